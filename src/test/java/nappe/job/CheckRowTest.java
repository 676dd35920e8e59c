package nappe.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import nappe.formula.FormulaParser;
import nappe.method.Texts;
import nappe.source.TextException;
import nappe.unit.Unit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CheckRowTest {
    private static final String HEAD = "id,method,entries,target,expected,unit,tolerance,source,kind,note\n";
    private static final String ROW =
            "T1,trough,\"size = \"\"2 ft\"\"; h = 0.5 ft\",Q,1.25,ft3/s,0.1 %,invented,derived,a note\n";

    @Test
    void aRowIsRead() {
        CheckRow row = CheckRow.read("t.csv", "# a remark\n" + HEAD + ROW).get(0);
        assertThat(row.id()).isEqualTo("T1");
        assertThat(row.method()).isEqualTo("trough");
        assertThat(row.entries())
                .containsExactly(
                        java.util.Map.entry("size", FormulaParser.parse("\"2 ft\"")),
                        java.util.Map.entry("h", FormulaParser.parse("0.5 ft")));
        assertThat(row.target()).isEqualTo("Q");
        assertThat(row.expected()).isEqualTo(1.25);
        assertThat(row.unit()).isEqualTo(Unit.parse("ft3/s"));
        assertThat(row.kind()).isEqualTo("derived");
        assertThat(row.note()).isEqualTo("a note");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            0.1 %   | 0.1       | t.csv:4:54: tolerance "0.1" is neither like 0.1 % nor like 0.005 abs (fault: tolerance-unclear)
            0.1 %   | --1 abs   | t.csv:4:54: tolerance "--1 abs" is neither like 0.1 % nor like 0.005 abs (fault: tolerance-unclear)
            0.1 %   | -1 %      | t.csv:4:54: tolerance "-1 %" is neither like 0.1 % nor like 0.005 abs (fault: tolerance-unclear)
            derived | hearsay   | t.csv:4:69: kind "hearsay" is none of published, library, derived, memory (fault: kind-unknown)
            invented | ``       | t.csv:4:60: a check value names its source (fault: source-missing)
            1.25    | 1.2.5     | t.csv:4:43: "1.2.5" is not a number; write it like 2.5 or -1e-3, its unit in the next column (fault: number-expected)
            1.25    | ``        | t.csv:4:43: "" is not a number; write it like 2.5 or -1e-3, its unit in the next column (fault: number-expected)
            1.25    | NaN       | t.csv:4:43: "NaN" is not a number; write it like 2.5 or -1e-3, its unit in the next column (fault: number-expected)
            ft3/s   | bucket    | t.csv:4:48: "bucket" is not a known unit (fault: unit-unknown)
            h = 0.5 ft | h 0.5 ft | t.csv:4:31: found "0.5" where "=" was expected (fault: syntax)
            h = 0.5 ft | h = 0.5furlong | t.csv:4:33: "0.5f": leave a blank between a number and its unit (fault: unit-unclear)
            h = 0.5 ft | h = 1 + 2 | t.csv:4:33: an entry is a number with its unit, or words in quotation marks (fault: entry-unclear)
            """)
    void aFaultSaysFileLineAndColumn(String written, String instead, String message) {
        String text = "# a remark\n" + HEAD + ROW + ROW.replace(written, instead);
        assertThatThrownBy(() -> CheckRow.read("t.csv", text))
                .isInstanceOf(TextException.class)
                .satisfies(
                        e -> assertThat(String.valueOf(e.getMessage()).lines().findFirst())
                                .hasValue(message));
    }

    @Test
    void aRowThatIsTooShortOrAHeadThatLacksAColumnIsAFault() {
        assertThatThrownBy(() -> CheckRow.read("t.csv", HEAD + "T1,trough\n"))
                .hasMessageStartingWith(
                        "t.csv:2:10: 2 columns where the head has 10; a field with a comma in it stands in quotation marks (fault: row-length)");
        assertThatThrownBy(() -> CheckRow.read("t.csv", "id,method\nT1,trough\n"))
                .hasMessageStartingWith(
                        "t.csv:1:1: the head lacks entries, target, expected, unit, tolerance, source, kind, note"
                                + " (fault: head-unclear)");
    }

    @Test
    void allFaultsAreToldAtOnce() {
        String broken =
                ROW.replace("0.1 %", "0.1").replace("derived", "hearsay").replace("ft3/s", "bucket");
        assertThatThrownBy(() -> CheckRow.read("t.csv", HEAD + broken + ROW + "T3\n" + ROW.replace("1.25", "many")))
                .isInstanceOfSatisfying(
                        TextException.class,
                        e -> assertThat(e.faults())
                                .extracting(fault -> fault.line() + " " + fault.code())
                                .containsExactly(
                                        "2 tolerance-unclear",
                                        "2 kind-unknown",
                                        "2 unit-unknown",
                                        "4 row-length",
                                        "5 number-expected"));
    }

    @Test
    void builtInRowsAreThoseOfEveryFileButTheOnesLeftOut() {
        Texts texts = new Texts()
                .with("checks/a.csv", HEAD + ROW)
                .with("checks/b.csv", HEAD + ROW.replace("T1", "T2"))
                .with("checks/left-out.csv", "id,why\nT3,for a reason\n");
        assertThat(CheckRow.builtIn(texts)).extracting(CheckRow::id).isEqualTo(List.of("T1", "T2"));
    }
}
