package nappe.formula;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PlainReadingTest {
    /** Each is written with the fewest brackets, so that reading and writing it gives it back. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "a + b - c",
                "a - (b - c)",
                "a*b/c",
                "a/(b*c)",
                "(a + b)*c",
                "-a^2",
                "(-a)^2",
                "a^(-b^c)",
                "(a^b)^c",
                "-(a + b)",
                "4 ft3/s * (W/1 ft)*(h_a/1 ft)^n",
                "h/1 ft * 2",
                "(4 ft)^2/1 ft",
                "-1 ft * h",
                "if(given(x), x, none())",
                "if(a <= b + c and not d > 0.5, \"met\", none())",
                "if((a < b or c < d) and e = \"free\", 1, 2)",
                "max(a, b, c^2)",
                "last(w_x) + before(S_x)"
            })
    void readsBackAsWritten(String text) {
        assertThat(PlainReading.of(FormulaParser.parse(text))).isEqualTo(text);
    }

    @ParameterizedTest
    @ValueSource(strings = {"S_f*L"})
    void saysWhatItDefines(String text) {
        assertThat(PlainReading.of("h_f", FormulaParser.parse(text))).isEqualTo("h_f = S_f*L");
    }
}
