package nappe.unit;

import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.commons.math3.fraction.Fraction;
import org.jspecify.annotations.Nullable;
import tech.units.indriya.function.RationalNumber;

/** Reads one unit text: {@code term { (. | /) term }}, where a term is a name with an exponent, or {@code 1}. */
final class UnitText {
    /** At most two figures and never zero, so that a slip of typing is a fault and not a vast power. */
    private static final Pattern EXPONENT =
            Pattern.compile("^(?:\\^\\((-?[1-9]\\d?)/([1-9]\\d?)\\)|\\^?(-?[1-9]\\d?))");

    private static final Pattern LETTERS = Pattern.compile("[A-Za-z]+");

    private final String text;
    private final UnitCatalogue catalogue;
    private int at;

    private Dimension dimension = Dimension.NONE;
    private @Nullable RationalNumber exact = RationalNumber.ONE;
    private double size = 1;

    UnitText(String text, UnitCatalogue catalogue) {
        this.text = text;
        this.catalogue = catalogue;
    }

    Unit parse() {
        if (text.isEmpty()) {
            throw new UnitException("no unit is given; write 1 for a pure number");
        }
        boolean over = false;
        while (true) {
            term(over);
            if (at == text.length()) {
                return new Unit(
                        text, dimension, exact, exact == null ? size : Unit.toDouble(exact), RationalNumber.ZERO);
            }
            char sign = text.charAt(at++);
            if (sign != '.' && sign != '/') {
                throw unknown();
            }
            over = sign == '/';
        }
    }

    private void term(boolean over) {
        String rest = text.substring(at);
        if (rest.startsWith("1") && (rest.length() == 1 || rest.charAt(1) == '/')) {
            at++;
            return;
        }
        String name = catalogue.nameAtStart(rest);
        Unit unit = name == null ? null : catalogue.named(name);
        if (name == null || unit == null) {
            throw unknown();
        }
        at += name.length();
        Fraction exponent = exponent();
        if (unit.zeroInSi() != 0) {
            throw new UnitException(text + ": " + name + " has a zero of its own and cannot stand in a compound unit");
        }
        multiply(unit, over ? exponent.negate() : exponent);
    }

    private Fraction exponent() {
        Matcher matcher = EXPONENT.matcher(text.substring(at));
        if (!matcher.find()) {
            return Fraction.ONE;
        }
        at += matcher.end();
        return matcher.group(3) != null
                ? new Fraction(Integer.parseInt(matcher.group(3)))
                : UnitCatalogue.fractionExponent(matcher.group(1), matcher.group(2));
    }

    private void multiply(Unit unit, Fraction exponent) {
        dimension = dimension.times(unit.dimension().power(exponent));
        size *= Math.pow(unit.sizeInSi(), exponent.doubleValue());
        RationalNumber unitSize = unit.exact();
        if (exact != null) {
            if (unitSize == null) {
                exact = null;
            } else if (unitSize.equals(RationalNumber.ONE)) {
                return;
            } else if (exponent.getDenominator() == 1) {
                exact = exact.multiply(Unit.power(unitSize, exponent.getNumerator()));
            } else {
                exact = null;
            }
        }
    }

    private UnitException unknown() {
        String near = String.join(", ", near());
        return new UnitException(
                "\"" + text + "\" is not a known unit" + (near.isEmpty() ? "" : "; did you mean " + near + "?"));
    }

    /** Named units that differ in capitals or go on in brackets; else the same text in the letters of the catalogue. */
    private List<String> near() {
        List<String> names = catalogue.entries().stream()
                .map(entry -> entry.unit().text())
                .filter(name -> name.equalsIgnoreCase(text) || name.startsWith(text + "("))
                .toList();
        String respelt = respelt();
        return names.isEmpty() && !respelt.equals(text) && catalogue.knows(respelt) ? List.of(respelt) : names;
    }

    private String respelt() {
        String plain = text.replace(" ", "")
                .replace('\u00b2', '2')
                .replace('\u00b3', '3')
                .replace('\u00b7', '.');
        return LETTERS.matcher(plain)
                .replaceAll(run -> catalogue.entries().stream()
                        .map(entry -> entry.unit().text())
                        .filter(name -> catalogue.named(run.group()) == null && name.equalsIgnoreCase(run.group()))
                        .findFirst()
                        .orElse(run.group()));
    }
}
