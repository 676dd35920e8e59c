package nappe.calculation;

import java.util.LinkedHashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * What the symbols of a method sheet point to at one place of a calculation. A case is a scope under that of the
 * element; a variant of a grid, or a trial row, is a scope under whatever it stands in.
 */
public final class Scope {
    private final @Nullable Scope parent;
    private final Map<String, Reference> own = new LinkedHashMap<>();
    private final Map<String, Scope> atRoots = new LinkedHashMap<>();

    private Scope(@Nullable Scope parent) {
        this.parent = parent;
    }

    /** The scope of an element. */
    public static Scope ofElement() {
        return new Scope(null);
    }

    /** A scope in which some symbols point elsewhere. */
    public Scope inner() {
        return new Scope(this);
    }

    public void put(String symbol, Reference reference) {
        own.put(symbol, reference);
    }

    /** What the symbol points to here, or null. */
    public @Nullable Reference find(String symbol) {
        Reference reference = own.get(symbol);
        return reference != null || parent == null ? reference : parent.find(symbol);
    }

    /** The cell the symbol points to here. */
    public Cell cell(String symbol) {
        if (find(symbol) instanceof Cell cell) {
            return cell;
        }
        throw new IllegalStateException("no cell for " + symbol);
    }

    /** Whether the symbol was put in this very scope. */
    boolean hasOwn(String symbol) {
        return own.containsKey(symbol);
    }

    /** Remembers the scope in which the members of a root stand at its result. */
    void putAtRoot(String root, Scope members) {
        atRoots.put(root, members);
    }

    /**
     * The scope in which the members of a root stand, if the root was laid in this very scope: what a case adds to a root
     * that serves all cases is laid once per case.
     */
    @Nullable
    Scope ownAtRoot(String root) {
        return atRoots.get(root);
    }
}
