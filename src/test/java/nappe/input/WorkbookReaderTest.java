package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.Arrays;
import java.util.Random;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.apache.poi.hssf.usermodel.HSSFWorkbook;
import org.apache.poi.poifs.filesystem.POIFSFileSystem;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Every kind of file that is no sound input workbook is refused, in words that help. */
class WorkbookReaderTest {
    private static final String FLOWS = "xl/worksheets/sheet2.xml";
    private static final Duration LONGEST = Duration.ofSeconds(10);

    @TempDir
    Path folder;

    private String refusal(Path file) {
        Instant start = Instant.now();
        InputRefused refused = catchThrowableOfType(InputRefused.class, () -> InputReader.read(file, Samples.METHODS));
        assertThat(Duration.between(start, Instant.now())).isLessThan(LONGEST);
        assertThat(refused).as("refused").isNotNull();
        return refused.getMessage();
    }

    private String refusal(byte[] bytes) throws IOException {
        return refusal(Files.write(folder.resolve("in.xlsx"), bytes));
    }

    private String refusal(String text) throws IOException {
        return refusal(text.getBytes(StandardCharsets.UTF_8));
    }

    private String refusal(Zips zips) throws IOException {
        return refusal(zips.bytes());
    }

    @Test
    void missingFileIsRefused() {
        assertThat(refusal(folder.resolve("none.xlsx")))
                .isEqualTo("none.xlsx: there is no such file in " + folder + " (fault: file-missing)");
    }

    @Test
    void folderIsRefused() {
        assertThat(refusal(folder))
                .endsWith(": this is a folder; give the input workbook saved as .xlsx (fault: file-is-folder)");
    }

    @Test
    void emptyFileIsRefused() throws IOException {
        assertThat(refusal(""))
                .isEqualTo("in.xlsx: the file is empty; give the input workbook saved as .xlsx (fault: file-empty)");
    }

    @Test
    void plainTextIsRefused() throws IOException {
        assertThat(refusal("Case,Flow\nPeak,12.5\n"))
                .isEqualTo(
                        "in.xlsx: this is no .xlsx workbook (it looks like plain text); give the input workbook saved "
                                + "as .xlsx (fault: not-a-workbook)");
    }

    @Test
    void htmlPdfXmlAndNoiseAreTold() throws IOException {
        byte[] noise = new byte[5000];
        new Random(1).nextBytes(noise);
        assertThat(refusal("<html><table></table></html>")).contains("(it looks like HTML)");
        assertThat(refusal("%PDF-1.7\n%\u00E2")).contains("(it looks like a PDF)");
        assertThat(refusal("<?xml version='1.0'?><Workbook/>")).contains("(it looks like XML)");
        assertThat(refusal(noise)).contains("(what it is can't be told)");
    }

    @Test
    void olderBinaryKindIsRefused() throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (HSSFWorkbook workbook = new HSSFWorkbook()) {
            workbook.createSheet();
            workbook.write(out);
        }
        assertThat(refusal(out.toByteArray()))
                .isEqualTo("in.xlsx: this is an older binary kind of file, not .xlsx; open it and save it as .xlsx "
                        + "(fault: old-kind)");
    }

    @Test
    void encryptedWorkbookIsRefused() throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (POIFSFileSystem files = new POIFSFileSystem()) {
            files.createDocument(new java.io.ByteArrayInputStream(new byte[9000]), "EncryptedPackage");
            files.writeFilesystem(out);
        }
        assertThat(refusal(out.toByteArray()))
                .isEqualTo("in.xlsx: the workbook is locked with a password; save it without one (fault: encrypted)");
    }

    @Test
    void otherZipIsRefused() throws IOException {
        assertThat(refusal(new Zips().with("readme.txt", "x")))
                .isEqualTo("in.xlsx: this zip file is no workbook; give the input workbook saved as .xlsx "
                        + "(fault: not-a-workbook)");
        assertThat(refusal(new Zips())).contains("zip file with nothing in it");
    }

    @Test
    void openDocumentIsRefused() throws IOException {
        assertThat(refusal(new Zips().with("mimetype", "application/vnd.oasis.opendocument.spreadsheet")))
                .isEqualTo(
                        "in.xlsx: this is an OpenDocument file; open it and save it as .xlsx (fault: open-document)");
    }

    @Test
    void cutOffFileIsRefused() throws IOException {
        byte[] whole = Samples.blank();
        String said = "in.xlsx: the file is damaged or cut off; get it again from where it came from (fault: damaged)";
        assertThat(refusal(Arrays.copyOf(whole, whole.length / 2))).isEqualTo(said);
        assertThat(refusal(Arrays.copyOf(whole, whole.length - 10))).isEqualTo(said);
    }

    @Test
    void everyFlippedByteIsRefusedOrChangesNothing() throws IOException {
        byte[] whole = Samples.filled().bytes();
        var design = InputReader.read(Files.write(folder.resolve("in.xlsx"), whole), Samples.METHODS);
        Random random = new Random(7);
        for (int i = 0; i < 150; i++) {
            byte[] flipped = whole.clone();
            flipped[random.nextInt(flipped.length)] ^= (byte) (1 << random.nextInt(8));
            Path file = Files.write(folder.resolve("in.xlsx"), flipped);
            try {
                assertThat(InputReader.read(file, Samples.METHODS)).isEqualTo(design);
            } catch (InputRefused e) {
                assertThat(e.faults()).isNotEmpty();
            }
        }
    }

    @Test
    void wrongChecksumIsRefused() throws IOException {
        byte[] bytes = Samples.blank();
        int directory = lastIndexOf(bytes, "xl/styles.xml");
        bytes[directory - 46 + 16] ^= 1;
        assertThat(refusal(bytes))
                .isEqualTo("in.xlsx: the file is damaged: the checksum of its part xl/styles.xml does not agree "
                        + "(fault: damaged)");
    }

    private static int lastIndexOf(byte[] bytes, String text) {
        return new String(bytes, StandardCharsets.ISO_8859_1).lastIndexOf(text);
    }

    @Test
    void workbookThatCanHoldMacrosIsRefused() throws IOException {
        String said = "in.xlsx: the workbook can hold macros; save it as a plain .xlsx workbook (fault: macros)";
        assertThat(refusal(Zips.sound()
                        .change(
                                "[Content_Types].xml",
                                s -> s.replace(
                                        "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet.main+xml",
                                        "application/vnd.ms-excel.sheet.macroEnabled.main+xml"))))
                .isEqualTo(said);
        assertThat(refusal(Zips.sound().with("xl/vbaProject.bin", "x"))).isEqualTo(said);
    }

    @Test
    void templateIsRefused() throws IOException {
        assertThat(refusal(Zips.sound()
                        .change("[Content_Types].xml", s -> s.replace("sheet.main+xml", "template.main+xml"))))
                .isEqualTo(
                        "in.xlsx: this is a template; open it and save it as a plain .xlsx workbook (fault: template)");
    }

    @Test
    void strictVariantIsRefused() throws IOException {
        assertThat(refusal(Zips.sound()
                        .change(
                                "xl/workbook.xml",
                                s -> s.replace(Xml.MAIN, "http://purl.oclc.org/ooxml/spreadsheetml/main"))))
                .isEqualTo("in.xlsx: the workbook is saved in the strict variant of .xlsx; save it as a plain .xlsx "
                        + "workbook (fault: strict-variant)");
    }

    @Test
    void missingSheetPartIsRefused() throws IOException {
        assertThat(refusal(Zips.sound().without(FLOWS)))
                .isEqualTo("in.xlsx, sheet Flows: the file is damaged: the part with this sheet's cells is missing "
                        + "(fault: sheet-part-missing)");
    }

    @Test
    void linksToOtherWorkbooksAreRefused() throws IOException {
        String link = "<Relationship Id=\"rId99\" Target=\"externalLinks/externalLink1.xml\" Type=\""
                + "http://schemas.openxmlformats.org/officeDocument/2006/relationships/externalLink\"/></Relationships>";
        assertThat(refusal(Zips.sound().change("xl/_rels/workbook.xml.rels", s -> s.replace("</Relationships>", link))))
                .isEqualTo("in.xlsx: the workbook has links to other workbooks; replace them by their values and save "
                        + "it again (fault: external-links)");
    }

    @Test
    void damageInsideCellsIsRefusedAtEachOfThem() throws IOException {
        String row = "<row r=\"60\"><c r=\"D60\"><v>abc</v></c><c r=\"E60\" t=\"s\"><v>99999</v></c>"
                + "<c r=\"F60\" s=\"999\"><v>1</v></c><c r=\"F60\"><v>2</v></c><c r=\"ZZZZ60\"><v>1</v></c>"
                + "<c r=\"G61\"><v>1</v></c><c r=\"H60\" t=\"zz\"><v>1</v></c><c r=\"I60\"><v>NaN</v></c>"
                + "<c r=\"J60\"><v>0x1p3</v></c><c r=\"K60\"><v>1e999</v></c></row></sheetData>";
        assertThat(refusal(Zips.sound().change(FLOWS, s -> s.replace("</sheetData>", row))))
                .isEqualTo("""
                        in.xlsx, sheet Flows: the file is damaged: row 60 has a cell with the address "ZZZZ60" (fault: wild-address)
                        in.xlsx, sheet Flows: the file is damaged: row 60 has a cell with the address "G61" (fault: wild-address)
                        in.xlsx, sheet Flows, cell D60: the file is damaged: it has a number cell holding "abc"; type the number again (fault: damaged-number)
                        in.xlsx, sheet Flows, cell E60: the file is damaged: it has a text that does not exist (number 99999); type the text again (fault: text-unknown)
                        in.xlsx, sheet Flows, cell F60: the file is damaged: it has a style that does not exist (number 999) (fault: style-unknown)
                        in.xlsx, sheet Flows, cell F60: the file is damaged: this cell appears twice (fault: cell-twice)
                        in.xlsx, sheet Flows, cell H60: the file is damaged: it has a cell of the unknown kind "zz" (fault: cell-kind)
                        in.xlsx, sheet Flows, cell I60: the file is damaged: it has a number cell holding "NaN"; type the number again (fault: damaged-number)
                        in.xlsx, sheet Flows, cell J60: the file is damaged: it has a number cell holding "0x1p3"; type the number again (fault: damaged-number)
                        in.xlsx, sheet Flows, cell K60: the file is damaged: it has a number cell holding "1e999"; type the number again (fault: damaged-number)""");
    }

    @Test
    void oddOrDoublePartNamesAreRefused() throws IOException {
        assertThat(refusal(Zips.sound().with("../../evil.txt", "x")))
                .isEqualTo("in.xlsx: the file has a part with the odd name \"../../evil.txt\"; it was not made by a "
                        + "spreadsheet program (fault: odd-part)");
        assertThat(refusal(Zips.sound().with("xl/a\\b.xml", "x"))).contains("(fault: odd-part)");
        assertThat(refusal(Zips.sound().with("XL/Workbook.xml", "x")))
                .contains("two parts named")
                .contains("(fault: part-twice)");
    }

    @Test
    void documentTypeDeclarationIsRefused() throws IOException {
        String bomb = "<!DOCTYPE sst [<!ENTITY a \"aaaaaaaaaa\"><!ENTITY b \"&a;&a;&a;&a;&a;&a;&a;&a;&a;&a;\">]><sst";
        assertThat(refusal(Zips.sound().change("xl/sharedStrings.xml", s -> s.replaceFirst("<sst", bomb))))
                .isEqualTo(
                        "in.xlsx: the part xl/sharedStrings.xml has a document type declaration, which no spreadsheet "
                                + "program writes; the file is not read (fault: doctype)");
        assertThat(refusal(Zips.sound()
                        .change(
                                FLOWS,
                                s -> s.replaceFirst(
                                        "<worksheet", "<!DOCTYPE x SYSTEM \"file:///etc/passwd\"><worksheet"))))
                .contains("(fault: doctype)");
        assertThat(refusal(Zips.sound()
                        .change(
                                "_rels/.rels",
                                s -> s.replaceFirst(
                                        "<Relationships", "<!DOCTYPE x SYSTEM \"http://localhost/x\"><Relationships"))))
                .contains("(fault: doctype)");
    }

    @Test
    void brokenXmlIsRefused() throws IOException {
        assertThat(refusal(Zips.sound().change(FLOWS, s -> s.replace("</sheetData>", "</sheet>"))))
                .startsWith(
                        "in.xlsx: the file is damaged: its part xl/worksheets/sheet2.xml is not well-formed XML (line ")
                .endsWith("(fault: damaged)");
    }

    @Test
    void fileThatUnpacksToTooMuchIsRefused() throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream out = new ZipOutputStream(bytes)) {
            out.putNextEntry(new ZipEntry("xl/worksheets/sheet1.xml"));
            byte[] blanks = new byte[1_000_000];
            for (int i = 0; i < 300; i++) {
                out.write(blanks);
            }
        }
        assertThat(refusal(bytes.toByteArray()))
                .isEqualTo("in.xlsx: the file unpacks to more than 200 MB, the most that an input workbook may have "
                        + "(fault: too-large)");
    }

    @Test
    void endlessTextIsRefused() throws IOException {
        String run = "x".repeat(5_000_000);
        assertThat(refusal(Zips.sound()
                        .change("xl/sharedStrings.xml", s -> s.replace("</sst>", "<si><t>" + run + "</t></si></sst>"))))
                .contains("(fault: too-large)");
        assertThat(refusal(Zips.sound().change(FLOWS, s -> s.replace("<sheetData>", "<sheetData a=\"" + run + "\">"))))
                .contains("(fault: too-large)");
    }

    @Test
    void whatWouldPileUpInMemoryIsRefused() throws IOException {
        assertThat(refusal(Zips.sound()
                        .change(FLOWS, s -> s.replace("<sheetData>", "<!--" + "<".repeat(2_000_000) + "-->"))))
                .isEqualTo(
                        "in.xlsx: the part xl/worksheets/sheet2.xml holds a run of text without end (fault: too-large)");
        assertThat(refusal(Zips.sound()
                        .change(FLOWS, s -> s.replace("<sheetData>", "<sheetData>" + "<a>".repeat(1000)))))
                .isEqualTo(
                        "in.xlsx: the part xl/worksheets/sheet2.xml is nested more than 100 deep (fault: too-large)");
        String texts = "<row r=\"99\"><c t=\"inlineStr\"><is>" + "<t>xxxxxxxxx</t>".repeat(50_000)
                + "</is></c></row></sheetData>";
        assertThat(refusal(Zips.sound().change(FLOWS, s -> s.replace("</sheetData>", texts))))
                .contains("holds a text of more than 300000 characters (fault: too-large)");
        assertThat(refusal(Zips.sound()
                        .change("xl/styles.xml", s -> s.replace("<cellXfs", "<x/>".repeat(2_000_000) + "<cellXfs"))))
                .isEqualTo("in.xlsx: the part xl/styles.xml has more than 5 MB, the most that it may have in an input "
                        + "workbook (fault: too-large)");
    }

    @Test
    void commentsAndCharacterSectionsAreRead() throws IOException {
        Path file = Zips.sound()
                .change(
                        FLOWS,
                        s -> s.replace(
                                "<sheetData>",
                                "<!-- a > b --><sheetData>"
                                        + "<row r=\"900\"><c r=\"Z900\" t=\"inlineStr\"><is><t><![CDATA[a<b]]></t></is></c></row>"))
                .save(folder.resolve("in.xlsx"));
        RawSheet sheet =
                WorkbookReader.read(file, new Faults("in.xlsx")).sheets().get(1);
        assertThat(sheet.cell(899, 25)).extracting(RawCell::text).isEqualTo("a<b");
    }

    @Test
    void tooManyPartsCellsOrSheetsAreRefused() throws IOException {
        Zips parts = Zips.sound();
        for (int i = 0; i < 1000; i++) {
            parts.with("xl/media/" + i, "x");
        }
        assertThat(refusal(parts))
                .contains("more than the 1000 that an input workbook may have (fault: too-many-parts)");
        StringBuilder rows = new StringBuilder();
        for (int i = 1000; i < 51_000; i++) {
            rows.append("<row r=\"").append(i).append("\">");
            rows.append("<c><v>1</v></c>".repeat(4)).append("</row>");
        }
        assertThat(refusal(Zips.sound().change(FLOWS, s -> s.replace("</sheetData>", rows + "</sheetData>"))))
                .isEqualTo("in.xlsx: the workbook has more than 200000 filled cells, the most that an input workbook "
                        + "may have (fault: too-many-cells)");
    }

    @Test
    void aMillionFormattedRowsAreRefused() throws IOException {
        assertThat(refusal(Zips.sound().change(FLOWS, s -> formatted(s, 1_048_576))))
                .isEqualTo("in.xlsx: the sheet Flows has more than 100000 rows, filled or formatted, the most that an "
                        + "input workbook may have; delete the rows below the entries and save it again "
                        + "(fault: too-many-rows)");
    }

    @Test
    void manyFormattedRowsAreRead() throws IOException {
        Path file = Zips.sound().change(FLOWS, s -> formatted(s, 100_000)).save(folder.resolve("in.xlsx"));
        assertThat(InputReader.read(file, Samples.METHODS).cases()).hasSize(3);
    }

    private static String formatted(String sheet, int last) {
        StringBuilder rows = new StringBuilder();
        for (int i = 1000; i <= last; i++) {
            rows.append("<row r=\"").append(i).append("\"><c s=\"1\"/></row>");
        }
        return sheet.replace("</sheetData>", rows + "</sheetData>");
    }

    @Test
    void rowThatAppearsTwiceIsRefused() throws IOException {
        assertThat(refusal(Zips.sound()
                        .change(
                                FLOWS,
                                s -> s.replace(
                                        "</sheetData>", "<row r=\"9\"><c r=\"Z9\"><v>1</v></c></row></sheetData>"))))
                .isEqualTo("in.xlsx, sheet Flows, cell A9: the file is damaged: this row appears twice; get it again "
                        + "from where it came from (fault: row-twice)");
    }

    @Test
    void rowsAndCellsWithoutAddressesAndRichInlineTextsAreRead() throws IOException {
        Path file = new Zips()
                .with(
                        "[Content_Types].xml",
                        "<Types xmlns=\"x\"><Override PartName=\"/b/w.xml\" ContentType=\""
                                + "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet.main+xml\"/></Types>")
                .with(
                        "_rels/.rels",
                        "<Relationships><Relationship Id=\"r\" Type=\"http://x/officeDocument\" "
                                + "Target=\"/b/w.xml\"/></Relationships>")
                .with(
                        "b/_rels/w.xml.rels",
                        "<Relationships><Relationship Id=\"r\" Type=\"http://x/worksheet\" "
                                + "Target=\"../c/s.xml\"/></Relationships>")
                .with(
                        "b/w.xml",
                        "<workbook xmlns=\"" + Xml.MAIN + "\" xmlns:r=\"http://x/relationships\"><sheets>"
                                + "<sheet name=\"A\" state=\"hidden\" r:id=\"r\"/></sheets></workbook>")
                .with(
                        "c/s.xml",
                        "<worksheet xmlns=\"" + Xml.MAIN + "\"><sheetData><row/><row><c/><c t=\"inlineStr\"><is>"
                                + "<r><t>one </t></r><r><t>t_x0077_o</t></r><rPh><t>no</t></rPh></is></c><c t=\"b\"><v>1</v></c>"
                                + "<c><f>1+1</f></c></row></sheetData></worksheet>")
                .save(folder.resolve("in.xlsx"));
        RawSheet sheet =
                WorkbookReader.read(file, new Faults("in.xlsx")).sheets().get(0);
        assertThat(sheet.isHidden()).isTrue();
        assertThat(sheet.rows().get(1).values())
                .containsExactly(
                        new RawCell(1, 1, RawCell.Kind.TEXT, "one two", false, RawCell.Format.PLAIN),
                        new RawCell(1, 2, RawCell.Kind.BOOLEAN, "TRUE", false, RawCell.Format.PLAIN),
                        new RawCell(1, 3, RawCell.Kind.NO_VALUE, "", true, RawCell.Format.PLAIN));
    }
}
