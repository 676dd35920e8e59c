package nappe.calculation;

import java.util.List;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.Operator;

/** Short names for making the formulas that the layout itself adds. */
public final class Formulas {
    private Formulas() {}

    public static Formula symbol(String name) {
        return new Formula.Symbol(name);
    }

    public static Formula word(String text) {
        return new Formula.Word(text);
    }

    /** A numeral, written as given. */
    public static Formula number(String text) {
        return new Formula.Numeral(Double.parseDouble(text), text);
    }

    public static Formula iff(Formula condition, Formula yes, Formula no) {
        return call(Function.IF, condition, yes, no);
    }

    public static Formula call(Function function, Formula... arguments) {
        return new Formula.Call(function, List.of(arguments));
    }

    public static Formula compare(Formula left, Comparator comparator, Formula right) {
        return new Formula.Comparison(comparator, left, right);
    }

    public static Formula plus(Formula a, Formula b) {
        return new Formula.Operation(Operator.PLUS, a, b);
    }

    public static Formula minus(Formula a, Formula b) {
        return new Formula.Operation(Operator.MINUS, a, b);
    }

    public static Formula times(Formula a, Formula b) {
        return new Formula.Operation(Operator.TIMES, a, b);
    }

    public static Formula over(Formula a, Formula b) {
        return new Formula.Operation(Operator.OVER, a, b);
    }
}
