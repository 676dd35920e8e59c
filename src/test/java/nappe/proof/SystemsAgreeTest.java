package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import nappe.input.SampleStations;
import nappe.job.Job;
import nappe.method.MethodException;
import nappe.method.MethodLibrary;
import nappe.results.Results;
import nappe.source.BuiltInLibrary;
import nappe.source.TextLibrary;
import nappe.station.Design;
import nappe.station.FoundCase;
import nappe.station.FoundFlows;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every sample worked in SI and in US customary units gives the same: each entry keeps the unit it was typed in, and only
 * the system that the package is worked in is another.
 */
class SystemsAgreeTest {
    private static final BuiltInLibrary LIBRARY = new BuiltInLibrary();
    private static final MethodLibrary METHODS = new MethodLibrary(LIBRARY);
    private static final double SAME_FLOW = 1e-6;

    /** A flow in words, as the outcome of a search tells it in the units of its system. */
    private static final Pattern FLOW = Pattern.compile("[0-9.,Ee-]+ \\S+( \\([0-9.,Ee-]+ \\S+\\))?(?=,)");

    private static final String WEIR = "return-weir.xlsx";

    static Stream<String> samples() {
        return SampleStations.all().keySet().stream().sorted();
    }

    private static Design inTheOther(Design design) {
        Design.Project p = design.project();
        Design.Project other = new Design.Project(
                p.project(),
                p.firm(),
                p.client(),
                p.number(),
                p.subject(),
                p.revision(),
                p.date(),
                p.status(),
                p.system() == WorkingSystem.SI ? WorkingSystem.US : WorkingSystem.SI,
                p.letterPaper(),
                p.flowUnit(),
                p.headUnit(),
                p.datum(),
                p.workedCase(),
                p.release(),
                p.sealSpace());
        return new Design(
                other,
                design.elements(),
                design.cases(),
                design.demands(),
                design.assumptions(),
                design.references(),
                design.requirements(),
                design.revisions(),
                design.combinations(),
                design.levels());
    }

    private static double inSi(double flow, Design design) {
        return flow * coherent(design).sizeInSi();
    }

    private static Unit coherent(Design design) {
        return design.project().system().coherentUnit(Dimension.FLOW);
    }

    /** The very flows found in one system, for columns that can be compared to the last digits. */
    private static FoundFlows converted(FoundFlows found, Design from, Design to) {
        List<FoundCase> cases = found.cases().stream()
                .map(one -> new FoundCase(
                        one.condition(),
                        inSi(one.flow(), from) / coherent(to).sizeInSi(),
                        one.limit(),
                        one.tag(),
                        one.label(),
                        one.conditions(),
                        one.metBelow(),
                        one.jump()))
                .toList();
        return new FoundFlows(cases, found.notReached(), found.notes());
    }

    private static Results results(Design design, FoundFlows found, MethodLibrary methods) {
        return new Job(methods, "0.0.0").run(design, List.of(), found).results();
    }

    private static SystemsComparison compared(Package sample, Design other, MethodLibrary methods) {
        FoundFlows found = converted(sample.found(), sample.design(), other);
        return SystemsComparison.of(sample.results(), results(other, found, methods));
    }

    /** The numbers at the flows found are those at the same flow; that the searches agree is a proof of its own. */
    @ParameterizedTest
    @MethodSource("samples")
    void everyResultIsTheSameInEitherSystem(String name) {
        Package sample = Package.ofSample(name);
        SystemsComparison comparison = compared(sample, inTheOther(sample.design()), METHODS);
        System.out.println(sample + ", systems: " + comparison);
        assertThat(comparison.faults()).isEmpty();
        assertThat(comparison.inRegister()).isGreaterThan(200);
    }

    @ParameterizedTest
    @MethodSource("samples")
    void limitsAreFirstReachedAtTheSameFlows(String name) {
        Package sample = Package.ofSample(name);
        Design other = inTheOther(sample.design());
        FoundFlows there = new Job(METHODS, "0.0.0").run(other, List.of()).found();
        sameFlows(sample.found(), sample.design(), there, other);
    }

    private static void sameFlows(FoundFlows here, Design design, FoundFlows there, Design other) {
        assertThat(here.cases()).isNotEmpty();
        assertThat(there.cases().stream().map(SystemsAgreeTest::withoutFlow))
                .isEqualTo(
                        here.cases().stream().map(SystemsAgreeTest::withoutFlow).toList());
        for (int i = 0; i < here.cases().size(); i++) {
            double flow = inSi(here.cases().get(i).flow(), design);
            assertThat(inSi(there.cases().get(i).flow(), other))
                    .as(here.cases().get(i).toString())
                    .isCloseTo(flow, within(SAME_FLOW * flow));
        }
        assertThat(there.notReached().stream().map(SystemsAgreeTest::withoutFlow))
                .isEqualTo(here.notReached().stream()
                        .map(SystemsAgreeTest::withoutFlow)
                        .toList());
    }

    private static FoundCase withoutFlow(FoundCase one) {
        return new FoundCase(
                one.condition(), 0, one.limit(), one.tag(), one.label(), one.conditions(), one.metBelow(), one.jump());
    }

    private static FoundFlows.NotReached withoutFlow(FoundFlows.NotReached one) {
        return new FoundFlows.NotReached(
                one.tag(),
                one.label(),
                one.conditions(),
                FLOW.matcher(one.outcome()).replaceAll("a flow"));
    }

    /** The built-in texts, one of them with other words. */
    private static MethodLibrary mutated(String path, String from, String to) {
        return new MethodLibrary(new TextLibrary() {
            @Override
            public @Nullable String text(String asked) {
                String text = LIBRARY.text(asked);
                if (text == null || !asked.equals(path)) {
                    return text;
                }
                assertThat(text).contains(from);
                return text.replace(from, to);
            }

            @Override
            public List<String> names(String folder) {
                return LIBRARY.names(folder);
            }
        });
    }

    /** A system with a constant of its own, rounded as handbooks round it, is noticed in numbers and in flows found. */
    @Test
    void aConstantRoundedInOneSystemIsReported() {
        Package sample = Package.ofSample(WEIR);
        Design other = inTheOther(sample.design());
        MethodLibrary rounded =
                mutated("methods/plate-weir-site.txt", "g = 9.80665 m/s2 ; m/s2", "g = 32.17 ft/s2 ; m/s2");
        assertThat(compared(sample, other, rounded).faults())
                .hasSizeGreaterThan(50)
                .anyMatch(fault -> fault.startsWith("Register of W1, ") && fault.contains(" h_1, Four pumps: "));
        FoundFlows there = new Job(rounded, "0.0.0").run(other, List.of()).found();
        assertThatThrownBy(() -> sameFlows(sample.found(), sample.design(), there, other))
                .isInstanceOf(AssertionError.class);
    }

    @Test
    void aDifferenceJustAboveTheLimitIsReported() {
        Package sample = Package.ofSample(WEIR);
        Design other = inTheOther(sample.design());
        assertThat(compared(
                                sample,
                                other,
                                mutated("methods/plate-weir-site.txt", "c_t = 0.2 ft", "c_t = 0.2000000004 ft"))
                        .faults())
                .isNotEmpty()
                .allMatch(fault -> fault.matches(".*(W1|Overview).*"));
    }

    /** What a bare number in the place of a quantity would hide is refused when the text is read. */
    @Test
    void aBareNumberInThePlaceOfAQuantityIsRefused() {
        assertThatThrownBy(() -> mutated("methods/parshall-flume.txt", "h/(1 ft * D_s)", "h/(1 * D_s)")
                        .sheet("parshall-flume"))
                .isInstanceOf(MethodException.class);
    }

    @Test
    void anEntryThatLosesItsUnitIsReported() {
        Package sample = Package.ofSample(WEIR);
        Design other = inTheOther(sample.design());
        Design.Element weir = other.elements().get(0);
        Map<String, Design.Typed> typed = new LinkedHashMap<>(weir.typed());
        typed.computeIfPresent(
                "p",
                (symbol, one) ->
                        new Design.Typed(one.value(), Unit.parse("ft"), one.source(), one.standing(), one.origin()));
        Design lost = other.withElements(List.of(new Design.Element(weir.tag(), weir.title(), weir.method(), typed)));
        assertThat(compared(sample, lost, METHODS).faults())
                .anyMatch(fault -> fault.startsWith("Register of W1, ") && fault.contains(" r_h, "));
    }

    @Test
    void aFoundFlowThatIsMissingTurnedOrOffIsReported() {
        Package sample = Package.ofSample(WEIR);
        FoundFlows found = sample.found();
        FoundCase first = found.cases().get(0);
        FoundFlows fewer =
                new FoundFlows(found.cases().subList(1, found.cases().size()), found.notReached(), found.notes());
        FoundCase turned = new FoundCase(
                first.condition(),
                first.flow(),
                first.limit(),
                first.tag(),
                first.label(),
                first.conditions(),
                !first.metBelow(),
                first.jump());
        FoundCase off = new FoundCase(
                first.condition(),
                first.flow() * (1 + 2e-6),
                first.limit(),
                first.tag(),
                first.label(),
                first.conditions(),
                first.metBelow(),
                first.jump());
        for (FoundFlows wrong : List.of(fewer, with(found, turned), with(found, off))) {
            assertThatThrownBy(() -> sameFlows(found, sample.design(), wrong, sample.design()))
                    .isInstanceOf(AssertionError.class);
        }
    }

    private static FoundFlows with(FoundFlows found, FoundCase first) {
        List<FoundCase> cases =
                Stream.concat(Stream.of(first), found.cases().stream().skip(1)).toList();
        return new FoundFlows(cases, found.notReached(), found.notes());
    }

    /** A size that fails more limits in one system is noticed, in the comparison of sizes and in what the reruns found. */
    @Test
    void aSizeThatFailsMoreInOneSystemIsReported() {
        Package sample = Package.ofSample("headworks.xlsx");
        MethodLibrary other = mutated(
                "methods/parshall-flume.txt", "line      h_max = r_max*h_0 ;", "line      h_max = 0.25*r_max*h_0 ;");
        assertThat(compared(sample, inTheOther(sample.design()), other).faults())
                .anyMatch(fault -> fault.startsWith("'F1 size grid'!"))
                .anyMatch(fault -> fault.matches("'F1 size reruns'!\\S+: [0-9.]+ 1 here, [0-9.]+ 1 there"))
                .anyMatch(fault -> fault.matches("'F1 size reruns'!\\S+: \".*head is in the rated range, upper end.*"));
    }
}
