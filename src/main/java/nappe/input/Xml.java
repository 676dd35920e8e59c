package nappe.input;

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
    private static final int LONGEST_SHORT_PART = 5_000_000;
    private static final int DEEPEST = 100;
    private static final XMLInputFactory FACTORY = factory();

    private final String part;
    private final Faults faults;
    private final InputStream in;
    private final XMLStreamReader reader;
    private int depth;

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

    /** Opens a part that can't be long in a sound workbook, and stands on its root element. */
    static Xml openShort(Parts parts, String part) {
        if (parts.size(part) > LONGEST_SHORT_PART) {
            throw parts.faults()
                    .refuse(
                            "too-large",
                            "the part " + part + " has more than " + LONGEST_SHORT_PART / 1_000_000
                                    + " MB, the most that it may have in an input workbook");
        }
        return open(parts, part);
    }

    /** Opens a part and stands on its root element. */
    static Xml open(Parts parts, String part) {
        InputStream in = InputStream.nullInputStream();
        try {
            in = new RunLimit(parts.stream(part));
            Xml xml = new Xml(part, parts.faults(), in, XmlText.open(FACTORY, in));
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
                throw faults.refuse(
                        "doctype",
                        "the part " + part + " has a document type declaration, which no "
                                + "spreadsheet program writes; the file is not read");
            }
            depth += event == XMLStreamConstants.START_ELEMENT ? 1 : event == XMLStreamConstants.END_ELEMENT ? -1 : 0;
            if (depth > DEEPEST) {
                throw faults.refuse("too-large", "the part " + part + " is nested more than " + DEEPEST + " deep");
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
        return reader.getEventType() == XMLStreamConstants.END_ELEMENT
                && reader.getLocalName().equals(name);
    }

    /** The name of the element that the reader stands on. */
    String name() {
        return reader.getLocalName();
    }

    String namespace() {
        return isStart() && reader.getNamespaceURI() != null ? reader.getNamespaceURI() : "";
    }

    /** The attribute of no namespace, or null. */
    @Nullable
    String attribute(String name) {
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
    @Nullable
    String relation() {
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
        appendText(text);
        return text.toString();
    }

    /** Adds the text of the element to what came before it. */
    void appendText(StringBuilder text) {
        int start = depth;
        while (depth >= start && next()) {
            boolean characters = reader.getEventType() == XMLStreamConstants.CHARACTERS
                    || reader.getEventType() == XMLStreamConstants.CDATA
                    || reader.getEventType() == XMLStreamConstants.SPACE;
            if (depth == start && characters) {
                text.append(reader.getText());
            }
            if (text.length() > LONGEST_TEXT) {
                throw faults.refuse(
                        "too-large", "the part " + part + " holds a text of more than " + LONGEST_TEXT + " characters");
            }
        }
    }

    private static InputRefused damaged(Faults faults, String part, Exception e) {
        if (e.getMessage() != null && e.getMessage().contains(RunLimit.SAID)) {
            return faults.refuse("too-large", "the part " + part + " holds a run of text without end");
        }
        String where = e instanceof XMLStreamException x && x.getLocation() != null
                ? " (line " + x.getLocation().getLineNumber() + ", column "
                        + x.getLocation().getColumnNumber() + ")"
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
}
