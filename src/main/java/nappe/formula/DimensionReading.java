package nappe.formula;

import java.util.List;
import java.util.Map;
import java.util.function.Function;
import nappe.unit.Dimension;
import org.apache.commons.math3.fraction.Fraction;
import org.apache.commons.math3.fraction.FractionConversionException;

/**
 * What kind of thing a formula comes out as: a quantity of some dimension, words, or a condition. Refuses sums and
 * comparisons of unlike dimensions, exponents that are no plain number on a dimensional base, and functions of
 * dimensional arguments; the message says both sides and the remedy.
 */
public final class DimensionReading implements Reading<DimensionReading.Outcome> {
    /** What a formula comes out as. */
    public sealed interface Outcome {}

    public record Quantity(Dimension dimension) implements Outcome {}

    public record Words() implements Outcome {}

    public record Condition() implements Outcome {}

    /** {@code none()}: fits beside anything. */
    public record Anything() implements Outcome {}

    private static final Outcome PURE = new Quantity(Dimension.NONE);

    private final Function<String, Outcome> symbols;
    private final Map<Formula, Integer> offsets;

    /**
     * @param symbols the outcome of each symbol; it may throw a FormulaException without place for an unknown one
     * @param offsets of the nodes in the text, for the place of a fault; may be empty
     */
    public DimensionReading(Function<String, Outcome> symbols, Map<Formula, Integer> offsets) {
        this.symbols = symbols;
        this.offsets = offsets;
    }

    /** The dimension of a formula that must be a quantity. */
    public Dimension dimension(Formula formula) {
        Outcome outcome = formula.read(this);
        if (outcome instanceof Quantity quantity) {
            return quantity.dimension();
        }
        if (outcome instanceof Anything) {
            return Dimension.NONE;
        }
        throw fault(formula, "a number is needed here, and this is " + shown(outcome), "not-a-number");
    }

    /** Checks a formula that must be a condition. */
    public void condition(Formula formula) {
        if (!(formula.read(this) instanceof Condition)) {
            throw fault(formula, "a condition is needed here, such as h < 2 ft", "not-a-condition");
        }
    }

    @Override
    public Outcome numeral(Formula.Numeral numeral) {
        return PURE;
    }

    @Override
    public Outcome quantity(Formula.Quantity quantity) {
        if (quantity.unit().zeroInSi() != 0) {
            throw fault(quantity, quantity.unit() + " has a zero of its own; use K or degR in formulas", "unit-unfit");
        }
        return new Quantity(quantity.unit().dimension());
    }

    @Override
    public Outcome word(Formula.Word word) {
        return new Words();
    }

    @Override
    public Outcome symbol(Formula.Symbol symbol) {
        return known(symbol, symbol.name());
    }

    @Override
    public Outcome neighbour(Formula.Neighbour neighbour) {
        return known(neighbour, neighbour.name());
    }

    @Override
    public Outcome summary(Formula.Summary summary) {
        return known(summary, summary.name());
    }

    private Outcome known(Formula node, String name) {
        try {
            return symbols.apply(name);
        } catch (FormulaException e) {
            throw new FormulaException(
                    String.valueOf(e.getMessage()), offsets.getOrDefault(node, 0), name.length(), e.code());
        }
    }

    @Override
    public Outcome negation(Formula.Negation negation) {
        return new Quantity(dimension(negation.of()));
    }

    @Override
    public Outcome operation(Formula.Operation operation) {
        Dimension left = dimension(operation.left());
        Dimension right = dimension(operation.right());
        return switch (operation.operator()) {
            case TIMES -> new Quantity(left.times(right));
            case OVER -> new Quantity(left.over(right));
            case POWER -> power(operation, left, right);
            case PLUS, MINUS -> {
                boolean plus = operation.operator() == Operator.PLUS;
                yield alike(operation, operation.left(), operation.right(), plus ? "plus" : "minus");
            }
        };
    }

    private Outcome power(Formula.Operation operation, Dimension base, Dimension exponent) {
        if (!exponent.isNone()) {
            throw fault(
                    operation, "the exponent is " + exponent + "; an exponent is a pure number", "exponent-dimension");
        }
        if (base.isNone()) {
            return PURE;
        }
        Fraction fraction = plainNumber(operation.right());
        if (fraction == null) {
            throw fault(
                    operation,
                    base + " to a power that is not a plain number; divide by one of its unit first, as in (h/1 m)^n",
                    "power-of-dimension");
        }
        return new Quantity(base.power(fraction));
    }

    private static @org.jspecify.annotations.Nullable Fraction plainNumber(Formula exponent) {
        if (exponent instanceof Formula.Numeral numeral) {
            return fraction(numeral.value());
        }
        if (exponent instanceof Formula.Negation negation) {
            Fraction positive = plainNumber(negation.of());
            return positive == null ? null : positive.negate();
        }
        if (exponent instanceof Formula.Operation over && over.operator() == Operator.OVER) {
            Fraction above = plainNumber(over.left());
            Fraction below = plainNumber(over.right());
            return above == null || below == null || below.equals(Fraction.ZERO) ? null : above.divide(below);
        }
        return null;
    }

    private static @org.jspecify.annotations.Nullable Fraction fraction(double value) {
        try {
            return new Fraction(value, 1e-9, 1000);
        } catch (FractionConversionException e) {
            return null;
        }
    }

    private Outcome alike(Formula whole, Formula left, Formula right, String verb) {
        Outcome a = left.read(this);
        Outcome b = right.read(this);
        if (a instanceof Anything) {
            return b;
        }
        if (b instanceof Anything) {
            return a;
        }
        if (!a.equals(b)) {
            throw fault(
                    whole, shown(a) + " " + verb + " " + shown(b) + "; both sides must be alike", "unlike-dimensions");
        }
        return a;
    }

    @Override
    public Outcome comparison(Formula.Comparison comparison) {
        Outcome sides = alike(comparison, comparison.left(), comparison.right(), "compared with");
        boolean order = comparison.comparator() != Comparator.EQUAL && comparison.comparator() != Comparator.UNLIKE;
        if (sides instanceof Words && order) {
            throw fault(comparison, "words have no order; compare them with = or <>", "words-ordered");
        }
        if (sides instanceof Quantity && !order) {
            throw fault(comparison, "numbers are not tested for equality; use <= or >=", "numbers-equal");
        }
        return new Condition();
    }

    @Override
    public Outcome logic(Formula.Logic logic) {
        logic.parts().forEach(this::condition);
        return new Condition();
    }

    @Override
    public Outcome noResult(Formula.NoResult noResult) {
        return new Anything();
    }

    @Override
    public Outcome call(Formula.Call call) {
        List<Formula> arguments = call.arguments();
        return switch (call.function()) {
            case IF -> {
                condition(arguments.get(0));
                yield alike(call, arguments.get(1), arguments.get(2), "or");
            }
            case SQRT -> new Quantity(dimension(arguments.get(0)).power(Fraction.ONE_HALF));
            case ABS -> new Quantity(dimension(arguments.get(0)));
            case MIN, MAX -> {
                Outcome first = arguments.get(0).read(this);
                for (Formula argument : arguments.subList(1, arguments.size())) {
                    alike(call, arguments.get(0), argument, "beside");
                }
                yield first;
            }
            case IS_NUMBER, SAME -> {
                arguments.forEach(argument -> argument.read(this));
                yield new Condition();
            }
            case MATCH, MATCH_BELOW -> {
                alike(call, arguments.get(0), arguments.get(1), "looked up among");
                yield PURE;
            }
            case INDEX, SMALL, LOWEST_OF -> arguments.get(0).read(this);
            case TALLY, COUNT_OF -> PURE;
            default -> pure(call);
        };
    }

    private Outcome pure(Formula.Call call) {
        Dimension dimension = dimension(call.arguments().get(0));
        if (!dimension.isNone()) {
            throw fault(
                    call,
                    call.function().word() + " of " + dimension + "; divide by one of its unit first",
                    "function-of-dimension");
        }
        return PURE;
    }

    private FormulaException fault(Formula node, String message, String code) {
        return new FormulaException(message, offsets.getOrDefault(node, 0), 1, code);
    }

    private static String shown(Outcome outcome) {
        if (outcome instanceof Quantity quantity) {
            return quantity.dimension().toString();
        }
        return outcome instanceof Words ? "words" : outcome instanceof Condition ? "a condition" : "no result";
    }
}
