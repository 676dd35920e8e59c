package nappe.source;

/** A cited table that cannot be read; the message starts with file and line and ends with the fault's code. */
public final class TableException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    public TableException(String message) {
        super(message);
    }
}
