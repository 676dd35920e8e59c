package nappe.deliver.pdf;

/** A run of characters set alike. */
record Piece(String text, Face face, Shift shift) {
    /** How the characters look. */
    public enum Face {
        PLAIN,
        /** A symbol that stands for a quantity. */
        ITALIC,
        BOLD
    }

    /** Where the characters stand against the line. */
    public enum Shift {
        NONE,
        LOWERED,
        RAISED,
        LOWERED_IN_RAISED,
        RAISED_TWICE
    }

    /** The style of what looks as its surroundings do. */
    static final String PLAIN = "t";

    public Piece {
        text = XmlText.safe(text);
    }

    static Piece plain(String text) {
        return new Piece(text, Face.PLAIN, Shift.NONE);
    }

    static Piece bold(String text) {
        return new Piece(text, Face.BOLD, Shift.NONE);
    }

    static Piece italic(String text) {
        return new Piece(text, Face.ITALIC, Shift.NONE);
    }

    /** The same as part of a subscript. */
    Piece lowered() {
        return new Piece(text, face, shift == Shift.RAISED ? Shift.LOWERED_IN_RAISED : Shift.LOWERED);
    }

    /** The same as part of an exponent. */
    Piece raised() {
        Shift higher = switch (shift) {
            case NONE -> Shift.RAISED;
            case LOWERED, LOWERED_IN_RAISED -> Shift.LOWERED_IN_RAISED;
            case RAISED, RAISED_TWICE -> Shift.RAISED_TWICE;
        };
        return new Piece(text, face, higher);
    }

    /** Class names for the style sheet. */
    public String style() {
        String look = switch (face) {
            case PLAIN -> PLAIN;
            case ITALIC -> "i";
            case BOLD -> "b";
        };
        return switch (shift) {
            case NONE -> look;
            case LOWERED -> look + " sub";
            case RAISED -> look + " sup";
            case LOWERED_IN_RAISED -> look + " supsub";
            case RAISED_TWICE -> look + " supsup";
        };
    }
}
