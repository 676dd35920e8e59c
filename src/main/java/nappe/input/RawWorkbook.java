package nappe.input;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** A workbook as the file holds it. */
record RawWorkbook(List<RawSheet> sheets, boolean from1904) {
    /** The sheet of that name, in capitals or not, or null. */
    @Nullable
    RawSheet sheet(String name) {
        return sheets.stream()
                .filter(s -> s.name().equalsIgnoreCase(name))
                .findFirst()
                .orElse(null);
    }
}
