package nappe.solve;

import static nappe.solve.Bench.typed;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import nappe.formula.Value;
import nappe.method.MethodReader;
import nappe.method.MethodSheet;
import nappe.method.Texts;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;
import org.junit.jupiter.api.Test;

/** A root that rests on a free symbol is laid wherever that symbol is bound. */
class NestedRootTest {
    private static final String HEAD = """
            method Pretend
            source INV ; An invented book
            entry a ; 1 ; a number
            case c ; 1 ; another ; any sign
            free x ; 1 ; unknown ; any sign
            free y ; 1 ; parameter ; any sign
            line f = x + 0.1*x^2 ; 1 ; a curve
            root x_r = x where f = y between 0 and y ; 1 ; where the curve is y
            line s = x_r + a ; 1 ; what rests on the root
            """;

    @Test
    void aRootAtTwoValuesIsTwoRootsAndBothAreJudged() {
        Bench bench = bench(HEAD + "at y = 8 : s_1 = s\nat y = 2.4*c : s_2 = s\n", "-1", "1");
        assertThat(bench.number("s_1", 0)).isCloseTo(1 + (Math.sqrt(1 + 0.4 * 8) - 1) / 0.2, within(1e-11));
        assertThat(bench.value("s_2", 0)).isEqualTo(new Value.None("no result"));
        assertThat(bench.number("s_2", 1)).isCloseTo(3, within(1e-11));
        assertThat(bench.verdicts("the trials for x_r have closed"))
                .containsExactlyInAnyOrder(
                        List.of(Value.word("met")), List.of(Value.word("not met"), Value.word("met")));
    }

    @Test
    void aRootInARootCloses() {
        Bench bench =
                bench(HEAD + "root y_r = y where s = c + 2 between 0.001 and 20 ; 1 ; where x is c + 1\n", "1", "2");
        assertThat(bench.number("y_r", 0)).isCloseTo(2.4, within(1e-11));
        assertThat(bench.number("y_r", 1)).isCloseTo(3.9, within(1e-11));
        assertThat(bench.verdicts("the trials for x_r have closed")).hasSize(1);
    }

    @Test
    void aRootInARatingTableIsLaidInEveryRow() {
        Bench bench = bench(HEAD + "rating y from 1 to 27 steps 2 : s\n", "1", "2");
        nappe.calculation.Block.Table table = bench.ratings().get(0);
        assertThat(table.rows()).hasSize(3);
        assertThat(table.rows()).allSatisfy(row -> assertThat(row.items()).hasSameSizeAs(table.columns()));
    }

    @Test
    void aRootAndWhatIsTakenAtItHaveAHeadInTheReportingUnitToo() {
        Bench bench = bench(HEAD + "at x = x_r : f_r = f\nrating y from 1 to 27 steps 2 : x_r, f_r\n", "1", "2");
        nappe.calculation.Block.Table table = bench.rating(Map.of(Dimension.NONE, Unit.parse("%")));
        assertThat(table.columns())
                .extracting(nappe.calculation.Block.Column::head)
                .contains("y [%]", "x_r [%]", "f_r [%]");
        assertThat(table.rows()).allSatisfy(row -> assertThat(row.items()).hasSameSizeAs(table.columns()));
    }

    @Test
    void aRootInARootKeepsTheColumnsOfItsTrials() {
        Bench bench =
                bench(HEAD + "root y_r = y where s = c + 2 between 0.001 and 20 ; 1 ; where x is c + 1\n", "1", "2");
        for (nappe.calculation.Block.Table table : bench.trialTables()) {
            assertThat(table.rows()).allSatisfy(row -> assertThat(row.items()).hasSameSizeAs(table.columns()));
        }
        assertThat(bench.cells()).extracting(nappe.calculation.Cell::place).doesNotHaveDuplicates();
    }

    private static Bench bench(String text, String... values) {
        MethodSheet method = new MethodReader(new Texts().method("pretend", text)).read("pretend");
        return new Bench(
                method,
                WorkingSystem.SI,
                typed("a", "1"),
                java.util.Arrays.stream(values).map(c -> typed("c", c)).toList());
    }
}
