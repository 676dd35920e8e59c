package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import nappe.deliver.pdf.Ink.At;
import nappe.results.Drawing;
import nappe.results.Drawing.Side;
import nappe.results.Results;

/** One view of a drawing: measured first, then drawn at a place and a scale. */
final class ViewSketch {
    private static final double SIZE = 8;
    private static final double RANK = 5.5;
    private static final double AIR = 3.5;
    private static final double HATCH = 1.6;

    private final Results results;
    private final Drawing.View view;
    private final Sketch sketch;
    private final double lowest;
    private final double highest;
    private final double leftmost;
    private final double rightmost;
    private final List<Figure> figures = new ArrayList<>();
    private double originX;
    private double originY;
    private double scale;

    ViewSketch(Results results, Drawing.View view, Sketch sketch) {
        this.results = results;
        this.view = view;
        this.sketch = sketch;
        List<Drawing.Point> points =
                view.parts().stream().flatMap(ViewSketch::points).toList();
        leftmost = points.stream().mapToDouble(Drawing.Point::x).min().orElse(0);
        rightmost = points.stream().mapToDouble(Drawing.Point::x).max().orElse(1);
        lowest = points.stream().mapToDouble(Drawing.Point::y).min().orElse(0);
        highest = points.stream().mapToDouble(Drawing.Point::y).max().orElse(1);
    }

    private static Stream<Drawing.Point> points(Drawing.Part part) {
        if (part instanceof Drawing.Path path) {
            return path.points().stream();
        } else if (part instanceof Drawing.Water water) {
            return Stream.of(water.from(), water.to());
        } else if (part instanceof Drawing.Dimension dimension) {
            return Stream.of(dimension.from(), dimension.to());
        } else if (part instanceof Drawing.Level level) {
            return Stream.of(level.at());
        } else if (part instanceof Drawing.Gauge gauge) {
            return Stream.of(gauge.at());
        } else if (part instanceof Drawing.Label label) {
            return Stream.of(label.at());
        }
        Drawing.Flow flow = (Drawing.Flow) part;
        return Stream.of(flow.from(), flow.to());
    }

    String title() {
        return view.title();
    }

    String schematic() {
        return view.schematic();
    }

    double width() {
        return rightmost - leftmost;
    }

    double height() {
        return highest - lowest;
    }

    double above() {
        return Math.max(margin(Side.ABOVE), margin(Side.ALONG)) + (hasWater() ? 6 : 1);
    }

    double below() {
        return margin(Side.BELOW) + (hasWater() ? 5 : 1);
    }

    private boolean hasWater() {
        return !DrawingPicture.parts(view, Drawing.Water.class).isEmpty();
    }

    /** The room that dimensions take on a side. */
    double margin(Side side) {
        int ranks = DrawingPicture.parts(view, Drawing.Dimension.class).stream()
                .filter(dimension -> dimension.side() == side)
                .mapToInt(Drawing.Dimension::rank)
                .max()
                .orElse(0);
        return ranks == 0 || side == Side.HERE ? 0 : ranks * RANK + AIR;
    }

    /** Draws it with its lower left corner at a place. */
    void draw(double x, double y, double perUnit) {
        originX = x - leftmost * perUnit;
        originY = y + lowest * perUnit;
        scale = perUnit;
        DrawingPicture.parts(view, Drawing.Path.class).forEach(this::path);
        DrawingPicture.parts(view, Drawing.Water.class).forEach(this::surface);
        DrawingPicture.parts(view, Drawing.Flow.class).forEach(this::flow);
        DrawingPicture.parts(view, Drawing.Gauge.class).forEach(gauge -> mark(at(gauge.at())));
        DrawingPicture.parts(view, Drawing.Dimension.class).forEach(this::dimension);
        placeFigures();
        DrawingPicture.parts(view, Drawing.Water.class).forEach(this::surfaceLevel);
        DrawingPicture.parts(view, Drawing.Level.class).forEach(this::level);
        DrawingPicture.parts(view, Drawing.Gauge.class)
                .forEach(gauge -> near(at(gauge.at()), 4.4, List.of(Piece.plain(gauge.words()))));
        DrawingPicture.parts(view, Drawing.Label.class)
                .forEach(label -> near(at(label.at()), 1, List.of(Piece.plain(label.words()))));
    }

    private At at(Drawing.Point point) {
        return new At(originX + point.x() * scale, originY - point.y() * scale);
    }

    private void path(Drawing.Path path) {
        List<At> points = path.points().stream().map(this::at).toList();
        switch (path.pen()) {
            case WALL -> sketch.stroke(Sketch.HEAVY, Sketch.WHOLE, path.closed(), points);
            case LINE -> sketch.stroke(Sketch.MEDIUM, Sketch.WHOLE, path.closed(), points);
            case HIDDEN -> sketch.stroke(Sketch.THIN, Sketch.DASHED, path.closed(), points);
            case AXIS -> sketch.stroke(Sketch.THIN, Sketch.DOTTED_DASH, path.closed(), points);
            case FLOOR -> {
                sketch.stroke(Sketch.HEAVY, Sketch.WHOLE, path.closed(), points);
                hatch(points);
            }
        }
    }

    /** Short strokes below a floor. */
    private void hatch(List<At> points) {
        double rest = 0.8;
        for (int i = 0; i + 1 < points.size(); i++) {
            At from = points.get(i);
            At to = points.get(i + 1);
            double length = Math.hypot(to.x() - from.x(), to.y() - from.y());
            double along = rest;
            for (; along < length; along += HATCH) {
                double x = from.x() + (to.x() - from.x()) * along / length;
                double y = from.y() + (to.y() - from.y()) * along / length;
                sketch.stroke(Sketch.THIN, Sketch.WHOLE, new At(x, y), new At(x - 1.2, y + 1.5));
            }
            rest = along - length;
        }
    }

    private void surface(Drawing.Water water) {
        sketch.stroke(Sketch.MEDIUM, Sketch.WHOLE, at(water.from()), at(water.to()));
        At sign = sign(water);
        double x = sign.x();
        double y = sign.y();
        sketch.stroke(
                Sketch.THIN, Sketch.WHOLE, true, List.of(new At(x, y), new At(x - 1.2, y - 2), new At(x + 1.2, y - 2)));
        for (int i = 1; i <= 3; i++) {
            double half = 1.5 - 0.4 * i;
            sketch.stroke(Sketch.THIN, Sketch.WHOLE, new At(x - half, y + 0.6 * i), new At(x + half, y + 0.6 * i));
        }
    }

    /** Where the sign of a water surface stands. */
    private At sign(Drawing.Water water) {
        At from = at(water.from());
        return new At(from.x() + (at(water.to()).x() - from.x()) * 0.2, from.y());
    }

    /** The level of a water surface, above its sign or near it. */
    private void surfaceLevel(Drawing.Water water) {
        Drawing.Quantity level = water.level();
        if (level == null) {
            return;
        }
        At sign = sign(water);
        List<Piece> pieces = quantity(level);
        double width = Sketch.width(pieces, SIZE);
        List<Ink.Lettering> places = new ArrayList<>();
        for (double up : new double[] {2.9, 6.3, 9.7, -5.6, -9, 13.1}) {
            for (double share : new double[] {0.5, 0.35, 0.65, 0.1, 0.9, -0.15, 1.15, -0.3, 1.3}) {
                places.add(new Ink.Lettering(new At(sign.x() - share * width, sign.y() - up), SIZE, 0, pieces));
            }
        }
        sketch.choose(places);
    }

    private void flow(Drawing.Flow flow) {
        At from = at(flow.from());
        At to = at(flow.to());
        double length = 10;
        double along = Math.hypot(to.x() - from.x(), to.y() - from.y());
        At end = along < 1e-9
                ? to
                : new At(
                        from.x() + (to.x() - from.x()) * length / along,
                        from.y() + (to.y() - from.y()) * length / along);
        sketch.stroke(Sketch.MEDIUM, Sketch.WHOLE, from, end);
        sketch.head(from, end);
        sketch.centred(new At((from.x() + end.x()) / 2, from.y() - 1.2), SIZE, 0, List.of(Piece.plain("flow")));
    }

    /** A level at a point: a dot, a leader, and the text where it hides least. */
    private void level(Drawing.Level level) {
        At at = at(level.at());
        List<Piece> pieces = quantity(level.value());
        double width = Sketch.width(pieces, SIZE);
        List<Ink.Lettering> places = new ArrayList<>();
        for (double down : new double[] {9, -8, 13, -12, 17, -16, -20, -5.5, 6.5}) {
            for (double right : new double[] {5, -5 - width, 9, -9 - width, 14, -14 - width}) {
                places.add(new Ink.Lettering(new At(at.x() + right, at.y() + down), SIZE, 0, pieces));
            }
        }
        Ink.Lettering text = sketch.choose(places, place -> List.of(at, leaderEnd(at, place, width)));
        sketch.circle(at, 0.5, false);
        sketch.stroke(Sketch.THIN, Sketch.WHOLE, at, leaderEnd(at, text, width));
    }

    /** Where the leader from a point meets its text. */
    private static At leaderEnd(At from, Ink.Lettering text, double width) {
        boolean isRight = text.at().x() >= from.x();
        return new At(
                isRight ? text.at().x() - 0.8 : text.at().x() + width + 0.8,
                text.at().y() - 0.9);
    }

    private void mark(At at) {
        sketch.circle(at, 1.1, true);
        sketch.circle(at, 0.35, false);
    }

    /** A text with its middle so far below a place, or near it. */
    private void near(At at, double below, List<Piece> pieces) {
        double half = Sketch.width(pieces, SIZE) / 2;
        List<Ink.Lettering> places = new ArrayList<>();
        for (double down : new double[] {below, below + 3, 1 - below, -2 - below}) {
            for (double right : new double[] {0, half + 2, -half - 2}) {
                places.add(new Ink.Lettering(new At(at.x() - half + right, at.y() + down), SIZE, 0, pieces));
            }
        }
        sketch.choose(places);
    }

    private List<Piece> quantity(Drawing.Quantity quantity) {
        List<Piece> pieces = new ArrayList<>();
        if (!quantity.words().isEmpty()) {
            pieces.add(Piece.plain(quantity.words() + " "));
        }
        pieces.addAll(SymbolPrint.pieces(quantity.symbol()));
        pieces.add(Piece.plain("\u00a0= "));
        pieces.addAll(Printed.withUnit(results, quantity.cell()));
        return pieces;
    }

    private void dimension(Drawing.Dimension dimension) {
        At from = at(dimension.from());
        At to = at(dimension.to());
        List<Piece> pieces = quantity(dimension.value());
        double off = AIR + (dimension.rank() - 1) * RANK + 3;
        double top = originY - highest * scale;
        double foot = originY - lowest * scale;
        double left = originX + leftmost * scale;
        double right = originX + rightmost * scale;
        switch (dimension.side()) {
            case ABOVE -> measured(from, to, new At(from.x(), top - off + 3), new At(to.x(), top - off + 3), pieces);
            case BELOW -> measured(from, to, new At(from.x(), foot + off), new At(to.x(), foot + off), pieces);
            case LEFT -> measured(from, to, new At(left - off + 1, from.y()), new At(left - off + 1, to.y()), pieces);
            case RIGHT -> measured(from, to, new At(right + off, from.y()), new At(right + off, to.y()), pieces);
            case HERE -> measured(from, to, from, to, pieces);
            case ALONG -> {
                double length = Math.max(1e-9, Math.hypot(to.x() - from.x(), to.y() - from.y()));
                double nx = (to.y() - from.y()) / length * off;
                double ny = -(to.x() - from.x()) / length * off;
                measured(from, to, new At(from.x() + nx, from.y() + ny), new At(to.x() + nx, to.y() + ny), pieces);
            }
        }
    }

    /** Extension lines from two places, and between their ends the dimension line with arrows and its text. */
    private void measured(At from, At to, At start, At end, List<Piece> pieces) {
        extension(from, start);
        extension(to, end);
        double length = Math.hypot(end.x() - start.x(), end.y() - start.y());
        double ux = length < 1e-9 ? 0 : (end.x() - start.x()) / length;
        double uy = length < 1e-9 ? 1 : (end.y() - start.y()) / length;
        boolean inside = length > 5.5;
        if (inside) {
            sketch.stroke(Sketch.THIN, Sketch.WHOLE, start, end);
            sketch.head(end, start);
            sketch.head(start, end);
        } else {
            At before = new At(start.x() - 4 * ux, start.y() - 4 * uy);
            At after = new At(end.x() + 4 * ux, end.y() + 4 * uy);
            sketch.stroke(Sketch.THIN, Sketch.WHOLE, before, after);
            sketch.head(before, start);
            sketch.head(after, end);
        }
        figures.add(new Figure(start, end, pieces));
    }

    /** The text of a dimension line, not yet placed. */
    private record Figure(At start, At end, List<Piece> pieces) {
        double length() {
            return Math.hypot(end.x() - start.x(), end.y() - start.y());
        }

        double width() {
            return Sketch.width(pieces, SIZE);
        }

        boolean fits() {
            return width() <= length() - 2;
        }
    }

    /** First the texts that fit between their arrows: they have no other place. */
    private void placeFigures() {
        figures.stream().filter(Figure::fits).forEach(this::place);
        figures.stream().filter(figure -> !figure.fits()).forEach(this::place);
        figures.clear();
    }

    private void place(Figure figure) {
        At start = figure.start();
        At end = figure.end();
        List<Piece> pieces = figure.pieces();
        double length = figure.length();
        double width = figure.width();
        double ux = length < 1e-9 ? 0 : (end.x() - start.x()) / length;
        double uy = length < 1e-9 ? 1 : (end.y() - start.y()) / length;
        At middle = new At((start.x() + end.x()) / 2, (start.y() + end.y()) / 2);
        boolean upright = Math.abs(ux) < 0.1;
        double angle = upright ? 90 : Math.toDegrees(Math.atan2(-uy * Math.signum(ux), Math.abs(ux)));
        double radians = Math.toRadians(angle);
        List<Ink.Lettering> places = new ArrayList<>();
        if (figure.fits()) {
            double x = middle.x() - 0.9 * Math.sin(radians) - width / 2 * Math.cos(radians);
            double y = middle.y() - 0.9 * Math.cos(radians) + width / 2 * Math.sin(radians);
            for (double share : new double[] {0, 0.25, -0.25}) {
                double along = share * (length - width - 2);
                places.add(new Ink.Lettering(
                        new At(x + along * Math.cos(radians), y - along * Math.sin(radians)), SIZE, angle, pieces));
            }
        } else if (upright) {
            double foot = Math.max(start.y(), end.y());
            double head = Math.min(start.y(), end.y());
            for (double y : new double[] {middle.y() + 1, foot + 3.4, head - 1.5, foot + 6.8}) {
                places.add(new Ink.Lettering(new At(middle.x() + 1.2, y), SIZE, 0, pieces));
                places.add(new Ink.Lettering(new At(middle.x() - 1.2 - width, y), SIZE, 0, pieces));
            }
        } else {
            for (double up : new double[] {0.9, -3.2, 4.3}) {
                for (double right : new double[] {-width / 2, length / 2 + 4.5, -length / 2 - 4.5 - width}) {
                    places.add(new Ink.Lettering(new At(middle.x() + right, middle.y() - up), SIZE, 0, pieces));
                }
            }
        }
        sketch.choose(places);
    }

    private void extension(At from, At to) {
        double length = Math.hypot(to.x() - from.x(), to.y() - from.y());
        if (length < 1.5) {
            return;
        }
        double ux = (to.x() - from.x()) / length;
        double uy = (to.y() - from.y()) / length;
        sketch.stroke(
                Sketch.THIN,
                Sketch.WHOLE,
                new At(from.x() + ux, from.y() + uy),
                new At(to.x() + 1.2 * ux, to.y() + 1.2 * uy));
    }
}
