package nappe.method;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.formula.DimensionReading;
import nappe.formula.Formula;
import nappe.formula.FormulaException;
import nappe.source.CitedTable;
import nappe.source.Publication;
import nappe.source.TextFault;
import org.jspecify.annotations.Nullable;

/** A method sheet while it is being read: what is known so far, and the faults so far. */
final class SheetDraft {
    final List<TextFault> faults = new ArrayList<>();
    final List<String> about = new ArrayList<>();
    final List<String> cautions = new ArrayList<>();
    final Map<String, Publication> sources = new LinkedHashMap<>();
    final List<Item> items = new ArrayList<>();
    final List<Limit> limits = new ArrayList<>();
    final List<Geometry> geometry = new ArrayList<>();
    final List<Rating> ratings = new ArrayList<>();
    final Map<String, String> gives = new LinkedHashMap<>();
    final Map<String, CitedTable> tables = new LinkedHashMap<>();
    final Map<String, Set<String>> reach = new LinkedHashMap<>();
    final StringBuilder text = new StringBuilder();
    String title = "";

    /** Where an included text could not be had, what it would have defined is not known. */
    boolean lacksText;

    @Nullable
    CitedTable openTable;

    @Nullable
    String openRow;

    @Nullable
    String openShare;

    boolean openTableIsBroken;

    @Nullable
    Screen screen;

    private final Map<String, DimensionReading.Outcome> outcomes = new LinkedHashMap<>();
    private final Set<String> broken = new HashSet<>();
    private final Set<String> brokenTables = new HashSet<>();
    private final List<String> lookUps = new ArrayList<>();

    /** A fault that only follows from another; it is not reported. */
    static final String FOLLOWS = "follows";

    /** The outcome of a symbol that is defined above. */
    DimensionReading.Outcome outcome(String symbol) {
        DimensionReading.Outcome outcome = outcomes.get(symbol);
        if (outcome != null) {
            return outcome;
        }
        throw lacksText || broken.contains(symbol)
                ? new FormulaException(symbol, 0, 1, FOLLOWS)
                : new FormulaException(symbol + " is not defined above", 0, symbol.length(), "symbol-unknown");
    }

    boolean knows(String symbol) {
        return outcomes.containsKey(symbol);
    }

    /** Whether a symbol is typed once per case or comes from a neighbour. */
    boolean isTypedPerCase(String symbol) {
        return items.stream()
                .anyMatch(item -> item instanceof Item.Given given
                        && given.symbol().equals(symbol)
                        && (given.from() == Item.From.CASE || given.from() == Item.From.NEIGHBOUR));
    }

    /** Whether a symbol rests on what is typed once per case: what sums it up over the cases does not. */
    boolean isPerCase(String symbol) {
        return reach.getOrDefault(symbol, Set.of(symbol)).stream().anyMatch(this::isTypedPerCase);
    }

    /** The item that defines a symbol, or null. */
    @Nullable
    Item item(String symbol) {
        return items.stream()
                .filter(item -> item.outputs().contains(symbol))
                .findFirst()
                .orElse(null);
    }

    boolean isFree(String symbol) {
        return items.stream()
                .anyMatch(
                        item -> item instanceof Item.Free free && free.symbol().equals(symbol));
    }

    boolean isBrokenTable(String name) {
        return brokenTables.contains(name);
    }

    void markBrokenTable(String name) {
        brokenTables.add(name);
    }

    void markReadTable(String name) {
        brokenTables.remove(name);
    }

    /** The number of a look-up, from 1: the same table looked up by the same key is one look-up. */
    int lookUp(String table, String key) {
        String lookUp = table + " " + key;
        if (!lookUps.contains(lookUp)) {
            lookUps.add(lookUp);
        }
        return lookUps.indexOf(lookUp) + 1;
    }

    void markBroken(String symbol) {
        broken.add(symbol);
    }

    void define(String symbol, DimensionReading.Outcome outcome) {
        outcomes.put(symbol, outcome);
    }

    /** Adds an item whose outputs have been defined, and works out what they rest on. */
    void add(Item item) {
        items.add(item);
        Set<String> all = new LinkedHashSet<>();
        for (String symbol : Closure.restsOn(item)) {
            all.addAll(reach.getOrDefault(symbol, Set.of(symbol)));
        }
        if (item instanceof Item.Line line && line.formula() instanceof Formula.Summary) {
            all.removeIf(this::isPerCase);
        }
        String bound = bound(item);
        if (bound != null) {
            all.remove(bound);
        }
        for (String output : item.outputs()) {
            Set<String> own = new LinkedHashSet<>(all);
            own.add(output);
            reach.put(output, own);
        }
    }

    private static @Nullable String bound(Item item) {
        return item instanceof Item.At at ? at.free() : item instanceof Item.Root root ? root.free() : null;
    }

    MethodSheet finish(String name, String house) {
        return new MethodSheet(
                name,
                house,
                title,
                List.copyOf(about),
                List.copyOf(cautions),
                List.copyOf(sources.values()),
                List.copyOf(items),
                List.copyOf(limits),
                List.copyOf(geometry),
                List.copyOf(ratings),
                screen,
                Map.copyOf(gives),
                new LinkedHashMap<>(tables),
                new LinkedHashMap<>(reach),
                text.toString());
    }
}
