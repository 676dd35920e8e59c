package nappe.input;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.List;
import java.util.Locale;
import nappe.formula.Value;
import nappe.input.RawCell.Format;
import nappe.input.RawCell.Kind;
import nappe.formula.Sign;
import nappe.unit.Unit;
import nappe.unit.UnitException;

/**
 * Reads single entries. What can't be taken becomes a fault, and a stand-in comes back, which nobody uses: a workbook
 * with a fault gives no design.
 */
final class Entries {
    static final int LONGEST_NAME = 60;
    static final int LONGEST_TEXT = 2000;
    private static final double LARGEST = 1e12;
    private static final double SMALLEST = 1e-12;
    private static final LocalDate NO_DATE = LocalDate.EPOCH;

    private final Faults faults;
    private final boolean from1904;

    Entries(Faults faults, boolean from1904) {
        this.faults = faults;
        this.from1904 = from1904;
    }

    void fault(Field field, String code, String message) {
        faults.add(field.sheet(), field.address(), code, message);
    }

    /** A fault of something that must be typed. */
    void missing(Field field, String what, String remedy) {
        String covered = field.covered().isEmpty()
                ? ""
                : " (the cell is covered by the merged cells " + field.covered() + "; split them)";
        fault(field, "entry-missing", what + " is missing" + covered + "; " + remedy);
    }

    /** A text; one that must not be blank. */
    String requiredText(Field field, String what, int longest) {
        if (field.isBlank()) {
            missing(field, what, "write it here");
        }
        return text(field, what, longest);
    }

    /** A text of one line; numbers and dates are taken as they are read by a person; empty where blank. */
    String text(Field field, String what, int longest) {
        RawCell cell = field.cell();
        if (cell == null || field.isBlank()) {
            return "";
        }
        if (!isReadable(field, cell, what)) {
            return "";
        }
        if (cell.format() == Format.DATE) {
            return date(field, what).toString();
        }
        if (cell.kind() == Kind.NUMBER) {
            return Plain.number(cell.number());
        }
        if (cell.kind() == Kind.BOOLEAN) {
            return cell.text();
        }
        boolean name = longest <= 120;
        for (int c : cell.text().codePoints().toArray()) {
            if (!isAllowed(c, name)) {
                fault(field, "odd-character", what + " holds a character that can't be seen or printed: "
                        + Shown.quoted(cell.text()) + "; type it again without " + String.format("U+%04X", c));
                return "";
            }
        }
        String text = cell.text().replaceAll("[\\p{Z}\\s]+", " ").strip();
        if (text.length() > longest) {
            fault(field, "text-too-long", what + " has " + text.length() + " characters; at most " + longest
                    + " can be printed, shorten it");
            return "";
        }
        return text;
    }

    /** One of the words, in capitals or not. */
    String word(Field field, String what, List<String> words) {
        if (field.isBlank()) {
            missing(field, what, "choose " + listed(words));
            return words.get(0);
        }
        String typed = text(field, what, LONGEST_TEXT);
        for (String word : words) {
            if (word.equalsIgnoreCase(typed)) {
                return word;
            }
        }
        if (!typed.isEmpty()) {
            String near = Near.to(typed, words);
            fault(field, "word-unknown", Shown.quoted(typed) + " is not a choice for " + what + "; "
                    + (near == null ? "choose " + listed(words) : "did you mean " + near + "?"));
        }
        return words.get(0);
    }

    /** A number, or "not given" where blank. */
    Value number(Field field, String what, Sign sign) {
        Value none = new Value.None(Value.NOT_GIVEN);
        RawCell cell = field.cell();
        if (cell == null || field.isBlank() || !isReadable(field, cell, what)) {
            return none;
        }
        String shown = cell.kind() == Kind.TEXT ? Shown.quoted(cell.text().strip()) : cell.text();
        if (cell.format() == Format.DATE) {
            fault(field, "date-in-number", "a date or time stands where " + what + " belongs; set the format of the "
                    + "cell to a plain number and write the number again");
        } else if (cell.kind() != Kind.NUMBER) {
            String remedy = cell.kind() == Kind.TEXT ? NumberTexts.remedy(cell.text()) : "write a number such as 12.5";
            fault(field, "number-expected", (cell.formula() ? "the formula here gives " + shown + ", which" : shown)
                    + " is not a number; " + (cell.formula() ? "let it give a number" : remedy));
        } else if (cell.format() == Format.PERCENT) {
            double held = cell.number();
            fault(field, "percent-format", "the cell shows " + Plain.number(round(held * 100)) + " % and holds "
                    + Plain.number(held) + "; set its format to a plain number, then write "
                    + Plain.number(round(held * 100)) + " with the unit % or " + Plain.number(held) + " with the unit 1");
        } else if (cell.format() == Format.WORDS) {
            fault(field, "format-with-words", "the format of the cell shows words or a scale beside the number "
                    + shown + "; set it to a plain number and give the unit in the unit column");
        } else {
            return sized(field, what, sign, cell.number());
        }
        return none;
    }

    private Value sized(Field field, String what, Sign sign, double number) {
        if (!sign.allows(number)) {
            fault(field, "sign-impossible", Plain.number(number) + " can't be " + what + "; it must be " + sign.words());
        } else if (Math.abs(number) > LARGEST || number != 0 && Math.abs(number) < SMALLEST) {
            fault(field, "number-out-of-reach", Plain.number(number) + " can't be " + what + "; a number must lie between "
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
            fault(field, "unit-unknown", Shown.quoted(typed) + " is not a known unit"
                    + (question.isEmpty() ? "; write one such as " + UnitOffer.examples(declared) : question));
            return declared;
        }
        if (!UnitOffer.fits(unit, declared)) {
            fault(field, "unit-dimension", Shown.quoted(typed) + " stands for " + UnitOffer.measured(unit) + ", but "
                    + what + " asks for " + UnitOffer.measured(declared) + "; write one such as "
                    + UnitOffer.examples(declared));
            return declared;
        }
        return unit;
    }

    /** The unit as typed, for one that may be of any kind; empty where blank or faulty. */
    String unitText(Field field, String what, Unit declared) {
        if (field.isBlank()) {
            missing(field, "the unit of " + what, "write one such as " + UnitOffer.examples(declared));
        }
        return text(field, "the unit of " + what, LONGEST_NAME);
    }

    /** A date: a real one, or year-month-day as text. */
    LocalDate date(Field field, String what) {
        RawCell cell = field.cell();
        if (cell == null || field.isBlank()) {
            missing(field, what, "write it as 2030-01-31");
            return NO_DATE;
        }
        try {
            if (cell.kind() == Kind.NUMBER && cell.format() == Format.DATE) {
                return checked(day(cell.number()));
            }
            if (cell.kind() == Kind.TEXT) {
                String text = cell.text().strip();
                return checked(LocalDate.parse(cell.format() == Format.DATE && text.length() > 10
                        ? text.substring(0, 10)
                        : text));
            }
        } catch (DateTimeException e) {
            // falls through to the fault
        }
        fault(field, "date-expected", (cell.kind() == Kind.TEXT ? Shown.quoted(cell.text()) : cell.text())
                + " is not a date for " + what + "; write year-month-day as 2030-01-31");
        return NO_DATE;
    }

    /** Days counted from the eve of 1900, with the leap day of that year that never was; or from the first day of 1904. */
    private LocalDate day(double count) {
        long days = (long) Math.min(Math.max(Math.floor(count), -1e6), 1e7);
        return from1904 ? LocalDate.of(1904, 1, 1).plusDays(days) : LocalDate.of(1899, 12, 30).plusDays(days);
    }

    private static LocalDate checked(LocalDate date) {
        if (date.getYear() < 1950 || date.getYear() > 2199) {
            throw new DateTimeException("not a date of this trade");
        }
        return date;
    }

    private boolean isReadable(Field field, RawCell cell, String what) {
        if (cell.kind() == Kind.ERROR) {
            fault(field, "cell-error", (cell.formula() ? "the formula here" : "the cell") + " gives the error "
                    + Shown.quoted(cell.text()) + " where " + what + " belongs; mend or replace it");
        } else if (cell.kind() == Kind.NO_VALUE) {
            fault(field, "formula-without-value", "the formula here was saved without its value, so " + what
                    + " is not known; open the workbook in a spreadsheet program and save it, or write the value");
        } else {
            return true;
        }
        return false;
    }

    private static boolean isAllowed(int c, boolean name) {
        return switch (Character.getType(c)) {
            case Character.CONTROL -> c == '\t' || c == '\n' || c == '\r';
            case Character.SURROGATE, Character.UNASSIGNED -> false;
            case Character.FORMAT -> !name && !(c >= 0x202A && c <= 0x202E || c >= 0x2066 && c <= 0x2069);
            default -> true;
        };
    }

    static String listed(List<String> words) {
        int shown = Math.min(words.size(), 12);
        String start = String.join(", ", words.subList(0, shown - 1));
        String more = words.size() > shown ? " ... (" + words.size() + " in all, see the sheet Lists)" : "";
        return words.size() == 1 ? words.get(0) : start + (more.isEmpty() ? " or " : ", ") + words.get(shown - 1) + more;
    }

    private static double round(double value) {
        return new java.math.BigDecimal(value)
                .round(new java.math.MathContext(12))
                .doubleValue();
    }

    static String key(String name) {
        return name.toLowerCase(Locale.ROOT);
    }
}
