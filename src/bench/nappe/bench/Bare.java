package nappe.bench;

import com.lowagie.text.Document;
import com.lowagie.text.Rectangle;
import com.lowagie.text.pdf.BaseFont;
import com.lowagie.text.pdf.PdfContentByte;
import com.lowagie.text.pdf.PdfFileSpecification;
import com.lowagie.text.pdf.PdfWriter;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellStyle;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.ss.usermodel.Workbook;
import org.apache.poi.xssf.streaming.SXSSFWorkbook;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/**
 * The bare libraries writing what stands in a package: CONTENT, FOLDER, {@code xssf} or {@code sxssf}.
 *
 * <p>The workbook by POI as its documentation has it: the same sheets, the same number of styles, every cell with its
 * style, its formula and the value of it. The PDF by OpenPDF: as many pages, every word at its place in the typeface of
 * the package, embedded, with the workbook attached; no rules, figures, links or bookmarks. One after the other.
 */
final class Bare {
    private Bare() {}

    public static void main(String[] args) throws IOException {
        System.setProperty("log4j.provider", "org.apache.logging.log4j.simple.internal.SimpleProvider");
        System.setProperty("org.apache.logging.log4j.simplelog.level", "OFF");
        Clock clock = Clock.sinceProcessStart();
        clock.lap("JVM");
        Content content = Content.load(Path.of(args[0]));
        clock.lap("reading what to write");
        Path folder = Files.createDirectories(Path.of(args[1]));
        byte[] workbook = workbook(content, args[2].equals("sxssf"));
        Files.write(folder.resolve("bare.xlsx"), workbook);
        clock.lap("workbook");
        Files.write(folder.resolve("bare.pdf"), pdf(content, workbook));
        clock.lap("PDF");
        clock.print();
    }

    private static byte[] workbook(Content content, boolean streaming) throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (Workbook workbook = streaming ? new SXSSFWorkbook(200) : new XSSFWorkbook()) {
            List<CellStyle> styles = new ArrayList<>();
            for (int i = 0; i < content.styles(); i++) {
                CellStyle style = workbook.createCellStyle();
                style.setWrapText(i % 2 == 0);
                styles.add(style);
            }
            for (Content.Sheet one : content.sheets()) {
                Sheet sheet = workbook.createSheet(one.name());
                Row row = null;
                for (Content.Filled filled : one.cells()) {
                    if (row == null || row.getRowNum() != filled.row()) {
                        row = sheet.createRow(filled.row());
                    }
                    Cell cell = row.createCell(filled.column());
                    cell.setCellStyle(styles.get(filled.style()));
                    if (!filled.formula().isEmpty()) {
                        cell.setCellFormula(filled.formula());
                    }
                    if (filled.text() != null) {
                        cell.setCellValue(filled.text());
                    } else if (!filled.blank()) {
                        cell.setCellValue(filled.number());
                    }
                }
            }
            workbook.write(bytes);
        }
        return bytes.toByteArray();
    }

    private static byte[] pdf(Content content, byte[] workbook) throws IOException {
        BaseFont face;
        try (InputStream in = Bare.class.getResourceAsStream("/fonts/SourceSans3-Regular.ttf")) {
            face = BaseFont.createFont("a.ttf", BaseFont.IDENTITY_H, BaseFont.EMBEDDED, false, in.readAllBytes(), null);
        }
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        Document document = new Document();
        PdfWriter writer = PdfWriter.getInstance(document, bytes);
        boolean open = false;
        for (Content.Page page : content.pages()) {
            document.setPageSize(new Rectangle(page.width(), page.height()));
            if (open) {
                document.newPage();
            } else {
                document.open();
                open = true;
            }
            PdfContentByte canvas = writer.getDirectContent();
            canvas.beginText();
            for (Content.Word word : page.words()) {
                canvas.setFontAndSize(face, word.size());
                canvas.setTextMatrix(word.x(), word.y());
                canvas.showText(word.text());
            }
            canvas.endText();
        }
        writer.addFileAttachment("bare.xlsx", PdfFileSpecification.fileEmbedded(writer, "", "bare.xlsx", workbook));
        document.close();
        return bytes.toByteArray();
    }
}
