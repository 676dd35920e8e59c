/** The cells of a calculation with their numbers, limits with margins, page furniture; records only. */
@NullMarked
package nappe.results;

import org.jspecify.annotations.NullMarked;
