package nappe.input;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.apache.poi.ss.util.CellAddress;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFClientAnchor;
import org.apache.poi.xssf.usermodel.XSSFComment;
import org.apache.poi.xssf.usermodel.XSSFRichTextString;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.jspecify.annotations.Nullable;

/** Writes a copy of a refused input workbook with a note on each faulty cell and a sheet that lists all faults. */
public final class MarkedCopy {
    /** The library that copies needs some twenty times as much memory. */
    static final long MOST_BYTES = 12_000_000;

    /** Faults of a whole file that can be opened all the same. One with links to other files is not copied. */
    private static final Set<String> OPENED = Set.of("too-many-faults");

    /** Damage that the library would mend in silence, so that the copy would not be what was sent. */
    private static final Set<String> MENDED =
            Set.of("wild-address", "row-twice", "cell-twice", "sheet-twice", "sheet-part-missing", "style-unknown");

    private static final String AUTHOR = "Nappe";
    private static final int COLUMNS = 3;
    private static final int LAST_COLUMN = 16_383;
    private static final int LAST_ROW = 1_048_575;
    private static final int CHARACTERS_PER_LINE = 34;

    private MarkedCopy() {}

    /**
     * What came of it.
     *
     * @param cells how many cells were marked
     * @param sheet the one that lists the faults
     * @param why there is no copy; null where there is one
     */
    public record Outcome(int cells, String sheet, @Nullable String why) {
        private static Outcome none(String why) {
            return new Outcome(0, "", why);
        }

        /** Whether there is a copy. */
        public boolean written() {
            return why == null;
        }
    }

    /**
     * Writes the copy, whole or not at all; the input itself is only read.
     *
     * @param copy a file that is not there yet
     * @return no copy for a file that cannot be opened, that may do harm, that is oversized or damaged
     */
    public static Outcome write(Path input, Path copy, List<Fault> faults) throws IOException {
        for (Fault fault : faults) {
            if (fault.sheet() == null && !OPENED.contains(fault.code())) {
                return Outcome.none("the file as a whole is not one that can be copied");
            }
            if (MENDED.contains(fault.code())) {
                return Outcome.none("the file is damaged, and a copy would not be what it was");
            }
        }
        if (unpacked(input) > MOST_BYTES) {
            return Outcome.none(
                    "the file unpacks to more than " + MOST_BYTES / 1_000_000 + " MB, the most that is copied");
        }
        BlankWriter.quietLogging();
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        Outcome outcome;
        try (InputStream in = Files.newInputStream(input);
                XSSFWorkbook workbook = new XSSFWorkbook(in)) {
            outcome = new Outcome(mark(workbook, faults), FaultList.add(workbook, faults), null);
            workbook.write(out);
        } catch (RuntimeException e) {
            // The library reads parts that a calculation has no need of, and throws what it likes where they are odd.
            return Outcome.none("a part of the file that is not read for the calculation is damaged");
        }
        NewFile.write(copy, FixedZip.of(out.toByteArray()));
        return outcome;
    }

    private static long unpacked(Path input) {
        try (Parts parts = Parts.open(input, new Faults(""))) {
            return parts.size();
        } catch (InputRefused e) {
            return Long.MAX_VALUE;
        }
    }

    private static int mark(XSSFWorkbook workbook, List<Fault> faults) {
        Map<Fault, String> texts = new LinkedHashMap<>();
        for (Fault fault : faults) {
            if (fault.sheet() != null && fault.cell() != null) {
                Fault place = new Fault(fault.file(), fault.sheet(), fault.cell(), "", "");
                texts.merge(place, text(fault), (a, b) -> a + "\n" + b);
            }
        }
        int marked = 0;
        for (Map.Entry<Fault, String> entry : texts.entrySet()) {
            XSSFSheet sheet = workbook.getSheet(entry.getKey().sheet());
            if (sheet != null) {
                mark(sheet, new CellAddress(entry.getKey().cell()), entry.getValue());
                marked++;
            }
        }
        return marked;
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
            XSSFRichTextString before = note.getString() == null ? new XSSFRichTextString("") : note.getString();
            before.append("\n" + text);
            note.setString(before);
            return;
        }
        int lines = 2 + text.length() / CHARACTERS_PER_LINE;
        XSSFClientAnchor anchor = new XSSFClientAnchor(
                0,
                0,
                0,
                0,
                Math.min(at.getColumn() + 1, LAST_COLUMN),
                at.getRow(),
                Math.min(at.getColumn() + 1 + COLUMNS, LAST_COLUMN),
                Math.min(at.getRow() + lines, LAST_ROW));
        note = sheet.createDrawingPatriarch().createCellComment(anchor);
        note.setAuthor(AUTHOR);
        note.setString(text);
        cell.setCellComment(note);
    }
}
