package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
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
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every thin-plate weir, with dimensions and heads from a tenth of the least to ten times the greatest, while the tailwater
 * rises from far below the crest to far above it: every trial closes, head and level never fall, words and verdicts agree.
 */
class PlateWeirTest {
    private static final BuiltInLibrary LIBRARY = new BuiltInLibrary();
    private static final double CREST = 100;

    /** The lower end of the searches, m. */
    private static final double FILM = 1e-4;

    /** Tailwater above the crest, in free heads. */
    private static final List<Double> TAILS =
            List.of(-50.0, -0.3, 0.0, 1e-9, 1e-3, 0.1, 0.6, 0.99, 1.2, 3.0, 40.0, 1000.0);

    /** Most trials that a root took, over a hundred times as many weirs as are run here. */
    private static final Map<String, Integer> MOST = Map.of("h_c", 9, "h_d", 11);

    /** A weir: its method and what is typed. */
    record Weir(String method, Map<String, String> entries, double width, double crest) {
        @Override
        public String toString() {
            return method + " " + entries;
        }
    }

    static Stream<Weir> weirs() {
        return weirs(1, 20300314);
    }

    static Stream<Weir> weirs(int each, long seed) {
        Random random = new Random(seed);
        List<Weir> weirs = new ArrayList<>();
        for (int k = 0; k < each; k++) {
            for (String set : List.of("ISO 1438", "US constants")) {
                double ratio = random.nextInt(4) == 0 ? 1 : Math.pow(10, -random.nextDouble() * 1.5);
                weirs.add(weir("rectangular-weir", random, ratio, "set", set));
            }
            for (String formula : List.of("Rehbock, range of 1980", "Rehbock, range of 2008", "White", "Ackers 1978")) {
                weirs.add(weir("full-width-weir", random, 1, "formula", formula));
            }
            for (String ends : List.of("both ends contracted", "one end contracted", "no end contracted")) {
                weirs.add(weir("francis-weir", random, ends.startsWith("no") ? 1 : random.nextDouble(), "ends", ends));
            }
            weirs.add(weir("cipolletti-weir", random, random.nextDouble()));
            for (String set : List.of("curve points", "polynomial")) {
                weirs.add(notch("v-notch-weir", random, "set", set));
            }
            weirs.add(notch("v-notch-weir-partial", random));
        }
        return weirs.stream();
    }

    private static Weir weir(String method, Random random, double ratio, String... choice) {
        double width = 0.015 * Math.pow(10, 3.5 * random.nextDouble());
        return weir(method, random, width, width / ratio, choice);
    }

    private static Weir weir(String method, Random random, double width, double channel, String... choice) {
        double crest = 0.01 * Math.pow(10, 3.3 * random.nextDouble());
        Map<String, String> entries = new LinkedHashMap<>();
        for (int i = 0; i < choice.length; i += 2) {
            entries.put(choice[i], "\"" + choice[i + 1] + "\"");
        }
        entries.put("b", plain(width) + " m");
        entries.put("B", plain(channel) + " m");
        entries.put("p", plain(crest) + " m");
        entries.put("z_c", plain(CREST) + " m");
        return new Weir(method, entries, width, crest);
    }

    private static Weir notch(String method, Random random, String... choice) {
        double channel = 0.06 * Math.pow(10, 2.5 * random.nextDouble());
        Weir weir = weir(method, random, channel, channel, choice);
        Map<String, String> entries = new LinkedHashMap<>(weir.entries());
        entries.remove("b");
        entries.put("rules", random.nextBoolean() ? "\"ISO 1438\"" : "\"US manual\"");
        if (method.equals("v-notch-weir")) {
            entries.put("theta", plain(20 + 80 * random.nextDouble()) + " deg");
        }
        return new Weir(method, entries, 0, weir.crest());
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("weirs")
    void aRisingTailwaterNeverLowersTheHead(Weir weir) {
        Map<String, Integer> trials = new TreeMap<>();
        assertThat(faults(sheet(weir.method()), weir, trials)).isEmpty();
        trials.forEach((root, most) -> assertThat(most).as(root).isLessThanOrEqualTo(MOST.get(root)));
    }

    @ParameterizedTest(name = "{0}: {2} in place of {1}")
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '\0',
            value = {
                "1.15*h_c + h_t | 1.01*h_c + h_t",
                "max(h_c, h_t, 0.1 mm) | max(2*h_c, h_t)",
                "if(h_t > 0 m, h_d, h_c) | h_c",
                "if(h_t > 0 m, h_d, h_c) | if(h_t > 0 m, h_t, h_c)",
                "Q/(1 - u_v) | Q*(1 - u_v)",
                "and c_t <= d_t and range | and range",
                "and range = \"inside\" and fit | and fit",
                "if(measured = \"measured\", h_u, none()) | h_u",
            })
    void anAlteredTextIsFoundOut(String text, String altered) {
        String part = LIBRARY.text("methods/plate-weir-levels.txt");
        assertThat(part).contains(text);
        Texts texts = new Texts();
        for (String folder : List.of("methods", "tables")) {
            for (String name : LIBRARY.names(folder)) {
                texts.with(folder + "/" + name, LIBRARY.text(folder + "/" + name));
            }
        }
        texts.with("methods/plate-weir-levels.txt", part.replace(text, altered));
        MethodLibrary methods = new MethodLibrary(texts);
        boolean found = weirs().anyMatch(weir ->
                !faults(methods.sheet(weir.method()), weir, new TreeMap<>()).isEmpty());
        assertThat(found).isTrue();
    }

    /** A head read where the weir itself would stand gives the flow back. */
    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "rectangular-weir; 0.1; set=ISO 1438, b=0.6 m, B=1.1 m, p=0.45 m",
                "rectangular-weir; 0.1; set=US constants, b=2 ft, B=4 ft, p=1.5 ft",
                "full-width-weir; 0.2; formula=White, b=1 m, p=0.5 m",
                "francis-weir; 0.1; ends=both ends contracted, b=1 m, B=3 m, p=0.8 m",
                "cipolletti-weir; 0.1; b=1 m, B=3 m, p=0.8 m",
                "v-notch-weir; 0.02; rules=ISO 1438, set=curve points, theta=60 deg, B=2 m, p=0.7 m",
                "v-notch-weir-partial; 0.02; rules=ISO 1438, B=0.8 m, p=0.3 m",
            })
    void aHeadReadGivesTheFlowBack(String method, double flow, String typed) {
        Map<String, String> entries = new LinkedHashMap<>(Map.of("z_c", "10 m"));
        for (String pair : typed.split(", ")) {
            String value = pair.substring(pair.indexOf('=') + 1);
            boolean number = value.matches("[0-9.]+ (m|ft|deg)");
            entries.put(pair.substring(0, pair.indexOf('=')), number ? value : "\"" + value + "\"");
        }
        String q = plain(flow) + " m3/s";
        Bench head = new Bench(sheet(method), WorkingSystem.SI, entries, List.of(Bench.typed("Q", q, "z_t", "9 m")));
        assertThat(word(head, "measured", 0)).isEqualTo("measured");
        assertThat(word(head, "level", 0)).isEqualTo("by the rating");
        String read = plain(head.number("h_1", 0)) + " m";
        Bench back = new Bench(
                sheet(method), WorkingSystem.SI, entries, List.of(Bench.typed("Q", q, "z_t", "9 m", "h_g", read)));
        assertThat(back.number("Q_r", 0)).isCloseTo(flow, within(1e-9 * flow));
    }

    @Test
    void stillWaterStandsAtTheCrestOrAtTheTailwater() {
        weirs(1, 1).forEach(weir -> {
            for (double level : List.of(CREST - 1, CREST + 0.4)) {
                Bench bench = bench(sheet(weir.method()), weir, List.of(0.0), List.of(level - CREST));
                assertThat(word(bench, "state", 0)).isEqualTo("no flow");
                assertThat(word(bench, "level", 0)).isEqualTo("still water");
                assertThat(bench.value("h_1", 0)).isEqualTo(new Value.None("no result"));
                assertThat(bench.number("z_u", 0)).as(weir.toString()).isEqualTo(Math.max(level, CREST));
                assertThat(bench.number("E_u", 0)).isEqualTo(bench.number("z_u", 0));
            }
        });
    }

    /** Faults of a weir at four flows under a rising tailwater, in words. */
    private static List<String> faults(MethodSheet method, Weir weir, Map<String, Integer> trials) {
        List<String> faults = new ArrayList<>();
        for (double ratio : List.of(0.003, 0.1, 1.0, 15.0)) {
            double head = weir.crest() * ratio;
            double flow = weir.width() > 0 ? 1.8 * weir.width() * Math.pow(head, 1.5) : 1.3 * Math.pow(head, 2.5);
            Bench first = bench(method, weir, List.of(flow), List.of(-1.0));
            if (!(first.value("h_c", 0) instanceof Value.Number)) {
                faults.add("no free head at " + flow);
                continue;
            }
            double free = first.number("h_c", 0);
            List<Double> tails = TAILS.stream().map(t -> t * free).toList();
            Bench bench = bench(method, weir, tails.stream().map(t -> flow).toList(), tails);
            count(bench, trials, faults);
            for (int c = 0; c < tails.size() && faults.isEmpty(); c++) {
                faults(bench, c, free, faults, " at " + flow + " m3/s, tailwater " + TAILS.get(c) + " heads");
            }
        }
        return faults;
    }

    private static void count(Bench bench, Map<String, Integer> trials, List<String> faults) {
        bench.trialRows().solved().forEach(root -> {
            String status = ((Value.Word) bench.value(root.status())).text();
            boolean nought = status.equals("below the bracket");
            if (!status.equals("closed") && !nought) {
                faults.add(root.root().symbol() + " " + status);
            }
            int open = (int) root.trials().stream()
                    .filter(trial -> !bench.value(trial).equals(Value.of(0)))
                    .count();
            if (nought && bench.number("h_c", 0) > FILM) {
                faults.add(root.root().symbol() + " " + status);
            }
            if (!nought) {
                trials.merge(root.root().symbol(), open, Math::max);
            }
        });
    }

    private static void faults(Bench bench, int c, double free, List<String> faults, String at) {
        double head = bench.number("h_u", c);
        double slack = 1e-9 * Math.max(free, head);
        if (head < free - slack || head < bench.number("h_t", c) - slack) {
            faults.add("head not above tailwater and free head" + at);
        }
        if (c > 0 && head < bench.number("h_u", c - 1) - slack) {
            faults.add("head falls" + at);
        }
        if (bench.number("h_t", c) > 0 && free > FILM) {
            carries(bench, c, faults, at);
        }
        boolean met = met(bench, "nappe is free: drop to the tailwater", c) && met(bench, "least head", c);
        boolean measured = word(bench, "measured", c).equals("measured");
        boolean byRating = word(bench, "level", c).equals("by the rating");
        if (measured && !met
                || bench.value("h_1", c) instanceof Value.Number != measured
                || byRating != measured
                || word(bench, "why", c).equals("free") != measured) {
            faults.add("a measurement where there is none, or none where there is" + at);
        }
        if (!Double.isFinite(bench.number("E_u", c)) || bench.number("E_u", c) < bench.number("z_u", c)) {
            faults.add("energy level under the water level" + at);
        }
    }

    /** Where the weir is drowned, the flow by Villemonte at the bounding head, less 15 %, is the flow. */
    private static void carries(Bench bench, int c, List<String> faults, String at) {
        if (bench.number("f_d", c) > 0.01 && Math.abs(bench.number("e_t", c)) > 1e-7) {
            faults.add("the bounding head does not carry the flow" + at);
        }
    }

    private static Bench bench(MethodSheet method, Weir weir, List<Double> flows, List<Double> tails) {
        List<Map<String, String>> cases = new ArrayList<>();
        for (int c = 0; c < flows.size(); c++) {
            cases.add(Bench.typed("Q", plain(flows.get(c)) + " m3/s", "z_t", plain(CREST + tails.get(c)) + " m"));
        }
        return new Bench(method, WorkingSystem.SI, weir.entries(), cases);
    }

    private static MethodSheet sheet(String name) {
        return new MethodLibrary(LIBRARY).sheet(name);
    }

    private static boolean met(Bench bench, String limit, int c) {
        return bench.verdict(limit, c).equals(Value.word("met"));
    }

    private static String word(Bench bench, String symbol, int c) {
        return ((Value.Word) bench.value(symbol, c)).text();
    }

    private static String plain(double number) {
        return new BigDecimal(number).toPlainString();
    }

    /** Measures the trials over many weirs. */
    public static void main(String[] arguments) {
        Map<String, Map<String, Integer>> most = new TreeMap<>();
        weirs(Integer.parseInt(arguments[0]), 7).forEach(weir -> {
            List<String> faults =
                    faults(sheet(weir.method()), weir, most.computeIfAbsent(weir.method(), m -> new TreeMap<>()));
            faults.forEach(fault -> System.out.println(weir + ": " + fault));
        });
        System.out.println(most);
    }
}
