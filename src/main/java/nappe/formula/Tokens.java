package nappe.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.unit.Unit;
import nappe.unit.UnitCatalogue;
import org.jspecify.annotations.Nullable;

/**
 * Formula text cut into tokens. A unit may only follow a numeral and one blank; it runs, brackets balanced, to the next
 * blank, comma or unmatched closing bracket and must stand in the catalogue.
 */
final class Tokens {
    private static final Pattern NUMERAL = Pattern.compile("\\d+(\\.\\d+)?([eE][+-]?\\d+)?");
    private static final Pattern NAME = Pattern.compile("[A-Za-z][A-Za-z0-9_]*");
    private static final Pattern SIGN = Pattern.compile("<=|>=|<>|[-+*/^()=<>,:]");

    private final String text;
    private final List<Token> tokens = new ArrayList<>();
    private int at;

    private Tokens(String text) {
        this.text = text;
    }

    static List<Token> of(String text) {
        Tokens tokens = new Tokens(text);
        tokens.cut();
        return tokens.tokens;
    }

    private void cut() {
        while (true) {
            while (at < text.length() && Character.isWhitespace(text.charAt(at))) {
                at++;
            }
            if (at == text.length()) {
                tokens.add(new Token(Token.Kind.END, "", null, at));
                return;
            }
            next();
        }
    }

    private void next() {
        char c = text.charAt(at);
        if (c == '"') {
            words();
        } else if (Character.isDigit(c)) {
            numeral();
        } else {
            Matcher name = match(NAME);
            Matcher sign = match(SIGN);
            if (name != null) {
                add(Token.Kind.NAME, name.end());
            } else if (sign != null) {
                add(Token.Kind.SIGN, sign.end());
            } else {
                throw new FormulaException("\"" + c + "\" has no meaning in a formula", at, 1, "sign-unknown");
            }
        }
    }

    private void words() {
        int close = text.indexOf('"', at + 1);
        if (close < 0) {
            throw new FormulaException("these words are not closed by a quote", at, text.length() - at, "quote-open");
        }
        tokens.add(new Token(Token.Kind.WORD, text.substring(at + 1, close), null, at));
        at = close + 1;
    }

    private void numeral() {
        Matcher matcher = match(NUMERAL);
        if (matcher == null) {
            throw new IllegalStateException();
        }
        int start = at;
        String digits = matcher.group();
        at = matcher.end();
        if (at < text.length() && Character.isLetter(text.charAt(at))) {
            throw new FormulaException(
                    "\"" + digits + text.charAt(at) + "\": leave a blank between a number and its unit",
                    start,
                    at - start + 1,
                    "unit-unclear");
        }
        tokens.add(new Token(Token.Kind.NUMERAL, digits, unitAfterBlank(), start));
    }

    private @Nullable Unit unitAfterBlank() {
        if (at + 1 >= text.length() || text.charAt(at) != ' ' || !startsUnit(at + 1)) {
            return null;
        }
        int end = at + 1;
        int depth = 0;
        while (end < text.length()) {
            char c = text.charAt(end);
            if (Character.isWhitespace(c) || c == ',' || c == ')' && depth == 0) {
                break;
            }
            depth += c == '(' ? 1 : c == ')' ? -1 : 0;
            end++;
        }
        String candidate = text.substring(at + 1, end);
        if (!UnitCatalogue.standard().knows(candidate)) {
            return null;
        }
        at = end;
        return Unit.parse(candidate);
    }

    /** Whether a unit may start there: a letter, {@code %}, or the 1 of {@code 1/s}. */
    private boolean startsUnit(int place) {
        char c = text.charAt(place);
        return Character.isLetter(c) || c == '%' || text.startsWith("1/", place);
    }

    private @Nullable Matcher match(Pattern pattern) {
        Matcher matcher = pattern.matcher(text).region(at, text.length());
        return matcher.lookingAt() ? matcher : null;
    }

    private void add(Token.Kind kind, int end) {
        tokens.add(new Token(kind, text.substring(at, end), null, at));
        at = end;
    }
}
