package nappe.source;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.URISyntaxException;
import java.net.URL;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;

/** The texts that come with Nappe, in its jar or its class folder. */
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
        URL url = BuiltInLibrary.class.getResource("/" + folder);
        if (url == null) {
            return List.of();
        }
        try {
            URI uri = url.toURI();
            if (!uri.getScheme().equals("jar")) {
                return list(Path.of(uri));
            }
            try (FileSystem jar = FileSystems.newFileSystem(uri, Map.of())) {
                return list(jar.getPath("/" + folder));
            }
        } catch (URISyntaxException | IOException e) {
            throw new IllegalStateException("cannot list " + folder, e);
        }
    }

    private static List<String> list(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString())
                    .filter(name -> name.endsWith(".txt") || name.endsWith(".csv"))
                    .sorted()
                    .toList();
        }
    }
}
