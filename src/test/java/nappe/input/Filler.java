package nappe.input;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Consumer;
import org.apache.poi.ss.usermodel.CellStyle;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** Fills in a blank by head words and labels, as an engineer would by hand. */
public final class Filler {
    private final XSSFWorkbook workbook;

    public Filler(byte[] blank) throws IOException {
        workbook = new XSSFWorkbook(new ByteArrayInputStream(blank));
    }

    /** The value of a label of the sheet Project. */
    public Filler project(String label, String value) {
        XSSFSheet sheet = workbook.getSheet("Project");
        return put(cell(sheet, rowOf(sheet, 0, label), 1), value);
    }

    /** An entry of an element: value, unit, source, standing; null leaves what is there. */
    public Filler entry(String tag, String symbol, Object value, String unit, String source, String standing) {
        XSSFSheet sheet = workbook.getSheet(tag);
        int row = rowOf(sheet, 0, symbol);
        put(cell(sheet, row, 2), value);
        put(cell(sheet, row, 3), unit);
        put(cell(sheet, row, 4), source);
        return put(cell(sheet, row, 5), standing);
    }

    /** The next free row of a list, by its columns from the left; null leaves what is there. */
    public Filler row(String name, Object... values) {
        XSSFSheet sheet = workbook.getSheet(name);
        int row = rowOf(sheet, 0, heads(name).get(0)) + 1;
        while (isFilled(cell(sheet, row, 0))) {
            row++;
        }
        for (int i = 0; i < values.length; i++) {
            put(cell(sheet, row, i), values[i]);
        }
        return this;
    }

    /** The cell at an address, made if need be. */
    public XSSFCell cell(String sheet, String address) {
        org.apache.poi.ss.util.CellReference reference = new org.apache.poi.ss.util.CellReference(address);
        return cell(workbook.getSheet(sheet), reference.getRow(), reference.getCol());
    }

    public Filler set(String sheet, String address, Object value) {
        return put(cell(sheet, address), value);
    }

    public Filler change(Consumer<XSSFWorkbook> change) {
        change.accept(workbook);
        return this;
    }

    /** Shows the number of a cell by a format of one's own. */
    public Filler format(String sheet, String address, String format) {
        CellStyle style = workbook.createCellStyle();
        style.cloneStyleFrom(cell(sheet, address).getCellStyle());
        style.setDataFormat(workbook.createDataFormat().getFormat(format));
        cell(sheet, address).setCellStyle(style);
        return this;
    }

    public byte[] bytes() throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        workbook.write(out);
        return FixedZip.of(out.toByteArray());
    }

    public Path save(Path file) throws IOException {
        return Files.write(file, bytes());
    }

    private static List<String> heads(String sheet) {
        return switch (sheet) {
            case "Flows" -> Layout.FLOW_HEADS;
            case "Demands" -> Layout.DEMAND_HEADS;
            case "Tailwater curve" -> Layout.LEVEL_HEADS;
            case "Combinations" -> Layout.COMBINATION_HEADS;
            case "Assumptions" -> Layout.ASSUMPTION_HEADS;
            case "References" -> Layout.REFERENCE_HEADS;
            case "Requirements" -> Layout.REQUIREMENT_HEADS;
            default -> Layout.REVISION_HEADS;
        };
    }

    private Filler put(XSSFCell cell, Object value) {
        if (value instanceof Number number) {
            cell.setCellValue(number.doubleValue());
        } else if (value != null) {
            cell.setCellValue(value.toString());
        }
        return this;
    }

    private static XSSFCell cell(XSSFSheet sheet, int row, int column) {
        XSSFRow there = sheet.getRow(row) == null ? sheet.createRow(row) : sheet.getRow(row);
        return there.getCell(column) == null ? there.createCell(column) : there.getCell(column);
    }

    private static String text(XSSFSheet sheet, int row, int column) {
        XSSFCell cell = cell(sheet, row, column);
        return cell.getCellType() == org.apache.poi.ss.usermodel.CellType.STRING ? cell.getStringCellValue() : "";
    }

    private static boolean isFilled(XSSFCell cell) {
        return cell.getCellType() != org.apache.poi.ss.usermodel.CellType.BLANK
                && !cell.toString().isEmpty();
    }

    private static int rowOf(XSSFSheet sheet, int column, String text) {
        for (int row = sheet.getLastRowNum(); row >= 0; row--) {
            if (sheet.getRow(row) != null && text(sheet, row, column).equals(text)) {
                return row;
            }
        }
        throw new IllegalArgumentException(sheet.getSheetName() + " has no row " + text);
    }
}
