package nappe.unit;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import javax.measure.quantity.Length;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.apache.commons.math3.fraction.Fraction;
import org.jspecify.annotations.Nullable;
import tech.units.indriya.AbstractUnit;
import tech.units.indriya.function.RationalNumber;
import tech.units.indriya.unit.Units;

/**
 * The units of the trade, read from {@code tables/units.csv}: each is so many of a unit defined above it.
 *
 * <p>A unit text is names joined by {@code .} and {@code /}, each with an exponent: {@code ft3/s}, {@code kg/m3},
 * {@code Pa.s}, {@code m^(1/3)/s}. The unit of a pure number is {@code 1}.
 */
public final class UnitCatalogue {
    /** A unit of the catalogue with what is printed of it. */
    public record Entry(Unit unit, String description, String definition, String source) {}

    private static final UnitCatalogue STANDARD = new UnitCatalogue();

    private final Map<String, Entry> entries = new LinkedHashMap<>();
    private final List<String> longestFirst = new ArrayList<>();
    private final Map<String, Unit> parsed = new ConcurrentHashMap<>();

    private UnitCatalogue() {
        base("m", "metre", Units.METRE, Dimension.of(1, 0, 0, 0));
        base("kg", "kilogram", Units.KILOGRAM, Dimension.of(0, 1, 0, 0));
        base("s", "second", Units.SECOND, Dimension.of(0, 0, 1, 0));
        base("K", "kelvin", Units.KELVIN, Dimension.of(0, 0, 0, 1));
        readTable();
    }

    /** The catalogue that comes with Nappe. */
    public static UnitCatalogue standard() {
        return STANDARD;
    }

    /** All named units in the order of the table. */
    public Collection<Entry> entries() {
        return entries.values();
    }

    /** The entry of a named unit, or null for one that is put together from names. */
    public @Nullable Entry entry(Unit unit) {
        return entries.get(unit.text());
    }

    /** The named units of a dimension, in the order of the table. */
    public List<Unit> of(Dimension dimension) {
        return entries.values().stream()
                .map(Entry::unit)
                .filter(unit -> unit.dimension().equals(dimension))
                .toList();
    }

    /** The unit written so. */
    public Unit parse(String text) {
        Unit known = parsed.get(text);
        if (known != null) {
            return known;
        }
        Unit unit = new UnitText(text, this).parse();
        parsed.put(text, unit);
        return unit;
    }

    /** Whether the text is a unit. */
    public boolean knows(String text) {
        try {
            parse(text);
            return true;
        } catch (UnitException e) {
            return false;
        }
    }

    @Nullable
    Unit named(String name) {
        Entry entry = entries.get(name);
        return entry == null ? null : entry.unit();
    }

    /** The longest name of the catalogue that the text starts with. */
    @Nullable
    String nameAtStart(String text) {
        return longestFirst.stream().filter(text::startsWith).findFirst().orElse(null);
    }

    private void base(String name, String description, javax.measure.Unit<?> unit, Dimension dimension) {
        if (!unit.getSystemUnit().equals(unit)) {
            throw new IllegalStateException(name + " is not a base unit");
        }
        add(new Entry(
                new Unit(name, dimension, RationalNumber.ONE, 1, RationalNumber.ZERO),
                description,
                "base unit of SI",
                "SI Brochure, 9th ed."));
    }

    private void add(Entry entry) {
        entries.put(entry.unit().text(), entry);
        longestFirst.add(entry.unit().text());
        longestFirst.sort(Comparator.comparingInt(String::length).reversed().thenComparing(Comparator.naturalOrder()));
        parsed.put(entry.unit().text(), entry.unit());
    }

    private void readTable() {
        try (InputStream in = UnitCatalogue.class.getResourceAsStream("/tables/units.csv")) {
            if (in == null) {
                throw new IllegalStateException("tables/units.csv is missing");
            }
            CSVFormat format = CSVFormat.DEFAULT
                    .builder()
                    .setCommentMarker('#')
                    .setHeader()
                    .setSkipHeaderRecord(true)
                    .setTrim(true)
                    .get();
            for (CSVRecord row : format.parse(new InputStreamReader(in, StandardCharsets.UTF_8))) {
                add(read(row));
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private Entry read(CSVRecord row) {
        String factor = row.get("factor");
        String of = row.get("of");
        Unit base = parse(of);
        String zero = row.get("zero");
        String definition = factor + " " + of + (zero.isEmpty() ? "" : ", from " + zero + " " + of);
        Unit unit;
        if (factor.equals("pi/180")) {
            unit = new Unit(
                    row.get("name"), base.dimension(), null, base.sizeInSi() * Math.PI / 180, RationalNumber.ZERO);
        } else {
            RationalNumber baseSize = base.exact();
            if (baseSize == null) {
                throw new IllegalStateException("units.csv: " + of + " has no exact size");
            }
            RationalNumber size = fraction(factor).multiply(baseSize);
            RationalNumber zeroInSi =
                    zero.isEmpty() ? RationalNumber.ZERO : fraction(zero).multiply(baseSize);
            unit = new Unit(row.get("name"), base.dimension(), size, throughLibrary(size), zeroInSi);
        }
        return new Entry(unit, row.get("description"), definition, row.get("source"));
    }

    /** The size as the JSR-385 library converts it. */
    private static double throughLibrary(RationalNumber size) {
        javax.measure.Unit<Length> scaled =
                Units.METRE.transform(tech.units.indriya.function.MultiplyConverter.of(size));
        Number number = ((AbstractUnit<Length>) scaled).getSystemConverter().convert((Number) RationalNumber.ONE);
        return number instanceof RationalNumber rational ? Unit.toDouble(rational) : number.doubleValue();
    }

    private static RationalNumber fraction(String text) {
        int slash = text.indexOf('/');
        if (slash >= 0) {
            return decimal(text.substring(0, slash)).divide(decimal(text.substring(slash + 1)));
        }
        return decimal(text);
    }

    private static RationalNumber decimal(String text) {
        BigDecimal number = new BigDecimal(text.strip());
        return number.scale() <= 0
                ? RationalNumber.of(number.toBigIntegerExact(), java.math.BigInteger.ONE)
                : RationalNumber.of(number.unscaledValue(), java.math.BigInteger.TEN.pow(number.scale()));
    }

    static Fraction fractionExponent(String numerator, String denominator) {
        return new Fraction(Integer.parseInt(numerator), Integer.parseInt(denominator));
    }
}
