package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;

/** Measures the columns of a table and shares out the width of the page between them. */
final class ColumnWidths {
    /** What is left free at both sides of a column together, in mm. */
    static final double PADDING = 2.6;

    /** A single word longer than this, in mm, is broken. */
    private static final double LONGEST_WORD = 42;

    private static final double LONGEST_TEXT = 130;

    /** A column of text narrower than this reads badly, in mm. */
    private static final double READABLE = 38;

    private final double size;
    private final List<double[]> needs = new ArrayList<>();

    /**
     * @param size of the type, in points
     */
    ColumnWidths(int columns, double size) {
        this.size = size;
        for (int i = 0; i < columns; i++) {
            needs.add(new double[] {0, 0, 0});
        }
    }

    /** Takes in a text that may be broken between words. */
    void text(int column, String text, boolean bold) {
        double least = 0;
        for (String word : text.split("[ \n]")) {
            least = Math.max(least, width(word, bold));
        }
        note(column, Math.min(least, LONGEST_WORD), Math.min(width(text, bold), LONGEST_TEXT));
    }

    /** Takes in a text that must not be broken, like a number. */
    void whole(int column, String text) {
        double width = Math.min(width(text, false), LONGEST_WORD);
        note(column, width, width);
    }

    private double width(String text, boolean bold) {
        return Typefaces.width(text, bold ? Typefaces.BOLD : Typefaces.REGULAR, size) + PADDING;
    }

    private void note(int column, double least, double most) {
        double[] need = needs.get(column);
        need[0] = Math.max(need[0], least);
        need[1] = Math.max(need[1], most);
    }

    /** The width below which words are broken. */
    double least() {
        return needs.stream().mapToDouble(need -> need[0]).sum();
    }

    /** The width below which columns of text read badly. */
    double comfortable() {
        return needs.stream()
                .mapToDouble(need -> Math.max(need[0], Math.min(need[1], READABLE)))
                .sum();
    }

    private double most() {
        return needs.stream().mapToDouble(need -> need[1]).sum();
    }

    /**
     * Widths that fill the width given, or less where the table needs much less.
     *
     * @param titles width that the titles over the table need
     */
    List<Double> fit(double width, double titles) {
        double least = least();
        double most = most();
        double narrow = Math.min(width, Math.max(most, titles));
        List<Double> widths = new ArrayList<>();
        for (double[] need : needs) {
            if (least >= width) {
                widths.add(need[0] * width / least);
            } else if (most <= width) {
                widths.add(need[1] * (narrow < 0.7 * width ? narrow : width) / most);
            } else {
                widths.add(need[0] + (need[1] - need[0]) * (width - least) / (most - least));
            }
        }
        return widths;
    }
}
