package nappe.station;

import static nappe.station.Sources.unitText;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;

/** Lays the design years side by side, a table for each averaging period that occurs in more years than one. */
final class YearsSheet {
    private static final int SIDE_BY_SIDE = 5;

    private final Design design;
    private final StationLayout station;
    private final SheetDraft sheet;

    YearsSheet(Design design, StationLayout station, SheetDraft sheet) {
        this.design = design;
        this.station = station;
        this.sheet = sheet;
    }

    /** Whether there is something to lay side by side. */
    static boolean isNeeded(Design design) {
        return families(design).values().stream().anyMatch(family -> isInYears(design, family));
    }

    void lay() {
        List<String> alone = new ArrayList<>();
        sheet.note(
                "Cases of one averaging period, in the order of their design years as typed. All numbers are those of the"
                        + " sheets of the cases and of the elements.");
        families(design).forEach((period, family) -> {
            if (isInYears(design, family)) {
                lay(period, family);
            } else {
                family.forEach(c -> alone.add(design.cases().get(c).name()));
            }
        });
        if (!alone.isEmpty()) {
            sheet.note("Not here, since their averaging period is typed for one design year or none: "
                    + String.join("; ", alone) + ".");
        }
    }

    private void lay(String period, List<Integer> family) {
        for (int from = 0; from < family.size(); from += SIDE_BY_SIDE) {
            List<Integer> part = family.subList(from, Math.min(family.size(), from + SIDE_BY_SIDE));
            List<Block.Column> columns = new ArrayList<>(List.of(
                    new Block.Column("Quantity", 34, Block.Align.LEFT), new Block.Column("Unit", 8, Block.Align.LEFT)));
            for (int c : part) {
                Design.FlowCase one = design.cases().get(c);
                columns.add(new Block.Column(one.year() + ": " + one.name(), 18, Block.Align.RIGHT));
            }
            TableDraft table = sheet.table("Averaging period: " + period + (from == 0 ? "" : ", continued"), columns);
            row(table, "flow of the case", part, station.cases().flows());
            if (!design.project().flowUnit().equals(station.cases().flow(0).unit())) {
                row(table, "the same", part, station.cases().reported());
            }
            row(table, "units in service", part, station.cases().units());
            row(table, "flow through one unit", part, station.cases().flowsThroughOne());
            row(table, "water level downstream", part, station.cases().levels());
            for (Design.Element element : design.elements()) {
                for (CaseResults.Row result : CaseResults.of(station, element.tag())) {
                    row(table, element.tag() + "  " + result.label(), part, result.cells());
                }
            }
            sheet.gap();
        }
    }

    private static void row(TableDraft table, String what, List<Integer> part, List<Cell> cells) {
        List<Block.Item> items = new ArrayList<>(List.of(
                new Block.Text(what), new Block.Text(unitText(cells.get(0).unit()))));
        part.forEach(c -> items.add(new Block.Content(cells.get(c))));
        table.add(items);
    }

    /** The cases with a design year by their averaging period, each family in the order in which the years first occur. */
    private static Map<String, List<Integer>> families(Design design) {
        List<Design.FlowCase> cases = design.cases();
        List<String> years = years(design);
        Map<String, List<Integer>> families = new LinkedHashMap<>();
        for (Design.FlowCase one : cases) {
            families.putIfAbsent(period(one), new ArrayList<>());
        }
        for (String year : years) {
            for (int c = 0; c < cases.size(); c++) {
                if (cases.get(c).year().equals(year)) {
                    java.util.Objects.requireNonNull(families.get(period(cases.get(c))))
                            .add(c);
                }
            }
        }
        return families;
    }

    private static List<String> years(Design design) {
        return design.cases().stream()
                .map(Design.FlowCase::year)
                .filter(year -> !year.isEmpty())
                .distinct()
                .toList();
    }

    private static String period(Design.FlowCase one) {
        return one.period().isEmpty() ? "not stated" : one.period();
    }

    private static boolean isInYears(Design design, List<Integer> family) {
        return family.stream().map(c -> design.cases().get(c).year()).distinct().count() > 1;
    }
}
