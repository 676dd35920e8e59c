package nappe.station;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Cell;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.unit.Unit;

/** What an element has to show for a case where cases stand side by side: by role, so that no device is known by name. */
final class CaseResults {
    private static final String STANDING = "standing of the level";
    private static final List<String> ROLES = List.of("state of flow", RatingCurve.GAUGE_HEAD, "water level", STANDING);
    private static final List<String> ALL_ROLES = List.of(
            "state of flow",
            "measurement",
            "reason",
            RatingCurve.GAUGE_HEAD,
            "water level",
            "energy level",
            STANDING,
            "remark");
    private static final List<String> IN_WORDS = List.of("state of flow", "measurement", "reason", STANDING, "remark");

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
        List<Row> rows = new ArrayList<>();
        for (String role : roles) {
            List<Cell> cells = cells(station, tag, role);
            if (!cells.isEmpty()) {
                rows.add(new Row(role, cells));
            }
        }
        return rows;
    }

    /** The standing of an element's levels, one per column; empty where no device below says it. */
    static List<Cell> standings(StationLayout station, String tag) {
        return cells(station, tag, STANDING);
    }

    /** A level that rests on a bound downstream is no surer than that: its standing is handed on from the device below. */
    private static List<Cell> cells(StationLayout station, String tag, String role) {
        List<String> tags = station.tags();
        for (int i = tags.indexOf(tag); i >= 0; i--) {
            MethodSheet method = station.method(tags.get(i));
            String symbol = method.gives().get(role);
            boolean passedOn = symbol != null && method.item(symbol) instanceof Item.Given;
            if (symbol != null && !passedOn) {
                return station.cases(tags.get(i)).stream()
                        .map(scope -> scope.cell(symbol))
                        .toList();
            }
            if (!role.equals(STANDING)) {
                break;
            }
        }
        return List.of();
    }
}
