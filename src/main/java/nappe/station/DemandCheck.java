package nappe.station;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/** Checks that each demand names a result of its element, in a unit that fits. */
final class DemandCheck {
    private DemandCheck() {}

    static List<DesignFault> faults(Design design, Map<String, MethodSheet> methods) {
        List<DesignFault> faults = new ArrayList<>();
        for (Design.Demand demand : design.demands()) {
            Design.Element element = design.element(demand.tag());
            MethodSheet method = element == null ? null : methods.get(element.tag());
            if (method == null) {
                continue;
            }
            Unit unit = unit(method, demand.symbol());
            if (unit == null) {
                faults.add(new DesignFault(
                        demand.symbolAt(),
                        "\"" + demand.symbol() + "\" is not a result of " + demand.tag() + "; "
                                + remedy(method, demand.symbol()),
                        "symbol-unknown"));
            } else if (!unit.dimension().equals(demand.value().unit().dimension())) {
                faults.add(new DesignFault(
                        demand.unitAt(),
                        demand.symbol() + " is measured in " + unit + ", and "
                                + demand.value().unit()
                                + " does not measure the same ("
                                + demand.value().unit().dimension() + " against "
                                + unit.dimension() + "); write a unit such as " + unit,
                        "unit-dimension"));
            }
        }
        return faults;
    }

    /** The result that was meant, where only its stroke is missing, as the package prints it; else all there are. */
    private static String remedy(MethodSheet method, String typed) {
        List<String> results = results(method);
        return results.stream()
                .filter(symbol -> symbol.replace("_", "").equals(typed.replace("_", "")))
                .findFirst()
                .map(symbol -> "did you mean " + symbol + label(method, symbol) + "?")
                .orElseGet(() -> "it has "
                        + results.stream()
                                .map(symbol -> symbol + label(method, symbol))
                                .collect(Collectors.joining(", ")));
    }

    /** The results that a demand may name: those that stand in the case columns. */
    private static List<String> results(MethodSheet method) {
        return method.items().stream()
                .flatMap(item -> item.outputs().stream())
                .filter(symbol -> unit(method, symbol) != null && method.perCase(symbol))
                .toList();
    }

    private static String label(MethodSheet method, String symbol) {
        Item item = method.item(symbol);
        if (item instanceof Item.Line line) {
            return " (" + line.label() + ")";
        }
        if (item instanceof Item.Root root) {
            return " (" + root.label() + ")";
        }
        return item instanceof Item.Given given ? " (" + given.label() + ")" : "";
    }

    /** The unit of a result, through names that an {@code at} gave it; null where there is no such result. */
    private static @Nullable Unit unit(MethodSheet method, String symbol) {
        Item item = method.item(symbol);
        if (item == null || item instanceof Item.Free || method.isTemplate(symbol)) {
            return null;
        }
        if (item instanceof Item.Line line) {
            return line.unit();
        }
        if (item instanceof Item.Root root) {
            return root.unit();
        }
        if (item instanceof Item.At at) {
            Item member =
                    method.item(java.util.Objects.requireNonNull(at.results().get(symbol)));
            return member instanceof Item.Line line ? line.unit() : null;
        }
        return item instanceof Item.Given given && given.from() != Item.From.CHOICE ? given.unit() : null;
    }
}
