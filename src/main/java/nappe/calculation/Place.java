package nappe.calculation;

/**
 * Where a cell stands in the workbook of the package.
 *
 * @param sheet name of the sheet, as on its tab
 * @param row from 0
 * @param column from 0
 */
public record Place(String sheet, int row, int column) {
    /** The address within its sheet: {@code E14}. */
    public String address() {
        return letters(column) + (row + 1);
    }

    /** The address as seen from another sheet, the name quoted: {@code 'F1'!E14}. */
    public String full() {
        return "'" + sheet.replace("'", "''") + "'!" + address();
    }

    /** As written in a formula that stands on the given sheet. */
    public String from(String otherSheet) {
        return sheet.equals(otherSheet) ? address() : full();
    }

    /** The letters of a column counted from 0: A, B, ... Z, AA. */
    public static String letters(int column) {
        return (column >= 26 ? letters(column / 26 - 1) : "") + (char) ('A' + column % 26);
    }
}
