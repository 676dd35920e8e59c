package nappe.unit;

import java.util.List;
import java.util.Map;
import org.apache.commons.math3.fraction.Fraction;
import tech.units.indriya.function.RationalNumber;

/** The coherent system a package works in, so that its formulas hide no factors. */
public enum WorkingSystem {
    /** Metre, kilogram, second, kelvin. */
    SI(
            "SI",
            List.of("m", "kg", "s", "K"),
            Map.of(Dimension.PRESSURE, "Pa", Dimension.VISCOSITY, "Pa.s", Dimension.FORCE, "N")),
    /** Foot, slug, second, degree Rankine. */
    US(
            "US customary",
            List.of("ft", "slug", "s", "degR"),
            Map.of(Dimension.PRESSURE, "lbf/ft2", Dimension.VISCOSITY, "lbf.s/ft2", Dimension.FORCE, "lbf"));

    private final String title;
    private final List<String> bases;
    private final Map<Dimension, String> named;

    WorkingSystem(String title, List<String> bases, Map<Dimension, String> named) {
        this.title = title;
        this.bases = bases;
        this.named = named;
    }

    public String title() {
        return title;
    }

    /** The coherent unit of a dimension: {@code ft3/s}, {@code Pa}, {@code m^(1/3)/s}. */
    public Unit coherentUnit(Dimension dimension) {
        String name = named.get(dimension);
        return Unit.parse(name != null ? name : written(dimension));
    }

    private String written(Dimension dimension) {
        StringBuilder above = new StringBuilder();
        StringBuilder below = new StringBuilder();
        for (int i = 0; i < 4; i++) {
            Fraction exponent = dimension.exponents().get(i);
            if (exponent.compareTo(Fraction.ZERO) > 0) {
                above.append(above.isEmpty() ? "" : ".").append(bases.get(i)).append(written(exponent));
            } else if (exponent.compareTo(Fraction.ZERO) < 0) {
                below.append('/').append(bases.get(i)).append(written(exponent.negate()));
            }
        }
        return (above.isEmpty() ? "1" : above.toString()) + below;
    }

    private static String written(Fraction exponent) {
        if (exponent.equals(Fraction.ONE)) {
            return "";
        }
        return exponent.getDenominator() == 1
                ? Integer.toString(exponent.getNumerator())
                : "^(" + exponent.getNumerator() + "/" + exponent.getDenominator() + ")";
    }

    double sizeOf(Unit unit) {
        RationalNumber exact = unit.exact();
        if (exact == null) {
            return unit.sizeInSi() / coherentUnit(unit.dimension()).sizeInSi();
        }
        RationalNumber size = exact;
        for (int i = 0; i < 4; i++) {
            Fraction exponent = unit.dimension().exponents().get(i);
            RationalNumber base = Unit.parse(bases.get(i)).exact();
            if (base == null || exponent.getDenominator() != 1) {
                return unit.sizeInSi() / coherentUnit(unit.dimension()).sizeInSi();
            }
            size = size.divide(Unit.power(base, exponent.getNumerator()));
        }
        return Unit.toDouble(size);
    }
}
