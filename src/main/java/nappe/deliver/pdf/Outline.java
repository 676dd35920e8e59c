package nappe.deliver.pdf;

import com.lowagie.text.pdf.PdfDestination;
import com.lowagie.text.pdf.PdfOutline;
import com.lowagie.text.pdf.PdfWriter;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.xhtmlrenderer.pdf.ITextRenderer;
import org.xhtmlrenderer.pdf.PagePosition;

/**
 * Bookmarks: the sheets, the headings of each, the titles of its tables and the headings between their rows. The renderer's
 * own bookmarks lead to a wrong height where pages are of two kinds.
 */
final class Outline {
    /** Classes of the template, from the sheet inwards. */
    private static final List<String> RANKS = List.of("title", "heading", "tabletitle", "between");

    private static final Pattern IDS = Pattern.compile("^(sheet|heading)-\\d+$");

    private record Entry(int rank, String words, String id) {}

    private final List<Entry> entries = new ArrayList<>();

    private Outline() {}

    /** Finds what gets a bookmark, and gives each heading an id by which it is found on the page. */
    static Outline of(Document document) {
        Outline outline = new Outline();
        outline.addAll(document.getDocumentElement());
        return outline;
    }

    /** By hand: the document's list of all elements starts from the front again whenever an attribute is set. */
    private void addAll(Element element) {
        add(element);
        for (Node child = element.getFirstChild(); child != null; child = child.getNextSibling()) {
            if (child instanceof Element inner) {
                addAll(inner);
            }
        }
    }

    private void add(Element element) {
        int rank = RANKS.indexOf(element.getAttribute("class").split(" ", -1)[0]);
        if (rank == 0) {
            String id = element.getAttribute("id");
            String title = element.getElementsByTagName("h1").item(0).getTextContent();
            entries.add(new Entry(rank, id.substring(id.indexOf('-') + 1) + " " + title, id));
        } else if (rank > 0) {
            String words = element.getTextContent().replace('\u00a0', ' ').strip();
            if (!words.isEmpty()) {
                String id = "heading-" + entries.size();
                element.setAttribute("id", id);
                entries.add(new Entry(rank, words, id));
            }
        }
    }

    /** Writes the bookmarks; those of the sheets are closed. Before the first page is painted, which moves table heads. */
    void write(ITextRenderer renderer, PdfWriter writer) {
        Map<String, PagePosition> places = new HashMap<>();
        renderer.findPagePositionsByID(IDS).forEach(place -> places.put(place.getId(), place));
        PdfOutline[] open = new PdfOutline[RANKS.size() + 1];
        for (Entry entry : entries) {
            PagePosition place = places.get(entry.id());
            if (place == null) {
                throw new IllegalStateException("no place for the bookmark " + entry.words());
            }
            PdfDestination top = new PdfDestination(PdfDestination.XYZ, 0, place.getY() + place.getHeight(), 0);
            top.addPage(writer.getPageReference(place.getPageNo() + 1));
            open[0] = writer.getRootOutline();
            int rank = entry.rank();
            PdfOutline under = open[rank];
            for (int above = rank - 1; under == null; above--) {
                under = open[above];
            }
            open[rank + 1] = new PdfOutline(under, top, entry.words(), false);
            java.util.Arrays.fill(open, rank + 2, open.length, null);
        }
    }
}
