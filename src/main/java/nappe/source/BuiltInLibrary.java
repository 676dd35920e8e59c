package nappe.source;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.JarURLConnection;
import java.net.URISyntaxException;
import java.net.URL;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.jar.JarFile;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import org.jspecify.annotations.Nullable;

/** The texts that come with Nappe, in its jar or its class folder. */
public final class BuiltInLibrary implements TextLibrary {
    private static final Map<String, List<String>> LISTED = new ConcurrentHashMap<>();

    @Override
    public @Nullable String text(String path) {
        try (InputStream in = BuiltInLibrary.class.getResourceAsStream("/" + path)) {
            return in == null ? null : new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The same at each call: what comes with Nappe does not change while it runs, and a jar is slow to look through. */
    @Override
    public List<String> names(String folder) {
        return LISTED.computeIfAbsent(folder, BuiltInLibrary::listed);
    }

    private static List<String> listed(String folder) {
        URL url = BuiltInLibrary.class.getResource("/" + folder);
        if (url == null) {
            return List.of();
        }
        try {
            if (url.openConnection() instanceof JarURLConnection inJar) {
                return inJar(inJar.getJarFile(), folder + "/");
            }
            try (Stream<Path> files = Files.list(Path.of(url.toURI()))) {
                return texts(files.map(file -> file.getFileName().toString()));
            }
        } catch (URISyntaxException | IOException e) {
            throw new IllegalStateException("cannot list " + folder, e);
        }
    }

    /** The file is open already, for the classes in it, and is left open. */
    private static List<String> inJar(JarFile jar, String folder) {
        return texts(jar.stream()
                .map(ZipEntry::getName)
                .filter(name -> name.startsWith(folder) && name.indexOf('/', folder.length()) < 0)
                .map(name -> name.substring(folder.length())));
    }

    private static List<String> texts(Stream<String> files) {
        return files.filter(name -> name.endsWith(".txt") || name.endsWith(".csv"))
                .sorted()
                .toList();
    }
}
