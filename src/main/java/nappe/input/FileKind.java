package nappe.input;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;

/** Tells from its first bytes whether a file can be an .xlsx workbook, and what it looks like where it can't. */
final class FileKind {
    static final long MOST_BYTES = 50_000_000;
    private static final String REMEDY = "; give the input workbook saved as .xlsx";
    private static final int[] OLE2 = {0xD0, 0xCF, 0x11, 0xE0, 0xA1, 0xB1, 0x1A, 0xE1};

    private final Path file;
    private final Faults faults;

    FileKind(Path file, Faults faults) {
        this.file = file;
        this.faults = faults;
    }

    /** Throws where the file isn't a zip of bearable size that can be read. */
    void requireZip() {
        if (!Files.exists(file)) {
            throw faults.refuse("file-missing", "there is no such file in " + folder() + near());
        }
        if (Files.isDirectory(file)) {
            throw faults.refuse("file-is-folder", "this is a folder" + REMEDY);
        }
        if (!Files.isRegularFile(file) || !Files.isReadable(file)) {
            throw faults.refuse("file-unreadable", "the file may not be read; check its permissions");
        }
        try (InputStream in = Files.newInputStream(file)) {
            long size = Files.size(file);
            if (size == 0) {
                throw faults.refuse("file-empty", "the file is empty" + REMEDY);
            }
            if (size > MOST_BYTES) {
                throw faults.refuse(
                        "file-too-large",
                        "the file has " + size / 1_000_000 + " MB, more than the " + MOST_BYTES / 1_000_000
                                + " MB that an input workbook may have");
            }
            requireZip(in.readNBytes(65_536));
        } catch (IOException e) {
            throw faults.refuse("file-unreadable", "the file can't be read: " + e.getMessage());
        }
    }

    private void requireZip(byte[] head) throws IOException {
        String text = new String(head, StandardCharsets.ISO_8859_1);
        String start = text.substring(0, Math.min(1000, text.length())).toLowerCase(Locale.ROOT);
        if (text.startsWith("PK\u0003\u0004")) {
            return;
        }
        if (text.startsWith("PK\u0005\u0006")) {
            throw faults.refuse("not-a-workbook", "this is a zip file with nothing in it" + REMEDY);
        }
        if (isOle2(head)) {
            throw oldKind(new String(Files.readAllBytes(file), StandardCharsets.ISO_8859_1));
        }
        if (start.length() > 3 && start.charAt(0) == 9 && start.charAt(1) <= 8 && start.charAt(1) % 2 == 0) {
            throw oldKind("");
        }
        throw faults.refuse("not-a-workbook", "this is no .xlsx workbook" + look(start) + REMEDY);
    }

    private InputRefused oldKind(String text) {
        if (text.contains("E\0n\0c\0r\0y\0p\0t\0e\0d\0P\0a\0c\0k\0a\0g\0e")) {
            return faults.refuse("encrypted", "the workbook is locked with a password; save it without one");
        }
        return faults.refuse(
                "old-kind", "this is an older binary kind of file, not .xlsx; open it and save it as .xlsx");
    }

    private static boolean isOle2(byte[] head) {
        for (int i = 0; i < OLE2.length; i++) {
            if (i >= head.length || (head[i] & 0xFF) != OLE2[i]) {
                return false;
            }
        }
        return true;
    }

    private String look(String start) {
        if (start.startsWith("%pdf")) {
            return " (it looks like a PDF)";
        }
        if (start.contains("<html") || start.contains("<!doctype html") || start.contains("<table")) {
            return " (it looks like HTML)";
        }
        if (start.contains("<?xml")) {
            return " (it looks like XML)";
        }
        if (file.toString().toLowerCase(Locale.ROOT).endsWith(".csv")) {
            return " (it looks like a CSV file)";
        }
        boolean text = start.chars().allMatch(c -> c >= ' ' || c == '\t' || c == '\r' || c == '\n');
        return text ? " (it looks like plain text)" : " (what it is can't be told)";
    }

    /** The workbook beside it that was most likely meant. */
    private String near() {
        Path folder = file.toAbsolutePath().getParent();
        if (folder == null || !Files.isDirectory(folder)) {
            return folder == null ? "" : ", which is no folder";
        }
        try (Stream<Path> all = Files.list(folder)) {
            List<String> workbooks = all.map(path -> String.valueOf(path.getFileName()))
                    .filter(name -> name.toLowerCase(Locale.ROOT).endsWith(".xlsx"))
                    .sorted()
                    .toList();
            String typed = String.valueOf(file.getFileName());
            String bare = typed.toLowerCase(Locale.ROOT).endsWith(".xlsx")
                    ? typed
                    : typed.replaceAll("\\.\\w*$", "") + ".xlsx";
            return Near.question(bare, workbooks);
        } catch (IOException e) {
            return "";
        }
    }

    private String folder() {
        Path parent = file.toAbsolutePath().getParent();
        return parent == null ? "that place" : parent.toString();
    }
}
