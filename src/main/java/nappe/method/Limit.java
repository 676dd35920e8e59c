package nappe.method;

import nappe.formula.Formula;
import org.jspecify.annotations.Nullable;

/**
 * A comparison that a result must meet: {@code lesser <= greater}.
 *
 * @param value the side that is judged, for the print: the lesser or the greater
 * @param scale what the margin is measured by; null for the size of the bound
 * @param when where it applies; null for always
 */
public record Limit(
        Formula lesser,
        Formula greater,
        boolean valueIsLesser,
        @Nullable Formula scale,
        @Nullable Formula when,
        String label,
        String source) {
    /** The side that is judged. */
    public Formula value() {
        return valueIsLesser ? lesser : greater;
    }

    /** The side it is judged by. */
    public Formula bound() {
        return valueIsLesser ? greater : lesser;
    }
}
