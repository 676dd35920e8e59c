package nappe.formula;

/** The comparisons a formula or a limit may make. Numbers are compared with {@link Tolerance}. */
public enum Comparator {
    AT_MOST("<="),
    BELOW("<"),
    AT_LEAST(">="),
    ABOVE(">"),
    EQUAL("="),
    UNLIKE("<>");

    private final String sign;

    Comparator(String sign) {
        this.sign = sign;
    }

    public String sign() {
        return sign;
    }
}
