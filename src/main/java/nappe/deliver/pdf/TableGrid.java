package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.formula.Formula;
import nappe.results.Results;

/** A table of a sheet as a grid: columns measured, numbers with their decimal points in line. */
final class TableGrid {
    private static final double SIZE = 8.5;
    private static final double TIGHT = 7;

    private final Results results;
    private final Links links;
    private final Block.Table table;
    private final List<Decimals> decimals = new ArrayList<>();
    private final ColumnWidths measured;
    private final ColumnWidths tight;
    private final List<List<View.Text>> texts = new ArrayList<>();

    TableGrid(Results results, Links links, Block.Table table) {
        this.results = results;
        this.links = links;
        this.table = table;
        int columns = table.columns().size();
        this.measured = new ColumnWidths(columns, SIZE);
        this.tight = new ColumnWidths(columns, TIGHT);
        for (int i = 0; i < columns; i++) {
            decimals.add(new Decimals());
            measure(i, UnitPrint.head(table.columns().get(i).head()), true);
        }
        for (Block.Row row : table.rows()) {
            List<View.Text> printed = new ArrayList<>();
            for (int i = 0; i < row.items().size(); i++) {
                View.Text text = text(row.items().get(i), table.columns().get(i));
                printed.add(text);
                decimals.get(i).add(text.characters());
                measure(i, text, false);
            }
            texts.add(printed);
        }
    }

    private void measure(int column, View.Text text, boolean head) {
        String characters = text.characters();
        boolean whole = !head
                && (Decimals.isNumber(characters) || text.style().equals("whole") || Verdicts.isGrave(characters));
        for (ColumnWidths widths : List.of(measured, tight)) {
            if (whole) {
                widths.whole(column, characters + "00");
            } else {
                widths.text(column, characters, head);
            }
        }
    }

    /** Whether it reads badly on an upright page. */
    boolean isWide(PageSize page) {
        return measured.least() > page.upright() || measured.comfortable() > page.upright() * 1.3;
    }

    /**
     * The grid.
     *
     * @param headings headings of the sheet that stand directly above it
     */
    View.Grid grid(List<View.Text> headings, double width) {
        List<View.Text> titles = new ArrayList<>(headings);
        if (!table.title().isEmpty()) {
            titles.add(View.Text.of("tabletitle", SymbolPrint.inText(table.title())));
        }
        double over = titles.stream()
                .mapToDouble(title -> Typefaces.width(title.characters(), Typefaces.BOLD, 11) + 4)
                .max()
                .orElse(0);
        boolean cramped = measured.least() > width;
        List<View.GridRow> body = new ArrayList<>();
        texts.forEach(row -> body.add(row(row)));
        return new View.Grid(
                cramped ? "tight" : "", (cramped ? tight : measured).fit(width, over), titles, List.of(head()), body);
    }

    private View.GridRow head() {
        List<View.GridCell> cells = new ArrayList<>();
        for (Block.Column column : table.columns()) {
            cells.add(View.GridCell.of(style(column), UnitPrint.head(column.head())));
        }
        return new View.GridRow("", cells);
    }

    /** A row; one with nothing after its first words is a blank to be filled in by hand, and higher. */
    private View.GridRow row(List<View.Text> printed) {
        List<View.GridCell> cells = new ArrayList<>();
        for (int i = 0; i < printed.size(); i++) {
            View.Text text = printed.get(i);
            Block.Column column = table.columns().get(i);
            String room = column.align() == Block.Align.RIGHT ? decimals.get(i).room(text.characters()) : text.style();
            cells.add(View.GridCell.of(style(column), new View.Text(room, text.pieces(), text.target())));
        }
        boolean blank = printed.size() > 1
                && printed.stream().skip(1).allMatch(text -> text.characters().isEmpty());
        return new View.GridRow(blank ? "blank" : "", cells);
    }

    private static String style(Block.Column column) {
        return switch (column.align()) {
            case LEFT -> "";
            case CENTRE -> "centre";
            case RIGHT -> "right";
        };
    }

    private View.Text text(Block.Item item, Block.Column column) {
        if (item instanceof Block.Text words) {
            return column.head().toLowerCase(Locale.ROOT).endsWith("unit")
                    ? View.Text.of("whole", UnitPrint.named(words.text()))
                    : View.Text.of("", List.of(Verdicts.weigh(words.text())));
        } else if (item instanceof Block.Symbol symbol) {
            return View.Text.of("whole", SymbolPrint.pieces(symbol.symbol()));
        } else if (item instanceof Block.Content content) {
            return content(content.cell());
        } else if (item instanceof Block.Equation equation) {
            return View.Text.of("formula", equation(equation.cell()));
        } else if (item instanceof Block.Address address) {
            return new View.Text(
                    "whole", List.of(Piece.plain(links.address(address.cell()))), links.to(address.cell()));
        } else if (item instanceof Block.Jump jump) {
            return new View.Text("", List.of(Piece.plain(jump.text())), links.to(jump.to()));
        } else if (item instanceof Block.SheetLink link) {
            return new View.Text(
                    "", List.of(Piece.plain(link.number() + "\u2002" + link.title())), Links.to(link.number()));
        }
        throw new IllegalArgumentException("unknown item " + item);
    }

    private View.Text content(Cell cell) {
        String value = Printed.value(results, cell);
        return Printed.isNumber(results, cell)
                ? View.Text.of("whole", List.of(Piece.plain(value)))
                : View.Text.of("", List.of(Verdicts.weigh(value)));
    }

    /** The symbol and the formula behind a live cell; nothing for a typed one. */
    static List<Piece> equation(Cell cell) {
        Formula formula = cell.formula();
        if (formula == null) {
            return List.of();
        }
        List<Piece> pieces = new ArrayList<>();
        if (!cell.symbol().isEmpty()) {
            pieces.addAll(SymbolPrint.pieces(cell.symbol()));
            pieces.add(Piece.plain(" = "));
        }
        pieces.addAll(TypesetReading.inSymbols(formula).pieces());
        return pieces;
    }
}
