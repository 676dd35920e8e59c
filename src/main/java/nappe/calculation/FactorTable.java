package nappe.calculation;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.Operator;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.unit.Unit;
import nappe.unit.UnitCatalogue;
import nappe.unit.WorkingSystem;
import org.jspecify.annotations.Nullable;

/**
 * The conversion factors in use, a cell each, laid out when they are first needed. A unit whose size in the working
 * system is 1 has none.
 */
public final class FactorTable {
    private final Cells cells;
    private final WorkingSystem system;
    private final SheetDraft sheet;
    private final Map<Unit, Cell> factors = new LinkedHashMap<>();
    private final Map<Unit, Cell> zeros = new LinkedHashMap<>();
    private @Nullable TableDraft table;

    FactorTable(Cells cells, WorkingSystem system, SheetDraft sheet) {
        this.cells = cells;
        this.system = system;
        this.sheet = sheet;
    }

    /** The cell that says how many working units one of the unit is; null where it is 1. */
    public @Nullable Cell cell(Unit unit) {
        double size = unit.sizeIn(system);
        if (size == 1) {
            return null;
        }
        Cell known = factors.get(unit);
        return known != null ? known : lay(unit, size);
    }

    private Cell lay(Unit unit, double size) {
        TableDraft open = table();
        Unit working = system.coherentUnit(unit.dimension());
        Cell cell = cells.typed(
                Cell.Kind.CONSTANT, open.place(1), "1 " + unit.text(), working, Value.of(size), Sign.POSITIVE);
        UnitCatalogue.Entry entry = UnitCatalogue.standard().entry(unit);
        open.add(List.of(
                new Block.Text("1 " + unit.text()),
                new Block.Content(cell),
                new Block.Text(working.text()),
                new Block.Text(entry == null ? "compound unit" : entry.description() + ": " + entry.definition()),
                new Block.Text(entry == null ? "from the units it is made of" : entry.source())));
        factors.put(unit, cell);
        return cell;
    }

    /** The cell with the zero of a scale such as degC in working units; null where it is 0. */
    @Nullable
    Cell zero(Unit unit) {
        double zero = unit.zeroIn(system);
        if (zero == 0) {
            return null;
        }
        Cell known = zeros.get(unit);
        if (known != null) {
            return known;
        }
        TableDraft open = table();
        Unit working = system.coherentUnit(unit.dimension());
        Cell cell =
                cells.typed(Cell.Kind.CONSTANT, open.place(1), "0 " + unit.text(), working, Value.of(zero), Sign.ANY);
        open.add(List.of(
                new Block.Text("0 " + unit.text()),
                new Block.Content(cell),
                new Block.Text(working.text()),
                new Block.Text("zero of the scale"),
                new Block.Text("")));
        zeros.put(unit, cell);
        return cell;
    }

    private TableDraft table() {
        TableDraft open = table;
        if (open == null) {
            open = sheet.table(
                    "Conversion factors in use",
                    List.of(
                            new Block.Column("One of", 14, Block.Align.LEFT),
                            new Block.Column("is so many", 18, Block.Align.RIGHT),
                            new Block.Column("of the working unit", 16, Block.Align.LEFT),
                            new Block.Column("Definition", 44, Block.Align.LEFT),
                            new Block.Column("Source", 30, Block.Align.LEFT)));
            table = open;
        }
        return open;
    }

    /** The cell's number in the working system, in a live cell of its own. */
    public Cell toWorking(Place place, String symbol, Cell typed) {
        Scope scope = Scope.ofElement();
        String name = symbol.isEmpty() ? "typed" : symbol;
        scope.put(name, typed);
        Formula formula = new Formula.Symbol(name);
        Unit unit = typed.unit();
        Cell zero = zero(unit);
        if (cell(unit) != null) {
            formula = new Formula.Operation(Operator.TIMES, formula, new Formula.Quantity(1, "1", unit));
        }
        if (zero != null) {
            scope.put("zero", zero);
            formula = new Formula.Operation(Operator.PLUS, formula, new Formula.Symbol("zero"));
        }
        if (typed.kind() == Cell.Kind.ENTRY && typed.sureness() != Sureness.SURE) {
            // an entry that may stay blank may also be cleared in the workbook, and is then not nought
            Formula given = Formulas.call(Function.IS_NUMBER, new Formula.Symbol(name));
            formula = Formulas.iff(given, formula, new Formula.NoResult(Value.NOT_GIVEN));
        }
        return cells.live(place, symbol, unit, formula, scope);
    }

    /** A working number in a reporting unit, in a live cell of its own. */
    public Cell toReport(Place place, String symbol, Cell working, Unit report) {
        Scope scope = Scope.ofElement();
        scope.put(symbol, working);
        Formula formula = cell(report) == null
                ? new Formula.Symbol(symbol)
                : new Formula.Operation(
                        Operator.OVER, new Formula.Symbol(symbol), new Formula.Quantity(1, "1", report));
        return cells.raw(place, symbol, report, formula, scope, null, false);
    }
}
