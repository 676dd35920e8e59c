package nappe.deliver.csv;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.formula.Formula;
import nappe.formula.PlainReading;
import nappe.formula.Value;
import nappe.results.Digits;
import nappe.results.Furniture;
import nappe.results.Results;

/**
 * A rating table as comma-separated text, for a flow computer or a logger:
 *
 * <pre>
 * # Project: Weaver pretend works
 * # Input fingerprint: 1f3a 99c0 5e77 0b12
 * "Head (ft)","Flow (ft3/s)"
 * 0.35,1.1379
 * 0.36,"no result"
 * </pre>
 *
 * <p>Lines that start with {@code #} say what the table belongs to. Numbers have a point, twelve figures at most and
 * no quotes; every text is quoted, and one that a spreadsheet program would run as a formula has an apostrophe before it.
 * Lines end in carriage return and line feed.
 */
public final class RatingCsv {
    private static final String END = "\r\n";
    private static final Pattern WOULD_RUN = Pattern.compile("^\\s*[=+\\-@\\t\\r]");
    private static final Pattern WOULD_RUN_AFTER_A_CUT = Pattern.compile("([,;\\t]\\s*)([=+\\-@])");

    /** More than any instrument needs, few enough that 0.1 + 0.2 is 0.3. */
    private static final MathContext FIGURES = new MathContext(12);

    private final Results results;

    private RatingCsv(Results results) {
        this.results = results;
    }

    /** The table with its head lines. */
    public static String write(Results results, Block.Table table) {
        return new RatingCsv(results).write(table);
    }

    private String write(Block.Table table) {
        List<String> lines = new ArrayList<>(header(table));
        lines.add(table.columns().stream().map(column -> quoted(column.head())).collect(Collectors.joining(",")));
        for (Block.Row row : table.rows()) {
            lines.add(row.items().stream().map(this::item).collect(Collectors.joining(",")));
        }
        return String.join(END, lines) + END;
    }

    private List<String> header(Block.Table table) {
        Furniture furniture = results.furniture();
        List<String> lines = new ArrayList<>();
        add(lines, "Table", table.title());
        add(lines, "Project", furniture.project());
        add(lines, "Calculation", furniture.number());
        add(lines, "Revision", furniture.revision() + ", " + furniture.date());
        add(lines, "Status", furniture.status());
        add(lines, "Release", furniture.release());
        add(lines, "Input fingerprint", furniture.fingerprint());
        furniture.cautions().forEach(caution -> add(lines, "Caution", caution));
        return lines;
    }

    private static void add(List<String> lines, String what, String text) {
        if (!text.isEmpty()) {
            String safe = WOULD_RUN_AFTER_A_CUT.matcher(oneLine(text)).replaceAll("$1'$2");
            lines.add("# " + what + ": " + safe);
        }
    }

    private String item(Block.Item item) {
        if (item instanceof Block.Content content) {
            return content(results.value(content.cell()));
        }
        if (item instanceof Block.Text text) {
            return quoted(text.text());
        }
        if (item instanceof Block.Symbol symbol) {
            return quoted(symbol.symbol());
        }
        if (item instanceof Block.Address address) {
            return quoted(address.cell().place().full());
        }
        if (item instanceof Block.SheetLink link) {
            return quoted(link.title());
        }
        Cell cell = ((Block.Equation) item).cell();
        Formula formula = cell.formula();
        return quoted(formula == null ? "" : PlainReading.of(cell.symbol(), formula));
    }

    private static String content(Value value) {
        if (value instanceof Value.Number number) {
            return Digits.asTyped(new BigDecimal(number.value()).round(FIGURES).doubleValue());
        }
        return quoted(value instanceof Value.Word word ? word.text() : ((Value.None) value).why());
    }

    private static String quoted(String text) {
        String line = oneLine(text);
        String safe = WOULD_RUN.matcher(line).find() ? "'" + line : line;
        return "\"" + safe.replace("\"", "\"\"") + "\"";
    }

    private static String oneLine(String text) {
        return text.replaceAll("\\p{Cntrl}+", " ");
    }
}
