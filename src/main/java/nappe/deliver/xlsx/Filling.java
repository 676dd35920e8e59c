package nappe.deliver.xlsx;

import nappe.formula.Value;

/** What a cell of a part holds. */
sealed interface Filling {
    /** Nothing but its style. */
    record Blank() implements Filling {}

    /** A text of the shared table, by its index. */
    record Shared(int index) implements Filling {}

    /** A typed number. */
    record Typed(double value) implements Filling {}

    /** A formula and the value that is shown until somebody recalculates. */
    record Live(String formula, Value value) implements Filling {}
}
