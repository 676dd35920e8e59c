package nappe.deliver.pdf;

import com.lowagie.text.pdf.PdfWriter;
import java.io.ByteArrayOutputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;
import org.w3c.dom.Document;
import org.xhtmlrenderer.pdf.ITextRenderer;

/** The pages with everything in its place, ready to be painted into a file in which nothing depends on hour or machine. */
final class LaidOutPages {
    private final FilledPages filled;
    private final ITextRenderer renderer;
    private final Glyphs glyphs;

    private LaidOutPages(FilledPages filled, ITextRenderer renderer, Glyphs glyphs) {
        this.filled = filled;
        this.renderer = renderer;
        this.glyphs = glyphs;
    }

    static LaidOutPages of(FilledPages filled, List<Attachment> attachments) {
        float dots = ITextRenderer.DEFAULT_DOTS_PER_POINT;
        FaceResolver faces = new FaceResolver();
        Glyphs glyphs = new Glyphs(faces);
        Paper paper = new Paper(dots);
        ClosedAgent agent = new ClosedAgent(paper);
        ITextRenderer renderer = new ITextRenderer(
                dots,
                ITextRenderer.DEFAULT_DOTS_PER_PIXEL,
                paper,
                agent,
                faces,
                new DrawnElements(filled.drawings(), dots, new PictureFactory(filled.pictures(), dots)),
                glyphs);
        renderer.setPDFVersion(PdfWriter.VERSION_1_7);
        renderer.getSharedContext().setLineBreakingStrategy(new SpaceBreaks());
        PlainNames names = new PlainNames();
        renderer.getSharedContext().setCss(new StyleMemory(agent, names));
        Document document = Xhtml.parse(filled.xhtml());
        renderer.setListener(new Stamp(filled.xhtml(), filled.furniture(), attachments, Outline.of(document)));
        renderer.setDocument(document, null, names);
        do {
            renderer.layout();
        } while (LonelyHeads.moved(renderer));
        return new LaidOutPages(filled, renderer, glyphs);
    }

    /** The file; waits for what is attached once all pages are painted. */
    PdfDelivery painted() {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        renderer.createPDF(bytes);
        SortedSet<Integer> missing = new TreeSet<>(glyphs.missing());
        missing.addAll(filled.drawings().missing());
        List<String> warnings = new ArrayList<>(filled.warnings());
        warnings.addAll(warnings(missing));
        return new PdfDelivery(bytes.toByteArray(), List.copyOf(warnings));
    }

    private static List<String> warnings(Set<Integer> missing) {
        return missing.stream()
                .map(character -> character == 0xFFFD
                        ? "a control character or half a character in the input; the PDF shows a box"
                        : String.format(
                                Locale.ROOT,
                                "character U+%04X is in none of the typefaces; the PDF shows a box",
                                character))
                .toList();
    }
}
