package nappe.deliver.pdf;

import com.lowagie.text.pdf.PdfPageLabels;
import java.util.Map;
import java.util.Objects;
import java.util.TreeMap;
import java.util.regex.Pattern;
import org.xhtmlrenderer.pdf.ITextRenderer;
import org.xhtmlrenderer.pdf.PagePosition;

/** The label of each page: number of the sheet and page within the sheet, {@code 8-2}. */
final class SheetPages {
    private static final Pattern SHEETS = Pattern.compile("^" + Links.id(0).replace("0", "\\d+") + "$");

    private final TreeMap<Integer, Integer> firsts = new TreeMap<>();

    private SheetPages() {}

    /** The pages of what was laid out. */
    static SheetPages of(ITextRenderer renderer) {
        SheetPages pages = new SheetPages();
        for (PagePosition title : renderer.findPagePositionsByID(SHEETS)) {
            int sheet = Integer.parseInt(title.getId().substring(Links.id(0).length() - 1));
            pages.firsts.put(title.getPageNo() + 1, sheet);
        }
        return pages;
    }

    /**
     * The label of a page.
     *
     * @param page from 1
     */
    String label(int page) {
        Map.Entry<Integer, Integer> first = Objects.requireNonNull(firsts.floorEntry(page));
        return first.getValue() + "-" + (page - first.getKey() + 1);
    }

    /** All labels, for the reader's page box. */
    PdfPageLabels labels() {
        PdfPageLabels labels = new PdfPageLabels();
        firsts.forEach(
                (page, sheet) -> labels.addPageLabel(page, PdfPageLabels.DECIMAL_ARABIC_NUMERALS, sheet + "-", 1));
        return labels;
    }
}
