package nappe.calculation;

import java.util.ArrayList;
import java.util.List;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.method.Screen;

/**
 * The closure of a choice to what is screened, laid out once per word of it: what rests on no case once per word, all
 * else once per word and case. All that does not rest on the choice is taken from the calculation itself.
 */
public final class ScreenGrid {
    /**
     * One word of the choice.
     *
     * @param scope knows what serves all cases
     * @param cases one scope per case under it
     */
    public record Variant(Cell word, Scope scope, List<Scope> cases) {}

    private final ItemLayout items;
    private final MethodSheet method;
    private final Screen screen;

    public ScreenGrid(ItemLayout items, MethodSheet method, Screen screen) {
        this.items = items;
        this.method = method;
        this.screen = screen;
    }

    /**
     * Lays both tables on the sheet, in the workbook only.
     *
     * @param words the cells of the words
     * @param scope that of the element, which knows all that serves all cases
     * @param cases one per case shown, which know all of the case
     */
    public List<Variant> lay(Run words, Scope scope, List<Scope> cases, List<String> caseNames, SheetDraft sheet) {
        List<Block.Column> columns = new ArrayList<>(List.of(column(screen.choice(), Block.Align.LEFT)));
        TableDraft table = sheet.workbookTable(
                "What serves all cases, once for each " + screen.choice(),
                columns,
                words.cells().size());
        List<Variant> variants = new ArrayList<>();
        for (Cell word : words.cells()) {
            Scope variant = scope.inner();
            variant.put(screen.choice(), word);
            row(table, false, variant, List.of(new Block.Content(word)), columns);
            variants.add(new Variant(
                    word,
                    variant,
                    cases.stream().map(one -> under(one, variant, word)).toList()));
        }
        sheet.gap();
        if (screen.members().stream().anyMatch(this::perCase)) {
            perCase(variants, caseNames, sheet);
        }
        return variants;
    }

    private void perCase(List<Variant> variants, List<String> caseNames, SheetDraft sheet) {
        List<Block.Column> columns = new ArrayList<>(
                List.of(column(screen.choice(), Block.Align.LEFT), new Block.Column("Case", 30, Block.Align.LEFT)));
        TableDraft table = sheet.workbookTable(
                "What rests on a case, once for each " + screen.choice() + " and case",
                columns,
                variants.size() * caseNames.size());
        for (Variant variant : variants) {
            for (int c = 0; c < caseNames.size(); c++) {
                List<Block.Item> first = List.of(new Block.Content(variant.word()), new Block.Text(caseNames.get(c)));
                row(table, true, variant.cases().get(c), first, columns);
            }
        }
        sheet.gap();
    }

    /** A case of a variant: what the case brings, and what of the calculation is the variant's own. */
    private Scope under(Scope oneCase, Scope variant, Cell word) {
        Scope inner = oneCase.inner();
        inner.put(screen.choice(), word);
        for (Item member : screen.members()) {
            if (!perCase(member)) {
                member.outputs().forEach(symbol -> inner.put(symbol, variant.cell(symbol)));
            }
        }
        return inner;
    }

    private void row(
            TableDraft table, boolean perCase, Scope scope, List<Block.Item> first, List<Block.Column> columns) {
        Strip strip = Strip.along(table.place(0).sheet(), table.nextRow(), first.size());
        for (Item member : screen.members()) {
            if (perCase(member) == perCase) {
                items.lay(member, scope, strip);
            }
        }
        if (table.isEmpty()) {
            strip.heads().forEach(head -> columns.add(column(head, Block.Align.RIGHT)));
        }
        List<Block.Item> shown = new ArrayList<>(first);
        strip.laid().forEach(line -> shown.add(new Block.Content(line.cell())));
        table.add(shown);
    }

    private boolean perCase(Item member) {
        return member.outputs().stream().anyMatch(method::perCase);
    }

    private static Block.Column column(String head, Block.Align align) {
        return new Block.Column(head, 12, align);
    }
}
