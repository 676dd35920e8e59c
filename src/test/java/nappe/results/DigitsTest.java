package nappe.results;

import static org.assertj.core.api.Assertions.assertThat;

import nappe.unit.Unit;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DigitsTest {
    /** 0.1 mm are 0.000328 ft. */
    @ParameterizedTest
    @CsvSource({
        "ft, 0.000328084, 0.00033",
        "ft, -0.00049, -0.00049",
        "ft, 0.0005, 0.001",
        "ft, 0.0123456, 0.012",
        "ft, 0, 0.000",
        "ft, 1e-7, 0.000",
        "ft, -3e-12, 0.000",
        "m, 0.0001, 0.0001",
        "m, 0.00001234, 0.000012",
        "in, 0.004, 0.0040",
        "mm, 0.04, 0.040",
        "mm, 12.34, 12.3"
    })
    void aLengthIsNotPrintedAsNoughtUnlessItIsOne(String unit, double value, String printed) {
        assertThat(Digits.print(Unit.parse(unit), value)).isEqualTo(printed);
    }
}
