package nappe.method;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.formula.Formula;
import nappe.formula.SymbolsReading;

/** The part of a calculation between a varied symbol and its targets: what a grid lays out once per variant. */
final class Closure {
    private Closure() {}

    /**
     * @param reach for each symbol, itself and all it rests on
     * @return the items that rest on the varied symbol and on which the targets rest, in order
     */
    static List<Item> of(List<Item> items, Map<String, Set<String>> reach, String varied, Set<String> targets) {
        Set<String> needed = new HashSet<>(targets);
        List<Item> closure = new ArrayList<>();
        for (int i = items.size() - 1; i >= 0; i--) {
            Item item = items.get(i);
            boolean wanted = item.outputs().stream()
                    .anyMatch(s -> needed.contains(s)
                            && !s.equals(varied)
                            && reach.getOrDefault(s, Set.of()).contains(varied));
            if (wanted) {
                closure.add(item);
                needed.addAll(restsOn(item));
            }
        }
        Collections.reverse(closure);
        return List.copyOf(closure);
    }

    /** The symbols that must stand before an item, with those of its members; what it binds is not among them. */
    static Set<String> restsOn(Item item) {
        Set<String> symbols = new LinkedHashSet<>();
        if (item instanceof Item.Line line) {
            add(symbols, line.formula());
        } else if (item instanceof Item.At at) {
            members(symbols, at.members(), at.free());
            add(symbols, at.value());
        } else if (item instanceof Item.Root root) {
            add(symbols, root.left());
            add(symbols, root.right());
            Set<String> inside = new HashSet<>();
            root.members().forEach(member -> inside.addAll(member.outputs()));
            symbols.removeAll(inside);
            members(symbols, root.members(), root.free());
            symbols.remove(root.free());
            add(symbols, root.from());
            add(symbols, root.to());
            if (root.below() != null) {
                add(symbols, root.below());
            }
            if (root.above() != null) {
                add(symbols, root.above());
            }
        }
        return symbols;
    }

    private static void members(Set<String> symbols, List<Item> members, String bound) {
        Set<String> inside = new HashSet<>();
        members.forEach(member -> inside.addAll(member.outputs()));
        for (Item member : members) {
            symbols.addAll(restsOn(member));
        }
        symbols.removeAll(inside);
        symbols.remove(bound);
    }

    private static void add(Set<String> symbols, Formula formula) {
        symbols.addAll(SymbolsReading.of(formula));
    }
}
