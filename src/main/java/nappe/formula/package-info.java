/** One formula as a tree, its parser, and the readings that need nothing else. */
@NullMarked
package nappe.formula;

import org.jspecify.annotations.NullMarked;
