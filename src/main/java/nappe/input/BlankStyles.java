package nappe.input;

import org.apache.poi.ss.usermodel.BorderStyle;
import org.apache.poi.ss.usermodel.FontScheme;
import org.apache.poi.ss.usermodel.HorizontalAlignment;
import org.apache.poi.ss.usermodel.VerticalAlignment;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.apache.poi.xssf.usermodel.XSSFFont;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** The cell styles of a blank. Where to type is told by a thick frame, not by a colour. */
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
        head = framed(workbook, font(workbook, 10, true), BorderStyle.THIN);
        head.setBorderBottom(BorderStyle.MEDIUM);
        XSSFFont slanted = font(workbook, 9, false);
        slanted.setItalic(true);
        mark = style(workbook, slanted);
        label = framed(workbook, plain, BorderStyle.THIN);
        textEntry = framed(workbook, plain, BorderStyle.MEDIUM);
        textEntry.setLocked(false);
        textEntry.setDataFormat(workbook.createDataFormat().getFormat("@"));
        numberEntry = framed(workbook, plain, BorderStyle.MEDIUM);
        numberEntry.setLocked(false);
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

    private static XSSFCellStyle framed(XSSFWorkbook workbook, XSSFFont font, BorderStyle border) {
        XSSFCellStyle style = style(workbook, font);
        style.setWrapText(true);
        style.setBorderTop(border);
        style.setBorderBottom(border);
        style.setBorderLeft(border);
        style.setBorderRight(border);
        return style;
    }
}
