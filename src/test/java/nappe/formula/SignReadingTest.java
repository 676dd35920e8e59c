package nappe.formula;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** In the texts, p is greater than zero, z is zero or greater, a is any number. */
class SignReadingTest {
    private static final Map<String, Sign> SIGNS =
            Map.of("p", Sign.POSITIVE, "z", Sign.NOT_NEGATIVE, "a", Sign.ANY, "k", Sign.POSITIVE);

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            2               | POSITIVE
            0               | NOT_NEGATIVE
            3 m             | POSITIVE
            "free"          | POSITIVE
            -p              | ANY
            p + z           | POSITIVE
            z + z           | NOT_NEGATIVE
            p + a           | ANY
            p - z           | ANY
            p*p             | POSITIVE
            p*z             | NOT_NEGATIVE
            z*a             | ANY
            z/p             | NOT_NEGATIVE
            p/p             | POSITIVE
            p^a             | POSITIVE
            z^p             | NOT_NEGATIVE
            a^2             | NOT_NEGATIVE
            a^3             | ANY
            sqrt(p)         | POSITIVE
            sqrt(z)         | NOT_NEGATIVE
            exp(a)          | POSITIVE
            ln(p)           | ANY
            tanh(p)         | POSITIVE
            tanh(z)         | NOT_NEGATIVE
            sin(p)          | ANY
            abs(a)          | NOT_NEGATIVE
            abs(p)          | POSITIVE
            min(p, z)       | NOT_NEGATIVE
            min(p, k)       | POSITIVE
            max(a, z)       | NOT_NEGATIVE
            max(a, p)       | POSITIVE
            max(a, a)       | ANY
            if(a < p, p, z) | NOT_NEGATIVE
            if(a < p, p, a) | ANY
            if(a < p, p, none()) | POSITIVE
            before(z)       | NOT_NEGATIVE
            last(p)         | POSITIVE
            """)
    void hasTheSign(String text, Sign sign) {
        assertThat(finding(text).sign()).isEqualTo(sign);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "1/p",
                "z/p",
                "sqrt(z)",
                "ln(p)",
                "log10(p)",
                "a^2",
                "a^3",
                "z^p",
                "z^1.5",
                "p^a",
                "p^-1",
                "sin(a)",
                "tanh(a)",
                "atan(a)",
                "a*a - p",
                "sqrt(abs(a))",
                "1/(p + z)",
                "1/max(a, p)",
                "if(a < p, 1/p, 2)"
            })
    void isDefinedWhateverItsSymbolsMayBe(String text) {
        assertThat(finding(text).safe()).isTrue();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "1/z",
                "1/a",
                "p/(p - z)",
                "sqrt(a)",
                "sqrt(p - z)",
                "ln(z)",
                "log10(a)",
                "asin(z)",
                "acos(p)",
                "a^0.5",
                "a^p",
                "z^a",
                "z^0",
                "z^-1",
                "a^-2",
                "exp(a)",
                "if(a < p, 1/z, 2)",
                "if(1/z < p, 1, 2)",
                "max(1/z, 1)",
                "if(not 1/a < p, 1, 2)"
            })
    void cannotBeShownToBeDefined(String text) {
        assertThat(finding(text).safe()).isFalse();
    }

    @Test
    void lookUpsHaveTheSignOfTheirColumn() {
        assertThat(of(Function.INDEX, "z", "p")).isEqualTo(Sign.NOT_NEGATIVE);
        assertThat(of(Function.SMALL, "p", "p")).isEqualTo(Sign.POSITIVE);
        assertThat(of(Function.LOWEST_OF, "a")).isEqualTo(Sign.ANY);
        assertThat(of(Function.MATCH, "a", "a")).isEqualTo(Sign.POSITIVE);
        assertThat(of(Function.MATCH_BELOW, "a", "a")).isEqualTo(Sign.POSITIVE);
        assertThat(of(Function.TALLY, "a", "a")).isEqualTo(Sign.NOT_NEGATIVE);
    }

    private static Sign of(Function function, String... symbols) {
        List<Formula> arguments = java.util.Arrays.stream(symbols)
                .map(s -> (Formula) new Formula.Symbol(s))
                .toList();
        return SignReading.of(new Formula.Call(function, arguments), SIGNS::get).sign();
    }

    private static SignReading.Finding finding(String text) {
        return SignReading.of(FormulaParser.parse(text), SIGNS::get);
    }
}
