package nappe.formula;

import java.util.List;
import nappe.unit.Unit;

/**
 * The value of a formula. A number that is not finite stands for "outside the range of definition" and becomes {@link
 * Value.None}; whoever evaluates a cell first passes on the words of what the formula needs as numbers, see {@code
 * Guard}.
 */
public final class NumberReading implements Reading<Value> {
    /** Where the values of symbols come from. */
    public interface Values {
        /** The value of a single symbol. */
        Value of(String symbol);

        /** The values of a column of cells. */
        List<Value> column(String symbol);

        /** How many coherent units one of the unit is. */
        double size(Unit unit);
    }

    private final Values values;

    public NumberReading(Values values) {
        this.values = values;
    }

    public static Value of(Formula formula, Values values) {
        return formula.read(new NumberReading(values));
    }

    @Override
    public Value numeral(Formula.Numeral numeral) {
        return Value.of(numeral.value());
    }

    @Override
    public Value quantity(Formula.Quantity quantity) {
        return Value.of(quantity.value() * values.size(quantity.unit()));
    }

    @Override
    public Value word(Formula.Word word) {
        return Value.word(word.text());
    }

    @Override
    public Value symbol(Formula.Symbol symbol) {
        return values.of(symbol.name());
    }

    @Override
    public Value neighbour(Formula.Neighbour neighbour) {
        return values.of((neighbour.before() ? "before " : "after ") + neighbour.name());
    }

    @Override
    public Value summary(Formula.Summary summary) {
        List<Value> column = values.column(summary.name());
        return switch (summary.kind()) {
            case "last" -> column.get(column.size() - 1);
            case "highest" ->
                Value.of(column.stream().mapToDouble(this::number).max().orElse(Double.NaN));
            default -> Value.of(column.stream().mapToDouble(this::number).min().orElse(Double.NaN));
        };
    }

    @Override
    public Value negation(Formula.Negation negation) {
        return Value.of(-number(negation.of()));
    }

    @Override
    public Value operation(Formula.Operation operation) {
        double a = number(operation.left());
        double b = number(operation.right());
        return Value.of(
                switch (operation.operator()) {
                    case PLUS -> a + b;
                    case MINUS -> a - b;
                    case TIMES -> a * b;
                    case OVER -> a / b;
                    case POWER -> a == 0 && b == 0 ? Double.NaN : Math.pow(a, b);
                });
    }

    @Override
    public Value comparison(Formula.Comparison comparison) {
        throw new IllegalStateException("a comparison has no number");
    }

    @Override
    public Value logic(Formula.Logic logic) {
        throw new IllegalStateException("a condition has no number");
    }

    @Override
    public Value noResult(Formula.NoResult noResult) {
        return new Value.None(noResult.why());
    }

    @Override
    public Value call(Formula.Call call) {
        List<Formula> arguments = call.arguments();
        return switch (call.function()) {
            case IF -> (holds(arguments.get(0)) ? arguments.get(1) : arguments.get(2)).read(this);
            case MATCH -> match(arguments);
            case MATCH_BELOW -> matchBelow(arguments);
            case INDEX -> index(arguments);
            case SMALL -> small(arguments);
            case LOWEST_OF ->
                Value.of(numbers(arguments.get(0)).stream()
                        .mapToDouble(Double::doubleValue)
                        .min()
                        .orElse(Double.NaN));
            case TALLY ->
                Value.of(column(arguments.get(0)).stream()
                        .filter(value -> alike(value, arguments.get(1).read(this)))
                        .count());
            case COUNT_OF ->
                Value.of(column(arguments.get(0)).stream()
                        .filter(value -> value instanceof Value.Number)
                        .count());
            case IS_NUMBER, SAME -> throw new IllegalStateException("a condition has no number");
            default ->
                Value.of(arithmetic(
                        call.function(),
                        arguments.stream().mapToDouble(this::number).toArray()));
        };
    }

    private static double arithmetic(Function function, double[] x) {
        return switch (function) {
            case SQRT -> Math.sqrt(x[0]);
            case EXP -> Math.exp(x[0]);
            case LN -> Math.log(x[0]);
            case LOG10 -> Math.log10(x[0]);
            case SIN -> Math.sin(x[0]);
            case COS -> Math.cos(x[0]);
            case TAN -> Math.tan(x[0]);
            case ASIN -> Math.asin(x[0]);
            case ACOS -> Math.acos(x[0]);
            case ATAN -> Math.atan(x[0]);
            case TANH -> Math.tanh(x[0]);
            case ABS -> Math.abs(x[0]);
            case MIN -> java.util.Arrays.stream(x).min().orElse(Double.NaN);
            case MAX -> java.util.Arrays.stream(x).max().orElse(Double.NaN);
            default -> throw new IllegalStateException("not arithmetic: " + function);
        };
    }

    /** Whether a condition holds; words are compared without regard to case, numbers with {@link Tolerance}. */
    public boolean holds(Formula condition) {
        if (condition instanceof Formula.Logic logic) {
            return switch (logic.kind()) {
                case "and" -> logic.parts().stream().allMatch(this::holds);
                case "or" -> logic.parts().stream().anyMatch(this::holds);
                default -> !holds(logic.parts().get(0));
            };
        }
        if (condition instanceof Formula.Comparison comparison) {
            return holds(comparison);
        }
        if (condition instanceof Formula.Call call && call.function() == Function.IS_NUMBER) {
            return call.arguments().get(0).read(this) instanceof Value.Number;
        }
        if (condition instanceof Formula.Call call && call.function() == Function.SAME) {
            return number(call.arguments().get(0)) == number(call.arguments().get(1));
        }
        throw new IllegalStateException("not a condition: " + condition);
    }

    private boolean holds(Formula.Comparison comparison) {
        Value left = comparison.left().read(this);
        Value right = comparison.right().read(this);
        if (left instanceof Value.Number a && right instanceof Value.Number b) {
            return Tolerance.holds(comparison.comparator(), a.value(), b.value());
        }
        boolean same = alike(left, right);
        return switch (comparison.comparator()) {
            case EQUAL -> same;
            case UNLIKE -> !same;
            default -> false;
        };
    }

    private double number(Formula formula) {
        return number(formula.read(this));
    }

    private double number(Value value) {
        return value instanceof Value.Number number ? number.value() : Double.NaN;
    }

    private static String words(Value value) {
        return value instanceof Value.Word word ? word.text() : value instanceof Value.None none ? none.why() : "";
    }

    private static boolean alike(Value a, Value b) {
        if (a instanceof Value.Number x && b instanceof Value.Number y) {
            return x.value() == y.value();
        }
        return !(a instanceof Value.Number) && !(b instanceof Value.Number) && words(a).equalsIgnoreCase(words(b));
    }

    private List<Value> column(Formula formula) {
        return values.column(((Formula.Symbol) formula).name());
    }

    private List<Double> numbers(Formula column) {
        return column(column).stream()
                .filter(Value.Number.class::isInstance)
                .map(value -> ((Value.Number) value).value())
                .toList();
    }

    private Value match(List<Formula> arguments) {
        Value key = arguments.get(0).read(this);
        List<Value> column = column(arguments.get(1));
        for (int i = 0; i < column.size(); i++) {
            if (alike(key, column.get(i))) {
                return Value.of(i + 1);
            }
        }
        return new Value.None(Value.NO_RESULT);
    }

    private Value matchBelow(List<Formula> arguments) {
        double key = number(arguments.get(0));
        int place = 0;
        for (double number : numbers(arguments.get(1))) {
            if (!Tolerance.holds(Comparator.AT_MOST, number, key)) {
                break;
            }
            place++;
        }
        return place == 0 ? new Value.None(Value.NO_RESULT) : Value.of(place);
    }

    private Value index(List<Formula> arguments) {
        List<Value> column = column(arguments.get(0));
        double place = number(arguments.get(1));
        return place >= 1 && place < column.size() + 1 ? column.get((int) place - 1) : new Value.None(Value.NO_RESULT);
    }

    private Value small(List<Formula> arguments) {
        List<Double> sorted = numbers(arguments.get(0)).stream().sorted().toList();
        double k = number(arguments.get(1));
        return k >= 1 && k <= sorted.size() ? Value.of(sorted.get((int) k - 1)) : new Value.None(Value.NO_RESULT);
    }
}
