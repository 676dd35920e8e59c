package nappe.deliver.xlsx;

import java.util.List;
import nappe.calculation.Place;
import nappe.results.Furniture;
import org.apache.poi.common.usermodel.HyperlinkType;
import org.apache.poi.ss.usermodel.DataValidation;
import org.apache.poi.ss.usermodel.DataValidationConstraint.OperatorType;
import org.apache.poi.ss.usermodel.DataValidationConstraint.ValidationType;
import org.apache.poi.ss.usermodel.DataValidationHelper;
import org.apache.poi.ss.usermodel.PageMargin;
import org.apache.poi.ss.usermodel.PrintSetup;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.ss.util.CellRangeAddressList;
import org.apache.poi.xssf.usermodel.XSSFHyperlink;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** All of a sheet but its rows: widths, panes, print set-up, protection, links, checks on what is typed. */
final class SheetFrame {
    private static final int PORTRAIT_FITS = 115;
    private static final int COLUMNS_HELD = 3;
    private static final int ROWS_HELD_AT_MOST = 7;

    private final XSSFWorkbook workbook;
    private final XSSFSheet sheet;
    private final SheetWriter content;
    private final Canvas canvas;

    SheetFrame(XSSFWorkbook workbook, XSSFSheet sheet, SheetWriter content) {
        this.workbook = workbook;
        this.sheet = sheet;
        this.content = content;
        this.canvas = content.canvas();
    }

    void set(Furniture furniture, int sheets) {
        widths();
        panes();
        print(furniture, sheets);
        protect();
        canvas.merged()
                .forEach(row -> sheet.addMergedRegionUnsafe(
                        new CellRangeAddress(row, row, 0, canvas.columns().span() - 1)));
        canvas.links().forEach(this::link);
        checkNumbers(canvas.numbersTyped());
    }

    private void widths() {
        List<Integer> widths = canvas.columns().widths();
        for (int i = 0; i < widths.size(); i++) {
            sheet.setColumnWidth(i, widths.get(i) * 256);
        }
        sheet.setDisplayGridlines(false);
    }

    /** The heads stay in sight where they stand near the top; else the title does, so that the sheet can be seen. */
    private void panes() {
        int head = content.mainHead();
        boolean nearTop = head >= 0 && head < ROWS_HELD_AT_MOST;
        sheet.createFreezePane(content.hasLines() ? COLUMNS_HELD : 0, nearTop ? head + 1 : 1);
        int first = nearTop || head < 0 ? 0 : head;
        int last = head < 0 ? SheetWriter.HEADER_ROWS - 1 : head;
        sheet.setRepeatingRows(new CellRangeAddress(first, last, -1, -1));
    }

    private void print(Furniture furniture, int sheets) {
        PrintSetup setup = sheet.getPrintSetup();
        setup.setPaperSize(furniture.letterPaper() ? PrintSetup.LETTER_PAPERSIZE : PrintSetup.A4_PAPERSIZE);
        setup.setLandscape(canvas.columns().total() > PORTRAIT_FITS);
        sheet.setFitToPage(true);
        setup.setFitWidth((short) 1);
        setup.setFitHeight((short) 0);
        sheet.setMargin(PageMargin.LEFT, 0.5);
        sheet.setMargin(PageMargin.RIGHT, 0.5);
        sheet.setMargin(PageMargin.TOP, 0.8);
        sheet.setMargin(PageMargin.BOTTOM, 0.9);
        sheet.setMargin(PageMargin.HEADER, 0.35);
        sheet.setMargin(PageMargin.FOOTER, 0.3);
        Margins margins = new Margins(furniture, content.sheet(), sheets);
        sheet.getHeader().setLeft(margins.headLeft());
        sheet.getHeader().setRight(margins.headRight());
        sheet.getFooter().setLeft(margins.footLeft());
        int index = workbook.getSheetIndex(sheet);
        workbook.setPrintArea(index, 0, canvas.rows().lastColumn(), 0, canvas.rows().lastRow());
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

    private void checkNumbers(List<Place> places) {
        if (places.isEmpty()) {
            return;
        }
        CellRangeAddressList addresses = new CellRangeAddressList();
        places.forEach(place -> addresses.addCellRangeAddress(place.row(), place.column(), place.row(), place.column()));
        DataValidationHelper helper = sheet.getDataValidationHelper();
        DataValidation validation = helper.createValidation(
                helper.createNumericConstraint(ValidationType.DECIMAL, OperatorType.BETWEEN, "-1E+300", "1E+300"),
                addresses);
        validation.setErrorStyle(DataValidation.ErrorStyle.STOP);
        validation.setShowErrorBox(true);
        validation.createErrorBox("A number is expected", "Type a number in the unit that stands beside it.");
        sheet.addValidationData(validation);
    }
}
