package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import nappe.formula.Formula;
import nappe.formula.Function;

/** Sets a call: by its sign where it has one, by a brace where it chooses, in words where it looks up, else by name. */
final class CallSetting {
    private final Formula.Call call;
    private final EquationReading reading;
    private final Shapes shapes;

    private CallSetting(Formula.Call call, EquationReading reading) {
        this.call = call;
        this.reading = reading;
        this.shapes = reading.shapes();
    }

    static BoxRow of(Formula.Call call, EquationReading reading) {
        return new CallSetting(call, reading).set();
    }

    private BoxRow set() {
        return switch (call.function()) {
            case IF -> BoxRow.of(BoxRow.LOOSE, shapes.braced(rows(reading.narrower(shapes.braceWidth()))));
            case SQRT -> BoxRow.atom(shapes.root(argument(0).box()));
            case ABS -> absolute(argument(0));
            case LOG10 -> reading.called(BoxRow.atom(logarithm()), arguments());
            case ASIN -> reading.call("arcsin", arguments());
            case ACOS -> reading.call("arccos", arguments());
            case ATAN -> reading.call("arctan", arguments());
            case EXP, LN, SIN, COS, TAN, TANH, MIN, MAX ->
                reading.call(call.function().name().toLowerCase(Locale.ROOT), arguments());
            case MATCH -> words("place of", 0, "in", 1);
            case MATCH_BELOW -> words("place of the last not above", 0, "in", 1);
            case INDEX -> words("entry", 1, "of", 0);
            case SMALL -> words("number", 1, "from the smallest of", 0);
            case LOWEST_OF -> after(reading.words("smallest of"), argument(0)).bound(BoxRow.SUM);
            case COUNT_OF ->
                after(reading.words("count of numbers in"), argument(0)).bound(BoxRow.SUM);
            case TALLY -> words("count of", 1, "in", 0);
            case IS_NUMBER -> after(argument(0), reading.words("is given")).bound(BoxRow.LOOSE);
            case SAME ->
                after(after(argument(0), reading.words("is exactly")), argument(1))
                        .bound(BoxRow.LOOSE);
        };
    }

    private BoxRow argument(int index) {
        return call.arguments().get(index).read(reading);
    }

    private List<BoxRow> arguments() {
        return call.arguments().stream().map(argument -> argument.read(reading)).toList();
    }

    private BoxRow absolute(BoxRow of) {
        Box inside = of.box();
        Box bar = shapes.bar(inside.above(), inside.below());
        return of.between(bar, bar);
    }

    private Box logarithm() {
        return shapes.scripts(
                reading.type().upright("log"), reading.type().script().upright("10"), null);
    }

    private BoxRow after(BoxRow first, BoxRow next) {
        return first.then(reading.em(Type.MEDIUM), 1, next);
    }

    private BoxRow words(String before, int first, String between, int second) {
        BoxRow start = after(reading.words(before), argument(first).within(BoxRow.POWER, shapes));
        return after(after(start, reading.words(between)), argument(second)).bound(BoxRow.LOOSE);
    }

    /** One row per case, the last one "otherwise"; a choice in place of the last is further rows. */
    private Box rows(EquationReading inner) {
        List<BoxRow> values = new ArrayList<>();
        List<BoxRow> conditions = new ArrayList<>();
        Formula rest = call;
        while (rest instanceof Formula.Call choice && choice.function() == Function.IF) {
            values.add(choice.arguments().get(1).read(inner));
            conditions.add(after(inner.words("if"), choice.arguments().get(0).read(inner)));
            rest = choice.arguments().get(2);
        }
        values.add(rest.read(inner));
        conditions.add(inner.words("otherwise"));
        return new Cases(inner, values, conditions).box();
    }
}
