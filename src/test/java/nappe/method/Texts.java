package nappe.method;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import nappe.source.TextLibrary;
import org.jspecify.annotations.Nullable;

/** A library of texts in memory: invented methods and tables for tests. */
public final class Texts implements TextLibrary {
    private final Map<String, String> texts = new TreeMap<>();
    private String house = "";

    /** Makes all of it the own texts of a house. */
    public Texts ofHouse(String name) {
        this.house = name;
        return this;
    }

    @Override
    public String house(String path) {
        return house;
    }

    public Texts with(String path, String text) {
        texts.put(path, text);
        return this;
    }

    public Texts method(String name, String text) {
        return with("methods/" + name + ".txt", text);
    }

    /** A table with an invented title and source over the rows given. */
    public Texts table(String name, String rows) {
        return with("tables/" + name + ".csv", "# title: Pretend table\n# source: invented for a test\n" + rows);
    }

    @Override
    public @Nullable String text(String path) {
        return texts.get(path);
    }

    @Override
    public List<String> names(String folder) {
        return texts.keySet().stream()
                .filter(path -> path.startsWith(folder + "/"))
                .map(path -> path.substring(folder.length() + 1))
                .toList();
    }
}
