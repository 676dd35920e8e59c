package nappe.input;

import java.text.Normalizer;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** What to do about a text that stands where a number belongs; it is never converted, for it may mean two things. */
final class NumberTexts {
    private static final String SIGN = "[+-]?";
    private static final Pattern PLAIN = Pattern.compile(SIGN + "(\\d+(\\.\\d*)?|\\.\\d+)([eE][+-]?\\d+)?");
    private static final Pattern ONE_GROUP = Pattern.compile("(" + SIGN + "[1-9]\\d{0,2}),(\\d{3})");
    private static final Pattern COMMA = Pattern.compile("(" + SIGN + "\\d*),(\\d+)");
    private static final Pattern GROUPS_POINT = Pattern.compile(SIGN + "\\d{1,3}(,\\d{3})+(\\.\\d*)?");
    private static final Pattern GROUPS_COMMA = Pattern.compile(SIGN + "\\d{1,3}(\\.\\d{3})+(,\\d+)?");
    private static final Pattern GROUPS_BLANK = Pattern.compile("(" + SIGN + "\\d{1,3}(?:[ ']\\d{3})+)([.,]\\d+)?");
    private static final Pattern FRACTION = Pattern.compile("(?:(\\d{1,6})[ -])?(\\d{1,4})/(\\d{1,4})");
    private static final Pattern FEET = Pattern.compile("(\\d{1,6})' ?-?(\\d{1,2}(?:\\.\\d+)?)\"");
    private static final Pattern WITH_WORD =
            Pattern.compile("(" + SIGN + "\\d+(?:\\.\\d+)?) ?([\\p{L}%\"'][\\p{L}\\d/^.%\"']{0,11})");

    private NumberTexts() {}

    /** The remedy: {@code write 12.5}. */
    static String remedy(String typed) {
        String text = plain(typed);
        if (text.length() > 40) {
            return "write a plain number such as 12.5";
        }
        if (PLAIN.matcher(text).matches()) {
            return text.equals(typed)
                    ? "it is stored as text; set the format of the cell to a plain number and write " + text + " again"
                    : "write " + text + " with plain digits, sign and point";
        }
        Matcher fraction = FRACTION.matcher(text);
        if (fraction.matches() && Integer.parseInt(fraction.group(3)) > 0) {
            double whole = fraction.group(1) == null ? 0 : Integer.parseInt(fraction.group(1));
            double part = (double) Integer.parseInt(fraction.group(2)) / Integer.parseInt(fraction.group(3));
            return "write " + Plain.number(Math.round((whole + part) * 1e6) / 1e6);
        }
        Matcher feet = FEET.matcher(text);
        if (feet.matches()) {
            double length = Integer.parseInt(feet.group(1)) + Double.parseDouble(feet.group(2)) / 12;
            return "write " + Plain.number(Math.round(length * 1e6) / 1e6) + " here and \"ft\" as its unit";
        }
        Matcher word = WITH_WORD.matcher(text);
        if (word.matches()) {
            String unit = word.group(2).equals("\"") ? "in" : word.group(2).equals("'") ? "ft" : word.group(2);
            return "write " + word.group(1) + " here and \"" + unit + "\" as its unit";
        }
        return separators(text);
    }

    private static String separators(String text) {
        Matcher one = ONE_GROUP.matcher(text);
        if (one.matches()) {
            return "write " + one.group(1) + one.group(2) + " or " + one.group(1) + "." + one.group(2)
                    + ", whichever is meant";
        }
        Matcher comma = COMMA.matcher(text);
        if (comma.matches()) {
            return "write " + (comma.group(1).matches(SIGN) ? comma.group(1) + "0" : comma.group(1)) + "."
                    + comma.group(2);
        }
        if (GROUPS_POINT.matcher(text).matches()) {
            return "write " + text.replace(",", "");
        }
        if (GROUPS_COMMA.matcher(text).matches()) {
            return "write " + text.replace(".", "").replace(',', '.');
        }
        Matcher blank = GROUPS_BLANK.matcher(text);
        if (blank.matches()) {
            String rest = blank.group(2) == null ? "" : blank.group(2).replace(',', '.');
            return "write " + blank.group(1).replaceAll("[ ']", "") + rest;
        }
        return "write a plain number such as 12.5";
    }

    /** With plain digits, minus and blanks, and without what can't be seen. */
    private static String plain(String typed) {
        return Normalizer.normalize(typed, Normalizer.Form.NFKC)
                .replaceAll("\\p{Cf}", "")
                .replaceAll("[\\p{Z}\\s]+", " ")
                .replace('\u2212', '-')
                .replace('\u2013', '-')
                .replace('\u2019', '\'')
                .replace('\u2032', '\'')
                .replace('\u201D', '"')
                .replace('\u2033', '"')
                .strip();
    }
}
