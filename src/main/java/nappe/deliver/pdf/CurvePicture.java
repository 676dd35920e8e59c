package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Cell;
import nappe.deliver.pdf.Ink.At;
import nappe.formula.Value;
import nappe.results.Curve;
import nappe.results.Digits;
import nappe.results.Results;

/** A rating curve on logarithmic scales, head over flow, so that both ends of the range can be read. */
final class CurvePicture {
    private static final double SIZE = 8;
    private static final double LEFT = 17;
    private static final double RIGHT = 4;
    private static final double TOP = 4;
    private static final double FOOT = 12;

    private final Results results;
    private final Curve curve;
    private final Sketch sketch;
    private final double width;
    private final double height;
    private LogAxis across;
    private LogAxis up;

    private CurvePicture(Results results, Curve curve, double width, double height) {
        this.results = results;
        this.curve = curve;
        this.width = width;
        this.sketch = new Sketch(width);
        this.height = height;
        List<Double> flows = new ArrayList<>();
        List<Double> heads = new ArrayList<>();
        curve.points().forEach(point -> {
            flows.add(number(point.flow()));
            heads.add(number(point.head()));
        });
        curve.cases().forEach(one -> {
            flows.add(number(one.flow()));
            heads.add(number(one.head()));
        });
        curve.ends().forEach(end -> (end.ofHead() ? heads : flows).add(end.value()));
        across = LogAxis.of(flows, LEFT, width - RIGHT);
        up = LogAxis.of(heads, height - FOOT, TOP);
    }

    static Picture of(Results results, Curve curve, double width, double height) {
        return new CurvePicture(results, curve, width, height).make();
    }

    private Picture make() {
        grid();
        ends();
        List<At> line = new ArrayList<>();
        curve.points().stream()
                .filter(point -> number(point.flow()) > 0 && number(point.head()) > 0)
                .forEach(point -> line.add(at(point.flow(), point.head())));
        sketch.stroke(Sketch.HEAVY, Sketch.WHOLE, false, line);
        curve.cases().stream()
                .filter(one -> number(one.flow()) > 0 && number(one.head()) > 0)
                .forEach(this::mark);
        return sketch.finish(height, curve.title());
    }

    private double number(Cell cell) {
        return results.value(cell) instanceof Value.Number number ? number.value() : Double.NaN;
    }

    private At at(Cell flow, Cell head) {
        return new At(across.place(number(flow)), up.place(number(head)));
    }

    private void grid() {
        double foot = height - FOOT;
        for (LogAxis.Tick tick : across.ticks()) {
            double x = across.place(tick.value());
            sketch.grid(new At(x, TOP), new At(x, foot));
            sketch.centred(new At(x, foot + 3.8), SIZE, 0, List.of(Piece.plain(tick.text())));
        }
        for (LogAxis.Tick tick : up.ticks()) {
            double y = up.place(tick.value());
            sketch.grid(new At(LEFT, y), new At(width - RIGHT, y));
            List<Piece> text = List.of(Piece.plain(tick.text()));
            sketch.text(new At(LEFT - 1.2 - Sketch.width(text, SIZE), y + 1), SIZE, text);
        }
        sketch.stroke(
                Sketch.MEDIUM,
                Sketch.WHOLE,
                true,
                List.of(
                        new At(LEFT, TOP),
                        new At(width - RIGHT, TOP),
                        new At(width - RIGHT, foot),
                        new At(LEFT, foot)));
        Curve.Point first = curve.points().get(0);
        sketch.centred(
                new At((LEFT + width - RIGHT) / 2, height - 2.6),
                SIZE + 0.5,
                0,
                axis("flow ", curve.flow(), first.flow()));
        sketch.centred(new At(3.6, (TOP + foot) / 2), SIZE + 0.5, 90, axis("head ", curve.head(), first.head()));
    }

    private static List<Piece> axis(String words, String symbol, Cell cell) {
        List<Piece> pieces = new ArrayList<>(List.of(Piece.plain(words)));
        pieces.addAll(SymbolPrint.pieces(symbol));
        pieces.add(Piece.plain(" ["));
        pieces.addAll(UnitPrint.named(cell.unit().text()));
        pieces.add(Piece.plain("]"));
        return pieces;
    }

    private void ends() {
        Curve.Point first = curve.points().get(0);
        for (Curve.End end : curve.ends()) {
            Cell like = end.ofHead() ? first.head() : first.flow();
            List<Piece> pieces = new ArrayList<>(List.of(Piece.plain(end.words() + " ")));
            pieces.addAll(UnitPrint.after(
                    Digits.print(like.unit(), end.value()), like.unit().text()));
            if (end.ofHead()) {
                double y = up.place(end.value());
                sketch.stroke(Sketch.MEDIUM, Sketch.DASHED, new At(LEFT, y), new At(width - RIGHT, y));
                boolean low = y > (TOP + height - FOOT) / 2;
                double x = low ? width - RIGHT - 2 - Sketch.width(pieces, SIZE) : LEFT + 2;
                choose(pieces, List.of(new At(x, y - 1), new At(x, y + 3.4), new At(x + (low ? -45 : 45), y - 1)), 0);
            } else {
                double x = across.place(end.value());
                sketch.stroke(Sketch.MEDIUM, Sketch.DASHED, new At(x, TOP), new At(x, height - FOOT));
                boolean low = x < (LEFT + width - RIGHT) / 2;
                double y = low ? TOP + 12 + Sketch.width(pieces, SIZE) : height - FOOT - 8;
                choose(pieces, List.of(new At(x - 1, y), new At(x + 3.2, y), new At(x - 1, y + (low ? 30 : -30))), 90);
            }
        }
    }

    /** Sets a text at the best of the places within the frame; at the first place where none is. */
    private void choose(List<Piece> pieces, List<At> places, double turned) {
        List<Ink.Lettering> all = places.stream()
                .map(at -> new Ink.Lettering(at, SIZE, turned, pieces))
                .toList();
        List<Ink.Lettering> inside = all.stream().filter(this::isInside).toList();
        sketch.choose(inside.isEmpty() ? all : inside);
    }

    private boolean isInside(Ink.Lettering text) {
        return text.corners().stream()
                .allMatch(c -> c.x() >= LEFT && c.x() <= width - RIGHT && c.y() >= TOP && c.y() <= height - FOOT);
    }

    private void mark(Curve.Case one) {
        At at = at(one.flow(), one.head());
        sketch.circle(at, 1.0, true);
        List<Piece> pieces = new ArrayList<>(List.of(Piece.bold(one.name())));
        pieces.add(Piece.plain(": "));
        pieces.addAll(Printed.withUnit(results, one.flow()));
        pieces.add(Piece.plain(", "));
        pieces.addAll(Printed.withUnit(results, one.head()));
        double w = Sketch.width(pieces, SIZE);
        List<At> places = new ArrayList<>();
        for (int row = 0; row < 8; row++) {
            for (double right : new double[] {2.2, -2.2 - w, 6, -6 - w}) {
                places.add(new At(at.x() + right, at.y() + 3.6 + 3.8 * row));
                places.add(new At(at.x() + right, at.y() - 1.6 - 3.8 * row));
            }
        }
        choose(pieces, places, 0);
    }
}
