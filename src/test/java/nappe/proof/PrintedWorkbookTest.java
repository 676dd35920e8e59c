package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.calculation.Run;
import nappe.calculation.Sheet;
import nappe.formula.Value;
import org.apache.poi.ss.usermodel.DataValidationConstraint.OperatorType;
import org.apache.poi.ss.usermodel.DataValidationConstraint.ValidationType;
import org.apache.poi.ss.util.CellAddress;
import org.apache.poi.xssf.usermodel.XSSFChart;
import org.apache.poi.xssf.usermodel.XSSFDataValidation;
import org.apache.poi.xssf.usermodel.XSSFHyperlink;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.openxmlformats.schemas.drawingml.x2006.chart.CTNumRef;
import org.openxmlformats.schemas.drawingml.x2006.chart.CTNumVal;
import org.openxmlformats.schemas.drawingml.x2006.chart.CTScatterSer;

/** What an issued workbook holds beside its cells: the chart of a rating, checks on what is typed, links, ends of pages. */
class PrintedWorkbookTest {
    private static XSSFChart chart(XSSFWorkbook book, String sheet) {
        List<XSSFChart> charts = book.getSheet(sheet).getDrawingPatriarch().getCharts();
        assertThat(charts).hasSize(1);
        return charts.get(0);
    }

    private static Block.Chart laid(Package sample, String sheet) {
        return sheet(sample, sheet).blocks().stream()
                .filter(Block.Chart.class::isInstance)
                .map(Block.Chart.class::cast)
                .findFirst()
                .orElseThrow();
    }

    private static Sheet sheet(Package sample, String name) {
        return sample.results().sheets().stream()
                .filter(s -> s.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    @ParameterizedTest
    @CsvSource({
        "headworks.xlsx, F1 rating, flow [ft3/s], head [ft]",
        "return-weir.xlsx, W1 rating, flow [m3/s], head [m]"
    })
    void chartRefersToTheCellsAndShowsWhatWasComputed(String name, String sheet, String across, String up) {
        Package sample = Package.ofSample(name);
        Block.Chart laid = laid(sample, sheet);
        assertThat(List.of(laid.across(), laid.up())).containsExactly(across, up);
        XSSFWorkbook book = OpenedBooks.of(name);
        XSSFChart chart = chart(book, sheet);
        List<CTScatterSer> drawn =
                chart.getCTChart().getPlotArea().getScatterChartList().get(0).getSerList();
        assertThat(drawn).hasSize(2).hasSameSizeAs(laid.series());
        for (int i = 0; i < drawn.size(); i++) {
            holds(
                    sample,
                    drawn.get(i).getXVal().getNumRef(),
                    laid.series().get(i).across());
            holds(
                    sample,
                    drawn.get(i).getYVal().getNumRef(),
                    laid.series().get(i).up());
        }
        String xml = chart.getCTChart().xmlText();
        assertThat(xml).contains(across, up, "sourceLinked=\"false\"").doesNotContain("#N/A");
    }

    private static void holds(Package sample, CTNumRef drawn, Run run) {
        assertThat(drawn.getF()).isEqualTo(run.fixedFrom(""));
        List<Double> stored = drawn.getNumCache().getPtList().stream()
                .map(CTNumVal::getV)
                .map(Double::valueOf)
                .toList();
        List<Double> computed = run.cells().stream()
                .map(cell -> ((Value.Number) sample.results().value(cell)).value())
                .toList();
        assertThat(stored).isEqualTo(computed);
    }

    @Test
    void caseWithoutAHeadIsMarkedAtTheOrigin() {
        Package sample = Package.ofSample("headworks.xlsx");
        Block.Series marks = laid(sample, "F1 rating").series().get(1);
        List<Value> heads = values(sample, marks.up());
        List<Value> flows = values(sample, marks.across());
        assertThat(heads).allMatch(Value.Number.class::isInstance).contains(Value.of(0));
        for (int i = 0; i < heads.size(); i++) {
            assertThat(heads.get(i).equals(Value.of(0))).isEqualTo(flows.get(i).equals(Value.of(0)));
        }
    }

    private static List<Value> values(Package sample, Run run) {
        return run.cells().stream().map(sample.results()::value).toList();
    }

    @Test
    void noPageEndsInsideAChart() {
        for (String name : List.of("headworks.xlsx", "return-weir.xlsx")) {
            Package sample = Package.ofSample(name);
            XSSFWorkbook book = OpenedBooks.of(name);
            for (Sheet sheet : sample.results().sheets()) {
                for (Block block : sheet.blocks()) {
                    if (block instanceof Block.Chart chart) {
                        for (int end : book.getSheet(sheet.name()).getRowBreaks()) {
                            assertThat(end < chart.row() || end >= chart.row() + chart.rows() - 1)
                                    .as("page of %s ends after row %d", sheet.name(), end)
                                    .isTrue();
                        }
                    }
                }
            }
        }
    }

    @Test
    void aSizeIsChosenFromTheCitedTable() {
        Package sample = Package.ofSample("headworks.xlsx");
        Cell size = entry(sample, "size");
        XSSFWorkbook book = OpenedBooks.of("headworks.xlsx");
        XSSFDataValidation check = check(book, size.place());
        assertThat(check.getValidationConstraint().getValidationType()).isEqualTo(ValidationType.LIST);
        // true where the arrow is shown
        assertThat(check.getSuppressDropDownArrow()).isTrue();
        String range = check.getValidationConstraint().getFormula1();
        List<String> words = sample.results().cells().stream()
                .filter(cell -> cell.kind() == Cell.Kind.TABLE
                        && cell.place().sheet().equals("Tables")
                        && cell.place().column() == 0
                        && cell.typed() instanceof Value.Word)
                .filter(cell -> within(range, cell.place()))
                .map(cell -> ((Value.Word) cell.typed()).text())
                .toList();
        assertThat(words)
                .hasSizeGreaterThan(30)
                .contains("1 in", "3 ft", "50 ft", "0.9 m")
                .doesNotHaveDuplicates();
        assertThat(range)
                .startsWith("'Tables'!$A$")
                .isEqualTo("'Tables'!$A$" + range.replaceAll(".*\\$A\\$(\\d+):.*", "$1") + ":$A$"
                        + (Integer.parseInt(range.replaceAll(".*\\$A\\$(\\d+):.*", "$1")) + words.size() - 1));
    }

    private static boolean within(String range, Place place) {
        String[] ends = range.replaceAll(".*!", "").replace("$A$", "").split(":");
        int row = place.row() + 1;
        return row >= Integer.parseInt(ends[0]) && row <= Integer.parseInt(ends[1]);
    }

    @ParameterizedTest
    @CsvSource({
        "headworks.xlsx, z_f, BETWEEN",
        "return-weir.xlsx, b, GREATER_THAN",
        "return-weir.xlsx, z_c, BETWEEN",
        "return-weir.xlsx, Q, GREATER_OR_EQUAL",
        "return-weir.xlsx, z, BETWEEN"
    })
    void aNumberIsTypedWithItsSign(String name, String symbol, String operator) throws Exception {
        Package sample = Package.ofSample(name);
        XSSFWorkbook book = OpenedBooks.of(name);
        XSSFDataValidation check = check(book, entry(sample, symbol).place());
        assertThat(check.getValidationConstraint().getValidationType()).isEqualTo(ValidationType.DECIMAL);
        assertThat(check.getValidationConstraint().getOperator())
                .isEqualTo(OperatorType.class.getField(operator).getInt(null));
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void everyEntryButANameIsChecked(String name) {
        Package sample = Package.ofSample(name);
        XSSFWorkbook book = OpenedBooks.of(name);
        for (Cell cell : sample.results().cells()) {
            boolean isName = cell.symbol().isEmpty();
            if (cell.kind() == Cell.Kind.ENTRY && !isName) {
                check(book, cell.place());
            }
        }
    }

    private static Cell entry(Package sample, String symbol) {
        return sample.results().cells().stream()
                .filter(cell -> cell.kind() == Cell.Kind.ENTRY && cell.symbol().equals(symbol))
                .findFirst()
                .orElseThrow();
    }

    private static XSSFDataValidation check(XSSFWorkbook book, Place place) {
        List<XSSFDataValidation> found = book.getSheet(place.sheet()).getDataValidations().stream()
                .filter(check -> Stream.of(check.getRegions().getCellRangeAddresses())
                        .anyMatch(range -> range.isInRange(place.row(), place.column())))
                .toList();
        assertThat(found).as("checks on " + place.full()).hasSize(1);
        return found.get(0);
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void linksLeadToTheIndexAndBackAndToWhereALineComesFrom(String name) {
        Package sample = Package.ofSample(name);
        XSSFWorkbook book = OpenedBooks.of(name);
        List<String> fromIndex = targets(book.getSheet("Index"));
        for (int i = 0; i < book.getNumberOfSheets(); i++) {
            XSSFSheet sheet = book.getSheetAt(i);
            assertThat(fromIndex).contains("'" + sheet.getSheetName() + "'!A1");
            if (!sheet.getSheetName().equals("Index")) {
                assertThat(sheet.getHyperlink(new CellAddress("A1")).getLocation())
                        .isEqualTo("'Index'!A1");
            }
            for (String target : targets(sheet)) {
                assertThat(book.getSheet(target.replaceAll("^'(.*)'!.*$", "$1")))
                        .as(target)
                        .isNotNull();
            }
        }
        String element = sample.design().elements().get(0).tag();
        assertThat(targets(book.getSheet("Limits")))
                .filteredOn(to -> to.startsWith("'" + element + "'!"))
                .hasSizeGreaterThan(5);
        assertThat(targets(book.getSheet(element))).anyMatch(to -> to.startsWith("'Entries'!"));
        if (name.equals("return-weir.xlsx")) {
            assertThat(targets(book.getSheet(element))).anyMatch(to -> to.startsWith("'Trials'!"));
        }
    }

    private static List<String> targets(XSSFSheet sheet) {
        List<String> targets = new ArrayList<>();
        for (XSSFHyperlink link : sheet.getHyperlinkList()) {
            targets.add(link.getLocation());
        }
        return targets;
    }
}
