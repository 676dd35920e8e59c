package nappe.station;

import java.util.List;

/**
 * What the search for the flows at which limits are first reached gave, with the entries as issued.
 *
 * @param cases in the order of the limits, each a column of its own
 * @param notReached what is not reached at any flow searched
 * @param notes the range searched, and what was left out
 */
public record FoundFlows(List<FoundCase> cases, List<NotReached> notReached, List<String> notes) {
    /** No search was made. */
    public static final FoundFlows NONE = new FoundFlows(List.of(), List.of(), List.of());

    public FoundFlows {
        cases = List.copyOf(cases);
        notReached = List.copyOf(notReached);
        notes = List.copyOf(notes);
    }

    /** A limit whose verdict does not turn under some conditions, and what it is there, in words. */
    public record NotReached(String tag, String label, String conditions, String outcome) {}
}
