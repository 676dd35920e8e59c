package nappe.method;

import java.util.HashSet;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.formula.DimensionReading;
import nappe.formula.Formula;
import nappe.formula.FormulaException;
import nappe.formula.FormulaParser;
import nappe.formula.SymbolsReading;
import nappe.source.Citation;
import nappe.source.Publication;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * The parts that statements share: fields, units, citations and symbols with their subscript. It keeps where in the
 * statement a fault belongs, and which symbols the statement would define.
 */
final class StatementParts {
    private static final String WORDS = "words";
    private static final Pattern NAME = Pattern.compile("[A-Za-z][A-Za-z0-9_]*");

    final SheetDraft draft;
    final Statement statement;
    final @Nullable String subscript;
    private final Set<String> defining = new HashSet<>();
    private int base;

    StatementParts(SheetDraft draft, Statement statement, @Nullable String subscript) {
        this.draft = draft;
        this.statement = statement;
        this.subscript = subscript;
    }

    /** Where in the statement's text the part that is being read starts. */
    int base() {
        return base;
    }

    /** Faults that follow belong to this field. */
    void moveTo(int field) {
        base = statement.field(field).offset();
    }

    /** Notes the symbols that the statement would define, however much of it can be read. */
    void noteDefined() {
        String defines = switch (statement.word()) {
            case "method",
                    "about",
                    "caution",
                    "source",
                    "include",
                    "table",
                    "limit",
                    "geometry",
                    "rating",
                    "screen",
                    "give" -> "";
            case "at" -> text(0).substring(text(0).indexOf(':') + 1);
            default -> text(0).split(",", 2)[0];
        };
        for (String part : defines.split(",")) {
            Matcher name = NAME.matcher(part.strip());
            if (name.lookingAt()) {
                defining.add(symbolOf(name.group()));
            }
        }
    }

    /** Notes that what this statement would define is not there, so that no later fault follows from it. */
    void spoil() {
        defining.stream().filter(symbol -> !draft.knows(symbol)).forEach(draft::markBroken);
    }

    FormulaParser parser(int field) {
        moveTo(field);
        return new FormulaParser(text(field));
    }

    String text(int field) {
        return statement.field(field).text();
    }

    Unit unit(int field) {
        moveTo(field);
        String text = text(field);
        if (text.contains(" ") && !text.matches(".*[0-9/*^].*")) {
            throw fault(
                    "a unit stands here, not \"" + text + "\"; the unit of a pure number is 1: sym ; 1 ; label",
                    "unit-missing");
        }
        Unit unit = Unit.parse(text);
        moveTo(0);
        return unit;
    }

    /** The unit in a field; none where the field says words. */
    @Nullable
    Unit unitOrWords(int field) {
        return text(field).equals(WORDS) ? null : unit(field);
    }

    boolean memory(int field) {
        String mark = text(field);
        if (!mark.isEmpty() && !mark.equals("memory")) {
            moveTo(field);
            throw fault("the only mark known here is \"memory\"", "mark-unknown");
        }
        return mark.equals("memory");
    }

    @Nullable
    Citation citation(int field) {
        String text = text(field);
        if (text.isEmpty()) {
            return null;
        }
        String key = text.split("\\s+", 2)[0];
        Publication publication = draft.sources.get(key);
        if (publication == null) {
            moveTo(field);
            throw fault(key + " is not a source of this sheet", "source-unknown");
        }
        String place = text.substring(key.length()).strip();
        return new Citation(publication, place, memory(field + 1));
    }

    String source(int field) {
        Citation citation = citation(field);
        return citation == null ? "" : citation.shown();
    }

    String symbolOf(String name) {
        return subscript == null ? name : name.contains("_") ? name + subscript : name + "_" + subscript;
    }

    String fresh(String name) {
        String symbol = symbolOf(name);
        if (draft.knows(symbol)) {
            throw fault(symbol + " is defined already", "symbol-twice");
        }
        defining.add(symbol);
        return symbol;
    }

    /** Refuses what rests on a free symbol where a value is needed. */
    void hasValue(Formula formula) {
        for (String symbol : SymbolsReading.of(formula)) {
            for (String free : draft.reach.getOrDefault(symbol, Set.of())) {
                if (draft.isFree(free)) {
                    throw fault(
                            symbol.equals(free)
                                    ? symbol + " is free and has no value by itself; bind it with at"
                                    : symbol + " rests on the free symbol " + free
                                            + " and has no value by itself; name one with at",
                            "no-value");
                }
            }
        }
    }

    void define(String symbol, Unit unit) {
        draft.define(symbol, new DimensionReading.Quantity(unit.dimension()));
    }

    void defineOutcome(String symbol, @Nullable Unit unit) {
        draft.define(
                symbol, unit == null ? new DimensionReading.Words() : new DimensionReading.Quantity(unit.dimension()));
    }

    void sameDimension(@Nullable Unit unit, DimensionReading.Outcome outcome) {
        if (outcome instanceof DimensionReading.Anything) {
            return;
        }
        if (unit == null) {
            if (!(outcome instanceof DimensionReading.Words)) {
                throw fault("the unit says words, but the formula gives none", "unlike-dimensions");
            }
        } else if (!(outcome instanceof DimensionReading.Quantity quantity)) {
            throw fault("the formula gives words or a condition; write \"words\" for the unit", "unlike-dimensions");
        } else if (!quantity.dimension().equals(unit.dimension())) {
            throw fault(
                    "the formula comes out as " + quantity.dimension() + ", but " + unit + " is " + unit.dimension(),
                    "unlike-dimensions");
        }
    }

    FormulaException fault(String message, String code) {
        return new FormulaException(message, 0, 1, code);
    }
}
