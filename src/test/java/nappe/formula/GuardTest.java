package nappe.formula;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

class GuardTest {
    private static final Formula X = new Formula.Symbol("x");
    private static final Formula COLUMN = new Formula.Symbol("column");

    @Test
    void symbolsOfArithmeticInTheOrderOfFirstAppearance() {
        assertThat(guarded("b*a + sqrt(c)/b")).containsExactly("b", "a", "c");
    }

    @Test
    void whatIsComparedWithWordsIsNotANumber() {
        assertThat(guarded("if(state = \"free\", a, b)")).containsExactly("a", "b");
    }

    @Test
    void whatIsComparedWithNumbersIsOne() {
        assertThat(guarded("if(x <= 2, \"met\", \"not met\")")).containsExactly("x");
    }

    @Test
    void whatTheFormulaAsksAboutIsLeftToIt() {
        Formula asked = new Formula.Call(Function.IS_NUMBER, List.of(X));
        Formula product = new Formula.Operation(Operator.TIMES, X, new Formula.Symbol("y"));
        assertThat(Guard.guarded(new Formula.Call(Function.IF, List.of(asked, product, new Formula.Word("none")))))
                .containsExactly("y");
    }

    @Test
    void keysOfWordsAndColumnsAreNoNumbers() {
        assertThat(Guard.guarded(new Formula.Call(Function.MATCH, List.of(X, COLUMN))))
                .isEmpty();
        assertThat(Guard.guarded(new Formula.Call(Function.INDEX, List.of(COLUMN, X))))
                .containsExactly("x");
        assertThat(Guard.guarded(new Formula.Call(Function.MATCH_BELOW, List.of(X, COLUMN))))
                .containsExactly("x");
        assertThat(Guard.guarded(new Formula.Call(Function.LOWEST_OF, List.of(COLUMN))))
                .isEmpty();
    }

    @Test
    void aBareSymbolHandsOnWhatStandsThere() {
        assertThat(Guard.guarded(X)).isEmpty();
    }

    @Test
    void neighboursAreKnownByTheirSide() {
        assertThat(guarded("x - before(x)")).containsExactly("x", "before x");
    }

    private static List<String> guarded(String text) {
        return Guard.guarded(FormulaParser.parse(text));
    }
}
