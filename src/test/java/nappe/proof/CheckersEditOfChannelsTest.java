package nappe.proof;

import static nappe.proof.CheckersEdits.INLET;
import static nappe.proof.CheckersEdits.TURNOUT;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What {@link CheckersEditTest} proves, of the samples with a channel in SI units. */
class CheckersEditOfChannelsTest {
    @TempDir
    static Path folder;

    private static EditedBooks books;

    @BeforeAll
    static void type() throws IOException {
        books = new EditedBooks(folder, INLET, TURNOUT);
    }

    @ParameterizedTest
    @CsvSource({INLET + ", 4", TURNOUT + ", 2"})
    void editsGiveWhatIssuingAnewGives(String sample, int byGnumericToo) {
        assertThat(books.faults(sample, byGnumericToo)).isEmpty();
    }
}
