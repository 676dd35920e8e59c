package nappe.unit;

import java.util.Objects;
import org.jspecify.annotations.Nullable;
import tech.units.indriya.function.RationalNumber;

/**
 * A unit as the trade writes it ({@code ft3/s}, {@code MGD}, {@code m^(1/3)/s}), with its dimension and its exact size.
 * Two units are equal when they are written alike.
 */
public final class Unit {
    private final String text;
    private final Dimension dimension;
    private final @Nullable RationalNumber exact;
    private final double size;
    private final RationalNumber zero;

    Unit(String text, Dimension dimension, @Nullable RationalNumber exact, double size, RationalNumber zero) {
        this.text = text;
        this.dimension = dimension;
        this.exact = exact;
        this.size = size;
        this.zero = zero;
    }

    /** The unit written so; an unknown one is an error that names the nearest known. */
    public static Unit parse(String text) {
        return UnitCatalogue.standard().parse(text);
    }

    /** The unit of pure numbers. */
    public static Unit one() {
        return parse("1");
    }

    public String text() {
        return text;
    }

    public Dimension dimension() {
        return dimension;
    }

    /** How many coherent SI units one of this unit is, as an exact fraction; null where it holds pi or a root. */
    @Nullable
    RationalNumber exact() {
        return exact;
    }

    /** How many coherent SI units one of this unit is. */
    public double sizeInSi() {
        return size;
    }

    /** What the zero of this unit is in coherent SI units: 273.15 for degC, 0 for nearly all. */
    public double zeroInSi() {
        return toDouble(zero);
    }

    /** How many coherent units of the system one of this unit is; exact to the last bit where it is a fraction. */
    public double sizeIn(WorkingSystem system) {
        return system.sizeOf(this);
    }

    /** What the zero of this unit is in coherent units of the system. */
    public double zeroIn(WorkingSystem system) {
        RationalNumber coherent = system.coherentUnit(dimension).exact();
        return coherent == null || zero.signum() == 0 ? zeroInSi() : toDouble(zero.divide(coherent));
    }

    @Override
    public boolean equals(@Nullable Object other) {
        return other instanceof Unit unit && unit.text.equals(text);
    }

    @Override
    public int hashCode() {
        return Objects.hashCode(text);
    }

    @Override
    public String toString() {
        return text;
    }

    static double toDouble(RationalNumber number) {
        return new java.math.BigDecimal(number.getDividend())
                .divide(new java.math.BigDecimal(number.getDivisor()), new java.math.MathContext(40))
                .doubleValue();
    }

    /** A whole power, negative ones too: the library's own {@code pow} fails on those. */
    static RationalNumber power(RationalNumber number, int exponent) {
        return exponent < 0 ? number.reciprocal().pow(-exponent) : number.pow(exponent);
    }
}
