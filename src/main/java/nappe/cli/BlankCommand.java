package nappe.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.concurrent.Callable;
import nappe.input.BlankWriter;
import nappe.input.Tags;
import nappe.unit.WorkingSystem;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code nappe blank F1=parshall-flume -o station.xlsx}. */
@Command(
        name = "blank",
        mixinStandardHelpOptions = true,
        description = "Write an input workbook to fill in, for the elements named, from the downstream end up.",
        footer = {
            "",
            "Example: a Parshall flume, in US customary units",
            "  nappe blank F1=parshall-flume --units US -o headworks.xlsx",
            "",
            "Example: a weir by a method of the house's own, methods/our-weir.txt in the folder our-methods",
            "  nappe blank W1=our-weir --house our-methods -o mill.xlsx",
            "",
            "The methods are listed by:  nappe blank --methods"
        })
final class BlankCommand implements Callable<Integer> {
    @Parameters(
            arity = "0..*",
            paramLabel = "TAG=METHOD",
            description = "an element: its tag and the name of its method")
    private List<String> elements = new ArrayList<>();

    @Option(
            names = "--units",
            paramLabel = "SI|US",
            defaultValue = "US",
            description = "working units: SI or US (default: US)")
    private String units = "US";

    @Option(names = "-o", paramLabel = "FILE", description = "the file to write; it must not be there yet")
    private @Nullable Path file;

    @Option(names = "--methods", description = "list the methods and write nothing")
    private boolean list;

    @CommandLine.Mixin
    private HouseOption house = new HouseOption();

    @CommandLine.Spec
    private CommandLine.Model.CommandSpec spec;

    @Override
    public Integer call() throws IOException {
        Desk desk = house.desk();
        if (list) {
            for (String name : desk.methods().names()) {
                spec.commandLine()
                        .getOut()
                        .printf("%-24s %s%s%n", name, desk.methods().title(name), house.mark(desk, name));
            }
            house.tellRemarks(desk, List.of());
            return ExitStatus.DONE;
        }
        List<BlankWriter.Chosen> chosen = chosen(desk);
        Path target = file;
        if (target == null) {
            throw usage("name the file to write: -o station.xlsx");
        }
        if (Files.exists(target)) {
            throw new Refusal(
                    ExitStatus.WRONG_USAGE, target + " is there already; it is not written over. Name another file.");
        }
        List<String> used =
                chosen.stream().map(BlankWriter.Chosen::method).distinct().toList();
        desk.requireSound(used);
        house.tellRemarks(desk, used);
        BlankWriter.write(target, system(), chosen, desk.methods());
        spec.commandLine()
                .getOut()
                .println("Wrote " + target + ". Fill it in, then: nappe inspect " + target + house.asTyped());
        return ExitStatus.DONE;
    }

    private WorkingSystem system() {
        return switch (units.toUpperCase(Locale.ROOT)) {
            case "SI" -> WorkingSystem.SI;
            case "US" -> WorkingSystem.US;
            default -> throw usage("--units is SI or US, not \"" + units + "\"");
        };
    }

    private List<BlankWriter.Chosen> chosen(Desk desk) {
        if (elements.isEmpty()) {
            throw usage("name at least one element, such as F1=parshall-flume");
        }
        List<BlankWriter.Chosen> chosen = new ArrayList<>();
        Set<String> tags = new HashSet<>();
        for (String element : elements) {
            int equals = element.indexOf('=');
            if (equals < 1) {
                throw usage("\"" + element + "\" is not of the form TAG=METHOD, such as F1=parshall-flume");
            }
            String tag = element.substring(0, equals);
            String method = element.substring(equals + 1);
            String complaint = Tags.complaint(tag);
            if (complaint != null) {
                throw usage(complaint);
            }
            if (!tags.add(tag)) {
                throw usage("the tag " + tag + " is given twice");
            }
            if (!desk.methods().knows(method)) {
                throw usage("there is no method \"" + method + "\"; there are "
                        + String.join(", ", desk.methods().names()) + house.hint(desk, method));
            }
            chosen.add(new BlankWriter.Chosen(tag, method));
        }
        return chosen;
    }

    private CommandLine.ParameterException usage(String message) {
        return new CommandLine.ParameterException(spec.commandLine(), message);
    }
}
