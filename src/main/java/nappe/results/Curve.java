package nappe.results;

import java.util.List;
import nappe.calculation.Cell;

/**
 * A rating curve: head against flow, with the flow cases and the limits marked on it.
 *
 * @param flow symbol and head of the axis of flow, its unit that of the points' cells
 * @param missing what could not be marked, one sentence each
 */
public record Curve(
        String title,
        String flow,
        String head,
        List<Point> points,
        List<Case> cases,
        List<End> ends,
        List<String> missing)
        implements Figure {
    /** A row of the rating table. */
    public record Point(Cell flow, Cell head) {}

    /** A flow case whose head is known. */
    public record Case(String name, Cell flow, Cell head) {}

    /**
     * An end of a range.
     *
     * @param ofHead true for a head, false for a flow
     * @param words what it is the end of
     * @param value in the working unit
     */
    public record End(boolean ofHead, String words, double value) {}
}
