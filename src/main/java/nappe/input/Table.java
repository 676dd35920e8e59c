package nappe.input;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.NavigableMap;
import org.jspecify.annotations.Nullable;

/** A table of one sheet: a row of head words and what stands in the rows below it. */
final class Table {
    /** One row, its fields by head word. */
    final class Row {
        private final int index;

        private Row(int index) {
            this.index = index;
        }

        Field field(String head) {
            Integer column = columns.get(head);
            if (column == null) {
                throw new IllegalArgumentException("no column " + head);
            }
            RawSheet.Merge merge = sheet.over(index, column);
            return new Field(
                    sheet.name(),
                    RawCell.address(index, column),
                    sheet.cell(index, column),
                    merge == null ? "" : merge.toString());
        }
    }

    private final RawSheet sheet;
    private final int headRow;
    private final Map<String, Integer> columns;
    private final int end;

    private Table(RawSheet sheet, int headRow, Map<String, Integer> columns, int end) {
        this.sheet = sheet;
        this.headRow = headRow;
        this.columns = columns;
        this.end = end;
    }

    /** The table whose head row has all the words; where it is missing or incomplete that is a fault, and null. */
    static @Nullable Table find(RawSheet sheet, List<String> heads, Faults faults) {
        int best = 0;
        int headRow = -1;
        for (Map.Entry<Integer, NavigableMap<Integer, RawCell>> row : sheet.rows().entrySet()) {
            int matches = (int) heads.stream()
                    .filter(head -> row.getValue().values().stream().anyMatch(c -> word(c).equals(key(head))))
                    .count();
            if (matches > best) {
                best = matches;
                headRow = row.getKey();
            }
        }
        if (best < Math.min(2, heads.size())) {
            faults.add(sheet.name(), null, "head-row-missing", "there is no head row; write a row with the words "
                    + String.join(" | ", heads) + " above the entries");
            return null;
        }
        return at(sheet, headRow, heads, faults);
    }

    private static @Nullable Table at(RawSheet sheet, int headRow, List<String> heads, Faults faults) {
        Map<String, Integer> columns = new LinkedHashMap<>();
        boolean whole = true;
        for (String head : heads) {
            List<RawCell> cells = sheet.rows().getOrDefault(headRow, new java.util.TreeMap<>()).values().stream()
                    .filter(c -> word(c).equals(key(head)))
                    .toList();
            if (cells.isEmpty()) {
                faults.add(sheet.name(), null, "head-word-missing", "the head row " + (headRow + 1)
                        + " has no column \"" + head + "\"; write that word above its column");
                whole = false;
            } else if (cells.size() > 1) {
                faults.add(sheet.name(), cells.get(1).address(), "head-word-twice", "the head row has two columns \""
                        + head + "\"; remove one");
                whole = false;
            } else {
                columns.put(head, cells.get(0).column());
            }
        }
        return whole ? new Table(sheet, headRow, columns, Integer.MAX_VALUE) : null;
    }

    /** Whether a sheet has a table with these head words. */
    static boolean looksLike(RawSheet sheet, List<String> heads) {
        return sheet.rows().values().stream().anyMatch(row -> heads.stream()
                .allMatch(head -> row.values().stream().anyMatch(c -> word(c).equals(key(head)))));
    }

    /** The same table, ending above the head row of another. */
    Table above(@Nullable Table other) {
        return other == null ? this : new Table(sheet, headRow, columns, other.headRow);
    }

    String sheet() {
        return sheet.name();
    }

    /** Texts of the head row that start with a tag and a point: {@code F1.h_g}. */
    List<RawCell> headCells() {
        NavigableMap<Integer, RawCell> row = sheet.rows().get(headRow);
        return row == null ? List.of() : List.copyOf(row.values());
    }

    /**
     * The rows with something typed; what is typed where nobody can see it is a fault.
     *
     * @param prefilled columns that hold something in an unused row
     */
    List<Row> rows(List<String> prefilled, Faults faults) {
        List<Row> rows = new ArrayList<>();
        for (NavigableMap<Integer, RawCell> cells : sheet.rows().subMap(headRow, false, end, false).values()) {
            List<RawCell> typed = columns.entrySet().stream()
                    .filter(e -> !prefilled.contains(e.getKey()))
                    .map(e -> cells.get(e.getValue()))
                    .filter(c -> c != null && !c.isBlank())
                    .toList();
            if (!typed.isEmpty()) {
                int index = typed.get(0).row();
                rows.add(new Row(index));
                for (RawCell cell : typed) {
                    refuseUnseen(cell, faults);
                }
            }
        }
        return rows;
    }

    private void refuseUnseen(RawCell cell, Faults faults) {
        RawSheet.Merge merge = sheet.over(cell.row(), cell.column());
        String what = null;
        if (merge != null) {
            what = "it is covered by the merged cells " + merge + "; split them";
        } else if (sheet.hiddenRows.get(cell.row())) {
            what = "row " + (cell.row() + 1) + " is hidden; show it";
        } else if (sheet.hiddenColumns.get(cell.column())) {
            what = "its column is hidden; show it";
        }
        if (what != null) {
            faults.add(sheet.name(), cell.address(), "entry-unseen",
                    Shown.quoted(cell.text()) + " can't be seen: " + what + " and check what stands there");
        }
    }

    private static String word(RawCell cell) {
        return cell.kind() == RawCell.Kind.TEXT && cell.text().length() < 100 ? key(cell.text()) : "";
    }

    private static String key(String text) {
        return text.replaceAll("[\\p{Z}\\s]+", " ").strip().toLowerCase(Locale.ROOT);
    }
}
