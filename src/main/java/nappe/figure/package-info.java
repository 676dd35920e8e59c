/** Figure files beside the method sheets, and figures made from results; no painting. */
@NullMarked
package nappe.figure;

import org.jspecify.annotations.NullMarked;
