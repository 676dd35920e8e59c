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

    /** The text as it is written between tags or in an attribute. */
    static String escaped(String text) {
        StringBuilder written = new StringBuilder(text.length() + 16);
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case '&' -> written.append("&amp;");
                case '<' -> written.append("&lt;");
                case '>' -> written.append("&gt;");
                case '"' -> written.append("&quot;");
                // else a reader of XML would take them for blanks or change them
                case '\t', '\n', '\r' -> written.append("&#").append((int) c).append(';');
                default -> written.append(c);
            }
        }
        return written.toString();
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
