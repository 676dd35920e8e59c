package nappe.calculation;

/** What a symbol in a cell's formula points to: one cell, or a run of cells in a row or column. */
public sealed interface Reference permits Cell, Run {}
