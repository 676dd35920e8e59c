package nappe.deliver.pdf;

import java.util.List;

/** A mark of a picture, in mm from its upper left corner. */
sealed interface Ink {
    record At(double x, double y) {}

    /**
     * A line through points.
     *
     * @param width in mm
     * @param dash lengths in mm, empty for a whole line
     * @param grey 0 for black, up to 1 for white
     */
    record Stroke(double width, List<Double> dash, double grey, boolean closed, List<At> points) implements Ink {}

    /** An area, filled with grey between 0 for black and 1 for white. */
    record Fill(double grey, List<At> points) implements Ink {}

    /**
     * A line of text.
     *
     * @param at where it starts, on the line of writing
     * @param size in points
     * @param turned degrees, counted against the clock
     */
    record Lettering(At at, double size, double turned, List<Piece> pieces) implements Ink {
        String characters() {
            StringBuilder all = new StringBuilder();
            pieces.forEach(piece -> all.append(piece.text()));
            return all.toString();
        }

        /** Its corners: along the foot, then back along the head. */
        List<At> corners() {
            return corners(0);
        }

        /** The same with room around it, in mm. */
        List<At> corners(double room) {
            double end = Sketch.width(pieces, size) + room;
            double up = size * Sketch.MM_PER_POINT * 0.75 + room / 2;
            double down = size * Sketch.MM_PER_POINT * 0.25 + room / 2;
            return List.of(corner(-room, down), corner(end, down), corner(end, -up), corner(-room, -up));
        }

        private At corner(double along, double down) {
            double angle = Math.toRadians(turned);
            return new At(
                    at.x() + along * Math.cos(angle) + down * Math.sin(angle),
                    at.y() - along * Math.sin(angle) + down * Math.cos(angle));
        }
    }
}
