package nappe.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Duration;
import java.util.Comparator;
import java.util.Map;
import java.util.stream.Stream;
import nappe.input.NotWritten;
import nappe.results.Furniture;

/**
 * The folder of one revision of a package. It is written beside its place, under a name with a point before it, and then moved
 * there whole. While a run writes it holds the lock of the folder around it; so what another run finds there beside the
 * package is left from one that was killed, and is cleared.
 */
final class PackageFolder {
    private static final Duration PATIENCE = Duration.ofSeconds(30);

    private final Path parent;
    private final PackageName name;
    private final Path path;
    private final Path fresh;
    private final Path old;

    private PackageFolder(Path parent, PackageName name) {
        this.parent = parent;
        this.name = name;
        this.path = parent.resolve(name.toString());
        this.fresh = parent.resolve("." + name + ".new");
        this.old = parent.resolve("." + name + ".old");
    }

    static PackageFolder of(Path parent, String number, String revision) {
        return new PackageFolder(parent, new PackageName(number, revision));
    }

    String name() {
        return name.toString();
    }

    Path path() {
        return path;
    }

    /** Refuses, before anything is computed, what could not be written afterwards. */
    void prepare() throws IOException {
        requireWritableParent();
        if (Files.exists(path) || Files.exists(fresh) || Files.exists(old)) {
            FolderLock.hold(parent, PATIENCE, () -> {
                clear();
                requireReplaceable();
            });
        }
    }

    private void requireWritableParent() {
        Path there = parent.toAbsolutePath();
        while (!Files.exists(there) && there.getParent() != null) {
            there = there.getParent();
        }
        if (!Files.isDirectory(there)) {
            throw new Refusal(
                    ExitStatus.WRONG_USAGE,
                    there + " is a file, not a folder; name a folder with -o (fault: folder-expected)");
        }
        if (!Files.isWritable(there)) {
            throw new Refusal(
                    ExitStatus.INTERNAL_FAULT,
                    "there is no right to write in the folder " + there
                            + "; get it, or name another folder with -o. Nothing was changed. (fault: file)");
        }
    }

    private void requireReplaceable() throws IOException {
        if (Files.exists(path)) {
            new StandingPackage(path).requireReplaceable(name);
        }
    }

    /** Writes the package; one that stands there is replaced where nothing of anybody's is lost. */
    void write(Map<String, byte[]> files, Furniture furniture) throws IOException {
        try {
            Files.createDirectories(parent);
            FolderLock.hold(parent, PATIENCE, () -> {
                clear();
                requireReplaceable();
                fill(files, furniture);
                replace();
            });
        } catch (IOException e) {
            throw new NotWritten(path, e);
        }
    }

    /** Puts right what a killed run left; only where the lock is held. */
    private void clear() throws IOException {
        Contents contents = Contents.of(old);
        if (contents != null && contents.isWhole(old) && !Files.exists(path)) {
            Files.move(old, path, StandardCopyOption.ATOMIC_MOVE);
        }
        delete(old);
        delete(fresh);
    }

    private void fill(Map<String, byte[]> files, Furniture furniture) throws IOException {
        try {
            Files.createDirectory(fresh);
            for (Map.Entry<String, byte[]> file : files.entrySet()) {
                Files.write(fresh.resolve(file.getKey()), file.getValue());
            }
            Files.writeString(fresh.resolve(Contents.FILE), Contents.text(files, furniture), StandardCharsets.UTF_8);
            open(fresh);
        } catch (IOException e) {
            delete(fresh);
            throw e;
        }
    }

    /** The package is for whoever may read its parent, whatever the habits of the one who makes it. */
    private static void open(Path folder) throws IOException {
        if (Files.getFileStore(folder).supportsFileAttributeView("posix")) {
            Files.setPosixFilePermissions(folder, PosixFilePermissions.fromString("rwxr-xr-x"));
        }
    }

    private void replace() throws IOException {
        try {
            if (Files.exists(path)) {
                Files.move(path, old, StandardCopyOption.ATOMIC_MOVE);
            }
            Files.move(fresh, path, StandardCopyOption.ATOMIC_MOVE);
        } catch (IOException e) {
            if (!Files.exists(path) && Files.exists(old)) {
                Files.move(old, path, StandardCopyOption.ATOMIC_MOVE);
            }
            delete(fresh);
            throw e;
        }
        delete(old);
    }

    /** The list of contents goes first: what is left of a folder half deleted is no package. */
    private static void delete(Path folder) throws IOException {
        if (Files.exists(folder)) {
            Files.deleteIfExists(folder.resolve(Contents.FILE));
            try (Stream<Path> all = Files.walk(folder)) {
                for (Path one : all.sorted(Comparator.reverseOrder()).toList()) {
                    Files.delete(one);
                }
            }
        }
    }
}
