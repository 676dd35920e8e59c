package nappe.deliver.pdf;

import java.util.Set;
import nappe.formula.Value;

/** Words that a checker must not overlook. */
final class Verdicts {
    private static final Set<String> GRAVE = Set.of("not met", Value.NO_RESULT, Value.NOT_GIVEN);

    private Verdicts() {}

    static boolean isGrave(String words) {
        return GRAVE.contains(words);
    }

    /** The words, in bold where they say that something is not in order. */
    static Piece weigh(String words) {
        return isGrave(words) ? Piece.bold(words) : Piece.plain(words);
    }
}
