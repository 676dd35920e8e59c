package nappe.job;

import java.io.IOException;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.formula.Formula;
import nappe.formula.FormulaException;
import nappe.formula.FormulaParser;
import nappe.source.TextLibrary;
import nappe.unit.Unit;
import nappe.unit.UnitException;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * One check value, as read from CSV with the head {@code
 * id,method,entries,target,expected,unit,tolerance,source,kind,note}.
 *
 * @param entries {@code size = "3 ft"; h = 2 ft}, by symbol
 * @param tolerance {@code 0.1 %} of the expected value, or {@code 0.005 abs} in the unit of the row
 * @param kind published, library, derived or memory
 */
public record CheckRow(
        String id,
        String method,
        String entriesText,
        Map<String, Formula> entries,
        String target,
        double expected,
        Unit unit,
        String tolerance,
        String source,
        String kind,
        String note) {

    private static final String NUMBER = "(\\d+\\.?\\d*|\\.\\d+)([eE][-+]?\\d{1,3})?";
    private static final List<String> KINDS = List.of("published", "library", "derived", "memory");

    /** How far the computed value may be off, in the unit of the row. */
    public double slack() {
        String[] parts = tolerance.split(" ");
        double size = Double.parseDouble(parts[0]);
        return parts[1].equals("%") ? Math.abs(expected) * size / 100 : size;
    }

    /** The check values that come with the methods: {@code checks/NAME.csv} for each method that has them. */
    public static List<CheckRow> builtIn(TextLibrary library) {
        List<CheckRow> rows = new ArrayList<>();
        for (String file : library.names("checks")) {
            String text = library.text("checks/" + file);
            if (file.endsWith(".csv") && !file.equals("left-out.csv") && text != null) {
                rows.addAll(read(file, text));
            }
        }
        return rows;
    }

    /**
     * Reads check values.
     *
     * @throws CheckException with file and line of the first fault
     */
    public static List<CheckRow> read(String file, String text) {
        CSVFormat format = CSVFormat.DEFAULT.builder()
                .setCommentMarker('#')
                .setHeader()
                .setSkipHeaderRecord(true)
                .setTrim(true)
                .get();
        List<CheckRow> rows = new ArrayList<>();
        try (CSVParser parser = format.parse(new StringReader(text))) {
            for (CSVRecord record : parser) {
                rows.add(row(file, parser.getCurrentLineNumber(), record));
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (IllegalArgumentException | UncheckedIOException e) {
            throw new CheckException(file + ": " + e.getMessage());
        }
        return rows;
    }

    private static CheckRow row(String file, long line, CSVRecord record) {
        try {
            if (!record.isConsistent()) {
                throw new CheckException("the row has " + record.size() + " values, the head row names "
                        + record.getParser().getHeaderNames().size());
            }
            String expected = record.get("expected");
            if (!expected.matches("[-+]?" + NUMBER)) {
                throw new CheckException("expected value \"" + expected + "\" is not a number");
            }
            String tolerance = record.get("tolerance");
            if (!tolerance.matches(NUMBER + " (%|abs)")) {
                throw new CheckException("tolerance \"" + tolerance + "\" is neither like 0.1 % nor like 0.005 abs");
            }
            if (!KINDS.contains(record.get("kind"))) {
                throw new CheckException("kind \"" + record.get("kind") + "\" is none of " + String.join(", ", KINDS));
            }
            if (record.get("source").isEmpty()) {
                throw new CheckException("a check value names its source");
            }
            return new CheckRow(
                    record.get("id"),
                    record.get("method"),
                    record.get("entries"),
                    entries(record.get("entries")),
                    record.get("target"),
                    Double.parseDouble(expected),
                    Unit.parse(record.get("unit")),
                    tolerance,
                    record.get("source"),
                    record.get("kind"),
                    record.get("note"));
        } catch (FormulaException | UnitException | IllegalArgumentException | CheckException e) {
            throw new CheckException(file + ":" + line + ": " + e.getMessage());
        }
    }

    private static Map<String, Formula> entries(String text) {
        Map<String, Formula> entries = new LinkedHashMap<>();
        for (String part : text.split(";")) {
            if (!part.isBlank()) {
                FormulaParser parser = new FormulaParser(part.strip());
                String symbol = parser.name();
                parser.expect("=");
                entries.put(symbol, parser.sum());
                parser.end();
            }
        }
        return entries;
    }
}
