package nappe.deliver.pdf;

import java.util.Optional;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.PlainReading;

/** What the formula of a limit's line asks: the words that it chooses from need no brace of their own in print. */
final class Asked {
    private static final Formula MET = new Formula.Word("met");
    private static final Formula.Word DOES_NOT_APPLY = new Formula.Word("does not apply");

    private Asked() {}

    /** The condition under which it is met, or the margin, where it applies; any other formula as it is. */
    static Formula condition(Formula formula) {
        if (formula instanceof Formula.Call choice && choice.function() == Function.IF) {
            if (doesNotApply(choice.arguments().get(2))) {
                return condition(choice.arguments().get(1));
            }
            if (choice.arguments().get(1).equals(MET)) {
                return choice.arguments().get(0);
            }
        }
        return formula;
    }

    private static boolean doesNotApply(Formula otherwise) {
        return otherwise.equals(DOES_NOT_APPLY)
                || otherwise instanceof Formula.NoResult no && no.why().equals(DOES_NOT_APPLY.text());
    }

    /** Where it applies, as plain text; empty where it does everywhere. */
    static Optional<String> when(Formula verdict) {
        return verdict instanceof Formula.Call choice
                        && choice.function() == Function.IF
                        && doesNotApply(choice.arguments().get(2))
                ? Optional.of(PlainReading.of(choice.arguments().get(0)))
                : Optional.empty();
    }
}
