package nappe.deliver.pdf;

import com.lowagie.text.pdf.PdfContentByte;
import java.util.Set;

/** Something drawn in the place of an element; free of the renderer's types. All lengths in points. */
interface Drawn {
    double width();

    /** From the baseline up to the upper edge. */
    double above();

    /** From the baseline down to the lower edge. */
    double below();

    /** Draws it, leaving the state of the page as it was; the left end of the baseline stands at x and y. */
    void paint(PdfContentByte page, double x, double y);

    /** The characters in it that no typeface has. */
    default Set<Integer> missing() {
        return Set.of();
    }
}
