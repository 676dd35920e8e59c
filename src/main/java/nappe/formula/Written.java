package nappe.formula;

/**
 * A piece of formula text and how tightly its outermost sign binds, so that whoever puts it into something larger knows
 * whether it needs brackets.
 *
 * @param binding as in {@link Operator#binding()}; {@link #WHOLE} for what never needs brackets
 * @param endsInUnit whether a sign that follows must be set off by a blank, so that it isn't read as part of a unit
 */
public record Written(String text, int binding, boolean endsInUnit) {
    /** A numeral, a symbol, a call, or what already stands in brackets. */
    public static final int WHOLE = 9;

    /** A comparison or a condition: looser than any arithmetic. */
    public static final int CONDITION = 0;

    public Written(String text, int binding) {
        this(text, binding, false);
    }

    public static Written whole(String text) {
        return new Written(text, WHOLE);
    }

    /** The text, in brackets where it binds less tightly than asked. */
    public String within(int least) {
        return needsBrackets(least) ? "(" + text + ")" : text;
    }

    public boolean needsBrackets(int least) {
        return binding < least;
    }
}
