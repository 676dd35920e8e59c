package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.File;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.concurrent.CompletableFuture;
import java.util.function.Supplier;
import java.util.stream.Stream;
import nappe.Tools;
import nappe.cli.Nappe;
import nappe.input.InputReader;
import nappe.input.SampleStations;
import nappe.method.MethodLibrary;
import nappe.source.BuiltInLibrary;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The same input gives the same bytes, in any locale, time zone and encoding. */
class SameBytesTest {
    /** How many files the package of a sample holds. */
    private static final Map<String, Integer> FILES = Map.of(
            "headworks.xlsx", 4,
            "inlet-works.xlsx", 4,
            "return-weir.xlsx", 4,
            "seepage-pond.xlsx", 5,
            "pumping-main.xlsx", 4);

    @TempDir
    static Path folder;

    private static Map<String, byte[]> here;
    private static Map<String, byte[]> there;

    /** Each issues all samples in a Java of its own, side by side; one is compiled by halves, which must not matter either. */
    @BeforeAll
    static void issueTwice() {
        CompletableFuture<Map<String, byte[]>> beside = CompletableFuture.supplyAsync(() ->
                issued("here", "-XX:+UseSerialGC", "-Duser.language=en", "-Duser.country=US", "-Duser.timezone=UTC"));
        there = issued(
                "there",
                "-XX:TieredStopAtLevel=1",
                "-XX:+UseSerialGC",
                "-Duser.language=tr",
                "-Duser.country=TR",
                "-Duser.timezone=Asia/Tokyo",
                "-Dfile.encoding=ISO-8859-9");
        here = beside.join();
    }

    private static Map<String, byte[]> issued(String to, String... flags) {
        Path output = folder.resolve(to);
        List<String> command = new ArrayList<>(
                List.of(Path.of(System.getProperty("java.home"), "bin", "java").toString()));
        command.addAll(Arrays.asList(flags));
        command.addAll(List.of("-cp", classPath(), "nappe.cli.EachInTurn", output.toString()));
        FILES.keySet().stream()
                .sorted()
                .forEach(sample -> command.add(Package.INPUTS.resolve(sample).toString()));
        try {
            Tools.run(command.toArray(String[]::new));
            return files(output);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The bytes of the files in a folder by name. */
    private static Map<String, byte[]> files(Path output) throws IOException {
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

    /** Those of the package of a sample. */
    private static Map<String, byte[]> of(String sample, Map<String, byte[]> files) {
        String start = InputReader.read(Package.INPUTS.resolve(sample), new MethodLibrary(new BuiltInLibrary()))
                        .project()
                        .number()
                + "_";
        Map<String, byte[]> found = new TreeMap<>(files);
        found.keySet().removeIf(name -> !name.startsWith(start));
        return found;
    }

    static Set<String> samples() {
        return FILES.keySet();
    }

    @ParameterizedTest
    @MethodSource("samples")
    void anotherLocaleZoneAndEncodingGiveTheSameBytes(String name) {
        Map<String, byte[]> one = of(name, here);
        Map<String, byte[]> other = of(name, there);
        assertThat(one.keySet()).hasSize(FILES.get(name)).isEqualTo(other.keySet());
        one.forEach((file, bytes) -> assertThat(other.get(file)).as(file).isEqualTo(bytes));
    }

    @Test
    void changedEntryChangesTheBytesOfEveryFile() throws IOException {
        Map<String, byte[]> before = of("return-weir.xlsx", here);
        Path changed =
                SampleStations.weir().entry("W1", "p", 0.46, null, null, null).save(folder.resolve("return-weir.xlsx"));
        Path output = folder.resolve("after");
        StringWriter said = new StringWriter();
        PrintWriter writer = new PrintWriter(said, true);
        Locale locale = Locale.getDefault();
        try {
            int status = Nappe.run(new String[] {"issue", changed.toString(), "-o", output.toString()}, writer, writer);
            assertThat(status).as(said.toString()).isZero();
        } finally {
            Locale.setDefault(locale);
        }
        Map<String, byte[]> after = files(output);
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
