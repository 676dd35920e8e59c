package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

/** Which word of a list a slip is taken for. */
class NearTest {
    private static final List<String> SIZES = List.of("1 in", "9 in", "9 ft", "12 ft");

    @Test
    void sizeWithItsUnitWrittenOutIsThatSize() {
        assertThat(Near.to("9 inch", SIZES)).isEqualTo("9 in");
        assertThat(Near.to("9\"", SIZES)).isEqualTo("9 in");
        assertThat(Near.to("12 feet", SIZES)).isEqualTo("12 ft");
        assertThat(Near.to("9'", SIZES)).isEqualTo("9 ft");
    }

    @Test
    void wordTooFarOffIsNone() {
        assertThat(Near.to("wide", SIZES)).isNull();
    }
}
