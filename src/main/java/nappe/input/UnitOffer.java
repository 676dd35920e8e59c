package nappe.input;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import nappe.unit.UnitCatalogue;
import nappe.unit.UnitException;
import nappe.unit.WorkingSystem;

/** Which units are offered for a quantity, which are taken, and what is said of those that aren't. */
final class UnitOffer {
    /** Compound units that the trade uses, beside the named ones of the catalogue. */
    private static final List<String> COMPOUND = List.of(
            "m3/s",
            "L/s",
            "m3/h",
            "m3/d",
            "ML/d",
            "ft3/s",
            "m/s",
            "ft/s",
            "m2",
            "mm2",
            "cm2",
            "ft2",
            "in2",
            "m3",
            "ft3",
            "in3",
            "m/s2",
            "ft/s2",
            "kg/m3",
            "lb/ft3",
            "slug/ft3",
            "m2/s",
            "ft2/s",
            "lbf.s/ft2",
            "Pa.s",
            "lbf/ft2");

    /** The US customary unit offered first where a method asks in the SI unit. */
    private static final Map<String, String> US = Map.ofEntries(
            Map.entry("m", "ft"),
            Map.entry("mm", "in"),
            Map.entry("cm", "in"),
            Map.entry("km", "mi"),
            Map.entry("m2", "ft2"),
            Map.entry("m3", "ft3"),
            Map.entry("m3/s", "ft3/s"),
            Map.entry("L/s", "gpm"),
            Map.entry("m/s", "ft/s"),
            Map.entry("m/s2", "ft/s2"),
            Map.entry("kg/m3", "slug/ft3"),
            Map.entry("m2/s", "ft2/s"),
            Map.entry("Pa.s", "lbf.s/ft2"),
            Map.entry("Pa", "psi"),
            Map.entry("kPa", "psi"),
            Map.entry("degC", "degF"));

    private static final Map<String, String> ALIASES = Map.ofEntries(
            Map.entry("feet", "ft"),
            Map.entry("foot", "ft"),
            Map.entry("'", "ft"),
            Map.entry("inch", "in"),
            Map.entry("inches", "in"),
            Map.entry("\"", "in"),
            Map.entry("metre", "m"),
            Map.entry("meter", "m"),
            Map.entry("metres", "m"),
            Map.entry("meters", "m"),
            Map.entry("sec", "s"),
            Map.entry("hr", "h"),
            Map.entry("cms", "m3/s"),
            Map.entry("cumec", "m3/s"),
            Map.entry("cumecs", "m3/s"),
            Map.entry("lps", "L/s"),
            Map.entry("cusec", "ft3/s"),
            Map.entry("fps", "ft/s"),
            Map.entry("gal/m", "gpm"),
            Map.entry("usgpm", "gpm"),
            Map.entry("cmh", "m3/h"),
            Map.entry("cmd", "m3/d"),
            Map.entry("acre", "ac"),
            Map.entry("litre", "L"),
            Map.entry("liter", "L"),
            Map.entry("percent", "%"),
            Map.entry("degrees", "deg"),
            Map.entry("°", "deg"),
            Map.entry("°c", "degC"),
            Map.entry("°f", "degF"),
            Map.entry("-", "1"),
            Map.entry("none", "1"));

    private static final Map<Dimension, String> WORDS = words();

    private UnitOffer() {}

    /** The unit that stands in a blank: the method's own, or its US customary fellow. */
    static Unit first(Unit declared, WorkingSystem system) {
        String us = US.get(declared.text());
        return system == WorkingSystem.US && us != null ? Unit.parse(us) : declared;
    }

    /** What can be chosen in place of the unit, itself first. */
    static List<Unit> offered(Unit unit) {
        if (isAngle(unit)) {
            return List.of(Unit.parse("deg"), Unit.parse("rad"));
        }
        if (unit.dimension().isNone()) {
            return List.of(Unit.one(), Unit.parse("%"));
        }
        Map<String, Unit> offered = new LinkedHashMap<>();
        Stream.of(
                        Stream.of(
                                unit,
                                WorkingSystem.SI.coherentUnit(unit.dimension()),
                                WorkingSystem.US.coherentUnit(unit.dimension())),
                        COMPOUND.stream().map(Unit::parse),
                        UnitCatalogue.standard().of(unit.dimension()).stream())
                .flatMap(s -> s)
                .filter(u -> u.dimension().equals(unit.dimension()))
                .forEach(u -> offered.put(u.text(), u));
        return new ArrayList<>(offered.values());
    }

    /** Every unit that is offered anywhere, that of pure numbers first. */
    static List<String> all() {
        return Stream.of(
                        Stream.of("1"),
                        COMPOUND.stream(),
                        Stream.of("m", "s", "kg", "K"),
                        UnitCatalogue.standard().entries().stream()
                                .map(e -> e.unit().text()))
                .flatMap(s -> s)
                .distinct()
                .toList();
    }

    /** Whether a quantity asked for in one unit may be typed in the other; an angle is no plain number. */
    static boolean fits(Unit typed, Unit declared) {
        return typed.dimension().equals(declared.dimension()) && isAngle(typed) == isAngle(declared);
    }

    /** What a unit measures: "a flow", "an angle". */
    static String measured(Unit unit) {
        return isAngle(unit)
                ? "an angle"
                : WORDS.getOrDefault(unit.dimension(), unit.dimension().toString());
    }

    /** The first few units that will do: {@code ft, m, in or mm}. */
    static String examples(Unit unit) {
        List<String> some = offered(unit).stream().map(Unit::text).limit(10).toList();
        return some.size() == 1
                ? some.get(0)
                : some.stream().limit(some.size() - 1).collect(Collectors.joining(", ")) + " or "
                        + some.get(some.size() - 1);
    }

    /** The known unit that an unknown text most likely means: {@code ; did you mean ft3/s?}, or nothing. */
    static String question(String typed, Unit declared) {
        String plain = typed.replace("\u00B3", "3")
                .replace("\u00B2", "2")
                .replace('\u00B7', '.')
                .replaceAll("\\s", "")
                .replace("**", "^")
                .replaceAll("\\.$", "");
        String alias = ALIASES.get(plain.toLowerCase(java.util.Locale.ROOT));
        if (alias != null) {
            return "; did you mean " + alias + "?";
        }
        if (knows(plain)) {
            return "; did you mean " + plain + "?";
        }
        return Near.question(plain, offered(declared).stream().map(Unit::text).toList());
    }

    private static boolean knows(String text) {
        try {
            Unit.parse(text);
            return true;
        } catch (UnitException | ArithmeticException | NumberFormatException e) {
            return false;
        }
    }

    private static boolean isAngle(Unit unit) {
        return unit.text().equals("deg") || unit.text().equals("rad");
    }

    private static Map<Dimension, String> words() {
        Map<Dimension, String> words = new LinkedHashMap<>();
        words.put(Dimension.LENGTH, "a length");
        words.put(Dimension.FLOW, "a flow");
        words.put(Dimension.PRESSURE, "a pressure");
        words.put(Dimension.VISCOSITY, "a dynamic viscosity");
        words.put(Dimension.FORCE, "a force");
        words.put(Dimension.of(2, 0, 0, 0), "an area");
        words.put(Dimension.of(3, 0, 0, 0), "a volume");
        words.put(Dimension.of(1, 0, -1, 0), "a velocity");
        words.put(Dimension.of(1, 0, -2, 0), "an acceleration");
        words.put(Dimension.of(2, 0, -1, 0), "a kinematic viscosity");
        words.put(Dimension.of(-3, 1, 0, 0), "a density");
        words.put(Dimension.of(0, 1, 0, 0), "a mass");
        words.put(Dimension.of(0, 0, 1, 0), "a time");
        words.put(Dimension.of(0, 0, 0, 1), "a temperature");
        return words;
    }
}
