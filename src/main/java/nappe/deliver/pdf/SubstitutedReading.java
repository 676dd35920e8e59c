package nappe.deliver.pdf;

import java.util.List;
import nappe.calculation.Cell;
import nappe.calculation.Reference;
import nappe.calculation.Run;
import nappe.formula.Formula;
import nappe.formula.Value;
import nappe.results.Digits;
import nappe.results.Results;

/** The typeset reading with the numbers and units of the referenced cells in place of symbols. */
final class SubstitutedReading {
    /** Digits beyond those of a result, so that a hand calculation from the printed numbers gives the printed result. */
    private static final int EXTRA = 2;

    private final Results results;

    SubstitutedReading(Results results) {
        this.results = results;
    }

    /** The formula of a live cell with the numbers it was evaluated with. */
    Inline of(Cell cell, Formula formula) {
        return TypesetReading.with(name -> number(cell, name), formula);
    }

    private Inline number(Cell cell, String name) {
        Reference reference = cell.references().get(name);
        if (reference instanceof Run run) {
            return Inline.of(Inline.ATOM, List.of(Piece.whole(Links.unquoted(run.from(cell.place().sheet())))));
        }
        return reference instanceof Cell other ? number(other) : TypesetReading.name(name);
    }

    private Inline number(Cell cell) {
        Value value = results.value(cell);
        if (value instanceof Value.Number number) {
            return Inline.number(digits(cell, number.value()), cell.unit().text());
        }
        return value instanceof Value.Word word
                ? Inline.text("“" + word.text() + "”")
                : Inline.text("(" + ((Value.None) value).why() + ")");
    }

    private static String digits(Cell cell, double value) {
        return cell.kind() == Cell.Kind.FORMULA
                ? Digits.print(value, Math.min(12, Digits.decimals(cell.unit(), value) + EXTRA))
                : Digits.asTyped(value);
    }
}
