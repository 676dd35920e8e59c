/** Results into the PDF of the package. */
@NullMarked
package nappe.deliver.pdf;

import org.jspecify.annotations.NullMarked;
