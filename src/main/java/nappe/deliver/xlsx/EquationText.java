package nappe.deliver.xlsx;

import java.util.stream.Stream;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.formula.Formula;
import nappe.formula.PlainReading;
import org.jspecify.annotations.Nullable;

/** The formula of a line or a cell as text in symbols, or what is said in its place. */
final class EquationText {
    private EquationText() {}

    /** What the layout says in place of a formula, or the formula itself. */
    static String of(Block.Line line) {
        Formula formula = formula(line);
        return formula == null || isWords(line) ? line.equation() : PlainReading.of(line.symbol(), formula);
    }

    /** Whether the layout says something in place of the formula. */
    static boolean isWords(Block.Line line) {
        Formula formula = formula(line);
        return !line.equation().isEmpty()
                && (formula == null || !line.equation().equals(PlainReading.of(formula)));
    }

    private static @Nullable Formula formula(Block.Line line) {
        return Stream.concat(Stream.ofNullable(line.forAll()), line.perCase().stream())
                .findFirst()
                .map(Cell::formula)
                .orElse(null);
    }

    /** The formula of a cell; for a typed one what kind it is. */
    static String of(Cell cell) {
        Formula formula = cell.formula();
        return formula != null
                ? PlainReading.of(cell.symbol(), formula)
                : switch (cell.kind()) {
                    case ENTRY -> "entry";
                    case CONSTANT -> "constant";
                    case TABLE -> "cited table";
                    case RERUN -> "found by reruns, as issued";
                    case FORMULA -> "";
                };
    }
}
