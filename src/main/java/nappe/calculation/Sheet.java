package nappe.calculation;

import java.util.List;

/**
 * One sheet of the package, the same in workbook and PDF.
 *
 * @param number from 1, in the order of the package
 * @param name name of the workbook's tab, at most 31 characters
 * @param title title in words
 * @param blocks what stands on it, from top to bottom
 */
public record Sheet(int number, String name, String title, List<Block> blocks) {}
