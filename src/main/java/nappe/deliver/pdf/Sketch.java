package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import nappe.deliver.pdf.Ink.At;

/** A picture while it is made: strokes first, then texts over them, each on a clear ground. */
final class Sketch {
    static final double MM_PER_POINT = 25.4 / 72;

    static final double HEAVY = 0.5;
    static final double MEDIUM = 0.3;
    static final double THIN = 0.15;

    static final List<Double> WHOLE = List.of();
    static final List<Double> DASHED = List.of(1.4, 0.9);
    static final List<Double> DOTTED_DASH = List.of(4.0, 0.8, 0.6, 0.8);

    private static final double SUB = 0.72;
    private static final double ARROW = 2.2;

    /** Room that a text keeps from lines, in mm. */
    private static final double AIR = 0.6;

    private final double width;
    private final List<Ink> strokes = new ArrayList<>();
    private final List<Ink.Lettering> texts = new ArrayList<>();

    /** The corners of the texts. */
    private final List<List<At>> taken = new ArrayList<>();

    /** @param width in mm, over which no text is to reach */
    Sketch(double width) {
        this.width = width;
    }

    void stroke(double width, List<Double> dash, At... points) {
        stroke(width, dash, false, List.of(points));
    }

    void stroke(double width, List<Double> dash, boolean closed, List<At> points) {
        strokes.add(new Ink.Stroke(width, dash, 0, closed, List.copyOf(points)));
    }

    /** A line of a grid, which texts may cover. */
    void grid(At from, At to) {
        strokes.add(new Ink.Stroke(0.1, WHOLE, 0.65, false, List.of(from, to)));
    }

    void fill(double grey, At... points) {
        strokes.add(new Ink.Fill(grey, List.of(points)));
    }

    /** A filled circle, or an open one with a filled middle. */
    void circle(At centre, double radius, boolean open) {
        List<At> rim = new ArrayList<>();
        for (int i = 0; i < 24; i++) {
            double angle = 2 * Math.PI * i / 24;
            rim.add(new At(centre.x() + radius * Math.cos(angle), centre.y() + radius * Math.sin(angle)));
        }
        strokes.add(new Ink.Fill(open ? 1 : 0, rim));
        strokes.add(new Ink.Stroke(MEDIUM, WHOLE, 0, true, rim));
    }

    /** The head of an arrow that points from one place to another. */
    void head(At from, At to) {
        double length = Math.hypot(to.x() - from.x(), to.y() - from.y());
        if (length < 1e-9) {
            return;
        }
        double dx = (to.x() - from.x()) / length;
        double dy = (to.y() - from.y()) / length;
        double half = ARROW * 0.17;
        At back = new At(to.x() - ARROW * dx, to.y() - ARROW * dy);
        fill(
                0,
                to,
                new At(back.x() - half * dy, back.y() + half * dx),
                new At(back.x() + half * dy, back.y() - half * dx));
    }

    /** A text that starts at a place. */
    Ink.Lettering text(At at, double size, List<Piece> pieces) {
        return turned(at, size, 0, pieces);
    }

    Ink.Lettering turned(At at, double size, double degrees, List<Piece> pieces) {
        Ink.Lettering text = new Ink.Lettering(at, size, degrees, pieces);
        add(text);
        return text;
    }

    private void add(Ink.Lettering text) {
        texts.add(text);
        taken.add(text.corners());
    }

    /** A text with its middle at a place, on the line of writing. */
    void centred(At at, double size, double degrees, List<Piece> pieces) {
        double half = width(pieces, size) / 2;
        double angle = Math.toRadians(degrees);
        turned(new At(at.x() - half * Math.cos(angle), at.y() + half * Math.sin(angle)), size, degrees, pieces);
    }

    /** Sets a text at the place where it hides least; the first of equals. */
    Ink.Lettering choose(List<Ink.Lettering> places) {
        return choose(places, place -> List.of());
    }

    /**
     * The same for a text with a leader, which is to cross nothing either.
     *
     * @param leader its two ends for a place, or none
     */
    Ink.Lettering choose(List<Ink.Lettering> places, Function<Ink.Lettering, List<At>> leader) {
        Ink.Lettering best = places.get(0);
        double least = Double.POSITIVE_INFINITY;
        for (Ink.Lettering place : places) {
            double hidden = hidden(place) + crossed(leader.apply(place));
            if (hidden < least - 1e-9) {
                best = place;
                least = hidden;
            }
        }
        add(best);
        return best;
    }

    /** How much a text would hide of what is there already: another text much, a heavy line some, a thin one little. */
    private double hidden(Ink.Lettering text) {
        double hidden = 0;
        List<At> corners = text.corners(AIR);
        for (List<At> other : taken) {
            hidden += separated(corners, other) <= 0 ? 100 : 0;
        }
        for (At corner : text.corners()) {
            hidden += corner.x() < 0 || corner.x() > width || corner.y() < 0 ? 1000 : 0;
        }
        for (Ink ink : strokes) {
            if (ink instanceof Ink.Stroke stroke && stroke.grey() == 0) {
                hidden += crosses(stroke, corners) ? 10 * stroke.width() : 0;
            } else if (ink instanceof Ink.Fill fill && separated(fill.points(), corners) <= 0) {
                hidden += 2;
            }
        }
        return hidden;
    }

    /**
     * How much a leader would cross: a text much, a line less. Its first tenth lies in the point that it leads from, where
     * lines may meet.
     */
    private double crossed(List<At> leader) {
        if (leader.isEmpty()) {
            return 0;
        }
        At from = leader.get(0);
        At to = leader.get(1);
        At start = new At(from.x() + 0.1 * (to.x() - from.x()), from.y() + 0.1 * (to.y() - from.y()));
        List<At> line = List.of(start, to);
        double crossed = 0;
        for (List<At> other : taken) {
            crossed += separated(line, other) <= 0 ? 50 : 0;
        }
        for (Ink ink : strokes) {
            if (ink instanceof Ink.Stroke stroke && stroke.grey() == 0) {
                crossed += crosses(stroke, line) ? 5 * stroke.width() : 0;
            }
        }
        return crossed;
    }

    private static boolean crosses(Ink.Stroke stroke, List<At> corners) {
        List<At> points = stroke.points();
        int last = stroke.closed() ? points.size() : points.size() - 1;
        for (int i = 0; i < last; i++) {
            if (separated(corners, List.of(points.get(i), points.get((i + 1) % points.size()))) <= 0) {
                return true;
            }
        }
        return false;
    }

    static boolean overlap(Ink.Lettering a, Ink.Lettering b) {
        return separated(a.corners(), b.corners()) <= 0;
    }

    /**
     * The widest gap between the shadows of two convex shapes, across the sides of either; not above 0 where they
     * overlap.
     */
    private static double separated(List<At> a, List<At> b) {
        double widest = Double.NEGATIVE_INFINITY;
        for (List<At> shape : List.of(a, b)) {
            for (int i = 0; i < shape.size(); i++) {
                At from = shape.get(i);
                At to = shape.get((i + 1) % shape.size());
                double length = Math.max(1e-9, Math.hypot(to.x() - from.x(), to.y() - from.y()));
                double across = -(to.y() - from.y()) / length;
                double up = (to.x() - from.x()) / length;
                double[] first = shadow(a, across, up);
                double[] second = shadow(b, across, up);
                widest = Math.max(widest, Math.max(second[0] - first[1], first[0] - second[1]));
            }
        }
        return widest;
    }

    private static double[] shadow(List<At> corners, double ux, double uy) {
        double from = Double.POSITIVE_INFINITY;
        double to = Double.NEGATIVE_INFINITY;
        for (At corner : corners) {
            double along = corner.x() * ux + corner.y() * uy;
            from = Math.min(from, along);
            to = Math.max(to, along);
        }
        return new double[] {from, to};
    }

    /** The width of pieces in mm at a size in points. */
    static double width(List<Piece> pieces, double size) {
        return pieces.stream()
                .mapToDouble(piece -> Typefaces.width(piece.text(), InkPress.face(piece), size * scale(piece)))
                .sum();
    }

    /** How large a piece is against the size of its line. */
    static double scale(Piece piece) {
        return piece.shift() == Piece.Shift.NONE ? 1 : SUB;
    }

    /** @param least height in mm; it becomes higher where a mark reaches lower */
    Picture finish(double least, String words) {
        List<Ink> inks = new ArrayList<>(strokes);
        texts.forEach(text -> inks.add(new Ink.Fill(1, text.corners())));
        inks.addAll(texts);
        double height = inks.stream()
                .flatMap(ink -> points(ink).stream())
                .mapToDouble(point -> point.y() + 0.3)
                .max()
                .orElse(0);
        return new Picture(width, Math.max(least, height), words, List.copyOf(inks));
    }

    private static List<At> points(Ink ink) {
        return ink instanceof Ink.Stroke stroke
                ? stroke.points()
                : ink instanceof Ink.Fill fill ? fill.points() : ((Ink.Lettering) ink).corners();
    }
}
