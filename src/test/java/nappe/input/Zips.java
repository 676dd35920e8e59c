package nappe.input;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.UnaryOperator;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;

/** A workbook taken apart, to be put together with something wrong in it. */
public final class Zips {
    private final Map<String, byte[]> parts = new LinkedHashMap<>();

    public static Zips of(byte[] zip) throws IOException {
        Zips zips = new Zips();
        try (ZipInputStream in = new ZipInputStream(new ByteArrayInputStream(zip))) {
            for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                zips.parts.put(entry.getName(), in.readAllBytes());
            }
        }
        return zips;
    }

    /** The parts of a sound workbook. The sheet Flows is its second sheet. */
    static Zips sound() throws IOException {
        return of(Samples.filled().bytes());
    }

    public Zips with(String name, String text) {
        parts.put(name, text.getBytes(StandardCharsets.UTF_8));
        return this;
    }

    public Zips without(String name) {
        parts.remove(name);
        return this;
    }

    public Zips change(String name, UnaryOperator<String> change) {
        String before = new String(parts.get(name), StandardCharsets.UTF_8);
        String after = change.apply(before);
        if (after.equals(before)) {
            throw new IllegalStateException("nothing was changed in " + name + ": " + before);
        }
        return with(name, after);
    }

    /** Changes a part byte for character, which may leave it as it was. */
    public Zips damage(String name, UnaryOperator<String> change) {
        String before = new String(parts.get(name), StandardCharsets.ISO_8859_1);
        parts.put(name, change.apply(before).getBytes(StandardCharsets.ISO_8859_1));
        return this;
    }

    /** The names of the parts. */
    public java.util.Set<String> names() {
        return parts.keySet();
    }

    /** A part as text; empty where there is none. */
    public String text(String name) {
        return new String(parts.getOrDefault(name, new byte[0]), StandardCharsets.UTF_8);
    }

    /** The parts with the cells, by the name of the sheet, as our own blank numbers them. */
    public Map<String, String> sheetParts() {
        Map<String, String> sheets = new LinkedHashMap<>();
        String workbook = new String(parts.get("xl/workbook.xml"), StandardCharsets.UTF_8);
        Matcher sheet = Pattern.compile("<sheet name=\"([^\"]*)\"").matcher(workbook);
        while (sheet.find()) {
            sheets.put(sheet.group(1), "xl/worksheets/sheet" + (sheets.size() + 1) + ".xml");
        }
        return sheets;
    }

    public byte[] bytes() throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream out = new ZipOutputStream(bytes)) {
            for (Map.Entry<String, byte[]> part : parts.entrySet()) {
                out.putNextEntry(new ZipEntry(part.getKey()));
                out.write(part.getValue());
                out.closeEntry();
            }
        }
        return bytes.toByteArray();
    }

    public Path save(Path file) throws IOException {
        return Files.write(file, bytes());
    }
}
