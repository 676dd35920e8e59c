package nappe.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.concurrent.Callable;
import nappe.input.BlankWriter;
import nappe.input.Near;
import nappe.input.Tags;
import nappe.job.CheckRow;
import nappe.job.MethodOverview;
import nappe.unit.WorkingSystem;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code nappe blank F1=parshall-flume -o station.xlsx}. */
@Command(
        name = "blank",
        description = "Write an input workbook to fill in, for the elements named, from the downstream end up.",
        footer = {
            "",
            "Examples:",
            "  nappe blank --methods",
            "  nappe blank --methods parshall-flume",
            "  nappe blank F1=parshall-flume --units US -o station.xlsx",
            "  nappe blank F1=parshall-flume A1=approach-channel --units US -o station.xlsx",
            "  nappe blank W1=mill-race-weir --units SI --house our-methods -o mill.xlsx",
            "",
            "The flow comes down through the elements from the last to the first: name the one at the downstream end first."
                    + " A tag is one capital letter and up to seven capitals or digits, as on your drawings. The workbook's units are"
                    + " a start: each number may be typed in any unit of its kind. The last example takes a method"
                    + " of the house's own from the folder our-methods."
        })
final class BlankCommand implements Callable<Integer> {
    @Parameters(
            arity = "0..*",
            paramLabel = "TAG=METHOD",
            description = "an element of the station: its tag and the name of its method")
    private List<String> elements = new ArrayList<>();

    @Option(
            names = "--units",
            paramLabel = "SI|US",
            defaultValue = "US",
            description = "units of the workbook and of the package, SI or US customary (default: US)")
    private String units = "US";

    @Option(names = "-o", paramLabel = "FILE", description = "the file to write; it must not be there yet")
    private @Nullable Path file;

    @Option(
            names = "--methods",
            description = "list the methods, or tell standards, ranges and check values of those named; write nothing")
    private boolean list;

    @CommandLine.Mixin
    private HelpOption help = new HelpOption();

    @CommandLine.Mixin
    private HouseOption house = new HouseOption();

    @CommandLine.Spec
    private CommandLine.Model.CommandSpec spec;

    @Override
    public Integer call() throws IOException {
        Desk desk = house.desk();
        if (list) {
            list(desk);
            return ExitStatus.DONE;
        }
        List<BlankWriter.Chosen> chosen = chosen(desk);
        Path target = file;
        if (target == null) {
            throw usage("name the file to write, such as: -o station.xlsx (fault: output-unnamed)");
        }
        if (Files.exists(target)) {
            throw new Refusal(
                    ExitStatus.WRONG_USAGE,
                    target + " is there already and is not written over; name another file (fault: file-exists)");
        }
        List<String> used =
                chosen.stream().map(BlankWriter.Chosen::method).distinct().toList();
        desk.requireSound(used);
        house.tellRemarks(desk, used);
        BlankWriter.write(target, system(), chosen, desk.methods());
        spec.commandLine()
                .getOut()
                .println("Wrote " + target + ". Fill it in, then: nappe inspect " + HouseOption.inShell(target)
                        + house.asTyped());
        return ExitStatus.DONE;
    }

    private void list(Desk desk) {
        List<String> names = desk.methods().names();
        List<String> asked = elements.stream()
                .map(element -> element.substring(element.indexOf('=') + 1))
                .toList();
        asked.forEach(method -> requireKnown(desk, method));
        PrintWriter screen = spec.commandLine().getOut();
        MethodList out = new MethodList(screen);
        List<CheckRow> checks = desk.checks();
        for (String name : asked.isEmpty() ? names : asked) {
            MethodOverview method = MethodOverview.of(desk.methods(), name, checks);
            if (asked.isEmpty()) {
                out.printShort(method, house.mark(desk, name));
            } else {
                out.print(method, house.mark(desk, name));
            }
        }
        if (asked.isEmpty()) {
            screen.println();
            screen.println("Standards and range of one:  nappe blank --methods " + names.get(0) + house.asTyped());
        }
        house.tellRemarks(desk, List.of());
    }

    private WorkingSystem system() {
        return switch (units.toUpperCase(Locale.ROOT)) {
            case "SI" -> WorkingSystem.SI;
            case "US" -> WorkingSystem.US;
            default ->
                throw usage("--units is SI (metres, m3/s) or US (feet, ft3/s), not \"" + units
                        + "\"; each number in the workbook may have a unit of its own (fault: units-unknown)");
        };
    }

    private List<BlankWriter.Chosen> chosen(Desk desk) {
        if (elements.isEmpty()) {
            throw usage("name at least one element, such as F1=parshall-flume; nappe blank --methods lists the methods"
                    + " (fault: elements-missing)");
        }
        List<BlankWriter.Chosen> chosen = new ArrayList<>();
        Set<String> tags = new HashSet<>();
        for (String element : elements) {
            int equals = element.indexOf('=');
            if (equals < 1) {
                throw usage("\"" + element + "\" is no element; write a tag, = and a method, such as F1="
                        + (desk.methods().knows(element) ? element : "parshall-flume") + " (fault: element-unclear)");
            }
            String tag = element.substring(0, equals);
            String method = element.substring(equals + 1);
            String complaint = Tags.complaint(tag);
            if (complaint != null) {
                throw usage(complaint + " (fault: tag-unclear)");
            }
            if (!tags.add(tag)) {
                throw usage("the tag " + tag + " is given twice; each element has a tag of its own (fault: tag-twice)");
            }
            requireKnown(desk, method);
            chosen.add(new BlankWriter.Chosen(tag, method));
        }
        return chosen;
    }

    private void requireKnown(Desk desk, String method) {
        List<String> names = desk.methods().names();
        if (!names.contains(method)) {
            String question = Near.question(method, names);
            throw usage("there is no method \"" + method + "\""
                    + (question.isEmpty()
                            ? "; there are " + String.join(", ", names) + house.hint(desk, method)
                            : question)
                    + " (fault: method-unknown)");
        }
    }

    private CommandLine.ParameterException usage(String message) {
        return new CommandLine.ParameterException(spec.commandLine(), message);
    }
}
