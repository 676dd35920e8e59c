package nappe.method;

import java.util.List;

/** The methods that are known, by name ({@code parshall-flume}). */
public interface MethodCatalogue {
    /** Names in alphabetical order. */
    List<String> names();

    boolean knows(String name);

    /** Title in words: "Parshall flume". */
    String title(String name);

    /** What the engineer types for it, in the order of the sheet; flow and tailwater of the cases are not among it. */
    List<Declared> declared(String name);
}
