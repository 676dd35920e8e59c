package nappe.job;

/** Check values that cannot be read; the message starts with file and line. */
public final class CheckException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    public CheckException(String message) {
        super(message);
    }
}
