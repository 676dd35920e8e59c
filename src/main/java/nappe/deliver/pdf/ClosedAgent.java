package nappe.deliver.pdf;

import java.io.InputStream;
import org.jspecify.annotations.Nullable;
import org.xhtmlrenderer.pdf.ITextOutputDevice;
import org.xhtmlrenderer.pdf.ITextRenderer;
import org.xhtmlrenderer.pdf.ITextUserAgent;
import org.xhtmlrenderer.resource.ImageResource;

/** Serves the package's own style sheet from the class path; opens nothing else, on disk or in the net. */
final class ClosedAgent extends ITextUserAgent {
    static final String STYLE_SHEET = "res:package.css";

    ClosedAgent(ITextOutputDevice device) {
        super(device, ITextRenderer.DEFAULT_DOTS_PER_PIXEL);
    }

    @Override
    public @Nullable String resolveURI(@Nullable String uri) {
        return uri;
    }

    @Override
    protected @Nullable InputStream resolveAndOpenStream(@Nullable String uri) {
        return STYLE_SHEET.equals(uri) ? ClosedAgent.class.getResourceAsStream("/templates/package.css") : null;
    }

    @Override
    public ImageResource getImageResource(String uri) {
        return new ImageResource(uri, null);
    }
}
