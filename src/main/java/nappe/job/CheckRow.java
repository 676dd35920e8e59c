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

    private static final List<String> HEAD =
            List.of("id", "method", "entries", "target", "expected", "unit", "tolerance", "source", "kind", "note");

    private static final CSVFormat FORMAT = CSVFormat.DEFAULT
            .builder()
            .setCommentMarker('#')
            .setHeader()
            .setSkipHeaderRecord(true)
            .setTrim(true)
            .get();

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

    /** The rows of {@code checks/left-out.csv} for a method that are known to disagree: id and why. */
    public static List<List<String>> knownToBeOff(TextLibrary library, String method) {
        String text = library.text("checks/left-out.csv");
        if (text == null) {
            return List.of();
        }
        try (CSVParser parser = FORMAT.parse(new StringReader(text))) {
            return parser.stream()
                    .filter(row ->
                            row.get("method").equals(method) && row.get("why").contains("known to be off"))
                    .map(row -> List.of(row.get("id"), row.get("why")))
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /**
     * Reads check values.
     *
     * @throws CheckException with file and line of the first fault
     */
    public static List<CheckRow> read(String file, String text) {
        List<CheckRow> rows = new ArrayList<>();
        try (CSVParser parser = FORMAT.parse(new StringReader(text))) {
            List<String> lacking = HEAD.stream()
                    .filter(name -> !parser.getHeaderNames().contains(name))
                    .toList();
            if (!lacking.isEmpty()) {
                long line = parser.getCurrentLineNumber();
                throw new CheckException(file + ":" + line + ": the head lacks " + String.join(", ", lacking)
                        + " (fault: head-unclear)");
            }
            for (CSVRecord record : parser) {
                rows.add(row(
                        file + ":" + parser.getCurrentLineNumber() + ": ",
                        record,
                        parser.getHeaderNames().size()));
            }
        } catch (IOException | IllegalArgumentException | UncheckedIOException e) {
            throw new CheckException(file + ": " + e.getMessage() + " (fault: table-unreadable)");
        }
        return rows;
    }

    private static CheckRow row(String place, CSVRecord record, int columns) {
        if (record.size() != columns) {
            throw new CheckException(
                    place + record.size() + " columns where the head has " + columns + " (fault: row-length)");
        }
        String tolerance = record.get("tolerance");
        if (!tolerance.matches("\\d+(\\.\\d+)?([eE][+-]?\\d+)? (%|abs)")) {
            throw new CheckException(place + "tolerance \"" + tolerance
                    + "\" is neither like 0.1 % nor like 0.005 abs (fault: tolerance-unclear)");
        }
        if (!KINDS.contains(record.get("kind"))) {
            throw new CheckException(place + "kind \"" + record.get("kind") + "\" is none of "
                    + String.join(", ", KINDS) + " (fault: kind-unknown)");
        }
        if (record.get("source").isEmpty()) {
            throw new CheckException(place + "a check value names its source (fault: source-missing)");
        }
        String expected = record.get("expected");
        if (!expected.matches("-?\\d+(\\.\\d+)?([eE][+-]?\\d+)?")) {
            throw new CheckException(place + "\"" + expected + "\" is not a number (fault: number-expected)");
        }
        try {
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
        } catch (FormulaException e) {
            throw new CheckException(place + e.getMessage() + " (fault: " + e.code() + ")");
        } catch (UnitException e) {
            throw new CheckException(place + e.getMessage() + " (fault: unit-unknown)");
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
