package nappe.input;

import java.util.ArrayList;
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
        found.add(new Fault(file, null, null, message, code));
        return new InputRefused(found);
    }

    int count() {
        return found.size();
    }

    void throwIfAny() {
        if (!found.isEmpty()) {
            throw new InputRefused(found);
        }
    }
}
