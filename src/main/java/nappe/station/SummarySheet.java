package nappe.station;

import static nappe.calculation.Formulas.call;
import static nappe.calculation.Formulas.compare;
import static nappe.calculation.Formulas.iff;
import static nappe.calculation.Formulas.number;
import static nappe.calculation.Formulas.over;
import static nappe.calculation.Formulas.plus;
import static nappe.calculation.Formulas.symbol;
import static nappe.calculation.Formulas.times;
import static nappe.calculation.Formulas.word;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
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
 * Lays the summary of limits, live: each limit with its worst verdict over the cases, in how many cases it is not met or
 * has no result, and its tightest margin with the case that has it. A limit that fails in one case stays in sight though
 * another case has no result. Sorted by verdict (not met, no result, not given, met, does not apply), then by margin.
 */
final class SummarySheet {
    private static final List<String> RANKED = List.of("not met", "no result", "not given", "met");

    /** What the work table holds of each limit, in the order of its columns from the left. */
    private static final List<String> PARTS =
            List.of("tag", "limit", "source", "verdict", "not met", "no result", "margin", "case");

    private final Cells cells;
    private final SheetDraft summary;
    private final SheetDraft work;
    private final List<String> caseNames;
    private final Run caseNameCells;

    private final Map<String, List<Cell>> parts = new LinkedHashMap<>();
    private final List<Cell> keys = new ArrayList<>();

    SummarySheet(Cells cells, SheetDraft summary, SheetDraft work, List<String> caseNames, Run caseNameCells) {
        this.cells = cells;
        this.summary = summary;
        this.work = work;
        this.caseNames = caseNames;
        this.caseNameCells = caseNameCells;
        PARTS.forEach(part -> parts.put(part, new ArrayList<>()));
    }

    /** The cells of one column of the sorted summary, the worst limit first. */
    record Sorted(Run verdicts, Run limits, Run cases) {}

    /** Lays the work table at the back and the two tables of the summary. */
    Sorted lay(List<LimitResult> limits) {
        work.heading("Order of the limits in the summary");
        work.note(
                "The order of a limit is the rank of its worst verdict (0 not met, 1 no result, 2 not given, 3 met, 4 does not apply) times"
                        + " three, plus its tightest margin m as m/(1 + |m|) or 1 where it has none (and a billionth for each case before), plus a millionth for each limit before it.");
        TableDraft table = work.workbookTable("", workColumns(), limits.size());
        for (LimitResult limit : limits) {
            work(table, limit);
        }
        work.gap();
        Sorted sorted = sorted(limits.size());
        matrix(limits);
        return sorted;
    }

    private List<Block.Column> workColumns() {
        List<Block.Column> columns = new ArrayList<>(List.of(
                new Block.Column("Element", 9, Block.Align.LEFT),
                new Block.Column("Limit", 40, Block.Align.LEFT),
                new Block.Column("Source", 26, Block.Align.LEFT),
                new Block.Column("Worst verdict", 24, Block.Align.LEFT),
                new Block.Column("Not met in", 15, Block.Align.RIGHT),
                new Block.Column("No result in", 12, Block.Align.RIGHT),
                new Block.Column("Tightest margin", 14, Block.Align.RIGHT),
                new Block.Column("In case", 22, Block.Align.LEFT),
                new Block.Column("Order", 12, Block.Align.RIGHT)));
        caseNames.forEach(name -> columns.add(new Block.Column("Rank, " + name, 14, Block.Align.RIGHT)));
        caseNames.forEach(name -> columns.add(new Block.Column("Margin held, " + name, 14, Block.Align.RIGHT)));
        return columns;
    }

    private void work(TableDraft table, LimitResult limit) {
        int count = limit.verdicts().size();
        int first = PARTS.size() + 1;
        List<Cell> ranks = new ArrayList<>();
        List<Cell> held = new ArrayList<>();
        for (int c = 0; c < count; c++) {
            ranks.add(rank(table, limit.verdicts().get(c), first + c));
        }
        List<Cell> margins = margins(limit);
        for (int c = 0; c < margins.size(); c++) {
            held.add(held(table, margins.get(c), first + caseNames.size() + c, c));
        }
        Scope scope = Scope.ofElement();
        scope.put("ranks", new Run(ranks));
        scope.put("verdicts", new Run(limit.verdicts()));
        scope.put("names", caseNameCells);
        Formula worst = call(Function.MATCH, call(Function.LOWEST_OF, symbol("ranks")), symbol("ranks"));
        keep("tag", typed(table, 0, limit.tag()));
        keep("limit", typed(table, 1, limit.label()));
        keep("source", typed(table, 2, limit.source().isEmpty() ? "-" : limit.source()));
        keep("verdict", live(table, 3, call(Function.INDEX, symbol("verdicts"), worst), scope, false));
        keep("not met", live(table, 4, call(Function.TALLY, symbol("verdicts"), word("not met")), scope, false));
        keep("no result", live(table, 5, call(Function.TALLY, symbol("verdicts"), word("no result")), scope, false));
        Formula order = times(number("3"), call(Function.LOWEST_OF, symbol("ranks")));
        if (held.isEmpty()) {
            keep("margin", typed(table, 6, "-"));
            keep(
                    "case",
                    limit.forAll()
                            ? typed(table, 7, "all cases")
                            : live(table, 7, call(Function.INDEX, symbol("names"), worst), scope, false));
            order = plus(order, number("1"));
        } else {
            scope.put("held", new Run(held));
            scope.put("margins", new Run(margins));
            Formula tightest = call(Function.MATCH, call(Function.LOWEST_OF, symbol("held")), symbol("held"));
            keep("margin", live(table, 6, call(Function.INDEX, symbol("margins"), tightest), scope, true));
            keep(
                    "case",
                    limit.forAll()
                            ? typed(table, 7, "all cases")
                            : live(table, 7, call(Function.INDEX, symbol("names"), tightest), scope, false));
            order = plus(order, call(Function.LOWEST_OF, symbol("held")));
        }
        String tie = String.format(Locale.ROOT, "%.6f", (keys.size() + 1) * 1e-6);
        Cell key = live(table, PARTS.size(), plus(order, number(tie)), scope, false);
        keys.add(key);
        List<Block.Item> row = new ArrayList<>();
        parts.values().forEach(cellsOf -> row.add(new Block.Content(cellsOf.get(cellsOf.size() - 1))));
        row.add(new Block.Content(key));
        add(row, ranks);
        add(row, held);
        table.add(row);
    }

    private void add(List<Block.Item> row, List<Cell> perCase) {
        for (int c = 0; c < caseNames.size(); c++) {
            row.add(c < perCase.size() ? new Block.Content(perCase.get(c)) : new Block.Text(""));
        }
    }

    private static List<Cell> margins(LimitResult limit) {
        List<Cell> known = new ArrayList<>();
        for (@Nullable Cell margin : limit.margins()) {
            if (margin != null) {
                known.add(margin);
            }
        }
        return known;
    }

    private void keep(String part, Cell cell) {
        java.util.Objects.requireNonNull(parts.get(part)).add(cell);
    }

    private Cell typed(TableDraft table, int column, String text) {
        return cells.typed(Cell.Kind.TABLE, table.place(column), "", Unit.one(), Value.word(text), Sign.POSITIVE);
    }

    private Cell live(TableDraft table, int column, Formula formula, Scope scope, boolean mayBeWords) {
        return cells.raw(table.place(column), "", Unit.one(), formula, scope, null, mayBeWords);
    }

    private Cell rank(TableDraft table, Cell verdict, int column) {
        Scope scope = Scope.ofElement();
        scope.put("verdict", verdict);
        Formula rank = number("4");
        for (int i = RANKED.size() - 1; i >= 0; i--) {
            rank = iff(
                    compare(symbol("verdict"), Comparator.EQUAL, word(RANKED.get(i))),
                    number(Integer.toString(i)),
                    rank);
        }
        return live(table, column, rank, scope, false);
    }

    /**
     * A margin of any size held between -1 and 1 in its order; 1 where there is none. A billionth for each case before
     * lets the first of equal margins stand, whatever the last digits are in a spreadsheet program.
     */
    private Cell held(TableDraft table, Cell margin, int column, int before) {
        Scope scope = Scope.ofElement();
        scope.put("margin", margin);
        Formula held = over(symbol("margin"), plus(number("1"), call(Function.ABS, symbol("margin"))));
        Formula known = iff(call(Function.IS_NUMBER, symbol("margin")), held, number("1"));
        return live(table, column, before == 0 ? known : plus(known, number(before + "e-9")), scope, false);
    }

    private Sorted sorted(int count) {
        summary.note(
                "Verdicts rest on full precision, with a tolerance of 1e-9 relative to the bound; print is rounded. The verdict of a limit is"
                        + " its worst over the cases. Margin: what is left to the limit over the size of the bound, unless the limit names another"
                        + " scale; for lengths and levels demanded by others, what is left over the height that the element names (greatest"
                        + " rated head, height of the walls), or over one working unit where it names none.");
        TableDraft table = summary.table(
                "Limits, the worst first",
                List.of(
                        new Block.Column("Rank", 6, Block.Align.RIGHT),
                        new Block.Column("Element", 9, Block.Align.LEFT),
                        new Block.Column("Limit", 44, Block.Align.LEFT),
                        new Block.Column("Worst verdict", 15, Block.Align.LEFT),
                        new Block.Column("Cases not met", 12, Block.Align.RIGHT),
                        new Block.Column("Cases without result", 14, Block.Align.RIGHT),
                        new Block.Column("Tightest margin", 14, Block.Align.RIGHT),
                        new Block.Column("in case", 26, Block.Align.LEFT),
                        new Block.Column("Source", 28, Block.Align.LEFT)));
        Scope scope = Scope.ofElement();
        scope.put("keys", new Run(keys));
        parts.forEach((part, cellsOf) -> scope.put(part, new Run(cellsOf)));
        List<String> columns = List.of("tag", "limit", "verdict", "not met", "no result", "margin", "case", "source");
        Map<String, List<Cell>> laid = new LinkedHashMap<>();
        for (int k = 1; k <= count; k++) {
            Formula place = call(
                    Function.MATCH, call(Function.SMALL, symbol("keys"), number(Integer.toString(k))), symbol("keys"));
            List<Block.Item> row = new ArrayList<>(List.of(new Block.Text(Integer.toString(k))));
            int column = 1;
            for (String part : columns) {
                Cell cell =
                        live(table, column++, call(Function.INDEX, symbol(part), place), scope, part.equals("margin"));
                laid.computeIfAbsent(part, p -> new ArrayList<>()).add(cell);
                row.add(new Block.Content(cell));
            }
            table.add(row);
        }
        summary.gap();
        return new Sorted(
                new Run(java.util.Objects.requireNonNull(laid.get("verdict"))),
                new Run(java.util.Objects.requireNonNull(laid.get("limit"))),
                new Run(java.util.Objects.requireNonNull(laid.get("case"))));
    }

    private void matrix(List<LimitResult> limits) {
        List<Block.Column> columns = new ArrayList<>(List.of(
                new Block.Column("Line", 6, Block.Align.RIGHT),
                new Block.Column("Element", 9, Block.Align.LEFT),
                new Block.Column("Limit", 44, Block.Align.LEFT)));
        List<Integer> widths = List.of(15, 12, 14, 14, 26, 28);
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
                row.add(new Block.Content(
                        cells.same(table.place(3 + c), "", limit.verdicts().get(limit.forAll() ? 0 : c))));
            }
            table.add(row);
        }
        summary.gap();
    }
}
