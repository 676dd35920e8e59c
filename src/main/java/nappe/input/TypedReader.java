package nappe.input;

import java.util.List;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.method.Declared;
import nappe.station.Design.Typed;
import nappe.unit.Unit;

/** Reads one typed quantity or choice with its unit, source and standing. */
final class TypedReader {
    /** Where source and standing of a quantity are typed. */
    record Backing(String source, String standing) {}

    private final Entries entries;
    private final Quantities quantities;

    TypedReader(Entries entries) {
        this.entries = entries;
        this.quantities = new Quantities(entries);
    }

    /** Source and standing; the standing must be given where something is typed. */
    Backing backing(Field source, Field standing, boolean typed) {
        String text = entries.text(source, "the source or basis", Entries.LONGEST_TEXT);
        boolean owed = typed || !standing.isBlank();
        return new Backing(text, owed ? entries.word(standing, "the standing", Layout.STANDINGS) : "");
    }

    /** What is declared, as typed; blank is a fault unless it is optional. */
    Typed typed(Declared declared, Field value, Field unit, Backing backing) {
        String what = declared.symbol() + (declared.label().isEmpty() ? "" : " (" + declared.label() + ")");
        return declared.words().isEmpty()
                ? quantity(what, declared.unit(), declared.sign(), declared.optional(), value, unit, backing)
                : choice(what, declared.words(), declared.optional(), value, backing);
    }

    private Typed choice(String what, List<String> words, boolean optional, Field value, Backing backing) {
        Value word = value.isBlank() && optional
                ? new Value.None(Value.NOT_GIVEN)
                : Value.word(entries.word(value, what, words));
        return new Typed(word, Unit.one(), backing.source(), backing.standing(), value.origin());
    }

    /** A quantity with its unit; the unit of a blank one is the declared one where none is typed. */
    Typed quantity(
            String what, Unit declared, Sign sign, boolean optional, Field value, Field unitField, Backing backing) {
        boolean blank = value.isBlank();
        Value number = new Value.None(Value.NOT_GIVEN);
        if (!blank) {
            number = quantities.number(value, what, sign);
        } else if (!optional) {
            entries.missing(
                    value,
                    what,
                    "write a number"
                            + (sign == Sign.ANY ? "" : ", " + sign.words())
                            + (declared.dimension().isNone()
                                    ? ""
                                    : (sign == Sign.ANY ? "" : ",") + " of " + UnitOffer.examples(declared)));
        }
        Unit unit = blank && unitField.isBlank() ? declared : quantities.unit(unitField, what, declared);
        return new Typed(number, unit, backing.source(), backing.standing(), value.origin());
    }
}
