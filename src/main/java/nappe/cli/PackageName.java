package nappe.cli;

import java.util.Locale;
import java.util.Set;

/**
 * The name of a package and of its files: {@code QW-H-017_rev-A}.
 *
 * @param number of the calculation, as typed
 * @param revision as typed
 */
record PackageName(String number, String revision) {
    /** Names of devices, which one system takes for a file before the first point; common practice, no source. */
    private static final Set<String> DEVICES = Set.of("con", "prn", "aux", "nul");

    private static final String NUMBERED_DEVICE = "(com|lpt)[0-9]";

    /** Letters, digits, points and hyphens, which every system takes in a name. */
    private static String safe(String text) {
        String kept = text.strip().replaceAll("[^A-Za-z0-9.-]+", "-").replaceAll("^[.-]+|[.-]+$", "");
        return kept.isEmpty() ? "0" : kept;
    }

    private static String noDevice(String text) {
        String start = text.replaceAll("\\..*", "").toLowerCase(Locale.ROOT);
        return DEVICES.contains(start) || start.matches(NUMBERED_DEVICE) ? text.replaceFirst("\\.", "-") : text;
    }

    @Override
    public String toString() {
        return noDevice(safe(number)) + "_rev-" + safe(revision);
    }
}
