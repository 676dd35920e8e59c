package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Sets a symbol as written ({@code h_f}, {@code Delta_h}) with italics, Greek letters and an upright subscript. */
final class SymbolPrint {
    private static final String NAMES =
            "alpha beta gamma delta epsilon zeta eta theta iota kappa lambda mu nu xi omicron"
                    + " pi rho sigma tau upsilon phi chi psi omega";
    private static final String LETTERS = "αβγδεζηθικλμνξοπρστυφχψω";
    private static final Map<String, String> GREEK = greek();

    private static final Pattern IN_TEXT = Pattern.compile("\\b[A-Za-z]+(_[A-Za-z0-9]+)+\\b");

    private SymbolPrint() {}

    private static Map<String, String> greek() {
        Map<String, String> greek = new HashMap<>();
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

    /** A text of the layout or of a method, with the symbols in it ({@code h_f}) set as such. */
    static List<Piece> inText(String text) {
        List<Piece> pieces = new ArrayList<>();
        Matcher symbol = IN_TEXT.matcher(text);
        int from = 0;
        while (symbol.find()) {
            String letter = symbol.group().substring(0, symbol.group().indexOf('_'));
            if (letter.length() == 1 || GREEK.containsKey(letter)) {
                pieces.add(Piece.plain(text.substring(from, symbol.start())));
                pieces.addAll(pieces(symbol.group()));
                from = symbol.end();
            }
        }
        pieces.add(Piece.plain(text.substring(from)));
        return pieces;
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
