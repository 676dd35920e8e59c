package nappe.job;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.formula.Value;
import nappe.station.Design;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;

/** Designs of stations that never were. */
final class Designs {
    static final Design.Project PROJECT = new Design.Project(
            "Pretend works",
            "Any Firm (fictional)",
            "Nowhere District (fictional)",
            "PW-1",
            "Pretend station",
            "A",
            LocalDate.of(2030, 1, 2),
            "preliminary",
            WorkingSystem.SI,
            false,
            Unit.parse("L/s"),
            Unit.parse("mm"),
            "invented datum",
            "",
            "for a test only",
            true);

    private Designs() {}

    /** A weir downstream of a Parshall flume; the flume's floor is 1.6 m, the weir's crest 1.2 m above the datum. */
    static Design weirBelowFlume(double floor, Design.FlowCase... cases) {
        Map<String, Design.Typed> weir = new LinkedHashMap<>();
        weir.put("set", typed(Value.word("ISO 1438"), "1"));
        weir.put("b", number(0.8, "m"));
        weir.put("B", number(1.6, "m"));
        weir.put("p", number(0.6, "m"));
        weir.put("z_c", number(1.2, "m"));
        Map<String, Design.Typed> flume = new LinkedHashMap<>();
        flume.put("size", typed(Value.word("1 ft"), "1"));
        flume.put("form", typed(Value.word("1967 form"), "1"));
        flume.put("submerged", typed(Value.word("refused"), "1"));
        flume.put("z_f", number(floor, "m"));
        return design(
                List.of(
                        new Design.Element("W1", "", "rectangular-weir", weir),
                        new Design.Element("F1", "", "parshall-flume", flume)),
                List.of(cases));
    }

    static Design design(List<Design.Element> elements, List<Design.FlowCase> cases) {
        return new Design(PROJECT, elements, cases, List.of(), List.of(), List.of(), List.of(), List.of());
    }

    static Design.FlowCase flowCase(String name, double flow, double level) {
        return new Design.FlowCase(name, "1 h", "2030", number(flow, "m3/s"), number(level, "m"), "", Map.of());
    }

    static Design.Typed number(double value, String unit) {
        return typed(Value.of(value), unit);
    }

    static Design.Typed typed(Value value, String unit) {
        return new Design.Typed(value, Unit.parse(unit), "invented", "known", new Design.Origin("Entries", "C7"));
    }

    /** Each design differs from the one given in one typed value; the key says in which. */
    static Map<String, Design> changedInOneValue(Design d) {
        Map<String, Design> changed = new LinkedHashMap<>();
        Design.Project p = d.project();
        List<Design.Project> projects = List.of(
                project(p, 0),
                project(p, 1),
                project(p, 2),
                project(p, 3),
                project(p, 4),
                project(p, 5),
                project(p, 6),
                project(p, 7),
                project(p, 8),
                project(p, 9),
                project(p, 10),
                project(p, 11),
                project(p, 12),
                project(p, 13),
                project(p, 14),
                project(p, 15));
        for (int i = 0; i < projects.size(); i++) {
            changed.put(
                    "project " + i,
                    new Design(
                            projects.get(i),
                            d.elements(),
                            d.cases(),
                            d.demands(),
                            d.assumptions(),
                            d.references(),
                            d.requirements(),
                            d.revisions()));
        }
        for (int e = 0; e < d.elements().size(); e++) {
            Design.Element element = d.elements().get(e);
            changed.put(
                    "tag " + e,
                    withElement(d, e, new Design.Element("X9", element.title(), element.method(), element.typed())));
            changed.put(
                    "title " + e,
                    withElement(d, e, new Design.Element(element.tag(), "other", element.method(), element.typed())));
            for (String symbol : element.typed().keySet()) {
                for (Design.Typed other : others(element.typed().get(symbol))) {
                    Map<String, Design.Typed> typed = new LinkedHashMap<>(element.typed());
                    typed.put(symbol, other);
                    changed.put(
                            element.tag() + "." + symbol + " " + other,
                            withElement(
                                    d, e, new Design.Element(element.tag(), element.title(), element.method(), typed)));
                }
            }
        }
        for (int c = 0; c < d.cases().size(); c++) {
            Design.FlowCase one = d.cases().get(c);
            changed.put(
                    "name " + c,
                    withCase(
                            d,
                            c,
                            new Design.FlowCase(
                                    "other",
                                    one.period(),
                                    one.year(),
                                    one.flow(),
                                    one.tailwater(),
                                    one.tailwaterReturn(),
                                    one.typed())));
            changed.put(
                    "period " + c,
                    withCase(
                            d,
                            c,
                            new Design.FlowCase(
                                    one.name(),
                                    "1 d",
                                    one.year(),
                                    one.flow(),
                                    one.tailwater(),
                                    one.tailwaterReturn(),
                                    one.typed())));
            changed.put(
                    "year " + c,
                    withCase(
                            d,
                            c,
                            new Design.FlowCase(
                                    one.name(),
                                    one.period(),
                                    "2099",
                                    one.flow(),
                                    one.tailwater(),
                                    one.tailwaterReturn(),
                                    one.typed())));
            changed.put(
                    "return " + c,
                    withCase(
                            d,
                            c,
                            new Design.FlowCase(
                                    one.name(),
                                    one.period(),
                                    one.year(),
                                    one.flow(),
                                    one.tailwater(),
                                    "25 years",
                                    one.typed())));
            for (Design.Typed other : others(one.flow())) {
                changed.put(
                        "flow " + c + other,
                        withCase(
                                d,
                                c,
                                new Design.FlowCase(
                                        one.name(),
                                        one.period(),
                                        one.year(),
                                        other,
                                        one.tailwater(),
                                        one.tailwaterReturn(),
                                        one.typed())));
            }
            for (Design.Typed other : others(one.tailwater())) {
                changed.put(
                        "tailwater " + c + other,
                        withCase(
                                d,
                                c,
                                new Design.FlowCase(
                                        one.name(),
                                        one.period(),
                                        one.year(),
                                        one.flow(),
                                        other,
                                        one.tailwaterReturn(),
                                        one.typed())));
            }
            changed.put(
                    "head read " + c,
                    withCase(
                            d,
                            c,
                            new Design.FlowCase(
                                    one.name(),
                                    one.period(),
                                    one.year(),
                                    one.flow(),
                                    one.tailwater(),
                                    one.tailwaterReturn(),
                                    Map.of("F1.h_g", number(0.2, "m")))));
        }
        changed.put(
                "demand",
                new Design(
                        p,
                        d.elements(),
                        d.cases(),
                        List.of(new Design.Demand("F1", "z_u", true, number(9, "m"), "pretend", "invented")),
                        d.assumptions(),
                        d.references(),
                        d.requirements(),
                        d.revisions()));
        changed.put("units in service", withCase(d, 0, inService(d.cases().get(0), 2)));
        changed.put("3 units in service", withCase(d, 0, inService(d.cases().get(0), 3)));
        changed.put(
                "demand in one case",
                withDemands(
                        d,
                        List.of(new Design.Demand(
                                "F1",
                                "z_u",
                                true,
                                number(9, "m"),
                                "pretend",
                                "invented",
                                new Design.Origin("", ""),
                                new Design.Origin("", ""),
                                "Low"))));
        for (Design.Combination one : List.of(
                combination("Both", "Low", "High", true, "invented"),
                combination("Other", "Low", "High", true, "invented"),
                combination("Both", "High", "High", true, "invented"),
                combination("Both", "Low", "Low", true, "invented"),
                combination("Both", "Low", "High", false, "invented"),
                combination("Both", "Low", "High", true, "another"))) {
            changed.put(one.toString(), combined(d, List.of(one), List.of()));
        }
        Design.Typed flow = number(0.1, "m3/s");
        Design.Typed level = number(0.5, "m");
        changed.put("level", combined(d, List.of(), List.of(new Design.LevelPair(flow, level))));
        others(flow)
                .forEach(other -> changed.put(
                        "level at " + other, combined(d, List.of(), List.of(new Design.LevelPair(other, level)))));
        others(level)
                .forEach(other -> changed.put(
                        "level of " + other, combined(d, List.of(), List.of(new Design.LevelPair(flow, other)))));
        changed.put(
                "assumption",
                new Design(
                        p,
                        d.elements(),
                        d.cases(),
                        d.demands(),
                        List.of(new Design.Assumption("pretend", "invented", "nobody", true)),
                        d.references(),
                        d.requirements(),
                        d.revisions()));
        changed.put(
                "assumption closed",
                new Design(
                        p,
                        d.elements(),
                        d.cases(),
                        d.demands(),
                        List.of(new Design.Assumption("pretend", "invented", "nobody", false)),
                        d.references(),
                        d.requirements(),
                        d.revisions()));
        changed.put(
                "reference",
                new Design(
                        p,
                        d.elements(),
                        d.cases(),
                        d.demands(),
                        d.assumptions(),
                        List.of("An invented book"),
                        d.requirements(),
                        d.revisions()));
        changed.put(
                "requirement",
                new Design(
                        p,
                        d.elements(),
                        d.cases(),
                        d.demands(),
                        d.assumptions(),
                        d.references(),
                        List.of(new Design.Requirement("pretend", "invented", "Limits")),
                        d.revisions()));
        changed.put(
                "revision",
                new Design(
                        p,
                        d.elements(),
                        d.cases(),
                        d.demands(),
                        d.assumptions(),
                        d.references(),
                        d.requirements(),
                        List.of(new Design.RevisionNote("A", "2030-01-02", "first"))));
        return changed;
    }

    private static List<Design.Typed> others(Design.Typed t) {
        List<Design.Typed> others = new ArrayList<>();
        if (t.value() instanceof Value.Number number) {
            others.add(new Design.Typed(
                    Value.of(Math.nextUp(number.value())), t.unit(), t.source(), t.standing(), t.origin()));
            others.add(new Design.Typed(t.value(), Unit.parse("ft"), t.source(), t.standing(), t.origin()));
            others.add(new Design.Typed(new Value.None("not given"), t.unit(), t.source(), t.standing(), t.origin()));
        } else {
            others.add(new Design.Typed(Value.word("2 ft"), t.unit(), t.source(), t.standing(), t.origin()));
        }
        others.add(new Design.Typed(t.value(), t.unit(), "another source", t.standing(), t.origin()));
        others.add(new Design.Typed(t.value(), t.unit(), t.source(), "assumed", t.origin()));
        return others;
    }

    static Design.FlowCase inService(Design.FlowCase one, int units) {
        return new Design.FlowCase(
                one.name(),
                one.period(),
                one.year(),
                one.flow(),
                number(units, "1"),
                one.tailwater(),
                one.tailwaterReturn(),
                one.typed());
    }

    static Design.Combination combination(
            String name, String flowOf, String levelOf, boolean canCoincide, String basis) {
        return new Design.Combination(
                name, flowOf, levelOf, canCoincide, basis, new Design.Origin("Combinations", "A7"));
    }

    static Design combined(Design d, List<Design.Combination> combinations, List<Design.LevelPair> levels) {
        return new Design(
                d.project(),
                d.elements(),
                d.cases(),
                d.demands(),
                d.assumptions(),
                d.references(),
                d.requirements(),
                d.revisions(),
                combinations,
                levels);
    }

    static Design withDemands(Design d, List<Design.Demand> demands) {
        return new Design(
                d.project(),
                d.elements(),
                d.cases(),
                demands,
                d.assumptions(),
                d.references(),
                d.requirements(),
                d.revisions(),
                d.combinations(),
                d.levels());
    }

    private static Design withElement(Design d, int at, Design.Element element) {
        List<Design.Element> elements = new ArrayList<>(d.elements());
        elements.set(at, element);
        return new Design(
                d.project(),
                elements,
                d.cases(),
                d.demands(),
                d.assumptions(),
                d.references(),
                d.requirements(),
                d.revisions());
    }

    private static Design withCase(Design d, int at, Design.FlowCase flowCase) {
        List<Design.FlowCase> cases = new ArrayList<>(d.cases());
        cases.set(at, flowCase);
        return new Design(
                d.project(),
                d.elements(),
                cases,
                d.demands(),
                d.assumptions(),
                d.references(),
                d.requirements(),
                d.revisions());
    }

    private static Design.Project project(Design.Project p, int changed) {
        String[] text = {
            p.project(),
            p.firm(),
            p.client(),
            p.number(),
            p.subject(),
            p.revision(),
            p.status(),
            p.datum(),
            p.workedCase(),
            p.release()
        };
        if (changed < text.length) {
            text[changed] = "other";
        }
        return new Design.Project(
                text[0],
                text[1],
                text[2],
                text[3],
                text[4],
                text[5],
                changed == 10 ? p.date().plusDays(1) : p.date(),
                text[6],
                changed == 11 ? WorkingSystem.US : p.system(),
                changed == 12 || p.letterPaper(),
                changed == 13 ? Unit.parse("MGD") : p.flowUnit(),
                changed == 14 ? Unit.parse("in") : p.headUnit(),
                text[7],
                text[8],
                text[9],
                changed != 15 && p.sealSpace());
    }
}
