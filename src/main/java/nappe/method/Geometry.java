package nappe.method;

import java.util.List;
import nappe.formula.Formula;

/**
 * What the built device must satisfy to exist at all, whatever a standard allows: {@code geometry d < D ; the bore is
 * smaller than the pipe}. A design that breaks it is refused at the entry's cell, before anything is computed.
 *
 * @param entries what is typed of it, in the order of the condition; the first names the cell
 * @param label the condition in words
 */
public record Geometry(Formula condition, List<String> entries, String label) {}
