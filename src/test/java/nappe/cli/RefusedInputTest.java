package nappe.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.GeneralSecurityException;
import java.time.Duration;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Stream;
import nappe.cli.NappeTest.Said;
import nappe.input.Filler;
import nappe.input.SampleStations;
import org.apache.poi.openxml4j.exceptions.OpenXML4JException;
import org.apache.poi.openxml4j.opc.OPCPackage;
import org.apache.poi.poifs.crypt.EncryptionInfo;
import org.apache.poi.poifs.crypt.EncryptionMode;
import org.apache.poi.poifs.crypt.Encryptor;
import org.apache.poi.poifs.filesystem.POIFSFileSystem;
import org.apache.poi.ss.usermodel.FormulaError;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** A workbook that can't be worked with is refused at its cell, in words, and nothing is written. */
class RefusedInputTest {
    @TempDir
    Path folder;

    private interface Change {
        void to(Filler filler);
    }

    private static final Map<String, Fault> FAULTS = new LinkedHashMap<>();

    /** @param where what the message must name: sheet and cell, or the sheet */
    private record Fault(Change change, String... where) {}

    private static void fault(String name, Change change, String... where) {
        FAULTS.put(name, new Fault(change, where));
    }

    static {
        fault(
                "missing sheet",
                f -> f.change(w -> w.removeSheetAt(w.getSheetIndex("Flows"))),
                "sheet Flows",
                "sheet-missing");
        fault(
                "missing entry",
                f -> f.cell("F1", at("z_f", "C")).setBlank(),
                "sheet F1, cell " + at("z_f", "C"),
                "entry-missing");
        fault("decimal comma", f -> f.set("F1", at("z_f", "C"), "412,5"), "cell " + at("z_f", "C"), "write 412.5");
        fault(
                "decimal comma in a flow",
                f -> f.set("Flows", flow(2, "D"), "12,5"),
                "sheet Flows, cell " + flow(2, "D"),
                "write 12.5");
        fault(
                "unit in the value",
                f -> f.set("F1", at("z_f", "C"), "18 in"),
                "cell " + at("z_f", "C"),
                "write 18 here");
        fault(
                "number stored as text",
                f -> f.set("F1", at("z_f", "C"), "412.5"),
                "cell " + at("z_f", "C"),
                "stored as text");
        fault("unknown unit", f -> f.set("F1", at("z_f", "D"), "feet"), "cell " + at("z_f", "D"), "unit-unknown");
        fault("wrong dimension", f -> f.set("F1", at("z_f", "D"), "MGD"), "cell " + at("z_f", "D"), "unit-dimension");
        fault(
                "choice out of range",
                f -> f.set("F1", at("size", "C"), "11 ft"),
                "cell " + at("size", "C"),
                "word-unknown");
        fault("duplicate case", f -> f.set("Flows", flow(3, "A"), "Start-up, average day"), "cell " + flow(3, "A"));
        fault("duplicate tag", f -> secondElement(f, "F1"), "sheet Project", "F1");
        fault("impossible sign", f -> f.set("Flows", flow(2, "D"), -12.5), "sheet Flows, cell " + flow(2, "D"));
        fault("formula without a stored number", f -> uncached(f.cell("F1", at("z_f", "C"))), "cell " + at("z_f", "C"));
        fault(
                "error value",
                f -> f.cell("F1", at("z_f", "C")).setCellErrorValue(FormulaError.REF.getCode()),
                "cell " + at("z_f", "C"),
                "#REF!");
        fault(
                "date typed as a number",
                f -> f.set("F1", at("z_f", "C"), 45000).format("F1", at("z_f", "C"), "d/m/yy"),
                "cell " + at("z_f", "C"),
                "date");
        fault(
                "demand of an unknown symbol",
                f -> f.set("Demands", demand("B"), "z_q"),
                "sheet Demands, cell",
                "z_q",
                "z_u");
        fault(
                "demand of another dimension",
                f -> f.set("Demands", demand("E"), "MGD"),
                "sheet Demands, cell",
                "unit-dimension");
        fault(
                "demand of a number that is words",
                f -> f.set("Demands", demand("B"), "state"),
                "sheet Demands, cell",
                "state");
        fault(
                "demand of no element",
                f -> f.set("Demands", demand("A"), "F9"),
                "sheet Demands, cell " + demand("A"),
                "tag-unknown");
    }

    static Stream<String> faults() {
        return FAULTS.keySet().stream();
    }

    private static String at(String symbol, String column) {
        return address("F1", symbol, column);
    }

    /** The cell of a flow case of the sample, counted from 1. */
    private static String flow(int number, String column) {
        return address("Flows", "Start-up, minimum hour", column, number - 1);
    }

    private static String demand(String column) {
        return address("Demands", "F1", column, 0);
    }

    private static String address(String sheet, String text, String column) {
        return address(sheet, text, column, 0);
    }

    /** The cell so many rows under the one whose column A holds a text. */
    private static String address(String sheet, String text, String column, int below) {
        String[] found = new String[1];
        sample().change(w -> w.getSheet(sheet).forEach(row -> {
            if (row.getCell(0) != null && row.getCell(0).toString().equals(text)) {
                found[0] = column + (row.getRowNum() + 1 + below);
            }
        }));
        return java.util.Objects.requireNonNull(found[0], text);
    }

    private static Filler sample() {
        try {
            return SampleStations.headworks();
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    private static void secondElement(Filler filler, String tag) {
        String first = address("Project", "F1", "A");
        int row = Integer.parseInt(first.substring(1)) + 1;
        filler.change(w -> {
            var from = w.getSheet("Project").getRow(row - 2);
            from.forEach(c -> filler.set("Project", (char) ('A' + c.getColumnIndex()) + "" + row, c.toString()));
        });
        filler.set("Project", "A" + row, tag);
    }

    private static void uncached(XSSFCell cell) {
        cell.setCellFormula("412+0.5");
        if (cell.getCTCell().isSetV()) {
            cell.getCTCell().unsetV();
        }
    }

    private Said refused(Path input) throws IOException {
        Path out = folder.resolve("out");
        long start = System.nanoTime();
        Said said = NappeTest.nappe("issue", input, "-o", out);
        assertThat(Duration.ofNanos(System.nanoTime() - start)).isLessThan(Duration.ofSeconds(10));
        assertThat(said.status()).as(said.err()).isEqualTo(ExitStatus.INPUT_REFUSED);
        assertThat(said.out()).isEmpty();
        assertThat(said.err())
                .contains(input.getFileName().toString(), "(fault: ", "no package was written")
                .doesNotContain("\tat ", "Exception", "nappe.", "org.apache");
        assertThat(out).doesNotExist();
        Said inspected = NappeTest.nappe("inspect", input);
        assertThat(inspected.status()).isEqualTo(ExitStatus.INPUT_REFUSED);
        assertThat(inspected.err()).isEqualTo(said.err());
        return said;
    }

    @ParameterizedTest
    @MethodSource("faults")
    void faultIsToldAtItsCell(String name) throws IOException {
        Fault fault = FAULTS.get(name);
        Filler filler = sample();
        fault.change().to(filler);
        Said said = refused(filler.save(folder.resolve("station.xlsx")));
        assertThat(said.err()).contains(fault.where());
        assertThat(said.err().lines().filter(line -> line.startsWith("station.xlsx")))
                .hasSize(1);
    }

    @Test
    void severalFaultsAreToldAtOnce() throws IOException {
        Filler filler = sample();
        for (String name : new String[] {
            "missing entry", "decimal comma in a flow", "choice out of range", "demand of no element", "duplicate case"
        }) {
            FAULTS.get(name).change().to(filler);
        }
        Said said = refused(filler.save(folder.resolve("station.xlsx")));
        assertThat(said.err())
                .contains(
                        "cell " + at("z_f", "C"),
                        "cell " + at("size", "C"),
                        "cell " + flow(2, "D"),
                        "cell " + flow(3, "A"),
                        "cell " + demand("A"),
                        "5 faults; no package was written.");
    }

    @Test
    void fileThatIsNoWorkbookIsRefused() throws IOException {
        Path text = Files.writeString(folder.resolve("notes.xlsx"), "size,3 ft\n");
        assertThat(refused(text).err()).contains("not");
        Path empty = Files.createFile(folder.resolve("empty.xlsx"));
        assertThat(refused(empty).err()).contains("empty");
    }

    @Test
    void fileThatIsNotThereIsRefused() throws IOException {
        Said said = NappeTest.nappe("issue", folder.resolve("none.xlsx"), "-o", folder.resolve("out"));
        assertThat(said.status()).isEqualTo(ExitStatus.INPUT_REFUSED);
        assertThat(said.err()).contains("none.xlsx").doesNotContain("\tat ");
        assertThat(folder.resolve("out")).doesNotExist();
        assertThat(NappeTest.nappe("inspect", folder).status()).isEqualTo(ExitStatus.INPUT_REFUSED);
    }

    @Test
    void encryptedWorkbookIsRefused() throws IOException, GeneralSecurityException, OpenXML4JException {
        Path file = folder.resolve("locked.xlsx");
        try (POIFSFileSystem system = new POIFSFileSystem();
                OPCPackage opened = OPCPackage.open(new ByteArrayInputStream(sample().bytes()))) {
            Encryptor encryptor = new EncryptionInfo(EncryptionMode.agile).getEncryptor();
            encryptor.confirmPassword("invented");
            try (OutputStream out = encryptor.getDataStream(system)) {
                opened.save(out);
            }
            try (OutputStream out = Files.newOutputStream(file)) {
                system.writeFilesystem(out);
            }
        }
        assertThat(refused(file).err()).contains("password");
    }

    @Test
    void truncatedWorkbookIsRefused() throws IOException {
        byte[] whole = sample().bytes();
        for (int length : new int[] {whole.length - 10, whole.length / 2, 100}) {
            Path file = Files.write(folder.resolve("cut" + length + ".xlsx"), Arrays.copyOf(whole, length));
            assertThat(refused(file).err()).contains("cut" + length + ".xlsx");
        }
    }

    @Test
    void issuedWorkbookAsInputIsRefused() throws IOException {
        Path out = folder.resolve("first");
        assertThat(NappeTest.nappe("issue", sample().save(folder.resolve("in.xlsx")), "-o", out)
                        .status())
                .isZero();
        Said said = refused(out.resolve("QW-H-017_rev-A/QW-H-017_rev-A.xlsx"));
        assertThat(said.err()).contains("Project");
    }
}
