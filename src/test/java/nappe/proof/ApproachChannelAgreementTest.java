package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import nappe.deliver.xlsx.Recalculated;
import nappe.deliver.xlsx.Spoiler;
import nappe.deliver.xlsx.XlsxDelivery;
import nappe.job.PretendApproach;
import nappe.results.Results;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Two approach channels in six cases, from dry to far above the walls: other programs find the same in every cell. */
class ApproachChannelAgreementTest {
    @TempDir
    Path folder;

    @Test
    void threeProgramsAgreeOnEveryCell() throws IOException {
        Results results = PretendApproach.inSixCases();
        byte[] workbook = XlsxDelivery.render(results);
        Map<String, Object> issued = Recalculated.asStored(Files.write(folder.resolve("issued.xlsx"), workbook));
        Path spoilt = Files.write(folder.resolve("spoilt.xlsx"), Spoiler.spoil(workbook));
        assertThat(Comparison.of(Recalculated.byLibreOffice(spoilt), issued, results)
                        .faults())
                .as("LibreOffice")
                .isEmpty();
        assertThat(Comparison.of(Recalculated.byGnumeric(spoilt), issued, results)
                        .faults())
                .as("Gnumeric")
                .isEmpty();
    }
}
