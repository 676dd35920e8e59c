package nappe.job;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;

/**
 * A check value beside what the method gives.
 *
 * @param computed in the unit of the row; not a number where the method gives none
 * @param words what stands in place of the number, where there is none
 */
public record CheckOutcome(CheckRow row, double computed, String words) {
    public boolean met() {
        return Math.abs(computed - row.expected()) <= row.slack();
    }

    /** The difference relative to the expected value, or absolute where that is zero. */
    public String difference() {
        if (!words.isEmpty()) {
            return "-";
        }
        double difference = computed - row.expected();
        return row.expected() == 0
                ? String.format(Locale.ROOT, "%+.3g", difference)
                : String.format(Locale.ROOT, "%+.4f %%", 100 * difference / row.expected());
    }

    /** The computed value to six figures, or the words in its place. */
    public String shown() {
        return words.isEmpty() ? String.format(Locale.ROOT, "%.6g", computed) : words;
    }

    /** As a row of the software statement. */
    List<String> printed() {
        String unit = row.unit().text().equals("1") ? "" : " " + row.unit();
        return List.of(
                row.id() + "  " + row.method() + ": " + row.entriesText(),
                row.source() + " (" + row.standing() + ")",
                row.target(),
                shown() + (words.isEmpty() ? unit : ""),
                nappe.results.Digits.asTyped(row.expected()) + unit,
                row.tolerance(),
                met() ? "met" : "NOT MET");
    }

    /** Counts by method and kind: method, kind, rows, met. */
    public static List<List<String>> counts(List<CheckOutcome> outcomes) {
        Map<String, int[]> counts = new TreeMap<>();
        for (CheckOutcome outcome : outcomes) {
            int[] count = counts.computeIfAbsent(
                    outcome.row().method() + "\t" + outcome.row().standing(), k -> new int[2]);
            count[0]++;
            count[1] += outcome.met() ? 1 : 0;
        }
        List<List<String>> rows = new ArrayList<>();
        new LinkedHashMap<>(counts).forEach((key, count) -> {
            String[] parts = key.split("\t");
            rows.add(List.of(parts[0], parts[1], Integer.toString(count[0]), Integer.toString(count[1])));
        });
        return rows;
    }
}
