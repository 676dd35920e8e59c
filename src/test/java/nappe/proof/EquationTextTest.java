package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import nappe.Tools;
import nappe.deliver.pdf.PdfDelivery;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Another program finds and copies the equations of the samples as their plain formulas. */
class EquationTextTest {
    private static String text(String sample, Path folder) throws IOException {
        Tools.require("pdftotext", "the text of equations as another program reads it");
        Path pdf = folder.resolve("package.pdf");
        Path text = folder.resolve("package.txt");
        Files.write(pdf, PdfDelivery.render(Package.ofSample(sample).results()).bytes());
        Tools.run("pdftotext", "-enc", "UTF-8", pdf.toString(), text.toString());
        return Files.readString(text);
    }

    @Test
    void theEquationsOfTheFlumeAreInTheText(@TempDir Path folder) throws IOException {
        assertThat(text("headworks.xlsx", folder))
                .contains("h_f = h_0*(Q/(Q_0*C))^(1/n)", "h_u = max(h_v, h_b + (1 - S_end)*h_v)")
                .containsPattern("= 1 ft \\* \\([\\d.]+ ft3/s / \\(1 ft3/s \\* 12\\)\\)\\^\\(1/[\\d.]+\\)");
    }

    @Test
    void theEquationsOfTheWeirAreInTheText(@TempDir Path folder) throws IOException {
        assertThat(text("return-weir.xlsx", folder))
                .contains("Q_h = C_e*2/3*sqrt(2*g)*b_e*h_e^1.5", "h where Q_h = Q, in trial rows");
    }
}
