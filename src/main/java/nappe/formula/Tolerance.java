package nappe.formula;

/**
 * The one tolerance of comparisons, 1e-9 relative to the right side: a value at its limit must not flip between engines.
 * The spreadsheet reading writes the same test into the cell.
 */
public final class Tolerance {
    /** Relative to the right side. */
    public static final double RELATIVE = 1e-9;

    private Tolerance() {}

    /** Whether the comparison holds. {@code a <= b} holds where {@code a - b <= 1e-9 |b|}. */
    public static boolean holds(Comparator comparator, double a, double b) {
        double slack = RELATIVE * Math.abs(b);
        return switch (comparator) {
            case AT_MOST -> a - b <= slack;
            case BELOW -> a - b < -slack;
            case AT_LEAST -> b - a <= slack;
            case ABOVE -> b - a < -slack;
            case EQUAL -> Math.abs(a - b) <= slack;
            case UNLIKE -> Math.abs(a - b) > slack;
        };
    }
}
