package nappe.figure;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.formula.Formula;
import nappe.results.Drawing.Pen;
import nappe.results.Drawing.Side;
import org.jspecify.annotations.Nullable;

/**
 * What one text says about the drawing of one kind of element: checked, and without numbers of a design.
 *
 * @param lets lengths of the drawing's own, in order, each resting on what stands above it
 * @param text the text itself, for the fingerprint
 */
public record FigureSheet(
        Map<String, Formula> lets,
        @Nullable Schematic schematic,
        List<View> views,
        List<Worded> worded,
        List<Note> notes,
        String text) {
    public FigureSheet {
        lets = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(lets));
        views = List.copyOf(views);
        worded = List.copyOf(worded);
        notes = List.copyOf(notes);
    }

    /** Where the drawing is not to scale, and why. */
    public record Schematic(Formula when, String why) {}

    /** A result in words that is printed below the drawing. */
    public record Worded(String symbol, String words) {}

    /**
     * A sentence below the drawing.
     *
     * @param when null for always
     */
    public record Note(@Nullable Formula when, String text) {}

    /** @param schematic where this view alone is not to scale; null for nowhere */
    public record View(String title, @Nullable Schematic schematic, List<Placed> parts) {}

    /**
     * A part, and where it is drawn at all.
     *
     * @param when null for always
     * @param otherwise what is said in its place
     */
    public record Placed(Part part, @Nullable Formula when, String otherwise) {}

    public record Point(Formula x, Formula y) {}

    /** A part of a view, its coordinates formulas over the symbols of the method. */
    public sealed interface Part {
        List<Point> points();
    }

    public record Path(Pen pen, boolean closed, List<Point> points) implements Part {}

    /** @param symbol of its level; empty for none */
    public record Water(List<Point> points, String symbol, String words) implements Part {}

    public record Dimension(Side side, int rank, String symbol, List<Point> points) implements Part {}

    public record Level(List<Point> points, String symbol, String words) implements Part {}

    public record Gauge(List<Point> points, String words) implements Part {}

    public record Label(List<Point> points, String words) implements Part {}

    public record Flow(List<Point> points) implements Part {}

    /** The symbols whose values are printed in it, in the order of the text. */
    public List<String> printed() {
        Set<String> symbols = new LinkedHashSet<>();
        for (View view : views) {
            for (Placed placed : view.parts()) {
                Part part = placed.part();
                if (part instanceof Dimension dimension) {
                    symbols.add(dimension.symbol());
                } else if (part instanceof Level level) {
                    symbols.add(level.symbol());
                } else if (part instanceof Water water && !water.symbol().isEmpty()) {
                    symbols.add(water.symbol());
                }
            }
        }
        worded.forEach(one -> symbols.add(one.symbol()));
        return new ArrayList<>(symbols);
    }
}
