package nappe.formula;

import java.util.List;

/**
 * What can be said of a formula's sign, and of its being defined at all, before any number is known: a division is safe
 * by what is greater than zero, a root of what is not negative. What cannot be shown safe is guarded in the workbook.
 */
public final class SignReading implements Reading<Sign> {
    /** Where the signs of symbols come from. */
    public interface Signs {
        Sign of(String symbol);
    }

    private final Signs signs;
    private boolean safe = true;

    private SignReading(Signs signs) {
        this.signs = signs;
    }

    /** The sign of a formula, and whether it is defined for all that its symbols may be. */
    public record Finding(Sign sign, boolean safe) {}

    public static Finding of(Formula formula, Signs signs) {
        SignReading reading = new SignReading(signs);
        Sign sign = formula.read(reading);
        return new Finding(sign, reading.safe);
    }

    @Override
    public Sign numeral(Formula.Numeral numeral) {
        return sign(numeral.value());
    }

    @Override
    public Sign quantity(Formula.Quantity quantity) {
        return sign(quantity.value());
    }

    private static Sign sign(double value) {
        return value > 0 ? Sign.POSITIVE : value == 0 ? Sign.NOT_NEGATIVE : Sign.ANY;
    }

    @Override
    public Sign word(Formula.Word word) {
        return Sign.POSITIVE;
    }

    @Override
    public Sign noResult(Formula.NoResult noResult) {
        return Sign.POSITIVE;
    }

    @Override
    public Sign symbol(Formula.Symbol symbol) {
        return signs.of(symbol.name());
    }

    @Override
    public Sign neighbour(Formula.Neighbour neighbour) {
        return signs.of(neighbour.name());
    }

    @Override
    public Sign summary(Formula.Summary summary) {
        return signs.of(summary.name());
    }

    @Override
    public Sign negation(Formula.Negation negation) {
        negation.of().read(this);
        return Sign.ANY;
    }

    @Override
    public Sign operation(Formula.Operation operation) {
        Sign left = operation.left().read(this);
        Sign right = operation.right().read(this);
        return switch (operation.operator()) {
            case PLUS -> sum(left, right);
            case MINUS -> Sign.ANY;
            case TIMES -> weaker(left, right);
            case OVER -> {
                safe &= right == Sign.POSITIVE;
                yield weaker(left, right);
            }
            case POWER -> power(left, right, operation.right());
        };
    }

    private static Sign sum(Sign left, Sign right) {
        if (left == Sign.ANY || right == Sign.ANY) {
            return Sign.ANY;
        }
        return left == Sign.POSITIVE || right == Sign.POSITIVE ? Sign.POSITIVE : Sign.NOT_NEGATIVE;
    }

    private static Sign weaker(Sign left, Sign right) {
        return left.compareTo(right) >= 0 ? left : right;
    }

    private static Sign stronger(Sign left, Sign right) {
        return left.compareTo(right) <= 0 ? left : right;
    }

    private Sign power(Sign base, Sign exponent, Formula exponentFormula) {
        if (base == Sign.POSITIVE) {
            return Sign.POSITIVE;
        }
        if (base == Sign.NOT_NEGATIVE && exponent == Sign.POSITIVE) {
            return Sign.NOT_NEGATIVE;
        }
        boolean whole = exponentFormula instanceof Formula.Numeral numeral
                && numeral.value() == Math.rint(numeral.value())
                && numeral.value() > 0;
        safe &= whole;
        return whole && ((Formula.Numeral) exponentFormula).value() % 2 == 0 ? Sign.NOT_NEGATIVE : Sign.ANY;
    }

    @Override
    public Sign comparison(Formula.Comparison comparison) {
        comparison.left().read(this);
        comparison.right().read(this);
        return Sign.ANY;
    }

    @Override
    public Sign logic(Formula.Logic logic) {
        logic.parts().forEach(part -> part.read(this));
        return Sign.ANY;
    }

    @Override
    public Sign call(Formula.Call call) {
        List<Formula> arguments = call.arguments();
        List<Sign> of = arguments.stream().map(argument -> argument.read(this)).toList();
        return switch (call.function()) {
            case IF -> weaker(of.get(1), of.get(2));
            case SQRT -> {
                safe &= of.get(0) != Sign.ANY;
                yield of.get(0);
            }
            case LN, LOG10 -> {
                safe &= of.get(0) == Sign.POSITIVE;
                yield Sign.ANY;
            }
            case ASIN, ACOS -> {
                safe = false;
                yield Sign.ANY;
            }
            case EXP -> {
                safe = false;
                yield Sign.POSITIVE;
            }
            case TANH, INDEX, SMALL, LOWEST_OF -> of.get(0);
            case ABS -> stronger(of.get(0), Sign.NOT_NEGATIVE);
            case MIN -> of.stream().reduce(Sign.POSITIVE, SignReading::weaker);
            case MAX -> of.stream().reduce(Sign.ANY, SignReading::stronger);
            case MATCH, MATCH_BELOW -> Sign.POSITIVE;
            case TALLY, COUNT_OF -> Sign.NOT_NEGATIVE;
            default -> Sign.ANY;
        };
    }
}
