package nappe.cli;

import java.nio.file.Path;
import java.util.List;
import nappe.input.InputReader;
import nappe.job.CheckRow;
import nappe.job.Job;
import nappe.method.MethodLibrary;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;
import nappe.station.StationException;

/** What the commands share: the methods, the check values, one design carried through. */
final class Desk {
    private final BuiltInLibrary library = new BuiltInLibrary();
    private final MethodLibrary methods = new MethodLibrary(library);

    MethodLibrary methods() {
        return methods;
    }

    List<CheckRow> checks() {
        return CheckRow.builtIn(library);
    }

    /** Reads an input workbook and computes it; faults as InputRefused. */
    Job.Done compute(Path input, Design design) {
        try {
            return new Job(methods, Nappe.version()).run(design, checks());
        } catch (StationException e) {
            throw Failures.at(String.valueOf(input.getFileName()), e);
        }
    }

    Design read(Path input) {
        return InputReader.read(input, methods);
    }
}
