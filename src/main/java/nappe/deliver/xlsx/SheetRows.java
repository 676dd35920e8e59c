package nappe.deliver.xlsx;

import java.util.Map;
import java.util.TreeMap;
import nappe.calculation.Place;
import nappe.formula.Value;

/** The rows of one sheet, written without the help of a library, in ascending order. */
final class SheetRows {
    private static final double TALLEST = 409;
    private static final double PLAIN = 13;

    private record Filled(int style, Filling content) {}

    private final String sheet;
    private final TreeMap<Integer, TreeMap<Integer, Filled>> rows = new TreeMap<>();
    private final Map<Integer, Double> heights = new TreeMap<>();

    SheetRows(String sheet) {
        this.sheet = sheet;
    }

    void put(int row, int column, int style, Filling content) {
        Filled before = rows.computeIfAbsent(row, key -> new TreeMap<>()).put(column, new Filled(style, content));
        if (before != null) {
            throw new IllegalStateException("two contents for " + new Place(sheet, row, column).full() + ": "
                    + before.content + ", " + content);
        }
    }

    /** A style for a place that nothing else fills. */
    void fill(int row, int column, int style) {
        rows.computeIfAbsent(row, key -> new TreeMap<>()).putIfAbsent(column, new Filled(style, new Filling.Blank()));
    }

    /** Makes a row at least so many points high. */
    void atLeast(int row, double points) {
        heights.merge(row, Math.min(TALLEST, points), Math::max);
        rows.computeIfAbsent(row, key -> new TreeMap<>());
    }

    int lastRow() {
        return rows.isEmpty() ? 0 : rows.lastKey();
    }

    int lastColumn() {
        return rows.values().stream()
                .filter(row -> !row.isEmpty())
                .mapToInt(TreeMap::lastKey)
                .max()
                .orElse(0);
    }

    /** The height of a row in points; of one that asks for none, that of plain type. */
    double height(int row) {
        return heights.getOrDefault(row, PLAIN);
    }

    String dimension() {
        return "A1:" + Place.letters(lastColumn()) + (lastRow() + 1);
    }

    String xml() {
        StringBuilder out = new StringBuilder("<sheetData>");
        rows.forEach((number, row) -> {
            out.append("<row r=\"").append(number + 1).append('"');
            Double height = heights.get(number);
            if (height != null) {
                out.append(" ht=\"").append(height).append("\" customHeight=\"1\"");
            }
            out.append('>');
            row.forEach((column, filled) -> {
                out.append("<c r=\"").append(Place.letters(column)).append(number + 1);
                out.append("\" s=\"").append(filled.style).append('"');
                write(filled.content, out);
            });
            out.append("</row>");
        });
        return out.append("</sheetData>").toString();
    }

    private static void write(Filling content, StringBuilder out) {
        if (content instanceof Filling.Shared shared) {
            out.append(" t=\"s\"><v>").append(shared.index()).append("</v></c>");
        } else if (content instanceof Filling.Typed typed) {
            out.append("><v>").append(number(typed.value())).append("</v></c>");
        } else if (content instanceof Filling.Live live) {
            boolean isNumber = live.value() instanceof Value.Number;
            out.append(isNumber ? "><f>" : " t=\"str\"><f>");
            out.append(Texts.xml(Texts.formula(live.formula()))).append("</f><v>");
            out.append(shown(live.value())).append("</v></c>");
        } else {
            out.append("/>");
        }
    }

    private static String shown(Value value) {
        if (value instanceof Value.Number number) {
            return number(number.value());
        }
        return Texts.xml(Texts.content(words(value)));
    }

    /** The words of a value that is no number. */
    static String words(Value value) {
        if (value instanceof Value.Word word) {
            return word.text();
        }
        if (value instanceof Value.None none) {
            return none.why();
        }
        throw new IllegalArgumentException("a number has no words");
    }

    private static String number(double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalStateException("not a finite number: " + value);
        }
        return Double.toString(value);
    }
}
