package nappe.job;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.ItemLayout;
import nappe.calculation.Place;
import nappe.calculation.Run;
import nappe.calculation.Scope;
import nappe.calculation.SheetDraft;
import nappe.calculation.Strip;
import nappe.calculation.TrialRows;
import nappe.formula.Formula;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.method.Item;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.solve.Evaluation;
import nappe.source.CitedTable;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;
import org.jspecify.annotations.Nullable;

/**
 * Runs check values through the method sheets: the same lines, laid and evaluated as in a package. A free symbol among
 * the entries is bound to its value; what is not given stays "not given".
 */
public final class Verification {
    private static final String SHEET = "Check";

    private final MethodLibrary methods;

    public Verification(MethodLibrary methods) {
        this.methods = methods;
    }

    /** Runs a row. One of method {@code units} checks the catalogue: its entry, converted to the unit of the row. */
    public CheckOutcome run(CheckRow row) {
        if (row.method().equals("units") && row.entries().get(row.target()) instanceof Formula.Quantity quantity) {
            double size = quantity.unit().sizeInSi() / row.unit().sizeInSi();
            return new CheckOutcome(row, quantity.value() * size, "");
        }
        return run(row, WorkingSystem.SI);
    }

    /** Runs a row in one working system. */
    public CheckOutcome run(CheckRow row, WorkingSystem system) {
        if (!methods.knows(row.method())) {
            return new CheckOutcome(row, Double.NaN, "no such method");
        }
        MethodSheet method = methods.sheet(row.method());
        if (method.item(row.target()) == null) {
            return new CheckOutcome(row, Double.NaN, "no such symbol");
        }
        Bench bench = new Bench(method, system);
        Cell target = bench.lay(row);
        if (target == null) {
            return new CheckOutcome(row, Double.NaN, "a free symbol is not given");
        }
        Map<Cell, Value> values = Evaluation.of(Evaluation.leadingTo(List.of(target), bench.cells.all()));
        Value value = java.util.Objects.requireNonNull(values.get(target));
        if (!(value instanceof Value.Number number)) {
            return new CheckOutcome(row, Double.NaN, value instanceof Value.None none ? none.why() : "words");
        }
        if (!target.unit().dimension().equals(row.unit().dimension())) {
            return new CheckOutcome(
                    row, Double.NaN, "the target is " + target.unit().dimension());
        }
        return new CheckOutcome(row, number.value() / row.unit().sizeIn(system), "");
    }

    /** A scratch sheet with the cells of one row. */
    private static final class Bench {
        private final MethodSheet method;
        private final Set<String> free;
        private final Cells cells;
        private final ItemLayout items;
        private final Scope scope = Scope.ofElement();
        private int next;

        Bench(MethodSheet method, WorkingSystem system) {
            this.method = method;
            this.free = method.items().stream()
                    .filter(Item.Free.class::isInstance)
                    .map(item -> ((Item.Free) item).symbol())
                    .collect(Collectors.toSet());
            this.cells = new Cells(system, new SheetDraft("Constants", ""));
            this.items = new ItemLayout(cells, new TrialRows(cells, new SheetDraft("Trials", "")));
        }

        @Nullable
        Cell lay(CheckRow row) {
            method.tables().values().forEach(this::table);
            for (Item item : method.items()) {
                if (item instanceof Item.Given given) {
                    given(
                            given.symbol(),
                            given.unit(),
                            given.sign(),
                            row.entries().get(given.symbol()));
                } else if (item instanceof Item.Constant constant) {
                    Cell typed = cells.typed(
                            Cell.Kind.CONSTANT,
                            place(),
                            constant.symbol(),
                            constant.unit(),
                            Value.of(constant.value()),
                            constant.value() > 0 ? Sign.POSITIVE : Sign.ANY);
                    scope.put(constant.symbol(), cells.factors().toWorking(place(), constant.symbol(), typed));
                } else if (item instanceof Item.Free free) {
                    Formula value = row.entries().get(free.symbol());
                    if (value != null) {
                        given(free.symbol(), free.unit(), free.sign(), value);
                    }
                } else if (isBound(item, row)) {
                    Strip strip = Strip.down(SHEET, next, 1);
                    if (item instanceof Item.Line line && line.formula() instanceof Formula.Summary over) {
                        items.layOverCases(line, over, new Run(List.of(scope.cell(over.name()))), scope, strip);
                    } else {
                        items.lay(item, scope, strip);
                    }
                    next += 100;
                }
            }
            return scope.find(row.target()) instanceof Cell cell ? cell : null;
        }

        private boolean isBound(Item item, CheckRow row) {
            for (String output : item.outputs()) {
                Set<String> reach = method.reach().getOrDefault(output, Set.of());
                if (reach.stream()
                        .anyMatch(s -> free.contains(s) && !row.entries().containsKey(s))) {
                    return false;
                }
            }
            return true;
        }

        private Place place() {
            return new Place(SHEET, next++, 0);
        }

        private void given(String symbol, Unit declared, Sign sign, @Nullable Formula formula) {
            Value value = new Value.None(Value.NOT_GIVEN);
            Unit unit = declared;
            if (formula instanceof Formula.Word word) {
                value = Value.word(word.text());
            } else if (formula != null) {
                Map.Entry<Double, Unit> number = quantity(formula);
                value = Value.of(number.getKey());
                unit = number.getValue();
            }
            Cell typed = value instanceof Value.None
                    ? cells.optional(place(), symbol, unit, value, sign)
                    : cells.typed(Cell.Kind.ENTRY, place(), symbol, unit, value, sign);
            scope.put(symbol, cells.factors().toWorking(place(), symbol, typed));
        }

        private static Map.Entry<Double, Unit> quantity(Formula formula) {
            if (formula instanceof Formula.Quantity quantity) {
                return Map.entry(quantity.value(), quantity.unit());
            }
            if (formula instanceof Formula.Numeral numeral) {
                return Map.entry(numeral.value(), Unit.one());
            }
            if (formula instanceof Formula.Negation negation) {
                Map.Entry<Double, Unit> positive = quantity(negation.of());
                return Map.entry(-positive.getKey(), positive.getValue());
            }
            throw new IllegalArgumentException("an entry is a number with its unit, or words in quotes");
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
    }
}
