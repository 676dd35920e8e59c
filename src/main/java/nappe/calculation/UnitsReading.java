package nappe.calculation;

import java.util.LinkedHashSet;
import java.util.Set;
import nappe.formula.Formula;
import nappe.formula.Parts;
import nappe.unit.Unit;

/** The units that the quantities of a formula name, in the order of their first appearance. */
final class UnitsReading {
    private UnitsReading() {}

    static Set<Unit> of(Formula formula) {
        Set<Unit> units = new LinkedHashSet<>();
        Parts.visit(formula, part -> {
            if (part instanceof Formula.Quantity quantity) {
                units.add(quantity.unit());
            }
        });
        return units;
    }
}
