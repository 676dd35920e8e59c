package nappe.calculation;

import java.util.ArrayList;
import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.Guard;
import nappe.formula.Renaming;
import nappe.formula.Sign;
import nappe.formula.SignReading;
import nappe.formula.SymbolsReading;
import nappe.formula.Value;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;
import org.jspecify.annotations.Nullable;

/** Makes the cells of a calculation, each after all that it refers to, and keeps them in that order. */
public final class Cells {
    private final WorkingSystem system;
    private final FactorTable factors;
    private final List<Cell> cells = new ArrayList<>();
    private final Map<Cell, Sign> signs = new IdentityHashMap<>();

    public Cells(WorkingSystem system, SheetDraft factorSheet) {
        this.system = system;
        this.factors = new FactorTable(this, system, factorSheet);
    }

    public WorkingSystem system() {
        return system;
    }

    public FactorTable factors() {
        return factors;
    }

    /** All cells so far, in the order of evaluation. */
    public List<Cell> all() {
        return Collections.unmodifiableList(cells);
    }

    /** The working unit of a dimension. */
    public Unit unit(Dimension dimension) {
        return system.coherentUnit(dimension);
    }

    /** A typed cell: an entry, a constant, a number of a table. */
    public Cell typed(Cell.Kind kind, Place place, String symbol, Unit unit, Value value, Sign sign) {
        Cell cell = Cell.typed(kind, place, symbol, unit, value);
        return keep(cell.allowed() == null ? cell : cell.allowing(new Allowed.Numbers(sign)), sign);
    }

    /** A typed cell that may stay blank. */
    public Cell optional(Place place, String symbol, Unit unit, Value value, Sign sign) {
        return keep(Cell.optional(place, symbol, unit, value).allowing(new Allowed.Numbers(sign)), sign);
    }

    /** An entry that is one of the words of a run, or may stay blank besides. */
    public Cell choice(Place place, String symbol, Value value, Run words, boolean mayBeBlank) {
        Cell cell = mayBeBlank
                ? Cell.optional(place, symbol, Unit.one(), value)
                : Cell.typed(Cell.Kind.ENTRY, place, symbol, Unit.one(), value);
        return keep(cell.allowing(new Allowed.Words(words)), Sign.ANY);
    }

    /** A live cell in the working unit of its dimension; null for words. */
    public Cell live(Place place, String symbol, @Nullable Unit unit, Formula formula, Scope scope) {
        return live(place, symbol, unit, formula, scope, null, false);
    }

    /** A live cell, whose sign may be known from how its formula was made, and which may look up a blank. */
    public Cell live(
            Place place,
            String symbol,
            @Nullable Unit unit,
            Formula formula,
            Scope scope,
            @Nullable Sign knownSign,
            boolean mayBeBlank) {
        Unit working = unit == null ? Unit.one() : unit(unit.dimension());
        return raw(place, symbol, working, formula, scope, knownSign, mayBeBlank);
    }

    /** A live cell whose number is in the very unit given, working or not. */
    public Cell raw(
            Place place,
            String symbol,
            Unit unit,
            Formula written,
            Scope scope,
            @Nullable Sign knownSign,
            boolean mayBeBlank) {
        Formula formula = Renaming.ofQuantities(written, this::withPlainZero);
        Map<String, Reference> references = references(formula, scope);
        SignReading.Finding finding = SignReading.of(formula, name -> sign(references, name));
        Sureness sureness = sureness(formula, references, finding.safe(), mayBeBlank);
        Cell cell = Cell.live(place, symbol, unit, formula, references, sureness);
        return keep(cell, knownSign == null ? finding.sign() : knownSign);
    }

    /** A live cell that repeats another, in its unit; the symbol is that of the line it stands in, or empty. */
    public Cell same(Place place, String symbol, Cell other) {
        Scope scope = Scope.ofElement();
        scope.put("x", other);
        return raw(place, symbol, other.unit(), Formulas.symbol("x"), scope, null, false);
    }

    /** Nought is nought in every unit: it is written in the working unit, and needs no factor. */
    private Formula.Quantity withPlainZero(Formula.Quantity quantity) {
        return quantity.value() == 0
                ? new Formula.Quantity(0, "0", unit(quantity.unit().dimension()))
                : quantity;
    }

    private Cell keep(Cell cell, Sign sign) {
        cells.add(cell);
        signs.put(cell, sign);
        return cell;
    }

    /** What is known of the sign of a cell. */
    Sign sign(Cell cell) {
        return signs.getOrDefault(cell, Sign.ANY);
    }

    private Sign sign(Map<String, Reference> references, String name) {
        Reference reference = references.get(name);
        if (reference instanceof Run run) {
            return run.cells().stream().map(this::sign).max(Sign::compareTo).orElse(Sign.ANY);
        }
        return reference instanceof Cell cell ? sign(cell) : Sign.ANY;
    }

    private Map<String, Reference> references(Formula formula, Scope scope) {
        Map<String, Reference> references = new LinkedHashMap<>();
        for (String symbol : SymbolsReading.of(formula)) {
            Reference reference = scope.find(symbol);
            if (reference == null) {
                throw new IllegalStateException(symbol + " stands nowhere yet");
            }
            references.put(symbol, reference);
        }
        for (Unit unit : UnitsReading.of(formula)) {
            Cell factor = factors.cell(unit);
            if (factor != null) {
                references.put("1 " + unit.text(), factor);
            }
        }
        return references;
    }

    private static Sureness sureness(
            Formula formula, Map<String, Reference> references, boolean safe, boolean mayBeBlank) {
        boolean looksUpAlone = formula instanceof Formula.Call call && call.function() == Function.INDEX;
        if (!safe || mayBeBlank && !looksUpAlone) {
            return Sureness.MAY_FAIL;
        }
        List<String> passedOn = formula instanceof Formula.Symbol bare ? List.of(bare.name()) : Guard.guarded(formula);
        boolean words = mayBeBlank
                || passedOn.stream().anyMatch(s -> references.get(s) instanceof Cell c && c.sureness() != Sureness.SURE)
                || HasNoResult.in(formula);
        return words ? Sureness.MAY_BE_WORDS : Sureness.SURE;
    }
}
