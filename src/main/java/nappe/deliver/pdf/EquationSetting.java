package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import nappe.formula.Formula;
import nappe.formula.PlainReading;

/**
 * Sets equations to a width: the symbol, its formula, and below it the same with numbers, aligned at the equals sign.
 * What is too long is broken into lines; where that doesn't do, fractions are set with a slash, then the type smaller.
 */
final class EquationSetting {
    private static final double ROUNDING = 1e-6;

    /** What a line of text reaches above and below its baseline at least, in parts of the size. */
    static final double LINE_ABOVE = 1.0;

    static final double LINE_BELOW = 0.33;

    /** Free above the first equation, in parts of the size. */
    private static final double CLEAR = 0.15;

    /** A left side wider than this part of the line has a line of its own. */
    private static final double WIDEST_LEFT = 0.4;

    private final double width;
    private final Box left;
    private final String symbol;
    private final double size;
    private final List<Box> lines = new ArrayList<>();
    private final List<String> texts = new ArrayList<>();

    /**
     * @param symbol on the left side; empty for none
     * @param size of the type, in points
     * @param width that it must not be wider than, in points
     */
    EquationSetting(String symbol, double size, double width) {
        this.symbol = symbol;
        this.size = size;
        this.width = width;
        this.left = symbol.isEmpty()
                ? Box.empty(0, 0, 0)
                : fitted(Type.of(size), width, (type, room) -> new EquationReading(type, room, false).name(symbol));
    }

    /** With the formula in symbols. */
    EquationSetting symbols(Formula formula) {
        Type type = Type.of(size);
        if (symbol.isEmpty()) {
            lines.add(fitted(type, width, (its, room) -> reading(its, room, false, formula)));
        } else if (ownLine()) {
            Box right = signed(type, (its, room) -> reading(its, room, false, formula));
            lines.add(Box.column(List.of(left, right), List.of(0.0, size), 1.3 * size, 0.3 * size));
        } else {
            Box right = signed(type, (its, room) -> reading(its, room, false, formula));
            lines.add(Box.holding(0, List.of(new Box.Part(left, 0, 0), new Box.Part(right, signAt(), 0))));
        }
        texts.add(PlainReading.of(symbol, formula));
        return this;
    }

    /** With the same in numbers, after an equals sign. */
    EquationSetting numbers(Formula formula) {
        Type type = Type.of(0.96 * size);
        Box right = signed(type, (its, room) -> reading(its, room, true, formula));
        lines.add(Box.holding(0, List.of(new Box.Part(right, signAt(), 0))));
        texts.add("= " + PlainReading.of(formula));
        return this;
    }

    /** With the same in numbers, without a sign before it. */
    EquationSetting numbersAlone(Formula formula) {
        lines.add(fitted(Type.of(0.96 * size), width, (its, room) -> reading(its, room, true, formula)));
        texts.add(PlainReading.of(formula));
        return this;
    }

    /** With something in words and symbols. */
    EquationSetting words(Function<EquationReading, BoxRow> words, String plain) {
        lines.add(fitted(Type.of(size), width, (type, room) -> words.apply(new EquationReading(type, room, false))));
        texts.add(plain);
        return this;
    }

    Equation equation() {
        Box all = Box.column(lines, 1.35 * size, 0.5 * size);
        double above = Math.max(all.above() + CLEAR * size, LINE_ABOVE * size);
        double last = -all.parts().get(all.parts().size() - 1).y();
        double below = Math.max(all.below(), last + LINE_BELOW * size);
        return new Equation(new Box(all.width(), above, below, all.ink(), all.parts()), texts);
    }

    private boolean ownLine() {
        return left.width() > WIDEST_LEFT * width;
    }

    private double signAt() {
        return left.width() == 0 ? 0 : ownLine() ? size : left.width() + Type.THICK * size;
    }

    private interface Setting {
        BoxRow at(Type type, double room);
    }

    private static BoxRow reading(Type type, double room, boolean numbers, Formula formula) {
        return formula.read(new EquationReading(type, room, numbers));
    }

    private Box signed(Type type, Setting right) {
        Box sign = type.upright("=");
        double gap = Type.THICK * type.size();
        Box set = fitted(type, width - signAt() - sign.width() - gap, right);
        return Box.holding(0, List.of(new Box.Part(sign, 0, 0), new Box.Part(set, sign.width() + gap, 0)));
    }

    private static Box fitted(Type type, double room, Setting setting) {
        Box set = broken(type, room, setting);
        if (set.width() <= room + ROUNDING) {
            return set;
        }
        set = broken(type.inLine(), room, setting);
        double size = type.size();
        while (set.width() > room + ROUNDING) {
            size *= Math.min(0.95, room / set.width());
            set = broken(Type.of(size).inLine(), room, setting);
        }
        return set;
    }

    private static Box broken(Type type, double room, Setting setting) {
        return LineEnds.broken(setting.at(type, room), room, type, type.size());
    }
}
