package nappe.station;

import java.util.List;
import java.util.stream.Collectors;

/** Says which limits fail in a rerun, and in which cases: the first three by name, of each the first two cases. */
final class FailingWords {
    private static final int LIMITS = 3;
    private static final int CASES = 2;

    private FailingWords() {}

    /** @param judged how many cases are judged */
    static String of(SizeRerun rerun, int judged) {
        if (!rerun.refused().isEmpty()) {
            return "no rerun: " + rerun.refused();
        }
        List<SizeRerun.Failure> failures = rerun.failures();
        if (failures.isEmpty()) {
            return rerun.lacks() ? "none, but not all is given" : "none";
        }
        String named =
                failures.stream().limit(LIMITS).map(f -> words(f, judged)).collect(Collectors.joining("; "));
        int more = failures.size() - LIMITS;
        return more > 0 ? named + "; and " + more + " more" : named;
    }

    private static String words(SizeRerun.Failure failure, int judged) {
        return failure.tag() + " " + failure.limit() + " (" + (failure.notMet() ? "" : "no result: ")
                + cases(failure.cases(), judged) + ")";
    }

    private static String cases(List<String> names, int judged) {
        if (names.isEmpty() || names.size() == judged && judged > CASES) {
            return "every case";
        }
        String first = String.join(", ", names.subList(0, Math.min(CASES, names.size())));
        int more = names.size() - CASES;
        return more > 0 ? first + " and " + more + (more == 1 ? " more case" : " more cases") : first;
    }
}
