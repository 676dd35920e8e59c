package nappe.deliver.pdf;

import com.lowagie.text.pdf.PdfContentByte;
import java.util.ArrayList;
import java.util.List;

/** Draws boxes: first all areas, then all characters as text. */
final class BoxPainting {
    private final PdfContentByte page;
    private final List<Spot> characters = new ArrayList<>();

    private record Spot(Mark.Characters characters, double x, double y) {}

    private BoxPainting(PdfContentByte page) {
        this.page = page;
    }

    /** Draws a box with the left end of its baseline at x and y. */
    static void paint(PdfContentByte page, Box box, double x, double y) {
        BoxPainting painting = new BoxPainting(page);
        painting.areas(box, x, y);
        painting.text();
    }

    private void areas(Box box, double x, double y) {
        if (box.ink() instanceof Mark.Area area) {
            fill(area, x, y);
        } else if (box.ink() instanceof Mark.Characters text && !text.text().isBlank()) {
            characters.add(new Spot(text, x, y));
        }
        box.parts().forEach(part -> areas(part.box(), x + part.x(), y + part.y()));
    }

    private void fill(Mark.Area area, double x, double y) {
        page.moveTo((float) (x + area.x()), (float) (y + area.y()));
        for (Mark.Curve curve : area.edge()) {
            float toX = (float) (x + curve.x());
            float toY = (float) (y + curve.y());
            if (curve.isStraight()) {
                page.lineTo(toX, toY);
            } else {
                page.curveTo(
                        (float) (x + curve.x1()),
                        (float) (y + curve.y1()),
                        (float) (x + curve.x2()),
                        (float) (y + curve.y2()),
                        toX,
                        toY);
            }
        }
        page.closePath();
        page.fill();
    }

    private void text() {
        if (characters.isEmpty()) {
            return;
        }
        page.beginText();
        for (Spot spot : characters) {
            page.setFontAndSize(
                    spot.characters().face(), (float) spot.characters().size());
            page.setTextMatrix((float) spot.x(), (float) spot.y());
            page.showText(spot.characters().text());
        }
        page.endText();
    }
}
