package nappe.job;

import java.util.List;
import java.util.Map;
import nappe.bench.Clock;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.solve.Evaluation;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;
import nappe.station.FoundFlows;
import nappe.station.SizeRerun;
import nappe.station.SoftwareStatement;

/** What solving consists of, one after the other, each with its time; the program does some of it side by side. */
public final class SolvingStages {
    private SolvingStages() {}

    public static Job.Done run(MethodLibrary methods, Design design, Clock clock) {
        Job job = new Job(methods, "bench");
        List<CheckRow> checks = CheckRow.builtIn(new BuiltInLibrary());
        Map<String, MethodSheet> used = job.used(design);
        clock.lap("reading the check values");
        SoftwareStatement software = job.statement(used, checks);
        clock.lap("verification");
        Map<String, List<SizeRerun>> sizes = new SizeReruns(design, methods::sheet).run();
        clock.lap("reruns for the sizes");
        FoundFlows found = FlowSearch.of(design, methods::sheet);
        clock.lap("flow search");
        Job.Done done = job.done(design, used, found, software, sizes);
        clock.lap("layout and solving");
        Evaluation.of(done.results().cells());
        clock.lap("  (solving alone, once more)");
        return done;
    }
}
