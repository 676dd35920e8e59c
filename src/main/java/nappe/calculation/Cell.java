package nappe.calculation;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.formula.Formula;
import nappe.formula.Guard;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * One cell of the package: typed (an entry, a constant, a number of a cited table) or a formula under a scope. Its
 * number, its spreadsheet text and its typeset equation are readings of the same formula with the same references. A
 * cell is made after all that it refers to, so the order of making is an order of evaluation and no circle can arise.
 */
public final class Cell implements Reference {
    /** What kind of content stands in a cell. */
    public enum Kind {
        /** Typed by the engineer. */
        ENTRY,
        /** A cited number or a conversion factor. */
        CONSTANT,
        /** A number or word of a cited table. */
        TABLE,
        /** Found by reruns of the whole calculation with the entries as issued; it does not follow a changed entry. */
        RERUN,
        /** A live formula. */
        FORMULA
    }

    private final Kind kind;
    private final Place place;
    private final String symbol;
    private final Unit unit;
    private final @Nullable Value typed;
    private final @Nullable Formula formula;
    private final Map<String, Reference> references;
    private final Sureness sureness;
    private final @Nullable Allowed allowed;
    private volatile @Nullable List<Cell> guards;

    private Cell(
            Kind kind,
            Place place,
            String symbol,
            Unit unit,
            @Nullable Value typed,
            @Nullable Formula formula,
            Map<String, Reference> references,
            Sureness sureness,
            @Nullable Allowed allowed) {
        this.kind = kind;
        this.place = place;
        this.symbol = symbol;
        this.unit = unit;
        this.typed = typed;
        this.formula = formula;
        this.references = Collections.unmodifiableMap(new LinkedHashMap<>(references));
        this.sureness = sureness;
        this.allowed = allowed;
    }

    /** A cell whose content is typed, in the unit given. */
    public static Cell typed(Kind kind, Place place, String symbol, Unit unit, Value value) {
        Sureness sureness = value instanceof Value.None ? Sureness.MAY_BE_WORDS : Sureness.SURE;
        Allowed allowed = kind == Kind.ENTRY && !(value instanceof Value.Word) ? new Allowed.Numbers(Sign.ANY) : null;
        return new Cell(kind, place, symbol, unit, value, null, Map.of(), sureness, allowed);
    }

    /** A typed cell that may stay blank, and then holds words; a number may be typed into it later. */
    public static Cell optional(Place place, String symbol, Unit unit, Value value) {
        return new Cell(
                Kind.ENTRY,
                place,
                symbol,
                unit,
                value,
                null,
                Map.of(),
                Sureness.MAY_BE_WORDS,
                new Allowed.Numbers(Sign.ANY));
    }

    /** The same typed cell, into which only such a thing may be typed later. */
    public Cell allowing(Allowed only) {
        return new Cell(kind, place, symbol, unit, typed, formula, references, sureness, only);
    }

    /** A live cell; every symbol of its formula must be among the references. */
    public static Cell live(
            Place place,
            String symbol,
            Unit unit,
            Formula formula,
            Map<String, Reference> references,
            Sureness sureness) {
        return new Cell(Kind.FORMULA, place, symbol, unit, null, formula, references, sureness, null);
    }

    public Kind kind() {
        return kind;
    }

    /** Whether its number was computed, live or by reruns, and is rounded in print. */
    public boolean isComputed() {
        return kind == Kind.FORMULA || kind == Kind.RERUN;
    }

    public Place place() {
        return place;
    }

    /** The symbol it stands for ({@code h_a}), or empty. */
    public String symbol() {
        return symbol;
    }

    /** The unit its number is in. */
    public Unit unit() {
        return unit;
    }

    /** What was typed, for a cell that is no formula. */
    public @Nullable Value typed() {
        return typed;
    }

    /** Its formula, for a live cell. */
    public @Nullable Formula formula() {
        return formula;
    }

    /**
     * What the symbols of its formula point to. A quantity {@code 4 ft3/s} in the formula looks for the key {@code "1
     * ft3/s"}: the cell that holds the size of the unit in the working system; where that size is 1 there is none.
     */
    public Map<String, Reference> references() {
        return references;
    }

    /**
     * The cells that its formula needs as numbers and that may hold words, by the rule of {@link Guard}, in the order in
     * which they decide. Found once: a cell is evaluated many times while flows and sizes are tried.
     */
    public List<Cell> guards() {
        List<Cell> known = guards;
        if (known == null) {
            known = formula == null
                    ? List.of()
                    : Guard.guarded(formula).stream()
                            .map(references::get)
                            .filter(other -> other instanceof Cell cell && cell.sureness() != Sureness.SURE)
                            .map(Cell.class::cast)
                            .toList();
            guards = known;
        }
        return known;
    }

    public Sureness sureness() {
        return sureness;
    }

    /** What may be typed into it, for an entry; null where any words may, and for a cell that is none. */
    public @Nullable Allowed allowed() {
        return allowed;
    }

    @Override
    public String toString() {
        return place.full() + (symbol.isEmpty() ? "" : " (" + symbol + ")");
    }
}
