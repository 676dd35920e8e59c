package nappe.input;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.time.LocalDateTime;
import java.util.Comparator;
import java.util.Map;
import java.util.TreeMap;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;

/** Packs a zip anew so that the same parts give the same bytes, whenever and wherever. */
final class FixedZip {
    /** Not 1980-01-01: Java takes that for a time before 1980 and adds a field that depends on the time zone. */
    private static final LocalDateTime TIME = LocalDateTime.of(2000, 1, 1, 0, 0);

    private static final Comparator<String> CONTENT_TYPES_FIRST = Comparator.comparing(
                    (String name) -> !name.equals("[Content_Types].xml"))
            .thenComparing(name -> name);

    private FixedZip() {}

    static byte[] of(byte[] zip) throws IOException {
        Map<String, byte[]> parts = new TreeMap<>(CONTENT_TYPES_FIRST);
        try (ZipInputStream in = new ZipInputStream(new ByteArrayInputStream(zip))) {
            for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                parts.put(entry.getName(), in.readAllBytes());
            }
        }
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream out = new ZipOutputStream(bytes)) {
            for (Map.Entry<String, byte[]> part : parts.entrySet()) {
                ZipEntry entry = new ZipEntry(part.getKey());
                entry.setTimeLocal(TIME);
                out.putNextEntry(entry);
                out.write(part.getValue());
                out.closeEntry();
            }
        }
        return bytes.toByteArray();
    }
}
