package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;

/**
 * Headings between the rows of a grid. A heading stands within the row below it, its words running over the columns at
 * the right: rows are never broken, so it cannot be left alone at the foot of a page, which the renderer would allow.
 */
final class Between {
    private final double width;
    private String waiting = "";

    /**
     * @param width of the grid, in mm
     */
    Between(double width) {
        this.width = width;
    }

    /** Takes in a heading; it is set with the next row. */
    void heading(String words) {
        waiting = words;
    }

    /** The row, with the heading that waits above it. */
    View.GridRow above(View.GridRow row) {
        if (waiting.isEmpty()) {
            return row;
        }
        boolean fits = Typefaces.width(waiting, Typefaces.BOLD, 8.5) < width - 3;
        List<View.GridCell> cells = new ArrayList<>();
        for (View.GridCell cell : row.cells()) {
            List<View.Text> texts = new ArrayList<>(cell.texts());
            String words = cells.isEmpty() ? waiting : "\u00a0";
            texts.add(0, View.Text.plain(fits ? "between" : "between wraps", words));
            cells.add(new View.GridCell(cell.style(), cell.span(), texts));
        }
        waiting = "";
        return new View.GridRow(row.style(), cells);
    }

    /** A heading that no row followed, as a row of its own; empty for none. */
    List<View.GridRow> rest(int columns) {
        return waiting.isEmpty()
                ? List.of()
                : List.of(new View.GridRow(
                        "",
                        List.of(new View.GridCell("", columns, List.of(View.Text.plain("between wraps", waiting))))));
    }
}
