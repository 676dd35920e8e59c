package nappe.deliver.pdf;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import nappe.formula.Formula;
import nappe.formula.FormulaParser;
import nappe.formula.Function;
import nappe.formula.Operator;
import nappe.unit.Unit;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.junit.jupiter.api.Test;

class EquationSettingTest {
    private static final double WIDTH = 260;

    private static Equation set(String symbol, String formula, String numbers, double width) {
        return new EquationSetting(symbol, 9.5, width)
                .symbols(FormulaParser.parse(formula))
                .numbers(FormulaParser.parse(numbers))
                .equation();
    }

    @Test
    void anEquationReadsAsItsPlainFormula() {
        assertThat(set("h_f", "h_0*(Q/(Q_0*C))^(1/n)", "1 ft * (2.5 ft3/s / (1 ft3/s * 4))^(1/1.522)", WIDTH)
                        .texts())
                .containsExactly("h_f = h_0*(Q/(Q_0*C))^(1/n)", "= 1 ft * (2.5 ft3/s / (1 ft3/s * 4))^(1/1.522)");
    }

    @Test
    void theNumbersAreAlignedAtTheEqualsSign() {
        Box box = set("Q_max", "q*Q_0", "50.4*1 ft3/s", WIDTH).box();
        double symbols =
                box.parts().get(0).x() + box.parts().get(0).box().parts().get(1).x();
        double numbers =
                box.parts().get(1).x() + box.parts().get(1).box().parts().get(0).x();
        assertThat(Boxes.marked(box.parts().get(0).box())).isEqualTo("/Q/_{max}=/q//Q/_{0}");
        assertThat(Boxes.marked(box.parts().get(1).box())).isEqualTo("=50.4×1ft³/s");
        assertThat(symbols).isEqualTo(numbers).isGreaterThan(20);
    }

    @Test
    void aLongEquationIsBrokenBeforeASignOfItsOutermostSum() {
        String sum = "(a_1 + b_1)*c_1 + (a_2 + b_2)*c_2 + (a_3 + b_3)*c_3";
        Box whole = new EquationSetting("x", 9.5, 400)
                .symbols(FormulaParser.parse(sum))
                .equation()
                .box();
        Box broken = new EquationSetting("x", 9.5, 130)
                .symbols(FormulaParser.parse(sum))
                .equation()
                .box();
        assertThat(broken.width()).isLessThanOrEqualTo(130);
        assertThat(broken.below()).isGreaterThan(whole.below() + 9.5);
        assertThat(Boxes.marked(broken))
                .isEqualTo("/x/=(/a/_{1}+/b/_{1})/c/_{1}+(/a/_{2}+/b/_{2})/c/_{2}_{+(/a/_{3}+/b/_{3})/c/_{3}}");
    }

    @Test
    void aFractionTooLongForTheLineIsSetWithASlash() {
        String fraction = "(a_1 + a_2 + a_3 + a_4 + a_5 + a_6 + a_7 + a_8 + a_9)/b";
        Equation equation = new EquationSetting("x", 9.5, 110)
                .symbols(FormulaParser.parse(fraction))
                .equation();
        assertThat(equation.width()).isLessThanOrEqualTo(110);
        assertThat(Boxes.marked(equation.box())).contains("//b/").doesNotContain("—");
    }

    @Test
    void hostileWordsFitTheLine() {
        Equation equation = new EquationSetting("x".repeat(200), 9.5, WIDTH)
                .symbols(new Formula.Word("y".repeat(600)))
                .numbers(new Formula.Word("\u4e2d\u0007 <b> \ud800"))
                .equation();
        assertThat(equation.width()).isLessThanOrEqualTo(WIDTH);
        assertThat(equation.missing()).containsExactly(0x4e2d, 0xfffd);
    }

    @Property(tries = 400)
    void noBoxReachesOutOfItsParentOrOverAnother(@ForAll("formulas") Formula formula) {
        Equation equation = new EquationSetting("h_f", 9.5, WIDTH)
                .symbols(formula)
                .numbers(formula)
                .equation();
        assertThat(Boxes.faults(equation.box())).isEmpty();
    }

    @Property(tries = 400)
    void noEquationIsWiderThanItsColumn(@ForAll("formulas") Formula formula) {
        for (double width : new double[] {60, 120, WIDTH}) {
            Equation equation = new EquationSetting("h_f", 9.5, width)
                    .symbols(formula)
                    .numbers(formula)
                    .equation();
            assertThat(equation.width()).isLessThanOrEqualTo(width + 1e-3);
        }
    }

    @Provide
    Arbitrary<Formula> formulas() {
        return formulas(4);
    }

    private static Arbitrary<Formula> formulas(int depth) {
        Arbitrary<Formula> leaves = Arbitraries.oneOf(
                Arbitraries.of("a", "Q_max", "rho_1", "series", "sizes.C", "F1!B4:B10")
                        .map(Formula.Symbol::new),
                Arbitraries.of("0.5", "19.3404", "123456")
                        .map(text -> new Formula.Numeral(Double.parseDouble(text), text)),
                Arbitraries.of("ft3/s", "m^(1/3)/s", "1")
                        .map(unit -> new Formula.Quantity(1.3563, "1.35630", Unit.parse(unit))),
                Arbitraries.of("free", "a choice of several words").map(Formula.Word::new),
                Arbitraries.of("no result", "not given").map(Formula.NoResult::new));
        if (depth == 0) {
            return leaves;
        }
        Arbitrary<Formula> inner = Arbitraries.lazy(() -> formulas(depth - 1));
        return Arbitraries.oneOf(
                leaves,
                inner.map(Formula.Negation::new),
                Combinators.combine(Arbitraries.of(Operator.class), inner, inner)
                        .as(Formula.Operation::new),
                Combinators.combine(inner, inner)
                        .as((a, b) -> new Formula.Comparison(nappe.formula.Comparator.AT_MOST, a, b)),
                Combinators.combine(inner, inner).as((a, b) -> new Formula.Logic("and", List.of(a, b))),
                Combinators.combine(inner, inner, inner)
                        .as((a, b, c) -> new Formula.Call(Function.IF, List.of(a, b, c))),
                Combinators.combine(Arbitraries.of(Function.SQRT, Function.ABS, Function.LOG10), inner)
                        .as((function, a) -> new Formula.Call(function, List.of(a))),
                Combinators.combine(Arbitraries.of(Function.MIN, Function.INDEX, Function.MATCH_BELOW), inner, inner)
                        .as((function, a, b) -> new Formula.Call(function, List.of(a, b))));
    }
}
