package nappe.figure;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Sheet;
import nappe.results.Bars;

/** The margins of the limits from the rows of the summary, in its order. */
public final class MarginBars {
    private MarginBars() {}

    /** @param summary the sheet whose first table is the summary of limits */
    public static Bars of(Sheet summary, String title) {
        List<Bars.Bar> bars = new ArrayList<>();
        for (Block block : summary.blocks()) {
            if (block instanceof Block.Table table && bars.isEmpty()) {
                table.rows().forEach(row -> bars.add(bar(table, row)));
            }
        }
        return new Bars(title, bars);
    }

    private static Bars.Bar bar(Block.Table table, Block.Row row) {
        String number = row.items().get(0) instanceof Block.Text text ? text.text() : "";
        return new Bars.Bar(
                number,
                cell(table, row, "Element"),
                cell(table, row, "Limit"),
                cell(table, row, "Verdict"),
                cell(table, row, "Margin"),
                cell(table, row, "Worst case"));
    }

    private static Cell cell(Block.Table table, Block.Row row, String head) {
        for (int i = 0; i < table.columns().size(); i++) {
            if (table.columns().get(i).head().equals(head) && row.items().get(i) instanceof Block.Content content) {
                return content.cell();
            }
        }
        throw new IllegalStateException("the summary of limits has no cell under " + head);
    }
}
