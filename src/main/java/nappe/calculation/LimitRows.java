package nappe.calculation;

import static nappe.calculation.Formulas.call;
import static nappe.calculation.Formulas.compare;
import static nappe.calculation.Formulas.iff;
import static nappe.calculation.Formulas.minus;
import static nappe.calculation.Formulas.over;
import static nappe.calculation.Formulas.symbol;
import static nappe.calculation.Formulas.word;

import java.util.Map;
import nappe.formula.Comparator;
import nappe.formula.DimensionReading;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.method.Limit;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/** Lays the cells of one limit: the sides where they are more than a symbol, the margin, the verdict in words. */
final class LimitRows {
    /** The five verdicts, in the order of the summary. */
    static final String NOT_MET = "not met";

    static final String MET = "met";
    static final String DOES_NOT_APPLY = "does not apply";

    private final Cells cells;

    LimitRows(Cells cells) {
        this.cells = cells;
    }

    /** The cells of a limit in one scope; no margin where there is nothing to measure. */
    record Judged(@Nullable Cell margin, Cell verdict) {}

    Judged lay(Limit limit, Scope scope, Strip strip) {
        Scope inner = scope.inner();
        Formula lesser = side(limit.lesser(), "lesser", limit.label() + ": lesser side", inner, strip);
        Formula greater = side(limit.greater(), "greater", limit.label() + ": greater side", inner, strip);
        Formula bound = limit.valueIsLesser() ? greater : lesser;
        Formula scale = limit.scale() == null ? call(Function.ABS, bound) : limit.scale();
        Formula left = minus(greater, lesser);
        Unit unit = unitOf(limit.greater(), inner);
        if (!unit.dimension().isNone()) {
            Cell leftCell = cells.raw(strip.next(), "left", unit, left, inner, null, false);
            inner.put("left", leftCell);
            strip.add(new Strip.Laid("", limit.label() + ": left to the limit", "", "", leftCell));
            left = symbol("left");
        }
        Formula measured = over(left, scale);
        if (limit.when() != null) {
            // what is left to a limit that does not apply is no margin, and must not count as the tightest
            measured = iff(limit.when(), measured, new Formula.NoResult(DOES_NOT_APPLY));
        }
        Cell margin = cells.live(strip.next(), "", Unit.one(), measured, inner);
        strip.add(new Strip.Laid("", limit.label() + ": margin", "", limit.source(), margin));
        Formula comparison = iff(compare(lesser, Comparator.AT_MOST, greater), word(MET), word(NOT_MET));
        Formula verdict = limit.when() == null ? comparison : iff(limit.when(), comparison, word(DOES_NOT_APPLY));
        Cell cell = cells.live(strip.next(), "", null, verdict, inner);
        strip.add(new Strip.Laid("", limit.label(), "", limit.source(), cell));
        return new Judged(margin, cell);
    }

    private Formula side(Formula side, String name, String label, Scope inner, Strip strip) {
        boolean simple =
                side instanceof Formula.Symbol || side instanceof Formula.Quantity || side instanceof Formula.Numeral;
        if (simple) {
            return side;
        }
        Cell cell = cells.raw(strip.next(), name, unitOf(side, inner), side, inner, null, false);
        inner.put(name, cell);
        strip.add(new Strip.Laid("", label, "", "", cell));
        return symbol(name);
    }

    /** The working unit of a side, from the cells it refers to. */
    private Unit unitOf(Formula side, Scope inner) {
        return cells.unit(new DimensionReading(name -> new DimensionReading.Quantity(dimension(inner, name)), Map.of())
                .dimension(side));
    }

    /** The numbers of a run of table cells are pure: their unit stands in the formula that looks them up. */
    private static Dimension dimension(Scope scope, String name) {
        return scope.find(name) instanceof Cell cell ? cell.unit().dimension() : Dimension.NONE;
    }

    /** The verdict on a root: whether its trials have closed. */
    Judged closing(TrialRows.Solved solved, Scope scope, Strip strip) {
        Scope inner = scope.inner();
        inner.put("closing", solved.status());
        Formula closing = symbol("closing");
        Formula verdict = iff(
                compare(closing, Comparator.EQUAL, word("closed")),
                word(MET),
                iff(
                        compare(closing, Comparator.EQUAL, word("not given")),
                        word(DOES_NOT_APPLY),
                        iff(
                                compare(closing, Comparator.EQUAL, word("no result")),
                                word("no result"),
                                outside(solved, closing))));
        Cell cell = cells.live(strip.next(), "", null, verdict, inner);
        String label = "the trials for " + solved.root().symbol() + " have closed";
        strip.add(new Strip.Laid("", label, "", "", cell));
        return new Judged(null, cell);
    }

    /** A root outside its bracket is no fault where the method says what holds there. */
    private static Formula outside(TrialRows.Solved solved, Formula closing) {
        Formula verdict = word(NOT_MET);
        if (solved.root().below() != null) {
            verdict = iff(compare(closing, Comparator.EQUAL, word("below the bracket")), word(MET), verdict);
        }
        if (solved.root().above() != null) {
            verdict = iff(compare(closing, Comparator.EQUAL, word("above the bracket")), word(MET), verdict);
        }
        return verdict;
    }
}
