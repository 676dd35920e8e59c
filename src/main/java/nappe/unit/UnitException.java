package nappe.unit;

/** A text that is no unit of the catalogue; the message says what was read and what is near it. */
public final class UnitException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    public UnitException(String message) {
        super(message);
    }
}
