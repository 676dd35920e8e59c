package nappe.method;

import java.util.List;
import nappe.formula.Sign;
import nappe.unit.Unit;

/**
 * What a method sheet asks the engineer to type.
 *
 * @param unit its dimension, and the unit offered first
 * @param optional true where it may stay blank: all that rests on it is then printed as "not given"
 * @param words the words of a choice, in order; empty for a quantity
 */
public record Declared(
        Kind kind, String symbol, Unit unit, String label, Sign sign, boolean optional, List<String> words) {
    /** Typed once for the element, chosen from words, or typed once per case. */
    public enum Kind {
        ENTRY,
        CHOICE,
        CASE
    }
}
