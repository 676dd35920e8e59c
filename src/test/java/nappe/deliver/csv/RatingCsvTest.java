package nappe.deliver.csv;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Block.Align;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.formula.Value;
import nappe.results.Furniture;
import nappe.results.Results;
import nappe.unit.Unit;
import org.junit.jupiter.api.Test;

class RatingCsvTest {
    private final Map<Cell, Value> values = new LinkedHashMap<>();

    @Test
    void isWrittenSo() {
        Block.Table table = new Block.Table(
                4,
                "Rating of M1",
                List.of(head("Head (ft)"), head("Flow (ft3/s)"), head("Remark")),
                List.of(
                        row(Value.of(0.1 + 0.2), Value.of(1.138), "say \"when\""),
                        row(Value.of(1e-7), new Value.None("no result"), "=1+1"),
                        row(Value.of(-2), Value.of(1200), " -x"),
                        row(Value.of(3), Value.word("free"), "two\nlines, one text")));
        Furniture furniture = new Furniture(
                "Weaver, pretend works;=1+1",
                "Made-up Engineers",
                "Nowhere District",
                "NW-007",
                "M1",
                "B",
                LocalDate.of(2026, 3, 14),
                "preliminary",
                "1f3a 99c0",
                "0.1.0",
                true,
                List.of("Check before use."),
                "");
        Results results = new Results(furniture, List.of(), List.copyOf(values.keySet()), values);
        assertThat(RatingCsv.write(results, table)).isEqualTo("""
                # Table: Rating of M1
                # Project: Weaver, pretend works;'=1+1
                # Calculation: NW-007
                # Revision: B, 2026-03-14
                # Status: preliminary
                # Input fingerprint: 1f3a 99c0
                # Caution: Check before use.
                "Head (ft)","Flow (ft3/s)","Remark"
                0.3,1.138,"say ""when\"""
                1E-7,"no result","'=1+1"
                -2,1200,"' -x"
                3,"free","two lines, one text"
                """.replace("\n", "\r\n"));
    }

    private Block.Row row(Value head, Value flow, String remark) {
        return new Block.Row(List.of(content(head), content(flow), new Block.Text(remark)));
    }

    private Block.Content content(Value value) {
        Cell cell = Cell.typed(Cell.Kind.TABLE, new Place("Rating", values.size(), 0), "", Unit.one(), value);
        values.put(cell, value);
        return new Block.Content(cell);
    }

    private static Block.Column head(String text) {
        return new Block.Column(text, 12, Align.RIGHT);
    }
}
