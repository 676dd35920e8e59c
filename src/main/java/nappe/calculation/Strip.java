package nappe.calculation;

import java.util.ArrayList;
import java.util.List;

/**
 * A run of places that lines are laid into: down a column of a calculation sheet, or along a row of a grid. The only
 * thing that knows which.
 */
public final class Strip {
    /**
     * A line as laid.
     *
     * @param equation text in place of the cell's formula; empty for the formula itself
     * @param onTheWay whether it only leads to a result elsewhere: a step at a bound value, a side of a limit
     */
    public record Laid(String symbol, String label, String equation, String source, Cell cell, boolean onTheWay) {
        public Laid(String symbol, String label, String equation, String source, Cell cell) {
            this(symbol, label, equation, source, cell, false);
        }
    }

    private final String sheet;
    private final boolean down;
    private int row;
    private int column;
    private final List<Laid> laid = new ArrayList<>();

    private Strip(String sheet, int row, int column, boolean down) {
        this.sheet = sheet;
        this.row = row;
        this.column = column;
        this.down = down;
    }

    public static Strip down(String sheet, int row, int column) {
        return new Strip(sheet, row, column, true);
    }

    public static Strip along(String sheet, int row, int column) {
        return new Strip(sheet, row, column, false);
    }

    /** The next free place. */
    Place next() {
        Place place = new Place(sheet, row, column);
        if (down) {
            row++;
        } else {
            column++;
        }
        return place;
    }

    void add(Laid line) {
        laid.add(line);
    }

    /** The heads of what has been laid, each with its unit: {@code h_e [m]}; the label where there is no symbol. */
    List<String> heads() {
        return laid.stream()
                .map(line -> (line.symbol().isEmpty() ? line.label() : line.symbol())
                        + (line.cell().unit().text().equals("1")
                                ? ""
                                : " [" + line.cell().unit() + "]"))
                .toList();
    }

    /** What has been laid, in order. */
    public List<Laid> laid() {
        return laid;
    }
}
