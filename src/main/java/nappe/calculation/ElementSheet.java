package nappe.calculation;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.formula.Formula;
import nappe.formula.PlainReading;
import nappe.formula.SymbolsReading;
import nappe.method.Item;
import nappe.method.Limit;
import nappe.method.MethodSheet;
import org.jspecify.annotations.Nullable;

/**
 * Lays the calculation of one element: what is given, every line, every limit; what rests on a case once per case, all
 * else once.
 */
public final class ElementSheet {
    /** The column of what serves all cases. */
    public static final int ALL_CASES = 6;

    /** The column of the first case. */
    public static final int FIRST_CASE = 7;

    /** A limit with its verdicts: one for all cases, or one per case. */
    public record LimitResult(
            String tag,
            String label,
            String source,
            Limit.Kind kind,
            List<@Nullable Cell> margins,
            List<Cell> verdicts) {
        public boolean forAll() {
            return verdicts.size() == 1;
        }

        /** The same for the first columns only. */
        public LimitResult first(int columnCount) {
            int count = Math.min(columnCount, verdicts.size());
            return new LimitResult(tag, label, source, kind, margins.subList(0, count), verdicts.subList(0, count));
        }
    }

    /** The name of the case, for a limit that is judged in one case alone. */
    public static final String CASE_NAME = "case";

    /**
     * A limit demanded by others, with the cells it brings along.
     *
     * @param caseNames the cells with the names of the columns, where its condition asks for the case; else empty
     */
    public record Demanded(Limit limit, Map<String, Cell> cells, List<Cell> caseNames) {}

    private final String tag;
    private final MethodSheet method;
    private final ItemLayout items;
    private final TrialRows trialRows;
    private final SheetDraft sheet;
    private final Scope scope;
    private final CaseColumns columns;
    private final List<Scope> cases;
    private final List<Block.Line> lines = new ArrayList<>();
    private final List<LimitResult> limits = new ArrayList<>();
    private int firstRow;
    private int numbered;

    /**
     * @param scope knows the entries, constants and table columns of the element
     * @param cases one scope per case under it, which know what is typed or taken per case
     */
    public ElementSheet(
            String tag,
            MethodSheet method,
            ItemLayout items,
            TrialRows trialRows,
            SheetDraft sheet,
            Scope scope,
            CaseColumns columns,
            List<Scope> cases) {
        this.tag = tag;
        this.method = method;
        this.items = items;
        this.trialRows = trialRows;
        this.sheet = sheet;
        this.scope = scope;
        this.columns = columns;
        this.cases = cases;
    }

    /** The lines laid, in order. */
    public List<Block.Line> lines() {
        return List.copyOf(lines);
    }

    /** Lays everything; the scopes then know every symbol. */
    public List<LimitResult> lay(int workedCase, List<Demanded> demands) {
        firstRow = sheet.nextRow() + 1;
        heading("Given");
        for (Item item : method.items()) {
            if (item instanceof Item.Given || item instanceof Item.Constant) {
                given(item);
            }
        }
        heading("Calculation");
        for (Item item : method.items()) {
            if (!(item instanceof Item.Given || item instanceof Item.Constant || item instanceof Item.Free)
                    && item.outputs().stream().noneMatch(method::isTemplate)) {
                if (item instanceof Item.Line line && line.formula() instanceof Formula.Summary over) {
                    overCases(line, over);
                    continue;
                }
                boolean perCase = item.outputs().stream().anyMatch(method::perCase);
                rows(perCase, (at, strip) -> items.lay(item, at, strip));
            }
        }
        heading("Limits");
        LimitRows limitRows = new LimitRows(items.cells());
        for (Limit limit : method.limits()) {
            if (limit.kind() != Limit.Kind.THRESHOLD) {
                limit(limitRows, limit, Map.of(), List.of());
            }
        }
        closings(limitRows);
        if (!demands.isEmpty()) {
            heading("Limits demanded by others");
            demands.forEach(demand -> limit(limitRows, demand.limit(), demand.cells(), demand.caseNames()));
        }
        thresholds(limitRows);
        sheet.lines(columns, workedCase, lines);
        return List.copyOf(limits);
    }

    private void thresholds(LimitRows limitRows) {
        List<Limit> thresholds = method.limits().stream()
                .filter(limit -> limit.kind() == Limit.Kind.THRESHOLD)
                .toList();
        if (!thresholds.isEmpty()) {
            heading("Thresholds: searched for, not judged");
            thresholds.forEach(limit -> limit(limitRows, limit, Map.of(), List.of()));
        }
    }

    /** A line over the cases stands once; it knows what it sums up as the run of the judged cases. */
    private void overCases(Item.Line line, Formula.Summary over) {
        Run run = new Run(cases.subList(0, columns.judged()).stream()
                .map(one -> one.cell(over.name()))
                .toList());
        rows(false, (at, strip) -> items.layOverCases(line, over, run, at, strip));
    }

    private void given(Item item) {
        String symbol = item.outputs().get(0);
        boolean perCase = method.perCase(symbol);
        String label = item instanceof Item.Given g ? g.label() : ((Item.Constant) item).label();
        String source = item instanceof Item.Constant c && c.citation() != null
                ? c.citation().shown()
                : "";
        rows(perCase, (at, strip) -> {
            Cell origin = at.cell(symbol);
            Cell cell = items.cells().factors().toWorking(strip.next(), symbol, origin);
            at.put(symbol, cell);
            strip.add(new Strip.Laid(
                    symbol,
                    label,
                    "from sheet " + origin.place().sheet() + ", "
                            + origin.place().address(),
                    source,
                    cell));
        });
    }

    private void heading(String text) {
        lines.add(new Block.Line(Block.LineKind.HEADING, "", text, "", "", "", "", null, List.of()));
    }

    private interface Laying {
        void lay(Scope scope, Strip strip);
    }

    private List<List<Strip.Laid>> rows(boolean perCase, Laying laying) {
        return rows(perCase, laying, false);
    }

    /** Lays the same rows once for all cases, or once per case beside each other. */
    private List<List<Strip.Laid>> rows(boolean perCase, Laying laying, boolean isLimit) {
        int row = firstRow + lines.size();
        List<List<Strip.Laid>> laid = new ArrayList<>();
        if (perCase) {
            for (int c = 0; c < cases.size(); c++) {
                trialRows.nowFor(tag, columns.names().get(c));
                Strip strip = Strip.down(sheet.name(), row, FIRST_CASE + c);
                laying.lay(cases.get(c), strip);
                laid.add(strip.laid());
            }
        } else {
            trialRows.nowFor(tag, "");
            Strip strip = Strip.down(sheet.name(), row, ALL_CASES);
            laying.lay(scope, strip);
            laid.add(strip.laid());
        }
        for (int i = 0; i < laid.get(0).size(); i++) {
            add(perCase, laid, i, isLimit);
        }
        return laid;
    }

    private void add(boolean perCase, List<List<Strip.Laid>> laid, int i, boolean isLimit) {
        Strip.Laid first = laid.get(0).get(i);
        List<Cell> perCaseCells =
                perCase ? laid.stream().map(l -> l.get(i).cell()).toList() : List.of();
        int size = laid.get(0).size();
        Block.LineKind kind = !isLimit || i < size - 2
                ? first.onTheWay() ? Block.LineKind.STEP : Block.LineKind.QUANTITY
                : i == size - 1 ? Block.LineKind.LIMIT_VERDICT : Block.LineKind.LIMIT_MARGIN;
        lines.add(new Block.Line(
                kind,
                tag + "." + String.format(java.util.Locale.ROOT, "%03d", ++numbered),
                first.label(),
                first.symbol(),
                equation(laid, i),
                unitText(first),
                first.source(),
                perCase ? null : first.cell(),
                perCaseCells));
    }

    /** The equation of a line; where each case has its own origin, the run of origins on the sheet of the first. */
    private static String equation(List<List<Strip.Laid>> laid, int i) {
        Strip.Laid first = laid.get(0).get(i);
        Formula formula = first.cell().formula();
        if (first.equation().isEmpty() && formula != null) {
            return PlainReading.of(formula);
        }
        String sheet = beforeComma(first.equation());
        String last = first.equation();
        for (List<Strip.Laid> one : laid) {
            String text = one.get(i).equation();
            last = beforeComma(text).equals(sheet) ? text : last;
        }
        return first.equation().equals(last)
                ? first.equation()
                : first.equation() + " to " + last.substring(sheet.length()) + ", one for each case";
    }

    private static String beforeComma(String text) {
        int comma = text.lastIndexOf(", ");
        return comma < 0 ? "" : text.substring(0, comma + 2);
    }

    private static String unitText(Strip.Laid line) {
        return line.cell().unit().text().equals("1") ? "" : line.cell().unit().text();
    }

    private void limit(LimitRows limitRows, Limit limit, Map<String, Cell> brought, List<Cell> caseNames) {
        Set<String> symbols = new HashSet<>(SymbolsReading.of(limit.lesser()));
        symbols.addAll(SymbolsReading.of(limit.greater()));
        if (limit.scale() != null) {
            symbols.addAll(SymbolsReading.of(limit.scale()));
        }
        if (limit.when() != null) {
            symbols.addAll(SymbolsReading.of(limit.when()));
        }
        boolean perCase = !caseNames.isEmpty() || symbols.stream().anyMatch(method::perCase);
        int[] next = {0};
        List<LimitRows.Judged> judged = new ArrayList<>();
        rows(
                perCase,
                (at, strip) -> {
                    Scope inner = at.inner();
                    brought.forEach(inner::put);
                    if (!caseNames.isEmpty()) {
                        inner.put(CASE_NAME, caseNames.get(next[0]++));
                    }
                    judged.add(limitRows.lay(limit, inner, strip));
                },
                true);
        keep(limit.label(), limit.source(), limit.kind(), judged);
    }

    private void closings(LimitRows limitRows) {
        List<TrialRows.Solved> mine =
                trialRows.solved().stream().filter(s -> s.tag().equals(tag)).toList();
        List<Item.Root> roots =
                mine.stream().map(TrialRows.Solved::root).distinct().toList();
        for (Item.Root root : roots) {
            List<TrialRows.Solved> ofRoot =
                    mine.stream().filter(s -> s.root() == root).toList();
            closings(limitRows, root, ofRoot, false);
            closings(limitRows, root, ofRoot, true);
        }
    }

    /** One limit for each time a root was laid: once for most, more often where at binds what it rests on. */
    private void closings(LimitRows limitRows, Item.Root root, List<TrialRows.Solved> ofRoot, boolean perCase) {
        List<List<TrialRows.Solved>> byCase = (perCase ? columns.names() : List.of(""))
                .stream()
                        .map(name -> ofRoot.stream()
                                .filter(s -> s.caseName().equals(name))
                                .toList())
                        .toList();
        for (int k = 0; k < byCase.get(0).size(); k++) {
            int place = k;
            int[] next = {0};
            List<LimitRows.Judged> judged = new ArrayList<>();
            rows(
                    perCase,
                    (at, strip) ->
                            judged.add(limitRows.closing(byCase.get(next[0]++).get(place), at, strip)),
                    true);
            keep(
                    "the trials for " + root.symbol() + " have closed" + (k == 0 ? "" : " (" + (k + 1) + ")"),
                    "",
                    Limit.Kind.LAYOUT,
                    judged);
        }
    }

    private void keep(String label, String source, Limit.Kind kind, List<LimitRows.Judged> judged) {
        List<@Nullable Cell> margins = new ArrayList<>();
        judged.forEach(j -> margins.add(j.margin()));
        limits.add(new LimitResult(
                tag,
                label,
                source,
                kind,
                margins,
                judged.stream().map(LimitRows.Judged::verdict).toList()));
    }
}
