package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.Tools;

/** Where the words of a PDF stand, page by page, in points from the upper left corner. */
record PdfBoxes(List<Page> pages) {
    /** A word and the box around it. */
    record Word(double left, double top, double right, double bottom, String text) {
        double height() {
            return bottom - top;
        }

        @Override
        public String toString() {
            return String.format(
                    java.util.Locale.ROOT, "\"%s\" at %.0f..%.0f, %.0f..%.0f", text, left, right, top, bottom);
        }
    }

    /** A page with its size. */
    record Page(int number, double width, double height, List<Word> words) {}

    private static final Pattern PAGE =
            Pattern.compile("<page width=\"([0-9.]+)\" height=\"([0-9.]+)\">(.*?)</page>", Pattern.DOTALL);
    private static final Pattern WORD = Pattern.compile(
            "<word xMin=\"([-0-9.]+)\" yMin=\"([-0-9.]+)\" xMax=\"([-0-9.]+)\" yMax=\"([-0-9.]+)\">(.*?)</word>",
            Pattern.DOTALL);
    private static final double MM = 72 / 25.4;
    private static final double SLACK = 0.6;
    private static final Pattern LABEL = Pattern.compile("\\d+-\\d+");
    private static final double LABEL_HEIGHT = 13;

    static PdfBoxes of(Path pdf, Path folder) throws IOException {
        Tools.require("pdftotext", "poppler");
        Path html = Files.createTempFile(folder, "boxes", ".html");
        Tools.run("pdftotext", "-bbox", "-enc", "UTF-8", pdf.toString(), html.toString());
        List<Page> pages = new ArrayList<>();
        Matcher page = PAGE.matcher(Files.readString(html));
        while (page.find()) {
            List<Word> words = new ArrayList<>();
            Matcher word = WORD.matcher(page.group(3));
            while (word.find()) {
                String text = word.group(5)
                        .replace("&lt;", "<")
                        .replace("&gt;", ">")
                        .replace("&quot;", "\"")
                        .replace("&amp;", "&");
                words.add(new Word(number(word, 1), number(word, 2), number(word, 3), number(word, 4), text));
            }
            pages.add(new Page(pages.size() + 1, number(page, 1), number(page, 2), words));
        }
        return new PdfBoxes(pages);
    }

    private static double number(Matcher matcher, int group) {
        return Double.parseDouble(matcher.group(group));
    }

    /**
     * Every word keeps clear of the edges: 14 mm at the sides, 25 mm at the edge where the page is bound, 8 mm above and below; the
     * label of a page alone stands in the clear space above its head.
     */
    void assertWithinMargins() {
        List<String> outside = new ArrayList<>();
        for (Page page : pages) {
            boolean wide = page.width() > page.height();
            double left = (wide ? 14 : 25) * MM - SLACK;
            double right = page.width() - 14 * MM + SLACK;
            double top = (wide ? 25 : 8) * MM - SLACK;
            double bottom = page.height() - 8 * MM;
            for (Word word : page.words()) {
                double above = LABEL.matcher(word.text()).matches() && word.top() < top ? LABEL_HEIGHT : 0;
                if (word.left() < left || word.right() > right || word.top() < top - above || word.bottom() > bottom) {
                    outside.add("page " + page.number() + ": " + word);
                }
            }
        }
        assertThat(outside).isEmpty();
    }

    /** No two words stand on one another by more than a point across and a third of the lower one's height. */
    void assertNoneOverlap() {
        List<String> over = new ArrayList<>();
        for (Page page : pages) {
            for (int i = 0; i < page.words().size(); i++) {
                for (int j = 0; j < i; j++) {
                    Word one = page.words().get(i);
                    Word other = page.words().get(j);
                    double across = Math.min(one.right(), other.right()) - Math.max(one.left(), other.left());
                    double up = Math.min(one.bottom(), other.bottom()) - Math.max(one.top(), other.top());
                    if (across > 1 && up > Math.min(one.height(), other.height()) / 3) {
                        over.add("page " + page.number() + ": " + one + " and " + other);
                    }
                }
            }
        }
        assertThat(over).isEmpty();
    }
}
