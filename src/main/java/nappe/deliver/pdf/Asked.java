package nappe.deliver.pdf;

import java.util.Optional;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.PlainReading;

/** What the formula of a verdict asks: the words that it chooses from need no brace of their own in print. */
final class Asked {
    private static final Formula MET = new Formula.Word("met");
    private static final Formula DOES_NOT_APPLY = new Formula.Word("does not apply");

    private Asked() {}

    /** The condition under which it is met, where it applies; the formula itself where it is no verdict. */
    static Formula condition(Formula verdict) {
        if (verdict instanceof Formula.Call choice && choice.function() == Function.IF) {
            if (choice.arguments().get(2).equals(DOES_NOT_APPLY)) {
                return condition(choice.arguments().get(1));
            }
            if (choice.arguments().get(1).equals(MET)) {
                return choice.arguments().get(0);
            }
        }
        return verdict;
    }

    /** Where it applies, as plain text; empty where it does everywhere. */
    static Optional<String> when(Formula verdict) {
        return verdict instanceof Formula.Call choice
                        && choice.function() == Function.IF
                        && choice.arguments().get(2).equals(DOES_NOT_APPLY)
                ? Optional.of(PlainReading.of(choice.arguments().get(0)))
                : Optional.empty();
    }
}
