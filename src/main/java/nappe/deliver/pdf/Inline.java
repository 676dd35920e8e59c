package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;

/**
 * A typeset formula or a part of one.
 *
 * @param binding how tightly its outermost operation binds, as in {@link nappe.formula.Operator#binding()}
 * @param numberFirst whether it starts with digits
 * @param unitLast whether it ends with digits or a unit, which must not run into what follows
 */
record Inline(List<Piece> pieces, int binding, boolean numberFirst, boolean unitLast) {
    /** Binding of words and conditions. */
    static final int LOOSE = 0;

    /** Binding of a sum. */
    static final int SUM = 1;

    /** Binding of a product. */
    static final int PRODUCT = 2;

    /** Binding of a leading minus. */
    static final int MINUS = 3;

    /** Binding of a power. */
    static final int POWER = 4;

    /** Binding of what is never bracketed but under a power where it has a unit. */
    static final int ATOM = 5;

    Inline {
        pieces = List.copyOf(pieces);
    }

    static Inline of(int binding, List<Piece> pieces) {
        return new Inline(pieces, binding, false, false);
    }

    static Inline text(String text) {
        return of(ATOM, List.of(Piece.plain(text)));
    }

    /** A number with its unit; negative ones, and ones with a unit where it matters, are bracketed like operations. */
    static Inline number(String number, String unit) {
        boolean bare = unit.equals("1");
        int binding = number.startsWith("-") ? MINUS : bare ? ATOM : PRODUCT;
        return new Inline(UnitPrint.after(number, unit), binding, true, !bare);
    }

    /** Itself, or in brackets where it binds less tightly than asked. */
    Inline within(int least) {
        return binding >= least ? this : bracketed();
    }

    boolean startsWithMinus() {
        return plain().startsWith("-") || plain().startsWith("−");
    }

    Inline bracketed() {
        return join(ATOM, text("("), this, text(")"));
    }

    Inline raised() {
        return of(binding, pieces.stream().map(Piece::raised).toList());
    }

    /** Parts side by side. */
    static Inline join(int binding, Inline... parts) {
        List<Piece> pieces = new ArrayList<>();
        for (Inline part : parts) {
            pieces.addAll(part.pieces);
        }
        return new Inline(pieces, binding, parts[0].numberFirst, parts[parts.length - 1].unitLast);
    }

    /** All characters in a row, for tests and measuring. */
    String plain() {
        StringBuilder plain = new StringBuilder();
        pieces.forEach(piece -> plain.append(piece.text()));
        return plain.toString();
    }
}
