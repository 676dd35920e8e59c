package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Sets a symbol as written ({@code h_f}, {@code Delta_h}) with italics, Greek letters and an upright subscript. */
final class SymbolPrint {
    private static final String NAMES = "alpha beta gamma delta epsilon zeta eta theta iota kappa lambda mu nu xi omicron"
            + " pi rho sigma tau upsilon phi chi psi omega";
    private static final String LETTERS = "αβγδεζηθικλμνξοπρστυφχψω";
    private static final Map<String, String> GREEK = greek();

    private SymbolPrint() {}

    private static Map<String, String> greek() {
        Map<String, String> greek = new java.util.HashMap<>();
        String[] names = NAMES.split(" ");
        for (int i = 0; i < names.length; i++) {
            char letter = LETTERS.charAt(i);
            greek.put(names[i], String.valueOf(letter));
            greek.put(
                    Character.toUpperCase(names[i].charAt(0)) + names[i].substring(1),
                    String.valueOf(Character.toUpperCase(letter)));
        }
        return Map.copyOf(greek);
    }

    /** The pieces of a symbol; what follows the first underscore is its subscript, further underscores are commas. */
    static List<Piece> pieces(String symbol) {
        int bar = symbol.indexOf('_');
        String letter = bar <= 0 ? symbol : symbol.substring(0, bar);
        List<Piece> pieces = new ArrayList<>();
        pieces.add(Piece.italic(GREEK.getOrDefault(letter, letter)));
        if (bar > 0 && bar < symbol.length() - 1) {
            StringBuilder below = new StringBuilder();
            for (String part : symbol.substring(bar + 1).split("_")) {
                below.append(below.isEmpty() ? "" : ",").append(GREEK.getOrDefault(part, part));
            }
            pieces.add(Piece.plain(below.toString()).lowered());
        }
        return pieces;
    }
}
