package nappe.deliver.pdf;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/** What is drawn in the places of elements of the document: the attribute {@link #ATTRIBUTE} of an element names it. */
final class Drawings {
    static final String ATTRIBUTE = "data-drawn";

    private final Map<String, Drawn> drawings = new LinkedHashMap<>();

    /**
     * Takes in a drawing, and tells how to refer to it.
     *
     * @param text what stands for it, in characters
     */
    View.Inset add(Drawn drawn, String text) {
        String name = "d" + (drawings.size() + 1);
        drawings.put(name, drawn);
        return new View.Inset(name, XmlText.safe(text));
    }

    Drawn named(String name) {
        Drawn drawn = drawings.get(name);
        if (drawn == null) {
            throw new IllegalArgumentException("there is no drawing " + name);
        }
        return drawn;
    }

    /** The characters in all of them that no typeface has. */
    Set<Integer> missing() {
        Set<Integer> missing = new TreeSet<>();
        drawings.values().forEach(drawn -> missing.addAll(drawn.missing()));
        return missing;
    }
}
