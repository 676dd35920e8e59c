package nappe.cli;

import static nappe.cli.NappeTest.nappe;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import nappe.formula.Value;
import nappe.job.MethodOverview;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.method.Statement;
import nappe.source.BuiltInLibrary;
import nappe.source.CitedTable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The table of methods, on the screen and in the README. */
class MethodOverviewTest {
    private static final Pattern NUMERAL = Pattern.compile("(?<![A-Za-z_0-9.])\\d+(\\.\\d+)?");

    static List<String> names() {
        return new MethodLibrary(new BuiltInLibrary()).names();
    }

    @Test
    void theReadmeSaysWhatTheProgramSays() throws IOException {
        assertThat(ReadmeMethods.written(Files.readString(ReadmeMethods.README)))
                .as("run ReadmeMethods.main, see DEVELOPERS.md")
                .isEqualTo(ReadmeMethods.table());
    }

    @ParameterizedTest
    @MethodSource("names")
    void everyMethodHasAStandardARangeAndCheckValues(String name) {
        Desk desk = new Desk();
        MethodOverview method = MethodOverview.of(desk.methods(), name, desk.checks());
        assertThat(method.standards()).isNotEmpty().noneMatch(text -> text.startsWith("SI Brochure"));
        assertThat(method.ranges()).isNotEmpty();
        assertThat(method.state()).contains("check value");
        long counted =
                desk.checks().stream().filter(row -> row.method().equals(name)).count();
        assertThat(method.state()).startsWith(counted + " check value");
    }

    /** A number in the words of a range stands somewhere in what is calculated, or counts the rows of a table. */
    @ParameterizedTest
    @MethodSource("names")
    void noNumberIsOnlyInTheWordsOfARange(String name) {
        MethodSheet sheet = new Desk().methods().sheet(name);
        Set<String> known = new TreeSet<>();
        StringBuilder said = new StringBuilder();
        for (Statement statement : Statement.of(name, sheet.text())) {
            if (statement.word().equals("range")) {
                said.append(statement.rest()).append('\n');
            } else if (!Set.of("about", "caution", "source").contains(statement.word())) {
                NUMERAL.matcher(statement.rest()).results().forEach(found -> known.add(found.group()));
            }
        }
        sheet.tables().values().forEach(table -> known.addAll(counts(table)));
        assertThat(NUMERAL.matcher(said).results().map(found -> found.group()))
                .allMatch(known::contains, "stands in what is calculated");
    }

    /** How many rows a table has, and how many with each of its words; the numbers in its words. */
    private static Set<String> counts(CitedTable table) {
        Set<String> counts = new TreeSet<>(Set.of(Integer.toString(table.rows())));
        table.columns().stream()
                .flatMap(column -> column.values().stream())
                .filter(Value.Word.class::isInstance)
                .forEach(word -> NUMERAL.matcher(((Value.Word) word).text())
                        .results()
                        .forEach(found -> counts.add(found.group())));
        for (CitedTable.Column column : table.columns()) {
            Map<Value, Long> rows =
                    column.values().stream().collect(Collectors.groupingBy(value -> value, Collectors.counting()));
            rows.values().forEach(count -> counts.add(count.toString()));
        }
        return counts;
    }

    @Test
    void methodsAreToldWithStandardRangeAndState() {
        NappeTest.Said said = nappe("blank", "--methods", "parshall-flume");
        assertThat(said.out())
                .contains(
                        "parshall-flume  Parshall flume", "standards  ", "ISO 9826:1992", "range      ", "state      ")
                .contains("check values: ")
                .doesNotContain("approach-channel");
        assertThat(said.out().lines()).allMatch(line -> line.length() <= 100);
    }

    @Test
    void aRangeFollowsFromTheLimitsWhereTheSheetSaysNone() {
        NappeTest.Said said = nappe("blank", "--methods", "mill-race-weir", "--house", MillRace.HOUSE);
        assertThat(said.out())
                .contains("mill-race-weir  Broad-crested weir with a rounded nose (house method, folder house-example)")
                .contains("least head (h_1 from 0.06 m)", "flow is free: drowning ratio (s_t up to 0.66)")
                .contains("check values of the house: ");
    }

    @Test
    void theListToChooseFromHasEveryMethodInTwoLines() {
        NappeTest.Said said = nappe("blank", "--methods");
        assertThat(said.out().lines()).hasSize(2 * names().size() + 2);
        names().forEach(name -> assertThat(said.out()).contains(name + "  "));
    }
}
