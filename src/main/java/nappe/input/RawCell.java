package nappe.input;

/**
 * One filled cell as the file holds it.
 *
 * @param row from 0
 * @param column from 0
 * @param text number as written in the file, text, {@code TRUE}, error word; empty where a formula has no value
 * @param formula whether a formula stands behind it
 */
record RawCell(int row, int column, Kind kind, String text, boolean formula, Format format) {
    enum Kind {
        NUMBER,
        TEXT,
        BOOLEAN,
        ERROR,
        /** A formula whose value was never stored. */
        NO_VALUE
    }

    /** How the number is shown, as far as that changes what the engineer saw when typing it. */
    enum Format {
        PLAIN,
        DATE,
        PERCENT,
        /** Words or a scale in the number format: {@code 0.00 "mm"}. */
        WORDS
    }

    String address() {
        return address(row, column);
    }

    static String address(int row, int column) {
        return letters(column) + (row + 1);
    }

    private static String letters(int column) {
        return (column >= 26 ? letters(column / 26 - 1) : "") + (char) ('A' + column % 26);
    }

    /** The value of a number cell. */
    double number() {
        return Double.parseDouble(text);
    }

    /** As a message shows it: a number as a person writes it, anything else in quotes. */
    String shown() {
        return kind == Kind.NUMBER ? Plain.number(number()) : Shown.quoted(text.strip());
    }

    /** Whether nothing can be seen in it. */
    boolean isBlank() {
        return kind == Kind.TEXT
                && text.codePoints().allMatch(c -> Character.isWhitespace(c) || Character.isSpaceChar(c));
    }
}
