package nappe.job;

import static nappe.job.Designs.flowCase;
import static nappe.job.Designs.number;
import static nappe.job.Designs.typed;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Sheet;
import nappe.calculation.Sureness;
import nappe.formula.Value;
import nappe.method.MethodLibrary;
import nappe.results.Results;
import nappe.source.BuiltInLibrary;
import nappe.source.TextLibrary;
import nappe.station.Design;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;

/** A device with two approach channels in a row above it: what is handed on, case by case. */
class ApproachChannelLinkTest {
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

    @Test
    void eachChannelTakesTheLevelsOfTheOneBelowIt() {
        Results results = run(flowCase("Low", 0.02, 0.5), flowCase("High", 0.3, 0.6));
        assertThat(values(results, "A1", "z_g")).isEqualTo(values(results, "D1", "z_u"));
        assertThat(values(results, "A1", "E_g")).isEqualTo(values(results, "D1", "E_u"));
        assertThat(values(results, "A2", "z_g")).isEqualTo(values(results, "A1", "z_1"));
        assertThat(values(results, "A2", "E_g")).isEqualTo(values(results, "A1", "E_1"));
        assertThat(values(results, "A2", "h")).isEqualTo(values(results, "D1", "h_a"));
        assertThat(values(results, "A2", "w")).allMatch(Value.of(0.5)::equals);
        assertThat(values(results, "A2", "state")).containsExactly(Value.word("tranquil"), Value.word("tranquil"));
        assertThat(numbers(results, "A2", "d_2")).allSatisfy(d -> assertThat(d).isCloseTo(0, within(1e-12)));
    }

    @Test
    void aDrownedDeviceLeavesTheLevelsAndTakesTheHead() {
        Results results = run(flowCase("Flood", 0.1, 3));
        assertThat(numbers(results, "A2", "z_1").get(0)).isGreaterThan(3);
        assertThat(values(results, "A2", "h")).containsExactly(new Value.None("no result"));
        assertThat(values(results, "A2", "L_j")).containsExactly(new Value.None("no result"));
        assertThat(values(results, "A2", "walls"))
                .containsExactly(Value.word("above the walls: levels hold only for higher walls"));
    }

    @Test
    void withoutFlowThePoolIsLevel() {
        Results results = run(flowCase("Dry", 0, 0.5), flowCase("Pool", 0, 1.6));
        assertThat(numbers(results, "A2", "z_1").get(1)).isEqualTo(1.6);
        assertThat(numbers(results, "A2", "F_m")).containsExactly(0.0, 0.0);
        assertThat(values(results, "A2", "state")).containsExactly(Value.word("no flow"), Value.word("no flow"));
    }

    @Test
    void cellsAndFormulasAreTheSameWhateverTheNumbers() {
        assertThat(described(run(flowCase("One", 0, 0.5)))).isEqualTo(described(run(flowCase("One", 9, 4))));
    }

    @Test
    void noCellThatIsSureHoldsWordsInPlaceOfANumber() {
        Results results = run(flowCase("Dry", 0, 0.5), flowCase("Flood", 0.02, 3), flowCase("Much", 30, 0.5));
        assertThat(results.cells())
                .filteredOn(cell ->
                        cell.sureness() == Sureness.SURE && cell.place().sheet().matches("A[12].*"))
                .isNotEmpty()
                .allSatisfy(cell -> assertThat(results.value(cell)).isNotInstanceOf(Value.None.class));
    }

    static Results run(Design.FlowCase... cases) {
        Map<String, Design.Typed> device = new LinkedHashMap<>();
        device.put("z_c", number(1, "m"));
        device.put("W", number(0.5, "m"));
        return JOB.run(
                        Designs.design(
                                List.of(
                                        new Design.Element("D1", "", "pretend-notch", device),
                                        new Design.Element("A1", "", "approach-channel", channel(0.8, 0.3, 0)),
                                        new Design.Element("A2", "", "approach-channel", channel(0.81, 0, 1.2))),
                                List.of(cases)),
                        List.of())
                .results();
    }

    private static Map<String, Design.Typed> channel(double floor, double transition, double screen) {
        Map<String, Design.Typed> channel = new LinkedHashMap<>();
        channel.put("serves", typed(Value.word("one unit"), "1"));
        channel.put("inflow", typed(Value.word("tranquil"), "1"));
        channel.put("b", number(900, "mm"));
        channel.put("m", number(0, "1"));
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

    private static List<String> described(Results results) {
        return results.cells().stream()
                .map(cell -> cell + (cell.formula() == null ? "" : " = " + cell.formula() + " " + cell.sureness()))
                .toList();
    }

    private static List<Double> numbers(Results results, String tag, String symbol) {
        return values(results, tag, symbol).stream()
                .map(value -> ((Value.Number) value).value())
                .toList();
    }

    /** The values of a symbol on the sheet of an element, one per case. */
    private static List<Value> values(Results results, String tag, String symbol) {
        List<Value> values = new ArrayList<>();
        for (Sheet sheet : results.sheets()) {
            for (Block block : sheet.blocks()) {
                if (sheet.name().equals(tag) && block instanceof Block.Lines lines) {
                    for (Block.Line line : lines.lines()) {
                        if (line.symbol().equals(symbol) && values.isEmpty()) {
                            for (Cell cell : line.perCase()) {
                                values.add(results.value(cell));
                            }
                        }
                    }
                }
            }
        }
        return values;
    }
}
