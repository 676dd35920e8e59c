package nappe.station;

import static nappe.calculation.Formulas.call;
import static nappe.calculation.Formulas.compare;
import static nappe.calculation.Formulas.iff;
import static nappe.calculation.Formulas.number;
import static nappe.calculation.Formulas.over;
import static nappe.calculation.Formulas.plus;
import static nappe.calculation.Formulas.symbol;
import static nappe.calculation.Formulas.word;
import static nappe.station.Sources.unitText;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.ElementSheet.LimitResult;
import nappe.calculation.Run;
import nappe.calculation.Scope;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.method.Limit;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * Lays what a reader asks of each judged case: is the flow measured, how high does the water stand, and which limit
 * governs. The governing limit is the first by verdict, then by margin, as in the summary.
 */
final class OverviewSheet {
    private static final List<String> RANKED = List.of("not met", Value.NO_RESULT, Value.NOT_GIVEN, "met");

    private final Design design;
    private final StationLayout station;
    private final SheetDraft sheet;
    private final Cells cells;
    private final List<String> names;

    OverviewSheet(Design design, StationLayout station, SheetDraft sheet) {
        this.design = design;
        this.station = station;
        this.sheet = sheet;
        this.cells = station.cells();
        this.names = station.columns().judgedNames();
    }

    /** The limits of one case, each in a row of a work table: what the sheet looks up. */
    private record Column(Run verdicts, Run margins, Run orders) {}

    /** Lays the work tables at the back, and the sheet. */
    void lay(SheetDraft work) {
        List<Cell> labels = new ArrayList<>();
        List<Column> columns = workTable(work, new Run(labels(work, labels)));
        sheet.note(
                "One row for each case, and for each combination that can occur. The governing limit is the first in the"
                        + " order of the summary: not met before no result before met, then the least margin; one that is about the"
                        + " layout (a length, a step) stands after the others of its verdict.");
        governing(new Run(labels), columns);
        design.elements().forEach(this::element);
    }

    private List<Cell> labels(SheetDraft work, List<Cell> labels) {
        List<LimitResult> limits = station.judgedLimits();
        TableDraft table = work.workbookTable(
                "Limits, as the overview of the cases names them",
                List.of(new Block.Column("Limit", 40, Block.Align.LEFT)),
                limits.size());
        for (LimitResult limit : limits) {
            Cell label = cells.typed(
                    Cell.Kind.TABLE,
                    table.place(0),
                    "",
                    Unit.one(),
                    Value.word(limit.tag() + "  " + limit.label()),
                    Sign.POSITIVE);
            labels.add(label);
            table.add(List.of(new Block.Content(label)));
        }
        work.gap();
        return labels;
    }

    private List<Column> workTable(SheetDraft work, Run labels) {
        List<Column> columns = new ArrayList<>();
        for (int c = 0; c < names.size(); c++) {
            TableDraft table = work.workbookTable(
                    "Limits in case " + names.get(c)
                            + ": the order is three times the rank of the verdict, plus m/(1 + |m|) of"
                            + " the margin m, or 1; and 1 more where it is about the layout; a billionth for each limit before",
                    List.of(
                            new Block.Column("Limit", 40, Block.Align.LEFT),
                            new Block.Column("Verdict", 16, Block.Align.LEFT),
                            new Block.Column("Margin", 16, Block.Align.RIGHT),
                            new Block.Column("Order", 16, Block.Align.RIGHT)),
                    labels.cells().size());
            List<Cell> verdicts = new ArrayList<>();
            List<Cell> margins = new ArrayList<>();
            List<Cell> orders = new ArrayList<>();
            for (LimitResult limit : station.judgedLimits()) {
                int at = limit.forAll() ? 0 : c;
                verdicts.add(same(table, 1, limit.verdicts().get(at)));
                margins.add(margin(table, limit.margins().get(at)));
                orders.add(order(
                        table,
                        verdicts.get(verdicts.size() - 1),
                        margins.get(margins.size() - 1),
                        limit.forAll() || limit.kind() == Limit.Kind.LAYOUT,
                        orders.size()));
                table.add(List.of(
                        new Block.Text(limit.tag() + "  " + limit.label()),
                        new Block.Content(verdicts.get(verdicts.size() - 1)),
                        new Block.Content(margins.get(margins.size() - 1)),
                        new Block.Content(orders.get(orders.size() - 1))));
            }
            columns.add(new Column(new Run(verdicts), new Run(margins), new Run(orders)));
            work.gap();
        }
        return columns;
    }

    private Cell same(TableDraft table, int column, Cell other) {
        return cells.same(table.place(column), "", other);
    }

    private Cell margin(TableDraft table, @Nullable Cell margin) {
        return margin == null
                ? cells.typed(Cell.Kind.TABLE, table.place(2), "", Unit.one(), Value.word("-"), Sign.POSITIVE)
                : same(table, 2, margin);
    }

    private Cell order(TableDraft table, Cell verdict, Cell margin, boolean ofTheLayout, int before) {
        Scope scope = Scope.ofElement();
        scope.put("verdict", verdict);
        scope.put("margin", margin);
        Formula rank = number(Integer.toString(3 * RANKED.size()));
        for (int i = RANKED.size() - 1; i >= 0; i--) {
            rank = iff(
                    compare(symbol("verdict"), Comparator.EQUAL, word(RANKED.get(i))),
                    number(Integer.toString(3 * i)),
                    rank);
        }
        Formula held = over(symbol("margin"), plus(number("1"), call(Function.ABS, symbol("margin"))));
        boolean never = margin.typed() != null;
        Formula share = never ? number("1") : iff(call(Function.IS_NUMBER, symbol("margin")), held, number("1"));
        Formula order = ofTheLayout ? plus(plus(rank, share), number("1")) : plus(rank, share);
        Formula apart = before == 0 ? order : plus(order, number(before + "e-9"));
        return cells.raw(table.place(3), "", Unit.one(), apart, scope, null, false);
    }

    private void governing(Run labels, List<Column> columns) {
        CasesSheet cases = station.cases();
        Unit report = design.project().flowUnit();
        boolean again = !report.equals(cases.flow(0).unit());
        List<Block.Column> heads = new ArrayList<>(List.of(
                new Block.Column("Case", 26, Block.Align.LEFT),
                new Block.Column("Flow [" + (again ? report : cases.flow(0).unit()) + "]", 14, Block.Align.RIGHT),
                new Block.Column("Units in service", 14, Block.Align.RIGHT),
                new Block.Column("Level downstream [" + cases.level(0).unit() + "]", 14, Block.Align.RIGHT),
                new Block.Column("Limits not met", 14, Block.Align.RIGHT),
                new Block.Column("Without result", 14, Block.Align.RIGHT),
                new Block.Column("Governing limit", 40, Block.Align.LEFT),
                new Block.Column("Verdict", 14, Block.Align.LEFT),
                new Block.Column("Margin", 14, Block.Align.RIGHT)));
        TableDraft table = sheet.table("What governs each case", heads);
        for (int c = 0; c < names.size(); c++) {
            Column column = columns.get(c);
            Scope scope = Scope.ofElement();
            scope.put("labels", labels);
            scope.put("verdicts", column.verdicts());
            scope.put("margins", column.margins());
            scope.put("orders", column.orders());
            Formula first = call(Function.MATCH, call(Function.LOWEST_OF, symbol("orders")), symbol("orders"));
            table.add(List.of(
                    new Block.Jump(
                            names.get(c),
                            station.judgedLimits()
                                    .get(0)
                                    .verdicts()
                                    .get(station.judgedLimits().get(0).forAll() ? 0 : c)),
                    new Block.Content(
                            again
                                    ? cells.factors().toReport(table.place(1), "Q", cases.flow(c), report)
                                    : same(table, 1, cases.flow(c))),
                    new Block.Content(same(table, 2, cases.unitsInService(c))),
                    new Block.Content(same(table, 3, cases.level(c))),
                    live(table, 4, call(Function.TALLY, symbol("verdicts"), word("not met")), scope),
                    live(table, 5, call(Function.TALLY, symbol("verdicts"), word(Value.NO_RESULT)), scope),
                    live(table, 6, call(Function.INDEX, symbol("labels"), first), scope),
                    live(table, 7, call(Function.INDEX, symbol("verdicts"), first), scope),
                    live(table, 8, call(Function.INDEX, symbol("margins"), first), scope)));
        }
        sheet.gap();
    }

    /** In how many of the cases the element measures. */
    private void measured(String tag, Run words) {
        TableDraft table = sheet.table(
                "",
                List.of(
                        new Block.Column("Element", 26, Block.Align.LEFT),
                        new Block.Column("Cases", 14, Block.Align.RIGHT),
                        new Block.Column("measured", 14, Block.Align.RIGHT),
                        new Block.Column("not measured", 14, Block.Align.RIGHT)));
        Scope scope = Scope.ofElement();
        scope.put("words", words);
        table.add(List.of(
                new Block.Text(tag),
                new Block.Text(Integer.toString(names.size())),
                live(table, 2, call(Function.TALLY, symbol("words"), word("measured")), scope),
                live(table, 3, call(Function.TALLY, symbol("words"), word("not measured")), scope)));
        sheet.gap();
    }

    private Block.Content live(TableDraft table, int column, Formula formula, Scope scope) {
        return new Block.Content(cells.raw(table.place(column), "", Unit.one(), formula, scope, null, column == 8));
    }

    private void element(Design.Element element) {
        List<CaseResults.Row> rows = CaseResults.inFull(station, element.tag());
        if (rows.isEmpty()) {
            return;
        }
        rows.stream()
                .filter(row -> row.role().equals("measurement"))
                .forEach(row -> measured(element.tag(), new Run(row.cells().subList(0, names.size()))));
        List<Block.Column> columns = new ArrayList<>(List.of(new Block.Column("Case", 26, Block.Align.LEFT)));
        for (CaseResults.Row row : rows) {
            String unit = unitText(row.unit());
            columns.add(new Block.Column(
                    row.label() + (unit.isEmpty() || row.isWords() ? "" : " [" + unit + "]"),
                    14,
                    row.isWords() ? Block.Align.LEFT : Block.Align.RIGHT));
        }
        TableDraft table =
                sheet.table(element.tag() + "  " + EntriesSheet.title(element, station.method(element.tag())), columns);
        for (int c = 0; c < names.size(); c++) {
            List<Block.Item> items = new ArrayList<>(List.of(new Block.Text(names.get(c))));
            for (int i = 0; i < rows.size(); i++) {
                items.add(
                        new Block.Content(same(table, 1 + i, rows.get(i).cells().get(c))));
            }
            table.add(items);
        }
        sheet.gap();
    }
}
