/** The input workbook: blank, strict reading, faults at their cells. */
@NullMarked
package nappe.input;

import org.jspecify.annotations.NullMarked;
