package nappe.station;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/** Says which limits fail in a rerun, the first three by name, and in which cases, by their numbers. */
final class FailingWords {
    private static final int LIMITS = 3;

    private FailingWords() {}

    /** {@code F1 flow is free: submergence (case 6); F1 head is in the rated range (no result in case 6); and 2 more} */
    static String of(SizeRerun rerun) {
        if (!rerun.refused().isEmpty()) {
            return "no rerun: " + rerun.refused();
        }
        List<SizeRerun.Failure> failures = rerun.failures();
        if (failures.isEmpty()) {
            return rerun.lacks() ? "none, but a limit could not be judged: not given" : "none";
        }
        String named = failures.stream().limit(LIMITS).map(FailingWords::words).collect(Collectors.joining("; "));
        int more = failures.size() - LIMITS;
        return more > 0 ? named + "; and " + more + " more" : named;
    }

    private static String words(SizeRerun.Failure failure) {
        String cases = failure.cases().isEmpty()
                ? "in all cases alike"
                : (failure.cases().size() == 1 ? "case " : "cases ") + numbers(failure.cases());
        return failure.tag() + " " + failure.limit() + " (" + (failure.notMet() ? cases : "no result, " + cases) + ")";
    }

    /** Rising numbers, runs of them drawn together: {@code 1, 3 to 6}. */
    static String numbers(List<Integer> rising) {
        List<String> runs = new ArrayList<>();
        for (int i = 0; i < rising.size(); i++) {
            int first = i;
            while (i + 1 < rising.size() && rising.get(i + 1) == rising.get(i) + 1) {
                i++;
            }
            String from = Integer.toString(rising.get(first));
            runs.add(i == first ? from : from + (i == first + 1 ? ", " : " to ") + rising.get(i));
        }
        return String.join(", ", runs);
    }
}
