package nappe.deliver.pdf;

import com.lowagie.text.pdf.BaseFont;
import java.util.List;

/** What is drawn in a box of an equation; in points from the left end of its baseline, upward. */
sealed interface Mark {
    /** Nothing: a box that only holds others, or a gap. */
    record None() implements Mark {}

    /** Characters of one face; all of them are in it. */
    record Characters(String text, BaseFont face, double size) implements Mark {}

    /** An area filled: a rule, a radical, a bracket that has grown. */
    record Area(double x, double y, List<Curve> edge) implements Mark {
        public Area {
            edge = List.copyOf(edge);
        }

        static Area rule(double width, double height) {
            return new Area(
                    0, 0, List.of(Curve.straight(width, 0), Curve.straight(width, height), Curve.straight(0, height)));
        }
    }

    /** A cubic curve on from where the edge has come to. */
    record Curve(double x1, double y1, double x2, double y2, double x, double y) {
        static Curve straight(double x, double y) {
            return new Curve(x, y, x, y, x, y);
        }

        boolean isStraight() {
            return x1 == x && y1 == y && x2 == x && y2 == y;
        }
    }
}
