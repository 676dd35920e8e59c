package nappe.deliver.pdf;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Sheet;

/** Where links within the PDF lead, and workbook addresses as they read from one sheet. */
final class Links {
    private static final String INDEX = "Index";
    private static final String ELEMENT = "Element";

    private final Map<String, Integer> numbers = new HashMap<>();
    private final String here;

    /**
     * @param here name of the sheet that is printed
     */
    Links(List<Sheet> sheets, String here) {
        sheets.forEach(sheet -> numbers.put(sheet.name(), sheet.number()));
        this.here = here;
    }

    /** The id of a sheet in the page. */
    static String id(int number) {
        return "sheet-" + number;
    }

    static String to(int number) {
        return "#" + id(number);
    }

    /** The link to the list of the sheets; empty where there is none. */
    static String toIndex(List<Sheet> sheets) {
        return sheets.stream()
                .filter(sheet -> sheet.name().equals(INDEX))
                .map(sheet -> to(sheet.number()))
                .findFirst()
                .orElse("");
    }

    /** The link to the sheet on which a cell stands; empty for this sheet and for one that is not in the package. */
    String to(Cell cell) {
        Integer number = numbers.get(cell.place().sheet());
        return number == null || cell.place().sheet().equals(here) ? "" : to(number);
    }

    /** A text as the link to the sheet of the element that it names, where the column holds elements. */
    View.Text ofElement(View.Text text, Block.Column column) {
        Integer number = column.head().equals(ELEMENT) ? numbers.get(text.characters()) : null;
        return number == null ? text : new View.Text(text.style(), text.pieces(), to(number));
    }

    /** The workbook address: {@code E14} on this sheet, {@code F1!E14} on another. */
    String address(Cell cell) {
        return unquoted(cell.place().from(here));
    }

    /** An address without the quotes around a plain sheet name. */
    static String unquoted(String address) {
        return address.replaceFirst("^'(\\w+)'!", "$1!");
    }
}
