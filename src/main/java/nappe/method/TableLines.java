package nappe.method;

import java.util.List;
import nappe.formula.DimensionReading;
import nappe.formula.Formula;
import nappe.formula.FormulaException;
import nappe.formula.Function;
import nappe.formula.Operator;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.source.CitedTable;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * The lines that a look-up in a cited table becomes: the row, and for numbers between two rows the share of the way from
 * one to the next, each in a cell of its own. A column of table {@code t} is known to formulas as {@code t.symbol}.
 */
final class TableLines {
    private final SheetDraft draft;
    private final CitedTable table;
    private final String key;
    private final String source;

    TableLines(SheetDraft draft, CitedTable table, String key, String source) {
        this.draft = draft;
        this.table = table;
        this.key = key;
        this.source = source;
    }

    /** Defines the columns and lays the lines that find the row. */
    void open(boolean between, DimensionReading.Outcome keyOutcome) {
        for (CitedTable.Column column : table.columns()) {
            draft.define(name(table, column), outcome(column));
            draft.reach.put(name(table, column), java.util.Set.of(name(table, column)));
        }
        CitedTable.Column first = table.columns().get(0);
        if (first.isWords() == between) {
            throw new FormulaException(
                    between
                            ? "the first column of " + table.name() + " holds words: write \"by\""
                            : "the first column of " + table.name() + " holds numbers: write \"between\"",
                    0,
                    1,
                    "table-unclear");
        }
        DimensionReading.Outcome wanted =
                between ? new DimensionReading.Quantity(unitOf(first).dimension()) : new DimensionReading.Words();
        if (!keyOutcome.equals(wanted)) {
            throw new FormulaException(
                    between
                            ? key + " is not " + unitOf(first).dimension() + ", as the first column of " + table.name()
                                    + " is"
                            : key + " does not hold words, as the first column of " + table.name() + " does",
                    0,
                    1,
                    "unlike-dimensions");
        }
        if (between) {
            checkRises(first);
        }
        draft.openTable = table;
        draft.openRow = row();
        draft.openShare = between ? share() : null;
        Formula column = new Formula.Symbol(name(table, first));
        if (between) {
            between(first, column);
        } else {
            line(row(), call(Function.MATCH, symbol(key), column), "row in the table: " + table.title(), Sign.POSITIVE);
        }
    }

    /** Only in a rising column, in two rows or more, is there a row below and a row above. */
    private void checkRises(CitedTable.Column first) {
        double last = Double.NEGATIVE_INFINITY;
        for (Value value : first.values()) {
            if (!(value instanceof Value.Number number) || number.value() <= last) {
                throw new FormulaException(
                        "the first column of " + table.name() + " must rise from row to row, without blanks",
                        0,
                        1,
                        "table-not-rising");
            }
            last = number.value();
        }
        if (first.values().size() < 2) {
            throw new FormulaException(
                    "the table " + table.name() + " has one row; two are needed", 0, 1, "table-not-rising");
        }
    }

    private void between(CitedTable.Column first, Formula column) {
        Unit unit = unitOf(first);
        Formula keyNumber = unit.text().equals("1")
                ? symbol(key)
                : new Formula.Operation(Operator.OVER, symbol(key), new Formula.Quantity(1, "1", unit));
        Formula last = call(Function.INDEX, column, number(table.rows()));
        Formula start = call(Function.INDEX, column, number(1));
        String inside = "x_" + suffix();
        line(
                inside,
                call(Function.MIN, call(Function.MAX, keyNumber, start), last),
                keyLabel() + " as looked up, not beyond the ends of the table: " + table.title(),
                first.sign());
        line(
                row(),
                call(Function.MIN, call(Function.MATCH_BELOW, symbol(inside), column), number(table.rows() - 1)),
                "row below it in the table: " + table.title(),
                Sign.POSITIVE);
        Formula below = call(Function.INDEX, column, symbol(row()));
        Formula next = call(Function.INDEX, column, plus(symbol(row()), number(1)));
        String step = "d_" + suffix();
        line(step, minus(next, below), "step of the table from this row to the next", Sign.POSITIVE);
        line(
                share(),
                new Formula.Operation(Operator.OVER, minus(symbol(inside), below), symbol(step)),
                "share of the way to the next row",
                Sign.ANY);
        Formula span = span(first);
        draft.limits.add(new Limit(
                start,
                keyNumber,
                false,
                span,
                null,
                keyLabel() + " is within the table, lower end: " + table.title(),
                source));
        draft.limits.add(new Limit(
                keyNumber,
                last,
                true,
                span,
                null,
                keyLabel() + " is within the table, upper end: " + table.title(),
                source));
    }

    /** What the margin to an end of the table is measured by: from its first row to its last. */
    private static Formula span(CitedTable.Column first) {
        double from = ((Value.Number) first.values().get(0)).value();
        double to = ((Value.Number) first.values().get(first.values().size() - 1)).value();
        String text = java.math.BigDecimal.valueOf(to)
                .subtract(java.math.BigDecimal.valueOf(from))
                .toPlainString();
        return new Formula.Numeral(Double.parseDouble(text), text);
    }

    /** Adds the line of one column of the table that was opened last. */
    static void column(
            SheetDraft draft, String symbol, String columnName, @Nullable Unit unit, String label, String source) {
        CitedTable table = draft.openTable;
        String row = draft.openRow;
        if (draft.openTableIsBroken) {
            throw new FormulaException(symbol, 0, 1, SheetDraft.FOLLOWS);
        }
        if (table == null || row == null) {
            throw new FormulaException("a column follows the table it is of", 0, 1, "table-missing");
        }
        CitedTable.Column column = table.column(columnName);
        if (column == null) {
            throw new FormulaException(
                    table.name() + ".csv has no column " + columnName + "; it has " + table.columnNames(),
                    0,
                    columnName.length(),
                    "column-unknown");
        }
        if (unit == null != column.isWords()) {
            throw new FormulaException(
                    "column " + columnName + (column.isWords() ? " holds words" : " holds numbers"),
                    0,
                    columnName.length(),
                    "unlike-dimensions");
        }
        if (unit != null && !unitOf(column).dimension().equals(unit.dimension())) {
            throw new FormulaException(
                    "column " + columnName + " is " + unitOf(column).dimension() + ", but " + unit + " is "
                            + unit.dimension(),
                    0,
                    columnName.length(),
                    "unlike-dimensions");
        }
        Formula run = new Formula.Symbol(name(table, column));
        Formula found = call(Function.INDEX, run, symbol(row));
        String share = draft.openShare;
        if (share != null) {
            Formula next = call(Function.INDEX, run, plus(symbol(row), number(1)));
            found = plus(found, new Formula.Operation(Operator.TIMES, symbol(share), minus(next, found)));
        }
        boolean blanks = !column.isWords() && column.hasBlanks();
        if (unit != null && !unitOf(column).text().equals("1")) {
            Formula size = new Formula.Operation(Operator.TIMES, found, new Formula.Quantity(1, "1", unitOf(column)));
            found = blanks
                    ? call(Function.IF, call(Function.IS_NUMBER, found), size, new Formula.NoResult(Value.NOT_GIVEN))
                    : size;
        }
        draft.add(new Item.Line(symbol, found, unit, label, source, column.isWords() ? null : column.sign(), blanks));
    }

    private void line(String symbol, Formula formula, String label, Sign sign) {
        if (!draft.knows(symbol)) {
            draft.define(symbol, new DimensionReading.Quantity(Dimension.NONE));
            draft.add(new Item.Line(symbol, formula, Unit.one(), label, source, sign, false));
        }
    }

    /** How formulas know a column. */
    static String name(CitedTable table, CitedTable.Column column) {
        return table.name() + "." + column.symbol();
    }

    private static DimensionReading.Outcome outcome(CitedTable.Column column) {
        return column.isWords() ? new DimensionReading.Words() : new DimensionReading.Quantity(Dimension.NONE);
    }

    private static Unit unitOf(CitedTable.Column column) {
        Unit unit = column.unit();
        return unit == null ? Unit.one() : unit;
    }

    private String keyLabel() {
        return draft.items.stream()
                .filter(item -> item.outputs().contains(key))
                .map(item -> item instanceof Item.Line line
                        ? line.label()
                        : item instanceof Item.Given given ? given.label() : key)
                .findFirst()
                .orElse(key);
    }

    /** T1 for the first look-up of the sheet, T2 for the second. */
    private String suffix() {
        return "T" + draft.lookUp(table.name(), key);
    }

    private String row() {
        return "i_" + suffix();
    }

    private String share() {
        return "t_" + suffix();
    }

    private static Formula call(Function function, Formula... arguments) {
        return new Formula.Call(function, List.of(arguments));
    }

    private static Formula symbol(String name) {
        return new Formula.Symbol(name);
    }

    private static Formula number(int value) {
        return new Formula.Numeral(value, Integer.toString(value));
    }

    private static Formula plus(Formula a, Formula b) {
        return new Formula.Operation(Operator.PLUS, a, b);
    }

    private static Formula minus(Formula a, Formula b) {
        return new Formula.Operation(Operator.MINUS, a, b);
    }
}
