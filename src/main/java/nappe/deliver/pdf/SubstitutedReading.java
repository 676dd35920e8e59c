package nappe.deliver.pdf;

import nappe.calculation.Cell;
import nappe.calculation.Reference;
import nappe.calculation.Run;
import nappe.formula.Formula;
import nappe.formula.Operator;
import nappe.formula.Renaming;
import nappe.formula.Value;
import nappe.results.Digits;
import nappe.results.Results;
import nappe.unit.Unit;

/** A formula with the numbers and units of the referenced cells in place of symbols, digits as printed. */
final class SubstitutedReading {
    /** Digits beyond those of a result, so that a hand calculation from the printed numbers gives the printed result. */
    private static final int EXTRA = 2;

    /** Whole numbers up to here are printed without decimals: they are exact as they stand. */
    private static final double LARGEST_WHOLE = 1e6;

    private final Results results;

    SubstitutedReading(Results results) {
        this.results = results;
    }

    /** The formula of a live cell with the numbers it was evaluated with in place of what it names. */
    Formula of(Cell cell, Formula formula) {
        return isConversion(cell, formula)
                ? converted(cell, (Formula.Operation) formula)
                : Renaming.ofNamed(formula, named -> value(cell, named));
    }

    /** Whether the formula only brings a typed number, which is in its own unit, into the working unit. */
    static boolean isConversion(Cell cell, Formula formula) {
        if (!(formula instanceof Formula.Operation operation)) {
            return false;
        }
        if (operation.operator() == Operator.PLUS) {
            return isConversion(cell, operation.left()) && operation.right() instanceof Formula.Symbol;
        }
        return operation.operator() == Operator.TIMES
                && operation.left() instanceof Formula.Symbol symbol
                && operation.right() instanceof Formula.Quantity quantity
                && quantity.value() == 1
                && cell.references().get(symbol.name()) instanceof Cell typed
                && typed.unit().equals(quantity.unit());
    }

    /** {@code 12 in * (0.0254 m / 1 in)}, with the zero of the scale where it has one. */
    private Formula converted(Cell cell, Formula.Operation formula) {
        if (formula.operator() == Operator.PLUS) {
            Formula scaled = converted(cell, (Formula.Operation) formula.left());
            return new Formula.Operation(Operator.PLUS, scaled, of(cell, formula.right()));
        }
        Formula.Quantity one = (Formula.Quantity) formula.right();
        Formula typed = of(cell, formula.left());
        if (!(cell.references().get("1 " + one.unit().text()) instanceof Cell factor)) {
            return typed;
        }
        Formula ratio = new Formula.Operation(Operator.OVER, value(factor), new Formula.Quantity(1, "1", one.unit()));
        return new Formula.Operation(Operator.TIMES, typed, ratio);
    }

    private Formula value(Cell cell, Formula named) {
        Reference reference = cell.references().get(key(named));
        if (reference instanceof Run run) {
            String address = Links.unquoted(run.from(cell.place().sheet()));
            return named instanceof Formula.Summary summary
                    ? new Formula.Summary(summary.kind(), address)
                    : new Formula.Symbol(address);
        }
        return reference instanceof Cell other && !(named instanceof Formula.Summary) ? value(other) : named;
    }

    /** References to a neighbour have a key of their own: {@code before x}. */
    private static String key(Formula named) {
        if (named instanceof Formula.Neighbour neighbour) {
            return (neighbour.before() ? "before " : "after ") + neighbour.name();
        }
        return named instanceof Formula.Symbol symbol ? symbol.name() : ((Formula.Summary) named).name();
    }

    private Formula value(Cell cell) {
        Value value = results.value(cell);
        if (value instanceof Value.Number number) {
            return number(digits(cell, number.value()), number.value(), cell.unit());
        }
        return value instanceof Value.Word word
                ? new Formula.Word(word.text())
                : new Formula.NoResult(((Value.None) value).why());
    }

    private static Formula number(String digits, double value, Unit unit) {
        return digits.startsWith("-")
                ? new Formula.Negation(new Formula.Quantity(-value, digits.substring(1), unit))
                : new Formula.Quantity(value, digits, unit);
    }

    private static String digits(Cell cell, double value) {
        boolean whole = value == Math.rint(value) && Math.abs(value) < LARGEST_WHOLE;
        return cell.isComputed() && !whole
                ? Digits.print(value, Math.min(12, Digits.decimals(cell.unit(), value) + EXTRA))
                : Digits.asTyped(value);
    }
}
