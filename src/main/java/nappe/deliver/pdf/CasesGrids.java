package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.results.Results;

/** Every case: one row per line, one column per case, in as many tables side by side as the paper asks for. */
final class CasesGrids {
    private static final double SIZE = 8.5;
    private static final List<String> HEADS = List.of("Line", "Row", "Symbol", "Description", "Unit");
    private static final int DESCRIPTION = 3;
    private static final int MOST = 6;

    /** Widths of a case's column, in mm. */
    private static final double LEAST_CASE = 15;

    private static final double LARGEST_CASE = 24;

    /** A longer word in the name of a case is broken. */
    private static final double LARGEST_NAME = 23;

    /** Tables of so many rows stay on one page. */
    private static final int SHORT = 20;

    private final Results results;
    private final Block.Lines lines;
    private final ColumnWidths fixed;
    private final double caseWidth;

    CasesGrids(Results results, Block.Lines lines) {
        this.results = results;
        this.lines = lines;
        this.fixed = measureFixed(lines);
        this.caseWidth = measureCases();
    }

    /** The tables; none where there is one case or none, since it is worked in full. */
    List<View.Grid> grids(double width) {
        int cases = lines.printed();
        if (cases < 2 || perCase(lines).isEmpty()) {
            return List.of();
        }
        int tables = tables(width);
        List<View.Grid> grids = new ArrayList<>();
        for (int i = 0; i < tables; i++) {
            int from = i * cases / tables;
            int to = (i + 1) * cases / tables;
            String part = tables == 1 ? "" : ", part " + (i + 1) + " of " + tables;
            grids.add(grid(
                    from,
                    to,
                    "Every case" + part
                            + "; a value stands in the workbook in the row of its line and the column of its case, as do steps on"
                            + " the way; verdicts of every case are on the sheet of limits",
                    width));
        }
        return grids;
    }

    private int tables(double width) {
        int cases = lines.printed();
        double room = width - fixed.least();
        int perTable = (int) Math.max(1, Math.min(MOST, Math.floor(room / caseWidth)));
        return (cases + perTable - 1) / perTable;
    }

    /** Widths of the fixed columns; the description takes what the cases leave, so that all tables are alike. */
    private static ColumnWidths measureFixed(Block.Lines lines) {
        ColumnWidths widths = new ColumnWidths(HEADS.size(), SIZE);
        for (int i = 0; i < HEADS.size(); i++) {
            widths.whole(i, HEADS.get(i) + "  ");
        }
        widths.whole(DESCRIPTION, "Description of some words.");
        for (Block.Line line : perCase(lines)) {
            widths.whole(0, line.code());
            widths.whole(1, workbookRow(line));
            widths.whole(2, symbol(line).characters());
            widths.whole(4, View.Text.of("", unit(line)).characters());
        }
        return widths;
    }

    private double measureCases() {
        ColumnWidths names = new ColumnWidths(1, SIZE);
        lines.caseNames().subList(0, lines.printed()).forEach(name -> names.text(0, name, true));
        ColumnWidths widths = new ColumnWidths(1, SIZE);
        for (Block.Line line : perCase(lines)) {
            for (int i = 0; i < lines.printed(); i++) {
                widths.text(0, value(line, i).characters(), true);
            }
        }
        return Math.max(Math.max(LEAST_CASE, widths.least()), Math.min(names.least(), LARGEST_NAME));
    }

    private static List<Block.Line> perCase(Block.Lines lines) {
        return lines.lines().stream().filter(CasesGrids::isPrinted).toList();
    }

    /** Steps are worked for one case and stand in the workbook for the others; verdicts stand on the sheet of limits. */
    private static boolean isPrinted(Block.Line line) {
        return !line.perCase().isEmpty()
                && line.kind() != Block.LineKind.STEP
                && line.kind() != Block.LineKind.LIMIT_VERDICT;
    }

    private List<Double> widths(int cases, double width) {
        List<Double> widths = new ArrayList<>(fixed.fit(fixed.least(), 0));
        double each = Math.min(LARGEST_CASE, Math.max(caseWidth, (width - fixed.least() - 25) / perTable(width)));
        widths.set(DESCRIPTION, widths.get(DESCRIPTION) + Math.max(0, width - fixed.least() - each * perTable(width)));
        widths.addAll(Collections.nCopies(cases, each));
        return widths;
    }

    private int perTable(double width) {
        int cases = lines.printed();
        return (cases + tables(width) - 1) / tables(width);
    }

    private View.Grid grid(int from, int to, String title, double width) {
        List<View.GridCell> head = new ArrayList<>();
        for (String name : HEADS) {
            head.add(View.GridCell.of("", View.Text.plain("", name)));
        }
        for (int i = from; i < to; i++) {
            head.add(new View.GridCell(
                    "right",
                    1,
                    List.of(View.Text.plain("", lines.caseNames().get(i)), View.Text.plain("small", column(i)))));
        }
        List<View.GridRow> body = new ArrayList<>();
        Between between = new Between(width);
        for (Block.Line line : lines.lines()) {
            if (line.kind() == Block.LineKind.HEADING) {
                between.heading(line.description());
            } else if (isPrinted(line)) {
                body.add(between.above(row(line, from, to)));
            }
        }
        return new View.Grid(
                body.size() <= SHORT ? "together" : "",
                widths(to - from, width),
                List.of(View.Text.plain("tabletitle", title)),
                List.of(new View.GridRow("", head)),
                body);
    }

    private View.GridRow row(Block.Line line, int from, int to) {
        List<View.GridCell> cells = new ArrayList<>();
        cells.add(View.GridCell.of("", View.Text.plain("", line.code())));
        cells.add(View.GridCell.of("", View.Text.plain("small", workbookRow(line))));
        cells.add(View.GridCell.of("", symbol(line)));
        cells.add(View.GridCell.of("", View.Text.of("", SymbolPrint.inText(line.description()))));
        cells.add(View.GridCell.of("", View.Text.of("", unit(line))));
        for (int i = from; i < to; i++) {
            cells.add(View.GridCell.of("right", value(line, i)));
        }
        return new View.GridRow("", cells);
    }

    private static String workbookRow(Block.Line line) {
        return Integer.toString(line.perCase().get(0).place().row() + 1);
    }

    /** The workbook column of a case. */
    private String column(int index) {
        Cell cell = perCase(lines).get(0).perCase().get(index);
        return "column " + Place.letters(cell.place().column());
    }

    private static View.Text symbol(Block.Line line) {
        return View.Text.of("", line.symbol().isEmpty() ? List.of() : SymbolPrint.pieces(line.symbol()));
    }

    private static List<Piece> unit(Block.Line line) {
        return line.unit().isEmpty() ? List.of() : UnitPrint.named(line.unit());
    }

    private View.Text value(Block.Line line, int index) {
        Cell cell = line.perCase().get(index);
        String value = Printed.value(results, cell);
        boolean number = Printed.isNumber(results, cell);
        Piece piece = number ? Piece.plain(value) : Verdicts.weigh(value);
        return View.Text.of("", List.of(piece));
    }
}
