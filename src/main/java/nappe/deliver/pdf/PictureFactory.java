package nappe.deliver.pdf;

import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.w3c.dom.Element;
import org.xhtmlrenderer.extend.ReplacedElement;
import org.xhtmlrenderer.extend.ReplacedElementFactory;
import org.xhtmlrenderer.extend.UserAgentCallback;
import org.xhtmlrenderer.layout.LayoutContext;
import org.xhtmlrenderer.render.BlockBox;
import org.xhtmlrenderer.simple.extend.FormSubmissionListener;

/** Draws an element with a picture's id as that picture, every other as text: no images, no form fields. */
final class PictureFactory implements ReplacedElementFactory {
    private final Map<String, Picture> pictures;
    private final double dotsPerPoint;

    /** @param pictures by the value of the attribute {@code picture} */
    PictureFactory(Map<String, Picture> pictures, double dotsPerPoint) {
        this.pictures = pictures;
        this.dotsPerPoint = dotsPerPoint;
    }

    @Override
    public @Nullable ReplacedElement createReplacedElement(
            LayoutContext context, BlockBox box, UserAgentCallback agent, int cssWidth, int cssHeight) {
        Element element = box.getElement();
        Picture picture = element == null ? null : pictures.get(element.getAttribute("picture"));
        return picture == null ? null : new PictureElement(picture, dotsPerPoint);
    }

    @Override
    public void reset() {}

    @Override
    public void remove(Element element) {}

    @Override
    public void setFormSubmissionListener(FormSubmissionListener listener) {}
}
