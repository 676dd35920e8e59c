package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.TimeZone;
import nappe.input.BlankWriter.Chosen;
import nappe.unit.WorkingSystem;
import org.apache.poi.xssf.usermodel.XSSFDataValidation;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class BlankWriterTest {
    @TempDir
    Path folder;

    private static XSSFWorkbook open(byte[] bytes) throws IOException {
        return new XSSFWorkbook(new ByteArrayInputStream(bytes));
    }

    @Test
    void sheetsStandInTheirOrderAndNoneIsHidden() throws IOException {
        try (XSSFWorkbook workbook = open(Samples.blank())) {
            assertThat(workbook)
                    .extracting(org.apache.poi.ss.usermodel.Sheet::getSheetName)
                    .containsExactly(
                            "Project",
                            "Flows",
                            "Tailwater curve",
                            "Combinations",
                            "F1",
                            "R1",
                            "Demands",
                            "Assumptions",
                            "References",
                            "Requirements",
                            "Revisions",
                            "Lists");
            for (int i = 0; i < workbook.getNumberOfSheets(); i++) {
                assertThat(workbook.getSheetVisibility(i))
                        .isEqualTo(org.apache.poi.ss.usermodel.SheetVisibility.VISIBLE);
                assertThat(workbook.getSheetAt(i).getProtect()).isTrue();
                assertThat(workbook.getSheetAt(i)
                                .getCTWorksheet()
                                .getSheetProtection()
                                .isSetPassword())
                        .isFalse();
            }
        }
    }

    @Test
    void sameArgumentsGiveTheSameBytesInAnyLocaleAndZone() {
        byte[] here = Samples.blank();
        Locale locale = Locale.getDefault();
        TimeZone zone = TimeZone.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("ar-EG-u-nu-arab"));
            TimeZone.setDefault(TimeZone.getTimeZone("Pacific/Kiritimati"));
            assertThat(Samples.blank()).isEqualTo(here);
        } finally {
            Locale.setDefault(locale);
            TimeZone.setDefault(zone);
        }
    }

    @Test
    void everyEntryOffersItsUnitsOrTakesOnlyNumbersOfItsSign() throws IOException {
        try (XSSFWorkbook workbook = open(Samples.blank())) {
            assertThat(offered(workbook, "F1", 6, 2)).containsExactly("1", "2", "3 ft");
            assertThat(offered(workbook, "F1", 8, 3))
                    .contains("ft", "m", "in", "mm")
                    .doesNotContain("psi");
            assertThat(offered(workbook, "F1", 10, 3)).containsExactly("%", "1");
            assertThat(offered(workbook, "F1", 11, 3)).containsExactly("deg", "rad");
            assertThat(offered(workbook, "Flows", 8, 4)).contains("MGD", "gpm", "ft3/s", "m3/s", "L/s");
            assertThat(offered(workbook, "F1", 8, 5)).containsExactly("known", "assumed");
            assertThat(validation(workbook.getSheet("F1"), 8, 2)
                            .getValidationConstraint()
                            .getFormula1())
                    .isEqualTo("0");
        }
    }

    @Test
    void unitsComeInTheWorkingSystem() throws IOException {
        try (XSSFWorkbook us = open(Samples.blank());
                XSSFWorkbook si = open(BlankWriter.bytes(WorkingSystem.SI, Samples.ELEMENTS, Samples.METHODS))) {
            assertThat(us.getSheet("F1").getRow(8).getCell(3).getStringCellValue())
                    .isEqualTo("ft");
            assertThat(si.getSheet("F1").getRow(8).getCell(3).getStringCellValue())
                    .isEqualTo("m");
        }
    }

    @Test
    void onlyEntryCellsAreUnlocked() throws IOException {
        try (XSSFWorkbook workbook = open(Samples.blank())) {
            XSSFSheet sheet = workbook.getSheet("F1");
            assertThat(sheet.getRow(8).getCell(0).getCellStyle().getLocked()).isTrue();
            assertThat(sheet.getRow(8).getCell(2).getCellStyle().getLocked()).isFalse();
            assertThat(sheet.getRow(8).getCell(2).getCellStyle().getBorderLeft())
                    .isEqualTo(org.apache.poi.ss.usermodel.BorderStyle.MEDIUM);
            assertThat(sheet.getRow(6).getCell(3).getCellStyle().getLocked())
                    .as("unit of a choice")
                    .isTrue();
        }
    }

    @Test
    void everySheetButListsCarriesTheCaution() throws IOException {
        try (XSSFWorkbook workbook = open(Samples.blank())) {
            for (var sheet : workbook) {
                boolean there = false;
                for (var row : sheet) {
                    there |= row.getCell(0) != null && row.getCell(0).toString().equals(BlankSheet.CAUTION);
                }
                assertThat(there || sheet.getSheetName().equals("Lists"))
                        .as(sheet.getSheetName())
                        .isTrue();
            }
        }
    }

    @Test
    void fileThatIsThereIsNotWrittenOver() throws IOException {
        Path file = Files.writeString(folder.resolve("filled.xlsx"), "precious");
        assertThatThrownBy(() -> BlankWriter.write(file, WorkingSystem.SI, Samples.ELEMENTS, Samples.METHODS))
                .isInstanceOf(FileAlreadyExistsException.class);
        assertThat(file).hasContent("precious");
    }

    @Test
    void oddTagsAndUnknownMethodsAreRefused() {
        assertThatThrownBy(() -> write(new Chosen("flume1", "trough")))
                .hasMessage(
                        "\"flume1\" is not a tag; write one capital letter and up to seven capitals or digits: FLUME1");
        assertThatThrownBy(() -> write(new Chosen("F1", "trugh")))
                .hasMessage("\"trugh\" is not a known method; did you mean trough?");
        assertThatThrownBy(() -> write(new Chosen("F1", "trough"), new Chosen("F1", "reach")))
                .hasMessage("the tag F1 is given twice");
        assertThatThrownBy(() -> write(new Chosen("FLOWS", "trough")))
                .hasMessage("\"FLOWS\" can't be a tag, because a sheet has that name; write another: F1");
        assertThatThrownBy(this::write).hasMessage("no element is given; name at least one");
    }

    private void write(Chosen... elements) throws IOException {
        BlankWriter.bytes(WorkingSystem.SI, List.of(elements), Samples.METHODS);
    }

    private static XSSFDataValidation validation(XSSFSheet sheet, int row, int column) {
        return sheet.getDataValidations().stream()
                .filter(v -> v.getRegions().getCellRangeAddresses()[0].isInRange(row, column))
                .findFirst()
                .orElseThrow();
    }

    private static List<String> offered(XSSFWorkbook workbook, String sheet, int row, int column) {
        String range = validation(workbook.getSheet(sheet), row, column)
                .getValidationConstraint()
                .getFormula1();
        var area = new org.apache.poi.ss.util.AreaReference(range, workbook.getSpreadsheetVersion());
        return java.util.Arrays.stream(area.getAllReferencedCells())
                .map(c -> workbook.getSheet("Lists")
                        .getRow(c.getRow())
                        .getCell(c.getCol())
                        .getStringCellValue())
                .toList();
    }
}
