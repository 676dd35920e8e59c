package nappe.input;

import java.util.Locale;
import org.jspecify.annotations.Nullable;

/** Tags of elements: a capital letter and up to seven more capitals or digits ({@code F1}). */
public final class Tags {
    private Tags() {}

    /** What is wrong with the text as a tag, with the remedy; null for a good one. */
    public static @Nullable String complaint(String text) {
        if (!text.matches("[A-Z][A-Z0-9]{0,7}")) {
            String better =
                    text.toUpperCase(Locale.ROOT).replaceAll("[^A-Z0-9]", "").replaceAll("^[0-9]+", "");
            better = better.substring(0, Math.min(8, better.length()));
            return Shown.quoted(text) + " is not a tag; write one capital letter and up to seven capitals or digits"
                    + (better.isEmpty() ? ": F1" : ": " + better);
        }
        return Layout.isReserved(text)
                ? Shown.quoted(text) + " can't be a tag, because a sheet has that name; write another: F1"
                : null;
    }
}
