package nappe.station;

/**
 * A flow at which the verdict on a limit turns, found by a search with the entries as issued; laid as a case of its own.
 *
 * @param condition what holds besides the flow
 * @param flow through all of the station, in the working unit
 * @param limit index of the limit among those of the station
 * @param tag of the limit's element
 * @param label of the limit
 * @param conditions the conditions under which the same flow was found, in words
 * @param metBelow whether the limit is met at lesser flows and not at greater ones; if not, the other way round
 * @param jump whether the margin jumps there and is not zero
 */
public record FoundCase(
        Condition condition,
        double flow,
        int limit,
        String tag,
        String label,
        String conditions,
        boolean metBelow,
        boolean jump) {
    /**
     * What holds while the flow varies: the water level and the units in service of a case.
     *
     * @param levelOf index of the case whose level it takes; {@link #TABLE} for the level that the table gives at the flow
     * @param unitsOf index of the case whose units in service it takes
     */
    public record Condition(int levelOf, int unitsOf) {
        /** The level follows from the flow, by the table of levels. */
        public static final int TABLE = -1;
    }

    /** A case to try flows in: it belongs to no limit yet. */
    public static FoundCase trial(Condition condition, double flow) {
        return new FoundCase(condition, flow, -1, "", "", "", true, false);
    }

    /** The direction in words. */
    String direction() {
        String words = metBelow ? "met below, not met above" : "not met below, met above";
        return jump ? words + "; the margin jumps there" : words;
    }
}
