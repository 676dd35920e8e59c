package nappe.station;

import java.util.List;

/**
 * What the package says of the program that made it.
 *
 * @param methods texts used: method name, the start of the hash of its text, and whose it is
 * @param counts check values by method and kind, in words
 * @param rows the check values: id, method and entries, target, computed, expected, tolerance,
 *     source, verdict
 * @param off check values at hand that disagree and are not run: id and why
 */
public record SoftwareStatement(
        String version,
        List<List<String>> methods,
        List<List<String>> counts,
        List<List<String>> rows,
        List<List<String>> off) {}
