package nappe.deliver.pdf;

import java.util.List;
import java.util.function.Function;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.formula.Operator;
import nappe.formula.Reading;

/**
 * The typeset reading of a formula: one line of italic symbols, upright subscripts and raised exponents. What stands
 * for a symbol is given: the symbol itself, or the number behind it.
 */
final class TypesetReading implements Reading<Inline> {
    private static final String THIN = "\u2009";

    private final Function<String, Inline> names;
    private final boolean crosses;

    private TypesetReading(Function<String, Inline> names, boolean crosses) {
        this.names = names;
        this.crosses = crosses;
    }

    /** The formula in symbols. */
    static Inline inSymbols(Formula formula) {
        return formula.read(new TypesetReading(TypesetReading::name, false));
    }

    /** The formula with what the function gives for each name, and a cross for every product. */
    static Inline with(Function<String, Inline> names, Formula formula) {
        return formula.read(new TypesetReading(names, true));
    }

    /** A name as a symbol; {@code before(x)} and the like keep their word; {@code sizes.C} is a column of a table. */
    static Inline name(String name) {
        int point = name.lastIndexOf('.');
        if (point > 0 && point < name.length() - 1) {
            Inline column = Inline.of(Inline.ATOM, SymbolPrint.pieces(name.substring(point + 1)));
            return Inline.join(
                    Inline.ATOM, Inline.text("column "), column, Inline.text(" of " + name.substring(0, point)));
        }
        int bracket = name.indexOf('(');
        if (bracket > 0 && name.endsWith(")")) {
            Inline of = name(name.substring(bracket + 1, name.length() - 1));
            return Inline.join(Inline.ATOM, Inline.text(name.substring(0, bracket) + "("), of, Inline.text(")"));
        }
        return Inline.of(Inline.ATOM, SymbolPrint.pieces(name));
    }

    @Override
    public Inline numeral(Formula.Numeral numeral) {
        return Inline.number(numeral.text(), "1");
    }

    @Override
    public Inline quantity(Formula.Quantity quantity) {
        return Inline.number(quantity.text(), quantity.unit().text());
    }

    @Override
    public Inline word(Formula.Word word) {
        return Inline.text("“" + word.text() + "”");
    }

    @Override
    public Inline symbol(Formula.Symbol symbol) {
        return names.apply(symbol.name());
    }

    @Override
    public Inline neighbour(Formula.Neighbour neighbour) {
        return names.apply((neighbour.before() ? "before(" : "after(") + neighbour.name() + ")");
    }

    @Override
    public Inline summary(Formula.Summary summary) {
        return Inline.join(
                Inline.ATOM, Inline.text(summary.kind() + "("), names.apply(summary.name()), Inline.text(")"));
    }

    @Override
    public Inline negation(Formula.Negation negation) {
        return Inline.join(
                Inline.MINUS, Inline.text("−"), negation.of().read(this).within(Inline.POWER));
    }

    @Override
    public Inline operation(Formula.Operation operation) {
        Inline left = operation.left().read(this);
        Inline right = operation.right().read(this);
        return switch (operation.operator()) {
            case PLUS -> infix(Operator.PLUS, left.within(Inline.SUM), " + ", right.within(Inline.SUM));
            case MINUS -> infix(Operator.MINUS, left.within(Inline.SUM), " − ", right.within(Inline.PRODUCT));
            case TIMES -> times(left.within(Inline.PRODUCT), right.within(Inline.PRODUCT));
            case OVER -> over(left, right.within(Inline.MINUS));
            case POWER -> power(left, right);
        };
    }

    private static Inline infix(Operator operator, Inline left, String sign, Inline right) {
        Inline second = right.startsWithMinus() ? right.bracketed() : right;
        return Inline.join(operator.binding(), left, Inline.text(sign), second);
    }

    private Inline times(Inline left, Inline right) {
        boolean cross = crosses || right.numberFirst() || left.unitLast();
        return infix(Operator.TIMES, left, cross ? " × " : " ", right);
    }

    private static Inline over(Inline left, Inline right) {
        Inline above = left.within(left.unitLast() && left.numberFirst() ? Inline.MINUS : Inline.PRODUCT);
        String sign = above.pieces().size() > 3 || right.pieces().size() > 3 ? THIN + "/" + THIN : "/";
        return infix(Operator.OVER, above, sign, right);
    }

    private static Inline power(Inline base, Inline exponent) {
        return Inline.join(Inline.POWER, base.within(Inline.ATOM), exponent.raised());
    }

    @Override
    public Inline comparison(Formula.Comparison comparison) {
        return Inline.join(
                Inline.LOOSE,
                comparison.left().read(this).within(Inline.SUM),
                Inline.text(" " + sign(comparison.comparator()) + " "),
                comparison.right().read(this).within(Inline.SUM));
    }

    private static String sign(Comparator comparator) {
        return switch (comparator) {
            case AT_MOST -> "≤";
            case AT_LEAST -> "≥";
            case UNLIKE -> "≠";
            case BELOW, ABOVE, EQUAL -> comparator.sign();
        };
    }

    @Override
    public Inline logic(Formula.Logic logic) {
        List<Formula> parts = logic.parts();
        if (logic.kind().equals("not")) {
            return Inline.join(
                    Inline.LOOSE, Inline.text("not "), parts.get(0).read(this).within(Inline.SUM));
        }
        Inline all = part(parts.get(0));
        for (Formula part : parts.subList(1, parts.size())) {
            all = Inline.join(Inline.LOOSE, all, Inline.text(" " + logic.kind() + " "), part(part));
        }
        return all;
    }

    private Inline part(Formula formula) {
        Inline part = formula.read(this);
        return formula instanceof Formula.Logic logic && !logic.kind().equals("not") ? part.bracketed() : part;
    }

    @Override
    public Inline call(Formula.Call call) {
        return CallPrint.typeset(call, formula -> formula.read(this));
    }

    @Override
    public Inline noResult(Formula.NoResult noResult) {
        return Inline.text(noResult.why());
    }
}
