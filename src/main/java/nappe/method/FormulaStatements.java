package nappe.method;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.formula.Comparator;
import nappe.formula.DimensionReading;
import nappe.formula.Formula;
import nappe.formula.FormulaParser;
import nappe.formula.Renaming;
import nappe.formula.Sign;
import nappe.formula.SymbolsReading;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/** The statements that hold formulas: line, root, at, limit and rating. */
final class FormulaStatements {
    /** Both ends of the bracket, and one step from them. */
    private static final int LEAST_TRIALS = 3;

    private final StatementParts parts;
    private final SheetDraft draft;

    FormulaStatements(StatementParts parts) {
        this.parts = parts;
        this.draft = parts.draft;
    }

    void line() {
        FormulaParser parser = parts.parser(0);
        String symbol = parts.fresh(parser.name());
        parser.expect("=");
        Formula formula = renamed(parser.condition());
        parser.end();
        DimensionReading.Outcome outcome = formula.read(dimensions(parser));
        @Nullable Unit unit = parts.unitOrWords(1);
        parts.sameDimension(unit, outcome);
        overCases(formula);
        parts.defineOutcome(symbol, unit);
        draft.add(new Item.Line(symbol, formula, unit, parts.text(2), parts.source(3), null, false));
    }

    /** The highest or lowest over the cases is a line by itself, of something that each case has. */
    private void overCases(Formula formula) {
        if (formula instanceof Formula.Summary over) {
            boolean perCase =
                    draft.reach.getOrDefault(over.name(), Set.of()).stream().anyMatch(draft::isTypedPerCase);
            if (!perCase || over.kind().equals("last")) {
                throw parts.fault(
                        over.kind() + "(" + over.name() + ") is over the cases: "
                                + (perCase ? "write highest or lowest" : over.name() + " is the same in every case"),
                        "not-per-case");
            }
            parts.hasValue(new Formula.Symbol(over.name()));
        } else if (Summaries.in(formula)) {
            throw parts.fault(
                    "highest(...), lowest(...), before(...) and after(...) stand alone: give the highest over the cases a"
                            + " line of its own",
                    "not-alone");
        }
    }

    void root() {
        FormulaParser parser = parts.parser(0);
        String symbol = parts.fresh(parser.name());
        parser.expect("=");
        String free = freeSymbol(parts.symbolOf(parser.name()));
        parser.expect("where");
        Formula left = renamed(parser.sum());
        parser.expect("=");
        Formula right = renamed(parser.sum());
        parser.expect("between");
        Formula from = renamed(parser.sum());
        parser.expect("and");
        Formula to = renamed(parser.sum());
        @Nullable Formula below = parser.passes("below") ? renamed(parser.sum()) : null;
        @Nullable Formula above = parser.passes("above") ? renamed(parser.sum()) : null;
        int trials = parser.passes("trials") ? parser.count() : 20;
        parser.end();
        if (trials < LEAST_TRIALS) {
            throw parts.fault("a root takes " + LEAST_TRIALS + " trials or more", "trials-few");
        }
        DimensionReading dimensions = dimensions(parser);
        if (!dimensions.dimension(left).equals(dimensions.dimension(right))) {
            throw parts.fault(
                    "the two sides differ: " + dimensions.dimension(left) + " and " + dimensions.dimension(right),
                    "unlike-dimensions");
        }
        Unit unit = parts.unit(1);
        parts.sameDimension(unit, draft.outcome(free));
        for (Formula end : Arrays.asList(from, to, below, above)) {
            if (end != null) {
                parts.sameDimension(unit, end.read(dimensions));
                doesNotRestOn(free, end);
            }
        }
        Set<String> targets = new LinkedHashSet<>(SymbolsReading.of(left));
        targets.addAll(SymbolsReading.of(right));
        List<Item> members = Closure.of(draft.items, draft.reach, free, targets);
        parts.define(symbol, unit);
        draft.add(new Item.Root(
                symbol,
                free,
                signOf(free),
                left,
                right,
                from,
                to,
                below,
                above,
                trials,
                members,
                unit,
                parts.text(2),
                parts.source(3)));
    }

    void at() {
        FormulaParser parser = parts.parser(0);
        String free = freeSymbol(parts.symbolOf(parser.name()));
        parser.expect("=");
        Formula value = renamed(parser.sum());
        DimensionReading.Outcome outcome = value.read(dimensions(parser));
        if (!outcome.equals(draft.outcome(free))) {
            throw parts.fault(free + " and its value differ in dimension", "unlike-dimensions");
        }
        doesNotRestOn(free, value);
        parser.expect(":");
        Map<String, String> results = new LinkedHashMap<>();
        do {
            String out = parts.fresh(parser.name());
            parser.expect("=");
            String member = parts.symbolOf(parser.name());
            draft.outcome(member);
            results.put(out, member);
        } while (parser.passes(","));
        parser.end();
        List<Item> members = Closure.of(draft.items, draft.reach, free, Set.copyOf(results.values()));
        results.forEach((out, member) -> draft.define(out, draft.outcome(member)));
        draft.add(new Item.At(free, value, members, results));
    }

    void limit() {
        FormulaParser parser = parts.parser(0);
        List<Formula> chain = new ArrayList<>(List.of(renamed(parser.sum())));
        while (parser.passes(Comparator.AT_MOST.sign())) {
            chain.add(renamed(parser.sum()));
        }
        @Nullable Formula when = parser.passes("when") ? renamed(parser.condition()) : null;
        @Nullable Formula scale = parser.passes("scale") ? renamed(parser.sum()) : null;
        Limit.Kind kind = parser.passes("layout")
                ? Limit.Kind.LAYOUT
                : parser.passes("threshold") ? Limit.Kind.THRESHOLD : Limit.Kind.JUDGED;
        parser.end();
        if (chain.size() < 2 || chain.size() > 3) {
            throw parts.fault("a limit is a <= b, or a <= b <= c", "limit-unclear");
        }
        DimensionReading dimensions = dimensions(parser);
        for (Formula side : chain) {
            if (!dimensions.dimension(side).equals(dimensions.dimension(chain.get(0)))) {
                throw parts.fault("the sides of the limit differ in dimension", "unlike-dimensions");
            }
        }
        if (scale != null && !dimensions.dimension(scale).equals(dimensions.dimension(chain.get(0)))) {
            throw parts.fault("the scale of the limit differs from its sides in dimension", "unlike-dimensions");
        }
        if (when != null) {
            dimensions.condition(when);
        }
        chain.forEach(parts::hasValue);
        if (scale != null) {
            parts.hasValue(scale);
        }
        if (when != null) {
            parts.hasValue(when);
        }
        String label = parts.text(1);
        String source = parts.source(2);
        if (source.isEmpty()) {
            throw parts.fault("a limit names its source", "source-missing");
        }
        if (chain.size() == 3) {
            draft.limits.add(
                    new Limit(chain.get(0), chain.get(1), false, scale, when, label + ", lower end", source, kind));
            draft.limits.add(
                    new Limit(chain.get(1), chain.get(2), true, scale, when, label + ", upper end", source, kind));
        } else {
            boolean valueIsLesser = varies(chain.get(0)) || !varies(chain.get(1)) && !isBound(chain.get(0));
            draft.limits.add(new Limit(chain.get(0), chain.get(1), valueIsLesser, scale, when, label, source, kind));
        }
    }

    void geometry() {
        FormulaParser parser = parts.parser(0);
        Formula condition = renamed(parser.condition());
        parser.end();
        dimensions(parser).condition(condition);
        List<String> entries = new ArrayList<>();
        for (String symbol : SymbolsReading.of(condition)) {
            Item item = draft.item(symbol);
            if (item instanceof Item.Given given
                    && (given.from() == Item.From.ENTRY || given.from() == Item.From.CHOICE)) {
                entries.add(symbol);
            } else if (!(item instanceof Item.Constant)) {
                throw parts.fault(
                        symbol + " is not typed once for the device; geometry compares entries, choices and constants",
                        "not-an-entry");
            }
        }
        if (entries.isEmpty()) {
            throw parts.fault("geometry compares at least one entry", "not-an-entry");
        }
        String label = parts.text(1);
        if (label.isEmpty()) {
            throw parts.fault(
                    "say in words what is asked: geometry d < D ; the bore is smaller than the pipe", "label-missing");
        }
        draft.geometry.add(new Geometry(condition, List.copyOf(entries), label));
    }

    /** Whether a side rests on a case: then it is what is judged. */
    private boolean varies(Formula side) {
        return SymbolsReading.of(side).stream()
                .flatMap(symbol -> draft.reach.getOrDefault(symbol, Set.of()).stream())
                .anyMatch(draft::isTypedPerCase);
    }

    /** Whether a side is what a result is judged by, not the result: a plain quantity. */
    private static boolean isBound(Formula side) {
        return SymbolsReading.of(side).isEmpty();
    }

    void rating() {
        FormulaParser parser = parts.parser(0);
        String free = freeSymbol(parts.symbolOf(parser.name()));
        parser.expect("from");
        Formula from = renamed(parser.sum());
        parser.expect("to");
        Formula to = renamed(parser.sum());
        parser.expect("steps");
        int steps = parser.count();
        parser.expect(":");
        List<String> results = new ArrayList<>();
        do {
            results.add(parts.symbolOf(parser.name()));
        } while (parser.passes(","));
        parser.end();
        results.forEach(draft::outcome);
        DimensionReading dimensions = dimensions(parser);
        for (Formula end : List.of(from, to)) {
            if (!end.read(dimensions).equals(draft.outcome(free))) {
                throw parts.fault(free + " and an end of its table differ in dimension", "unlike-dimensions");
            }
            parts.hasValue(end);
        }
        if (steps < 1) {
            throw parts.fault("a rating takes 1 step or more", "steps-few");
        }
        List<Item> members = Closure.of(draft.items, draft.reach, free, Set.copyOf(results));
        draft.ratings.add(new Rating(free, from, to, steps, List.copyOf(results), members));
    }

    private String freeSymbol(String symbol) {
        draft.outcome(symbol);
        if (!draft.isFree(symbol)) {
            throw parts.fault(symbol + " is not a free symbol", "not-free");
        }
        return symbol;
    }

    /** Refuses an end of a bracket, or a value, that rests on the very symbol that is bound. */
    private void doesNotRestOn(String free, Formula formula) {
        for (String symbol : SymbolsReading.of(formula)) {
            if (draft.reach.getOrDefault(symbol, Set.of()).contains(free)) {
                throw parts.fault(symbol + " rests on " + free + ", which is bound here", "rests-on-itself");
            }
        }
    }

    private Sign signOf(String free) {
        return draft.items.stream()
                .filter(item -> item instanceof Item.Free f && f.symbol().equals(free))
                .map(item -> ((Item.Free) item).sign())
                .findFirst()
                .orElse(Sign.ANY);
    }

    private Formula renamed(Formula formula) {
        return parts.subscript == null ? formula : Renaming.of(formula, parts::symbolOf);
    }

    private DimensionReading dimensions(FormulaParser parser) {
        return new DimensionReading(draft::outcome, parts.subscript == null ? parser.offsets() : Map.of());
    }
}
