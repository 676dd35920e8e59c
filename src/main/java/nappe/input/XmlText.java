package nappe.input;

import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;

/**
 * Opens XML whose characters are decoded here where it is UTF-8, as in all that spreadsheet programs write: left to the
 * JDK's parser, a damaged character would be told on the error stream besides.
 */
final class XmlText {
    private static final int MARK = 3;

    private XmlText() {}

    /** A reader at the start of the text; UTF-16 is left to the parser. */
    static XMLStreamReader open(XMLInputFactory factory, InputStream in) throws IOException, XMLStreamException {
        BufferedInputStream bytes = new BufferedInputStream(in);
        bytes.mark(MARK);
        int[] first = {bytes.read(), bytes.read(), bytes.read()};
        boolean marked = first[0] == 0xEF && first[1] == 0xBB && first[2] == 0xBF;
        if (!marked) {
            bytes.reset();
        }
        if (first[0] == 0 || first[0] >= 0xFE || first[1] == 0) {
            return factory.createXMLStreamReader(bytes);
        }
        CharsetDecoder strict = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT);
        return factory.createXMLStreamReader(new InputStreamReader(bytes, strict));
    }
}
