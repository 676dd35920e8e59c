package nappe.input;

import java.util.ArrayList;
import java.util.List;

/** The lists of words that cells of a blank offer; they stand on the sheet Lists, a column for each. */
final class DropDowns {
    static final int FIRST_ROW = 4;

    record Column(String title, List<String> words) {}

    private final List<Column> columns = new ArrayList<>();

    /** The range that holds the words; equal words share one. */
    String range(String title, List<String> words) {
        int at = 0;
        while (at < columns.size() && !columns.get(at).words().equals(words)) {
            at++;
        }
        if (at == columns.size()) {
            columns.add(new Column(title, words));
        }
        String first = RawCell.address(FIRST_ROW, at);
        String last = RawCell.address(FIRST_ROW + words.size() - 1, at);
        return Layout.LISTS + "!" + fixed(first) + ":" + fixed(last);
    }

    List<Column> columns() {
        return columns;
    }

    /** With dollar signs: {@code $A$5}. */
    static String fixed(String address) {
        return address.replaceAll("([A-Z]+)([0-9]+)", "\\$$1\\$$2");
    }
}
