package nappe.job;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.formula.Formula;
import nappe.formula.FormulaParser;
import nappe.formula.Value;
import nappe.method.Declared;
import nappe.method.MethodLibrary;
import nappe.source.BuiltInLibrary;
import nappe.source.CsvText;
import nappe.station.Design;
import nappe.station.Design.FlowCase;
import nappe.station.Design.Typed;
import nappe.unit.Unit;

/** The invented stations of one device each in {@code src/test/devices/every-device.csv}. */
public final class DeviceStations {
    private static final Path FILE = Path.of("src/test/devices/every-device.csv");
    private static final MethodLibrary METHODS = new MethodLibrary(new BuiltInLibrary());

    private DeviceStations() {}

    /**
     * One of them.
     *
     * @param entries as typed, with their units: {@code 0.3 m}, {@code "concrete"}
     * @param flows in m3/s, from too small to too large
     * @param high a level at which the last but one of the flows stands once more
     */
    public record Station(String method, Map<String, String> entries, List<Double> flows, double level, double high) {
        @Override
        public String toString() {
            return method;
        }

        /** The station as if it had been read from an input workbook. */
        public Design design() {
            Map<String, Typed> typed = new LinkedHashMap<>();
            Map<String, Typed> perCase = new LinkedHashMap<>();
            for (Declared one : METHODS.declared(method)) {
                Typed value = typed(one, entries.get(one.symbol()));
                if (one.kind() == Declared.Kind.CASE) {
                    perCase.put("X1." + one.symbol(), value);
                } else {
                    typed.put(one.symbol(), value);
                }
            }
            List<FlowCase> cases = new ArrayList<>();
            for (double flow : flows) {
                cases.add(flowCase("flow " + flow, flow, level, perCase));
            }
            cases.add(flowCase("high", flows.get(flows.size() - 2), high, perCase));
            return Designs.design(List.of(new Design.Element("X1", "", method, typed)), cases);
        }

        private static FlowCase flowCase(String name, double flow, double level, Map<String, Typed> perCase) {
            return new FlowCase(
                    name, "1 h", "2030", Designs.number(flow, "m3/s"), Designs.number(level, "m"), "", perCase);
        }

        private static Typed typed(Declared declared, String text) {
            if (text == null) {
                return new Typed(
                        new Value.None(Value.NOT_GIVEN), declared.unit(), "", "known", new Design.Origin("X1", "A1"));
            }
            Formula formula = FormulaParser.parse(text);
            if (formula instanceof Formula.Word word) {
                return Designs.typed(Value.word(word.text()), "1");
            }
            return formula instanceof Formula.Quantity quantity
                    ? Designs.number(quantity.value(), quantity.unit().text())
                    : Designs.number(
                            ((Formula.Numeral) formula).value(), Unit.one().text());
        }
    }

    /** All of them, in the order of the file. */
    public static List<Station> all() {
        try {
            List<Station> all = new ArrayList<>();
            List<CsvText.Row> rows =
                    CsvText.of(FILE.toString(), Files.readString(FILE)).rows();
            for (CsvText.Row row : rows.subList(1, rows.size())) {
                List<String> cells =
                        row.cells().stream().map(CsvText.Cell::text).toList();
                all.add(new Station(
                        cells.get(0),
                        entries(cells.get(1)),
                        Arrays.stream(cells.get(2).split(" "))
                                .map(Double::valueOf)
                                .toList(),
                        Double.parseDouble(cells.get(3)),
                        Double.parseDouble(cells.get(4))));
            }
            return all;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Map<String, String> entries(String text) {
        Map<String, String> entries = new LinkedHashMap<>();
        for (String one : text.split(";")) {
            String[] sides = one.split("=", 2);
            entries.put(sides[0].strip(), sides[1].strip());
        }
        return entries;
    }
}
