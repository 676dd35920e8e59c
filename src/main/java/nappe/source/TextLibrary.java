package nappe.source;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** Where method sheets, cited tables, check rows and figures are read from. */
public interface TextLibrary {
    /**
     * The text at a path such as {@code methods/parshall-flume.txt}, or null where there is none.
     *
     * @throws TextException where there is one that cannot be read
     */
    @Nullable
    String text(String path);

    /** The file names in a folder such as {@code methods}, in alphabetical order. */
    List<String> names(String folder);

    /** How messages name the file at a path. */
    default String shown(String path) {
        return path.startsWith("figures/") ? path : path.substring(path.lastIndexOf('/') + 1);
    }

    /** The name of the house whose own text stands at a path; empty for what comes with Nappe. */
    default String house(String path) {
        return "";
    }
}
