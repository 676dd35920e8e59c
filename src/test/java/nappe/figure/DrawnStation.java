package nappe.figure;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.deliver.pdf.PdfDelivery;
import nappe.formula.Value;
import nappe.job.Job;
import nappe.method.MethodLibrary;
import nappe.results.Results;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;
import nappe.station.Design.Typed;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;

/** A station of one device, all of it invented, in two cases; the first is drawn. */
public final class DrawnStation {
    private DrawnStation() {}

    /**
     * A flume whose crest is at 100.
     *
     * @param level of the water downstream, in the unit of the system; NaN where none is given
     */
    static Results flume(WorkingSystem system, String size, double flow, double level) {
        String length = system == WorkingSystem.US ? "ft" : "m";
        Map<String, Typed> typed = new LinkedHashMap<>();
        typed.put("size", typed(Value.word(size), "1"));
        typed.put("form", typed(Value.word("1967 form"), "1"));
        typed.put("submerged", typed(Value.word("accepted"), "1"));
        typed.put("z_f", typed(Value.of(100), length));
        return results(system, "parshall-flume", typed, flow, level);
    }

    /** A weir whose crest is at 100 m. */
    static Results weir(double notch, double channel, double height, double flow, double level) {
        Map<String, Typed> typed = new LinkedHashMap<>();
        typed.put("set", typed(Value.word("ISO 1438"), "1"));
        typed.put("b", typed(Value.of(notch), "m"));
        typed.put("B", typed(Value.of(channel), "m"));
        typed.put("p", typed(Value.of(height), "m"));
        typed.put("z_c", typed(Value.of(100), "m"));
        return results(WorkingSystem.SI, "rectangular-weir", typed, flow, level);
    }

    private static Results results(
            WorkingSystem system, String method, Map<String, Typed> typed, double flow, double level) {
        boolean us = system == WorkingSystem.US;
        String length = us ? "ft" : "m";
        String volume = us ? "ft3/s" : "m3/s";
        Design.Project project = new Design.Project(
                "Pretend works",
                "Made-up Engineers",
                "Nowhere District",
                "NW-9",
                "Drawn device",
                "A",
                LocalDate.of(2026, 3, 1),
                "preliminary",
                system,
                us,
                Unit.parse(us ? "MGD" : "L/s"),
                Unit.parse(us ? "in" : "mm"),
                "invented datum",
                "",
                "For review only.",
                true);
        List<Design.FlowCase> cases = new ArrayList<>();
        for (String name : List.of("drawn", "half of it")) {
            double q = name.equals("drawn") ? flow : flow / 2;
            cases.add(new Design.FlowCase(
                    name,
                    "peak hour",
                    "2040",
                    typed(Value.of(q), volume),
                    typed(Double.isNaN(level) ? notGiven() : Value.of(level), length),
                    "10 years",
                    Map.of("X1.h_g", typed(notGiven(), length))));
        }
        Design design = new Design(
                project,
                List.of(new Design.Element("X1", "Pretend device", method, typed)),
                cases,
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of());
        return new Job(new MethodLibrary(new BuiltInLibrary()), "0.0.0")
                .run(design, List.of())
                .results();
    }

    private static Value notGiven() {
        return new Value.None(Value.NOT_GIVEN);
    }

    private static Typed typed(Value value, String unit) {
        return new Typed(value, Unit.parse(unit), "made up", "known", new Design.Origin("Made up", "A1"));
    }

    /** Devices of all kinds, small and large, free and not. */
    public static Map<String, Results> all() {
        Map<String, Results> all = new LinkedHashMap<>();
        all.put("inch", flume(WorkingSystem.US, "1 in", 0.1, 99.9));
        all.put("six", flume(WorkingSystem.SI, "6 in", 0.05, 100.1));
        all.put("foot", flume(WorkingSystem.US, "1 ft", 4, 100.3));
        all.put("drowned", flume(WorkingSystem.US, "1 ft", 4, 101.3));
        all.put("fifty", flume(WorkingSystem.US, "50 ft", 1000, 102));
        all.put("metric", flume(WorkingSystem.SI, "0.6 m", 0.3, 99.9));
        all.put("nolevel", flume(WorkingSystem.US, "2 ft", 10, Double.NaN));
        all.put("weir", weir(2.0, 2.0, 0.3, 0.4, 99.8));
        all.put("smallweir", weir(0.2, 1.2, 0.6, 0.01, 99.0));
        all.put("wetweir", weir(0.6, 1.2, 0.6, 0.1, 100.1));
        return all;
    }

    /** Writes packages to a folder, to be looked at. */
    public static void main(String[] arguments) throws IOException {
        Path folder = Path.of(arguments[0]);
        for (Map.Entry<String, Results> one : all().entrySet()) {
            Files.write(
                    folder.resolve(one.getKey() + ".pdf"),
                    PdfDelivery.render(one.getValue()).bytes());
        }
    }
}
