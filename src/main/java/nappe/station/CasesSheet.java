package nappe.station;

import static nappe.station.Sources.unitText;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.Run;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.method.Item;
import nappe.unit.Unit;

/** Lays the flow cases: each flow with its tailwater, as typed and in the working unit, and in the reporting unit. */
final class CasesSheet {
    private final Cells cells;
    private final SheetDraft sheet;
    private final List<Design.FlowCase> cases;
    private final List<Cell> names = new ArrayList<>();
    private final List<Cell> flows = new ArrayList<>();
    private final List<Cell> levels = new ArrayList<>();

    CasesSheet(Cells cells, SheetDraft sheet, List<Design.FlowCase> cases) {
        this.cells = cells;
        this.sheet = sheet;
        this.cases = cases;
    }

    /** The flow of a case in the working unit. */
    Cell flow(int i) {
        return flows.get(i);
    }

    /** The flow through one of the units in service in a case. */
    Cell flowThroughOne(int i) {
        return flows.get(i);
    }

    /** How many units are in service in a case. */
    Cell unitsInService(int i) {
        throw new StationException(
                List.of(new DesignFault(new Design.Origin("Flows", ""), "units in service are not typed", "units")));
    }

    /** The water level downstream of the station in the working unit. */
    Cell level(int i) {
        return levels.get(i);
    }

    /** The names of the cases. */
    Run names() {
        return new Run(names);
    }

    void lay(Unit flowReport, String datum) {
        sheet.note("Elevations refer to " + datum
                + ". Flows and water levels are as supplied; the governing combination is for"
                + " the engineer to confirm.");
        TableDraft flowTable = sheet.table(
                "Flows",
                List.of(
                        new Block.Column("Case", 26, Block.Align.LEFT),
                        new Block.Column("Averaging period", 16, Block.Align.LEFT),
                        new Block.Column("Design year", 10, Block.Align.LEFT),
                        new Block.Column("Flow as typed", 12, Block.Align.RIGHT),
                        new Block.Column("Unit", 8, Block.Align.LEFT),
                        new Block.Column("Q [" + working(flowReport) + "]", 12, Block.Align.RIGHT),
                        new Block.Column("Q [" + flowReport + "]", 12, Block.Align.RIGHT),
                        new Block.Column("Source or basis", 34, Block.Align.LEFT),
                        new Block.Column("Standing", 10, Block.Align.LEFT)));
        for (Design.FlowCase one : cases) {
            flow(flowTable, one, flowReport);
        }
        sheet.gap();
        TableDraft levelTable = sheet.table(
                "Water levels downstream",
                List.of(
                        new Block.Column("Case", 26, Block.Align.LEFT),
                        new Block.Column("Return period", 16, Block.Align.LEFT),
                        new Block.Column("", 10, Block.Align.LEFT),
                        new Block.Column("Level as typed", 12, Block.Align.RIGHT),
                        new Block.Column("Unit", 8, Block.Align.LEFT),
                        new Block.Column(
                                "Level [" + cells.unit(nappe.unit.Dimension.LENGTH) + "]", 12, Block.Align.RIGHT),
                        new Block.Column("", 12, Block.Align.RIGHT),
                        new Block.Column("Source or basis", 34, Block.Align.LEFT),
                        new Block.Column("Standing", 10, Block.Align.LEFT)));
        for (Design.FlowCase one : cases) {
            level(levelTable, one);
        }
        sheet.gap();
    }

    private Unit working(Unit unit) {
        return cells.unit(unit.dimension());
    }

    private void flow(TableDraft table, Design.FlowCase one, Unit flowReport) {
        Design.Typed typed = one.flow();
        Cell name = cells.typed(Cell.Kind.TABLE, table.place(0), "", Unit.one(), Value.word(one.name()), Sign.POSITIVE);
        names.add(name);
        Cell flow = cells.typed(Cell.Kind.ENTRY, table.place(3), "Q", typed.unit(), typed.value(), Sign.NOT_NEGATIVE);
        Cell working = cells.factors().toWorking(table.place(5), "Q", flow);
        Cell report = cells.factors().toReport(table.place(6), "Q", working, flowReport);
        flows.add(working);
        table.add(List.of(
                new Block.Content(name),
                new Block.Text(one.period()),
                new Block.Text(one.year()),
                new Block.Content(flow),
                new Block.Text(unitText(typed.unit())),
                new Block.Content(working),
                new Block.Content(report),
                new Block.Text(typed.source()),
                new Block.Text(typed.standing())));
    }

    private void level(TableDraft table, Design.FlowCase one) {
        Design.Typed typed = one.tailwater();
        Cell level = cells.typed(Cell.Kind.ENTRY, table.place(3), "z", typed.unit(), typed.value(), Sign.ANY);
        Cell working = cells.factors().toWorking(table.place(5), "z", level);
        levels.add(working);
        table.add(List.of(
                new Block.Text(one.name()),
                new Block.Text(one.tailwaterReturn()),
                new Block.Text(""),
                new Block.Content(level),
                new Block.Text(unitText(typed.unit())),
                new Block.Content(working),
                new Block.Text(""),
                new Block.Text(typed.source()),
                new Block.Text(typed.standing())));
    }

    /** Lays what an element asks for in each case, and returns the working cells by symbol, in the order of the cases. */
    Map<String, List<Cell>> layOwn(String tag, List<Item.Given> asked) {
        Map<String, List<Cell>> known = new LinkedHashMap<>();
        for (Item.Given given : asked) {
            Unit working = working(given.unit());
            TableDraft table = sheet.table(
                    tag + "  " + given.symbol() + ": " + given.label(),
                    List.of(
                            new Block.Column("Case", 26, Block.Align.LEFT),
                            new Block.Column("", 16, Block.Align.LEFT),
                            new Block.Column("", 10, Block.Align.LEFT),
                            new Block.Column("As typed", 12, Block.Align.RIGHT),
                            new Block.Column("Unit", 8, Block.Align.LEFT),
                            new Block.Column(given.symbol() + " [" + working + "]", 12, Block.Align.RIGHT)));
            List<Cell> perCase = new ArrayList<>();
            for (Design.FlowCase one : cases) {
                perCase.add(own(table, tag, given, one));
            }
            known.put(given.symbol(), perCase);
            sheet.gap();
        }
        return known;
    }

    private Cell own(TableDraft table, String tag, Item.Given given, Design.FlowCase one) {
        Design.Typed typed = one.typed().get(tag + "." + given.symbol());
        Value value = typed == null ? new Value.None(Value.NOT_GIVEN) : typed.value();
        Unit unit = typed == null ? working(given.unit()) : typed.unit();
        Cell cell = cells.optional(table.place(3), given.symbol(), unit, value, given.sign());
        Cell working = cells.factors().toWorking(table.place(5), given.symbol(), cell);
        table.add(List.of(
                new Block.Text(one.name()),
                new Block.Text(""),
                new Block.Text(""),
                new Block.Content(cell),
                new Block.Text(unitText(unit)),
                new Block.Content(working)));
        return working;
    }
}
