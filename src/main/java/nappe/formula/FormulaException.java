package nappe.formula;

/** A formula that cannot be read, with the place of the fault in its text. */
public final class FormulaException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final int offset;
    private final int length;
    private final String code;

    /**
     * @param offset where the fault starts, counted from 0 in the text that was read
     * @param code stable and searchable: "symbol-unknown"
     */
    public FormulaException(String message, int offset, int length, String code) {
        super(message);
        this.offset = offset;
        this.length = length;
        this.code = code;
    }

    public int offset() {
        return offset;
    }

    public int length() {
        return length;
    }

    public String code() {
        return code;
    }
}
