package nappe.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The packed program as a user runs it: from a folder of the own, all of whose names have blanks and other signs. */
class WholeProgramIT {
    @TempDir
    Path folder;

    private static void fill(Path blank) throws IOException {
        NappeTest.flume(blank)
                .row("Revisions", "A", "2030-01-31", "First issue.")
                .save(blank);
    }

    private static Jar.Said done(Jar.Said said) {
        assertThat(said.status()).as(said.err() + said.out()).isZero();
        assertThat(said.err()).isEmpty();
        return said;
    }

    @Test
    void fromAnEmptyFolderToACheckedPackage() throws IOException {
        Path tools = Files.createDirectory(folder.resolve("our programs"));
        Path work = Files.createDirectory(folder.resolve("Station 7, Überlauf & Ölfang (100%)"));
        Jar nappe = Jar.in(work).copiedTo(tools.resolve("the calculator.jar"));

        assertThat(done(nappe.run("--version")).out()).startsWith("nappe ");
        assertThat(done(nappe.run("blank", "F1=parshall-flume", "-o", "the flume.xlsx"))
                        .out())
                .contains("Wrote the flume.xlsx");
        Path input = work.resolve("the flume.xlsx");
        Jar.Said refused = nappe.run("inspect", "the flume.xlsx", "--marked", "the flume, marked.xlsx");
        assertThat(refused.status()).isEqualTo(ExitStatus.INPUT_REFUSED);
        assertThat(refused.err())
                .contains("Calculation number is missing", "cells marked, all faults on its sheet Faults");
        assertThat(work.resolve("the flume, marked.xlsx")).isNotEmptyFile();

        fill(input);
        Map<String, String> before = Jar.listing(folder);
        assertThat(done(nappe.run("inspect", "the flume.xlsx")).out()).contains("1 element, 1 flow case, no faults.");
        assertThat(Jar.listing(folder)).isEqualTo(before);
        assertThat(done(nappe.run("issue", "the flume.xlsx")).out()).contains("Wrote output/C-001-b_rev-A");
        Path made = work.resolve("output/C-001-b_rev-A");
        assertThat(Contents.of(made).isWhole(made)).isTrue();
        String pdf = Files.readString(made.resolve("C-001-b_rev-A.pdf"), StandardCharsets.ISO_8859_1);
        assertThat(pdf).startsWith("%PDF-1.7").endsWith("%%EOF\n");
        try (XSSFWorkbook workbook = new XSSFWorkbook(Files.newInputStream(made.resolve("C-001-b_rev-A.xlsx")))) {
            assertThat(workbook.getNumberOfSheets()).isGreaterThan(10);
        }
        Map<String, String> first = Jar.listing(work.resolve("output"));
        done(nappe.run("issue", input, "-o", "output"));
        assertThat(Jar.listing(work.resolve("output"))).isEqualTo(first);
        assertThat(done(nappe.run("verify")).out()).contains(", 0 not met.");
    }
}
