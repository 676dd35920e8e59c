/** One design carried through layout and solving into results; the check values. */
@NullMarked
package nappe.job;

import org.jspecify.annotations.NullMarked;
