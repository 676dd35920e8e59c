package nappe.job;

import static nappe.job.Designs.number;
import static nappe.job.Designs.typed;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.formula.Value;
import nappe.method.MethodLibrary;
import nappe.results.Results;
import nappe.source.BuiltInLibrary;
import nappe.source.TextLibrary;
import nappe.station.Design;
import org.jspecify.annotations.Nullable;

/** An invented device D1 with two approach channels above it: A1 rectangular, A2 trapezoidal with a screen. */
public final class PretendApproach {
    /** A notch of an invented rating, which gives what a device gives, and no head where the tailwater drowns it. */
    private static final String DEVICE = """
            method    Pretend notch
            source    INV ; An invented book
            entry     z_c ; m ; level of the crest ; any sign
            entry     W ; m ; width of the notch
            case      Q = flow through one ; m3/s ; flow ; not negative
            take      z_t = water level ; m ; water level downstream ; any sign
            line      h_f = (Q/(1.7 m^(1/2)/s * W))^(2/3) ; m ; free head
            line      h_a = if(z_t <= z_c, h_f, none()) ; m ; head at the gauge
            line      z_u = max(z_t, z_c + h_f) ; m ; water level
            line      E_u = z_u + h_f/20 ; m ; energy level
            give      water level = z_u
            give      energy level = E_u
            give      head at the gauge = h_a
            give      control width = W
            """;

    private static final Job JOB = new Job(new MethodLibrary(library()), "0.1.0");

    private PretendApproach() {}

    /** No flow with and without a pool, a trickle, ordinary flow, a drowned device, and flow far above the walls. */
    public static Results inSixCases() {
        return results(
                Designs.flowCase("Dry", 0, 0.5),
                Designs.flowCase("Pool", 0, 1.6),
                Designs.flowCase("Trickle", 0.000001, 0.5),
                Designs.flowCase("Ordinary", 0.12, 0.6),
                Designs.flowCase("Flood", 0.1, 3),
                Designs.flowCase("Much", 20, 0.5));
    }

    public static Results results(Design.FlowCase... cases) {
        Map<String, Design.Typed> device = new LinkedHashMap<>();
        device.put("z_c", number(1, "m"));
        device.put("W", number(0.5, "m"));
        Design design = new Design(
                Designs.PROJECT,
                List.of(
                        new Design.Element("D1", "", "pretend-notch", device),
                        new Design.Element("A1", "", "approach-channel", channel(0.8, 0, 0.3, 0)),
                        new Design.Element("A2", "", "approach-channel", channel(0.81, 0.5, 0, 1.2))),
                List.of(cases),
                List.of(
                        demand("f_b", false, number(300, "mm")),
                        demand("V_m", false, number(0.3, "m/s")),
                        demand("z_1", true, number(1.9, "m")),
                        demand("E_1", true, number(2, "m"))),
                List.of(),
                List.of(),
                List.of(),
                List.of());
        return JOB.run(design, List.of()).results();
    }

    private static Design.Demand demand(String symbol, boolean atMost, Design.Typed value) {
        return new Design.Demand("A2", symbol, atMost, value, "demand on " + symbol, "Invented permit, clause 3");
    }

    private static Map<String, Design.Typed> channel(double floor, double side, double transition, double screen) {
        Map<String, Design.Typed> channel = new LinkedHashMap<>();
        channel.put("serves", typed(Value.word("one unit"), "1"));
        channel.put("inflow", typed(Value.word("tranquil"), "1"));
        channel.put("b", number(900, "mm"));
        channel.put("m", number(side, "1"));
        channel.put("z_f", number(floor, "m"));
        channel.put("L_c", number(5, "m"));
        channel.put("S_0", number(0.002, "1"));
        channel.put("n", number(0.013, "1"));
        channel.put("C_t", number(transition, "1"));
        channel.put("K", number(screen, "1"));
        channel.put("z_w", number(2.2, "m"));
        channel.put("L_s", number(10, "m"));
        channel.put("x_j", typed(new Value.None(Value.NOT_GIVEN), "m"));
        return channel;
    }

    private static TextLibrary library() {
        BuiltInLibrary builtIn = new BuiltInLibrary();
        return new TextLibrary() {
            @Override
            public @Nullable String text(String path) {
                return path.equals("methods/pretend-notch.txt") ? DEVICE : builtIn.text(path);
            }

            @Override
            public List<String> names(String folder) {
                List<String> names = new ArrayList<>(builtIn.names(folder));
                if (folder.equals("methods")) {
                    names.add("pretend-notch.txt");
                }
                return names;
            }
        };
    }
}
