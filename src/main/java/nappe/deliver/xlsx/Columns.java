package nappe.deliver.xlsx;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Sheet;

/** The widths of a sheet's columns, in characters, and how far a text over the whole width reaches. */
final class Columns {
    /** Heads and widths of a calculation, before the columns of its cases. */
    static final List<Block.Column> OF_LINES = List.of(
            new Block.Column("Code", 8, Block.Align.LEFT),
            new Block.Column("Description", 34, Block.Align.LEFT),
            new Block.Column("Symbol", 8, Block.Align.LEFT),
            new Block.Column("Equation", 34, Block.Align.LEFT),
            new Block.Column("Unit", 9, Block.Align.LEFT),
            new Block.Column("Source", 28, Block.Align.LEFT),
            new Block.Column("All cases", 16, Block.Align.RIGHT));

    private static final int CASE = 13;
    private static final int NARROWEST = 5;
    private static final int WIDEST = 120;
    private static final int UNUSED = 9;
    private static final int FOR_TEXT = 90;

    private final List<Integer> widths = new ArrayList<>();
    private final int used;
    private final int span;
    private final int spanWidth;

    private Columns(Sheet sheet) {
        for (Block block : sheet.blocks()) {
            List<Integer> asked = asked(block);
            for (int i = 0; i < asked.size(); i++) {
                widen(i, asked.get(i));
            }
        }
        used = widths.size();
        int reach = 0;
        int column = 0;
        while (reach < FOR_TEXT) {
            if (column == widths.size()) {
                widths.add(UNUSED);
            }
            reach += widths.get(column++);
        }
        span = column;
        spanWidth = reach;
    }

    static Columns of(Sheet sheet) {
        return new Columns(sheet);
    }

    private static List<Integer> asked(Block block) {
        if (block instanceof Block.Table table) {
            return table.columns().stream().map(Block.Column::width).toList();
        }
        if (block instanceof Block.WorkbookOnly only) {
            return asked(only.table());
        }
        if (block instanceof Block.Lines lines) {
            List<Integer> all =
                    new ArrayList<>(OF_LINES.stream().map(Block.Column::width).toList());
            lines.caseNames().forEach(name -> all.add(CASE));
            return all;
        }
        return List.of();
    }

    /** Makes a column wide enough for a text that can't be broken. */
    void fit(int column, String text) {
        widen(column, (int) Math.ceil(TextWidth.of(text) + 2));
    }

    private void widen(int column, int width) {
        while (column >= widths.size()) {
            widths.add(NARROWEST);
        }
        widths.set(column, Math.max(widths.get(column), Math.min(WIDEST, width)));
    }

    /** All widths that are set, those of columns that only a text reaches included. */
    List<Integer> widths() {
        return widths;
    }

    int width(int column) {
        return column < widths.size() ? widths.get(column) : UNUSED;
    }

    /** How many columns a text over the sheet's width spans. */
    int span() {
        return span;
    }

    int spanWidth() {
        return spanWidth;
    }

    /** The width of what is printed. */
    int total() {
        return widths.subList(0, Math.max(used, span)).stream()
                .mapToInt(Integer::intValue)
                .sum();
    }
}
