package nappe.input;

import org.apache.poi.ss.usermodel.BorderStyle;
import org.apache.poi.ss.usermodel.FontScheme;
import org.apache.poi.ss.usermodel.HorizontalAlignment;
import org.apache.poi.ss.usermodel.VerticalAlignment;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.apache.poi.xssf.usermodel.XSSFFont;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** The cell styles of a blank. Where to type is told by a frame, not by a colour; other cells have none. */
final class BlankStyles {
    private static final String FONT = "Arial";

    final XSSFCellStyle title;
    final XSSFCellStyle line;
    final XSSFCellStyle head;
    final XSSFCellStyle mark;
    final XSSFCellStyle label;
    final XSSFCellStyle textEntry;
    final XSSFCellStyle numberEntry;

    BlankStyles(XSSFWorkbook workbook) {
        XSSFFont plain = workbook.getFontAt(0);
        plain.setFontName(FONT);
        plain.setScheme(FontScheme.NONE);
        plain.setFontHeightInPoints((short) 10);
        title = style(workbook, font(workbook, 14, true));
        line = style(workbook, plain);
        head = wrapped(workbook, font(workbook, 10, true));
        head.setBorderBottom(BorderStyle.MEDIUM);
        XSSFFont slanted = font(workbook, 9, false);
        slanted.setItalic(true);
        mark = style(workbook, slanted);
        label = wrapped(workbook, plain);
        label.setBorderBottom(BorderStyle.HAIR);
        textEntry = entry(workbook, plain);
        textEntry.setAlignment(HorizontalAlignment.LEFT);
        textEntry.setDataFormat(workbook.createDataFormat().getFormat("@"));
        numberEntry = entry(workbook, plain);
        numberEntry.setAlignment(HorizontalAlignment.RIGHT);
    }

    private static XSSFFont font(XSSFWorkbook workbook, int points, boolean bold) {
        XSSFFont font = workbook.createFont();
        font.setFontName(FONT);
        font.setFontHeightInPoints((short) points);
        font.setBold(bold);
        return font;
    }

    private static XSSFCellStyle style(XSSFWorkbook workbook, XSSFFont font) {
        XSSFCellStyle style = workbook.createCellStyle();
        style.setFont(font);
        style.setVerticalAlignment(VerticalAlignment.TOP);
        return style;
    }

    private static XSSFCellStyle wrapped(XSSFWorkbook workbook, XSSFFont font) {
        XSSFCellStyle style = style(workbook, font);
        style.setWrapText(true);
        return style;
    }

    private static XSSFCellStyle entry(XSSFWorkbook workbook, XSSFFont font) {
        XSSFCellStyle style = wrapped(workbook, font);
        style.setLocked(false);
        style.setIndention((short) 1);
        style.setBorderTop(BorderStyle.MEDIUM);
        style.setBorderBottom(BorderStyle.MEDIUM);
        style.setBorderLeft(BorderStyle.MEDIUM);
        style.setBorderRight(BorderStyle.MEDIUM);
        return style;
    }
}
