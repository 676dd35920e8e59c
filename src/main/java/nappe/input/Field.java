package nappe.input;

import nappe.station.Design.Origin;
import org.jspecify.annotations.Nullable;

/**
 * A place of the input workbook where something is typed.
 *
 * @param cell null where nothing is typed
 * @param covered the merged range under which the place can't be seen ({@code C7:C8}); empty for none
 */
record Field(String sheet, String address, @Nullable RawCell cell, String covered) {
    boolean isBlank() {
        return cell == null || cell.isBlank();
    }

    Origin origin() {
        return new Origin(sheet, address);
    }
}
