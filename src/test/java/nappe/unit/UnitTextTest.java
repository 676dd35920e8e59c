package nappe.unit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.apache.commons.math3.fraction.Fraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What a unit text means, and which texts are none. */
class UnitTextTest {
    @ParameterizedTest
    @CsvSource({
        "m3/s, length^3 time^-1",
        "m^3/s, length^3 time^-1",
        "L/s, length^3 time^-1",
        "ac-ft/d, length^3 time^-1",
        "ft.s-2, length time^-2",
        "kg/m/s2, length^-1 mass time^-2",
        "lbf.s/ft2, length^-1 mass time^-1",
        "1/s, time^-1",
        "m^(1/3)/s, length^1/3 time^-1",
        "m^(-1/3).s, length^-1/3 time",
        "ft/ft, a pure number",
        "%, a pure number",
        "K, temperature",
    })
    void dimensionOfAText(String text, String dimension) {
        assertThat(Unit.parse(text).dimension()).hasToString(dimension);
    }

    @Test
    void everySlashDividesOnlyWhatFollowsIt() {
        assertThat(Unit.parse("kg/m.s").dimension())
                .isEqualTo(Unit.parse("kg.s/m").dimension());
        assertThat(Unit.parse("kg/m/s").dimension()).isEqualTo(Dimension.VISCOSITY);
    }

    @Test
    void theLongestNameIsRead() {
        assertThat(Unit.parse("min").sizeInSi()).isEqualTo(60);
        assertThat(Unit.parse("mi/h").sizeInSi()).isCloseTo(0.44704, within(1e-15));
        assertThat(Unit.parse("mm").sizeInSi()).isEqualTo(0.001);
        assertThat(Unit.parse("mH2O(4degC)").dimension()).isEqualTo(Dimension.PRESSURE);
    }

    @Test
    void negativeExponentsAreExact() {
        assertThat(Unit.parse("in-2").exact())
                .isEqualTo(UnitCatalogueTest.decimal("0.0254").pow(2).reciprocal());
        assertThat(Unit.parse("1/in2").exact()).isEqualTo(Unit.parse("in-2").exact());
    }

    @Test
    void aRootHasASizeButNoFraction() {
        Unit unit = Unit.parse("ft^(1/2)/s");
        assertThat(unit.exact()).isNull();
        assertThat(unit.sizeInSi()).isCloseTo(Math.sqrt(0.3048), within(1e-16));
        assertThat(unit.dimension().length()).isEqualTo(new Fraction(1, 2));
        assertThat(Unit.parse("m^(1/2)/s").sizeInSi()).isEqualTo(1);
        assertThat(Unit.parse("ft^(4/2)").exact()).isEqualTo(Unit.parse("ft2").exact());
    }

    @Test
    void thePureNumberIsWrittenAsOne() {
        assertThat(Unit.one().text()).isEqualTo("1");
        assertThat(Unit.one().dimension()).isEqualTo(Dimension.NONE);
        assertThat(Unit.one().sizeInSi()).isEqualTo(1);
    }

    @Test
    void unitsAreEqualWhenTheyAreWrittenAlike() {
        assertThat(Unit.parse("ft3/s")).isEqualTo(Unit.parse("ft3/s")).hasSameHashCodeAs(Unit.parse("ft3/s"));
        assertThat(Unit.parse("ft3/s")).isNotEqualTo(Unit.parse("cfs"));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "furlong",
                "m3 / s",
                " m",
                "m ",
                "m/",
                "/s",
                "m.",
                ".m",
                "m//s",
                "m**3",
                "m^",
                "m^()",
                "m^(1/0)",
                "m^(1/2",
                "m^1.5",
                "m0",
                "m^(0/2)",
                "m123",
                "m99999999999",
                "2m",
                "m/2",
                "11",
                "1.5",
                "m3s",
                "m\u00b3/s",
                "inH2O",
                "-"
            })
    void aTextThatIsNoUnitIsRefused(String text) {
        assertThatThrownBy(() -> Unit.parse(text))
                .isInstanceOf(UnitException.class)
                .hasMessageStartingWith("\"" + text + "\" is not a known unit");
        assertThat(UnitCatalogue.standard().knows(text)).isFalse();
    }

    @Test
    void anEmptyTextIsAskedForAOne() {
        assertThatThrownBy(() -> Unit.parse(""))
                .isInstanceOf(UnitException.class)
                .hasMessage("no unit is given; write 1 for a pure number");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "mgd; MGD",
                "GPM; gpm",
                "CFS; cfs",
                "degc; degC",
                "FT; ft",
                "AC-FT; ac-ft",
                "l/s; L/s",
                "M3/S; m3/s",
                "m\u00b3/s; m3/s",
                "ft3 / s; ft3/s",
                "inH2O; inH2O(4degC), inH2O(60degF)"
            })
    void wrongLettersNameTheUnitThatIsMeant(String text, String meant) {
        assertThatThrownBy(() -> Unit.parse(text))
                .hasMessage("\"" + text + "\" is not a known unit; did you mean " + meant + "?");
    }

    @ParameterizedTest
    @ValueSource(strings = {"degC/m", "m.degF", "1/degC", "degC2"})
    void aScaleWithAZeroCannotStandInACompound(String text) {
        String name = text.contains("degC") ? "degC" : "degF";
        assertThatThrownBy(() -> Unit.parse(text))
                .isInstanceOf(UnitException.class)
                .hasMessage(text + ": " + name + " has a zero of its own and cannot stand in a compound unit");
    }
}
