package nappe.input;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Collections;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.zip.CRC32;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import org.jspecify.annotations.Nullable;

/** The parts of one zip file, each known to be whole; names are case-blind and start with no slash. */
final class Parts implements AutoCloseable {
    static final int MOST_PARTS = 1000;
    static final long MOST_BYTES = 200_000_000;

    private final ZipFile zip;
    private final Faults faults;
    private final Map<String, ZipEntry> entries = new LinkedHashMap<>();
    private final Map<String, Long> sizes = new HashMap<>();

    private Parts(ZipFile zip, Faults faults) {
        this.zip = zip;
        this.faults = faults;
    }

    /** Opens the file and reads every part once, so that nothing damaged is met later. */
    static Parts open(Path file, Faults faults) {
        try {
            Parts parts = new Parts(new ZipFile(file.toFile()), faults);
            try {
                parts.index();
                parts.verify();
                return parts;
            } catch (InputRefused e) {
                parts.close();
                throw e;
            }
        } catch (IOException | IllegalArgumentException e) {
            boolean encrypted = String.valueOf(e.getMessage()).contains("encrypted");
            throw encrypted
                    ? faults.refuse("encrypted", "the zip file is locked with a password; save it without one")
                    : faults.refuse("damaged", "the file is damaged or cut off; get it again from where it came from");
        }
    }

    boolean has(String name) {
        return entries.containsKey(key(name));
    }

    /** How many bytes the part unpacks to. */
    long size(String name) {
        return sizes.getOrDefault(key(name), 0L);
    }

    /** How many bytes all parts unpack to. */
    long size() {
        return sizes.values().stream().mapToLong(Long::longValue).sum();
    }

    /** The part as a stream; the caller has asked {@link #has}. */
    InputStream stream(String name) throws IOException {
        ZipEntry entry = entries.get(key(name));
        if (entry == null) {
            throw new IOException("no part " + name);
        }
        return zip.getInputStream(entry);
    }

    /** The first characters of a small part, or null. */
    @Nullable
    String start(String name) throws IOException {
        if (!has(name)) {
            return null;
        }
        try (InputStream in = stream(name)) {
            return new String(in.readNBytes(200), StandardCharsets.ISO_8859_1);
        }
    }

    Faults faults() {
        return faults;
    }

    private void index() {
        List<? extends ZipEntry> all = Collections.list(zip.entries());
        if (all.size() > MOST_PARTS) {
            throw faults.refuse(
                    "too-many-parts",
                    "the file has " + all.size() + " parts inside, more than the " + MOST_PARTS
                            + " that an input workbook may have");
        }
        for (ZipEntry entry : all) {
            String name = entry.getName();
            if (!name.matches("[^\\\\/:\\p{Cntrl}]+(/[^\\\\/:\\p{Cntrl}]+)*/?")
                    || name.matches("(.*/)?\\.\\.?(/.*)?")) {
                throw faults.refuse(
                        "odd-part",
                        "the file has a part with the odd name " + Shown.quoted(name)
                                + "; it was not made by a spreadsheet program");
            }
            if (!entry.isDirectory() && entries.put(key(name), entry) != null) {
                throw faults.refuse(
                        "part-twice",
                        "the file has two parts named " + name + "; it was not made by a spreadsheet program");
            }
        }
    }

    private void verify() {
        byte[] buffer = new byte[65_536];
        long total = 0;
        for (ZipEntry entry : entries.values()) {
            long before = total;
            CRC32 sum = new CRC32();
            try (InputStream in = zip.getInputStream(entry)) {
                for (int n = in.read(buffer); n >= 0; n = in.read(buffer)) {
                    sum.update(buffer, 0, n);
                    total += n;
                    if (total > MOST_BYTES) {
                        throw faults.refuse(
                                "too-large",
                                "the file unpacks to more than " + MOST_BYTES / 1_000_000
                                        + " MB, the most that an input workbook may have");
                    }
                }
            } catch (IOException e) {
                throw faults.refuse(
                        "damaged", "the file is damaged: its part " + entry.getName() + " can't be unpacked");
            }
            sizes.put(key(entry.getName()), total - before);
            if (sum.getValue() != entry.getCrc()) {
                throw faults.refuse(
                        "damaged",
                        "the file is damaged: the checksum of its part " + entry.getName() + " does not agree");
            }
        }
    }

    private static String key(String name) {
        return (name.startsWith("/") ? name.substring(1) : name).toLowerCase(Locale.ROOT);
    }

    @Override
    public void close() {
        try {
            zip.close();
        } catch (IOException e) {
            throw faults.refuse("file-unreadable", "the file can't be closed: " + e.getMessage());
        }
    }
}
