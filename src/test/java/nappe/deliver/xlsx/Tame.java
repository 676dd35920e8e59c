package nappe.deliver.xlsx;

import java.util.List;
import java.util.Map;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.formula.Formula.Call;
import nappe.formula.Formula.Comparison;
import nappe.formula.Formula.Negation;
import nappe.formula.Formula.Numeral;
import nappe.formula.Formula.Operation;
import nappe.formula.Formula.Symbol;

/**
 * Whether a formula keeps away from all that spreadsheet programs do each in their own way: 0^0, a negative base under a
 * fraction, sums that cancel, a comparison on the edge, numbers huge or tiny. A small evaluator of its own, so that the
 * number reading has a second opinion.
 */
final class Tame {
    private final Map<String, Double> symbols;

    Tame(Map<String, Double> symbols) {
        this.symbols = symbols;
    }

    boolean is(Formula formula) {
        return Double.isFinite(value(formula));
    }

    /** The value, or NaN where it isn't tame. */
    double value(Formula formula) {
        double value = raw(formula);
        double size = Math.abs(value);
        return size >= 1e-5 && size <= 1e5 ? value : Double.NaN;
    }

    private double raw(Formula formula) {
        if (formula instanceof Numeral numeral) {
            return numeral.value();
        }
        if (formula instanceof Symbol symbol) {
            return symbols.getOrDefault(symbol.name(), Double.NaN);
        }
        if (formula instanceof Negation negation) {
            return -value(negation.of());
        }
        if (formula instanceof Operation operation) {
            return operation(operation, value(operation.left()), value(operation.right()));
        }
        return formula instanceof Call call ? call(call) : Double.NaN;
    }

    private static double operation(Operation operation, double a, double b) {
        double largest = Math.max(Math.abs(a), Math.abs(b));
        return switch (operation.operator()) {
            case PLUS -> Math.abs(a + b) < 0.05 * largest ? Double.NaN : a + b;
            case MINUS -> Math.abs(a - b) < 0.05 * largest ? Double.NaN : a - b;
            case TIMES -> a * b;
            case OVER -> a / b;
            case POWER -> Math.abs(b) > 12 || (a < 0 && b != Math.rint(b)) ? Double.NaN : Math.pow(a, b);
        };
    }

    private double call(Call call) {
        List<Formula> arguments = call.arguments();
        double x = call.function() == nappe.formula.Function.IF ? 0 : value(arguments.get(0));
        return switch (call.function()) {
            case IF -> choice(arguments);
            case SQRT -> Math.sqrt(x);
            case EXP -> Math.exp(x);
            case LN -> Math.abs(x - 1) < 0.05 ? Double.NaN : Math.log(x);
            case LOG10 -> Math.abs(x - 1) < 0.05 ? Double.NaN : Math.log10(x);
            case SIN -> awayFromZero(x, Math.sin(x));
            case COS -> awayFromZero(x, Math.cos(x));
            case TAN -> Math.abs(Math.cos(x)) < 0.05 ? Double.NaN : awayFromZero(x, Math.tan(x));
            case ASIN -> Math.abs(x) > 0.95 ? Double.NaN : Math.asin(x);
            case ACOS -> Math.abs(x) > 0.95 ? Double.NaN : Math.acos(x);
            case ATAN -> Math.atan(x);
            case TANH -> Math.tanh(x);
            case ABS -> Math.abs(x);
            case MIN -> Math.min(x, value(arguments.get(1)));
            case MAX -> Math.max(x, value(arguments.get(1)));
            default -> Double.NaN;
        };
    }

    private static double awayFromZero(double x, double value) {
        return Math.abs(x) > 50 || Math.abs(value) < 0.05 ? Double.NaN : value;
    }

    private double choice(List<Formula> arguments) {
        Comparison comparison = (Comparison) arguments.get(0);
        double a = value(comparison.left());
        double b = value(comparison.right());
        double yes = value(arguments.get(1));
        double no = value(arguments.get(2));
        if (!(Math.abs(a - b) > 1e-3 * Math.abs(b)) || Double.isNaN(yes) || Double.isNaN(no)) {
            return Double.NaN;
        }
        return holds(comparison.comparator(), a, b) ? yes : no;
    }

    private static boolean holds(Comparator comparator, double a, double b) {
        return switch (comparator) {
            case AT_MOST, BELOW -> a < b;
            case AT_LEAST, ABOVE -> a > b;
            case EQUAL -> false;
            case UNLIKE -> true;
        };
    }
}
