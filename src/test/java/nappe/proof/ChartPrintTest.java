package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import nappe.Tools;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** LibreOffice and Gnumeric print the chart of a rating, whole on one page, under its table of cases. */
class ChartPrintTest {
    @TempDir
    Path folder;

    private Path book() throws IOException {
        return Files.write(
                folder.resolve("book.xlsx"),
                Package.ofSample("return-weir.xlsx").workbook());
    }

    @Test
    void libreOfficePrintsTheChart() throws IOException {
        Tools.require("soffice", "LibreOffice");
        Tools.run(
                "soffice",
                "-env:UserInstallation=" + folder.resolve("profile").toUri(),
                "--headless",
                "--convert-to",
                "pdf",
                "--outdir",
                folder.toString(),
                book().toString());
        printed(pages(folder.resolve("book.pdf")));
    }

    @Test
    void gnumericPrintsTheChart() throws IOException {
        Tools.require("ssconvert", "Gnumeric");
        Path pdf = folder.resolve("book.pdf");
        Tools.run("ssconvert", "-T", "Gnumeric_pdf:pdf_assistant", book().toString(), pdf.toString());
        printed(pages(pdf));
    }

    /** The axes' titles and the words of the legend stand on one page. */
    private static void printed(List<String> pages) {
        assertThat(pages)
                .filteredOn(page -> page.contains("flow [m3/s]") && page.contains("flow cases"))
                .hasSize(1);
    }

    private List<String> pages(Path pdf) throws IOException {
        return PdfPages.of(Files.readAllBytes(pdf), folder).all();
    }
}
