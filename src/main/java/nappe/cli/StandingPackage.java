package nappe.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;

/** What stands where a package would go. It is replaced only where that loses nothing. */
final class StandingPackage {
    /** What programs for looking at folders leave behind; common practice, no source. */
    private static final Set<String> OF_THE_SYSTEM = Set.of(".DS_Store", "Thumbs.db", "desktop.ini");

    private final Path path;

    StandingPackage(Path path) {
        this.path = path;
    }

    /**
     * Refuses where the folder holds an issued revision, another calculation, or something that somebody else put or changed there.
     *
     * @param name of the package that would take its place
     */
    void requireReplaceable(PackageName name) throws IOException {
        Contents contents = Contents.of(path);
        if (contents == null) {
            throw refusal(
                    " is there already and was not written by nappe; move it away or name another folder with -o");
        }
        if (contents.isFinal()) {
            throw refusal(" holds an issued revision; it is never written over. Give the change a revision of its own");
        }
        boolean same = contents.word("calculation").equals(name.number())
                && contents.word("revision").equals(name.revision());
        if (!same) {
            throw refusal(" holds another calculation: number " + contents.word("calculation") + ", revision "
                    + contents.word("revision")
                    + ". Its number differs only in signs that a file name cannot have; name another folder with -o");
        }
        for (Path file : files()) {
            requireOurs(file, contents);
        }
    }

    private void requireOurs(Path file, Contents contents) throws IOException {
        String name = String.valueOf(file.getFileName());
        if (name.equals(Contents.FILE) || OF_THE_SYSTEM.contains(name) || contents.agrees(file)) {
            return;
        }
        if (name.startsWith(".~lock.") || name.startsWith("~$")) {
            throw refusal(
                    " is in use: " + name + " says that a file is open in another program. Close it and run again");
        }
        throw refusal(
                contents.hashes().containsKey(name)
                        ? " holds the file " + name
                                + ", which was changed since nappe wrote it. Move it away if the change"
                                + " is needed, or delete it, and run again"
                        : " holds " + name + ", which nappe did not write. Move it away and run again");
    }

    private List<Path> files() throws IOException {
        try (Stream<Path> files = Files.list(path)) {
            return files.sorted().toList();
        }
    }

    private Refusal refusal(String what) {
        return new Refusal(ExitStatus.WOULD_OVERWRITE, path + what + " (fault: would-overwrite)");
    }
}
