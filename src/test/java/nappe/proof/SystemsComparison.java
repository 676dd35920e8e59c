package nappe.proof;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Sheet;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.Operator;
import nappe.formula.Value;
import nappe.results.Results;
import nappe.unit.Dimension;
import nappe.unit.Unit;

/**
 * One design worked in two systems of units, compared result by result: numbers in SI, words as they are. Numbers agree
 * within {@link Comparison#RELATIVE} of the larger one, or within {@link Comparison#FLOOR} of the largest number of their
 * dimension, for the reason told in {@link Comparison}.
 *
 * <p>All tables and lines are compared place by place, except the conversion factors, which only one of the systems
 * needs, the trials, which are steps on the way to what the lines hold, and the ranks of the limits.
 */
final class SystemsComparison {
    private static final Set<String> LEFT_OUT = Set.of("Constants", "Trials");

    /**
     * What takes the least of unlike margins: those of demanded lengths count feet in one system and metres in the other, so
     * that the order of the limits is the system's own. What is ordered is compared elsewhere, on the lines.
     */
    private static final Set<String> RANKED = Set.of("Cover", "Limits");

    private static final String GOVERNING = "Governing limit";

    /** A result with its name: element, symbol and case, or the cell where it has no such name. */
    private record Named(String name, Cell cell) {}

    private final Results here;
    private final Results there;
    private final Map<Dimension, Double> largest = new HashMap<>();
    private final List<String> faults = new ArrayList<>();
    private int numbers;
    private int words;
    private int inRegister;
    private double worst;

    private SystemsComparison(Results here, Results there) {
        this.here = here;
        this.there = there;
    }

    static SystemsComparison of(Results here, Results there) {
        SystemsComparison comparison = new SystemsComparison(here, there);
        comparison.largest(here);
        comparison.largest(there);
        comparison.sheets();
        return comparison;
    }

    /** Where the two part, in words. */
    List<String> faults() {
        return faults;
    }

    /** How many results of the register were compared. */
    int inRegister() {
        return inRegister;
    }

    @Override
    public String toString() {
        return String.format(
                Locale.ROOT,
                "%d numbers and %d words, %d of the register; %d disagree; worst %.1e of the number",
                numbers,
                words,
                inRegister,
                faults.size(),
                worst);
    }

    private void largest(Results results) {
        for (Cell cell : results.cells()) {
            if (results.value(cell) instanceof Value.Number number) {
                largest.merge(unit(cell).dimension(), Math.abs(inSi(cell, number)), Math::max);
            }
        }
    }

    private static double inSi(Cell cell, Value.Number number) {
        return number.value() * unit(cell).sizeInSi() + unit(cell).zeroInSi();
    }

    /** The unit of a number; that of the margin of a demanded length is the one it counts, though the cell holds a pure number. */
    private static Unit unit(Cell cell) {
        Formula formula = cell.formula();
        if (cell.unit().dimension().isNone()) {
            if (formula instanceof Formula.Symbol same && cell.references().get(same.name()) instanceof Cell shown) {
                return unit(shown);
            }
            if (formula instanceof Formula.Call chosen && chosen.function() == Function.IF) {
                formula = chosen.arguments().get(1);
            }
            if (formula instanceof Formula.Operation over
                    && over.operator() == Operator.OVER
                    && over.right() instanceof Formula.Quantity one
                    && over.left() instanceof Formula.Symbol left
                    && left.name().equals("left")) {
                return one.unit();
            }
        }
        return cell.unit();
    }

    private void sheets() {
        if (here.sheets().size() != there.sheets().size()) {
            faults.add(here.sheets().size() + " sheets here, " + there.sheets().size() + " there");
            return;
        }
        for (int i = 0; i < here.sheets().size(); i++) {
            Sheet one = here.sheets().get(i);
            if (!LEFT_OUT.contains(one.name()) && !RANKED.contains(one.name())) {
                compare(one.name(), named(one), named(there.sheets().get(i)));
            }
        }
    }

    private void compare(String sheet, List<Named> ours, List<Named> theirs) {
        if (ours.size() != theirs.size()) {
            faults.add(sheet + ": " + ours.size() + " results here, " + theirs.size() + " there");
            return;
        }
        inRegister += sheet.equals("Register") ? ours.size() : 0;
        for (int i = 0; i < ours.size(); i++) {
            compare(ours.get(i), theirs.get(i));
        }
    }

    private void compare(Named ours, Named theirs) {
        Value a = here.value(ours.cell());
        Value b = there.value(theirs.cell());
        boolean alike = ours.name().equals(theirs.name())
                && unit(ours.cell()).dimension().equals(unit(theirs.cell()).dimension());
        if (alike && a instanceof Value.Number one && b instanceof Value.Number other) {
            numbers++;
            alike = agree(ours.cell(), inSi(ours.cell(), one), inSi(theirs.cell(), other));
        } else {
            words++;
            alike &= a.equals(b);
        }
        if (!alike) {
            faults.add(ours.name() + ": " + shown(ours, a) + " here, " + shown(theirs, b) + " there"
                    + (ours.name().equals(theirs.name()) ? "" : ", of " + theirs.name()));
        }
    }

    private boolean agree(Cell cell, double one, double other) {
        double apart = Math.abs(one - other);
        double size = Math.max(Math.abs(one), Math.abs(other));
        double floor = Comparison.FLOOR * largest.getOrDefault(unit(cell).dimension(), 0.0);
        if (size > floor / Comparison.RELATIVE) {
            worst = Math.max(worst, apart / size);
        }
        return apart <= Comparison.RELATIVE * size || apart <= floor;
    }

    private static String shown(Named named, Value value) {
        return value instanceof Value.Number number
                ? number.value() + " " + unit(named.cell())
                : value instanceof Value.Word word ? "\"" + word.text() + "\"" : ((Value.None) value).why();
    }

    private static List<Named> named(Sheet sheet) {
        List<Named> all = new ArrayList<>();
        for (Block block : sheet.blocks()) {
            if (block instanceof Block.Table table) {
                table(sheet, table, all);
            } else if (block instanceof Block.WorkbookOnly only) {
                table(sheet, only.table(), all);
            } else if (block instanceof Block.Lines lines) {
                lines.lines().forEach(line -> line(line, lines.caseNames(), all));
            }
        }
        return all;
    }

    private static void table(Sheet sheet, Block.Table table, List<Named> all) {
        boolean isRegister = sheet.name().equals("Register");
        for (Block.Row row : table.rows()) {
            String name = isRegister
                    ? table.title() + ", " + text(row.items().get(1)) + " "
                            + text(row.items().get(2)) + ", " + text(row.items().get(4))
                    : "";
            for (int i = 0; i < row.items().size(); i++) {
                if (row.items().get(i) instanceof Block.Content content && !isRanked(table, i)) {
                    all.add(new Named(isRegister ? name : content.cell().place().full(), content.cell()));
                }
            }
        }
    }

    /** The governing limit of a case and its margin. */
    private static boolean isRanked(Block.Table table, int column) {
        List<String> heads = table.columns().stream().map(Block.Column::head).toList();
        return heads.contains(GOVERNING)
                && (heads.get(column).equals(GOVERNING) || heads.get(column).equals("Margin"));
    }

    private static String text(Block.Item item) {
        return item instanceof Block.Text text ? text.text() : ((Block.Symbol) item).symbol();
    }

    private static void line(Block.Line line, List<String> caseNames, List<Named> all) {
        String name = line.code() + " " + line.symbol() + ", ";
        if (line.forAll() != null) {
            all.add(new Named(name + "all cases", line.forAll()));
        }
        for (int c = 0; c < line.perCase().size(); c++) {
            all.add(new Named(name + caseNames.get(c), line.perCase().get(c)));
        }
    }
}
