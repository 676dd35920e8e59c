package nappe.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;

/** The packed program in a Java of its own, as a user runs it. */
final class Jar {
    private static final long PATIENCE_SECONDS = 400;
    private final Path jar;
    private final Path folder;
    private final List<String> before;
    private final String language;

    private Jar(Path jar, Path folder, List<String> before, String language) {
        this.jar = jar;
        this.folder = folder;
        this.before = before;
        this.language = language;
    }

    /** What one run said, and how long it took. */
    record Said(int status, String out, String err, Duration time) {}

    /** A run that was started. */
    record Started(Process process, Path out, Path err, long start) {
        /** Waits for its end. */
        Said said() throws IOException {
            try {
                if (!process.waitFor(PATIENCE_SECONDS, TimeUnit.SECONDS)) {
                    throw new IOException("no end: " + Files.readString(out) + Files.readString(err));
                }
            } catch (InterruptedException e) {
                Thread.currentThread().interrupt();
                throw new IOException(e);
            } finally {
                process.destroyForcibly();
            }
            Duration time = Duration.ofNanos(System.nanoTime() - start);
            Said said = new Said(process.exitValue(), Files.readString(out), Files.readString(err), time);
            Files.delete(out);
            Files.delete(err);
            return said;
        }
    }

    /** The packed program, run from a folder; what it wants to keep for itself goes into a folder {@code tmp} there. */
    static Jar in(Path folder) throws IOException {
        Files.createDirectories(folder.resolve("tmp"));
        Path packed = Path.of(System.getProperty("nappe.jar", "target/nappe-0.1.0.jar"));
        return new Jar(packed.toAbsolutePath(), folder, List.of(), "C.UTF-8");
    }

    /** The same, with words before the command: another user, a limit. */
    Jar after(String... words) {
        return new Jar(jar, folder, List.of(words), language);
    }

    /** The same, in a shell set to another language. */
    Jar inLanguage(String name) {
        return new Jar(jar, folder, before, name);
    }

    /** The same, from a copy of the packed program. */
    Jar copiedTo(Path copy) throws IOException {
        return new Jar(Files.copy(jar, copy), folder, before, language);
    }

    Said run(Object... args) throws IOException {
        return start(args).said();
    }

    Started start(Object... args) throws IOException {
        List<String> command = java("-jar", jar.toString());
        Stream.of(args).map(Object::toString).forEach(command::add);
        return start(command);
    }

    /** Runs a class of the tests with the packed program on its class path. */
    Said runClass(Class<?> main, List<String> args) throws IOException {
        List<String> command = java(
                "-cp",
                jar
                        + java.io.File.pathSeparator
                        + Path.of("target/test-classes").toAbsolutePath(),
                main.getName());
        command.addAll(args);
        return start(command).said();
    }

    private List<String> java(String... words) {
        List<String> command = new ArrayList<>(before);
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        command.addAll(List.of("-Xmx512m", "-XX:-UsePerfData", "-Djava.io.tmpdir=" + folder.resolve("tmp")));
        command.addAll(List.of(words));
        return command;
    }

    private Started start(List<String> command) throws IOException {
        Path out = Files.createTempFile("nappe-out", ".txt");
        Path err = Files.createTempFile("nappe-err", ".txt");
        ProcessBuilder builder = new ProcessBuilder(command)
                .directory(folder.toFile())
                .redirectOutput(out.toFile())
                .redirectError(err.toFile());
        builder.environment().put("LC_ALL", language);
        return new Started(builder.start(), out, err, System.nanoTime());
    }

    /** All files and folders in a folder, with size and contents' hash. */
    static Map<String, String> listing(Path folder) throws IOException {
        Map<String, String> listing = new TreeMap<>();
        try (Stream<Path> all = Files.walk(folder)) {
            for (Path one : all.toList()) {
                String what = Files.isRegularFile(one)
                        ? Files.size(one) + " " + java.util.Arrays.hashCode(Files.readAllBytes(one))
                        : "";
                listing.put(folder.relativize(one).toString(), what);
            }
        }
        return listing;
    }
}
