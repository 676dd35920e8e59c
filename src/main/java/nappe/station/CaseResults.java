package nappe.station;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Cell;
import nappe.method.MethodSheet;
import nappe.unit.Unit;

/** What an element has to show for a case where cases stand side by side: by role, so that no device is known by name. */
final class CaseResults {
    private static final List<String> ROLES = List.of("state of flow", RatingCurve.GAUGE_HEAD, "water level");

    private CaseResults() {}

    /** A result with its role and its cells, one per column of the calculation. */
    record Row(String role, List<Cell> cells) {
        /** What it is called beside levels downstream. */
        String label() {
            return role.equals("water level") ? "water level upstream" : role;
        }

        Unit unit() {
            return cells.get(0).unit();
        }
    }

    /** The results that the element offers, in a fixed order. */
    static List<Row> of(StationLayout station, String tag) {
        MethodSheet method = station.method(tag);
        List<Row> rows = new ArrayList<>();
        for (String role : ROLES) {
            String symbol = method.gives().get(role);
            if (symbol != null) {
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
