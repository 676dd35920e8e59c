package nappe.job;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import nappe.formula.Formula;
import nappe.source.CsvText;
import nappe.source.TextException;
import nappe.source.TextLibrary;
import nappe.unit.Unit;

/**
 * One check value, as read from CSV with the head {@code
 * id,method,entries,target,expected,unit,tolerance,source,kind,note}.
 *
 * @param entries {@code size = "3 ft"; h = 2 ft}, by symbol
 * @param tolerance {@code 0.1 %} of the expected value, or {@code 0.005 abs} in the unit of the row
 * @param kind published, library, derived or memory
 * @param house the name of the house whose own check value it is; empty for one that comes with Nappe
 */
public record CheckRow(
        String id,
        String method,
        String entriesText,
        Map<String, Formula> entries,
        String target,
        double expected,
        Unit unit,
        String tolerance,
        String source,
        String kind,
        String note,
        String house) {

    private static final String LEFT_OUT = "left-out.csv";

    /** How far the computed value may be off, in the unit of the row. */
    public double slack() {
        String[] parts = tolerance.split(" ");
        double size = Double.parseDouble(parts[0]);
        return parts[1].equals("%") ? Math.abs(expected) * size / 100 : size;
    }

    /** Who stands behind the row and how: {@code derived}, {@code derived (house row)}. */
    public String standing() {
        return house.isEmpty() ? kind : kind + " (house row)";
    }

    /**
     * The check values of a library: every file in {@code checks}, except the list of those that are left out.
     *
     * @throws TextException with the faults of the first file that has any
     */
    public static List<CheckRow> builtIn(TextLibrary library) {
        List<CheckRow> rows = new ArrayList<>();
        library.names("checks").forEach(file -> rows.addAll(of(library, file)));
        return rows;
    }

    /**
     * The check values of one file of a library, such as {@code parshall-flume.csv}; none where there is no such file.
     *
     * @throws TextException with all faults of the file
     */
    public static List<CheckRow> of(TextLibrary library, String file) {
        String path = "checks/" + file;
        String text = file.equals(LEFT_OUT) || !file.endsWith(".csv") ? null : library.text(path);
        return text == null ? List.of() : new CheckReader(library.shown(path), library.house(path), text).rows();
    }

    /** The rows of {@code checks/left-out.csv} for a method that are known to disagree: id and why. */
    public static List<List<String>> knownToBeOff(TextLibrary library, String method) {
        String text = library.text("checks/" + LEFT_OUT);
        if (text == null) {
            return List.of();
        }
        List<CsvText.Row> rows = CsvText.of(LEFT_OUT, text).rows();
        List<String> head = texts(rows.get(0));
        return rows.stream()
                .skip(1)
                .map(CheckRow::texts)
                .filter(row -> row.get(head.indexOf("method")).equals(method)
                        && row.get(head.indexOf("why")).contains("known to be off"))
                .map(row -> List.of(row.get(head.indexOf("id")), row.get(head.indexOf("why"))))
                .toList();
    }

    private static List<String> texts(CsvText.Row row) {
        return row.cells().stream().map(CsvText.Cell::text).toList();
    }

    /**
     * Reads check values of a file that the user named.
     *
     * @throws TextException with all faults by line and column
     */
    public static List<CheckRow> read(String file, String text) {
        return new CheckReader(file, "", text).rows();
    }
}
