package nappe.source;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.unit.Unit;
import org.junit.jupiter.api.Test;

class CitedTableTest {
    private static final String HEAD = "# title: Pretend sizes\n# source: invented for this test\n";

    private static final CitedTable TABLE = CitedTable.read("pretend", HEAD + """
            # a remark

            size, C [1], d [mm], s [ft3/s]
            small, 2.5, -3, 0
            "big, long", 1e-3, , 4.25
            """);

    @Test
    void aTableSaysItsTitleSourceAndRemarks() {
        assertThat(TABLE.name()).isEqualTo("pretend");
        assertThat(TABLE.title()).isEqualTo("Pretend sizes");
        assertThat(TABLE.source()).isEqualTo("invented for this test");
        assertThat(TABLE.remarks()).containsExactly("a remark");
        assertThat(TABLE.columnNames()).isEqualTo("size, C, d, s");
        assertThat(TABLE.rows()).isEqualTo(2);
    }

    @Test
    void aColumnWithoutAUnitHoldsWords() {
        assertThat(column("size").isWords()).isTrue();
        assertThat(column("size").values()).containsExactly(Value.word("small"), Value.word("big, long"));
    }

    @Test
    void aColumnWithAUnitHoldsNumbers() {
        assertThat(column("C").isWords()).isFalse();
        assertThat(column("s").unit()).isEqualTo(Unit.parse("ft3/s"));
        assertThat(column("C").values()).containsExactly(Value.of(2.5), Value.of(0.001));
    }

    @Test
    void aBlankNumberIsNotGiven() {
        assertThat(column("d").values()).containsExactly(Value.of(-3), new Value.None("not given"));
        assertThat(column("d").hasBlanks()).isTrue();
        assertThat(column("C").hasBlanks()).isFalse();
    }

    @Test
    void theSignOfAColumnIsThatOfItsLeastNumber() {
        assertThat(column("C").sign()).isEqualTo(Sign.POSITIVE);
        assertThat(column("s").sign()).isEqualTo(Sign.NOT_NEGATIVE);
        assertThat(column("d").sign()).isEqualTo(Sign.ANY);
    }

    @Test
    void aColumnThatIsNotThereIsNull() {
        assertThat(TABLE.column("c")).isNull();
    }

    @Test
    void aTableWithoutSourceIsRefused() {
        refused(
                "# title: Pretend sizes\nC [1]\n1\n",
                "pretend.csv:1:1: a cited table starts with \"# title:\" and \"# source:\" (fault: source-missing)");
        refused(
                "# title: Pretend sizes\n# source:\nC [1]\n1\n",
                "pretend.csv:1:1: a cited table starts with \"# title:\" and \"# source:\" (fault: source-missing)");
        refused(
                "",
                "pretend.csv:1:1: a cited table starts with \"# title:\" and \"# source:\" (fault: source-missing)");
    }

    @Test
    void aTableWithoutRowsIsRefused() {
        refused(HEAD + "C [1]\n", "pretend.csv:3:1: the table has no rows (fault: table-empty)");
    }

    @Test
    void aHeadThatIsNoSymbolWithItsUnitIsRefused() {
        refused(
                HEAD + "size,C (1)\na,1\n",
                "pretend.csv:3:6: column head \"C (1)\" is not a symbol with its unit in brackets, such as h [m] (fault: head-unclear)");
        refused(
                HEAD + "2nd,C [1]\na,1\n",
                "pretend.csv:3:1: column head \"2nd\" is not a symbol with its unit in brackets, such as h [m] (fault: head-unclear)");
    }

    @Test
    void twoColumnsOfOneNameAreRefused() {
        refused(HEAD + "C [1],C [mm]\n1,2\n", "pretend.csv:3:7: there are two columns C (fault: head-twice)");
    }

    @Test
    void anUnknownUnitIsRefusedAtTheHead() {
        refused(HEAD + "C [furlong]\n1\n", "pretend.csv:3:4: \"furlong\" is not a known unit (fault: unit-unknown)");
    }

    @Test
    void aRowOfAnotherLengthIsRefused() {
        refused(
                HEAD + "size,C [1]\na,1\nb\n",
                "pretend.csv:5:2: 1 column where the head has 2; a field with a comma in it stands in quotation marks (fault: row-length)");
        refused(
                HEAD + "size,C [1]\na,1,2\n",
                "pretend.csv:4:5: 3 columns where the head has 2; a field with a comma in it stands in quotation marks (fault: row-length)");
    }

    @Test
    void whatIsNoNumberIsRefusedAtItsLine() {
        refused(
                HEAD + "C [1]\n1\n2,5\n",
                "pretend.csv:5:3: 2 columns where the head has 1; a field with a comma in it stands in quotation marks (fault: row-length)");
        refused(
                HEAD + "C [1]\n1\n\"2,5\"\n",
                "pretend.csv:5:2: \"2,5\" is not a number; write it like 2.5 or -1e-3, without a unit (fault: number-expected)");
        refused(
                HEAD + "C [1]\n.5\n",
                "pretend.csv:4:1: \".5\" is not a number; write it like 2.5 or -1e-3, without a unit (fault: number-expected)");
        refused(
                HEAD + "C [1]\n1e999\n",
                "pretend.csv:4:1: \"1e999\" is not a number; write it like 2.5 or -1e-3, without a unit (fault: number-expected)");
    }

    @Test
    void blankLinesAndRemarksBetweenRowsCountAsLines() {
        refused(
                HEAD + "C [1]\n1\n\n# a remark\nx\n",
                "pretend.csv:7:1: \"x\" is not a number; write it like 2.5 or -1e-3, without a unit (fault: number-expected)");
    }

    @Test
    void allFaultsAreToldAtOnceByLineAndColumn() {
        String text = "# title: Pretend sizes\nsize,C [furlong],d (m),e [m]\na,1,2,\"2,5\"\nb,1\nc,x,,  1 m\n";
        TextException thrown = catchThrowableOfType(TextException.class, () -> CitedTable.read("pretend", text));
        assertThat(thrown.faults())
                .extracting(fault -> fault.line() + ":" + fault.column() + " " + fault.code())
                .containsExactly(
                        "1:1 source-missing",
                        "2:9 unit-unknown",
                        "2:18 head-unclear",
                        "3:8 number-expected",
                        "4:4 row-length",
                        "5:8 number-expected");
    }

    @Test
    void aFileThatIsNoCsvIsRefused() {
        assertThatThrownBy(() -> CitedTable.read("pretend", HEAD + "C [1]\n\"1\n"))
                .isInstanceOf(TextException.class)
                .hasMessageStartingWith(
                        "pretend.csv:4:1: the quotation marks opened here are not closed on this line (fault: quote-open)");
    }

    private static void refused(String text, String message) {
        assertThatThrownBy(() -> CitedTable.read("pretend", text))
                .isInstanceOf(TextException.class)
                .satisfies(
                        e -> assertThat(String.valueOf(e.getMessage()).lines().findFirst())
                                .hasValue(message));
    }

    private static CitedTable.Column column(String symbol) {
        return TABLE.column(symbol);
    }
}
