package nappe.deliver.pdf;

import java.util.List;
import java.util.Set;
import nappe.calculation.Block;
import nappe.results.Results;

/** Which words of a package are texts of the methods or of the layout, whose symbols are set as such. */
final class Labels {
    /** Heads of columns that hold such texts. */
    private static final Set<String> HEADS = Set.of(
            "Limit", "Governing limit", "Which limits, in which cases", "Root", "Description", "What rests on it");

    /** Columns of what the engineer demands, which comes back as the name of a limit. */
    private static final Set<String> TYPED = Set.of("What is demanded");

    /** How notes begin that name cases, or give what was typed. */
    private static final List<String> TYPED_NOTES =
            List.of("Reason given", "Cases by number", "Elevations refer", "Not here, since");

    private Labels() {}

    /** A text in a column of a table. */
    static List<Piece> inColumn(Results results, String head, String text) {
        return HEADS.contains(head) ? label(results, text) : List.of(Piece.plain(text));
    }

    /** The name of a limit; one that the engineer typed stays as typed. */
    static List<Piece> label(Results results, String text) {
        List<Piece> pieces = SymbolPrint.inText(text);
        return pieces.size() == 1 || isTyped(results, text) ? List.of(Piece.plain(text)) : pieces;
    }

    static List<Piece> note(String text) {
        return TYPED_NOTES.stream().anyMatch(text::startsWith) ? List.of(Piece.plain(text)) : SymbolPrint.inText(text);
    }

    private static boolean isTyped(Results results, String text) {
        return results.sheets().stream()
                .flatMap(sheet -> sheet.blocks().stream())
                .filter(Block.Table.class::isInstance)
                .map(Block.Table.class::cast)
                .anyMatch(table -> holds(results, table, text));
    }

    private static boolean holds(Results results, Block.Table table, String text) {
        for (int i = 0; i < table.columns().size(); i++) {
            int column = i;
            if (TYPED.contains(table.columns().get(i).head())
                    && table.rows().stream()
                            .map(row -> words(results, row.items().get(column)))
                            .anyMatch(typed -> !typed.isBlank() && text.contains(typed))) {
                return true;
            }
        }
        return false;
    }

    private static String words(Results results, Block.Item item) {
        return item instanceof Block.Text text
                ? text.text()
                : item instanceof Block.Content content ? Printed.value(results, content.cell()) : "";
    }
}
