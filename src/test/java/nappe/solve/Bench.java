package nappe.solve;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.CaseColumns;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.ElementSheet;
import nappe.calculation.ItemLayout;
import nappe.calculation.Place;
import nappe.calculation.RatingGrid;
import nappe.calculation.Run;
import nappe.calculation.Scope;
import nappe.calculation.SheetDraft;
import nappe.calculation.TrialRows;
import nappe.formula.Formula;
import nappe.formula.FormulaParser;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.source.CitedTable;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;

/** One element laid out and evaluated with typed entries, for tests of the layout. */
public final class Bench {
    private final MethodSheet method;
    private final Cells cells;
    private final Scope scope = Scope.ofElement();
    private final List<Scope> cases = new ArrayList<>();
    private final TrialRows trialRows;
    private final ItemLayout items;
    private final List<ElementSheet.LimitResult> limits;
    private final SheetDraft sheet = new SheetDraft("E1", "Element");
    private final SheetDraft trials = new SheetDraft("Trials", "Trials");
    private final Map<Cell, Value> values;
    private final List<Block.Table> ratings = new ArrayList<>();
    private int next;

    /**
     * @param entries typed once, as text: {@code "b", "0.6 m"}; what is missing is not given
     * @param typedPerCase one map for each case
     */
    public Bench(
            MethodSheet method,
            WorkingSystem system,
            Map<String, String> entries,
            List<Map<String, String>> typedPerCase) {
        this.method = method;
        this.cells = new Cells(system, new SheetDraft("Constants", "Constants"));
        this.trialRows = new TrialRows(cells, trials);
        this.items = new ItemLayout(cells, trialRows);
        method.tables().values().forEach(this::table);
        typedPerCase.forEach(c -> cases.add(scope.inner()));
        for (Item item : method.items()) {
            if (item instanceof Item.Given given) {
                boolean perCase = method.perCase(given.symbol());
                if (perCase) {
                    for (int c = 0; c < cases.size(); c++) {
                        cases.get(c)
                                .put(
                                        given.symbol(),
                                        typed(given, typedPerCase.get(c).get(given.symbol())));
                    }
                } else {
                    scope.put(given.symbol(), typed(given, entries.get(given.symbol())));
                }
            } else if (item instanceof Item.Constant constant) {
                scope.put(
                        constant.symbol(),
                        cells.typed(
                                Cell.Kind.CONSTANT,
                                place(),
                                constant.symbol(),
                                constant.unit(),
                                Value.of(constant.value()),
                                Sign.POSITIVE));
            }
        }
        List<String> names = new ArrayList<>();
        for (int c = 0; c < cases.size(); c++) {
            names.add("case " + (c + 1));
        }
        this.limits = new ElementSheet("E1", method, items, trialRows, sheet, scope, CaseColumns.of(names), cases)
                .lay(0, List.of());
        SheetDraft ratingSheet = new SheetDraft("E1 rating", "Rating");
        method.ratings()
                .forEach(rating -> ratings.add(new RatingGrid(items, method, Map.of())
                        .lay(rating, scope, ratingSheet, "Rating")
                        .table()));
        this.values = Evaluation.of(cells.all());
    }

    /** The cells in the order of evaluation. */
    public List<Cell> cells() {
        return cells.all();
    }

    /** The first rating table once more, on a sheet of its own, with results in reporting units too; without values. */
    public Block.Table rating(Map<Dimension, Unit> reports) {
        return new RatingGrid(items, method, reports)
                .lay(method.ratings().get(0), scope, new SheetDraft("E1 reported", "Rating"), "Rating")
                .table();
    }

    public List<Block.Table> ratings() {
        return ratings;
    }

    public TrialRows trialRows() {
        return trialRows;
    }

    public Value value(Cell cell) {
        return values.get(cell);
    }

    /** The value of a symbol that serves all cases. */
    public Value value(String symbol) {
        return values.get(scope.cell(symbol));
    }

    /** The value of a symbol in a case, counted from 0. */
    public Value value(String symbol, int oneCase) {
        return values.get(cases.get(oneCase).cell(symbol));
    }

    public double number(String symbol, int oneCase) {
        return ((Value.Number) value(symbol, oneCase)).value();
    }

    /** Whether a symbol stands once for all cases. */
    public boolean servesAllCases(String symbol) {
        return scope.find(symbol) != null;
    }

    /** Whether a symbol stands anywhere by itself. */
    public boolean stands(String symbol) {
        return cases.get(0).find(symbol) != null;
    }

    /** The verdict on the limit of a label in a case. */
    public Value verdict(String label, int oneCase) {
        return limit(label, oneCase, false);
    }

    /** The verdicts of every limit of a label. */
    public List<List<Value>> verdicts(String label) {
        return limits.stream()
                .filter(l -> l.label().equals(label))
                .map(l -> l.verdicts().stream().map(values::get).toList())
                .toList();
    }

    /** The tables of trial rows. */
    public List<Block.Table> trialTables() {
        List<Block.Table> tables = new ArrayList<>();
        for (Block block : trials.finish(1).blocks()) {
            if (block instanceof Block.WorkbookOnly only) {
                tables.add(only.table());
            }
        }
        return tables;
    }

    public Value margin(String label, int oneCase) {
        return limit(label, oneCase, true);
    }

    private Value limit(String label, int oneCase, boolean margin) {
        ElementSheet.LimitResult result =
                limits.stream().filter(l -> l.label().equals(label)).findFirst().orElseThrow();
        List<Cell> laid = margin ? result.margins() : result.verdicts();
        return values.get(laid.get(result.forAll() ? 0 : oneCase));
    }

    private Place place() {
        return new Place("Typed", next++, 0);
    }

    private Cell typed(Item.Given given, String text) {
        if (text == null) {
            return cells.optional(place(), given.symbol(), given.unit(), new Value.None("not given"), given.sign());
        }
        Formula formula = FormulaParser.parse(text);
        boolean negative = formula instanceof Formula.Negation;
        Formula plain = negative ? ((Formula.Negation) formula).of() : formula;
        Value value = Value.word(text);
        Unit unit = given.unit();
        if (plain instanceof Formula.Word word) {
            value = Value.word(word.text());
        } else if (plain instanceof Formula.Quantity quantity) {
            value = Value.of(negative ? -quantity.value() : quantity.value());
            unit = quantity.unit();
        } else if (plain instanceof Formula.Numeral numeral) {
            value = Value.of(negative ? -numeral.value() : numeral.value());
        }
        return given.optional()
                ? cells.optional(place(), given.symbol(), unit, value, given.sign())
                : cells.typed(Cell.Kind.ENTRY, place(), given.symbol(), unit, value, given.sign());
    }

    private void table(CitedTable table) {
        for (CitedTable.Column column : table.columns()) {
            Unit unit = column.unit() == null ? Unit.one() : column.unit();
            List<Cell> run = column.values().stream()
                    .map(value -> cells.typed(Cell.Kind.TABLE, place(), "", unit, value, column.sign()))
                    .toList();
            scope.put(table.name() + "." + column.symbol(), new Run(run));
        }
    }

    /** Symbols and texts in pairs. */
    public static Map<String, String> typed(String... pairs) {
        Map<String, String> typed = new LinkedHashMap<>();
        for (int i = 0; i < pairs.length; i += 2) {
            typed.put(pairs[i], pairs[i + 1]);
        }
        return typed;
    }
}
