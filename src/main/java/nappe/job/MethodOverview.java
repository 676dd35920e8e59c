package nappe.job;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import nappe.formula.Formula;
import nappe.formula.PlainReading;
import nappe.method.Item;
import nappe.method.Limit;
import nappe.method.MethodException;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.method.Statement;
import nappe.source.Publication;
import org.jspecify.annotations.Nullable;

/**
 * What one looks at to choose a method: what it is, on which publications it rests, where it holds, and what speaks for it.
 *
 * @param standards publications that its lines and limits cite
 * @param ranges what the sheet says with {@code range}; else the limits that have a number for a bound
 * @param state its check values by kind
 */
public record MethodOverview(String name, String title, List<String> standards, List<String> ranges, String state) {
    private static final Set<String> CITING = Set.of("line", "root", "limit", "table", "column");
    private static final List<String> KINDS = List.of("published", "library", "derived", "memory");

    /** @param checks check values, of this method and of others */
    public static MethodOverview of(MethodLibrary methods, String name, List<CheckRow> checks) {
        MethodSheet sheet;
        try {
            sheet = methods.sheet(name);
        } catch (MethodException e) {
            return new MethodOverview(
                    name, methods.title(name), List.of(), List.of(), "cannot be used: its text has faults");
        }
        int off = CheckRow.knownToBeOff(methods.library(), name).size();
        List<CheckRow> own =
                checks.stream().filter(row -> row.method().equals(name)).toList();
        return new MethodOverview(name, sheet.title(), standards(sheet), ranges(sheet), state(own, off));
    }

    /** A publication that only a constant rests on, such as the one of standard gravity, is no standard of the device. */
    private static List<String> standards(MethodSheet sheet) {
        return sheet.sources().stream()
                .filter(source -> isCited(sheet, source))
                .map(source -> source.text() + (source.memory() ? " (from memory)" : ""))
                .toList();
    }

    private static boolean isCited(MethodSheet sheet, Publication source) {
        return Statement.of(sheet.name(), sheet.text()).stream()
                .filter(statement -> CITING.contains(statement.word()))
                .anyMatch(statement ->
                        Arrays.asList(statement.rest().split("[^A-Za-z0-9_]+")).contains(source.key()));
    }

    private static List<String> ranges(MethodSheet sheet) {
        List<String> said = Statement.of(sheet.name(), sheet.text()).stream()
                .filter(statement -> statement.word().equals("range"))
                .map(Statement::rest)
                .toList();
        if (!said.isEmpty()) {
            return said;
        }
        Map<String, String> ranges = new LinkedHashMap<>();
        for (Limit limit : sheet.limits()) {
            String bound = number(sheet, limit.bound());
            if (bound != null && limit.kind() != Limit.Kind.THRESHOLD && !isAboutAReading(limit)) {
                String side = (limit.valueIsLesser() ? " up to " : " from ") + bound;
                String label = limit.label().replaceAll(", (lower|upper) end$", "");
                ranges.merge(label + " (" + PlainReading.of(limit.value()), side, (from, to) -> from + to);
            }
        }
        return ranges.entrySet().stream()
                .map(range -> range.getKey() + range.getValue() + ")")
                .toList();
    }

    /** A limit that applies only where something optional was typed, such as a head read: it says again what another says. */
    private static boolean isAboutAReading(Limit limit) {
        return limit.when() != null && PlainReading.of(limit.when()).contains("given(");
    }

    /** A bound that is a number or a cited constant, with its unit; null for one that follows from the entries. */
    private static @Nullable String number(MethodSheet sheet, Formula bound) {
        if (bound instanceof Formula.Numeral || bound instanceof Formula.Quantity) {
            return PlainReading.of(bound);
        }
        return bound instanceof Formula.Symbol symbol && sheet.item(symbol.name()) instanceof Item.Constant constant
                ? PlainReading.of(new Formula.Quantity(constant.value(), constant.digits(), constant.unit()))
                : null;
    }

    private static String state(List<CheckRow> own, int off) {
        if (own.isEmpty()) {
            return "UNVERIFIED: no check values";
        }
        Map<String, Integer> counts = new TreeMap<>();
        own.forEach(row -> counts.merge(row.kind(), 1, Integer::sum));
        List<String> words = KINDS.stream()
                .filter(counts::containsKey)
                .map(kind -> counts.get(kind) + " " + (kind.equals("memory") ? "from memory" : kind))
                .toList();
        String house = own.get(0).house().isEmpty() ? "" : " of the house";
        return own.size() + (own.size() == 1 ? " check value" : " check values") + house + ": "
                + String.join(", ", words) + (off == 0 ? "" : "; " + off + " more known to be off");
    }
}
