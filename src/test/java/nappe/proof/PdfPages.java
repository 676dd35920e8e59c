package nappe.proof;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.Tools;

/** The text of a PDF, page by page, as a reader sees it: columns side by side. */
final class PdfPages {
    private static final Pattern SHEET = Pattern.compile("sheet (\\d+) of (\\d+)");
    private static final Pattern CODE = Pattern.compile("^ ?\\s*([A-Z][A-Z0-9]*\\.\\d{3}) ", Pattern.MULTILINE);

    private final List<String> pages;

    private PdfPages(List<String> pages) {
        this.pages = pages;
    }

    static PdfPages of(byte[] pdf, Path folder) throws IOException {
        Tools.require("pdftotext", "poppler");
        Path file = Files.write(Files.createTempFile(folder, "package", ".pdf"), pdf);
        Path text = folder.resolve("package.txt");
        Tools.run("pdftotext", "-layout", "-enc", "UTF-8", file.toString(), text.toString());
        String all = Files.readString(text)
                .replace('\u2212', '-')
                .replace('\u00a0', ' ')
                .replace('\u2009', ' ');
        List<String> pages = new ArrayList<>(Arrays.asList(all.split("\f")));
        return new PdfPages(pages);
    }

    List<String> all() {
        return pages;
    }

    /** The number of the sheet that a page belongs to, and of how many: {@code "3 of 13"}. */
    static String sheetOf(String page) {
        Matcher matcher = SHEET.matcher(page);
        return matcher.find() ? matcher.group(1) + " of " + matcher.group(2) : "none";
    }

    /** The pages of one sheet, one after another. */
    String ofSheet(int number) {
        return String.join(
                "\n",
                pages.stream()
                        .filter(page -> sheetOf(page).startsWith(number + " of "))
                        .toList());
    }

    /** All that stands between a line's code and the next code, wherever the line is printed on its sheet, by code. */
    static Map<String, String> lines(String sheet) {
        Map<String, String> lines = new HashMap<>();
        Matcher matcher = CODE.matcher(sheet);
        boolean more = matcher.find();
        while (more) {
            String code = matcher.group(1);
            int from = matcher.start();
            more = matcher.find();
            lines.merge(code, sheet.substring(from, more ? matcher.start() : sheet.length()), (a, c) -> a + '\n' + c);
        }
        return lines;
    }

    /** Whether a number or words stand in a text by themselves, not as a part of another number. */
    static boolean holds(String text, String what) {
        return Pattern.compile("(?<![0-9.\\w-])" + Pattern.quote(what).replace(" ", "\\E\\s+\\Q") + "(?![0-9.]*[0-9])")
                .matcher(text)
                .find();
    }
}
