package nappe.deliver.xlsx;

import java.util.stream.Stream;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.formula.Formula;
import nappe.formula.PlainReading;

/** The formula of a line or a cell as text in symbols, or what is said in its place. */
final class EquationText {
    private EquationText() {}

    /** What the layout says in place of a formula, or the formula itself. */
    static String of(Block.Line line) {
        Cell cell = Stream.concat(Stream.ofNullable(line.forAll()), line.perCase().stream())
                .findFirst()
                .orElse(null);
        Formula formula = cell == null ? null : cell.formula();
        if (formula == null) {
            return line.equation();
        }
        String text = PlainReading.of(formula);
        boolean itself = line.equation().isEmpty() || line.equation().equals(text);
        return itself ? PlainReading.of(line.symbol(), formula) : line.equation();
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
                    case FORMULA -> "";
                };
    }
}
