package nappe.deliver.pdf;

import com.lowagie.text.pdf.BaseFont;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedSet;
import java.util.TreeSet;
import org.xhtmlrenderer.extend.FontContext;
import org.xhtmlrenderer.extend.OutputDevice;
import org.xhtmlrenderer.pdf.ITextFSFont;
import org.xhtmlrenderer.pdf.ITextFSFontMetrics;
import org.xhtmlrenderer.pdf.ITextOutputDevice;
import org.xhtmlrenderer.pdf.ITextTextRenderer;
import org.xhtmlrenderer.render.FSFont;
import org.xhtmlrenderer.render.FSFontMetrics;
import org.xhtmlrenderer.render.JustificationInfo;

/**
 * Draws text character by character from the face that has it; the renderer by itself leaves out what a face lacks. A
 * character that no face has is drawn as a box and remembered.
 */
final class Glyphs extends ITextTextRenderer {
    private static final float ASCENT = 0.93f;
    private static final float DESCENT = 0.26f;

    private final FaceResolver faces;
    private final SortedSet<Integer> missing = new TreeSet<>();

    Glyphs(FaceResolver faces) {
        this.faces = faces;
    }

    /** The characters that were drawn as a box. */
    SortedSet<Integer> missing() {
        return missing;
    }

    @Override
    public int getWidth(FontContext context, FSFont font, String text) {
        int width = 0;
        for (Stretch stretch : stretches(text, face(font))) {
            width += super.getWidth(context, with(font, stretch.face()), stretch.text());
        }
        return width;
    }

    @Override
    public void drawString(OutputDevice device, String text, float x, float y) {
        drawString(device, text, x, y, null);
    }

    @Override
    public void drawString(
            OutputDevice device,
            String text,
            float x,
            float y,
            @org.jspecify.annotations.Nullable JustificationInfo info) {
        FSFont font = device instanceof Paper paper ? paper.font() : null;
        if (font == null) {
            throw new IllegalStateException("no font is set");
        }
        float at = x;
        for (Stretch stretch : stretches(text, face(font))) {
            FSFont its = with(font, stretch.face());
            ((ITextOutputDevice) device).setFont(its);
            ((ITextOutputDevice) device).drawString(stretch.text(), at, y, info);
            at += super.getWidth(NO_CONTEXT, its, stretch.text());
        }
        ((ITextOutputDevice) device).setFont(font);
    }

    private static final FontContext NO_CONTEXT = new FontContext() {};

    /**
     * Ascent and descent that hold capitals with accents and descenders. Together they must not be more than the line
     * height of the style sheet: the renderer draws a line that reaches over the edge of a page on both pages.
     */
    @Override
    public FSFontMetrics getFSFontMetrics(FontContext context, FSFont font, String text) {
        float size = font.getSize2D();
        return new ITextFSFontMetrics(ASCENT * size, DESCENT * size, -size / 4, size / 12, size / 10, size / 20);
    }

    private static BaseFont face(FSFont font) {
        return ((ITextFSFont) font).getFontDescription().getFont();
    }

    private FSFont with(FSFont font, BaseFont face) {
        return face(font) == face ? font : new ITextFSFont(faces.describe(face), font.getSize2D());
    }

    private record Stretch(String text, BaseFont face) {}

    private List<Stretch> stretches(String text, BaseFont asked) {
        List<Stretch> stretches = new ArrayList<>();
        StringBuilder same = new StringBuilder();
        BaseFont face = asked;
        for (int at = 0; at < text.length(); at += Character.charCount(text.codePointAt(at))) {
            int character = text.codePointAt(at);
            if (Typefaces.isMissing(character, asked)) {
                missing.add(character);
                character = Typefaces.BOX;
            }
            BaseFont its = Typefaces.faceFor(character, asked);
            if (its != face && !same.isEmpty()) {
                stretches.add(new Stretch(same.toString(), face));
                same.setLength(0);
            }
            face = its;
            same.appendCodePoint(character);
        }
        if (!same.isEmpty()) {
            stretches.add(new Stretch(same.toString(), face));
        }
        return stretches;
    }
}
