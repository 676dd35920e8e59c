package nappe.deliver.pdf;

import java.awt.Point;
import org.jspecify.annotations.Nullable;
import org.w3c.dom.Element;
import org.xhtmlrenderer.extend.ReplacedElement;
import org.xhtmlrenderer.extend.ReplacedElementFactory;
import org.xhtmlrenderer.extend.UserAgentCallback;
import org.xhtmlrenderer.layout.LayoutContext;
import org.xhtmlrenderer.pdf.ITextOutputDevice;
import org.xhtmlrenderer.pdf.ITextReplacedElement;
import org.xhtmlrenderer.render.BlockBox;
import org.xhtmlrenderer.render.RenderingContext;
import org.xhtmlrenderer.simple.extend.FormSubmissionListener;

/** Draws our own drawings where an element names one; every other element is left to another factory. */
final class DrawnElements implements ReplacedElementFactory {
    private final Drawings drawings;
    private final float dotsPerPoint;
    private final ReplacedElementFactory others;

    DrawnElements(Drawings drawings, float dotsPerPoint, ReplacedElementFactory others) {
        this.drawings = drawings;
        this.dotsPerPoint = dotsPerPoint;
        this.others = others;
    }

    @Override
    public @Nullable ReplacedElement createReplacedElement(
            LayoutContext context, BlockBox box, UserAgentCallback agent, int cssWidth, int cssHeight) {
        Element element = box.getElement();
        return element != null && element.hasAttribute(Drawings.ATTRIBUTE)
                ? new Place(drawings.named(element.getAttribute(Drawings.ATTRIBUTE)), dotsPerPoint)
                : others.createReplacedElement(context, box, agent, cssWidth, cssHeight);
    }

    @Override
    public void reset() {}

    @Override
    public void remove(Element element) {}

    @Override
    public void setFormSubmissionListener(FormSubmissionListener listener) {}

    /** The place of one drawing in the page. */
    private static final class Place implements ITextReplacedElement {
        private final Drawn drawn;
        private final float dots;
        private Point location = new Point();

        Place(Drawn drawn, float dots) {
            this.drawn = drawn;
            this.dots = dots;
        }

        @Override
        public int getIntrinsicWidth() {
            return (int) Math.ceil(drawn.width() * dots);
        }

        @Override
        public int getIntrinsicHeight() {
            return getBaseline() + (int) Math.ceil(drawn.below() * dots);
        }

        @Override
        public boolean hasBaseline() {
            return true;
        }

        @Override
        public int getBaseline() {
            return (int) Math.ceil(drawn.above() * dots);
        }

        @Override
        public void paint(RenderingContext context, ITextOutputDevice device, BlockBox box) {
            com.lowagie.text.Rectangle area = device.createLocalTargetArea(context, box);
            double top = area.getBottom() + getIntrinsicHeight() / dots;
            drawn.paint(device.getCurrentPage(), area.getLeft(), top - getBaseline() / dots);
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
    }
}
