package nappe.results;

import java.util.List;
import nappe.calculation.Cell;

/**
 * A device as drawn for the worked case, in working units of length.
 *
 * @param unit the unit of every coordinate
 * @param schematic why none of it is to scale; empty where it is
 * @param notes what is said below it, what could not be drawn included; one sentence each
 */
public record Drawing(String title, nappe.unit.Unit unit, String schematic, List<View> views, List<String> notes)
        implements Figure {
    /**
     * One view; y points up.
     *
     * @param schematic why this view is not to scale, where others are; empty where it is
     */
    public record View(String title, String schematic, List<Part> parts) {}

    public record Point(double x, double y) {}

    /** A part of a view. */
    public sealed interface Part {}

    /** How a line is drawn. */
    public enum Pen {
        WALL,
        LINE,
        HIDDEN,
        AXIS,
        /** Heavy, with hatching to the right of its direction. */
        FLOOR
    }

    public record Path(Pen pen, boolean closed, List<Point> points) implements Part {}

    /** A water surface with its sign, and its level where it has one. */
    public record Water(
            Point from,
            Point to,
            @org.jspecify.annotations.Nullable Quantity level) implements Part {}

    /** A dimension between two points; a rank further out where there is no room. */
    public record Dimension(Side side, int rank, Point from, Point to, Quantity value) implements Part {}

    /** A level at a point. */
    public record Level(Point at, Quantity value) implements Part {}

    /** The place of a gauge. */
    public record Gauge(Point at, String words) implements Part {}

    public record Label(Point at, String words) implements Part {}

    /** Direction of flow. */
    public record Flow(Point from, Point to) implements Part {}

    /** A number that is printed: symbol, cell, and words that go with it or none. */
    public record Quantity(String symbol, Cell cell, String words) {}

    /** Where a dimension stands against its view: outside it, along the line between its points, or on that line. */
    public enum Side {
        ABOVE,
        BELOW,
        LEFT,
        RIGHT,
        ALONG,
        HERE
    }
}
