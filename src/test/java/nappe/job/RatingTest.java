package nappe.job;

import static nappe.solve.Bench.typed;
import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.formula.Formula;
import nappe.formula.FormulaParser;
import nappe.formula.Value;
import nappe.method.Item;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.method.Rating;
import nappe.solve.Bench;
import nappe.source.BuiltInLibrary;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** A closure equals a rerun: each row of a rating table is, to the last bit, what the method gives at that head. */
class RatingTest {
    private static final MethodLibrary METHODS = new MethodLibrary(new BuiltInLibrary());
    private static final Verification VERIFICATION = new Verification(METHODS);

    static List<String> sizes() {
        return METHODS.declared("parshall-flume").get(0).words();
    }

    @ParameterizedTest
    @MethodSource("sizes")
    void everyRowOfAParshallFlumeIsARerunAtThatHead(String size) {
        rowsAreReruns("parshall-flume", WorkingSystem.SI, typed("size", "\"" + size + "\"", "z_f", "1 m"));
    }

    @ParameterizedTest
    @CsvSource({"0.3, 0.9, 0.2", "0.5, 0.5, 0.5", "0.6, 1.1, 0.45", "1.2, 3, 1", "2, 40, 0.15", "4.9, 6.2, 2.5"})
    void everyRowOfAWeirIsARerunAtThatHead(String b, String channel, String p) {
        rowsAreReruns(
                "rectangular-weir",
                WorkingSystem.SI,
                typed("set", "\"ISO 1438\"", "b", b + " m", "B", channel + " m", "p", p + " m", "z_c", "2 m"));
    }

    @Test
    void soItIsInUsCustomaryUnits() {
        rowsAreReruns("parshall-flume", WorkingSystem.US, typed("size", "\"3 ft\"", "z_f", "1 ft"));
        rowsAreReruns(
                "rectangular-weir",
                WorkingSystem.US,
                typed("set", "\"US constants\"", "b", "2 ft", "B", "4.5 ft", "p", "1.25 ft", "z_c", "2 ft"));
    }

    static List<DeviceStations.Station> stations() {
        return DeviceStations.all();
    }

    @ParameterizedTest
    @MethodSource("stations")
    void everyRowOfEveryDeviceIsARerun(DeviceStations.Station station) {
        rowsAreReruns(station.method(), WorkingSystem.SI, station.entries());
    }

    private static void rowsAreReruns(String method, WorkingSystem system, Map<String, String> entries) {
        Bench bench =
                new Bench(METHODS.sheet(method), system, entries, List.of(typed("Q", "0.1 m3/s", "z_t", "0.1 m")));
        Block.Table table = bench.ratings().get(0);
        Rating rating = METHODS.sheet(method).ratings().get(0);
        assertThat(table.rows()).hasSize(rating.steps() + 1);
        Set<String> compared = new HashSet<>();
        for (Block.Row row : table.rows()) {
            double head = 0;
            for (Block.Item item : row.items()) {
                if (item instanceof Block.Content content) {
                    Cell cell = content.cell();
                    if (cell.symbol().equals(rating.free())) {
                        head = ((Value.Number) bench.value(cell)).value();
                    } else if (restsOnlyOn(rating.free(), method, cell.symbol())) {
                        rerun(bench, system, method, entries, head, cell);
                        compared.add(cell.symbol());
                    }
                }
            }
            assertThat(head).isPositive();
        }
        assertThat(compared).containsAnyElementsOf(rating.results());
    }

    /** Members of a root inside the row rest on the root's own free symbol: a rerun at the head alone does not name them. */
    private static boolean restsOnlyOn(String free, String method, String symbol) {
        MethodSheet sheet = METHODS.sheet(method);
        return sheet.item(symbol) != null
                && sheet.reach().getOrDefault(symbol, Set.of()).stream()
                        .noneMatch(s -> sheet.item(s) instanceof Item.Free && !s.equals(free));
    }

    private static void rerun(
            Bench bench, WorkingSystem system, String method, Map<String, String> entries, double head, Cell cell) {
        Map<String, Formula> all = new LinkedHashMap<>();
        entries.forEach((symbol, text) -> all.put(symbol, FormulaParser.parse(text)));
        all.put(
                METHODS.sheet(method).ratings().get(0).free(),
                new Formula.Quantity(
                        head,
                        Double.toString(head),
                        system.coherentUnit(Unit.parse("m").dimension())));
        CheckRow row = new CheckRow(
                "T",
                method,
                entries + " at " + head,
                all,
                cell.symbol(),
                0,
                cell.unit(),
                "0 abs",
                "this test",
                "derived",
                "",
                "");
        CheckOutcome outcome = VERIFICATION.run(row, system);
        if (bench.value(cell) instanceof Value.Number number) {
            assertThat(outcome.computed())
                    .as(cell.symbol() + " of " + row.entriesText())
                    .isEqualTo(number.value());
        } else {
            assertThat(outcome.words()).isEqualTo("no result");
            assertThat(bench.value(cell)).isEqualTo(new Value.None("no result"));
        }
    }

    @ParameterizedTest
    @MethodSource("sizes")
    void aRatingRisesWithTheHead(String size) {
        Bench bench = new Bench(
                METHODS.sheet("parshall-flume"),
                WorkingSystem.SI,
                typed("size", "\"" + size + "\"", "z_f", "1 m"),
                List.of(typed("Q", "0.1 m3/s", "z_t", "0.1 m")));
        List<Double> flows = new ArrayList<>();
        for (Block.Row row : bench.ratings().get(0).rows()) {
            for (Block.Item item : row.items()) {
                if (item instanceof Block.Content content
                        && content.cell().symbol().equals("Q_h")) {
                    flows.add(((Value.Number) bench.value(content.cell())).value());
                }
            }
        }
        assertThat(flows).hasSize(21).isSorted().doesNotHaveDuplicates();
    }
}
