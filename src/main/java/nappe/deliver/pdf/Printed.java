package nappe.deliver.pdf;

import java.util.List;
import nappe.calculation.Cell;
import nappe.formula.Value;
import nappe.results.Digits;
import nappe.results.Results;

/** What is printed of a cell: a typed number with the digits it was typed with, a result rounded, or words. */
final class Printed {
    private Printed() {}

    /** The value without its unit. */
    static String value(Results results, Cell cell) {
        Value value = results.value(cell);
        if (value instanceof Value.Number number) {
            return cell.isComputed() ? Digits.print(cell.unit(), number.value()) : Digits.asTyped(number.value());
        }
        return value instanceof Value.Word word ? word.text() : ((Value.None) value).why();
    }

    static boolean isNumber(Results results, Cell cell) {
        return results.value(cell) instanceof Value.Number;
    }

    /** The value with its unit, where it is a number. */
    static List<Piece> withUnit(Results results, Cell cell) {
        String value = value(results, cell);
        return isNumber(results, cell) ? UnitPrint.after(value, cell.unit().text()) : List.of(Piece.plain(value));
    }
}
