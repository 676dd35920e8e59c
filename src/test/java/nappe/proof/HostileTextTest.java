package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import com.lowagie.text.pdf.PdfReader;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import javax.xml.parsers.DocumentBuilderFactory;
import nappe.Tools;
import nappe.cli.Nappe;
import nappe.input.Filler;
import nappe.proof.HostileStation.Spot;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Whatever words are typed into an entry for text, they come out as these words in PDF and workbook, or are refused at their
 * cell. Each entry gets the words with a mark of its own behind them, all entries of the input workbook at once. The last run
 * is of a flume, which prints the reason for its size too; all others are of a weir, which is issued sooner.
 */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class HostileTextTest {
    private record Said(int status, String out, String err) {}

    private static final Pattern FAULT =
            Pattern.compile("(?m)^\\S+, sheet ([\\w ]+), cell ([A-Z]+[0-9]+): .*\\(fault: [a-z-]+\\)$");
    private static final Pattern QUOTED = Pattern.compile("\"(?:[^\"]|\"\")*\"");

    /** What is typed, outside of quotes. */
    private static final Pattern WORKED_OUT = Pattern.compile("q1\\d\\dq|7\\*7|61\\+67");

    @TempDir
    static Path folder;

    private HostileStation weir;
    private HostileStation flume;
    private final Map<String, Path> workbooks = new LinkedHashMap<>();

    @BeforeAll
    void findSpots() throws IOException {
        weir = HostileStation.weir();
        flume = HostileStation.flume();
    }

    private static final List<String> HOSTILE = List.of(
            "<script>&amp;</b>",
            "${7*7} [[${7*7}]] *{x} @{x}",
            "[(${7*7})] #{x} ~{x} th:text",
            "=61+67",
            "@SUM(61) +61+67",
            "]]> <![CDATA[ <!--",
            "<!DOCTYPE a [<!ENTITY b \"c\">]>",
            "&P &L &&P &\"Arial\"&D",
            "\"double\" 'single' \u201ctwo\u201d \\",
            "{\\b} %s %n {0} $1 \\1 \\u0041",
            "_x005F_ & _x00e4_",
            "\u03a9\u03bc\u03ad\u03b3\u03b1 \u0416\u0443\u043a \u0141\u00f3d\u017a");
    private static final int RUNS = 3;

    private static String mark(int spot) {
        return "q" + (100 + spot) + "q";
    }

    private static String words(String text, int spot) {
        return text + " " + mark(spot);
    }

    private Said issue(Filler filler, Path out) throws IOException {
        Path input = filler.save(Files.createTempFile(folder, "in", ".xlsx"));
        Locale locale = Locale.getDefault();
        StringWriter said = new StringWriter();
        StringWriter err = new StringWriter();
        try {
            int status = Nappe.run(
                    new String[] {"issue", input.toString(), "-o", out.toString()},
                    new PrintWriter(said, true),
                    new PrintWriter(err, true));
            return new Said(status, said.toString(), err.toString());
        } finally {
            Locale.setDefault(locale);
        }
    }

    private static Filler filled(HostileStation station, Map<Spot, String> words) throws IOException {
        Filler filler = station.filler();
        words.forEach((spot, text) -> filler.set(spot.sheet(), spot.address(), escaped(text)));
        return filler;
    }

    /** The same, and what may name the cases and combinations names them by their new words. */
    private static Filler filledAndNamed(HostileStation station, Map<Spot, String> words) throws IOException {
        Map<Spot, String> all = new LinkedHashMap<>(words);
        station.named().forEach((spot, named) -> named.forEach(cell -> all.put(cell, words.get(spot))));
        return filled(station, all);
    }

    /** As a workbook writes what XML can't hold, and what looks like it. */
    private static String escaped(String text) {
        StringBuilder escaped = new StringBuilder();
        for (char c : text.replaceAll("_(?=x[0-9A-Fa-f]{4}_)", "_x005F_").toCharArray()) {
            boolean odd = c < ' ' || c >= 0xFFFE;
            escaped.append(odd ? String.format("_x%04X_", (int) c) : String.valueOf(c));
        }
        return escaped.toString();
    }

    private static Path one(Path folder, String end) throws IOException {
        try (Stream<Path> all = Files.walk(folder)) {
            return all.filter(file -> file.toString().endsWith(end)).findFirst().orElseThrow();
        }
    }

    /** Without any blanks, also those that a line may break at. */
    private static String solid(String text) {
        return text.replaceAll("[\\s\\p{Z}\\u00ad\\u200b\\u200e\\u200f\\u202a-\\u202e\\u2060]+", "");
    }

    private static String pdfText(Path pdf) throws IOException {
        Tools.require("pdftotext", "poppler");
        Path text = Files.createTempFile("hostile", ".txt");
        Tools.run("pdftotext", "-raw", "-enc", "UTF-8", pdf.toString(), text.toString());
        String all = Files.readString(text);
        Files.delete(text);
        return all;
    }

    private void refused(Said said, List<Spot> where) {
        assertThat(said.status()).as(said.err()).isEqualTo(3);
        assertThat(said.out()).isEmpty();
        List<String> told = FAULT.matcher(said.err())
                .results()
                .map(found -> found.group(1) + "!" + found.group(2))
                .toList();
        assertThat(told)
                .as(said.err())
                .containsExactlyInAnyOrderElementsOf(
                        where.stream().map(Spot::cell).toList());
        assertThat(said.err()).doesNotContain("\tat ", "Exception", "nappe.");
        assertThat(said.err().lines()).allMatch(line -> line.length() < 400);
    }

    /** A long entry gets all the texts, each time with others before; a short one gets one of them in each run. */
    private static Map<Spot, String> hostile(HostileStation station, int run) {
        List<Spot> spots = station.spots();
        Map<Spot, String> words = new LinkedHashMap<>();
        for (int i = 0; i < spots.size(); i++) {
            int first = (i + run * HOSTILE.size() / RUNS) % HOSTILE.size();
            List<String> turned = new ArrayList<>(HOSTILE.subList(first, HOSTILE.size()));
            turned.addAll(HOSTILE.subList(0, first));
            boolean isShort = spots.get(i).longest() < HostileStation.TEXT;
            words.put(spots.get(i), words(isShort ? turned.get(0) : String.join(" ", turned), i));
        }
        return words;
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2})
    void comesOutAsText(int run) throws IOException {
        HostileStation station = run == RUNS - 1 ? flume : weir;
        Map<Spot, String> words = hostile(station, run);
        Path out = Files.createTempDirectory(folder, "out");
        Said said = issue(filledAndNamed(station, words), out);
        assertThat(said.status()).as(said.err()).isZero();
        assertThat(said.err()).doesNotContain("Exception", "none of the typefaces");
        inWorkbook(words, one(out, ".xlsx"));
        inPdf(words, words.get(station.subject()), one(out, ".pdf"));
        String csv = Files.readString(one(out, ".csv"));
        assertThat(csv.lines())
                .noneMatch(line -> line.matches("\"?\\s*[=+@].*") || line.matches(".*[,;]\"?\\s*[=+@].*"));
        assertThat(Files.readString(one(out, "contents.txt"))).contains(words.get(station.project()));
        workbooks.put("run " + run, one(out, ".xlsx"));
    }

    private void inWorkbook(Map<Spot, String> words, Path file) throws IOException {
        List<String> texts = new ArrayList<>();
        List<String> formulas = new ArrayList<>();
        try (XSSFWorkbook book = new XSSFWorkbook(new ByteArrayInputStream(Files.readAllBytes(file)))) {
            book.forEach(sheet -> sheet.forEach(row -> row.forEach(cell -> {
                if (cell.getCellType() == CellType.FORMULA) {
                    formulas.add(cell.getCellFormula());
                } else if (cell.getCellType() == CellType.STRING) {
                    texts.add(cell.getStringCellValue());
                }
            })));
            for (int i = 0; i < book.getNumberOfSheets(); i++) {
                assertThat(book.getSheetName(i)).doesNotContain(mark(0).substring(0, 2));
            }
        }
        assertThat(formulas).isNotEmpty();
        assertThat(formulas.stream()
                        .filter(formula -> WORKED_OUT
                                .matcher(QUOTED.matcher(formula).replaceAll(""))
                                .find()))
                .as("formulas with typed words in them")
                .isEmpty();
        String all = String.join("\n", texts);
        List<String> missing = new ArrayList<>();
        words.forEach((spot, said) -> {
            if (!all.contains(said)) {
                missing.add(spot.cell());
            }
        });
        assertThat(missing).as("in the workbook").isEmpty();
        marked(words, all);
    }

    private static void inPdf(Map<Spot, String> words, String subject, Path file) throws IOException {
        String all = solid(pdfText(file));
        List<String> missing = new ArrayList<>();
        words.forEach((spot, said) -> {
            if (!all.contains(solid(said))) {
                missing.add(spot.cell());
            }
        });
        assertThat(missing).as("in the PDF").isEmpty();
        marked(words, all);
        try (PdfReader reader = new PdfReader(Files.readAllBytes(file))) {
            assertThat(reader.getInfo().get("Title")).contains(subject);
            String title = DocumentBuilderFactory.newInstance()
                    .newDocumentBuilder()
                    .parse(new ByteArrayInputStream(reader.getMetadata()))
                    .getDocumentElement()
                    .getTextContent();
            assertThat(title).contains(subject);
            assertThat(new String(Files.readAllBytes(file), StandardCharsets.ISO_8859_1))
                    .doesNotContain("/JavaScript", "/URI", "/Launch");
        } catch (javax.xml.parsers.ParserConfigurationException | org.xml.sax.SAXException e) {
            throw new AssertionError(e);
        }
    }

    /** Before every mark stand the words as typed; nothing worked them out. */
    private static void marked(Map<Spot, String> words, String all) {
        List<String> bySpot = List.copyOf(words.values());
        String solid = solid(all);
        Matcher marks = Pattern.compile("q1(\\d\\d)q").matcher(solid);
        while (marks.find()) {
            String typed = solid(bySpot.get(Integer.parseInt(marks.group(1))));
            assertThat(solid.substring(Math.max(0, marks.end() - typed.length()), marks.end()))
                    .isEqualTo(typed);
        }
        assertThat(solid).doesNotContain("[[49]]", "[(49)]", "49*{x}");
    }

    /** Right-to-left and other scripts keep their characters in the workbook; the PDF says which it can't draw. */
    @Test
    void otherScriptsComeOutInTheWorkbookAndTheMissingGlyphsAreTold() throws IOException {
        List<Spot> spots = weir.spots();
        String text = "\u6c34\u8def \u05de\u05d9\u05dd \u0645\u0627\u0621 \ud83d\udca7 \u0e19\u0e49\u0e33";
        Map<Spot, String> words = new LinkedHashMap<>();
        for (int i = 0; i < spots.size(); i++) {
            words.put(spots.get(i), words(text, i));
        }
        Path out = Files.createTempDirectory(folder, "out");
        Said said = issue(filledAndNamed(weir, words), out);
        assertThat(said.status()).as(said.err()).isZero();
        assertThat(said.err())
                .contains("U+6C34", "U+05DE", "U+0621", "U+1F4A7", "shows a box")
                .doesNotContain("Exception");
        inWorkbook(words, one(out, ".xlsx"));
        String pdf = solid(pdfText(one(out, ".pdf")));
        for (int i = 0; i < spots.size(); i++) {
            assertThat(pdf).as(spots.get(i).cell()).contains(mark(i));
        }
        workbooks.put(text, one(out, ".xlsx"));
    }

    @Test
    void charactersThatCannotBeSeenAreRefusedAtTheirCell() throws IOException {
        for (String odd :
                List.of("\u0007", "\u0000", "\u001b[2J", "\u007f", "\u0085", "\ud800", "\udc00\ud800", "\uffff")) {
            Map<Spot, String> words = new LinkedHashMap<>();
            weir.spots().forEach(spot -> words.put(spot, "a" + odd + "b"));
            Said said = issue(raw(words), folder.resolve("none"));
            refused(said, weir.spots());
            assertThat(said.err()).doesNotContainPattern("[\\p{Cntrl}\\p{Cs}&&[^\\r\\n]]");
            assertThat(folder.resolve("none")).doesNotExist();
        }
    }

    /** All that is odd as an escape, also a half of a pair. */
    private Filler raw(Map<Spot, String> words) throws IOException {
        Filler filler = weir.filler();
        words.forEach((spot, text) -> {
            StringBuilder escaped = new StringBuilder();
            text.chars()
                    .forEach(c -> escaped.append(
                            c >= ' ' && c < 127 ? String.valueOf((char) c) : String.format("_x%04X_", c)));
            filler.set(spot.sheet(), spot.address(), escaped.toString());
        });
        return filler;
    }

    @Test
    void tenThousandCharactersAreRefusedAtTheirCell() throws IOException {
        Map<Spot, String> words = new LinkedHashMap<>();
        weir.spots().forEach(spot -> words.put(spot, "w".repeat(10_000)));
        refused(issue(filled(weir, words), folder.resolve("none")), weir.spots());
    }

    @Test
    void nineteenHundredCharactersAreRefusedWhereTheyHaveNoRoom() throws IOException {
        Map<Spot, String> words = new LinkedHashMap<>();
        weir.spots().forEach(spot -> words.put(spot, "w".repeat(1900)));
        refused(
                issue(filled(weir, words), folder.resolve("none")),
                weir.spots().stream().filter(spot -> spot.longest() < 1900).toList());
    }

    /** Each as long as it may be, without a blank, of a letter of its own; what stands on every page is a line long. */
    @Test
    void longestTextsWithoutABlankComeOutWhole() throws IOException {
        List<Spot> spots = weir.spots();
        Map<Spot, String> words = new LinkedHashMap<>();
        for (int i = 0; i < spots.size(); i++) {
            Spot spot = spots.get(i);
            int longest = spot.equals(weir.release()) ? HostileStation.LINE : spot.longest();
            boolean isLong = longest > HostileStation.LINE
                    && (i == 0
                            || !spots.get(i - 1)
                                    .address()
                                    .substring(0, 1)
                                    .equals(spot.address().substring(0, 1)));
            words.put(
                    spot,
                    String.valueOf((char) (0x410 + i)).repeat(isLong ? 1900 : Math.min(longest, HostileStation.LINE)));
        }
        Path out = Files.createTempDirectory(folder, "out");
        Said said = issue(filledAndNamed(weir, words), out);
        assertThat(said.status()).as(said.err()).isZero();
        List<String> texts = new ArrayList<>();
        try (XSSFWorkbook book = new XSSFWorkbook(new ByteArrayInputStream(Files.readAllBytes(one(out, ".xlsx"))))) {
            book.forEach(sheet -> sheet.forEach(row -> row.forEach(cell -> {
                if (cell.getCellType() == CellType.STRING) {
                    texts.add(cell.getStringCellValue());
                }
            })));
        }
        String book = String.join("\n", texts);
        String pdf = pdfText(one(out, ".pdf"));
        List<String> missing = new ArrayList<>();
        words.forEach((spot, text) -> {
            if (!book.contains(text)) {
                missing.add(spot.cell() + " in the workbook");
            }
            // a text that runs on over pages has their furniture between; the furniture and the figures cut what is too
            // long for them
            long letters = pdf.chars().filter(c -> c == text.charAt(0)).count();
            if (letters < text.length() || !inFurnitureOrFigure(spot) && letters % text.length() != 0) {
                missing.add(spot.cell() + " in the PDF: " + letters + " of " + text.length());
            }
        });
        assertThat(missing).as(said.err()).isEmpty();
        workbooks.put("long", one(out, ".xlsx"));
    }

    private static boolean inFurnitureOrFigure(Spot spot) {
        return spot.sheet().equals("Project") || spot.cell().matches("(Flows|Combinations)!A\\d+|Demands!F\\d+");
    }

    /** One run of LibreOffice over all workbooks that the other tests made; their texts are on the printed sheets. */
    @AfterAll
    void anotherProgramOpensEveryWorkbook() throws IOException {
        if (workbooks.isEmpty()) {
            return; // every test has failed, and LibreOffice without a file would wait for one
        }
        Path books = Files.createDirectory(folder.resolve("books"));
        List<String> command = new ArrayList<>(List.of(
                "soffice",
                "-env:UserInstallation=" + folder.resolve("profile").toUri(),
                "--headless",
                "--convert-to",
                "pdf",
                "--outdir",
                folder.resolve("printed").toString()));
        List<String> texts = List.copyOf(workbooks.keySet());
        for (int i = 0; i < texts.size(); i++) {
            command.add(Files.copy(workbooks.get(texts.get(i)), books.resolve("book" + i + ".xlsx"))
                    .toString());
        }
        Tools.require("soffice", "LibreOffice");
        Tools.run(command.toArray(String[]::new));
        for (int i = 0; i < texts.size(); i++) {
            String printed = solid(pdfText(folder.resolve("printed/book" + i + ".pdf")));
            if (texts.get(i).startsWith("run")) {
                assertThat(HOSTILE.stream().filter(text -> !printed.contains(solid(text))))
                        .as(texts.get(i))
                        .isEmpty();
            }
            assertThat(printed).doesNotContain("[[49]]", "Err:5", "#NAME?");
        }
    }
}
