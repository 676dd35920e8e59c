package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntFunction;
import nappe.calculation.Allowed;
import nappe.calculation.Cell;
import nappe.deliver.xlsx.Recalculated;
import nappe.deliver.xlsx.Spoiler;
import nappe.formula.Value;
import nappe.input.SampleStations;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Java, LibreOffice and Gnumeric agree on every cell of every sample, whatever was stored in the file before. */
class AgreementTest {
    private static final String FLUME = "headworks.xlsx";

    @TempDir
    static Path folder;

    private static final List<Path> BOOKS = new ArrayList<>();
    private static final Map<String, Map<String, Object>> STORED = new HashMap<>();
    private static IntFunction<Map<String, Object>> byLibreOffice;

    /** One run of LibreOffice for all: the spoilt samples by their names, and last the one with a changed table. */
    @BeforeAll
    static void recalculate() throws IOException {
        for (String name : SampleStations.names()) {
            BOOKS.add(file(Spoiler.spoil(Package.ofSample(name).workbook())));
        }
        BOOKS.add(file(withChangedTable(Package.ofSample(FLUME))));
        byLibreOffice = Recalculated.byLibreOffice(BOOKS, Files.createTempDirectory(folder, "recalculated"));
    }

    private static Path file(byte[] workbook) throws IOException {
        return Files.write(Files.createTempFile(folder, "book", ".xlsx"), workbook);
    }

    private static Map<String, Object> issued(String name) throws IOException {
        if (!STORED.containsKey(name)) {
            STORED.put(name, Recalculated.asStored(file(Package.ofSample(name).workbook())));
        }
        return STORED.get(name);
    }

    @ParameterizedTest
    @MethodSource("nappe.input.SampleStations#names")
    void everyStoredValueIsWhatJavaComputed(String name) throws IOException {
        Package sample = Package.ofSample(name);
        assertThat(Recalculated.disagreements(issued(name), sample.results(), 0))
                .isEmpty();
    }

    @ParameterizedTest
    @MethodSource("nappe.input.SampleStations#names")
    void threeProgramsAgreeOnEveryCell(String name) throws IOException {
        Package sample = Package.ofSample(name);
        int number = SampleStations.names().indexOf(name);
        Comparison libreOffice = Comparison.of(byLibreOffice.apply(number), issued(name), sample.results());
        Comparison gnumeric = Comparison.of(Recalculated.byGnumeric(BOOKS.get(number)), issued(name), sample.results());
        System.out.println(sample + ", LibreOffice: " + libreOffice + "\n" + sample + ", Gnumeric: " + gnumeric);
        assertThat(libreOffice.faults()).as("LibreOffice").isEmpty();
        assertThat(gnumeric.faults()).as("Gnumeric").isEmpty();
        assertThat(libreOffice.cells()).isGreaterThan(sample.results().cells().size());
    }

    @Test
    void spoiltFileThatNobodyRecalculatedDisagreesInEveryLiveCell() throws IOException {
        Package sample = Package.ofSample("return-weir.xlsx");
        Comparison comparison = Comparison.of(
                Recalculated.asStored(file(Spoiler.spoil(sample.workbook()))),
                issued("return-weir.xlsx"),
                sample.results());
        long live = sample.results().cells().stream()
                .filter(c -> c.kind() == Cell.Kind.FORMULA)
                .count();
        assertThat(comparison.faults()).hasSizeGreaterThanOrEqualTo((int) live);
    }

    @Test
    void changedNumberOfACitedTableIsReported() throws IOException {
        List<String> faults = Comparison.of(
                        byLibreOffice.apply(BOOKS.size() - 1),
                        issued(FLUME),
                        Package.ofSample(FLUME).results())
                .faults();
        assertThat(faults).hasSizeGreaterThan(20).anyMatch(fault -> fault.startsWith("F1 rating!"));
    }

    private static byte[] withChangedTable(Package sample) {
        double published = number(sample, lineOf(sample, "C"));
        Cell cited = inTables(sample, "3 ft", published);
        return new Edited(sample.workbook())
                .type(cited.place(), published * (1 + 1e-6))
                .bytes();
    }

    /** What may be typed over in an issued workbook is what the checkers' edits type over: numbers and choices. */
    @ParameterizedTest
    @MethodSource("nappe.input.SampleStations#names")
    void wordsThatAreUnlockedAreChoices(String name) {
        assertThat(Package.ofSample(name).results().cells())
                .filteredOn(c -> c.kind() == Cell.Kind.ENTRY && c.typed() instanceof Value.Word)
                .isNotEmpty()
                .allMatch(c -> c.allowed() instanceof Allowed.Words);
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
