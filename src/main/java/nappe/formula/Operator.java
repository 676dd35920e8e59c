package nappe.formula;

/** The five operations of arithmetic, with the sign that stands for each in plain text. */
public enum Operator {
    PLUS("+", 1),
    MINUS("-", 1),
    TIMES("*", 2),
    OVER("/", 2),
    POWER("^", 4);

    private final String sign;
    private final int binding;

    Operator(String sign, int binding) {
        this.sign = sign;
        this.binding = binding;
    }

    public String sign() {
        return sign;
    }

    /** How tightly it binds; a leading minus binds at 3, between product and power. */
    public int binding() {
        return binding;
    }
}
