package nappe.station;

import java.util.List;

/**
 * What a rerun of the whole station with one word of a choice found.
 *
 * @param failures limits not met, then limits without result, each in the order of the calculation
 * @param lacks whether a limit could not be judged because something was not given
 * @param refused why the station can't be laid out with this word; empty where it can
 */
public record SizeRerun(String word, List<Failure> failures, boolean lacks, String refused) {
    /**
     * A limit that is not met in some case; or that is met where it has a result, and has none in some case.
     *
     * @param cases the judged cases in which it is so, counted from 1; empty for a limit that serves all cases
     */
    public record Failure(String tag, String limit, boolean notMet, List<Integer> cases) {}

    public SizeRerun {
        failures = List.copyOf(failures);
    }

    /** How many limits are not met in some case. */
    public long notMet() {
        return failures.stream().filter(Failure::notMet).count();
    }

    /** How many limits are met wherever they have a result, and have none in some case. */
    public long withoutResult() {
        return failures.size() - notMet();
    }
}
