/** Results into the workbook of the package. */
@NullMarked
package nappe.deliver.xlsx;

import org.jspecify.annotations.NullMarked;
