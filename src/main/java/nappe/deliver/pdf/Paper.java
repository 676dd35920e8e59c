package nappe.deliver.pdf;

import org.jspecify.annotations.Nullable;
import org.xhtmlrenderer.pdf.ITextOutputDevice;
import org.xhtmlrenderer.render.FSFont;

/** The renderer's drawing surface, which also tells what font is set. */
final class Paper extends ITextOutputDevice {
    private @Nullable FSFont font;

    Paper(float dotsPerPoint) {
        super(dotsPerPoint);
    }

    @Override
    public void setFont(FSFont font) {
        this.font = font;
        super.setFont(font);
    }

    @Nullable
    FSFont font() {
        return font;
    }
}
