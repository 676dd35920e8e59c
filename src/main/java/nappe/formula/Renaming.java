package nappe.formula;

import java.util.function.UnaryOperator;

/** The same formula with other names for its symbols, other quantities, or other formulas where it names something. */
public final class Renaming implements Reading<Formula> {
    private final UnaryOperator<Formula> named;
    private final UnaryOperator<Formula.Quantity> quantity;

    private Renaming(UnaryOperator<Formula> named, UnaryOperator<Formula.Quantity> quantity) {
        this.named = named;
        this.quantity = quantity;
    }

    public static Formula of(Formula formula, UnaryOperator<String> name) {
        return formula.read(new Renaming(named -> renamed(named, name), quantity -> quantity));
    }

    public static Formula ofQuantities(Formula formula, UnaryOperator<Formula.Quantity> quantity) {
        return formula.read(new Renaming(named -> named, quantity));
    }

    /** With something else for each symbol, neighbour and summary. */
    public static Formula ofNamed(Formula formula, UnaryOperator<Formula> named) {
        return formula.read(new Renaming(named, quantity -> quantity));
    }

    private static Formula renamed(Formula named, UnaryOperator<String> name) {
        if (named instanceof Formula.Symbol symbol) {
            return new Formula.Symbol(name.apply(symbol.name()));
        } else if (named instanceof Formula.Neighbour neighbour) {
            return new Formula.Neighbour(neighbour.before(), name.apply(neighbour.name()));
        }
        Formula.Summary summary = (Formula.Summary) named;
        return new Formula.Summary(summary.kind(), name.apply(summary.name()));
    }

    @Override
    public Formula numeral(Formula.Numeral numeral) {
        return numeral;
    }

    @Override
    public Formula quantity(Formula.Quantity written) {
        return quantity.apply(written);
    }

    @Override
    public Formula word(Formula.Word word) {
        return word;
    }

    @Override
    public Formula symbol(Formula.Symbol symbol) {
        return named.apply(symbol);
    }

    @Override
    public Formula neighbour(Formula.Neighbour neighbour) {
        return named.apply(neighbour);
    }

    @Override
    public Formula summary(Formula.Summary summary) {
        return named.apply(summary);
    }

    @Override
    public Formula negation(Formula.Negation negation) {
        return new Formula.Negation(negation.of().read(this));
    }

    @Override
    public Formula operation(Formula.Operation o) {
        return new Formula.Operation(
                o.operator(), o.left().read(this), o.right().read(this));
    }

    @Override
    public Formula comparison(Formula.Comparison c) {
        return new Formula.Comparison(
                c.comparator(), c.left().read(this), c.right().read(this));
    }

    @Override
    public Formula logic(Formula.Logic logic) {
        return new Formula.Logic(
                logic.kind(),
                logic.parts().stream().map(part -> part.read(this)).toList());
    }

    @Override
    public Formula call(Formula.Call call) {
        return new Formula.Call(
                call.function(),
                call.arguments().stream().map(a -> a.read(this)).toList());
    }

    @Override
    public Formula noResult(Formula.NoResult noResult) {
        return noResult;
    }
}
