package nappe.station;

import static nappe.calculation.Formulas.call;
import static nappe.calculation.Formulas.compare;
import static nappe.calculation.Formulas.iff;
import static nappe.calculation.Formulas.number;
import static nappe.calculation.Formulas.symbol;
import static nappe.calculation.Formulas.word;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.ItemLayout;
import nappe.calculation.Place;
import nappe.calculation.Run;
import nappe.calculation.Scope;
import nappe.calculation.ScreenGrid;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.method.Screen;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * Lays the comparison of all words of a choice: their targets, live; which is chosen, live; and what reruns of the whole
 * station found for each, as issued.
 */
final class SizesSheet {
    private static final String PLACE = "place";

    private final ItemLayout items;
    private final Cells cells;
    private final MethodSheet method;
    private final Screen screen;
    private final SheetDraft sheet;
    private final SheetDraft behind;
    private final List<String> caseNames;

    /**
     * @param behind where the grid stands
     * @param caseNames of the judged cases
     */
    SizesSheet(
            ItemLayout items,
            MethodSheet method,
            Screen screen,
            SheetDraft sheet,
            SheetDraft behind,
            List<String> caseNames) {
        this.behind = behind;
        this.items = items;
        this.cells = items.cells();
        this.method = method;
        this.screen = screen;
        this.sheet = sheet;
        this.caseNames = caseNames;
    }

    /**
     * @param choice the cell of the choice in the calculation of the element
     * @param reason source or basis typed beside it
     * @param reruns one for each variant, in the same order
     */
    void lay(String tag, Cell choice, String reason, List<ScreenGrid.Variant> variants, List<SizeRerun> reruns) {
        Cell entry = entry(choice);
        String entryCell =
                "cell " + entry.place().address() + " of sheet " + entry.place().sheet();
        sheet.note("Every " + screen.choice() + " of the cited table, in its order; \"chosen\" follows " + entryCell
                + ". Lowest and highest are over the cases that are judged. " + legend());
        Cell place = place(choice, variants);
        compared(tag, place, variants);
        sheet.note("Reason given for the choice: " + (reason.isBlank() ? "none given" : reason));
        sheet.gap();
        sheet.note("What follows was found by reruns of the whole station, one for each " + screen.choice()
                + ", all other entries as issued, and does not follow a changed entry. To reproduce a row, type its "
                + screen.choice() + " into " + entryCell + " and read sheet Limits. It fits where every limit is met or"
                + " does not apply. A limit that is not met in some case counts as not met; one that is met wherever it"
                + " has a result counts as without result, often only because another is not met.");
        sheet.note("Cases by number: " + numbered() + ".");
        failing(tag, place, variants, reruns);
    }

    private String numbered() {
        List<String> numbered = new ArrayList<>();
        for (int c = 0; c < caseNames.size(); c++) {
            numbered.add((c + 1) + " " + caseNames.get(c));
        }
        return String.join("; ", numbered);
    }

    /** What each symbol means. */
    private String legend() {
        return screen.targets().stream()
                        .filter(target -> !isWords(target))
                        .map(target -> target + ": " + label(method.item(target), target))
                        .collect(Collectors.joining("; "))
                + ".";
    }

    private String label(@Nullable Item item, String symbol) {
        if (item instanceof Item.Line line) {
            return line.label();
        }
        String member = item instanceof Item.At at ? at.results().get(symbol) : null;
        return member == null ? "" : label(method.item(member), member);
    }

    private void compared(String tag, Cell place, List<ScreenGrid.Variant> variants) {
        List<Block.Column> columns = new ArrayList<>(List.of(
                new Block.Column(screen.choice(), 9, Block.Align.LEFT),
                new Block.Column("Chosen", 8, Block.Align.LEFT)));
        TableDraft table = sheet.table("Each " + screen.choice() + " of " + tag + " over the cases", columns);
        for (int i = 0; i < variants.size(); i++) {
            ScreenGrid.Variant variant = variants.get(i);
            boolean first = i == 0;
            List<Block.Item> row = new ArrayList<>();
            row.add(new Block.Content(variant.word()));
            row.add(new Block.Content(mark(table.place(1), place, i + 1)));
            for (String target : screen.targets()) {
                if (!method.perCase(target)) {
                    Cell cell = variant.scope().cell(target);
                    boolean words = isWords(target);
                    row.add(new Block.Content(cell));
                    if (first) {
                        columns.add(new Block.Column(
                                head(target, "", cell.unit()),
                                words ? 12 : 10,
                                words ? Block.Align.LEFT : Block.Align.RIGHT));
                    }
                    continue;
                }
                Run run = new Run(
                        variant.cases().stream().map(one -> one.cell(target)).toList());
                for (String kind : List.of("lowest", "highest")) {
                    Cell cell = items.overCases(
                            table.place(row.size()),
                            target,
                            run.cells().get(0).unit(),
                            new Formula.Summary(kind, target),
                            run);
                    row.add(new Block.Content(cell));
                    if (first) {
                        columns.add(new Block.Column(head(target, " " + kind, cell.unit()), 10, Block.Align.RIGHT));
                    }
                }
            }
            table.add(row);
        }
    }

    private void failing(String tag, Cell place, List<ScreenGrid.Variant> variants, List<SizeRerun> reruns) {
        TableDraft table = sheet.table(
                "What fails in the whole station with each " + screen.choice() + " of " + tag + ", as issued",
                List.of(
                        new Block.Column(screen.choice(), 9, Block.Align.LEFT),
                        new Block.Column("Chosen", 8, Block.Align.LEFT),
                        new Block.Column("Fits", 9, Block.Align.LEFT),
                        new Block.Column("Limits not met", 9, Block.Align.RIGHT),
                        new Block.Column("without result", 9, Block.Align.RIGHT),
                        new Block.Column("Which limits, in which cases", 60, Block.Align.LEFT)));
        for (int i = 0; i < variants.size(); i++) {
            SizeRerun rerun = reruns.get(i);
            boolean ran = rerun.refused().isEmpty();
            table.add(List.of(
                    new Block.Content(variants.get(i).word()),
                    new Block.Content(mark(table.place(1), place, i + 1)),
                    rerun(table.place(2), Value.word(fits(rerun))),
                    rerun(table.place(3), ran ? Value.of(rerun.notMet()) : new Value.None(Value.NO_RESULT)),
                    rerun(table.place(4), ran ? Value.of(rerun.withoutResult()) : new Value.None(Value.NO_RESULT)),
                    rerun(table.place(5), Value.word(FailingWords.of(rerun)))));
        }
        sheet.gap();
    }

    private Block.Item rerun(Place place, Value value) {
        return new Block.Content(cells.typed(Cell.Kind.RERUN, place, "", Unit.one(), value, Sign.ANY));
    }

    private static String fits(SizeRerun rerun) {
        if (!rerun.refused().isEmpty()) {
            return Value.NO_RESULT;
        }
        return !rerun.failures().isEmpty() ? "no" : rerun.lacks() ? Value.NOT_GIVEN : "yes";
    }

    /** The place of the chosen word among all; words where none of them is chosen. */
    private Cell place(Cell choice, List<ScreenGrid.Variant> variants) {
        TableDraft table = behind.workbookTable(
                "", List.of(new Block.Column("Row of the chosen " + screen.choice(), 12, Block.Align.LEFT)), 1);
        Scope scope = Scope.ofElement();
        scope.put(screen.choice(), choice);
        scope.put(
                "words", new Run(variants.stream().map(ScreenGrid.Variant::word).toList()));
        Cell cell = cells.raw(
                table.place(0),
                "",
                Unit.one(),
                call(Function.MATCH, symbol(screen.choice()), symbol("words")),
                scope,
                null,
                false);
        table.add(List.of(new Block.Content(cell)));
        return cell;
    }

    private Cell mark(Place at, Cell place, int row) {
        Scope scope = Scope.ofElement();
        scope.put(PLACE, place);
        Formula here = compare(symbol(PLACE), Comparator.EQUAL, number(Integer.toString(row)));
        Formula mark = iff(call(Function.IS_NUMBER, symbol(PLACE)), iff(here, word("chosen"), word("-")), word("-"));
        return cells.raw(at, "", Unit.one(), mark, scope, null, false);
    }

    /** The cell of the entry behind a cell that hands it on. */
    private static Cell entry(Cell cell) {
        Cell at = cell;
        while (at.formula() != null) {
            @Nullable
            Cell next = at.references().values().stream()
                    .filter(Cell.class::isInstance)
                    .map(Cell.class::cast)
                    .findFirst()
                    .orElse(null);
            if (next == null) {
                return at;
            }
            at = next;
        }
        return at;
    }

    private boolean isWords(String target) {
        return method.item(target) instanceof Item.Line line && line.unit() == null;
    }

    private static String head(String symbol, String more, Unit unit) {
        return symbol + more + (unit.text().equals("1") ? "" : " [" + unit + "]");
    }
}
