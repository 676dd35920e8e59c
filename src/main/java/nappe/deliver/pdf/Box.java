package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * A rectangle of an equation, with what is drawn in it and the boxes in it; in points.
 *
 * @param above from the baseline up to its upper edge
 * @param below from the baseline down to its lower edge; negative where the edge is above the baseline
 */
record Box(double width, double above, double below, Mark ink, List<Part> parts) {
    private static final Mark NONE = new Mark.None();

    /** A box in another; the left end of its baseline stands at x and y of the other's, upward. */
    record Part(Box box, double x, double y) {
        double right() {
            return x + box.width();
        }

        double top() {
            return y + box.above();
        }

        double bottom() {
            return y - box.below();
        }
    }

    Box {
        parts = List.copyOf(parts);
    }

    /** A box with something drawn in it. */
    static Box of(double width, double above, double below, Mark ink) {
        return new Box(width, above, below, ink, List.of());
    }

    /** The smallest box from x = 0 that holds all the parts, and the width. */
    static Box holding(double width, List<Part> parts) {
        double above = parts.stream().mapToDouble(Part::top).max().orElse(0);
        double below = -parts.stream().mapToDouble(Part::bottom).min().orElse(0);
        double right = parts.stream().mapToDouble(Part::right).max().orElse(0);
        return new Box(Math.max(width, right), above, below, NONE, parts);
    }

    /** Nothing, at this size. */
    static Box empty(double width, double above, double below) {
        return of(width, above, below, NONE);
    }

    /** Boxes side by side on one baseline. */
    static Box row(List<Box> boxes) {
        if (boxes.size() == 1) {
            return boxes.get(0);
        }
        List<Part> parts = new ArrayList<>();
        double x = 0;
        for (Box box : boxes) {
            parts.add(new Part(box, x, 0));
            x += box.width();
        }
        return holding(x, parts);
    }

    /** Boxes below one another, flush left; the baseline is that of the first. */
    static Box column(List<Box> boxes, double leading, double gap) {
        return column(boxes, Collections.nCopies(boxes.size(), 0.0), leading, gap);
    }

    /**
     * Boxes below one another; the baseline is that of the first.
     *
     * @param indents how far each is moved to the right
     * @param leading least distance of baselines
     * @param gap least distance of edges
     */
    static Box column(List<Box> boxes, List<Double> indents, double leading, double gap) {
        List<Part> parts = new ArrayList<>();
        double y = 0;
        for (int i = 0; i < boxes.size(); i++) {
            if (i > 0) {
                y -= Math.max(
                        leading, boxes.get(i - 1).below() + gap + boxes.get(i).above());
            }
            parts.add(new Part(boxes.get(i), indents.get(i), y));
        }
        return holding(0, parts);
    }

    double height() {
        return above + below;
    }
}
