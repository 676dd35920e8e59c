package nappe.deliver.pdf;

import java.util.List;

/**
 * A figure as marks on paper.
 *
 * @param width in mm
 * @param height in mm
 * @param words what it shows, for those who can't see it
 */
record Picture(double width, double height, String words, List<Ink> inks) {}
