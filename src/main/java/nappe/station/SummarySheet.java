package nappe.station;

import static nappe.calculation.Formulas.call;
import static nappe.calculation.Formulas.compare;
import static nappe.calculation.Formulas.iff;
import static nappe.calculation.Formulas.number;
import static nappe.calculation.Formulas.plus;
import static nappe.calculation.Formulas.symbol;
import static nappe.calculation.Formulas.times;
import static nappe.calculation.Formulas.word;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.ElementSheet.LimitResult;
import nappe.calculation.Run;
import nappe.calculation.Scope;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * Lays the summary of limits: each in its worst case, the tightest first, live. The order comes from a key per limit and
 * case: the verdict first (no result, not met, not given, met, does not apply), then the margin.
 */
final class SummarySheet {
    private static final int CLASS_STEP = 20;

    private final Cells cells;
    private final SheetDraft summary;
    private final SheetDraft work;
    private final List<String> caseNames;
    private final Run caseNameCells;

    private final List<Cell> tags = new ArrayList<>();
    private final List<Cell> labels = new ArrayList<>();
    private final List<Cell> sources = new ArrayList<>();
    private final List<Cell> worst = new ArrayList<>();
    private final List<Cell> verdicts = new ArrayList<>();
    private final List<Cell> margins = new ArrayList<>();
    private final List<Cell> keys = new ArrayList<>();

    SummarySheet(Cells cells, SheetDraft summary, SheetDraft work, List<String> caseNames, Run caseNameCells) {
        this.cells = cells;
        this.summary = summary;
        this.work = work;
        this.caseNames = caseNames;
        this.caseNameCells = caseNameCells;
    }

    /** Lays the work table at the back and the two tables of the summary; returns the verdicts in summary order. */
    Run lay(List<LimitResult> limits) {
        TableDraft table = work.table("Order of the limits in the summary", workColumns());
        for (LimitResult limit : limits) {
            work(table, limit);
        }
        work.gap();
        Run sorted = sorted(limits.size());
        matrix(limits);
        return sorted;
    }

    private List<Block.Column> workColumns() {
        List<Block.Column> columns = new ArrayList<>(List.of(
                new Block.Column("Element", 9, Block.Align.LEFT),
                new Block.Column("Limit", 40, Block.Align.LEFT),
                new Block.Column("Source", 26, Block.Align.LEFT),
                new Block.Column("Worst case", 24, Block.Align.LEFT),
                new Block.Column("Verdict", 15, Block.Align.LEFT),
                new Block.Column("Margin", 12, Block.Align.RIGHT),
                new Block.Column("Key of the limit", 14, Block.Align.RIGHT)));
        caseNames.forEach(name -> columns.add(new Block.Column("Key, " + name, 14, Block.Align.RIGHT)));
        return columns;
    }

    private void work(TableDraft table, LimitResult limit) {
        int count = limit.verdicts().size();
        List<Cell> caseKeys = new ArrayList<>();
        for (int c = 0; c < count; c++) {
            caseKeys.add(key(table, limit.margins().get(c), limit.verdicts().get(c), 7 + c));
        }
        Scope scope = Scope.ofElement();
        scope.put("keys", new Run(caseKeys));
        scope.put("verdicts", new Run(limit.verdicts()));
        scope.put("names", caseNameCells);
        Formula place = call(Function.MATCH, call(Function.LOWEST_OF, symbol("keys")), symbol("keys"));
        Cell tag = typed(table, 0, limit.tag());
        Cell label = typed(table, 1, limit.label());
        Cell source = typed(table, 2, limit.source().isEmpty() ? "-" : limit.source());
        Cell name = limit.forAll()
                ? typed(table, 3, "all cases")
                : words(table, 3, call(Function.INDEX, symbol("names"), place), scope);
        Cell verdict = words(table, 4, call(Function.INDEX, symbol("verdicts"), place), scope);
        Cell margin = margin(table, limit, scope, place);
        Formula order = plus(
                call(Function.LOWEST_OF, symbol("keys")),
                number(String.format(Locale.ROOT, "%.6f", (keys.size() + 1) * 1e-6)));
        Cell key = cells.raw(table.place(6), "", Unit.one(), order, scope, null, false);
        List<Block.Item> row = new ArrayList<>();
        for (Cell cell : List.of(tag, label, source, name, verdict, margin, key)) {
            row.add(new Block.Content(cell));
        }
        caseKeys.forEach(cell -> row.add(new Block.Content(cell)));
        while (row.size() < 7 + caseNames.size()) {
            row.add(new Block.Text(""));
        }
        table.add(row);
        tags.add(tag);
        labels.add(label);
        sources.add(source);
        worst.add(name);
        verdicts.add(verdict);
        margins.add(margin);
        keys.add(key);
    }

    private Cell margin(TableDraft table, LimitResult limit, Scope scope, Formula place) {
        List<Cell> known = new ArrayList<>();
        for (@Nullable Cell margin : limit.margins()) {
            if (margin != null) {
                known.add(margin);
            }
        }
        if (known.size() != limit.verdicts().size()) {
            return typed(table, 5, "-");
        }
        scope.put("margins", new Run(known));
        return cells.raw(
                table.place(5), "", Unit.one(), call(Function.INDEX, symbol("margins"), place), scope, null, true);
    }

    private Cell typed(TableDraft table, int column, String text) {
        return cells.typed(Cell.Kind.TABLE, table.place(column), "", Unit.one(), Value.word(text), Sign.POSITIVE);
    }

    private Cell words(TableDraft table, int column, Formula formula, Scope scope) {
        return cells.raw(table.place(column), "", Unit.one(), formula, scope, null, false);
    }

    /** The rank of the verdict times twenty, plus the margin, held between -9 and 9. */
    private Cell key(TableDraft table, @Nullable Cell margin, Cell verdict, int column) {
        Scope scope = Scope.ofElement();
        scope.put("verdict", verdict);
        Formula rank = number("4");
        List<String> order = List.of("no result", "not met", "not given", "met");
        for (int i = order.size() - 1; i >= 0; i--) {
            rank = iff(compare(symbol("verdict"), Comparator.EQUAL, word(order.get(i))), number(Integer.toString(i)), rank);
        }
        Formula key = times(number(Integer.toString(CLASS_STEP)), rank);
        if (margin != null) {
            scope.put("margin", margin);
            Formula held = call(Function.MIN, call(Function.MAX, symbol("margin"), new Formula.Negation(number("9"))), number("9"));
            key = plus(key, iff(call(Function.IS_NUMBER, symbol("margin")), held, number("0")));
        }
        return cells.raw(table.place(column), "", Unit.one(), key, scope, null, false);
    }

    private Run sorted(int count) {
        summary.note("Verdicts rest on full precision, with a tolerance of 1e-9 relative to the bound; print is rounded. Margin: what is"
                + " left to the limit, over the size of the bound unless the limit names another scale.");
        TableDraft table = summary.table("Limits, each in its worst case, the tightest first", List.of(
                new Block.Column("No.", 6, Block.Align.RIGHT),
                new Block.Column("Element", 9, Block.Align.LEFT),
                new Block.Column("Limit", 44, Block.Align.LEFT),
                new Block.Column("Verdict", 15, Block.Align.LEFT),
                new Block.Column("Margin", 12, Block.Align.RIGHT),
                new Block.Column("Worst case", 26, Block.Align.LEFT),
                new Block.Column("Source", 28, Block.Align.LEFT)));
        Scope scope = Scope.ofElement();
        scope.put("keys", new Run(keys));
        scope.put("tags", new Run(tags));
        scope.put("labels", new Run(labels));
        scope.put("sources", new Run(sources));
        scope.put("worst", new Run(worst));
        scope.put("verdicts", new Run(verdicts));
        scope.put("margins", new Run(margins));
        List<Cell> sortedVerdicts = new ArrayList<>();
        for (int k = 1; k <= count; k++) {
            Formula place = call(
                    Function.MATCH, call(Function.SMALL, symbol("keys"), number(Integer.toString(k))), symbol("keys"));
            List<Block.Item> row = new ArrayList<>(List.of(new Block.Text(Integer.toString(k))));
            int column = 1;
            for (String what : List.of("tags", "labels", "verdicts", "margins", "worst", "sources")) {
                boolean mayBeBlank = what.equals("margins");
                Cell cell = cells.raw(
                        table.place(column++),
                        "",
                        Unit.one(),
                        call(Function.INDEX, symbol(what), place),
                        scope,
                        null,
                        mayBeBlank);
                if (what.equals("verdicts")) {
                    sortedVerdicts.add(cell);
                }
                row.add(new Block.Content(cell));
            }
            table.add(row);
        }
        summary.gap();
        return new Run(sortedVerdicts);
    }

    private void matrix(List<LimitResult> limits) {
        List<Block.Column> columns = new ArrayList<>(List.of(
                new Block.Column("No.", 6, Block.Align.RIGHT),
                new Block.Column("Element", 9, Block.Align.LEFT),
                new Block.Column("Limit", 44, Block.Align.LEFT)));
        List<Integer> widths = List.of(15, 12, 26, 28);
        for (int c = 0; c < caseNames.size(); c++) {
            columns.add(new Block.Column(caseNames.get(c), c < widths.size() ? widths.get(c) : 15, Block.Align.LEFT));
        }
        TableDraft table = summary.table("Every limit in every case", columns);
        for (int i = 0; i < limits.size(); i++) {
            LimitResult limit = limits.get(i);
            List<Block.Item> row = new ArrayList<>(List.of(
                    new Block.Text(Integer.toString(i + 1)),
                    new Block.Jump(limit.tag(), limit.verdicts().get(0)),
                    new Block.Text(limit.label())));
            for (int c = 0; c < caseNames.size(); c++) {
                Cell verdict = limit.verdicts().get(limit.forAll() ? 0 : c);
                Scope scope = Scope.ofElement();
                scope.put("verdict", verdict);
                row.add(new Block.Content(
                        cells.raw(table.place(3 + c), "", Unit.one(), symbol("verdict"), scope, null, false)));
            }
            table.add(row);
        }
        summary.gap();
    }
}
