package nappe.formula;

import static org.assertj.core.api.Assertions.assertThat;

import nappe.unit.Unit;
import org.junit.jupiter.api.Test;

class RenamingTest {
    @Test
    void everySymbolIsRenamedAndNothingElse() {
        Formula formula =
                FormulaParser.parse("if(not a < b and state = \"a\", -before(a)^2 + last(b), max(a, 3 ft, none()))");
        assertThat(PlainReading.of(Renaming.of(formula, name -> name + "_e")))
                .isEqualTo("if(not a_e < b_e and state_e = \"a\", -before(a_e)^2 + last(b_e), max(a_e, 3 ft, none()))");
    }

    @Test
    void quantitiesCanBeReplaced() {
        Formula formula = FormulaParser.parse("if(h > 0 ft, h/1 ft, x)");
        Formula replaced =
                Renaming.ofQuantities(formula, q -> q.value() == 0 ? new Formula.Quantity(0, "0", Unit.parse("m")) : q);
        assertThat(PlainReading.of(replaced)).isEqualTo("if(h > 0 m, h/1 ft, x)");
    }
}
