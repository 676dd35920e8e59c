/** Arguments, wiring, messages and exit status. */
@NullMarked
package nappe.cli;

import org.jspecify.annotations.NullMarked;
