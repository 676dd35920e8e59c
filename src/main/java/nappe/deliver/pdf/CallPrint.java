package nappe.deliver.pdf;

import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import nappe.formula.Formula;

/** Sets a call: by its sign where it has one, in words where it chooses or looks up, else by its name. */
final class CallPrint {
    private CallPrint() {}

    static Inline typeset(Formula.Call call, Function<Formula, Inline> reading) {
        List<Inline> of = call.arguments().stream().map(reading).toList();
        return switch (call.function()) {
            case IF -> choice(call, of);
            case SQRT -> named("√", of);
            case ABS -> Inline.join(Inline.ATOM, Inline.text("|"), of.get(0), Inline.text("|"));
            case LOG10 -> Inline.join(Inline.ATOM, lowered("log", "10"), named("", of));
            case ASIN -> named("arcsin", of);
            case ACOS -> named("arccos", of);
            case ATAN -> named("arctan", of);
            case EXP, LN, SIN, COS, TAN, TANH, MIN, MAX ->
                named(call.function().name().toLowerCase(Locale.ROOT), of);
            case MATCH -> words("place of ", of.get(0), " in ", of.get(1));
            case MATCH_BELOW -> words("place of the last not above ", of.get(0), " in ", of.get(1));
            case INDEX -> words("entry ", of.get(1).within(Inline.POWER), " of ", of.get(0));
            case SMALL -> words("number ", of.get(1), " from the smallest of ", of.get(0));
            case LOWEST_OF -> Inline.join(Inline.SUM, Inline.text("smallest of "), of.get(0));
            case TALLY -> words("count of ", of.get(1), " in ", of.get(0));
            case IS_NUMBER -> Inline.join(Inline.LOOSE, of.get(0), Inline.text(" is a number"));
            case SAME -> words("", of.get(0), " is exactly ", of.get(1));
        };
    }

    /** {@code a if c, otherwise b}; a chain of choices reads on without brackets. */
    private static Inline choice(Formula.Call call, List<Inline> of) {
        boolean chained = call.arguments().get(2) instanceof Formula.Call other && other.function() == call.function();
        Inline yes = call.arguments().get(1) instanceof Formula.Call inner && inner.function() == call.function()
                ? of.get(1).bracketed()
                : of.get(1);
        return Inline.join(
                Inline.LOOSE,
                yes,
                Inline.text(" if "),
                of.get(0),
                Inline.text(chained ? ", or " : ", otherwise "),
                of.get(2));
    }

    private static Inline named(String name, List<Inline> of) {
        Inline call = Inline.text(name + "(");
        for (int i = 0; i < of.size(); i++) {
            call = Inline.join(Inline.ATOM, call, Inline.text(i == 0 ? "" : ", "), of.get(i));
        }
        return Inline.join(Inline.ATOM, call, Inline.text(")"));
    }

    private static Inline lowered(String name, String below) {
        return Inline.of(
                Inline.ATOM, List.of(Piece.plain(name), Piece.plain(below).lowered()));
    }

    private static Inline words(String before, Inline first, String between, Inline second) {
        return Inline.join(Inline.LOOSE, Inline.text(before), first, Inline.text(between), second);
    }
}
