/** Method sheets: reader, faults, items and their graph; knows no device by name. */
@NullMarked
package nappe.method;

import org.jspecify.annotations.NullMarked;
