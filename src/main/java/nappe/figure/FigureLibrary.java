package nappe.figure;

import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import nappe.method.MethodException;
import nappe.method.MethodSheet;
import nappe.source.TextException;
import nappe.source.TextLibrary;

/** The figure files of a library, read when they are first asked for. */
public final class FigureLibrary {
    private final TextLibrary library;
    private final Map<String, Optional<FigureSheet>> sheets = new ConcurrentHashMap<>();

    public FigureLibrary(TextLibrary library) {
        this.library = library;
    }

    /**
     * The figure of a method: {@code parshall-flume} is drawn by {@code figures/parshall-flume.txt}; empty where there is
     * no such text.
     *
     * @throws nappe.method.MethodException with all faults of the text
     */
    public Optional<FigureSheet> of(MethodSheet method) {
        return sheets.computeIfAbsent(method.name(), name -> read(method));
    }

    private Optional<FigureSheet> read(MethodSheet method) {
        String path = "figures/" + method.name() + ".txt";
        try {
            String text = library.text(path);
            return text == null ? Optional.empty() : Optional.of(FigureReader.read(method, library.shown(path), text));
        } catch (TextException e) {
            throw new MethodException(e.faults());
        }
    }
}
