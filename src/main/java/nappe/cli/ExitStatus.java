package nappe.cli;

/** What the program says to the shell. */
final class ExitStatus {
    /** Done. Limits that are not met are results, not errors. */
    static final int DONE = 0;

    /** A fault of Nappe itself. */
    static final int INTERNAL_FAULT = 1;

    /** The command line was not understood. */
    static final int WRONG_USAGE = 2;

    /** The input was refused; the messages say where and why. */
    static final int INPUT_REFUSED = 3;

    /** An issued revision stands where the package would go. */
    static final int WOULD_OVERWRITE = 4;

    private ExitStatus() {}
}
