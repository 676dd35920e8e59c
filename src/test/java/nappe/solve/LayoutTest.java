package nappe.solve;

import static nappe.solve.Bench.typed;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.calculation.Cell;
import nappe.calculation.Reference;
import nappe.calculation.Run;
import nappe.calculation.Sureness;
import nappe.formula.PlainReading;
import nappe.formula.Value;
import nappe.method.MethodReader;
import nappe.method.MethodSheet;
import nappe.method.Texts;
import nappe.unit.WorkingSystem;
import org.junit.jupiter.api.Test;

/** An invented trough laid out and evaluated: what stands where, and what passes on. */
class LayoutTest {
    private static final String TROUGH = """
            method Pretend trough
            source INV ; An invented book
            entry  b ; m ; width
            entry  d ; m ; a depth that may be left out ; optional
            case   Q = flow ; m3/s ; flow ; not negative
            case   h_g ; m ; head read ; optional
            take   z_t = water level ; m ; level downstream ; any sign
            line   B = 2*b ; m ; twice the width
            line   D = B + d ; m ; rests on what may be left out
            line   E = D*2 ; m ; rests on it at second hand
            free   h ; m ; head
            line   q = 2 m^(1/2)/s * b*h^1.5 ; m3/s ; flow at a head
            root   h_1 = h where q = Q between 0.001 m and 9 m below 0 m ; m ; head
            at     h = h_g : q_g = q
            root   h_fix = h where q = 3 m3/s between 0.001 m and 9 m ; m ; head at a stated flow
            line   w = h*Q ; m4/s ; rests on the head and on the case
            at     h = h_fix : w_f = w, q_f = q
            line   state = if(z_t <= 0.5 m, "free", "drowned") ; words ; state
            line   h_a = if(state = "free", h_1, none()) ; m ; head, where it is free
            line   z_u = h_a + 1 m ; m ; level upstream
            line   v = if(given(h_g), q_g/Q, none()) ; 1 ; flow read over flow
            limit  b <= 4 m ; width fits ; INV p. 1
            limit  h_a <= 2 m scale b ; head fits ; INV p. 2
            limit  h_g <= 2 m when given(h_g) ; head read fits ; INV p. 3
            limit  E <= 9 m ; depth fits ; INV p. 4
            limit  h_1 <= 2 m when state = "free" ; head fits while free ; INV p. 5
            rating h from 0.1 m to 2*b steps 4 : q
            give   water level = z_u
            """;

    private static final MethodSheet METHOD = new MethodReader(new Texts().method("trough", TROUGH)).read("trough");

    private static final Bench BENCH = new Bench(
            METHOD,
            WorkingSystem.SI,
            typed("b", "0.5 m"),
            List.of(
                    typed("Q", "0.4 m3/s", "z_t", "0.2 m"),
                    typed("Q", "1.2 m3/s", "z_t", "0.9 m", "h_g", "0.7 m"),
                    typed("Q", "0 m3/s", "z_t", "-1 m")));

    @Test
    void whatRestsOnEntriesStandsOnceAndWhatRestsOnACaseOncePerCase() {
        assertThat(List.of("b", "B", "D", "h_fix")).allMatch(BENCH::servesAllCases);
        assertThat(List.of("Q", "h_1", "state", "z_u", "q_g", "w_f", "q_f")).noneMatch(BENCH::servesAllCases);
    }

    @Test
    void whatRestsOnAFreeSymbolStandsNowhereByItself() {
        assertThat(BENCH.stands("h")).isFalse();
        assertThat(BENCH.stands("q")).isFalse();
    }

    @Test
    void aRootGivesBackTheFlowItWasAskedFor() {
        assertThat(BENCH.number("h_1", 0)).isCloseTo(Math.pow(0.4, 2.0 / 3), within(1e-12));
        assertThat(BENCH.number("h_1", 1)).isCloseTo(Math.pow(1.2, 2.0 / 3), within(1e-12));
        assertThat(BENCH.verdict("the trials for h_1 have closed", 0)).isEqualTo(Value.word("met"));
    }

    @Test
    void belowTheBracketTheResultIsTheOneTheMethodNames() {
        assertThat(BENCH.value("h_1", 2)).isEqualTo(Value.of(0));
        assertThat(BENCH.verdict("the trials for h_1 have closed", 2)).isEqualTo(Value.word("met"));
    }

    @Test
    void aHeadThatWasReadGivesItsFlowAndOneThatWasNotGivesNone() {
        assertThat(BENCH.value("q_g", 0)).isEqualTo(new Value.None("not given"));
        assertThat(BENCH.number("q_g", 1)).isCloseTo(Math.pow(0.7, 1.5), within(1e-15));
    }

    @Test
    void notGivenPassesOnThroughLinesAndIntoLimits() {
        assertThat(BENCH.value("D")).isEqualTo(new Value.None("not given"));
        assertThat(BENCH.value("E")).isEqualTo(new Value.None("not given"));
        assertThat(BENCH.verdict("depth fits", 0)).isEqualTo(new Value.None("not given"));
        assertThat(BENCH.margin("depth fits", 0)).isEqualTo(new Value.None("not given"));
    }

    @Test
    void noResultPassesOnThroughLinesAndIntoLimits() {
        assertThat(BENCH.value("state", 1)).isEqualTo(Value.word("drowned"));
        assertThat(BENCH.value("h_a", 1)).isEqualTo(new Value.None("no result"));
        assertThat(BENCH.value("z_u", 1)).isEqualTo(new Value.None("no result"));
        assertThat(BENCH.verdict("head fits", 1)).isEqualTo(new Value.None("no result"));
        assertThat(BENCH.number("z_u", 0)).isEqualTo(BENCH.number("h_1", 0) + 1);
    }

    @Test
    void whatTheFormulaAsksAboutDoesNotPassOn() {
        assertThat(BENCH.value("v", 0)).isEqualTo(new Value.None("not given"));
        assertThat(BENCH.number("v", 1)).isCloseTo(Math.pow(0.7, 1.5) / 1.2, within(1e-15));
    }

    @Test
    void aLimitIsMetNotMetOrDoesNotApply() {
        assertThat(BENCH.verdict("width fits", 0)).isEqualTo(Value.word("met"));
        assertThat(BENCH.margin("width fits", 0)).isEqualTo(Value.of((4 - 0.5) / 4));
        assertThat(BENCH.verdict("head fits", 0)).isEqualTo(Value.word("met"));
        assertThat(BENCH.margin("head fits", 0)).isEqualTo(Value.of((2 - BENCH.number("h_1", 0)) / 0.5));
        assertThat(BENCH.verdict("head read fits", 1)).isEqualTo(Value.word("met"));
        assertThat(BENCH.verdict("head fits while free", 1)).isEqualTo(Value.word("does not apply"));
        assertThat(bench("b", "5 m").verdict("width fits", 0)).isEqualTo(Value.word("not met"));
    }

    @Test
    void aRootForAllCasesServesWhatIsPerCase() {
        double head = Math.pow(3, 2.0 / 3);
        assertThat(BENCH.number("w_f", 0)).isCloseTo(head * 0.4, within(1e-12));
        assertThat(BENCH.number("w_f", 1)).isCloseTo(head * 1.2, within(1e-12));
    }

    @Test
    void layoutAndFormulasAreTheSameWhateverTheNumbers() {
        Bench other = bench("b", "3.25 m", "d", "0.007 m");
        assertThat(described(bench("b", "0.5 m"))).isEqualTo(described(other));
    }

    @Test
    void everyCellComesAfterAllThatItRefersTo() {
        Set<Cell> before = new HashSet<>();
        for (Cell cell : BENCH.cells()) {
            for (Reference reference : cell.references().values()) {
                List<Cell> needed = reference instanceof Run run ? run.cells() : List.of((Cell) reference);
                assertThat(before).as(cell.toString()).containsAll(needed);
            }
            before.add(cell);
        }
    }

    @Test
    void noTwoCellsStandInOnePlace() {
        assertThat(BENCH.cells()).extracting(Cell::place).doesNotHaveDuplicates();
    }

    @Test
    void aCellThatIsSureHoldsANumberOrAPlainWord() {
        assertThat(BENCH.cells())
                .filteredOn(cell -> cell.sureness() == Sureness.SURE)
                .allSatisfy(cell -> assertThat(BENCH.value(cell)).isNotInstanceOf(Value.None.class));
    }

    @Test
    void bothWorkingSystemsGiveTheSame() {
        Bench feet = new Bench(
                METHOD, WorkingSystem.US, typed("b", "0.5 m"), List.of(typed("Q", "0.4 m3/s", "z_t", "0.2 m")));
        assertThat(feet.number("h_1", 0) * 0.3048).isCloseTo(BENCH.number("h_1", 0), within(1e-12));
        assertThat(feet.number("z_u", 0) * 0.3048).isCloseTo(BENCH.number("z_u", 0), within(1e-12));
    }

    private static Bench bench(String... entries) {
        return new Bench(
                METHOD,
                WorkingSystem.SI,
                typed(entries),
                List.of(
                        typed("Q", "0.4 m3/s", "z_t", "0.2 m"),
                        typed("Q", "1.2 m3/s", "z_t", "0.9 m", "h_g", "0.7 m")));
    }

    private static List<String> described(Bench bench) {
        return bench.cells().stream()
                .map(cell -> cell + " " + cell.kind() + " " + (cell.kind() == Cell.Kind.ENTRY ? "" : cell.unit() + " ")
                        + (cell.formula() == null ? "" : PlainReading.of(cell.formula()) + " " + cell.sureness())
                        + places(cell.references()))
                .toList();
    }

    private static Map<String, String> places(Map<String, Reference> references) {
        Map<String, String> places = new java.util.TreeMap<>();
        references.forEach((name, to) -> places.put(
                name, to instanceof Run run ? run.from("") : ((Cell) to).place().full()));
        return places;
    }
}
