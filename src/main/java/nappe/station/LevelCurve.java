package nappe.station;

import static nappe.calculation.Formulas.call;
import static nappe.calculation.Formulas.compare;
import static nappe.calculation.Formulas.iff;
import static nappe.calculation.Formulas.minus;
import static nappe.calculation.Formulas.number;
import static nappe.calculation.Formulas.over;
import static nappe.calculation.Formulas.plus;
import static nappe.calculation.Formulas.symbol;
import static nappe.calculation.Formulas.times;
import static nappe.calculation.Formulas.word;
import static nappe.station.Sources.unitText;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.Place;
import nappe.calculation.Run;
import nappe.calculation.Scope;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.unit.Dimension;
import nappe.unit.Unit;

/**
 * Lays the tailwater curve, and for each case the level that it gives at the flow of the case: straight between two rows,
 * no result beyond the ends. A level typed for the case rules.
 */
final class LevelCurve {
    private static final String RISES = "rises";

    private final Cells cells;
    private final SheetDraft sheet;
    private final List<Design.LevelPair> pairs;
    private final List<Cell> flows = new ArrayList<>();
    private final List<Cell> levels = new ArrayList<>();
    private final List<Cell> orders = new ArrayList<>();

    /** @param pairs two and more, flows rising */
    LevelCurve(Cells cells, SheetDraft sheet, List<Design.LevelPair> pairs) {
        this.cells = cells;
        this.sheet = sheet;
        this.pairs = pairs;
    }

    /**
     * Lays the curve and the levels of the cases.
     *
     * @param flowsOf the flows of the cases in the working unit
     * @param typed the levels as typed in the working unit, or words
     * @return the level that rules in each case
     */
    List<Cell> lay(List<Cell> names, List<Cell> flowsOf, List<Cell> typed) {
        Unit flow = cells.unit(Dimension.FLOW);
        Unit level = cells.unit(Dimension.LENGTH);
        curve(flow, level);
        sheet.note(
                "A level typed for a case rules. Where none is typed the tailwater curve gives it at the flow of the case through"
                        + " all of the station: straight between the row at or below that flow and the next; beyond the first and the last"
                        + " flow of the curve there is no result.");
        TableDraft table = sheet.table("Water level of each case: typed, or from the tailwater curve", columns());
        List<Cell> used = new ArrayList<>();
        for (int c = 0; c < names.size(); c++) {
            used.add(level(table, names.get(c), flowsOf.get(c), typed.get(c)));
        }
        sheet.gap();
        return used;
    }

    /** The columns of a table of levels by the curve. */
    List<Block.Column> columns() {
        Unit flow = cells.unit(Dimension.FLOW);
        Unit level = cells.unit(Dimension.LENGTH);
        return List.of(
                new Block.Column("Case", 26, Block.Align.LEFT),
                new Block.Column("Level used is", 16, Block.Align.LEFT),
                new Block.Column("Row below, i", 10, Block.Align.RIGHT),
                new Block.Column("Q [" + flow + "]", 12, Block.Align.RIGHT),
                new Block.Column("Share of the way, t", 10, Block.Align.RIGHT),
                new Block.Column("From the curve [" + level + "]", 12, Block.Align.RIGHT),
                new Block.Column("Typed [" + level + "]", 12, Block.Align.RIGHT),
                new Block.Column("Level used [" + level + "]", 12, Block.Align.RIGHT));
    }

    /** Adds the level of the curve at a flow found, for which none is typed. */
    Cell at(TableDraft table, Cell name, Cell flow) {
        Cell none = cells.typed(
                Cell.Kind.RERUN,
                table.place(6),
                "z",
                cells.unit(Dimension.LENGTH),
                new Value.None(Value.NOT_GIVEN),
                Sign.ANY);
        return level(table, name, flow, none);
    }

    private void curve(Unit flow, Unit level) {
        TableDraft table = sheet.table(
                "Tailwater curve: water level downstream against the flow of the whole station",
                List.of(
                        new Block.Column("Row", 26, Block.Align.LEFT),
                        new Block.Column("Flow as typed", 16, Block.Align.RIGHT),
                        new Block.Column("Unit", 10, Block.Align.LEFT),
                        new Block.Column("Q_r [" + flow + "]", 12, Block.Align.RIGHT),
                        new Block.Column("Level as typed", 10, Block.Align.RIGHT),
                        new Block.Column("Unit", 12, Block.Align.LEFT),
                        new Block.Column("z_r [" + level + "]", 12, Block.Align.RIGHT),
                        new Block.Column("Flow and level", 12, Block.Align.LEFT),
                        new Block.Column("Standing", 10, Block.Align.LEFT),
                        new Block.Column("Source or basis", 34, Block.Align.LEFT)));
        for (Design.LevelPair pair : pairs) {
            pair(table, pair);
        }
        sheet.gap();
    }

    private void pair(TableDraft table, Design.LevelPair pair) {
        Design.Typed q = pair.flow();
        Design.Typed z = pair.level();
        Cell flow = cells.typed(Cell.Kind.ENTRY, table.place(1), "Q_r", q.unit(), q.value(), Sign.NOT_NEGATIVE);
        Cell workingFlow = cells.factors().toWorking(table.place(3), "Q_r", flow);
        Cell level = cells.typed(Cell.Kind.ENTRY, table.place(4), "z_r", z.unit(), z.value(), Sign.ANY);
        Cell workingLevel = cells.factors().toWorking(table.place(6), "z_r", level);
        Cell order = order(table, workingFlow, workingLevel);
        table.add(List.of(
                new Block.Text(Integer.toString(orders.size() + 1)),
                new Block.Content(flow),
                new Block.Text(unitText(q.unit())),
                new Block.Content(workingFlow),
                new Block.Content(level),
                new Block.Text(unitText(z.unit())),
                new Block.Content(workingLevel),
                new Block.Content(order),
                new Block.Text(q.standing()),
                new Block.Text(q.source())));
        flows.add(workingFlow);
        levels.add(workingLevel);
        orders.add(order);
    }

    /** The reader refuses a curve that does not rise; a flow changed in the issued workbook is caught here. */
    private Cell order(TableDraft table, Cell flow, Cell level) {
        if (flows.isEmpty()) {
            return cells.typed(Cell.Kind.TABLE, table.place(7), "", Unit.one(), Value.word("first"), Sign.POSITIVE);
        }
        Scope scope = Scope.ofElement();
        scope.put("Q_r", flow);
        scope.put("z_r", level);
        scope.put("Q_above", flows.get(flows.size() - 1));
        scope.put("z_above", levels.get(levels.size() - 1));
        Formula rises = iff(
                compare(symbol("Q_r"), Comparator.ABOVE, symbol("Q_above")),
                iff(compare(symbol("z_r"), Comparator.AT_LEAST, symbol("z_above")), word(RISES), word("level falls")),
                word("flow does not rise"));
        return cells.raw(table.place(7), "", Unit.one(), rises, scope, null, false);
    }

    private Cell level(TableDraft table, Cell name, Cell flow, Cell typed) {
        Scope scope = Scope.ofElement();
        scope.put("Q", flow);
        scope.put("Q_r", new Run(flows));
        scope.put("z_r", new Run(levels));
        scope.put("order", new Run(orders));
        Cell row = cells.raw(table.place(2), "i", Unit.one(), row(), scope, Sign.POSITIVE, false);
        scope.put("i", row);
        Formula next = plus(symbol("i"), number("1"));
        Formula share =
                over(minus(symbol("Q"), at("Q_r", symbol("i"))), minus(at("Q_r", next), at("Q_r", symbol("i"))));
        Cell way = cells.raw(table.place(4), "t", Unit.one(), share, scope, null, false);
        scope.put("t", way);
        Formula between =
                plus(at("z_r", symbol("i")), times(symbol("t"), minus(at("z_r", next), at("z_r", symbol("i")))));
        Cell curve = cells.raw(table.place(5), "z_Q", typed.unit(), between, scope, null, false);
        scope.put("z_Q", curve);
        scope.put("z", typed);
        Formula isTyped = call(Function.IS_NUMBER, symbol("z"));
        Formula isCurve = call(Function.IS_NUMBER, symbol("z_Q"));
        Cell which = cells.raw(
                table.place(1),
                "",
                Unit.one(),
                iff(isTyped, word("as typed"), iff(isCurve, word("from the curve"), word("not on the curve"))),
                scope,
                null,
                false);
        Cell used = cells.raw(
                table.place(7),
                "z",
                typed.unit(),
                iff(isTyped, symbol("z"), iff(isCurve, symbol("z_Q"), new Formula.NoResult(Value.NO_RESULT))),
                scope,
                null,
                false);
        table.add(List.of(
                new Block.Content(here(table.place(0), name)),
                new Block.Content(which),
                new Block.Content(row),
                new Block.Content(here(table.place(3), flow)),
                new Block.Content(way),
                new Block.Content(curve),
                new Block.Content(here(table.place(6), typed)),
                new Block.Content(used)));
        return used;
    }

    /** What stands elsewhere, repeated here. */
    private Cell here(Place place, Cell cell) {
        if (cell.place().equals(place)) {
            return cell;
        }
        return cells.same(place, cell.symbol(), cell);
    }

    /** The row at or below the flow, at most the last but one; none outside the curve, or where the curve is no curve. */
    private Formula row() {
        Formula none = new Formula.NoResult(Value.NO_RESULT);
        String steps = Integer.toString(pairs.size() - 1);
        Formula found = call(Function.MIN, call(Function.MATCH_BELOW, symbol("Q"), symbol("Q_r")), number(steps));
        Formula inside = iff(
                compare(symbol("Q"), Comparator.AT_MOST, at("Q_r", number(Integer.toString(pairs.size())))),
                found,
                none);
        Formula fromTheFirst = iff(compare(symbol("Q"), Comparator.AT_LEAST, at("Q_r", number("1"))), inside, none);
        return iff(
                compare(call(Function.TALLY, symbol("order"), word(RISES)), Comparator.EQUAL, number(steps)),
                fromTheFirst,
                none);
    }

    private static Formula at(String run, Formula place) {
        return call(Function.INDEX, symbol(run), place);
    }
}
