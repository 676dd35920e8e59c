package nappe.solve;

import static nappe.solve.Bench.typed;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.stream.Stream;
import nappe.formula.Value;
import nappe.method.MethodReader;
import nappe.method.MethodSheet;
import nappe.source.BuiltInLibrary;
import nappe.source.TextLibrary;
import nappe.unit.WorkingSystem;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The approach channel over invented channels and flows, from none to far over the walls. */
class ApproachChannelTest {
    private static final BuiltInLibrary LIBRARY = new BuiltInLibrary();
    private static final MethodSheet METHOD = new MethodReader(LIBRARY).read("approach-channel");

    /** Ten digits of a level near 1 m, and the dead band of the trials. */
    private static final double SLACK = 1e-9;

    private static final List<String> ROOTS = List.of("y_c", "y_2", "y_u", "y_1");
    private static final List<String> LEVELS = List.of("z_2", "E_2", "z_u", "E_u", "z_1", "E_1");

    @Test
    void everyChannelHasLevelsThatMeetTheEnergyEquationAndAreTranquil() {
        assertThat(faults(METHOD, 1, 60)).isEmpty();
    }

    /** The property above sees each of these wrong texts. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
                    h_f = S_f*L_c/2                 | h_f = S_f*L_c/3
                    H_e = H + S_0*L_c               | H_e = H - S_0*L_c
                    h_t = C_t*abs(k - k_g)          | h_t = C_t*abs(k + k_g)
                    where H = G_t between y_l       | where H = G_t between y_l/9
                    max(G_g + h_t, H_l)             | G_g + h_t
                    max(G_e, G_l)                   | G_e
                    line      h_s = K*k_u           | line      h_s = K*k_g
                    between y_q and y_r             | between 2*y_q and 3*y_r
                    max(y_c, y_0)                   | y_c
                    """)
    void aWrongTextIsFound(String right, String wrong) {
        String text = LIBRARY.text("methods/approach-channel.txt");
        assertThat(text).contains(right);
        MethodSheet changed = new MethodReader(with(text.replace(right, wrong))).read("approach-channel");
        assertThat(Stream.of(1, 2, 3, 4, 5, 6, 7, 8))
                .anyMatch(seed -> !faults(changed, seed, 5).isEmpty());
    }

    /** The energy offered stands a little above that of critical flow: the search is flattest there. */
    @ParameterizedTest
    @CsvSource({"1e-13", "1e-11", "1e-9", "1e-7", "1e-5", "1e-3", "-1e-13", "-1e-9"})
    void theDepthIsFoundCloseToCriticalFlow(double above) {
        double critical = Math.cbrt(0.25 / 9.80665);
        Map<String, String> channel = level("tranquil");
        channel.put("K", "0.000001");
        Bench bench = new Bench(
                METHOD, WorkingSystem.SI, channel, List.of(aCase(0.5, 1.5 * critical * (1 + above), "0.3 m")));
        assertThat(fault(bench, 0)).isNull();
        assertThat(bench.number("y_2", 0))
                .isCloseTo(critical * (1 + Math.sqrt(Math.max(above, 0))), within(1e-3 * critical));
    }

    @Test
    void aFlowThatNeedsMoreEnergyThanTheDeviceLeavesIsCriticalAtTheEnd() {
        Bench bench = new Bench(METHOD, WorkingSystem.SI, level("tranquil"), List.of(aCase(0.5, -3, "0.3 m")));
        assertThat(bench.value("state", 0)).isEqualTo(Value.word("critical at the downstream end"));
        assertThat(bench.number("F_2", 0)).isCloseTo(1, within(1e-9));
        assertThat(bench.verdict("approach is tranquil: Froude number", 0)).isEqualTo(Value.word("not met"));
    }

    @Test
    void aSteepFloorIsCriticalAtItsUpstreamEnd() {
        Map<String, String> steep = level("tranquil");
        steep.put("S_0", "0.1");
        Bench bench = new Bench(METHOD, WorkingSystem.SI, steep, List.of(aCase(0.5, 0.8, "0.3 m")));
        assertThat(bench.value("state", 0)).isEqualTo(Value.word("critical at the upstream end"));
        assertThat(bench.number("F_u", 0)).isCloseTo(1, within(1e-9));
    }

    @Test
    void theDistanceFromAJumpIsAskedForOnlyWhereThereIsOne() {
        String label = "distance from the jump to the gauge";
        Map<String, String> near = level("rapid, with a jump");
        near.put("x_j", "8.9 m");
        Map<String, String> far = level("rapid, with a jump");
        far.put("x_j", "9 m");
        assertThat(verdict(level("tranquil"), null, label)).isEqualTo("does not apply");
        assertThat(verdict(level("tranquil"), "0.3 m", label)).isEqualTo("does not apply");
        assertThat(verdict(level("rapid, with a jump"), "0.3 m", label)).isEqualTo("no result");
        assertThat(verdict(far, null, label)).isEqualTo("no result");
        assertThat(verdict(near, "0.3 m", label)).isEqualTo("not met");
        assertThat(verdict(far, "0.3 m", label)).isEqualTo("met");
    }

    /** Channel 1 m wide; twenty control widths of 0.3 m are 6 m, ten channel widths are 10 m. */
    @ParameterizedTest
    @CsvSource({"one unit, 5.9, not met", "one unit, 6, met", "all units, 9.9, not met", "all units, 10, met"})
    void theStraightLengthFollowsTheWidthOfTheControls(String serves, String straight, String verdict) {
        Map<String, String> channel = level("tranquil");
        channel.put("serves", "\"" + serves + "\"");
        channel.put("L_s", straight + " m");
        assertThat(verdict(channel, "0.3 m", "straight length upstream of the gauge"))
                .isEqualTo(verdict);
    }

    @Test
    void theFlowIsThatOfOneUnitOrOfAll() {
        Map<String, String> all = level("tranquil");
        all.put("serves", "\"all units\"");
        List<Map<String, String>> cases = List.of(aCase(0.5, 1, "0.3 m"));
        assertThat(new Bench(METHOD, WorkingSystem.SI, level("tranquil"), cases).number("Q", 0))
                .isEqualTo(0.5);
        assertThat(new Bench(METHOD, WorkingSystem.SI, all, cases).number("Q", 0))
                .isEqualTo(1);
    }

    private static String verdict(Map<String, String> channel, @Nullable String head, String label) {
        Bench bench = new Bench(METHOD, WorkingSystem.SI, channel, List.of(aCase(0.2, 1, head)));
        Value verdict = bench.verdict(label, 0);
        return verdict instanceof Value.Word word ? word.text() : ((Value.None) verdict).why();
    }

    /** A level rectangular channel 1 m wide and 10 m long that feeds one unit. */
    private static Map<String, String> level(String inflow) {
        return new LinkedHashMap<>(typed(
                "serves",
                "\"one unit\"",
                "inflow",
                "\"" + inflow + "\"",
                "b",
                "1 m",
                "m",
                "0",
                "z_f",
                "0 m",
                "L_c",
                "10 m",
                "S_0",
                "0",
                "n",
                "0.013",
                "C_t",
                "0",
                "K",
                "0",
                "z_w",
                "2 m",
                "L_s",
                "20 m"));
    }

    private static Map<String, String> aCase(double flow, double energy, @Nullable String head) {
        Map<String, String> one = typed(
                "Q_t",
                plain(2 * flow) + " m3/s",
                "Q_1",
                plain(flow) + " m3/s",
                "N",
                "2",
                "w",
                "0.3 m",
                "E_g",
                exact(energy) + " m",
                "z_g",
                exact(energy) + " m");
        if (head != null) {
            one.put("h", head);
        }
        return one;
    }

    private static String exact(double value) {
        return new BigDecimal(value).toPlainString();
    }

    private static List<String> faults(MethodSheet method, long seed, int channels) {
        Random random = new Random(seed);
        List<String> faults = new ArrayList<>();
        for (int i = 0; i < channels; i++) {
            Map<String, String> channel = channel(random);
            List<Map<String, String>> cases = cases(random);
            Bench bench = new Bench(method, WorkingSystem.SI, channel, cases);
            for (int c = 0; c < cases.size(); c++) {
                String fault = fault(bench, c);
                if (fault != null) {
                    faults.add(fault + " " + channel + " " + cases.get(c));
                }
            }
        }
        return faults;
    }

    private static @Nullable String fault(Bench bench, int c) {
        for (String root : ROOTS) {
            if (!bench.verdict("the trials for " + root + " have closed", c).equals(Value.word("met"))) {
                return root + " has not closed";
            }
        }
        for (String level : LEVELS) {
            if (!(bench.value(level, c) instanceof Value.Number)) {
                return level + " is no number";
            }
        }
        boolean freeBelow = bench.number("G_g", c) + bench.number("h_tl", c) < bench.number("H_l", c);
        boolean freeAbove = bench.number("G_e", c) < bench.number("G_l", c);
        if (!near(bench.number("d_2", c), freeBelow)
                || !near(bench.number("d_u", c), freeAbove)
                || !near(bench.number("d_1", c), false)) {
            return "energy left over " + bench.number("d_2", c) + " " + bench.number("d_u", c) + " "
                    + bench.number("d_1", c);
        }
        for (String depth : List.of("y_2", "y_u", "y_1")) {
            if (bench.number(depth, c) < bench.number("y_l", c) * (1 - 1e-12)) {
                return depth + " is rapid";
            }
        }
        if (bench.number("F_m", c) > 1 + 1e-6 || !(bench.number("F_m", c) >= 0)) {
            return "F_m is " + bench.number("F_m", c);
        }
        if (bench.number("E_2", c) < bench.number("E_g", c) - SLACK
                || bench.number("E_u", c) < bench.number("E_2", c) - SLACK
                || bench.number("E_1", c) < bench.number("E_u", c) - SLACK) {
            return "energy rises with the flow";
        }
        return bench.number("Q", c) > 0 ? null : stillFault(bench, c);
    }

    /** Without flow a pool stands level over all that is below it; what is above it keeps a film of 0.1 mm. */
    private static @Nullable String stillFault(Bench bench, int c) {
        double pool = Math.max(bench.number("E_g", c), bench.number("z_f", 0) + 1e-4);
        double above = Math.max(pool, bench.number("z_e", 0) + 1e-4);
        boolean level = Math.abs(bench.number("z_2", c) - pool) < SLACK
                && Math.abs(bench.number("z_u", c) - above) < SLACK
                && Math.abs(bench.number("E_1", c) - above) < SLACK;
        boolean still = bench.number("V_m", c) == 0 && bench.number("F_m", c) == 0;
        return level && still && bench.value("state", c).equals(Value.word("no flow")) ? null : "no level pool";
    }

    private static boolean near(double leftOver, boolean more) {
        return leftOver > -SLACK && (more || leftOver < SLACK);
    }

    private static Map<String, String> channel(Random random) {
        double[] sides = {0, 0, 0.5, 1.5, 3};
        double[] screens = {0, 0, 0.01, 0.5, 8};
        double[] transitions = {0, 0.1, 0.3, 1};
        return new LinkedHashMap<>(typed(
                "serves", random.nextBoolean() ? "\"one unit\"" : "\"all units\"",
                "inflow", random.nextBoolean() ? "\"tranquil\"" : "\"rapid, with a jump\"",
                "b", metres(0.2 * Math.pow(40, random.nextDouble())),
                "m", plain(sides[random.nextInt(5)]),
                "z_f", metres(random.nextInt(3) * 50 - 50),
                "L_c", metres(0.5 * Math.pow(400, random.nextDouble())),
                "S_0", plain(random.nextInt(4) == 0 ? 0 : (random.nextDouble() - 0.4) * 0.02),
                "n", plain(0.009 + 0.03 * random.nextDouble()),
                "C_t", plain(transitions[random.nextInt(4)]),
                "K", plain(screens[random.nextInt(5)]),
                "z_w", metres(101),
                "L_s", metres(20)));
    }

    private static List<Map<String, String>> cases(Random random) {
        double floor = 0;
        List<Map<String, String>> cases = new ArrayList<>();
        double[] flows = {0, 0, 1e-6, 1e-4, 0.003, 0.05, 0.4, 3, 30};
        for (int i = 0; i < flows.length; i++) {
            double offered = random.nextInt(5) == 0 ? -3 : 0.002 * Math.pow(5000, random.nextDouble());
            double velocityHead = flows[i] == 0 || random.nextInt(3) == 0 ? 0 : 0.3 * offered * random.nextDouble();
            Map<String, String> one = typed(
                    "Q_t",
                    plain(2 * flows[i]) + " m3/s",
                    "Q_1",
                    plain(flows[i]) + " m3/s",
                    "N",
                    "2",
                    "E_g",
                    metres(offered + 50 * (i % 3) - 50 + floor),
                    "z_g",
                    metres(offered - velocityHead + 50 * (i % 3) - 50 + floor),
                    "w",
                    "0.3 m");
            if (random.nextBoolean()) {
                one.put("h", metres(Math.abs(offered)));
            }
            cases.add(one);
        }
        return cases;
    }

    private static String metres(double value) {
        return plain(value) + " m";
    }

    private static String plain(double value) {
        return new BigDecimal(value).round(new java.math.MathContext(12)).toPlainString();
    }

    private static TextLibrary with(String text) {
        return new TextLibrary() {
            @Override
            public @Nullable String text(String path) {
                return path.equals("methods/approach-channel.txt") ? text : LIBRARY.text(path);
            }

            @Override
            public List<String> names(String folder) {
                return LIBRARY.names(folder);
            }
        };
    }
}
