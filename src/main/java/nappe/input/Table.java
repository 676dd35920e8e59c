package nappe.input;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.NavigableMap;
import java.util.Objects;
import java.util.Set;
import java.util.TreeMap;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
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
            if (column == null && optional.contains(head)) {
                return new Field(sheet.name(), RawCell.address(index, 0), null, "");
            }
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

    private static final Pattern BLANKS = Pattern.compile("[\\p{Z}\\s]+");

    private final RawSheet sheet;
    private final int headRow;
    private final Map<String, Integer> columns;
    private final List<String> optional;
    private final int end;

    private Table(RawSheet sheet, int headRow, Map<String, Integer> columns, List<String> optional, int end) {
        this.sheet = sheet;
        this.headRow = headRow;
        this.columns = columns;
        this.optional = optional;
        this.end = end;
    }

    /** The table whose head row has all the words; where it is missing or incomplete that is a fault, and null. */
    static @Nullable Table find(RawSheet sheet, List<String> heads, Faults faults) {
        return find(sheet, heads, List.of(), faults);
    }

    /**
     * The same, with words that may be missing.
     *
     * @param optional the field of a missing column is blank
     */
    static @Nullable Table find(RawSheet sheet, List<String> heads, List<String> optional, Faults faults) {
        int best = 0;
        int headRow = -1;
        for (Map.Entry<Integer, NavigableMap<Integer, RawCell>> row :
                sheet.rows().entrySet()) {
            int matches = matches(row.getValue(), heads);
            if (matches > best) {
                best = matches;
                headRow = row.getKey();
            }
        }
        if (best < Math.min(2, heads.size())) {
            faults.add(
                    sheet.name(),
                    null,
                    "head-row-missing",
                    "there is no head row; write a row with the words " + String.join(" | ", heads)
                            + " above the entries");
            return null;
        }
        return at(sheet, headRow, heads, optional, faults);
    }

    private static @Nullable Table at(
            RawSheet sheet, int headRow, List<String> heads, List<String> optional, Faults faults) {
        Map<String, Integer> columns = new LinkedHashMap<>();
        Collection<RawCell> row =
                sheet.rows().getOrDefault(headRow, new TreeMap<>()).values();
        boolean whole = true;
        List<String> all = Stream.concat(heads.stream(), optional.stream()).toList();
        for (String head : all) {
            List<RawCell> cells =
                    row.stream().filter(c -> word(c).equals(key(head))).toList();
            if (cells.isEmpty() && optional.contains(head)) {
                whole &= !isMisspelt(sheet, row, head, all, faults);
            } else if (cells.isEmpty()) {
                faults.add(
                        sheet.name(),
                        null,
                        "head-word-missing",
                        "the head row " + (headRow + 1) + " has no column \"" + head
                                + "\"; write that word above its column");
                whole = false;
            } else if (cells.size() > 1) {
                faults.add(
                        sheet.name(),
                        cells.get(1).address(),
                        "head-word-twice",
                        "the head row has two columns \"" + head + "\"; remove one");
                whole = false;
            } else {
                columns.put(head, cells.get(0).column());
            }
        }
        return whole ? new Table(sheet, headRow, columns, optional, Integer.MAX_VALUE) : null;
    }

    /** What stands under a misspelt head of a column that may be missing would be lost in silence. */
    private static boolean isMisspelt(
            RawSheet sheet, Collection<RawCell> row, String head, List<String> all, Faults faults) {
        for (RawCell cell : row) {
            boolean known = all.stream().anyMatch(other -> word(cell).equals(key(other)));
            if (!known && !word(cell).isEmpty() && Near.to(cell.text(), List.of(head)) != null) {
                faults.add(
                        sheet.name(),
                        cell.address(),
                        "head-word-unknown",
                        Shown.quoted(cell.text()) + " is not a column of this sheet; did you mean " + head + "?");
                return true;
            }
        }
        return false;
    }

    /** Whether a sheet has a table with these head words. */
    static boolean looksLike(RawSheet sheet, List<String> heads) {
        return sheet.rows().values().stream().anyMatch(row -> matches(row, heads) == heads.size());
    }

    private static int matches(NavigableMap<Integer, RawCell> row, List<String> heads) {
        Set<String> words = row.values().stream().map(Table::word).collect(Collectors.toSet());
        return (int) heads.stream().map(Table::key).filter(words::contains).count();
    }

    /** The same table, ending above the head row of another. */
    Table above(@Nullable Table other) {
        return other == null ? this : new Table(sheet, headRow, columns, optional, other.headRow);
    }

    String sheet() {
        return sheet.name();
    }

    /** The cells of the head row, from the left. */
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
        BitSet told = new BitSet();
        for (NavigableMap<Integer, RawCell> cells :
                sheet.rows().subMap(headRow, false, end, false).values()) {
            List<RawCell> filled = columns.values().stream()
                    .map(cells::get)
                    .filter(c -> c != null && !c.isBlank())
                    .toList();
            List<RawCell> typed = columns.entrySet().stream()
                    .filter(e -> !prefilled.contains(e.getKey()))
                    .map(e -> cells.get(e.getValue()))
                    .filter(filled::contains)
                    .toList();
            if (!typed.isEmpty()) {
                rows.add(new Row(typed.get(0).row()));
                refuseCovered(filled, faults);
                refuseHidden(typed, told, faults);
            }
        }
        return rows;
    }

    private void refuseCovered(List<RawCell> filled, Faults faults) {
        for (RawCell cell : filled) {
            RawSheet.Merge merge = sheet.over(cell.row(), cell.column());
            if (merge != null) {
                refuseUnseen(cell, "it is covered by the merged cells " + merge + "; split them", faults);
            }
        }
    }

    /** Once for each row and each column; a row with nothing but its printed symbol or label may be hidden. */
    private void refuseHidden(List<RawCell> typed, BitSet told, Faults faults) {
        List<RawCell> entries = typed.stream().filter(c -> !isLabel(c.column())).toList();
        for (RawCell cell : entries) {
            if (sheet.hiddenRows.get(cell.row())) {
                refuseUnseen(cell, "row " + (cell.row() + 1) + " is hidden; show it", faults);
                return;
            }
            if (sheet.hiddenColumns.get(cell.column()) && !told.get(cell.column())) {
                told.set(cell.column());
                refuseUnseen(cell, "its column is hidden; show it", faults);
            }
        }
    }

    private boolean isLabel(int column) {
        boolean entries = columns.containsKey("Description") || columns.containsKey("Label");
        return entries
                && (Objects.equals(columns.get("Symbol"), column)
                        || Objects.equals(columns.get("Label"), column)
                        || Objects.equals(columns.get("Note"), column));
    }

    private void refuseUnseen(RawCell cell, String what, Faults faults) {
        faults.add(
                sheet.name(),
                cell.address(),
                "entry-unseen",
                cell.shown() + " can't be seen: " + what + " and check what stands there");
    }

    private static String word(RawCell cell) {
        return cell.kind() == RawCell.Kind.TEXT && cell.text().length() < 100 ? key(cell.text()) : "";
    }

    private static String key(String text) {
        return BLANKS.matcher(text).replaceAll(" ").strip().toLowerCase(Locale.ROOT);
    }
}
