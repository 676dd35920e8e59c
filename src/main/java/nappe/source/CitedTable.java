package nappe.source;

import java.util.List;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * A published table, read from CSV with its source inside:
 *
 * <pre>
 * # title: Coefficients of a contracted weir
 * # source: where the numbers were read, in words
 * # any other remark
 * r_b [1], a [1], k_b [mm], remark
 * 0.2, 0.589, 2.4, from memory
 * </pre>
 *
 * A column with a unit holds numbers, one without holds words. A blank number is "not given".
 */
public final class CitedTable {
    /** One column; {@code unit} is null for words. */
    public record Column(String symbol, @Nullable Unit unit, List<Value> values) {
        public boolean isWords() {
            return unit == null;
        }

        public boolean hasBlanks() {
            return values.stream().anyMatch(Value.None.class::isInstance);
        }

        /** What can be said of the sign of every number in it. */
        public Sign sign() {
            double least = values.stream()
                    .filter(Value.Number.class::isInstance)
                    .mapToDouble(value -> ((Value.Number) value).value())
                    .min()
                    .orElse(1);
            return least > 0 ? Sign.POSITIVE : least == 0 ? Sign.NOT_NEGATIVE : Sign.ANY;
        }
    }

    private final String name;
    private final String house;
    private final String title;
    private final String source;
    private final List<String> remarks;
    private final List<Column> columns;

    CitedTable(String name, String house, String title, String source, List<String> remarks, List<Column> columns) {
        this.name = name;
        this.house = house;
        this.title = title;
        this.source = source;
        this.remarks = remarks;
        this.columns = columns;
    }

    /** The file name without its ending: {@code kindsvater-carter}. */
    public String name() {
        return name;
    }

    /** The name of the house whose own table it is; empty for one that comes with Nappe. */
    public String house() {
        return house;
    }

    public String title() {
        return title;
    }

    public String source() {
        return source;
    }

    public List<String> remarks() {
        return remarks;
    }

    public List<Column> columns() {
        return columns;
    }

    public int rows() {
        return columns.get(0).values().size();
    }

    /** The column with the symbol, or null. */
    public @Nullable Column column(String symbol) {
        return columns.stream()
                .filter(c -> c.symbol().equals(symbol))
                .findFirst()
                .orElse(null);
    }

    /** The names of its columns, for messages. */
    public String columnNames() {
        return String.join(", ", columns.stream().map(Column::symbol).toList());
    }

    /**
     * Reads a table that comes with Nappe.
     *
     * @throws TextException with all faults by line and column, where it is not such a table
     */
    public static CitedTable read(String name, String text) {
        return TableReader.read(name, "", name + ".csv", text);
    }

    /**
     * The table of a library, or null where it has none of the name.
     *
     * @throws TextException with all faults by line and column, where it is not such a table
     */
    public static @Nullable CitedTable from(TextLibrary library, String name) {
        String path = "tables/" + name + ".csv";
        String text = library.text(path);
        return text == null ? null : TableReader.read(name, library.house(path), library.shown(path), text);
    }
}
