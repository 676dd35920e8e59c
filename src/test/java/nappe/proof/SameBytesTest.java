package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.File;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.CompletableFuture;
import java.util.function.Supplier;
import java.util.stream.Stream;
import nappe.Tools;
import nappe.input.SampleStations;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The same input gives the same bytes, in any locale, time zone and encoding. */
class SameBytesTest {
    @TempDir
    Path folder;

    /** Issues in a Java of its own, and gives the bytes of the files by name. */
    private Map<String, byte[]> issued(String to, Path input, String... flags) {
        try {
            return files(to, input, flags);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The same, where less is compiled on the way: a Java that lives so briefly is done in half the time. */
    private Map<String, byte[]> issuedSoon(String to, Path input, String... flags) {
        return issued(
                to,
                input,
                Stream.concat(Stream.of("-XX:TieredStopAtLevel=1", "-XX:+UseSerialGC"), Stream.of(flags))
                        .toArray(String[]::new));
    }

    private Map<String, byte[]> files(String to, Path input, String... flags) throws IOException {
        Path output = folder.resolve(to);
        List<String> command = new ArrayList<>(
                List.of(Path.of(System.getProperty("java.home"), "bin", "java").toString()));
        command.addAll(Arrays.asList(flags));
        command.addAll(
                List.of("-cp", classPath(), "nappe.cli.Nappe", "issue", input.toString(), "-o", output.toString()));
        Tools.run(command.toArray(String[]::new));
        Map<String, byte[]> files = new TreeMap<>();
        try (Stream<Path> all = Files.walk(output)) {
            for (Path file : all.filter(Files::isRegularFile).toList()) {
                files.put(
                        output.relativize(file).toString().replace(File.separatorChar, '/'), Files.readAllBytes(file));
            }
        }
        return files;
    }

    private static String classPath() {
        return System.getProperty("surefire.test.class.path", System.getProperty("java.class.path"));
    }

    /** Side by side; one of them compiled by halves, which must not matter either. */
    @ParameterizedTest
    @CsvSource({
        "headworks.xlsx, 4",
        "inlet-works.xlsx, 4",
        "return-weir.xlsx, 4",
        "seepage-pond.xlsx, 5",
        "pumping-main.xlsx, 4"
    })
    void anotherLocaleZoneAndEncodingGiveTheSameBytes(String name, int files) {
        Path input = Package.INPUTS.resolve(name);
        CompletableFuture<Map<String, byte[]>> beside = CompletableFuture.supplyAsync(
                () -> issued("here", input, "-Duser.language=en", "-Duser.country=US", "-Duser.timezone=UTC"));
        Map<String, byte[]> there = issuedSoon(
                "there",
                input,
                "-Duser.language=tr",
                "-Duser.country=TR",
                "-Duser.timezone=Asia/Tokyo",
                "-Dfile.encoding=ISO-8859-9");
        Map<String, byte[]> here = beside.join();
        assertThat(here.keySet()).hasSize(files).isEqualTo(there.keySet());
        here.forEach((file, bytes) -> assertThat(there.get(file)).as(file).isEqualTo(bytes));
    }

    @Test
    void changedEntryChangesTheBytesOfEveryFile() throws IOException {
        Map<String, byte[]> before = issuedSoon("before", Package.INPUTS.resolve("return-weir.xlsx"));
        Path changed =
                SampleStations.weir().entry("W1", "p", 0.46, null, null, null).save(folder.resolve("return-weir.xlsx"));
        Map<String, byte[]> after = issuedSoon("after", changed);
        assertThat(after.keySet()).isEqualTo(before.keySet());
        before.forEach((file, bytes) -> assertThat(after.get(file)).as(file).isNotEqualTo(bytes));
    }

    @Test
    void committedSamplesAreWhatSampleStationsWrites() throws IOException {
        for (Map.Entry<String, Supplier<byte[]>> sample : SampleStations.all().entrySet()) {
            assertThat(Files.readAllBytes(Package.INPUTS.resolve(sample.getKey())))
                    .as(sample.getKey())
                    .isEqualTo(sample.getValue().get());
        }
    }
}
