package nappe.input;

import java.math.BigDecimal;
import java.math.MathContext;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.input.RawCell.Format;
import nappe.input.RawCell.Kind;
import nappe.unit.Unit;
import nappe.unit.UnitException;

/** Reads single numbers and units; a number is taken only where the engineer saw it as it is stored. */
final class Quantities {
    private static final double LARGEST = 1e12;
    private static final double SMALLEST = 1e-12;

    private final Entries entries;

    Quantities(Entries entries) {
        this.entries = entries;
    }

    /** A number, or "not given" where blank. */
    Value number(Field field, String what, Sign sign) {
        Value none = new Value.None(Value.NOT_GIVEN);
        RawCell cell = field.cell();
        if (cell == null || field.isBlank() || !entries.isReadable(field, cell, what)) {
            return none;
        }
        String shown = cell.kind() == Kind.BOOLEAN ? cell.text() : cell.shown();
        if (cell.format() == Format.DATE) {
            entries.fault(
                    field,
                    "date-in-number",
                    "a date or time stands where " + what + " belongs; set the format of the "
                            + "cell to a plain number and write the number again");
        } else if (cell.kind() != Kind.NUMBER) {
            String remedy = cell.kind() == Kind.TEXT ? NumberTexts.remedy(cell.text()) : "write a number such as 12.5";
            entries.fault(
                    field,
                    "number-expected",
                    (cell.formula() ? "the formula here gives " + shown + ", which" : shown) + " is not a number; "
                            + (cell.formula() ? "let it give a number" : remedy));
        } else if (cell.format() == Format.PERCENT) {
            double held = cell.number();
            entries.fault(
                    field,
                    "percent-format",
                    "the cell shows " + Plain.number(round(held * 100)) + " % and holds "
                            + Plain.number(held) + "; set its format to a plain number, then write "
                            + Plain.number(round(held * 100)) + " with the unit % or " + Plain.number(held)
                            + " with the unit 1");
        } else if (cell.format() == Format.WORDS) {
            entries.fault(
                    field,
                    "format-with-words",
                    "the format of the cell shows words or a scale beside the number " + shown
                            + "; set it to a plain number and give the unit in the unit column");
        } else {
            return sized(field, what, sign, cell.number());
        }
        return none;
    }

    private Value sized(Field field, String what, Sign sign, double number) {
        if (!sign.allows(number)) {
            entries.fault(
                    field,
                    "sign-impossible",
                    Plain.number(number) + " can't be " + what + "; it must be " + sign.words());
        } else if (Math.abs(number) > LARGEST || number != 0 && Math.abs(number) < SMALLEST) {
            entries.fault(
                    field,
                    "number-out-of-reach",
                    Plain.number(number) + " can't be " + what + "; a number must lie between "
                            + "1e-12 and 1e12 in size");
        }
        return Value.of(number);
    }

    /** A unit that fits the declared one. */
    Unit unit(Field field, String what, Unit declared) {
        String typed = unitText(field, what, declared);
        if (typed.isEmpty()) {
            return declared;
        }
        Unit unit;
        try {
            unit = Unit.parse(typed);
        } catch (UnitException | ArithmeticException | NumberFormatException e) {
            String question = UnitOffer.question(typed, declared);
            entries.fault(
                    field,
                    "unit-unknown",
                    Shown.quoted(typed) + " is not a known unit"
                            + (question.isEmpty() ? "; write one such as " + UnitOffer.examples(declared) : question));
            return declared;
        }
        if (!UnitOffer.fits(unit, declared)) {
            entries.fault(
                    field,
                    "unit-dimension",
                    Shown.quoted(typed) + " stands for " + UnitOffer.measured(unit) + ", but "
                            + what + " asks for " + UnitOffer.measured(declared) + "; write one such as "
                            + UnitOffer.examples(declared));
            return declared;
        }
        return unit;
    }

    /** The unit as typed, for one that may be of any kind; empty where blank or faulty. */
    String unitText(Field field, String what, Unit declared) {
        if (field.isBlank()) {
            entries.missing(field, "the unit of " + what, "write one such as " + UnitOffer.examples(declared));
        }
        return entries.text(field, "the unit of " + what, Entries.LONGEST_NAME);
    }

    private static double round(double value) {
        return new BigDecimal(value).round(new MathContext(12)).doubleValue();
    }
}
