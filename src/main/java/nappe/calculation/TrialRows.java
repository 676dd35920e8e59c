package nappe.calculation;

import static nappe.calculation.Formulas.call;
import static nappe.calculation.Formulas.iff;
import static nappe.calculation.Formulas.minus;
import static nappe.calculation.Formulas.number;
import static nappe.calculation.Formulas.over;
import static nappe.calculation.Formulas.symbol;
import static nappe.calculation.Formulas.times;
import static nappe.calculation.Formulas.word;

import java.util.ArrayList;
import java.util.List;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.PlainReading;
import nappe.formula.Value;
import nappe.method.Item;
import org.jspecify.annotations.Nullable;

/**
 * Roots in explicit trial rows: false position with the weighting of Anderson and Bjorck (BIT 13, 1973, pp. 253-264,
 * from memory), one evaluation of the closure a row. A row whose difference is within 1e-12 of the right side counts as
 * closed, and every later row repeats it, in every program alike.
 */
public final class TrialRows {
    /** How one root of one case went. */
    public record Solved(Item.Root root, String tag, String caseName, Cell status, Cell residual, List<Cell> trials) {}

    private static final Formula ZERO = number("0");

    private final Cells cells;
    private final SheetDraft sheet;
    private final List<Solved> solved = new ArrayList<>();
    private @Nullable ItemLayout layout;
    private String tag = "";
    private String caseName = "";
    private int depth;

    public TrialRows(Cells cells, SheetDraft sheet) {
        this.cells = cells;
        this.sheet = sheet;
    }

    void use(ItemLayout itemLayout) {
        this.layout = itemLayout;
    }

    /** Names the element and the case whose roots are laid next. */
    public void nowFor(String elementTag, String nameOfCase) {
        this.tag = elementTag;
        this.caseName = nameOfCase;
    }

    /** Every root laid so far, but for those inside the trial rows of another: that one does not close unless they do. */
    public List<Solved> solved() {
        return solved;
    }

    Cell lay(Item.Root root, Scope scope, Strip strip) {
        ItemLayout items = java.util.Objects.requireNonNull(layout);
        String title = tag + " " + root.symbol() + (caseName.isEmpty() ? "" : ", " + caseName) + ": " + root.label()
                + ", where " + PlainReading.of(root.left()) + " = " + PlainReading.of(root.right());
        List<Trial> trials = new ArrayList<>();
        List<Block.Column> columns = new ArrayList<>();
        TableDraft table = sheet.workbookTable(title, columns, root.trials());
        depth++;
        for (int k = 0; k < root.trials(); k++) {
            trials.add(row(root, scope, items, table, columns, trials));
        }
        depth--;
        Trial last = trials.get(trials.size() - 1);
        Scope end = scope.inner();
        end.put("d_1", trials.get(0).difference);
        end.put("d_2", trials.get(1).difference);
        end.put("d_n", last.difference);
        end.put("x_n", last.x);
        Cell status = status(root, strip, end);
        end.put("closing", status);
        Cell result = cells.live(strip.next(), root.symbol(), root.unit(), result(root), end);
        String equation = root.free() + " where " + PlainReading.of(root.left()) + " = " + PlainReading.of(root.right())
                + ", in trial rows";
        strip.add(new Strip.Laid(root.symbol(), root.label(), equation, root.source(), result));
        if (depth == 0) {
            solved.add(new Solved(
                    root,
                    tag,
                    caseName,
                    status,
                    last.difference,
                    trials.stream().map(t -> t.difference).toList()));
        }
        return result;
    }

    private Cell status(Item.Root root, Strip strip, Scope end) {
        Formula noBracket = compare(Comparator.ABOVE, times(symbol("d_1"), symbol("d_2")), ZERO);
        Formula closed = new Formula.Call(Function.SAME, List.of(symbol("d_n"), ZERO));
        Formula formula = iff(noBracket, outside(root), iff(closed, word("closed"), word("not closed")));
        Cell status = cells.live(strip.next(), "", null, formula, end);
        strip.add(new Strip.Laid(
                "", "trials for " + root.symbol(), "closed where the difference of the last trial is 0", "", status));
        return status;
    }

    private static Formula outside(Item.Root root) {
        if (root.below() == null && root.above() == null) {
            return word("no root in the bracket");
        }
        Formula nearLower =
                compare(Comparator.BELOW, call(Function.ABS, symbol("d_1")), call(Function.ABS, symbol("d_2")));
        return iff(
                nearLower,
                word(root.below() == null ? "no root in the bracket" : "below the bracket"),
                word(root.above() == null ? "no root in the bracket" : "above the bracket"));
    }

    private static Formula result(Item.Root root) {
        Formula result = new Formula.NoResult(Value.NO_RESULT);
        if (root.above() != null) {
            result = iff(compare(Comparator.EQUAL, symbol("closing"), word("above the bracket")), root.above(), result);
        }
        if (root.below() != null) {
            result = iff(compare(Comparator.EQUAL, symbol("closing"), word("below the bracket")), root.below(), result);
        }
        return iff(compare(Comparator.EQUAL, symbol("closing"), word("closed")), symbol("x_n"), result);
    }

    private record Trial(
            Cell x,
            Cell difference,
            @Nullable Cell other,
            @Nullable Cell weighted) {}

    private Trial row(
            Item.Root root,
            Scope scope,
            ItemLayout items,
            TableDraft table,
            List<Block.Column> columns,
            List<Trial> before) {
        int k = before.size();
        Scope rows = scope.inner();
        List<Block.Item> shown = new ArrayList<>();
        shown.add(new Block.Text(Integer.toString(k + 1)));
        if (k >= 1) {
            rows.put("d_1", before.get(0).difference);
        }
        if (k >= 2) {
            Trial one = before.get(k - 1);
            rows.put("x_1", before.get(0).x);
            rows.put("d_2", before.get(1).difference);
            rows.put("x_p", one.x);
            rows.put("d_p", one.difference);
            rows.put("x_o", java.util.Objects.requireNonNull(one.other));
            rows.put("d_o", java.util.Objects.requireNonNull(one.weighted));
        }
        Formula formula = k == 0 ? root.from() : k == 1 ? root.to() : next();
        Cell x = cells.live(
                table.place(1), root.free(), root.unit(), formula, k < 2 ? scope : rows, root.freeSign(), false);
        shown.add(new Block.Content(x));

        Scope trial = scope.inner();
        trial.put(root.free(), x);
        Strip strip = Strip.along(table.place(2).sheet(), table.nextRow(), 2);
        root.members().forEach(member -> items.lay(member, trial, strip));
        strip.laid().forEach(line -> shown.add(new Block.Content(line.cell())));
        if (k == 0) {
            columns.addAll(columns(root, strip));
        }
        Cell difference = cells.live(strip.next(), "d", null, difference(root), trial);
        shown.add(new Block.Content(difference));

        Cell other = null;
        Cell weighted = null;
        if (k >= 1) {
            Scope ends = scope.inner();
            Trial one = before.get(k - 1);
            ends.put("d", difference);
            ends.put("x_p", one.x);
            ends.put("d_p", one.difference);
            if (one.other != null && one.weighted != null) {
                ends.put("x_o", one.other);
                ends.put("d_o", one.weighted);
            }
            other = cells.live(strip.next(), "x_o", root.unit(), k == 1 ? symbol("x_p") : otherEnd(), ends);
            weighted = cells.live(strip.next(), "d_o", null, k == 1 ? symbol("d_p") : weighting(), ends);
            shown.add(new Block.Content(other));
            shown.add(new Block.Content(weighted));
        } else {
            shown.add(new Block.Text(""));
            shown.add(new Block.Text(""));
        }
        table.add(shown);
        return new Trial(x, difference, other, weighted);
    }

    /** {@code if(d_1*d_2 > 0, x_1, if(same(d_p, d_o), x_p, x_p - d_p*(x_p - x_o)/(d_p - d_o)))}. */
    private static Formula next() {
        Formula step =
                over(times(symbol("d_p"), minus(symbol("x_p"), symbol("x_o"))), minus(symbol("d_p"), symbol("d_o")));
        Formula noBracket = compare(Comparator.ABOVE, times(symbol("d_1"), symbol("d_2")), ZERO);
        Formula level = new Formula.Call(Function.SAME, List.of(symbol("d_p"), symbol("d_o")));
        return iff(noBracket, symbol("x_1"), iff(level, symbol("x_p"), minus(symbol("x_p"), step)));
    }

    /** {@code if(abs(left - right) - 1e-12*abs(right) <= 0, 0, left - right)}. */
    private static Formula difference(Item.Root root) {
        Formula difference = minus(root.left(), root.right());
        Formula miss = minus(call(Function.ABS, difference), times(number("1e-12"), call(Function.ABS, root.right())));
        return iff(compare(Comparator.AT_MOST, miss, ZERO), ZERO, difference);
    }

    private static Formula otherEnd() {
        return iff(compare(Comparator.BELOW, times(symbol("d"), symbol("d_p")), ZERO), symbol("x_p"), symbol("x_o"));
    }

    private static Formula weighting() {
        Formula ratio = over(symbol("d"), symbol("d_p"));
        Formula half = number("0.5");
        Formula one = number("1");
        Formula weight = iff(
                new Formula.Call(Function.SAME, List.of(symbol("d_p"), ZERO)),
                one,
                iff(compare(Comparator.BELOW, ratio, one), minus(one, ratio), half));
        return iff(
                compare(Comparator.BELOW, times(symbol("d"), symbol("d_p")), ZERO),
                symbol("d_p"),
                times(symbol("d_o"), weight));
    }

    private List<Block.Column> columns(Item.Root root, Strip members) {
        List<Block.Column> columns = new ArrayList<>();
        columns.add(column("Trial"));
        columns.add(column(root.free() + " [" + cells.unit(root.unit().dimension()) + "]"));
        members.heads().forEach(head -> columns.add(column(head)));
        columns.add(column("difference"));
        columns.add(column("other end"));
        columns.add(column("its difference"));
        return columns;
    }

    private static Block.Column column(String head) {
        return new Block.Column(head, 16, Block.Align.RIGHT);
    }

    private static Formula compare(Comparator comparator, Formula left, Formula right) {
        return Formulas.compare(left, comparator, right);
    }
}
