package nappe.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import nappe.input.SampleStations;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class MarkedOptionTest {
    @TempDir
    Path folder;

    private String run(String... args) {
        StringWriter err = new StringWriter();
        int status = Nappe.run(args, new PrintWriter(new StringWriter()), new PrintWriter(err, true));
        return status + "\n" + err;
    }

    private Path faulty() throws IOException {
        return SampleStations.headworks().set("Flows", "D13", "12,5").save(folder.resolve("faulty.xlsx"));
    }

    @Test
    void aRefusedWorkbookComesBackWithANoteOnTheFaultyCell() throws IOException {
        Path copy = folder.resolve("copy.xlsx");
        assertThat(run(
                        "issue",
                        faulty().toString(),
                        "-o",
                        folder.resolve("out").toString(),
                        "--marked",
                        copy.toString()))
                .startsWith("3\n")
                .contains("1 cell marked", "1 fault; no package was written.");
        try (XSSFWorkbook marked = new XSSFWorkbook(new ByteArrayInputStream(Files.readAllBytes(copy)))) {
            assertThat(marked.getSheet("Flows")
                            .getRow(12)
                            .getCell(3)
                            .getCellComment()
                            .getString()
                            .getString())
                    .contains("write 12.5");
        }
        assertThat(folder.resolve("out")).doesNotExist();
    }

    @Test
    void aFileThatIsThereIsNotWrittenOver() throws IOException {
        Path copy = Files.writeString(folder.resolve("copy.xlsx"), "mine");
        assertThat(run("inspect", faulty().toString(), "--marked", copy.toString()))
                .contains("is there already");
        assertThat(copy).hasContent("mine");
    }

    @Test
    void aSoundWorkbookLeavesNoCopy() throws IOException {
        Path copy = folder.resolve("copy.xlsx");
        Path sound = SampleStations.headworks().save(folder.resolve("sound.xlsx"));
        assertThat(run("inspect", sound.toString(), "--marked", copy.toString()))
                .startsWith("0\n");
        assertThat(copy).doesNotExist();
    }
}
