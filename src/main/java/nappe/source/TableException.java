package nappe.source;

/** A cited table that cannot be read; the message starts with file and line and ends with the fault's code. */
public final class TableException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private static final String MARK = " (fault: ";

    private final String message;

    public TableException(String message) {
        super(message);
        this.message = message;
    }

    /** The message without its code. */
    public String fault() {
        return message.substring(0, message.lastIndexOf(MARK));
    }

    /** Stable and searchable: "row-length". */
    public String code() {
        return message.substring(message.lastIndexOf(MARK) + MARK.length(), message.length() - 1);
    }
}
