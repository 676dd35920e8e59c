package nappe.input;

import java.util.Collection;
import java.util.Locale;
import org.jspecify.annotations.Nullable;

/** The word of a list that was most likely meant. */
public final class Near {
    private Near() {}

    /** The nearest word, at most a third of its letters off, in capitals or not, with inch or feet written out or not; null where none is near. */
    public static @Nullable String to(String text, Collection<String> words) {
        String typed = plain(text);
        String best = null;
        int least = Integer.MAX_VALUE;
        for (String word : words) {
            int steps = steps(typed, plain(word));
            if (steps < least && steps * 3 <= Math.max(word.length(), 3)) {
                best = word;
                least = steps;
            }
        }
        return best;
    }

    /** {@code ; did you mean known?}, or nothing. */
    public static String question(String text, Collection<String> words) {
        String near = to(text, words);
        return near == null ? "" : "; did you mean " + near + "?";
    }

    private static String plain(String text) {
        String lower = text.toLowerCase(Locale.ROOT)
                .replaceAll("[\\s_-]", "")
                .replaceAll("(?<=\\d)(inches|inch|\")", "in")
                .replaceAll("(?<=\\d)(feet|foot|')", "ft");
        return lower.substring(0, Math.min(60, lower.length()));
    }

    /** Letters to insert, drop or change, and neighbours to swap (restricted Damerau distance). */
    private static int steps(String a, String b) {
        int[][] d = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                if (i == 0 || j == 0) {
                    d[i][j] = i + j;
                    continue;
                }
                int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
                d[i][j] = Math.min(Math.min(d[i - 1][j], d[i][j - 1]) + 1, d[i - 1][j - 1] + change);
                if (i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1)) {
                    d[i][j] = Math.min(d[i][j], d[i - 2][j - 2] + 1);
                }
            }
        }
        return d[a.length()][b.length()];
    }
}
