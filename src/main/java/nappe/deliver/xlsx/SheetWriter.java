package nappe.deliver.xlsx;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import nappe.calculation.Block;
import nappe.calculation.Block.Align;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.calculation.Sheet;
import nappe.deliver.xlsx.Styles.Role;
import nappe.results.Furniture;
import nappe.results.Results;
import org.jspecify.annotations.Nullable;

/**
 * The blocks of one sheet into rows. A cell is written at its own place, and the texts that belong to it in the same
 * row; a cell of another sheet becomes a link to it.
 */
final class SheetWriter {
    /** The sheet to which each other leads back. */
    private static final String INDEX = "Index";

    /** Rows that the sheet's own header takes. */
    static final int HEADER_ROWS = 4;

    private static final double CHART_ROW = 15;

    /** A table of no more rows is kept on one page. */
    private static final int SMALL_TABLE = 8;

    private final Results results;
    private final Sheet sheet;
    private final Canvas canvas;
    private final List<Integer> heads = new ArrayList<>();
    private final List<Block.Chart> charts = new ArrayList<>();
    private final List<Pages.Kept> kept = new ArrayList<>();
    private int headOfLines = -1;

    SheetWriter(Results results, Sheet sheet, Styles styles, SharedTexts texts) {
        this.results = results;
        this.sheet = sheet;
        this.canvas = new Canvas(results, sheet, styles, texts);
    }

    SheetWriter write() {
        header();
        int headings = -1;
        for (Block block : sheet.blocks()) {
            int first = headings < 0 ? block.row() : headings;
            headings = block instanceof Block.Heading ? first : -1;
            kept.add(new Pages.Kept(first, lastKept(block)));
            if (block instanceof Block.Heading heading) {
                canvas.wide(heading.row(), Role.HEADING, Canvas.tidy(heading.text()));
            } else if (block instanceof Block.Note note) {
                canvas.wide(note.row(), note.caution() ? Role.CAUTION : Role.NOTE, Canvas.tidy(note.text()));
            } else if (block instanceof Block.Figure figure) {
                canvas.wide(figure.row(), Role.NOTE, Canvas.tidy(figure.words()));
            } else if (block instanceof Block.Table table) {
                table(table);
            } else if (block instanceof Block.WorkbookOnly only) {
                table(only.table());
            } else if (block instanceof Block.Lines lines) {
                lines(lines);
            } else if (block instanceof Block.Chart chart) {
                for (int row = 0; row < chart.rows(); row++) {
                    canvas.gap(chart.row() + row, CHART_ROW);
                }
                charts.add(chart);
            }
        }
        return this;
    }

    /** A chart is kept whole, of a table its title, its head and two rows, of lines two. */
    private static int lastKept(Block block) {
        if (block instanceof Block.Chart chart) {
            return chart.row() + chart.rows() - 1;
        }
        if (block instanceof Block.Table table) {
            int last = table.row()
                    + (table.title().isEmpty() ? 0 : 1)
                    + table.rows().size();
            return Math.min(table.row() + (table.rows().size() <= SMALL_TABLE ? SMALL_TABLE + 1 : 3), last);
        }
        if (block instanceof Block.WorkbookOnly only) {
            return lastKept(only.table());
        }
        return block instanceof Block.Lines lines
                ? lines.row() + Math.min(2, lines.lines().size())
                : block.row();
    }

    private void header() {
        Furniture furniture = results.furniture();
        canvas.wide(
                0,
                Role.SHEET_TITLE,
                "Sheet " + sheet.number() + " of " + results.sheets().size() + "   " + sheet.title());
        canvas.wide(
                1,
                Role.FURNITURE,
                furniture.project() + "   Calculation " + furniture.number() + "   Revision " + furniture.revision()
                        + ", " + furniture.date() + "   Status: " + furniture.status());
        canvas.wide(
                2,
                Role.FURNITURE,
                String.join(
                        " ",
                        Stream.concat(
                                        Stream.of("Input fingerprint " + furniture.fingerprint(), furniture.release()),
                                        furniture.cautions().stream())
                                .filter(text -> !text.isEmpty())
                                .map(text -> text.endsWith(".") ? text : text + ".")
                                .toList()));
        String index = results.sheets().stream()
                .map(Sheet::name)
                .filter(name -> name.equals(INDEX) && !name.equals(sheet.name()))
                .map(name -> new Place(name, 0, 0).full())
                .findFirst()
                .orElse("");
        if (index.isEmpty()) {
            canvas.gap(3, 6);
        } else {
            canvas.leads(0, 0, index);
            canvas.plainLink(3, 0, INDEX, index);
        }
    }

    private void table(Block.Table table) {
        int row = table.row();
        if (!table.title().isEmpty()) {
            canvas.wide(row++, Role.TABLE_TITLE, Canvas.tidy(table.title()));
        }
        head(row, table.columns());
        for (Block.Row items : table.rows()) {
            row = tableRow(row + 1, items.items(), table.columns());
        }
    }

    private int tableRow(int next, List<Block.Item> items, List<Block.Column> heads) {
        int row = items.stream()
                .filter(Block.Content.class::isInstance)
                .map(item -> ((Block.Content) item).cell())
                .filter(canvas::isHere)
                .map(cell -> cell.place().row())
                .findFirst()
                .orElse(next);
        for (int i = 0; i < items.size(); i++) {
            item(row, i, items.get(i), i < heads.size() ? heads.get(i).align() : Align.LEFT);
        }
        canvas.fill(row, Math.max(items.size(), heads.size()), Role.TEXT);
        return row;
    }

    private void item(int row, int column, Block.Item item, Align align) {
        if (item instanceof Block.Text text) {
            canvas.text(row, column, Role.TEXT, align, text.text());
        } else if (item instanceof Block.Symbol symbol) {
            canvas.symbol(row, column, symbol.symbol(), align);
        } else if (item instanceof Block.Content content) {
            canvas.cell(row, column, content.cell(), align, Role.RESULT);
        } else if (item instanceof Block.Equation equation) {
            canvas.text(row, column, Role.TEXT, align, EquationText.of(equation.cell()));
        } else if (item instanceof Block.Address address) {
            canvas.link(
                    row,
                    column,
                    align,
                    address.cell().place().from(sheet.name()),
                    address.cell().place().full());
        } else if (item instanceof Block.Jump jump) {
            canvas.link(row, column, align, jump.text(), jump.to().place().full());
        } else if (item instanceof Block.SheetLink link) {
            canvas.link(
                    row, column, align, link.number() + "  " + link.title(), new Place(link.sheetName(), 0, 0).full());
        }
    }

    private void lines(Block.Lines block) {
        List<Block.Column> all = new ArrayList<>(Columns.OF_LINES);
        block.caseNames().forEach(name -> all.add(new Block.Column(name, 0, Align.RIGHT)));
        head(block.row(), all);
        headOfLines = block.row();
        int row = block.row();
        for (Block.Line line : block.lines()) {
            row = Stream.concat(Stream.ofNullable(line.forAll()), line.perCase().stream())
                    .filter(canvas::isHere)
                    .map(cell -> cell.place().row())
                    .findFirst()
                    .orElse(row + 1);
            line(row, line);
            canvas.fill(row, all.size(), Role.TEXT);
        }
    }

    private void line(int row, Block.Line line) {
        Role role = line.kind() == Block.LineKind.HEADING ? Role.STRONG : Role.TEXT;
        canvas.text(row, 0, role, Align.LEFT, line.code());
        canvas.text(row, 1, role, Align.LEFT, line.description());
        canvas.symbol(row, 2, line.symbol(), Align.LEFT);
        String equation = EquationText.of(line);
        Place origin = origin(line);
        if (origin == null) {
            canvas.text(row, 3, Role.TEXT, Align.LEFT, equation);
        } else {
            canvas.link(row, 3, Align.LEFT, equation, origin.full());
        }
        canvas.text(row, 4, Role.TEXT, Align.LEFT, line.unit());
        canvas.text(row, 5, Role.TEXT, Align.LEFT, line.source());
        Role result = line.kind() == Block.LineKind.LIMIT_VERDICT ? Role.VERDICT : Role.RESULT;
        Cell forAll = line.forAll();
        int column = Columns.OF_LINES.size() - 1;
        if (forAll != null) {
            canvas.cell(row, column, forAll, Align.RIGHT, result);
        }
        for (Cell cell : line.perCase()) {
            canvas.cell(row, ++column, cell, Align.RIGHT, result);
        }
    }

    /**
     * Where a line comes from, if words stand in place of its formula and it rests on a cell of another sheet: an entry,
     * a constant, the trial rows of a root. Of several cases that of the first.
     */
    private @Nullable Place origin(Block.Line line) {
        Cell cell = line.forAll() != null
                ? line.forAll()
                : line.perCase().isEmpty() ? null : line.perCase().get(0);
        if (cell == null || line.symbol().isEmpty() || !EquationText.isWords(line)) {
            return null;
        }
        return cell.references().values().stream()
                .filter(reference -> reference instanceof Cell other && !canvas.isHere(other))
                .map(reference -> ((Cell) reference).place())
                .filter(place ->
                        !place.sheet().equals("Constants") || line.equation().contains("Constants"))
                // references have no order that is the same in every run
                .min(Comparator.comparing(Place::sheet)
                        .thenComparing(Place::row)
                        .thenComparing(Place::column))
                .orElse(null);
    }

    private void head(int row, List<Block.Column> heads) {
        this.heads.add(row);
        for (int i = 0; i < heads.size(); i++) {
            canvas.text(row, i, Role.HEAD, heads.get(i).align(), heads.get(i).head());
        }
        canvas.fill(row, heads.size(), Role.HEAD);
    }

    Sheet sheet() {
        return sheet;
    }

    Canvas canvas() {
        return canvas;
    }

    /** Rows that belong on one page, each from its heading on. */
    List<Pages.Kept> kept() {
        return kept;
    }

    List<Block.Chart> charts() {
        return charts;
    }

    /** The row whose heads matter on every page: that of a calculation, or of the only table; -1 for none. */
    int mainHead() {
        return hasLines() ? headOfLines : heads.size() == 1 ? heads.get(0) : -1;
    }

    /** Whether a calculation stands here, whose first columns say what a row is about. */
    boolean hasLines() {
        return headOfLines >= 0;
    }
}
