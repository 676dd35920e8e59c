package nappe.unit;

import static org.assertj.core.api.Assertions.assertThat;

import org.apache.commons.math3.fraction.Fraction;
import org.junit.jupiter.api.Test;

class DimensionTest {
    @Test
    void wordsForADimension() {
        assertThat(Dimension.NONE).hasToString("a pure number");
        assertThat(Dimension.FLOW).hasToString("length^3 time^-1");
        assertThat(Dimension.FORCE).hasToString("length mass time^-2");
        assertThat(Dimension.of(0, 0, 0, 1)).hasToString("temperature");
        assertThat(Dimension.of(1, 0, -2, 0).power(new Fraction(1, 2))).hasToString("length^1/2 time^-1");
    }

    /** sqrt(2 g) b h^1.5 of a weir is a flow. */
    @Test
    void rootsOfAnAccelerationMakeAFlow() {
        Dimension acceleration = Dimension.of(1, 0, -2, 0);
        Dimension flow = acceleration
                .power(new Fraction(1, 2))
                .times(Dimension.LENGTH)
                .times(Dimension.LENGTH.power(new Fraction(3, 2)));
        assertThat(flow).isEqualTo(Dimension.FLOW);
    }
}
