package nappe.deliver.pdf;

import com.lowagie.text.pdf.BaseFont;
import com.lowagie.text.pdf.PdfContentByte;
import java.util.List;

/** Prints the marks of a picture on a page. */
final class InkPress {
    private static final double POINTS = 72 / 25.4;

    private final PdfContentByte page;
    private final double left;
    private final double top;

    /**
     * @param left of the picture on the page, in points
     * @param top of the picture above the foot of the page, in points
     */
    InkPress(PdfContentByte page, double left, double top) {
        this.page = page;
        this.left = left;
        this.top = top;
    }

    void print(Picture picture) {
        page.saveState();
        page.setLineCap(PdfContentByte.LINE_CAP_BUTT);
        page.setLineJoin(PdfContentByte.LINE_JOIN_ROUND);
        picture.inks().forEach(this::print);
        page.restoreState();
    }

    private void print(Ink ink) {
        if (ink instanceof Ink.Stroke stroke) {
            page.setLineWidth(points(stroke.width()));
            page.setGrayStroke((float) stroke.grey());
            dash(stroke.dash());
            path(stroke.points());
            if (stroke.closed()) {
                page.closePathStroke();
            } else {
                page.stroke();
            }
        } else if (ink instanceof Ink.Fill fill) {
            page.setGrayFill((float) fill.grey());
            path(fill.points());
            page.fill();
        } else if (ink instanceof Ink.Lettering text) {
            letters(text);
        }
    }

    private void dash(List<Double> dash) {
        float[] lengths = new float[dash.size()];
        for (int i = 0; i < lengths.length; i++) {
            lengths[i] = points(dash.get(i));
        }
        page.setLineDash(lengths, 0);
    }

    private void path(List<Ink.At> points) {
        for (int i = 0; i < points.size(); i++) {
            float x = x(points.get(i).x());
            float y = y(points.get(i).y());
            if (i == 0) {
                page.moveTo(x, y);
            } else {
                page.lineTo(x, y);
            }
        }
    }

    private void letters(Ink.Lettering text) {
        double angle = Math.toRadians(text.turned());
        float cos = (float) Math.cos(angle);
        float sin = (float) Math.sin(angle);
        page.setGrayFill(0);
        page.beginText();
        double along = 0;
        for (Piece piece : text.pieces()) {
            double size = text.size() * Sketch.scale(piece);
            double rise = rise(piece) * text.size() / POINTS;
            double width = Sketch.width(List.of(piece), text.size());
            page.setTextMatrix(
                    cos,
                    sin,
                    -sin,
                    cos,
                    x(text.at().x() + along * cos - rise * sin),
                    y(text.at().y() - along * sin - rise * cos));
            show(piece, size);
            along += width;
        }
        page.endText();
    }

    /** Shows a piece in stretches of one face. */
    private void show(Piece piece, double size) {
        BaseFont asked = face(piece);
        StringBuilder stretch = new StringBuilder();
        BaseFont face = asked;
        for (int at = 0;
                at < piece.text().length();
                at += Character.charCount(piece.text().codePointAt(at))) {
            int character = piece.text().codePointAt(at);
            int shown = Typefaces.isMissing(character, asked) ? Typefaces.BOX : character;
            BaseFont own = Typefaces.faceFor(shown, asked);
            if (own != face && !stretch.isEmpty()) {
                show(face, size, stretch);
            }
            face = own;
            stretch.appendCodePoint(shown);
        }
        show(face, size, stretch);
    }

    private void show(BaseFont face, double size, StringBuilder stretch) {
        if (!stretch.isEmpty()) {
            page.setFontAndSize(face, (float) size);
            page.showText(stretch.toString());
            stretch.setLength(0);
        }
    }

    static BaseFont face(Piece piece) {
        return switch (piece.face()) {
            case PLAIN -> Typefaces.REGULAR;
            case ITALIC -> Typefaces.ITALIC;
            case BOLD -> Typefaces.BOLD;
        };
    }

    /** How far a piece stands above the line, in parts of its size. */
    private static double rise(Piece piece) {
        return switch (piece.shift()) {
            case NONE -> 0;
            case LOWERED -> -0.18;
            case RAISED, LOWERED_IN_RAISED, RAISED_TWICE -> 0.35;
        };
    }

    private static float points(double mm) {
        return (float) (mm * POINTS);
    }

    private float x(double mm) {
        return (float) (left + mm * POINTS);
    }

    private float y(double mm) {
        return (float) (top - mm * POINTS);
    }
}
