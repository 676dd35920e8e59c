package nappe.source;

import java.util.ArrayList;
import java.util.List;

/**
 * The rows of a CSV text, each field with its place, so that a fault can be told by line and column. Fields are separated
 * by commas; one with a comma stands in quotation marks, in which a doubled mark is one mark. A row is one line. Blank lines
 * and lines that start with {@code #} are passed over; blanks around a field do not count.
 */
public final class CsvText {
    /** One field. */
    public static final class Cell {
        private final String text;
        private final int[] columns;

        private Cell(String text, int[] columns) {
            this.text = text;
            this.columns = columns;
        }

        public String text() {
            return text;
        }

        /** The column in its line, from 1, of a character of the field. */
        public int column(int offset) {
            return columns[Math.max(0, Math.min(offset, columns.length - 1))] + 1;
        }
    }

    /** One row; {@code line} from 1. */
    public record Row(int line, List<Cell> cells) {}

    private final String file;
    private final List<String> lines;
    private final List<Row> rows = new ArrayList<>();
    private final List<TextFault> faults = new ArrayList<>();

    private CsvText(String file, String text) {
        this.file = file;
        this.lines = text.lines().toList();
        for (int i = 0; i < lines.size(); i++) {
            String line = lines.get(i);
            if (!line.isBlank() && !line.startsWith("#")) {
                rows.add(new Row(i + 1, cells(line, i + 1)));
            }
        }
    }

    /** @param file as messages name it */
    public static CsvText of(String file, String text) {
        return new CsvText(file, text);
    }

    public List<Row> rows() {
        return rows;
    }

    /** The faults so far: those of quotation marks, and what the caller added. */
    public List<TextFault> faults() {
        return faults;
    }

    /** Adds a fault at a place of the text. */
    public void add(int line, int column, String message, String code) {
        String text = line > 0 && line <= lines.size() ? lines.get(line - 1) : "";
        faults.add(new TextFault(file, line, column, message, code, text));
    }

    /** Adds a fault of a field. */
    public void add(Row row, Cell cell, String message, String code) {
        add(row.line(), cell.column(0), message, code);
    }

    /** Adds a fault where a row is not as long as the head; tells whether it is. */
    public boolean isAsLongAs(Row head, Row row) {
        int wanted = head.cells().size();
        int found = row.cells().size();
        if (found != wanted) {
            int at = found > wanted
                    ? row.cells().get(wanted).column(0)
                    : lines.get(row.line() - 1).length() + 1;
            add(
                    row.line(),
                    at,
                    found + (found == 1 ? " column" : " columns") + " where the head has " + wanted
                            + "; a field with a comma in it stands in quotation marks",
                    "row-length");
        }
        return found == wanted;
    }

    private List<Cell> cells(String line, int number) {
        List<Cell> cells = new ArrayList<>();
        int at = 0;
        while (true) {
            int end = separator(line, at);
            cells.add(cell(line, number, at, end));
            if (end >= line.length()) {
                return cells;
            }
            at = end + 1;
        }
    }

    /** Where the field that starts here ends: at a comma that is not quoted, or at the end of the line. */
    private static int separator(String line, int from) {
        int at = from;
        while (at < line.length() && Character.isWhitespace(line.charAt(at))) {
            at++;
        }
        boolean quoted = at < line.length() && line.charAt(at) == '"';
        boolean inside = false;
        for (; at < line.length(); at++) {
            inside ^= quoted && line.charAt(at) == '"';
            if (line.charAt(at) == ',' && !inside) {
                return at;
            }
        }
        return line.length();
    }

    private Cell cell(String line, int number, int from, int to) {
        int start = from;
        int end = to;
        while (start < end && Character.isWhitespace(line.charAt(start))) {
            start++;
        }
        while (end > start && Character.isWhitespace(line.charAt(end - 1))) {
            end--;
        }
        if (start == end) {
            return new Cell("", new int[] {start});
        }
        return line.charAt(start) == '"' ? quoted(line, number, start, end) : plain(line.substring(start, end), start);
    }

    private static Cell plain(String text, int start) {
        int[] columns = new int[text.length()];
        for (int i = 0; i < columns.length; i++) {
            columns[i] = start + i;
        }
        return new Cell(text, columns);
    }

    private Cell quoted(String line, int number, int start, int end) {
        StringBuilder text = new StringBuilder();
        List<Integer> columns = new ArrayList<>();
        int at = start + 1;
        boolean closed = false;
        while (at < end && !closed) {
            boolean mark = line.charAt(at) == '"';
            boolean doubled = mark && at + 1 < end && line.charAt(at + 1) == '"';
            if (mark && !doubled) {
                closed = true;
            } else {
                text.append(line.charAt(at));
                columns.add(at);
            }
            at += doubled ? 2 : 1;
        }
        if (!closed) {
            add(number, start + 1, "the quotation marks opened here are not closed on this line", "quote-open");
        } else if (at < end) {
            add(
                    number,
                    at + 1,
                    "there is text behind the closing quotation marks; inside a field a mark is written twice",
                    "quote-closed");
        }
        columns.add(Math.min(at, end) - 1);
        return new Cell(
                text.toString().strip(),
                columns.stream()
                        .skip(text.length() - text.toString().stripLeading().length())
                        .mapToInt(c -> c)
                        .toArray());
    }
}
