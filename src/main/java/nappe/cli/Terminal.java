package nappe.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** Whether a person watches the error stream. */
final class Terminal {
    private static final Path ERROR_STREAM = Path.of("/proc/self/fd/2");

    private Terminal() {}

    /**
     * True where the error stream is a terminal whose line can be written over. Where the system does not tell what the stream
     * is, Java is asked whether input and output are a terminal. TERM=dumb says that no line is to be written over.
     */
    static boolean isWatched() {
        if ("dumb".equals(System.getenv("TERM"))) {
            return false;
        }
        try {
            String stream = Files.readSymbolicLink(ERROR_STREAM).toString();
            return stream.startsWith("/dev/pts/") || stream.startsWith("/dev/tty") || stream.equals("/dev/console");
        } catch (IOException | UnsupportedOperationException e) {
            // later Javas have a console even where nobody watches, unless told so
            System.setProperty("jdk.console", "java.base");
            return System.console() != null;
        }
    }
}
