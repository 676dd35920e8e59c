package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
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
}
