package nappe.source;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** Where method sheets, cited tables and check rows are read from. */
public interface TextLibrary {
    /** The text at a path such as {@code methods/parshall-flume.txt}, or null where there is none. */
    @Nullable
    String text(String path);

    /** The file names in a folder such as {@code methods}, in alphabetical order. */
    List<String> names(String folder);
}
