package nappe.proof;

import static nappe.proof.CheckersEdits.MAIN;
import static nappe.proof.CheckersEdits.POND;
import static nappe.proof.CheckersEdits.REUSE;
import static nappe.proof.CheckersEdits.WEIR;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.proof.Typing.Entry;
import nappe.proof.Typing.Head;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * What a checker types into the issued workbook gives, recalculated, what issuing anew with that entry gives. Flows found
 * stay as issued: they are handed on to the new issue, and all that rests on them follows the entry. Two classes beside
 * this one hold the larger samples, so that the three run side by side.
 */
class CheckersEditTest {
    private static final Head DELETED = new Head(2, "W1", null);
    private static final Entry WIDER_THAN_ITS_CHANNEL = new Entry("W1", "b", 1300);
    private static final Entry NOT_MADE_IN_THE_DESIGN = new Entry("W1", "p", 0.4500001);

    @TempDir
    static Path folder;

    private static EditedBooks books;

    @BeforeAll
    static void type() throws IOException {
        books = new EditedBooks(folder, WEIR, MAIN, REUSE, POND);
        for (Typing typing : List.of(DELETED, WIDER_THAN_ITS_CHANNEL, NOT_MADE_IN_THE_DESIGN)) {
            books.add(WEIR, List.of(typing));
        }
    }

    @ParameterizedTest
    @CsvSource({WEIR + ", 5", MAIN + ", 3", REUSE + ", 3", POND + ", 2"})
    void editsGiveWhatIssuingAnewGives(String sample, int byGnumericToo) {
        assertThat(books.faults(sample, byGnumericToo)).isEmpty();
    }

    /** A cell that is emptied is empty where "not given" stood; all that rests on it reads as not given. */
    @Test
    void headReadThatIsDeletedIsNotGiven() throws IOException {
        Package anew = EditedBooks.anew(WEIR, List.of(DELETED));
        String emptied = "Cases!" + DELETED.place(Package.ofSample(WEIR)).address();
        Map<String, Object> expected = new LinkedHashMap<>(books.stored(anew));
        assertThat(expected.remove(emptied)).isEqualTo("not given");
        for (Map<String, Object> there :
                List.of(books.byLibreOffice(WEIR, List.of(DELETED)), books.byGnumeric(WEIR, List.of(DELETED)))) {
            assertThat(Comparison.of(there, expected, anew.results()).faults()).isEmpty();
        }
    }

    /** What cannot be built is refused when issued anew; typed over in the issued workbook, a limit there is not met. */
    @Test
    void aNotchWiderThanItsChannelIsToldByALimit() throws IOException {
        List<Typing> wider = List.of(WIDER_THAN_ITS_CHANNEL);
        assertThatThrownBy(() -> EditedBooks.anew(WEIR, wider))
                .hasMessageContaining("the notch is no wider than the channel");
        long before = notMet(books.stored(Package.ofSample(WEIR)));
        assertThat(notMet(books.byLibreOffice(WEIR, wider))).isGreaterThan(before);
    }

    private static long notMet(Map<String, Object> values) {
        return values.entrySet().stream()
                .filter(one -> one.getKey().startsWith("W1!") && "not met".equals(one.getValue()))
                .count();
    }

    @Test
    void anEditThatIsNotMadeInTheDesignIsReported() throws IOException {
        Package issued = Package.ofSample(WEIR);
        assertThat(Comparison.of(
                                books.byLibreOffice(WEIR, List.of(NOT_MADE_IN_THE_DESIGN)),
                                books.stored(issued),
                                issued.results())
                        .faults())
                .hasSizeGreaterThan(20);
    }
}
