package nappe.solve;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.calculation.Cell;
import nappe.calculation.Reference;
import nappe.calculation.Run;
import nappe.formula.Formula;
import nappe.formula.NumberReading;
import nappe.formula.Value;
import nappe.unit.Unit;

/**
 * Evaluates cells in their order. A cell first passes on the words of what its formula needs as a number, by the rule of
 * {@link Cell#guards} that the workbook's formulas follow too.
 */
public final class Evaluation {
    private final Map<Cell, Value> values = new IdentityHashMap<>();
    private final Map<Cell, Value> before;

    private Evaluation(Map<Cell, Value> before) {
        this.before = before;
    }

    /**
     * @param cells each after all that it refers to
     * @return the value of each cell, by identity
     */
    public static Map<Cell, Value> of(List<Cell> cells) {
        return again(Map.of(), Map.of(), cells);
    }

    /**
     * The same as if other values had been typed into some cells.
     *
     * @param typedAnew what stands in these typed cells instead; a number where a number was, a word where a word was
     */
    public static Map<Cell, Value> of(List<Cell> cells, Map<Cell, Value> typedAnew) {
        return again(
                Map.of(),
                typedAnew,
                cells.stream().filter(cell -> !typedAnew.containsKey(cell)).toList());
    }

    /**
     * Evaluates cells once more, where some others hold other values than before.
     *
     * @param before the values of all cells that are neither changed nor evaluated
     * @param changed what some cells hold now
     * @param cells those that rest on the changed ones, each after all that it refers to
     * @return the value of each changed and each evaluated cell, by identity
     */
    public static Map<Cell, Value> again(Map<Cell, Value> before, Map<Cell, Value> changed, List<Cell> cells) {
        Evaluation evaluation = new Evaluation(before);
        evaluation.values.putAll(changed);
        cells.forEach(cell -> evaluation.values.put(cell, evaluation.value(cell)));
        return evaluation.values;
    }

    /** Of the cells, those that rest on one, directly or through others, in the same order. */
    public static List<Cell> restingOn(Cell one, List<Cell> cells) {
        Set<Cell> moved = Collections.newSetFromMap(new IdentityHashMap<>());
        moved.add(one);
        List<Cell> resting = new ArrayList<>();
        for (Cell cell : cells) {
            boolean rests = cell.references().values().stream()
                    .anyMatch(reference -> reference instanceof Run run
                            ? run.cells().stream().anyMatch(moved::contains)
                            : reference instanceof Cell other && moved.contains(other));
            if (rests) {
                moved.add(cell);
                resting.add(cell);
            }
        }
        return resting;
    }

    /** Of the cells, those that the targets rest on, directly or through others, and the targets, in the same order. */
    public static List<Cell> leadingTo(Collection<Cell> targets, List<Cell> cells) {
        Set<Cell> wanted = Collections.newSetFromMap(new IdentityHashMap<>());
        wanted.addAll(targets);
        List<Cell> leading = new ArrayList<>();
        for (int i = cells.size() - 1; i >= 0; i--) {
            if (wanted.contains(cells.get(i))) {
                leading.add(cells.get(i));
                for (Reference reference : cells.get(i).references().values()) {
                    wanted.addAll(reference instanceof Run run ? run.cells() : List.of((Cell) reference));
                }
            }
        }
        Collections.reverse(leading);
        return leading;
    }

    private Value value(Cell cell) {
        Formula formula = cell.formula();
        if (formula == null) {
            return java.util.Objects.requireNonNull(cell.typed());
        }
        for (Cell needed : cell.guards()) {
            Value there = known(needed);
            if (!(there instanceof Value.Number)) {
                return there instanceof Value.Word word ? new Value.None(word.text()) : there;
            }
        }
        return NumberReading.of(formula, new Seen(cell));
    }

    private Value known(Cell cell) {
        Value value = values.get(cell);
        if (value == null) {
            value = before.get(cell);
        }
        if (value == null) {
            throw new IllegalStateException(cell + " is referred to before it is evaluated");
        }
        return value;
    }

    /** What a cell's formula sees. */
    private final class Seen implements NumberReading.Values {
        private final Cell cell;

        Seen(Cell cell) {
            this.cell = cell;
        }

        @Override
        public Value of(String symbol) {
            if (cell.references().get(symbol) instanceof Cell one) {
                return known(one);
            }
            throw new IllegalStateException(cell + " does not know " + symbol);
        }

        @Override
        public List<Value> column(String symbol) {
            if (cell.references().get(symbol) instanceof Run run) {
                return run.cells().stream().map(Evaluation.this::known).toList();
            }
            throw new IllegalStateException(cell + " does not know the column " + symbol);
        }

        @Override
        public double size(Unit unit) {
            Reference factor = cell.references().get("1 " + unit.text());
            return factor instanceof Cell one && known(one) instanceof Value.Number number ? number.value() : 1;
        }
    }
}
