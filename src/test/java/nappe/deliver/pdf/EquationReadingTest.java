package nappe.deliver.pdf;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import nappe.formula.Formula;
import nappe.formula.FormulaParser;
import nappe.formula.Function;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class EquationReadingTest {
    private static Box box(String formula) {
        return box(FormulaParser.parse(formula), false);
    }

    private static Box box(Formula formula, boolean numbers) {
        return formula.read(new EquationReading(Type.of(10), 300, numbers)).box();
    }

    private static String set(String formula) {
        return Boxes.marked(box(formula));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "h_f                        | /h/_{f}",
                "Delta_h_max                | /Δ/_{h,max}",
                "rho_1*g                    | /ρ/_{1}/g/",
                "2*g*h                      | 2/g//h/",
                "a/b                        | ^{/a/}—_{/b/}",
                "a/b/c                      | ^{^{/a/}—_{/b/}}—_{/c/}",
                "a/(b*c)                    | ^{/a/}—_{/b//c/}",
                "a*b/(c + d)                | ^{/a//b/}—_{/c/+/d/}",
                "C*2/3*b                    | /C/×^{2}—_{3}/b/",
                "C*(h/1 ft)^n               | /C/~^{/h/}—_{1ft}~^{/n/}",
                "1 ft * (Q/(C*1 ft3/s))^(1/n) | 1ft×~^{/Q/}—_{/C/×1ft³/s}~^{1//n/}",
                "a - (b - c)                | /a/−(/b/−/c/)",
                "a - (b + c)*d              | /a/−(/b/+/c/)/d/",
                "-a^2                       | −/a/^{2}",
                "(-a)^2                     | (−/a/)^{2}",
                "a - -b                     | /a/−(−/b/)",
                "a*-2                       | /a/(−2)",
                "-(a/b)                     | −^{/a/}—_{/b/}",
                "a^-b                       | /a/^{−/b/}",
                "(a^b)^c                    | (/a/^{/b/})^{/c/}",
                "a^(b^c_1)                  | /a/^{/b/^{/c/_{1}}}",
                "h_a^n                      | /h/^{/n/}_{a}",
                "(2 m)^2                    | (2m)^{2}",
                "a^(1/(2*n))                | /a/^{1/(2/n/)}",
                "sqrt(2*g*h)                | ~2/g//h/",
                "sqrt(a/b)                  | ~^{/a/}—_{/b/}",
                "abs(a - b)                 | —/a/−/b/—",
                "log10(S) + ln(x)           | log_{10}(/S/)+ln(/x/)",
                "min(a, b)                  | min(/a/,/b/)",
                "a <= b and not (c > d or e <> 1) | /a/≤/b/andnot(/c/>/d/or/e/≠1)",
                "before(x)/2                | ^{before(/x/)}—_{2}",
                "highest(y)                 | highest(/y/)"
            })
    void aFormulaIsSetAsATextbookSetsIt(String formula, String expected) {
        assertThat(set(formula).replace("_{}", "")).isEqualTo(expected);
    }

    @Test
    void productsOfNumbersHaveACross() {
        assertThat(Boxes.marked(box(FormulaParser.parse("2 ft * 3 * (1 + 2)*(3 + 4)"), true)))
                .isEqualTo("2ft×3×(1+2)×(3+4)");
    }

    @Test
    void aChoiceIsABraceWithCasesInRows() {
        Formula choice = new Formula.Call(
                Function.IF,
                List.of(
                        FormulaParser.parse("S_f <= S_x"),
                        FormulaParser.parse("h_f"),
                        new Formula.NoResult("no result")));
        assertThat(Boxes.marked(box(choice, false))).isEqualTo("~^{/h/_{f}if/S/_{f}≤/S/_{x}_{noresultotherwise}}");
        assertThat(set("if(a < b, \"free\", if(a < c, \"submerged\", \"drowned\"))"))
                .isEqualTo("~^{“free”if/a/</b/_{“submerged”if/a/</c/}_{“drowned”otherwise}}");
        assertThat(set("2*if(a < b, c, d)")).isEqualTo("2~~^{/c/if/a/</b/_{/d/otherwise}}~");
    }

    @Test
    void whatIsNotGivenIsBracketedInAProduct() {
        Formula product = new Formula.Operation(
                nappe.formula.Operator.TIMES, new Formula.NoResult("not given"), new Formula.Numeral(2, "2"));
        assertThat(Boxes.marked(box(product, true))).isEqualTo("(notgiven)×2");
    }

    @Test
    void theBarOfAFractionStandsOnTheAxisOfTheMinusSign() {
        Box fraction = box("a/b");
        Box.Part bar = fraction.parts().get(1);
        assertThat((bar.top() + bar.bottom()) / 2).isEqualTo(3.3, within(1e-9));
        assertThat(fraction.parts().get(0).bottom()).isGreaterThan(bar.top() + 1);
        assertThat(fraction.parts().get(2).top()).isLessThan(bar.bottom() - 1);
    }

    @Test
    void widthsAndBaselinesAreThoseOfTheTypeface() {
        assertThat(box("h").width()).isEqualTo(5.23, within(1e-6));
        assertThat(box("h").above()).isEqualTo(7.12, within(1e-6));
        assertThat(box("h").below()).isEqualTo(0.0, within(1e-6));
        Box sum = box("a + b");
        assertThat(sum.width()).isEqualTo(box("a").width() + box("b").width() + 4.97 + 4.4, within(1e-6));
        Box power = box("h^n");
        assertThat(power.parts().get(1).x()).isEqualTo(5.83, within(1e-6));
        assertThat(power.parts().get(1).y()).isEqualTo(3.8, within(1e-6));
        Box both = box("h_a^n");
        assertThat(both.parts().get(1).x()).isEqualTo(5.83, within(1e-6));
        assertThat(both.parts().get(2).x()).isEqualTo(5.43, within(1e-6));
        assertThat(both.parts().get(2).y()).isEqualTo(-2.0, within(1e-6));
    }

    @Test
    void bracketsAndRootsGrowWithWhatTheyHold() {
        assertThat(box("(a + b)*c").height()).isLessThan(10);
        Box tall = box("(a/b + 1)*c");
        assertThat(tall.parts().get(0).box().above()).isGreaterThan(box("a/b").above());
        assertThat(tall.parts().get(0).box().below()).isGreaterThan(box("a/b").below());
        assertThat(box("sqrt(a/b)").above()).isGreaterThan(box("a/b").above() + 1);
        assertThat(box("sqrt(a/b)").below()).isGreaterThanOrEqualTo(box("a/b").below());
    }

    private static org.assertj.core.data.Offset<Double> within(double value) {
        return org.assertj.core.data.Offset.offset(value);
    }
}
