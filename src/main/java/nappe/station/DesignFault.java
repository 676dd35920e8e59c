package nappe.station;

/** Something typed that does not fit the method it is for, with the cell it was typed in. */
public record DesignFault(Design.Origin origin, String message, String code) {}
