package nappe.input;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.input.ProjectSheet.Named;
import nappe.input.TypedReader.Backing;
import nappe.method.Declared;
import nappe.station.Design.Element;
import nappe.station.Design.Typed;

/** Reads the sheet of one element. */
final class ElementSheet {
    private final RawSheet sheet;
    private final Entries entries;
    private final Faults faults;
    private final TypedReader typedReader;

    ElementSheet(RawSheet sheet, Entries entries, Faults faults) {
        this.sheet = sheet;
        this.entries = entries;
        this.faults = faults;
        this.typedReader = new TypedReader(entries);
    }

    /** The element with all that its method declares once, in the order of the method; blanks included. */
    Element element(Named named, List<Declared> declared) {
        Map<String, Typed> typed = new LinkedHashMap<>();
        Table table = Table.find(sheet, Layout.ENTRY_HEADS, faults);
        if (table != null) {
            List<Declared> asked = declared.stream()
                    .filter(d -> d.kind() != Declared.Kind.CASE)
                    .toList();
            Map<String, Table.Row> strangers = new LinkedHashMap<>();
            Map<String, Table.Row> rows = rows(table, asked, strangers);
            List<Declared> missing =
                    asked.stream().filter(d -> !rows.containsKey(d.symbol())).toList();
            strangers.forEach((symbol, row) -> refuseStranger(symbol, row, named.method(), declared, missing));
            if (missing.size() > strangers.size()) {
                missing.forEach(this::refuseMissing);
            }
            for (Declared one : asked) {
                Table.Row row = rows.get(one.symbol());
                if (row != null) {
                    typed.put(one.symbol(), typed(one, row));
                }
            }
        }
        return new Element(named.tag(), named.title(), named.method(), typed);
    }

    private Typed typed(Declared declared, Table.Row row) {
        Field value = row.field("Value");
        Backing backing = typedReader.backing(row.field("Source or basis"), row.field("Standing"), !value.isBlank());
        return typedReader.typed(declared, value, row.field("Unit"), backing);
    }

    /** Rows by the symbols that are asked for; those with other symbols go to the strangers. */
    private Map<String, Table.Row> rows(Table table, List<Declared> asked, Map<String, Table.Row> strangers) {
        Map<String, Table.Row> rows = new LinkedHashMap<>();
        List<String> symbols = asked.stream().map(Declared::symbol).toList();
        for (Table.Row row : table.rows(List.of("Description", "Unit"), faults)) {
            Field field = row.field("Symbol");
            String symbol = entries.requiredText(field, "the symbol", Entries.LONGEST_NAME);
            Map<String, Table.Row> side = symbols.contains(symbol) ? rows : strangers;
            if (!symbol.isEmpty() && side.putIfAbsent(symbol, row) != null) {
                entries.fault(field, "symbol-twice", symbol + " stands here a second time; keep one row for it");
            }
        }
        return rows;
    }

    private void refuseStranger(
            String symbol, Table.Row row, String method, List<Declared> declared, List<Declared> missing) {
        Field field = row.field("Symbol");
        boolean perCase = declared.stream()
                .anyMatch(d -> d.kind() == Declared.Kind.CASE && d.symbol().equals(symbol));
        if (perCase) {
            entries.fault(field, "symbol-per-case", symbol + " is typed for each case on the sheet Flows, not here");
            return;
        }
        String near =
                Near.question(symbol, missing.stream().map(Declared::symbol).toList());
        List<String> all = declared.stream()
                .filter(d -> d.kind() != Declared.Kind.CASE)
                .map(Declared::symbol)
                .toList();
        entries.fault(
                field,
                "symbol-unknown",
                Shown.quoted(symbol) + " is not asked for by the method " + method
                        + (near.isEmpty() ? "; it asks for " + String.join(", ", all) : near));
    }

    private void refuseMissing(Declared declared) {
        faults.add(
                sheet.name(),
                null,
                "row-missing",
                "there is no row for " + declared.symbol() + " ("
                        + declared.label() + "); write that symbol in the column Symbol"
                        + (declared.optional() ? " and leave its value blank" : ", and its value"));
    }
}
