package nappe.deliver.pdf;

import com.lowagie.text.pdf.PdfDictionary;
import com.lowagie.text.pdf.PdfLiteral;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfString;
import com.lowagie.text.pdf.PdfWriter;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.time.format.DateTimeFormatter;
import java.util.HexFormat;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;
import nappe.results.Furniture;
import org.w3c.dom.Document;
import org.xhtmlrenderer.pdf.DefaultPDFCreationListener;
import org.xhtmlrenderer.pdf.ITextRenderer;

/** Lays out the filled template and writes the file, with nothing in it that depends on hour or machine. */
final class PdfWriting {
    private PdfWriting() {}

    static PdfDelivery write(String xhtml, Furniture furniture, Drawings drawings, Map<String, Picture> pictures) {
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
        renderer.setListener(new Stamp(xhtml, furniture));
        renderer.getSharedContext().setLineBreakingStrategy(new SpaceBreaks());
        Document document = Xhtml.parse(xhtml);
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

    /** Date, identity and language of the file, all from the input. */
    private static final class Stamp extends DefaultPDFCreationListener {
        private final String xhtml;
        private final Furniture furniture;

        Stamp(String xhtml, Furniture furniture) {
            this.xhtml = xhtml;
            this.furniture = furniture;
        }

        @Override
        public void preOpen(ITextRenderer renderer) {
            PdfWriter writer = java.util.Objects.requireNonNull(renderer.getWriter());
            writer.setViewerPreferences(PdfWriter.PageModeUseOutlines);
            writer.addViewerPreference(PdfName.DISPLAYDOCTITLE, com.lowagie.text.pdf.PdfBoolean.PDFTRUE);
            writer.getExtraCatalog().put(PdfName.LANG, new PdfString("en"));
            stamp(writer);
        }

        @Override
        public void onClose(ITextRenderer renderer) {
            stamp(java.util.Objects.requireNonNull(renderer.getWriter()));
        }

        private void stamp(PdfWriter writer) {
            PdfDictionary info = writer.getInfo();
            PdfString date =
                    new PdfString("D:" + furniture.date().format(DateTimeFormatter.BASIC_ISO_DATE) + "000000Z");
            info.put(PdfName.CREATIONDATE, date);
            info.put(PdfName.MODDATE, date);
            info.put(PdfName.PRODUCER, new PdfString("Nappe " + furniture.version(), PdfString.TEXT_UNICODE));
            info.put(PdfName.CREATOR, new PdfString("Nappe " + furniture.version(), PdfString.TEXT_UNICODE));
            String identity = digest();
            info.put(PdfName.FILEID, new PdfLiteral("[<" + identity + "><" + identity + ">]"));
        }

        /** The first 16 bytes of a hash of all that is printed. */
        private String digest() {
            try {
                byte[] hash = MessageDigest.getInstance("SHA-256")
                        .digest((xhtml + furniture).getBytes(StandardCharsets.UTF_8));
                return HexFormat.of().formatHex(hash, 0, 16);
            } catch (NoSuchAlgorithmException e) {
                throw new IllegalStateException(e);
            }
        }
    }
}
