package nappe.formula;

import java.util.LinkedHashSet;
import java.util.Set;

/** The symbols a formula rests on, in the order of their first appearance. */
public final class SymbolsReading implements Reading<Void> {
    private final Set<String> symbols = new LinkedHashSet<>();

    private SymbolsReading() {}

    public static Set<String> of(Formula formula) {
        SymbolsReading reading = new SymbolsReading();
        formula.read(reading);
        return reading.symbols;
    }

    @Override
    public Void symbol(Formula.Symbol symbol) {
        symbols.add(symbol.name());
        return nothing();
    }

    @Override
    public Void neighbour(Formula.Neighbour neighbour) {
        symbols.add(neighbour.name());
        return nothing();
    }

    @Override
    public Void summary(Formula.Summary summary) {
        symbols.add(summary.name());
        return nothing();
    }

    @Override
    public Void negation(Formula.Negation negation) {
        return negation.of().read(this);
    }

    @Override
    public Void operation(Formula.Operation operation) {
        operation.left().read(this);
        return operation.right().read(this);
    }

    @Override
    public Void comparison(Formula.Comparison comparison) {
        comparison.left().read(this);
        return comparison.right().read(this);
    }

    @Override
    public Void logic(Formula.Logic logic) {
        logic.parts().forEach(part -> part.read(this));
        return nothing();
    }

    @Override
    public Void call(Formula.Call call) {
        call.arguments().forEach(argument -> argument.read(this));
        return nothing();
    }

    @Override
    public Void numeral(Formula.Numeral numeral) {
        return nothing();
    }

    @Override
    public Void quantity(Formula.Quantity quantity) {
        return nothing();
    }

    @Override
    public Void word(Formula.Word word) {
        return nothing();
    }

    @Override
    public Void noResult(Formula.NoResult noResult) {
        return nothing();
    }

    @SuppressWarnings("NullAway")
    private static Void nothing() {
        return null;
    }
}
