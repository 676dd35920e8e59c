package nappe.input;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.List;
import java.util.Locale;
import nappe.input.RawCell.Format;
import nappe.input.RawCell.Kind;

/**
 * Reads single texts, words and dates. What can't be taken becomes a fault, and a stand-in comes back, which nobody uses: a workbook
 * with a fault gives no design.
 */
final class Entries {
    static final int LONGEST_NAME = 60;
    static final int LONGEST_TITLE = 120;
    static final int LONGEST_TEXT = 2000;
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
        boolean name = longest <= LONGEST_TITLE;
        for (int c : cell.text().codePoints().toArray()) {
            if (!isAllowed(c, name)) {
                fault(
                        field,
                        "odd-character",
                        what + " holds a character that can't be seen or printed: " + Shown.quoted(cell.text())
                                + "; type it again without " + String.format("U+%04X", c));
                return "";
            }
        }
        String text = cell.text().replaceAll("[\\p{Z}\\s]+", " ").strip();
        if (text.length() > longest) {
            fault(
                    field,
                    "text-too-long",
                    what + " has " + text.length() + " characters; at most " + longest + " can be printed, shorten it");
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
            fault(
                    field,
                    "word-unknown",
                    Shown.quoted(typed) + " is not a choice for " + what + "; "
                            + (near == null ? "choose " + listed(words) : "did you mean " + near + "?"));
        }
        return words.get(0);
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
                return checked(LocalDate.parse(
                        cell.format() == Format.DATE && text.length() > 10 ? text.substring(0, 10) : text));
            }
        } catch (DateTimeException e) {
            // falls through to the fault
        }
        fault(
                field,
                "date-expected",
                cell.shown() + " is not a date for " + what + "; write year-month-day as 2030-01-31");
        return NO_DATE;
    }

    /** Days counted from the eve of 1900, with the leap day of that year that never was; or from the first day of 1904. */
    private LocalDate day(double count) {
        long days = (long) Math.min(Math.max(Math.floor(count), -1e6), 1e7);
        return from1904
                ? LocalDate.of(1904, 1, 1).plusDays(days)
                : LocalDate.of(1899, 12, 30).plusDays(days);
    }

    private static LocalDate checked(LocalDate date) {
        if (date.getYear() < 1950 || date.getYear() > 2199) {
            throw new DateTimeException("not a date of this trade");
        }
        return date;
    }

    /** Whether the cell holds a value at all; an error and a formula without one are faults. */
    boolean isReadable(Field field, RawCell cell, String what) {
        if (cell.kind() == Kind.ERROR) {
            fault(
                    field,
                    "cell-error",
                    (cell.formula() ? "the formula here" : "the cell") + " gives the error " + Shown.quoted(cell.text())
                            + " where " + what + " belongs; mend or replace it");
        } else if (cell.kind() == Kind.NO_VALUE) {
            fault(
                    field,
                    "formula-without-value",
                    "the formula here was saved without its value, so " + what
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
        return words.size() == 1
                ? words.get(0)
                : start + (more.isEmpty() ? " or " : ", ") + words.get(shown - 1) + more;
    }

    static String key(String name) {
        return name.toLowerCase(Locale.ROOT);
    }
}
