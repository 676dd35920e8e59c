package nappe.station;

import static nappe.calculation.Formulas.call;
import static nappe.calculation.Formulas.compare;
import static nappe.calculation.Formulas.iff;
import static nappe.calculation.Formulas.number;
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
import nappe.unit.Unit;

/**
 * Lays the combinations of the flow of one case with the level of another: what the engineer states of each, what comes
 * of it, and how many limits are not met in it.
 */
final class CombinationsSheet {
    private static final String NOT_MET = "not met";
    private static final int SIDE_BY_SIDE = 5;

    private final Design design;
    private final StationLayout station;
    private final SheetDraft sheet;
    private final List<Design.Combination> combinations;

    CombinationsSheet(Design design, StationLayout station, SheetDraft sheet) {
        this.design = design;
        this.station = station;
        this.sheet = sheet;
        this.combinations = design.combinations();
    }

    /** Lays the verdicts as a work table at the back, and the sheet, which counts in it. */
    void lay(SheetDraft work) {
        List<List<Cell>> verdicts = new ArrayList<>();
        List<Cell> labels = new ArrayList<>();
        workTable(work, labels, verdicts);
        sheet.note(
                "Each combination is the flow of one case, with its units in service, and the water level downstream of"
                        + " another. One that can occur, as the engineer states here, is judged as a case is: it counts in the summary"
                        + " of limits and in the highest and lowest over the cases. One that cannot is marked \"not judged\": it is"
                        + " shown for what it would give, and counts nowhere.");
        statements();
        results(labels, verdicts);
        design.elements().forEach(this::element);
        places();
        matrix(verdicts);
    }

    private int column(Design.Combination one) {
        return station.columns().names().indexOf(one.name());
    }

    /** The verdicts of each combination in one run of cells, which the sheet counts and looks in. */
    private void workTable(SheetDraft work, List<Cell> labels, List<List<Cell>> verdicts) {
        List<Block.Column> columns = new ArrayList<>(List.of(new Block.Column("Limit", 40, Block.Align.LEFT)));
        combinations.forEach(one -> {
            columns.add(new Block.Column(one.name(), 20, Block.Align.LEFT));
            verdicts.add(new ArrayList<>());
        });
        Cells cells = station.cells();
        List<LimitResult> limits = station.judgedLimits();
        TableDraft table = work.workbookTable("Verdicts in each combination", columns, limits.size());
        for (LimitResult limit : limits) {
            labels.add(cells.typed(
                    Cell.Kind.TABLE,
                    table.place(0),
                    "",
                    Unit.one(),
                    Value.word(limit.tag() + "  " + limit.label()),
                    Sign.POSITIVE));
            List<Block.Item> row = new ArrayList<>(List.of(new Block.Content(labels.get(labels.size() - 1))));
            for (int k = 0; k < combinations.size(); k++) {
                int column = limit.forAll() ? 0 : column(combinations.get(k));
                Cell verdict =
                        cells.same(table.place(1 + k), "", limit.verdicts().get(column));
                verdicts.get(k).add(verdict);
                row.add(new Block.Content(verdict));
            }
            table.add(row);
        }
        work.gap();
    }

    private void statements() {
        TableDraft table = sheet.table(
                "What is combined, and whether it can occur",
                List.of(
                        new Block.Column("Combination", 26, Block.Align.LEFT),
                        new Block.Column("Flow of", 22, Block.Align.LEFT),
                        new Block.Column("Water level of", 22, Block.Align.LEFT),
                        new Block.Column("Can coincide", 12, Block.Align.LEFT),
                        new Block.Column("Verdicts", 12, Block.Align.LEFT),
                        new Block.Column("Basis, as stated by the engineer", 40, Block.Align.LEFT)));
        for (Design.Combination one : combinations) {
            table.add(List.of(
                    new Block.Text(one.name()),
                    new Block.Text(one.flowOf()),
                    new Block.Text(one.levelOf()),
                    new Block.Text(one.canCoincide() ? "yes" : "no"),
                    new Block.Text(one.canCoincide() ? "judged" : "not judged"),
                    new Block.Text(one.basis())));
        }
        sheet.gap();
    }

    private void results(List<Cell> labels, List<List<Cell>> verdicts) {
        CasesSheet cases = station.cases();
        TableDraft table = sheet.table(
                "Flow, level and limits not met",
                List.of(
                        new Block.Column("Combination", 26, Block.Align.LEFT),
                        new Block.Column("Q [" + cases.flow(0).unit() + "]", 22, Block.Align.RIGHT),
                        new Block.Column("Units in service", 22, Block.Align.RIGHT),
                        new Block.Column("Level [" + cases.level(0).unit() + "]", 12, Block.Align.RIGHT),
                        new Block.Column("Limits not met", 12, Block.Align.RIGHT),
                        new Block.Column("The first of them", 40, Block.Align.LEFT),
                        new Block.Column("Limits without result", 12, Block.Align.RIGHT),
                        new Block.Column("Verdicts", 12, Block.Align.LEFT)));
        for (int k = 0; k < combinations.size(); k++) {
            Design.Combination one = combinations.get(k);
            int c = column(one);
            Scope scope = Scope.ofElement();
            scope.put("verdicts", new Run(verdicts.get(k)));
            scope.put("labels", new Run(labels));
            Formula tally = call(Function.TALLY, symbol("verdicts"), word(NOT_MET));
            Formula without = call(Function.TALLY, symbol("verdicts"), word(Value.NO_RESULT));
            Cell count = station.cells().raw(table.place(4), "", Unit.one(), tally, scope, null, false);
            scope.put("count", count);
            Formula first =
                    call(Function.INDEX, symbol("labels"), call(Function.MATCH, word(NOT_MET), symbol("verdicts")));
            Cell name = station.cells()
                    .raw(
                            table.place(5),
                            "",
                            Unit.one(),
                            iff(compare(symbol("count"), Comparator.ABOVE, number("0")), first, word("none")),
                            scope,
                            null,
                            false);
            table.add(List.of(
                    new Block.Jump(one.name(), verdicts.get(k).get(0)),
                    new Block.Content(cases.flow(c)),
                    new Block.Content(cases.unitsInService(c)),
                    new Block.Content(cases.level(c)),
                    new Block.Content(count),
                    new Block.Content(name),
                    new Block.Content(station.cells().raw(table.place(6), "", Unit.one(), without, scope, null, false)),
                    new Block.Text(one.canCoincide() ? "judged" : "not judged")));
        }
        sheet.gap();
    }

    private void element(Design.Element element) {
        List<CaseResults.Row> rows = CaseResults.of(station, element.tag());
        if (rows.isEmpty()) {
            return;
        }
        List<Block.Column> columns = new ArrayList<>(List.of(new Block.Column("Combination", 26, Block.Align.LEFT)));
        for (CaseResults.Row row : rows) {
            String unit = unitText(row.unit());
            boolean words = row.isWords();
            columns.add(new Block.Column(
                    row.label() + (unit.isEmpty() || words ? "" : " [" + unit + "]"),
                    22,
                    words ? Block.Align.LEFT : Block.Align.RIGHT));
        }
        TableDraft table =
                sheet.table(element.tag() + "  " + EntriesSheet.title(element, station.method(element.tag())), columns);
        for (Design.Combination one : combinations) {
            List<Block.Item> items = new ArrayList<>(List.of(new Block.Text(one.name())));
            rows.forEach(row -> items.add(new Block.Content(row.cells().get(column(one)))));
            table.add(items);
        }
        sheet.gap();
    }

    /** Which combination stands where, the flows down and the levels across. */
    private void places() {
        List<String> flows =
                combinations.stream().map(Design.Combination::flowOf).distinct().toList();
        List<String> levels = combinations.stream()
                .map(Design.Combination::levelOf)
                .distinct()
                .toList();
        if (combinations.size() < 2 || levels.size() > SIDE_BY_SIDE) {
            return;
        }
        List<Block.Column> columns = new ArrayList<>(List.of(new Block.Column("Flow of", 26, Block.Align.LEFT)));
        levels.forEach(level -> columns.add(new Block.Column("Level of " + level, 22, Block.Align.LEFT)));
        TableDraft table = sheet.table("Flows down, water levels across", columns);
        for (String flow : flows) {
            List<Block.Item> row = new ArrayList<>(List.of(new Block.Text(flow)));
            levels.forEach(level -> row.add(new Block.Text(place(flow, level))));
            table.add(row);
        }
        sheet.gap();
    }

    private String place(String flow, String level) {
        List<String> here = new ArrayList<>();
        if (flow.equals(level)) {
            here.add("the case itself");
        }
        for (Design.Combination one : combinations) {
            if (one.flowOf().equals(flow) && one.levelOf().equals(level)) {
                here.add(one.name() + (one.canCoincide() ? "" : " (not judged)"));
            }
        }
        return here.isEmpty() ? "-" : String.join("; ", here);
    }

    private void matrix(List<List<Cell>> verdicts) {
        List<LimitResult> limits = station.judgedLimits();
        for (int from = 0; from < combinations.size(); from += SIDE_BY_SIDE) {
            int to = Math.min(combinations.size(), from + SIDE_BY_SIDE);
            List<Block.Column> columns = new ArrayList<>(List.of(
                    new Block.Column("Limit", 26, Block.Align.LEFT),
                    new Block.Column("Element", 22, Block.Align.LEFT)));
            for (Design.Combination one : combinations.subList(from, to)) {
                columns.add(new Block.Column(
                        one.name() + (one.canCoincide() ? "" : " (not judged)"), 22, Block.Align.LEFT));
            }
            TableDraft table =
                    sheet.table("Every limit in every combination" + (from == 0 ? "" : ", continued"), columns);
            for (int i = 0; i < limits.size(); i++) {
                LimitResult limit = limits.get(i);
                List<Block.Item> row = new ArrayList<>(List.of(
                        new Block.Text(limit.label()),
                        new Block.Jump(limit.tag(), limit.verdicts().get(0))));
                for (int k = from; k < to; k++) {
                    row.add(new Block.Content(verdicts.get(k).get(i)));
                }
                table.add(row);
            }
            sheet.gap();
        }
    }
}
