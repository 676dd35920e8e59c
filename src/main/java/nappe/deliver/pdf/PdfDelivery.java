package nappe.deliver.pdf;

import java.util.List;
import nappe.results.Results;

/**
 * The PDF of a package.
 *
 * @param bytes the file; the same for the same results, on any machine with the same libraries
 * @param warnings what a reader of the PDF would miss, one line each
 */
public record PdfDelivery(byte[] bytes, List<String> warnings) {
    /** Prints the results: every sheet on pages of its own, no number that is not in the results. */
    public static PdfDelivery render(Results results) {
        return FilledPages.of(results).laidOut(List.of()).painted();
    }

    /** The same, with the workbook of the package attached. */
    public static PdfDelivery render(Results results, Attachment workbook) {
        return FilledPages.of(results).laidOut(List.of(workbook)).painted();
    }
}
