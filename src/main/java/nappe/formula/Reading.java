package nappe.formula;

/** One way to read a formula: a method for each kind of node, so that a new kind doesn't compile until all say. */
public interface Reading<R> {
    R numeral(Formula.Numeral numeral);

    R quantity(Formula.Quantity quantity);

    R word(Formula.Word word);

    R symbol(Formula.Symbol symbol);

    R neighbour(Formula.Neighbour neighbour);

    R summary(Formula.Summary summary);

    R negation(Formula.Negation negation);

    R operation(Formula.Operation operation);

    R comparison(Formula.Comparison comparison);

    R logic(Formula.Logic logic);

    R call(Formula.Call call);

    R noResult(Formula.NoResult noResult);
}
