package nappe.source;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.formula.Value;
import nappe.unit.Unit;
import nappe.unit.UnitException;
import org.jspecify.annotations.Nullable;

/** Reads the CSV form of a cited table; all faults are collected, each at its line and column. */
final class TableReader {
    private static final Pattern HEAD = Pattern.compile("([A-Za-z][A-Za-z0-9_]*)(?: \\[(.+)])?");

    /** A column while it is read; {@code sound} is false where its head has a fault. */
    private record Draft(String symbol, @Nullable Unit unit, boolean sound, List<Value> values) {}

    private final CsvText csv;
    private final List<String> remarks = new ArrayList<>();
    private String title = "";
    private String source = "";

    private TableReader(String file, String text) {
        this.csv = CsvText.of(file, text);
    }

    /** @throws TextException with all faults */
    static CitedTable read(String name, String house, String file, String text) {
        return new TableReader(file, text).table(name, house, text);
    }

    private CitedTable table(String name, String house, String text) {
        for (String line : text.lines().takeWhile(line -> line.startsWith("#")).toList()) {
            remark(line.substring(1).strip());
        }
        if (title.isEmpty() || source.isEmpty()) {
            csv.add(1, 1, "a cited table starts with \"# title:\" and \"# source:\"", "source-missing");
        }
        List<CitedTable.Column> columns = columns();
        if (!csv.faults().isEmpty()) {
            throw new TextException(csv.faults());
        }
        return new CitedTable(name, house, title, source, List.copyOf(remarks), columns);
    }

    private void remark(String remark) {
        if (remark.startsWith("title:")) {
            title = remark.substring(6).strip();
        } else if (remark.startsWith("source:")) {
            source = remark.substring(7).strip();
        } else if (!remark.isEmpty()) {
            remarks.add(remark);
        }
    }

    private List<CitedTable.Column> columns() {
        List<CsvText.Row> rows = csv.rows();
        if (rows.size() < 2) {
            csv.add(rows.isEmpty() ? 1 : rows.get(0).line(), 1, "the table has no rows", "table-empty");
        }
        if (rows.isEmpty()) {
            return List.of();
        }
        CsvText.Row head = rows.get(0);
        Set<String> known = new HashSet<>();
        List<Draft> drafts =
                head.cells().stream().map(cell -> head(head, cell, known)).toList();
        for (CsvText.Row row : rows.subList(1, rows.size())) {
            if (csv.isAsLongAs(head, row)) {
                for (int i = 0; i < drafts.size(); i++) {
                    value(drafts.get(i), row, row.cells().get(i));
                }
            }
        }
        return drafts.stream()
                .map(draft -> new CitedTable.Column(draft.symbol(), draft.unit(), List.copyOf(draft.values())))
                .toList();
    }

    private Draft head(CsvText.Row row, CsvText.Cell cell, Set<String> known) {
        Matcher head = HEAD.matcher(cell.text());
        if (!head.matches()) {
            csv.add(
                    row,
                    cell,
                    "column head \"" + cell.text()
                            + "\" is not a symbol with its unit in brackets, such as h [m]"
                            + (cell.text().contains(";") ? "; columns are separated by commas" : ""),
                    "head-unclear");
            return new Draft("", null, false, new ArrayList<>());
        }
        String symbol = head.group(1);
        if (!known.add(symbol)) {
            csv.add(row, cell, "there are two columns " + symbol, "head-twice");
        }
        try {
            return new Draft(symbol, head.group(2) == null ? null : Unit.parse(head.group(2)), true, new ArrayList<>());
        } catch (UnitException e) {
            csv.add(row.line(), cell.column(head.start(2)), String.valueOf(e.getMessage()), "unit-unknown");
            return new Draft(symbol, null, false, new ArrayList<>());
        }
    }

    private void value(Draft draft, CsvText.Row row, CsvText.Cell cell) {
        String text = cell.text();
        if (draft.unit() == null) {
            draft.values().add(Value.word(text));
        } else if (text.isEmpty()) {
            draft.values().add(new Value.None(Value.NOT_GIVEN));
        } else if (!text.matches("-?\\d+(\\.\\d+)?([eE][+-]?\\d+)?") || !Double.isFinite(Double.parseDouble(text))) {
            csv.add(
                    row,
                    cell,
                    "\"" + text + "\" is not a number; write it like 2.5 or -1e-3, without a unit",
                    "number-expected");
        } else {
            draft.values().add(Value.of(Double.parseDouble(text)));
        }
    }
}
