/** Publications, citations and cited CSV tables. */
@NullMarked
package nappe.source;

import org.jspecify.annotations.NullMarked;
