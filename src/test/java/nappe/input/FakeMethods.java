package nappe.input;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import nappe.formula.Sign;
import nappe.method.Declared;
import nappe.method.Declared.Kind;
import nappe.method.MethodCatalogue;
import nappe.unit.Unit;

/** Three invented methods: a trough, a plate and a reach. */
final class FakeMethods implements MethodCatalogue {
    private static final Map<String, String> TITLES =
            new TreeMap<>(Map.of("trough", "Trough", "plate", "Plate", "reach", "Reach"));

    @Override
    public List<String> names() {
        return List.copyOf(TITLES.keySet());
    }

    @Override
    public boolean knows(String name) {
        return TITLES.containsKey(name);
    }

    @Override
    public String title(String name) {
        return TITLES.get(name);
    }

    @Override
    public List<Declared> declared(String name) {
        return switch (name) {
            case "trough" ->
                List.of(
                        new Declared(
                                Kind.CHOICE,
                                "size",
                                Unit.one(),
                                "nominal size",
                                Sign.ANY,
                                false,
                                List.of("1", "2", "3 ft")),
                        entry("z_f", "m", "level of the floor", Sign.ANY, false),
                        entry("D", "m", "width of the approach", Sign.POSITIVE, false),
                        entry("d", "mm", "depth of the recess", Sign.NOT_NEGATIVE, true),
                        entry("u_r", "1", "standard uncertainty of the rating, relative", Sign.POSITIVE, true),
                        entry("theta", "deg", "angle of the wing walls", Sign.POSITIVE, true),
                        new Declared(
                                Kind.CASE,
                                "h_g",
                                Unit.parse("m"),
                                "head read at the gauge",
                                Sign.POSITIVE,
                                true,
                                List.of()));
            case "plate" -> List.of(entry("b", "m", "width of the notch", Sign.POSITIVE, false));
            default ->
                List.of(
                        entry("L", "m", "length", Sign.POSITIVE, false),
                        entry("S_0", "1", "slope of the invert", Sign.ANY, false));
        };
    }

    private static Declared entry(String symbol, String unit, String label, Sign sign, boolean optional) {
        return new Declared(Kind.ENTRY, symbol, Unit.parse(unit), label, sign, optional, List.of());
    }
}
