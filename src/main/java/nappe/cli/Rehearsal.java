package nappe.cli;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.calculation.Sheet;
import nappe.calculation.Sureness;
import nappe.deliver.pdf.PdfDelivery;
import nappe.deliver.xlsx.XlsxDelivery;
import nappe.formula.FormulaParser;
import nappe.formula.Value;
import nappe.job.Beside;
import nappe.results.Furniture;
import nappe.results.Results;
import nappe.unit.Unit;

/**
 * A package of one small sheet, made and thrown away on a thread of its own while the input is read: what workbook and PDF
 * need is then loaded when the results are there. Once in the life of the program.
 */
final class Rehearsal {
    private static final String SHEET = "Rehearsal";

    private Rehearsal() {}

    private static final class Once {
        static final Beside<Boolean> PAGES = Beside.start("rehearsal of the pages", () -> {
            PdfDelivery.render(results());
            return true;
        });

        static final Beside<Boolean> WORKBOOK = Beside.start("rehearsal of the workbook", () -> {
            PAGES.outcome();
            XlsxDelivery.render(results());
            return true;
        });
    }

    /** Starts it, where it has not been; the pages come first, since they take longest later on. */
    static Beside<Boolean> ofPages() {
        return Once.PAGES;
    }

    static Beside<Boolean> ofWorkbook() {
        return Once.WORKBOOK;
    }

    private static Results results() {
        Unit unit = Unit.parse("m");
        Cell typed = Cell.typed(Cell.Kind.ENTRY, new Place(SHEET, 6, 6), "h_a", unit, Value.of(1));
        Cell live = Cell.live(
                new Place(SHEET, 7, 6),
                "Q",
                unit,
                FormulaParser.parse("h_a ^ 1.5 / h_a"),
                Map.of("h_a", typed),
                Sureness.SURE);
        List<Block> blocks = List.of(
                new Block.Note(4, "A note.", false),
                new Block.Lines(5, List.of(), 0, List.of(line(typed, "typed"), line(live, "h_a ^ 1.5 / h_a"))),
                new Block.Table(
                        9,
                        "A table",
                        List.of(
                                new Block.Column("Name", 20, Block.Align.LEFT),
                                new Block.Column("Value", 9, Block.Align.RIGHT)),
                        List.of(new Block.Row(List.of(new Block.Symbol("h_a"), new Block.Text("1.00"))))));
        return new Results(
                new Furniture("", "", "", "", "", "", LocalDate.EPOCH, "", "", "", false, List.of("A caution."), ""),
                List.of(new Sheet(1, SHEET, "Rehearsal", blocks)),
                List.of(typed, live),
                Map.of(typed, Value.of(1), live, Value.of(1)));
    }

    private static Block.Line line(Cell cell, String equation) {
        return new Block.Line(
                Block.LineKind.QUANTITY, "R.001", "a length", cell.symbol(), equation, "m", "none", cell, List.of());
    }
}
