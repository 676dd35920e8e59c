package nappe.input;

import java.math.BigDecimal;

/** Numbers as a person would type them. */
final class Plain {
    private Plain() {}

    /** The shortest text of the number, without exponent where that is short: {@code 2045}, {@code 12.5}. */
    static String number(double value) {
        BigDecimal exact = new BigDecimal(Double.toString(value)).stripTrailingZeros();
        String text = exact.toPlainString();
        return text.length() <= 20 ? text : Double.toString(value);
    }
}
