package nappe.calculation;

import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.Operator;

/** A line that does nothing but look up a column of a cited table, told in words: they say more than its formula. */
final class LookUp {
    private LookUp() {}

    /** {@code row i_T1 of column C, table parshall-sizes}; empty for any other formula. */
    static String inWords(Formula formula) {
        Formula found = formula;
        String unit = "";
        if (found instanceof Formula.Call given && given.function() == Function.IF) {
            boolean blankTold = given.arguments().get(0) instanceof Formula.Call test
                    && test.function() == Function.IS_NUMBER
                    && given.arguments().get(2) instanceof Formula.NoResult;
            found = blankTold ? given.arguments().get(1) : found;
        }
        if (found instanceof Formula.Operation times
                && times.operator() == Operator.TIMES
                && times.right() instanceof Formula.Quantity quantity
                && quantity.value() == 1) {
            found = times.left();
            unit = ", in " + quantity.unit();
        }
        if (found instanceof Formula.Call index
                && index.function() == Function.INDEX
                && index.arguments().get(0) instanceof Formula.Symbol column
                && index.arguments().get(1) instanceof Formula.Symbol row) {
            int dot = column.name().lastIndexOf('.');
            return "row " + row.name() + " of column " + column.name().substring(dot + 1) + unit + ", table "
                    + column.name().substring(0, Math.max(0, dot));
        }
        return "";
    }
}
