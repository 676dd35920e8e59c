package nappe.calculation;

import java.util.ArrayList;
import java.util.List;

/**
 * A sheet while it is being laid out, from top to bottom. Rows 0 to 3 are kept for the head of the sheet. One table at a
 * time is open; it closes when the next block is added.
 */
public final class SheetDraft {
    /** The first row for blocks. */
    public static final int FIRST_ROW = 4;

    private final String name;
    private final String title;
    private final List<Block> blocks = new ArrayList<>();
    private int next = FIRST_ROW;

    public SheetDraft(String name, String title) {
        this.name = name;
        this.title = title;
    }

    public String name() {
        return name;
    }

    public String title() {
        return title;
    }

    /** The row on which the next block starts. */
    public int nextRow() {
        return next;
    }

    public void heading(String text) {
        blocks.add(new Block.Heading(next, text));
        next++;
    }

    public void note(String text) {
        blocks.add(new Block.Note(next, text, false));
        next++;
    }

    public void caution(String text) {
        blocks.add(new Block.Note(next, text, true));
        next++;
    }

    /** A table to which rows are added; empty title for none. Columns may be added to the list with the first row. */
    public TableDraft table(String title, List<Block.Column> columns) {
        TableDraft table = new TableDraft(this, next, title, columns, false);
        blocks.add(table.block());
        next = table.nextRow();
        return table;
    }

    /**
     * A table that stands in the workbook only. Its rows are kept free from the start: what is laid before it is full,
     * such as a root inside its trial rows, stands below it.
     */
    public TableDraft workbookTable(String title, List<Block.Column> columns, int rows) {
        TableDraft table = new TableDraft(this, next, title, columns, true);
        blocks.add(table.block());
        next = table.nextRow() + rows + 1;
        return table;
    }

    /** Lines of a calculation, whose rows were placed from {@link #nextRow()} + 1 on. */
    public void lines(CaseColumns columns, int workedCase, List<Block.Line> lines) {
        blocks.add(new Block.Lines(next, columns.names(), columns.printed(), workedCase, List.copyOf(lines)));
        next += 1 + lines.size();
        gap();
    }

    /** A chart in the workbook, over so many rows. */
    public void chart(int rows, String chartTitle, String across, String up, List<Block.Series> series) {
        blocks.add(new Block.Chart(next, rows, chartTitle, across, up, List.copyOf(series)));
        next += rows;
    }

    /** A figure, by the key under which the results know it. */
    public void figure(String figureTitle, String key) {
        blocks.add(new Block.Figure(next, figureTitle, key));
        next++;
        gap();
    }

    /** One empty row. */
    public void gap() {
        next++;
    }

    void grown(TableDraft table) {
        next = Math.max(next, table.nextRow());
    }

    /** The finished sheet. */
    public Sheet finish(int number) {
        return new Sheet(number, name, title, List.copyOf(blocks));
    }
}
