package nappe.deliver.xlsx;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.apache.poi.ss.util.CellReference;

/**
 * The values of a workbook that LibreOffice writes as one text a sheet, commas between the cells, texts in quotes and
 * numbers with all the digits that it hands on. It writes so in half the time of a workbook.
 */
final class SheetsAsText {
    /** Commas, quotes, UTF-8, from row 1; texts quoted, numbers unquoted and whole, results for formulas, each sheet. */
    static final String FORMAT = "csv:Text - txt - csv (StarCalc):44,34,76,1,,0,true,true,false,false,false,-1";

    private final String text;
    private final String sheet;
    private final Map<String, Object> values;
    private int at;

    private SheetsAsText(String text, String sheet, Map<String, Object> values) {
        this.text = text;
        this.sheet = sheet;
        this.values = values;
    }

    /** By {@code "Sheet!A1"}: numbers as Double, all else as String; a cell without content is left out. */
    static Map<String, Object> of(Path folder, String book) throws IOException {
        Map<String, Object> values = new LinkedHashMap<>();
        for (Path file : files(folder, book)) {
            String name = file.getFileName().toString();
            String sheet = name.substring(book.length() + 1, name.length() - ".csv".length());
            new SheetsAsText(Files.readString(file), sheet, values).read();
        }
        return values;
    }

    private static List<Path> files(Path folder, String book) throws IOException {
        try (Stream<Path> all = Files.list(folder)) {
            List<Path> files = all.filter(file -> file.getFileName().toString().startsWith(book + "-"))
                    .sorted()
                    .toList();
            if (files.isEmpty()) {
                throw new IOException("no sheet of " + book + " was written");
            }
            return files;
        }
    }

    private void read() {
        for (int row = 0; at < text.length(); row++) {
            int column = 0;
            cell(row, column);
            while (at < text.length() && text.charAt(at) == ',') {
                at++;
                column++;
                cell(row, column);
            }
            if (at < text.length() && text.charAt(at) != '\n') {
                throw new IllegalStateException(sheet + ", character " + at + " ends no cell");
            }
            at++;
        }
    }

    private void cell(int row, int column) {
        if (at == text.length()) {
            return;
        }
        Object value = text.charAt(at) == '"' ? quoted() : unquoted();
        if (value != null) {
            values.put(sheet + "!" + CellReference.convertNumToColString(column) + (row + 1), value);
        }
    }

    private String quoted() {
        StringBuilder words = new StringBuilder();
        for (int end = text.indexOf('"', ++at); ; end = text.indexOf('"', at)) {
            words.append(text, at, end);
            at = end + 1;
            if (at == text.length() || text.charAt(at) != '"') {
                return words.toString();
            }
            words.append('"');
            at++;
        }
    }

    /** A number; else a truth or an error, which no result is. */
    private Object unquoted() {
        int from = at;
        while (at < text.length() && text.charAt(at) != ',' && text.charAt(at) != '\n') {
            at++;
        }
        String content = text.substring(from, at);
        if (content.isEmpty()) {
            return null;
        }
        char last = content.charAt(content.length() - 1);
        return Character.isDigit(last) ? (Object) Double.valueOf(content) : content;
    }
}
