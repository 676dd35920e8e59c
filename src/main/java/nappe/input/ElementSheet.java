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
            Map<String, Table.Row> rows = rows(table, named.method(), declared);
            for (Declared one : declared) {
                if (one.kind() != Declared.Kind.CASE) {
                    Table.Row row = rows.get(one.symbol());
                    if (row == null) {
                        faults.add(sheet.name(), null, "row-missing", "there is no row for " + one.symbol() + " ("
                                + one.label() + "); write that symbol in the column Symbol"
                                + (one.optional() ? " and leave its value blank" : ", and its value"));
                    } else {
                        typed.put(one.symbol(), typed(one, row));
                    }
                }
            }
        }
        return new Element(named.tag(), named.title(), named.method(), typed);
    }

    private Typed typed(Declared declared, Table.Row row) {
        Field value = row.field("Value");
        Backing backing =
                typedReader.backing(row.field("Source or basis"), row.field("Standing"), !value.isBlank());
        return typedReader.typed(declared, value, row.field("Unit"), backing);
    }

    private Map<String, Table.Row> rows(Table table, String method, List<Declared> declared) {
        Map<String, Table.Row> rows = new LinkedHashMap<>();
        List<String> asked = declared.stream()
                .filter(d -> d.kind() != Declared.Kind.CASE)
                .map(Declared::symbol)
                .toList();
        for (Table.Row row : table.rows(List.of("Description", "Unit"), faults)) {
            Field field = row.field("Symbol");
            String symbol = entries.requiredText(field, "the symbol", Entries.LONGEST_NAME);
            boolean perCase = declared.stream()
                    .anyMatch(d -> d.kind() == Declared.Kind.CASE && d.symbol().equals(symbol));
            if (perCase) {
                entries.fault(field, "symbol-per-case", symbol + " is typed for each case on the sheet Flows, not here");
            } else if (!symbol.isEmpty() && !asked.contains(symbol)) {
                entries.fault(field, "symbol-unknown", Shown.quoted(symbol) + " is not asked for by the method " + method
                        + question(symbol, asked));
            } else if (!symbol.isEmpty() && rows.putIfAbsent(symbol, row) != null) {
                entries.fault(field, "symbol-twice", symbol + " stands here a second time; keep one row for it");
            }
        }
        return rows;
    }

    private static String question(String symbol, List<String> asked) {
        String near = Near.question(symbol, asked);
        return near.isEmpty() ? "; it asks for " + String.join(", ", asked) : near;
    }
}
