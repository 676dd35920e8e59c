package nappe.cli;

import static nappe.cli.NappeTest.nappe;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import nappe.cli.NappeTest.Said;
import nappe.input.SampleStations;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Help, what to do next, and what is said to slips on the command line. */
class HelpTest {
    private static final List<String> COMMANDS = List.of("blank", "inspect", "issue", "verify");

    @TempDir
    Path folder;

    /** Every line of the helps, of what the bare name prints and of the guide that runs the program. */
    static List<String> examples() throws IOException {
        List<String> texts =
                new ArrayList<>(List.of(nappe().out(), nappe("--help").out()));
        COMMANDS.forEach(command -> texts.add(nappe(command, "--help").out()));
        texts.add(Files.readString(Path.of("README.md")));
        return texts.stream()
                .flatMap(String::lines)
                .map(String::strip)
                .filter(line -> line.matches("nappe (blank|inspect|issue|verify) .*|nappe verify")
                        && !line.matches("nappe blank --help, .*"))
                .distinct()
                .toList();
    }

    @Test
    void everyCommandHasExamples() throws IOException {
        for (String command : COMMANDS) {
            assertThat(nappe(command, "--help").out()).contains("Examples:", "  nappe " + command);
            assertThat(nappe("help", command).out())
                    .isEqualTo(nappe(command, "--help").out());
        }
        assertThat(examples()).hasSizeGreaterThan(10);
    }

    @ParameterizedTest
    @MethodSource("examples")
    void everyExampleRuns(String example) throws IOException {
        boolean blank = example.startsWith("nappe blank");
        copy(MillRace.HOUSE, folder.resolve("our-methods"));
        if (!blank) {
            SampleStations.weir().save(folder.resolve("station.xlsx"));
            Path mill = folder.resolve("mill.xlsx");
            nappe("blank", "W1=mill-race-weir", "--units", "SI", "--house", folder.resolve("our-methods"), "-o", mill);
            MillRace.filled(mill).save(mill);
            Files.writeString(folder.resolve("firm-checks.csv"), rowsShownByVerify());
        }
        Object[] args =
                Stream.of(example.split(" +")).skip(1).map(this::inFolder).toArray();
        Said said = nappe(args);
        assertThat(said.status()).as(said.err()).isZero();
    }

    private static String rowsShownByVerify() {
        List<String> rows = nappe("verify", "--help")
                .out()
                .lines()
                .map(String::strip)
                .dropWhile(line -> !line.startsWith("id,"))
                .toList();
        assertThat(rows).hasSize(2);
        return String.join("\n", rows) + "\n";
    }

    private Object inFolder(String word) {
        boolean isPath = word.matches(".*\\.(xlsx|csv)|our-methods|output");
        return isPath ? folder.resolve(word) : word;
    }

    private static void copy(Path from, Path to) throws IOException {
        try (Stream<Path> all = Files.walk(from)) {
            for (Path one : all.filter(Files::isRegularFile).toList()) {
                Path target = to.resolve(from.relativize(one).toString());
                Files.createDirectories(target.getParent());
                Files.copy(one, target);
            }
        }
    }

    @Test
    void theBareNameSaysWhatToDoNextInAFewLines() {
        Said said = nappe();
        assertThat(said.status()).isZero();
        assertThat(said.out().lines()).hasSizeLessThan(15);
        assertThat(said.out()).contains("nappe blank", "nappe inspect", "nappe issue", "nappe --help");
        assertThat(said.err()).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            isue station.xlsx                         | there is no command "isue"; did you mean issue?                     | command-unknown
            print station.xlsx                        | there is no command "print"; there are blank, inspect, issue, verify | command-unknown
            station.xlsx                              | say what is to be done with it: nappe inspect station.xlsx          | command-missing
            issue                                     | name the input workbook                                             | file-unnamed
            issue my station.xlsx                     | a name with blanks stands in quotation marks                        | argument-unexpected
            issue station.xlsx -o                     | -o is followed by FOLDER                                            | option-incomplete
            issue station.xlsx -o a -o b              | the option -o is given twice                                        | option-twice
            blank F1=parshall-flume --unit US         | did you mean --units?                                               | option-unknown
            blank F1=parshall-flume                   | name the file to write, such as: -o station.xlsx                    | output-unnamed
            blank -o x.xlsx                           | name at least one element, such as F1=parshall-flume                | elements-missing
            blank parshall-flume -o x.xlsx            | F1=parshall-flume                                                   | element-unclear
            blank F1=parshal-flume -o x.xlsx          | there is no method "parshal-flume"; did you mean parshall-flume?    | method-unknown
            blank F1=siphon -o x.xlsx                 | there are approach-channel,                                         | method-unknown
            blank --methods siphon                    | there are approach-channel,                                         | method-unknown
            blank f1=parshall-flume -o x.xlsx         | write one capital letter and up to seven capitals or digits: F1     | tag-unclear
            blank F1=parshall-flume F1=parshall-flume | the tag F1 is given twice                                           | tag-twice
            blank F1=parshall-flume --units metric    | --units is SI (metres, m3/s) or US (feet, ft3/s), not "metric"      | units-unknown
            """)
    void aSlipIsAnsweredWithWhatWasMeant(String line, String answer, String code) {
        String[] args = line.split(" ");
        boolean writes = line.startsWith("blank") && line.contains("--units");
        Said said = nappe(Stream.concat(Stream.of(args), writes ? Stream.of("-o", "x.xlsx") : Stream.empty())
                .toArray());
        assertThat(said.status()).isEqualTo(ExitStatus.WRONG_USAGE);
        assertThat(said.err()).contains(answer, "(fault: " + code + ")", "--help");
        assertThat(said.out()).isEmpty();
    }

    @Test
    void aFileThatIsNotThereIsAnsweredWithTheOneThatWasMeant() throws IOException {
        SampleStations.weir().save(folder.resolve("return-weir.xlsx"));
        for (String typed : List.of("retrun-weir.xlsx", "return-weir", "return-weir.csv")) {
            Said said = nappe("inspect", folder.resolve(typed));
            assertThat(said.status()).isEqualTo(ExitStatus.INPUT_REFUSED);
            assertThat(said.err()).contains("did you mean return-weir.xlsx?", "(fault: file-missing)");
        }
        Path csv = Files.writeString(folder.resolve("flows.csv"), "a,b\n");
        assertThat(nappe("issue", csv).err()).contains("it looks like a CSV file", "saved as .xlsx");
        assertThat(nappe("inspect", folder).err()).contains("this is a folder");
    }

    @Test
    void aWorkbookInPlaceOfCheckValuesIsOneFault() throws IOException {
        Path workbook = SampleStations.weir().save(folder.resolve("return-weir.xlsx"));
        Said said = nappe("verify", workbook);
        assertThat(said.status()).isEqualTo(ExitStatus.INPUT_REFUSED);
        assertThat(said.err()).contains("this is a workbook", "save what it holds as plain text", "1 fault;");
    }
}
