package nappe.input;

import java.util.List;
import org.apache.poi.common.usermodel.HyperlinkType;
import org.apache.poi.ss.usermodel.VerticalAlignment;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.apache.poi.xssf.usermodel.XSSFFont;
import org.apache.poi.xssf.usermodel.XSSFHyperlink;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.jspecify.annotations.Nullable;

/** The sheet of a marked copy that lists the faults, each with a link to its cell. */
final class FaultList {
    static final String NAME = "Faults";
    private static final List<String> HEADS = List.of("Sheet", "Cell", "What is wrong and how to mend it", "Fault");
    private static final int[] WIDTHS = {18, 9, 90, 26};
    private static final int CHARACTERS_PER_LINE = 84;
    private static final int POINTS_PER_LINE = 15;

    private final XSSFWorkbook workbook;
    private final XSSFSheet sheet;
    private final XSSFCellStyle plain;
    private final XSSFCellStyle bold;

    private FaultList(XSSFWorkbook workbook, String name) {
        this.workbook = workbook;
        this.sheet = workbook.createSheet(name);
        this.plain = style(false);
        this.bold = style(true);
    }

    /** Adds the sheet behind all others; returns its name, which none of them has. */
    static String add(XSSFWorkbook workbook, List<Fault> faults) {
        String name = NAME;
        for (int i = 2; workbook.getSheet(name) != null; i++) {
            name = NAME + " " + i;
        }
        new FaultList(workbook, name).write(faults);
        return name;
    }

    private void write(List<Fault> faults) {
        for (int i = 0; i < WIDTHS.length; i++) {
            sheet.setColumnWidth(i, WIDTHS[i] * 256);
        }
        sheet.setFitToPage(true);
        sheet.getPrintSetup().setLandscape(true);
        sheet.getPrintSetup().setFitHeight((short) 0);
        sheet.addMergedRegion(new CellRangeAddress(1, 1, 0, HEADS.size() - 1));
        put(sheet.createRow(0), 0, "Faults of " + faults.get(0).file() + " as it was read", bold);
        put(
                sheet.createRow(1),
                0,
                "Mend them in the workbook itself or in this copy, where this sheet may stay.",
                plain);
        XSSFRow head = sheet.createRow(3);
        HEADS.forEach(word -> put(head, HEADS.indexOf(word), word, bold));
        int row = 4;
        for (Fault fault : faults) {
            write(sheet.createRow(row++), fault);
        }
        sheet.createFreezePane(0, 4);
    }

    private void write(XSSFRow row, Fault fault) {
        put(row, 0, fault.sheet(), plain);
        XSSFCell cell = put(row, 1, fault.cell(), plain);
        put(row, 2, fault.message(), plain);
        put(row, 3, fault.code(), plain);
        row.setHeightInPoints((1 + fault.message().length() / CHARACTERS_PER_LINE) * POINTS_PER_LINE);
        if (fault.sheet() != null && fault.cell() != null && workbook.getSheet(fault.sheet()) != null) {
            XSSFHyperlink link = workbook.getCreationHelper().createHyperlink(HyperlinkType.DOCUMENT);
            link.setLocation("'" + fault.sheet().replace("'", "''") + "'!" + fault.cell());
            cell.setHyperlink(link);
        }
    }

    private static XSSFCell put(XSSFRow row, int column, @Nullable String text, XSSFCellStyle style) {
        XSSFCell cell = row.createCell(column);
        cell.setCellValue(text == null ? "" : text);
        cell.setCellStyle(style);
        return cell;
    }

    private XSSFCellStyle style(boolean bold) {
        XSSFFont font = workbook.createFont();
        font.setBold(bold);
        XSSFCellStyle style = workbook.createCellStyle();
        style.setFont(font);
        style.setWrapText(!bold);
        style.setVerticalAlignment(VerticalAlignment.TOP);
        return style;
    }
}
