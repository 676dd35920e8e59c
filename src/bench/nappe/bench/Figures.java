package nappe.bench;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** Figures of several rounds by name, printed as median, least and greatest. */
final class Figures {
    private final Map<String, List<Double>> all = new LinkedHashMap<>();

    void add(String name, double figure) {
        all.computeIfAbsent(name, key -> new ArrayList<>()).add(figure);
    }

    /** The ratio of two figures, round by round, so that a drift of the machine does not count. */
    void addRatio(String name, String above, String below) {
        List<Double> a = all.get(above);
        List<Double> b = all.get(below);
        for (int i = 0; i < Math.min(a.size(), b.size()); i++) {
            add(name, a.get(i) / b.get(i));
        }
    }

    /** The sum of two figures, round by round. */
    void addSum(String name, String one, String other) {
        List<Double> a = all.get(one);
        List<Double> b = all.get(other);
        for (int i = 0; i < Math.min(a.size(), b.size()); i++) {
            add(name, a.get(i) + b.get(i));
        }
    }

    boolean has(String name) {
        return all.containsKey(name);
    }

    void print() {
        System.out.printf(Locale.ROOT, "  %-58s %8s %8s %8s%n", "", "median", "least", "most");
        all.forEach((name, figures) -> {
            List<Double> sorted = figures.stream().sorted().toList();
            int n = sorted.size();
            double median = (sorted.get((n - 1) / 2) + sorted.get(n / 2)) / 2;
            System.out.printf(
                    Locale.ROOT, "  %-58s %8.2f %8.2f %8.2f%n", name, median, sorted.get(0), sorted.get(n - 1));
        });
    }
}
