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
    private double originX;
    private double originY;
    private double scale;

    ViewSketch(Results results, Drawing.View view, Sketch sketch) {
        this.results = results;
        this.view = view;
        this.sketch = sketch;
        List<Drawing.Point> points = view.parts().stream().flatMap(ViewSketch::points).toList();
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

    double width() {
        return rightmost - leftmost;
    }

    double height() {
        return highest - lowest;
    }

    double above() {
        return Math.max(margin(Side.ABOVE), margin(Side.ALONG)) + 5;
    }

    double below() {
        return margin(Side.BELOW) + 4;
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
        DrawingPicture.parts(view, Drawing.Dimension.class).forEach(this::dimension);
        DrawingPicture.parts(view, Drawing.Water.class).forEach(this::water);
        DrawingPicture.parts(view, Drawing.Flow.class).forEach(this::flow);
        DrawingPicture.parts(view, Drawing.Level.class).forEach(this::level);
        DrawingPicture.parts(view, Drawing.Gauge.class).forEach(this::gauge);
        DrawingPicture.parts(view, Drawing.Label.class)
                .forEach(label -> note(at(label.at()), List.of(Piece.plain(label.words()))));
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

    private void water(Drawing.Water water) {
        At from = at(water.from());
        At to = at(water.to());
        sketch.stroke(Sketch.MEDIUM, Sketch.WHOLE, from, to);
        double x = from.x() + (to.x() - from.x()) * 0.35;
        double y = from.y();
        sketch.stroke(Sketch.THIN, Sketch.WHOLE, true, List.of(new At(x, y), new At(x - 1.2, y - 2), new At(x + 1.2, y - 2)));
        for (int i = 1; i <= 3; i++) {
            double half = 1.5 - 0.4 * i;
            sketch.stroke(Sketch.THIN, Sketch.WHOLE, new At(x - half, y + 0.6 * i), new At(x + half, y + 0.6 * i));
        }
        Drawing.Quantity level = water.level();
        if (level != null) {
            place(new At(x, y - 2.8), quantity(level), List.of(
                    new At(0, 0), new At(0, -3.4), new At(0, -6.8), new At(14, 0), new At(-14, 0), new At(0, 8)));
        }
    }

    private void flow(Drawing.Flow flow) {
        At from = at(flow.from());
        At to = at(flow.to());
        double length = 10;
        double along = Math.hypot(to.x() - from.x(), to.y() - from.y());
        At end = along < 1e-9
                ? to
                : new At(from.x() + (to.x() - from.x()) * length / along, from.y() + (to.y() - from.y()) * length / along);
        sketch.stroke(Sketch.MEDIUM, Sketch.WHOLE, from, end);
        sketch.head(from, end);
        sketch.centred(new At((from.x() + end.x()) / 2, from.y() - 1.2), SIZE, 0, List.of(Piece.plain("flow")));
    }

    private void level(Drawing.Level level) {
        At at = at(level.at());
        List<Piece> pieces = quantity(level.value());
        double width = Sketch.width(pieces, SIZE);
        At[] places = {new At(5, 9), new At(-5 - width, 9), new At(5, 13), new At(-5 - width, 13), new At(5, -9)};
        for (At place : places) {
            Ink.Lettering text = new Ink.Lettering(new At(at.x() + place.x(), at.y() + place.y()), SIZE, 0, pieces);
            if (sketch.isFree(text)) {
                leader(at, text, width);
                return;
            }
        }
        leader(at, new Ink.Lettering(new At(at.x() + 5, at.y() + 9), SIZE, 0, pieces), width);
    }

    private void leader(At at, Ink.Lettering text, double width) {
        sketch.circle(at, 0.5, false);
        boolean right = text.at().x() >= at.x();
        double y = text.at().y() - 0.9;
        At near = new At(right ? text.at().x() - 0.8 : text.at().x() + width + 0.8, y);
        sketch.stroke(Sketch.THIN, Sketch.WHOLE, at, near);
        sketch.text(text.at(), text.size(), text.pieces());
    }

    private void gauge(Drawing.Gauge gauge) {
        At at = at(gauge.at());
        sketch.circle(at, 1.1, true);
        sketch.circle(at, 0.35, false);
        List<Piece> pieces = List.of(Piece.plain(gauge.words()));
        place(new At(at.x(), at.y() + 4.4), pieces, List.of(new At(0, 0), new At(0, 2), new At(-8, -3), new At(8, -3)));
    }

    private void note(At at, List<Piece> pieces) {
        place(at, pieces, List.of(new At(0, 0), new At(0, -3.4), new At(0, 3.4), new At(12, 0), new At(-12, 0)));
    }

    /** Sets a text with its middle at the first of the places where it lies on no other. */
    private void place(At at, List<Piece> pieces, List<At> shifts) {
        double half = Sketch.width(pieces, SIZE) / 2;
        At chosen = shifts.stream()
                .map(shift -> new At(at.x() + shift.x() - half, at.y() + shift.y()))
                .filter(start -> sketch.isFree(new Ink.Lettering(start, SIZE, 0, pieces)))
                .findFirst()
                .orElse(new At(at.x() - half, at.y()));
        sketch.text(chosen, SIZE, pieces);
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
        figure(start, end, ux, uy, length, pieces);
    }

    private void figure(At start, At end, double ux, double uy, double length, List<Piece> pieces) {
        double width = Sketch.width(pieces, SIZE);
        At middle = new At((start.x() + end.x()) / 2, (start.y() + end.y()) / 2);
        boolean upright = Math.abs(ux) < 0.1;
        if (upright && width > length - 2) {
            At beside = new At(middle.x() + 1.2, middle.y() + 1);
            sketch.text(beside, SIZE, pieces);
            return;
        }
        double angle = upright ? 90 : Math.toDegrees(Math.atan2(-uy * Math.signum(ux), Math.abs(ux)));
        double radians = Math.toRadians(angle);
        At above = new At(middle.x() - 0.9 * Math.sin(radians), middle.y() - 0.9 * Math.cos(radians));
        sketch.centred(above, SIZE, angle, pieces);
    }

    private void extension(At from, At to) {
        double length = Math.hypot(to.x() - from.x(), to.y() - from.y());
        if (length < 1.5) {
            return;
        }
        double ux = (to.x() - from.x()) / length;
        double uy = (to.y() - from.y()) / length;
        sketch.stroke(Sketch.THIN, Sketch.WHOLE, new At(from.x() + ux, from.y() + uy), new At(to.x() + 1.2 * ux, to.y() + 1.2 * uy));
    }
}
