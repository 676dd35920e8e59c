package nappe.deliver.xlsx;

import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.regex.Pattern;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Sheet;

/**
 * The defined names of the package: one for each cell of a line, from the line's code and, where it holds for one case
 * only, the number of the case: {@code F1_07}, {@code F1_07_case_2}. They identify cells for whoever looks for them
 * later; formulas do not use them. Spreadsheet programs do not tell capitals from small letters in names.
 */
public final class CellNames {
    private static final Pattern LIKE_AN_ADDRESS =
            Pattern.compile("[A-Z]{1,3}\\d+|R\\d*C?\\d*|C\\d*|TRUE|FALSE", Pattern.CASE_INSENSITIVE);

    private final Map<String, Cell> names = new LinkedHashMap<>();
    private final Set<String> taken = new HashSet<>();

    private CellNames() {}

    /** The names in the order of the sheets, each with its cell. */
    public static Map<String, Cell> of(List<Sheet> sheets) {
        CellNames all = new CellNames();
        for (Sheet sheet : sheets) {
            for (Block block : sheet.blocks()) {
                if (block instanceof Block.Lines lines) {
                    lines.lines().forEach(all::name);
                }
            }
        }
        return all.names;
    }

    private void name(Block.Line line) {
        String code = safe(line.code());
        Cell forAll = line.forAll();
        if (forAll != null) {
            names.put(unique(code), forAll);
        }
        for (int i = 0; i < line.perCase().size(); i++) {
            names.put(unique(code + "_case_" + (i + 1)), line.perCase().get(i));
        }
    }

    private static String safe(String code) {
        String name = code.replaceAll("[^A-Za-z0-9]+", "_");
        boolean fits = !name.isEmpty()
                && Character.isLetter(name.charAt(0))
                && !LIKE_AN_ADDRESS.matcher(name).matches();
        return fits ? name : "line_" + name;
    }

    private String unique(String name) {
        String free = name;
        for (int i = 2; !taken.add(free.toLowerCase(Locale.ROOT)); i++) {
            free = name + "_" + (char) ('a' + (i - 2) % 26) + (i - 2) / 26;
        }
        return free;
    }
}
