package nappe.proof;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.calculation.Cell;
import nappe.formula.Value;
import nappe.results.Results;

/**
 * Two workbooks compared cell by cell, by address: every number, every word, every text. Numbers agree within 1e-9 of
 * the larger one or within the floor of their unit.
 *
 * <p>The floor of a unit is 1e-12 of the largest number in that unit in the package. A difference such as a drop from a
 * crest to a tailwater, or what a trial of a root leaves, is only as exact as its largest term: LibreOffice hands on 15
 * digits and takes nearly equal terms as equal, Gnumeric computes with longer numbers than Java, so the terms differ by
 * up to 5e-15 of their size. The largest number in the unit bounds the largest term, and 1e-12 leaves room for a chain of
 * some hundred operations. For an elevation of 414 ft it is 4e-10 ft. A figure's list of dimensions repeats cells; the floor
 * there is 1e-12 of one.
 */
final class Comparison {
    static final double RELATIVE = 1e-9;
    static final double FLOOR = 1e-12;

    private static final Pattern FINGERPRINT = Pattern.compile("Input fingerprint [0-9a-f ]{19}\\.");

    private final Results results;
    private final Map<String, Double> floors = new HashMap<>();
    private final List<String> faults = new ArrayList<>();
    private double worst;
    private double inFloors;
    private int numbers;
    private int words;

    private Comparison(Results results) {
        this.results = results;
    }

    /**
     * @param there the values of a program, by {@code "Sheet!A1"}
     * @param here the values expected
     * @param results whose cells say the unit of an address
     */
    static Comparison of(Map<String, Object> there, Map<String, Object> here, Results results) {
        Comparison comparison = new Comparison(results);
        comparison.floors();
        TreeSet<String> all = new TreeSet<>(here.keySet());
        all.addAll(there.keySet());
        all.forEach(address -> comparison.compare(address, here.get(address), there.get(address)));
        return comparison;
    }

    /** Where the two part, in words. */
    List<String> faults() {
        return faults;
    }

    int cells() {
        return numbers + words;
    }

    @Override
    public String toString() {
        return String.format(
                Locale.ROOT,
                "%d numbers and %d words, %d disagree; worst %.1e of the number, %.1e of the floor of its unit",
                numbers,
                words,
                faults.size(),
                worst,
                inFloors);
    }

    private void floors() {
        Map<String, Double> largest = new LinkedHashMap<>();
        for (Cell cell : results.cells()) {
            if (results.value(cell) instanceof Value.Number number) {
                largest.merge(cell.unit().text(), Math.abs(number.value()), Math::max);
            }
        }
        for (Cell cell : results.cells()) {
            floors.put(
                    cell.place().sheet() + "!" + cell.place().address(),
                    FLOOR * largest.getOrDefault(cell.unit().text(), 0.0));
        }
    }

    private void compare(String address, Object here, Object there) {
        if (here instanceof Double a && there instanceof Double b) {
            numbers++;
            double apart = Math.abs(a - b);
            double floor = floors.getOrDefault(address, FLOOR);
            double size = Math.max(Math.abs(a), Math.abs(b));
            double share = apart == 0 ? 0 : apart / size;
            inFloors = Math.max(inFloors, apart == 0 || floor == 0 ? 0 : apart / floor);
            if (size > floor / RELATIVE) {
                worst = Math.max(worst, share);
            }
            if (!(share <= RELATIVE || apart <= floor)) {
                faults.add(address + ": " + a + " here, " + b + " there");
            }
            return;
        }
        words++;
        if (!text(here).equals(text(there))) {
            faults.add(address + ": " + shown(here) + " here, " + shown(there) + " there");
        }
    }

    /** A text; the fingerprint is the input's own, and another input has another. */
    private static Object text(Object value) {
        if (value instanceof String text) {
            Matcher matcher = FINGERPRINT.matcher(text);
            return matcher.replaceAll("Input fingerprint.");
        }
        return value == null ? "" : value;
    }

    private static String shown(Object value) {
        return value == null ? "nothing" : value instanceof String text ? "\"" + text + "\"" : value.toString();
    }
}
