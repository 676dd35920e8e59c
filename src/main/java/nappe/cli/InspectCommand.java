package nappe.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import java.util.function.Consumer;
import nappe.job.Job;
import nappe.station.Design;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** {@code nappe inspect station.xlsx}. */
@Command(
        name = "inspect",
        description =
                "Read an input workbook, report every fault at its cell or the verdicts on its limits, and write nothing.",
        footer = {
            "",
            "Examples:",
            "  nappe inspect station.xlsx",
            "  nappe inspect station.xlsx --marked station-marked.xlsx",
            "  nappe inspect mill.xlsx --house our-methods"
        })
final class InspectCommand implements Callable<Integer> {
    @Parameters(paramLabel = "IN.xlsx", description = "the input workbook, filled in")
    private Path input;

    @CommandLine.Mixin
    private MarkedOption marked = new MarkedOption();

    @CommandLine.Mixin
    private HelpOption help = new HelpOption();

    @CommandLine.Mixin
    private HouseOption house = new HouseOption();

    @CommandLine.Spec
    private CommandLine.Model.CommandSpec spec;

    @Override
    public Integer call() {
        Consumer<String> stage = Nappe.stage(spec);
        stage.accept("reading the workbook");
        Desk desk = house.desk();
        Design design = marked.read(desk, input);
        house.tellRemarks(
                desk, design.elements().stream().map(Design.Element::method).toList());
        Remarks.of(design).forEach(remark -> spec.commandLine().getErr().println("remark: " + remark));
        Job.Done done = desk.compute(design, stage);
        PrintWriter out = spec.commandLine().getOut();
        out.println(design.project().project() + ": " + design.project().subject());
        out.println(counted(design.elements().size(), "element") + ", "
                + counted(design.cases().size(), "flow case") + ", no faults.");
        out.println();
        new VerdictList(done.results()).print(out);
        out.println();
        out.println("The package:  nappe issue " + HouseOption.inShell(input) + house.asTyped() + " -o output");
        return ExitStatus.DONE;
    }

    private static String counted(int number, String what) {
        return number + " " + what + (number == 1 ? "" : "s");
    }
}
