package nappe.deliver.pdf;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.calculation.Reference;
import nappe.calculation.Run;
import nappe.calculation.Sureness;
import nappe.formula.Formula;
import nappe.formula.FormulaParser;
import nappe.formula.PlainReading;
import nappe.formula.Value;
import nappe.results.Results;
import nappe.unit.Unit;
import org.junit.jupiter.api.Test;

class SubstitutedReadingTest {
    private final Map<Cell, Value> values = new HashMap<>();

    private Cell typed(String unit, Value value) {
        Cell cell = Cell.typed(Cell.Kind.ENTRY, new Place("Given", 6, 2), "x", Unit.parse(unit), value);
        values.put(cell, value);
        return cell;
    }

    private Cell computed(String unit, double value) {
        Cell cell = Cell.live(
                new Place("F1", 3, 2), "x", Unit.parse(unit), FormulaParser.parse("1"), Map.of(), Sureness.SURE);
        values.put(cell, Value.of(value));
        return cell;
    }

    private String read(String formula, Map<String, Reference> references) {
        Formula parsed = FormulaParser.parse(formula);
        Cell cell = Cell.live(new Place("F1", 4, 2), "y", Unit.one(), parsed, references, Sureness.SURE);
        Results results = new Results(Invented.furniture(true, "", "issued"), List.of(), List.of(), values);
        return PlainReading.of(new SubstitutedReading(results).of(cell, parsed));
    }

    @Test
    void aComputedNumberHasTwoDigitsMoreThanIsPrintedOfAResult() {
        assertThat(read("h*2", Map.of("h", computed("ft", 0.123456789)))).isEqualTo("0.12346 ft * 2");
        assertThat(read("Q", Map.of("Q", computed("m3/s", 1.23456789)))).isEqualTo("1.23457 m3/s");
    }

    @Test
    void aTypedNumberKeepsItsDigits() {
        assertThat(read("h/1 ft", Map.of("h", typed("ft", Value.of(0.5))))).isEqualTo("0.5 ft / 1 ft");
    }

    @Test
    void aNegativeNumberIsANegation() {
        Map<String, Reference> references = Map.of("a", typed("1", Value.of(-0.5)), "b", typed("1", Value.of(2)));
        assertThat(read("b - a", references)).isEqualTo("2 - -0.5");
        assertThat(read("b + a", references)).isEqualTo("2 + -0.5");
        assertThat(read("b*a", references)).isEqualTo("2*-0.5");
        assertThat(read("a^b", references)).isEqualTo("(-0.5)^2");
        assertThat(read("a <= b", references)).isEqualTo("-0.5 <= 2");
    }

    @Test
    void wordsStandInTheirPlace() {
        assertThat(read("s = \"free\"", Map.of("s", typed("1", Value.word("submerged")))))
                .isEqualTo("\"submerged\" = \"free\"");
        assertThat(read("h*2", Map.of("h", typed("1", new Value.None("not given")))))
                .isEqualTo("none(\"not given\")*2");
    }

    @Test
    void aColumnIsNamedByItsAddress() {
        Run column = new Run(List.of(
                Cell.typed(Cell.Kind.TABLE, new Place("Sizes", 3, 1), "C", Unit.one(), Value.of(1)),
                Cell.typed(Cell.Kind.TABLE, new Place("Sizes", 9, 1), "C", Unit.one(), Value.of(2))));
        assertThat(read("C", Map.of("C", column))).isEqualTo("Sizes!B4:B10");
    }

    @Test
    void aConversionShowsItsFactor() {
        Cell factor =
                Cell.typed(Cell.Kind.CONSTANT, new Place("Factors", 3, 1), "1 in", Unit.parse("m"), Value.of(0.0254));
        values.put(factor, Value.of(0.0254));
        assertThat(read("W * 1 in", Map.of("W", typed("in", Value.of(12)), "1 in", factor)))
                .isEqualTo("12 in * (0.0254 m / 1 in)");
    }
}
