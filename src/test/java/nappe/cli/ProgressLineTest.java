package nappe.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import nappe.Tools;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The line that tells a waiting person what the program is busy with; on a pseudo-terminal and in a pipe. */
class ProgressLineTest {
    private static final long NEVER = 1_000_000;

    @TempDir
    Path folder;

    private final StringWriter screen = new StringWriter();

    @Test
    void nothingIsShownBeforeAPersonHasWaited() {
        ProgressLine line = ProgressLine.on(screen, NEVER);
        line.stage("computing");
        line.end();
        assertThat(screen.toString()).isEmpty();
    }

    @Test
    void eachStageTakesThePlaceOfTheOneBeforeAndNothingIsLeft() throws Exception {
        ProgressLine line = ProgressLine.on(screen, 0);
        line.stage("reading");
        await("nappe: reading ...");
        line.stage("computing");
        line.end();
        line.stage("too late");
        assertThat(screen.toString())
                .isEqualTo("nappe: reading ...\r                  \rnappe: computing ...\r                    \r");
    }

    @Test
    void whatIsPrintedTakesTheLineAwayFirst() throws Exception {
        ProgressLine line = ProgressLine.on(screen, 0);
        line.stage("reading");
        await("nappe: reading ...");
        new PrintWriter(line.before(screen), true).println("remark: a word");
        line.end();
        assertThat(screen.toString())
                .isEqualTo("nappe: reading ...\r                  \rremark: a word" + System.lineSeparator());
    }

    @Test
    void stagesAreToldOnATerminalAndWipedOut() throws IOException {
        Tools.require("script", "script, of util-linux");
        Path seen = folder.resolve("seen");
        Tools.run(issue("script", "-qec", String.join(" ", java()), seen.toString()));
        String text = Files.readString(seen);
        assertThat(text).contains("nappe: writing the workbook and setting the PDF ...", "Wrote ");
        assertThat(afterWiping(text)).contains("Wrote ").doesNotContain("...");
    }

    @Test
    void nothingOfItGoesIntoAPipeOrAFile() throws Exception {
        Path out = folder.resolve("out.txt");
        Path err = folder.resolve("err.txt");
        Process process = issue(java().toArray(String[]::new))
                .redirectOutput(out.toFile())
                .redirectError(err.toFile())
                .start();
        assertThat(process.waitFor(10, TimeUnit.MINUTES)).isTrue();
        assertThat(process.exitValue()).isZero();
        assertThat(Files.readString(out)).startsWith("Wrote ").doesNotContain("\r");
        assertThat(Files.readString(err)).doesNotContain("...", "\r");
    }

    private ProcessBuilder issue(String... command) {
        ProcessBuilder builder = new ProcessBuilder(command);
        builder.environment().put("TERM", "xterm");
        return builder;
    }

    private List<String> java() {
        return List.of(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-cp",
                System.getProperty("java.class.path"),
                "nappe.cli.Nappe",
                "issue",
                Path.of("sample-inputs/return-weir.xlsx").toAbsolutePath().toString(),
                "-o",
                folder.resolve("output").toString());
    }

    /** What is left on a terminal: a carriage return starts the line anew. */
    private static String afterWiping(String text) {
        StringBuilder left = new StringBuilder();
        for (String line : text.replace("\r\n", "\n").split("\n")) {
            char[] cells = new char[0];
            for (String over : line.split("\r")) {
                cells = java.util.Arrays.copyOf(cells, Math.max(cells.length, over.length()));
                over.getChars(0, over.length(), cells, 0);
            }
            left.append(cells).append('\n');
        }
        return left.toString();
    }

    private void await(String text) throws InterruptedException {
        for (int tries = 0; tries < 1000 && !screen.toString().equals(text); tries++) {
            Thread.sleep(10);
        }
        assertThat(screen.toString()).isEqualTo(text);
    }
}
