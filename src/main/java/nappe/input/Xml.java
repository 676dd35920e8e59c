package nappe.input;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;
import org.jspecify.annotations.Nullable;

/** One XML part, read forward; no document type declaration, nothing from outside, no endless run of text. */
final class Xml implements AutoCloseable {
    static final String MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
    private static final int LONGEST_TEXT = 300_000;
    private static final XMLInputFactory FACTORY = factory();

    private final String part;
    private final Faults faults;
    private final InputStream in;
    private final XMLStreamReader reader;

    private Xml(String part, Faults faults, InputStream in, XMLStreamReader reader) {
        this.part = part;
        this.faults = faults;
        this.in = in;
        this.reader = reader;
    }

    private static XMLInputFactory factory() {
        XMLInputFactory factory = XMLInputFactory.newDefaultFactory();
        factory.setProperty(XMLInputFactory.SUPPORT_DTD, false);
        factory.setProperty(XMLInputFactory.IS_SUPPORTING_EXTERNAL_ENTITIES, false);
        factory.setProperty(XMLInputFactory.IS_COALESCING, false);
        return factory;
    }

    /** Opens a part and stands on its root element. */
    static Xml open(Parts parts, String part) {
        InputStream in = InputStream.nullInputStream();
        try {
            in = new RunLimit(parts.stream(part));
            Xml xml = new Xml(part, parts.faults(), in, FACTORY.createXMLStreamReader(in));
            while (xml.next() && !xml.isStart()) {
                // what stands before the root
            }
            return xml;
        } catch (IOException | XMLStreamException e) {
            throw damaged(parts.faults(), part, e);
        }
    }

    /** Goes on; false at the end of the part. */
    boolean next() {
        try {
            if (!reader.hasNext()) {
                return false;
            }
            int event = reader.next();
            if (event == XMLStreamConstants.DTD || event == XMLStreamConstants.ENTITY_REFERENCE) {
                throw faults.refuse("doctype", "the part " + part + " has a document type declaration, which no "
                        + "spreadsheet program writes; the file is not read");
            }
            return true;
        } catch (XMLStreamException | RuntimeException e) {
            if (e instanceof InputRefused refused) {
                throw refused;
            }
            throw damaged(faults, part, e);
        }
    }

    boolean isStart() {
        return reader.getEventType() == XMLStreamConstants.START_ELEMENT;
    }

    boolean starts(String name) {
        return isStart() && reader.getLocalName().equals(name);
    }

    boolean ends(String name) {
        return reader.getEventType() == XMLStreamConstants.END_ELEMENT && reader.getLocalName().equals(name);
    }

    /** The name of the element that the reader stands on. */
    String name() {
        return reader.getLocalName();
    }

    String namespace() {
        return isStart() && reader.getNamespaceURI() != null ? reader.getNamespaceURI() : "";
    }

    /** The attribute of no namespace, or null. */
    @Nullable String attribute(String name) {
        return reader.getAttributeValue(null, name);
    }

    String attribute(String name, String otherwise) {
        String value = attribute(name);
        return value == null ? otherwise : value;
    }

    boolean isTrue(String name) {
        String value = attribute(name, "0");
        return value.equals("1") || value.equals("true");
    }

    /** The id that points to another part, or null. */
    @Nullable String relation() {
        for (int i = 0; i < reader.getAttributeCount(); i++) {
            String space = reader.getAttributeNamespace(i);
            if (reader.getAttributeLocalName(i).equals("id") && space != null && space.endsWith("/relationships")) {
                return reader.getAttributeValue(i);
            }
        }
        return null;
    }

    /** The text of the element that the reader stands on, up to its end; what is nested is left out. */
    String text() {
        StringBuilder text = new StringBuilder();
        int depth = 1;
        while (depth > 0 && next()) {
            switch (reader.getEventType()) {
                case XMLStreamConstants.START_ELEMENT -> depth++;
                case XMLStreamConstants.END_ELEMENT -> depth--;
                case XMLStreamConstants.CHARACTERS, XMLStreamConstants.CDATA, XMLStreamConstants.SPACE -> {
                    if (depth == 1) {
                        text.append(reader.getText());
                    }
                }
                default -> {}
            }
            if (text.length() > LONGEST_TEXT) {
                throw faults.refuse("too-large", "the part " + part + " holds a text of more than " + LONGEST_TEXT
                        + " characters");
            }
        }
        return text.toString();
    }

    private static InputRefused damaged(Faults faults, String part, Exception e) {
        if (e.getMessage() != null && e.getMessage().contains(RunLimit.SAID)) {
            return faults.refuse("too-large", "the part " + part + " holds a run of text without end");
        }
        String where = e instanceof XMLStreamException x && x.getLocation() != null
                ? " (line " + x.getLocation().getLineNumber() + ", column " + x.getLocation().getColumnNumber() + ")"
                : "";
        return faults.refuse("damaged", "the file is damaged: its part " + part + " is not well-formed XML" + where);
    }

    @Override
    public void close() {
        try {
            reader.close();
            in.close();
        } catch (IOException | XMLStreamException e) {
            throw damaged(faults, part, e);
        }
    }

    /** Stops where a million bytes go by without a tag, before they pile up in memory. */
    private static final class RunLimit extends FilterInputStream {
        static final String SAID = "run of text without end";
        private static final int LONGEST = 1_000_000;
        private int run;

        RunLimit(InputStream in) {
            super(in);
        }

        @Override
        public int read() throws IOException {
            int c = super.read();
            count(c);
            return c;
        }

        @Override
        public int read(byte[] to, int from, int most) throws IOException {
            int n = super.read(to, from, most);
            for (int i = from; i < from + n; i++) {
                count(to[i]);
            }
            return n;
        }

        private void count(int c) throws IOException {
            run = c == '<' ? 0 : run + 1;
            if (run > LONGEST) {
                throw new IOException(SAID);
            }
        }
    }
}
