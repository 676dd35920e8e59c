package nappe.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import nappe.formula.Value;
import nappe.station.Design;
import nappe.unit.WorkingSystem;

/** What is legal but worth a second look before a package goes out; told on the screen, and nothing is refused for it. */
final class Remarks {
    private static final double SAME = 1e-9;
    private static final int NAMED = 6;

    private Remarks() {}

    static List<String> of(Design design) {
        List<String> remarks = new ArrayList<>();
        Design.Project project = design.project();
        boolean listed =
                design.revisions().stream().anyMatch(note -> note.revision().equalsIgnoreCase(project.revision()));
        if (!listed) {
            remarks.add("revision " + project.revision() + " is not among the revisions on sheet Revisions");
        }
        long open =
                design.assumptions().stream().filter(Design.Assumption::open).count();
        if (project.status().equals("issued") && open > 0) {
            remarks.add("the status is issued, and " + open + (open == 1 ? " assumption is" : " assumptions are")
                    + " still open");
        }
        design.cases().stream()
                .filter(one -> design.levels().isEmpty() && one.tailwater().value() instanceof Value.None)
                .forEach(one -> remarks.add("case " + one.name() + " has no water level downstream (sheet "
                        + one.tailwater().origin().sheet() + ", "
                        + one.tailwater().origin().cell()
                        + "): whether its flow is free is not given, and no head follows from it"));
        if (!design.levels().isEmpty()) {
            design.cases().stream()
                    .filter(one -> one.tailwater().value() instanceof Value.None && !isOnCurve(one, design.levels()))
                    .forEach(one -> remarks.add("case " + one.name() + " has no water level downstream (sheet "
                            + one.tailwater().origin().sheet() + ", "
                            + one.tailwater().origin().cell()
                            + "), and its flow lies beyond the ends of the tailwater curve: nothing follows from it"));
        }
        remarks.addAll(unsourced(design));
        return remarks;
    }

    /** One remark on all values that say nothing of where they come from; the first few by their cells. */
    private static List<String> unsourced(Design design) {
        List<String> cells = Stream.concat(
                        design.cases().stream().map(Design.FlowCase::flow),
                        design.elements().stream().flatMap(element -> element.typed().values().stream()))
                .filter(typed ->
                        !(typed.value() instanceof Value.None) && typed.source().isBlank())
                .map(typed -> typed.origin().sheet() + " " + typed.origin().cell())
                .distinct()
                .toList();
        if (cells.isEmpty()) {
            return List.of();
        }
        String named = String.join(", ", cells.subList(0, Math.min(NAMED, cells.size())));
        return List.of("no source or basis is typed beside "
                + (cells.size() == 1 ? "the value in " : "the values in ")
                + named
                + (cells.size() > NAMED ? " and " + (cells.size() - NAMED) + " more" : ""));
    }

    private static boolean isOnCurve(Design.FlowCase one, List<Design.LevelPair> levels) {
        double flow = size(one.flow());
        return flow >= size(levels.get(0).flow()) * (1 - SAME)
                && flow <= size(levels.get(levels.size() - 1).flow()) * (1 + SAME);
    }

    private static double size(Design.Typed typed) {
        return typed.value() instanceof Value.Number number
                ? number.value() * typed.unit().sizeIn(WorkingSystem.SI)
                : Double.NaN;
    }
}
