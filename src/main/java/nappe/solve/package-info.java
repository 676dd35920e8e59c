/** A calculation into results: evaluation in order. */
@NullMarked
package nappe.solve;

import org.jspecify.annotations.NullMarked;
