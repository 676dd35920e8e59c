package nappe.unit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The coherent units of the two systems and the sizes of the trade's units in them. */
class WorkingSystemTest {
    @ParameterizedTest
    @CsvSource({
        "mm, m, ft",
        "gpm, m3/s, ft3/s",
        "ac, m2, ft2",
        "km/h, m/s, ft/s",
        "psi, Pa, lbf/ft2",
        "cP, Pa.s, lbf.s/ft2",
        "cSt, m2/s, ft2/s",
        "kN, N, lbf",
        "kg/m3, kg/m3, slug/ft3",
        "degC, K, degR",
        "deg, 1, 1",
        "1/d, 1/s, 1/s",
        "mm^(1/3)/min, m^(1/3)/s, ft^(1/3)/s",
        "s/m^(1/3), s/m^(1/3), s/ft^(1/3)",
    })
    void coherentUnits(String text, String si, String us) {
        Dimension dimension = Unit.parse(text).dimension();
        assertThat(WorkingSystem.SI.coherentUnit(dimension).text()).isEqualTo(si);
        assertThat(WorkingSystem.US.coherentUnit(dimension).text()).isEqualTo(us);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "ft",
                "ft3/s",
                "cfs",
                "slug",
                "lbf",
                "psf",
                "lbf.s/ft2",
                "slug/ft3",
                "degR",
                "degF",
                "s",
                "1",
                "ft^(1/3)/s",
                "ft^(5/2)/s"
            })
    void unitsOfTheSystemItselfAreExactlyOneInUs(String text) {
        assertThat(Unit.parse(text).sizeIn(WorkingSystem.US)).isEqualTo(1.0);
    }

    @ParameterizedTest
    @ValueSource(strings = {"m", "m3/s", "Pa", "N", "Pa.s", "kg/m3", "K", "degC", "rad", "m^(1/3)/s"})
    void unitsOfTheSystemItselfAreExactlyOneInSi(String text) {
        assertThat(Unit.parse(text).sizeIn(WorkingSystem.SI)).isEqualTo(1.0);
    }

    @ParameterizedTest
    @CsvSource({
        "yd, 3",
        "mi, 5280",
        "psi, 144",
        "ac, 43560",
        "ac-ft, 43560",
        "in, 0.08333333333333333",
        "gal/s, 0.13368055555555555"
    })
    void multiplesAreExactInUs(String text, double size) {
        assertThat(Unit.parse(text).sizeIn(WorkingSystem.US)).isEqualTo(size);
    }

    /** One foot over standard gravity: 0.3048/9.80665. */
    @Test
    void aPoundIsThisPartOfASlug() {
        assertThat(Unit.parse("lb").sizeIn(WorkingSystem.US))
                .isEqualTo(UnitCatalogueTest.quotient("0.3048", "9.80665"));
    }

    @Test
    void rootsConvertBetweenTheSystems() {
        assertThat(Unit.parse("m^(1/3)/s").sizeIn(WorkingSystem.US)).isCloseTo(1 / Math.cbrt(0.3048), within(1e-15));
        assertThat(Unit.parse("ft^(1/2)/s").sizeIn(WorkingSystem.SI)).isCloseTo(Math.sqrt(0.3048), within(1e-15));
    }

    @ParameterizedTest
    @EnumSource(WorkingSystem.class)
    void everyNamedUnitHasACoherentUnitOfItsDimension(WorkingSystem system) {
        for (UnitCatalogue.Entry entry : UnitCatalogue.standard().entries()) {
            Unit coherent = system.coherentUnit(entry.unit().dimension());
            assertThat(coherent.dimension()).isEqualTo(entry.unit().dimension());
            assertThat(coherent.zeroInSi()).isZero();
            assertThat(coherent.sizeIn(system)).as(coherent.text()).isEqualTo(1.0);
        }
    }

    @Test
    void pressureIsForceOverArea() {
        double force = WorkingSystem.US.coherentUnit(Dimension.FORCE).sizeInSi();
        double length = WorkingSystem.US.coherentUnit(Dimension.LENGTH).sizeInSi();
        assertThat(WorkingSystem.US.coherentUnit(Dimension.PRESSURE).sizeInSi())
                .isCloseTo(force / length / length, within(1e-13));
    }
}
