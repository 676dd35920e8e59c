package nappe.figure;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import nappe.calculation.Cell;
import nappe.calculation.Scope;
import nappe.formula.Formula;
import nappe.formula.Guard;
import nappe.formula.NumberReading;
import nappe.formula.SymbolsReading;
import nappe.formula.Value;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.results.Drawing;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;
import org.jspecify.annotations.Nullable;

/**
 * Draws a figure for one case: coordinates as numbers in the working unit. A part without a number is left out, and the
 * notes say what was missing.
 */
public final class Drafting {
    private final FigureSheet figure;
    private final MethodSheet method;
    private final Scope scope;
    private final Map<Cell, Value> values;
    private final WorkingSystem system;
    private final Map<String, Value> lets = new LinkedHashMap<>();

    /** What is said in place of parts that are left out. */
    private final Set<String> said = new LinkedHashSet<>();

    /** Why a symbol has no number, in the order in which it was missed. */
    private final Map<String, String> missed = new LinkedHashMap<>();

    private Drafting(
            FigureSheet figure, MethodSheet method, Scope scope, Map<Cell, Value> values, WorkingSystem system) {
        this.figure = figure;
        this.method = method;
        this.scope = scope;
        this.values = values;
        this.system = system;
    }

    /**
     * @param scope of the case that is drawn
     * @param caseName what the title calls it
     */
    public static Drawing draw(
            FigureSheet figure,
            MethodSheet method,
            Scope scope,
            Map<Cell, Value> values,
            WorkingSystem system,
            String caseName) {
        return new Drafting(figure, method, scope, values, system).draw(caseName);
    }

    private Drawing draw(String caseName) {
        figure.lets().forEach((name, formula) -> lets.put(name, value(formula)));
        List<Drawing.View> views = new ArrayList<>();
        for (FigureSheet.View view : figure.views()) {
            List<Drawing.Part> parts = new ArrayList<>();
            view.parts().forEach(placed -> placed(placed).ifPresent(parts::add));
            views.add(new Drawing.View(view.title(), why(view.schematic()), parts));
        }
        return new Drawing(
                "Geometry and levels, case " + caseName,
                system.coherentUnit(Dimension.LENGTH),
                why(figure.schematic()),
                views,
                notes());
    }

    private String why(FigureSheet.@Nullable Schematic schematic) {
        return schematic != null && reading().holds(schematic.when()) ? schematic.why() : "";
    }

    private Optional<Drawing.Part> placed(FigureSheet.Placed placed) {
        Optional<Drawing.Part> part = part(placed.part());
        Formula when = placed.when();
        if (part.isPresent() && when != null && !reading().holds(when)) {
            if (!placed.otherwise().isEmpty()) {
                said.add(placed.otherwise());
            }
            return Optional.empty();
        }
        return part;
    }

    private Optional<Drawing.Part> part(FigureSheet.Part part) {
        List<Drawing.Point> points = new ArrayList<>();
        boolean whole = true;
        for (FigureSheet.Point point : part.points()) {
            Optional<Double> x = number(point.x());
            Optional<Double> y = number(point.y());
            if (x.isPresent() && y.isPresent()) {
                points.add(new Drawing.Point(x.get(), y.get()));
            } else {
                whole = false;
            }
        }
        String printed = printed(part);
        if (!printed.isEmpty()) {
            whole &= number(new Formula.Symbol(printed)).isPresent();
        }
        return whole ? Optional.of(made(part, points)) : Optional.empty();
    }

    /** The symbol whose value is printed at a part; empty for none. */
    private static String printed(FigureSheet.Part part) {
        return part instanceof FigureSheet.Dimension dimension
                ? dimension.symbol()
                : part instanceof FigureSheet.Level level
                        ? level.symbol()
                        : part instanceof FigureSheet.Water water ? water.symbol() : "";
    }

    private Drawing.Part made(FigureSheet.Part part, List<Drawing.Point> points) {
        Drawing.Point first = points.get(0);
        Drawing.Point last = points.get(points.size() - 1);
        if (part instanceof FigureSheet.Path path) {
            return new Drawing.Path(path.pen(), path.closed(), points);
        } else if (part instanceof FigureSheet.Water water) {
            return new Drawing.Water(
                    first, last, water.symbol().isEmpty() ? null : quantity(water.symbol(), water.words()));
        } else if (part instanceof FigureSheet.Dimension dimension) {
            return new Drawing.Dimension(
                    dimension.side(), dimension.rank(), first, last, quantity(dimension.symbol(), ""));
        } else if (part instanceof FigureSheet.Level level) {
            return new Drawing.Level(first, quantity(level.symbol(), level.words()));
        } else if (part instanceof FigureSheet.Gauge gauge) {
            return new Drawing.Gauge(first, gauge.words());
        } else if (part instanceof FigureSheet.Label label) {
            return new Drawing.Label(first, label.words());
        }
        return new Drawing.Flow(first, last);
    }

    private Drawing.Quantity quantity(String symbol, String words) {
        return new Drawing.Quantity(symbol, scope.cell(symbol), words);
    }

    private Optional<Double> number(Formula formula) {
        Value value = value(formula);
        if (value instanceof Value.Number number) {
            return Optional.of(number.value());
        }
        note(formula);
        return Optional.empty();
    }

    /** Notes each symbol of the method for want of which the formula has no number. */
    private void note(Formula formula) {
        for (String symbol : SymbolsReading.of(formula)) {
            Formula let = figure.lets().get(symbol);
            if (of(symbol) instanceof Value.Number) {
                continue;
            }
            if (let != null) {
                note(let);
            } else {
                missed.put(symbol, words(of(symbol)));
            }
        }
    }

    private Value value(Formula formula) {
        for (String symbol : Guard.guarded(formula)) {
            if (!(of(symbol) instanceof Value.Number)) {
                return new Value.None(words(of(symbol)));
            }
        }
        return formula.read(reading());
    }

    private Value of(String symbol) {
        Value let = lets.get(symbol);
        if (let != null) {
            return let;
        }
        Value value = values.get(scope.cell(symbol));
        return value == null ? new Value.None(Value.NO_RESULT) : value;
    }

    private NumberReading reading() {
        return new NumberReading(new NumberReading.Values() {
            @Override
            public Value of(String symbol) {
                return Drafting.this.of(symbol);
            }

            @Override
            public List<Value> column(String symbol) {
                throw new IllegalStateException("no columns in a figure");
            }

            @Override
            public double size(Unit unit) {
                return unit.sizeIn(system);
            }
        });
    }

    private List<String> notes() {
        List<String> notes = new ArrayList<>();
        for (FigureSheet.Worded one : figure.worded()) {
            notes.add(one.words() + ": " + words(of(one.symbol())) + ".");
        }
        Map<String, List<String>> byWords = new LinkedHashMap<>();
        missed.forEach((symbol, words) ->
                byWords.computeIfAbsent(words, w -> new ArrayList<>()).add(symbol));
        byWords.forEach(
                (words, symbols) -> notes.add("Not drawn, since there is " + why(words) + ": " + named(symbols) + "."));
        notes.addAll(said);
        for (FigureSheet.Note note : figure.notes()) {
            Formula when = note.when();
            if (when == null || reading().holds(when)) {
                notes.add(note.text());
            }
        }
        return notes;
    }

    private static String why(String words) {
        return words.equals(Value.NOT_GIVEN) ? "no value given" : words;
    }

    /** A few symbols with what they stand for, many by themselves. */
    private String named(List<String> symbols) {
        boolean few = symbols.size() <= 3;
        return String.join(
                ", ", symbols.stream().map(s -> few ? label(s) + " " + s : s).toList());
    }

    private String label(String symbol) {
        Item item = method.item(symbol);
        return item instanceof Item.Line line ? line.label() : item instanceof Item.Given given ? given.label() : "";
    }

    private static String words(Value value) {
        return value instanceof Value.Word word
                ? word.text()
                : value instanceof Value.None none ? none.why() : "number";
    }
}
