package nappe.deliver.pdf;

import org.jspecify.annotations.Nullable;
import org.w3c.dom.Element;
import org.xhtmlrenderer.extend.ReplacedElement;
import org.xhtmlrenderer.extend.ReplacedElementFactory;
import org.xhtmlrenderer.extend.UserAgentCallback;
import org.xhtmlrenderer.layout.LayoutContext;
import org.xhtmlrenderer.render.BlockBox;
import org.xhtmlrenderer.simple.extend.FormSubmissionListener;

/** Draws every element as text: no images, no form fields. */
final class NothingReplaced implements ReplacedElementFactory {
    @Override
    public @Nullable ReplacedElement createReplacedElement(
            LayoutContext context, BlockBox box, UserAgentCallback agent, int cssWidth, int cssHeight) {
        return null;
    }

    @Override
    public void reset() {}

    @Override
    public void remove(Element element) {}

    @Override
    public void setFormSubmissionListener(FormSubmissionListener listener) {}
}
