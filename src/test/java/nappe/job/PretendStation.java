package nappe.job;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.formula.Value;
import nappe.method.MethodLibrary;
import nappe.results.Results;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;
import nappe.station.Design.Typed;
import nappe.station.FoundFlows;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;

/**
 * A weir above a flume that never was, in five cases; numbers may be changed before it is computed.
 *
 * @param floor level of the flume's crest, ft
 * @param flows in MGD
 * @param levels water levels downstream in ft; NaN where none is given
 * @param headRead in the third case, in
 * @param notch width of the weir's notch, in
 */
record PretendStation(double floor, List<Double> flows, List<Double> levels, double headRead, double notch) {
    static final PretendStation AS_ISSUED = new PretendStation(
            101.25, List.of(0.0, 0.5, 2.2, 7.4, 30.0), List.of(Double.NaN, 100.0, 101.5, 102.2, 103.5), 13.2, 24);

    private static final Job JOB = new Job(new MethodLibrary(new BuiltInLibrary()), "0.0.0");

    Job.Done done(WorkingSystem system) {
        return JOB.run(design(system), List.of());
    }

    /** With flows found before. */
    Results results(WorkingSystem system, FoundFlows found) {
        return JOB.run(design(system), List.of(), found).results();
    }

    private Design design(WorkingSystem system) {
        boolean us = system == WorkingSystem.US;
        Design.Project project = new Design.Project(
                "Pretend works",
                "Made-up Engineers",
                "Nowhere District",
                "NW-7",
                "Station M1",
                "A",
                LocalDate.of(2026, 3, 1),
                "for checking",
                system,
                us,
                Unit.parse(us ? "MGD" : "L/s"),
                Unit.parse(us ? "in" : "mm"),
                "invented datum",
                "",
                "For review only.",
                true);
        Map<String, Typed> flume = new LinkedHashMap<>();
        flume.put("size", typed(Value.word("1 ft"), "1"));
        flume.put("form", typed(Value.word("subtraction"), "1"));
        flume.put("submerged", typed(Value.word("refused"), "1"));
        flume.put("z_f", typed(Value.of(floor), "ft"));
        Map<String, Typed> weir = new LinkedHashMap<>();
        weir.put("set", typed(Value.word("ISO 1438"), "1"));
        weir.put("b", typed(Value.of(notch), "in"));
        weir.put("B", typed(Value.of(6), "ft"));
        weir.put("p", typed(Value.of(1.5), "ft"));
        weir.put("z_c", typed(Value.of(103), "ft"));
        List<Design.FlowCase> cases = new ArrayList<>();
        for (int i = 0; i < flows.size(); i++) {
            Map<String, Typed> heads = new LinkedHashMap<>();
            heads.put("F1.h_g", typed(i == 2 ? Value.of(headRead) : notGiven(), "in"));
            heads.put("W1.h_g", typed(notGiven(), "in"));
            Value level = levels.get(i).isNaN() ? notGiven() : Value.of(levels.get(i));
            cases.add(new Design.FlowCase(
                    "Case " + (i + 1),
                    "peak hour",
                    "2040",
                    typed(Value.of(flows.get(i)), "MGD"),
                    typed(level, "ft"),
                    "10 years",
                    heads));
        }
        return new Design(
                project,
                List.of(
                        new Design.Element("F1", "Pretend flume", "parshall-flume", flume),
                        new Design.Element("W1", "Pretend weir", "rectangular-weir", weir)),
                cases,
                List.of(new Design.Demand(
                        "F1", "h_a", true, typed(Value.of(2), "ft"), "head no higher", "Pretend permit, p. 3")),
                List.of(new Design.Assumption("Water levels are invented", "none", "nobody", true)),
                List.of("An invented reference"),
                List.of(new Design.Requirement("Show the limits", "Pretend permit", "Summary of limits")),
                List.of(new Design.RevisionNote("A", "2026-03-01", "first")));
    }

    private static Value notGiven() {
        return new Value.None(Value.NOT_GIVEN);
    }

    private static Typed typed(Value value, String unit) {
        return new Typed(value, Unit.parse(unit), "made up", "known", new Design.Origin("Made up", "A1"));
    }
}
