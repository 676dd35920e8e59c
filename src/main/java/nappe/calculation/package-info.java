/** What is to be computed, laid out on sheets: scopes, cells, places, grids; no numbers. */
@NullMarked
package nappe.calculation;

import org.jspecify.annotations.NullMarked;
