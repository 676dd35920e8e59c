package nappe.station;

import static nappe.calculation.Formulas.symbol;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.ElementSheet.LimitResult;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * Lays the page on where each limit is first reached: before the elements what the flows found mean, after them what the
 * calculation gives at each of these flows, live, and which limits are not reached.
 */
final class FoundSheet {
    private final SheetDraft sheet;
    private final FoundFlows found;

    FoundSheet(SheetDraft sheet, FoundFlows found) {
        this.sheet = sheet;
        this.found = found;
    }

    /** What stands over the table of the flows. */
    void head() {
        sheet.note("Each flow at which the verdict on a limit turns between met and not met, for a fixed water level"
                + " downstream. With a fixed level a flume or weir can be drowned at low flow and free above it, so that"
                + " the direction is stated.");
        sheet.note(
                "As issued: each flow was found by reruns of the whole calculation with the entries as issued, and does"
                        + " not follow a changed entry. The margin beside it is live: zero while the flow stands for the limit; any"
                        + " other margin, once an entry is changed, says that the flow no longer does. Where the margin jumps, as"
                        + " published ratings do where they join, it is not zero.");
        sheet.note(
                "Every flow found is a case of its own at the right of each calculation sheet of the workbook; no"
                        + " summary counts it. Where a flow was found for several levels it stands once, with the level of the first.");
        found.notes().forEach(sheet::note);
        sheet.gap();
    }

    /** The live results at each flow, and what is not reached. */
    void lay(Design design, StationLayout station) {
        if (found.cases().isEmpty()) {
            sheet.heading("Flows found");
            sheet.note("none");
            sheet.gap();
        } else {
            sheet.gap();
            results(design, station);
        }
        notReached();
    }

    private void results(Design design, StationLayout station) {
        Cells cells = station.cells();
        Unit length = cells.unit(Dimension.LENGTH);
        Unit report = design.project().headUnit();
        @Nullable String top = top(design, station);
        TableDraft table = sheet.table(
                "What holds at these flows, live",
                List.of(
                        new Block.Column("Case", 10, Block.Align.LEFT),
                        new Block.Column("Element", 9, Block.Align.LEFT),
                        new Block.Column("Limit", 40, Block.Align.LEFT),
                        new Block.Column("Verdict", 22, Block.Align.LEFT),
                        new Block.Column("Margin", 12, Block.Align.RIGHT),
                        new Block.Column("Head at the gauge [" + length + "]", 12, Block.Align.RIGHT),
                        new Block.Column("Head at the gauge [" + report + "]", 12, Block.Align.RIGHT),
                        new Block.Column("State of flow", 9, Block.Align.LEFT),
                        new Block.Column(
                                (top == null ? "Level upstream" : "Level upstream of " + top) + " [" + length + "]",
                                12,
                                Block.Align.RIGHT),
                        new Block.Column("Standing of the level", 22, Block.Align.LEFT)));
        int first = station.columns().count() - found.cases().size();
        for (int i = 0; i < found.cases().size(); i++) {
            FoundCase one = found.cases().get(i);
            int column = first + i;
            LimitResult limit = station.limits().get(one.limit());
            Cell verdict = limit.verdicts().get(column);
            Cell head = offered(station, one.tag(), "head at the gauge", column);
            List<Block.Item> row = new ArrayList<>(List.of(
                    new Block.Jump(station.columns().names().get(column), verdict),
                    new Block.Text(one.tag()),
                    new Block.Text(one.label()),
                    shown(cells, table, 3, verdict),
                    shown(cells, table, 4, limit.margins().get(column)),
                    shown(cells, table, 5, head)));
            row.add(
                    head == null
                            ? new Block.Text("-")
                            : new Block.Content(cells.factors().toReport(table.place(6), "h", head, report)));
            row.add(shown(cells, table, 7, offered(station, one.tag(), "state of flow", column)));
            row.add(shown(cells, table, 8, top == null ? null : offered(station, top, "water level", column)));
            row.add(shown(cells, table, 9, standing(station, top, column)));
            table.add(row);
        }
        sheet.gap();
    }

    private static Block.Item shown(Cells cells, TableDraft table, int column, @Nullable Cell cell) {
        return cell == null ? new Block.Text("-") : new Block.Content(cells.same(table.place(column), "", cell));
    }

    /** The uppermost element that gives a water level, or null. */
    private static @Nullable String top(Design design, StationLayout station) {
        @Nullable String top = null;
        for (Design.Element element : design.elements()) {
            if (station.method(element.tag()).gives().containsKey("water level")) {
                top = element.tag();
            }
        }
        return top;
    }

    private static @Nullable Cell standing(StationLayout station, @Nullable String top, int column) {
        List<Cell> standings = top == null ? List.of() : CaseResults.standings(station, top);
        return standings.isEmpty() ? null : standings.get(column);
    }

    private static @Nullable Cell offered(StationLayout station, String tag, String role, int column) {
        String symbol = station.method(tag).gives().get(role);
        return symbol == null ? null : station.cases(tag).get(column).cell(symbol);
    }

    private void notReached() {
        if (found.notReached().isEmpty()) {
            sheet.heading("Limits whose verdict does not turn");
            sheet.note("none");
            return;
        }
        TableDraft table = sheet.table(
                "Limits whose verdict does not turn at any flow searched, as issued",
                List.of(
                        new Block.Column("Element", 10, Block.Align.LEFT),
                        new Block.Column("", 9, Block.Align.LEFT),
                        new Block.Column("Limit", 40, Block.Align.LEFT),
                        new Block.Column("Verdict", 22, Block.Align.LEFT),
                        new Block.Column("Under", 12, Block.Align.LEFT)));
        for (FoundFlows.NotReached one : found.notReached()) {
            table.add(List.of(
                    new Block.Text(one.tag()),
                    new Block.Text(""),
                    new Block.Text(one.label()),
                    new Block.Text(one.outcome()),
                    new Block.Text(one.conditions())));
        }
        sheet.gap();
    }
}
