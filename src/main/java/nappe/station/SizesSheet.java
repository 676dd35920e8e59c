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
        sheet.note("Every " + screen.choice() + " of the cited table, in its order, in the "
                + (caseNames.size() == 1 ? "case" : caseNames.size() + " cases")
                + " of this calculation. Lowest and highest are over these cases. " + legend());
        sheet.note("Which one is chosen follows cell " + entry.place().address() + " of sheet "
                + entry.place().sheet()
                + ". \"Fits\" says whether every limit of the whole station is met: it was found"
                + " by reruns for the entries as issued and does not follow a changed entry.");
        compared(tag, choice, variants, reruns);
        sheet.note("Reason given for the choice: " + (reason.isBlank() ? "none given" : reason));
        sheet.gap();
        sheet.note("Found by reruns of the whole station, one for each " + screen.choice() + ", all other entries as"
                + " issued. To reproduce a row, type its " + screen.choice() + " into cell "
                + entry.place().address() + " of sheet " + entry.place().sheet()
                + " and read sheet Limits. A limit that is not met in some case is counted once, as not met; one that is"
                + " met wherever it has a result, once as without result. A limit may be without result only because"
                + " another is not met.");
        failing(tag, variants, reruns);
    }

    /** What each symbol means. */
    private String legend() {
        return screen.targets().stream()
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

    private void compared(String tag, Cell choice, List<ScreenGrid.Variant> variants, List<SizeRerun> reruns) {
        List<Block.Column> columns = new ArrayList<>(List.of(
                new Block.Column(screen.choice(), 9, Block.Align.LEFT),
                new Block.Column("Chosen", 8, Block.Align.LEFT)));
        Cell place = place(choice, variants);
        TableDraft table = sheet.table("Standard values of " + screen.choice() + " for " + tag, columns);
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
            if (first) {
                columns.add(new Block.Column("Fits, as issued", 9, Block.Align.LEFT));
            }
            row.add(rerun(table.place(row.size()), Value.word(fits(reruns.get(i)))));
            table.add(row);
        }
    }

    private void failing(String tag, List<ScreenGrid.Variant> variants, List<SizeRerun> reruns) {
        TableDraft table = sheet.table(
                "Limits of the whole station that fail with each " + screen.choice() + " of " + tag + ", as issued",
                List.of(
                        new Block.Column(screen.choice(), 9, Block.Align.LEFT),
                        new Block.Column("Limits not met", 8, Block.Align.RIGHT),
                        new Block.Column("Limits without result", 12, Block.Align.RIGHT),
                        new Block.Column("Which limits, in which cases", 60, Block.Align.LEFT)));
        for (int i = 0; i < variants.size(); i++) {
            SizeRerun rerun = reruns.get(i);
            boolean ran = rerun.refused().isEmpty();
            table.add(List.of(
                    new Block.Content(variants.get(i).word()),
                    rerun(table.place(1), ran ? Value.of(rerun.notMet()) : new Value.None(Value.NO_RESULT)),
                    rerun(table.place(2), ran ? Value.of(rerun.withoutResult()) : new Value.None(Value.NO_RESULT)),
                    rerun(table.place(3), Value.word(FailingWords.of(rerun, caseNames.size())))));
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
