package nappe.station;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.Place;
import nappe.calculation.ScreenGrid;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.formula.Sign;
import nappe.formula.Value;
import nappe.unit.Unit;

/** Lays what reruns of the whole station found for each word of a choice: which limits fail, as issued. */
final class SizeRerunsSheet {
    private final Cells cells;
    private final SheetDraft sheet;
    private final String choice;

    /** @param choice its symbol */
    SizeRerunsSheet(Cells cells, SheetDraft sheet, String choice) {
        this.cells = cells;
        this.sheet = sheet;
        this.choice = choice;
    }

    /**
     * Lays the notes above the table.
     *
     * @param entry where the choice is typed, in words
     * @param caseNames of the judged cases
     */
    void notes(String entry, List<String> caseNames) {
        sheet.note("Found by reruns of the whole station, one for each " + choice + ", all other entries as issued; it"
                + " does not follow a changed entry, only the mark does. To reproduce a row, type its " + choice
                + " into " + entry + " and read sheet Limits.");
        sheet.note(
                "It fits where every limit is met or does not apply. A limit that is not met in some case counts as not"
                        + " met; one that is met wherever it has a result counts as without result, often only because another"
                        + " is not met.");
        List<String> numbered = new ArrayList<>();
        for (int c = 0; c < caseNames.size(); c++) {
            numbered.add((c + 1) + " " + caseNames.get(c));
        }
        sheet.note("Cases by number: " + String.join("; ", numbered) + ".");
    }

    /**
     * Lays the table.
     *
     * @param marks the cells that mark the chosen one, in the order of the variants
     * @param reruns one for each variant
     */
    void table(List<ScreenGrid.Variant> variants, List<Cell> marks, List<SizeRerun> reruns) {
        TableDraft table = sheet.table(
                "What fails in the whole station with each " + choice + ", as issued",
                List.of(
                        new Block.Column(choice, 9, Block.Align.LEFT),
                        new Block.Column("Chosen", 8, Block.Align.LEFT),
                        new Block.Column("Fits", 9, Block.Align.LEFT),
                        new Block.Column("Limits not met", 9, Block.Align.RIGHT),
                        new Block.Column("without result", 9, Block.Align.RIGHT),
                        new Block.Column("Which limits, in which cases", 70, Block.Align.LEFT)));
        for (int i = 0; i < variants.size(); i++) {
            SizeRerun rerun = reruns.get(i);
            boolean ran = rerun.refused().isEmpty();
            Value none = new Value.None(Value.NO_RESULT);
            table.add(List.of(
                    new Block.Content(variants.get(i).word()),
                    new Block.Content(marks.get(i)),
                    rerun(table.place(2), Value.word(fits(rerun))),
                    rerun(table.place(3), ran ? Value.of(rerun.notMet()) : none),
                    rerun(table.place(4), ran ? Value.of(rerun.withoutResult()) : none),
                    rerun(table.place(5), Value.word(FailingWords.of(rerun)))));
        }
        sheet.gap();
    }

    private Block.Item rerun(Place place, Value value) {
        return new Block.Content(cells.typed(Cell.Kind.RERUN, place, "", Unit.one(), value, Sign.ANY));
    }

    private static String fits(SizeRerun rerun) {
        if (!rerun.refused().isEmpty()) {
            return Value.NO_RESULT;
        }
        return !rerun.failures().isEmpty() ? "no" : rerun.lacks() ? Value.NOT_GIVEN : "yes";
    }
}
