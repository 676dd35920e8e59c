package nappe.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import nappe.formula.FormulaParser;
import nappe.method.Texts;
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
            0.1 %   | 0.1       | t.csv:4: tolerance "0.1" is neither like 0.1 % nor like 0.005 abs (fault: tolerance-unclear)
            0.1 %   | --1 abs   | t.csv:4: tolerance "--1 abs" is neither like 0.1 % nor like 0.005 abs (fault: tolerance-unclear)
            0.1 %   | -1 %      | t.csv:4: tolerance "-1 %" is neither like 0.1 % nor like 0.005 abs (fault: tolerance-unclear)
            derived | hearsay   | t.csv:4: kind "hearsay" is none of published, library, derived, memory (fault: kind-unknown)
            invented | ``       | t.csv:4: a check value names its source (fault: source-missing)
            1.25    | 1.2.5     | t.csv:4: "1.2.5" is not a number (fault: number-expected)
            1.25    | ``        | t.csv:4: "" is not a number (fault: number-expected)
            1.25    | NaN       | t.csv:4: "NaN" is not a number (fault: number-expected)
            ft3/s   | bucket    | t.csv:4: "bucket" is not a known unit (fault: unit-unknown)
            h = 0.5 ft | h 0.5 ft | t.csv:4: found "0.5" where "=" was expected (fault: syntax)
            h = 0.5 ft | h = 0.5furlong | t.csv:4: "0.5f": leave a blank between a number and its unit (fault: unit-unclear)
            """)
    void aFaultSaysFileAndLine(String written, String instead, String message) {
        String text = "# a remark\n" + HEAD + ROW + ROW.replace(written, instead);
        assertThatThrownBy(() -> CheckRow.read("t.csv", text))
                .isInstanceOf(CheckException.class)
                .hasMessage(message);
    }

    @Test
    void aRowThatIsTooShortOrAHeadThatLacksAColumnIsAFault() {
        assertThatThrownBy(() -> CheckRow.read("t.csv", HEAD + "T1,trough\n"))
                .hasMessage("t.csv:2: 2 columns where the head has 10 (fault: row-length)");
        assertThatThrownBy(() -> CheckRow.read("t.csv", "id,method\nT1,trough\n"))
                .hasMessage("t.csv:1: the head lacks entries, target, expected, unit, tolerance, source, kind, note"
                        + " (fault: head-unclear)");
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
