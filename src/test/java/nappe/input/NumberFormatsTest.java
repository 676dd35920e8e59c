package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;

import nappe.input.RawCell.Format;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NumberFormatsTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "General            | PLAIN",
                "Standard           | PLAIN",
                "0.000              | PLAIN",
                "#,##0.00           | PLAIN",
                "#,##0;[Red]-#,##0  | PLAIN",
                "0.00E+00           | PLAIN",
                "@                  | PLAIN",
                "# ?/?              | PLAIN",
                "_-* #,##0.00_-     | PLAIN",
                "yyyy-mm-dd         | DATE",
                "[h]:mm             | DATE",
                "d. mmmm yyyy       | DATE",
                "0%                 | PERCENT",
                "0.0\" %\"          | WORDS",
                "0.00 \"mm\"        | WORDS",
                "0.00\\m            | WORDS",
                "0.0,               | WORDS",
                "[$EUR] #,##0       | WORDS"
            })
    void formatThatChangesWhatIsSeenIsKnown(String code, Format format) {
        assertThat(NumberFormats.ofCode(code)).isEqualTo(format);
    }
}
