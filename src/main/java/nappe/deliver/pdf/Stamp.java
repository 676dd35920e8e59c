package nappe.deliver.pdf;

import com.lowagie.text.pdf.PdfBoolean;
import com.lowagie.text.pdf.PdfDictionary;
import com.lowagie.text.pdf.PdfLiteral;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfString;
import com.lowagie.text.pdf.PdfWriter;
import java.awt.color.ColorSpace;
import java.awt.color.ICC_Profile;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.time.format.DateTimeFormatter;
import java.util.HexFormat;
import java.util.List;
import java.util.Objects;
import nappe.results.Furniture;
import org.xhtmlrenderer.pdf.DefaultPDFCreationListener;
import org.xhtmlrenderer.pdf.ITextRenderer;

/** What the file is beside its pages: an archive file with date, identity, language, attachment; all from the input. */
final class Stamp extends DefaultPDFCreationListener {
    private final String xhtml;
    private final Furniture furniture;
    private final List<Attachment> attachments;
    private final Outline outline;

    Stamp(String xhtml, Furniture furniture, List<Attachment> attachments, Outline outline) {
        this.xhtml = xhtml;
        this.furniture = furniture;
        this.attachments = attachments;
        this.outline = outline;
    }

    @Override
    public void preOpen(ITextRenderer renderer) {
        PdfWriter writer = Objects.requireNonNull(renderer.getWriter());
        writer.setViewerPreferences(PdfWriter.PageModeUseOutlines);
        writer.addViewerPreference(PdfName.DISPLAYDOCTITLE, PdfBoolean.PDFTRUE);
        writer.getExtraCatalog().put(PdfName.LANG, new PdfString("en"));
        stamp(writer);
    }

    @Override
    public void preWrite(ITextRenderer renderer, int pageCount) {
        PdfWriter writer = Objects.requireNonNull(renderer.getWriter());
        SheetPages pages = SheetPages.of(renderer);
        writer.setPageLabels(pages.labels());
        writer.setPageEvent(new PageLabel(pages));
        SignatureField.add(renderer, writer);
        outline.write(renderer, writer);
    }

    @Override
    public void onClose(ITextRenderer renderer) {
        PdfWriter writer = Objects.requireNonNull(renderer.getWriter());
        stamp(writer);
        String identity = digest();
        writer.getInfo().put(PdfName.FILEID, new PdfLiteral("[<" + identity + "><" + identity + ">]"));
        attachments.forEach(attachment -> AttachedFile.add(writer, attachment, date()));
        writer.setXmpMetadata(Identification.xmp(writer.getInfo(), furniture.date() + "T00:00:00Z"));
        try {
            // "PDFA/1" makes the library name the intent as PDF/A of every part wants it.
            writer.setOutputIntents(
                    "sRGB IEC61966-2.1",
                    "PDFA/1",
                    "http://www.color.org",
                    "sRGB IEC61966-2.1",
                    ICC_Profile.getInstance(ColorSpace.CS_sRGB));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private PdfString date() {
        return new PdfString("D:" + furniture.date().format(DateTimeFormatter.BASIC_ISO_DATE) + "000000Z");
    }

    private void stamp(PdfWriter writer) {
        PdfDictionary info = writer.getInfo();
        info.put(PdfName.CREATIONDATE, date());
        info.put(PdfName.MODDATE, date());
        info.put(PdfName.PRODUCER, new PdfString("Nappe " + furniture.version(), PdfString.TEXT_UNICODE));
        info.put(PdfName.CREATOR, new PdfString("Nappe " + furniture.version(), PdfString.TEXT_UNICODE));
    }

    /** The first 16 bytes of a hash of all that is printed or attached. */
    private String digest() {
        try {
            MessageDigest hash = MessageDigest.getInstance("SHA-256");
            hash.update((xhtml + furniture).getBytes(StandardCharsets.UTF_8));
            attachments.forEach(attachment -> hash.update(attachment.bytes()));
            return HexFormat.of().formatHex(hash.digest(), 0, 16);
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
    }
}
