package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.formula.Formula;
import nappe.formula.PlainReading;
import nappe.formula.Value;
import nappe.results.Results;

/** A table of a sheet as a grid: columns measured, numbers with their decimal points in line. */
final class TableGrid {
    private static final double SIZE = 8.5;
    private static final double TIGHT = 7;

    /** Words so short, like the name of a size or "found 12", stay on one line. */
    private static final int SHORT = 10;

    private final Results results;
    private final Links links;
    private final Drawings drawings;
    private final Block.Table table;
    private final List<Decimals> decimals = new ArrayList<>();
    private final ColumnWidths measured;
    private final ColumnWidths tight;
    private final List<List<View.Text>> texts = new ArrayList<>();

    TableGrid(Results results, Links links, Drawings drawings, Block.Table table) {
        this.results = results;
        this.links = links;
        this.drawings = drawings;
        this.table = table;
        int columns = table.columns().size();
        this.measured = new ColumnWidths(columns, SIZE);
        this.tight = new ColumnWidths(columns, TIGHT);
        for (int i = 0; i < columns; i++) {
            decimals.add(new Decimals());
            measure(i, UnitPrint.head(table.columns().get(i).head()), true);
        }
        for (Block.Row row : printedRows()) {
            List<View.Text> printed = new ArrayList<>();
            for (int i = 0; i < row.items().size(); i++) {
                Block.Column column = table.columns().get(i);
                View.Text text = links.ofElement(text(row.items().get(i), column), column);
                printed.add(text);
                decimals.get(i).add(text.characters());
                measure(i, text, false);
            }
            texts.add(printed);
        }
    }

    /** The rows in use, where the table is looked up by a word; all of them where none of its keys stands in it. */
    private List<Block.Row> printedRows() {
        List<Value> keys = table.keys().stream().map(results::value).toList();
        List<Block.Row> inUse = table.rows().stream()
                .filter(row ->
                        row.items().get(0) instanceof Block.Content first && keys.contains(results.value(first.cell())))
                .toList();
        return inUse.isEmpty() ? table.rows() : inUse;
    }

    /** The workbook row, from 1, of the first row of the table. */
    private int firstRow() {
        return table.row() + (table.title().isEmpty() ? 0 : 1) + 2;
    }

    private boolean isCut() {
        return texts.size() < table.rows().size();
    }

    private void measure(int column, View.Text text, boolean head) {
        String characters = text.characters();
        boolean whole = !head
                && (Decimals.isNumber(characters)
                        || text.style().equals(View.Text.WHOLE)
                        || Verdicts.isGrave(characters));
        for (ColumnWidths widths : List.of(measured, tight)) {
            if (whole) {
                widths.whole(column, characters + "00");
            } else if (!head && characters.length() <= SHORT) {
                widths.whole(column, characters);
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
        if (isCut()) {
            titles.add(View.Text.plain(
                    "small",
                    (texts.size() == 1 ? "the row in use; all " : "the " + texts.size() + " rows in use; all ")
                            + table.rows().size() + " rows stand in the workbook, rows " + firstRow()
                            + " to " + (firstRow() + table.rows().size() - 1)));
        }
        double over = titles.stream()
                .mapToDouble(title -> Typefaces.width(title.characters(), Typefaces.BOLD, 11) + 4)
                .max()
                .orElse(0);
        boolean cramped = measured.least() > width;
        List<View.GridRow> body = new ArrayList<>();
        List<Double> widths = (cramped ? tight : measured).fit(width, over);
        for (int i = 0; i < texts.size(); i++) {
            body.add(row(drawn(i, widths, cramped)));
        }
        return new View.Grid(cramped ? "tight" : "", widths, titles, List.of(head()), body);
    }

    /** The texts of a row, its equations drawn. */
    private List<View.Text> drawn(int row, List<Double> widths, boolean cramped) {
        List<View.Text> drawn = new ArrayList<>(texts.get(row));
        for (int i = 0; i < drawn.size(); i++) {
            if (table.rows().get(row).items().get(i) instanceof Block.Equation equation) {
                drawn.set(i, equation(equation.cell(), widths.get(i), cramped));
            }
        }
        return drawn;
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
            cells.add(View.GridCell.of(style(column), new View.Text(room, text.pieces(), text.target(), text.inset())));
        }
        boolean blank = printed.size() > 1
                && printed.stream().skip(1).allMatch(text -> text.characters().isEmpty() && text.inset() == null);
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
                    ? View.Text.of(View.Text.WHOLE, UnitPrint.named(words.text()))
                    : words(words.text(), column);
        } else if (item instanceof Block.Symbol symbol) {
            return View.Text.of(View.Text.WHOLE, SymbolPrint.pieces(symbol.symbol()));
        } else if (item instanceof Block.Content content) {
            return content(content.cell(), column);
        } else if (item instanceof Block.Equation equation) {
            return View.Text.plain("formula", plain(equation.cell()));
        } else if (item instanceof Block.Address address) {
            return new View.Text(
                    View.Text.WHOLE, List.of(Piece.plain(links.address(address.cell()))), links.to(address.cell()));
        } else if (item instanceof Block.Jump jump) {
            return new View.Text("", List.of(Piece.plain(jump.text())), links.to(jump.to()));
        } else if (item instanceof Block.SheetLink link) {
            return new View.Text(
                    "", List.of(Piece.plain(link.number() + "\u2002" + link.title())), Links.to(link.number()));
        }
        throw new IllegalArgumentException("unknown item " + item);
    }

    private View.Text words(String text, Block.Column column) {
        return View.Text.of(
                "",
                Verdicts.isGrave(text) ? List.of(Verdicts.weigh(text)) : Labels.inColumn(results, column.head(), text));
    }

    private View.Text content(Cell cell, Block.Column column) {
        String value = Printed.value(results, cell);
        return Printed.isNumber(results, cell)
                ? View.Text.of(View.Text.WHOLE, List.of(Piece.plain(value)))
                : words(value, column);
    }

    /** The symbol and the formula behind a live cell as plain text, to be measured and then drawn. */
    private static String plain(Cell cell) {
        Formula formula = cell.formula();
        return formula == null ? "" : PlainReading.of(cell.symbol(), formula);
    }

    private View.Text equation(Cell cell, double width, boolean cramped) {
        Formula formula = cell.formula();
        if (formula == null) {
            return View.Text.of("", List.of());
        }
        Equation equation = new EquationSetting(
                        cell.symbol(), cramped ? TIGHT : SIZE, Typefaces.points(width - ColumnWidths.PADDING))
                .symbols(formula)
                .equation();
        return View.Text.of("formula", List.of()).with(drawings.add(equation, equation.text()));
    }
}
