package nappe.results;

import java.util.List;
import nappe.calculation.Cell;
import nappe.unit.Unit;

/** The margins of the limits as bars, in the order of the summary. */
public record Bars(String title, List<Bar> bars) implements Figure {
    /**
     * One limit.
     *
     * @param number its place in the summary
     * @param verdict the worst over the cases
     * @param margin the tightest; holds a number, or words where there is nothing to measure
     * @param unit of the margin: that of a pure number where it is a share of the limit's scale
     * @param where the case with the tightest margin
     */
    public record Bar(String number, Cell tag, Cell label, Cell verdict, Cell margin, Unit unit, Cell where) {}
}
