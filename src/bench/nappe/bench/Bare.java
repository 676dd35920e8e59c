package nappe.bench;

import com.lowagie.text.Document;
import com.lowagie.text.Rectangle;
import com.lowagie.text.pdf.BaseFont;
import com.lowagie.text.pdf.PdfAnnotation;
import com.lowagie.text.pdf.PdfContentByte;
import com.lowagie.text.pdf.PdfDestination;
import com.lowagie.text.pdf.PdfFileSpecification;
import com.lowagie.text.pdf.PdfOutline;
import com.lowagie.text.pdf.PdfWriter;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.common.usermodel.HyperlinkType;
import org.apache.poi.ss.usermodel.CellStyle;
import org.apache.poi.ss.usermodel.Hyperlink;
import org.apache.poi.ss.usermodel.Name;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.ss.usermodel.Workbook;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.streaming.SXSSFWorkbook;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/**
 * The bare libraries writing what stands in a package: CONTENT, FOLDER, {@code xssf} or {@code sxssf}.
 *
 * <p>The workbook by POI as its documentation has it: the same sheets, the same number of styles, every cell with its
 * style, its formula and the value of it; links, names, merged cells, widths and heights. No chart, lists to choose from
 * or page set-up. The PDF by OpenPDF: as many pages, every word at its place in one typeface of the package, embedded,
 * every rule and stroke of a figure, links and bookmarks, with the workbook attached. One after the other.
 */
final class Bare {
    private Bare() {}

    public static void main(String[] args) throws IOException {
        System.setProperty("log4j.provider", "org.apache.logging.log4j.simple.internal.SimpleProvider");
        System.setProperty("org.apache.logging.log4j.simplelog.level", "OFF");
        Clock clock = Clock.sinceProcessStart();
        clock.lap("JVM");
        Content content = ContentFile.load(Path.of(args[0]));
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
                Map<List<Integer>, Content.Link> links = new HashMap<>();
                one.links().forEach(link -> links.put(List.of(link.row(), link.column()), link));
                one.merged().forEach(range -> sheet.addMergedRegion(CellRangeAddress.valueOf(range)));
                for (int column = 0; column < one.widths().size(); column++) {
                    sheet.setColumnWidth(column, one.widths().get(column));
                }
                Row row = null;
                for (Content.Filled filled : one.cells()) {
                    if (row == null || row.getRowNum() != filled.row()) {
                        row = sheet.createRow(filled.row());
                        float height = one.heights().get(filled.row());
                        if (height > 0) {
                            row.setHeightInPoints(height);
                        }
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
                    Content.Link link = links.get(List.of(filled.row(), filled.column()));
                    if (link != null) {
                        Hyperlink made = workbook.getCreationHelper().createHyperlink(HyperlinkType.DOCUMENT);
                        made.setAddress(link.target());
                        cell.setHyperlink(made);
                    }
                }
            }
            for (Content.Name one : content.names()) {
                Name name = workbook.createName();
                name.setNameName(one.name());
                name.setRefersToFormula(one.target());
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
            page.marks().forEach(mark -> draw(canvas, mark.operator(), mark.numbers()));
            for (float[] at : page.links()) {
                Rectangle place = new Rectangle(at[0], at[1], at[2], at[3]);
                PdfDestination top = new PdfDestination(PdfDestination.FIT);
                writer.addAnnotation(
                        PdfAnnotation.createLink(writer, place, PdfAnnotation.HIGHLIGHT_NONE, 1, top));
            }
        }
        for (String title : content.bookmarks()) {
            new PdfOutline(writer.getRootOutline(), new PdfDestination(PdfDestination.FIT), title);
        }
        writer.addFileAttachment("bare.xlsx", PdfFileSpecification.fileEmbedded(writer, "", "bare.xlsx", workbook));
        document.close();
        return bytes.toByteArray();
    }

    private static void draw(PdfContentByte canvas, String operator, float[] n) {
        switch (operator) {
            case "m" -> canvas.moveTo(n[0], n[1]);
            case "l" -> canvas.lineTo(n[0], n[1]);
            case "c" -> canvas.curveTo(n[0], n[1], n[2], n[3], n[4], n[5]);
            case "re" -> canvas.rectangle(n[0], n[1], n[2], n[3]);
            case "h" -> canvas.closePath();
            case "S" -> canvas.stroke();
            case "f" -> canvas.fill();
            case "B" -> canvas.fillStroke();
            case "n" -> canvas.newPath();
            case "W" -> canvas.clip();
            case "w" -> canvas.setLineWidth(n[0]);
            case "g" -> canvas.setGrayFill(n[0]);
            case "G" -> canvas.setGrayStroke(n[0]);
            case "rg" -> canvas.setRGBColorFillF(n[0], n[1], n[2]);
            case "RG" -> canvas.setRGBColorStrokeF(n[0], n[1], n[2]);
            case "q" -> canvas.saveState();
            case "Q" -> canvas.restoreState();
            case "cm" -> canvas.concatCTM(n[0], n[1], n[2], n[3], n[4], n[5]);
            default -> {}
        }
    }
}
