package nappe.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The launcher with the jar that was built, as a user has them. */
class LauncherIT {
    private static final Path LAUNCHER = Path.of("src/launch/nappe").toAbsolutePath();
    private static final String INPUT =
            Path.of("sample-inputs/return-weir.xlsx").toAbsolutePath().toString();

    @TempDir
    private Path temp;

    private Path folder;
    private Path link;
    private Path cache;
    private final List<ProcessBuilder> printed = new ArrayList<>();
    private final List<Process> started = new ArrayList<>();

    /** What a run printed, and its status. */
    private record Ended(int status, String out, String err) {}

    @BeforeEach
    void aLinkInAFolderWithBlanks() throws IOException {
        assumeTrue(Files.isExecutable(Path.of("/bin/sh")), "there is no shell here: the launcher is not tested");
        folder = Files.createDirectory(temp.resolve("a folder with blanks"));
        link = Files.createSymbolicLink(folder.resolve("nappe"), LAUNCHER);
        cache = temp.resolve("a cache");
    }

    @Test
    void throughALinkFromAnotherFolderItPrintsNothingOfJava() throws Exception {
        Ended ended = ended(start("--version"));

        assertThat(ended.err()).isEmpty();
        assertThat(ended.out()).startsWith("nappe ").hasLineCount(1);
        assertThat(ended.status()).isZero();
        assertThat(cache).doesNotExist();
    }

    @Test
    void theStatusIsPassedOn() throws Exception {
        assertThat(ended(start("no-such-command")).status()).isEqualTo(ExitStatus.WRONG_USAGE);
        assertThat(ended(start("issue", "no such file.xlsx")).status()).isEqualTo(ExitStatus.INPUT_REFUSED);
        assertThat(archives()).isEmpty();
    }

    @Test
    void twoFirstRunsAtOnceLeaveOneArchiveAndALaterRunPrintsTheSame() throws Exception {
        Process one = start("issue", INPUT, "-o", "out");
        Process other = start("issue", INPUT, "-o", "other out");
        Ended first = ended(one);
        Ended second = ended(other);

        assertThat(first.err()).isEmpty();
        assertThat(first.status()).isZero();
        assertThat(second.status()).isZero();
        assertThat(archives()).singleElement().asString().contains("classes-");

        Ended later = ended(start("issue", INPUT, "-o", "out"));

        assertThat(later).isEqualTo(first);
        assertThat(archives()).hasSize(1);
    }

    @Test
    void anArchiveThatDoesNotFitIsPassedOverInSilence() throws Exception {
        assertThat(ended(start("issue", INPUT, "-o", "out")).status()).isZero();
        Path archive = archives().get(0);
        archive.toFile().setWritable(true);
        Files.writeString(archive, "no archive");

        assertThat(ended(start("--version")).err()).isEmpty();
        assertThat(ended(start("--version")).out()).startsWith("nappe ").hasLineCount(1);
    }

    @Test
    void withoutRoomForAnArchiveAPackageIsMadeAllTheSame() throws Exception {
        Files.writeString(cache, "a file where the folder would be");

        Ended ended = ended(start("issue", INPUT, "-o", "out"));

        assertThat(ended.err()).isEmpty();
        assertThat(ended.status()).isZero();
        assertThat(folder.resolve("out")).isNotEmptyDirectory();
    }

    private Process start(String... arguments) throws IOException {
        List<String> command = new ArrayList<>(List.of(link.toString()));
        command.addAll(List.of(arguments));
        ProcessBuilder builder = new ProcessBuilder(command)
                .directory(folder.toFile())
                .redirectOutput(Files.createTempFile(temp, "out", ".txt").toFile())
                .redirectError(Files.createTempFile(temp, "err", ".txt").toFile());
        builder.environment().put("XDG_CACHE_HOME", cache.toString());
        builder.environment().keySet().removeIf(name -> name.endsWith("_OPTIONS"));
        printed.add(builder);
        started.add(builder.start());
        return started.get(started.size() - 1);
    }

    private Ended ended(Process process) throws IOException, InterruptedException {
        int status = process.waitFor();
        ProcessBuilder builder = printed.get(started.indexOf(process));
        return new Ended(
                status,
                Files.readString(builder.redirectOutput().file().toPath(), StandardCharsets.UTF_8),
                Files.readString(builder.redirectError().file().toPath(), StandardCharsets.UTF_8));
    }

    /** What stands in the cache, half-written archives too. */
    private List<Path> archives() throws IOException {
        Path nappe = cache.resolve("nappe");
        if (!Files.isDirectory(nappe)) {
            return List.of();
        }
        try (Stream<Path> files = Files.list(nappe)) {
            return files.toList();
        }
    }
}
