package nappe.results;

/** A figure of the package, evaluated: strokes and texts in working units, to be painted to scale. */
public sealed interface Figure permits Drawing, Curve, Bars {
    /** Its title in words. */
    String title();
}
