package nappe.formula;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * The rule by which a cell passes on words, the same in Java and in the spreadsheet.
 *
 * <p>A formula needs a number under each of its symbols, but for those that the formula itself tests: a symbol that
 * occurs inside {@code is_number(...)}, one that is compared with words, the key of {@code match}, the word of {@code
 * tally}, and a column of cells. A formula that is nothing but a symbol hands on whatever stands there. Where a symbol
 * whose cell is not sure to hold a number holds words, the cell shows these words instead of evaluating its formula;
 * the first such symbol decides, in the order in which the symbols first appear in the formula.
 */
public final class Guard implements Reading<Boolean> {
    private final List<String> seen = new ArrayList<>();
    private final Set<String> tested = new HashSet<>();
    private int insideIsNumber;

    private Guard() {}

    /** The symbols that must hold numbers, in the order of first appearance; neighbours as {@code "before x"}. */
    public static List<String> guarded(Formula formula) {
        if (formula instanceof Formula.Symbol) {
            return List.of();
        }
        Guard guard = new Guard();
        formula.read(guard);
        return guard.seen.stream()
                .filter(symbol -> !guard.tested.contains(symbol))
                .distinct()
                .toList();
    }

    /** Whether a comparison is one of words: a word stands on one of its sides. */
    public static boolean comparesWords(Formula.Comparison comparison) {
        return comparison.left() instanceof Formula.Word || comparison.right() instanceof Formula.Word;
    }

    /** The name under which a neighbour is referred to. */
    public static String key(Formula.Neighbour neighbour) {
        return (neighbour.before() ? "before " : "after ") + neighbour.name();
    }

    @Override
    public Boolean symbol(Formula.Symbol symbol) {
        return note(symbol.name());
    }

    @Override
    public Boolean neighbour(Formula.Neighbour neighbour) {
        return note(key(neighbour));
    }

    @Override
    public Boolean negation(Formula.Negation negation) {
        return negation.of().read(this);
    }

    @Override
    public Boolean operation(Formula.Operation operation) {
        return readAll(List.of(operation.left(), operation.right()));
    }

    @Override
    public Boolean comparison(Formula.Comparison comparison) {
        if (comparesWords(comparison)) {
            test(comparison.left());
            test(comparison.right());
        }
        return readAll(List.of(comparison.left(), comparison.right()));
    }

    @Override
    public Boolean logic(Formula.Logic logic) {
        return readAll(logic.parts());
    }

    @Override
    public Boolean call(Formula.Call call) {
        List<Formula> arguments = call.arguments();
        switch (call.function()) {
            case IS_NUMBER -> {
                insideIsNumber++;
                readAll(arguments);
                insideIsNumber--;
            }
            case MATCH -> test(arguments.get(0));
            case TALLY -> test(arguments.get(1));
            case MATCH_BELOW -> arguments.get(0).read(this);
            case INDEX, SMALL -> arguments.get(1).read(this);
            case LOWEST_OF, COUNT_OF -> {}
            default -> readAll(arguments);
        }
        return true;
    }

    @Override
    public Boolean numeral(Formula.Numeral numeral) {
        return true;
    }

    @Override
    public Boolean quantity(Formula.Quantity quantity) {
        return true;
    }

    @Override
    public Boolean word(Formula.Word word) {
        return true;
    }

    @Override
    public Boolean summary(Formula.Summary summary) {
        return true;
    }

    @Override
    public Boolean noResult(Formula.NoResult noResult) {
        return true;
    }

    private Boolean readAll(List<Formula> formulas) {
        formulas.forEach(formula -> formula.read(this));
        return true;
    }

    private Boolean note(String symbol) {
        seen.add(symbol);
        if (insideIsNumber > 0) {
            tested.add(symbol);
        }
        return true;
    }

    /** A symbol standing there alone is tested by the formula itself. */
    private void test(Formula formula) {
        if (formula instanceof Formula.Symbol symbol) {
            tested.add(symbol.name());
        } else if (formula instanceof Formula.Neighbour neighbour) {
            tested.add(key(neighbour));
        } else {
            formula.read(this);
        }
    }
}
