package nappe.input;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** The faults of one file as they are found. */
final class Faults {
    /** Beyond so many, what is wrong is the file as a whole, and reading more of them helps nobody. */
    private static final int MOST = 500;

    private final String file;
    private final List<Fault> found = new ArrayList<>();

    Faults(String file) {
        this.file = file;
    }

    void add(String sheet, @Nullable String cell, String code, String message) {
        found.add(new Fault(file, sheet, cell, message, code));
        if (found.size() == MOST) {
            throw refuse("too-many-faults", "more than " + (MOST - 1) + " faults; the rest was not read");
        }
    }

    /** A fault of the whole file after which nothing can be read: to be thrown, with those found before it. */
    InputRefused refuse(String code, String message) {
        List<Fault> all = inOrder();
        all.add(new Fault(file, null, null, message, code));
        return new InputRefused(all);
    }

    int count() {
        return found.size();
    }

    void throwIfAny() {
        if (!found.isEmpty()) {
            throw new InputRefused(inOrder());
        }
    }

    /** Sheet by sheet as they were read, in each from the top down and from left to right. */
    private List<Fault> inOrder() {
        List<String> sheets =
                found.stream().map(f -> String.valueOf(f.sheet())).distinct().toList();
        List<Fault> ordered = new ArrayList<>(found);
        ordered.sort(Comparator.comparingInt((Fault f) -> sheets.indexOf(String.valueOf(f.sheet())))
                .thenComparingInt(f -> row(f.cell()))
                .thenComparingInt(f -> column(f.cell()).length())
                .thenComparing(f -> column(f.cell())));
        return ordered;
    }

    private static int row(@Nullable String cell) {
        return cell == null ? 0 : Integer.parseInt(cell.replaceAll("[A-Z]", ""));
    }

    private static String column(@Nullable String cell) {
        return cell == null ? "" : cell.replaceAll("[0-9]", "");
    }
}
