package nappe.station;

import static nappe.station.Sources.unitText;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import nappe.calculation.Block;
import nappe.calculation.CaseColumns;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.Formulas;
import nappe.calculation.Place;
import nappe.calculation.Run;
import nappe.calculation.Scope;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.method.Item;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * Lays the flow cases: each flow with its tailwater, as typed and in the working unit, and in the reporting unit; then
 * the combinations of the flow of one case with the level of another, which refer to the same cells.
 */
final class CasesSheet {
    private final Cells cells;
    private final SheetDraft sheet;
    private final Design design;
    private final List<Design.FlowCase> cases;
    private final List<Design.Combination> combinations;
    private final List<Cell> names = new ArrayList<>();
    private final List<Cell> judgedNames = new ArrayList<>();
    private final List<Cell> flows = new ArrayList<>();
    private final List<Cell> reported = new ArrayList<>();
    private final List<Cell> units = new ArrayList<>();
    private final List<Cell> flowsThroughOne = new ArrayList<>();
    private final List<Cell> levels = new ArrayList<>();
    private @Nullable LevelCurve curve;

    CasesSheet(Cells cells, SheetDraft sheet, Design design) {
        this.cells = cells;
        this.sheet = sheet;
        this.design = design;
        this.cases = design.cases();
        this.combinations = Stream.concat(
                        design.combinations().stream().filter(Design.Combination::canCoincide),
                        design.combinations().stream().filter(one -> !one.canCoincide()))
                .toList();
    }

    /** The columns laid here: the cases as typed, the combinations that can coincide, and those that cannot. */
    CaseColumns columns() {
        List<String> all = Stream.concat(
                        cases.stream().map(Design.FlowCase::name),
                        combinations.stream().map(Design.Combination::name))
                .toList();
        int coincide = (int)
                combinations.stream().filter(Design.Combination::canCoincide).count();
        return new CaseColumns(all, cases.size(), cases.size() + coincide);
    }

    /** The flow of a case, through all of the station, in the working unit. */
    Cell flow(int i) {
        return flows.get(i);
    }

    /** The flow through one of the units in service in a case. */
    Cell flowThroughOne(int i) {
        return flowsThroughOne.get(i);
    }

    /** How many units are in service in a case. */
    Cell unitsInService(int i) {
        return units.get(i);
    }

    /** The water level downstream of the station in the working unit. */
    Cell level(int i) {
        return levels.get(i);
    }

    /** Adds a column after those of the cases and combinations. */
    void add(Cell name, Cell flow, Cell inService, Cell throughOne, Cell level) {
        names.add(name);
        flows.add(flow);
        units.add(inService);
        flowsThroughOne.add(throughOne);
        levels.add(level);
    }

    /** The tailwater curve, where there is one. */
    LevelCurve curve() {
        return java.util.Objects.requireNonNull(curve);
    }

    /** The cells with the names of all columns. */
    List<Cell> names() {
        return List.copyOf(names);
    }

    /** The flows in the working unit, in the order of the columns. */
    List<Cell> flows() {
        return List.copyOf(flows);
    }

    /** The flows of the cases as typed in the reporting unit. */
    List<Cell> reported() {
        return List.copyOf(reported);
    }

    /** The units in service, in the order of the columns. */
    List<Cell> units() {
        return List.copyOf(units);
    }

    /** The flows through one unit, in the order of the columns. */
    List<Cell> flowsThroughOne() {
        return List.copyOf(flowsThroughOne);
    }

    /** The water levels downstream that rule, in the order of the columns. */
    List<Cell> levels() {
        return List.copyOf(levels);
    }

    /** The names of the judged columns. */
    Run judgedNames() {
        return new Run(judgedNames.subList(0, columns().judged()));
    }

    /** @param isShared whether an element of the station takes the flow through one of the units in service */
    void lay(boolean isShared) {
        Unit flowReport = design.project().flowUnit();
        String datum = design.project().datum();
        sheet.note(
                "Elevations refer to " + datum
                        + ". Flows and water levels are as supplied; the governing combination is for"
                        + " the engineer to confirm."
                        + (isShared
                                ? ""
                                : " No element here shares the flow among units: each takes the flow through all of the station."));
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
                        new Block.Column("Units in service", 10, Block.Align.RIGHT),
                        new Block.Column("Q, one [" + working(flowReport) + "]", 12, Block.Align.RIGHT),
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
                        new Block.Column("Level [" + cells.unit(Dimension.LENGTH) + "]", 12, Block.Align.RIGHT),
                        new Block.Column("", 12, Block.Align.RIGHT),
                        new Block.Column("Source or basis", 34, Block.Align.LEFT),
                        new Block.Column("Standing", 10, Block.Align.LEFT)));
        for (Design.FlowCase one : cases) {
            level(levelTable, one);
        }
        sheet.gap();
        if (!design.levels().isEmpty()) {
            LevelCurve laid = new LevelCurve(cells, sheet, design.levels());
            curve = laid;
            List<Cell> used = laid.lay(names, flows, levels);
            levels.clear();
            levels.addAll(used);
        }
        if (!combinations.isEmpty()) {
            combinations();
        }
        nameJudged();
    }

    /** The summary looks for a name in one run of cells: where combinations are judged too, in a list of its own. */
    private void nameJudged() {
        int judged = columns().judged();
        if (judged == cases.size()) {
            judgedNames.addAll(names);
            return;
        }
        TableDraft table = sheet.workbookTable(
                "Cases and combinations that are judged",
                List.of(new Block.Column("Case", 26, Block.Align.LEFT)),
                judged);
        for (Cell name : names.subList(0, judged)) {
            Cell again = same(table.place(0), name);
            judgedNames.add(again);
            table.add(List.of(new Block.Content(again)));
        }
        sheet.gap();
    }

    private Cell inService(Place place, Design.Typed typed) {
        Value count = typed.value() instanceof Value.None ? Value.of(1) : typed.value();
        return cells.typed(Cell.Kind.ENTRY, place, "N", Unit.one(), count, Sign.POSITIVE);
    }

    /** The flow through one of the units in service. */
    Cell throughOne(Place place, Cell flow, Cell inService) {
        Scope scope = Scope.ofElement();
        scope.put("Q", flow);
        scope.put("N", inService);
        return cells.raw(
                place,
                "Q_1",
                flow.unit(),
                Formulas.over(Formulas.symbol("Q"), Formulas.symbol("N")),
                scope,
                null,
                false);
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
        reported.add(report);
        Cell inService = inService(table.place(7), one.units());
        units.add(inService);
        flowsThroughOne.add(throughOne(table.place(8), working, inService));
        table.add(List.of(
                new Block.Content(name),
                new Block.Text(one.period()),
                new Block.Text(one.year()),
                new Block.Content(flow),
                new Block.Text(unitText(typed.unit())),
                new Block.Content(working),
                new Block.Content(report),
                new Block.Content(inService),
                new Block.Content(flowsThroughOne.get(flowsThroughOne.size() - 1)),
                new Block.Text(typed.source()),
                new Block.Text(typed.standing())));
    }

    private void level(TableDraft table, Design.FlowCase one) {
        Design.Typed typed = one.tailwater();
        Cell level = design.levels().isEmpty()
                ? cells.typed(Cell.Kind.ENTRY, table.place(3), "z", typed.unit(), typed.value(), Sign.ANY)
                : cells.optional(table.place(3), "z", typed.unit(), typed.value(), Sign.ANY);
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
                perCase.add(own(table, given, one.name(), one.typed().get(tag + "." + given.symbol())));
            }
            for (Design.Combination one : combinations) {
                perCase.add(own(table, given, one.name(), null));
            }
            known.put(given.symbol(), perCase);
            sheet.gap();
        }
        return known;
    }

    private Cell own(TableDraft table, Item.Given given, String name, Design.@Nullable Typed typed) {
        Value value = typed == null ? new Value.None(Value.NOT_GIVEN) : typed.value();
        Unit unit = typed == null ? working(given.unit()) : typed.unit();
        Cell cell = cells.optional(table.place(3), given.symbol(), unit, value, given.sign());
        Cell working = cells.factors().toWorking(table.place(5), given.symbol(), cell);
        table.add(List.of(
                new Block.Text(name),
                new Block.Text(""),
                new Block.Text(""),
                new Block.Content(cell),
                new Block.Text(unitText(unit)),
                new Block.Content(working)));
        return working;
    }

    /** The combinations refer to the flow, the units and the level of the cases they name. */
    private void combinations() {
        Unit flow = cells.unit(Dimension.FLOW);
        TableDraft table = sheet.table(
                "Combinations: the flow of one case with the level of another",
                List.of(
                        new Block.Column("Combination", 26, Block.Align.LEFT),
                        new Block.Column("Flow of", 16, Block.Align.LEFT),
                        new Block.Column("Level of", 10, Block.Align.LEFT),
                        new Block.Column("Units in service", 12, Block.Align.RIGHT),
                        new Block.Column("Can coincide", 8, Block.Align.LEFT),
                        new Block.Column("Q [" + flow + "]", 12, Block.Align.RIGHT),
                        new Block.Column("Level [" + cells.unit(Dimension.LENGTH) + "]", 12, Block.Align.RIGHT),
                        new Block.Column("", 10, Block.Align.RIGHT),
                        new Block.Column("Q, one [" + flow + "]", 12, Block.Align.RIGHT),
                        new Block.Column("Basis", 34, Block.Align.LEFT)));
        for (Design.Combination one : combinations) {
            int flowOf = caseOf(one.flowOf());
            int levelOf = caseOf(one.levelOf());
            Cell name =
                    cells.typed(Cell.Kind.TABLE, table.place(0), "", Unit.one(), Value.word(one.name()), Sign.POSITIVE);
            Cell inService = same(table.place(3), units.get(flowOf));
            Cell all = same(table.place(5), flows.get(flowOf));
            Cell level = same(table.place(6), levels.get(levelOf));
            Cell through = throughOne(table.place(8), all, inService);
            add(name, all, inService, through, level);
            table.add(List.of(
                    new Block.Content(name),
                    new Block.Text(one.flowOf()),
                    new Block.Text(one.levelOf()),
                    new Block.Content(inService),
                    new Block.Text(one.canCoincide() ? "yes" : "no"),
                    new Block.Content(all),
                    new Block.Content(level),
                    new Block.Text(""),
                    new Block.Content(through),
                    new Block.Text(one.basis())));
        }
        sheet.gap();
    }

    private int caseOf(String name) {
        for (int i = 0; i < cases.size(); i++) {
            if (cases.get(i).name().equals(name)) {
                return i;
            }
        }
        throw new IllegalArgumentException("no case " + name);
    }

    /** A cell that repeats another. */
    Cell same(Place place, Cell other) {
        return cells.same(place, other.symbol(), other);
    }
}
