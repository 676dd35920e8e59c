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
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.method.Screen;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/** Lays the comparison of all words of a choice, live: the targets of each, and which is chosen. */
final class SizesSheet {
    private static final String PLACE = "place";

    private final ItemLayout items;
    private final Cells cells;
    private final MethodSheet method;
    private final Screen screen;
    private final SheetDraft behind;

    /** @param behind where the grid stands */
    SizesSheet(ItemLayout items, MethodSheet method, Screen screen, SheetDraft behind) {
        this.items = items;
        this.cells = items.cells();
        this.method = method;
        this.screen = screen;
        this.behind = behind;
    }

    /**
     * Lays the comparison and returns the cells that mark the chosen one, in the order of the variants.
     *
     * @param choice the cell of the choice in the calculation of the element
     * @param entry where it is typed, in words
     * @param reason source or basis typed beside it
     */
    List<Cell> lay(SheetDraft sheet, Cell choice, String entry, String reason, List<ScreenGrid.Variant> variants) {
        sheet.note("Every " + screen.choice() + " of the cited table, in its order; \"chosen\" follows " + entry
                + ". Lowest and highest are over the cases that are judged. " + legend());
        List<Cell> marks = compared(sheet, place(choice, variants), variants);
        sheet.note("Reason given for the choice: " + (reason.isBlank() ? "none given" : reason));
        return marks;
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

    private List<Cell> compared(SheetDraft sheet, Cell place, List<ScreenGrid.Variant> variants) {
        List<Cell> marks = new ArrayList<>();
        List<Block.Column> columns = new ArrayList<>(List.of(
                new Block.Column(screen.choice(), 9, Block.Align.LEFT),
                new Block.Column("Chosen", 8, Block.Align.LEFT)));
        TableDraft table = sheet.table("Each " + screen.choice() + " over the cases", columns);
        for (int i = 0; i < variants.size(); i++) {
            ScreenGrid.Variant variant = variants.get(i);
            boolean first = i == 0;
            List<Block.Item> row = new ArrayList<>();
            row.add(new Block.Content(variant.word()));
            marks.add(mark(table.place(1), place, i + 1));
            row.add(new Block.Content(marks.get(i)));
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
        sheet.gap();
        return marks;
    }

    /** The place of the chosen word among all; words where none of them is chosen. */
    private Cell place(Cell choice, List<ScreenGrid.Variant> variants) {
        TableDraft table = behind.workbookTable(
                "Row of the chosen " + screen.choice() + " in the first table",
                List.of(new Block.Column("Row", 12, Block.Align.LEFT)),
                1);
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

    private boolean isWords(String target) {
        return method.item(target) instanceof Item.Line line && line.unit() == null;
    }

    private static String head(String symbol, String more, Unit unit) {
        return symbol + more + (unit.text().equals("1") ? "" : " [" + unit + "]");
    }
}
