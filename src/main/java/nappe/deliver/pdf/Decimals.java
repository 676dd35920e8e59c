package nappe.deliver.pdf;

import java.util.regex.Pattern;

/** The decimals found in a column of numbers, so that their points can stand in line. */
final class Decimals {
    private static final Pattern NUMBER = Pattern.compile("-?\\d+(\\.\\d+)?");

    /** Beyond this difference of decimals the numbers of a column are only flush right. */
    private static final int MOST = 4;

    private int least = Integer.MAX_VALUE;
    private int most;

    static boolean isNumber(String text) {
        return NUMBER.matcher(text).matches();
    }

    void add(String text) {
        if (isNumber(text)) {
            least = Math.min(least, decimals(text));
            most = Math.max(most, decimals(text));
        }
    }

    /** The class name that leaves room at the right for the decimals that the number lacks. */
    String room(String text) {
        if (!isNumber(text) || most - least > MOST || decimals(text) == most) {
            return "";
        }
        return (decimals(text) == 0 ? "e" : "d") + (most - decimals(text));
    }

    private static int decimals(String text) {
        int point = text.indexOf('.');
        return point < 0 ? 0 : text.length() - point - 1;
    }
}
