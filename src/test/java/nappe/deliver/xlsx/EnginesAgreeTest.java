package nappe.deliver.xlsx;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import nappe.calculation.Block;
import nappe.calculation.Block.Align;
import nappe.calculation.Cell;
import nappe.calculation.Formulas;
import nappe.calculation.Place;
import nappe.calculation.Reference;
import nappe.calculation.Sheet;
import nappe.calculation.Sureness;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.formula.FormulaParser;
import nappe.formula.Function;
import nappe.formula.Operator;
import nappe.formula.Value;
import nappe.results.Results;
import nappe.unit.Unit;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.EdgeCasesMode;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.ShrinkingMode;

/** Java, LibreOffice and Gnumeric give one number for one formula, leading minus signs and powers included. */
class EnginesAgreeTest {
    private static final int FORMULAS = 400;
    private static final String SHEET = "Random's own";
    private static final Map<String, Double> TYPED = new LinkedHashMap<>();

    static {
        double[] values = {0.37, 1.0 / 3, 1.62, 2, 3, 4.75, 0.1 + 0.2, 12.5, 0.045, 7.77};
        for (int i = 0; i < values.length; i++) {
            TYPED.put("x" + i, values[i]);
        }
    }

    /** What spreadsheet programs read each in their own way when it is written as in mathematics. */
    private static final List<String> AWKWARD = List.of(
            "-x3^2",
            "(-x3)^2",
            "-x3^-2",
            "(-x3)^-3",
            "x3^x4^x3",
            "(x3^x4)^x3",
            "x4^-x3^2",
            "-x3^x4^0.5",
            "x0-x3^2",
            "x0*-x3^2",
            "-x3*-x4",
            "-(-x3)",
            "-(-x3)^2",
            "x3-(-x4)",
            "x0/x3/x4",
            "x0/(x3/x4)",
            "x0-(x3-x4)",
            "-(x3 - x4)^2",
            "(x3 - x4)^2",
            "2^-x0",
            "-x3^0.5/x4",
            "1 - x0*-2^2");

    @Property(tries = 1, seed = "20260314", shrinking = ShrinkingMode.OFF, edgeCases = EdgeCasesMode.NONE)
    void oneNumberForOneFormula(@ForAll("many") Batch formulas) throws IOException {
        List<Formula> all =
                new ArrayList<>(AWKWARD.stream().map(FormulaParser::parse).toList());
        all.addAll(formulas.all());
        Results results = results(all);
        Tame tame = new Tame(TYPED);
        for (Cell cell : results.cells()) {
            Formula formula = cell.formula();
            if (formula != null) {
                double other = tame.value(formula);
                assertThat(((Value.Number) results.value(cell)).value())
                        .as(SpreadsheetReading.of(cell))
                        .isCloseTo(other, within(1e-12 * Math.abs(other)));
            }
        }
        Path file = Files.createTempFile("nappe-engines", ".xlsx");
        try {
            Files.write(file, Spoiler.spoil(XlsxDelivery.render(results)));
            assertThat(Recalculated.disagreements(Recalculated.byGnumeric(file), results, 0))
                    .isEmpty();
            assertThat(Recalculated.disagreements(Recalculated.byLibreOffice(file), results, 0))
                    .isEmpty();
        } finally {
            Files.delete(file);
        }
    }

    /** Many formulas, which no report should print. */
    record Batch(List<Formula> all) {
        @Override
        public String toString() {
            return all.size() + " formulas";
        }
    }

    @Provide
    Arbitrary<Batch> many() {
        Tame tame = new Tame(TYPED);
        Arbitrary<Formula> grown = Arbitraries.recursive(EnginesAgreeTest::leaf, EnginesAgreeTest::larger, 1, 4);
        return grown.filter(10_000, tame::is).list().ofSize(FORMULAS).map(Batch::new);
    }

    private static Arbitrary<Formula> leaf() {
        Arbitrary<Formula> symbols = Arbitraries.of(TYPED.keySet()).map(Formulas::symbol);
        Arbitrary<Formula> numerals =
                Arbitraries.of("2", "3", "0.5", "1.522", "10", "0.07", "1e-2").map(Formulas::number);
        return Arbitraries.oneOf(symbols, numerals);
    }

    private static Arbitrary<Formula> larger(Arbitrary<Formula> inner) {
        Arbitrary<Formula> whole = Arbitraries.of("2", "3", "1").map(Formulas::number);
        Arbitrary<Formula> exponent = Arbitraries.oneOf(leaf(), whole, whole.map(Formula.Negation::new), inner);
        Arbitrary<Formula> powers =
                Combinators.combine(inner, exponent).as((a, b) -> new Formula.Operation(Operator.POWER, a, b));
        Arbitrary<Formula> operations = Combinators.combine(Arbitraries.of(Operator.values()), inner, inner)
                .as(Formula.Operation::new);
        Arbitrary<Formula> negations = inner.map(Formula.Negation::new);
        Arbitrary<Formula> calls = Combinators.combine(
                        Arbitraries.of(Stream.of(Function.values())
                                .filter(f -> f.least() == 1 && f.compareTo(Function.MATCH) < 0)
                                .toList()),
                        inner)
                .as((function, x) -> Formulas.call(function, x));
        Arbitrary<Formula> extremes = Combinators.combine(Arbitraries.of(Function.MIN, Function.MAX), inner, inner)
                .as((function, a, b) -> Formulas.call(function, a, b));
        Arbitrary<Formula> choices = Combinators.combine(
                        Arbitraries.of(Comparator.values()), inner, inner, leaf(), inner)
                .as((comparator, a, b, yes, no) -> Formulas.iff(Formulas.compare(a, comparator, b), yes, no));
        return Arbitraries.oneOf(powers, operations, operations, negations, calls, extremes, choices);
    }

    private static Results results(List<Formula> formulas) {
        List<Cell> cells = new ArrayList<>();
        List<Block.Row> rows = new ArrayList<>();
        Map<String, Reference> known = new LinkedHashMap<>();
        TYPED.forEach((name, value) -> {
            Cell cell = Cell.typed(
                    Cell.Kind.ENTRY, new Place(SHEET, 5 + rows.size(), 1), name, Unit.one(), Value.of(value));
            known.put(name, cell);
            add(cell, cells, rows);
        });
        for (Formula formula : formulas) {
            Place place = new Place(SHEET, 5 + rows.size(), 1);
            add(Cell.live(place, "", Unit.one(), formula, known, Sureness.SURE), cells, rows);
        }
        List<Block.Column> columns =
                List.of(new Block.Column("Equation", 80, Align.LEFT), new Block.Column("Value", 14, Align.RIGHT));
        Sheet sheet = new Sheet(1, SHEET, "Random formulas", List.of(new Block.Table(4, "", columns, rows)));
        return new Results(Sample.FURNITURE, List.of(sheet), cells, Evaluated.of(cells));
    }

    private static void add(Cell cell, List<Cell> cells, List<Block.Row> rows) {
        cells.add(cell);
        rows.add(new Block.Row(List.of(new Block.Equation(cell), new Block.Content(cell))));
    }
}
