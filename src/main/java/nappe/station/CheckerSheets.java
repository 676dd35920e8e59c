package nappe.station;

import java.util.ArrayList;
import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Reference;
import nappe.calculation.Run;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;

/** Lays what a checker works with: every formula with room for a tick, and every symbol with what it rests on. */
final class CheckerSheets {
    private static final int LONGEST_LIST = 400;
    private static final String TRIALS = "Trials";

    private CheckerSheets() {}

    /** Every line of the elements with its formula and its cell, to be ticked off by hand. */
    static void formulas(SheetDraft sheet, Map<String, List<Block.Line>> linesOf) {
        sheet.note(
                "To be filled in by the checker, by hand. Each line is given once, by its cell for all cases or for the first case.");
        linesOf.forEach((tag, lines) -> {
            TableDraft table = sheet.table(
                    "Formulas of " + tag,
                    List.of(
                            new Block.Column("Line", 9, Block.Align.LEFT),
                            new Block.Column("Quantity", 34, Block.Align.LEFT),
                            new Block.Column("Formula", 46, Block.Align.LEFT),
                            new Block.Column("Cell", 12, Block.Align.LEFT),
                            new Block.Column("Tick", 6, Block.Align.LEFT),
                            new Block.Column("Initials", 8, Block.Align.LEFT),
                            new Block.Column("Comment", 30, Block.Align.LEFT)));
            for (Block.Line line : lines) {
                Cell cell = first(line);
                if (cell != null) {
                    String formula = line.symbol().isEmpty() || !isFormula(line)
                            ? line.equation()
                            : line.symbol() + " = " + line.equation();
                    table.add(List.of(
                            new Block.Text(line.code()),
                            new Block.Text(line.description()),
                            new Block.Text(formula),
                            new Block.Address(cell),
                            new Block.Text(""),
                            new Block.Text(""),
                            new Block.Text("")));
                }
            }
            sheet.gap();
        });
    }

    private static boolean isFormula(Block.Line line) {
        Cell cell = first(line);
        return cell != null
                && cell.formula() != null
                && line.equation().equals(nappe.formula.PlainReading.of(cell.formula()));
    }

    /** Every symbol with its meaning and unit, what it rests on and what rests on it. */
    static void glossary(SheetDraft sheet, Map<String, List<Block.Line>> linesOf) {
        linesOf.forEach((tag, lines) -> {
            Map<String, Block.Line> known = new LinkedHashMap<>();
            lines.stream().filter(l -> !l.symbol().isEmpty()).forEach(l -> known.putIfAbsent(l.symbol(), l));
            Map<String, Set<String>> restsOn = new LinkedHashMap<>();
            Map<String, Set<String>> carries = new LinkedHashMap<>();
            for (Block.Line line : known.values()) {
                Set<String> direct = direct(line, known);
                restsOn.put(line.symbol(), direct);
                direct.forEach(s ->
                        carries.computeIfAbsent(s, k -> new LinkedHashSet<>()).add(line.symbol()));
            }
            TableDraft table = sheet.table(
                    "Symbols of " + tag,
                    List.of(
                            new Block.Column("Symbol", 12, Block.Align.LEFT),
                            new Block.Column("Meaning", 46, Block.Align.LEFT),
                            new Block.Column("Unit", 10, Block.Align.LEFT),
                            new Block.Column("Rests on", 36, Block.Align.LEFT),
                            new Block.Column("What rests on it", 36, Block.Align.LEFT)));
            known.values()
                    .forEach(line -> table.add(List.of(
                            new Block.Symbol(line.symbol()),
                            new Block.Text(line.description()),
                            new Block.Text(line.unit()),
                            new Block.Text(listed(restsOn.getOrDefault(line.symbol(), Set.of()), "what is given")),
                            new Block.Text(listed(carries.getOrDefault(line.symbol(), Set.of()), "a result")))));
            sheet.gap();
        });
    }

    /** The symbols of the same sheet that a line rests on directly, or through the trial rows of a root. */
    private static Set<String> direct(Block.Line line, Map<String, Block.Line> known) {
        Set<String> symbols = new LinkedHashSet<>();
        Cell cell = first(line);
        if (cell != null) {
            follow(cell, cell.place().sheet(), known, symbols, Collections.newSetFromMap(new IdentityHashMap<>()));
        }
        symbols.remove(line.symbol());
        return symbols;
    }

    private static void follow(
            Cell cell, String sheet, Map<String, Block.Line> known, Set<String> symbols, Set<Cell> seen) {
        for (Reference reference : cell.references().values()) {
            for (Cell one : reference instanceof Run run ? run.cells() : List.of((Cell) reference)) {
                boolean here = one.place().sheet().equals(sheet);
                if (here && known.containsKey(one.symbol())) {
                    symbols.add(one.symbol());
                } else if ((here || one.place().sheet().equals(TRIALS)) && seen.add(one)) {
                    follow(one, sheet, known, symbols, seen);
                }
            }
        }
    }

    private static String listed(Set<String> symbols, String none) {
        List<String> sorted = new ArrayList<>(symbols);
        sorted.sort(null);
        String text = String.join(", ", sorted);
        return text.isEmpty() ? none : text.length() > LONGEST_LIST ? text.substring(0, LONGEST_LIST) + ", ..." : text;
    }

    private static @org.jspecify.annotations.Nullable Cell first(Block.Line line) {
        return line.forAll() != null
                ? line.forAll()
                : line.perCase().isEmpty() ? null : line.perCase().get(0);
    }
}
