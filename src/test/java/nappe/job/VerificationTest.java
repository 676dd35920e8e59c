package nappe.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import nappe.method.MethodLibrary;
import nappe.method.Texts;
import nappe.source.BuiltInLibrary;
import nappe.unit.WorkingSystem;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The check values that come with the methods, each with its source. */
class VerificationTest {
    private static final BuiltInLibrary LIBRARY = new BuiltInLibrary();
    private static final Verification VERIFICATION = new Verification(new MethodLibrary(LIBRARY));

    static List<CheckRow> builtIn() {
        return CheckRow.builtIn(LIBRARY);
    }

    static List<CheckRow> ofMethods() {
        return builtIn().stream().filter(row -> !row.method().equals("units")).toList();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("builtIn")
    void everyBuiltInCheckValueIsMet(CheckRow row) {
        CheckOutcome outcome = VERIFICATION.run(row);
        assertThat(outcome.met()).as(shown(outcome)).isTrue();
    }

    /** 1e-12: the rounding of some twenty operations in either system. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("ofMethods")
    void everyCheckValueIsTheSameInBothWorkingSystems(CheckRow row) {
        double si = VERIFICATION.run(row, WorkingSystem.SI).computed();
        double us = VERIFICATION.run(row, WorkingSystem.US).computed();
        assertThat(us).as(row.id()).isCloseTo(si, within(1e-12 * Math.max(Math.abs(si), 1e-3)));
    }

    @Test
    void aRowWithAWrongExpectedValueIsNotMet() {
        for (CheckRow row : builtIn()) {
            CheckRow off = off(row, row.expected() + 1.5 * row.slack() + 2 * Math.abs(row.expected()));
            assertThat(VERIFICATION.run(off).met()).as(row.id()).isFalse();
        }
    }

    @Test
    void aRowThatIsNotMetSaysSoWithItsNumbers() {
        CheckRow row = builtIn().stream()
                .filter(r -> r.id().equals("KC23"))
                .findFirst()
                .orElseThrow();
        CheckOutcome outcome = VERIFICATION.run(off(row, 0.0351));
        assertThat(shown(outcome))
                .isEqualTo(
                        "KC23 Q_h: computed 0.0341785, expected 0.0351, difference -2.6253 %, tolerance 0.05 %, "
                                + "a, a_1 and k_b of the cited tables, interpolated linearly; value from a separate evaluation");
        assertThat(outcome.printed()).contains("NOT MET");
    }

    @Test
    void idsAreUniqueAndNoneThatIsLeftOutIsRun() {
        List<String> ids = builtIn().stream().map(CheckRow::id).toList();
        List<String> leftOut = LIBRARY.text("checks/left-out.csv")
                .lines()
                .filter(line -> !line.startsWith("#") && !line.startsWith("id,"))
                .map(line -> line.split(",")[0])
                .toList();
        assertThat(ids).doesNotHaveDuplicates().hasSizeGreaterThan(100);
        assertThat(leftOut).doesNotHaveDuplicates().isNotEmpty();
        assertThat(ids).doesNotContainAnyElementsOf(leftOut);
    }

    /** No outside value was at hand for these: their rows guard the coding only, and their tables of check values say so. */
    private static final List<String> WITHOUT_OUTSIDE_VALUE = List.of(
            "broad-crested-weir",
            "cipolletti-weir",
            "cutthroat-flume",
            "h-flume",
            "long-throat-rectangular",
            "long-throat-trapezoidal",
            "long-throat-u",
            "rated-structure",
            "round-nose-weir",
            "short-sewer-flume",
            "triangular-profile-weir");

    @Test
    void everyOtherBuiltInMethodHasCheckValuesThatSomebodyElsePrintedOrComputed() {
        List<String> without = new ArrayList<>();
        for (String method : new MethodLibrary(LIBRARY).names()) {
            List<CheckRow> own = builtIn().stream()
                    .filter(row -> row.method().equals(method))
                    .toList();
            assertThat(own).as(method).isNotEmpty();
            if (own.stream().noneMatch(row -> List.of("published", "library").contains(row.kind()))) {
                without.add(method);
            }
        }
        assertThat(without).containsExactlyInAnyOrderElementsOf(WITHOUT_OUTSIDE_VALUE);
    }

    @Test
    void theSlackIsInTheUnitOfTheRow() {
        CheckRow row = builtIn().get(0);
        assertThat(with(row, "0.1 %", -2).slack()).isEqualTo(0.002);
        assertThat(with(row, "0.005 abs", -2).slack()).isEqualTo(0.005);
    }

    @Test
    void whatCannotBeComputedIsNotMetAndSaysWhy() {
        assertThat(words("no-such-device", "h = 1 m", "Q_h", "m3/s")).isEqualTo("no such method");
        assertThat(words("trough", "b = 1 m; h = 1 m", "Q_x", "m3/s")).isEqualTo("no such symbol");
        assertThat(words("trough", "b = 1 m", "q", "m3/s")).isEqualTo("a free symbol is not given");
        assertThat(words("trough", "h = 1 m", "q", "m3/s")).isEqualTo("not given");
        assertThat(words("trough", "b = 1 m; h = 1 m", "state", "1")).isEqualTo("words");
        assertThat(words("trough", "b = 1 m; h = 1 m", "q", "m")).isEqualTo("the target is length^3 time^-1");
        assertThat(words("trough", "b = 4 m; h = 1 m", "z", "m")).isEqualTo("no result");
    }

    @Test
    void countsAreByMethodAndKind() {
        List<CheckOutcome> outcomes = new ArrayList<>();
        CheckRow row = builtIn().stream()
                .filter(r -> r.id().equals("KC23"))
                .findFirst()
                .orElseThrow();
        outcomes.add(VERIFICATION.run(row));
        outcomes.add(VERIFICATION.run(off(row, 9)));
        assertThat(CheckOutcome.counts(outcomes)).containsExactly(List.of("rectangular-weir", "derived", "2", "1"));
    }

    private static String words(String method, String entries, String target, String unit) {
        Verification verification = new Verification(new MethodLibrary(new Texts().method("trough", """
                method Pretend trough
                entry b ; m ; width
                free h ; m ; head
                line q = 2 m^(1/2)/s * b*h^1.5 ; m3/s ; flow
                line state = if(b < 2 m, "narrow", "wide") ; words ; state
                line z = if(b < 2 m, b, none()) ; m ; width of a narrow one
                """)));
        String text = "id,method,entries,target,expected,unit,tolerance,source,kind,note\n"
                + String.join(",", "T", method, entries, target, "1", unit, "1 %", "invented", "memory", "");
        CheckOutcome outcome = verification.run(CheckRow.read("t.csv", text).get(0), WorkingSystem.SI);
        assertThat(outcome.met()).isFalse();
        return outcome.words();
    }

    private static String shown(CheckOutcome outcome) {
        return String.format(
                Locale.ROOT,
                "%s %s: computed %s, expected %s, difference %s, tolerance %s, %s",
                outcome.row().id(),
                outcome.row().target(),
                outcome.shown(),
                outcome.row().expected(),
                outcome.difference(),
                outcome.row().tolerance(),
                outcome.row().source());
    }

    private static CheckRow off(CheckRow row, double expected) {
        return with(row, row.tolerance(), expected);
    }

    private static CheckRow with(CheckRow row, String tolerance, double expected) {
        return new CheckRow(
                row.id(),
                row.method(),
                row.entriesText(),
                row.entries(),
                row.target(),
                expected,
                row.unit(),
                tolerance,
                row.source(),
                row.kind(),
                row.note(),
                row.house());
    }
}
