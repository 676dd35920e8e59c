package nappe.station;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Cell;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.unit.Unit;

/** What an element has to show for a case where cases stand side by side: by role, so that no device is known by name. */
final class CaseResults {
    private static final List<String> ROLES = List.of("state of flow", RatingCurve.GAUGE_HEAD, "water level");
    private static final List<String> ALL_ROLES = List.of(
            "state of flow",
            "measurement",
            "reason",
            RatingCurve.GAUGE_HEAD,
            "water level",
            "standing of the level",
            "energy level");
    private static final List<String> IN_WORDS =
            List.of("state of flow", "measurement", "reason", "standing of the level");

    private CaseResults() {}

    /** A result with its role and its cells, one per column of the calculation. */
    record Row(String role, List<Cell> cells) {
        /** What it is called beside levels downstream. */
        String label() {
            return role.equals("water level") ? "water level upstream" : role;
        }

        /** Whether it is told in words. */
        boolean isWords() {
            return IN_WORDS.contains(role);
        }

        Unit unit() {
            return cells.get(0).unit();
        }
    }

    /** The results that the element offers, in a fixed order. */
    static List<Row> of(StationLayout station, String tag) {
        return of(station, tag, ROLES);
    }

    /** All that an element offers to a reader. */
    static List<Row> inFull(StationLayout station, String tag) {
        return of(station, tag, ALL_ROLES);
    }

    private static List<Row> of(StationLayout station, String tag, List<String> roles) {
        MethodSheet method = station.method(tag);
        List<Row> rows = new ArrayList<>();
        for (String role : roles) {
            String symbol = method.gives().get(role);
            boolean passedOn = symbol != null && method.item(symbol) instanceof Item.Given;
            if (symbol != null && !passedOn) {
                rows.add(new Row(
                        role,
                        station.cases(tag).stream()
                                .map(scope -> scope.cell(symbol))
                                .toList()));
            }
        }
        return rows;
    }
}
