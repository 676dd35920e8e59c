package nappe.formula;

/** What a formula comes out as: a finite number, a word, or no result with the reason in words. */
public sealed interface Value {
    /** A finite number in the coherent unit of the working system. */
    record Number(double value) implements Value {
        public Number {
            if (!Double.isFinite(value)) {
                throw new IllegalArgumentException("not a finite number: " + value);
            }
        }
    }

    /** A result in words ("met", "free", "submerged") or a word typed as a choice. */
    record Word(String text) implements Value {}

    /** No number, and why, in the words that are printed in its place ("no result", "not given"). */
    record None(String why) implements Value {}

    /** The words printed where a formula is outside its range of definition. */
    String NO_RESULT = "no result";

    /** The words printed where an entry, or what a line rests on, was not typed. */
    String NOT_GIVEN = "not given";

    static Value of(double value) {
        return Double.isFinite(value) ? new Number(value == 0 ? 0.0 : value) : new None(NO_RESULT);
    }

    static Value word(String text) {
        return new Word(text);
    }
}
