package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
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

    private final List<Ink> strokes = new ArrayList<>();
    private final List<Ink.Lettering> texts = new ArrayList<>();

    void stroke(double width, List<Double> dash, At... points) {
        strokes.add(new Ink.Stroke(width, dash, false, List.of(points)));
    }

    void stroke(double width, List<Double> dash, boolean closed, List<At> points) {
        strokes.add(new Ink.Stroke(width, dash, closed, List.copyOf(points)));
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
        strokes.add(new Ink.Stroke(MEDIUM, WHOLE, true, rim));
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
        fill(0, to, new At(back.x() - half * dy, back.y() + half * dx), new At(back.x() + half * dy, back.y() - half * dx));
    }

    /** A text that starts at a place. */
    Ink.Lettering text(At at, double size, List<Piece> pieces) {
        return turned(at, size, 0, pieces);
    }

    Ink.Lettering turned(At at, double size, double degrees, List<Piece> pieces) {
        Ink.Lettering text = new Ink.Lettering(at, size, degrees, pieces);
        texts.add(text);
        return text;
    }

    /** A text with its middle at a place, on the line of writing. */
    void centred(At at, double size, double degrees, List<Piece> pieces) {
        double half = width(pieces, size) / 2;
        double angle = Math.toRadians(degrees);
        turned(new At(at.x() - half * Math.cos(angle), at.y() + half * Math.sin(angle)), size, degrees, pieces);
    }

    /** Whether a text there would lie on one that is there already. */
    boolean isFree(Ink.Lettering text) {
        return texts.stream().noneMatch(other -> overlap(text, other));
    }

    static boolean overlap(Ink.Lettering a, Ink.Lettering b) {
        return separated(a.corners(), b.corners()) <= 0;
    }

    /** The widest gap between the shadows of two quadrilaterals on the sides of either; not above 0 where they overlap. */
    private static double separated(List<At> a, List<At> b) {
        double widest = Double.NEGATIVE_INFINITY;
        for (List<At> shape : List.of(a, b)) {
            for (int i = 0; i < 2; i++) {
                At from = shape.get(i);
                At to = shape.get(i + 1);
                double length = Math.max(1e-9, Math.hypot(to.x() - from.x(), to.y() - from.y()));
                double ux = (to.x() - from.x()) / length;
                double uy = (to.y() - from.y()) / length;
                double[] first = shadow(a, ux, uy);
                double[] second = shadow(b, ux, uy);
                widest = Math.max(widest, Math.max(second[0] - first[1], first[0] - second[1]));
            }
        }
        return widest;
    }

    private static double[] shadow(List<At> corners, double ux, double uy) {
        double[] along = corners.stream().mapToDouble(c -> c.x() * ux + c.y() * uy).sorted().toArray();
        return new double[] {along[0], along[along.length - 1]};
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

    Picture finish(double width, double height, String words) {
        List<Ink> inks = new ArrayList<>(strokes);
        texts.forEach(text -> inks.add(new Ink.Fill(1, text.corners())));
        inks.addAll(texts);
        return new Picture(width, height, words, List.copyOf(inks));
    }
}
