package nappe.method;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import nappe.formula.DimensionReading;
import nappe.formula.Formula;
import nappe.formula.FormulaException;
import nappe.formula.FormulaParser;
import nappe.formula.Sign;
import nappe.source.Citation;
import nappe.source.Publication;
import nappe.source.TextException;
import nappe.source.TextLibrary;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/** Reads one statement into the draft; says which method reads each statement word. */
final class StatementReader {
    /** What a symbol may be to the station. */
    private static final List<String> ROLES = List.of(
            "flow",
            "flow through one",
            "units in service",
            "water level",
            "energy level",
            "rapid depth",
            "head at the gauge",
            "state of flow",
            "measurement",
            "reason",
            "standing of the level",
            "remark",
            "scale of levels",
            "control width");

    private final StatementParts parts;
    private final SheetDraft draft;
    private final MethodReader files;
    private final TextLibrary library;
    private final Set<String> open;
    private final TableStatements tables;
    private final FormulaStatements formulas;

    StatementReader(StatementParts parts, MethodReader files, TextLibrary library, Set<String> open) {
        this.parts = parts;
        this.draft = parts.draft;
        this.files = files;
        this.library = library;
        this.open = open;
        this.tables = new TableStatements(parts, library);
        this.formulas = new FormulaStatements(parts);
    }

    void read() {
        parts.noteDefined();
        switch (parts.statement.word()) {
            case "method" -> draft.title = parts.statement.rest();
            case "range" -> range();
            case "about" -> draft.about.add(parts.statement.rest());
            case "caution" -> draft.cautions.add(parts.statement.rest());
            case "source" -> source();
            case "include" -> include();
            case "requires" -> requires();
            case "entry" -> given(Item.From.ENTRY);
            case "case" -> given(Item.From.CASE);
            case "take" -> given(Item.From.NEIGHBOUR);
            case "choice" -> tables.choice();
            case "constant" -> constant();
            case "table" -> tables.table();
            case "column" -> tables.column();
            case "free" -> free();
            case "line" -> formulas.line();
            case "root" -> formulas.root();
            case "at" -> formulas.at();
            case "limit" -> formulas.limit();
            case "geometry" -> formulas.geometry();
            case "rating" -> formulas.rating();
            case "screen" -> new ScreenStatement(parts).read();
            case "give" -> give();
            default ->
                throw new FormulaException(
                        "\"" + parts.statement.word() + "\" is not a statement word",
                        0,
                        parts.statement.word().length(),
                        "statement-unknown");
        }
    }

    /** Words for the list of methods, which takes them from the text; nothing is calculated with them. */
    private void range() {
        if (parts.statement.rest().isEmpty()) {
            throw parts.fault(
                    "a range says in words where the method holds: range heads of 0.03 m to 0.6 m", "range-unclear");
        }
    }

    private void source() {
        String key = parts.text(0);
        if (!key.isEmpty()) {
            draft.sources.putIfAbsent(
                    key, new Publication(key, parts.text(1), parts.text(2).equals("memory")));
        }
        if (key.isEmpty() || parts.text(1).isEmpty()) {
            throw parts.fault("a source has a key and a publication: source KEY ; publication", "source-unclear");
        }
        parts.memory(2);
    }

    private void include() {
        String[] words = parts.text(0).split("\\s+");
        String name = words[0];
        boolean withSubscript = words.length == 3 && words[1].equals("subscript");
        if (words.length != 1 && !withSubscript) {
            throw parts.fault("write: include file, or: include file subscript s", "include-unclear");
        }
        String included = text("methods/" + name + ".txt");
        if (included == null) {
            throw parts.fault("there is no text methods/" + name + ".txt to include", "include-missing");
        }
        if (open.contains(name)) {
            throw parts.fault(name + " includes itself", "include-circle");
        }
        Set<String> nowOpen = new HashSet<>(open);
        nowOpen.add(name);
        String inner =
                withSubscript ? (parts.subscript == null ? words[2] : words[2] + parts.subscript) : parts.subscript;
        files.readInto(draft, name, included, inner, nowOpen);
    }

    /** A text that is there and cannot be read: no later fault of a symbol follows from that. */
    private @Nullable String text(String path) {
        try {
            return library.text(path);
        } catch (TextException e) {
            draft.lacksText = true;
            throw e;
        }
    }

    private void requires() {
        FormulaParser parser = parts.parser(0);
        String symbol = parts.symbolOf(parser.name());
        parser.end();
        DimensionReading.Outcome outcome = draft.outcome(symbol);
        DimensionReading.Outcome wanted =
                new DimensionReading.Quantity(parts.unit(1).dimension());
        if (!outcome.equals(wanted)) {
            throw parts.fault(symbol + " is of another dimension where this text is included", "unlike-dimensions");
        }
    }

    private void given(Item.From from) {
        FormulaParser parser = parts.parser(0);
        String symbol = parts.fresh(parser.name());
        String role = parser.passes("=")
                ? parts.text(0).substring(parts.text(0).indexOf('=') + 1).strip()
                : "";
        if (role.isEmpty()) {
            parser.end();
        }
        if (from == Item.From.NEIGHBOUR && role.isEmpty()) {
            throw parts.fault("what is taken has a role: take z_t = water level", "role-missing");
        }
        if (from == Item.From.ENTRY && !role.isEmpty()) {
            throw parts.fault("an entry has no role; it is typed", "role-unknown");
        }
        if (!role.isEmpty()) {
            checkRole(role);
        }
        Unit unit = parts.unit(1);
        String rules = parts.text(3);
        Sign sign = rules.contains("any sign")
                ? Sign.ANY
                : rules.contains("not negative") ? Sign.NOT_NEGATIVE : Sign.POSITIVE;
        boolean optional = rules.contains("optional");
        String left = rules.replace("any sign", "")
                .replace("not negative", "")
                .replace("optional", "")
                .replace(",", "");
        if (!left.isBlank()) {
            parts.moveTo(3);
            throw parts.fault(
                    "\"" + left.strip() + "\": only any sign, not negative and optional are known here",
                    "rule-unknown");
        }
        parts.define(symbol, unit);
        draft.add(new Item.Given(from, symbol, unit, parts.text(2), sign, optional, role, List.of(), ""));
    }

    private void constant() {
        FormulaParser parser = parts.parser(0);
        String symbol = parts.fresh(parser.name());
        parser.expect("=");
        Formula value = parser.sum();
        parser.end();
        Unit unit = parts.unit(1);
        Citation citation = parts.citation(3);
        if (citation == null) {
            throw parts.fault("a constant names its source", "source-missing");
        }
        if (value instanceof Formula.Quantity quantity) {
            parts.sameDimension(
                    unit, new DimensionReading.Quantity(quantity.unit().dimension()));
            draft.add(new Item.Constant(
                    symbol, quantity.value(), quantity.text(), quantity.unit(), parts.text(2), citation));
        } else if (value instanceof Formula.Numeral numeral) {
            parts.sameDimension(unit, new DimensionReading.Quantity(Dimension.NONE));
            draft.add(new Item.Constant(symbol, numeral.value(), numeral.text(), unit, parts.text(2), citation));
        } else {
            parts.moveTo(0);
            throw parts.fault("a constant is one number, with its unit", "constant-unclear");
        }
        parts.define(symbol, unit);
    }

    private void free() {
        FormulaParser parser = parts.parser(0);
        String symbol = parts.fresh(parser.name());
        parser.end();
        Unit unit = parts.unit(1);
        Sign sign = parts.text(3).equals("any sign") ? Sign.ANY : Sign.POSITIVE;
        parts.define(symbol, unit);
        draft.add(new Item.Free(symbol, unit, parts.text(2), sign));
    }

    private void give() {
        parts.moveTo(0);
        String text = parts.text(0);
        int equals = text.indexOf('=');
        if (equals < 0) {
            throw parts.fault("write: give water level = z_u", "give-unclear");
        }
        String symbol = parts.symbolOf(text.substring(equals + 1).strip());
        draft.outcome(symbol);
        parts.hasValue(new Formula.Symbol(symbol));
        String role = text.substring(0, equals).strip();
        checkRole(role);
        draft.gives.put(role, symbol);
    }

    private void checkRole(String role) {
        if (!ROLES.contains(role)) {
            throw parts.fault("\"" + role + "\" is no role; roles are " + String.join(", ", ROLES), "role-unknown");
        }
    }
}
