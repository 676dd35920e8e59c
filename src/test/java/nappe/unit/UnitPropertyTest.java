package nappe.unit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import org.apache.commons.math3.fraction.Fraction;

/** What must hold for every unit and every dimension. */
class UnitPropertyTest {
    /** One factor of a compound unit. */
    record Factor(String name, int exponent) {}

    @Property
    void thereAndBackGivesTheSameNumber(
            @ForAll("named") Unit unit,
            @ForAll WorkingSystem system,
            @ForAll @DoubleRange(min = -1e6, max = 1e6) double value) {
        double coherent = value * unit.sizeIn(system) + unit.zeroIn(system);
        double back = (coherent - unit.zeroIn(system)) / unit.sizeIn(system);
        double largest = Math.max(Math.abs(value), Math.abs(unit.zeroIn(system) / unit.sizeIn(system)));
        assertThat(back).isCloseTo(value, within(4 * Math.ulp(largest)));
    }

    @Property
    void bothSystemsDifferByTheCoherentUnitOnly(@ForAll("named") Unit unit) {
        double foot = WorkingSystem.US.coherentUnit(unit.dimension()).sizeInSi();
        assertThat(unit.sizeIn(WorkingSystem.US) * foot)
                .isCloseTo(unit.sizeIn(WorkingSystem.SI), within(1e-15 * Math.abs(unit.sizeInSi())));
        assertThat(unit.sizeIn(WorkingSystem.SI)).isEqualTo(unit.sizeInSi());
    }

    @Property
    void aCoherentUnitHasTheDimensionThatWasAskedFor(
            @ForAll("dimensions") Dimension dimension, @ForAll WorkingSystem system) {
        Unit unit = system.coherentUnit(dimension);
        assertThat(unit.dimension()).isEqualTo(dimension);
        assertThat(unit.sizeIn(system)).isCloseTo(1.0, within(1e-14));
        assertThat(Unit.parse(unit.text())).isEqualTo(unit);
    }

    @Property
    void aCompoundIsTheProductOfItsFactors(@ForAll("compounds") List<Factor> factors) {
        StringBuilder text = new StringBuilder();
        Dimension dimension = Dimension.NONE;
        double size = 1;
        for (Factor factor : factors) {
            Unit unit = Unit.parse(factor.name());
            text.append(text.isEmpty() ? "" : ".").append(factor.name()).append(factor.exponent());
            dimension = dimension.times(unit.dimension().power(new Fraction(factor.exponent())));
            size *= Math.pow(unit.sizeInSi(), factor.exponent());
        }
        Unit compound = Unit.parse(text.toString());
        assertThat(compound.dimension()).isEqualTo(dimension);
        assertThat(compound.sizeInSi() / size).isCloseTo(1, within(1e-14));
    }

    @Property
    void aSlashIsANegativeExponent(@ForAll("scaled") Factor above, @ForAll("scaled") Factor below) {
        Unit slash = Unit.parse(above.name() + above.exponent() + "/" + below.name() + below.exponent());
        Unit point = Unit.parse(above.name() + above.exponent() + "." + below.name() + (-below.exponent()));
        assertThat(slash.dimension()).isEqualTo(point.dimension());
        assertThat(slash.exact()).isEqualTo(point.exact());
        assertThat(slash.sizeInSi() / point.sizeInSi()).isCloseTo(1, within(1e-14));
    }

    /** Input comes from people: whatever is typed is a unit or a fault, never anything else. */
    @Property
    void anyTextIsAUnitOrAFault(@ForAll("texts") String text) {
        try {
            assertThat(Unit.parse(text).sizeInSi()).isPositive();
        } catch (UnitException fault) {
            assertThat(fault).hasMessageContaining(text.isEmpty() ? "no unit" : text);
        }
    }

    @Property
    void dimensionsCancel(@ForAll("dimensions") Dimension a, @ForAll("dimensions") Dimension b) {
        assertThat(a.times(b).over(b)).isEqualTo(a);
        assertThat(a.over(a).isNone()).isTrue();
        assertThat(a.power(new Fraction(1, 2)).power(new Fraction(2))).isEqualTo(a);
        assertThat(a.times(b)).isEqualTo(b.times(a));
    }

    @Provide
    Arbitrary<Unit> named() {
        return Arbitraries.of(UnitCatalogue.standard().entries().stream()
                .map(UnitCatalogue.Entry::unit)
                .toList());
    }

    @Provide
    Arbitrary<Factor> scaled() {
        Arbitrary<String> names = named().filter(unit -> unit.zeroInSi() == 0).map(Unit::text);
        return Combinators.combine(names, Arbitraries.of(1, 2, 3)).as(Factor::new);
    }

    @Provide
    Arbitrary<List<Factor>> compounds() {
        Arbitrary<String> names = named().filter(unit -> unit.zeroInSi() == 0).map(Unit::text);
        return Combinators.combine(names, Arbitraries.of(-3, -2, -1, 1, 2, 3))
                .as(Factor::new)
                .list()
                .ofMinSize(1)
                .ofMaxSize(4);
    }

    @Provide
    Arbitrary<Dimension> dimensions() {
        Arbitrary<Fraction> exponents = Combinators.combine(
                        Arbitraries.integers().between(-6, 6), Arbitraries.of(1, 1, 1, 2, 3))
                .as(Fraction::new);
        return Combinators.combine(exponents, exponents, exponents, exponents).as(Dimension::new);
    }

    @Provide
    Arbitrary<String> texts() {
        return Arbitraries.strings().withChars("mft3s./^()-10kginKdegC% ").ofMaxLength(12);
    }
}
