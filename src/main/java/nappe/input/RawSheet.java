package nappe.input;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.NavigableMap;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;

/** One sheet as the file holds it: its filled cells by row and column, both from 0. */
final class RawSheet {
    /** Cells shown as one; only the first holds an entry. */
    record Merge(int top, int left, int bottom, int right) {
        boolean hides(int row, int column) {
            return row >= top && row <= bottom && column >= left && column <= right && !(row == top && column == left);
        }

        @Override
        public String toString() {
            return RawCell.address(top, left) + ":" + RawCell.address(bottom, right);
        }
    }

    private final String name;
    private final boolean hidden;
    private final NavigableMap<Integer, NavigableMap<Integer, RawCell>> rows = new TreeMap<>();
    final List<Merge> merges = new ArrayList<>();
    final BitSet hiddenRows = new BitSet();
    final BitSet hiddenColumns = new BitSet();

    RawSheet(String name, boolean hidden) {
        this.name = name;
        this.hidden = hidden;
    }

    String name() {
        return name;
    }

    boolean isHidden() {
        return hidden;
    }

    NavigableMap<Integer, NavigableMap<Integer, RawCell>> rows() {
        return rows;
    }

    /** Adds a cell; false where there is one already. */
    boolean add(RawCell cell) {
        return rows.computeIfAbsent(cell.row(), r -> new TreeMap<>()).putIfAbsent(cell.column(), cell) == null;
    }

    @Nullable
    RawCell cell(int row, int column) {
        NavigableMap<Integer, RawCell> cells = rows.get(row);
        return cells == null ? null : cells.get(column);
    }

    /** The merged range under which the cell can't be seen, or null. */
    @Nullable
    Merge over(int row, int column) {
        return merges.stream().filter(m -> m.hides(row, column)).findFirst().orElse(null);
    }
}
