package nappe;

import static org.junit.jupiter.api.Assertions.fail;
import static org.junit.jupiter.api.Assumptions.abort;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;

/**
 * Programs that only tests need. Where one is missing its tests are skipped with a message on the error stream; where
 * {@code NAPPE_ALL_TOOLS=1} stands in the environment they fail instead.
 */
public final class Tools {
    /** The system's own, which has the packages of the system. */
    public static final String PYTHON = "/usr/bin/python3";

    private static final long PATIENCE_SECONDS = 600;

    private Tools() {}

    /** Goes on only where the program is installed. */
    public static void require(String program, String name) {
        boolean found = Stream.of(System.getenv().getOrDefault("PATH", "").split(File.pathSeparator))
                .anyMatch(folder -> Files.isExecutable(Path.of(folder, program)));
        if (found) {
            return;
        }
        notProven(name + " (" + program + ") is not installed");
    }

    /** Goes on only where the system's Python has the module. */
    public static void requirePythonModule(String module, String name) throws IOException {
        require("python3", "Python");
        try {
            run(PYTHON, "-c", "import " + module);
        } catch (IOException e) {
            notProven(name + " (Python module " + module + ") is not installed");
        }
    }

    private static void notProven(String why) {
        String message = "NOT PROVEN: " + why;
        System.err.println(message);
        if ("1".equals(System.getenv("NAPPE_ALL_TOOLS"))) {
            fail(message + ", and NAPPE_ALL_TOOLS=1 asks for all tools");
        }
        abort(message);
    }

    /** Runs a program to its end; what it printed is part of the message where it fails. */
    public static void run(String... command) throws IOException {
        run(new ProcessBuilder(command));
    }

    /** Runs a prepared program to its end. */
    public static void run(ProcessBuilder builder) throws IOException {
        Path log = Files.createTempFile("nappe-tool", ".log");
        Process process =
                builder.redirectErrorStream(true).redirectOutput(log.toFile()).start();
        try {
            if (!process.waitFor(PATIENCE_SECONDS, TimeUnit.SECONDS)) {
                throw new IOException(builder.command() + " did not end: " + Files.readString(log));
            }
            if (process.exitValue() != 0) {
                throw new IOException(builder.command() + " failed: " + Files.readString(log));
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IOException(builder.command() + " was interrupted", e);
        } finally {
            process.destroyForcibly();
            Files.delete(log);
        }
    }
}
