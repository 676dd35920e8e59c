package nappe.deliver.xlsx;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Cell;
import nappe.calculation.Reference;
import nappe.calculation.Run;
import nappe.calculation.Sureness;
import nappe.formula.Formula;
import nappe.formula.Guard;
import nappe.formula.NumberReading;
import nappe.formula.Value;
import nappe.unit.Unit;

/** Values of hand-made cells in their order, by the number reading and the rule of guards. */
final class Evaluated {
    private Evaluated() {}

    static Map<Cell, Value> of(List<Cell> cells) {
        Map<Cell, Value> values = new HashMap<>();
        for (Cell cell : cells) {
            values.put(cell, value(cell, values));
        }
        return values;
    }

    private static Value value(Cell cell, Map<Cell, Value> values) {
        Formula formula = cell.formula();
        Value typed = cell.typed();
        if (formula == null) {
            return java.util.Objects.requireNonNull(typed);
        }
        for (String symbol : Guard.guarded(formula)) {
            if (cell.references().get(symbol) instanceof Cell other
                    && other.sureness() != Sureness.SURE
                    && !(values.get(other) instanceof Value.Number)) {
                return values.get(other);
            }
        }
        return NumberReading.of(formula, new NumberReading.Values() {
            @Override
            public Value of(String symbol) {
                Reference reference = cell.references().get(symbol);
                return values.get((Cell) java.util.Objects.requireNonNull(reference, symbol));
            }

            @Override
            public List<Value> column(String symbol) {
                Run run =
                        (Run) java.util.Objects.requireNonNull(cell.references().get(symbol), symbol);
                return run.cells().stream().map(values::get).toList();
            }

            @Override
            public double size(Unit unit) {
                return cell.references().get("1 " + unit.text()) instanceof Cell size
                                && values.get(size) instanceof Value.Number number
                        ? number.value()
                        : 1;
            }
        });
    }
}
