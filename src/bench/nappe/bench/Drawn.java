package nappe.bench;

import com.lowagie.text.pdf.PRTokeniser;
import com.lowagie.text.pdf.PdfArray;
import com.lowagie.text.pdf.PdfContentParser;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfNumber;
import com.lowagie.text.pdf.PdfObject;
import com.lowagie.text.pdf.PdfReader;
import com.lowagie.text.pdf.SimpleBookmark;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** What a PDF holds beside its words: rules and lines, links, bookmarks. */
final class Drawn {
    private static final Set<String> KEPT =
            Set.of("m", "l", "c", "h", "re", "S", "f", "B", "n", "w", "g", "G", "rg", "RG", "q", "Q", "cm", "W");

    private Drawn() {}

    /** Adds rules and links to the pages; the titles of the bookmarks. */
    static List<String> onto(List<Content.Page> pages, Path pdf) throws IOException {
        PdfReader reader = new PdfReader(Files.readAllBytes(pdf));
        for (int i = 0; i < pages.size(); i++) {
            marks(reader.getPageContent(i + 1), pages.get(i).marks());
            links(reader.getPageN(i + 1).getAsArray(PdfName.ANNOTS), pages.get(i).links());
        }
        List<String> titles = new ArrayList<>();
        titles(SimpleBookmark.getBookmarkList(reader), titles);
        reader.close();
        return titles;
    }

    private static void marks(byte[] content, List<Content.Mark> marks) throws IOException {
        PdfContentParser parser = new PdfContentParser(new PRTokeniser(content));
        List<PdfObject> operands = new ArrayList<>();
        while (!parser.parse(operands).isEmpty()) {
            String operator = operands.get(operands.size() - 1).toString();
            if (KEPT.contains(operator)) {
                marks.add(new Content.Mark(operator, numbers(operands)));
            }
        }
    }

    private static float[] numbers(List<PdfObject> operands) {
        List<PdfObject> numbers = operands.stream().filter(PdfObject::isNumber).toList();
        float[] read = new float[numbers.size()];
        for (int i = 0; i < read.length; i++) {
            read[i] = ((PdfNumber) numbers.get(i)).floatValue();
        }
        return read;
    }

    private static void links(PdfArray annotations, List<float[]> links) {
        for (int i = 0; annotations != null && i < annotations.size(); i++) {
            PdfArray place = annotations.getAsDict(i).getAsArray(PdfName.RECT);
            float[] corners = new float[4];
            for (int k = 0; k < 4; k++) {
                corners[k] = place.getAsNumber(k).floatValue();
            }
            links.add(corners);
        }
    }

    @SuppressWarnings("unchecked")
    private static void titles(List<Map<String, Object>> bookmarks, List<String> titles) {
        for (Map<String, Object> bookmark : bookmarks == null ? List.<Map<String, Object>>of() : bookmarks) {
            titles.add(String.valueOf(bookmark.get("Title")));
            titles((List<Map<String, Object>>) bookmark.get("Kids"), titles);
        }
    }
}
