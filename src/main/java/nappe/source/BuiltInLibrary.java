package nappe.source;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** The texts that come with Nappe. A file {@code index.txt} in each folder names what stands in it. */
public final class BuiltInLibrary implements TextLibrary {
    @Override
    public @Nullable String text(String path) {
        try (InputStream in = BuiltInLibrary.class.getResourceAsStream("/" + path)) {
            return in == null ? null : new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Override
    public List<String> names(String folder) {
        String index = text(folder + "/index.txt");
        return index == null
                ? List.of()
                : index.lines().map(String::strip).filter(line -> !line.isEmpty()).sorted().toList();
    }
}
