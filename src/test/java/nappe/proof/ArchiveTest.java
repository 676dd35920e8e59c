package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import com.lowagie.text.pdf.PRStream;
import com.lowagie.text.pdf.PdfDictionary;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfReader;
import com.lowagie.text.pdf.PdfStamper;
import java.io.File;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import nappe.Tools;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The PDF is an archive file that carries its workbook. */
class ArchiveTest {
    private static final Path VALIDATOR = Path.of("target", "validators", "verapdf");

    @TempDir
    Path folder;

    static List<Issued> both() {
        return Issued.both();
    }

    /** What the validator says of each file, in a Java of its own. */
    private String validated(Path... files) throws IOException {
        Path said = folder.resolve("said.txt");
        List<String> command = new ArrayList<>(List.of(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-cp",
                VALIDATOR + File.separator + "*",
                Path.of("src", "test", "validators", "ArchiveCheck.java").toString(),
                said.toString()));
        for (Path file : files) {
            command.add(file.toString());
        }
        Tools.run(command.toArray(String[]::new));
        return Files.readString(said);
    }

    @Test
    void bothSamplesKeepToTheArchiveFormat() throws IOException {
        assertThat(validated(both().get(0).pdf(), both().get(1).pdf()).lines())
                .hasSize(2)
                .allMatch(line -> line.startsWith("compliant ") && line.contains(" 3u "));
    }

    @Test
    void theValidatorSeesWhatIsMissing() throws IOException {
        byte[] pdf = Files.readAllBytes(both().get(1).pdf());
        String text = new String(pdf, StandardCharsets.ISO_8859_1).replace("pdfaid:part>", "pdfaid:port>");
        Path unnamed = Files.write(folder.resolve("unnamed.pdf"), text.getBytes(StandardCharsets.ISO_8859_1));
        Path uncoloured = folder.resolve("uncoloured.pdf");
        PdfReader reader = new PdfReader(pdf);
        reader.getCatalog().remove(PdfName.OUTPUTINTENTS);
        new PdfStamper(reader, Files.newOutputStream(uncoloured)).close();
        assertThat(validated(unnamed, uncoloured))
                .contains("not compliant " + unnamed, "6.6.4-")
                .contains("not compliant " + uncoloured, "6.2.4.3-2 DeviceRGB")
                .doesNotContain("\ncompliant");
    }

    @ParameterizedTest
    @MethodSource("both")
    void anotherProgramFindsNoFault(Issued issued) throws IOException {
        Tools.require("qpdf", "qpdf");
        Tools.run("qpdf", "--check", issued.pdf().toString());
    }

    @ParameterizedTest
    @MethodSource("both")
    void theAttachmentIsTheIssuedWorkbook(Issued issued) throws IOException {
        try (PdfReader reader = new PdfReader(Files.readAllBytes(issued.pdf()))) {
            PdfDictionary file =
                    reader.getCatalog().getAsArray(new PdfName("AF")).getAsDict(0);
            assertThat(file.getAsString(PdfName.UF).toUnicodeString())
                    .isEqualTo(issued.workbook().getFileName().toString());
            assertThat(file.getAsName(new PdfName("AFRelationship"))).hasToString("/Data");
            PRStream stream = (PRStream)
                    Objects.requireNonNull(file.getAsDict(PdfName.EF)).getAsStream(PdfName.F);
            assertThat(PdfReader.getStreamBytes(stream)).isEqualTo(Files.readAllBytes(issued.workbook()));
            assertThat(stream.getAsDict(PdfName.PARAMS).getAsString(PdfName.MODDATE))
                    .hasToString(reader.getInfo().get("ModDate"));
        }
    }

    @ParameterizedTest
    @MethodSource("both")
    void anotherProgramTakesTheWorkbookOut(Issued issued) throws IOException {
        Tools.require("pdfdetach", "poppler");
        Tools.run("pdfdetach", "-saveall", "-o", folder.toString(), issued.pdf().toString());
        assertThat(folder.resolve(issued.workbook().getFileName())).hasSameBinaryContentAs(issued.workbook());
    }

    @ParameterizedTest
    @MethodSource("both")
    void theFileSaysTwiceWhatItIs(Issued issued) throws IOException {
        try (PdfReader reader = new PdfReader(Files.readAllBytes(issued.pdf()))) {
            Map<String, String> info = reader.getInfo();
            String xmp = new String(reader.getMetadata(), StandardCharsets.UTF_8);
            assertThat(xmp)
                    .contains("<pdfaid:part>3</pdfaid:part>", "<pdfaid:conformance>U</pdfaid:conformance>")
                    .contains(
                            ">" + info.get("Title") + "<",
                            ">" + info.get("Author") + "<",
                            ">" + info.get("Subject") + "<",
                            ">" + info.get("Producer") + "<");
            assertThat(reader.getPdfVersion()).isEqualTo('7');
            assertThat(reader.isEncrypted()).isFalse();
            assertThat(reader.getJavaScript()).isNullOrEmpty();
            assertThat(reader.getCatalog().getAsString(PdfName.LANG)).hasToString("en");
            assertThat(reader.getCatalog().contains(new PdfName("OpenAction"))).isFalse();
        }
    }
}
