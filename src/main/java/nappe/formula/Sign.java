package nappe.formula;

/** Which signs a quantity may have. */
public enum Sign {
    POSITIVE("greater than zero"),
    NOT_NEGATIVE("zero or greater"),
    ANY("any number");

    private final String words;

    Sign(String words) {
        this.words = words;
    }

    /** In words, for error messages: "greater than zero". */
    public String words() {
        return words;
    }

    public boolean allows(double value) {
        return switch (this) {
            case POSITIVE -> value > 0;
            case NOT_NEGATIVE -> value >= 0;
            case ANY -> true;
        };
    }
}
