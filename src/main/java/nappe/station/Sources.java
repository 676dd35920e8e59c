package nappe.station;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.Run;
import nappe.calculation.Scope;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.source.CitedTable;
import nappe.unit.Unit;

/** Lays the constants and the cited tables that the methods of a station use; each once. */
final class Sources {
    private static final int LONG_WORDS = 20;

    /** Behind the name of a table: its first column. No column can have this name. */
    private static final String KEY = ".(key)";

    private final Cells cells;
    private final SheetDraft constants;
    private final SheetDraft tables;
    private final SheetDraft standing;
    private final Map<String, TableDraft> drafts = new LinkedHashMap<>();
    private final Map<String, Map<String, Run>> runs = new LinkedHashMap<>();

    Sources(Cells cells, SheetDraft constants, SheetDraft tables, SheetDraft standing) {
        this.cells = cells;
        this.constants = constants;
        this.tables = tables;
        this.standing = standing;
    }

    /** Lays the constants of each method; they must stand before the first conversion factor is asked for. */
    Map<String, Map<String, Cell>> layConstants(List<MethodSheet> methods) {
        TableDraft table = constants.table(
                "Constants of the methods",
                List.of(
                        new Block.Column("Symbol", 14, Block.Align.LEFT),
                        new Block.Column("Value", 18, Block.Align.RIGHT),
                        new Block.Column("Unit", 16, Block.Align.LEFT),
                        new Block.Column("Description", 44, Block.Align.LEFT),
                        new Block.Column("Source", 30, Block.Align.LEFT)));
        Map<String, Map<String, Cell>> typed = new LinkedHashMap<>();
        for (MethodSheet method : methods) {
            Map<String, Cell> own = new LinkedHashMap<>();
            for (Item item : method.items()) {
                if (item instanceof Item.Constant constant) {
                    own.put(constant.symbol(), constant(table, constant, method));
                }
            }
            typed.put(method.name(), own);
        }
        if (table.isEmpty()) {
            table.add(List.of(
                    new Block.Text("none"),
                    new Block.Text(""),
                    new Block.Text(""),
                    new Block.Text(""),
                    new Block.Text("")));
        }
        constants.gap();
        return typed;
    }

    private Cell constant(TableDraft table, Item.Constant constant, MethodSheet method) {
        Sign sign = constant.value() > 0 ? Sign.POSITIVE : Sign.ANY;
        Cell cell = cells.typed(
                Cell.Kind.CONSTANT,
                table.place(1),
                constant.symbol(),
                constant.unit(),
                Value.of(constant.value()),
                sign);
        String source = constant.citation() == null ? "" : constant.citation().shown();
        table.add(List.of(
                new Block.Symbol(constant.symbol()),
                new Block.Content(cell),
                new Block.Text(unitText(constant.unit())),
                new Block.Text(constant.label() + " (" + method.name() + ")"),
                new Block.Text(source)));
        return cell;
    }

    /** Lays a table if it has not been laid, and makes its columns known to the scope. */
    void layTable(CitedTable table, Scope scope) {
        Map<String, Run> columns = runs.computeIfAbsent(table.name(), name -> lay(table));
        columns.forEach(scope::put);
    }

    /** Of a table that is looked up by a word, the PDF prints the rows in use; the workbook holds them all. */
    void printRow(String table, Cell key) {
        TableDraft draft = drafts.get(table);
        if (draft != null) {
            draft.printRowsOf(key);
        }
    }

    /** The words of a table that was laid, from which an entry chooses. */
    static Run keys(Scope scope, String table) {
        return (Run) java.util.Objects.requireNonNull(scope.find(table + KEY));
    }

    private Map<String, Run> lay(CitedTable table) {
        tables.heading(table.title());
        tables.note((table.house().isEmpty() ? "" : "House table, folder " + table.house() + ". ") + "Source: "
                + table.source());
        table.remarks().forEach(tables::note);
        List<CitedTable.Column> narrow =
                table.columns().stream().filter(c -> !isRemark(c)).toList();
        List<CitedTable.Column> remarks =
                table.columns().stream().filter(Sources::isRemark).toList();
        Map<String, Run> known = new LinkedHashMap<>();
        lay(table, narrow, tables, "", known);
        if (!remarks.isEmpty()) {
            lay(table, remarks, standing, table.title(), known);
        }
        String keys = table.name() + "." + table.columns().get(0).symbol();
        known.put(table.name() + KEY, java.util.Objects.requireNonNull(known.get(keys)));
        return known;
    }

    /** A column of long words stands on a sheet of its own, with the key repeated, so that both stay readable. */
    static boolean isRemark(CitedTable.Column column) {
        return column.isWords() && longest(column) > LONG_WORDS;
    }

    private void lay(
            CitedTable table, List<CitedTable.Column> columns, SheetDraft sheet, String title, Map<String, Run> known) {
        CitedTable.Column key = table.columns().get(0);
        boolean repeatsKey = !columns.contains(key);
        List<Block.Column> heads = new ArrayList<>();
        if (repeatsKey) {
            heads.add(head(key));
        }
        columns.forEach(column -> heads.add(head(column)));
        TableDraft draft = repeatsKey ? sheet.workbookTable(title, heads, table.rows()) : sheet.table(title, heads);
        List<List<Cell>> cellsOf = new ArrayList<>();
        columns.forEach(column -> cellsOf.add(new ArrayList<>()));
        for (int r = 0; r < table.rows(); r++) {
            List<Block.Item> row = new ArrayList<>();
            if (repeatsKey) {
                row.add(new Block.Text(key.values().get(r) instanceof Value.Word word ? word.text() : ""));
            }
            for (int c = 0; c < columns.size(); c++) {
                CitedTable.Column column = columns.get(c);
                Unit unit = column.unit() == null ? Unit.one() : column.unit();
                Cell cell = cells.typed(
                        Cell.Kind.TABLE,
                        draft.place(row.size()),
                        "",
                        unit,
                        column.values().get(r),
                        column.sign());
                cellsOf.get(c).add(cell);
                row.add(new Block.Content(cell));
            }
            draft.add(row);
        }
        if (!repeatsKey) {
            drafts.put(table.name(), draft);
        }
        sheet.gap();
        for (int c = 0; c < columns.size(); c++) {
            known.put(table.name() + "." + columns.get(c).symbol(), new Run(cellsOf.get(c)));
        }
    }

    private static Block.Column head(CitedTable.Column column) {
        Unit unit = column.unit();
        return new Block.Column(
                unit == null || unit.text().equals("1") ? column.symbol() : column.symbol() + " [" + unit + "]",
                column.isWords() ? Math.max(10, Math.min(46, longest(column) + 2)) : 11,
                column.isWords() ? Block.Align.LEFT : Block.Align.RIGHT);
    }

    private static int longest(CitedTable.Column column) {
        return column.values().stream()
                .mapToInt(
                        value -> value instanceof Value.Word word ? word.text().length() : 8)
                .max()
                .orElse(8);
    }

    static String unitText(Unit unit) {
        return unit.text().equals("1") ? "" : unit.text();
    }
}
