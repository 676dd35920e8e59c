package nappe.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Comparator;
import java.util.HexFormat;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import nappe.results.Furniture;

/**
 * The folder of one revision of a package. It is written beside its place and then moved there whole. A file {@code
 * contents.txt} says status, fingerprint and the hash of each file; a folder whose status is issued, or that this program
 * did not write, is never replaced.
 */
final class PackageFolder {
    private static final String CONTENTS = "contents.txt";

    private final Path path;
    private final String name;

    private PackageFolder(Path path, String name) {
        this.path = path;
        this.name = name;
    }

    static PackageFolder of(Path parent, String number, String revision) {
        String name = safe(number) + "_rev-" + safe(revision);
        return new PackageFolder(parent.resolve(name), name);
    }

    private static String safe(String text) {
        String kept = text.strip().replaceAll("[^A-Za-z0-9.-]+", "-").replaceAll("^[.-]+|[.-]+$", "");
        return kept.isEmpty() ? "0" : kept;
    }

    String name() {
        return name;
    }

    Path path() {
        return path;
    }

    void refuseIfIssued() throws IOException {
        if (!Files.exists(path)) {
            return;
        }
        Path contents = path.resolve(CONTENTS);
        if (!Files.isRegularFile(contents)) {
            throw new Refusal(
                    ExitStatus.WOULD_OVERWRITE,
                    path + " is there already and was not written by nappe; move it away or name another folder with -o"
                            + " (fault: would-overwrite)");
        }
        if (Files.readString(contents)
                .lines()
                .anyMatch(line -> line.equals("status: issued") || line.equals("status: superseded"))) {
            throw new Refusal(
                    ExitStatus.WOULD_OVERWRITE,
                    path + " holds an issued revision; it is never written over. Give the change a revision of its own"
                            + " (fault: would-overwrite)");
        }
    }

    void write(Map<String, byte[]> files, Furniture furniture) throws IOException {
        Path parent = java.util.Objects.requireNonNull(path.toAbsolutePath().getParent());
        if (Files.exists(parent) && !Files.isDirectory(parent)) {
            throw new Refusal(ExitStatus.WRONG_USAGE, parent + " is a file, not a folder; name a folder with -o");
        }
        Files.createDirectories(parent);
        Path fresh = Files.createTempDirectory(parent, "." + name + "-");
        try {
            for (Map.Entry<String, byte[]> file : files.entrySet()) {
                Files.write(fresh.resolve(file.getKey()), file.getValue());
            }
            Files.writeString(fresh.resolve(CONTENTS), contents(files, furniture), StandardCharsets.UTF_8);
            open(fresh);
            replace(fresh, parent);
        } finally {
            delete(fresh);
        }
    }

    /** A temporary folder is for its owner only; the package is for whoever may read its parent. */
    private static void open(Path fresh) throws IOException {
        if (Files.getFileStore(fresh).supportsFileAttributeView("posix")) {
            Files.setPosixFilePermissions(fresh, java.nio.file.attribute.PosixFilePermissions.fromString("rwxr-xr-x"));
        }
    }

    private void replace(Path fresh, Path parent) throws IOException {
        Path old = null;
        if (Files.exists(path)) {
            refuseIfIssued();
            old = Files.createTempDirectory(parent, "." + name + "-old-");
            Files.move(path, old, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.ATOMIC_MOVE);
        }
        try {
            Files.move(fresh, path, StandardCopyOption.ATOMIC_MOVE);
        } catch (IOException e) {
            if (old != null) {
                Files.move(old, path, StandardCopyOption.ATOMIC_MOVE);
            }
            throw e;
        }
        if (old != null) {
            delete(old);
        }
    }

    private static String contents(Map<String, byte[]> files, Furniture furniture) {
        StringBuilder text = new StringBuilder();
        text.append("project: ").append(furniture.project()).append('\n');
        text.append("calculation: ").append(furniture.number()).append('\n');
        text.append("revision: ").append(furniture.revision()).append('\n');
        text.append("date: ").append(furniture.date()).append('\n');
        text.append("status: ").append(furniture.status()).append('\n');
        text.append("fingerprint: ").append(furniture.fingerprint()).append('\n');
        text.append("made by: nappe ").append(furniture.version()).append('\n');
        new TreeMap<>(files)
                .forEach((file, bytes) -> text.append("sha256 ")
                        .append(hash(bytes))
                        .append("  ")
                        .append(file)
                        .append('\n'));
        return text.toString();
    }

    private static String hash(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
    }

    private static void delete(Path folder) throws IOException {
        if (Files.exists(folder)) {
            try (Stream<Path> all = Files.walk(folder)) {
                for (Path one : all.sorted(Comparator.reverseOrder()).toList()) {
                    Files.delete(one);
                }
            }
        }
    }
}
