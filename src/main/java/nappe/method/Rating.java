package nappe.method;

import java.util.List;
import nappe.formula.Formula;

/** A rating table: a free symbol in equal steps, and what comes of it. */
public record Rating(String free, Formula from, Formula to, int steps, List<String> results, List<Item> members) {}
