package nappe.source;

/** A cited table that cannot be read; the message starts with file and line and ends with the fault's code. */
public final class TableException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private static final String MARK = " (fault: ";

    public TableException(String message) {
        super(message);
    }

    /** The message without its code. */
    public String fault() {
        return getMessage().substring(0, mark());
    }

    /** Stable and searchable: "row-length". */
    public String code() {
        return getMessage().substring(mark() + MARK.length(), getMessage().length() - 1);
    }

    private int mark() {
        return getMessage().lastIndexOf(MARK);
    }
}
