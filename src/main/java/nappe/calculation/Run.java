package nappe.calculation;

import java.util.List;

/** A run of neighbouring cells in one row or one column of one sheet. */
public record Run(List<Cell> cells) implements Reference {
    public Run {
        cells = List.copyOf(cells);
        if (cells.isEmpty()) {
            throw new IllegalArgumentException("a run needs a cell");
        }
    }

    /** As written in a formula that stands on the given sheet: {@code 'Tables'!B4:B38}. */
    public String from(String otherSheet) {
        Place first = cells.get(0).place();
        Place last = cells.get(cells.size() - 1).place();
        return first.from(otherSheet) + ":" + last.address();
    }

    /** The same with dollar signs, for a range that stays where it is. */
    public String fixedFrom(String otherSheet) {
        Place first = cells.get(0).place();
        Place last = cells.get(cells.size() - 1).place();
        String sheet =
                first.sheet().equals(otherSheet) ? "" : "'" + first.sheet().replace("'", "''") + "'!";
        return sheet + dollars(first) + ":" + dollars(last);
    }

    private static String dollars(Place place) {
        return "$" + Place.letters(place.column()) + "$" + (place.row() + 1);
    }
}
