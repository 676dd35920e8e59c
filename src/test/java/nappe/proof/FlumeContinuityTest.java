package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import nappe.formula.Value;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.method.Texts;
import nappe.solve.Bench;
import nappe.source.BuiltInLibrary;
import nappe.unit.WorkingSystem;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every size and form of the Parshall flume, at flows inside and outside the rated range, while the tailwater rises from
 * below the crest to far above it: head and level never fall, state and verdicts agree, every trial closes, and the head
 * jumps nowhere but where free flow is lost, by what the sheet prints.
 */
class FlumeContinuityTest {
    private static final BuiltInLibrary LIBRARY = new BuiltInLibrary();
    private static final String NAME = "parshall-flume";
    private static final MethodSheet FLUME = new MethodLibrary(LIBRARY).sheet(NAME);
    private static final double CREST = 100;

    /** Steps of the tailwater in free-flow heads, two of them just inside and just outside the limit of free flow. */
    private static List<Double> tailwaters(double limit) {
        List<Double> list = new ArrayList<>(List.of(-2.0, 0.0, 0.3, limit - 1e-6, limit + 1e-6));
        for (int k = 0; k <= 9; k++) {
            list.add(0.55 + 0.11 * k);
        }
        list.addAll(List.of(2.0, 40.0));
        return list.stream().sorted().toList();
    }

    static Stream<Arguments> sizesAndForms() {
        List<String> sizes = FLUME.tables().get("parshall-sizes").column("size").values().stream()
                .map(value -> ((Value.Word) value).text())
                .toList();
        assertThat(sizes).hasSize(35);
        return sizes.stream()
                .flatMap(size -> Stream.of("1967 form", "subtraction")
                        .filter(form -> form.equals("1967 form") || size.matches("([1-8]|1\\.5) ft"))
                        .map(form -> Arguments.of(size, form)));
    }

    @ParameterizedTest(name = "{0}, {1}")
    @MethodSource("sizesAndForms")
    void risingTailwaterNeverLowersTheHeadNorBelittlesIt(String size, String form) {
        List<Double> ends = ratedFlows(FLUME, size);
        double least = ends.get(0);
        double most = ends.get(1);
        for (double flow : List.of(least / 1000, Math.sqrt(least * most), most, 20 * most)) {
            assertThat(faults(FLUME, size, form, flow))
                    .as(size + ", " + form + ", " + flow + " m3/s")
                    .isEmpty();
        }
    }

    @ParameterizedTest(name = "{0} in place of {1}")
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '\0',
            value = {
                "1 ft | 1967 form | + (1 - S_end)*h_v | + 0*h_v",
                "1 ft | 1967 form | max(h_v, h_b + (1 - S_end)*h_v) | h_v",
                "3 in | 1967 form | max(h_d, h_r) | h_r",
                "1.5 ft | 1967 form | used = \"1967 form\", h_lo, | used = \"1967 form\", h_d,",
                "2 ft | subtraction | h_lo, if(given(h_3), h_3, none()) | h_lo, if(given(h_3), h_d, none())",
                "50 ft | 1967 form | min(max(h_t/h, S_x), S_end) | min(max(h_t/h, 0.3), S_end)",
                "6 in | 1967 form | 1.001*h_hi | 0.95*h_hi",
                "0.6 m | subtraction | if(S_a <= S_end, \"submerged\" | if(S_a <= 0.95, \"submerged\"",
                "0.6 m | subtraction | if(measured = \"measured\", h_u, none()) | h_u",
            })
    void anAlteredMethodIsFoundOut(String size, String form, String text, String altered) {
        String method = LIBRARY.text("methods/" + NAME + ".txt");
        assertThat(method).contains(text);
        MethodSheet other = new MethodLibrary(altered(method.replace(text, altered))).sheet(NAME);
        double flow = Math.sqrt(
                ratedFlows(other, size).get(0) * ratedFlows(other, size).get(1));
        assertThat(faults(other, size, form, flow)).isNotEmpty();
    }

    /** The greatest jumps over the rated range, measured; the 1967 form's C_1 of 1.5 ft is suspect. */
    @ParameterizedTest(name = "{0}, {1}")
    @MethodSource("sizesAndForms")
    void theJumpIsNoMoreThanWasMeasured(String size, String form) {
        List<Double> ends = ratedFlows(FLUME, size);
        List<Double> flows = new ArrayList<>();
        for (int k = 0; k <= 4; k++) {
            flows.add(ends.get(0) * Math.pow(ends.get(1) / ends.get(0), k / 4.0));
        }
        boolean subtraction = form.equals("subtraction") || size.endsWith(" m");
        double most = subtraction ? 0.346 : size.equals("1.5 ft") ? 0.0185 : 0.0125;
        Bench bench =
                bench(FLUME, size, form, flows, flows.stream().map(q -> -1.0).toList());
        for (int c = 0; c < flows.size(); c++) {
            assertThat(bench.number("e_x", c)).isLessThanOrEqualTo(most);
        }
    }

    /** A head read where the flume itself would stand gives the flow back, free and by either form. */
    @ParameterizedTest(name = "{0}, {1}, {3} m")
    @CsvSource({
        "2 ft, 1967 form, 0.3, 99.9",
        "2 ft, 1967 form, 0.3, 100.32",
        "2 ft, subtraction, 0.3, 100.32",
        "0.6 m, 1967 form, 0.3, 100.32",
        "20 ft, 1967 form, 14, 100.86",
    })
    void aHeadReadGivesTheFlowBack(String size, String form, double flow, double level) {
        Map<String, String> entries = Map.of(
                "size",
                quoted(size),
                "form",
                quoted(form),
                "submerged",
                quoted("accepted"),
                "z_f",
                plain(CREST) + " m");
        String q = plain(flow) + " m3/s";
        String z = plain(level) + " m";
        Bench head = new Bench(FLUME, WorkingSystem.SI, entries, List.of(Bench.typed("Q", q, "z_t", z)));
        assertThat(word(head, "state", 0)).isEqualTo(level < CREST ? "free" : "submerged");
        assertThat(word(head, "measured", 0)).isEqualTo("measured");
        String read = plain(head.number("h_a", 0)) + " m";
        Bench back = new Bench(FLUME, WorkingSystem.SI, entries, List.of(Bench.typed("Q", q, "z_t", z, "h_g", read)));
        assertThat(back.number("Q_r", 0)).isCloseTo(flow, within(1e-9 * flow));
    }

    @Test
    void stillWaterStandsAtTheCrestOrAtTheTailwater() {
        for (String level : List.of("99 m", "100.4 m")) {
            Bench bench = new Bench(
                    FLUME,
                    WorkingSystem.SI,
                    Bench.typed(
                            "size", "\"2 ft\"", "form", "\"1967 form\"", "submerged", "\"accepted\"", "z_f", "100 m"),
                    List.of(Bench.typed("Q", "0 m3/s", "z_t", level)));
            assertThat(bench.value("state", 0)).isEqualTo(Value.word("no flow"));
            assertThat(bench.value("level", 0)).isEqualTo(Value.word("still water"));
            assertThat(bench.value("h_a", 0)).isEqualTo(new Value.None("no result"));
            assertThat(bench.number("z_u", 0)).isEqualTo(level.equals("99 m") ? 100 : 100.4);
            assertThat(bench.number("E_u", 0)).isEqualTo(bench.number("z_u", 0));
            assertThat(bench.verdict("flow is in the rated range, lower end", 0))
                    .isEqualTo(Value.word("does not apply"));
        }
    }

    /** Faults of one flow under a rising tailwater, in words. */
    private static List<String> faults(MethodSheet method, String size, String form, double flow) {
        Bench first = bench(method, size, form, List.of(flow), List.of(-1.0));
        double free = first.number("h_f", 0);
        List<Double> tailwaters = tailwaters(((Value.Number) first.value("S_x")).value());
        List<Double> tails = tailwaters.stream().map(t -> t * free).toList();
        Bench bench = bench(method, size, form, tails.stream().map(t -> flow).toList(), tails);
        List<String> faults = new ArrayList<>();
        bench.trialRows().solved().forEach(root -> {
            boolean lacked = bench.value(root.status()).equals(new Value.None("not given"));
            if (!lacked && !bench.value(root.status()).equals(Value.word("closed"))) {
                faults.add(root.root().symbol() + ": " + bench.value(root.status()));
            }
        });
        if (!faults.isEmpty()) {
            return faults;
        }
        for (int c = 0; c < tails.size(); c++) {
            String at = " at h_b/h_f = " + tailwaters.get(c);
            double head = bench.number("h_u", c);
            if (!(head > bench.number("h_b", c) && head >= free * (1 - 1e-12))) {
                faults.add("head not above tailwater and free head" + at);
            }
            if (c > 0) {
                rise(bench, c, head - bench.number("h_u", c - 1), free, faults, at);
            }
            verdicts(bench, c, faults, at);
        }
        return faults;
    }

    /** Never a fall; and no more of a rise than the tailwater accounts for, but for the jump that is printed. */
    private static void rise(Bench bench, int c, double rise, double free, List<String> faults, String at) {
        if (rise < -1e-9 * free || bench.number("z_u", c) < bench.number("z_u", c - 1) - 1e-9 * free) {
            faults.add("head falls" + at);
        }
        boolean lost = word(bench, "state", c - 1).equals("free")
                && !word(bench, "state", c).equals("free");
        double jump = lost ? Math.max(0, bench.number("e_x", c)) * free : 0;
        double tail = bench.number("h_b", c) - bench.number("h_b", c - 1);
        if (rise > jump + 1.9 * tail + 1e-9 * free || lost && rise < jump - 1e-9 * free) {
            faults.add("head jumps by " + rise + ", printed " + jump + at);
        }
    }

    private static void verdicts(Bench bench, int c, List<String> faults, String at) {
        String state = word(bench, "state", c);
        boolean free = state.equals("free");
        boolean drowned = state.equals("drowned");
        boolean inside = (drowned || met(bench, "head is in the rated range, lower end", c))
                && (drowned || met(bench, "head is in the rated range, upper end", c))
                && met(bench, "flow is in the rated range, lower end", c)
                && met(bench, "flow is in the rated range, upper end", c);
        if (free != met(bench, "flow is free: submergence", c)
                || drowned == met(bench, "flume is not drowned: submergence", c)
                || !word(bench, "why", c)
                        .replace(", refused", "")
                        .equals(drowned || inside ? state : "outside the rated range")) {
            faults.add("state and verdicts differ" + at);
        }
        boolean measured = inside && !drowned;
        if (bench.value("h_a", c) instanceof Value.Number != (measured && free)
                || word(bench, "level", c).equals("by the rating") != measured
                || word(bench, "measured", c).equals("measured") != (measured && free)) {
            faults.add("a measurement where there is none, or none where there is" + at);
        }
        if (state.equals("submerged") && Math.abs(bench.number("e_r", c)) > 1e-9) {
            faults.add("the flow is not found again" + at);
        }
    }

    private static boolean met(Bench bench, String limit, int c) {
        return bench.verdict(limit, c).equals(Value.word("met"));
    }

    private static String word(Bench bench, String symbol, int c) {
        return ((Value.Word) bench.value(symbol, c)).text();
    }

    /** The ends of the rated flows in m3/s: by flow and by head, the tighter of the two. */
    private static List<Double> ratedFlows(MethodSheet method, String size) {
        Bench bench = bench(method, size, "1967 form", List.of(1e-9, 1e6), List.of(-1.0, -1.0));
        return List.of(
                Math.max(fixed(bench, "Q_min"), fixed(bench, "Q_n")),
                Math.min(fixed(bench, "Q_max"), fixed(bench, "Q_x")));
    }

    private static double fixed(Bench bench, String symbol) {
        return ((Value.Number) bench.value(symbol)).value();
    }

    private static Bench bench(
            MethodSheet method, String size, String form, List<Double> flows, List<Double> tailwaters) {
        List<Map<String, String>> cases = new ArrayList<>();
        for (int c = 0; c < flows.size(); c++) {
            cases.add(Bench.typed("Q", plain(flows.get(c)) + " m3/s", "z_t", plain(CREST + tailwaters.get(c)) + " m"));
        }
        return new Bench(
                method,
                WorkingSystem.SI,
                Map.of(
                        "size", quoted(size),
                        "form", quoted(form),
                        "submerged", quoted("refused"),
                        "z_f", plain(CREST) + " m"),
                cases);
    }

    private static String quoted(String words) {
        return "\"" + words + "\"";
    }

    private static String plain(double number) {
        return new BigDecimal(number).toPlainString();
    }

    private static Texts altered(String method) {
        Texts texts = new Texts().method(NAME, method);
        for (String table : LIBRARY.names("tables")) {
            texts.with("tables/" + table, LIBRARY.text("tables/" + table));
        }
        return texts;
    }
}
