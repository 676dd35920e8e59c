package nappe.job;

import static nappe.job.Designs.flowCase;
import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Sheet;
import nappe.calculation.Sureness;
import nappe.formula.Value;
import nappe.method.MethodLibrary;
import nappe.results.Results;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;
import nappe.station.FoundFlows;
import org.junit.jupiter.api.Test;

/** A weir downstream, a Parshall flume upstream: the flume takes the weir's level upstream, case by case. */
class WaterLevelLinkTest {
    private static final Job JOB = new Job(new MethodLibrary(new BuiltInLibrary()), "0.1.0");

    @Test
    void theUpperElementTakesTheLevelOfTheLowerInTheSameCase() {
        Results results = run(Designs.weirBelowFlume(1.6, flowCase("Low", 0.02, 0.5), flowCase("High", 0.1, 0.6)));
        List<Value> below = values(results, "W1", "z_u");
        assertThat(below).hasSize(2).doesNotHaveDuplicates().allMatch(Value.Number.class::isInstance);
        assertThat(values(results, "F1", "z_t")).isEqualTo(below);
        assertThat(values(results, "F1", "state")).containsExactly(Value.word("free"), Value.word("free"));
    }

    @Test
    void theLowerElementTakesTheTailwaterOfTheCase() {
        Results results = run(Designs.weirBelowFlume(1.6, flowCase("Low", 0.02, 0.5), flowCase("High", 0.1, 0.6)));
        assertThat(values(results, "W1", "z_t")).containsExactly(Value.of(0.5), Value.of(0.6));
    }

    @Test
    void whereTheLowerIsNotFreeItsLevelServesAboveAllTheSame() {
        Results results = run(Designs.weirBelowFlume(1.6, flowCase("Low", 0.02, 0.5), flowCase("Flood", 0.02, 1.19)));
        assertThat(values(results, "W1", "state")).containsExactly(Value.word("free"), Value.word("not free"));
        assertThat(values(results, "W1", "h_1").get(1)).isEqualTo(new Value.None("no result"));
        assertThat(values(results, "W1", "level").get(1)).isEqualTo(Value.word("bounding level, not a measurement"));
        assertThat(values(results, "W1", "z_u").get(1))
                .isEqualTo(values(results, "W1", "z_u").get(0));
        assertThat(values(results, "F1", "z_t")).isEqualTo(values(results, "W1", "z_u"));
        assertThat(values(results, "F1", "h_a")).allMatch(Value.Number.class::isInstance);
    }

    @Test
    void whereTheTailwaterIsNotGivenThereIsNoLevelAbove() {
        Results results = run(Designs.weirBelowFlume(
                1.6,
                flowCase("Low", 0.02, 0.5),
                new Design.FlowCase(
                        "Unknown",
                        "1 h",
                        "2030",
                        Designs.number(0.02, "m3/s"),
                        Designs.typed(new Value.None("not given"), "m"),
                        "",
                        java.util.Map.of())));
        Value none = new Value.None("not given");
        for (String symbol : List.of("z_u", "h_1")) {
            assertThat(values(results, "W1", symbol).get(1)).as(symbol).isEqualTo(none);
        }
        for (String symbol : List.of("z_t", "z_u", "h_a")) {
            assertThat(values(results, "F1", symbol).get(1)).as(symbol).isEqualTo(none);
        }
    }

    @Test
    void aLowFloorIsDrownedByTheWeirAndGivesNoMeasurement() {
        Results results = run(Designs.weirBelowFlume(1.05, flowCase("High", 0.1, 0.6)));
        assertThat(values(results, "W1", "z_u").get(0)).isInstanceOf(Value.Number.class);
        assertThat(values(results, "F1", "state")).containsExactly(Value.word("drowned"));
        assertThat(values(results, "F1", "h_a")).containsExactly(new Value.None("no result"));
        assertThat(values(results, "F1", "level")).containsExactly(Value.word("bounding level, not a measurement"));
        assertThat(((Value.Number) values(results, "F1", "z_u").get(0)).value())
                .isGreaterThan(((Value.Number) values(results, "F1", "z_t").get(0)).value());
    }

    @Test
    void cellsAndFormulasAreTheSameWhateverTheNumbers() {
        Results one = run(Designs.weirBelowFlume(1.6, flowCase("Low", 0.02, 0.5)));
        Results other = run(Designs.weirBelowFlume(1.1, flowCase("Low", 0.9, 1.4)));
        assertThat(described(one)).isEqualTo(described(other));
    }

    @Test
    void noCellThatIsSureHoldsWordsInPlaceOfANumber() {
        Results results = run(Designs.weirBelowFlume(1.6, flowCase("Dry", 0, 0.5), flowCase("Flood", 0.02, 1.19)));
        assertThat(results.cells())
                .filteredOn(cell ->
                        cell.sureness() == Sureness.SURE && cell.place().sheet().matches("[WF]1.*"))
                .allSatisfy(cell -> assertThat(results.value(cell)).isNotInstanceOf(Value.None.class));
    }

    private static Results run(Design design) {
        return JOB.run(design, List.of(), FoundFlows.NONE).results();
    }

    private static List<String> described(Results results) {
        return results.cells().stream()
                .map(cell -> cell + (cell.formula() == null ? "" : " = " + cell.formula() + " " + cell.sureness()))
                .toList();
    }

    /** The values of a symbol on the sheet of an element, one per case. */
    private static List<Value> values(Results results, String tag, String symbol) {
        Map<String, List<Value>> found = new HashMap<>();
        for (Sheet sheet : results.sheets()) {
            for (Block block : sheet.blocks()) {
                if (sheet.name().equals(tag) && block instanceof Block.Lines lines) {
                    for (Block.Line line : lines.lines()) {
                        List<Value> values = new ArrayList<>();
                        for (Cell cell : line.perCase()) {
                            values.add(results.value(cell));
                        }
                        found.putIfAbsent(line.symbol(), values);
                    }
                }
            }
        }
        return found.get(symbol);
    }
}
