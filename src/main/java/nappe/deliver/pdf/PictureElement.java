package nappe.deliver.pdf;

import com.lowagie.text.pdf.PdfContentByte;
import java.awt.Point;
import java.awt.Rectangle;
import java.awt.geom.Point2D;
import org.xhtmlrenderer.layout.LayoutContext;
import org.xhtmlrenderer.pdf.ITextOutputDevice;
import org.xhtmlrenderer.pdf.ITextReplacedElement;
import org.xhtmlrenderer.render.BlockBox;
import org.xhtmlrenderer.render.RenderingContext;

/** A picture in the place of an element of the page. */
final class PictureElement implements ITextReplacedElement {
    private final Picture picture;
    private final double dotsPerMm;
    private Point location = new Point(0, 0);

    PictureElement(Picture picture, double dotsPerPoint) {
        this.picture = picture;
        this.dotsPerMm = dotsPerPoint / Sketch.MM_PER_POINT;
    }

    @Override
    public void paint(RenderingContext context, ITextOutputDevice device, BlockBox box) {
        Rectangle place = box.getContentAreaEdge(box.getAbsX(), box.getAbsY(), context);
        Point2D corner = device.getTransform().transform(new Point2D.Double(place.x, place.y), null);
        PdfContentByte page = device.getCurrentPage();
        double height =
                java.util.Objects.requireNonNull(context.getPage()).getHeight(context) / device.getDotsPerPoint();
        new InkPress(page, corner.getX(), height - corner.getY()).print(picture);
    }

    @Override
    public int getIntrinsicWidth() {
        return (int) Math.round(picture.width() * dotsPerMm);
    }

    @Override
    public int getIntrinsicHeight() {
        return (int) Math.round(picture.height() * dotsPerMm);
    }

    @Override
    public Point getLocation() {
        return location;
    }

    @Override
    public void setLocation(int x, int y) {
        location = new Point(x, y);
    }

    @Override
    public void detach(LayoutContext context) {}

    @Override
    public boolean isRequiresInteractivePaint() {
        return false;
    }

    @Override
    public boolean hasBaseline() {
        return false;
    }

    @Override
    public int getBaseline() {
        return 0;
    }
}
