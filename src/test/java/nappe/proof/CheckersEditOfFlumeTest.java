package nappe.proof;

import static nappe.proof.CheckersEdits.FLUME;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import nappe.calculation.Cell;
import nappe.proof.Typing.Entry;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What {@link CheckersEditTest} proves, of the largest sample. */
class CheckersEditOfFlumeTest {
    private static final Entry IN_NO_TABLE = new Entry("F1", "size", "11 ft");

    @TempDir
    static Path folder;

    private static EditedBooks books;

    @BeforeAll
    static void type() throws IOException {
        books = new EditedBooks(folder, FLUME);
        books.add(FLUME, List.of(IN_NO_TABLE));
    }

    @Test
    void editsGiveWhatIssuingAnewGives() {
        assertThat(books.faults(FLUME, 4)).isEmpty();
    }

    @Test
    void sizeThatNoTableHasLeavesNoNumber() throws IOException {
        Map<String, Object> values = books.byLibreOffice(FLUME, List.of(IN_NO_TABLE));
        assertThat(Package.ofSample(FLUME).results().cells().stream()
                        .filter(c -> c.kind() == Cell.Kind.FORMULA
                                && List.of("h_f", "h_a", "z_u", "Q_h", "Q_min").contains(c.symbol())
                                && c.place().sheet().startsWith("F1")
                                && !c.place().sheet().startsWith("F1 size"))
                        .map(c -> values.get(c.place().sheet() + "!" + c.place().address())))
                .hasSizeGreaterThan(20)
                .noneMatch(Double.class::isInstance);
    }
}
