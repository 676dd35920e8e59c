package nappe.deliver.pdf;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.formula.Formula;
import nappe.formula.FormulaException;
import nappe.formula.FormulaParser;

/** What the layout wrote about a root, {@code h where Q_s = Q, in trial rows}, with both its sides. */
record WrittenEquation(String unknown, Formula left, Formula right, String more) {
    private static final Pattern ROOT = Pattern.compile("(\\w+) where (.+?) = (.+?)(?:, (in trial rows))?");

    /** The text taken apart; nothing where it is other words. */
    static Optional<WrittenEquation> of(String written) {
        Matcher root = ROOT.matcher(written);
        if (!root.matches()) {
            return Optional.empty();
        }
        try {
            return Optional.of(new WrittenEquation(
                    root.group(1),
                    FormulaParser.parse(root.group(2)),
                    FormulaParser.parse(root.group(3)),
                    root.group(4) == null ? "" : root.group(4)));
        } catch (FormulaException e) {
            return Optional.empty();
        }
    }

    BoxRow set(EquationReading reading) {
        BoxRow equals = reading.words("=");
        BoxRow sides = left.read(reading)
                .then(reading.em(Type.THICK), 1, equals)
                .then(reading.em(Type.THICK), right.read(reading));
        BoxRow all = reading.name(unknown)
                .then(reading.em(Type.THICK), 0, reading.words("where"))
                .then(reading.em(Type.THICK), 0, sides);
        return more.isEmpty()
                ? all
                : all.then(0, reading.words(",")).then(reading.em(Type.MEDIUM), 0, reading.words(more));
    }
}
