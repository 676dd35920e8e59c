/** Rating tables into CSV. */
@NullMarked
package nappe.deliver.csv;

import org.jspecify.annotations.NullMarked;
