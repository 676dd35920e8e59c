package nappe.calculation;

/** Whether a cell always holds a number (or a plain word), found from its formula alone, before any number is known. */
public enum Sureness {
    /** Always a number, or one of the words the formula names. */
    SURE,
    /** May hold words in place of a number because something it rests on may. */
    MAY_BE_WORDS,
    /** May in itself be outside the range of definition: its spreadsheet text is guarded by IFERROR. */
    MAY_FAIL
}
