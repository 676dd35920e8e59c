package nappe.method;

import java.util.Set;
import nappe.formula.FormulaException;
import nappe.source.TextException;
import nappe.source.TextFault;
import nappe.source.TextLibrary;
import nappe.unit.UnitException;
import org.jspecify.annotations.Nullable;

/**
 * Reads the text form of method sheets. The statements are listed in DEVELOPERS.md; {@link StatementReader} says
 * which method reads each. All faults are collected, none that only follows from another.
 */
public final class MethodReader {
    private final TextLibrary library;

    public MethodReader(TextLibrary library) {
        this.library = library;
    }

    /**
     * The method sheet of a name: {@code parshall-flume} stands in {@code methods/parshall-flume.txt}.
     *
     * @throws MethodException with all faults
     */
    public MethodSheet read(String name) {
        SheetDraft draft = new SheetDraft();
        String path = "methods/" + name + ".txt";
        String text = text(path);
        if (text == null) {
            throw new MethodException(java.util.List.of(
                    new TextFault(library.shown(path), 1, 1, "there is no such method sheet", "method-missing", "")));
        }
        readInto(draft, name, text, null, Set.of(name));
        if (draft.title.isEmpty()) {
            draft.faults.add(new TextFault(
                    library.shown(path), 1, 1, "the first statement is \"method\" with a title", "title-missing", ""));
        }
        if (!draft.faults.isEmpty()) {
            throw new MethodException(draft.faults);
        }
        return draft.finish(name, library.house(path));
    }

    private @Nullable String text(String path) {
        try {
            return library.text(path);
        } catch (TextException e) {
            throw new MethodException(e.faults());
        }
    }

    /** Reads a text, or one that it includes, into the draft. */
    void readInto(SheetDraft draft, String name, String text, @Nullable String subscript, Set<String> open) {
        draft.text.append(text).append('\n');
        for (Statement statement : Statement.of(library.shown("methods/" + name + ".txt"), text)) {
            StatementParts parts = new StatementParts(draft, statement, subscript);
            try {
                new StatementReader(parts, this, library, open).read();
            } catch (FormulaException e) {
                parts.spoil();
                if (!e.code().equals(SheetDraft.FOLLOWS)) {
                    draft.faults.add(
                            statement.fault(parts.base() + e.offset(), String.valueOf(e.getMessage()), e.code()));
                }
            } catch (UnitException e) {
                parts.spoil();
                draft.faults.add(statement.fault(parts.base(), String.valueOf(e.getMessage()), "unit-unknown"));
            } catch (TextException e) {
                parts.spoil();
                draft.faults.addAll(e.faults());
            }
        }
    }
}
