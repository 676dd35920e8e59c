package nappe.station;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.formula.Value;
import nappe.method.MethodLibrary;
import nappe.method.Texts;
import nappe.station.Design.Origin;
import nappe.station.Design.Typed;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;
import org.junit.jupiter.api.Test;

/** What does not fit together is told at the entry's cell before anything is computed, all at once. */
class DesignCheckTest {
    private static final String PRETEND = """
            method Pretend meter
            source INV ; an invented source
            constant t = 2 mm ; m ; least wall ; INV
            entry d ; m ; bore
            entry D ; m ; pipe
            entry T ; K ; temperature ; optional
            choice shape from shapes ; shape
            geometry d + t < D ; the bore is smaller than the pipe
            geometry shape = "round" or d < 0.5 m ; a square bore is narrow
            geometry T > 273.15 K ; water is not ice
            entry e ; m ; first end ; optional
            entry f ; m ; second end ; optional
            geometry given(e) or not given(f) ; the second end follows the first
            case Q = flow ; m3/s ; flow
            take z_t = water level ; m ; level
            line v = Q/d^2 ; m/s ; velocity
            """;

    private final MethodLibrary methods = new MethodLibrary(new Texts()
            .table("shapes", "shape,a [1]\nround,1\nsquare,2\n")
            .method("pretend", PRETEND)
            .method("silent", "method Silent\ncase Q = flow ; m3/s ; flow\nline x = Q*2 ; m3/s ; twice\n"));

    @Test
    void dimensionsInUnlikeUnitsAreComparedAsTheyAre() {
        assertThat(codes(meter(199, "mm", 0.2, "m", "round"))).containsExactly("geometry-impossible");
        assertThat(codes(meter(197, "mm", 0.2, "m", "round"))).isEmpty();
        assertThat(codes(meter(7.8, "in", 0.2, "m", "round"))).containsExactly("geometry-impossible");
    }

    @Test
    void theFaultStandsAtTheFirstEntryAndSaysWhatWasReadAndWhatIsAsked() {
        DesignFault fault = faults(meter(300, "mm", 0.2, "m", "round")).get(0);
        assertThat(fault.origin()).isEqualTo(new Origin("X1", "d"));
        assertThat(fault.message())
                .isEqualTo(
                        "with d = 300 mm, D = 0.2 m this cannot be built: the bore is smaller than the pipe, d + t < D;"
                                + " correct what is wrong");
    }

    @Test
    void equalDimensionsAreNotSmaller() {
        assertThat(codes(meter(198, "mm", 0.2, "m", "round"))).containsExactly("geometry-impossible");
    }

    @Test
    void aChoiceCanDecideWhatIsAsked() {
        assertThat(codes(meter(0.6, "m", 1, "m", "round"))).isEmpty();
        assertThat(codes(meter(0.6, "m", 1, "m", "square"))).containsExactly("geometry-impossible");
    }

    @Test
    void whatIsLeftBlankIsNotJudgedAndATemperatureKeepsItsZero() {
        assertThat(codes(meter(0.1, "m", 1, "m", "round"))).isEmpty();
        Design cold = design(element(Map.of(
                "d", typed("d", Value.of(0.1), "m"),
                "D", typed("D", Value.of(1), "m"),
                "shape", typed("shape", Value.word("round"), "1"),
                "T", typed("T", Value.of(-1), "degC"))));
        assertThat(codes(cold)).containsExactly("geometry-impossible");
    }

    @Test
    void whatTheConditionAsksForIsJudgedWhereItIsBlankToo() {
        Map<String, Typed> second = Map.of("f", typed("f", Value.of(2), "m"));
        DesignFault fault = faults(design(element(second))).get(0);
        assertThat(fault.origin()).isEqualTo(new Origin("X1", "f"));
        assertThat(fault.message())
                .isEqualTo(
                        "with e left blank, f = 2 m this cannot be built: the second end follows the first; correct what"
                                + " is wrong");
        assertThat(codes(design(element(Map.of("e", typed("e", Value.of(2), "m"))))))
                .isEmpty();
        assertThat(codes(design(element(Map.of())))).isEmpty();
    }

    @Test
    void anElementWhoseNeighbourGivesNothingIsToldBesideTheOtherFaults() {
        Design.Element silent = new Design.Element("S1", "", "silent", Map.of());
        List<Design.Element> both = new ArrayList<>(List.of(silent));
        both.addAll(meter(300, "mm", 0.2, "m", "round").elements());
        List<DesignFault> faults = faults(design(both.toArray(Design.Element[]::new)));
        assertThat(faults).extracting(DesignFault::code).containsExactly("link-missing", "geometry-impossible");
        assertThat(faults.get(0).message())
                .isEqualTo(
                        "X1 (pretend) takes the water level from the element downstream, and S1 (silent) below it gives"
                                + " none; put an element below it that gives one, or take X1 away");
    }

    private List<String> codes(Design design) {
        return faults(design).stream().map(DesignFault::code).toList();
    }

    private List<DesignFault> faults(Design design) {
        return DesignCheck.faults(design, methods::sheet);
    }

    private static Design meter(double d, String dUnit, double pipe, String pipeUnit, String shape) {
        Map<String, Typed> typed = new LinkedHashMap<>();
        typed.put("d", typed("d", Value.of(d), dUnit));
        typed.put("D", typed("D", Value.of(pipe), pipeUnit));
        typed.put("shape", typed("shape", Value.word(shape), "1"));
        typed.put("T", typed("T", new Value.None(Value.NOT_GIVEN), "K"));
        return design(element(typed));
    }

    private static Design.Element element(Map<String, Typed> typed) {
        return new Design.Element("X1", "", "pretend", typed);
    }

    private static Typed typed(String cell, Value value, String unit) {
        return new Typed(value, Unit.parse(unit), "invented", "known", new Origin("X1", cell));
    }

    private static Design design(Design.Element... elements) {
        Design.Project project = new Design.Project(
                "Pretend",
                "",
                "",
                "P-1",
                "",
                "A",
                LocalDate.of(2030, 1, 2),
                "preliminary",
                WorkingSystem.SI,
                false,
                Unit.parse("m3/s"),
                Unit.parse("m"),
                "",
                "",
                "",
                false);
        return new Design(project, List.of(elements), List.of(), List.of(), List.of(), List.of(), List.of(), List.of());
    }
}
