package nappe.input;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.poi.ss.util.CellAddress;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFClientAnchor;
import org.apache.poi.xssf.usermodel.XSSFComment;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** Writes a copy of a refused input workbook with a note on each faulty cell. */
public final class MarkedCopy {
    private static final String AUTHOR = "Nappe";
    private static final int COLUMNS = 3;
    private static final int CHARACTERS_PER_LINE = 34;

    private MarkedCopy() {}

    /**
     * Writes the copy; the input itself is only read.
     *
     * @param copy a file that is not there yet
     * @return how many cells were marked; none, and no copy, where no fault has a cell in a sheet of the file
     */
    public static int write(Path input, Path copy, List<Fault> faults) throws IOException {
        BlankWriter.quietLogging();
        Map<Fault, String> texts = new LinkedHashMap<>();
        for (Fault fault : faults) {
            if (fault.sheet() != null && fault.cell() != null) {
                Fault place = new Fault(fault.file(), fault.sheet(), fault.cell(), "", "");
                texts.merge(place, text(fault), (a, b) -> a + "\n" + b);
            }
        }
        if (texts.isEmpty()) {
            return 0;
        }
        try (InputStream in = Files.newInputStream(input);
                XSSFWorkbook workbook = new XSSFWorkbook(in)) {
            int marked = 0;
            for (Map.Entry<Fault, String> entry : texts.entrySet()) {
                XSSFSheet sheet = workbook.getSheet(entry.getKey().sheet());
                if (sheet != null) {
                    mark(sheet, new CellAddress(entry.getKey().cell()), entry.getValue());
                    marked++;
                }
            }
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            workbook.write(out);
            Files.write(copy, FixedZip.of(out.toByteArray()), StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE);
            return marked;
        }
    }

    private static String text(Fault fault) {
        return fault.message() + " (fault: " + fault.code() + ")";
    }

    private static void mark(XSSFSheet sheet, CellAddress at, String text) {
        XSSFRow row = sheet.getRow(at.getRow()) == null ? sheet.createRow(at.getRow()) : sheet.getRow(at.getRow());
        XSSFCell cell =
                row.getCell(at.getColumn()) == null ? row.createCell(at.getColumn()) : row.getCell(at.getColumn());
        XSSFComment note = cell.getCellComment();
        if (note != null) {
            String before = note.getString() == null ? "" : note.getString().getString();
            note.setString(before + "\n" + text);
            return;
        }
        int lines = 2 + text.length() / CHARACTERS_PER_LINE;
        XSSFClientAnchor anchor = new XSSFClientAnchor(
                0, 0, 0, 0, at.getColumn() + 1, at.getRow(), at.getColumn() + 1 + COLUMNS, at.getRow() + lines);
        note = sheet.createDrawingPatriarch().createCellComment(anchor);
        note.setAuthor(AUTHOR);
        note.setString(text);
        cell.setCellComment(note);
    }
}
