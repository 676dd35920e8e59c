package nappe.job;

import static nappe.job.Designs.flowCase;
import static nappe.job.Designs.number;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import nappe.calculation.Cell;
import nappe.calculation.ElementSheet.LimitResult;
import nappe.formula.Value;
import nappe.input.InputReader;
import nappe.method.MethodLibrary;
import nappe.method.Texts;
import nappe.solve.Evaluation;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;
import nappe.station.FoundCase;
import nappe.station.FoundFlows;
import nappe.station.FoundFlows.NotReached;
import nappe.station.StationLayout;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The flows at which limits are first reached, on an invented sill whose turns are known by hand. */
class FlowSearchTest {
    private static final String HEAD = """
            method Pretend sill
            source INV ; An invented book
            entry  z_f ; m ; level of the sill ; any sign
            case   Q = flow ; m3/s ; flow ; not negative
            take   z_t = water level ; m ; level downstream ; any sign
            line   q = Q/1 m3/s ; 1 ; flow as a number
            line   h = sqrt(q)*1 m ; m ; head
            """;
    private static final String FREE = """
            line   t = max(z_t - z_f, 0 m) ; m ; tailwater above the sill
            line   t_x = 0.8*h ; m ; tailwater at which free flow is lost
            limit  t <= t_x scale 1 m ; sill is free ; INV p. 1
            """;

    @Test
    void aFixedLevelDrownsTheLowFlows() {
        FoundFlows found = search(FREE, flowCase("River", 0.3, 1.2));
        assertThat(found.cases()).hasSize(1);
        FoundCase one = found.cases().get(0);
        assertThat(one.flow()).isCloseTo(0.0625, within(1e-9));
        assertThat(one.metBelow()).isFalse();
        assertThat(one.jump()).isFalse();
        assertThat(one.conditions()).isEqualTo("level of: River");
        assertThat(found.notReached()).isEmpty();
    }

    @Test
    void everyDistinctLevelHasItsTurnAndTheSameLevelOne() {
        FoundFlows found =
                search(FREE, flowCase("A", 0.3, 1.2), flowCase("B", 0.4, 1.4), flowCase("C", 0.5, 1.2), dry("D"));
        assertThat(found.cases()).extracting(FoundCase::conditions).containsExactly("level of: A; C", "level of: B");
        assertThat(found.cases().get(1).flow()).isCloseTo(0.25, within(1e-9));
        assertThat(found.notReached())
                .containsExactly(new NotReached("S1", "sill is free", "level of: D", "met throughout"));
    }

    @Test
    void aTurnThatDoesNotRestOnTheLevelIsGivenOnce() {
        FoundFlows found =
                search("limit h <= 1 m ; head in range ; INV p. 2\n", flowCase("A", 0.3, 1.2), flowCase("B", 0.4, 1.4));
        assertThat(found.cases()).hasSize(1);
        assertThat(found.cases().get(0).conditions()).isEqualTo("every level of the cases");
        assertThat(found.cases().get(0).flow()).isCloseTo(1, within(1e-8));
        assertThat(found.cases().get(0).metBelow()).isTrue();
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.7, 0.5, 0.31, 0.301, 0.30003})
    void twoTurnsOfOneLimitAreFoundHoweverCloseTheyAre(double second) {
        FoundFlows found = search(
                "line k = (q - 0.3)*(q - " + second + ") ; 1 ; below nought between two flows\n"
                        + "limit 0 <= k scale 1 ; not between ; INV p. 3\n",
                flowCase("A", 0.1, 1.2),
                flowCase("B", 0.9, 1.2));
        // at a plain nought the verdict has no tolerance, and the flow is as exact as the slope of k lets the margin be
        double exact = 1e-10 / (second - 0.3) * 1.5;
        assertThat(found.cases()).extracting(FoundCase::metBelow).containsExactly(true, false);
        assertThat(found.cases().get(0).flow()).isCloseTo(0.3, within(exact));
        assertThat(found.cases().get(1).flow()).isCloseTo(second, within(exact));
    }

    @Test
    void aJumpIsToldAsAJumpAndNotAsAZero() {
        String text = """
                line   c = if(Q <= 0.2 m3/s, 1, 2) ; 1 ; a number that jumps
                limit  c <= 1.5 ; before the jump ; INV p. 4
                """;
        FoundFlows found = search(text, flowCase("A", 0.1, 1.2));
        assertThat(found.cases()).hasSize(1);
        FoundCase one = found.cases().get(0);
        assertThat(one.jump()).isTrue();
        assertThat(one.metBelow()).isTrue();
        assertThat(one.flow()).isBetween(0.2, 0.2 * (1 + 1e-6));
        assertThat(marginAt(text, one)).isCloseTo(-1 / 3.0, within(1e-12));
        assertThat(verdictAt(text, one, one.flow() * (1 - 1e-6))).isEqualTo("met");
        assertThat(verdictAt(text, one, one.flow())).isEqualTo("not met");
    }

    @Test
    void aLimitThatIsMetThroughoutOrNowhereHasNoCase() {
        FoundFlows found = search("""
                limit  0 m <= h scale 1 m ; always ; INV p. 5
                limit  h <= -1 m scale 1 m ; never ; INV p. 5
                limit  h <= 1 m when Q < 0 m3/s ; applies nowhere ; INV p. 5
                """, flowCase("A", 0.1, 1.2));
        assertThat(found.cases()).isEmpty();
        assertThat(found.notReached())
                .extracting(NotReached::label, NotReached::outcome)
                .containsExactly(
                        org.assertj.core.groups.Tuple.tuple("always", "met throughout"),
                        org.assertj.core.groups.Tuple.tuple("never", "not met throughout"),
                        org.assertj.core.groups.Tuple.tuple(
                                "applies nowhere", "no verdict at any flow: does not apply, not given or no result"));
        assertThat(found.notes().get(0)).startsWith("Flows searched: from 0.005000 m3/s (5.000 L/s) to 0.4000 m3/s");
    }

    @Test
    void aTurnLostInAStretchWithoutVerdictIsToldInWords() {
        FoundFlows found = search(
                "limit h <= 0.5 m when Q < 0.1 m3/s or Q > 0.4 m3/s ; outside of the stretch ; INV p. 6\n",
                flowCase("A", 0.2, 1.2));
        assertThat(found.cases()).isEmpty();
        assertThat(found.notReached()).hasSize(1);
        assertThat(found.notReached().get(0).outcome())
                .startsWith("met at 0.09")
                .contains("not met at 0.4")
                .endsWith("without a verdict between");
    }

    @Test
    void aFlowTypedJustAtALimitIsTheFlowFound() {
        FoundFlows found = search("limit Q <= 0.2 m3/s ; rated ; INV p. 7\n", flowCase("A", 0.2, 1.2));
        assertThat(found.cases()).extracting(FoundCase::flow).containsExactly(0.2);
    }

    @Test
    void theEndOfARatingFarFromTheTypedFlowsIsSearchedToo() {
        FoundFlows found = search("""
                free   y ; m ; head of the table
                line   Q_y = (y/1 m)^2*1 m3/s ; m3/s ; flow of the table
                rating y from 1 m to 3 m steps 4 : Q_y
                limit  Q <= 9 m3/s ; rated ; INV p. 7
                """, flowCase("A", 0.2, 1.2));
        assertThat(found.cases()).hasSize(1);
        assertThat(found.cases().get(0).flow()).isCloseTo(9, within(1e-8));
    }

    @Test
    void onlySoManyAreLaidAndTheOthersAreCounted() {
        List<Design.FlowCase> cases = new ArrayList<>();
        for (int i = 1; i <= 45; i++) {
            cases.add(flowCase("Level " + i, i <= 20 ? 0.02 : 0.3, 1 + (i + 2) * 0.01));
        }
        FoundFlows found = search(FREE, cases.toArray(new Design.FlowCase[0]));
        assertThat(found.cases()).hasSize(FlowSearch.MOST_CASES);
        assertThat(found.notes()).anyMatch(note -> note.startsWith("Cut off: 45 flows were found; the 40 "));
        // those within the range typed come first: the five left out lie outside of it, below or above
        assertThat(found.cases())
                .filteredOn(one -> one.flow() >= 0.02 && one.flow() <= 0.3)
                .hasSize(32);
    }

    @Test
    void withoutAFlowNothingIsSearched() {
        FoundFlows found = search(FREE, flowCase("None", 0, 1.2));
        assertThat(found.cases()).isEmpty();
        assertThat(found.notes()).containsExactly("No flow above nought was typed: nothing was searched.");
    }

    @Test
    void whatACaseSumsUpOverTheCasesDoesNotRestOnTheFlowsTried() {
        String text = """
                line   h_m = highest(h) ; m ; highest head of the cases
                line   d = h_m - h ; m ; under the highest
                limit  0 m <= d scale 1 m ; under the highest head ; INV p. 8
                """;
        FoundFlows found = search(text, flowCase("A", 0.2, 1.2), flowCase("B", 0.49, 1.2));
        assertThat(found.cases()).hasSize(1);
        assertThat(found.cases().get(0).flow()).isCloseTo(0.49, within(1e-8));
    }

    /** The curve rises with the flow as Q, what the head lets it be only as the root of Q: drowned at high flow. */
    @Test
    void onATailwaterCurveFreeFlowIsLostAtHighFlowAndThePackageShowsIt() {
        Design typed = design(flowCase("River", 0.3, 1.2), blank("Curve", 0.2));
        Design design = new Design(
                typed.project(),
                typed.elements(),
                typed.cases(),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of(
                        new Design.LevelPair(number(0, "m3/s"), number(1, "m")),
                        new Design.LevelPair(number(1, "m3/s"), number(2, "m"))));
        MethodLibrary methods = library(FREE);
        Job.Done done = new Job(methods, "0.0.0").run(design, List.of());
        assertThat(done.found().cases())
                .extracting(FoundCase::conditions)
                .containsExactly("level of: River", "tailwater curve");
        FoundCase one = done.found().cases().get(1);
        assertThat(one.flow()).isCloseTo(0.64, within(1e-8));
        assertThat(one.metBelow()).isTrue();
        assertThat(done.results().cells())
                .filteredOn(
                        cell -> cell.kind() == Cell.Kind.RERUN && cell.symbol().equals("Q"))
                .hasSize(2)
                .allMatch(cell -> cell.place().sheet().equals("Found"));
        assertThat(done.results().cells())
                .filteredOn(cell -> cell.place().sheet().equals("Found")
                        && cell.place().column() == 4
                        && cell.kind() == Cell.Kind.FORMULA
                        && cell.place().row() > 14)
                .hasSize(2)
                .allMatch(cell ->
                        done.results().value(cell) instanceof Value.Number margin && Math.abs(margin.value()) <= 1e-9);
    }

    private static Design.FlowCase blank(String name, double flow) {
        return new Design.FlowCase(
                name,
                "1 h",
                "2030",
                number(flow, "m3/s"),
                Designs.typed(new Value.None(Value.NOT_GIVEN), "m"),
                "",
                Map.of());
    }

    /** Just below a flow found, the flow itself, just above. */
    private static final List<Double> SHARES = List.of(1 - 1e-6, 1.0, 1 + 1e-6);

    /** All in one station, since no trial rests on another. */
    @ParameterizedTest
    @MethodSource("nappe.input.SampleStations#names")
    void atEachFlowFoundTheMarginIsZeroAndBesideItTheVerdictTurns(String sample) {
        MethodLibrary methods = new MethodLibrary(new BuiltInLibrary());
        Design design = InputReader.read(Path.of("sample-inputs", sample), methods);
        FoundFlows found = FlowSearch.of(design, methods::sheet);
        assertThat(found.cases()).hasSizeGreaterThanOrEqualTo(2);
        List<FoundCase> beside = found.cases().stream()
                .flatMap(one -> SHARES.stream().map(share -> FoundCase.trial(one.condition(), one.flow() * share)))
                .toList();
        StationLayout whole = StationLayout.bare(design, methods::sheet, beside);
        Map<Cell, Value> values = Evaluation.of(whole.allCells());
        for (int i = 0; i < found.cases().size(); i++) {
            FoundCase one = found.cases().get(i);
            LimitResult limit = whole.limits().get(one.limit());
            int below = limit.verdicts().size() - beside.size() + i * SHARES.size();
            assertThat(one.jump()).isFalse();
            Value margin = values.get(limit.margins().get(below + 1));
            assertThat(((Value.Number) margin).value()).as(one.label()).isBetween(-1e-9, 1e-9);
            assertThat(List.of(
                            values.get(limit.verdicts().get(below)),
                            values.get(limit.verdicts().get(below + 2))))
                    .as(one.label())
                    .containsExactly(
                            Value.word(one.metBelow() ? "met" : "not met"),
                            Value.word(one.metBelow() ? "not met" : "met"));
        }
    }

    @Test
    void aTrialIsTheWholeCalculationWithThatFlow() {
        MethodLibrary methods = new MethodLibrary(new BuiltInLibrary());
        Design design = Designs.weirBelowFlume(1.6, flowCase("Low", 0.02, 0.5), flowCase("High", 0.1, 0.6));
        List<FoundCase.Condition> both = List.of(new FoundCase.Condition(0, 0), new FoundCase.Condition(1, 1));
        TrialFlows trials = new TrialFlows(design, methods::sheet, both);
        for (double flow : List.of(0.003, 0.05, 0.4)) {
            StationLayout whole =
                    StationLayout.bare(design, methods::sheet, List.of(FoundCase.trial(both.get(1), flow)));
            Map<Cell, Value> values = Evaluation.of(whole.allCells());
            List<TrialFlows.Judged> judged = trials.at(1, flow);
            for (int i = 0; i < judged.size(); i++) {
                LimitResult limit = whole.limits().get(trials.limits().get(i));
                Value margin = values.get(limit.margins().get(2));
                assertThat(judged.get(i).margin())
                        .isEqualTo(margin instanceof Value.Number number ? number.value() : null);
            }
        }
    }

    private static Design.FlowCase dry(String name) {
        return flowCase(name, 0.2, 0.5);
    }

    private static MethodLibrary library(String text) {
        return new MethodLibrary(new Texts().method("sill", HEAD + text));
    }

    private static Design design(Design.FlowCase... cases) {
        return Designs.design(
                List.of(new Design.Element("S1", "", "sill", Map.of("z_f", number(1, "m")))), List.of(cases));
    }

    private static FoundFlows search(String text, Design.FlowCase... cases) {
        return FlowSearch.of(design(cases), library(text)::sheet);
    }

    private static double marginAt(String text, FoundCase one) {
        return margin(library(text), design(flowCase("A", 0.1, 1.2)), one, one.flow());
    }

    private static String verdictAt(String text, FoundCase one, double flow) {
        return verdict(library(text), design(flowCase("A", 0.1, 1.2)), one, flow);
    }

    private static double margin(MethodLibrary methods, Design design, FoundCase one, double flow) {
        StationLayout whole =
                StationLayout.bare(design, methods::sheet, List.of(FoundCase.trial(one.condition(), flow)));
        LimitResult limit = whole.limits().get(one.limit());
        Cell margin = limit.margins().get(limit.margins().size() - 1);
        return ((Value.Number) Evaluation.of(whole.allCells()).get(margin)).value();
    }

    private static String verdict(MethodLibrary methods, Design design, FoundCase one, double flow) {
        StationLayout whole =
                StationLayout.bare(design, methods::sheet, List.of(FoundCase.trial(one.condition(), flow)));
        List<Cell> verdicts = whole.limits().get(one.limit()).verdicts();
        return ((Value.Word) Evaluation.of(whole.allCells()).get(verdicts.get(verdicts.size() - 1))).text();
    }
}
