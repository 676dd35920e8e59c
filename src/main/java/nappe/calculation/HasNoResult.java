package nappe.calculation;

import nappe.formula.Formula;
import nappe.formula.Parts;

/** Whether a formula may come out as {@code none()}. */
final class HasNoResult {
    private HasNoResult() {}

    static boolean in(Formula formula) {
        boolean[] found = {false};
        Parts.visit(formula, part -> found[0] |= part instanceof Formula.NoResult);
        return found[0];
    }
}
