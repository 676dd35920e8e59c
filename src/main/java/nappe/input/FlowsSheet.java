package nappe.input;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.input.ProjectSheet.Named;
import nappe.input.TypedReader.Backing;
import nappe.method.Declared;
import nappe.method.MethodCatalogue;
import nappe.station.Design.FlowCase;
import nappe.station.Design.Typed;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;

/** Reads the flow cases, with what single elements ask for in each of them. */
final class FlowsSheet {
    static final int LONGEST_CASE = 40;
    static final int MOST_UNITS = 50;
    private static final List<String> PREFILLED = List.of("Flow unit", "Water level unit");

    private final RawSheet sheet;
    private final Entries entries;
    private final Faults faults;
    private final TypedReader typedReader;
    private final Quantities quantities;
    private final Unit flow;
    private final Unit level;
    private final Map<String, Declared> perCase = new LinkedHashMap<>();

    FlowsSheet(RawSheet sheet, WorkingSystem system, Entries entries, Faults faults) {
        this.sheet = sheet;
        this.entries = entries;
        this.faults = faults;
        this.typedReader = new TypedReader(entries);
        this.quantities = new Quantities(entries);
        this.flow = system.coherentUnit(Dimension.FLOW);
        this.level = system.coherentUnit(Dimension.LENGTH);
    }

    List<FlowCase> cases(List<Named> elements, MethodCatalogue methods) {
        for (Named element : elements) {
            for (Declared declared : methods.declared(element.method())) {
                if (declared.kind() == Declared.Kind.CASE) {
                    perCase.put(element.tag() + "." + declared.symbol(), declared);
                }
            }
        }
        List<FlowCase> cases = new ArrayList<>();
        Table table = Table.find(sheet, heads(perCase.keySet().stream()), Layout.FLOW_OPTIONAL, faults);
        if (table == null) {
            return cases;
        }
        List<String> prefilled = new ArrayList<>(PREFILLED);
        perCase.keySet().forEach(key -> prefilled.add(key + Layout.UNIT_OF));
        refuseUnknownHeads(table, elements);
        Map<String, String> names = new LinkedHashMap<>();
        for (Table.Row row : table.rows(prefilled, faults)) {
            FlowCase flowCase = flowCase(row);
            String key = Entries.key(flowCase.name());
            String cell = row.field("Case").address();
            String before = flowCase.name().isEmpty() ? null : names.putIfAbsent(key, cell);
            if (before != null) {
                entries.fault(
                        row.field("Case"),
                        "case-twice",
                        Shown.quoted(flowCase.name()) + " is the name of the case in " + before
                                + " too; give each case its own");
            }
            cases.add(flowCase);
        }
        if (cases.isEmpty()) {
            faults.add(
                    sheet.name(),
                    null,
                    "cases-missing",
                    "there is no flow case; write name, flow and unit of at least one below the head row");
        }
        return cases;
    }

    /** The head words, with a column for the value and one for the unit of each quantity of the elements. */
    static List<String> heads(Stream<String> perCase) {
        List<String> heads = new ArrayList<>(Layout.FLOW_HEADS);
        perCase.forEach(key -> {
            heads.add(key);
            heads.add(key + Layout.UNIT_OF);
        });
        return heads;
    }

    private void refuseUnknownHeads(Table table, List<Named> elements) {
        for (RawCell cell : table.headCells()) {
            String text = cell.text().strip();
            int point = text.indexOf('.');
            String tag = text.substring(0, Math.max(0, point));
            boolean ours = elements.stream().anyMatch(e -> e.tag().equals(tag));
            if (ours && perCase.keySet().stream().noneMatch(k -> text.equals(k) || text.equals(k + Layout.UNIT_OF))) {
                faults.add(
                        sheet.name(),
                        cell.address(),
                        "symbol-unknown",
                        Shown.quoted(text)
                                + " is not asked for in each case; remove the column"
                                + Near.question(text, perCase.keySet()));
            }
        }
    }

    private FlowCase flowCase(Table.Row row) {
        Backing backing = typedReader.backing(row.field("Source or basis"), row.field("Standing"), true);
        Map<String, Typed> typed = new LinkedHashMap<>();
        perCase.forEach((key, declared) -> typed.put(
                key,
                typedReader.typed(named(key, declared), row.field(key), row.field(key + Layout.UNIT_OF), backing)));
        return new FlowCase(
                entries.requiredText(row.field("Case"), "the name of the case", LONGEST_CASE),
                entries.text(row.field("Averaging period"), "the averaging period", Entries.LONGEST_NAME),
                entries.text(row.field("Design year"), "the design year", Entries.LONGEST_NAME),
                typedReader.quantity(
                        "the flow", flow, Sign.POSITIVE, false, row.field("Flow"), row.field("Flow unit"), backing),
                units(row.field(Layout.UNITS), backing),
                typedReader.quantity(
                        "the water level downstream",
                        level,
                        Sign.ANY,
                        true,
                        row.field("Water level downstream"),
                        row.field("Water level unit"),
                        backing),
                entries.text(row.field("Return period of the level"), "the return period", Entries.LONGEST_NAME),
                typed);
    }

    /** How many like units share the flow; blank for one. */
    private Typed units(Field field, Backing backing) {
        String what = "the number of units in service";
        Value value = quantities.number(field, what, Sign.ANY);
        if (value instanceof Value.Number number && !isCount(number.value())) {
            entries.fault(
                    field,
                    "count-expected",
                    Plain.number(number.value()) + " can't be " + what + "; write a whole number from 1 to "
                            + MOST_UNITS + ", or leave it blank for one");
        }
        return new Typed(value, Unit.one(), backing.source(), backing.standing(), field.origin());
    }

    private static boolean isCount(double number) {
        return number == Math.rint(number) && number >= 1 && number <= MOST_UNITS;
    }

    private static Declared named(String key, Declared declared) {
        return new Declared(
                declared.kind(),
                key,
                declared.unit(),
                declared.label(),
                declared.sign(),
                declared.optional(),
                declared.words());
    }
}
