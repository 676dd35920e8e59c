package nappe.method;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.formula.Comparator;
import nappe.formula.DimensionReading;
import nappe.formula.Formula;
import nappe.formula.FormulaException;
import nappe.formula.FormulaParser;
import nappe.formula.Renaming;
import nappe.formula.Sign;
import nappe.formula.SymbolsReading;
import nappe.formula.Value;
import nappe.source.Citation;
import nappe.source.CitedTable;
import nappe.source.Publication;
import nappe.source.TextLibrary;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/** Reads one statement into the draft; a method for each statement word. */
final class StatementReader {
    private static final String WORDS = "words";
    /** What a symbol may be to the station. */
    private static final List<String> ROLES = List.of("flow", "water level", "energy level", "head at the gauge");

    /** Both ends of the bracket, and one step from them. */
    private static final int LEAST_TRIALS = 3;

    private static final Pattern NAME = Pattern.compile("[A-Za-z][A-Za-z0-9_]*");

    private final SheetDraft draft;
    private final Statement statement;
    private final @Nullable String subscript;
    private final MethodReader files;
    private final TextLibrary library;
    private final Set<String> open;
    private int base;
    private final Set<String> defining = new HashSet<>();

    StatementReader(
            SheetDraft draft,
            Statement statement,
            @Nullable String subscript,
            MethodReader files,
            TextLibrary library,
            Set<String> open) {
        this.draft = draft;
        this.statement = statement;
        this.subscript = subscript;
        this.files = files;
        this.library = library;
        this.open = open;
    }

    /** Where in the statement's text the part that is being read starts. */
    int base() {
        return base;
    }

    /** Notes that what this statement would define is not there, so that no later fault follows from it. */
    void spoil() {
        defining.stream().filter(symbol -> !draft.knows(symbol)).forEach(draft::markBroken);
    }

    /** Notes the symbols that the statement would define, however much of it can be read. */
    private void noteDefined() {
        String defines = switch (statement.word()) {
            case "method", "about", "caution", "source", "include", "table", "limit", "rating", "give" -> "";
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

    void read() {
        noteDefined();
        switch (statement.word()) {
            case "method" -> draft.title = statement.rest();
            case "about" -> draft.about.add(statement.rest());
            case "caution" -> draft.cautions.add(statement.rest());
            case "source" -> source();
            case "include" -> include();
            case "requires" -> requires();
            case "entry" -> given(Item.From.ENTRY);
            case "case" -> given(Item.From.CASE);
            case "take" -> given(Item.From.NEIGHBOUR);
            case "choice" -> choice();
            case "constant" -> constant();
            case "table" -> table();
            case "column" -> column();
            case "free" -> free();
            case "line" -> line();
            case "root" -> root();
            case "at" -> at();
            case "limit" -> limit();
            case "rating" -> rating();
            case "give" -> give();
            default -> throw new FormulaException(
                    "\"" + statement.word() + "\" is not a statement word", 0, statement.word().length(), "statement-unknown");
        }
    }

    private void source() {
        String key = text(0);
        if (!key.isEmpty()) {
            draft.sources.putIfAbsent(key, new Publication(key, text(1), text(2).equals("memory")));
        }
        if (key.isEmpty() || text(1).isEmpty()) {
            throw fault("a source has a key and a publication: source KEY ; publication", "source-unclear");
        }
        memory(2);
    }

    private void include() {
        String[] words = text(0).split("\\s+");
        String name = words[0];
        boolean withSubscript = words.length == 3 && words[1].equals("subscript");
        if (words.length != 1 && !withSubscript) {
            throw fault("write: include file, or: include file subscript s", "include-unclear");
        }
        String included = library.text("methods/" + name + ".txt");
        if (included == null) {
            throw fault("there is no text methods/" + name + ".txt to include", "include-missing");
        }
        if (open.contains(name)) {
            throw fault(name + " includes itself", "include-circle");
        }
        Set<String> nowOpen = new HashSet<>(open);
        nowOpen.add(name);
        String inner = withSubscript ? (subscript == null ? words[2] : words[2] + subscript) : subscript;
        files.readInto(draft, name, included, inner, nowOpen);
    }

    private void requires() {
        FormulaParser parser = parser(0);
        String symbol = symbolOf(parser.name());
        parser.end();
        DimensionReading.Outcome outcome = draft.outcome(symbol);
        DimensionReading.Outcome wanted = new DimensionReading.Quantity(unit(1).dimension());
        if (!outcome.equals(wanted)) {
            throw fault(symbol + " is of another dimension where this text is included", "unlike-dimensions");
        }
    }

    private void given(Item.From from) {
        FormulaParser parser = parser(0);
        String symbol = fresh(parser.name());
        String role = parser.passes("=") ? text(0).substring(text(0).indexOf('=') + 1).strip() : "";
        if (role.isEmpty()) {
            parser.end();
        }
        if (from == Item.From.NEIGHBOUR && role.isEmpty()) {
            throw fault("what is taken has a role: take z_t = water level", "role-missing");
        }
        if (from == Item.From.ENTRY && !role.isEmpty()) {
            throw fault("an entry has no role; it is typed", "role-unknown");
        }
        if (!role.isEmpty()) {
            checkRole(role);
        }
        Unit unit = unit(1);
        String rules = text(3);
        Sign sign = rules.contains("any sign")
                ? Sign.ANY
                : rules.contains("not negative") ? Sign.NOT_NEGATIVE : Sign.POSITIVE;
        boolean optional = rules.contains("optional");
        String left = rules.replace("any sign", "").replace("not negative", "").replace("optional", "").replace(",", "");
        if (!left.isBlank()) {
            base = statement.field(3).offset();
            throw fault("\"" + left.strip() + "\": only any sign, not negative and optional are known here", "rule-unknown");
        }
        define(symbol, unit);
        draft.add(new Item.Given(from, symbol, unit, text(2), sign, optional, role, List.of(), ""));
    }

    private void choice() {
        FormulaParser parser = parser(0);
        String symbol = fresh(parser.name());
        String[] words = text(0).split("\\s+");
        if (words.length != 3 || !words[1].equals("from")) {
            throw fault("write: choice symbol from table ; label", "choice-unclear");
        }
        CitedTable table = tableNamed(words[2]);
        CitedTable.Column first = table.columns().get(0);
        if (!first.isWords()) {
            throw fault("the first column of " + table.name() + " does not hold words", "choice-unclear");
        }
        base = statement.field(0).offset();
        List<String> keys = first.values().stream()
                .map(value -> ((Value.Word) value).text())
                .toList();
        draft.define(symbol, new DimensionReading.Words());
        draft.add(new Item.Given(
                Item.From.CHOICE, symbol, Unit.one(), text(1), Sign.POSITIVE, false, "", keys, table.name()));
    }

    private void constant() {
        FormulaParser parser = parser(0);
        String symbol = fresh(parser.name());
        parser.expect("=");
        Formula value = parser.sum();
        parser.end();
        Unit unit = unit(1);
        Citation citation = citation(3);
        if (citation == null) {
            throw fault("a constant names its source", "source-missing");
        }
        if (value instanceof Formula.Quantity quantity) {
            sameDimension(unit, new DimensionReading.Quantity(quantity.unit().dimension()));
            draft.add(new Item.Constant(symbol, quantity.value(), quantity.text(), quantity.unit(), text(2), citation));
        } else if (value instanceof Formula.Numeral numeral) {
            sameDimension(unit, new DimensionReading.Quantity(Dimension.NONE));
            draft.add(new Item.Constant(symbol, numeral.value(), numeral.text(), unit, text(2), citation));
        } else {
            base = statement.field(0).offset();
            throw fault("a constant is one number, with its unit", "constant-unclear");
        }
        define(symbol, unit);
    }

    private void table() {
        draft.openTable = null;
        draft.openTableIsBroken = true;
        base = statement.field(0).offset();
        String[] words = text(0).split("\\s+");
        if (words.length != 3 || !(words[1].equals("by") || words[1].equals("between"))) {
            throw fault("write: table name by choice, or: table name between number", "table-unclear");
        }
        CitedTable table = tableNamed(words[0]);
        String key = symbolOf(words[2]);
        DimensionReading.Outcome outcome = draft.outcome(key);
        hasValue(new Formula.Symbol(key));
        new TableLines(draft, table, key, source(1)).open(words[1].equals("between"), outcome);
        draft.openTableIsBroken = false;
    }

    private void column() {
        FormulaParser parser = parser(0);
        String symbol = fresh(parser.name());
        String column = parser.passes("=") ? parser.name() : text(0).strip();
        parser.end();
        @Nullable Unit unit = text(1).equals(WORDS) ? null : unit(1);
        TableLines.column(draft, symbol, column, unit, text(2), source(3));
        defineOutcome(symbol, unit);
    }

    private void free() {
        FormulaParser parser = parser(0);
        String symbol = fresh(parser.name());
        parser.end();
        Unit unit = unit(1);
        Sign sign = text(3).equals("any sign") ? Sign.ANY : Sign.POSITIVE;
        define(symbol, unit);
        draft.add(new Item.Free(symbol, unit, text(2), sign));
    }

    private void line() {
        FormulaParser parser = parser(0);
        String symbol = fresh(parser.name());
        parser.expect("=");
        Formula formula = renamed(parser.condition());
        parser.end();
        DimensionReading.Outcome outcome = formula.read(dimensions(parser));
        @Nullable Unit unit = text(1).equals(WORDS) ? null : unit(1);
        sameDimension(unit, outcome);
        defineOutcome(symbol, unit);
        draft.add(new Item.Line(symbol, formula, unit, text(2), source(3), null, false));
    }

    private void root() {
        FormulaParser parser = parser(0);
        String symbol = fresh(parser.name());
        parser.expect("=");
        String free = freeSymbol(symbolOf(parser.name()));
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
            throw fault("a root takes " + LEAST_TRIALS + " trials or more", "trials-few");
        }
        DimensionReading dimensions = dimensions(parser);
        if (!dimensions.dimension(left).equals(dimensions.dimension(right))) {
            throw fault(
                    "the two sides differ: " + dimensions.dimension(left) + " and " + dimensions.dimension(right),
                    "unlike-dimensions");
        }
        Unit unit = unit(1);
        sameDimension(unit, draft.outcome(free));
        for (Formula end : java.util.Arrays.asList(from, to, below, above)) {
            if (end != null) {
                sameDimension(unit, end.read(dimensions));
                doesNotRestOn(free, end);
            }
        }
        Set<String> targets = new LinkedHashSet<>(SymbolsReading.of(left));
        targets.addAll(SymbolsReading.of(right));
        List<Item> members = Closure.of(draft.items, draft.reach, free, targets);
        define(symbol, unit);
        draft.add(new Item.Root(
                symbol, free, signOf(free), left, right, from, to, below, above, trials, members, unit, text(2), source(3)));
    }

    private void at() {
        FormulaParser parser = parser(0);
        String free = freeSymbol(symbolOf(parser.name()));
        parser.expect("=");
        Formula value = renamed(parser.sum());
        DimensionReading.Outcome outcome = value.read(dimensions(parser));
        if (!outcome.equals(draft.outcome(free))) {
            throw fault(free + " and its value differ in dimension", "unlike-dimensions");
        }
        doesNotRestOn(free, value);
        parser.expect(":");
        Map<String, String> results = new LinkedHashMap<>();
        do {
            String out = fresh(parser.name());
            parser.expect("=");
            String member = symbolOf(parser.name());
            draft.outcome(member);
            results.put(out, member);
        } while (parser.passes(","));
        parser.end();
        List<Item> members = Closure.of(draft.items, draft.reach, free, Set.copyOf(results.values()));
        results.forEach((out, member) -> draft.define(out, draft.outcome(member)));
        draft.add(new Item.At(free, value, members, results));
    }

    private void limit() {
        FormulaParser parser = parser(0);
        List<Formula> chain = new ArrayList<>(List.of(renamed(parser.sum())));
        while (parser.passes(Comparator.AT_MOST.sign())) {
            chain.add(renamed(parser.sum()));
        }
        @Nullable Formula when = parser.passes("when") ? renamed(parser.condition()) : null;
        @Nullable Formula scale = parser.passes("scale") ? renamed(parser.sum()) : null;
        parser.end();
        if (chain.size() < 2 || chain.size() > 3) {
            throw fault("a limit is a <= b, or a <= b <= c", "limit-unclear");
        }
        DimensionReading dimensions = dimensions(parser);
        for (Formula side : chain) {
            if (!dimensions.dimension(side).equals(dimensions.dimension(chain.get(0)))) {
                throw fault("the sides of the limit differ in dimension", "unlike-dimensions");
            }
        }
        if (scale != null && !dimensions.dimension(scale).equals(dimensions.dimension(chain.get(0)))) {
            throw fault("the scale of the limit differs from its sides in dimension", "unlike-dimensions");
        }
        if (when != null) {
            dimensions.condition(when);
        }
        chain.forEach(this::hasValue);
        if (scale != null) {
            hasValue(scale);
        }
        if (when != null) {
            hasValue(when);
        }
        String label = text(1);
        String source = source(2);
        if (source.isEmpty()) {
            throw fault("a limit names its source", "source-missing");
        }
        if (chain.size() == 3) {
            draft.limits.add(new Limit(chain.get(0), chain.get(1), false, scale, when, label + ", lower end", source));
            draft.limits.add(new Limit(chain.get(1), chain.get(2), true, scale, when, label + ", upper end", source));
        } else {
            boolean valueIsLesser = varies(chain.get(0)) || !varies(chain.get(1)) && !isBound(chain.get(0));
            draft.limits.add(new Limit(chain.get(0), chain.get(1), valueIsLesser, scale, when, label, source));
        }
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

    private void rating() {
        FormulaParser parser = parser(0);
        String free = freeSymbol(symbolOf(parser.name()));
        parser.expect("from");
        Formula from = renamed(parser.sum());
        parser.expect("to");
        Formula to = renamed(parser.sum());
        parser.expect("steps");
        int steps = parser.count();
        parser.expect(":");
        List<String> results = new ArrayList<>();
        do {
            results.add(symbolOf(parser.name()));
        } while (parser.passes(","));
        parser.end();
        results.forEach(draft::outcome);
        DimensionReading dimensions = dimensions(parser);
        for (Formula end : List.of(from, to)) {
            if (!end.read(dimensions).equals(draft.outcome(free))) {
                throw fault(free + " and an end of its table differ in dimension", "unlike-dimensions");
            }
            hasValue(end);
        }
        if (steps < 1) {
            throw fault("a rating takes 1 step or more", "steps-few");
        }
        List<Item> members = Closure.of(draft.items, draft.reach, free, Set.copyOf(results));
        draft.ratings.add(new Rating(free, from, to, steps, List.copyOf(results), members));
    }

    private void give() {
        base = statement.field(0).offset();
        String text = text(0);
        int equals = text.indexOf('=');
        if (equals < 0) {
            throw fault("write: give water level = z_u", "give-unclear");
        }
        String symbol = symbolOf(text.substring(equals + 1).strip());
        draft.outcome(symbol);
        hasValue(new Formula.Symbol(symbol));
        String role = text.substring(0, equals).strip();
        checkRole(role);
        draft.gives.put(role, symbol);
    }

    private void checkRole(String role) {
        if (!ROLES.contains(role)) {
            throw fault("\"" + role + "\" is no role; roles are " + String.join(", ", ROLES), "role-unknown");
        }
    }

    // --- parts of statements

    private FormulaParser parser(int field) {
        base = statement.field(field).offset();
        return new FormulaParser(text(field));
    }

    private String text(int field) {
        return statement.field(field).text();
    }

    private Unit unit(int field) {
        base = statement.field(field).offset();
        Unit unit = Unit.parse(text(field));
        base = statement.field(0).offset();
        return unit;
    }

    private boolean memory(int field) {
        String mark = text(field);
        if (!mark.isEmpty() && !mark.equals("memory")) {
            base = statement.field(field).offset();
            throw fault("the only mark known here is \"memory\"", "mark-unknown");
        }
        return mark.equals("memory");
    }

    private @Nullable Citation citation(int field) {
        String text = text(field);
        if (text.isEmpty()) {
            return null;
        }
        String key = text.split("\\s+", 2)[0];
        Publication publication = draft.sources.get(key);
        if (publication == null) {
            base = statement.field(field).offset();
            throw fault(key + " is not a source of this sheet", "source-unknown");
        }
        String place = text.substring(key.length()).strip();
        return new Citation(publication, place, memory(field + 1));
    }

    private String source(int field) {
        Citation citation = citation(field);
        return citation == null ? "" : citation.shown();
    }

    private CitedTable tableNamed(String name) {
        CitedTable known = draft.tables.get(name);
        if (known != null) {
            return known;
        }
        if (draft.isBrokenTable(name)) {
            throw fault(name, SheetDraft.FOLLOWS);
        }
        draft.markBrokenTable(name);
        String text = library.text("tables/" + name + ".csv");
        if (text == null) {
            throw fault("there is no table tables/" + name + ".csv", "table-missing");
        }
        CitedTable table = CitedTable.read(name, text);
        draft.tables.put(name, table);
        draft.markReadTable(name);
        draft.text.append(text).append('\n');
        return table;
    }

    private String symbolOf(String name) {
        return subscript == null ? name : name.contains("_") ? name + subscript : name + "_" + subscript;
    }

    private String fresh(String name) {
        String symbol = symbolOf(name);
        if (draft.knows(symbol)) {
            throw fault(symbol + " is defined already", "symbol-twice");
        }
        defining.add(symbol);
        return symbol;
    }

    private String freeSymbol(String symbol) {
        draft.outcome(symbol);
        if (!draft.isFree(symbol)) {
            throw fault(symbol + " is not a free symbol", "not-free");
        }
        return symbol;
    }

    /** Refuses what rests on a free symbol where a value is needed. */
    private void hasValue(Formula formula) {
        for (String symbol : SymbolsReading.of(formula)) {
            for (String free : draft.reach.getOrDefault(symbol, Set.of())) {
                if (draft.isFree(free)) {
                    throw fault(
                            symbol.equals(free)
                                    ? symbol + " is free and has no value by itself; bind it with at"
                                    : symbol + " rests on the free symbol " + free + " and has no value by itself; name one with at",
                            "no-value");
                }
            }
        }
    }

    /** Refuses an end of a bracket, or a value, that rests on the very symbol that is bound. */
    private void doesNotRestOn(String free, Formula formula) {
        for (String symbol : SymbolsReading.of(formula)) {
            if (draft.reach.getOrDefault(symbol, Set.of()).contains(free)) {
                throw fault(symbol + " rests on " + free + ", which is bound here", "rests-on-itself");
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
        return subscript == null ? formula : Renaming.of(formula, this::symbolOf);
    }

    private DimensionReading dimensions(FormulaParser parser) {
        return new DimensionReading(draft::outcome, subscript == null ? parser.offsets() : Map.of());
    }

    private void define(String symbol, Unit unit) {
        draft.define(symbol, new DimensionReading.Quantity(unit.dimension()));
    }

    private void defineOutcome(String symbol, @Nullable Unit unit) {
        draft.define(
                symbol,
                unit == null ? new DimensionReading.Words() : new DimensionReading.Quantity(unit.dimension()));
    }

    private void sameDimension(@Nullable Unit unit, DimensionReading.Outcome outcome) {
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

    private FormulaException fault(String message, String code) {
        return new FormulaException(message, 0, 1, code);
    }
}
