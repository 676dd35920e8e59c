package nappe.formula;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class SymbolsReadingTest {
    @Test
    void symbolsAreNamedOnceInTheOrderOfFirstAppearance() {
        assertThat(SymbolsReading.of(FormulaParser.parse("b*h_a^n + sqrt(b - 2 ft)/h_a")))
                .containsExactly("b", "h_a", "n");
    }

    @Test
    void conditionsBranchesNeighboursAndSummariesCount() {
        Formula formula = FormulaParser.parse("if(not a < b and state = \"free\", -before(y) + last(w), none())");
        assertThat(SymbolsReading.of(formula)).containsExactly("a", "b", "state", "y", "w");
    }

    @Test
    void numbersUnitsAndWordsAreNoSymbols() {
        assertThat(SymbolsReading.of(FormulaParser.parse("if(1 ft < 2 m, \"h\", \"b\")")))
                .isEmpty();
    }
}
