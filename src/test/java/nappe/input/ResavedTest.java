package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import nappe.station.Design;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What an engineer saves from a spreadsheet program reads the same as what was written. */
class ResavedTest {
    private static final int SECONDS = 120;

    @TempDir
    Path folder;

    @Test
    void savedByLibreOfficeReadsTheSame() throws IOException, InterruptedException {
        Path out = Files.createDirectory(folder.resolve("out"));
        run(
                "soffice",
                "-env:UserInstallation=file://" + folder.resolve("profile"),
                "--headless",
                "--convert-to",
                "xlsx",
                "--outdir",
                out.toString(),
                original().toString());
        assertReadsTheSame(out.resolve("station.xlsx"));
    }

    @Test
    void savedByGnumericReadsTheSame() throws IOException, InterruptedException {
        Path out = Files.createDirectory(folder.resolve("out")).resolve("station.xlsx");
        run("ssconvert", original().toString(), out.toString());
        assertReadsTheSame(out);
    }

    private Path original() throws IOException {
        return withFormula().save(folder.resolve("station.xlsx"));
    }

    /** One entry is a formula with its value, as engineers do. */
    private static Filler withFormula() {
        return Samples.filled().change(workbook -> {
            var cell = workbook.getSheet("R1").getRow(6).getCell(2);
            cell.setCellFormula("100+20");
            cell.setCellValue(120);
        });
    }

    private void assertReadsTheSame(Path saved) throws IOException {
        Design written = InputReader.read(original(), Samples.METHODS);
        assertThat(InputReader.read(saved, Samples.METHODS)).isEqualTo(written);
    }

    private static void run(String... command) throws IOException, InterruptedException {
        boolean there = List.of(System.getenv("PATH").split(File.pathSeparator)).stream()
                .anyMatch(p -> Files.isExecutable(Path.of(p, command[0])));
        if (!there) {
            System.err.println("NOT TESTED: " + command[0] + " is not installed");
        }
        assumeTrue(there, command[0] + " is not installed: what it saves was not tested");
        Process process = new ProcessBuilder(command)
                .redirectErrorStream(true)
                .redirectOutput(ProcessBuilder.Redirect.DISCARD)
                .start();
        boolean ended = process.waitFor(SECONDS, TimeUnit.SECONDS);
        process.destroyForcibly();
        assertThat(ended).as(command[0] + " ends").isTrue();
    }
}
