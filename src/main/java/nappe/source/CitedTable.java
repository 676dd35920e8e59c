package nappe.source;

import java.io.IOException;
import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.unit.Unit;
import nappe.unit.UnitException;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.jspecify.annotations.Nullable;

/**
 * A published table, read from CSV with its source inside:
 *
 * <pre>
 * # title: Coefficients of a contracted weir
 * # source: where the numbers were read, in words
 * # any other remark
 * r_b [1], a [1], k_b [mm], remark
 * 0.2, 0.589, 2.4, from memory
 * </pre>
 *
 * A column with a unit holds numbers, one without holds words. A blank number is "not given".
 */
public final class CitedTable {
    /** One column; {@code unit} is null for words. */
    public record Column(String symbol, @Nullable Unit unit, List<Value> values) {
        public boolean isWords() {
            return unit == null;
        }

        public boolean hasBlanks() {
            return values.stream().anyMatch(Value.None.class::isInstance);
        }

        /** What can be said of the sign of every number in it. */
        public Sign sign() {
            double least = values.stream()
                    .filter(Value.Number.class::isInstance)
                    .mapToDouble(value -> ((Value.Number) value).value())
                    .min()
                    .orElse(1);
            return least > 0 ? Sign.POSITIVE : least == 0 ? Sign.NOT_NEGATIVE : Sign.ANY;
        }
    }

    private static final Pattern HEAD = Pattern.compile("([A-Za-z][A-Za-z0-9_]*)(?: \\[(.+)])?");

    private final String name;
    private final String title;
    private final String source;
    private final List<String> remarks;
    private final List<Column> columns;

    private CitedTable(String name, String title, String source, List<String> remarks, List<Column> columns) {
        this.name = name;
        this.title = title;
        this.source = source;
        this.remarks = remarks;
        this.columns = columns;
    }

    /** The file name without its ending: {@code kindsvater-carter}. */
    public String name() {
        return name;
    }

    public String title() {
        return title;
    }

    public String source() {
        return source;
    }

    public List<String> remarks() {
        return remarks;
    }

    public List<Column> columns() {
        return columns;
    }

    public int rows() {
        return columns.get(0).values().size();
    }

    /** The column with the symbol, or null. */
    public @Nullable Column column(String symbol) {
        return columns.stream()
                .filter(c -> c.symbol().equals(symbol))
                .findFirst()
                .orElse(null);
    }

    /** The names of its columns, for messages. */
    public String columnNames() {
        return String.join(", ", columns.stream().map(Column::symbol).toList());
    }

    /**
     * Reads a table.
     *
     * @throws TableException with file and line, where it is not such a table
     */
    public static CitedTable read(String name, String text) {
        String file = name + ".csv";
        List<String> remarks = new ArrayList<>();
        String title = "";
        String source = "";
        for (String line : text.lines().takeWhile(line -> line.startsWith("#")).toList()) {
            String remark = line.substring(1).strip();
            if (remark.startsWith("title:")) {
                title = remark.substring(6).strip();
            } else if (remark.startsWith("source:")) {
                source = remark.substring(7).strip();
            } else if (!remark.isEmpty()) {
                remarks.add(remark);
            }
        }
        if (title.isEmpty() || source.isEmpty()) {
            throw new TableException(
                    file + ":1: a cited table starts with \"# title:\" and \"# source:\" (fault: source-missing)");
        }
        return new CitedTable(name, title, source, List.copyOf(remarks), readColumns(file, text));
    }

    private static List<Column> readColumns(String file, String text) {
        CSVFormat format = CSVFormat.DEFAULT
                .builder()
                .setCommentMarker('#')
                .setTrim(true)
                .setIgnoreSurroundingSpaces(true)
                .get();
        try (CSVParser parser = format.parse(new StringReader(text))) {
            List<Row> rows = new ArrayList<>();
            for (CSVRecord row : parser) {
                rows.add(new Row(row, parser.getCurrentLineNumber()));
            }
            if (rows.size() < 2) {
                throw new TableException(file + ":1: the table has no rows (fault: table-empty)");
            }
            List<Column> columns = new ArrayList<>();
            for (int i = 0; i < rows.get(0).fields().size(); i++) {
                Column column = readColumn(file, rows, i);
                if (columns.stream().anyMatch(c -> c.symbol().equals(column.symbol()))) {
                    throw new TableException(file + ":" + rows.get(0).line() + ": there are two columns "
                            + column.symbol() + " (fault: head-twice)");
                }
                columns.add(column);
            }
            return List.copyOf(columns);
        } catch (IOException | java.io.UncheckedIOException e) {
            throw new TableException(file + ": " + e.getMessage() + " (fault: table-unreadable)");
        }
    }

    /** A row of the file with the line it ends on. */
    private record Row(CSVRecord fields, long line) {}

    private static Column readColumn(String file, List<Row> rows, int i) {
        Row first = rows.get(0);
        Matcher head = HEAD.matcher(first.fields().get(i));
        if (!head.matches()) {
            throw new TableException(file + ":" + first.line() + ": column head \""
                    + first.fields().get(i)
                    + "\" is not a symbol with its unit in brackets, such as h [m] (fault: head-unclear)");
        }
        Unit unit = unit(file, first.line(), head.group(2));
        List<Value> values = new ArrayList<>();
        for (Row row : rows.subList(1, rows.size())) {
            if (row.fields().size() != first.fields().size()) {
                throw new TableException(
                        file + ":" + row.line() + ": " + row.fields().size() + " columns where the head has "
                                + first.fields().size() + " (fault: row-length)");
            }
            String field = row.fields().get(i);
            values.add(unit == null ? Value.word(field) : number(file, row.line(), field));
        }
        return new Column(head.group(1), unit, List.copyOf(values));
    }

    private static @Nullable Unit unit(String file, long line, @Nullable String text) {
        try {
            return text == null ? null : Unit.parse(text);
        } catch (UnitException e) {
            throw new TableException(file + ":" + line + ": " + e.getMessage() + " (fault: unit-unknown)");
        }
    }

    private static Value number(String file, long line, String text) {
        if (text.isEmpty()) {
            return new Value.None(Value.NOT_GIVEN);
        }
        if (!text.matches("-?\\d+(\\.\\d+)?([eE][+-]?\\d+)?") || !Double.isFinite(Double.parseDouble(text))) {
            throw new TableException(file + ":" + line + ": \"" + text + "\" is not a number (fault: number-expected)");
        }
        return Value.of(Double.parseDouble(text));
    }
}
