package nappe.formula;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import nappe.unit.Unit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class FormulaParserTest {
    /** Each pair is the same tree: the right side has a bracket for every operation. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            a + b*c                | a + (b*c)
            a - b - c              | (a - b) - c
            a/b/c                  | (a/b)/c
            a/b*c                  | (a/b)*c
            a^b^c                  | a^(b^c)
            a*b^c                  | a*(b^c)
            -a^2                   | -(a^2)
            -a*b                   | (-a)*b
            a - -b                 | a - (-b)
            a*-b                   | a*(-b)
            a^-b^c                 | a^(-(b^c))
            --a                    | -(-a)
            a + b < c*d            | (a + b) < (c*d)
            a < b and c < d        | (a < b) and (c < d)
            a < b or c < d and e<f | a < b or (c < d and e < f)
            not a < b and c < d    | (not a < b) and c < d
            """)
    void bindsAsInMathematics(String plain, String bracketed) {
        assertThat(FormulaParser.parse(plain)).isEqualTo(FormulaParser.parse(bracketed));
    }

    @Test
    void aUnitFollowsANumeralAndOneBlank() {
        Formula quantity = new Formula.Quantity(4, "4", Unit.parse("ft3/s"));
        assertThat(FormulaParser.parse("4 ft3/s")).isEqualTo(quantity);
        assertThat(FormulaParser.parse("4 ft3/s * W")).isEqualTo(times(quantity, new Formula.Symbol("W")));
        assertThat(FormulaParser.parse("W*(4 ft3/s)")).isEqualTo(times(new Formula.Symbol("W"), quantity));
    }

    @Test
    void aUnitMayHoldBracketsAndEndsAtACommaOrAnUnmatchedBracket() {
        Formula root = new Formula.Quantity(1.49, "1.49", Unit.parse("ft^(1/3)/s"));
        assertThat(FormulaParser.parse("(1.49 ft^(1/3)/s)")).isEqualTo(root);
        assertThat(FormulaParser.parse("max(1 ft, 2 ft)"))
                .isEqualTo(new Formula.Call(Function.MAX, java.util.List.of(feet("1"), feet("2"))));
    }

    @Test
    void aUnitMayStartWithOneOver() {
        assertThat(FormulaParser.parse("k*2.5 1/s"))
                .isEqualTo(times(new Formula.Symbol("k"), new Formula.Quantity(2.5, "2.5", Unit.parse("1/s"))));
    }

    @Test
    void aNameAfterANumeralThatIsNoUnitIsANameOfItsOwn() {
        FormulaParser parser = new FormulaParser("2 when x");
        assertThat(parser.sum()).isEqualTo(new Formula.Numeral(2, "2"));
        assertThat(parser.passes("when")).isTrue();
        assertThat(parser.sum()).isEqualTo(new Formula.Symbol("x"));
        assertThat(parser.atEnd()).isTrue();
    }

    @Test
    void numeralsKeepTheirDigits() {
        assertThat(FormulaParser.parse("1.50e-3")).isEqualTo(new Formula.Numeral(0.0015, "1.50e-3"));
        assertThat(FormulaParser.parse("2.0E+6")).isEqualTo(new Formula.Numeral(2e6, "2.0E+6"));
    }

    @Test
    void wordsStandInQuotes() {
        assertThat(FormulaParser.parse("\"not free; # 3\"")).isEqualTo(new Formula.Word("not free; # 3"));
    }

    @Test
    void givenAsksForASymbolAndNoneIsNoResult() {
        assertThat(FormulaParser.parse("given(h_g)"))
                .isEqualTo(new Formula.Call(Function.IS_NUMBER, java.util.List.of(new Formula.Symbol("h_g"))));
        assertThat(FormulaParser.parse("none()")).isEqualTo(new Formula.NoResult("no result"));
    }

    @Test
    void rowsOfAMarchAreReferredToByNeighbourAndSummary() {
        assertThat(FormulaParser.parse("before(y)")).isEqualTo(new Formula.Neighbour(true, "y"));
        assertThat(FormulaParser.parse("after(y)")).isEqualTo(new Formula.Neighbour(false, "y"));
        assertThat(FormulaParser.parse("highest(y)")).isEqualTo(new Formula.Summary("highest", "y"));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "sqrt(x)",
                "exp(x)",
                "ln(x)",
                "log10(x)",
                "sin(x)",
                "cos(x)",
                "tan(x)",
                "asin(x)",
                "acos(x)",
                "atan(x)",
                "tanh(x)",
                "abs(x)",
                "min(x, y)",
                "max(x, y, z)",
                "if(x < y, x, y)"
            })
    void functionsForAuthorsAreRead(String text) {
        assertThat(FormulaParser.parse(text)).isInstanceOf(Formula.Call.class);
    }

    /** Text, offset, length, message and code. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            a +             | 3 | 1 | found the end where a number, a symbol or "(" was expected | syntax
            a b             | 2 | 1 | found "b" where an operation or the end was expected      | syntax
            (a + b          | 6 | 1 | found the end where ")" was expected                      | syntax
            a)              | 1 | 1 | found ")" where an operation or the end was expected      | syntax
            a < b < c       | 6 | 1 | found "<" where an operation or the end was expected      | syntax
            a * / b         | 4 | 1 | found "/" where a number, a symbol or "(" was expected    | syntax
            before(2)       | 7 | 1 | found "2" where a symbol was expected                     | syntax
            given(a + b)    | 8 | 1 | found "+" where ")" was expected                          | syntax
            none(a)         | 5 | 1 | found "a" where ")" was expected                          | syntax
            a + 3h          | 4 | 2 | "3h": leave a blank between a number and its unit         | unit-unclear
            a & b           | 2 | 1 | "&" has no meaning in a formula                           | sign-unknown
            a = "free       | 4 | 5 | these words are not closed by a quote                     | quote-open
            a + sine(b)     | 4 | 4 | sine is not a function                                    | function-unknown
            match(a, b)     | 0 | 5 | match is not a function                                   | function-unknown
            2*sqrt(a, b)    | 2 | 4 | sqrt takes 1 arguments, here are 2                        | arguments-wrong
            if(a < b, c)    | 0 | 2 | if takes 3 arguments, here are 2                          | arguments-wrong
            max(a)          | 0 | 3 | max takes 2 or more arguments, here are 1                 | arguments-wrong
            sqrt()          | 5 | 1 | found ")" where a number, a symbol or "(" was expected    | syntax
            1.              | 1 | 1 | "." has no meaning in a formula                           | sign-unknown
            """)
    void aFaultSaysItsPlace(String text, int offset, int length, String message, String code) {
        FormulaException fault = catchThrowableOfType(FormulaException.class, () -> FormulaParser.parse(text));
        assertThat(fault).as(text).isNotNull().hasMessage(message);
        assertThat(fault.offset()).isEqualTo(offset);
        assertThat(fault.length()).isEqualTo(length);
        assertThat(fault.code()).isEqualTo(code);
    }

    @ParameterizedTest
    @ValueSource(strings = {"2.5", "2 m", "12345", "x"})
    void aCountIsAWholeNumberOfAtMostFourDigits(String text) {
        FormulaException fault = catchThrowableOfType(FormulaException.class, () -> new FormulaParser(text).count());
        assertThat(fault).hasMessageEndingWith("where a whole number was expected");
        assertThat(new FormulaParser("20").count()).isEqualTo(20);
    }

    @Test
    void nodesKnowWhereTheyStart() {
        FormulaParser parser = new FormulaParser("a + sqrt(b)*c");
        Formula.Operation sum = (Formula.Operation) parser.condition();
        Formula.Operation product = (Formula.Operation) sum.right();
        assertThat(parser.offsets().get(sum)).isEqualTo(0);
        assertThat(parser.offsets().get(product)).isEqualTo(4);
        assertThat(parser.offsets().get(product.right())).isEqualTo(12);
    }

    private static Formula times(Formula a, Formula b) {
        return new Formula.Operation(Operator.TIMES, a, b);
    }

    private static Formula feet(String digits) {
        return new Formula.Quantity(Double.parseDouble(digits), digits, Unit.parse("ft"));
    }

    @Test
    void aFormulaThatIsTooDeepOrTooLongIsRefusedInWords() {
        assertThat(FormulaParser.parse("(".repeat(59) + "1" + ")".repeat(59))).isEqualTo(FormulaParser.parse("1"));
        for (String deep : new String[] {
            "(".repeat(200_000) + "1" + ")".repeat(200_000),
            "-".repeat(100_000) + "1",
            "not ".repeat(300) + "a < b",
            "(".repeat(300) + "1" + ")".repeat(300),
            "-".repeat(300) + "1"
        }) {
            assertThatThrownBy(() -> FormulaParser.parse(deep))
                    .isInstanceOf(FormulaException.class)
                    .hasMessageContaining("write");
        }
        assertThatThrownBy(() -> FormulaParser.parse("1" + "+1".repeat(2000)))
                .isInstanceOf(FormulaException.class)
                .hasMessageContaining("more than 2000 parts");
    }
}
