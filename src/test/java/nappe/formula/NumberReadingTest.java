package nappe.formula;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NumberReadingTest {
    private static final Value NO_RESULT = new Value.None("no result");

    private final Map<String, Value> symbols = new HashMap<>(Map.of(
            "x", Value.of(3),
            "zero", Value.of(0),
            "state", Value.word("Free"),
            "blank", new Value.None("not given"),
            "before x", Value.of(2),
            "after x", Value.of(5)));
    private final Map<String, List<Value>> columns = new HashMap<>(Map.of(
            "rise", numbers(1, 2, 4, 8),
            "mixed", List.of(Value.of(7), Value.word("small"), Value.of(-2), Value.of(5), Value.word("SMALL"))));

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            2 + 3*4                | 14
            2^3^2                  | 512
            -2^2                   | -4
            (-2)^2                 | 4
            (-8)^3                 | -512
            2^-1                   | 0.5
            7/4                    | 1.75
            1 ft + 0 m             | 0.3048
            sqrt(x + 1)            | 2
            exp(1)                 | 2.718281828459045
            ln(10)                 | 2.302585092994046
            log10(1000)            | 3
            sin(0.5)               | 0.479425538604203
            cos(0.5)               | 0.8775825618903728
            tan(0.5)               | 0.5463024898437905
            asin(0.5)              | 0.5235987755982989
            acos(0.5)              | 1.0471975511965979
            atan(1)                | 0.7853981633974483
            tanh(0.5)              | 0.46211715726000975
            abs(-x)                | 3
            min(4, x, 9)           | 3
            max(4, x, 9)           | 9
            if(x < 4, 1, 2)        | 1
            if(x > 4, 1, 2)        | 2
            x - before(x)          | 1
            after(x)               | 5
            last(rise)             | 8
            highest(rise)          | 8
            lowest(rise)           | 1
            """)
    void comesOutAs(String text, double expected) {
        Value.Number number = (Value.Number) value(text);
        assertThat(number.value()).isCloseTo(expected, within(1e-15 * Math.max(1, Math.abs(expected))));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "1/zero",
                "zero/zero",
                "zero^zero",
                "zero^-1",
                "(-8)^0.5",
                "sqrt(-1)",
                "ln(zero)",
                "log10(-x)",
                "asin(1.5)",
                "acos(-1.5)",
                "exp(1000)",
                "1e300*1e300",
                "none()",
                "if(x > 4, 1, none())",
                "blank + 1",
                "-state",
                "max(x, blank)",
                "sqrt(none())"
            })
    void outsideTheRangeOfDefinitionThereIsNoResult(String text) {
        assertThat(value(text)).isEqualTo(NO_RESULT);
    }

    @ParameterizedTest
    @ValueSource(strings = {"if(x > 4, 1/zero, 2)", "if(x < 4, 2, none())"})
    void theBranchNotTakenIsNotEvaluated(String text) {
        assertThat(value(text)).isEqualTo(Value.of(2));
    }

    @Test
    void minusNoughtIsNought() {
        assertThat(Double.compare(((Value.Number) value("-zero")).value(), 0.0)).isZero();
    }

    @Test
    void aSymbolAloneHandsOnWordsAndNotGiven() {
        assertThat(value("state")).isEqualTo(Value.word("Free"));
        assertThat(value("blank")).isEqualTo(new Value.None("not given"));
    }

    /** A value at its limit must not flip between engines: 1e-9 of the right side. */
    @ParameterizedTest
    @CsvSource({
        "<=, 1.0000000009, true", "<=, 1.0000000011, false",
        "<, 0.9999999991, false", "<, 0.9999999989, true",
        ">=, 0.9999999991, true", ">=, 0.9999999989, false",
        ">, 1.0000000009, false", ">, 1.0000000011, true",
        "=, 1.0000000009, true", "=, 1.0000000011, false",
        "<>, 0.9999999991, false", "<>, 0.9999999989, true"
    })
    void numbersAreComparedWithATolerance(String comparator, String left, boolean holds) {
        assertThat(holds(left + " " + comparator + " 1")).isEqualTo(holds);
        assertThat(holds("-" + left + " " + mirrored(comparator) + " -1")).isEqualTo(holds);
    }

    private static String mirrored(String comparator) {
        return comparator.startsWith("<>") || comparator.equals("=")
                ? comparator
                : comparator.replace('<', '\0').replace('>', '<').replace('\0', '>');
    }

    @ParameterizedTest
    @CsvSource({
        "1e-300 <= 0, false",
        "0 <= 0, true",
        "-1e-300 < 0, true",
        "0 < 0, false",
        "0 >= 0, true",
        "0 > 0, false"
    })
    void besideNoughtThereIsNoTolerance(String condition, boolean holds) {
        assertThat(holds(condition)).isEqualTo(holds);
    }

    @ParameterizedTest
    @CsvSource({
        "state = \"free\", true", "state = \"FREE\", true", "state <> \"free\", false", "state = \"drowned\", false",
        "state <> \"drowned\", true", "x = \"3\", false", "x <> \"3\", true", "blank = \"Not Given\", true"
    })
    void wordsAreComparedWithoutRegardToCase(String condition, boolean holds) {
        assertThat(holds(condition)).isEqualTo(holds);
    }

    @ParameterizedTest
    @CsvSource({
        "x < 4 and x > 2, true", "x < 4 and x > 3, false", "x < 2 or x > 2, true", "x < 2 or x > 4, false",
                "not x < 2, true",
        "not (x < 4 and x > 2), false", "given(x), true", "given(blank), false", "given(state), false",
                "not given(blank), true"
    })
    void conditionsAreJoined(String condition, boolean holds) {
        assertThat(holds(condition)).isEqualTo(holds);
    }

    @Test
    void sameIsExact() {
        symbols.put("near", Value.of(Math.nextUp(3.0)));
        assertThat(NumberReading.of(FormulaParser.parse("x"), values())).isEqualTo(Value.of(3));
        assertThat(same("x", "x")).isTrue();
        assertThat(same("x", "near")).isFalse();
        assertThat(same("blank", "blank")).isFalse();
    }

    @Test
    void matchFindsAWordWithoutRegardToCase() {
        assertThat(call(Function.MATCH, word("Small"), symbol("mixed"))).isEqualTo(Value.of(2));
        assertThat(call(Function.MATCH, number("-2"), symbol("mixed"))).isEqualTo(Value.of(3));
        assertThat(call(Function.MATCH, word("large"), symbol("mixed"))).isEqualTo(NO_RESULT);
    }

    @ParameterizedTest
    @CsvSource({"1, 1", "1.999, 1", "2, 2", "7.9, 3", "8, 4", "99, 4"})
    void matchBelowFindsTheRowThatIsNotAbove(String key, double place) {
        assertThat(call(Function.MATCH_BELOW, number(key), symbol("rise"))).isEqualTo(Value.of(place));
    }

    @Test
    void belowTheFirstRowThereIsNone() {
        assertThat(call(Function.MATCH_BELOW, number("0.999"), symbol("rise"))).isEqualTo(NO_RESULT);
    }

    @Test
    void indexGivesWhatStandsAtAPlaceCountedFromOne() {
        assertThat(call(Function.INDEX, symbol("mixed"), number("2"))).isEqualTo(Value.word("small"));
        assertThat(call(Function.INDEX, symbol("mixed"), number("5"))).isEqualTo(Value.word("SMALL"));
        assertThat(call(Function.INDEX, symbol("mixed"), number("0"))).isEqualTo(NO_RESULT);
        assertThat(call(Function.INDEX, symbol("mixed"), number("6"))).isEqualTo(NO_RESULT);
    }

    @Test
    void smallAndLowestLookAtTheNumbersOnly() {
        assertThat(call(Function.SMALL, symbol("mixed"), number("1"))).isEqualTo(Value.of(-2));
        assertThat(call(Function.SMALL, symbol("mixed"), number("3"))).isEqualTo(Value.of(7));
        assertThat(call(Function.SMALL, symbol("mixed"), number("4"))).isEqualTo(NO_RESULT);
        assertThat(call(Function.LOWEST_OF, symbol("mixed"))).isEqualTo(Value.of(-2));
    }

    @Test
    void lowestOfWordsAloneIsNoResult() {
        columns.put("words", List.of(Value.word("a"), new Value.None("not given")));
        assertThat(call(Function.LOWEST_OF, symbol("words"))).isEqualTo(NO_RESULT);
    }

    @Test
    void tallyCountsAWordWithoutRegardToCase() {
        assertThat(call(Function.TALLY, symbol("mixed"), word("small"))).isEqualTo(Value.of(2));
        assertThat(call(Function.TALLY, symbol("mixed"), word("large"))).isEqualTo(Value.of(0));
    }

    private Value value(String text) {
        return NumberReading.of(FormulaParser.parse(text), values());
    }

    private boolean holds(String text) {
        return new NumberReading(values()).holds(FormulaParser.parse(text));
    }

    private boolean same(String a, String b) {
        return new NumberReading(values()).holds(new Formula.Call(Function.SAME, List.of(symbol(a), symbol(b))));
    }

    private Value call(Function function, Formula... arguments) {
        return NumberReading.of(new Formula.Call(function, List.of(arguments)), values());
    }

    private static Formula symbol(String name) {
        return new Formula.Symbol(name);
    }

    private static Formula word(String text) {
        return new Formula.Word(text);
    }

    private static Formula number(String text) {
        return new Formula.Numeral(Double.parseDouble(text), text);
    }

    private static List<Value> numbers(double... numbers) {
        return Arrays.stream(numbers).mapToObj(Value::of).toList();
    }

    private NumberReading.Values values() {
        return new NumberReading.Values() {
            @Override
            public Value of(String symbol) {
                return symbols.get(symbol);
            }

            @Override
            public List<Value> column(String symbol) {
                return columns.get(symbol);
            }

            @Override
            public double size(Unit unit) {
                return unit.sizeIn(WorkingSystem.SI);
            }
        };
    }
}
