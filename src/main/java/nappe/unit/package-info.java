/** The catalogue of the trade's units, quantities, conversion and the two working systems. */
@NullMarked
package nappe.unit;

import org.jspecify.annotations.NullMarked;
