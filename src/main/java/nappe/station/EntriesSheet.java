package nappe.station;

import static nappe.station.Sources.unitText;

import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.Place;
import nappe.calculation.Scope;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.unit.Unit;

/** Lays what was typed for each element, and what others demand: as typed, and in the working unit. */
final class EntriesSheet {
    private static final List<Block.Column> ENTRY_COLUMNS = List.of(
            new Block.Column("Symbol", 10, Block.Align.LEFT),
            new Block.Column("Description", 34, Block.Align.LEFT),
            new Block.Column("Value", 12, Block.Align.RIGHT),
            new Block.Column("Unit", 10, Block.Align.LEFT),
            new Block.Column("In working unit", 14, Block.Align.RIGHT),
            new Block.Column("Working unit", 10, Block.Align.LEFT),
            new Block.Column("Source or basis", 34, Block.Align.LEFT),
            new Block.Column("Standing", 10, Block.Align.LEFT));

    private static final List<Block.Column> DEMAND_COLUMNS = List.of(
            new Block.Column("Symbol", 10, Block.Align.LEFT),
            new Block.Column("What is demanded", 34, Block.Align.LEFT),
            new Block.Column("Value", 12, Block.Align.RIGHT),
            new Block.Column("Unit", 10, Block.Align.LEFT),
            new Block.Column("In working unit", 14, Block.Align.RIGHT),
            new Block.Column("Working unit", 10, Block.Align.LEFT),
            new Block.Column("Citation", 34, Block.Align.LEFT),
            new Block.Column("Bound", 10, Block.Align.LEFT));

    private final Cells cells;
    private final SheetDraft sheet;

    EntriesSheet(Cells cells, SheetDraft sheet) {
        this.cells = cells;
        this.sheet = sheet;
    }

    /** Lays the entries of an element, whose scope knows the tables it chooses from, and then knows the entries too. */
    void lay(Design.Element element, MethodSheet method, Scope scope) {
        TableDraft table = sheet.table(element.tag() + "  " + title(element, method), ENTRY_COLUMNS);
        for (Item item : method.items()) {
            if (item instanceof Item.Given given
                    && (given.from() == Item.From.ENTRY || given.from() == Item.From.CHOICE)) {
                entry(table, given, element, scope);
            }
        }
        sheet.gap();
    }

    static String title(Design.Element element, MethodSheet method) {
        boolean own = !element.title().isEmpty() && !element.title().equals(method.title());
        return own ? element.title() + ": " + method.title() : method.title();
    }

    private void entry(TableDraft table, Item.Given given, Design.Element element, Scope scope) {
        Design.Typed typed = element.typed().get(given.symbol());
        Value value = typed == null ? new Value.None(Value.NOT_GIVEN) : typed.value();
        Unit unit = typed == null ? given.unit() : typed.unit();
        Cell cell = cell(table.place(2), given, unit, value, scope);
        Cell working = cells.factors().toWorking(table.place(4), given.symbol(), cell);
        scope.put(given.symbol(), working);
        table.add(List.of(
                new Block.Symbol(given.symbol()),
                new Block.Text(given.label()),
                new Block.Content(cell),
                new Block.Text(unitText(unit)),
                new Block.Content(working),
                new Block.Text(unitText(working.unit())),
                new Block.Text(typed == null ? "" : typed.source()),
                new Block.Text(typed == null ? "" : typed.standing())));
    }

    private Cell cell(Place place, Item.Given given, Unit unit, Value value, Scope scope) {
        boolean mayBeBlank = given.optional() || value instanceof Value.None;
        if (given.from() == Item.From.CHOICE) {
            return cells.choice(place, given.symbol(), value, Sources.keys(scope, given.table()), mayBeBlank);
        }
        return mayBeBlank
                ? cells.optional(place, given.symbol(), unit, value, given.sign())
                : cells.typed(Cell.Kind.ENTRY, place, given.symbol(), unit, value, given.sign());
    }

    /** Lays the demands and returns the working cell of each. */
    Map<Design.Demand, Cell> layDemands(List<Design.Demand> demands) {
        Map<Design.Demand, Cell> working = new java.util.IdentityHashMap<>();
        sheet.heading("Limits demanded by others, as typed by the engineer");
        if (demands.isEmpty()) {
            sheet.note("none");
            return working;
        }
        TableDraft table = sheet.table("", DEMAND_COLUMNS);
        for (Design.Demand demand : demands) {
            Design.Typed typed = demand.value();
            Cell cell = cells.typed(
                    Cell.Kind.ENTRY, table.place(2), demand.symbol(), typed.unit(), typed.value(), Sign.ANY);
            Cell inWorking = cells.factors().toWorking(table.place(4), demand.symbol(), cell);
            working.put(demand, inWorking);
            table.add(List.of(
                    new Block.Text(demand.tag() + " " + demand.symbol()),
                    new Block.Text(demand.label()),
                    new Block.Content(cell),
                    new Block.Text(unitText(typed.unit())),
                    new Block.Content(inWorking),
                    new Block.Text(unitText(inWorking.unit())),
                    new Block.Text(demand.citation()),
                    new Block.Text(demand.atMost() ? "at most" : "at least")));
        }
        sheet.gap();
        return working;
    }
}
