package nappe.deliver.pdf;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import com.lowagie.text.pdf.PdfReader;
import com.lowagie.text.pdf.SimpleBookmark;
import com.lowagie.text.pdf.parser.PdfTextExtractor;
import java.io.ByteArrayOutputStream;
import java.io.File;
import java.io.IOException;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TimeZone;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Sheet;
import nappe.results.Results;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class PdfDeliveryTest {
    private static final Results RESULTS = Invented.results();
    private static final byte[] PDF = PdfDelivery.render(RESULTS).bytes();
    private static final List<String> PAGES = pages(PDF);

    /** The text of each page, blanks of every kind as one space. */
    private static List<String> pages(byte[] pdf) {
        List<String> pages = new ArrayList<>();
        try (PdfReader reader = new PdfReader(pdf)) {
            PdfTextExtractor extractor = new PdfTextExtractor(reader);
            for (int page = 1; page <= reader.getNumberOfPages(); page++) {
                pages.add(extractor.getTextFromPage(page).replaceAll("[\\s\\u00a0\\u2002\\u2009]+", " "));
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return pages;
    }

    @Test
    void everyValueStandsInTheTextAsPrinted() throws IOException {
        String all = String.join(" ", PAGES);
        for (Cell cell : RESULTS.cells()) {
            if (!cell.place().sheet().equals("Tables")) {
                assertThat(all).contains(Printed.value(RESULTS, cell));
            }
        }
        assertThat(all).contains("no result", "not met", "does not slow the flume");
    }

    @Test
    void everyValueOfACaseStandsInItsRow() throws IOException {
        String all = String.join(" ", PAGES);
        Block.Lines lines = (Block.Lines) RESULTS.sheets().get(1).blocks().get(3);
        for (Block.Line line : lines.lines()) {
            for (Cell cell : line.perCase()) {
                assertThat(all)
                        .containsPattern(
                                Pattern.quote(line.code()) + "(?!m).*?" + Pattern.quote(Printed.value(RESULTS, cell)));
            }
        }
    }

    @Test
    void aChangedNumberChangesTheText() throws IOException {
        String before = String.join(" ", PAGES);
        String after = String.join(
                " ", pages(PdfDelivery.render(Invented.results(1.3456)).bytes()));
        assertThat(before).contains("1.2345").doesNotContain("1.3456");
        assertThat(after).contains("1.3456").doesNotContain("1.2345");
    }

    @Test
    void aWorkedLineShowsEquationNumbersResultSourceAndCell() throws IOException {
        assertThat(String.join(" ", PAGES).replace(" ", ""))
                .contains("F1.10gaugeheadinfreeflowhf=1ft×QC×1ft³/s1/n=1ft×2.6965ft³/s4×1ft³/s1/1.522"
                        + "hf=0.772ft"
                        + "InventedManualofFlumes,2nded.(fiction),table8-2,p.8-47cellJ13");
    }

    @Test
    void anEquationIsOneSpanThatCopiesAsItsPlainFormula() throws IOException {
        List<String> spans = spans(PDF);
        assertThat(spans)
                .contains(
                        "h_f = 1 ft * (Q/(C*1 ft3/s))^(1/n)",
                        "= 1 ft * (2.6965 ft3/s / (4*1 ft3/s))^(1/1.522)",
                        "h_a = if(S_f <= S_lim, h_f, none())");
    }

    /** The plain texts of the equations on all pages; each is one span with the characters in it. */
    private static List<String> spans(byte[] pdf) throws IOException {
        List<String> spans = new ArrayList<>();
        try (PdfReader reader = new PdfReader(pdf)) {
            for (int page = 1; page <= reader.getNumberOfPages(); page++) {
                String content = new String(reader.getPageContent(page), StandardCharsets.ISO_8859_1);
                Matcher span = Pattern.compile("/Span <</ActualText\\((.*?)\\)>> ?BDC\n")
                        .matcher(content);
                while (span.find()) {
                    spans.add(span.group(1).replace("\\(", "(").replace("\\)", ")"));
                    String within = content.substring(span.end(), content.indexOf("EMC", span.end()));
                    assertThat(within).contains("BT", "Tj", "ET").doesNotContain("BDC");
                }
            }
        }
        return spans;
    }

    /** The renderer would draw on both pages what reaches over the edge of one. */
    @Test
    void everyEquationStandsOnOnePageWhole() throws IOException {
        Drawings drawings = new Drawings();
        List<String> set = new ArrayList<>();
        PageSize page = PageSize.of(RESULTS.furniture().letterPaper());
        for (View.Leaf leaf : new Leaves(RESULTS, page, drawings, new Pictures(RESULTS)).leaves()) {
            for (View.Part part : leaf.parts()) {
                if (part instanceof View.Grid grid) {
                    grid.body().stream()
                            .flatMap(row -> row.cells().stream())
                            .flatMap(cell -> cell.texts().stream())
                            .filter(text -> text.inset() != null)
                            .forEach(text -> set.addAll(
                                    ((Equation) drawings.named(text.inset().name())).texts()));
                }
            }
        }
        assertThat(set).hasSizeGreaterThan(50);
        assertThat(spans(PDF)).isEqualTo(set);
    }

    @Test
    void everyPageCarriesTheFurniture() throws IOException {
        List<String> pages = PAGES;
        for (int i = 0; i < pages.size(); i++) {
            assertThat(pages.get(i))
                    .contains(RESULTS.furniture().cautions())
                    .contains(
                            "4F3A 99E1 0C7D 51B2",
                            "C-0042",
                            "Invented Engineers of Nowhere",
                            "Example Creek interceptor",
                            "Imaginary Sanitary District",
                            "Parshall flume and thin-plate weir",
                            "2026-03-01",
                            "preliminary",
                            "For checking only; not for construction.",
                            "page " + (i + 1) + " of " + pages.size())
                    .containsPattern("Revision ?B")
                    .containsPattern("By ?date ?Checked ?date ?Approved ?date");
        }
    }

    @Test
    void everyPageOfASheetHasItsNumber() throws IOException {
        List<String> pages = PAGES;
        int total = RESULTS.sheets().size();
        int sheet = 0;
        for (String page : pages) {
            Matcher title = Pattern.compile("Sheet (\\d+) of " + total).matcher(page);
            if (title.find()) {
                sheet++;
                assertThat(title.group(1)).isEqualTo(String.valueOf(sheet));
                assertThat(page).contains(RESULTS.sheets().get(sheet - 1).title());
            }
            assertThat(page).contains("sheet " + sheet + " of " + total);
        }
        assertThat(sheet).isEqualTo(total);
    }

    @Test
    void anIssuedPackageHasNoReleaseStatement() throws IOException {
        assertThat(String.join(" ", pages(PdfDelivery.render(Invented.onA4()).bytes())))
                .doesNotContain("For checking only")
                .contains("issued");
    }

    @Test
    void hostileTextIsPrintedAsText() throws IOException {
        String all = String.join(" ", PAGES);
        assertThat(all).contains("<script>alert(1)</script> & ${7*7} [[${7*7}]] ]]>", "Notes & <b>remarks</b>");
        assertThat(letters(all, "x")).isEqualTo(10_000);
        assertThat(letters(all, "y")).isEqualTo(600);
    }

    private static int letters(String text, String letter) {
        Matcher runs = Pattern.compile(letter + "{4,}").matcher(text);
        int letters = 0;
        while (runs.find()) {
            letters += runs.group().length();
        }
        return letters;
    }

    /** The renderer draws on both pages what reaches over the edge of one. */
    @Test
    void noRowIsPrintedTwice() throws IOException {
        String all = String.join(" ", PAGES);
        for (int i = 0; i < 60; i++) {
            Matcher row =
                    Pattern.compile("2 F1 Parshall flume ?F1\\." + (10 + i)).matcher(all);
            assertThat(row.results().count()).isEqualTo(1);
        }
    }

    @Test
    void aCharacterInNoTypefaceIsABoxAndAWarning() {
        assertThat(PdfDelivery.render(RESULTS).warnings())
                .containsExactly(
                        "character U+4E2D is in none of the typefaces; the PDF shows a box",
                        "character U+6587 is in none of the typefaces; the PDF shows a box",
                        "a control character or half a character in the input; the PDF shows a box");
    }

    @Test
    void onlyTheBundledFontsAreEmbedded() throws IOException {
        String raw = new String(PDF, StandardCharsets.ISO_8859_1);
        assertThat(raw).doesNotContain("/Helvetica", "/Times", "/Courier", "/JavaScript", "/URI");
    }

    @Test
    void sheetsAreBookmarksAndLinks() throws IOException {
        try (PdfReader reader = new PdfReader(PDF)) {
            List<String> titles = SimpleBookmark.getBookmarkList(reader).stream()
                    .map(bookmark -> String.valueOf(bookmark.get("Title")))
                    .toList();
            List<String> expected = RESULTS.sheets().stream()
                    .map(sheet -> sheet.number() + " " + sheet.title())
                    .toList();
            assertThat(titles).isEqualTo(expected);
            assertThat(reader.getPageN(1)
                            .getAsArray(com.lowagie.text.pdf.PdfName.ANNOTS)
                            .size())
                    .isGreaterThanOrEqualTo(2);
        }
    }

    @Test
    void theFileSaysWhoseItIsAndWhen() throws IOException {
        try (PdfReader reader = new PdfReader(PDF)) {
            Map<String, String> info = reader.getInfo();
            assertThat(info)
                    .containsEntry("Title", "C-0042 Parshall flume and thin-plate weir at the headworks, revision B")
                    .containsEntry("Author", "Invented Engineers of Nowhere")
                    .containsEntry("CreationDate", "D:20260301000000Z")
                    .containsEntry("ModDate", "D:20260301000000Z")
                    .containsEntry("Producer", "Nappe 0.1.0");
        }
    }

    @Test
    void sameInputSameBytesInAnotherLocaleAndTimeZone() {
        Locale locale = Locale.getDefault();
        TimeZone zone = TimeZone.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("tr-TR"));
            TimeZone.setDefault(TimeZone.getTimeZone("Asia/Tokyo"));
            assertThat(PdfDelivery.render(Invented.results()).bytes()).isEqualTo(PDF);
        } finally {
            Locale.setDefault(locale);
            TimeZone.setDefault(zone);
        }
    }

    @Test
    void sameInputSameBytesInAnotherProcessWithAnotherCharset(@TempDir Path folder) throws Exception {
        Path file = folder.resolve("other.pdf");
        Process process = new ProcessBuilder(
                        System.getProperty("java.home") + File.separator + "bin" + File.separator + "java",
                        "-cp",
                        System.getProperty("java.class.path"),
                        "-Dfile.encoding=ISO-8859-1",
                        "-Duser.language=th",
                        "-Duser.country=TH",
                        "-Duser.timezone=Pacific/Auckland",
                        PrintSample.class.getName(),
                        file.toString())
                .redirectErrorStream(true)
                .start();
        String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
        assertThat(said).isEmpty();
        assertThat(Files.readAllBytes(file)).isEqualTo(PDF);
    }

    @Test
    void nothingIsSaidOnStandardOutput() {
        PrintStream out = System.out;
        ByteArrayOutputStream said = new ByteArrayOutputStream();
        System.setOut(new PrintStream(said, true, StandardCharsets.UTF_8));
        try {
            PdfDelivery.render(RESULTS);
        } finally {
            System.setOut(out);
        }
        assertThat(said.toString(StandardCharsets.UTF_8)).isEmpty();
    }

    @Test
    void tooLongAProjectNameIsCutInTheHeadAndWarnedOf() {
        var furniture = Invented.furniture(true, "", "issued");
        var longer = new nappe.results.Furniture(
                "p".repeat(2000),
                furniture.firm(),
                furniture.client(),
                furniture.number(),
                furniture.subject(),
                furniture.revision(),
                furniture.date(),
                furniture.status(),
                furniture.fingerprint(),
                furniture.version(),
                true,
                furniture.cautions(),
                "");
        PdfDelivery delivery = PdfDelivery.render(
                new Results(longer, List.of(new Sheet(1, "A", "A", List.of())), List.of(), Map.of()));
        assertThat(delivery.warnings())
                .containsExactly("the project is too long for the head of the page and is cut there");
    }

    @Test
    void anotherProgramFindsNoFault(@TempDir Path folder) throws Exception {
        assumeTrue(isInstalled("qpdf"), "SKIPPED: qpdf is not installed, the PDF's structure was not checked");
        Path file = folder.resolve("package.pdf");
        Files.write(file, PDF);
        Process process = new ProcessBuilder("qpdf", "--check", file.toString())
                .redirectErrorStream(true)
                .start();
        String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertThat(process.waitFor()).as(said).isZero();
        assertThat(said).doesNotContain("WARNING");
    }

    @Test
    void anotherProgramReadsTheSameText(@TempDir Path folder) throws Exception {
        assumeTrue(isInstalled("pdftotext"), "SKIPPED: pdftotext is not installed, the PDF's text was not read by it");
        Path file = folder.resolve("package.pdf");
        Files.write(file, PDF);
        Process process = new ProcessBuilder("pdftotext", "-layout", "-enc", "UTF-8", file.toString(), "-").start();
        String text = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertThat(process.waitFor()).isZero();
        String row = text.lines()
                .filter(line -> line.strip().startsWith("F1.10 "))
                .skip(1)
                .findFirst()
                .orElse("");
        assertThat(row).containsPattern("gauge head in free flow +ft +0\\.462 +0\\.627 +0\\.772");
        for (Cell cell : RESULTS.cells()) {
            if (!cell.place().sheet().equals("Tables")) {
                assertThat(text).contains(Printed.value(RESULTS, cell));
            }
        }
    }

    private static boolean isInstalled(String program) {
        for (String folder : System.getenv("PATH").split(File.pathSeparator)) {
            if (Files.isExecutable(Path.of(folder, program))) {
                return true;
            }
        }
        return false;
    }
}
