package nappe.results;

import java.util.List;
import nappe.calculation.Cell;

/** The margins of the limits as bars, in the order of the summary. */
public record Bars(String title, List<Bar> bars) implements Figure {
    /**
     * One limit in its worst case.
     *
     * @param number its place in the summary
     * @param margin holds a number, or words where there is nothing to measure
     */
    public record Bar(String number, Cell tag, Cell label, Cell verdict, Cell margin, Cell worst) {}
}
