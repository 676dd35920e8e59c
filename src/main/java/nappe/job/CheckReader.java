package nappe.job;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.formula.Formula;
import nappe.formula.FormulaException;
import nappe.formula.FormulaParser;
import nappe.source.CsvText;
import nappe.source.TextException;
import nappe.unit.Unit;
import nappe.unit.UnitException;

/** Reads check values from CSV; all faults are collected, each at its line and column. */
final class CheckReader {
    private static final List<String> HEAD =
            List.of("id", "method", "entries", "target", "expected", "unit", "tolerance", "source", "kind", "note");

    private static final List<String> KINDS = List.of("published", "library", "derived", "memory");

    private final CsvText csv;
    private final String house;
    private List<String> head = List.of();

    CheckReader(String file, String house, String text) {
        this.csv = CsvText.of(file, text);
        this.house = house;
    }

    /** @throws TextException with all faults */
    List<CheckRow> rows() {
        List<CsvText.Row> lines = csv.rows();
        head = lines.isEmpty()
                ? List.of()
                : lines.get(0).cells().stream().map(CsvText.Cell::text).toList();
        List<String> lacking =
                HEAD.stream().filter(name -> !head.contains(name)).toList();
        List<CheckRow> rows = new ArrayList<>();
        if (!lacking.isEmpty()) {
            csv.add(
                    lines.isEmpty() ? 1 : lines.get(0).line(),
                    1,
                    "the head lacks " + String.join(", ", lacking),
                    "head-unclear");
        } else {
            for (CsvText.Row line : lines.subList(1, lines.size())) {
                if (csv.isAsLongAs(lines.get(0), line)) {
                    rows.add(row(line));
                }
            }
        }
        if (!csv.faults().isEmpty()) {
            throw new TextException(csv.faults());
        }
        return rows;
    }

    private CheckRow row(CsvText.Row row) {
        refuseEmpty(row, "id", "a check value has a name of its own, such as C1", "id-missing");
        refuseEmpty(row, "source", "a check value names its source", "source-missing");
        if (!text(row, "tolerance").matches("\\d+(\\.\\d+)?([eE][+-]?\\d+)? (%|abs)")) {
            add(
                    row,
                    "tolerance",
                    "tolerance \"" + text(row, "tolerance") + "\" is neither like 0.1 % nor like 0.005 abs",
                    "tolerance-unclear");
        }
        if (!KINDS.contains(text(row, "kind"))) {
            add(
                    row,
                    "kind",
                    "kind \"" + text(row, "kind") + "\" is none of " + String.join(", ", KINDS),
                    "kind-unknown");
        }
        return new CheckRow(
                text(row, "id"),
                text(row, "method"),
                text(row, "entries"),
                entries(row, cell(row, "entries")),
                text(row, "target"),
                expected(row),
                unit(row),
                text(row, "tolerance"),
                text(row, "source"),
                text(row, "kind"),
                text(row, "note"),
                house);
    }

    private void refuseEmpty(CsvText.Row row, String column, String message, String code) {
        if (text(row, column).isEmpty()) {
            add(row, column, message, code);
        }
    }

    private double expected(CsvText.Row row) {
        String expected = text(row, "expected");
        boolean isNumber = expected.matches("-?\\d+(\\.\\d+)?([eE][+-]?\\d+)?");
        double number = isNumber ? Double.parseDouble(expected) : 0;
        if (!isNumber || Double.isInfinite(number)) {
            add(
                    row,
                    "expected",
                    "\"" + expected + "\" is not a number; write it like 2.5 or -1e-3, its unit in the next column",
                    "number-expected");
        }
        return number;
    }

    private Unit unit(CsvText.Row row) {
        try {
            return Unit.parse(text(row, "unit"));
        } catch (UnitException e) {
            add(row, "unit", String.valueOf(e.getMessage()), "unit-unknown");
            return Unit.one();
        }
    }

    private Map<String, Formula> entries(CsvText.Row row, CsvText.Cell cell) {
        Map<String, Formula> entries = new LinkedHashMap<>();
        int from = 0;
        for (String part : cell.text().split(";")) {
            int start = from + part.length() - part.stripLeading().length();
            from += part.length() + 1;
            if (!part.isBlank()) {
                entry(row, cell, start, part.strip(), entries);
            }
        }
        return entries;
    }

    private void entry(CsvText.Row row, CsvText.Cell cell, int start, String text, Map<String, Formula> entries) {
        try {
            FormulaParser parser = new FormulaParser(text);
            String symbol = parser.name();
            parser.expect("=");
            int value = parser.offset();
            Formula formula = parser.sum();
            parser.end();
            if (!isTyped(formula)) {
                throw new FormulaException(
                        "an entry is a number with its unit, or words in quotation marks", value, 1, "entry-unclear");
            }
            entries.put(symbol, formula);
        } catch (FormulaException e) {
            csv.add(row.line(), cell.column(start + e.offset()), String.valueOf(e.getMessage()), e.code());
        } catch (UnitException e) {
            csv.add(row.line(), cell.column(start), String.valueOf(e.getMessage()), "unit-unknown");
        }
    }

    private static boolean isTyped(Formula formula) {
        Formula size = formula instanceof Formula.Negation negation ? negation.of() : formula;
        return size instanceof Formula.Quantity || size instanceof Formula.Numeral || formula instanceof Formula.Word;
    }

    private CsvText.Cell cell(CsvText.Row row, String column) {
        return row.cells().get(head.indexOf(column));
    }

    private String text(CsvText.Row row, String column) {
        return cell(row, column).text();
    }

    private void add(CsvText.Row row, String column, String message, String code) {
        csv.add(row, cell(row, column), message, code);
    }
}
