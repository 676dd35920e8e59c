package nappe.source;

/**
 * A place in a publication.
 *
 * @param place chapter, clause or table; may be empty
 * @param memory true where the fact is from memory and not confirmed; so is all of a publication that was not seen
 */
public record Citation(Publication publication, String place, boolean memory) {
    /** As printed beside a line: {@code WMM ch. 8 (from memory)}. */
    public String shown() {
        return publication.key()
                + (place.isEmpty() ? "" : " " + place)
                + (memory || publication.memory() ? " (from memory)" : "");
    }
}
