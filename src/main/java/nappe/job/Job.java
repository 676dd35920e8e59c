package nappe.job;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.formula.Value;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.results.Furniture;
import nappe.results.Results;
import nappe.solve.Evaluation;
import nappe.station.Design;
import nappe.station.PackageLayout;
import nappe.station.SoftwareStatement;

/** One design carried through: laid out, evaluated, ready to be delivered. */
public final class Job {
    /** Short lines at the foot of every page and sheet. */
    private static final List<String> FOOT = List.of(
            "Valid only for the entries and revision shown; the fingerprint must be the same on every sheet and in the workbook.",
            "Design estimate, not a field calibration: accuracy is to be confirmed after installation.",
            "Not for use until checked and approved; any later revision supersedes it. Local codes and licensed practice govern.",
            "Printed values are rounded; the workbook carries full precision.");

    private final MethodLibrary methods;
    private final String version;

    public Job(MethodLibrary methods, String version) {
        this.methods = methods;
        this.version = version;
    }

    /** The results of a design, with the rating table of each element by its tag. */
    public record Done(Results results, Map<String, Block.Table> ratings) {}

    /**
     * @param checks check values to run for the methods used; their outcome is part of the package
     * @throws nappe.station.StationException where entries do not fit the methods
     */
    public Done run(Design design, List<CheckRow> checks) {
        Map<String, MethodSheet> used = new LinkedHashMap<>();
        design.elements().forEach(e -> used.computeIfAbsent(e.method(), methods::sheet));
        SoftwareStatement software = statement(used, checks);
        PackageLayout.Layout layout = PackageLayout.of(design, methods::sheet, software);
        Map<Cell, Value> values = Evaluation.of(layout.cells());
        return new Done(
                new Results(furniture(design, used), layout.sheets(), layout.cells(), values), layout.ratings());
    }

    private Furniture furniture(Design design, Map<String, MethodSheet> used) {
        Design.Project p = design.project();
        return new Furniture(
                p.project(),
                p.firm(),
                p.client(),
                p.number(),
                p.subject(),
                p.revision(),
                p.date(),
                p.status(),
                Fingerprint.of(design, used.values(), version),
                version,
                p.letterPaper(),
                FOOT,
                p.release());
    }

    private SoftwareStatement statement(Map<String, MethodSheet> used, List<CheckRow> checks) {
        List<List<String>> texts = used.values().stream()
                .map(method -> List.of(method.name(), Fingerprint.ofText(method.text())))
                .toList();
        Verification verification = new Verification(methods);
        List<CheckOutcome> outcomes = checks.stream()
                .filter(row -> used.containsKey(row.method()))
                .map(verification::run)
                .toList();
        List<List<String>> rows = outcomes.stream().map(CheckOutcome::printed).toList();
        List<List<String>> off = used.keySet().stream()
                .flatMap(method -> CheckRow.knownToBeOff(methods.library(), method).stream())
                .toList();
        return new SoftwareStatement(version, texts, CheckOutcome.counts(outcomes), rows, off);
    }
}
