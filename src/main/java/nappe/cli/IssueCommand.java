package nappe.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.concurrent.Callable;
import java.util.function.Consumer;
import nappe.calculation.Block;
import nappe.deliver.csv.RatingCsv;
import nappe.deliver.pdf.Attachment;
import nappe.deliver.pdf.PdfDelivery;
import nappe.deliver.xlsx.XlsxDelivery;
import nappe.job.Beside;
import nappe.job.Job;
import nappe.results.Furniture;
import nappe.results.Results;
import nappe.station.Design;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code nappe issue station.xlsx -o output}. */
@Command(
        name = "issue",
        description =
                "Make the calculation package: a PDF, a workbook with live formulas, and the rating tables as CSV.",
        footer = {
            "",
            "Examples:",
            "  nappe issue station.xlsx -o output",
            "  nappe issue mill.xlsx --house our-methods -o output",
            "",
            "The package goes into a folder of its own in FOLDER, named for the calculation number and the revision. A preliminary"
                    + " package is written over; one whose status is issued never is: a change is a new revision."
        })
final class IssueCommand implements Callable<Integer> {
    @Parameters(paramLabel = "IN.xlsx", description = "the input workbook, filled in")
    private Path input;

    @Option(
            names = "-o",
            paramLabel = "FOLDER",
            defaultValue = "output",
            description = "where the package goes (default: output)")
    private Path folder;

    @CommandLine.Mixin
    private MarkedOption marked = new MarkedOption();

    @CommandLine.Mixin
    private HelpOption help = new HelpOption();

    @CommandLine.Mixin
    private HouseOption house = new HouseOption();

    @CommandLine.Spec
    private CommandLine.Model.CommandSpec spec;

    @Override
    public Integer call() throws IOException {
        Consumer<String> stage = Nappe.stage(spec);
        stage.accept("reading the workbook");
        Desk desk = house.desk();
        Design design = marked.read(desk, input);
        house.tellRemarks(
                desk, design.elements().stream().map(Design.Element::method).toList());
        Remarks.of(design).forEach(remark -> spec.commandLine().getErr().println("remark: " + remark));
        PackageFolder target = PackageFolder.of(
                folder, design.project().number(), design.project().revision());
        target.prepare();
        Job.Done done = desk.compute(design, stage);
        // the typefaces serve one document at a time
        Rehearsal.ofPages().outcome();
        target.write(files(target.name(), done, stage), done.results().furniture());
        PrintWriter out = spec.commandLine().getOut();
        out.println("Wrote " + target.path());
        new VerdictList(done.results()).print(out);
        return ExitStatus.DONE;
    }

    private Map<String, byte[]> files(String name, Job.Done done, Consumer<String> stage) {
        Results results = done.results();
        Furniture furniture = results.furniture();
        Map<String, byte[]> files = new LinkedHashMap<>();
        stage.accept("writing the workbook and setting the PDF");
        Beside<byte[]> workbook = Beside.start("workbook", () -> {
            Rehearsal.ofWorkbook().outcome();
            return XlsxDelivery.render(results);
        });
        PdfDelivery pdf;
        try {
            pdf = PdfDelivery.render(results, new Attachment(name + ".xlsx", workbook::outcome));
        } finally {
            // where both fail, the workbook's failure is told
            workbook.outcome();
        }
        pdf.warnings().forEach(warning -> spec.commandLine().getErr().println("nappe: " + warning));
        files.put(name + ".pdf", pdf.bytes());
        files.put(name + ".xlsx", workbook.outcome());
        for (Map.Entry<String, Block.Table> rating : done.ratings().entrySet()) {
            String csv = RatingCsv.write(results, rating.getValue());
            files.put(name + "_" + rating.getKey() + "-rating.csv", csv.getBytes(StandardCharsets.UTF_8));
        }
        return files;
    }
}
