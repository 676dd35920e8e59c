package nappe.formula;

import java.util.stream.Collectors;

/**
 * A formula as plain text, as a method sheet writes it: {@code 4 ft3/s * (W/1 ft)*(h_a/1 ft)^n}. It has few brackets;
 * {@code ^} groups to the right and binds tighter than a leading minus, as in mathematics. Read again it gives the same
 * formula.
 */
public final class PlainReading implements Reading<Written> {
    private static final int OR = -3;
    private static final int AND = -2;
    private static final int NOT = -1;
    private static final int MINUS_SIGN = 3;

    private PlainReading() {}

    /** The formula as text. */
    public static String of(Formula formula) {
        return formula.read(new PlainReading()).text();
    }

    /** The formula with what it defines: {@code h_f = S_f*L}. */
    public static String of(String symbol, Formula formula) {
        return symbol.isEmpty() ? of(formula) : symbol + " = " + of(formula);
    }

    @Override
    public Written numeral(Formula.Numeral numeral) {
        return Written.whole(numeral.text());
    }

    @Override
    public Written quantity(Formula.Quantity quantity) {
        return quantity.unit().text().equals("1")
                ? Written.whole(quantity.text())
                : new Written(quantity.text() + " " + quantity.unit().text(), Operator.POWER.binding(), true);
    }

    @Override
    public Written word(Formula.Word word) {
        return Written.whole(quoted(word.text()));
    }

    @Override
    public Written symbol(Formula.Symbol symbol) {
        return Written.whole(symbol.name());
    }

    @Override
    public Written neighbour(Formula.Neighbour neighbour) {
        return Written.whole((neighbour.before() ? "before(" : "after(") + neighbour.name() + ")");
    }

    @Override
    public Written summary(Formula.Summary summary) {
        return Written.whole(summary.kind() + "(" + summary.name() + ")");
    }

    @Override
    public Written negation(Formula.Negation negation) {
        Written of = negation.of().read(this);
        int least = MINUS_SIGN + 1;
        return new Written("-" + of.within(least), MINUS_SIGN, of.endsInUnit() && !of.needsBrackets(least));
    }

    @Override
    public Written operation(Formula.Operation operation) {
        Operator operator = operation.operator();
        int binding = operator.binding();
        Written left = operation.left().read(this);
        Written right = operation.right().read(this);
        int leastLeft = operator == Operator.POWER ? binding + 1 : binding;
        int leastRight = operator == Operator.POWER ? binding : binding + 1;
        boolean loose = binding == Operator.PLUS.binding() || left.endsInUnit() && !left.needsBrackets(leastLeft);
        String sign = loose ? " " + operator.sign() + " " : operator.sign();
        return new Written(
                left.within(leastLeft) + sign + right.within(leastRight),
                binding,
                right.endsInUnit() && !right.needsBrackets(leastRight));
    }

    @Override
    public Written comparison(Formula.Comparison comparison) {
        int least = Written.CONDITION + 1;
        return new Written(
                comparison.left().read(this).within(least)
                        + " " + comparison.comparator().sign() + " "
                        + comparison.right().read(this).within(least),
                Written.CONDITION);
    }

    @Override
    public Written logic(Formula.Logic logic) {
        if (logic.kind().equals("not")) {
            return new Written("not " + logic.parts().get(0).read(this).within(NOT), NOT);
        }
        int binding = logic.kind().equals("and") ? AND : OR;
        return new Written(
                logic.parts().stream()
                        .map(part -> part.read(this).within(binding + 1))
                        .collect(Collectors.joining(" " + logic.kind() + " ")),
                binding);
    }

    @Override
    public Written call(Formula.Call call) {
        if (call.function() == Function.IS_NUMBER && call.arguments().get(0) instanceof Formula.Symbol symbol) {
            return Written.whole("given(" + symbol.name() + ")");
        }
        return Written.whole(call.arguments().stream()
                .map(argument -> argument.read(this).text())
                .collect(Collectors.joining(", ", call.function().word() + "(", ")")));
    }

    @Override
    public Written noResult(Formula.NoResult noResult) {
        return Written.whole(
                noResult.why().equals(Value.NO_RESULT) ? "none()" : "none(" + quoted(noResult.why()) + ")");
    }

    private static String quoted(String text) {
        return "\"" + text + "\"";
    }
}
