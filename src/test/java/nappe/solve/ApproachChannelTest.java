package nappe.solve;

import static nappe.solve.Bench.typed;
import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
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
                    h_f = S_f*L_c/2               | h_f = S_f*L_c/3
                    H_e = H + S_0*L_c           | H_e = H - S_0*L_c
                    h_t = C_t*abs(k - k_g)      | h_t = C_t*abs(k + k_g)
                    where H = G_t between y_l   | where H = G_t between y_l/9
                    max(G_g + h_t, H_l)         | G_g + h_t
                    max(G_e, G_l)               | G_e
                    line      h_s = K*k_u       | line      h_s = K*k_g
                    between y_q and y_r         | between 2*y_q and 3*y_r
                    max(y_c, y_0)               | y_c
                    """)
    void aWrongTextIsFound(String right, String wrong) {
        String text = LIBRARY.text("methods/approach-channel.txt");
        assertThat(text).contains(right);
        assertThat(faults(new MethodReader(with(text.replace(right, wrong))).read("approach-channel"), 1, 20))
                .isNotEmpty();
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
