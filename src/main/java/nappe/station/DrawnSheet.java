package nappe.station;

import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Scope;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.method.Item;
import nappe.method.MethodSheet;

/** Lays the sheet of a drawing: the figure, and the values shown in it, each a link to its line. */
final class DrawnSheet {
    private final MethodSheet method;
    private final SheetDraft sheet;

    DrawnSheet(MethodSheet method, SheetDraft sheet) {
        this.method = method;
        this.sheet = sheet;
    }

    /** @param symbols shown in the drawing */
    void lay(String tag, List<String> symbols, Scope worked) {
        sheet.figure("Geometry and levels of " + tag, tag + PackageLayout.GEOMETRY_FIGURE);
        TableDraft table = sheet.table(
                "Values shown in the drawing",
                List.of(
                        new Block.Column("Symbol", 10, Block.Align.LEFT),
                        new Block.Column("Description", 50, Block.Align.LEFT),
                        new Block.Column("Value", 16, Block.Align.RIGHT),
                        new Block.Column("Unit", 8, Block.Align.LEFT),
                        new Block.Column("Source", 30, Block.Align.LEFT)));
        for (String symbol : symbols) {
            Cell cell = worked.cell(symbol);
            table.add(List.of(
                    new Block.Symbol(symbol),
                    new Block.Text(label(symbol)),
                    new Block.Content(cell),
                    new Block.Text(Sources.unitText(cell.unit())),
                    new Block.Text(source(symbol))));
        }
        sheet.gap();
    }

    private String label(String symbol) {
        Item item = method.item(symbol);
        if (item instanceof Item.Line line) {
            return line.label();
        }
        return item instanceof Item.Given given
                ? given.label()
                : item instanceof Item.Constant constant
                        ? constant.label()
                        : item instanceof Item.Root root ? root.label() : "";
    }

    private String source(String symbol) {
        Item item = method.item(symbol);
        return item instanceof Item.Line line ? line.source() : item instanceof Item.Root root ? root.source() : "";
    }
}
