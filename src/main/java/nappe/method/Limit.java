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
        String source,
        Kind kind) {
    /** What a limit is about. */
    public enum Kind {
        /** Each case is judged by it. */
        JUDGED,
        /** It is about how the station is built, or how it is calculated: it governs no case unless it is not met. */
        LAYOUT,
        /** Nothing is judged by it: the flows at which it turns are searched for. */
        THRESHOLD
    }

    /** A limit that each case is judged by. */
    public Limit(
            Formula lesser,
            Formula greater,
            boolean valueIsLesser,
            @Nullable Formula scale,
            @Nullable Formula when,
            String label,
            String source) {
        this(lesser, greater, valueIsLesser, scale, when, label, source, Kind.JUDGED);
    }

    /** The side that is judged. */
    public Formula value() {
        return valueIsLesser ? lesser : greater;
    }

    /** The side it is judged by. */
    public Formula bound() {
        return valueIsLesser ? greater : lesser;
    }
}
