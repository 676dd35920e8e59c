package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import com.lowagie.text.pdf.PdfArray;
import com.lowagie.text.pdf.PdfDictionary;
import com.lowagie.text.pdf.PdfIndirectReference;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfPageLabels;
import com.lowagie.text.pdf.PdfReader;
import com.lowagie.text.pdf.SimpleBookmark;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** A reader finds the way in the PDF: page labels, bookmarks, links. */
class NavigationTest {
    @TempDir
    Path folder;

    static List<Issued> both() {
        return Issued.both();
    }

    /** The first page of each sheet by its number, as printed in the head of the pages. */
    private Map<Integer, Integer> firstPages(byte[] pdf) throws IOException {
        Map<Integer, Integer> firsts = new TreeMap<>();
        List<String> pages = PdfPages.of(pdf, folder).all();
        for (int i = 0; i < pages.size(); i++) {
            String sheet = PdfPages.sheetOf(pages.get(i));
            if (!sheet.equals("none")) {
                firsts.putIfAbsent(Integer.valueOf(sheet.split(" ")[0]), i + 1);
            }
        }
        return firsts;
    }

    @ParameterizedTest
    @MethodSource("both")
    void pageLabelsAreTheSheetAndItsPageAsPrinted(Issued issued) throws IOException {
        byte[] pdf = Files.readAllBytes(issued.pdf());
        List<String> pages = PdfPages.of(pdf, folder).all();
        try (PdfReader reader = new PdfReader(pdf)) {
            String[] labels = PdfPageLabels.getPageLabels(reader);
            assertThat(labels).hasSize(reader.getNumberOfPages());
            int within = 0;
            String before = "";
            for (int i = 0; i < labels.length; i++) {
                String sheet = PdfPages.sheetOf(pages.get(i)).split(" ")[0];
                within = sheet.equals(before) ? within + 1 : 1;
                before = sheet;
                assertThat(labels[i]).isEqualTo(sheet + "-" + within);
                assertThat(pages.get(i).strip()).startsWith(labels[i] + "\n");
            }
        }
    }

    @ParameterizedTest
    @MethodSource("both")
    void bookmarksLeadToTheSheetsAndTheirHeadings(Issued issued) throws IOException {
        byte[] pdf = Files.readAllBytes(issued.pdf());
        Map<Integer, Integer> firsts = firstPages(pdf);
        List<String> pages = PdfPages.of(pdf, folder).all();
        try (PdfReader reader = new PdfReader(pdf)) {
            List<Map<String, Object>> sheets = SimpleBookmark.getBookmarkList(reader);
            assertThat(sheets).hasSameSizeAs(firsts.keySet());
            for (int i = 0; i < sheets.size(); i++) {
                assertThat(sheets.get(i).get("Title").toString()).startsWith((i + 1) + " ");
                assertThat(page(sheets.get(i))).isEqualTo(firsts.get(i + 1));
            }
            List<Map<?, ?>> all = new ArrayList<>();
            gather(sheets, all);
            assertThat(all).hasSizeGreaterThan(2 * sheets.size());
            for (Map<?, ?> bookmark : all) {
                String title = bookmark.get("Title").toString().replaceFirst("^\\d+ ", "");
                assertThat(solid(pages.get(page(bookmark) - 1))).contains(solid(title));
                assertThat(Double.parseDouble(bookmark.get("Page").toString().split(" ")[3]))
                        .isBetween(
                                0.0, (double) reader.getPageSize(page(bookmark)).getHeight());
            }
        }
    }

    private static int page(Map<?, ?> bookmark) {
        return Integer.parseInt(bookmark.get("Page").toString().split(" ")[0]);
    }

    private static void gather(List<?> bookmarks, List<Map<?, ?>> all) {
        for (Object each : bookmarks) {
            Map<?, ?> bookmark = (Map<?, ?>) each;
            all.add(bookmark);
            if (bookmark.get("Kids") instanceof List<?> kids) {
                gather(kids, all);
            }
        }
    }

    private static String solid(String text) {
        return text.replaceAll("[\\s\\u2002]+", "");
    }

    @ParameterizedTest
    @MethodSource("both")
    void everyLinkLeadsToAPageAndEveryPageBackToTheIndex(Issued issued) throws IOException {
        byte[] pdf = Files.readAllBytes(issued.pdf());
        Map<Integer, Integer> firsts = firstPages(pdf);
        try (PdfReader reader = new PdfReader(pdf)) {
            Map<Integer, TreeSet<Integer>> links = links(reader);
            int index = firsts.get(2);
            assertThat(links).hasSize(reader.getNumberOfPages());
            assertThat(links.values()).allMatch(targets -> targets.contains(index));
            assertThat(links.get(index)).containsAll(firsts.values());
            assertThat(links.get(firsts.get(3))).as("from the summary").hasSizeGreaterThan(1);
        }
    }

    /** To which pages each page links; a link that leads nowhere throws. */
    private static Map<Integer, TreeSet<Integer>> links(PdfReader reader) {
        Map<Integer, Integer> numbers = new HashMap<>();
        for (int page = 1; page <= reader.getNumberOfPages(); page++) {
            numbers.put(reader.getPageOrigRef(page).getNumber(), page);
        }
        Map<Integer, TreeSet<Integer>> links = new TreeMap<>();
        for (int page = 1; page <= reader.getNumberOfPages(); page++) {
            PdfArray notes = reader.getPageN(page).getAsArray(PdfName.ANNOTS);
            for (int i = 0; i < notes.size(); i++) {
                PdfDictionary note = notes.getAsDict(i);
                if (PdfName.LINK.equals(note.getAsName(PdfName.SUBTYPE))) {
                    PdfDictionary action = note.getAsDict(PdfName.A);
                    assertThat(action.getAsName(PdfName.S)).isEqualTo(PdfName.GOTO);
                    PdfArray target = action.getAsArray(PdfName.D);
                    int to = numbers.get(((PdfIndirectReference) target.getPdfObject(0)).getNumber());
                    assertThat(target.getAsNumber(3).doubleValue())
                            .isBetween(0.0, (double) reader.getPageSize(to).getHeight());
                    links.computeIfAbsent(page, key -> new TreeSet<>()).add(to);
                }
            }
        }
        return links;
    }
}
