package nappe.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Random;
import java.util.function.Consumer;
import java.util.zip.Deflater;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import nappe.input.SampleStations;
import nappe.input.Zips;
import org.apache.poi.hssf.usermodel.HSSFWorkbook;
import org.apache.poi.poifs.filesystem.POIFSFileSystem;
import org.apache.poi.ss.usermodel.SheetVisibility;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** Files that are no sound input workbook, made from a sound one; each by the fault that it must be refused for. */
final class HostileFiles {
    private static final String FLOWS = "xl/worksheets/sheet2.xml";
    private static final String TYPES = "[Content_Types].xml";
    private static final String RELATIONS = "xl/_rels/workbook.xml.rels";
    private static final String PLAIN = "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet.main+xml";
    private static final String BOMB =
            "<!DOCTYPE x [<!ENTITY a \"aaaaaaaaaaaaaaaa\"><!ENTITY b \"&a;&a;&a;&a;&a;&a;&a;&a;\"><!ENTITY c"
                    + " \"&b;&b;&b;&b;&b;&b;&b;&b;\"><!ENTITY d \"&c;&c;&c;&c;&c;&c;&c;&c;\"><!ENTITY e"
                    + " \"&d;&d;&d;&d;&d;&d;&d;&d;\"><!ENTITY f \"&e;&e;&e;&e;&e;&e;&e;&e;\">]>";

    private final Path folder;
    private final byte[] sound;
    private final Map<Path, String> faults = new LinkedHashMap<>();

    private HostileFiles(Path folder) throws IOException {
        this.folder = folder;
        this.sound = SampleStations.weir().bytes();
    }

    /** The files that weigh little, and the code of the fault of each. */
    static Map<Path, String> light(Path folder) throws IOException {
        HostileFiles files = new HostileFiles(folder);
        files.noWorkbooks();
        files.otherKinds();
        files.damagedFiles();
        files.damagedParts();
        files.damagedCells();
        files.unseen();
        return files.faults;
    }

    /** The files that would fill the memory or the time of a reader that trusts them. */
    static Map<Path, String> heavy(Path folder) throws IOException {
        HostileFiles files = new HostileFiles(folder);
        files.oversized();
        return files.faults;
    }

    private void add(String name, String fault, byte[] bytes) throws IOException {
        faults.put(Files.write(folder.resolve(name), bytes), fault);
    }

    private void add(String name, String fault, String text) throws IOException {
        add(name, fault, text.getBytes(StandardCharsets.UTF_8));
    }

    private Zips zips() throws IOException {
        return Zips.of(sound);
    }

    private void changed(String name, String fault, String part, String from, String to) throws IOException {
        add(name, fault, zips().change(part, s -> s.replace(from, to)).bytes());
    }

    private void flows(String name, String fault, String from, String to) throws IOException {
        changed(name, fault, FLOWS, from, to);
    }

    private void edited(String name, String fault, Consumer<XSSFWorkbook> change) throws IOException {
        add(name, fault, SampleStations.weir().change(change).bytes());
    }

    private void noWorkbooks() throws IOException {
        byte[] noise = new byte[5000];
        new Random(1).nextBytes(noise);
        faults.put(folder.resolve("not there.xlsx"), "file-missing");
        faults.put(Files.createDirectory(folder.resolve("folder.xlsx")), "file-is-folder");
        add("empty.xlsx", "file-empty", "");
        add("table.csv", "not-a-workbook", "Case,Flow\nPeak,12.5\n");
        add("page.xlsx", "not-a-workbook", "<html><body><table/></body></html>");
        add("print.pdf", "not-a-workbook", "%PDF-1.7\n");
        add("noise.xlsx", "not-a-workbook", noise);
        add("zip.xlsx", "not-a-workbook", new Zips().with("readme.txt", "x").bytes());
        add("empty zip.xlsx", "not-a-workbook", new Zips().bytes());
        add(
                "open.ods",
                "open-document",
                new Zips()
                        .with("mimetype", "application/vnd.oasis.opendocument.spreadsheet")
                        .bytes());
    }

    private void otherKinds() throws IOException {
        ByteArrayOutputStream old = new ByteArrayOutputStream();
        try (HSSFWorkbook workbook = new HSSFWorkbook()) {
            workbook.createSheet();
            workbook.write(old);
        }
        add("old.xls", "old-kind", old.toByteArray());
        add("old named as new.xlsx", "old-kind", old.toByteArray());
        ByteArrayOutputStream locked = new ByteArrayOutputStream();
        try (POIFSFileSystem files = new POIFSFileSystem()) {
            files.createDocument(new java.io.ByteArrayInputStream(new byte[9000]), "EncryptedPackage");
            files.writeFilesystem(locked);
        }
        add("locked.xlsx", "encrypted", locked.toByteArray());
        byte[] bits = sound.clone();
        for (int at = 0; at < bits.length - 4; at++) {
            if (bits[at] == 'P' && bits[at + 1] == 'K' && bits[at + 2] == 1 && bits[at + 3] == 2) {
                bits[at + 8] |= 1;
            }
        }
        add("locked zip.xlsx", "encrypted", bits);
        String macros = "application/vnd.ms-excel.sheet.macroEnabled.main+xml";
        changed("macros.xlsm", "macros", TYPES, PLAIN, macros);
        changed("macros.xlsx", "macros", TYPES, PLAIN, macros);
        add(
                "macros in a plain one.xlsx",
                "macros",
                zips().with("xl/vbaProject.bin", "x").bytes());
        changed("template.xltx", "template", TYPES, "sheet.main+xml", "template.main+xml");
        changed(
                "template with macros.xltm",
                "template",
                TYPES,
                PLAIN,
                "application/vnd.ms-excel.template.macroEnabled.main+xml");
        changed(
                "strict.xlsx",
                "strict-variant",
                "xl/workbook.xml",
                "http://schemas.openxmlformats.org/spreadsheetml/2006/main",
                "http://purl.oclc.org/ooxml/spreadsheetml/main");
        changed(
                "text document.xlsx",
                "not-a-workbook",
                TYPES,
                PLAIN,
                PLAIN.replace("spreadsheetml.sheet", "wordprocessingml.document"));
        changed(
                "links.xlsx",
                "external-links",
                RELATIONS,
                "</Relationships>",
                "<Relationship Id=\"rId99\" Target=\"externalLinks/externalLink1.xml\" Type=\"http://schemas."
                        + "openxmlformats.org/officeDocument/2006/relationships/externalLink\"/></Relationships>");
    }

    private void damagedFiles() throws IOException {
        add("tail cut.xlsx", "damaged", Arrays.copyOf(sound, sound.length - 10));
        add("half.xlsx", "damaged", Arrays.copyOf(sound, sound.length / 2));
        add("head only.xlsx", "damaged", Arrays.copyOf(sound, 100));
        byte[] flipped = sound.clone();
        flipped[new String(flipped, StandardCharsets.ISO_8859_1).lastIndexOf("xl/styles.xml") - 46 + 16] ^= 1;
        add("checksum.xlsx", "damaged", flipped);
        flows("not well formed.xlsx", "damaged", "</sheetData>", "</sheet>");
        add("outside name.xlsx", "odd-part", zips().with("../../evil.txt", "x").bytes());
        add("name twice.xlsx", "part-twice", zips().with("XL/Workbook.xml", "x").bytes());
    }

    private void damagedParts() throws IOException {
        add("no sheet part.xlsx", "sheet-part-missing", zips().without(FLOWS).bytes());
        add(
                "no texts.xlsx",
                "text-unknown",
                zips().without("xl/sharedStrings.xml").bytes());
        add("no styles.xlsx", "style-unknown", zips().without("xl/styles.xml").bytes());
        add(
                "no workbook.xlsx",
                "not-a-workbook",
                zips().without("xl/workbook.xml").bytes());
        add("no types.xlsx", "not-a-workbook", zips().without(TYPES).bytes());
        add("no relations.xlsx", "sheet-part-missing", zips().without(RELATIONS).bytes());
        for (String part : new String[] {TYPES, "_rels/.rels", RELATIONS, "xl/workbook.xml", "xl/styles.xml", FLOWS}) {
            add(
                    "bomb in " + part.replace('/', ' ') + ".xlsx",
                    "doctype",
                    zips().change(part, s -> s.replaceFirst("(<[A-Za-z])", BOMB + "$1"))
                            .bytes());
        }
        changed("bomb in texts.xlsx", "doctype", "xl/sharedStrings.xml", "<sst", BOMB + "<sst");
        flows("reaches out.xlsx", "doctype", "<worksheet", "<!DOCTYPE x SYSTEM \"file:///etc/passwd\"><worksheet");
    }

    private void damagedCells() throws IOException {
        String cell = "<c r=\"D9\" s=\"7\" t=\"n\"><v>4.0</v></c>";
        for (String number :
                new String[] {"abc", "NaN", "INF", "1e999", "0x1p3", "4,0", "4.0.0", "--4", "4d", "9".repeat(70)}) {
            flows(
                    "number " + number.substring(0, Math.min(9, number.length())) + ".xlsx",
                    "damaged-number",
                    cell,
                    cell.replace("4.0", number));
        }
        flows("number away.xlsx", "entry-missing", cell, cell.replace("4.0", ""));
        flows("cell twice.xlsx", "cell-twice", cell, cell + cell);
        flows("column far out.xlsx", "wild-address", cell, cell.replace("D9", "ZZZZ9"));
        flows("column beyond.xlsx", "wild-address", cell, cell.replace("D9", "XFE9"));
        flows("cell of another row.xlsx", "wild-address", cell, cell.replace("D9", "D10"));
        flows("cell without a row.xlsx", "wild-address", cell, cell.replace("D9", "D0"));
        flows("row twice.xlsx", "row-twice", "<row r=\"10\"", "<row r=\"9\"/><row r=\"10\"");
        for (String row : new String[] {"0", "-9", "1048577", "99999999999999", "nine"}) {
            flows("row " + row + ".xlsx", "wild-address", "<row r=\"9\"", "<row r=\"" + row + "\"");
        }
        flows("kind of cell.xlsx", "cell-kind", cell, cell.replace("\"n\"", "\"zz\""));
        for (String index : new String[] {"99999", "-1", "1e3", "NaN", ""}) {
            String named = index.isEmpty() ? "none" : index;
            flows("style " + named + ".xlsx", "style-unknown", cell, cell.replace("s=\"7\"", "s=\"" + index + "\""));
            flows(
                    "text " + named + ".xlsx",
                    "text-unknown",
                    cell,
                    cell.replace("\"n\"", "\"s\"").replace("4.0", index));
        }
    }

    private void unseen() throws IOException {
        edited("sheet hidden.xlsx", "sheet-hidden", w -> w.setSheetHidden(w.getSheetIndex("Flows"), true));
        edited(
                "sheet hidden well.xlsx",
                "sheet-hidden",
                w -> w.setSheetVisibility(w.getSheetIndex("W1"), SheetVisibility.VERY_HIDDEN));
        edited(
                "row hidden.xlsx",
                "entry-unseen",
                w -> w.getSheet("Flows").getRow(8).setZeroHeight(true));
        edited("column hidden.xlsx", "entry-unseen", w -> w.getSheet("Flows").setColumnHidden(3, true));
        edited(
                "merged.xlsx",
                "entry-unseen",
                w -> w.getSheet("Flows").addMergedRegion(CellRangeAddress.valueOf("D9:D10")));
        edited(
                "merged over a number.xlsx",
                "entry-unseen",
                w -> w.getSheet("Flows").addMergedRegion(CellRangeAddress.valueOf("C9:D9")));
    }

    private void oversized() throws IOException {
        add("zip bomb.xlsx", "too-large", blown(FLOWS, 1));
        add("zip bomb of many parts.xlsx", "too-large", blown("xl/media/image", 40));
        StringBuilder filled = new StringBuilder();
        StringBuilder formatted = new StringBuilder();
        for (int row = 1000; row <= 1_048_576; row++) {
            filled.append("<row r=\"").append(row).append("\"><c><v>1</v></c></row>");
            formatted.append("<row r=\"").append(row).append("\" ht=\"20\"/>");
        }
        flows("a million rows filled.xlsx", "too-many-rows", "</sheetData>", filled + "</sheetData>");
        flows("a million rows formatted.xlsx", "too-many-rows", "</sheetData>", formatted + "</sheetData>");
        String row = "<row r=\"900\">" + "<c><v>1</v></c>".repeat(16_384) + "</row>";
        StringBuilder wide = new StringBuilder();
        for (int i = 0; i < 60; i++) {
            wide.append(row.replace("900", String.valueOf(900 + i)));
        }
        flows("a million cells.xlsx", "too-many-cells", "</sheetData>", wide + "</sheetData>");
        Zips parts = zips();
        for (int i = 0; i < 20_000; i++) {
            parts.with("xl/media/" + i, "x");
        }
        add("thousands of parts.xlsx", "too-many-parts", parts.bytes());
        byte[] big = new byte[60_000_000];
        System.arraycopy(sound, 0, big, 0, sound.length);
        add("big.xlsx", "file-too-large", big);
    }

    private byte[] blown(String name, int parts) throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream out = new ZipOutputStream(bytes)) {
            out.setLevel(Deflater.BEST_SPEED);
            byte[] blanks = new byte[1_000_000];
            for (int part = 0; part < parts; part++) {
                out.putNextEntry(new ZipEntry(name + part));
                for (int i = 0; i < 240 / parts; i++) {
                    out.write(blanks);
                }
            }
        }
        return bytes.toByteArray();
    }
}
