package nappe.deliver.pdf;

/** Text made fit for XML 1.0. */
final class XmlText {
    private XmlText() {}

    /** The text with U+FFFD in place of what XML cannot carry: control characters and halves of surrogate pairs. */
    static String safe(String text) {
        if (text.chars().allMatch(c -> c >= 0x20 && c < 0xD800)) {
            return text;
        }
        StringBuilder safe = new StringBuilder(text.length());
        text.codePoints().forEach(c -> safe.appendCodePoint(allowed(c) ? c : 0xFFFD));
        return safe.toString();
    }

    private static boolean allowed(int c) {
        return c == '\t'
                || c == '\n'
                || c == '\r'
                || c >= 0x20 && c < 0xD800
                || c >= 0xE000 && c < 0xFFFE
                || c > 0xFFFF;
    }
}
