package nappe.input;

import java.util.ArrayList;
import java.util.List;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.input.TypedReader.Backing;
import nappe.station.Design.LevelPair;
import nappe.station.Design.Typed;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;

/** Reads the tailwater curve: the water level downstream at some flows of the whole station. */
final class LevelsSheet {
    /** Two sizes closer than this part of either are one: the same flow in two units differs in its last digit. */
    private static final double SAME = 1e-9;

    private final RawSheet sheet;
    private final WorkingSystem system;
    private final Entries entries;
    private final Faults faults;
    private final TypedReader typedReader;

    LevelsSheet(RawSheet sheet, WorkingSystem system, Entries entries, Faults faults) {
        this.sheet = sheet;
        this.system = system;
        this.entries = entries;
        this.faults = faults;
        this.typedReader = new TypedReader(entries);
    }

    /** The pairs, from the least flow up; none, or two and more. */
    List<LevelPair> pairs() {
        List<LevelPair> pairs = new ArrayList<>();
        Table table = Table.find(sheet, Layout.LEVEL_HEADS, faults);
        if (table == null) {
            return pairs;
        }
        int before = faults.count();
        List<Table.Row> rows = table.rows(List.of("Flow unit", "Water level unit"), faults);
        rows.forEach(row -> pairs.add(pair(row)));
        if (faults.count() > before) {
            return pairs; // an order of numbers that are wrong says nothing
        }
        if (rows.size() == 1) {
            entries.fault(
                    rows.get(0).field("Flow"),
                    "curve-too-short",
                    "the tailwater curve has one row, and no level lies between rows; write a second row, or take this "
                            + "one away");
        }
        for (int i = 1; i < pairs.size(); i++) {
            checkOrder(rows.get(i), rows.get(i - 1), pairs.get(i), pairs.get(i - 1));
        }
        return pairs;
    }

    private LevelPair pair(Table.Row row) {
        Backing backing = typedReader.backing(row.field("Source or basis"), row.field("Standing"), true);
        return new LevelPair(
                typedReader.quantity(
                        "the flow",
                        unit(Dimension.FLOW),
                        Sign.NOT_NEGATIVE,
                        false,
                        row.field("Flow"),
                        row.field("Flow unit"),
                        backing),
                typedReader.quantity(
                        "the water level",
                        unit(Dimension.LENGTH),
                        Sign.ANY,
                        false,
                        row.field("Water level"),
                        row.field("Water level unit"),
                        backing));
    }

    private Unit unit(Dimension dimension) {
        return system.coherentUnit(dimension);
    }

    private void checkOrder(Table.Row row, Table.Row above, LevelPair pair, LevelPair before) {
        if (size(pair.flow()) <= size(before.flow()) * (1 + SAME)) {
            entries.fault(
                    row.field("Flow"),
                    "curve-not-rising",
                    shown(pair.flow()) + " is not above the " + shown(before.flow()) + " in "
                            + above.field("Flow").address() + "; write the flows rising from row to row");
        }
        if (size(pair.level()) < size(before.level()) - SAME * Math.abs(size(before.level()))) {
            entries.fault(
                    row.field("Water level"),
                    "curve-falling",
                    shown(pair.level()) + " is below the " + shown(before.level()) + " in "
                            + above.field("Water level").address()
                            + "; the water stands no lower at a greater flow, so check both rows");
        }
    }

    private double size(Typed typed) {
        return number(typed) * typed.unit().sizeIn(system);
    }

    private static double number(Typed typed) {
        return typed.value() instanceof Value.Number number ? number.value() : Double.NaN;
    }

    private static String shown(Typed typed) {
        return Plain.number(number(typed)) + " " + typed.unit();
    }
}
