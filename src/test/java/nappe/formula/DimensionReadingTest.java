package nappe.formula;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.util.Map;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class DimensionReadingTest {
    private static final Map<String, String> UNITS =
            Map.of("h", "m", "b", "ft", "Q", "m3/s", "g", "m/s2", "n", "1", "rho", "kg/m3", "p", "Pa", "nu", "m2/s");

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            h + b                        | m
            h*b                          | m2
            Q/(h*b)                      | m/s
            sqrt(2*g*h)                  | m/s
            sqrt(g)*h^(5/2)              | m3/s
            2/3*sqrt(2*g)*b*h^1.5        | m3/s
            (Q^2/(g*b^2))^(1/3)          | m
            h^-1                         | 1/m
            h^0.5*h^0.5                  | m
            4 ft3/s * (b/1 ft)*(h/1 ft)^n | m3/s
            rho*g*h                      | Pa
            Q/(nu*h)                     | 1
            abs(-h)                      | m
            min(h, b, 1 mm)              | m
            if(h < b, h, none())         | m
            if(h < b, none(), Q)         | m3/s
            exp(h/b)                     | 1
            n^n                          | 1
            before(h) - h                | m
            highest(Q)                   | m3/s
            -p                           | Pa
            """)
    void comesOutAs(String text, String unit) {
        assertThat(dimension(text)).isEqualTo(Unit.parse(unit).dimension());
    }

    @Test
    void theSquareRootOfAnAccelerationTimesFiveHalvesOfALengthIsAFlow() {
        assertThat(dimension("sqrt(1 m/s2)*(1 m)^(5/2)")).isEqualTo(Dimension.FLOW);
        assertThat(dimension("1 m^(1/2)/s * (1 m)^(5/2)")).isEqualTo(Dimension.FLOW);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            1 + (h + Q)        | 5 | length plus length^3 time^-1; both sides must be alike | unlike-dimensions
            h - 1              | 0 | length minus a pure number; both sides must be alike | unlike-dimensions
            if(h < 2, 1, 2)    | 3 | length compared with a pure number; both sides must be alike | unlike-dimensions
            if(n < 2, h, Q)    | 0 | length or length^3 time^-1; both sides must be alike | unlike-dimensions
            if(n < 2, h, "x")  | 0 | length or words; both sides must be alike | unlike-dimensions
            max(h, n)          | 0 | length beside a pure number; both sides must be alike | unlike-dimensions
            n = "x" + 1        | 4 | a number is needed here, and this is words | not-a-number
            h^n                | 0 | length to a power that is not a plain number; divide by one of its unit first, as in (h/1 m)^n | power-of-dimension
            h^(n + 1)          | 0 | length to a power that is not a plain number; divide by one of its unit first, as in (h/1 m)^n | power-of-dimension
            h^(1/0)            | 0 | length to a power that is not a plain number; divide by one of its unit first, as in (h/1 m)^n | power-of-dimension
            n^h                | 0 | the exponent is length; an exponent is a pure number | exponent-dimension
            2*exp(h)           | 2 | exp of length; divide by one of its unit first | function-of-dimension
            ln(Q)              | 0 | ln of length^3 time^-1; divide by one of its unit first | function-of-dimension
            "a" = n            | 0 | words compared with a pure number; both sides must be alike | unlike-dimensions
            "a" < "b"          | 0 | words have no order; compare them with = or <> | words-ordered
            n = 2              | 0 | numbers are not tested for equality; use <= or >= | numbers-equal
            h <> b             | 0 | numbers are not tested for equality; use <= or >= | numbers-equal
            -(n < 2)           | 2 | a number is needed here, and this is a condition | not-a-number
            if(n, 1, 2)        | 3 | a condition is needed here, such as h < 2 ft | not-a-condition
            n < 2 and n        | 10 | a condition is needed here, such as h < 2 ft | not-a-condition
            1 + 20 degC        | 4 | degC has a zero of its own; use K or degR in formulas | unit-unfit
            h + k              | 4 | k is not known here | symbol-unknown
            """)
    void refusesAndSaysBothSides(String text, int offset, String message, String code) {
        FormulaException fault = catchThrowableOfType(FormulaException.class, () -> outcome(text));
        assertThat(fault).as(text).isNotNull().hasMessage(message);
        assertThat(fault.offset()).isEqualTo(offset);
        assertThat(fault.code()).isEqualTo(code);
    }

    /** A decimal that is no simple fraction must be refused in words, not end the run. */
    @ParameterizedTest
    @ValueSource(strings = {"h^0.12345678912", "h^123456789012", "h^(1/3)", "h^1.5"})
    void anyPlainExponentIsReadOrRefused(String text) {
        FormulaException fault = catchThrowableOfType(FormulaException.class, () -> outcome(text));
        assertThat(fault == null || fault.code().equals("power-of-dimension")).isTrue();
    }

    @Test
    void wordsAndConditionsAreNoQuantities() {
        assertThat(outcome("if(n < 2, \"free\", \"drowned\")")).isEqualTo(new DimensionReading.Words());
        assertThat(outcome("n < 2 or given(h)")).isEqualTo(new DimensionReading.Condition());
        assertThat(outcome("none()")).isEqualTo(new DimensionReading.Anything());
        assertThat(outcome("if(n < 2, none(), \"free\")")).isEqualTo(new DimensionReading.Words());
    }

    private static Dimension dimension(String text) {
        return ((DimensionReading.Quantity) outcome(text)).dimension();
    }

    private static DimensionReading.Outcome outcome(String text) {
        FormulaParser parser = new FormulaParser(text);
        Formula formula = parser.condition();
        parser.end();
        return formula.read(new DimensionReading(DimensionReadingTest::known, parser.offsets()));
    }

    private static DimensionReading.Outcome known(String symbol) {
        String unit = UNITS.get(symbol);
        if (unit == null) {
            throw new FormulaException(symbol + " is not known here", 0, 1, "symbol-unknown");
        }
        return new DimensionReading.Quantity(Unit.parse(unit).dimension());
    }
}
