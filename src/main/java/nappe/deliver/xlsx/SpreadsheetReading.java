package nappe.deliver.xlsx;

import java.util.List;
import java.util.stream.Collectors;
import nappe.calculation.Cell;
import nappe.calculation.Reference;
import nappe.calculation.Run;
import nappe.calculation.Sureness;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.Guard;
import nappe.formula.Operator;
import nappe.formula.Reading;
import nappe.formula.Value;
import nappe.formula.Written;

/**
 * The formula of a live cell as spreadsheet text, without the leading equals sign: {@code IF(ISNUMBER(E5),4*(E6^1.5),E5)}.
 *
 * <p>Spreadsheet programs disagree on a leading minus before {@code ^} and on chained powers, so every negation that
 * stands in something larger and every compound side of a power is in brackets. Comparisons of numbers carry the
 * tolerance of {@link nappe.formula.Tolerance}. A unit whose size is one vanishes.
 *
 * <p>A cell passes on words by the rule of {@link Guard}: each symbol that must be a number and whose cell is not sure
 * to hold one is asked first, in that order, and its words are shown. Inside these questions, a cell that may be outside
 * its range of definition shows "no result" instead of an error.
 */
public final class SpreadsheetReading implements Reading<Written> {
    private static final int ARITHMETIC = Operator.PLUS.binding();
    private static final int MINUS_SIGN = Written.CONDITION;

    private final Cell cell;

    private SpreadsheetReading(Cell cell) {
        this.cell = cell;
    }

    /** The spreadsheet text of a live cell. */
    public static String of(Cell cell) {
        Formula formula = cell.formula();
        if (formula == null) {
            throw new IllegalArgumentException(cell + " is typed and has no formula");
        }
        SpreadsheetReading reading = new SpreadsheetReading(cell);
        boolean handsOn = formula instanceof Formula.Symbol && cell.sureness() != Sureness.SURE;
        String text = handsOn
                ? reading.handedOn((Formula.Symbol) formula)
                : formula.read(reading).text();
        if (cell.sureness() == Sureness.MAY_FAIL) {
            text = "IFERROR(" + text + "," + quoted(Value.NO_RESULT) + ")";
        }
        List<Cell> guards = cell.guards();
        for (int i = guards.size() - 1; i >= 0; i--) {
            String address = reading.addressOf(guards.get(i));
            text = "IF(ISNUMBER(" + address + ")," + text + "," + reading.orNotGiven(guards.get(i)) + ")";
        }
        return text;
    }

    private String handedOn(Formula.Symbol symbol) {
        return reference(symbol.name()) instanceof Cell other
                ? orNotGiven(other)
                : read(symbol).text();
    }

    /** A cell that may hold words, and is not given where it is typed and somebody has emptied it: it would count as 0. */
    private String orNotGiven(Cell other) {
        String address = addressOf(other);
        return other.kind() == Cell.Kind.ENTRY
                ? "IF(" + address + "=\"\"," + quoted(Value.NOT_GIVEN) + "," + address + ")"
                : address;
    }

    @Override
    public Written numeral(Formula.Numeral numeral) {
        return numeral.value() < 0
                ? new Written(number(numeral.value()), MINUS_SIGN)
                : Written.whole(number(numeral.value()));
    }

    /** A unit whose size is not one stands in a cell of its own. */
    @Override
    public Written quantity(Formula.Quantity quantity) {
        Reference size = cell.references().get("1 " + quantity.unit().text());
        if (size == null) {
            return numeral(new Formula.Numeral(quantity.value(), quantity.text()));
        }
        if (quantity.value() == 1) {
            return Written.whole(address(size));
        }
        Written number = numeral(new Formula.Numeral(quantity.value(), quantity.text()));
        return new Written(number.within(ARITHMETIC) + "*" + address(size), Operator.TIMES.binding());
    }

    @Override
    public Written word(Formula.Word word) {
        return Written.whole(quoted(word.text()));
    }

    @Override
    public Written symbol(Formula.Symbol symbol) {
        return Written.whole(address(reference(symbol.name())));
    }

    @Override
    public Written neighbour(Formula.Neighbour neighbour) {
        return Written.whole(address(reference(Guard.key(neighbour))));
    }

    @Override
    public Written summary(Formula.Summary summary) {
        if (!(reference(summary.name()) instanceof Run run)) {
            throw new IllegalStateException(cell + ": " + summary.kind() + " needs a run of cells");
        }
        return Written.whole(
                switch (summary.kind()) {
                    case "last" -> addressOf(run.cells().get(run.cells().size() - 1));
                    case "highest" -> "MAX(" + address(run) + ")";
                    case "lowest" -> "MIN(" + address(run) + ")";
                    default -> throw new IllegalStateException(cell + ": no such summary: " + summary.kind());
                });
    }

    @Override
    public Written negation(Formula.Negation negation) {
        return new Written("-" + read(negation.of()).within(Written.WHOLE), MINUS_SIGN);
    }

    @Override
    public Written operation(Formula.Operation operation) {
        Operator operator = operation.operator();
        boolean rightIsOne = isOne(operation.right());
        if (rightIsOne && (operator == Operator.OVER || operator == Operator.TIMES)) {
            return read(operation.left());
        }
        if (operator == Operator.TIMES && isOne(operation.left())) {
            return read(operation.right());
        }
        int binding = operator.binding();
        int sides = operator == Operator.POWER ? Written.WHOLE : binding;
        String left = read(operation.left()).within(sides);
        String right = read(operation.right()).within(sides == Written.WHOLE ? sides : sides + 1);
        return new Written(left + operator.sign() + right, binding);
    }

    /** Whether it is a bare unit of size one, such as the 1 ft of h/1 ft. */
    private boolean isOne(Formula formula) {
        return formula instanceof Formula.Quantity quantity
                && quantity.value() == 1
                && !cell.references().containsKey("1 " + quantity.unit().text());
    }

    @Override
    public Written comparison(Formula.Comparison comparison) {
        Written a = read(comparison.left());
        Written b = read(comparison.right());
        if (Guard.comparesWords(comparison)) {
            String sign = comparison.comparator().sign();
            return new Written(a.within(ARITHMETIC) + sign + b.within(ARITHMETIC), Written.CONDITION);
        }
        if (isNought(comparison.right())) {
            return new Written(a.within(ARITHMETIC) + comparison.comparator().sign() + "0", Written.CONDITION);
        }
        String slack = "1E-9*ABS(" + b.text() + ")";
        String over = a.within(ARITHMETIC) + "-" + b.within(ARITHMETIC + 1);
        String under = b.within(ARITHMETIC) + "-" + a.within(ARITHMETIC + 1);
        return new Written(
                switch (comparison.comparator()) {
                    case AT_MOST -> over + "<=" + slack;
                    case BELOW -> over + "<-" + slack;
                    case AT_LEAST -> under + "<=" + slack;
                    case ABOVE -> under + "<-" + slack;
                    case EQUAL -> "ABS(" + over + ")<=" + slack;
                    case UNLIKE -> "ABS(" + over + ")>" + slack;
                },
                Written.CONDITION);
    }

    /** Against a plain 0 the tolerance is 0, and the comparison is written as it is. */
    private static boolean isNought(Formula formula) {
        return formula instanceof Formula.Numeral numeral && numeral.value() == 0
                || formula instanceof Formula.Quantity quantity && quantity.value() == 0;
    }

    @Override
    public Written logic(Formula.Logic logic) {
        return function(
                switch (logic.kind()) {
                    case "and" -> "AND";
                    case "or" -> "OR";
                    case "not" -> "NOT";
                    default -> throw new IllegalStateException(cell + ": no such condition: " + logic.kind());
                },
                logic.parts(),
                "");
    }

    @Override
    public Written call(Formula.Call call) {
        Function function = call.function();
        List<Formula> arguments = call.arguments();
        return switch (function) {
            case MATCH -> function("MATCH", arguments, ",0");
            case MATCH_BELOW -> matchBelow(arguments);
            case LOWEST_OF -> function("MIN", arguments, "");
            case COUNT_OF -> function("COUNT", arguments, "");
            case TALLY -> function("COUNTIF", arguments, "");
            case IS_NUMBER -> function("ISNUMBER", arguments, "");
            case SAME ->
                new Written(
                        read(arguments.get(0)).within(ARITHMETIC) + "="
                                + read(arguments.get(1)).within(ARITHMETIC),
                        Written.CONDITION);
            case INDEX -> index(arguments);
            case IF, SQRT, EXP, LN, LOG10, SIN, COS, TAN, ASIN, ACOS, ATAN, TANH, ABS, MIN, MAX, SMALL ->
                function(function.name(), arguments, "");
        };
    }

    /** With the tolerance of comparisons, or programs part where the key stands on a row of the table. */
    private Written matchBelow(List<Formula> arguments) {
        Written key = read(arguments.get(0));
        String column = read(arguments.get(1)).text();
        return Written.whole("MATCH(" + key.within(ARITHMETIC) + "+1E-9*ABS(" + key.text() + ")," + column + ",1)");
    }

    /** Gnumeric neither guesses that a single place in a run along a row means the column, nor looks into one cell. */
    private Written index(List<Formula> arguments) {
        String column = read(arguments.get(0)).text();
        Written place = read(arguments.get(1));
        if (!(arguments.get(0) instanceof Formula.Symbol symbol && reference(symbol.name()) instanceof Run run)) {
            throw new IllegalStateException(cell + ": index needs a run of cells");
        }
        Cell first = run.cells().get(0);
        if (run.cells().size() == 1) {
            return Written.whole(
                    "IF(" + place.within(ARITHMETIC) + "=1," + addressOf(first) + "," + quoted(Value.NO_RESULT) + ")");
        }
        boolean alongARow = first.place().row() == run.cells().get(1).place().row();
        return Written.whole("INDEX(" + column + (alongARow ? ",1," : ",") + place.text() + ")");
    }

    @Override
    public Written noResult(Formula.NoResult noResult) {
        return Written.whole(quoted(noResult.why()));
    }

    private Written read(Formula formula) {
        return formula.read(this);
    }

    private Written function(String name, List<Formula> arguments, String end) {
        return Written.whole(arguments.stream()
                .map(argument -> read(argument).text())
                .collect(Collectors.joining(",", name + "(", end + ")")));
    }

    private Reference reference(String symbol) {
        Reference reference = cell.references().get(symbol);
        if (reference == null) {
            throw new IllegalStateException(cell + ": " + symbol + " points to no cell");
        }
        return reference;
    }

    private String address(Reference reference) {
        String sheet = cell.place().sheet();
        return reference instanceof Run run ? run.fixedFrom(sheet) : addressOf((Cell) reference);
    }

    private String addressOf(Cell other) {
        return other.place().from(cell.place().sheet());
    }

    /** Exact, with a point, without a needless ".0": {@code 4}, {@code 0.385}, {@code 1E-9}. */
    private static String number(double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalStateException("not a finite number: " + value);
        }
        String text = Double.toString(value);
        return text.endsWith(".0") ? text.substring(0, text.length() - 2) : text.replace(".0E", "E");
    }

    private static String quoted(String text) {
        return "\"" + text.replace("\"", "\"\"") + "\"";
    }
}
