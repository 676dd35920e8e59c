package nappe.deliver.pdf;

import com.lowagie.text.Document;
import com.lowagie.text.Rectangle;
import com.lowagie.text.pdf.PdfContentByte;
import com.lowagie.text.pdf.PdfPageEventHelper;
import com.lowagie.text.pdf.PdfWriter;

/** Prints the label of each page above the right end of its head. */
final class PageLabel extends PdfPageEventHelper {
    private static final float SIZE = 8;
    private static final float ABOVE = 4;

    private final SheetPages pages;

    PageLabel(SheetPages pages) {
        this.pages = pages;
    }

    @Override
    public void onEndPage(PdfWriter writer, Document document) {
        Rectangle paper = writer.getPageSize();
        boolean wide = paper.getWidth() > paper.getHeight();
        PdfContentByte page = writer.getDirectContent();
        page.beginText();
        page.setFontAndSize(Typefaces.BOLD, SIZE);
        page.showTextAligned(
                PdfContentByte.ALIGN_RIGHT,
                pages.label(writer.getPageNumber()),
                paper.getRight() - PageSize.points(PageSize.SIDE),
                paper.getTop() - PageSize.points(PageSize.aboveHead(wide)) + ABOVE,
                0);
        page.endText();
    }
}
