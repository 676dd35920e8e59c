package nappe.source;

/**
 * A publication that method sheets cite by a short key.
 *
 * @param memory true where its content was not seen but recalled; printed so
 */
public record Publication(String key, String text, boolean memory) {}
