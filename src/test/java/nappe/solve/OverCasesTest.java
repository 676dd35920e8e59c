package nappe.solve;

import static nappe.solve.Bench.typed;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import nappe.formula.Value;
import nappe.method.MethodException;
import nappe.method.MethodReader;
import nappe.method.MethodSheet;
import nappe.method.Texts;
import nappe.unit.WorkingSystem;
import org.junit.jupiter.api.Test;

/** A line over the cases: the highest or lowest of what each case has. */
class OverCasesTest {
    private static final String TEXT = """
            method Pretend sill
            source INV ; An invented book
            entry  z_f ; m ; level of the sill ; any sign
            take   z_t = water level ; m ; level downstream ; any sign
            case   d ; m ; drop that is asked for ; optional
            line   z_x = z_t + 0.5*d ; m ; lowest sill in the case
            line   z_m = highest(z_x) ; m ; lowest sill for every case
            line   z_l = lowest(z_t) ; m ; lowest level
            line   m_f = z_f - z_m ; m ; margin
            line   r = z_t - z_m ; m ; level under the governing one
            limit  z_m <= z_f scale 1 m ; sill is high enough ; INV p. 1
            """;

    @Test
    void theHighestOfTheCasesStandsOnceAndServesThemAll() {
        Bench bench = bench(List.of("1 m", "3 m", "2 m"), "0.4 m");
        assertThat(bench.servesAllCases("z_m")).isTrue();
        assertThat(bench.value("z_m")).isEqualTo(Value.of(3.2));
        assertThat(bench.value("z_l")).isEqualTo(Value.of(1));
        assertThat(bench.value("m_f")).isEqualTo(Value.of(2.5 - 3.2));
        assertThat(bench.number("r", 0)).isEqualTo(1 - 3.2);
        assertThat(bench.verdict("sill is high enough", 0)).isEqualTo(Value.word("not met"));
    }

    @Test
    void aCaseWithoutItsNumberLeavesNoHighest() {
        Bench bench = new Bench(
                method(TEXT),
                WorkingSystem.SI,
                typed("z_f", "2.5 m"),
                List.of(typed("z_t", "1 m", "d", "1 m"), typed("z_t", "3 m")));
        assertThat(bench.value("z_m")).isEqualTo(new Value.None("no result"));
        assertThat(bench.value("z_l")).isEqualTo(Value.of(1));
    }

    @Test
    void whatIsTheSameInEveryCaseHasNoHighest() {
        assertThatThrownBy(() -> method(TEXT + "line y = highest(z_f) ; m ; of one only\n"))
                .isInstanceOf(MethodException.class)
                .hasMessageContaining("z_f is the same in every case");
    }

    @Test
    void theHighestStandsOnALineOfItsOwn() {
        assertThatThrownBy(() -> method(TEXT + "line y = z_f + highest(z_t) ; m ; of more\n"))
                .isInstanceOf(MethodException.class)
                .hasMessageContaining("a line of its own");
    }

    private static MethodSheet method(String text) {
        return new MethodReader(new Texts().method("sill", text)).read("sill");
    }

    private static Bench bench(List<String> levels, String drop) {
        return new Bench(
                method(TEXT),
                WorkingSystem.SI,
                typed("z_f", "2.5 m"),
                levels.stream().map(level -> typed("z_t", level, "d", drop)).toList());
    }
}
