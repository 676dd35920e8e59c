package nappe.deliver.pdf;

import com.lowagie.text.pdf.PdfWriter;
import java.io.ByteArrayOutputStream;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;
import nappe.results.Furniture;
import org.w3c.dom.Document;
import org.xhtmlrenderer.pdf.ITextRenderer;

/** Lays out the filled template and writes the file, with nothing in it that depends on hour or machine. */
final class PdfWriting {
    private PdfWriting() {}

    static PdfDelivery write(
            String xhtml,
            Furniture furniture,
            Drawings drawings,
            Map<String, Picture> pictures,
            List<Attachment> attachments) {
        float dots = ITextRenderer.DEFAULT_DOTS_PER_POINT;
        FaceResolver faces = new FaceResolver();
        Glyphs glyphs = new Glyphs(faces);
        Paper paper = new Paper(dots);
        ITextRenderer renderer = new ITextRenderer(
                dots,
                ITextRenderer.DEFAULT_DOTS_PER_PIXEL,
                paper,
                new ClosedAgent(paper),
                faces,
                new DrawnElements(drawings, dots, new PictureFactory(pictures, dots)),
                glyphs);
        renderer.setPDFVersion(PdfWriter.VERSION_1_7);
        renderer.getSharedContext().setLineBreakingStrategy(new SpaceBreaks());
        Document document = Xhtml.parse(xhtml);
        renderer.setListener(new Stamp(xhtml, furniture, attachments, Outline.of(document)));
        do {
            renderer.setDocument(document, null, new PlainNames());
            renderer.layout();
        } while (LonelyHeads.moved(renderer));
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        renderer.createPDF(bytes);
        SortedSet<Integer> missing = new TreeSet<>(glyphs.missing());
        missing.addAll(drawings.missing());
        return new PdfDelivery(bytes.toByteArray(), warnings(missing));
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
