package nappe.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import nappe.job.Job;
import nappe.station.Design;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** {@code nappe inspect station.xlsx}. */
@Command(
        name = "inspect",
        mixinStandardHelpOptions = true,
        description =
                "Read an input workbook, report every fault at its cell or the verdicts on its limits, and write nothing.",
        footer = {"", "Examples:", "  nappe inspect headworks.xlsx", "  nappe inspect mill.xlsx --house our-methods"})
final class InspectCommand implements Callable<Integer> {
    @Parameters(paramLabel = "IN.xlsx", description = "the input workbook")
    private Path input;

    @CommandLine.Mixin
    private MarkedOption marked = new MarkedOption();

    @CommandLine.Mixin
    private HouseOption house = new HouseOption();

    @CommandLine.Spec
    private CommandLine.Model.CommandSpec spec;

    @Override
    public Integer call() {
        Desk desk = house.desk();
        Design design = marked.read(desk, input);
        house.tellRemarks(
                desk, design.elements().stream().map(Design.Element::method).toList());
        Remarks.of(design).forEach(remark -> spec.commandLine().getErr().println("remark: " + remark));
        Job.Done done = desk.compute(design);
        PrintWriter out = spec.commandLine().getOut();
        out.println(design.project().project() + ": " + design.project().subject());
        out.println(design.elements().size() + " element(s), " + design.cases().size() + " flow case(s), no faults.");
        out.println();
        new VerdictList(done.results()).print(out);
        return ExitStatus.DONE;
    }
}
