package nappe.calculation;

import java.util.Map;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.PlainReading;
import nappe.formula.Value;
import nappe.method.Item;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * Lays items of a method sheet as cells under a scope. One recursion serves case columns, trial rows and rating tables;
 * they differ in the scope and the strip.
 */
public final class ItemLayout {
    private final Cells cells;
    private final TrialRows trialRows;

    public ItemLayout(Cells cells, TrialRows trialRows) {
        this.cells = cells;
        this.trialRows = trialRows;
        trialRows.use(this);
    }

    public Cells cells() {
        return cells;
    }

    /** Lays one item; what it defines is then known in the scope. */
    public void lay(Item item, Scope scope, Strip strip) {
        if (item instanceof Item.Line line) {
            lay(line, line.symbol(), "", scope, strip);
        } else if (item instanceof Item.At at) {
            lay(at, scope, strip);
        } else if (item instanceof Item.Root root) {
            lay(root, scope, strip);
        }
    }

    /**
     * Lays a line over the cases: the highest or lowest of a run, and no result where one of the cases has none.
     *
     * @param run what the summary names, one cell per case
     */
    public void layOverCases(Item.Line line, Formula.Summary over, Run run, Scope scope, Strip strip) {
        Cell cell = overCases(strip.next(), line.symbol(), line.unit(), over, run);
        scope.put(line.symbol(), cell);
        strip.add(new Strip.Laid(
                line.symbol(), line.label(), PlainReading.of(over) + " over the cases", line.source(), cell));
    }

    /** The highest or lowest of a run of one cell per case; no result where one of them has none. */
    public Cell overCases(Place place, String symbol, @Nullable Unit unit, Formula.Summary over, Run run) {
        Scope inner = Scope.ofElement();
        inner.put(over.name(), run);
        boolean sure = run.cells().stream().allMatch(cell -> cell.sureness() == Sureness.SURE);
        Formula all = Formulas.compare(
                Formulas.call(Function.COUNT_OF, Formulas.symbol(over.name())),
                Comparator.EQUAL,
                Formulas.number(Integer.toString(run.cells().size())));
        Formula formula = sure ? over : Formulas.iff(all, over, new Formula.NoResult(Value.NO_RESULT));
        return cells.live(place, symbol, unit, formula, inner);
    }

    private void lay(Item.Line line, String shownAs, String where, Scope scope, Strip strip) {
        Cell cell = cells.live(
                strip.next(), shownAs, line.unit(), line.formula(), scope, line.knownSign(), line.mayBeBlank());
        scope.put(line.symbol(), cell);
        strip.add(new Strip.Laid(shownAs, line.label() + where, LookUp.inWords(line.formula()), line.source(), cell));
    }

    private void lay(Item.At at, Scope scope, Strip strip) {
        Scope known = at.value() instanceof Formula.Symbol value ? scope.ownAtRoot(value.name()) : null;
        Scope inner = known != null && known.hasOwn(at.free()) ? known : scope.inner();
        String where = ", at " + at.free() + " = " + PlainReading.of(at.value());
        if (inner != known) {
            bind(at, scope, inner, strip);
        }
        for (Item member : at.members()) {
            if (member.outputs().stream().allMatch(inner::hasOwn)) {
                continue;
            }
            if (member instanceof Item.Line line) {
                lay(line, nameFor(at, line.symbol()), where, inner, strip);
            } else {
                lay(member, inner, strip);
            }
        }
        at.results().forEach((name, symbol) -> scope.put(name, inner.cell(symbol)));
    }

    private void bind(Item.At at, Scope scope, Scope inner, Strip strip) {
        if (at.value() instanceof Formula.Symbol value) {
            inner.put(at.free(), scope.cell(value.name()));
        } else {
            Cell cell = cells.live(strip.next(), at.free(), null, at.value(), scope);
            inner.put(at.free(), cell);
            strip.add(new Strip.Laid(at.free(), "value of " + at.free(), "", "", cell));
        }
    }

    private static String nameFor(Item.At at, String member) {
        return at.results().entrySet().stream()
                .filter(result -> result.getValue().equals(member))
                .map(Map.Entry::getKey)
                .findFirst()
                .orElse(member);
    }

    private void lay(Item.Root root, Scope scope, Strip strip) {
        Cell result = trialRows.lay(root, scope, strip);
        scope.put(root.symbol(), result);
        Scope inner = scope.inner();
        inner.put(root.free(), result);
        for (Item member : root.members()) {
            if (member instanceof Item.Line line) {
                lay(line, line.symbol(), ", at " + root.free() + " = " + root.symbol(), inner, strip);
            } else {
                lay(member, inner, strip);
            }
        }
        scope.putAtRoot(root.symbol(), inner);
    }
}
