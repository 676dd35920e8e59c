package nappe.calculation;

import static nappe.calculation.Formulas.minus;
import static nappe.calculation.Formulas.number;
import static nappe.calculation.Formulas.over;
import static nappe.calculation.Formulas.plus;
import static nappe.calculation.Formulas.symbol;
import static nappe.calculation.Formulas.times;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import nappe.formula.Formula;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.method.Rating;
import nappe.unit.Dimension;
import nappe.unit.Unit;

/** A rating table: the closure of the results over a free symbol, laid out once per step of it. */
public final class RatingGrid {
    private final ItemLayout items;
    private final MethodSheet method;
    private final Map<Dimension, Unit> reports;

    /** @param reports the reporting unit of a dimension, where the engineer wants one beside the working unit */
    public RatingGrid(ItemLayout items, MethodSheet method, Map<Dimension, Unit> reports) {
        this.items = items;
        this.method = method;
        this.reports = reports;
    }

    /** Lays the table on the sheet; the scope must know all that serves all cases. */
    public TableDraft lay(Rating rating, Scope scope, SheetDraft sheet, String title) {
        Item.Free free = (Item.Free) java.util.Objects.requireNonNull(method.item(rating.free()));
        Cells cells = items.cells();
        TableDraft ends = sheet.table(
                "Ends of the table",
                List.of(
                        new Block.Column("End", 10, Block.Align.LEFT),
                        new Block.Column(head(free.symbol(), free.unit()), 14, Block.Align.RIGHT),
                        new Block.Column("Equation", 18, Block.Align.LEFT)));
        Scope inner = scope.inner();
        inner.put("h_from", end(cells, ends, "from", rating.from(), free, scope));
        inner.put("h_to", end(cells, ends, "to", rating.to(), free, scope));
        sheet.gap();
        List<Block.Column> columns = new ArrayList<>();
        TableDraft table = sheet.table(title, columns);
        for (int i = 0; i <= rating.steps(); i++) {
            Laid row = row(rating, free, inner, table, i);
            if (i == 0) {
                columns.addAll(columns(free, row));
            }
        }
        sheet.gap();
        return table;
    }

    private static Cell end(Cells cells, TableDraft ends, String name, Formula formula, Item.Free free, Scope scope) {
        Cell cell = cells.live(ends.place(1), free.symbol(), free.unit(), formula, scope);
        ends.add(List.of(new Block.Text(name), new Block.Content(cell), new Block.Equation(cell)));
        return cell;
    }

    /** What stands in a row behind the free symbol: its members, and the heads of results in reporting units. */
    private record Laid(Strip members, List<String> reported) {}

    private Laid row(Rating rating, Item.Free free, Scope ends, TableDraft table, int i) {
        Cells cells = items.cells();
        List<Block.Item> shown = new ArrayList<>(List.of(new Block.Text(Integer.toString(i))));
        Formula share = over(
                times(minus(symbol("h_to"), symbol("h_from")), number(Integer.toString(i))),
                number(Integer.toString(rating.steps())));
        Formula step = i == 0 ? symbol("h_from") : i == rating.steps() ? symbol("h_to") : plus(symbol("h_from"), share);
        Cell x = cells.live(table.place(1), free.symbol(), free.unit(), step, ends, free.sign(), false);
        shown.add(new Block.Content(x));
        Scope variant = ends.inner();
        variant.put(free.symbol(), x);
        int column = 2;
        Unit freeReport = reports.get(free.unit().dimension());
        if (freeReport != null) {
            shown.add(new Block.Content(cells.factors().toReport(table.place(column++), free.symbol(), x, freeReport)));
        }
        Strip strip = Strip.along(table.place(0).sheet(), table.nextRow(), column);
        for (Item member : rating.members()) {
            items.lay(member, variant, strip);
        }
        strip.laid().forEach(line -> shown.add(new Block.Content(line.cell())));
        column += strip.laid().size();
        List<String> reported = new ArrayList<>();
        for (String result : rating.results()) {
            Cell cell = variant.cell(result);
            Unit report = reports.get(cell.unit().dimension());
            if (report != null) {
                shown.add(new Block.Content(cells.factors().toReport(table.place(column++), result, cell, report)));
                reported.add(result + " [" + report + "]");
            }
        }
        table.add(shown);
        return new Laid(strip, reported);
    }

    private List<Block.Column> columns(Item.Free free, Laid row) {
        List<Block.Column> columns = new ArrayList<>();
        columns.add(new Block.Column("Step", 6, Block.Align.RIGHT));
        columns.add(column(head(free.symbol(), free.unit())));
        Unit freeReport = reports.get(free.unit().dimension());
        if (freeReport != null) {
            columns.add(column(free.symbol() + " [" + freeReport + "]"));
        }
        row.members().heads().forEach(head -> columns.add(column(head)));
        row.reported().forEach(head -> columns.add(column(head)));
        return columns;
    }

    private String head(String symbol, Unit unit) {
        Unit working = items.cells().unit(unit.dimension());
        return working.text().equals("1") ? symbol : symbol + " [" + working + "]";
    }

    private static Block.Column column(String head) {
        return new Block.Column(head, 14, Block.Align.RIGHT);
    }
}
