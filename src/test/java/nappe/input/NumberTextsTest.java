package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NumberTextsTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "12,5           | write 12.5",
                ",5             | write 0.5",
                "0,500          | write 0.500",
                "1,500          | write 1500 or 1.500, whichever is meant",
                "1 500          | write 1500",
                "1\u00A0500     | write 1500",
                "1\u202F500,25  | write 1500.25",
                "1,234.56       | write 1234.56",
                "1.234,56       | write 1234.56",
                "12,345,678     | write 12345678",
                "\u22121.5      | write -1.5 with plain digits, sign and point",
                "1.5\u200B      | write 1.5 with plain digits, sign and point",
                "\uFF11\uFF12   | write 12 with plain digits, sign and point",
                "1 1/2          | write 1.5",
                "3' 6\"         | write 3.5 here and \"ft\" as its unit",
                "18\"           | write 18 here and \"in\" as its unit",
                "18 in          | write 18 here and \"in\" as its unit",
                "5 %            | write 5 here and \"%\" as its unit",
                "n/a            | write a plain number such as 12.5",
                "~5             | write a plain number such as 12.5",
                "3-4            | write a plain number such as 12.5",
                "1/0            | write a plain number such as 12.5",
                "NaN            | write a plain number such as 12.5",
                "1e3            | it is stored as text; set the format of the cell to a plain number and write 1e3 again"
            })
    void textIsNeverConvertedButARemedyIsNamed(String typed, String remedy) {
        assertThat(NumberTexts.remedy(typed)).isEqualTo(remedy);
    }
}
