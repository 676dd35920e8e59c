package nappe.deliver.xlsx;

import java.util.HashMap;
import java.util.Map;
import nappe.calculation.Block.Align;
import org.apache.poi.ss.usermodel.BorderStyle;
import org.apache.poi.ss.usermodel.FillPatternType;
import org.apache.poi.ss.usermodel.Font;
import org.apache.poi.ss.usermodel.FontScheme;
import org.apache.poi.ss.usermodel.HorizontalAlignment;
import org.apache.poi.ss.usermodel.IndexedColors;
import org.apache.poi.ss.usermodel.VerticalAlignment;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.apache.poi.xssf.usermodel.XSSFColor;
import org.apache.poi.xssf.usermodel.XSSFFont;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/**
 * The cell styles of the package. What was typed by the engineer is slanted, stands in a box of dashes and is not locked; a
 * cited number stands in a black box, all else in a grey one. Nothing rests on colour. No hatching: Gnumeric makes it black.
 */
final class Styles {
    /** The type of the body. */
    static final String FACE = "Arial";

    static final int POINTS = 10;

    /** The number format that shows a number as typed. */
    static final String AS_TYPED = "General";

    /**
     * Room behind a number, as wide as a bracket: LibreOffice forgets the indent of some. Not behind a number as typed,
     * which would no longer be cut to the width of its column.
     */
    private static final String ROOM = "_)";

    private static final byte[] HEAD_GREY = {(byte) 0xFF, (byte) 0xE6, (byte) 0xE6, (byte) 0xE6};

    /** What a cell is there for. */
    enum Role {
        SHEET_TITLE(14, true),
        FURNITURE(9, false),
        HEADING(12, true),
        NOTE(POINTS, false),
        CAUTION(POINTS, true),
        TABLE_TITLE(POINTS, true),
        HEAD(POINTS, true),
        TEXT(POINTS, false),
        STRONG(POINTS, true),
        LINK(POINTS, false),
        BACK(8, false),
        RESULT(POINTS, false),
        VERDICT(POINTS, true),
        ENTRY(POINTS, false),
        CONSTANT(POINTS, false);

        private final int points;
        private final boolean bold;

        Role(int points, boolean bold) {
            this.points = points;
            this.bold = bold;
        }

        int points() {
            return points;
        }

        boolean bold() {
            return bold;
        }
    }

    private record Look(Role role, Align align, String format, boolean wraps) {}

    private final XSSFWorkbook workbook;
    private final Map<Look, Integer> made = new HashMap<>();

    Styles(XSSFWorkbook workbook) {
        this.workbook = workbook;
        XSSFFont body = workbook.getFontAt(0);
        body.setScheme(FontScheme.NONE);
        body.setFontName(FACE);
        body.setFontHeightInPoints((short) POINTS);
    }

    /** The index of a style for texts, which are broken into lines. */
    int of(Role role, Align align) {
        return of(new Look(role, align, AS_TYPED, true));
    }

    /** The index of a style for numbers. */
    int of(Role role, Align align, String format) {
        return of(new Look(role, align, format, false));
    }

    private int of(Look look) {
        return made.computeIfAbsent(look, key -> (int) make(key).getIndex());
    }

    private XSSFCellStyle make(Look look) {
        Role role = look.role;
        XSSFCellStyle style = workbook.createCellStyle();
        XSSFFont font = font(workbook, role.points, role.bold);
        font.setItalic(role == Role.ENTRY);
        if (role == Role.LINK || role == Role.BACK) {
            font.setUnderline(Font.U_SINGLE);
        }
        style.setFont(font);
        style.setWrapText(look.wraps);
        style.setVerticalAlignment(VerticalAlignment.TOP);
        style.setAlignment(
                switch (look.align) {
                    case LEFT -> HorizontalAlignment.LEFT;
                    case CENTRE -> HorizontalAlignment.CENTER;
                    case RIGHT -> HorizontalAlignment.RIGHT;
                });
        if (look.format.equals(AS_TYPED)) {
            style.setIndention((short) (look.align == Align.RIGHT ? 1 : 0));
        } else {
            style.setDataFormat(workbook.createDataFormat().getFormat(look.format + ROOM));
        }
        switch (role) {
            case SHEET_TITLE, FURNITURE, HEADING, NOTE, CAUTION, TABLE_TITLE, BACK -> {}
            case HEAD -> {
                box(style, BorderStyle.THIN, IndexedColors.GREY_40_PERCENT);
                style.setFillPattern(FillPatternType.SOLID_FOREGROUND);
                style.setFillForegroundColor(new XSSFColor(HEAD_GREY, null));
            }
            case ENTRY -> {
                box(style, BorderStyle.DASHED, IndexedColors.BLACK);
                style.setLocked(false);
            }
            case CONSTANT -> box(style, BorderStyle.THIN, IndexedColors.BLACK);
            case TEXT, STRONG, LINK, RESULT, VERDICT -> box(style, BorderStyle.THIN, IndexedColors.GREY_40_PERCENT);
        }
        return style;
    }

    private static void box(XSSFCellStyle style, BorderStyle line, IndexedColors colour) {
        style.setBorderTop(line);
        style.setBorderBottom(line);
        style.setBorderLeft(line);
        style.setBorderRight(line);
        style.setTopBorderColor(colour.getIndex());
        style.setBottomBorderColor(colour.getIndex());
        style.setLeftBorderColor(colour.getIndex());
        style.setRightBorderColor(colour.getIndex());
    }

    static XSSFFont font(XSSFWorkbook workbook, int points, boolean bold) {
        XSSFFont font = workbook.createFont();
        font.setFontName(FACE);
        font.setFontHeightInPoints((short) points);
        font.setBold(bold);
        return font;
    }
}
