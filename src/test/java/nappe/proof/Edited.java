package nappe.proof;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.MatchResult;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;
import nappe.calculation.Place;

/** An issued workbook in which typed cells are changed, all else left as it is. */
final class Edited {
    private final Map<String, byte[]> parts = new LinkedHashMap<>();
    private final Map<String, String> partOfSheet = new LinkedHashMap<>();

    Edited(byte[] workbook) {
        try (ZipInputStream in = new ZipInputStream(new ByteArrayInputStream(workbook))) {
            for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                parts.put(entry.getName(), in.readAllBytes());
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        Map<String, String> targets = new HashMap<>();
        found("xl/_rels/workbook.xml.rels", "<Relationship [^>]*>")
                .forEach(one -> targets.put(attribute(one, "Id"), attribute(one, "Target")));
        found("xl/workbook.xml", "<sheet [^>]*>")
                .forEach(one -> partOfSheet.put(attribute(one, "name"), "xl/" + targets.get(attribute(one, "r:id"))));
    }

    private List<String> found(String part, String pattern) {
        return Pattern.compile(pattern)
                .matcher(new String(parts.get(part), StandardCharsets.UTF_8))
                .results()
                .map(MatchResult::group)
                .toList();
    }

    private static String attribute(String element, String name) {
        Matcher found = Pattern.compile(" " + name + "=\"([^\"]*)\"").matcher(element);
        if (!found.find()) {
            throw new IllegalArgumentException(element + " has no " + name);
        }
        return found.group(1);
    }

    /** Types a number, or words, over what was typed; null empties the cell. */
    Edited type(Place place, Object value) {
        String name = partOfSheet.get(place.sheet());
        String part = new String(parts.get(name), StandardCharsets.UTF_8);
        Matcher cell = Pattern.compile("<c r=\"" + place.address() + "\"( s=\"\\d+\")(?: t=\"s\")?><v>[^<]*</v></c>")
                .matcher(part);
        if (!cell.find()) {
            throw new IllegalArgumentException(place.full() + " is no typed cell");
        }
        String content = value == null
                ? "/>"
                : value instanceof Number
                        ? "><v>" + value + "</v></c>"
                        : " t=\"inlineStr\"><is><t>" + value + "</t></is></c>";
        String changed = part.substring(0, cell.start()) + "<c r=\"" + place.address() + "\"" + cell.group(1) + content
                + part.substring(cell.end());
        parts.put(name, changed.getBytes(StandardCharsets.UTF_8));
        return this;
    }

    byte[] bytes() {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream out = new ZipOutputStream(bytes)) {
            for (Map.Entry<String, byte[]> part : parts.entrySet()) {
                out.putNextEntry(new ZipEntry(part.getKey()));
                out.write(part.getValue());
                out.closeEntry();
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return bytes.toByteArray();
    }
}
