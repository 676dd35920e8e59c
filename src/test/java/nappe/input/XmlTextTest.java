package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;
import org.junit.jupiter.api.Test;

/** Damaged characters are told by an exception alone; whatever a spreadsheet program may write is read. */
class XmlTextTest {
    private static final byte[] DAMAGED = "<a>Abfluß im Schacht</a>".getBytes(StandardCharsets.ISO_8859_1);

    private static String text(byte[] xml) throws IOException, XMLStreamException {
        XMLStreamReader reader = XmlText.open(XMLInputFactory.newDefaultFactory(), new ByteArrayInputStream(xml));
        StringBuilder text = new StringBuilder();
        while (reader.hasNext()) {
            if (reader.next() == XMLStreamConstants.CHARACTERS) {
                text.append(reader.getText());
            }
        }
        return text.toString();
    }

    @Test
    void aDamagedCharacterIsToldAndNothingIsPrinted() {
        PrintStream before = System.err;
        ByteArrayOutputStream said = new ByteArrayOutputStream();
        System.setErr(new PrintStream(said, true, StandardCharsets.UTF_8));
        try {
            assertThat(catchThrowableOfType(XMLStreamException.class, () -> text(DAMAGED)))
                    .isNotNull();
        } finally {
            System.setErr(before);
        }
        assertThat(said.toString(StandardCharsets.UTF_8)).isEmpty();
    }

    @Test
    void textInEachEncodingOfTheStandardIsRead() throws IOException, XMLStreamException {
        String xml = "<a>Überlauf 3 µm</a>";
        assertThat(text(xml.getBytes(StandardCharsets.UTF_8))).isEqualTo("Überlauf 3 µm");
        assertThat(text(("\uFEFF" + xml).getBytes(StandardCharsets.UTF_8))).isEqualTo("Überlauf 3 µm");
        for (String name : new String[] {"UTF-16", "UTF-16LE", "UTF-16BE"}) {
            String declared = "<?xml version=\"1.0\" encoding=\"" + name + "\"?>" + xml;
            assertThat(text(declared.getBytes(Charset.forName(name)))).as(name).isEqualTo("Überlauf 3 µm");
        }
    }

    @Test
    void anEmptyPartIsNoXml() {
        assertThat(catchThrowableOfType(XMLStreamException.class, () -> text(new byte[0])))
                .isNotNull();
    }
}
