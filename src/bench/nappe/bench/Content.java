package nappe.bench;

import java.io.BufferedInputStream;
import java.io.BufferedOutputStream;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** What stands in a package: each cell with its style, formula and value; each word with its place on its page. */
record Content(int styles, List<Sheet> sheets, List<Page> pages) {
    record Sheet(String name, List<Filled> cells) {}

    /** @param formula empty where there is none; @param text null where the value is a number or blank */
    record Filled(int row, int column, int style, String formula, String text, double number, boolean blank) {}

    record Page(float width, float height, List<Word> words) {}

    /** @param y of the line of writing, from the foot of the page, in points */
    record Word(float x, float y, float size, String text) {}

    int cells() {
        return sheets.stream().mapToInt(sheet -> sheet.cells().size()).sum();
    }

    long formulas() {
        return sheets.stream()
                .flatMap(sheet -> sheet.cells().stream())
                .filter(cell -> !cell.formula().isEmpty())
                .count();
    }

    int words() {
        return pages.stream().mapToInt(page -> page.words().size()).sum();
    }

    /** Reads an issued package: the workbook by POI, the words of the PDF by pdftotext. */
    static Content of(Path workbook, Path pdf) throws IOException, InterruptedException {
        List<Sheet> sheets = new ArrayList<>();
        int styles;
        try (XSSFWorkbook read = new XSSFWorkbook(Files.newInputStream(workbook))) {
            styles = read.getNumCellStyles();
            for (int i = 0; i < read.getNumberOfSheets(); i++) {
                XSSFSheet sheet = read.getSheetAt(i);
                List<Filled> cells = new ArrayList<>();
                for (Row row : sheet) {
                    for (Cell cell : row) {
                        cells.add(filled(cell));
                    }
                }
                sheets.add(new Sheet(sheet.getSheetName(), cells));
            }
        }
        return new Content(styles, sheets, pages(pdf));
    }

    private static Filled filled(Cell cell) {
        boolean live = cell.getCellType() == CellType.FORMULA;
        CellType kind = live ? cell.getCachedFormulaResultType() : cell.getCellType();
        return new Filled(
                cell.getRowIndex(),
                cell.getColumnIndex(),
                cell.getCellStyle().getIndex(),
                live ? cell.getCellFormula() : "",
                kind == CellType.STRING ? cell.getStringCellValue() : null,
                kind == CellType.NUMERIC ? cell.getNumericCellValue() : 0,
                kind == CellType.BLANK);
    }

    private static final Pattern PAGE = Pattern.compile("<page width=\"([0-9.]+)\" height=\"([0-9.]+)\">");
    private static final Pattern WORD = Pattern.compile(
            "<word xMin=\"([0-9.-]+)\" yMin=\"([0-9.-]+)\" xMax=\"[0-9.-]+\" yMax=\"([0-9.-]+)\">(.*)</word>");

    private static List<Page> pages(Path pdf) throws IOException, InterruptedException {
        Path boxes = Files.createTempFile("words", ".html");
        int status = new ProcessBuilder("pdftotext", "-bbox", pdf.toString(), boxes.toString()).inheritIO().start().waitFor();
        if (status != 0) {
            throw new IOException("pdftotext ended with " + status);
        }
        List<Page> pages = new ArrayList<>();
        for (String line : Files.readAllLines(boxes)) {
            Matcher page = PAGE.matcher(line);
            Matcher word = WORD.matcher(line);
            if (page.find()) {
                pages.add(new Page(Float.parseFloat(page.group(1)), Float.parseFloat(page.group(2)), new ArrayList<>()));
            } else if (word.find()) {
                Page on = pages.get(pages.size() - 1);
                float size = (Float.parseFloat(word.group(3)) - Float.parseFloat(word.group(2))) * 0.75f;
                String text = word.group(4).replace("&lt;", "<").replace("&gt;", ">").replace("&quot;", "\"").replace("&amp;", "&");
                on.words().add(new Word(Float.parseFloat(word.group(1)), on.height() - Float.parseFloat(word.group(3)) + size / 4, size, text));
            }
        }
        Files.delete(boxes);
        return pages;
    }

    void save(Path file) throws IOException {
        try (DataOutputStream out = new DataOutputStream(new BufferedOutputStream(Files.newOutputStream(file)))) {
            out.writeInt(styles);
            out.writeInt(sheets.size());
            for (Sheet sheet : sheets) {
                out.writeUTF(sheet.name());
                out.writeInt(sheet.cells().size());
                for (Filled cell : sheet.cells()) {
                    out.writeInt(cell.row());
                    out.writeInt(cell.column());
                    out.writeInt(cell.style());
                    out.writeUTF(cell.formula());
                    out.writeBoolean(cell.text() != null);
                    out.writeUTF(cell.text() == null ? "" : cell.text());
                    out.writeDouble(cell.number());
                    out.writeBoolean(cell.blank());
                }
            }
            out.writeInt(pages.size());
            for (Page page : pages) {
                out.writeFloat(page.width());
                out.writeFloat(page.height());
                out.writeInt(page.words().size());
                for (Word word : page.words()) {
                    out.writeFloat(word.x());
                    out.writeFloat(word.y());
                    out.writeFloat(word.size());
                    out.writeUTF(word.text());
                }
            }
        }
    }

    static Content load(Path file) throws IOException {
        try (DataInputStream in = new DataInputStream(new BufferedInputStream(Files.newInputStream(file)))) {
            int styles = in.readInt();
            List<Sheet> sheets = new ArrayList<>();
            for (int s = in.readInt(); s > 0; s--) {
                Sheet sheet = new Sheet(in.readUTF(), new ArrayList<>());
                for (int c = in.readInt(); c > 0; c--) {
                    int row = in.readInt();
                    int column = in.readInt();
                    int style = in.readInt();
                    String formula = in.readUTF();
                    boolean words = in.readBoolean();
                    String text = in.readUTF();
                    sheet.cells().add(new Filled(row, column, style, formula, words ? text : null, in.readDouble(), in.readBoolean()));
                }
                sheets.add(sheet);
            }
            List<Page> pages = new ArrayList<>();
            for (int p = in.readInt(); p > 0; p--) {
                Page page = new Page(in.readFloat(), in.readFloat(), new ArrayList<>());
                for (int w = in.readInt(); w > 0; w--) {
                    page.words().add(new Word(in.readFloat(), in.readFloat(), in.readFloat(), in.readUTF()));
                }
                pages.add(page);
            }
            return new Content(styles, sheets, pages);
        }
    }
}
