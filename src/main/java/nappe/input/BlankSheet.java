package nappe.input;

import java.util.List;
import nappe.formula.Sign;
import org.apache.poi.ss.usermodel.DataValidation.ErrorStyle;
import org.apache.poi.ss.usermodel.DataValidationConstraint;
import org.apache.poi.ss.usermodel.DataValidationConstraint.OperatorType;
import org.apache.poi.ss.usermodel.DataValidationConstraint.ValidationType;
import org.apache.poi.ss.usermodel.PageMargin;
import org.apache.poi.ss.usermodel.PrintSetup;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.ss.util.CellRangeAddressList;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.apache.poi.xssf.usermodel.XSSFDataValidation;
import org.apache.poi.xssf.usermodel.XSSFDataValidationHelper;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.jspecify.annotations.Nullable;

/** One sheet of a blank as it is written from the top down. */
final class BlankSheet {
    static final String CAUTION =
            "The engineer remains responsible for every entry and for what is made of the results; "
                    + "local codes and the authority in charge govern.";
    private static final double POINTS_PER_LINE = 13.5;
    private static final int LONGEST_PROMPT = 255;
    private static final int LONGEST_PROMPT_TITLE = 32;

    private final XSSFSheet sheet;
    private final BlankStyles styles;
    private final int[] widths;
    private int next;

    /**
     * Starts a sheet with its title.
     *
     * @param widths of its columns, in characters
     */
    BlankSheet(XSSFWorkbook workbook, BlankStyles styles, String name, String title, int... widths) {
        this.sheet = workbook.createSheet(name);
        this.styles = styles;
        this.widths = widths.clone();
        for (int i = 0; i < widths.length; i++) {
            sheet.setColumnWidth(i, widths[i] * 256);
        }
        XSSFRow row = row(20);
        cell(row, 0, styles.title, title);
    }

    /** Short lines of instruction, and the caution. */
    void lines(List<String> lines) {
        lines.forEach(line -> cell(row(POINTS_PER_LINE), 0, styles.line, line));
        cell(row(POINTS_PER_LINE), 0, styles.line, CAUTION);
        skip();
    }

    void skip() {
        row(POINTS_PER_LINE);
    }

    /** A line by itself. */
    void line(String text) {
        cell(row(POINTS_PER_LINE), 0, styles.line, text);
    }

    /** Words above the head row that tell what must be filled in. */
    void marks(List<String> marks) {
        XSSFRow row = row(POINTS_PER_LINE);
        for (int i = 0; i < marks.size(); i++) {
            cell(row, i, styles.mark, marks.get(i));
        }
    }

    /** The head row; it is repeated on each printed page and stays in view. */
    void head(List<String> heads, boolean stays) {
        XSSFRow row = row(height(heads));
        for (int i = 0; i < heads.size(); i++) {
            cell(row, i, styles.head, heads.get(i));
        }
        if (stays) {
            sheet.createFreezePane(0, next);
            sheet.setRepeatingRows(new CellRangeAddress(next - 1, next - 1, -1, -1));
        }
    }

    /** The next row, as high as its texts need; returns its number. */
    int line(List<String> texts, List<XSSFCellStyle> cellStyles) {
        XSSFRow row = row(height(texts));
        for (int i = 0; i < texts.size(); i++) {
            cell(row, i, cellStyles.get(i), texts.get(i));
        }
        return next - 1;
    }

    /** So many rows alike; returns the first. */
    int rows(int count, List<String> texts, List<XSSFCellStyle> cellStyles) {
        int first = next;
        for (int i = 0; i < count; i++) {
            line(texts, cellStyles);
        }
        return first;
    }

    /** Offers the words of a range; others are refused, or only remarked on. */
    void offer(int firstRow, int lastRow, int column, String range, boolean strict) {
        XSSFDataValidation validation =
                validation(helper().createFormulaListConstraint(range), firstRow, lastRow, column);
        validation.setSuppressDropDownArrow(true);
        validation.setErrorStyle(strict ? ErrorStyle.STOP : ErrorStyle.WARNING);
        validation.createErrorBox(
                "Not in the list",
                strict
                        ? "Choose one of the words offered."
                        : "This is not one of the words offered; it is checked when the workbook is read.");
        validation.setShowErrorBox(true);
        sheet.addValidationData(validation);
    }

    /** Takes only numbers of the sign. */
    void number(int firstRow, int lastRow, int column, Sign sign, String what, String prompt) {
        DataValidationConstraint constraint = switch (sign) {
            case POSITIVE -> decimal(OperatorType.GREATER_THAN, "0", null);
            case NOT_NEGATIVE -> decimal(OperatorType.GREATER_OR_EQUAL, "0", null);
            case ANY -> decimal(OperatorType.BETWEEN, "-1000000000000", "1000000000000");
        };
        XSSFDataValidation validation = validation(constraint, firstRow, lastRow, column);
        validation.setErrorStyle(ErrorStyle.STOP);
        validation.createErrorBox(
                "Not a number that fits", "Write a plain number, " + sign.words() + ", without its unit.");
        validation.setShowErrorBox(true);
        validation.createPromptBox(cut(what, LONGEST_PROMPT_TITLE), cut(prompt, LONGEST_PROMPT));
        validation.setShowPromptBox(true);
        sheet.addValidationData(validation);
    }

    /** Takes only whole numbers from one up. */
    void count(int firstRow, int lastRow, int column, int most, String what, String prompt) {
        XSSFDataValidation validation = validation(
                helper().createNumericConstraint(
                                ValidationType.INTEGER, OperatorType.BETWEEN, "1", Integer.toString(most)),
                firstRow,
                lastRow,
                column);
        validation.setErrorStyle(ErrorStyle.STOP);
        validation.createErrorBox("Not a count", "Write a whole number from 1 to " + most + ", or leave it blank.");
        validation.setShowErrorBox(true);
        validation.createPromptBox(cut(what, LONGEST_PROMPT_TITLE), cut(prompt, LONGEST_PROMPT));
        validation.setShowPromptBox(true);
        sheet.addValidationData(validation);
    }

    /** Protection without a password, print set-up. */
    void finish(boolean letter) {
        sheet.enableLocking();
        sheet.lockFormatCells(false);
        sheet.lockFormatColumns(false);
        sheet.lockFormatRows(false);
        sheet.lockSelectLockedCells(false);
        sheet.lockSelectUnlockedCells(false);
        sheet.setFitToPage(true);
        sheet.getPrintSetup().setFitWidth((short) 1);
        sheet.getPrintSetup().setFitHeight((short) 0);
        sheet.getPrintSetup().setLandscape(true);
        sheet.getPrintSetup().setPaperSize(letter ? PrintSetup.LETTER_PAPERSIZE : PrintSetup.A4_PAPERSIZE);
        for (PageMargin margin : List.of(PageMargin.LEFT, PageMargin.RIGHT, PageMargin.TOP, PageMargin.BOTTOM)) {
            sheet.setMargin(margin, 0.7);
        }
        sheet.getFooter().setLeft("Input workbook, sheet &A");
        sheet.getFooter().setRight("Page &P of &N");
    }

    private DataValidationConstraint decimal(int operator, String first, @Nullable String second) {
        return helper().createNumericConstraint(ValidationType.DECIMAL, operator, first, second);
    }

    private XSSFDataValidation validation(DataValidationConstraint constraint, int firstRow, int lastRow, int column) {
        return (XSSFDataValidation)
                helper().createValidation(constraint, new CellRangeAddressList(firstRow, lastRow, column, column));
    }

    private XSSFDataValidationHelper helper() {
        return new XSSFDataValidationHelper(sheet);
    }

    private static String cut(String text, int longest) {
        return text.length() <= longest ? text : text.substring(0, longest - 3) + "...";
    }

    private XSSFRow row(double points) {
        XSSFRow row = sheet.createRow(next++);
        row.setHeightInPoints((float) points);
        return row;
    }

    private static void cell(XSSFRow row, int column, XSSFCellStyle style, String text) {
        XSSFCell cell = row.createCell(column);
        cell.setCellStyle(style);
        if (!text.isEmpty()) {
            cell.setCellValue(text);
        }
    }

    private double height(List<String> texts) {
        int lines = 1;
        for (int i = 0; i < texts.size(); i++) {
            int width = Math.max(4, widths[Math.min(i, widths.length - 1)] - 1);
            lines = Math.max(lines, (texts.get(i).length() + width - 1) / width);
        }
        return lines * POINTS_PER_LINE + 2;
    }
}
