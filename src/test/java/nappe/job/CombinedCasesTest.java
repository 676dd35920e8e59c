package nappe.job;

import static nappe.job.Designs.combination;
import static nappe.job.Designs.flowCase;
import static nappe.job.Designs.number;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Sheet;
import nappe.deliver.xlsx.Recalculated;
import nappe.deliver.xlsx.Spoiler;
import nappe.deliver.xlsx.XlsxDelivery;
import nappe.formula.Value;
import nappe.method.MethodLibrary;
import nappe.results.Results;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Units in service, levels from the tailwater curve, combinations, demands in one case: what comes of them. */
class CombinedCasesTest {
    private static final Job JOB = new Job(new MethodLibrary(new BuiltInLibrary()), "0.1.0");
    private static final Value NO_RESULT = new Value.None(Value.NO_RESULT);

    private static final Design.FlowCase LOW = flowCase("Low", 0.02, 0.5);
    private static final Design.FlowCase HIGH = flowCase("High", 0.1, 0.6);
    private static final Design.FlowCase FLOOD = flowCase("Flood", 0.05, 1.19);

    @TempDir
    Path folder;

    private static Design of(Design.FlowCase... cases) {
        return Designs.weirBelowFlume(1.6, cases);
    }

    private static Design.FlowCase blank(String name, double flow) {
        Design.FlowCase one = flowCase(name, flow, 0);
        Design.Typed none = Designs.typed(new Value.None(Value.NOT_GIVEN), "m");
        return new Design.FlowCase(name, one.period(), one.year(), one.flow(), none, "", Map.of());
    }

    private static List<Design.LevelPair> curve() {
        return List.of(
                new Design.LevelPair(number(20, "L/s"), number(400, "mm")),
                new Design.LevelPair(number(0.05, "m3/s"), number(0.7, "m")),
                new Design.LevelPair(number(0.1, "m3/s"), number(0.7, "m")),
                new Design.LevelPair(number(720, "m3/h"), number(0.9, "m")));
    }

    private static Results run(Design design) {
        return JOB.run(design, List.of()).results();
    }

    /** The values of a symbol on the sheet of an element, one per column. */
    private static List<Value> values(Results results, String tag, String symbol) {
        return lines(results, tag).stream()
                .filter(line -> line.symbol().equals(symbol))
                .findFirst()
                .orElseThrow()
                .perCase()
                .stream()
                .map(results::value)
                .toList();
    }

    private static List<Block.Line> lines(Results results, String tag) {
        List<Block.Line> lines = new ArrayList<>();
        for (Block block : sheet(results, tag).blocks()) {
            if (block instanceof Block.Lines of) {
                lines.addAll(of.lines());
            }
        }
        return lines;
    }

    private static List<List<Value>> everyLine(Results results, String tag, int column) {
        return lines(results, tag).stream()
                .filter(line -> line.perCase().size() > column)
                .map(line -> List.of(results.value(line.perCase().get(column))))
                .toList();
    }

    private static Sheet sheet(Results results, String name) {
        return results.sheets().stream()
                .filter(sheet -> sheet.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    private static Block.Table table(Results results, String sheet, String title) {
        return sheet(results, sheet).blocks().stream()
                .filter(block ->
                        block instanceof Block.Table table && table.title().startsWith(title))
                .map(Block.Table.class::cast)
                .findFirst()
                .orElseThrow();
    }

    /** What stands in a table, a row by its first words. */
    private static List<String> row(Results results, Block.Table table, String first) {
        return table.rows().stream()
                .map(row ->
                        row.items().stream().map(item -> shown(results, item)).toList())
                .filter(row -> row.get(0).equals(first))
                .findFirst()
                .orElseThrow();
    }

    private static String shown(Results results, Block.Item item) {
        if (item instanceof Block.Content content) {
            Value value = results.value(content.cell());
            return value instanceof Value.Number number
                    ? Double.toString(number.value())
                    : value instanceof Value.Word word ? word.text() : ((Value.None) value).why();
        }
        return item instanceof Block.Text text ? text.text() : item instanceof Block.Jump jump ? jump.text() : "?";
    }

    private static int column(Block.Table table, String head) {
        for (int i = 0; i < table.columns().size(); i++) {
            if (table.columns().get(i).head().equals(head)) {
                return i;
            }
        }
        throw new AssertionError(head);
    }

    private static double numberOf(Value value) {
        assertThat(value).isInstanceOf(Value.Number.class);
        return ((Value.Number) value).value();
    }

    @Test
    void aCombinationIsLikeACaseTypedWithThatFlowAndLevel() {
        Results results = run(Designs.combined(
                of(LOW, FLOOD),
                List.of(
                        combination("Never", "Flood", "Low", false, "invented"),
                        combination("Both", "Low", "Flood", true, "invented")),
                List.of()));
        Results typed = run(of(LOW, FLOOD, flowCase("Both", 0.02, 1.19), flowCase("Never", 0.05, 0.5)));
        for (String tag : List.of("W1", "F1")) {
            assertThat(everyLine(results, tag, 2)).hasSizeGreaterThan(20).isEqualTo(everyLine(typed, tag, 2));
            assertThat(everyLine(results, tag, 3)).isEqualTo(everyLine(typed, tag, 3));
        }
    }

    @Test
    void onlyWhatCanCoincideCountsInTheSummary() {
        Design twoCases = of(LOW, HIGH);
        Design drowned = of(LOW, FLOOD);
        Design.Combination flood = combination("Both", "Low", "Flood", true, "invented");
        Design.Combination never = combination("Both", "Low", "Flood", false, "invented");
        assertThat(notMet(run(twoCases))).isZero();
        long alone = notMet(run(drowned));
        assertThat(notMet(run(Designs.combined(drowned, List.of(never), List.of()))))
                .isEqualTo(alone);
        assertThat(notMet(run(Designs.combined(drowned, List.of(flood), List.of()))))
                .isGreaterThan(alone);
    }

    /** All cases in which limits are not met, as the summary counts them. */
    private static long notMet(Results results) {
        Block.Table table = table(results, "Limits", "Limits, the worst first");
        int count = column(table, "Cases not met");
        return (long) table.rows().stream()
                .mapToDouble(
                        row -> Double.parseDouble(shown(results, row.items().get(count))))
                .sum();
    }

    @Test
    void theSheetOfCombinationsSaysWhatIsNotMetInEach() {
        Results results = run(Designs.combined(
                of(LOW, FLOOD),
                List.of(
                        combination("Both", "Low", "Flood", true, "invented study"),
                        combination("Never", "Flood", "Low", false, "invented letter")),
                List.of()));
        Block.Table said = table(results, "Combinations", "What is combined");
        assertThat(row(results, said, "Both"))
                .containsExactly("Both", "Low", "Flood", "yes", "judged", "invented study");
        assertThat(row(results, said, "Never")).contains("no", "not judged", "invented letter");
        Block.Table found = table(results, "Combinations", "Flow, level");
        List<String> both = row(results, found, "Both");
        assertThat(both.get(column(found, "Q [m3/s]"))).isEqualTo("0.02");
        assertThat(both.get(column(found, "Level [m]"))).isEqualTo("1.19");
        List<String> verdicts = lines(results, "W1").stream()
                .filter(line -> line.kind() == Block.LineKind.LIMIT_VERDICT
                        && line.perCase().size() > 2)
                .filter(line -> results.value(line.perCase().get(2)).equals(Value.word("not met")))
                .map(Block.Line::description)
                .toList();
        assertThat(verdicts).isNotEmpty();
        assertThat(both.get(column(found, "The first of them"))).isEqualTo("W1  " + verdicts.get(0));
        List<String> never = row(results, found, "Never");
        assertThat(never.get(column(found, "Limits not met"))).isEqualTo("0.0");
        assertThat(never.get(column(found, "The first of them"))).isEqualTo("none");
        assertThat(row(results, table(results, "Combinations", "Flows down"), "Low"))
                .containsExactly("Low", "Both", "the case itself");
        assertThat(sheet(run(of(LOW)), "Cases")).isNotNull();
        assertThat(run(of(LOW)).sheets()).extracting(Sheet::name).doesNotContain("Combinations", "Years");
    }

    @Test
    void aLevelFromTheCurveLiesStraightBetweenItsRows() {
        Design.FlowCase typed = flowCase("Typed", 0.03, 0.55);
        List<Value> levels = values(
                run(Designs.combined(
                        of(
                                blank("In the first step", 0.03),
                                blank("On a row", 0.05),
                                blank("Level", 0.07),
                                blank("At the end", 0.2),
                                blank("At the start", 0.02),
                                typed),
                        List.of(combination("Both", "Typed", "At the end", true, "invented")),
                        curve())),
                "W1",
                "z_t");
        // by hand: 0.4 + (0.03 - 0.02)/(0.05 - 0.02)*(0.7 - 0.4) = 0.5 m
        double[] byHand = {0.5, 0.7, 0.7, 0.9, 0.4, 0.55, 0.9};
        assertThat(levels).hasSize(byHand.length);
        for (int i = 0; i < byHand.length; i++) {
            assertThat(numberOf(levels.get(i))).as("column " + i).isCloseTo(byHand[i], within(1e-12));
        }
    }

    @Test
    void beyondTheEndsOfTheCurveThereIsNoResultUnlessALevelIsTyped() {
        Results results = run(Designs.combined(
                of(blank("Under", 0.0199), blank("Over", 0.2001), flowCase("Typed", 0.0199, 0.3)), List.of(), curve()));
        assertThat(values(results, "W1", "z_t")).containsExactly(NO_RESULT, NO_RESULT, Value.of(0.3));
        Block.Table table = table(results, "Cases", "Water level of each case");
        int which = column(table, "Level used is");
        assertThat(row(results, table, "Under").get(which)).isEqualTo("not on the curve");
        assertThat(row(results, table, "Typed").get(which)).isEqualTo("as typed");
    }

    @Test
    void aDemandInOneCaseIsJudgedThereAlone() {
        Design.Demand demand = demand("Both");
        Results results = run(Designs.withDemands(
                Designs.combined(
                        of(LOW, HIGH), List.of(combination("Both", "High", "Low", true, "invented")), List.of()),
                List.of(demand, demand("low".toUpperCase(java.util.Locale.ROOT)))));
        List<Block.Line> verdicts = lines(results, "F1").stream()
                .filter(line -> line.kind() == Block.LineKind.LIMIT_VERDICT
                        && line.description().startsWith("pretend"))
                .toList();
        assertThat(verdicts).hasSize(2);
        Value idle = Value.word("does not apply");
        assertThat(verdicts.get(0).perCase().stream().map(results::value))
                .containsExactly(idle, idle, Value.word("not met"));
        assertThat(verdicts.get(1).perCase().stream().map(results::value))
                .containsExactly(Value.word("not met"), idle, idle);
        Block.Table summary = table(results, "Limits", "Limits, the worst first");
        List<String> worst = summary.rows().get(0).items().stream()
                .map(item -> shown(results, item))
                .toList();
        assertThat(worst.get(column(summary, "Limit"))).isEqualTo("pretend (in case Both)");
        assertThat(worst.get(column(summary, "in case"))).isEqualTo("Both");
        assertThat(worst.get(column(summary, "Cases not met"))).isEqualTo("1.0");
    }

    private static Design.Demand demand(String inCase) {
        Design.Origin nowhere = new Design.Origin("Demands", "A7");
        return new Design.Demand("F1", "z_u", true, number(1, "m"), "pretend", "invented", nowhere, nowhere, inCase);
    }

    @Test
    void unitsInServiceShareTheFlow() {
        Results results = run(Designs.combined(
                of(Designs.inService(HIGH, 2), LOW),
                List.of(combination("Both", "High", "Low", true, "invented")),
                List.of()));
        Block.Table flows = table(results, "Cases", "Flows");
        int one = column(flows, "Q, one [m3/s]");
        assertThat(row(results, flows, "High").get(one)).isEqualTo("0.05");
        assertThat(row(results, flows, "Low").get(one)).isEqualTo("0.02");
        Block.Table both = table(results, "Cases", "Combinations");
        assertThat(row(results, both, "Both").get(column(both, "Q, one [m3/s]")))
                .isEqualTo("0.05");
        assertThat(row(results, both, "Both").get(column(both, "Units in service")))
                .isEqualTo("2.0");
    }

    @Test
    void designYearsOfOneAveragingPeriodStandSideBySide() {
        Design.FlowCase later = new Design.FlowCase(
                "Later", "1 h", "2050", number(0.15, "m3/s"), number(2, "1"), number(0.6, "m"), "", Map.of());
        Design.FlowCase day =
                new Design.FlowCase("Day", "1 d", "2050", number(0.1, "m3/s"), number(0.6, "m"), "", Map.of());
        Results results = run(of(later, day, LOW));
        Block.Table table = table(results, "Years", "Averaging period: 1 h");
        assertThat(table.columns()).extracting(Block.Column::head).contains("2050: Later", "2030: Low");
        assertThat(row(results, table, "flow through one unit"))
                .containsExactly("flow through one unit", "m3/s", "0.075", "0.02");
        Value head = values(results, "W1", "h_1").get(0);
        assertThat(row(results, table, "W1  head at the gauge").get(2)).isEqualTo(Double.toString(numberOf(head)));
        assertThat(sheet(results, "Years").blocks())
                .anyMatch(
                        block -> block instanceof Block.Note note && note.text().endsWith(": Day."));
    }

    @Test
    void spreadsheetProgramsComputeAllOfItAlike() throws IOException {
        Results results = run(Designs.withDemands(
                Designs.combined(
                        of(
                                Designs.inService(blank("Curve", 0.03), 2),
                                FLOOD,
                                blank("On a row", 0.05),
                                blank("Under", 0.0199),
                                blank("Over", 0.2001)),
                        List.of(
                                combination("Both", "Curve", "Flood", true, "invented"),
                                combination("Never", "Flood", "Curve", false, "invented"),
                                combination("Nothing", "Curve", "Over", true, "invented")),
                        curve()),
                List.of(demand("Both"))));
        Path spoilt = Files.write(folder.resolve("spoilt.xlsx"), Spoiler.spoil(XlsxDelivery.render(results)));
        assertThat(Recalculated.disagreements(Recalculated.byGnumeric(spoilt), results))
                .isEmpty();
        assertThat(Recalculated.disagreements(Recalculated.byLibreOffice(spoilt), results))
                .isEmpty();
    }

    @Test
    void cellsAndFormulasAreTheSameWhateverIsTyped() {
        Results one = run(Designs.combined(of(LOW, blank("High", 0.1)), List.of(), curve()));
        Results other = run(Designs.combined(of(blank("Low", 0.3), HIGH), List.of(), curve()));
        assertThat(described(one)).isEqualTo(described(other));
    }

    private static List<String> described(Results results) {
        return results.cells().stream()
                .map((Cell cell) ->
                        cell + (cell.formula() == null ? "" : " = " + cell.formula() + " " + cell.sureness()))
                .toList();
    }
}
