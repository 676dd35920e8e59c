package nappe.formula;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import nappe.unit.Unit;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** Random formulas: their text reads back to the same tree, and their number is that of a second evaluation. */
class FormulaPropertyTest {
    private static final Map<String, Double> VALUES = Map.of("a", 1.5, "b", -2.25, "h_1", 0.4);

    @Property(tries = 500)
    void plainTextParsesBackToTheSameTree(@ForAll("formulas") Sample sample) {
        assertThat(FormulaParser.parse(PlainReading.of(sample.formula()))).isEqualTo(sample.formula());
    }

    @Property(tries = 500)
    void plainTextOfAConditionParsesBackToTheSameTree(@ForAll("conditions") Condition condition) {
        assertThat(FormulaParser.parse(PlainReading.of(condition.formula()))).isEqualTo(condition.formula());
    }

    @Property(tries = 500)
    void theNumberIsThatOfAnIndependentEvaluation(@ForAll("formulas") Sample sample) {
        Value value = NumberReading.of(sample.formula(), new Known());
        if (Double.isFinite(sample.number())) {
            assertThat(value).isEqualTo(new Value.Number(sample.number() == 0 ? 0.0 : sample.number()));
        } else {
            assertThat(value).isEqualTo(new Value.None("no result"));
        }
    }

    @Property(tries = 300)
    void theNumberOfTheTextIsTheNumberOfTheTree(@ForAll("formulas") Sample sample) {
        Formula again = FormulaParser.parse(PlainReading.of(sample.formula()));
        assertThat(NumberReading.of(again, new Known())).isEqualTo(NumberReading.of(sample.formula(), new Known()));
    }

    /** A formula made together with its number, so that the number owes nothing to the tree. */
    record Sample(Formula formula, double number) {}

    record Condition(Formula formula) {}

    @Provide
    Arbitrary<Sample> formulas() {
        return samples(4);
    }

    @Provide
    Arbitrary<Condition> conditions() {
        return conditions(3);
    }

    private static Arbitrary<Sample> samples(int depth) {
        Arbitrary<Sample> leaves = Arbitraries.oneOf(
                Arbitraries.of(VALUES.keySet()).map(name -> new Sample(new Formula.Symbol(name), VALUES.get(name))),
                Arbitraries.integers()
                        .between(0, 400)
                        .map(i -> i / 16.0)
                        .map(x -> new Sample(new Formula.Numeral(x, Double.toString(x)), x)),
                Arbitraries.of("ft", "m3/s", "m^(1/3)/s", "ft.lbf/s", "1/s")
                        .map(unit -> new Sample(new Formula.Quantity(2.5, "2.5", Unit.parse(unit)), 2.5 * 3)));
        if (depth == 0) {
            return leaves;
        }
        Arbitrary<Sample> inner = Arbitraries.lazy(() -> samples(depth - 1));
        return Arbitraries.oneOf(
                leaves,
                inner.map(x -> new Sample(new Formula.Negation(x.formula()), -x.number())),
                Combinators.combine(Arbitraries.of(Operator.class), inner, inner)
                        .as(FormulaPropertyTest::join),
                Combinators.combine(inner, inner, inner)
                        .as((x, y, z) -> new Sample(
                                call(
                                        Function.IF,
                                        new Formula.Comparison(Comparator.BELOW, x.formula(), y.formula()),
                                        y.formula(),
                                        z.formula()),
                                x.number() - y.number() < -1e-9 * Math.abs(y.number()) ? y.number() : z.number())),
                inner.map(x -> new Sample(call(Function.SQRT, x.formula()), Math.sqrt(x.number()))),
                Combinators.combine(inner, inner)
                        .as((x, y) -> new Sample(
                                call(Function.MAX, x.formula(), y.formula()), Math.max(x.number(), y.number()))));
    }

    private static Sample join(Operator operator, Sample x, Sample y) {
        double a = x.number();
        double b = y.number();
        double number = switch (operator) {
            case PLUS -> a + b;
            case MINUS -> a - b;
            case TIMES -> a * b;
            case OVER -> a / b;
            case POWER -> a == 0 && b == 0 ? Double.NaN : Math.pow(a, b);
        };
        return new Sample(
                new Formula.Operation(operator, x.formula(), y.formula()),
                Double.isFinite(number) ? number : Double.NaN);
    }

    private static Arbitrary<Condition> conditions(int depth) {
        Arbitrary<Formula> numbers = samples(2).map(Sample::formula);
        Arbitrary<Condition> comparisons = Combinators.combine(Arbitraries.of(Comparator.class), numbers, numbers)
                .as((comparator, a, b) -> new Condition(new Formula.Comparison(comparator, a, b)));
        if (depth == 0) {
            return comparisons;
        }
        Arbitrary<Condition> inner = Arbitraries.lazy(() -> conditions(depth - 1));
        return Arbitraries.oneOf(
                comparisons,
                Arbitraries.of("a", "h_1").map(s -> new Condition(call(Function.IS_NUMBER, new Formula.Symbol(s)))),
                inner.map(c -> new Condition(new Formula.Logic("not", List.of(c.formula())))),
                Combinators.combine(Arbitraries.of("and", "or"), inner, inner)
                        .as((kind, a, b) -> new Condition(new Formula.Logic(kind, List.of(a.formula(), b.formula())))));
    }

    private static Formula call(Function function, Formula... arguments) {
        return new Formula.Call(function, List.of(arguments));
    }

    /** Every unit is three times as large as one. */
    private static final class Known implements NumberReading.Values {
        @Override
        public Value of(String symbol) {
            return Value.of(VALUES.get(symbol));
        }

        @Override
        public List<Value> column(String symbol) {
            return List.of();
        }

        @Override
        public double size(Unit unit) {
            return 3;
        }
    }
}
