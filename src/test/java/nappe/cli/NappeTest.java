package nappe.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import nappe.input.Filler;
import nappe.input.SampleStations;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The command line from end to end: what it prints, writes and says to the shell. */
class NappeTest {
    @TempDir
    Path folder;

    /** What one run said. */
    record Said(int status, String out, String err) {}

    static Said nappe(Object... args) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int status = Nappe.run(
                Stream.of(args).map(Object::toString).toArray(String[]::new),
                new PrintWriter(out, true),
                new PrintWriter(err, true));
        return new Said(status, out.toString(), err.toString());
    }

    private Map<String, byte[]> files(Path where) throws IOException {
        Map<String, byte[]> files = new TreeMap<>();
        try (Stream<Path> all = Files.walk(where)) {
            for (Path file : all.filter(Files::isRegularFile).toList()) {
                files.put(where.relativize(file).toString(), Files.readAllBytes(file));
            }
        }
        return files;
    }

    @ParameterizedTest
    @ValueSource(strings = {"blank", "inspect", "issue", "verify"})
    void helpOfEveryCommandHasAnExample(String command) {
        Said said = nappe(command, "--help");
        assertThat(said.status()).isZero();
        assertThat(said.out()).containsPattern("Examples?:?").contains("nappe " + command);
        assertThat(said.err()).isEmpty();
    }

    @Test
    void helpWithoutACommandNamesEveryCommand() {
        assertThat(nappe("--help").out()).contains("blank", "inspect", "issue", "verify", "Exit status");
        assertThat(nappe("--version").out()).startsWith("nappe ");
        assertThat(nappe().status()).isIn(ExitStatus.DONE, ExitStatus.WRONG_USAGE);
    }

    /** A blank of one flume {@code F1}, filled in but for firm, client and revisions. */
    static Filler flume(Path blank) throws IOException {
        return new Filler(Files.readAllBytes(blank))
                .project("Project", "Invented works at Nowhere")
                .project("Calculation number", "C/001 b")
                .project("Subject", "Flume")
                .project("Revision", "A")
                .project("Revision date", "2030-01-31")
                .project("Elevations refer to", "invented datum")
                .project("Purpose of release", "For trying out only.")
                .row("Flows", "Peak hour", "1 h", "2050", 2.5, "MGD", 100.1, "ft", "", "invented", "known")
                .entry("F1", "size", "1 ft", null, "invented", "known")
                .entry("F1", "form", "subtraction", null, "invented", "known")
                .entry("F1", "submerged", "accepted", null, "invented", "known")
                .entry("F1", "z_f", 100, "ft", "invented", "known");
    }

    @Test
    void blankFilledInspectedAndIssued() throws IOException {
        Path file = folder.resolve("station.xlsx");
        assertThat(nappe("blank", "F1=parshall-flume", "--units", "US", "-o", file)
                        .status())
                .isZero();
        flume(file).project("Firm", "Any Firm").project("Client", "Any Town").save(file);
        Said inspected = nappe("inspect", file);
        assertThat(inspected.err()).isEqualTo("remark: revision A is not among the revisions on sheet Revisions\n");
        assertThat(inspected.status()).isZero();
        assertThat(inspected.out()).contains("no faults", "flume is not drowned: submergence");
        assertThat(files(folder)).hasSize(1);
        new Filler(Files.readAllBytes(file))
                .entry("F1", "z_f", 100, "ft", "", "known")
                .save(file);
        assertThat(nappe("inspect", file).err())
                .contains("remark: no source or basis is typed beside the value in F1 C10\n");
        Path demanding = Files.createDirectories(folder.resolve("demand")).resolve("in.xlsx");
        new Filler(Files.readAllBytes(file))
                .row("Demands", "F1", "zu", "at most", 103, "ft", "", "invented")
                .save(demanding);
        assertThat(nappe("inspect", demanding).err())
                .contains("\"zu\" is not a result of F1; did you mean z_u (")
                .doesNotContain("it has");
        Said issued = nappe("issue", file, "-o", folder.resolve("out"));
        assertThat(issued.status()).isZero();
        assertThat(files(folder.resolve("out")).keySet())
                .containsExactlyInAnyOrder(
                        "C-001-b_rev-A/C-001-b_rev-A.pdf",
                        "C-001-b_rev-A/C-001-b_rev-A.xlsx",
                        "C-001-b_rev-A/C-001-b_rev-A_F1-rating.csv",
                        "C-001-b_rev-A/contents.txt");
    }

    @Test
    void preliminaryPackageIsWrittenOver() throws IOException {
        Path input = SampleStations.weir().project("Status", "preliminary").save(folder.resolve("in.xlsx"));
        Path out = folder.resolve("out");
        assertThat(nappe("issue", input, "-o", out).status()).isZero();
        Map<String, byte[]> first = files(out);
        assertThat(nappe("issue", input, "-o", out).status()).isZero();
        Map<String, byte[]> second = files(out);
        assertThat(second.keySet()).isEqualTo(first.keySet());
        first.forEach((name, bytes) -> assertThat(second.get(name)).as(name).isEqualTo(bytes));
    }

    @ParameterizedTest
    @ValueSource(strings = {"issued", "superseded"})
    void issuedRevisionIsNeverWrittenOver(String status) throws IOException {
        Path input = SampleStations.weir().project("Status", status).save(folder.resolve("in.xlsx"));
        Path out = folder.resolve("out");
        assertThat(nappe("issue", input, "-o", out).status()).isZero();
        Map<String, byte[]> before = files(out);
        Path changed = SampleStations.weir().project("Status", "preliminary").save(folder.resolve("in2.xlsx"));
        for (Path again : List.of(input, changed)) {
            Said said = nappe("issue", again, "-o", out);
            assertThat(said.status()).isEqualTo(ExitStatus.WOULD_OVERWRITE);
            assertThat(said.err()).contains("LF-W-004_rev-0", "issued revision", "(fault: would-overwrite)");
            assertThat(said.out()).isEmpty();
        }
        unchanged(before, out);
        Path contents = out.resolve("LF-W-004_rev-0/contents.txt");
        Files.delete(contents);
        Said said = nappe("issue", changed, "-o", out);
        assertThat(said.status()).isEqualTo(ExitStatus.WOULD_OVERWRITE);
        before.remove("LF-W-004_rev-0/contents.txt");
        unchanged(before, out);
    }

    private void unchanged(Map<String, byte[]> before, Path out) throws IOException {
        Map<String, byte[]> after = files(out);
        assertThat(after.keySet()).isEqualTo(before.keySet());
        before.forEach((name, bytes) -> assertThat(after.get(name)).as(name).isEqualTo(bytes));
    }

    @Test
    void revisionsThatDifferInSmallLettersOrMarksDoNotShareAFolder() throws IOException {
        Path out = folder.resolve("out");
        Path one = SampleStations.weir()
                .project("Status", "issued")
                .project("Revision", "A")
                .save(folder.resolve("a.xlsx"));
        Path two = SampleStations.weir()
                .project("Status", "preliminary")
                .project("Revision", "A.")
                .save(folder.resolve("b.xlsx"));
        assertThat(nappe("issue", one, "-o", out).status()).isZero();
        Map<String, byte[]> before = files(out);
        nappe("issue", two, "-o", out);
        before.forEach((name, bytes) -> assertThat(out.resolve(name)).hasBinaryContent(bytes));
    }

    @Test
    void wrongUsageIsTwo() throws IOException {
        Path there = Files.writeString(folder.resolve("there.xlsx"), "mine");
        List<Object[]> wrong = List.of(
                new Object[] {"isue", "x.xlsx"},
                new Object[] {"issue"},
                new Object[] {"inspect"},
                new Object[] {"issue", "a.xlsx", "--no-such-option"},
                new Object[] {"blank", "-o", folder.resolve("x.xlsx")},
                new Object[] {"blank", "F1=parshall-flume"},
                new Object[] {"blank", "F1=parshal", "-o", folder.resolve("x.xlsx")},
                new Object[] {"blank", "F 1=parshall-flume", "-o", folder.resolve("x.xlsx")},
                new Object[] {"blank", "F1=parshall-flume", "F1=rectangular-weir", "-o", folder.resolve("x.xlsx")},
                new Object[] {"blank", "F1=parshall-flume", "--units", "imperial", "-o", folder.resolve("x.xlsx")},
                new Object[] {"blank", "F1=parshall-flume", "-o", there});
        for (Object[] args : wrong) {
            Said said = nappe(args);
            assertThat(said.status())
                    .as(String.join(" ", Stream.of(args).map(Object::toString).toList()))
                    .isEqualTo(2);
            assertThat(said.err()).isNotBlank().doesNotContain("\tat ", "Exception");
        }
        assertThat(files(folder)).hasSize(1);
        assertThat(there).hasContent("mine");
    }

    @Test
    void verifyPrintsEveryRowAndTheCounts() {
        Said said = nappe("verify");
        assertThat(said.status()).isZero();
        assertThat(said.err()).isEmpty();
        int rows = new Desk().checks().size();
        assertThat(said.out().lines().filter(line -> line.contains("expected"))).hasSize(rows);
        assertThat(said.out()).contains(rows + " rows, " + rows + " met, 0 not met.");
        new Desk().checks().forEach(row -> assertThat(said.out()).contains(row.id()));
    }

    @Test
    void checkValueThatIsNotMetIsNamedAndFails() throws IOException {
        Path file = Files.writeString(folder.resolve("firm.csv"), """
                id,method,entries,target,expected,unit,tolerance,source,kind,note
                H1,parshall-flume,"size = ""3 ft""; h = 2 ft",Q_h,35.5,ft3/s,0.6 %,invented test,derived,
                H2,parshall-flume,"size = ""3 ft""; h = 2 ft",Q_h,36.5,ft3/s,0.6 %,invented test,derived,
                """);
        Said said = nappe("verify", file);
        assertThat(said.status()).isNotZero();
        assertThat(said.out())
                .containsPattern("H1 +met")
                .containsPattern("H2 +NOT MET")
                .contains("2 rows, 1 met, 1 not met.");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "H1,no-such-method,\"h = 2 ft\",Q_h,35.5,ft3/s,0.6 %,invented,derived,",
                "H1,parshall-flume,\"size = \"\"3 ft\"\"; h = 2 ft\",Q_x,35.5,ft3/s,0.6 %,invented,derived,",
                "H1,parshall-flume,\"size = \"\"3 ft\"\"; h = 2 ft\",Q_h,35.5,ft3/s,lots,invented,derived,",
                "H1,parshall-flume,\"size = \"\"3 ft\"\"; h = 2 furlongs\",Q_h,35.5,ft3/s,0.6 %,invented,derived,",
                "H1,parshall-flume,\"size = \"\"3 ft\"\"; h = 2 ft\",Q_h,35.5,furlong,0.6 %,invented,derived,",
                "H1,parshall-flume,\"size = \"\"3 ft\"\"; h = 2 ft\",Q_h,many,ft3/s,0.6 %,invented,derived,",
                "H1,parshall-flume,h = 2 ft"
            })
    void damagedCheckFileIsRefusedInWords(String row) throws IOException {
        Path file = Files.writeString(
                folder.resolve("firm.csv"),
                "id,method,entries,target,expected,unit,tolerance,source,kind,note\n" + row + "\n",
                StandardCharsets.UTF_8);
        Said said = nappe("verify", file);
        assertThat(said.status()).as(said.err() + said.out()).isEqualTo(3);
        assertThat(said.err() + said.out())
                .containsPattern("firm.csv:2: |H1")
                .doesNotContain("\tat ", "Exception", "input string", "Index for");
    }
}
