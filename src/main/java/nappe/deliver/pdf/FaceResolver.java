package nappe.deliver.pdf;

import com.lowagie.text.pdf.BaseFont;
import java.util.HashMap;
import java.util.Map;
import org.xhtmlrenderer.css.constants.IdentValue;
import org.xhtmlrenderer.css.value.FontSpecification;
import org.xhtmlrenderer.layout.SharedContext;
import org.xhtmlrenderer.pdf.FontDescription;
import org.xhtmlrenderer.pdf.FontFamily;
import org.xhtmlrenderer.pdf.ITextFSFont;
import org.xhtmlrenderer.pdf.ITextFontResolver;
import org.xhtmlrenderer.render.FSFont;

/** Answers every request for a font with one of the bundled faces. */
final class FaceResolver extends ITextFontResolver {
    private final Map<BaseFont, FontDescription> descriptions = new HashMap<>();

    /** None: the fonts that every reader is said to have cannot be embedded. */
    @Override
    protected Map<String, FontFamily> loadFonts() {
        return new HashMap<>();
    }

    @Override
    public FSFont resolveFont(SharedContext context, FontSpecification wanted) {
        boolean bold = convertWeightToInt(wanted.fontWeight) >= 600;
        boolean italic = wanted.fontStyle == IdentValue.ITALIC || wanted.fontStyle == IdentValue.OBLIQUE;
        BaseFont face = bold ? Typefaces.BOLD : italic ? Typefaces.ITALIC : Typefaces.REGULAR;
        return new ITextFSFont(describe(face), wanted.size);
    }

    FontDescription describe(BaseFont face) {
        return descriptions.computeIfAbsent(
                face,
                f -> new FontDescription(
                        f,
                        f == Typefaces.ITALIC ? IdentValue.ITALIC : IdentValue.NORMAL,
                        f == Typefaces.BOLD ? 700 : 400));
    }
}
