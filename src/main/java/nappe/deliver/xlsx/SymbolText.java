package nappe.deliver.xlsx;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

/**
 * A symbol as it is set: {@code h_a} is an h with an a below, {@code alpha_1} a Greek letter with a 1 below.
 *
 * @param subscript empty where there is none; parts of a longer one are joined by commas
 * @param slanted false where it is a digit or a Greek capital
 */
record SymbolText(String letter, String subscript, boolean slanted) {
    private static final List<String> NAMES = List.of(
            "alpha", "beta", "gamma", "delta", "epsilon", "zeta", "eta", "theta", "iota", "kappa", "lambda", "mu", "nu",
            "xi", "omicron", "pi", "rho", "", "sigma", "tau", "upsilon", "phi", "chi", "psi", "omega");

    static SymbolText of(String symbol) {
        String[] parts = symbol.split("_");
        if (parts.length == 0 || parts[0].isEmpty()) {
            return new SymbolText(symbol, "", false);
        }
        String letter = letter(parts[0]);
        String subscript = Arrays.stream(parts).skip(1).map(SymbolText::letter).collect(Collectors.joining(","));
        char first = letter.charAt(0);
        return new SymbolText(letter, subscript, Character.isLetter(first) && !(first >= 0x391 && first <= 0x3A9));
    }

    private static String letter(String name) {
        int place = NAMES.indexOf(name.toLowerCase(Locale.ROOT));
        if (place < 0 || name.isEmpty()) {
            return name;
        }
        boolean capital = Character.isUpperCase(name.charAt(0));
        return String.valueOf((char) ((capital ? 0x391 : 0x3B1) + place));
    }
}
