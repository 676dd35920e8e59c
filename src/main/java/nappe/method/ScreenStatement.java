package nappe.method;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import nappe.formula.DimensionReading;
import nappe.formula.Formula;
import nappe.formula.FormulaException;
import nappe.formula.FormulaParser;
import org.jspecify.annotations.Nullable;

/** The statement that has every word of a choice compared: {@code screen size : W, h_max, h_f}. */
final class ScreenStatement {
    private final StatementParts parts;
    private final SheetDraft draft;
    private int offset;

    ScreenStatement(StatementParts parts) {
        this.parts = parts;
        this.draft = parts.draft;
    }

    void read() {
        if (draft.screen != null) {
            throw parts.fault(
                    "this sheet has a screen statement already, of " + draft.screen.choice() + "; one is laid",
                    "screen-twice");
        }
        FormulaParser parser = parts.parser(0);
        String choice = next(parser);
        if (!isChoice(choice)) {
            throw fault(choice, " is not a choice; what is screened are the words of one", "not-a-choice");
        }
        parser.expect(":");
        List<String> targets = new ArrayList<>();
        do {
            String target = next(parser);
            if (targets.contains(target)) {
                throw fault(target, " is named already", "symbol-twice");
            }
            check(target, choice);
            targets.add(target);
        } while (parser.passes(","));
        parser.end();
        List<Item> members = Closure.of(draft.items, draft.reach, choice, Set.copyOf(targets));
        draft.screen = new Screen(choice, List.copyOf(targets), members);
    }

    private String next(FormulaParser parser) {
        offset = parser.offset();
        String symbol = parts.symbolOf(parser.name());
        if (!draft.knows(symbol)) {
            try {
                draft.outcome(symbol);
            } catch (FormulaException e) {
                throw new FormulaException(
                        String.valueOf(e.getMessage()), offset + e.offset(), symbol.length(), e.code());
            }
        }
        return symbol;
    }

    private boolean isChoice(String symbol) {
        return draft.items.stream()
                .anyMatch(item -> item instanceof Item.Given given
                        && given.from() == Item.From.CHOICE
                        && given.symbol().equals(symbol));
    }

    /** A target differs from size to size, has a value, and needs neither trials nor what sums up the cases. */
    private void check(String target, String choice) {
        Set<String> reach = draft.reach.getOrDefault(target, Set.of());
        if (target.equals(choice) || !reach.contains(choice)) {
            throw fault(
                    target, " does not rest on " + choice + "; it is the same for each of its words", "not-screened");
        }
        if (reach.stream().anyMatch(draft::isFree)) {
            throw fault(target, " rests on a free symbol and has no value by itself; name one with at", "no-value");
        }
        for (Item item : Closure.of(draft.items, draft.reach, choice, Set.of(target))) {
            Item.@Nullable Root root = rootIn(item);
            if (root != null) {
                throw fault(
                        target,
                        " rests on the root " + root.symbol() + ", which would be solved once for each word of "
                                + choice + "; name what comes ahead of the root",
                        "rests-on-root");
            }
            if (item instanceof Item.Line line && line.formula() instanceof Formula.Summary over) {
                throw fault(
                        target,
                        " rests on " + line.symbol() + ", which is over the cases; name " + over.name()
                                + ", of which the lowest and the highest are shown",
                        "over-cases");
            }
        }
        if (draft.isPerCase(target) && draft.outcome(target) instanceof DimensionReading.Words) {
            throw fault(
                    target, " holds words in each case; of these there is no lowest and no highest", "words-per-case");
        }
    }

    private static Item.@Nullable Root rootIn(Item item) {
        if (item instanceof Item.Root root) {
            return root;
        }
        if (item instanceof Item.At at) {
            for (Item member : at.members()) {
                Item.@Nullable Root root = rootIn(member);
                if (root != null) {
                    return root;
                }
            }
        }
        return null;
    }

    private FormulaException fault(String symbol, String message, String code) {
        return new FormulaException(symbol + message, offset, symbol.length(), code);
    }
}
