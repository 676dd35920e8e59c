package nappe.input;

import org.jspecify.annotations.Nullable;

/**
 * One thing wrong with an input workbook, at its place.
 *
 * <pre>headworks.xlsx, sheet Flows, cell C7: "12,5" is not a number; write 12.5 (fault: number-expected)</pre>
 *
 * @param file name of the file, without its folder
 * @param sheet null where the fault is one of the whole file
 * @param cell address ({@code C7}); null where the fault is one of the whole sheet
 * @param message what was read, what was expected, and the remedy
 * @param code stable and searchable: {@code number-expected}
 */
public record Fault(
        String file, @Nullable String sheet, @Nullable String cell, String message, String code) {
    @Override
    public String toString() {
        return file
                + (sheet == null ? "" : ", sheet " + sheet)
                + (cell == null ? "" : ", cell " + cell)
                + ": " + message + " (fault: " + code + ")";
    }
}
