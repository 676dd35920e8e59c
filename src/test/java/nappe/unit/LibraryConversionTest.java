package nappe.unit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import javax.measure.IncommensurableException;
import javax.measure.MetricPrefix;
import org.junit.jupiter.api.Test;
import tech.units.indriya.unit.Units;

/** Our conversions against the JSR-385 library's own, for the units that it knows. */
class LibraryConversionTest {
    private static final Map<String, javax.measure.Unit<?>> KNOWN = Map.ofEntries(
            Map.entry("m", Units.METRE),
            Map.entry("mm", MetricPrefix.MILLI(Units.METRE)),
            Map.entry("cm", MetricPrefix.CENTI(Units.METRE)),
            Map.entry("km", MetricPrefix.KILO(Units.METRE)),
            Map.entry("ha", MetricPrefix.HECTO(Units.METRE).pow(2)),
            Map.entry("L", Units.LITRE),
            Map.entry("ML", MetricPrefix.MEGA(Units.LITRE)),
            Map.entry("L/s", Units.LITRE.divide(Units.SECOND)),
            Map.entry("m3/h", Units.CUBIC_METRE.divide(Units.HOUR)),
            Map.entry("ML/d", MetricPrefix.MEGA(Units.LITRE).divide(Units.DAY)),
            Map.entry("km/h", Units.KILOMETRE_PER_HOUR),
            Map.entry("min", Units.MINUTE),
            Map.entry("h", Units.HOUR),
            Map.entry("d", Units.DAY),
            Map.entry("g", Units.GRAM),
            Map.entry("N", Units.NEWTON),
            Map.entry("kN", MetricPrefix.KILO(Units.NEWTON)),
            Map.entry("Pa", Units.PASCAL),
            Map.entry("hPa", MetricPrefix.HECTO(Units.PASCAL)),
            Map.entry("kPa", MetricPrefix.KILO(Units.PASCAL)),
            Map.entry("MPa", MetricPrefix.MEGA(Units.PASCAL)),
            Map.entry("mPa.s", MetricPrefix.MILLI(Units.PASCAL).multiply(Units.SECOND)),
            Map.entry("cSt", MetricPrefix.MILLI(Units.METRE).pow(2).divide(Units.SECOND)),
            Map.entry("%", Units.PERCENT),
            Map.entry("rad", Units.RADIAN),
            Map.entry("degC", Units.CELSIUS));

    @Test
    void ourConversionToSiIsTheLibrarys() throws IncommensurableException {
        for (Map.Entry<String, javax.measure.Unit<?>> known : KNOWN.entrySet()) {
            Unit ours = Unit.parse(known.getKey());
            javax.measure.Unit<?> theirs = known.getValue();
            for (double value : new double[] {0, 1, 12.5, -3}) {
                double expected =
                        theirs.getConverterToAny(theirs.getSystemUnit()).convert(value);
                assertThat(value * ours.sizeInSi() + ours.zeroInSi())
                        .as(value + " " + ours)
                        .isCloseTo(expected, within(1e-15 * Math.max(1e-9, Math.abs(expected))));
            }
        }
    }

    @Test
    void ourDimensionIsTheLibrarys() {
        KNOWN.forEach((text, theirs) -> assertThat(
                        rebuilt(Unit.parse(text).dimension()).getDimension())
                .as(text)
                .isEqualTo(theirs.getDimension()));
    }

    private static javax.measure.Unit<?> rebuilt(Dimension dimension) {
        return Units.METRE
                .pow(dimension.length().intValue())
                .multiply(Units.KILOGRAM.pow(dimension.mass().intValue()))
                .multiply(Units.SECOND.pow(dimension.time().intValue()))
                .multiply(Units.KELVIN.pow(dimension.temperature().intValue()));
    }
}
