package nappe.method;

import java.util.List;
import nappe.formula.DimensionReading;
import nappe.formula.Formula;
import nappe.formula.FormulaParser;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.source.CitedTable;
import nappe.source.TextLibrary;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/** The statements that read a cited table: choice, table and column. */
final class TableStatements {
    private final StatementParts parts;
    private final SheetDraft draft;
    private final TextLibrary library;

    TableStatements(StatementParts parts, TextLibrary library) {
        this.parts = parts;
        this.draft = parts.draft;
        this.library = library;
    }

    void choice() {
        FormulaParser parser = parts.parser(0);
        String symbol = parts.fresh(parser.name());
        String[] words = parts.text(0).split("\\s+");
        if (words.length != 3 || !words[1].equals("from")) {
            throw parts.fault("write: choice symbol from table ; label", "choice-unclear");
        }
        CitedTable table = tableNamed(words[2]);
        CitedTable.Column first = table.columns().get(0);
        if (!first.isWords()) {
            throw parts.fault("the first column of " + table.name() + " does not hold words", "choice-unclear");
        }
        parts.moveTo(0);
        List<String> keys = first.values().stream()
                .map(value -> ((Value.Word) value).text())
                .toList();
        draft.define(symbol, new DimensionReading.Words());
        draft.add(new Item.Given(
                Item.From.CHOICE, symbol, Unit.one(), parts.text(1), Sign.POSITIVE, false, "", keys, table.name()));
    }

    void table() {
        draft.openTable = null;
        draft.openTableIsBroken = true;
        parts.moveTo(0);
        String[] words = parts.text(0).split("\\s+");
        if (words.length != 3 || !(words[1].equals("by") || words[1].equals("between"))) {
            throw parts.fault("write: table name by choice, or: table name between number", "table-unclear");
        }
        CitedTable table = tableNamed(words[0]);
        String key = parts.symbolOf(words[2]);
        DimensionReading.Outcome outcome = draft.outcome(key);
        parts.hasValue(new Formula.Symbol(key));
        new TableLines(draft, table, key, parts.source(1)).open(words[1].equals("between"), outcome);
        draft.openTableIsBroken = false;
    }

    void column() {
        FormulaParser parser = parts.parser(0);
        String symbol = parts.fresh(parser.name());
        String column = parser.passes("=") ? parser.name() : parts.text(0).strip();
        parser.end();
        @Nullable Unit unit = parts.unitOrWords(1);
        TableLines.column(draft, symbol, column, unit, parts.text(2), parts.source(3));
        parts.defineOutcome(symbol, unit);
    }

    private CitedTable tableNamed(String name) {
        CitedTable known = draft.tables.get(name);
        if (known != null) {
            return known;
        }
        if (draft.isBrokenTable(name)) {
            throw parts.fault(name, SheetDraft.FOLLOWS);
        }
        draft.markBrokenTable(name);
        CitedTable table = CitedTable.from(library, name);
        if (table == null) {
            throw parts.fault("there is no table tables/" + name + ".csv", "table-missing");
        }
        draft.tables.put(name, table);
        draft.markReadTable(name);
        draft.text.append(library.text("tables/" + name + ".csv")).append('\n');
        return table;
    }
}
