package nappe.deliver.xlsx;

import java.util.regex.Pattern;

/** Text on its way into a part of the workbook: checked, and escaped twice, for the workbook and for XML. */
final class Texts {
    /** A cell holds no more than this. */
    static final int LONGEST = 32_767;

    /** A formula holds no more than this. */
    static final int LONGEST_FORMULA = 8_192;

    private static final Pattern LOOKS_ESCAPED = Pattern.compile("_(?=x[0-9A-Fa-f]{4}_)");

    private Texts() {}

    /** The text as a cell's content: anything that looks like an escaped character is kept as it was typed. */
    static String content(String text) {
        check(text, LONGEST);
        return LOOKS_ESCAPED.matcher(text).replaceAll("_x005F_");
    }

    /** A formula, checked. */
    static String formula(String text) {
        check(text, LONGEST_FORMULA);
        return text;
    }

    private static void check(String text, int longest) {
        if (text.length() > longest) {
            throw new IllegalStateException(
                    text.length() + " characters, " + longest + " is the most: " + text.substring(0, 60) + "...");
        }
        text.codePoints().forEach(c -> {
            boolean control = c < 0x20 && c != '\n' && c != '\t';
            if (control || c == 0xFFFE || c == 0xFFFF || (c >= 0xD800 && c <= 0xDFFF)) {
                throw new IllegalStateException(
                        String.format("control character U+%04X in: %s", c, text.replaceAll("\\p{Cntrl}", "?")));
            }
        });
    }

    static String xml(String text) {
        StringBuilder out = new StringBuilder(text.length() + 16);
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case '&' -> out.append("&amp;");
                case '<' -> out.append("&lt;");
                case '>' -> out.append("&gt;");
                case '"' -> out.append("&quot;");
                default -> out.append(c);
            }
        }
        return out.toString();
    }
}
