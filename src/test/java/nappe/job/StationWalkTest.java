package nappe.job;

import static nappe.job.Designs.number;
import static nappe.job.Designs.typed;
import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.DoubleStream;
import nappe.calculation.Cell;
import nappe.calculation.ElementSheet;
import nappe.calculation.Scope;
import nappe.formula.Value;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.solve.Evaluation;
import nappe.source.BuiltInLibrary;
import nappe.source.CitedTable;
import nappe.station.Design;
import nappe.station.StationLayout;
import org.junit.jupiter.api.Test;

/**
 * A flume with its approach channel, walked through every size, no flow to ten times the rated flow, dry to deeply
 * drowned, two heights of the crest: each case gives levels that satisfy the equations, written here a second time, or
 * says in words why there is none.
 */
class StationWalkTest {
    private static final double G = 9.80665;
    private static final double[] OF_LEAST = {0, 0.3, 1.001};
    private static final double[] OF_GREATEST = {0.2, 0.999, 10};
    private static final double[] SUBMERGENCES = {-2, 0.6, 0.78, 0.87, 3};
    private static final double[] CRESTS = {0.05, 0.6};

    private final MethodLibrary methods = new MethodLibrary(new BuiltInLibrary());
    private final Map<String, Integer> seen = new LinkedHashMap<>();
    private int walked;

    @Test
    void everyCaseSatisfiesTheEquationsOrSaysWhyNot() {
        MethodSheet flume = methods.sheet("parshall-flume");
        CitedTable sizes = flume.tables().get("parshall-sizes");
        for (String size : words(sizes, "size")) {
            for (double crest : CRESTS) {
                walk(size, crest);
            }
        }
        assertThat(walked).isGreaterThanOrEqualTo(2000);
        assertThat(seen.keySet())
                .containsExactlyInAnyOrder(
                        "free", "submerged", "drowned", "no flow", "outside the rated range", "above the walls");
    }

    private void walk(String size, double crest) {
        Design probe = design(size, crest, 1, List.of(Designs.flowCase("one", 0.1, -1)));
        StationLayout first = StationLayout.bare(probe, methods::sheet);
        Map<Cell, Value> known = Evaluation.of(first.allCells());
        double least = known(known, first.scope("F1"), "Q_min");
        double greatest = known(known, first.scope("F1"), "Q_max");
        double head = known(known, first.scope("F1"), "h_max");
        List<Design.FlowCase> cases = new ArrayList<>();
        List<Double> flows = new ArrayList<>();
        DoubleStream.of(OF_LEAST).forEach(share -> flows.add(share * least));
        DoubleStream.of(OF_GREATEST).forEach(share -> flows.add(share * greatest));
        for (double flow : flows) {
            double freeHead = head * Math.pow(Math.max(flow, least / 10) / greatest, 1 / 1.55);
            for (double submergence : SUBMERGENCES) {
                cases.add(Designs.flowCase("case " + cases.size(), flow, 10 + submergence * freeHead));
            }
        }
        Design design = design(size, crest, head, cases);
        StationLayout station = StationLayout.bare(design, methods::sheet);
        Map<Cell, Value> values = Evaluation.of(station.allCells());
        values.values().forEach(value -> {
            if (value instanceof Value.Number number) {
                assertThat(number.value()).isFinite();
            }
        });
        station.limits().stream()
                .filter(limit -> limit.label().contains("have closed"))
                .forEach(limit -> closed(size, limit, values));
        for (int c = 0; c < cases.size(); c++) {
            check(size + ", crest " + crest + ", " + cases.get(c), station, values, c);
            walked++;
        }
    }

    private static void closed(String size, ElementSheet.LimitResult limit, Map<Cell, Value> values) {
        limit.verdicts()
                .forEach(verdict -> assertThat(values.get(verdict))
                        .as(size + ": " + limit.label() + " at " + verdict)
                        .isIn(Value.word("met"), Value.word("does not apply")));
    }

    private void check(String what, StationLayout station, Map<Cell, Value> values, int c) {
        At flume = new At(values, station.cases("F1").get(c));
        At channel = new At(values, station.cases("A1").get(c));
        double flow = flume.number("Q");
        double tailwater = flume.number("z_t") - 10;
        double head = flume.number("h_u");
        assertThat(head).as(what).isGreaterThanOrEqualTo(Math.max(0, tailwater) - 1e-12);
        String state = flume.word("state");
        String why = flume.word("why");
        seen.merge(state, 1, Integer::sum);
        seen.merge(why, 1, Integer::sum);
        boolean measured = flume.word("measured").equals("measured");
        assertThat(flume.isNumber("h_a")).as(what).isEqualTo(measured);
        assertThat(measured).as(what).isEqualTo(why.equals("free") || why.equals("submerged"));
        double rating =
                flume.number("Q_0") * flume.number("C") * Math.pow(head / flume.number("h_0"), flume.number("n"));
        if (state.equals("free")) {
            assertThat(rating / flow).as(what).isCloseTo(1, near(1e-9));
            assertThat(tailwater / head).as(what).isLessThanOrEqualTo(flume.number("S_x") * (1 + 1e-9));
        } else if (state.equals("submerged") && measured) {
            double submergence = Math.max(tailwater / head, flume.number("S_x"));
            double form = flume.word("used").equals("1967 form")
                    ? form1967(flume, head, submergence)
                    : subtraction(flume, rating, head, submergence);
            boolean heldAtTheFreeHead = Math.abs(rating / flow - 1) < 1e-9 && form > flow;
            assertThat(heldAtTheFreeHead ? flow : form).as(what).isCloseTo(flow, near(1e-8 * flow));
        }
        energy(what, flume, channel, flow);
    }

    private static double form1967(At flume, double head, double submergence) {
        return flume.number("Q_0")
                * flume.number("C_1")
                * Math.pow((1 - submergence) * head / flume.number("h_0"), flume.number("n_1"))
                / Math.pow(-(Math.log10(submergence) + 0.0044), flume.number("n_2"));
    }

    private static double subtraction(At flume, double free, double head, double submergence) {
        double base = head / 0.3048 / (Math.pow(1.8 / submergence, 1.8) - 2.45);
        double taken = Math.pow(base, 4.57 - 3.14 * submergence) + 0.093 * submergence;
        return free
                - flume.number("Q_0")
                        * flume.number("c_s")
                        * Math.pow(flume.number("W") / flume.number("h_0"), 0.815)
                        * taken;
    }

    /** The level above the channel, against a second writing of the energy equation in upright walls. */
    private void energy(String what, At flume, At channel, double flow) {
        double width = channel.number("b");
        double lower = channel.number("y_2");
        double upper = channel.number("y_u");
        double above = channel.number("y_1");
        double critical = Math.max(1e-4, Math.cbrt(flow * flow / (G * width * width)));
        double length = channel.number("L_c");
        double slope = channel.number("S_0");
        double offered = flume.number("E_u") - channel.number("z_f");
        double[] depths = {lower, upper, above};
        for (double depth : depths) {
            assertThat(depth).as(what).isGreaterThanOrEqualTo(critical * (1 - 1e-9));
        }
        double atLower = head(flow, width, lower);
        assertThat(atLower).as(what).isGreaterThanOrEqualTo(offered - 1e-9 * Math.abs(offered) - 1e-12);
        if (channel.word("c_2").equals("critical depth")) {
            assertThat(lower).as(what).isCloseTo(critical, near(1e-6 * critical));
        } else {
            double loss = channel.number("C_t")
                    * Math.abs(velocityHead(flow, width, lower) - (flume.number("E_u") - flume.number("z_u")));
            assertThat(atLower).as(what).isCloseTo(offered + loss, near(1e-8 * atLower));
        }
        double friction = (friction(flow, width, lower, channel) + friction(flow, width, upper, channel)) / 2 * length;
        double atUpper = head(flow, width, upper) + slope * length;
        if (channel.word("c_u").equals("critical depth")) {
            assertThat(upper).as(what).isCloseTo(critical, near(1e-6 * critical));
        } else {
            assertThat(atUpper).as(what).isCloseTo(atLower + friction, near(1e-8 * atUpper));
        }
        double screen = channel.number("K") * velocityHead(flow, width, upper);
        assertThat(head(flow, width, above))
                .as(what)
                .isCloseTo(head(flow, width, upper) + screen, near(1e-8 * (above + screen)));
        boolean inside = channel.word("walls").equals("level inside the walls");
        assertThat(inside).as(what).isEqualTo(channel.number("z_h") <= channel.number("z_w") * (1 + 1e-9));
        if (!inside) {
            seen.merge("above the walls", 1, Integer::sum);
        }
    }

    private static double velocityHead(double flow, double width, double depth) {
        double velocity = flow / (width * depth);
        return velocity * velocity / (2 * G);
    }

    private static double head(double flow, double width, double depth) {
        return depth + velocityHead(flow, width, depth);
    }

    private static double friction(double flow, double width, double depth, At channel) {
        double radius = width * depth / (width + 2 * depth);
        double root = channel.number("n") * flow / (width * depth) / Math.pow(radius, 2.0 / 3);
        return root * root;
    }

    private static org.assertj.core.data.Offset<Double> near(double offset) {
        return org.assertj.core.data.Offset.offset(Math.max(offset, 1e-12));
    }

    private static double known(Map<Cell, Value> values, Scope scope, String symbol) {
        return ((Value.Number) values.get(scope.cell(symbol))).value();
    }

    /** What a case of an element holds. */
    private record At(Map<Cell, Value> values, Scope scope) {
        double number(String symbol) {
            return StationWalkTest.known(values, scope, symbol);
        }

        boolean isNumber(String symbol) {
            return values.get(scope.cell(symbol)) instanceof Value.Number;
        }

        String word(String symbol) {
            return ((Value.Word) values.get(scope.cell(symbol))).text();
        }
    }

    private static List<String> words(CitedTable table, String column) {
        return table.columns().stream()
                .filter(one -> one.symbol().equals(column))
                .flatMap(one -> one.values().stream())
                .map(value -> ((Value.Word) value).text())
                .toList();
    }

    /** The crest lies so many greatest heads above the channel's floor; the walls end two greatest heads above it. */
    private static Design design(String size, double crest, double head, List<Design.FlowCase> cases) {
        Map<String, Design.Typed> flume = new LinkedHashMap<>();
        flume.put("size", typed(Value.word(size), "1"));
        flume.put("form", typed(Value.word(size.length() % 2 == 0 ? "1967 form" : "subtraction"), "1"));
        flume.put("submerged", typed(Value.word("accepted"), "1"));
        flume.put("z_f", number(10, "m"));
        Map<String, Design.Typed> channel = new LinkedHashMap<>();
        channel.put("serves", typed(Value.word("one unit"), "1"));
        channel.put("inflow", typed(Value.word("tranquil"), "1"));
        channel.put("b", number(2.5 * head, "m"));
        channel.put("m", number(0, "1"));
        channel.put("z_f", number(10 - crest * head, "m"));
        channel.put("L_c", number(10 * head, "m"));
        channel.put("S_0", number(0.002, "1"));
        channel.put("n", number(0.013, "1"));
        channel.put("C_t", number(0.2, "1"));
        channel.put("K", number(0.8, "1"));
        channel.put("z_w", number(10 + 1.5 * head, "m"));
        channel.put("L_s", number(30, "m"));
        return Designs.design(
                List.of(
                        new Design.Element("F1", "", "parshall-flume", flume),
                        new Design.Element("A1", "", "approach-channel", channel)),
                cases);
    }
}
