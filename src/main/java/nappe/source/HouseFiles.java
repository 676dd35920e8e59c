package nappe.source;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;

/**
 * The files of a house folder, read once. A file that cannot be read keeps its faults and hinders only what would use it; a
 * file that nothing can name is told in words.
 */
final class HouseFiles {
    /** The folders in it, as built-in texts have them, and the ending of the files in each. */
    static final Map<String, String> ENDINGS =
            new TreeMap<>(Map.of("methods", ".txt", "tables", ".csv", "checks", ".csv", "figures", ".txt"));

    private static final int LARGEST = 1_000_000;
    private static final int MOST = 500;

    private final String shown;
    private final Path root;
    private final Map<String, String> texts = new TreeMap<>();
    private final Map<String, List<TextFault>> unreadable = new TreeMap<>();
    private final List<TextFault> strays = new ArrayList<>();
    private final List<String> passedOver = new ArrayList<>();

    private HouseFiles(Path folder) throws IOException {
        this.shown = folder.toString().replace('\\', '/');
        this.root = folder.toRealPath();
    }

    /** @throws TextException where there is no such folder, or it is not laid out as a house folder */
    static HouseFiles read(Path folder) {
        String shown = folder.toString().replace('\\', '/');
        try {
            if (!Files.isDirectory(folder)) {
                throw refused(
                        shown,
                        Files.exists(folder)
                                ? "this is a file; name the folder that holds methods, tables, checks and figures"
                                : "there is no such folder",
                        "house-missing");
            }
            HouseFiles files = new HouseFiles(folder);
            files.readAll();
            return files;
        } catch (IOException e) {
            throw refused(shown, inWords(e), "house-unreadable");
        }
    }

    private static TextException refused(String shown, String message, String code) {
        return new TextException(List.of(TextFault.ofFile(shown, message, code)));
    }

    private void readAll() throws IOException {
        int known = 0;
        for (Path entry : list(root)) {
            String name = String.valueOf(entry.getFileName());
            String ending = ENDINGS.get(name);
            if (ending != null && Files.isDirectory(entry)) {
                known++;
                readFolder(entry, name, ending);
            } else if (Files.isDirectory(entry) || name.endsWith(".txt") || name.endsWith(".csv")) {
                passedOver.add(
                        shown(name) + " is not read: a house folder holds " + String.join(", ", ENDINGS.keySet()));
            }
        }
        if (known == 0) {
            throw refused(
                    shown,
                    "none of the folders " + String.join(", ", ENDINGS.keySet())
                            + " is in it; put each method sheet into methods, as methods/NAME.txt",
                    "house-empty");
        }
        if (texts.size() + unreadable.size() > MOST) {
            throw refused(
                    shown, "more than " + MOST + " files; name the folder of the house methods only", "house-large");
        }
    }

    private void readFolder(Path folder, String name, String ending) {
        try {
            if (!folder.toRealPath().startsWith(root)) {
                strays.add(TextFault.ofFile(
                        shown(name),
                        "a link to outside the house folder; put the files themselves into it",
                        "link-outside"));
                return;
            }
            for (Path file : list(folder)) {
                String own = String.valueOf(file.getFileName());
                String path = name + "/" + own;
                if (Files.isDirectory(file) || !own.endsWith(ending)) {
                    passedOver.add(shown(path) + " is not read: " + name + " holds files that end in " + ending);
                } else if (!own.substring(0, own.length() - 4).matches("[A-Za-z0-9-]+")) {
                    strays.add(TextFault.ofFile(
                            shown(path),
                            "the name may hold letters (a to z), digits and hyphens, and nothing else; rename the file",
                            "name-unclear"));
                } else {
                    readFile(file, path);
                }
            }
        } catch (IOException e) {
            strays.add(TextFault.ofFile(shown(name), inWords(e), "file-unreadable"));
        }
    }

    private void readFile(Path file, String path) {
        try {
            Path real = file.toRealPath();
            if (!real.startsWith(root)) {
                fault(path, "a link to outside the house folder; put the file itself into it", "link-outside");
            } else if (!Files.isRegularFile(real)) {
                fault(path, "this is not a file that can be read", "file-unreadable");
            } else {
                readText(real, path);
            }
        } catch (TextException e) {
            unreadable.put(path, e.faults());
        } catch (NoSuchFileException e) {
            fault(path, "a link to a file that is not there", "file-unreadable");
        } catch (IOException e) {
            fault(path, inWords(e), "file-unreadable");
        }
    }

    private void readText(Path file, String path) throws IOException {
        try (InputStream in = Files.newInputStream(file)) {
            byte[] bytes = in.readNBytes(LARGEST + 1);
            if (bytes.length > LARGEST) {
                fault(path, "more than " + LARGEST + " bytes; a method sheet or a table is far shorter", "file-large");
            } else {
                texts.put(path, StrictText.of(shown(path), bytes));
            }
        }
    }

    private void fault(String path, String message, String code) {
        unreadable.put(path, List.of(TextFault.ofFile(shown(path), message, code)));
    }

    /** What stands in a folder, in alphabetical order, without hidden files and what editors leave behind. */
    private static List<Path> list(Path folder) throws IOException {
        try (Stream<Path> all = Files.list(folder)) {
            return all.filter(file -> !String.valueOf(file.getFileName()).matches("\\..*|.*~"))
                    .sorted()
                    .toList();
        }
    }

    private static String inWords(IOException e) {
        return e instanceof AccessDeniedException
                ? "there is no right to read it"
                : "it cannot be read: " + e.getMessage();
    }

    /** How messages name a path: the folder as typed, and the path in it. */
    String shown(String path) {
        return shown.endsWith("/") ? shown + path : shown + "/" + path;
    }

    /** The texts by path. */
    Map<String, String> texts() {
        return texts;
    }

    /** The faults of files that could not be read, by path. */
    Map<String, List<TextFault>> unreadable() {
        return unreadable;
    }

    /** Faults of files and folders that nothing can name. */
    List<TextFault> strays() {
        return strays;
    }

    /** What stands in the folder and is no part of it, in words. */
    List<String> passedOver() {
        return passedOver;
    }
}
