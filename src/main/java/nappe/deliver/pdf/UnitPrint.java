package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.unit.Unit;
import nappe.unit.UnitException;

/** Sets a unit as written ({@code ft3/s}, {@code m^(1/3)/s}) with its exponents raised. */
final class UnitPrint {
    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static final Pattern EXPONENT = Pattern.compile("(?<=[A-Za-z])\\^?(-?\\d)(?![\\dA-Za-z(])");
    private static final Pattern FRACTION = Pattern.compile("\\^\\((-?\\d+/\\d+)\\)");

    private static final Pattern IN_BRACKETS = Pattern.compile("[(\\[]([^\\s]+)[)\\]]$");

    private UnitPrint() {}

    /** The pieces of a unit; none for the unit of pure numbers. */
    static List<Piece> pieces(String unit) {
        List<Piece> pieces = new ArrayList<>();
        if (unit.equals("1")) {
            return pieces;
        }
        Matcher fraction = FRACTION.matcher(unit);
        int from = 0;
        while (fraction.find()) {
            pieces.add(Piece.plain(wholeExponents(unit.substring(from, fraction.start()))));
            pieces.add(Piece.plain(fraction.group(1)).raised());
            from = fraction.end();
        }
        if (from < unit.length()) {
            pieces.add(Piece.plain(wholeExponents(unit.substring(from))));
        }
        return pieces;
    }

    /** The pieces of a unit that stands by itself: pure numbers have the unit 1. */
    static List<Piece> named(String unit) {
        return unit.equals("1") ? List.of(Piece.plain("1")) : pieces(unit);
    }

    /** The head of a column; a unit in brackets at its end is set as one. */
    static View.Text head(String head) {
        Matcher unit = IN_BRACKETS.matcher(head);
        if (!unit.find() || !isUnit(unit.group(1))) {
            return View.Text.of("", symbol(head));
        }
        List<Piece> pieces = new ArrayList<>();
        pieces.addAll(symbol(head.substring(0, unit.start())));
        List<Piece> named = named(unit.group(1));
        for (int i = 0; i < named.size(); i++) {
            String open = i == 0 ? head.substring(unit.start(), unit.start() + 1) : "";
            String close = i == named.size() - 1 ? head.substring(head.length() - 1) : "";
            Piece piece = named.get(i);
            pieces.add(new Piece(open + piece.text() + close, piece.face(), piece.shift()));
        }
        return View.Text.of("", pieces);
    }

    /** A head that is one letter is a symbol, and so is a letter with a subscript. */
    private static List<Piece> symbol(String head) {
        return head.strip().length() == 1 ? List.of(Piece.italic(head)) : SymbolPrint.inText(head);
    }

    private static boolean isUnit(String text) {
        try {
            Unit.parse(text);
            return true;
        } catch (UnitException e) {
            return false;
        }
    }

    /** The pieces of a number with its unit, a fixed space between; never broken over two lines. */
    static List<Piece> after(String number, String unit) {
        List<Piece> pieces = new ArrayList<>(pieces(unit));
        if (pieces.isEmpty()) {
            pieces.add(Piece.plain(number));
        } else {
            Piece first = pieces.get(0);
            pieces.set(0, Piece.plain(number + "\u00a0" + first.text()));
        }
        return pieces;
    }

    /** Whole exponents as raised digits, so that they stay in the text when it is copied. */
    private static String wholeExponents(String unit) {
        return EXPONENT.matcher(unit).replaceAll(found -> {
            String digits = found.group(1);
            String sign = digits.startsWith("-") ? "⁻" : "";
            return sign + RAISED.charAt(digits.charAt(digits.length() - 1) - '0');
        });
    }
}
