package nappe.deliver.xlsx;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Map;
import nappe.calculation.Place;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** Types other numbers into a workbook that Nappe wrote, as an engineer would, and leaves all else to recalculation. */
public final class Retyper {
    private Retyper() {}

    /**
     * The workbook with other numbers typed; what its formula cells store is out of date.
     *
     * @throws IllegalArgumentException where nobody could type, since the cell is locked
     */
    public static byte[] type(byte[] workbook, Map<Place, Double> numbers) {
        try (XSSFWorkbook book = new XSSFWorkbook(new ByteArrayInputStream(workbook))) {
            numbers.forEach((place, number) -> {
                XSSFCell cell = book.getSheet(place.sheet()).getRow(place.row()).getCell(place.column());
                if (cell.getCellStyle().getLocked()) {
                    throw new IllegalArgumentException(place.full() + " is locked");
                }
                cell.setCellValue(number);
            });
            ByteArrayOutputStream bytes = new ByteArrayOutputStream();
            book.write(bytes);
            return bytes.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
