package nappe.deliver.xlsx;

import java.util.List;
import java.util.function.Function;
import nappe.calculation.Cell;
import nappe.formula.Value;
import nappe.results.Furniture;
import org.apache.poi.common.usermodel.HyperlinkType;
import org.apache.poi.ss.usermodel.PageMargin;
import org.apache.poi.ss.usermodel.PrintSetup;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.usermodel.XSSFHyperlink;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** All of a sheet but its rows: widths, panes, print set-up, protection, links, checks on what is typed, charts. */
final class SheetFrame {
    private static final int COLUMNS_HELD = 3;
    private static final int ROWS_HELD_AT_MOST = 7;

    private final XSSFWorkbook workbook;
    private final XSSFSheet sheet;
    private final SheetWriter content;
    private final Canvas canvas;
    private final Function<Cell, Value> values;

    /** @param values the values of cells, for what a chart shows until somebody recalculates */
    SheetFrame(XSSFWorkbook workbook, XSSFSheet sheet, SheetWriter content, Function<Cell, Value> values) {
        this.values = values;
        this.workbook = workbook;
        this.sheet = sheet;
        this.content = content;
        this.canvas = content.canvas();
    }

    void set(Furniture furniture, int sheets) {
        widths();
        panes(furniture);
        print(furniture, sheets);
        protect();
        canvas.merged()
                .forEach(row -> sheet.addMergedRegionUnsafe(
                        new CellRangeAddress(row, row, 0, canvas.columns().span() - 1)));
        canvas.links().forEach(this::link);
        new TypedChecks(sheet).set(canvas.typedInto());
        Charts charts = new Charts(sheet, values, canvas.columns().span());
        content.charts().forEach(charts::draw);
    }

    private void widths() {
        List<Integer> widths = canvas.columns().widths();
        for (int i = 0; i < widths.size(); i++) {
            sheet.setColumnWidth(i, widths.get(i) * 256);
        }
        sheet.setDisplayGridlines(false);
    }

    /** The heads stay in sight where they stand near the top; else the title does, so that the sheet can be seen. */
    private void panes(Furniture furniture) {
        int head = content.mainHead();
        boolean nearTop = head >= 0 && head < ROWS_HELD_AT_MOST;
        sheet.createFreezePane(content.hasLines() ? COLUMNS_HELD : 0, nearTop ? head + 1 : 1);
        int first = nearTop || head < 0 ? 0 : head;
        int last = head < 0 ? SheetWriter.HEADER_ROWS - 1 : head;
        sheet.setRepeatingRows(new CellRangeAddress(first, last, -1, -1));
        Pages pages = new Pages(furniture, canvas.columns().total(), canvas.rows());
        sheet.getPrintSetup().setLandscape(pages.wide());
        sheet.setFitToPage(true);
        sheet.getPrintSetup().setFitWidth((short) pages.beside());
        sheet.getPrintSetup().setFitHeight((short) (pages.onOne() ? 1 : 0));
        if (pages.beside() > 1 && content.hasLines()) {
            sheet.setRepeatingColumns(new CellRangeAddress(-1, -1, 0, COLUMNS_HELD - 1));
        }
        pages.ends(new Pages.Kept(first, last), content.kept()).forEach(sheet::setRowBreak);
    }

    private void print(Furniture furniture, int sheets) {
        PrintSetup setup = sheet.getPrintSetup();
        setup.setPaperSize(furniture.letterPaper() ? PrintSetup.LETTER_PAPERSIZE : PrintSetup.A4_PAPERSIZE);
        sheet.setMargin(PageMargin.LEFT, Pages.SIDE);
        sheet.setMargin(PageMargin.RIGHT, Pages.SIDE);
        sheet.setMargin(PageMargin.TOP, Pages.TOP);
        sheet.setMargin(PageMargin.BOTTOM, Pages.BOTTOM);
        sheet.setMargin(PageMargin.HEADER, 0.35);
        sheet.setMargin(PageMargin.FOOTER, 0.3);
        Margins margins = new Margins(furniture, content.sheet(), sheets);
        sheet.getHeader().setLeft(margins.headLeft());
        sheet.getHeader().setRight(margins.headRight());
        sheet.getFooter().setLeft(margins.footLeft());
        int index = workbook.getSheetIndex(sheet);
        workbook.setPrintArea(
                index, 0, canvas.rows().lastColumn(), 0, canvas.rows().lastRow());
    }

    private void protect() {
        sheet.enableLocking();
        sheet.lockFormatCells(false);
        sheet.lockFormatColumns(false);
        sheet.lockFormatRows(false);
        sheet.lockSelectLockedCells(false);
        sheet.lockSelectUnlockedCells(false);
    }

    private void link(Canvas.Link link) {
        XSSFHyperlink hyperlink = workbook.getCreationHelper().createHyperlink(HyperlinkType.DOCUMENT);
        hyperlink.setLocation(link.to());
        hyperlink.setCellReference(link.from().address());
        sheet.addHyperlink(hyperlink);
    }
}
