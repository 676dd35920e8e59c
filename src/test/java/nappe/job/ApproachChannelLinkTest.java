package nappe.job;

import static nappe.job.Designs.flowCase;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Sheet;
import nappe.calculation.Sureness;
import nappe.formula.Value;
import nappe.results.Results;
import nappe.station.Design;
import org.junit.jupiter.api.Test;

/** A device with two approach channels in a row above it: what is handed on, case by case. */
class ApproachChannelLinkTest {
    @Test
    void eachChannelTakesTheLevelsOfTheOneBelowIt() {
        Results results = run(flowCase("Low", 0.02, 0.5), flowCase("High", 0.3, 0.6));
        assertThat(values(results, "A1", "z_g")).isEqualTo(values(results, "D1", "z_u"));
        assertThat(values(results, "A1", "E_g")).isEqualTo(values(results, "D1", "E_u"));
        assertThat(values(results, "A2", "z_g")).isEqualTo(values(results, "A1", "z_1"));
        assertThat(values(results, "A2", "E_g")).isEqualTo(values(results, "A1", "E_1"));
        assertThat(values(results, "A2", "h")).isEqualTo(values(results, "D1", "h_a"));
        assertThat(values(results, "A2", "w")).allMatch(Value.of(0.5)::equals);
        assertThat(values(results, "A2", "state")).containsExactly(Value.word("tranquil"), Value.word("tranquil"));
        assertThat(numbers(results, "A2", "d_2")).allSatisfy(d -> assertThat(d).isCloseTo(0, within(1e-12)));
    }

    @Test
    void aDrownedDeviceLeavesTheLevelsAndTakesTheHead() {
        Results results = run(flowCase("Flood", 0.1, 3));
        assertThat(numbers(results, "A2", "z_1").get(0)).isGreaterThan(3);
        assertThat(values(results, "A2", "h")).containsExactly(new Value.None("no result"));
        assertThat(values(results, "A2", "walls"))
                .containsExactly(Value.word("above the walls: levels hold only for higher walls"));
    }

    @Test
    void withoutFlowThePoolIsLevel() {
        Results results = run(flowCase("Dry", 0, 0.5), flowCase("Pool", 0, 1.6));
        assertThat(numbers(results, "A2", "z_1").get(1)).isEqualTo(1.6);
        assertThat(numbers(results, "A2", "F_m")).containsExactly(0.0, 0.0);
        assertThat(values(results, "A2", "state")).containsExactly(Value.word("no flow"), Value.word("no flow"));
    }

    @Test
    void whatAnAuthorityDemandsIsJudgedOnTheResults() {
        Results results = run(flowCase("Ordinary", 0.12, 0.6), flowCase("Flood", 0.1, 3));
        assertThat(verdicts(results, "demand on f_b")).containsExactly(Value.word("met"), Value.word("not met"));
        assertThat(verdicts(results, "demand on V_m")).containsExactly(Value.word("not met"), Value.word("not met"));
        assertThat(verdicts(results, "demand on z_1")).containsExactly(Value.word("met"), Value.word("not met"));
        assertThat(verdicts(results, "demand on E_1")).containsExactly(Value.word("met"), Value.word("not met"));
    }

    @Test
    void cellsAndFormulasAreTheSameWhateverTheNumbers() {
        assertThat(described(run(flowCase("One", 0, 0.5)))).isEqualTo(described(run(flowCase("One", 9, 4))));
    }

    @Test
    void noCellThatIsSureHoldsWordsInPlaceOfANumber() {
        Results results = run(flowCase("Dry", 0, 0.5), flowCase("Flood", 0.02, 3), flowCase("Much", 30, 0.5));
        assertThat(results.cells())
                .filteredOn(cell ->
                        cell.sureness() == Sureness.SURE && cell.place().sheet().matches("A[12].*"))
                .isNotEmpty()
                .allSatisfy(cell -> assertThat(results.value(cell)).isNotInstanceOf(Value.None.class));
    }

    private static Results run(Design.FlowCase... cases) {
        return PretendApproach.results(cases);
    }

    private static List<String> described(Results results) {
        return results.cells().stream()
                .map(cell -> cell + (cell.formula() == null ? "" : " = " + cell.formula() + " " + cell.sureness()))
                .toList();
    }

    private static List<Double> numbers(Results results, String tag, String symbol) {
        return values(results, tag, symbol).stream()
                .map(value -> ((Value.Number) value).value())
                .toList();
    }

    /** The verdicts on a limit of the upper channel, one per case. */
    private static List<Value> verdicts(Results results, String label) {
        List<Value> verdicts = new ArrayList<>();
        for (Sheet sheet : results.sheets()) {
            for (Block block : sheet.blocks()) {
                if (sheet.name().equals("A2") && block instanceof Block.Lines lines) {
                    for (Block.Line line : lines.lines()) {
                        if (line.description().equals(label)
                                && line.kind() == Block.LineKind.LIMIT_VERDICT
                                && verdicts.isEmpty()) {
                            line.perCase().forEach(cell -> verdicts.add(results.value(cell)));
                        }
                    }
                }
            }
        }
        return verdicts;
    }

    /** The values of a symbol on the sheet of an element, one per case. */
    private static List<Value> values(Results results, String tag, String symbol) {
        List<Value> values = new ArrayList<>();
        for (Sheet sheet : results.sheets()) {
            for (Block block : sheet.blocks()) {
                if (sheet.name().equals(tag) && block instanceof Block.Lines lines) {
                    for (Block.Line line : lines.lines()) {
                        if (line.symbol().equals(symbol) && values.isEmpty()) {
                            for (Cell cell : line.perCase()) {
                                values.add(results.value(cell));
                            }
                        }
                    }
                }
            }
        }
        return values;
    }
}
