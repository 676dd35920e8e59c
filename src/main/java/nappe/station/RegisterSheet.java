package nappe.station;

import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;

/**
 * Lays the register: every result of every element, a row for each case, with its sheet, its line and its cell. It
 * stands in the workbook only; in the PDF every value is printed with its row and column where it belongs.
 */
final class RegisterSheet {
    private static final List<Block.Column> COLUMNS = List.of(
            new Block.Column("Sheet", 7, Block.Align.RIGHT),
            new Block.Column("Line", 9, Block.Align.LEFT),
            new Block.Column("Symbol", 10, Block.Align.LEFT),
            new Block.Column("Description", 50, Block.Align.LEFT),
            new Block.Column("Case", 28, Block.Align.LEFT),
            new Block.Column("Value", 16, Block.Align.RIGHT),
            new Block.Column("Unit", 10, Block.Align.LEFT),
            new Block.Column("Cell", 14, Block.Align.LEFT));

    private RegisterSheet() {}

    /**
     * @param numbers sheet number of each element, by its tag
     */
    static void lay(
            SheetDraft sheet,
            Cells cells,
            Map<String, List<Block.Line>> linesOf,
            Map<String, Integer> numbers,
            List<String> caseNames) {
        linesOf.forEach((tag, lines) -> {
            List<Block.Line> results = lines.stream()
                    .filter(line -> line.forAll() != null || !line.perCase().isEmpty())
                    .toList();
            int rows = results.stream()
                    .mapToInt(line -> Math.max(1, line.perCase().size()))
                    .sum();
            TableDraft table = sheet.workbookTable("Register of " + tag, COLUMNS, rows);
            String number = Integer.toString(numbers.getOrDefault(tag, 0));
            for (Block.Line line : results) {
                if (line.forAll() != null) {
                    row(table, cells, number, line, "all cases", line.forAll());
                }
                for (int c = 0; c < line.perCase().size(); c++) {
                    row(
                            table,
                            cells,
                            number,
                            line,
                            caseNames.get(c),
                            line.perCase().get(c));
                }
            }
        });
    }

    private static void row(
            TableDraft table, Cells cells, String number, Block.Line line, String caseName, Cell result) {
        Cell shown = cells.same(table.place(5), "", result);
        table.add(List.of(
                new Block.Text(number),
                new Block.Text(line.code()),
                new Block.Symbol(line.symbol()),
                new Block.Text(line.description()),
                new Block.Text(caseName),
                new Block.Content(shown),
                new Block.Text(line.unit()),
                new Block.Address(result)));
    }
}
