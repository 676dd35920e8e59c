package nappe.figure;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.ElementSheet.LimitResult;
import nappe.calculation.Sheet;
import nappe.formula.Formula;
import nappe.formula.Operator;
import nappe.formula.Value;
import nappe.results.Bars;
import nappe.unit.Unit;

/** The margins of the limits from the rows of the summary, in its order. */
public final class MarginBars {
    private static final String MARGIN = "Tightest margin";

    private MarginBars() {}

    /**
     * @param summary the sheet with the summary of limits
     * @param limits all limits, whose margins tell their unit
     */
    public static Bars of(Sheet summary, List<LimitResult> limits, Map<Cell, Value> values, String title) {
        List<Bars.Bar> bars = new ArrayList<>();
        for (Block block : summary.blocks()) {
            if (block instanceof Block.Table table
                    && table.columns().stream().anyMatch(c -> c.head().equals(MARGIN))) {
                table.rows().forEach(row -> bars.add(bar(table, row, limits, values)));
            }
        }
        return new Bars(title, bars);
    }

    private static Bars.Bar bar(Block.Table table, Block.Row row, List<LimitResult> limits, Map<Cell, Value> values) {
        String number = row.items().get(0) instanceof Block.Text text ? text.text() : "";
        Cell tag = cell(table, row, "Element");
        Cell label = cell(table, row, "Limit");
        Unit unit = limits.stream()
                .filter(limit -> Value.word(limit.tag()).equals(values.get(tag))
                        && Value.word(limit.label()).equals(values.get(label)))
                .flatMap(limit -> limit.margins().stream())
                .filter(java.util.Objects::nonNull)
                .map(margin -> unit(java.util.Objects.requireNonNull(margin)))
                .findFirst()
                .orElse(Unit.one());
        return new Bars.Bar(
                number,
                tag,
                label,
                cell(table, row, "Worst verdict"),
                cell(table, row, MARGIN),
                unit,
                cell(table, row, "in case"));
    }

    /** The unit by one of which a margin is measured; that of a pure number where its scale is something else. */
    private static Unit unit(Cell margin) {
        return margin.formula() instanceof Formula.Operation over
                        && over.operator() == Operator.OVER
                        && over.right() instanceof Formula.Quantity one
                        && one.value() == 1
                ? one.unit()
                : Unit.one();
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
