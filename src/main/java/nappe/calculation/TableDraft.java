package nappe.calculation;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** A table while rows are added to it. */
public final class TableDraft {
    private final SheetDraft sheet;
    private final List<Block.Row> rows = new ArrayList<>();
    private final List<Cell> keys = new ArrayList<>();
    private final Block block;
    private final int firstRow;

    TableDraft(SheetDraft sheet, int row, String title, List<Block.Column> columns, boolean workbookOnly) {
        this.sheet = sheet;
        Block.Table table = new Block.Table(
                row,
                title,
                Collections.unmodifiableList(columns),
                Collections.unmodifiableList(rows),
                Collections.unmodifiableList(keys));
        this.block = workbookOnly ? new Block.WorkbookOnly(table) : table;
        this.firstRow = row + (title.isEmpty() ? 0 : 1) + 1;
    }

    Block block() {
        return block;
    }

    /** The table as a block of its sheet. */
    public Block.Table table() {
        return block instanceof Block.WorkbookOnly only ? only.table() : (Block.Table) block;
    }

    /** The workbook row on which the next row of the table stands. */
    public int nextRow() {
        return firstRow + rows.size();
    }

    /** Where column i of the next row stands. */
    public Place place(int column) {
        return new Place(sheet.name(), nextRow(), column);
    }

    /** Adds the next row. */
    public void add(List<Block.Item> items) {
        rows.add(new Block.Row(List.copyOf(items)));
        sheet.grown(this);
    }

    /** From now on the PDF prints only rows that begin with what such a cell holds. */
    public void printRowsOf(Cell key) {
        keys.add(key);
    }

    public boolean isEmpty() {
        return rows.isEmpty();
    }
}
