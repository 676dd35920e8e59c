package nappe.figure;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import nappe.formula.DimensionReading;
import nappe.formula.Formula;
import nappe.formula.FormulaException;
import nappe.formula.FormulaParser;
import nappe.method.Item;
import nappe.method.MethodException;
import nappe.method.MethodSheet;
import nappe.method.Statement;
import nappe.results.Drawing.Pen;
import nappe.results.Drawing.Side;
import nappe.source.TextFault;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * Reads the text form of a figure, one statement a row as in method sheets:
 *
 * <pre>
 * schematic when CONDITION ; why it is not to scale    of the whole drawing, or below a view of that view
 * let       x = formula
 * view      title
 * wall      x, y ; x, y ; ...            line, hidden, axis, floor: other pens; outline: closed
 * water     x, y ; x, y ; symbol ; words
 * dimension SIDE RANK symbol ; x, y ; x, y
 * level     x, y ; symbol ; words
 * gauge     x, y ; words
 * label     x, y ; words
 * flow      x, y ; x, y
 * words     symbol ; words
 * note      text                                      note when CONDITION ; text: only where it holds
 * </pre>
 *
 * After a rank, two blanks keep a symbol that is also the name of a unit from being read as one ({@code 1  L}).
 * Any part of a view may end in {@code ; when CONDITION ; words}: where the condition does not hold it is left out, and the
 * words are said below the drawing. Coordinates are formulas of dimension length over the symbols of the method. All faults are collected.
 */
final class FigureReader {
    private final MethodSheet method;
    private final Map<String, Formula> lets = new LinkedHashMap<>();
    private final Map<String, DimensionReading.Outcome> known = new HashMap<>();
    private final List<FigureSheet.View> views = new ArrayList<>();
    private final List<FigureSheet.Worded> worded = new ArrayList<>();
    private final List<FigureSheet.Note> notes = new ArrayList<>();
    private FigureSheet.@Nullable Schematic schematic;
    private Statement statement;
    private int base;

    private FigureReader(MethodSheet method, Statement first) {
        this.method = method;
        this.statement = first;
    }

    /** @throws MethodException with all faults */
    static FigureSheet read(MethodSheet method, String file, String text) {
        List<Statement> statements = Statement.of(file, text);
        if (statements.isEmpty()) {
            throw new MethodException(List.of(new TextFault(file, 1, 1, "there is no statement", "figure-empty", "")));
        }
        FigureReader reader = new FigureReader(method, statements.get(0));
        List<TextFault> faults = new ArrayList<>();
        for (Statement statement : statements) {
            reader.statement = statement;
            reader.base = 0;
            try {
                reader.read();
            } catch (FormulaException e) {
                faults.add(statement.fault(reader.base + e.offset(), String.valueOf(e.getMessage()), e.code()));
            }
        }
        if (!faults.isEmpty()) {
            throw new MethodException(faults);
        }
        return new FigureSheet(reader.lets, reader.schematic, reader.views, reader.worded, reader.notes, text);
    }

    private void read() {
        switch (statement.word()) {
            case "let" -> let();
            case "schematic" -> schematic();
            case "view" -> views.add(new FigureSheet.View(text(0), null, new ArrayList<>()));
            case "wall" -> add(new FigureSheet.Path(Pen.WALL, false, points(0, own())));
            case "outline" -> add(new FigureSheet.Path(Pen.WALL, true, points(0, own())));
            case "line" -> add(new FigureSheet.Path(Pen.LINE, false, points(0, own())));
            case "hidden" -> add(new FigureSheet.Path(Pen.HIDDEN, false, points(0, own())));
            case "axis" -> add(new FigureSheet.Path(Pen.AXIS, false, points(0, own())));
            case "floor" -> add(new FigureSheet.Path(Pen.FLOOR, false, points(0, own())));
            case "water" ->
                add(new FigureSheet.Water(
                        points(0, 2), own() < 3 || text(2).isEmpty() ? "" : length(2), own() < 4 ? "" : text(3)));
            case "dimension" -> dimension();
            case "level" -> add(new FigureSheet.Level(points(0, 1), length(1), text(2)));
            case "gauge" -> add(new FigureSheet.Gauge(points(0, 1), text(1)));
            case "label" -> add(new FigureSheet.Label(points(0, 1), text(1)));
            case "flow" -> add(new FigureSheet.Flow(points(0, 2)));
            case "words" -> words();
            case "note" -> note();
            default ->
                throw new FormulaException(
                        "\"" + statement.word() + "\" is not a statement word of a figure",
                        0,
                        statement.word().length(),
                        "statement-unknown");
        }
    }

    private void add(FigureSheet.Part part) {
        if (views.isEmpty()) {
            base = 0;
            throw new FormulaException("a view comes first: view title", 0, 1, "view-missing");
        }
        Formula when = null;
        if (own() < statement.fieldCount()) {
            FormulaParser parser = parser(own());
            parser.expect("when");
            when = parser.condition();
            parser.end();
            dimensions(parser).condition(when);
        }
        views.get(views.size() - 1).parts().add(new FigureSheet.Placed(part, when, text(own() + 1)));
    }

    /** How many fields stand before the condition under which a part is drawn. */
    private int own() {
        int fields = 0;
        while (fields < statement.fieldCount() && !text(fields).startsWith("when ")) {
            fields++;
        }
        return fields;
    }

    private void let() {
        FormulaParser parser = parser(0);
        String symbol = parser.name();
        if (known.containsKey(symbol) || method.item(symbol) != null) {
            throw new FormulaException(symbol + " is defined already", 0, symbol.length(), "symbol-again");
        }
        known.put(symbol, new DimensionReading.Quantity(Dimension.LENGTH));
        parser.expect("=");
        Formula formula = parser.sum();
        parser.end();
        isLength(parser, formula);
        lets.put(symbol, formula);
    }

    private void schematic() {
        FormulaParser parser = parser(0);
        parser.expect("when");
        Formula when = parser.condition();
        parser.end();
        dimensions(parser).condition(when);
        FigureSheet.Schematic read = new FigureSheet.Schematic(when, text(1));
        if (views.isEmpty()) {
            schematic = read;
        } else {
            FigureSheet.View last = views.remove(views.size() - 1);
            views.add(new FigureSheet.View(last.title(), read, last.parts()));
        }
    }

    /** What stands after the first semicolon: a sentence may hold further ones. */
    private static String afterFirst(String rest) {
        return rest.substring(rest.indexOf(';') + 1).strip();
    }

    private void note() {
        if (!text(0).startsWith("when ")) {
            notes.add(new FigureSheet.Note(null, statement.rest()));
            return;
        }
        FormulaParser parser = parser(0);
        parser.expect("when");
        Formula when = parser.condition();
        parser.end();
        dimensions(parser).condition(when);
        if (text(1).isEmpty()) {
            throw new FormulaException("a note needs its sentence", parser.offset(), 1, "note-empty");
        }
        notes.add(new FigureSheet.Note(when, afterFirst(statement.rest())));
    }

    private void words() {
        FormulaParser parser = parser(0);
        String symbol = parser.name();
        parser.end();
        outcome(symbol);
        worded.add(new FigureSheet.Worded(symbol, text(1)));
    }

    /** Read word by word: as a formula, "1 d" would be one day. */
    private void dimension() {
        String text = text(0);
        String[] words = text.split("\\s+");
        base = statement.field(0).offset();
        if (words.length != 3 || !words[1].matches("\\d{1,2}")) {
            throw new FormulaException(
                    "write: dimension side rank symbol, such as dimension left 1 D", 0, 1, "dimension-unclear");
        }
        Side side = side(words[0]);
        lengthOf(words[2], text.length() - words[2].length());
        add(new FigureSheet.Dimension(side, Integer.parseInt(words[1]), words[2], points(1, 3)));
    }

    private static Side side(String name) {
        for (Side side : Side.values()) {
            if (side.name().toLowerCase(Locale.ROOT).equals(name)) {
                return side;
            }
        }
        throw new FormulaException(
                "a dimension stands above, below, left, right, along or here", 0, name.length(), "side-unknown");
    }

    /** A symbol whose value is a length. */
    private String length(int field) {
        FormulaParser parser = parser(field);
        int at = parser.offset();
        String symbol = parser.name();
        parser.end();
        lengthOf(symbol, at);
        return symbol;
    }

    private void lengthOf(String symbol, int at) {
        if (method.item(symbol) == null) {
            throw new FormulaException(
                    symbol + " is not a symbol of " + method.name() + ".txt", at, symbol.length(), "symbol-unknown");
        }
        if (!outcome(symbol).equals(new DimensionReading.Quantity(Dimension.LENGTH))) {
            throw new FormulaException(symbol + " is not a length", at, symbol.length(), "not-a-length");
        }
    }

    private List<FigureSheet.Point> points(int from, int to) {
        List<FigureSheet.Point> points = new ArrayList<>();
        for (int i = from; i < to; i++) {
            FormulaParser parser = parser(i);
            Formula x = parser.sum();
            parser.expect(",");
            Formula y = parser.sum();
            parser.end();
            isLength(parser, x);
            isLength(parser, y);
            points.add(new FigureSheet.Point(x, y));
        }
        return points;
    }

    private void isLength(FormulaParser parser, Formula formula) {
        Dimension dimension = dimensions(parser).dimension(formula);
        if (!dimension.equals(Dimension.LENGTH)) {
            int at = parser.offsets().getOrDefault(formula, 0);
            throw new FormulaException(
                    "a length is needed here, and this is " + dimension
                            + (dimension.isNone() ? "; nought is written 0 m" : ""),
                    at,
                    1,
                    "not-a-length");
        }
    }

    private DimensionReading dimensions(FormulaParser parser) {
        return new DimensionReading(this::outcome, parser.offsets());
    }

    private DimensionReading.Outcome outcome(String symbol) {
        DimensionReading.Outcome own = known.get(symbol);
        if (own != null) {
            return own;
        }
        Item item = method.item(symbol);
        if (item == null) {
            throw new FormulaException(
                    symbol + " is neither a symbol of " + method.name() + ".txt nor defined above",
                    0,
                    symbol.length(),
                    "symbol-unknown");
        }
        if (method.isTemplate(symbol) || item instanceof Item.Free) {
            throw new FormulaException(symbol + " has no value by itself", 0, symbol.length(), "symbol-free");
        }
        return outcome(symbol, item);
    }

    private DimensionReading.Outcome outcome(String symbol, Item item) {
        if (item instanceof Item.At at) {
            String own = java.util.Objects.requireNonNull(at.results().get(symbol));
            return outcome(own, java.util.Objects.requireNonNull(method.item(own)));
        }
        if (item instanceof Item.Given given && given.from() == Item.From.CHOICE) {
            return new DimensionReading.Words();
        }
        @Nullable
        Unit unit = item instanceof Item.Given given
                ? given.unit()
                : item instanceof Item.Constant constant
                        ? constant.unit()
                        : item instanceof Item.Root root
                                ? root.unit()
                                : item instanceof Item.Line line ? line.unit() : null;
        return unit == null ? new DimensionReading.Words() : new DimensionReading.Quantity(unit.dimension());
    }

    private FormulaParser parser(int field) {
        base = statement.field(field).offset();
        return new FormulaParser(statement.field(field).text());
    }

    private String text(int field) {
        return statement.field(field).text();
    }
}
