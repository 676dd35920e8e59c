package nappe.job;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import nappe.method.MethodLibrary;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;
import nappe.station.SizeRerun;
import org.junit.jupiter.api.Test;

/** What reruns of a whole station find for each size of one of its elements. */
class SizeRerunsTest {
    private static final MethodLibrary METHODS = new MethodLibrary(new BuiltInLibrary());
    private static final List<String> SIZES =
            METHODS.declared("parshall-flume").get(0).words();

    private static Map<String, List<SizeRerun>> of(Design design) {
        return new SizeReruns(design, METHODS::sheet).run();
    }

    private static Design station(double flow) {
        return Designs.weirBelowFlume(2.5, Designs.flowCase("low", 0.05, 0.4), Designs.flowCase("high", flow, 0.5));
    }

    @Test
    void eachElementThatIsScreenedHasOneForEachSize() {
        Map<String, List<SizeRerun>> found = of(station(0.2));
        assertThat(found).containsOnlyKeys("F1");
        assertThat(found.get("F1").stream().map(SizeRerun::word)).isEqualTo(SIZES);
    }

    @Test
    void aSizeFitsThatMeetsEveryLimitOfTheStation() {
        SizeRerun foot = of(station(0.2)).get("F1").get(SIZES.indexOf("1 ft"));
        assertThat(foot.failures()).isEmpty();
        assertThat(foot.refused()).isEmpty();
    }

    @Test
    void theCasesInWhichALimitFailsAreCountedFromOne() {
        SizeRerun foot = of(station(0.6)).get("F1").get(SIZES.indexOf("1 ft"));
        assertThat(foot.failures())
                .contains(new SizeRerun.Failure("F1", "flow is in the rated range, upper end", true, List.of(2)));
    }

    /** A limit of a neighbour that no size of the flume changes fails with every size. */
    @Test
    void limitsOfTheOtherElementsCountToo() {
        Design design = Designs.weirBelowFlume(2.5, Designs.flowCase("low", 0.05, 1.3));
        assertThat(of(design).get("F1"))
                .allMatch(rerun -> rerun.failures().stream()
                        .anyMatch(failure -> failure.tag().equals("W1")));
    }

    @Test
    void entriesThatNoRerunCanTakeAreToldInWords() {
        Design d = station(0.2);
        Design impossible = new Design(
                d.project(),
                d.elements(),
                d.cases(),
                List.of(new Design.Demand(
                        "F1", "nothing_here", true, Designs.number(1, "m"), "pretend demand", "invented")),
                d.assumptions(),
                d.references(),
                d.requirements(),
                d.revisions());
        assertThat(of(impossible).get("F1"))
                .hasSize(SIZES.size())
                .allMatch(rerun -> !rerun.refused().isEmpty());
    }
}
