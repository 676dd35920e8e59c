package nappe.method;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import nappe.source.TextException;
import nappe.source.TextLibrary;
import org.jspecify.annotations.Nullable;

/** The method sheets of a library; names and sheets are read once, when they are first asked for. */
public final class MethodLibrary implements MethodCatalogue {
    private final TextLibrary library;
    private final Map<String, MethodSheet> sheets = new ConcurrentHashMap<>();
    private @Nullable List<String> names;

    public MethodLibrary(TextLibrary library) {
        this.library = library;
    }

    /** Where the texts are read from. */
    public TextLibrary library() {
        return library;
    }

    /** The sheet of a name; faults of its text as {@link MethodException}. */
    public MethodSheet sheet(String name) {
        return sheets.computeIfAbsent(name, n -> new MethodReader(library).read(n));
    }

    /** Names of the texts that start with "method"; others are parts to be included. */
    @Override
    public List<String> names() {
        List<String> known = names;
        if (known == null) {
            known = library.names("methods").stream()
                    .filter(name -> name.endsWith(".txt") && isMethod(name))
                    .map(name -> name.substring(0, name.length() - 4))
                    .toList();
            names = known;
        }
        return known;
    }

    /** A text that cannot be read counts as a method, so that whoever names it is told why. */
    private boolean isMethod(String file) {
        try {
            return String.valueOf(library.text("methods/" + file))
                    .lines()
                    .filter(l -> !l.isBlank() && !l.startsWith("#"))
                    .findFirst()
                    .orElse("")
                    .startsWith("method ");
        } catch (TextException e) {
            return true;
        }
    }

    private String textOf(String file) {
        try {
            return String.valueOf(library.text("methods/" + file));
        } catch (TextException e) {
            return "";
        }
    }

    @Override
    public boolean knows(String name) {
        return names().contains(name);
    }

    /** The title as the text has it; known even where the text has faults. */
    @Override
    public String title(String name) {
        return Statement.of(name, textOf(name + ".txt")).stream()
                .filter(statement -> statement.word().equals("method"))
                .map(Statement::rest)
                .findFirst()
                .orElse("");
    }

    @Override
    public List<Declared> declared(String name) {
        List<Declared> declared = new ArrayList<>();
        for (Item item : sheet(name).items()) {
            if (item instanceof Item.Given given && given.role().isEmpty() && given.from() != Item.From.NEIGHBOUR) {
                Declared.Kind kind = switch (given.from()) {
                    case CHOICE -> Declared.Kind.CHOICE;
                    case CASE -> Declared.Kind.CASE;
                    default -> Declared.Kind.ENTRY;
                };
                declared.add(new Declared(
                        kind,
                        given.symbol(),
                        given.unit(),
                        given.label(),
                        given.sign(),
                        given.optional(),
                        given.words()));
            }
        }
        return declared;
    }
}
