package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Sheet;
import nappe.deliver.csv.RatingCsv;
import nappe.deliver.pdf.PdfDelivery;
import nappe.formula.Value;
import nappe.results.Digits;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.SheetVisibility;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What a package must hold, and must not, in the workbook, the PDF and the CSV. */
class PackageTest {
    private static final Pattern TEXT = Pattern.compile("\"[^\"]*\"");
    private static final Pattern REFERENCE =
            Pattern.compile("(?:'([^']+)'!)?\\$?([A-Z]{1,3})\\$?(\\d+)(?![\\d(])(?::\\$?([A-Z]{1,3})\\$?(\\d+))?");
    private static final Map<String, PdfPages> PDFS = new HashMap<>();
    private static final Map<String, Map<String, String>> FORMULAS = new HashMap<>();

    @TempDir
    Path folder;

    private static Map<String, String> parts(byte[] workbook) throws IOException {
        Map<String, String> parts = new LinkedHashMap<>();
        try (ZipInputStream in = new ZipInputStream(new ByteArrayInputStream(workbook))) {
            for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                parts.put(entry.getName(), new String(in.readAllBytes(), StandardCharsets.UTF_8));
            }
        }
        return parts;
    }

    private PdfPages pdf(Package sample) throws IOException {
        PdfPages pages = PDFS.get(sample.toString());
        if (pages == null) {
            pages = PdfPages.of(PdfDelivery.render(sample.results()).bytes(), folder);
            PDFS.put(sample.toString(), pages);
        }
        return pages;
    }

    /** The formulas of the workbook by {@code "Sheet!A1"}. */
    private static Map<String, String> formulas(String name) {
        return FORMULAS.computeIfAbsent(name, sample -> formulas(OpenedBooks.of(sample)));
    }

    private static Map<String, String> formulas(XSSFWorkbook book) {
        Map<String, String> formulas = new LinkedHashMap<>();
        book.forEach(sheet -> sheet.forEach(row -> row.forEach(cell -> {
            if (cell.getCellType() == CellType.FORMULA) {
                formulas.put(sheet.getSheetName() + "!" + cell.getAddress(), cell.getCellFormula());
            }
        })));
        return formulas;
    }

    private static List<String> referred(String from, String formula) {
        List<String> cells = new ArrayList<>();
        Matcher matcher = REFERENCE.matcher(TEXT.matcher(formula).replaceAll(""));
        while (matcher.find()) {
            String sheet = matcher.group(1) == null ? from.substring(0, from.indexOf('!')) : matcher.group(1);
            String first = matcher.group(2) + matcher.group(3);
            String last = matcher.group(4) == null ? first : matcher.group(4) + matcher.group(5);
            CellRangeAddress.valueOf(first + ":" + last).forEach(a -> cells.add(sheet + "!" + a));
        }
        return cells;
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void everyNumberIsAnEntryAConstantACitedNumberOrLive(String name) {
        Package sample = Package.ofSample(name);
        Set<String> typed = new LinkedHashSet<>();
        Set<String> live = new LinkedHashSet<>();
        sample.results()
                .cells()
                .forEach(cell -> (cell.kind() == Cell.Kind.FORMULA ? live : typed)
                        .add(cell.place().sheet() + "!" + cell.place().address()));
        XSSFWorkbook book = OpenedBooks.of(name);
        // containsAll of AssertJ would look through all of them once for each cell
        Set<String> missing = new HashSet<>(live);
        missing.removeAll(formulas(name).keySet());
        assertThat(missing).isEmpty();
        book.forEach(sheet -> sheet.forEach(row -> row.forEach(cell -> {
            String address = sheet.getSheetName() + "!" + cell.getAddress();
            assertThat(cell.getCellType()).as(address).isNotIn(CellType.BOOLEAN, CellType.ERROR);
            if (cell.getCellType() == CellType.NUMERIC) {
                assertThat(typed).contains(address);
            }
        })));
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void flowsFoundStandAsIssuedAndNobodyTypesIntoThem(String name) {
        Package sample = Package.ofSample(name);
        List<Cell> found = sample.results().cells().stream()
                .filter(cell -> cell.kind() == Cell.Kind.RERUN
                        && cell.symbol().equals("Q")
                        && cell.place().sheet().equals("Found"))
                .toList();
        assertThat(found).hasSameSizeAs(sample.found().cases()).isNotEmpty();
        XSSFWorkbook book = OpenedBooks.of(name);
        for (Cell cell : found) {
            var there = book.getSheet("Found")
                    .getRow(cell.place().row())
                    .getCell(cell.place().column());
            assertThat(there.getCellType()).isEqualTo(CellType.NUMERIC);
            assertThat(there.getCellStyle().getLocked()).isTrue();
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void nothingIsHidden(String name) throws IOException {
        Package sample = Package.ofSample(name);
        XSSFWorkbook book = OpenedBooks.of(name);
        for (int i = 0; i < book.getNumberOfSheets(); i++) {
            XSSFSheet sheet = book.getSheetAt(i);
            assertThat(book.getSheetVisibility(i)).isEqualTo(SheetVisibility.VISIBLE);
            sheet.forEach(row -> assertThat(row.getZeroHeight() || row.getHeightInPoints() < 3)
                    .isFalse());
            for (int column = 0; column < 60; column++) {
                assertThat(sheet.isColumnHidden(column) || sheet.getColumnWidth(column) < 256)
                        .isFalse();
            }
        }
        assertThat(book.getAllNames()).noneMatch(one -> one.isHidden() || one.isFunctionName());
        assertThat(parts(sample.workbook()).values())
                .noneMatch(part -> part.contains("hidden=\"1\"") || part.contains("eryHidden"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void noMacroNoLinkOutAndNoVolatileFunction(String name) throws IOException {
        Package sample = Package.ofSample(name);
        Map<String, String> parts = parts(sample.workbook());
        assertThat(parts.keySet())
                .noneMatch(part ->
                        part.matches("(?i).*(vba|macro|externalLink|activeX|embedding|connections|queryTable).*"));
        assertThat(parts.get("[Content_Types].xml")).doesNotContainIgnoringCase("macro");
        assertThat(parts.values()).noneMatch(part -> part.contains("TargetMode=\"External\""));
        XSSFWorkbook book = OpenedBooks.of(name);
        assertThat(book.isMacroEnabled()).isFalse();
        assertThat(formulas(name).values())
                .isNotEmpty()
                .allSatisfy(formula -> assertThat(TEXT.matcher(formula).replaceAll(""))
                        .doesNotContainPattern(
                                "\\b(NOW|TODAY|RAND|RANDBETWEEN|OFFSET|INDIRECT|CELL|INFO|EVALUATE|CALL|HYPERLINK|WEBSERVICE)\\(")
                        .doesNotContain("[", "{", "_xl"));
        assertThat(parts.get("xl/workbook.xml")).contains("iterate=\"false\"");
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void noFormulaLeadsBackToItselfOrToAnEmptyCell(String name) {
        Package sample = Package.ofSample(name);
        XSSFWorkbook book = OpenedBooks.of(name);
        Map<String, String> formulas = formulas(name);
        Map<String, List<String>> needs = new LinkedHashMap<>();
        Map<String, List<String>> neededBy = new HashMap<>();
        formulas.forEach((cell, formula) -> {
            List<String> referred = referred(cell, formula);
            needs.put(
                    cell,
                    referred.stream().filter(formulas::containsKey).distinct().toList());
            for (String one : referred) {
                String sheet = one.substring(0, one.indexOf('!'));
                var at = new org.apache.poi.ss.util.CellReference(one.substring(one.indexOf('!') + 1));
                var row = book.getSheet(sheet).getRow(at.getRow());
                assertThat(row == null
                                || row.getCell(at.getCol()) == null
                                || row.getCell(at.getCol()).getCellType() == CellType.BLANK)
                        .as(cell + " =" + formula + " refers to the empty " + one)
                        .isFalse();
            }
        });
        needs.forEach((cell, all) -> all.forEach(
                one -> neededBy.computeIfAbsent(one, key -> new ArrayList<>()).add(cell)));
        Map<String, Integer> open = new HashMap<>();
        needs.forEach((cell, all) -> open.put(cell, all.size()));
        Deque<String> ready = new ArrayDeque<>(
                open.keySet().stream().filter(c -> open.get(c) == 0).toList());
        int done = 0;
        while (!ready.isEmpty()) {
            done++;
            for (String next : neededBy.getOrDefault(ready.pop(), List.of())) {
                if (open.merge(next, -1, Integer::sum) == 0) {
                    ready.push(next);
                }
            }
        }
        assertThat(done).as("formulas that can be computed one after another").isEqualTo(formulas.size());
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void everyNumberOfTheWorkedCaseIsPrintedWithItsWorkbookAddress(String name) throws IOException {
        Package sample = Package.ofSample(name);
        List<String> missing = new ArrayList<>();
        int lines = 0;
        for (Sheet sheet : sample.results().sheets()) {
            String printed = pdf(sample).ofSheet(sheet.number());
            Map<String, String> printedLines = PdfPages.lines(printed);
            for (Block block : sheet.blocks()) {
                if (block instanceof Block.Lines all) {
                    for (Block.Line line : all.lines()) {
                        Cell cell = line.forAll() != null
                                ? line.forAll()
                                : line.perCase().isEmpty()
                                        ? null
                                        : line.perCase().get(all.workedCase());
                        if (cell != null) {
                            lines++;
                            String text = printedLines.getOrDefault(line.code(), "");
                            require(missing, text, line.code(), print(sample, cell));
                            require(
                                    missing,
                                    text,
                                    line.code(),
                                    "cell " + cell.place().address());
                        }
                    }
                }
            }
        }
        assertThat(missing).isEmpty();
        assertThat(lines).isGreaterThan(40);
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void everyNumberOfEveryCaseAndTableIsPrinted(String name) throws IOException {
        Package sample = Package.ofSample(name);
        List<String> missing = new ArrayList<>();
        for (Sheet sheet : sample.results().sheets()) {
            String printed = pdf(sample).ofSheet(sheet.number());
            Map<String, String> printedLines = PdfPages.lines(printed);
            for (Block block : sheet.blocks()) {
                if (block instanceof Block.Lines all) {
                    for (Block.Line line : all.lines()) {
                        String text = printedLines.getOrDefault(line.code(), "");
                        printed(all, line).forEach(cell -> require(missing, text, line.code(), print(sample, cell)));
                    }
                } else if (block instanceof Block.Table table) {
                    printed(table, sample)
                            .forEach(row -> row.items().forEach(item -> {
                                if (item instanceof Block.Content content
                                        && sample.results().value(content.cell()) instanceof Value.Number) {
                                    require(missing, printed, content.cell().toString(), print(sample, content.cell()));
                                }
                            }));
                }
            }
        }
        assertThat(missing).isEmpty();
    }

    /**
     * The cases of a line that the PDF shows: of a step on the way the case worked in full, of a verdict that case here
     * and every case on the sheet of limits.
     */
    static List<Cell> printed(Block.Lines all, Block.Line line) {
        boolean workedOnly = line.kind() == Block.LineKind.STEP || line.kind() == Block.LineKind.LIMIT_VERDICT;
        if (line.perCase().isEmpty()) {
            return List.of();
        }
        return workedOnly
                ? List.of(line.perCase().get(all.workedCase()))
                : line.perCase().subList(0, all.printed());
    }

    /** The rows that the PDF shows: of a table that is looked up by a word, those in use. */
    static List<Block.Row> printed(Block.Table table, Package sample) {
        List<Value> keys =
                table.keys().stream().map(key -> sample.results().value(key)).toList();
        return table.rows().stream()
                .filter(row -> keys.isEmpty()
                        || row.items().get(0) instanceof Block.Content first
                                && keys.contains(sample.results().value(first.cell())))
                .toList();
    }

    private static String print(Package sample, Cell cell) {
        Value value = sample.results().value(cell);
        if (value instanceof Value.Number number) {
            return cell.isComputed() ? Digits.print(cell.unit(), number.value()) : Digits.asTyped(number.value());
        }
        return value instanceof Value.Word word ? word.text() : ((Value.None) value).why();
    }

    /** Long words run on to the next line beside other columns, so only the first of them is one piece. */
    private static void require(List<String> missing, String text, String what, String printed) {
        if (!PdfPages.holds(
                text,
                printed.length() < 20 || printed.indexOf(' ') < 0
                        ? printed
                        : printed.substring(0, printed.indexOf(' ')))) {
            missing.add(what + ": " + printed);
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void pdfAndWorkbookCarryTheSameSheets(String name) throws IOException {
        Package sample = Package.ofSample(name);
        PdfPages pages = pdf(sample);
        int count = sample.results().sheets().size();
        String fingerprint = sample.results().furniture().fingerprint();
        XSSFWorkbook book = OpenedBooks.of(name);
        assertThat(book.getNumberOfSheets()).isEqualTo(count);
        for (Sheet sheet : sample.results().sheets()) {
            XSSFSheet there = book.getSheetAt(sheet.number() - 1);
            assertThat(there.getSheetName()).isEqualTo(sheet.name());
            String head = there.getRow(0).getCell(0).getStringCellValue();
            assertThat(head).isEqualTo("Sheet " + sheet.number() + " of " + count + "   " + sheet.title());
            assertThat(there.getRow(1).getCell(0).getStringCellValue())
                    .contains(
                            "Calculation " + sample,
                            "Revision " + sample.results().furniture().revision());
            assertThat(there.getRow(2).getCell(0).getStringCellValue()).contains(fingerprint);
            assertThat(there.getFooter().getLeft()
                            + there.getFooter().getCenter()
                            + there.getFooter().getRight())
                    .contains(fingerprint);
            String printed = pages.ofSheet(sheet.number());
            assertThat(PdfPages.holds(printed, "Sheet " + sheet.number() + " of " + count))
                    .as(head)
                    .isTrue();
            assertThat(printed.replaceAll("\\s+", " ")).contains(sheet.title().replaceAll("\\s+", " "));
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void everyPageHasItsCautionsAndItsPlace(String name) throws IOException {
        Package sample = Package.ofSample(name);
        List<String> pages = pdf(sample).all();
        int count = sample.results().sheets().size();
        int page = 0;
        for (String text : pages) {
            page++;
            String flat = text.replaceAll("\\s+", " ");
            assertThat(flat)
                    .contains(
                            "page " + page + " of " + pages.size(),
                            sample.toString(),
                            sample.results().furniture().status(),
                            sample.results().furniture().fingerprint());
            assertThat(PdfPages.sheetOf(text)).endsWith(" of " + count);
            // a caution that runs on stands in the left of two columns, so only its beginning is one piece
            sample.results()
                    .furniture()
                    .cautions()
                    .forEach(caution -> assertThat(flat).as("page " + flat).contains(caution.substring(0, 60)));
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void nothingThatIsNoNumberIsShown(String name) throws IOException {
        Package sample = Package.ofSample(name);
        Pattern wrong = Pattern.compile(
                "\\bNaN\\b|Infinity|#VALUE!|#DIV/0!|#N/A|#REF!|#NAME\\?|#NUM!|\\bnull\\b|<v>-0(?:\\.0+)?<|(?<=[\\s,;])-0(?:\\.0+)?(?=[\\s,;])|\\bnappe\\.[a-z]+\\.|\\$\\{");
        Stream<String> workbook = parts(sample.workbook()).entrySet().stream()
                .filter(part -> part.getKey().matches("xl/(worksheets/sheet.*|sharedStrings|workbook)\\.xml"))
                .map(Map.Entry::getValue);
        List<String> texts = new ArrayList<>(workbook.toList());
        assertThat(texts).hasSizeGreaterThan(10);
        texts.addAll(pdf(sample).all());
        sample.ratings().values().forEach(table -> texts.add(RatingCsv.write(sample.results(), table)));
        for (String text : texts) {
            assertThat(wrong.matcher(text)
                            .results()
                            .map(m -> around(text, m.start()))
                            .toList())
                    .isEmpty();
        }
    }

    private static String around(String text, int at) {
        return text.substring(Math.max(0, at - 40), Math.min(text.length(), at + 40));
    }
}
