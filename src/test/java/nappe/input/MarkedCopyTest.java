package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.usermodel.XSSFClientAnchor;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class MarkedCopyTest {
    @TempDir
    Path folder;

    @Test
    void eachFaultyCellCarriesANoteAndTheInputIsUntouched() throws IOException {
        Path file = Samples.filled()
                .set("F1", "C9", "4 ft")
                .set("F1", "D9", "psi")
                .set("Flows", "D9", "12,5")
                .save(folder.resolve("headworks.xlsx"));
        byte[] before = Files.readAllBytes(file);
        Path copy = folder.resolve("headworks-marked.xlsx");
        InputRefused refused = catchThrowableOfType(InputRefused.class, () -> InputReader.read(file, Samples.METHODS));

        assertThat(MarkedCopy.write(file, copy, refused.faults())).isEqualTo(new MarkedCopy.Outcome(3, "Faults", null));

        assertThat(Files.readAllBytes(file)).isEqualTo(before);
        try (XSSFWorkbook workbook = new XSSFWorkbook(Files.newInputStream(copy))) {
            assertThat(workbook.getSheet("Flows")
                            .getRow(8)
                            .getCell(3)
                            .getCellComment()
                            .getString()
                            .getString())
                    .isEqualTo("\"12,5\" is not a number; write 12.5 (fault: number-expected)");
            assertThat(workbook.getSheet("F1").getCellComments()).hasSize(2);
        }
        InputRefused again = catchThrowableOfType(InputRefused.class, () -> InputReader.read(copy, Samples.METHODS));
        assertThat(again.faults())
                .extracting(Fault::message)
                .isEqualTo(refused.faults().stream().map(Fault::message).toList());
    }

    @Test
    void faultOfTheWholeFileMakesNoCopy() throws IOException {
        Path copy = folder.resolve("copy.xlsx");
        assertThat(MarkedCopy.write(
                                folder.resolve("none.xlsx"),
                                copy,
                                List.of(new Fault("none.xlsx", null, null, "x", "y")))
                        .written())
                .isFalse();
        assertThat(copy).doesNotExist();
    }

    private static final String FLOWS = "xl/worksheets/sheet2.xml";

    private InputRefused refused(Path file) {
        return catchThrowableOfType(InputRefused.class, () -> InputReader.read(file, Samples.METHODS));
    }

    /** Refused files that can be opened, by what is wrong with them, and how many cells that concerns. */
    private static Map<String, Integer> openable(Path folder) throws IOException {
        String cell = "<c r=\"D9\" s=\"7\" t=\"n\"><v>1.5</v></c>";
        Samples.filled()
                .set("F1", "D9", "psi")
                .set("Flows", "D9", "12,5")
                .set("Project", "B14", "draft")
                .save(folder.resolve("typed.xlsx"));
        Samples.filled()
                .change(w -> w.setSheetHidden(w.getSheetIndex("F1"), true))
                .save(folder.resolve("hidden sheet.xlsx"));
        Samples.filled()
                .change(w -> w.getSheet("F1").getRow(8).setZeroHeight(true))
                .save(folder.resolve("hidden row.xlsx"));
        Samples.filled()
                .change(w -> w.getSheet("F1").addMergedRegion(CellRangeAddress.valueOf("E8:E9")))
                .save(folder.resolve("merged.xlsx"));
        Samples.filled()
                .change(w -> w.removeSheetAt(w.getSheetIndex("Demands")))
                .save(folder.resolve("sheet missing.xlsx"));
        Samples.filled()
                .set("Flows", "D9", "12,5")
                .change(w -> {
                    XSSFSheet sheet = w.getSheet("Flows");
                    var note = sheet.createDrawingPatriarch()
                            .createCellComment(new XSSFClientAnchor(0, 0, 0, 0, 4, 8, 6, 12));
                    note.setString("of the engineer");
                    sheet.getRow(8).getCell(3).setCellComment(note);
                })
                .save(folder.resolve("with a note.xlsx"));
        Zips.sound()
                .change(FLOWS, s -> s.replace(cell, cell.replace("1.5", "abc")))
                .save(folder.resolve("number.xlsx"));
        return new TreeMap<>(Map.of(
                "typed.xlsx", 3,
                "hidden sheet.xlsx", 0,
                "hidden row.xlsx", 1,
                "merged.xlsx", 1,
                "sheet missing.xlsx", 0,
                "with a note.xlsx", 1,
                "number.xlsx", 1));
    }

    @Test
    void everythingElseIsUntouched() throws IOException {
        for (Map.Entry<String, Integer> kind : openable(folder).entrySet()) {
            Path file = folder.resolve(kind.getKey());
            byte[] before = Files.readAllBytes(file);
            Path copy = folder.resolve("copy of " + kind.getKey());
            InputRefused refused = refused(file);
            assertThat(MarkedCopy.write(file, copy, refused.faults()))
                    .as(kind.getKey())
                    .isEqualTo(new MarkedCopy.Outcome(kind.getValue(), "Faults", null));
            assertThat(file).hasBinaryContent(before);
            assertThat(refused(copy)).as(kind.getKey()).isNotNull();
            assertThat(refused(copy).faults())
                    .as(kind.getKey())
                    .extracting(Fault::message)
                    .isEqualTo(refused.faults().stream().map(Fault::message).toList());
            assertListed(copy, refused.faults());
            assertUntouched(Zips.of(before), Zips.of(Files.readAllBytes(copy)), kind.getKey());
        }
    }

    private static void assertListed(Path copy, List<Fault> faults) throws IOException {
        try (XSSFWorkbook workbook = new XSSFWorkbook(Files.newInputStream(copy))) {
            XSSFSheet list = workbook.getSheet("Faults");
            assertThat(workbook.getSheetIndex(list)).isEqualTo(workbook.getNumberOfSheets() - 1);
            for (int i = 0; i < faults.size(); i++) {
                assertThat(list.getRow(4 + i).getCell(2))
                        .hasToString(faults.get(i).message());
                assertThat(list.getRow(4 + i).getCell(3))
                        .hasToString(faults.get(i).code());
            }
            assertThat(list.getLastRowNum()).isEqualTo(3 + faults.size());
        }
    }

    /** Each part is as it was, but for what the notes and the list need. */
    private static void assertUntouched(Zips before, Zips after, String kind) {
        for (String part : before.names()) {
            String was = before.text(part);
            String is = after.text(part);
            if (part.startsWith("xl/worksheets/sheet")) {
                assertThat(bare(is)).as(kind + " " + part).isEqualTo(bare(was));
            } else if (part.equals("xl/sharedStrings.xml") || part.equals("xl/styles.xml")) {
                for (String list : List.of("si", "xf", "font", "fill", "border", "numFmt")) {
                    assertThat(elements(is, list))
                            .as(kind + " " + part)
                            .startsWith(elements(was, list).toArray(String[]::new));
                }
            } else if (part.equals("xl/workbook.xml")) {
                assertThat(is.replaceFirst("<sheet name=\"Faults\"[^>]*/>", ""))
                        .as(kind)
                        .isEqualTo(was);
            } else if (part.startsWith("docProps")) {
                assertThat(bare(is)).as(kind + " " + part).isEqualTo(bare(was));
            }
        }
    }

    private static String bare(String sheet) {
        return sheet.replaceAll("<(legacyDrawing|drawing) [^>]*/>", "")
                .replaceAll("<\\?xml[^>]*\\?>\\s*", "")
                .replaceAll(" xmlns:r=\"[^\"]*\"", "");
    }

    private static List<String> elements(String text, String name) {
        return Pattern.compile("<" + name + "(?: [^>]*?)?(?:/>|>.*?</" + name + ">)")
                .matcher(text)
                .results()
                .map(MatchResult::group)
                .toList();
    }

    @Test
    void aNoteOfTheEngineerStandsBeforeOurs() throws IOException {
        openable(folder);
        Path file = folder.resolve("with a note.xlsx");
        Path copy = folder.resolve("copy.xlsx");
        MarkedCopy.write(file, copy, refused(file).faults());
        try (XSSFWorkbook workbook = new XSSFWorkbook(Files.newInputStream(copy))) {
            assertThat(workbook.getSheet("Flows")
                            .getRow(8)
                            .getCell(3)
                            .getCellComment()
                            .getString()
                            .getString())
                    .isEqualTo("of the engineer\n\"12,5\" is not a number; write 12.5 (fault: number-expected)");
        }
    }

    @Test
    void whatCannotBeOpenedOrIsOversizedGetsTheMessageAlone() throws IOException {
        String cell = "<c r=\"D9\" s=\"7\" t=\"n\"><v>1.5</v></c>";
        String filler = "<row r=\"2000\">" + "<c s=\"1\"/>".repeat(16_000) + "</row>";
        StringBuilder large = new StringBuilder();
        for (int i = 2000; i < 2090; i++) {
            large.append(filler.replace("2000", String.valueOf(i)));
        }
        Map<String, Zips> files = new TreeMap<>();
        files.put("twice", Zips.sound().change(FLOWS, s -> s.replace(cell, cell + cell)));
        files.put("wild", Zips.sound().change(FLOWS, s -> s.replace(cell, cell.replace("D9", "ZZZZ9"))));
        files.put("style", Zips.sound().change(FLOWS, s -> s.replace(cell, cell.replace("\"7\"", "\"999\""))));
        files.put("macros", Zips.sound().with("xl/vbaProject.bin", "x"));
        files.put("no part", Zips.sound().without(FLOWS));
        files.put(
                "large",
                Zips.sound()
                        .change(
                                FLOWS,
                                s -> s.replace(cell, cell.replace("1.5", "abc"))
                                        .replace("</sheetData>", large + "</sheetData>")));
        files.put(
                "odd elsewhere",
                Zips.sound()
                        .change(FLOWS, s -> s.replace(cell, cell.replace("1.5", "abc")))
                        .with("docProps/core.xml", "<!DOCTYPE x [<!ENTITY a \"a\">]><x>&a;</x>"));
        for (Map.Entry<String, Zips> one : files.entrySet()) {
            Path file = one.getValue().save(folder.resolve(one.getKey() + ".xlsx"));
            Path copy = folder.resolve("copy.xlsx");
            assertThat(MarkedCopy.write(file, copy, refused(file).faults()).why())
                    .as(one.getKey())
                    .isNotNull();
            assertThat(copy).doesNotExist();
        }
    }
}
