package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
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
        return render(results, List.of());
    }

    /** The same, with the workbook of the package attached. */
    public static PdfDelivery render(Results results, Attachment workbook) {
        return render(results, List.of(workbook));
    }

    private static PdfDelivery render(Results results, List<Attachment> attachments) {
        PageSize page = PageSize.of(results.furniture().letterPaper());
        Furnishing furnishing = Furnishing.of(results.furniture(), page);
        String title = furnishing.number() + " " + furnishing.subject() + ", revision " + furnishing.revision();
        Drawings drawings = new Drawings();
        Pictures pictures = new Pictures(results);
        String xhtml = Xhtml.fill(Map.of(
                "title",
                title,
                "furnishing",
                furnishing,
                "pageRule",
                page.rules(furnishing.footHeight(page)),
                "leaves",
                new Leaves(results, page, drawings, pictures).leaves(),
                "index",
                Links.toIndex(results.sheets())));
        PdfDelivery written = PdfWriting.write(xhtml, results.furniture(), drawings, pictures.made(), attachments);
        List<String> warnings = new ArrayList<>(furnishing.warnings(results.furniture()));
        warnings.addAll(written.warnings());
        return new PdfDelivery(written.bytes(), List.copyOf(warnings));
    }
}
