package nappe.solve;

import static nappe.solve.Bench.typed;
import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Cell;
import nappe.formula.Value;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.source.BuiltInLibrary;
import nappe.unit.WorkingSystem;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;

/** The trials of plates and nozzles: the flow from a reading, where the coefficient depends on the flow. */
class PressureMeterTrialsTest {
    private static final MethodLibrary METHODS = new MethodLibrary(new BuiltInLibrary());
    private static final List<String> TAPS = List.of("corner", "flange", "D and D/2");
    private static final List<String> NOZZLES = List.of("ISA 1932", "long radius", "Venturi nozzle");
    private static final String CLOSED = "the trials for Re_h have closed";

    /** Rows of ten that were needed at worst over the range of each standard, from 1 Pa to 250 kPa. */
    private static final int WORST = 7;

    @Property(tries = 100)
    void theTrialsCloseOverTheWholeRangeOfTheStandard(
            @ForAll @IntRange(min = 0, max = 5) int device,
            @ForAll @DoubleRange(min = 0, max = 1) double pipe,
            @ForAll @DoubleRange(min = 0, max = 1) double ratio,
            @ForAll @DoubleRange(min = 0, max = 5.39) double logPressure,
            @ForAll @DoubleRange(min = 0, max = 40) double temperature) {
        boolean plate = device < 3;
        double diameter = plate ? 0.05 * Math.pow(20, pipe) : 0.065 * Math.pow(500.0 / 65, pipe);
        double beta = plate ? 0.1 + 0.65 * ratio : 0.32 + 0.45 * ratio;
        Bench bench = bench(device, diameter, beta, Math.pow(10, logPressure), temperature);
        assertThat(bench.verdict(CLOSED, 0)).isEqualTo(Value.word("met"));
        assertThat(bench.number("Q_1", 0)).isPositive();
        assertThat(trials(bench)).isLessThanOrEqualTo(WORST);
    }

    /** Entries ten times larger or smaller than the standard knows: closed, or no result and the limit says so. */
    @Property(tries = 100)
    void farOutsideTheRangeTheTrialsCloseOrSayThatTheyHaveNot(
            @ForAll @IntRange(min = 0, max = 5) int device,
            @ForAll @DoubleRange(min = -2.3, max = 1) double logDiameter,
            @ForAll @DoubleRange(min = 0.01, max = 0.99) double beta,
            @ForAll @DoubleRange(min = -1, max = 7) double logPressure,
            @ForAll @DoubleRange(min = 0, max = 40) double temperature) {
        Bench bench = bench(device, Math.pow(10, logDiameter), beta, Math.pow(10, logPressure), temperature);
        if (bench.verdict(CLOSED, 0).equals(Value.word("met"))) {
            assertThat(bench.number("Q_1", 0)).isPositive();
        } else {
            assertThat(bench.value("Q_1", 0)).isInstanceOf(Value.None.class);
        }
        bench.cells().forEach(cell -> {
            if (bench.value(cell) instanceof Value.Number number) {
                assertThat(number.value()).as(cell.symbol()).isFinite();
            }
        });
    }

    private static long trials(Bench bench) {
        List<Cell> rows = bench.trialRows().solved().get(0).trials();
        return rows.stream()
                .filter(row -> !bench.value(row).equals(Value.of(0)))
                .count();
    }

    private static Bench bench(int device, double diameter, double beta, double pressure, double temperature) {
        boolean plate = device < 3;
        MethodSheet method = METHODS.sheet(plate ? "orifice-plate" : "flow-nozzle");
        Map<String, String> entries = new HashMap<>(typed(
                "T", temperature + " degC",
                "z_s", "0 m",
                "D", diameter + " m",
                "d", beta * diameter + " m",
                "z_k", "1 m",
                "L_p", "0 m",
                "f_D", "0",
                "gauge", "\"transmitter only\"",
                "fitting", "\"none\"",
                "L_s", "100 m",
                "L_d", "100 m"));
        entries.putAll(plate ? typed("taps", word(TAPS, device), "second", "\"none\"", "L_2", "0 m") : Map.of());
        entries.putAll(plate ? Map.of() : typed("nozzle", word(NOZZLES, device - 3)));
        Map<String, String> flow = typed("Q", "0.01 m3/s", "z_t", "5 m", "E_t", "5 m", "p_g", pressure + " Pa");
        return new Bench(method, WorkingSystem.SI, entries, List.of(flow));
    }

    private static String word(List<String> words, int index) {
        return '"' + words.get(index) + '"';
    }
}
