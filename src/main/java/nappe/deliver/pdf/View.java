package nappe.deliver.pdf;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** What the template prints: sheets of paragraphs and grids, all numbers already in words. Public for the template. */
public final class View {
    private View() {}

    /**
     * One sheet.
     *
     * @param id of its title, the target of links to it
     * @param style class names for the style sheet
     */
    public record Leaf(String id, int number, String title, String style, List<Part> parts) {}

    /** A part of a sheet, by kind. */
    public sealed interface Part {
        /** The name of the template's fragment that prints it. */
        String kind();
    }

    /** One paragraph. */
    public record Paragraph(String style, Text text) implements Part {
        @Override
        public String kind() {
            return "paragraph";
        }
    }

    /** Parts that stay on one page. */
    public record Together(List<Part> parts) implements Part {
        @Override
        public String kind() {
            return "together";
        }
    }

    /** A clear square for a seal; nothing is ever drawn in it. */
    public record SealSpace() implements Part {
        /** What it takes of the width of the page, with a gap, in mm. */
        static final double ROOM = 75;

        @Override
        public String kind() {
            return "seal";
        }
    }

    /**
     * A picture of a fixed size.
     *
     * @param id by which the page asks for it
     * @param words what it shows
     * @param width in mm
     * @param height in mm
     */
    public record Picture(String id, String words, double width, double height) implements Part {
        @Override
        public String kind() {
            return "picture";
        }

        /** The size, for the style sheet. */
        public String size() {
            return "width: " + Math.round(width * 100) / 100.0 + "mm; height: " + Math.round(height * 100) / 100.0
                    + "mm";
        }
    }

    /**
     * A table. Its head repeats on every page.
     *
     * @param widths of the columns, in mm
     * @param titles rows over the full width above the head, repeated with it
     * @param head rows of the head
     */
    public record Grid(String style, List<Double> widths, List<Text> titles, List<GridRow> head, List<GridRow> body)
            implements Part {
        @Override
        public String kind() {
            return "grid";
        }

        /** The width of the whole, for the style sheet. */
        public String width() {
            return mm(widths.stream().mapToDouble(w -> w).sum());
        }

        /** The width of each column, for the style sheet. */
        public List<String> columns() {
            return widths.stream().map(Grid::mm).toList();
        }

        private static String mm(double width) {
            return "width: " + Math.round(width * 100) / 100.0 + "mm";
        }
    }

    /** One row of a grid. */
    public record GridRow(String style, List<GridCell> cells) {
        /** The cells, each an element of this name, as XHTML. */
        public String markup(String element) {
            return Markup.of(this, element);
        }
    }

    /** One cell of a grid, with its lines of text. */
    public record GridCell(String style, int span, List<Text> texts) {
        static GridCell of(String style, Text... texts) {
            return new GridCell(style, 1, List.of(texts));
        }
    }

    /**
     * Pieces that follow one another.
     *
     * @param whole whether they are one word of several pieces, never broken over two lines
     */
    record Word(boolean whole, List<Piece> pieces) {}

    /**
     * Something drawn that stands in a line.
     *
     * @param name of the drawing
     * @param text what stands for it, in characters
     */
    record Inset(String name, String text) {}

    /**
     * Characters that are set as one line or paragraph.
     *
     * @param target id of what it links to, with the hash; empty for none
     * @param inset drawn after the pieces; null for none
     */
    public record Text(
            String style,
            List<Piece> pieces,
            String target,
            @Nullable Inset inset) {
        /** The style of what is never broken over two lines; it looks as its surroundings do. */
        static final String WHOLE = "whole";

        Text(String style, List<Piece> pieces, String target) {
            this(style, pieces, target, null);
        }

        /** The same with something drawn at its end. */
        Text with(Inset drawn) {
            return new Text(style, pieces, target, drawn);
        }

        static Text of(String style, List<Piece> pieces) {
            return new Text(style, List.copyOf(pieces), "");
        }

        static Text plain(String style, String text) {
            return of(style, List.of(Piece.plain(text)));
        }

        /** Whether its style says how it looks. */
        boolean hasLook() {
            return !style.isEmpty() && !style.equals(WHOLE);
        }

        /** The characters with their looks, as XHTML. */
        public String markup() {
            return Markup.of(this);
        }

        /** All characters in a row, for measuring. */
        String characters() {
            StringBuilder all = new StringBuilder();
            pieces.forEach(piece -> all.append(piece.text()));
            return all.toString();
        }
    }
}
