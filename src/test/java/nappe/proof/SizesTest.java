package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Sheet;
import nappe.formula.Value;
import nappe.method.MethodLibrary;
import nappe.proof.Typing.Entry;
import nappe.results.Results;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The comparison of standard sizes in a package: which sizes, which is chosen, what fails. */
class SizesTest {
    private static final List<String> SIZES = new MethodLibrary(new BuiltInLibrary())
            .declared("parshall-flume")
            .get(0)
            .words();

    private static Package headworks() {
        return Package.ofSample("headworks.xlsx");
    }

    private static final Map<String, Package> WITH = new HashMap<>();

    /** The sample issued with another size, made once. */
    private static Package with(Object size) {
        return WITH.computeIfAbsent(
                String.valueOf(size),
                key -> Package.of(new Entry("F1", "size", size).in(headworks().design(), headworks())));
    }

    private static Sheet sheet(Results results, String name) {
        return results.sheets().stream()
                .filter(s -> s.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    private static List<Block.Table> tables(Results results, String name) {
        return sheet(results, name).blocks().stream()
                .filter(Block.Table.class::isInstance)
                .map(Block.Table.class::cast)
                .toList();
    }

    /** The rows of a table as shown, by head. */
    private static List<Map<String, String>> rows(Results results, Block.Table table) {
        List<Map<String, String>> rows = new ArrayList<>();
        for (Block.Row row : table.rows()) {
            Map<String, String> shown = new LinkedHashMap<>();
            for (int i = 0; i < row.items().size(); i++) {
                shown.put(
                        table.columns().get(i).head(),
                        shown(results, row.items().get(i)));
            }
            rows.add(shown);
        }
        return rows;
    }

    private static String shown(Results results, Block.Item item) {
        if (item instanceof Block.Content content) {
            Value value = results.value(content.cell());
            return value instanceof Value.Number number
                    ? Double.toString(number.value())
                    : value instanceof Value.Word word ? word.text() : ((Value.None) value).why();
        }
        return item instanceof Block.Text text ? text.text() : "";
    }

    private static List<Map<String, String>> compared(Package p) {
        return rows(p.results(), tables(p.results(), "F1 sizes").get(0));
    }

    private static List<Map<String, String>> failing(Package p) {
        return rows(p.results(), tables(p.results(), "F1 size reruns").get(0));
    }

    private static List<String> chosen(List<Map<String, String>> rows) {
        return rows.stream()
                .filter(row -> row.get("Chosen").equals("chosen"))
                .map(row -> row.get("size"))
                .toList();
    }

    @Test
    void everySizeStandsOnceInTheOrderOfTheTable() {
        for (List<Map<String, String>> rows : List.of(compared(headworks()), failing(headworks()))) {
            assertThat(rows.stream().map(row -> row.get("size"))).isEqualTo(SIZES);
        }
        assertThat(SIZES).doesNotHaveDuplicates().hasSizeGreaterThan(30);
    }

    @ParameterizedTest
    @ValueSource(strings = {"1 in", "3 ft", "2.4 m"})
    void theMarkIsWithTheSizeTyped(String size) {
        Package p = with(size);
        assertThat(chosen(compared(p))).containsExactly(size);
        assertThat(chosen(failing(p))).containsExactly(size);
    }

    @Test
    void aSizeThatIsNotGivenOrInNoTableIsMarkedNowhere() {
        for (Object size : new Object[] {null, "11 ft"}) {
            Package p = with(size);
            assertThat(chosen(compared(p))).isEmpty();
            assertThat(chosen(failing(p))).isEmpty();
            assertThat(failing(p)).isEqualTo(unmarked(failing(headworks())));
        }
    }

    private static List<Map<String, String>> unmarked(List<Map<String, String>> rows) {
        rows.forEach(row -> row.put("Chosen", "-"));
        return rows;
    }

    private static String name(Map<String, String> limit) {
        return limit.get("Element") + " " + limit.get("Limit");
    }

    /** What the table says of a size is what the summary of limits says in a package issued with that size. */
    @ParameterizedTest
    @ValueSource(strings = {"1 in", "3 ft", "8 ft", "0.45 m"})
    void whatFailsIsWhatFailsInAPackageIssuedWithTheSize(String size) {
        Map<String, String> row = failing(headworks()).get(SIZES.indexOf(size));
        Package anew = with(size);
        List<String> names =
                anew.design().cases().stream().map(Design.FlowCase::name).toList();
        List<Map<String, String>> limits =
                rows(anew.results(), tables(anew.results(), "Limits").get(1));
        List<String> notMet = new ArrayList<>();
        List<String> noResult = new ArrayList<>();
        for (Map<String, String> limit : limits) {
            List<String> verdicts = names.stream().map(limit::get).toList();
            if (verdicts.contains("not met")) {
                notMet.add(name(limit));
            } else if (verdicts.contains("no result")) {
                noResult.add(name(limit));
            }
        }
        assertThat(row.get("Limits not met")).isEqualTo(notMet.size() + ".0");
        assertThat(row.get("without result")).isEqualTo(noResult.size() + ".0");
        List<String> all = Stream.concat(notMet.stream(), noResult.stream()).toList();
        assertThat(row.get("Fits")).isEqualTo(all.isEmpty() ? "yes" : "no");
        String words = row.get("Which limits, in which cases");
        List<String> named = all.subList(0, Math.min(3, all.size()));
        named.forEach(limit -> {
            assertThat(words).contains(limit + " (");
            String after = words.substring(words.indexOf(limit + " ("));
            String numbers = after.substring(after.indexOf("(", limit.length()) + 1, after.indexOf(")"));
            boolean isNotMet = notMet.contains(limit);
            assertThat(numbers.startsWith("no result, ")).isEqualTo(!isNotMet);
            Map<String, String> of = limits.stream()
                    .filter(one -> name(one).equals(limit))
                    .findFirst()
                    .orElseThrow();
            for (int c = 0; c < names.size(); c++) {
                assertThat(inRuns(numbers, c + 1))
                        .as(limit + " in case " + (c + 1) + ": " + numbers)
                        .isEqualTo(of.get(names.get(c)).equals(isNotMet ? "not met" : "no result"));
            }
        });
        assertThat(words.endsWith("; and " + (all.size() - 3) + " more")).isEqualTo(all.size() > 3);
    }

    /** Whether a number is among runs such as "cases 1 to 3, 5". */
    private static boolean inRuns(String runs, int number) {
        for (String run :
                runs.replace("no result, ", "").replaceAll("cases? ", "").split(", ")) {
            String[] ends = run.split(" to ");
            if (number >= Integer.parseInt(ends[0]) && number <= Integer.parseInt(ends[ends.length - 1])) {
                return true;
            }
        }
        return false;
    }

    @Test
    void theReasonIsPrintedOrThatThereIsNone() {
        String reason = headworks().design().element("F1").typed().get("size").source();
        assertThat(reason).isNotBlank();
        assertThat(notes(headworks(), "F1 sizes")).contains("Reason given for the choice: " + reason);
        Design design = headworks().design();
        Design blank = design.withElements(design.elements().stream()
                .map(e -> {
                    Map<String, Design.Typed> typed = new LinkedHashMap<>(e.typed());
                    typed.computeIfPresent(
                            "size", (k, t) -> new Design.Typed(t.value(), t.unit(), " ", t.standing(), t.origin()));
                    return new Design.Element(e.tag(), e.title(), e.method(), typed);
                })
                .toList());
        assertThat(notes(Package.of(blank), "F1 sizes")).contains("Reason given for the choice: none given");
    }

    @Test
    void theEntryToTypeIsNamed() {
        Cell entry = headworks().results().cells().stream()
                .filter(c -> c.kind() == Cell.Kind.ENTRY && c.symbol().equals("size"))
                .findFirst()
                .orElseThrow();
        assertThat(notes(headworks(), "F1 size reruns"))
                .anyMatch(note ->
                        note.contains("type its size into cell " + entry.place().address() + " of sheet Entries"));
    }

    private static List<String> notes(Package p, String name) {
        return sheet(p.results(), name).blocks().stream()
                .filter(Block.Note.class::isInstance)
                .map(block -> ((Block.Note) block).text())
                .toList();
    }

    /** Only what reruns found is not live; the comparison by the lines is, all of it. */
    @Test
    void onlyOneSheetHoldsWhatRerunsFound() {
        assertThat(headworks().results().cells())
                .filteredOn(
                        c -> c.kind() == Cell.Kind.RERUN && !c.place().sheet().equals("Found"))
                .hasSize(4 * SIZES.size())
                .allMatch(c -> c.place().sheet().equals("F1 size reruns"));
    }

    @Test
    void theGridStaysUnderItsBudget() {
        assertThat(headworks().results().cells().stream()
                        .filter(c -> c.place().sheet().startsWith("F1 size"))
                        .count())
                .isBetween(1000L, 3000L);
    }

    @Test
    void anElementWithoutTheStatementHasNoSuchSheet() {
        assertThat(Package.ofSample("return-weir.xlsx").results().sheets())
                .noneMatch(sheet -> sheet.name().contains("size"));
    }
}
