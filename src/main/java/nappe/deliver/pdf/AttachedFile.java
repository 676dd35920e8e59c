package nappe.deliver.pdf;

import com.lowagie.text.pdf.PdfArray;
import com.lowagie.text.pdf.PdfDictionary;
import com.lowagie.text.pdf.PdfFileSpecification;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfString;
import com.lowagie.text.pdf.PdfWriter;
import java.io.IOException;
import java.io.UncheckedIOException;

/** Puts the workbook into the PDF, as an associated file that readers list among the attachments. */
final class AttachedFile {
    private static final String KIND = "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet";
    private static final int SMALLEST = 9;

    private AttachedFile() {}

    /**
     * @param date of the revision, as the PDF writes dates
     */
    static void add(PdfWriter writer, Attachment attachment, PdfString date) {
        PdfDictionary params = new PdfDictionary();
        params.put(PdfName.MODDATE, date);
        try {
            PdfFileSpecification file = PdfFileSpecification.fileEmbedded(
                    writer, "", attachment.fileName(), attachment.bytes(), KIND, params, SMALLEST);
            file.setUnicodeFileName(attachment.fileName(), true);
            file.addDescription("The same calculation as a workbook with live formulas", true);
            file.put(new PdfName("AFRelationship"), new PdfName("Data"));
            writer.addFileAttachment(attachment.fileName(), file);
            writer.getExtraCatalog().put(new PdfName("AF"), new PdfArray(file.getReference()));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
