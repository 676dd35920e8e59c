package nappe.job;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.formula.Value;
import nappe.station.Design;
import nappe.station.FoundCase.Condition;
import nappe.unit.WorkingSystem;

/**
 * What is held while the flow varies: each distinct water level and number of units in service of the typed cases, and
 * the tailwater curve where there is one. Between cases no other level exists.
 */
final class FlowConditions {
    private final List<Condition> conditions = new ArrayList<>();
    private final List<List<String>> names = new ArrayList<>();
    private final List<Double> flows = new ArrayList<>();
    private boolean unitsDiffer;
    private double mostUnits = 1;

    private FlowConditions() {}

    static FlowConditions of(Design design) {
        FlowConditions all = new FlowConditions();
        WorkingSystem system = design.project().system();
        Map<List<Object>, Integer> known = new LinkedHashMap<>();
        Map<Object, Integer> units = new LinkedHashMap<>();
        for (int c = 0; c < design.cases().size(); c++) {
            Design.FlowCase typed = design.cases().get(c);
            Object level = working(typed.tailwater(), system);
            Object inService = typed.units().value() instanceof Value.None
                    ? Value.of(1)
                    : typed.units().value();
            boolean ofTable = !design.levels().isEmpty() && level instanceof Value.None;
            all.add(known, ofTable ? Condition.TABLE : c, c, ofTable ? "table" : level, inService, typed.name());
            units.putIfAbsent(inService, c);
            if (working(typed.flow(), system) instanceof Value.Number flow && flow.value() > 0) {
                all.flows.add(flow.value());
            }
            if (inService instanceof Value.Number number) {
                all.mostUnits = Math.max(all.mostUnits, number.value());
            }
        }
        if (!design.levels().isEmpty()) {
            units.forEach((inService, c) -> all.add(
                    known,
                    Condition.TABLE,
                    c,
                    "table",
                    inService,
                    design.cases().get(c).name()));
        }
        all.unitsDiffer = units.size() > 1;
        return all;
    }

    /** As the cells convert it: two levels typed in two units are one level where they come out alike. */
    private static Value working(Design.Typed typed, WorkingSystem system) {
        return typed.value() instanceof Value.Number number
                ? Value.of(number.value() * typed.unit().sizeIn(system)
                        + typed.unit().zeroIn(system))
                : typed.value();
    }

    private void add(
            Map<List<Object>, Integer> known, int levelOf, int unitsOf, Object level, Object inService, String name) {
        Integer at = known.putIfAbsent(List.of(level, inService), conditions.size());
        if (at == null) {
            conditions.add(new Condition(levelOf, unitsOf));
            names.add(new ArrayList<>(List.of(name)));
        } else if (!names.get(at).contains(name)) {
            names.get(at).add(name);
        }
    }

    List<Condition> all() {
        return conditions;
    }

    /** The typed flows above nought, in the working unit. */
    List<Double> flows() {
        return flows;
    }

    double mostUnits() {
        return mostUnits;
    }

    /** Some of the conditions in words, by the names of the cases that have them. */
    String words(List<Integer> some) {
        if (some.size() == conditions.size() && some.size() > 1) {
            return unitsDiffer ? "every level and number of units in service" : "every level of the cases";
        }
        List<String> levels = new ArrayList<>();
        List<String> table = new ArrayList<>();
        for (int k : some) {
            (conditions.get(k).levelOf() == Condition.TABLE ? table : levels).addAll(names.get(k));
        }
        List<String> words = new ArrayList<>();
        if (!levels.isEmpty()) {
            words.add((unitsDiffer ? "level and units of: " : "level of: ") + String.join("; ", levels));
        }
        if (!table.isEmpty()) {
            words.add("tailwater curve" + (unitsDiffer ? " with the units of: " + String.join("; ", table) : ""));
        }
        return String.join("; ", words);
    }
}
