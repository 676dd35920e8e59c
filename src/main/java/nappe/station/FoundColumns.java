package nappe.station;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.CaseColumns;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.method.Item;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * Lays the flows found as columns after all others: each flow as found, its level and its units in service those of a
 * typed case, live.
 */
final class FoundColumns {
    private final Cells cells;
    private final SheetDraft sheet;
    private final Design design;
    private final List<FoundCase> found;
    private final List<String> names = new ArrayList<>();
    private final List<Cell> flows = new ArrayList<>();
    private final Map<String, Cell> blanks = new LinkedHashMap<>();
    private @Nullable TableDraft blankTable;

    FoundColumns(Cells cells, SheetDraft sheet, Design design, List<FoundCase> found) {
        this.cells = cells;
        this.sheet = sheet;
        this.design = design;
        this.found = found;
    }

    /** The columns with those of the flows found at their right, printed and judged nowhere. */
    CaseColumns after(CaseColumns typed) {
        String word = "found ";
        while (startsOne(typed.names(), word)) {
            word = "flow " + word;
        }
        for (int i = 1; i <= found.size(); i++) {
            names.add(word + i);
        }
        List<String> all = new ArrayList<>(typed.names());
        all.addAll(names);
        return new CaseColumns(all, typed.printed(), typed.judged());
    }

    private static boolean startsOne(List<String> names, String word) {
        return names.stream().anyMatch(name -> name.toLowerCase(Locale.ROOT).startsWith(word));
    }

    /** The names of the columns of the flows found. */
    List<String> names() {
        return names;
    }

    /** The flows as found, in the working unit. */
    List<Cell> flows() {
        return flows;
    }

    /** Lays the flows; the sheet of cases then knows them after all others. */
    void lay(CasesSheet cases) {
        if (found.isEmpty()) {
            return;
        }
        Unit flow = cells.unit(Dimension.FLOW);
        Unit report = design.project().flowUnit();
        Unit length = cells.unit(Dimension.LENGTH);
        TableDraft byCurve = byCurve(cases);
        TableDraft table = sheet.table(
                "Flows found, as issued",
                List.of(
                        new Block.Column("Case", 10, Block.Align.LEFT),
                        new Block.Column("Element", 9, Block.Align.LEFT),
                        new Block.Column("Limit", 40, Block.Align.LEFT),
                        new Block.Column("Direction", 22, Block.Align.LEFT),
                        new Block.Column("Q as issued [" + flow + "]", 12, Block.Align.RIGHT),
                        new Block.Column("Q [" + report + "]", 12, Block.Align.RIGHT),
                        new Block.Column("Q, one [" + flow + "]", 12, Block.Align.RIGHT),
                        new Block.Column("Units in service", 9, Block.Align.RIGHT),
                        new Block.Column("Level downstream [" + length + "]", 12, Block.Align.RIGHT),
                        new Block.Column("Found for", 44, Block.Align.LEFT)));
        for (int i = 0; i < found.size(); i++) {
            FoundCase one = found.get(i);
            Cell name = cells.typed(
                    Cell.Kind.TABLE, table.place(0), "", Unit.one(), Value.word(names.get(i)), Sign.POSITIVE);
            Cell all = cells.typed(Cell.Kind.RERUN, table.place(4), "Q", flow, Value.of(one.flow()), Sign.NOT_NEGATIVE);
            Cell reported = cells.factors().toReport(table.place(5), "Q", all, report);
            Cell inService = cases.same(
                    table.place(7), cases.unitsInService(one.condition().unitsOf()));
            Cell through = cases.throughOne(table.place(6), all, inService);
            int levelOf = one.condition().levelOf();
            Cell level = cases.same(
                    table.place(8),
                    byCurve == null || levelOf >= 0
                            ? cases.level(levelOf)
                            : cases.curve().at(byCurve, name, all));
            flows.add(all);
            cases.add(name, all, inService, through, level);
            table.add(List.of(
                    new Block.Content(name),
                    new Block.Text(one.tag()),
                    new Block.Text(one.label()),
                    new Block.Text(one.direction()),
                    new Block.Content(all),
                    new Block.Content(reported),
                    new Block.Content(through),
                    new Block.Content(inService),
                    new Block.Content(level),
                    new Block.Text(one.conditions())));
        }
        sheet.gap();
    }

    /** The table of the levels that follow from the flows found by the tailwater curve; null where none does. */
    private @Nullable TableDraft byCurve(CasesSheet cases) {
        int count = (int) found.stream()
                .filter(one -> one.condition().levelOf() == FoundCase.Condition.TABLE)
                .count();
        return count == 0
                ? null
                : sheet.workbookTable(
                        "Levels by the tailwater curve at flows found",
                        cases.curve().columns(),
                        count);
    }

    /** The cell that stands for what an element asks for in each case: at a flow found it is not given. */
    Cell notGiven(String tag, Item.Given given) {
        return blanks.computeIfAbsent(tag + "." + given.symbol(), key -> {
            TableDraft table = blankTable();
            Cell cell = cells.typed(
                    Cell.Kind.RERUN,
                    table.place(3),
                    given.symbol(),
                    cells.unit(given.unit().dimension()),
                    new Value.None(Value.NOT_GIVEN),
                    given.sign());
            table.add(List.of(
                    new Block.Symbol(given.symbol()),
                    new Block.Text(tag),
                    new Block.Text(given.label()),
                    new Block.Content(cell)));
            return cell;
        });
    }

    private TableDraft blankTable() {
        TableDraft open = blankTable;
        if (open == null) {
            open = sheet.table(
                    "Typed in each case, and not at the flows found",
                    List.of(
                            new Block.Column("Symbol", 10, Block.Align.LEFT),
                            new Block.Column("Element", 9, Block.Align.LEFT),
                            new Block.Column("Description", 40, Block.Align.LEFT),
                            new Block.Column("At the flows found", 22, Block.Align.LEFT)));
            blankTable = open;
        }
        return open;
    }
}
