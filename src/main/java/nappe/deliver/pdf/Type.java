package nappe.deliver.pdf;

import com.lowagie.text.pdf.BaseFont;
import java.util.ArrayList;
import java.util.List;

/**
 * The type of a part of an equation.
 *
 * @param size in points
 * @param level how deep in fractions it stands; from {@link #SLASHES} on a fraction has a slash
 */
record Type(double size, int level) {
    /** The level from which a fraction is set with a slash: in scripts, and in fractions within fractions. */
    static final int SLASHES = 2;

    private static final double SCRIPT = 0.72;
    private static final double INNER_FRACTION = 0.88;

    /** Width of the spaces of mathematics, as parts of the size. */
    static final double THIN = 0.17;

    static final double MEDIUM = 0.22;
    static final double THICK = 0.28;

    static Type of(double size) {
        return new Type(size, 0);
    }

    /** That of exponents and subscripts. */
    Type script() {
        return new Type(size * SCRIPT, SLASHES);
    }

    /** That of what stands above and below a bar. */
    Type inFraction() {
        return new Type(level == 0 ? size : size * INNER_FRACTION, level + 1);
    }

    boolean hasSlashes() {
        return level >= SLASHES;
    }

    /** All fractions with a slash. */
    Type inLine() {
        return new Type(size, SLASHES);
    }

    /** The height above the baseline on which signs and bars stand. */
    double axis() {
        int[] minus = Typefaces.REGULAR.getCharBBox('−');
        return (minus[1] + minus[3]) / 2000.0 * size;
    }

    /** The thickness of bars. */
    double rule() {
        return 0.052 * size;
    }

    Box upright(String text) {
        return set(text, Typefaces.REGULAR);
    }

    Box italic(String text) {
        return set(text, Typefaces.ITALIC);
    }

    Box gap(double part) {
        return Box.empty(part * size, 0, 0);
    }

    /** Pieces as they stand in a text, with what is lowered or raised in them. */
    Box pieces(List<Piece> pieces) {
        List<Box.Part> parts = new ArrayList<>();
        double x = 0;
        for (Piece piece : pieces) {
            boolean moved = piece.shift() != Piece.Shift.NONE;
            boolean lower = piece.shift() == Piece.Shift.LOWERED;
            Type type = moved ? script() : this;
            Box box = piece.face() == Piece.Face.ITALIC ? type.italic(piece.text()) : type.upright(piece.text());
            parts.add(new Box.Part(box, x, !moved ? 0 : lower ? -0.2 * size : 0.36 * size));
            x += box.width();
        }
        return parts.size() == 1 ? parts.get(0).box() : Box.holding(x, parts);
    }

    /** Characters, each from the face that has it; the height is that of the ink, but at least that of a small letter. */
    private Box set(String text, BaseFont asked) {
        List<Box> boxes = new ArrayList<>();
        StringBuilder same = new StringBuilder();
        BaseFont face = asked;
        for (int at = 0; at < text.length(); at += Character.charCount(text.codePointAt(at))) {
            int character = text.codePointAt(at);
            int shown = Typefaces.isMissing(character, asked) ? Typefaces.BOX : character;
            BaseFont its = Typefaces.faceFor(shown, asked);
            if (its != face && !same.isEmpty()) {
                boxes.add(stretch(same.toString(), face));
                same.setLength(0);
            }
            face = its;
            same.appendCodePoint(shown);
        }
        boxes.add(stretch(same.toString(), face));
        return Box.row(boxes);
    }

    private Box stretch(String text, BaseFont face) {
        double top = 0.486;
        double bottom = 0;
        for (int at = 0; at < text.length(); at += Character.charCount(text.codePointAt(at))) {
            int[] ink = face.getCharBBox(text.codePointAt(at));
            if (ink != null) {
                top = Math.max(top, ink[3] / 1000.0);
                bottom = Math.min(bottom, ink[1] / 1000.0);
            }
        }
        return Box.of(
                face.getWidthPoint(text, (float) size),
                top * size,
                -bottom * size,
                new Mark.Characters(text, face, size));
    }
}
