package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import nappe.calculation.Cell;
import nappe.deliver.xlsx.Recalculated;
import nappe.deliver.xlsx.Spoiler;
import nappe.formula.Value;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Java, LibreOffice and Gnumeric agree on every cell of every sample, whatever was stored in the file before. */
class AgreementTest {
    @TempDir
    Path folder;

    private Path file(byte[] workbook) throws IOException {
        return Files.write(Files.createTempFile(folder, "book", ".xlsx"), workbook);
    }

    private Map<String, Object> issued(Package sample) throws IOException {
        return Recalculated.asStored(file(sample.workbook()));
    }

    @ParameterizedTest
    @MethodSource("nappe.input.SampleStations#names")
    void everyStoredValueIsWhatJavaComputed(String name) throws IOException {
        Package sample = Package.ofSample(name);
        assertThat(Recalculated.disagreements(issued(sample), sample.results(), 0))
                .isEmpty();
    }

    @ParameterizedTest
    @MethodSource("nappe.input.SampleStations#names")
    void threeProgramsAgreeOnEveryCell(String name) throws IOException {
        Package sample = Package.ofSample(name);
        Path spoilt = file(Spoiler.spoil(sample.workbook()));
        Comparison libreOffice = Comparison.of(Recalculated.byLibreOffice(spoilt), issued(sample), sample.results());
        Comparison gnumeric = Comparison.of(Recalculated.byGnumeric(spoilt), issued(sample), sample.results());
        System.out.println(sample + ", LibreOffice: " + libreOffice + "\n" + sample + ", Gnumeric: " + gnumeric);
        assertThat(libreOffice.faults()).as("LibreOffice").isEmpty();
        assertThat(gnumeric.faults()).as("Gnumeric").isEmpty();
        assertThat(libreOffice.cells()).isGreaterThan(sample.results().cells().size());
    }

    @Test
    void spoiltFileThatNobodyRecalculatedDisagreesInEveryLiveCell() throws IOException {
        Package sample = Package.ofSample("return-weir.xlsx");
        Comparison comparison = Comparison.of(
                Recalculated.asStored(file(Spoiler.spoil(sample.workbook()))), issued(sample), sample.results());
        long live = sample.results().cells().stream()
                .filter(c -> c.kind() == Cell.Kind.FORMULA)
                .count();
        assertThat(comparison.faults()).hasSizeGreaterThanOrEqualTo((int) live);
    }

    @Test
    void changedNumberOfACitedTableIsReported() throws IOException {
        Package sample = Package.ofSample("headworks.xlsx");
        double published = number(sample, lineOf(sample, "C"));
        Cell cited = inTables(sample, "3 ft", published);
        Path changed = file(new Edited(sample.workbook())
                .type(cited.place(), published * (1 + 1e-6))
                .bytes());
        List<String> faults = Comparison.of(Recalculated.byLibreOffice(changed), issued(sample), sample.results())
                .faults();
        assertThat(faults).hasSizeGreaterThan(20).anyMatch(fault -> fault.startsWith("F1 rating!"));
    }

    private static double number(Package sample, Cell cell) {
        return ((Value.Number) sample.results().value(cell)).value();
    }

    private static Cell lineOf(Package sample, String symbol) {
        return sample.results().cells().stream()
                .filter(c -> c.symbol().equals(symbol) && c.place().sheet().equals("F1"))
                .findFirst()
                .orElseThrow();
    }

    /** The cell of the cited table in the row of a size that holds a number. */
    private static Cell inTables(Package sample, String size, double number) {
        List<Cell> table = sample.results().cells().stream()
                .filter(c -> c.kind() == Cell.Kind.TABLE && c.place().sheet().equals("Tables"))
                .toList();
        int row = table.stream()
                .filter(c -> c.typed() instanceof Value.Word word && word.text().equals(size))
                .findFirst()
                .orElseThrow()
                .place()
                .row();
        return table.stream()
                .filter(c -> c.place().row() == row && c.typed() instanceof Value.Number n && n.value() == number)
                .findFirst()
                .orElseThrow();
    }
}
