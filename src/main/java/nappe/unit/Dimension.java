package nappe.unit;

import java.util.List;
import org.apache.commons.math3.fraction.Fraction;

/**
 * The dimension of a quantity: exponents of length, mass, time and temperature, which may be fractions (the square root
 * of an acceleration is length^1/2 time^-1).
 */
public record Dimension(Fraction length, Fraction mass, Fraction time, Fraction temperature) {
    /** The dimension of pure numbers and of words. */
    public static final Dimension NONE = of(0, 0, 0, 0);

    public static final Dimension LENGTH = of(1, 0, 0, 0);
    public static final Dimension FLOW = of(3, 0, -1, 0);
    public static final Dimension PRESSURE = of(-1, 1, -2, 0);
    public static final Dimension VISCOSITY = of(-1, 1, -1, 0);
    public static final Dimension FORCE = of(1, 1, -2, 0);

    private static final List<String> NAMES = List.of("length", "mass", "time", "temperature");

    public static Dimension of(int length, int mass, int time, int temperature) {
        return new Dimension(new Fraction(length), new Fraction(mass), new Fraction(time), new Fraction(temperature));
    }

    /** The four exponents in the order length, mass, time, temperature. */
    public List<Fraction> exponents() {
        return List.of(length, mass, time, temperature);
    }

    public boolean isNone() {
        return equals(NONE);
    }

    public Dimension times(Dimension other) {
        return new Dimension(
                length.add(other.length),
                mass.add(other.mass),
                time.add(other.time),
                temperature.add(other.temperature));
    }

    public Dimension over(Dimension other) {
        return times(other.power(new Fraction(-1)));
    }

    public Dimension power(Fraction exponent) {
        return new Dimension(
                length.multiply(exponent),
                mass.multiply(exponent),
                time.multiply(exponent),
                temperature.multiply(exponent));
    }

    /** In words: {@code length^3 time^-1}, or {@code a pure number}. */
    @Override
    public String toString() {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < 4; i++) {
            Fraction exponent = exponents().get(i);
            if (!exponent.equals(Fraction.ZERO)) {
                text.append(text.isEmpty() ? "" : " ").append(NAMES.get(i));
                if (!exponent.equals(Fraction.ONE)) {
                    text.append('^').append(exponent.toString().replace(" ", ""));
                }
            }
        }
        return text.isEmpty() ? "a pure number" : text.toString();
    }
}
