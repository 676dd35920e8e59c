package nappe.station;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import nappe.formula.Guard;
import nappe.formula.NumberReading;
import nappe.formula.PlainReading;
import nappe.formula.Value;
import nappe.method.Geometry;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.station.Design.Element;
import nappe.station.Design.Typed;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * Checks that what was typed of a device can be built. What is left blank is not judged, unless the condition itself asks
 * whether it is given.
 */
final class GeometryCheck implements NumberReading.Values {
    private final Element element;
    private final MethodSheet method;

    private GeometryCheck(Element element, MethodSheet method) {
        this.element = element;
        this.method = method;
    }

    static List<DesignFault> faults(Design design, Map<String, MethodSheet> methods) {
        List<DesignFault> faults = new ArrayList<>();
        for (Element element : design.elements()) {
            MethodSheet method = methods.get(element.tag());
            if (method != null) {
                faults.addAll(new GeometryCheck(element, method).faults());
            }
        }
        return faults;
    }

    private List<DesignFault> faults() {
        NumberReading reading = new NumberReading(this);
        return method.geometry().stream()
                .filter(this::isJudged)
                .filter(geometry -> !reading.holds(geometry.condition()))
                .map(this::fault)
                .toList();
    }

    /** What the condition asks for by {@code given(...)} may be blank; all else it names must be there. */
    private boolean isJudged(Geometry geometry) {
        return geometry.entries().stream().allMatch(symbol -> isGiven(symbol) || isAsked(geometry, symbol));
    }

    private boolean isAsked(Geometry geometry, String symbol) {
        return method.item(symbol) instanceof Item.Given given
                && given.from() == Item.From.ENTRY
                && !Guard.guarded(geometry.condition()).contains(symbol);
    }

    private boolean isGiven(String symbol) {
        Typed typed = element.typed().get(symbol);
        return typed != null && !(typed.value() instanceof Value.None);
    }

    private DesignFault fault(Geometry geometry) {
        List<String> entries = geometry.entries();
        String read = entries.stream().map(this::shown).collect(Collectors.joining(", "));
        String first = entries.stream().filter(this::isGiven).findFirst().orElse(entries.get(0));
        boolean compares = entries.stream().noneMatch(symbol -> isAsked(geometry, symbol));
        return new DesignFault(
                typed(first).origin(),
                "with " + read + " this cannot be built: " + geometry.label()
                        + (compares ? ", " + PlainReading.of(geometry.condition()) : "") + "; correct what is wrong",
                "geometry-impossible");
    }

    private String shown(String symbol) {
        if (!isGiven(symbol)) {
            return symbol + " left blank";
        }
        Typed typed = typed(symbol);
        if (typed.value() instanceof Value.Number number) {
            String unit = typed.unit().text();
            return symbol + " = " + plain(number.value()) + (unit.equals("1") ? "" : " " + unit);
        }
        return symbol + " = " + (typed.value() instanceof Value.Word word ? "\"" + word.text() + "\"" : "");
    }

    private static String plain(double value) {
        String text = Double.toString(value);
        return text.endsWith(".0") ? text.substring(0, text.length() - 2) : text;
    }

    private Typed typed(String symbol) {
        return java.util.Objects.requireNonNull(element.typed().get(symbol));
    }

    @Override
    public Value of(String symbol) {
        @Nullable Item item = method.item(symbol);
        if (item instanceof Item.Constant constant) {
            return Value.of(inSi(constant.value(), constant.unit()));
        }
        if (!isGiven(symbol)) {
            return new Value.None(Value.NOT_GIVEN);
        }
        Typed typed = typed(symbol);
        return typed.value() instanceof Value.Number number
                ? Value.of(inSi(number.value(), typed.unit()))
                : typed.value();
    }

    private static double inSi(double value, Unit unit) {
        return value * unit.sizeInSi() + unit.zeroInSi();
    }

    @Override
    public List<Value> column(String symbol) {
        throw new IllegalStateException("no column of " + symbol + " is read before anything is laid out");
    }

    @Override
    public double size(Unit unit) {
        return unit.sizeInSi();
    }
}
