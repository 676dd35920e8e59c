package nappe.station;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import nappe.station.SizeRerun.Failure;
import org.junit.jupiter.api.Test;

class FailingWordsTest {
    private static String of(Failure... failures) {
        return FailingWords.of(new SizeRerun("3 ft", List.of(failures), false, ""));
    }

    @Test
    void threeLimitsAreNamedAndTheRestCounted() {
        Failure a = new Failure("F1", "flow is free", true, List.of(6));
        Failure b = new Failure("F1", "head is in the range", false, List.of(1, 2, 3, 5, 7, 8));
        Failure c = new Failure("A1", "floor is under the crest", true, List.of());
        assertThat(of(a, b, c))
                .isEqualTo("F1 flow is free (case 6); F1 head is in the range (no result, cases 1 to 3, 5, 7, 8);"
                        + " A1 floor is under the crest (in all cases alike)");
        assertThat(of(a, b, c, a, b)).startsWith(of(a, b, c)).endsWith("; and 2 more");
    }

    @Test
    void nothingThatFailsIsSaid() {
        assertThat(of()).isEqualTo("none");
        assertThat(FailingWords.of(new SizeRerun("3 ft", List.of(), true, "")))
                .isEqualTo("none, but a limit could not be judged: not given");
    }

    @Test
    void aSizeThatNoRerunCanTakeIsSaid() {
        assertThat(FailingWords.of(new SizeRerun("3 ft", List.of(), false, "x is not there")))
                .isEqualTo("no rerun: x is not there");
    }
}
