package nappe.deliver.xlsx;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import nappe.calculation.Block;
import nappe.calculation.Block.Align;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.calculation.Sheet;
import nappe.deliver.xlsx.Styles.Role;
import nappe.formula.Formula;
import nappe.formula.PlainReading;
import nappe.formula.Value;
import nappe.results.Digits;
import nappe.results.Furniture;
import nappe.results.Results;

/**
 * The blocks of one sheet into rows. A cell is written at its own place, and the texts that belong to it in the same
 * row; a cell of another sheet becomes a link to it.
 */
final class SheetWriter {
    /** Rows that the sheet's own header takes. */
    static final int HEADER_ROWS = 4;

    private static final double LINE = 1.28;
    private static final double AIR = 3;

    /** A place that leads to another. */
    record Link(Place from, String to) {}

    private final Results results;
    private final Sheet sheet;
    private final Styles styles;
    private final SharedTexts texts;
    private final Columns columns;
    private final SheetRows rows;
    private final Set<Cell> written = new LinkedHashSet<>();
    private final List<Integer> merged = new ArrayList<>();
    private final List<Integer> heads = new ArrayList<>();
    private final List<Link> links = new ArrayList<>();

    SheetWriter(Results results, Sheet sheet, Styles styles, SharedTexts texts) {
        this.results = results;
        this.sheet = sheet;
        this.styles = styles;
        this.texts = texts;
        this.columns = Columns.of(sheet);
        this.rows = new SheetRows(sheet.name());
    }

    SheetWriter write() {
        header();
        for (Block block : sheet.blocks()) {
            if (block instanceof Block.Heading heading) {
                wide(heading.row(), Role.HEADING, tidy(heading.text()));
            } else if (block instanceof Block.Note note) {
                wide(note.row(), note.caution() ? Role.CAUTION : Role.NOTE, tidy(note.text()));
            } else if (block instanceof Block.Table table) {
                table(table);
            } else if (block instanceof Block.WorkbookOnly only) {
                table(only.table());
            } else if (block instanceof Block.Lines lines) {
                lines(lines);
            }
        }
        return this;
    }

    private void header() {
        Furniture furniture = results.furniture();
        wide(0, Role.SHEET_TITLE, "Sheet " + sheet.number() + " of " + results.sheets().size() + "   " + sheet.title());
        wide(1, Role.FURNITURE, furniture.project() + "   Calculation " + furniture.number() + "   Revision "
                + furniture.revision() + ", " + furniture.date() + "   Status: " + furniture.status());
        wide(2, Role.FURNITURE, String.join(" ", Stream.concat(
                        Stream.of("Input fingerprint " + furniture.fingerprint(), furniture.release()),
                        furniture.cautions().stream())
                .filter(text -> !text.isEmpty())
                .map(text -> text.endsWith(".") ? text : text + ".")
                .toList()));
        rows.atLeast(3, 6);
    }

    private void table(Block.Table table) {
        int row = table.row();
        if (!table.title().isEmpty()) {
            wide(row++, Role.TABLE_TITLE, tidy(table.title()));
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
                .filter(this::isHere)
                .map(cell -> cell.place().row())
                .findFirst()
                .orElse(next);
        for (int i = 0; i < items.size(); i++) {
            item(row, i, items.get(i), i < heads.size() ? heads.get(i).align() : Align.LEFT);
        }
        fill(row, Math.max(items.size(), heads.size()));
        return row;
    }

    private void item(int row, int column, Block.Item item, Align align) {
        if (item instanceof Block.Text text) {
            text(row, column, Role.TEXT, align, text.text());
        } else if (item instanceof Block.Symbol symbol) {
            symbol(row, column, symbol.symbol(), align);
        } else if (item instanceof Block.Content content) {
            cell(row, column, content.cell(), align, Role.RESULT);
        } else if (item instanceof Block.Equation equation) {
            text(row, column, Role.TEXT, align, equation(equation.cell()));
        } else if (item instanceof Block.Address address) {
            link(row, column, align, address.cell().place().from(sheet.name()), address.cell().place().full());
        } else if (item instanceof Block.SheetLink link) {
            link(row, column, align, link.number() + "  " + link.title(), new Place(link.sheetName(), 0, 0).full());
        }
    }

    private void lines(Block.Lines block) {
        List<Block.Column> all = new ArrayList<>(Columns.OF_LINES);
        block.caseNames().forEach(name -> all.add(new Block.Column(name, 0, Align.RIGHT)));
        head(block.row(), all);
        int row = block.row();
        for (Block.Line line : block.lines()) {
            row = Stream.concat(Stream.ofNullable(line.forAll()), line.perCase().stream())
                    .filter(this::isHere)
                    .map(cell -> cell.place().row())
                    .findFirst()
                    .orElse(row + 1);
            line(row, line);
            fill(row, all.size());
        }
    }

    private void line(int row, Block.Line line) {
        Role role = line.kind() == Block.LineKind.HEADING ? Role.STRONG : Role.TEXT;
        text(row, 0, role, Align.LEFT, line.code());
        text(row, 1, role, Align.LEFT, line.description());
        symbol(row, 2, line.symbol(), Align.LEFT);
        text(row, 3, Role.TEXT, Align.LEFT, equation(line));
        text(row, 4, Role.TEXT, Align.LEFT, line.unit());
        text(row, 5, Role.TEXT, Align.LEFT, line.source());
        Role result = line.kind() == Block.LineKind.LIMIT_VERDICT ? Role.VERDICT : Role.RESULT;
        Cell forAll = line.forAll();
        int column = Columns.OF_LINES.size() - 1;
        if (forAll != null) {
            cell(row, column, forAll, Align.RIGHT, result);
        }
        for (Cell cell : line.perCase()) {
            cell(row, ++column, cell, Align.RIGHT, result);
        }
    }

    private void head(int row, List<Block.Column> heads) {
        this.heads.add(row);
        for (int i = 0; i < heads.size(); i++) {
            text(row, i, Role.HEAD, heads.get(i).align(), heads.get(i).head());
            rows.fill(row, i, styles.of(Role.HEAD, Align.LEFT));
        }
    }

    private void cell(int row, int column, Cell cell, Align align, Role role) {
        Value value = results.value(cell);
        if (!isHere(cell)) {
            put(row, column, role, align, cell, new Filling.Live(cell.place().from(sheet.name()), value));
            return;
        }
        Place place = cell.place();
        if (!written.add(cell)) {
            return;
        }
        switch (cell.kind()) {
            case FORMULA -> put(place.row(), place.column(), role, align, cell,
                    new Filling.Live(SpreadsheetReading.of(cell), value));
            case ENTRY -> put(place.row(), place.column(), Role.ENTRY, align, cell, typed(value));
            case CONSTANT, TABLE -> put(place.row(), place.column(), Role.CONSTANT, align, cell, typed(value));
        }
    }

    private void put(int row, int column, Role role, Align align, Cell cell, Filling content) {
        Value value = results.value(cell);
        boolean isNumber = value instanceof Value.Number;
        int style = isNumber ? styles.of(role, align, format(cell, value)) : styles.of(role, align);
        rows.put(row, column, style, content);
        grow(row, role, isNumber ? "" : SheetRows.words(value), columns.width(column));
    }

    private Filling typed(Value value) {
        return value instanceof Value.Number number
                ? new Filling.Typed(number.value())
                : texts.text(SheetRows.words(value));
    }

    /** A result that is whole as issued is shown as typed: after a change its decimals would still have to be seen. */
    private static String format(Cell cell, Value value) {
        if (cell.kind() != Cell.Kind.FORMULA || !(value instanceof Value.Number number)) {
            return Styles.AS_TYPED;
        }
        int decimals = Digits.decimals(cell.unit(), number.value());
        boolean whole = decimals == 0 && number.value() == Math.rint(number.value());
        return whole ? Styles.AS_TYPED : Digits.format(decimals);
    }

    /** What the layout says in place of a formula, or the formula itself. */
    private static String equation(Block.Line line) {
        Cell cell = Stream.concat(Stream.ofNullable(line.forAll()), line.perCase().stream())
                .findFirst()
                .orElse(null);
        Formula formula = cell == null ? null : cell.formula();
        if (formula != null && (line.equation().isEmpty() || line.equation().equals(PlainReading.of(formula)))) {
            return PlainReading.of(line.symbol(), formula);
        }
        return line.equation();
    }

    private static String equation(Cell cell) {
        Formula formula = cell.formula();
        return formula != null
                ? PlainReading.of(cell.symbol(), formula)
                : switch (cell.kind()) {
                    case ENTRY -> "entry";
                    case CONSTANT -> "constant";
                    case TABLE -> "cited table";
                    case FORMULA -> "";
                };
    }

    private void text(int row, int column, Role role, Align align, String text) {
        if (!text.isEmpty()) {
            String tidy = tidy(text);
            rows.put(row, column, styles.of(role, align), texts.text(tidy));
            grow(row, role, tidy, columns.width(column));
        }
    }

    /** Blanks that only laid out a text elsewhere would leave gaps here. */
    private static String tidy(String text) {
        return text.replaceAll(" {2,}", " ");
    }

    private void symbol(int row, int column, String symbol, Align align) {
        if (!symbol.isEmpty()) {
            rows.put(row, column, styles.of(Role.TEXT, align), texts.symbol(symbol));
            grow(row, Role.TEXT, symbol, columns.width(column));
        }
    }

    private void link(int row, int column, Align align, String text, String to) {
        rows.put(row, column, styles.of(Role.LINK, align), texts.text(text));
        grow(row, Role.LINK, text, columns.width(column));
        links.add(new Link(new Place(sheet.name(), row, column), to));
    }

    /** A text over the width of the sheet, in a row of its own. */
    private void wide(int row, Role role, String text) {
        int style = styles.of(role, Align.LEFT);
        rows.put(row, 0, style, texts.text(text));
        for (int column = 1; column < columns.span(); column++) {
            rows.fill(row, column, style);
        }
        grow(row, role, text, columns.spanWidth());
        merged.add(row);
    }

    private void fill(int row, int width) {
        for (int column = 0; column < width; column++) {
            rows.fill(row, column, styles.of(Role.TEXT, Align.LEFT));
        }
    }

    private void grow(int row, Role role, String text, int width) {
        double larger = role.points() / (double) Styles.POINTS * (role.bold() ? 1.08 : 1);
        int lines = TextWidth.lines(text, (width - 1.5) / larger);
        rows.atLeast(row, Math.ceil(lines * role.points() * LINE + AIR));
    }

    private boolean isHere(Cell cell) {
        return cell.place().sheet().equals(sheet.name());
    }

    Sheet sheet() {
        return sheet;
    }

    SheetRows rows() {
        return rows;
    }

    Columns columns() {
        return columns;
    }

    /** The cells that stand on this sheet. */
    Set<Cell> written() {
        return written;
    }

    /** Rows that hold one text over the width of the sheet. */
    List<Integer> merged() {
        return merged;
    }

    /** Rows that hold the heads of a table. */
    List<Integer> heads() {
        return heads;
    }

    List<Link> links() {
        return links;
    }

    /** Whether a calculation stands here, whose first columns say what a row is about. */
    boolean hasLines() {
        return sheet.blocks().stream().anyMatch(Block.Lines.class::isInstance);
    }

    /** The places where the engineer types a number. */
    List<Place> numbersTyped() {
        return written.stream()
                .filter(cell -> cell.kind() == Cell.Kind.ENTRY && !(cell.typed() instanceof Value.Word))
                .map(Cell::place)
                .toList();
    }
}
