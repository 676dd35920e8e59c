package nappe.cli;

import static nappe.cli.NappeTest.nappe;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import nappe.cli.NappeTest.Said;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A folder of the house's own methods in every command; the folder is the one of the walk-through, so that it cannot rot. */
class HouseOptionTest {
    private static final String SHEET = "methods/mill-race-weir.txt";
    private static final String TABLE = "tables/mill-race-finish.csv";
    private static final String CHECKS = "checks/mill-race-weir.csv";
    private static final String FIGURE = "figures/mill-race-weir.txt";

    @TempDir
    Path folder;

    private Path house;

    @BeforeEach
    void copyTheExample() throws IOException {
        house = folder.resolve("our-methods");
        copy(MillRace.HOUSE, house);
    }

    private static void copy(Path from, Path to) throws IOException {
        try (Stream<Path> all = Files.walk(from)) {
            for (Path file : all.toList()) {
                Path target = to.resolve(from.relativize(file).toString());
                if (Files.isDirectory(file)) {
                    Files.createDirectories(target);
                } else {
                    Files.copy(file, target);
                }
            }
        }
    }

    private void put(String path, String text) throws IOException {
        Files.writeString(house.resolve(path), text);
    }

    private void change(String path, String from, String to) throws IOException {
        String text = Files.readString(house.resolve(path));
        assertThat(text).contains(from);
        put(path, text.replace(from, to));
    }

    private Path station() throws IOException {
        Path file = folder.resolve("mill.xlsx");
        Said said = nappe("blank", "W1=mill-race-weir", "--units", "SI", "--house", house, "-o", file);
        assertThat(said.status()).as(said.err()).isZero();
        assertThat(said.out()).contains("--house " + house);
        return MillRace.filled(file).save(file);
    }

    private static Map<String, byte[]> files(Path where) throws IOException {
        Map<String, byte[]> files = new TreeMap<>();
        try (Stream<Path> all = Files.walk(where)) {
            for (Path file : all.filter(Files::isRegularFile).toList()) {
                files.put(where.relativize(file).toString(), Files.readAllBytes(file));
            }
        }
        return files;
    }

    /** The texts of a sheet of the issued workbook, row by row. */
    private static String sheet(Path issued, String name) throws IOException {
        StringBuilder text = new StringBuilder();
        try (XSSFWorkbook workbook = new XSSFWorkbook(Files.newInputStream(issued))) {
            workbook.getSheet(name).forEach(row -> {
                row.forEach(cell -> text.append(cell).append(" | "));
                text.append('\n');
            });
        }
        return text.toString();
    }

    private Path issue(Path input, String where) throws IOException {
        Path out = folder.resolve(where);
        Said said = nappe("issue", input, "--house", house, "-o", out);
        assertThat(said.status()).as(said.err()).isZero();
        assertThat(said.err()).isEmpty();
        return out.resolve("AM-W-001_rev-A/AM-W-001_rev-A.xlsx");
    }

    private static Said refused(Said said) {
        assertThat(said.status()).as(said.err()).isEqualTo(ExitStatus.INPUT_REFUSED);
        assertThat(said.out()).isEmpty();
        assertThat(said.err()).contains("(fault: ").doesNotContain("\tat ", "Exception", "nappe.", "java.");
        return said;
    }

    private static String fingerprint(Path issued) throws IOException {
        return Files.readString(issued.resolveSibling("contents.txt"))
                .lines()
                .filter(line -> line.startsWith("fingerprint"))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void walkThroughIsIssuedAndPrintedAsTheHousesOwn() throws IOException {
        Path input = station();
        Said inspected = nappe("inspect", input, "--house", house);
        assertThat(inspected.status()).as(inspected.err()).isZero();
        assertThat(inspected.out())
                .contains("1 element, 3 flow cases, no faults")
                .containsPattern("not met +W1 +flow is free: drowning ratio.*Flood in the tailwater");
        Path issued = issue(input, "out");
        assertThat(sheet(issued, "References"))
                .contains("mill-race-weir | ", "house method, folder our-methods", "house table, folder our-methods")
                .contains("by a house method only");
        assertThat(sheet(issued, "Software"))
                .contains("the house's own, folder our-methods; not verified by Nappe's check values; 6 check values of"
                        + " the house run, 6 met")
                .contains("derived (house row)", "mill-race-weir, figure");
        assertThat(sheet(issued, "W1 method")).contains("House method mill-race-weir of folder our-methods");
        assertThat(sheet(issued, "Tables")).contains("House table, folder our-methods");
        assertThat(files(folder.resolve("out")).keySet()).contains("AM-W-001_rev-A/AM-W-001_rev-A_W1-rating.csv");
    }

    @Test
    void sameFolderGivesTheSameBytesWhereverItLiesAndHoweverItsLinesEnd() throws IOException {
        Path input = station();
        issue(input, "one");
        Path elsewhere = folder.resolve("elsewhere/our-methods");
        copy(house, elsewhere);
        for (String path : new String[] {SHEET, TABLE, CHECKS, FIGURE}) {
            String text = Files.readString(elsewhere.resolve(path));
            Files.writeString(elsewhere.resolve(path), "\uFEFF" + text.replace("\n", "\r\n"));
        }
        house = elsewhere;
        issue(input, "two");
        Map<String, byte[]> one = files(folder.resolve("one"));
        Map<String, byte[]> two = files(folder.resolve("two"));
        assertThat(two.keySet()).isEqualTo(one.keySet());
        one.forEach((name, bytes) -> assertThat(two.get(name)).as(name).isEqualTo(bytes));
    }

    @Test
    void sheetTableAndFigureAreInTheFingerprint() throws IOException {
        Path input = station();
        String before = fingerprint(issue(input, "out"));
        change(FIGURE, "Section along", "A section along");
        String drawn = fingerprint(issue(input, "out"));
        change(TABLE, "0.005", "0.006");
        change(CHECKS, "MR3,", "#MR3,");
        change(CHECKS, "MR4,", "#MR4,");
        change(CHECKS, "MR4i,", "#MR4i,");
        String tabled = fingerprint(issue(input, "out"));
        change(SHEET, "undamaged", "sound");
        assertThat(java.util.List.of(before, drawn, tabled, fingerprint(issue(input, "out"))))
                .doesNotHaveDuplicates();
    }

    @Test
    void methodWithoutCheckValuesIsCalledUnverified() throws IOException {
        Files.delete(house.resolve(CHECKS));
        Said said = nappe("verify", "--house", house);
        assertThat(said.status()).isZero();
        assertThat(said.out()).contains("mill-race-weir: UNVERIFIED");
        assertThat(sheet(issue(station(), "out"), "Software"))
                .contains("UNVERIFIED: the house has no check values for it");
    }

    @Test
    void verifyRunsTheCheckValuesOfTheHouse() throws IOException {
        Said said = nappe("verify", "--house", house);
        assertThat(said.status()).as(said.out()).isZero();
        assertThat(said.err()).isEmpty();
        assertThat(said.out())
                .contains("Check values of the house, folder our-methods:", "6 rows, 6 met, 0 not met.")
                .containsPattern("mill-race-weir +derived \\(house row\\) +6 +6")
                .doesNotContain("parshall", "UNVERIFIED");
        change(CHECKS, "0.05243389", "0.06243389");
        Said off = nappe("verify", "--house", house);
        assertThat(off.status()).isEqualTo(ExitStatus.INPUT_REFUSED);
        assertThat(off.out()).containsPattern("MR1 +NOT MET").contains("6 rows, 5 met, 1 not met.");
    }

    @Test
    void allFaultsOfTheMethodInUseAreToldAtOnceByLineAndColumn() throws IOException {
        Path input = station();
        change(SHEET, "l_f = L_b - r", "l_f = L_b - q");
        change(SHEET, "limit     0.30 m <= b", "limit     0.30 s <= b");
        change(TABLE, "smooth,0.003", "smooth,0.003 mm");
        change(CHECKS, "0.05243389,m3/s", "0.05243389,bucket");
        Said issued = refused(nappe("issue", input, "--house", house, "-o", folder.resolve("out")));
        assertThat(issued.err())
                .contains(house + "/" + SHEET + ":28:23: q is not defined above (fault: symbol-unknown)")
                .containsPattern("mill-race-weir.txt:50:\\d+: ")
                .contains(house + "/" + TABLE + ":5:8: \"0.003 mm\" is not a number")
                .contains(house + "/" + CHECKS + ":3:", "\"bucket\" is not a known unit")
                .contains("4 faults; nothing was written.");
        assertThat(folder.resolve("out")).doesNotExist();
        assertThat(refused(nappe("inspect", input, "--house", house)).err()).isEqualTo(issued.err());
        assertThat(refused(nappe("verify", "--house", house)).err()).isEqualTo(issued.err());
        Said blank = refused(nappe("blank", "W2=mill-race-weir", "--house", house, "-o", folder.resolve("b.xlsx")));
        assertThat(blank.err()).isEqualTo(issued.err());
        assertThat(folder.resolve("b.xlsx")).doesNotExist();
    }

    @Test
    void faultsOfAFigureAreToldBeforeAnythingIsIssued() throws IOException {
        Path input = station();
        change(FIGURE, "level     0.5*L_b, p ; z_c", "level     0.5*L_b, p ; z_q");
        assertThat(refused(nappe("issue", input, "--house", house, "-o", folder.resolve("out")))
                        .err())
                .contains(house + "/" + FIGURE + ":", "z_q is not a symbol");
    }

    @Test
    void nextCommandQuotesPathsWithABlank() throws IOException {
        Path input = Files.createDirectories(folder.resolve("a b")).resolve("mill.xlsx");
        String quoted = "\"" + input + "\"";
        assertThat(nappe("blank", "W1=mill-race-weir", "--units", "SI", "--house", house, "-o", input)
                        .out())
                .contains("nappe inspect " + quoted + " --house " + house);
        MillRace.filled(input).save(input);
        assertThat(nappe("inspect", input, "--house", house).out()).contains("nappe issue " + quoted + " --house");
    }

    @Test
    void brokenSheetThatIsNotUsedHindersNothingButIsNamed() throws IOException {
        put("methods/unfinished.txt", "method Unfinished\nline x = y ; m ; from nothing\n");
        Path input = folder.resolve("mill.xlsx");
        assertThat(nappe("blank", "W1=mill-race-weir", "--units", "SI", "--house", house, "-o", input)
                        .status())
                .isZero();
        MillRace.filled(input).save(input);
        Said issued = nappe("issue", input, "--house", house, "-o", folder.resolve("out"));
        assertThat(issued.status()).as(issued.err()).isZero();
        assertThat(issued.err()).contains("remark: house method unfinished, not used here, has 1 fault");
        assertThat(refused(nappe("verify", "--house", house)).err()).contains("unfinished.txt:2:10: y is not defined");
        assertThat(nappe("blank", "--methods", "--house", house).out())
                .containsPattern("unfinished +Unfinished \\(house method, folder our-methods\\)")
                .contains("parshall-flume");
    }

    @Test
    void nameOfABuiltInFileIsRefused() throws IOException {
        put("methods/Parshall-Flume.txt", "method Ours\n");
        put("tables/parshall-sizes.csv", "# title: a\n# source: b\nc\nd\n");
        put("figures/rectangular-weir.txt", "view a\n");
        Said said = refused(nappe("blank", "--methods", "--house", house));
        assertThat(said.err())
                .contains(
                        house + "/methods/Parshall-Flume.txt: this name is taken by a built-in file",
                        "methods/our-Parshall-Flume.txt",
                        "tables/parshall-sizes.csv",
                        "figures/rectangular-weir.txt",
                        "3 faults");
    }

    @Test
    void houseSheetIncludesBuiltInTextsAndUsesBuiltInTables() throws IOException {
        put("methods/two-weirs.txt", "method Twin\ninclude rectangular-weir subscript a\n");
        put(
                "methods/sized.txt",
                "method Sized\nsource A ; invented\nchoice size from parshall-sizes ; size\n"
                        + "entry b ; m ; width\nlimit b <= 3 m ; not too wide ; A\n");
        Said said = nappe("verify", "--house", house);
        assertThat(said.status()).as(said.err()).isZero();
        assertThat(said.out()).contains("two-weirs: UNVERIFIED", "sized: UNVERIFIED");
        assertThat(nappe("blank", "S1=sized", "--house", house, "-o", folder.resolve("s.xlsx"))
                        .status())
                .isZero();
    }

    @Test
    void methodWithoutAnyLimitIsRefused() throws IOException {
        put("methods/bare.txt", "method Bare\nentry b ; m ; width\n");
        String err = refused(nappe("blank", "B1=bare", "--house", house, "-o", folder.resolve("b.xlsx")))
                .err();
        assertThat(err).contains("methods/bare.txt: a method states at least one limit of its use");
    }

    @Test
    void checkValuesThatCannotBeReadAreNamedWhereTheyAreOfNoMethod() throws IOException {
        put("checks/others.csv", "id,method\n");
        Said said = nappe("issue", station(), "--house", house, "-o", folder.resolve("out"));
        assertThat(said.status()).isZero();
        assertThat(said.err())
                .contains("remark: no check value of " + house + "/checks/others.csv is run: it has 1 fault");
    }

    @Test
    void folderThatCannotBeUsedIsToldInWords() throws IOException {
        Path empty = Files.createDirectory(folder.resolve("empty"));
        assertThat(refused(nappe("verify", "--house", folder.resolve("nothing")))
                        .err())
                .contains("there is no such folder");
        assertThat(refused(nappe("verify", "--house", house.resolve(SHEET))).err())
                .contains("this is a file");
        assertThat(refused(nappe("verify", "--house", empty)).err()).contains("put each method sheet into methods");
        Path odd = Files.createDirectories(folder.resolve("ours\u0001/methods"));
        assertThat(refused(nappe("verify", "--house", odd.getParent())).err()).contains("the folder's name is printed");
    }

    @Test
    void fileThatIsNotTextInUtf8IsToldByLineAndColumn() throws IOException {
        byte[] latin = "method Weir\nabout Höhe\n".getBytes(StandardCharsets.ISO_8859_1);
        Files.write(house.resolve("methods/latin.txt"), latin);
        put("methods/control.txt", "method Weir\nabout a\u0007b\n");
        Said said = refused(nappe("verify", "--house", house));
        assertThat(said.err())
                .contains("methods/latin.txt:2:8: the byte F6 is not UTF-8 here")
                .contains("methods/control.txt:2:8: U+0007 is no character of a text")
                .contains("2 faults");
    }

    @Test
    void linkOutOfTheFolderAndOddNamesAreTold() throws IOException {
        Path outside = Files.writeString(folder.resolve("outside.txt"), "method Outside\n");
        Files.createSymbolicLink(house.resolve("methods/linked.txt"), outside);
        put("methods/our weir.txt", "method Spaced\n");
        put("methods/notes.md", "notes");
        put("methods/part.txt", "entry b ; m ; width\n");
        Files.write(house.resolve("tables/big.csv"), new byte[1_000_001]);
        Said said = refused(nappe("verify", "--house", house));
        assertThat(said.err())
                .contains("methods/linked.txt: a link to outside the house folder")
                .contains("methods/our weir.txt: the name may hold letters")
                .contains("tables/big.csv: more than 1000000 bytes")
                .contains("3 faults");
        Files.delete(house.resolve("methods/linked.txt"));
        Files.delete(house.resolve("methods/our weir.txt"));
        Files.delete(house.resolve("tables/big.csv"));
        Said mended = nappe("verify", "--house", house);
        assertThat(mended.status()).isZero();
        assertThat(mended.err())
                .contains("methods/notes.md is not read")
                .contains("methods/part.txt was not checked: it does not start with \"method\"");
        Said blank = nappe("blank", "W1=part", "--house", house, "-o", folder.resolve("p.xlsx"));
        assertThat(blank.status()).isEqualTo(ExitStatus.WRONG_USAGE);
        assertThat(blank.err()).contains("methods/part.txt does not start with the statement \"method\"");
    }

    @Test
    void workbookWithoutItsHouseIsRefusedWithTheRemedy() throws IOException {
        assertThat(refused(nappe("inspect", station())).err())
                .contains("\"mill-race-weir\" is not a known method", "--house");
    }

    @ParameterizedTest
    @ValueSource(strings = {"blank", "inspect", "issue", "verify"})
    void helpOfEveryCommandShowsTheOptionInAnExample(String command) {
        assertThat(nappe(command, "--help").out())
                .contains("--house=FOLDER")
                .containsPattern("nappe .*--house our-methods");
    }
}
