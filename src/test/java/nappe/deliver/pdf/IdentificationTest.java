package nappe.deliver.pdf;

import static org.assertj.core.api.Assertions.assertThat;

import com.lowagie.text.pdf.PdfReader;
import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import javax.xml.parsers.DocumentBuilderFactory;
import nappe.calculation.Sheet;
import nappe.results.Furniture;
import nappe.results.Results;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;

class IdentificationTest {
    private static final String HOSTILE = "Weir & <flume> \"5 > 3\" ]]> %s 中é";

    private static byte[] pdf(Attachment... attachments) {
        Furniture plain = Invented.furniture(true, "", "issued");
        Furniture furniture = new Furniture(
                plain.project(),
                HOSTILE,
                plain.client(),
                plain.number(),
                HOSTILE,
                plain.revision(),
                plain.date(),
                plain.status(),
                plain.fingerprint(),
                plain.version(),
                true,
                plain.cautions(),
                "");
        Results results = new Results(furniture, List.of(new Sheet(1, "A", "A", List.of())), List.of(), Map.of());
        return attachments.length == 0
                ? PdfDelivery.render(results).bytes()
                : PdfDelivery.render(results, attachments[0]).bytes();
    }

    @Test
    void hostileWordsAreTheSameInBothDescriptions() throws Exception {
        try (PdfReader reader = new PdfReader(pdf())) {
            Document xmp = DocumentBuilderFactory.newDefaultInstance()
                    .newDocumentBuilder()
                    .parse(new ByteArrayInputStream(reader.getMetadata()));
            Map<String, String> info = reader.getInfo();
            assertThat(info.get("Author")).isEqualTo(HOSTILE);
            assertThat(text(xmp, "dc:creator")).isEqualTo(info.get("Author"));
            assertThat(text(xmp, "dc:title")).isEqualTo(info.get("Title"));
            assertThat(text(xmp, "dc:description")).isEqualTo(info.get("Subject"));
            assertThat(text(xmp, "xmp:ModifyDate")).isEqualTo("2026-03-01T00:00:00Z");
        }
    }

    private static String text(Document xmp, String name) {
        return xmp.getElementsByTagName(name).item(0).getTextContent();
    }

    @Test
    void anotherWorkbookMakesAnotherFile() {
        byte[] one = pdf(new Attachment("a.xlsx", "one".getBytes(StandardCharsets.UTF_8)));
        byte[] two = pdf(new Attachment("a.xlsx", "two".getBytes(StandardCharsets.UTF_8)));
        assertThat(identity(one))
                .isNotEqualTo(identity(two))
                .isEqualTo(identity(pdf(new Attachment("a.xlsx", "one".getBytes(StandardCharsets.UTF_8)))));
    }

    private static String identity(byte[] pdf) {
        String raw = new String(pdf, StandardCharsets.ISO_8859_1);
        return raw.substring(raw.lastIndexOf("/ID"), raw.lastIndexOf("/ID") + 40);
    }
}
