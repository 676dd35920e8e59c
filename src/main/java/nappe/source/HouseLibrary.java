package nappe.source;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/**
 * A folder of the user's own method sheets, tables, check values and figures, together with the built-in ones. The folder is
 * laid out as the built-in texts are; a text of the house may include and use built-in ones. Nothing built in is replaced:
 * a house file that has the name of a built-in one is refused.
 */
public final class HouseLibrary implements TextLibrary {
    private static final Pattern PATH = Pattern.compile("[a-z]+/[A-Za-z0-9-]+\\.(txt|csv)");

    /** Printed in the package, so it must be in letters that the typefaces have. */
    private static final Pattern NAME = Pattern.compile("[\\p{IsLatin}0-9][\\p{IsLatin}0-9 ._-]{0,59}");

    private final TextLibrary builtIn;
    private final HouseFiles files;
    private final String name;

    private HouseLibrary(TextLibrary builtIn, HouseFiles files, String name) {
        this.builtIn = builtIn;
        this.files = files;
        this.name = name;
    }

    /**
     * Reads a house folder.
     *
     * @throws TextException with all faults that are of no single method: no such folder, a name that is taken
     */
    public static HouseLibrary open(Path folder, TextLibrary builtIn) {
        HouseFiles files = HouseFiles.read(folder);
        String name = String.valueOf(folder.toAbsolutePath().normalize().getFileName());
        List<TextFault> faults = new ArrayList<>();
        if (!NAME.matcher(name).matches()) {
            faults.add(TextFault.ofFile(
                    folder.toString(),
                    "the folder's name is printed in the package; give it one of at most 60 letters, digits, blanks,"
                            + " dots, hyphens and underscores",
                    "name-unclear"));
        }
        HouseLibrary library = new HouseLibrary(builtIn, files, name);
        library.paths().forEach(path -> library.refuseTaken(path, faults));
        if (!faults.isEmpty()) {
            throw new TextException(faults);
        }
        return library;
    }

    private void refuseTaken(String path, List<TextFault> faults) {
        String folder = path.substring(0, path.indexOf('/'));
        String file = path.substring(path.indexOf('/') + 1);
        boolean taken = contains(builtIn.names(folder), file)
                || folder.equals("figures") && contains(builtIn.names("methods"), file);
        if (taken) {
            faults.add(TextFault.ofFile(
                    files.shown(path),
                    "this name is taken by a built-in file, and nothing built in is replaced; rename it, for example "
                            + folder + "/our-" + file,
                    "name-taken"));
        }
    }

    /** Small and capital letters are the same to some file systems. */
    private static boolean contains(List<String> names, String file) {
        return names.stream().anyMatch(file::equalsIgnoreCase);
    }

    private TreeSet<String> paths() {
        TreeSet<String> paths = new TreeSet<>(files.texts().keySet());
        paths.addAll(files.unreadable().keySet());
        return paths;
    }

    /** The name of the folder, as the package prints it. */
    public String name() {
        return name;
    }

    @Override
    public @Nullable String text(String path) {
        List<TextFault> faults = files.unreadable().get(path);
        if (faults != null) {
            throw new TextException(faults);
        }
        String own = files.texts().get(path);
        return own != null ? own : PATH.matcher(path).matches() ? builtIn.text(path) : null;
    }

    @Override
    public List<String> names(String folder) {
        TreeSet<String> names = new TreeSet<>(builtIn.names(folder));
        names.addAll(ownNames(folder));
        return List.copyOf(names);
    }

    /** The file names of the house in a folder such as {@code methods}, in alphabetical order. */
    public List<String> ownNames(String folder) {
        return paths().stream()
                .filter(path -> path.startsWith(folder + "/"))
                .map(path -> path.substring(folder.length() + 1))
                .toList();
    }

    @Override
    public String shown(String path) {
        return house(path).isEmpty() ? builtIn.shown(path) : files.shown(path);
    }

    @Override
    public String house(String path) {
        return files.texts().containsKey(path) || files.unreadable().containsKey(path) ? name : "";
    }

    /** Faults of files and folders that nothing can name, so that they hinder no method. */
    public List<TextFault> strays() {
        return List.copyOf(files.strays());
    }

    /** What stands in the folder and is no part of it, in words. */
    public List<String> passedOver() {
        return List.copyOf(files.passedOver());
    }
}
