package nappe.deliver.xlsx;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TimeZone;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.calculation.Sheet;
import nappe.formula.Value;
import nappe.results.Results;
import nappe.unit.Unit;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.SheetVisibility;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class XlsxDeliveryTest {
    private static final Results SAMPLE = Sample.results();
    private static final byte[] WORKBOOK = XlsxDelivery.render(SAMPLE);

    @TempDir
    Path folder;

    @Test
    void storedValuesAreThoseThatWereComputed() throws IOException {
        assertThat(Recalculated.disagreements(Recalculated.asStored(file(WORKBOOK)), SAMPLE))
                .isEmpty();
    }

    @Test
    void libreOfficeComputesTheSameFromSpoiltResults() throws IOException {
        Map<String, Object> values = Recalculated.byLibreOffice(file(Spoiler.spoil(WORKBOOK)));
        assertThat(Recalculated.disagreements(values, SAMPLE)).isEmpty();
    }

    @Test
    void gnumericComputesTheSameFromSpoiltResults() throws IOException {
        Map<String, Object> values = Recalculated.byGnumeric(file(Spoiler.spoil(WORKBOOK)));
        assertThat(Recalculated.disagreements(values, SAMPLE)).isEmpty();
    }

    @Test
    void gnumericComputesTheSameFromNoResults() throws IOException {
        Map<String, Object> values = Recalculated.byGnumeric(file(Spoiler.strip(WORKBOOK)));
        assertThat(Recalculated.disagreements(values, SAMPLE)).isEmpty();
    }

    @Test
    void spoilingSpoilsEveryLiveCell() throws IOException {
        long live =
                SAMPLE.cells().stream().filter(cell -> cell.formula() != null).count();
        assertThat(Recalculated.disagreements(Recalculated.asStored(file(Spoiler.spoil(WORKBOOK))), SAMPLE))
                .hasSize((int) live);
    }

    @Test
    void sameResultsGiveTheSameBytesInAnyLocaleAndTimeZone() {
        Locale locale = Locale.getDefault();
        TimeZone zone = TimeZone.getDefault();
        try {
            Locale.setDefault(Locale.GERMANY);
            TimeZone.setDefault(TimeZone.getTimeZone("Asia/Kolkata"));
            assertThat(XlsxDelivery.render(Sample.results())).isEqualTo(WORKBOOK);
        } finally {
            Locale.setDefault(locale);
            TimeZone.setDefault(zone);
        }
    }

    @Test
    void nothingIsHidden() throws IOException {
        try (XSSFWorkbook book = open()) {
            for (int i = 0; i < book.getNumberOfSheets(); i++) {
                XSSFSheet sheet = book.getSheetAt(i);
                assertThat(book.getSheetVisibility(i)).isEqualTo(SheetVisibility.VISIBLE);
                sheet.forEach(row -> assertThat(row.getZeroHeight()).isFalse());
                for (int column = 0; column < 30; column++) {
                    assertThat(sheet.isColumnHidden(column)).isFalse();
                    assertThat(sheet.getColumnWidth(column)).isPositive();
                }
            }
            assertThat(book.getAllNames()).allMatch(name -> !name.getNameName().contains("FilterDatabase"));
        }
    }

    @Test
    void everyNumberThatIsNotTypedIsAFormula() throws IOException {
        List<String> typed = SAMPLE.cells().stream()
                .filter(cell -> cell.kind() != Cell.Kind.FORMULA)
                .map(cell -> cell.place().full())
                .toList();
        List<String> loose = new ArrayList<>();
        try (XSSFWorkbook book = open()) {
            book.forEach(sheet -> sheet.forEach(row -> row.forEach(cell -> {
                String place = new Place(sheet.getSheetName(), cell.getRowIndex(), cell.getColumnIndex()).full();
                if (cell.getCellType() == CellType.NUMERIC && !typed.contains(place)) {
                    loose.add(place);
                }
            })));
        }
        assertThat(loose).isEmpty();
    }

    @Test
    void onlyEntriesCanBeTypedInto() throws IOException {
        try (XSSFWorkbook book = open()) {
            for (Cell cell : SAMPLE.cells()) {
                XSSFCell there = at(book, cell.place());
                assertThat(there.getCellStyle().getLocked()).isEqualTo(cell.kind() != Cell.Kind.ENTRY);
                assertThat(book.getSheet(cell.place().sheet()).getProtect()).isTrue();
            }
        }
    }

    @Test
    void mergedRowsHoldOneTextAndNothingElse() throws IOException {
        try (XSSFWorkbook book = open()) {
            book.forEach(sheet -> sheet.getMergedRegions().forEach(region -> {
                assertThat(region.getFirstRow()).isEqualTo(region.getLastRow());
                for (int column = 0; column < 40; column++) {
                    var cell = sheet.getRow(region.getFirstRow()).getCell(column);
                    CellType expected = column == 0 ? CellType.STRING : CellType.BLANK;
                    assertThat(cell == null ? CellType.BLANK : cell.getCellType())
                            .isEqualTo(expected);
                }
            }));
        }
    }

    @Test
    void textsThatLookLikeFormulasStayTexts() throws IOException {
        try (XSSFWorkbook book = open()) {
            XSSFSheet sheet = book.getSheet("Constants");
            assertThat(sheet.getRow(7).getCell(4).getCellType()).isEqualTo(CellType.STRING);
            assertThat(sheet.getRow(7).getCell(4).getStringCellValue()).isEqualTo("=1+1 stays a text");
            assertThat(book.getSheet("Summary").getRow(6).getCell(0).getStringCellValue())
                    .isEqualTo("the flow _x0041_ itself, a link");
        }
    }

    @Test
    void symbolsHaveRealSubscripts() throws IOException {
        try (XSSFWorkbook book = open()) {
            var symbol = at(book, new Place("F1 Flume", 10, 2)).getRichStringCellValue();
            assertThat(symbol.getString()).isEqualTo("ha");
            assertThat(symbol.numFormattingRuns()).isEqualTo(2);
            assertThat(at(book, new Place("F1 Flume", 17, 2)).getStringCellValue())
                    .isEqualTo("\u03b4z");
        }
    }

    @Test
    void namesLeadToTheCellsOfLines() throws IOException {
        try (XSSFWorkbook book = open()) {
            assertThat(book.getName("F1_01").getRefersToFormula()).isEqualTo("'F1 Flume'!$G$8");
            assertThat(book.getName("F1_07_case_3").getRefersToFormula()).isEqualTo("'F1 Flume'!$J$15");
        }
    }

    @Test
    void propertiesSayWhatThePackageIs() throws IOException {
        try (XSSFWorkbook book = open()) {
            var properties = book.getProperties();
            assertThat(properties.getCoreProperties().getCreated()).isEqualTo("2026-03-14T00:00:00Z");
            assertThat(properties.getCoreProperties().getModified()).isEqualTo("2026-03-14T00:00:00Z");
            assertThat(properties.getCoreProperties().getCreator()).isEqualTo("Made-up Engineers");
            assertThat(properties
                            .getCustomProperties()
                            .getProperty("Input fingerprint")
                            .getLpwstr())
                    .isEqualTo("1f3a 99c0 5e77 0b12");
        }
    }

    @Test
    void marginsFitAndAmpersandsAreDoubled() throws IOException {
        try (XSSFWorkbook book = open()) {
            String head = book.getSheetAt(0).getHeader().getLeft();
            assertThat(head).isEqualTo("&8Project Weaver && Fox pretend works\nCalculation NW-007");
            assertThat(book.getSheetAt(1).getHeader().getRight())
                    .isEqualTo("&8Revision B, for checking\nSheet 2 of 3, page &P of &N");
            book.forEach(sheet -> assertThat(((XSSFSheet) sheet)
                            .getCTWorksheet()
                            .getHeaderFooter()
                            .getOddFooter())
                    .hasSizeLessThan(256)
                    .contains("1f3a 99c0 5e77 0b12"));
        }
    }

    @Test
    void controlCharactersAndOverlongTextsAreRefused() {
        assertThatThrownBy(() -> XlsxDelivery.render(withNote("bell \u0007")))
                .isInstanceOf(IllegalStateException.class)
                .hasMessage("control character U+0007 in: bell ?");
        assertThatThrownBy(() -> XlsxDelivery.render(withNote("x".repeat(32_768))))
                .isInstanceOf(IllegalStateException.class)
                .hasMessageStartingWith("32768 characters, 32767 is the most");
    }

    @Test
    void aCellThatStandsNowhereIsAFault() {
        Cell lost = Cell.typed(Cell.Kind.ENTRY, new Place("Empty", 9, 9), "x", Unit.one(), Value.of(1));
        Results results =
                new Results(Sample.FURNITURE, withNote("note").sheets(), List.of(lost), Map.of(lost, Value.of(1)));
        assertThatThrownBy(() -> XlsxDelivery.render(results)).hasMessage("on no sheet: ['Empty'!J10 (x)]");
    }

    private static Results withNote(String text) {
        Sheet sheet = new Sheet(1, "Empty", "Empty", List.of(new Block.Note(4, text, false)));
        return new Results(Sample.FURNITURE, List.of(sheet), List.of(), Map.of());
    }

    private Path file(byte[] bytes) throws IOException {
        return Files.write(folder.resolve("book.xlsx"), bytes);
    }

    private static XSSFWorkbook open() throws IOException {
        return new XSSFWorkbook(new ByteArrayInputStream(WORKBOOK));
    }

    private static XSSFCell at(XSSFWorkbook book, Place place) {
        return book.getSheet(place.sheet()).getRow(place.row()).getCell(place.column());
    }
}
