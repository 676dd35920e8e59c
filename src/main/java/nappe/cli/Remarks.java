package nappe.cli;

import java.util.ArrayList;
import java.util.List;
import nappe.station.Design;

/** What is legal but worth a second look before a package goes out; told on the screen, and nothing is refused for it. */
final class Remarks {
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
                .filter(one -> one.tailwater().value() instanceof nappe.formula.Value.None)
                .forEach(one -> remarks.add("case " + one.name() + " has no water level downstream (sheet "
                        + one.tailwater().origin().sheet() + ", "
                        + one.tailwater().origin().cell()
                        + "): whether its flow is free is not given, and no head follows from it"));
        return remarks;
    }
}
