package nappe.input;

/** Typed texts as messages show them: short, and with what can't be seen made visible. */
final class Shown {
    private static final int MOST = 40;

    private Shown() {}

    /** In double quotes: {@code "1<U+00A0>500"}. */
    static String quoted(String text) {
        StringBuilder shown = new StringBuilder("\"");
        int length = 0;
        for (int at = 0; at < text.length(); at += Character.charCount(text.codePointAt(at))) {
            if (++length > MOST) {
                shown.append("...");
                break;
            }
            int c = text.codePointAt(at);
            if (isPlain(c)) {
                shown.appendCodePoint(c);
            } else {
                shown.append(String.format("<U+%04X>", c));
            }
        }
        return shown.append('"').toString();
    }

    /** Whether a reader sees the character as what it is; the blank is plain, other blanks are not. */
    static boolean isPlain(int c) {
        return switch (Character.getType(c)) {
            case Character.CONTROL,
                    Character.FORMAT,
                    Character.SURROGATE,
                    Character.UNASSIGNED,
                    Character.PRIVATE_USE,
                    Character.LINE_SEPARATOR,
                    Character.PARAGRAPH_SEPARATOR -> false;
            case Character.SPACE_SEPARATOR -> c == ' ';
            default -> c != '\u2212';
        };
    }
}
