package nappe.calculation;

import java.util.List;

/**
 * The columns of a calculation, one per case: first those that are judged, among them first those that are printed; then
 * those laid for what they show (combinations that cannot coincide, flows found by a search), which no summary counts.
 *
 * @param names heads of the columns, each its own
 * @param printed how many from the left are printed in the PDF too
 * @param judged how many from the left count in summaries, and in the highest and lowest over the cases
 */
public record CaseColumns(List<String> names, int printed, int judged) {
    public CaseColumns {
        names = List.copyOf(names);
        if (printed > judged || judged > names.size()) {
            throw new IllegalArgumentException("printed columns are judged, and judged ones are there");
        }
    }

    /** Columns that are all printed and judged. */
    public static CaseColumns of(List<String> names) {
        return new CaseColumns(names, names.size(), names.size());
    }

    public int count() {
        return names.size();
    }

    /** The names of the judged columns. */
    public List<String> judgedNames() {
        return names.subList(0, judged);
    }
}
