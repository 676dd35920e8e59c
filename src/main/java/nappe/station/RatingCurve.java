package nappe.station;

import static nappe.calculation.Formulas.call;
import static nappe.calculation.Formulas.iff;
import static nappe.calculation.Formulas.symbol;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.Run;
import nappe.calculation.Scope;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.method.Rating;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * Lays the chart of a rating under its table: head against flow, and each flow case as a mark where its head is known.
 * Spreadsheet programs draw a word as nought, or count it as a category: so a case without a head is drawn at the
 * origin, from cells of its own.
 */
final class RatingCurve {
    /** What an element gives where its head in a case is the head of its rating. */
    static final String GAUGE_HEAD = "head at the gauge";

    private static final int ROWS = 22;

    private final Cells cells;
    private final MethodSheet method;
    private final SheetDraft sheet;

    RatingCurve(Cells cells, MethodSheet method, SheetDraft sheet) {
        this.cells = cells;
        this.method = method;
        this.sheet = sheet;
    }

    /**
     * Lays the chart, where the table gives a flow.
     *
     * @param cases the scopes of the cases, which know flow and head
     */
    void lay(Block.Table table, Rating rating, String title, List<String> caseNames, List<Scope> cases) {
        Item.Given flow = flow();
        String result = flow == null ? null : flowOf(rating, flow.unit());
        if (flow == null || result == null) {
            return;
        }
        Run heads = column(table, rating.free());
        Run flows = column(table, result);
        List<Block.Series> series = new ArrayList<>();
        series.add(new Block.Series("rating", true, flows, heads));
        String head = method.gives().get(GAUGE_HEAD);
        sheet.heading(title);
        if (head != null) {
            series.add(points(flow.symbol(), head, caseNames, cases));
        }
        sheet.chart(
                ROWS,
                title,
                "flow [" + flows.cells().get(0).unit() + "]",
                "head [" + heads.cells().get(0).unit() + "]",
                series);
        sheet.gap();
    }

    private Item.@Nullable Given flow() {
        return method.items().stream()
                .filter(item -> item instanceof Item.Given given && given.isFlow())
                .map(Item.Given.class::cast)
                .findFirst()
                .orElse(null);
    }

    private @Nullable String flowOf(Rating rating, Unit flow) {
        return rating.results().stream()
                .filter(symbol -> method.item(symbol) instanceof Item.Line line
                        && line.unit() != null
                        && line.unit().dimension().equals(flow.dimension()))
                .findFirst()
                .orElse(null);
    }

    /** The cells of a symbol in its working unit, which stand before those in other units. */
    private static Run column(Block.Table table, String symbol) {
        List<Cell> column = new ArrayList<>();
        for (Block.Row row : table.rows()) {
            column.add(row.items().stream()
                    .filter(item -> item instanceof Block.Content content
                            && content.cell().symbol().equals(symbol))
                    .map(item -> ((Block.Content) item).cell())
                    .findFirst()
                    .orElseThrow());
        }
        return new Run(column);
    }

    private Block.Series points(String flow, String head, List<String> caseNames, List<Scope> cases) {
        Unit across = cases.get(0).cell(flow).unit();
        Unit up = cases.get(0).cell(head).unit();
        TableDraft table = sheet.workbookTable(
                "Flow cases as marked; one without a head is marked at the origin",
                List.of(
                        new Block.Column("No.", 6, Block.Align.RIGHT),
                        new Block.Column(flow + " [" + across + "]", 14, Block.Align.RIGHT),
                        new Block.Column(head + " [" + up + "]", 14, Block.Align.RIGHT),
                        new Block.Column("marked at " + flow, 14, Block.Align.RIGHT),
                        new Block.Column("marked at " + head, 14, Block.Align.RIGHT),
                        new Block.Column("Case", 26, Block.Align.LEFT)),
                cases.size());
        List<Cell> flows = new ArrayList<>();
        List<Cell> heads = new ArrayList<>();
        for (int c = 0; c < cases.size(); c++) {
            Scope scope = cases.get(c);
            flows.add(marked(table, 3, flow, scope, across, head));
            heads.add(marked(table, 4, head, scope, up, head));
            table.add(List.of(
                    new Block.Text(Integer.toString(c + 1)),
                    new Block.Content(scope.cell(flow)),
                    new Block.Content(scope.cell(head)),
                    new Block.Content(flows.get(c)),
                    new Block.Content(heads.get(c)),
                    new Block.Text(caseNames.get(c))));
        }
        return new Block.Series("flow cases", false, new Run(flows), new Run(heads));
    }

    private Cell marked(TableDraft table, int column, String what, Scope scope, Unit unit, String head) {
        Formula known = call(Function.IS_NUMBER, symbol(head));
        Formula formula = iff(known, symbol(what), new Formula.Quantity(0, "0", unit));
        return cells.raw(table.place(column), "", unit, formula, scope, null, false);
    }
}
