package nappe.unit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Map;
import org.junit.jupiter.api.Test;
import tech.units.indriya.function.RationalNumber;

/** The facts of the catalogue, each against its definition worked out here. */
class UnitCatalogueTest {
    /** Definitions of NIST SP 811 (2008), appendix B, multiplied out; all exact. */
    private static final Map<String, String> EXACT = Map.ofEntries(
            Map.entry("in", "0.0254"),
            Map.entry("ft", "0.3048"),
            Map.entry("yd", "0.9144"),
            Map.entry("mi", "1609.344"),
            Map.entry("ft3", "0.028316846592"),
            Map.entry("ft3/s", "0.028316846592"),
            Map.entry("cfs", "0.028316846592"),
            Map.entry("ac", "4046.8564224"),
            Map.entry("ac-ft", "1233.48183754752"),
            Map.entry("gal", "0.003785411784"),
            Map.entry("L", "0.001"),
            Map.entry("ML", "1000"),
            Map.entry("ha", "10000"),
            Map.entry("lb", "0.45359237"),
            Map.entry("lbf", "4.4482216152605"),
            Map.entry("mbar", "100"),
            Map.entry("cP", "0.001"),
            Map.entry("cSt", "0.000001"),
            Map.entry("%", "0.01"));

    @Test
    void definedFactorsAreExact() {
        EXACT.forEach((text, size) -> {
            assertThat(Unit.parse(text).exact()).as(text).isEqualTo(decimal(size));
            assertThat(Unit.parse(text).sizeInSi()).as(text).isEqualTo(Double.parseDouble(size));
        });
    }

    @Test
    void factorsThatAreNoShortDecimalAreExactFractions() {
        RationalNumber slug = decimal("4.4482216152605").divide(decimal("0.3048"));
        RationalNumber psi = decimal("4.4482216152605").divide(decimal("0.0254").pow(2));
        RationalNumber mgd =
                decimal("0.003785411784").multiply(decimal("1000000")).divide(decimal("86400"));
        assertThat(Unit.parse("slug").exact()).isEqualTo(slug);
        assertThat(Unit.parse("psi").exact()).isEqualTo(psi);
        assertThat(Unit.parse("MGD").exact()).isEqualTo(mgd);
    }

    @Test
    void fractionsComeOutAsTheNearestDouble() {
        assertThat(Unit.parse("slug").sizeInSi()).isEqualTo(quotient("4.4482216152605", "0.3048"));
        assertThat(Unit.parse("psi").sizeInSi()).isEqualTo(quotient("4.4482216152605", "0.00064516"));
        assertThat(Unit.parse("gpm").sizeInSi()).isEqualTo(quotient("0.003785411784", "60"));
        assertThat(Unit.parse("degR").sizeInSi()).isEqualTo(quotient("5", "9"));
    }

    @Test
    void everyExactSizeAgreesWithItsDouble() {
        for (UnitCatalogue.Entry entry : UnitCatalogue.standard().entries()) {
            RationalNumber exact = entry.unit().exact();
            if (exact == null) {
                assertThat(entry.unit().text()).isEqualTo("deg");
            } else {
                assertThat(entry.unit().sizeInSi()).as(entry.unit().text()).isEqualTo(Unit.toDouble(exact));
            }
        }
    }

    /** 231 in3 in a gallon, 1728 in3 in a cubic foot, 86400 s in a day. */
    @Test
    void aMillionGallonsPerDayIsSoManyCubicFeetPerSecond() {
        assertThat(Unit.parse("MGD").sizeIn(WorkingSystem.US)).isEqualTo(231e6 / 1728 / 86400);
        assertThat(Unit.parse("MGD").sizeIn(WorkingSystem.US)).isCloseTo(1.547228, within(1e-6));
    }

    @Test
    void degreesOfAngleHoldPi() {
        assertThat(Unit.parse("deg").exact()).isNull();
        assertThat(Unit.parse("deg").sizeInSi()).isEqualTo(Math.PI / 180);
        assertThat(Unit.parse("deg").dimension()).isEqualTo(Dimension.NONE);
        assertThat(Unit.parse("deg").sizeIn(WorkingSystem.US)).isEqualTo(Math.PI / 180);
    }

    @Test
    void scalesOfTemperatureStartAboveAbsoluteZero() {
        assertThat(Unit.parse("degC").zeroInSi()).isEqualTo(273.15);
        assertThat(Unit.parse("degF").zeroInSi()).isEqualTo(quotient("2298.35", "9"));
        assertThat(Unit.parse("K").zeroInSi()).isZero();
        assertThat(Unit.parse("degR").zeroInSi()).isZero();
    }

    /** Ice point and boiling point of the scales by their definitions, and where the two scales meet. */
    @Test
    void celsiusAndFahrenheitAgree() {
        Map<Double, Double> pairs = Map.of(0.0, 32.0, 100.0, 212.0, -40.0, -40.0);
        Unit celsius = Unit.parse("degC");
        Unit fahrenheit = Unit.parse("degF");
        pairs.forEach((c, f) -> assertThat(c * celsius.sizeInSi() + celsius.zeroInSi())
                .isCloseTo(f * fahrenheit.sizeInSi() + fahrenheit.zeroInSi(), within(1e-12 * 373.15)));
    }

    @Test
    void zerosInDegreesRankine() {
        assertThat(Unit.parse("degF").zeroIn(WorkingSystem.US)).isEqualTo(459.67);
        assertThat(Unit.parse("degC").zeroIn(WorkingSystem.US)).isEqualTo(491.67);
        assertThat(Unit.parse("degC").zeroIn(WorkingSystem.SI)).isEqualTo(273.15);
        assertThat(Unit.parse("ft").zeroIn(WorkingSystem.US)).isZero();
    }

    @Test
    void onlyTheTwoTemperatureScalesHaveAZeroOfTheirOwn() {
        assertThat(UnitCatalogue.standard().entries())
                .filteredOn(entry -> entry.unit().zeroInSi() != 0)
                .extracting(entry -> entry.unit().text())
                .containsExactly("degC", "degF");
    }

    @Test
    void everyNamedUnitSaysWhatItIsAndWhereItsFactorIsFrom() {
        for (UnitCatalogue.Entry entry : UnitCatalogue.standard().entries()) {
            assertThat(entry.description()).as(entry.unit().text()).isNotBlank();
            assertThat(entry.definition()).as(entry.unit().text()).isNotBlank();
            assertThat(entry.source()).as(entry.unit().text()).isNotBlank();
            assertThat(Unit.parse(entry.unit().text())).isSameAs(entry.unit());
        }
    }

    @Test
    void unitsOfADimensionComeInTheOrderOfTheTable() {
        assertThat(UnitCatalogue.standard().of(Dimension.LENGTH))
                .extracting(Unit::text)
                .containsExactly("m", "mm", "cm", "km", "in", "ft", "yd", "mi");
        assertThat(UnitCatalogue.standard().of(Dimension.FLOW))
                .extracting(Unit::text)
                .containsExactly("cfs", "gpm", "gpd", "MGD");
    }

    @Test
    void onlyNamedUnitsHaveAnEntry() {
        UnitCatalogue.Entry inch = UnitCatalogue.standard().entry(Unit.parse("in"));
        assertThat(inch).isNotNull();
        assertThat(inch.definition()).isEqualTo("0.0254 m");
        assertThat(UnitCatalogue.standard().entry(Unit.parse("in/s"))).isNull();
    }

    static RationalNumber decimal(String text) {
        BigDecimal number = new BigDecimal(text);
        return RationalNumber.of(number.unscaledValue(), java.math.BigInteger.TEN.pow(number.scale()));
    }

    /** The nearest double to a quotient of decimals. */
    static double quotient(String above, String below) {
        return new BigDecimal(above)
                .divide(new BigDecimal(below), new MathContext(60))
                .doubleValue();
    }
}
