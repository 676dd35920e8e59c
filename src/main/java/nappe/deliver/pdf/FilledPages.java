package nappe.deliver.pdf;

import java.util.List;
import java.util.Map;
import nappe.results.Furniture;
import nappe.results.Results;

/**
 * The template filled in with the results, before anything is laid out.
 *
 * @param warnings what had to be cut on the way, one line each
 */
record FilledPages(
        String xhtml, Furniture furniture, Drawings drawings, Map<String, Picture> pictures, List<String> warnings) {

    static FilledPages of(Results results) {
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
        return new FilledPages(
                xhtml, results.furniture(), drawings, pictures.made(), furnishing.warnings(results.furniture()));
    }

    LaidOutPages laidOut(List<Attachment> attachments) {
        return LaidOutPages.of(this, attachments);
    }
}
