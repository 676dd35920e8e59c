package nappe.calculation;

import nappe.formula.Sign;

/** What a spreadsheet program lets a checker type into the cell of an entry. */
public sealed interface Allowed {
    /** A number of such a sign. */
    record Numbers(Sign sign) implements Allowed {}

    /** One of the words that stand in a run of cells. */
    record Words(Run run) implements Allowed {}
}
