package nappe.formula;

import java.util.List;
import java.util.function.Consumer;

/** Every node of a formula, from left to right. */
public final class Parts {
    private Parts() {}

    public static void visit(Formula formula, Consumer<Formula> visitor) {
        visitor.accept(formula);
        children(formula).forEach(child -> visit(child, visitor));
    }

    private static List<Formula> children(Formula formula) {
        if (formula instanceof Formula.Negation negation) {
            return List.of(negation.of());
        }
        if (formula instanceof Formula.Operation operation) {
            return List.of(operation.left(), operation.right());
        }
        if (formula instanceof Formula.Comparison comparison) {
            return List.of(comparison.left(), comparison.right());
        }
        if (formula instanceof Formula.Logic logic) {
            return logic.parts();
        }
        return formula instanceof Formula.Call call ? call.arguments() : List.of();
    }
}
