package nappe.results;

import java.math.BigDecimal;
import java.math.RoundingMode;
import nappe.unit.Dimension;
import nappe.unit.Unit;

/**
 * How many digits are printed: lengths and levels to 0.001 ft or 0.1 mm, or to two figures where they would be printed
 * as nought, pure numbers that are whole without decimals,
 * all else to four figures. Verdicts are made
 * with full precision; only print is rounded.
 */
public final class Digits {
    private static final int FIGURES = 4;

    /** A length no greater than this, in any unit, is what is left by rounding or by a search. */
    private static final double REST = 1e-7;

    private Digits() {}

    /** The decimals printed of a result in its working unit. */
    public static int decimals(Unit unit, double value) {
        if (unit.dimension().equals(Dimension.LENGTH)) {
            return switch (unit.text()) {
                case "m" -> ofLength(value, 4);
                case "ft" -> ofLength(value, 3);
                case "in" -> ofLength(value, 2);
                case "mm" -> ofLength(value, 1);
                default -> figures(value, FIGURES);
            };
        }
        boolean whole = unit.dimension().isNone() && value == Math.rint(value) && Math.abs(value) < 1e6;
        return whole ? 0 : figures(value, FIGURES);
    }

    /** What a computation leaves of a difference that is nought is printed as nought. */
    private static int ofLength(double value, int usual) {
        boolean vanishes = Math.abs(value) < 0.5 * Math.pow(10, -usual) && Math.abs(value) > REST;
        return vanishes ? figures(value, 2) : usual;
    }

    /** The decimals that show so many figures of a value, at most 9. */
    public static int figures(double value, int figures) {
        if (value == 0) {
            return 0;
        }
        if (Math.abs(value) < 5e-10) {
            return figures;
        }
        int decimals = figures - 1 - (int) Math.floor(Math.log10(Math.abs(value)));
        return Math.max(0, Math.min(9, decimals));
    }

    /** A result as printed. */
    public static String print(Unit unit, double value) {
        return print(value, decimals(unit, value));
    }

    /** A number with so many decimals, rounded half away from zero; never "-0". */
    public static String print(double value, int decimals) {
        BigDecimal rounded = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_UP);
        return (rounded.signum() == 0 ? rounded.abs() : rounded).toPlainString();
    }

    /** A number as typed: all its digits and no more. */
    public static String asTyped(double value) {
        BigDecimal number = BigDecimal.valueOf(value).stripTrailingZeros();
        if (number.signum() != 0 && (Math.abs(value) < 1e-6 || Math.abs(value) >= 1e12)) {
            return number.toString();
        }
        return number.scale() < 0 ? number.setScale(0).toPlainString() : number.toPlainString();
    }

    /** The workbook's number format for so many decimals: {@code 0.000}. */
    public static String format(int decimals) {
        return decimals == 0 ? "0" : "0." + "0".repeat(decimals);
    }
}
