package nappe.deliver.pdf;

import com.lowagie.text.Rectangle;
import com.lowagie.text.pdf.PdfAnnotation;
import com.lowagie.text.pdf.PdfFormField;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfTemplate;
import com.lowagie.text.pdf.PdfWriter;
import java.util.regex.Pattern;
import org.xhtmlrenderer.pdf.ITextRenderer;
import org.xhtmlrenderer.pdf.PagePosition;

/** The field over the seal space in which the engineer may sign. It is left unsigned and nothing is drawn in it. */
final class SignatureField {
    private static final Pattern SEAL = Pattern.compile("^seal$");

    private SignatureField() {}

    /** Lays the field over the seal space, if there is one; before its page is written. */
    static void add(ITextRenderer renderer, PdfWriter writer) {
        for (PagePosition seal : renderer.findPagePositionsByID(SEAL)) {
            PdfFormField field = PdfFormField.createSignature(writer);
            field.setWidget(
                    new Rectangle(
                            seal.getX(), seal.getY(), seal.getX() + seal.getWidth(), seal.getY() + seal.getHeight()),
                    PdfAnnotation.HIGHLIGHT_OUTLINE);
            field.setFieldName("engineer");
            field.setUserName("Seal and digital signature of the engineer in responsible charge");
            field.setFlags(PdfAnnotation.FLAGS_PRINT);
            field.setPage(seal.getPageNo() + 1);
            field.setPlaceInPage(seal.getPageNo() + 1);
            // PDF/A wants every field to have an appearance: this one is empty.
            PdfTemplate empty = PdfTemplate.createTemplate(writer, seal.getWidth(), seal.getHeight());
            field.setAppearance(PdfName.N, empty);
            writer.addAnnotation(field);
        }
    }
}
