package nappe.results;

import java.util.List;
import java.util.Map;
import nappe.calculation.Cell;
import nappe.calculation.Sheet;
import nappe.formula.Value;

/**
 * The cells of a calculation with their values, on the sheets of the package.
 *
 * @param cells in the order of evaluation
 * @param figures by the key of their block
 */
public record Results(
        Furniture furniture,
        List<Sheet> sheets,
        List<Cell> cells,
        Map<Cell, Value> values,
        Map<String, Figure> figures) {
    /** Results without figures. */
    public Results(Furniture furniture, List<Sheet> sheets, List<Cell> cells, Map<Cell, Value> values) {
        this(furniture, sheets, cells, values, Map.of());
    }

    /** The value of a cell. */
    public Value value(Cell cell) {
        Value value = values.get(cell);
        if (value == null) {
            throw new IllegalArgumentException("no value for " + cell);
        }
        return value;
    }
}
