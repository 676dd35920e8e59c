package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.File;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Every part of an issued workbook is what the schemas of Open XML allow. They run in a JVM of their own: the test class
 * path must not hold types that the shipped jar lacks. Their jars are put into {@code target/validators} by the build.
 */
class OpenXmlSchemaTest {
    private static final Path JARS = Path.of("target", "validators");

    @TempDir
    Path folder;

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void issuedWorkbookIsWhatTheSchemasAllow(String name) throws IOException {
        List<String> said = validated(Package.ofSample(name).workbook());
        assertThat(said).filteredOn(line -> line.startsWith("fault")).isEmpty();
        assertThat(said).contains("checked xl/charts/chart1.xml", "checked xl/workbook.xml", "checked xl/styles.xml");
        assertThat(said)
                .filteredOn(line -> line.startsWith("checked xl/worksheets/"))
                .hasSizeGreaterThan(12);
    }

    @Test
    void strayCharacterAndAPlaceOutOfOrderAreFound() throws IOException {
        byte[] workbook = Package.ofSample("return-weir.xlsx").workbook();
        assertThat(validated(changed(workbook, "xl/worksheets/sheet3.xml", "</f><v>", "</f>><v>")))
                .anyMatch(line -> line.startsWith("fault in xl/worksheets/sheet3.xml"));
        assertThat(validated(changed(
                        workbook, "xl/charts/chart1.xml", "<c:legendPos val=\"b\"/>", "<c:legendPos val=\"foot\"/>")))
                .anyMatch(line -> line.startsWith("fault in xl/charts/chart1.xml"));
    }

    private List<String> validated(byte[] workbook) throws IOException {
        Path book = Files.write(Files.createTempFile(folder, "book", ".xlsx"), workbook);
        Path said = Files.createTempFile(folder, "said", ".txt");
        assertThat(JARS).as("put there by process-test-resources").isDirectory();
        String jars;
        try (Stream<Path> all = Files.list(JARS)) {
            jars = all.sorted().map(Path::toString).collect(Collectors.joining(File.pathSeparator));
        }
        Process process = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-XX:+UseSerialGC",
                        "-cp",
                        jars,
                        Path.of("src", "test", "validators", "ValidateOpenXml.java")
                                .toString(),
                        book.toString())
                .redirectErrorStream(true)
                .redirectOutput(said.toFile())
                .start();
        try {
            int status = process.waitFor();
            List<String> lines = Files.readAllLines(said);
            assertThat(status).as(String.join("\n", lines)).isZero();
            return lines;
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IOException(e);
        } finally {
            process.destroyForcibly();
        }
    }

    private static byte[] changed(byte[] workbook, String part, String before, String after) throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        List<String> found = new ArrayList<>();
        try (ZipInputStream in = new ZipInputStream(new ByteArrayInputStream(workbook));
                ZipOutputStream out = new ZipOutputStream(bytes)) {
            for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
                if (entry.getName().equals(part) && text.contains(before)) {
                    found.add(part);
                    text = text.replaceFirst(java.util.regex.Pattern.quote(before), after);
                }
                out.putNextEntry(new ZipEntry(entry.getName()));
                out.write(text.getBytes(StandardCharsets.UTF_8));
            }
        }
        assertThat(found).as("nothing to change in " + part).hasSize(1);
        return bytes.toByteArray();
    }
}
