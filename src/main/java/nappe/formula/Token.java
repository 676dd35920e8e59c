package nappe.formula;

import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * A piece of formula text.
 *
 * @param unit for a numeral that a unit follows
 * @param offset where it starts
 */
record Token(Kind kind, String text, @Nullable Unit unit, int offset) {
    enum Kind {
        NUMERAL,
        WORD,
        NAME,
        SIGN,
        END
    }

    boolean isSign(String sign) {
        return kind == Kind.SIGN && text.equals(sign);
    }

    boolean isName(String name) {
        return kind == Kind.NAME && text.equals(name);
    }

    /** How it is called in messages. */
    String shown() {
        return kind == Kind.END ? "the end" : "\"" + text + "\"";
    }
}
