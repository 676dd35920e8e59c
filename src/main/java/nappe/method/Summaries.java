package nappe.method;

import nappe.formula.Formula;
import nappe.formula.Parts;

/** Whether a formula looks at other rows or sums up a column anywhere within. */
final class Summaries {
    private Summaries() {}

    static boolean in(Formula formula) {
        boolean[] found = {false};
        Parts.visit(formula, part -> found[0] |= part instanceof Formula.Summary || part instanceof Formula.Neighbour);
        return found[0];
    }
}
