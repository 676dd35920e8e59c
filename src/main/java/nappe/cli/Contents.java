package nappe.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HashMap;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import nappe.results.Furniture;
import org.jspecify.annotations.Nullable;

/**
 * The file {@code contents.txt} of a package: what it is, and the hash of each other file.
 *
 * @param words what is said of the package, by the word before the colon
 * @param hashes by file name
 */
record Contents(Map<String, String> words, Map<String, String> hashes) {
    static final String FILE = "contents.txt";
    private static final String HASH = "sha256 ";

    /** The text of the file. */
    static String text(Map<String, byte[]> files, Furniture furniture) {
        StringBuilder text = new StringBuilder();
        text.append("project: ").append(furniture.project()).append('\n');
        text.append("calculation: ").append(furniture.number()).append('\n');
        text.append("revision: ").append(furniture.revision()).append('\n');
        text.append("date: ").append(furniture.date()).append('\n');
        text.append("status: ").append(furniture.status()).append('\n');
        text.append("fingerprint: ").append(furniture.fingerprint()).append('\n');
        text.append("made by: nappe ").append(furniture.version()).append('\n');
        new TreeMap<>(files)
                .forEach((file, bytes) -> text.append(HASH)
                        .append(hash(bytes))
                        .append("  ")
                        .append(file)
                        .append('\n'));
        return text.toString();
    }

    /** What a folder says of itself; null where it does not, and then this program has not written it. */
    static @Nullable Contents of(Path folder) {
        Path file = folder.resolve(FILE);
        Map<String, String> words = new HashMap<>();
        Map<String, String> hashes = new HashMap<>();
        if (!Files.isRegularFile(file)) {
            return null;
        }
        try {
            for (String line : Files.readAllLines(file)) {
                if (line.startsWith(HASH)) {
                    List<String> pair = List.of(line.substring(HASH.length()).split("  ", 2));
                    hashes.put(pair.get(pair.size() - 1), pair.get(0));
                } else if (line.contains(": ")) {
                    words.putIfAbsent(line.substring(0, line.indexOf(": ")), line.substring(line.indexOf(": ") + 2));
                }
            }
        } catch (IOException e) {
            return null;
        }
        return words.containsKey("status") ? new Contents(words, hashes) : null;
    }

    /** Whether it must stay as it is for good. */
    boolean isFinal() {
        return word("status").equals("issued") || word("status").equals("superseded");
    }

    /** What one reads behind a word, or nothing. */
    String word(String word) {
        return words.getOrDefault(word, "");
    }

    /** Whether the file is as it was written. */
    boolean agrees(Path file) throws IOException {
        return Files.isRegularFile(file)
                && hash(Files.readAllBytes(file)).equals(hashes.get(String.valueOf(file.getFileName())));
    }

    /** Whether every file stands in the folder as it was written. */
    boolean isWhole(Path folder) throws IOException {
        for (String name : hashes.keySet()) {
            if (!agrees(folder.resolve(name))) {
                return false;
            }
        }
        return true;
    }

    static String hash(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
    }
}
