package nappe.deliver.xlsx;

/**
 * How many lines a text takes in a column, from a rough width of each character. No font is asked, so that the rows are
 * the same on every machine; the guess errs on the wide side.
 */
final class TextWidth {
    private static final String NARROW = "iljI.,:;'|! ()[]tfr/-";
    private static final String WIDE = "mwMW@%";

    private TextWidth() {}

    /** The lines that the text takes, broken at blanks, where so many digits of the same type fit side by side. */
    static int lines(String text, double digits) {
        int lines = 0;
        for (String paragraph : text.split("\n", -1)) {
            lines += linesOfParagraph(paragraph, Math.max(1, digits));
        }
        return lines;
    }

    private static int linesOfParagraph(String text, double digits) {
        int lines = 1;
        double used = 0;
        for (String word : text.split(" ")) {
            double width = of(word);
            double blank = used == 0 ? 0 : of(" ");
            if (used + blank + width <= digits) {
                used += blank + width;
                continue;
            }
            if (used > 0) {
                lines++;
            }
            int more = (int) Math.ceil(width / digits) - 1;
            lines += Math.max(0, more);
            used = width - Math.max(0, more) * digits;
        }
        return lines;
    }

    /** The width of a text, in digits. */
    static double of(String text) {
        return text.codePoints().mapToDouble(TextWidth::of).sum();
    }

    private static double of(int c) {
        if (NARROW.indexOf(c) >= 0) {
            return 0.6;
        }
        if (WIDE.indexOf(c) >= 0) {
            return 1.6;
        }
        if (c > 0x2E80) {
            return 2;
        }
        return Character.isUpperCase(c) ? 1.3 : 1.0;
    }
}
