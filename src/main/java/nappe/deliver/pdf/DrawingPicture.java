package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import nappe.deliver.pdf.Ink.At;
import nappe.results.Drawing;
import nappe.results.Drawing.Part;
import nappe.results.Drawing.Side;
import nappe.results.Results;

/** A device drawn to scale: its views below one another, all to one scale. */
final class DrawingPicture {
    private static final double TITLE = 7;
    private static final double GAP = 5;
    private static final double[] SCALES = {1, 1.25, 1.5, 2, 2.5, 3, 4, 5, 6, 7.5, 8};

    private final Drawing drawing;
    private final List<ViewSketch> views = new ArrayList<>();
    private final Sketch sketch;

    private DrawingPicture(Results results, Drawing drawing, double width) {
        this.sketch = new Sketch(width);
        this.drawing = drawing;
        for (Drawing.View view : drawing.views()) {
            views.add(new ViewSketch(results, view, sketch));
        }
    }

    /** @param height that it may take at most, in mm */
    static Picture of(Results results, Drawing drawing, double width, double height) {
        return new DrawingPicture(results, drawing, width).make(width, height);
    }

    private Picture make(double width, double height) {
        Map<Side, Double> margins = new EnumMap<>(Side.class);
        for (Side side : Side.values()) {
            margins.put(
                    side,
                    views.stream().mapToDouble(view -> view.margin(side)).max().orElse(0));
        }
        double left = margins.getOrDefault(Side.LEFT, 0.0);
        double across = width - left - margins.getOrDefault(Side.RIGHT, 0.0);
        double fixed = views.stream().mapToDouble(ViewSketch::above).sum()
                + views.stream().mapToDouble(ViewSketch::below).sum()
                + views.size() * TITLE
                + (views.size() - 1) * GAP;
        double widest = views.stream().mapToDouble(ViewSketch::width).max().orElse(1);
        double tallest = views.stream().mapToDouble(ViewSketch::height).sum();
        double largest = Math.min(across / widest, (height - fixed) / tallest);
        double mmPerUnit = drawing.unit().sizeInSi() * 1000;
        double denominator = scale(mmPerUnit / largest);
        double perUnit = mmPerUnit / denominator;
        double y = 0;
        for (ViewSketch view : views) {
            String why = drawing.schematic().isEmpty() ? view.schematic() : drawing.schematic();
            String scale = why.isEmpty() ? "scale 1:" + number(denominator) : "not to scale: " + why;
            sketch.text(new At(0, y + 4), 9, List.of(Piece.bold(view.title()), Piece.plain(", " + scale)));
            y += TITLE + view.above();
            double indent = left + (across - view.width() * perUnit) / 2;
            view.draw(indent, y + view.height() * perUnit, perUnit);
            y += view.height() * perUnit + view.below() + GAP;
        }
        return sketch.finish(y - GAP, drawing.title());
    }

    /** The next usual scale: 1:20, 1:25, 1:30... */
    static double scale(double least) {
        double power = Math.pow(10, Math.floor(Math.log10(least)));
        for (double step : SCALES) {
            if (step * power >= least * (1 - 1e-9)) {
                return step * power;
            }
        }
        return 10 * power;
    }

    private static String number(double denominator) {
        return nappe.results.Digits.asTyped(Math.round(denominator * 1e6) / 1e6);
    }

    /** All parts of one kind. */
    static <P extends Part> List<P> parts(Drawing.View view, Class<P> kind) {
        return view.parts().stream().filter(kind::isInstance).map(kind::cast).toList();
    }
}
