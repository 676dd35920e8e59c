package nappe.formula;

import java.util.Locale;
import java.util.Optional;

/** The functions a formula may call; each exists under some name in every spreadsheet program. */
public enum Function {
    IF(3, 3, true),
    SQRT(1, 1, true),
    EXP(1, 1, true),
    LN(1, 1, true),
    LOG10(1, 1, true),
    SIN(1, 1, true),
    COS(1, 1, true),
    TAN(1, 1, true),
    ASIN(1, 1, true),
    ACOS(1, 1, true),
    ATAN(1, 1, true),
    TANH(1, 1, true),
    ABS(1, 1, true),
    MIN(2, 255, true),
    MAX(2, 255, true),
    /** {@code match(key, column)}: the place of the key in a column of words, counted from 1. */
    MATCH(2, 2, false),
    /** {@code match_below(key, column)}: the place of the last number in a rising column that is not above the key. */
    MATCH_BELOW(2, 2, false),
    /** {@code index(column, place)}: what stands at the place, counted from 1. */
    INDEX(2, 2, false),
    /** {@code small(column, k)}: the k-th smallest number of a column. */
    SMALL(2, 2, false),
    /** {@code lowest_of(column)}: the smallest number of a column. */
    LOWEST_OF(1, 1, false),
    /** {@code tally(column, word)}: how many cells of a column hold the word. */
    TALLY(2, 2, false),
    /** {@code count_of(column)}: how many cells of a column hold a number. */
    COUNT_OF(1, 1, false),
    /** {@code is_number(x)}: true where x is a number, false where it is words. */
    IS_NUMBER(1, 1, false),
    /** {@code same(a, b)}: exactly equal; only in the layout's own trial rows. */
    SAME(2, 2, false);

    private final int least;
    private final int most;
    private final boolean forAuthors;

    Function(int least, int most, boolean forAuthors) {
        this.least = least;
        this.most = most;
        this.forAuthors = forAuthors;
    }

    public int least() {
        return least;
    }

    public int most() {
        return most;
    }

    /** The name as written in a formula. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** The function that method sheets know by this name, if there is one. */
    public static Optional<Function> forAuthors(String name) {
        for (Function function : values()) {
            if (function.forAuthors && function.word().equals(name)) {
                return Optional.of(function);
            }
        }
        return Optional.empty();
    }
}
