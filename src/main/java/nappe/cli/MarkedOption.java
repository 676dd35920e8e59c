package nappe.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import nappe.input.InputRefused;
import nappe.input.MarkedCopy;
import nappe.station.Design;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine;
import picocli.CommandLine.Option;

/** The option to have a refused workbook back as a copy with a note on each faulty cell. */
final class MarkedOption {
    @Option(
            names = "--marked",
            paramLabel = "COPY.xlsx",
            description =
                    "where the input is refused, write a copy with a note on each faulty cell and a sheet that lists the faults; it must"
                            + " not be there yet")
    private @Nullable Path copy;

    @CommandLine.Spec(CommandLine.Spec.Target.MIXEE)
    private CommandLine.Model.CommandSpec spec;

    /** Reads the input; refused, it is copied with notes if the user asked for that. */
    Design read(Desk desk, Path input) {
        try {
            return desk.read(input);
        } catch (InputRefused e) {
            Path target = copy;
            if (target != null) {
                mark(input, target, e);
            }
            throw e;
        }
    }

    private void mark(Path input, Path target, InputRefused refused) {
        PrintWriter err = spec.commandLine().getErr();
        if (Files.exists(target)) {
            err.println("nappe: " + target + " is there already; no marked copy was written");
            return;
        }
        try {
            MarkedCopy.Outcome outcome = MarkedCopy.write(input, target, refused.faults());
            err.println(
                    outcome.written()
                            ? "Wrote " + target + ": " + outcome.cells()
                                    + (outcome.cells() == 1 ? " cell marked" : " cells marked")
                                    + ", all faults on its sheet " + outcome.sheet()
                            : "nappe: no marked copy was written, because " + outcome.why());
        } catch (FileAlreadyExistsException e) {
            err.println("nappe: " + target + " is there already; no marked copy was written");
        } catch (IOException e) {
            err.println("nappe: no marked copy was written: " + e.getMessage());
        }
    }
}
