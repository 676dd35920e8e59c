package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import com.lowagie.text.pdf.AcroFields;
import com.lowagie.text.pdf.PdfDictionary;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfReader;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import javax.imageio.ImageIO;
import nappe.Tools;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The space for the engineer's seal and signature: large enough, empty, unsigned. */
class SealSpaceTest {
    private static final double LEAST_MM = 64;
    private static final int DOTS_PER_INCH = 144;

    /** The signature field of a sample as left, bottom, right, top in points. */
    private static float[] field(byte[] pdf) throws IOException {
        try (PdfReader reader = new PdfReader(pdf)) {
            return reader.getAcroFields().getFieldPositions("engineer");
        }
    }

    @Test
    void anUnsignedFieldWithATooltipLiesOverTheSealSpace() throws IOException {
        byte[] pdf = Files.readAllBytes(Issued.of(Issued.WITH_SEAL_SPACE).pdf());
        try (PdfReader reader = new PdfReader(pdf)) {
            AcroFields fields = reader.getAcroFields();
            assertThat(fields.getAllFields().keySet()).isEqualTo(Set.of("engineer"));
            assertThat(fields.getFieldType("engineer")).isEqualTo(AcroFields.FIELD_TYPE_SIGNATURE);
            assertThat(fields.getSignedFieldNames()).isEmpty();
            PdfDictionary field = fields.getFieldItem("engineer").getMerged(0);
            assertThat(field.getAsString(PdfName.TU).toUnicodeString()).contains("Seal", "signature");
            assertThat(field.contains(PdfName.V)).isFalse();
            float[] place = fields.getFieldPositions("engineer");
            assertThat(place[0]).as("page").isEqualTo(1);
            assertThat((place[3] - place[1]) / 72 * 25.4).isGreaterThan(LEAST_MM);
            assertThat((place[4] - place[2]) / 72 * 25.4).isGreaterThan(LEAST_MM);
        }
    }

    @Test
    void withoutASealSpaceThereIsNoField() throws IOException {
        byte[] pdf = Files.readAllBytes(Issued.of(Issued.WITHOUT_SEAL_SPACE).pdf());
        assertThat(field(pdf)).isNullOrEmpty();
    }

    /** Measured on the picture of the page: white inside the field, its frame dark on all sides. */
    @Test
    void nothingIsDrawnInTheSealSpace(@TempDir Path folder) throws IOException {
        Tools.require("pdftoppm", "poppler");
        Path pdf = Issued.of(Issued.WITH_SEAL_SPACE).pdf();
        String dots = String.valueOf(DOTS_PER_INCH);
        String to = folder.resolve("cover").toString();
        Tools.run("pdftoppm", "-r", dots, "-f", "1", "-l", "1", "-singlefile", "-png", pdf.toString(), to);
        BufferedImage cover = ImageIO.read(folder.resolve("cover.png").toFile());
        float[] place = field(Files.readAllBytes(pdf));
        int left = dots(place[1]);
        int right = dots(place[3]);
        int top = cover.getHeight() - dots(place[4]);
        int bottom = cover.getHeight() - dots(place[2]);
        int margin = 3;
        for (int x = left + margin; x < right - margin; x++) {
            for (int y = top + margin; y < bottom - margin; y++) {
                assertThat(cover.getRGB(x, y)).isEqualTo(0xFFFFFFFF);
            }
        }
        int middle = (top + bottom) / 2;
        assertThat(darkest(cover, left - margin, left + margin, middle)).isLessThan(128);
        assertThat(darkest(cover, right - margin, right + margin, middle)).isLessThan(128);
    }

    private static int dots(float points) {
        return Math.round(points / 72 * DOTS_PER_INCH);
    }

    private static int darkest(BufferedImage picture, int from, int to, int y) {
        int darkest = 255;
        for (int x = from; x <= to; x++) {
            darkest = Math.min(darkest, picture.getRGB(x, y) & 0xFF);
        }
        return darkest;
    }
}
