package nappe.deliver.pdf;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.Collectors;
import nappe.formula.Formula;
import nappe.formula.FormulaParser;
import nappe.formula.Function;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TypesetReadingTest {
    /** Pieces in a row: italics in slashes, lowered after an underscore, raised after a caret. */
    private static String marked(List<Piece> pieces) {
        return pieces.stream()
                .map(piece -> switch (piece.shift()) {
                            case NONE -> "";
                            case LOWERED -> "_";
                            case RAISED -> "^";
                            case LOWERED_IN_RAISED -> "^_";
                            case RAISED_TWICE -> "^^";
                        }
                        + (piece.face() == Piece.Face.ITALIC ? "/" + piece.text() + "/" : piece.text()))
                .collect(Collectors.joining());
    }

    private static String typeset(String formula) {
        return marked(TypesetReading.inSymbols(FormulaParser.parse(formula)).pieces())
                .replace('\u00a0', '~')
                .replace("\u2009", "");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "h_f                                 | /h/_f",
                "Delta_h_max                         | /Δ/_h,max",
                "rho_1*g                             | /ρ/_1 /g/",
                "2*g*h                               | 2 /g/ /h/",
                "C*(h/1 ft)^n                        | /C/ (/h//(1~ft))^/n/",
                "1 ft * (Q/(C*1 ft3/s))^(1/n)        | 1~ft × (/Q//(/C/ × 1~ft³/s))^1^/^/n/",
                "a - (b - c)                         | /a/ − (/b/ − /c/)",
                "a - (b + c)*d                       | /a/ − (/b/ + /c/) /d/",
                "a/(b*c)                             | /a//(/b/ /c/)",
                "a/(b/c)                             | /a//(/b///c/)",
                "-a^2                                | −/a/^2",
                "(-a)^2                              | (−/a/)^2",
                "a^-b                                | /a/^−^/b/",
                "(a^b)^c                             | (/a/^/b/)^/c/",
                "a^(b^c_1)                           | /a/^/b/^^/c/^_1",
                "sqrt(2*g*h)                         | √(2 /g/ /h/)",
                "log10(S) + ln(x)                    | log_10(/S/) + ln(/x/)",
                "min(a, b)                           | min(/a/, /b/)",
                "a <= b and not (c > d or e <> 1)    | /a/ ≤ /b/ and not (/c/ > /d/ or /e/ ≠ 1)",
                "before(x)/2                         | before(/x/)/2",
                "highest(y)                          | highest(/y/)"
            })
    void aFormulaIsSetAsAnEngineerWritesIt(String formula, String expected) {
        assertThat(typeset(formula)).isEqualTo(expected);
    }

    @Test
    void aChoiceReadsInWords() {
        Formula choice = new Formula.Call(
                Function.IF,
                List.of(
                        FormulaParser.parse("S_f <= S_x"),
                        FormulaParser.parse("h_f"),
                        new Formula.NoResult("no result")));
        assertThat(marked(TypesetReading.inSymbols(choice).pieces()))
                .isEqualTo("/h/_f if /S/_f ≤ /S/_x, otherwise no result");
        assertThat(typeset("if(a < b, \"free\", if(a < c, \"submerged\", \"drowned\"))"))
                .isEqualTo("“free” if /a/ < /b/, or “submerged” if /a/ < /c/, otherwise “drowned”");
        assertThat(typeset("2*if(a < b, c, d)")).isEqualTo("2 (/c/ if /a/ < /b/, otherwise /d/)");
    }

    @Test
    void anAbsoluteValueStandsBetweenBars() {
        assertThat(typeset("abs(a - b)")).isEqualTo("|/a/ − /b/|");
    }

    @Test
    void noFormulaLosesItsBrackets() {
        Formula formula = FormulaParser.parse("(a + b)*(c - d)/((e + f)*g)^(1/(m + 1))");
        assertThat(TypesetReading.inSymbols(formula).plain().replace("\u2009", ""))
                .isEqualTo("(a + b) (c − d)/((e + f) g)1/(m + 1)");
    }
}
