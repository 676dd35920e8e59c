package nappe.deliver.pdf;

/**
 * Lines and the cells of tables as XHTML, which the template takes as they are: they are by far the most of what it
 * prints, and an element of the template costs many times what writing these few letters does.
 */
final class Markup {
    private final StringBuilder written = new StringBuilder();

    private Markup() {}

    static String of(View.Text text) {
        Markup markup = new Markup();
        markup.line(text);
        return markup.written.toString();
    }

    static String of(View.GridRow row, String element) {
        Markup markup = new Markup();
        for (View.GridCell cell : row.cells()) {
            markup.open(
                    element, "class", cell.style(), "colspan", cell.span() == 1 ? "" : Integer.toString(cell.span()));
            if (cell.texts().size() == 1 && isBare(cell.texts().get(0))) {
                markup.line(cell.texts().get(0));
            } else {
                cell.texts().forEach(markup::paragraph);
            }
            markup.close(element);
        }
        return markup.written.toString();
    }

    /** A word of several pieces would stand lower in a cell at the head of a page than in a paragraph there. */
    private static boolean isBare(View.Text text) {
        return !text.hasLook() && text.pieces().size() < 2 && text.inset() == null;
    }

    private void paragraph(View.Text text) {
        open("p", "class", text.style());
        line(text);
        close("p");
    }

    private void line(View.Text text) {
        boolean linked = !text.target().isEmpty();
        if (linked) {
            open("a", "href", text.target());
        }
        for (View.Word word : Words.of(text.pieces())) {
            word(word);
        }
        View.Inset inset = text.inset();
        if (inset != null) {
            open("span", "class", "drawn", Drawings.ATTRIBUTE, inset.name(), "title", inset.text());
            close("span");
        }
        if (linked) {
            close("a");
        }
    }

    private void word(View.Word word) {
        if (word.whole()) {
            open("span", "class", "word");
        }
        for (Piece piece : word.pieces()) {
            boolean plain = piece.style().equals(Piece.PLAIN);
            if (!plain) {
                open("span", "class", piece.style());
            }
            written.append(XmlText.escaped(piece.text()));
            if (!plain) {
                close("span");
            }
        }
        if (word.whole()) {
            close("span");
        }
    }

    /** @param attributes name and value in turn; one without a value is left out */
    private void open(String name, String... attributes) {
        written.append('<').append(name);
        for (int i = 0; i < attributes.length; i += 2) {
            if (attributes[i + 1].isEmpty()) {
                continue;
            }
            written.append(' ')
                    .append(attributes[i])
                    .append("=\"")
                    .append(XmlText.escaped(attributes[i + 1]))
                    .append('"');
        }
        written.append('>');
    }

    private void close(String name) {
        written.append("</").append(name).append('>');
    }
}
