package nappe.bench;

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
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.usermodel.XSSFName;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/**
 * What stands in a package: each cell with its style, formula and value, links, names and the sizes of rows and columns;
 * each word with its place on its page, each rule and line of a drawing, links and bookmarks.
 */
record Content(int styles, List<Sheet> sheets, List<Name> names, List<Page> pages, List<String> bookmarks) {
    /**
     * @param merged such as {@code A1:H1}
     * @param widths of the columns, in 256ths of a character
     * @param heights by row, in points; 0 for a row as high as others
     */
    record Sheet(
            String name,
            List<Filled> cells,
            List<Link> links,
            List<String> merged,
            List<Integer> widths,
            List<Float> heights) {}

    record Link(int row, int column, String target) {}

    record Name(String name, String target) {}

    /** @param formula empty where there is none; @param text null where the value is a number or blank */
    record Filled(int row, int column, int style, String formula, String text, double number, boolean blank) {}

    /**
     * @param marks what is drawn, as operators of the page with their numbers
     * @param links rectangles: left, bottom, right, top
     */
    record Page(float width, float height, List<Word> words, List<Mark> marks, List<float[]> links) {}

    record Mark(String operator, float[] numbers) {}

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

    int links() {
        return sheets.stream().mapToInt(sheet -> sheet.links().size()).sum()
                + pages.stream().mapToInt(page -> page.links().size()).sum();
    }

    int marks() {
        return pages.stream().mapToInt(page -> page.marks().size()).sum();
    }

    int words() {
        return pages.stream().mapToInt(page -> page.words().size()).sum();
    }

    /** Reads an issued package: the workbook by POI, the PDF by OpenPDF and its words by pdftotext. */
    static Content of(Path workbook, Path pdf) throws IOException, InterruptedException {
        List<Sheet> sheets = new ArrayList<>();
        List<Name> names = new ArrayList<>();
        int styles;
        try (XSSFWorkbook read = new XSSFWorkbook(Files.newInputStream(workbook))) {
            styles = read.getNumCellStyles();
            for (int i = 0; i < read.getNumberOfSheets(); i++) {
                sheets.add(sheet(read.getSheetAt(i)));
            }
            for (XSSFName name : read.getAllNames()) {
                if (!name.getNameName().startsWith("_xlnm")) {
                    names.add(new Name(name.getNameName(), name.getRefersToFormula()));
                }
            }
        }
        List<Page> pages = pages(pdf);
        return new Content(styles, sheets, names, pages, Drawn.onto(pages, pdf));
    }

    private static Sheet sheet(XSSFSheet sheet) {
        List<Filled> cells = new ArrayList<>();
        List<Float> heights = new ArrayList<>();
        for (Row row : sheet) {
            while (heights.size() < row.getRowNum()) {
                heights.add(0f);
            }
            heights.add(((XSSFRow) row).getCTRow().isSetHt() ? row.getHeightInPoints() : 0f);
            for (Cell cell : row) {
                cells.add(filled(cell));
            }
        }
        List<Link> links = sheet.getHyperlinkList().stream()
                .map(link -> new Link(link.getFirstRow(), link.getFirstColumn(), link.getLocation()))
                .toList();
        List<String> merged = sheet.getMergedRegions().stream()
                .map(CellRangeAddress::formatAsString)
                .toList();
        List<Integer> widths = new ArrayList<>();
        for (int column = 0; column < 20; column++) {
            widths.add(sheet.getColumnWidth(column));
        }
        return new Sheet(sheet.getSheetName(), cells, links, merged, widths, heights);
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
                pages.add(new Page(Float.parseFloat(page.group(1)), Float.parseFloat(page.group(2)), new ArrayList<>(), new ArrayList<>(), new ArrayList<>()));
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
}
