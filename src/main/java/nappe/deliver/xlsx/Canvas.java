package nappe.deliver.xlsx;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.calculation.Allowed;
import nappe.calculation.Block.Align;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.calculation.Sheet;
import nappe.deliver.xlsx.Styles.Role;
import nappe.formula.Value;
import nappe.results.Digits;
import nappe.results.Results;

/** One sheet while it is filled: each text and cell gets its style, and its row the height it needs. */
final class Canvas {
    private static final double LINE = 1.28;
    private static final double AIR = 3;

    /** A place that leads to another. */
    record Link(Place from, String to) {}

    private final Results results;
    private final String sheet;
    private final Styles styles;
    private final SharedTexts texts;
    private final Columns columns;
    private final SheetRows rows;
    private final Set<Cell> written = new LinkedHashSet<>();
    private final List<Integer> merged = new ArrayList<>();
    private final List<Link> links = new ArrayList<>();

    Canvas(Results results, Sheet sheet, Styles styles, SharedTexts texts) {
        this.results = results;
        this.sheet = sheet.name();
        this.styles = styles;
        this.texts = texts;
        this.columns = Columns.of(sheet);
        this.rows = new SheetRows(sheet.name());
    }

    boolean isHere(Cell cell) {
        return cell.place().sheet().equals(sheet);
    }

    /** A cell at its own place, or, where it stands on another sheet, a link to it. */
    void cell(int row, int column, Cell cell, Align align, Role role) {
        Value value = results.value(cell);
        if (!isHere(cell)) {
            put(row, column, role, align, cell, new Filling.Live(cell.place().from(sheet), value));
            return;
        }
        Place place = cell.place();
        if (!written.add(cell)) {
            return;
        }
        switch (cell.kind()) {
            case FORMULA ->
                put(
                        place.row(),
                        place.column(),
                        role,
                        align,
                        cell,
                        new Filling.Live(SpreadsheetReading.of(cell), value));
            case ENTRY -> put(place.row(), place.column(), Role.ENTRY, align, cell, typed(value));
            case CONSTANT, TABLE, RERUN -> put(place.row(), place.column(), Role.CONSTANT, align, cell, typed(value));
        }
    }

    private void put(int row, int column, Role role, Align align, Cell cell, Filling content) {
        Value value = results.value(cell);
        if (value instanceof Value.Number number) {
            String format = format(cell, number.value());
            rows.put(row, column, styles.of(role, align, format), content);
            grow(row, role, "", columns.width(column));
            if (!format.equals(Styles.AS_TYPED)) {
                columns.fit(column, Digits.print(cell.unit(), number.value()));
            }
        } else {
            rows.put(row, column, styles.of(role, align), content);
            grow(row, role, SheetRows.words(value), columns.width(column));
        }
    }

    private Filling typed(Value value) {
        return value instanceof Value.Number number
                ? new Filling.Typed(number.value())
                : texts.text(SheetRows.words(value));
    }

    /** A result that is whole as issued is shown as typed: after a change its decimals would still have to be seen. */
    private static String format(Cell cell, double value) {
        int decimals = Digits.decimals(cell.unit(), value);
        boolean whole = decimals == 0 && value == Math.rint(value);
        return whole || !cell.isComputed() ? Styles.AS_TYPED : Digits.format(decimals);
    }

    void text(int row, int column, Role role, Align align, String text) {
        if (!text.isEmpty()) {
            String tidy = tidy(text);
            rows.put(row, column, styles.of(role, align), texts.text(tidy));
            grow(row, role, tidy, columns.width(column));
        }
    }

    /** Blanks that only laid out a text elsewhere would leave gaps here. */
    static String tidy(String text) {
        return text.replaceAll(" {2,}", " ");
    }

    void symbol(int row, int column, String symbol, Align align) {
        if (!symbol.isEmpty()) {
            rows.put(row, column, styles.of(Role.TEXT, align), texts.symbol(symbol));
            grow(row, Role.TEXT, symbol, columns.width(column));
        }
    }

    /** A text that leads to a place; it is not broken into lines, since LibreOffice doesn't break links. */
    void link(int row, int column, Align align, String text, String to) {
        rows.put(row, column, styles.of(Role.LINK, align), texts.text(text));
        columns.fit(column, text);
        grow(row, Role.LINK, text, columns.width(column));
        links.add(new Link(new Place(sheet, row, column), to));
    }

    /** A small text without a box that leads to a place. */
    void plainLink(int row, int column, String text, String to) {
        rows.put(row, column, styles.of(Role.BACK, Align.LEFT), texts.text(text));
        columns.fit(column, text);
        grow(row, Role.BACK, text, columns.width(column));
        leads(row, column, to);
    }

    /** Makes what stands in a cell lead to a place. */
    void leads(int row, int column, String to) {
        links.add(new Link(new Place(sheet, row, column), to));
    }

    /** A text over the width of the sheet, in a row of its own. */
    void wide(int row, Role role, String text) {
        int style = styles.of(role, Align.LEFT);
        rows.put(row, 0, style, texts.text(text));
        for (int column = 1; column < columns.span(); column++) {
            rows.fill(row, column, style);
        }
        grow(row, role, text, columns.spanWidth());
        merged.add(row);
    }

    /** Boxes where nothing stands, up to so many columns. */
    void fill(int row, int width, Role role) {
        for (int column = 0; column < width; column++) {
            rows.fill(row, column, styles.of(role, Align.LEFT));
        }
    }

    /** An empty row of some height. */
    void gap(int row, double points) {
        rows.atLeast(row, points);
    }

    private void grow(int row, Role role, String text, int width) {
        double larger = role.points() / (double) Styles.POINTS * (role.bold() ? 1.08 : 1);
        int lines = TextWidth.lines(text, (width - 1.5) / larger);
        rows.atLeast(row, Math.ceil(lines * role.points() * LINE + AIR));
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

    List<Link> links() {
        return links;
    }

    /** Where something is typed, by what may be typed there. */
    Map<Allowed, List<Place>> typedInto() {
        Map<Allowed, List<Place>> places = new LinkedHashMap<>();
        for (Cell cell : written) {
            Allowed allowed = cell.allowed();
            if (allowed != null) {
                places.computeIfAbsent(allowed, key -> new ArrayList<>()).add(cell.place());
            }
        }
        return places;
    }
}
