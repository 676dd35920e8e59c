package nappe.deliver.pdf;

import java.util.List;
import nappe.calculation.Cell;
import nappe.calculation.Reference;
import nappe.calculation.Run;
import nappe.formula.Formula;
import nappe.formula.Operator;
import nappe.formula.Value;
import nappe.results.Digits;
import nappe.results.Results;
import nappe.unit.Unit;

/** The typeset reading with the numbers and units of the referenced cells in place of symbols. */
final class SubstitutedReading {
    /** Digits beyond those of a result, so that a hand calculation from the printed numbers gives the printed result. */
    private static final int EXTRA = 2;

    /** Whole numbers up to here are printed without decimals: they are exact as they stand. */
    private static final double LARGEST_WHOLE = 1e6;

    private final Results results;

    SubstitutedReading(Results results) {
        this.results = results;
    }

    /** The formula of a live cell with the numbers it was evaluated with. */
    Inline of(Cell cell, Formula formula) {
        if (isConversion(cell, formula)) {
            return converted(cell, (Formula.Operation) formula);
        }
        return TypesetReading.with(name -> number(cell, name), formula);
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

    /** {@code 12 in × (0.0254 m)/(1 in)}, with the zero of the scale where it has one. */
    private Inline converted(Cell cell, Formula.Operation formula) {
        if (formula.operator() == Operator.PLUS) {
            Inline scaled = converted(cell, (Formula.Operation) formula.left());
            return Inline.join(Inline.SUM, scaled, Inline.text(" + "), of(cell, formula.right()));
        }
        Unit unit = ((Formula.Quantity) formula.right()).unit();
        Inline typed = of(cell, formula.left());
        if (!(cell.references().get("1 " + unit.text()) instanceof Cell factor)) {
            return typed;
        }
        Inline ratio = Inline.join(
                Inline.PRODUCT,
                number(factor).bracketed(),
                Inline.text("/"),
                Inline.number("1", unit.text()).bracketed());
        return Inline.join(Inline.PRODUCT, typed, Inline.text(" × "), ratio);
    }

    private Inline number(Cell cell, String name) {
        Reference reference = cell.references().get(key(name));
        if (reference instanceof Run run) {
            String address = Links.unquoted(run.from(cell.place().sheet()));
            return Inline.of(Inline.ATOM, List.of(Piece.plain(address)));
        }
        return reference instanceof Cell other ? number(other) : TypesetReading.name(name);
    }

    /** References to a neighbour have a key of their own: {@code before x}. */
    private static String key(String name) {
        return name.replaceFirst("^(before|after)\\((.*)\\)$", "$1 $2");
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
        boolean whole = value == Math.rint(value) && Math.abs(value) < LARGEST_WHOLE;
        return cell.kind() == Cell.Kind.FORMULA && !whole
                ? Digits.print(value, Math.min(12, Digits.decimals(cell.unit(), value) + EXTRA))
                : Digits.asTyped(value);
    }
}
