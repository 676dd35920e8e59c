package nappe.deliver.xlsx;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.time.LocalDateTime;
import java.util.Map;
import java.util.Objects;
import java.util.TreeMap;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;

/**
 * Puts our own rows into a workbook that a library made without a cell, and zips every part again in one order and with
 * one time, so that the same input gives the same bytes.
 */
final class Splice {
    /** Not 1980-01-01: there the JDK adds a field that depends on the time zone. */
    private static final LocalDateTime ONE_TIME = LocalDateTime.of(2000, 1, 1, 0, 0);

    private static final String NO_ROWS = "<sheetData/>";
    private static final String NO_DIMENSION = "<dimension ref=\"A1\"/>";

    private Splice() {}

    /**
     * The workbook with rows.
     *
     * @param rows by the name of the sheet's part, with a leading slash
     */
    static byte[] together(byte[] workbook, Map<String, SheetRows> rows) {
        try {
            TreeMap<String, byte[]> parts = parts(workbook);
            rows.forEach((name, sheet) -> parts.compute(name.substring(1), (key, part) -> withRows(key, part, sheet)));
            ByteArrayOutputStream bytes = new ByteArrayOutputStream();
            try (ZipOutputStream zip = new ZipOutputStream(bytes, StandardCharsets.UTF_8)) {
                for (String first : new String[] {"[Content_Types].xml", "_rels/.rels"}) {
                    write(zip, first, Objects.requireNonNull(parts.remove(first)));
                }
                for (Map.Entry<String, byte[]> part : parts.entrySet()) {
                    write(zip, part.getKey(), part.getValue());
                }
            }
            return bytes.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static TreeMap<String, byte[]> parts(byte[] workbook) throws IOException {
        TreeMap<String, byte[]> parts = new TreeMap<>();
        try (ZipInputStream zip = new ZipInputStream(new ByteArrayInputStream(workbook))) {
            for (ZipEntry entry = zip.getNextEntry(); entry != null; entry = zip.getNextEntry()) {
                parts.put(entry.getName(), zip.readAllBytes());
            }
        }
        return parts;
    }

    private static byte[] withRows(String name, byte[] part, SheetRows rows) {
        String text = new String(part, StandardCharsets.UTF_8);
        int place = text.indexOf(NO_ROWS);
        if (place < 0) {
            throw new IllegalStateException(name + " has no place for rows");
        }
        String head = text.substring(0, place).replace(NO_DIMENSION, "<dimension ref=\"" + rows.dimension() + "\"/>");
        return (head + rows.xml() + text.substring(place + NO_ROWS.length())).getBytes(StandardCharsets.UTF_8);
    }

    private static void write(ZipOutputStream zip, String name, byte[] content) throws IOException {
        ZipEntry entry = new ZipEntry(name);
        entry.setTimeLocal(ONE_TIME);
        zip.putNextEntry(entry);
        zip.write(content);
        zip.closeEntry();
    }
}
