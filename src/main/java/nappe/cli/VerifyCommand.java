package nappe.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import nappe.job.CheckOutcome;
import nappe.job.CheckRow;
import nappe.job.HouseReview;
import nappe.job.Verification;
import nappe.results.Digits;
import nappe.source.HouseLibrary;
import nappe.source.StrictText;
import nappe.source.TextException;
import nappe.source.TextFault;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** {@code nappe verify [FILE.csv...]}. */
@Command(
        name = "verify",
        description =
                "Run check values through the method sheets: the built-in ones, or those of the files or of the house folder named.",
        footer = {
            "",
            "Examples:",
            "  nappe verify",
            "  nappe verify firm-checks.csv",
            "  nappe verify --house our-methods",
            "",
            "With --house all texts of the folder are read, used or not, every fault is told, and its check values are run.",
            "",
            "A file holds a head and rows, such as:",
            "  id,method,entries,target,expected,unit,tolerance,source,kind,note",
            "  H1,parshall-flume,\"size = \"\"3 ft\"\"; h = 2 ft\",Q_h,35.5,ft3/s,0.6 %%,our test of 1 May,derived,"
        })
final class VerifyCommand implements Callable<Integer> {
    @Parameters(arity = "0..*", paramLabel = "FILE.csv", description = "files with check values of your own")
    private List<Path> files = new ArrayList<>();

    @CommandLine.Mixin
    private HelpOption help = new HelpOption();

    @CommandLine.Mixin
    private HouseOption house = new HouseOption();

    @CommandLine.Spec
    private CommandLine.Model.CommandSpec spec;

    @Override
    public Integer call() throws IOException {
        Desk desk = house.desk();
        HouseReview review = desk.review();
        if (review != null) {
            requireSound(review);
            review.notLookedAt().forEach(remark -> spec.commandLine().getErr().println("remark: " + remark));
        }
        List<CheckRow> rows = new ArrayList<>(review == null ? List.of() : review.rows());
        if (files.isEmpty() && review == null) {
            rows.addAll(desk.checks());
        }
        rows.addAll(named());
        Nappe.stage(spec).accept("running " + rows.size() + " check values");
        Verification verification = new Verification(desk.methods());
        PrintWriter out = spec.commandLine().getOut();
        HouseLibrary own = desk.house();
        if (own != null) {
            out.println("Check values of the house, folder " + own.name() + ":");
        }
        List<CheckOutcome> outcomes = rows.stream().map(verification::run).toList();
        outcomes.forEach(outcome -> print(out, outcome));
        out.println();
        out.printf("%-24s %-22s %6s %6s%n", "Method", "Kind", "Rows", "Met");
        for (List<String> count : CheckOutcome.counts(outcomes)) {
            out.printf("%-24s %-22s %6s %6s%n", count.toArray());
        }
        if (review != null) {
            tellUnverified(review, rows, out);
        }
        long met = outcomes.stream().filter(CheckOutcome::met).count();
        out.printf(
                Locale.ROOT,
                "%d %s, %d met, %d not met.%n",
                outcomes.size(),
                outcomes.size() == 1 ? "row" : "rows",
                met,
                outcomes.size() - met);
        return met == outcomes.size() ? ExitStatus.DONE : ExitStatus.INPUT_REFUSED;
    }

    /** All the faults of the house, used or not. */
    private static void requireSound(HouseReview review) {
        List<TextFault> faults = List.copyOf(review.all());
        if (!faults.isEmpty()) {
            throw new TextException(faults);
        }
    }

    /** The rows of the files named on the command line; the faults of all of them at once. */
    private List<CheckRow> named() throws IOException {
        List<CheckRow> rows = new ArrayList<>();
        List<TextFault> faults = new ArrayList<>();
        for (Path file : files) {
            if (!Files.isRegularFile(file)) {
                throw new Refusal(ExitStatus.INPUT_REFUSED, "there is no file " + file + " (fault: file-missing)");
            }
            try {
                rows.addAll(CheckRow.read(file.toString(), StrictText.of(file.toString(), Files.readAllBytes(file))));
            } catch (TextException e) {
                faults.addAll(e.faults());
            }
        }
        if (!faults.isEmpty()) {
            throw new TextException(faults);
        }
        return rows;
    }

    private static void tellUnverified(HouseReview review, List<CheckRow> rows, PrintWriter out) {
        for (String method : review.ownMethods()) {
            if (rows.stream().noneMatch(row -> row.method().equals(method))) {
                out.println(method + ": UNVERIFIED, the house has no check values for it");
            }
        }
    }

    private static void print(PrintWriter out, CheckOutcome outcome) {
        CheckRow row = outcome.row();
        String unit = row.unit().text().equals("1") ? "" : " " + row.unit();
        out.printf(
                "%-8s %-7s %s: %s%n         %s = %s%s, expected %s%s, difference %s, tolerance %s%n         %s (%s)%n",
                row.id(),
                outcome.met() ? "met" : "NOT MET",
                row.method(),
                row.entriesText(),
                row.target(),
                outcome.shown(),
                unit,
                Digits.asTyped(row.expected()),
                unit,
                outcome.difference(),
                row.tolerance(),
                row.source(),
                row.standing());
    }
}
