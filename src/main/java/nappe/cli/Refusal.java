package nappe.cli;

/** Something that is not done, with what to do instead, and its exit status. */
final class Refusal extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final int status;

    Refusal(int status, String message) {
        super(message);
        this.status = status;
    }

    int status() {
        return status;
    }
}
