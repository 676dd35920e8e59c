/** A design as typed, and how its elements and cases become a calculation. */
@NullMarked
package nappe.station;

import org.jspecify.annotations.NullMarked;
