package nappe.deliver.xlsx;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.regex.Pattern;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;

/**
 * The values that the cells of a workbook store, read in one pass over each sheet: a workbook held as a whole takes ten
 * times as long, and nothing but values is asked for.
 */
final class StoredCells {
    /** Where a formula stores no value; no result reads so. */
    static final String NOTHING = "no value is stored";

    private static final Pattern ESCAPED = Pattern.compile("_x([0-9A-Fa-f]{4})_");

    private final ZipFile zip;
    private final List<String> shared = new ArrayList<>();
    private final Map<String, Object> values = new LinkedHashMap<>();

    private StoredCells(ZipFile zip) {
        this.zip = zip;
    }

    /** By {@code "Sheet!A1"}: numbers as Double, all else as String; a cell without content is left out. */
    static Map<String, Object> of(Path workbook) throws IOException {
        try (ZipFile zip = new ZipFile(workbook.toFile())) {
            StoredCells cells = new StoredCells(zip);
            Map<String, String> targets = new LinkedHashMap<>();
            cells.each("xl/_rels/workbook.xml.rels", "Relationship", in -> targets.put(in.get("Id"), in.get("Target")));
            if (zip.getEntry("xl/sharedStrings.xml") != null) {
                cells.each("xl/sharedStrings.xml", "si", in -> cells.shared.add(in.text("si")));
            }
            Map<String, String> sheets = new LinkedHashMap<>();
            cells.each("xl/workbook.xml", "sheet", in -> sheets.put(in.get("name"), targets.get(in.get("id"))));
            sheets.forEach((name, target) ->
                    cells.each("xl/" + target.replaceFirst("^/xl/", ""), "c", in -> cells.cell(name, in)));
            return cells.values;
        } catch (UncheckedIOException e) {
            throw e.getCause();
        }
    }

    private interface Work {
        void on(Element element) throws XMLStreamException;
    }

    private void each(String part, String name, Work work) {
        ZipEntry entry = Objects.requireNonNull(zip.getEntry(part), part);
        XMLInputFactory factory = XMLInputFactory.newDefaultFactory();
        factory.setProperty(XMLInputFactory.IS_COALESCING, true);
        factory.setProperty(XMLInputFactory.SUPPORT_DTD, false);
        try (InputStream in = zip.getInputStream(entry)) {
            XMLStreamReader reader = factory.createXMLStreamReader(in);
            while (reader.hasNext()) {
                if (reader.next() == XMLStreamConstants.START_ELEMENT
                        && reader.getLocalName().equals(name)) {
                    work.on(new Element(reader));
                }
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (XMLStreamException e) {
            throw new UncheckedIOException(new IOException(part, e));
        }
    }

    private void cell(String sheet, Element in) throws XMLStreamException {
        String at = sheet + "!" + in.get("r");
        String type = Objects.requireNonNullElse(in.get("t"), "n");
        XMLStreamReader reader = in.reader();
        boolean formula = false;
        String stored = null;
        for (int event = reader.next(); !Element.ends(reader, event, "c"); event = reader.next()) {
            if (event == XMLStreamConstants.START_ELEMENT) {
                switch (reader.getLocalName()) {
                    case "f" -> formula = true;
                    case "v" -> stored = reader.getElementText();
                    case "is" -> stored = in.text("is");
                    default -> {}
                }
            }
        }
        if (stored != null) {
            values.put(at, value(type, stored));
        } else if (formula) {
            values.put(at, type.equals("str") ? "" : NOTHING);
        }
    }

    private Object value(String type, String stored) {
        return switch (type) {
            case "n" -> (Object) Double.valueOf(stored);
            case "b" -> stored.equals("1") ? "TRUE" : "FALSE";
            case "e" -> "error " + stored;
            case "s" -> shared.get(Integer.parseInt(stored));
            default -> plain(stored);
        };
    }

    /** A character that XML can't hold stands as its number. */
    private static String plain(String text) {
        return text.contains("_x")
                ? ESCAPED.matcher(text)
                        .replaceAll(escaped -> java.util.regex.Matcher.quoteReplacement(
                                String.valueOf((char) Integer.parseInt(escaped.group(1), 16))))
                : text;
    }

    /** An element at its start. */
    private record Element(XMLStreamReader reader) {
        static boolean ends(XMLStreamReader reader, int event, String name) {
            return event == XMLStreamConstants.END_ELEMENT
                    && reader.getLocalName().equals(name);
        }

        String get(String attribute) {
            for (int i = 0; i < reader.getAttributeCount(); i++) {
                if (reader.getAttributeLocalName(i).equals(attribute)) {
                    return reader.getAttributeValue(i);
                }
            }
            return null;
        }

        /** The text of all runs up to the end of an element; how a word is said stands in none. */
        String text(String end) throws XMLStreamException {
            StringBuilder text = new StringBuilder();
            boolean said = false;
            for (int event = reader.next(); !ends(reader, event, end); event = reader.next()) {
                if (event == XMLStreamConstants.START_ELEMENT
                        && reader.getLocalName().equals("rPh")) {
                    said = true;
                } else if (ends(reader, event, "rPh")) {
                    said = false;
                } else if (event == XMLStreamConstants.START_ELEMENT
                        && reader.getLocalName().equals("t")) {
                    String run = reader.getElementText();
                    text.append(said ? "" : run);
                }
            }
            return plain(text.toString());
        }
    }
}
