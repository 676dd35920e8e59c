package nappe.job;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import java.util.function.Supplier;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Scope;
import nappe.figure.Drafting;
import nappe.figure.FigureLibrary;
import nappe.figure.FigureSheet;
import nappe.figure.MarginBars;
import nappe.figure.RatingFigure;
import nappe.formula.Value;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.results.Figure;
import nappe.results.Furniture;
import nappe.results.Results;
import nappe.solve.Evaluation;
import nappe.station.Design;
import nappe.station.FoundFlows;
import nappe.station.PackageLayout;
import nappe.station.SizeRerun;
import nappe.station.SoftwareStatement;
import nappe.unit.WorkingSystem;

/** One design carried through: laid out, evaluated, ready to be delivered. */
public final class Job {
    /** Short lines at the foot of every page and sheet. */
    private static final List<String> FOOT = List.of(
            "Valid only for the entries and revision shown; the fingerprint must be the same on every sheet and in the workbook.",
            "Design estimate, not a field calibration: accuracy is to be confirmed after installation.",
            "Not for use until checked and approved; any later revision supersedes it. Local codes and licensed practice govern.",
            "Printed values are rounded; the workbook carries full precision.");

    private final MethodLibrary methods;
    private final FigureLibrary drawings;
    private final String version;
    private final Consumer<String> stage;

    /** With the drawings that stand beside the method sheets. */
    public Job(MethodLibrary methods, String version) {
        this(methods, new FigureLibrary(methods.library()), version);
    }

    /** @param drawings the figure files beside the method sheets */
    public Job(MethodLibrary methods, FigureLibrary drawings, String version) {
        this(methods, drawings, version, words -> {});
    }

    private Job(MethodLibrary methods, FigureLibrary drawings, String version, Consumer<String> stage) {
        this.methods = methods;
        this.drawings = drawings;
        this.version = version;
        this.stage = stage;
    }

    /** The same, telling in words what it is busy with. */
    public Job telling(Consumer<String> listener) {
        return new Job(methods, drawings, version, listener);
    }

    /**
     * The results of a design.
     *
     * @param ratings the rating table of each element, by its tag
     * @param found the flows at which limits are first reached, with the entries as issued
     */
    public record Done(Results results, Map<String, Block.Table> ratings, FoundFlows found) {}

    /**
     * @param checks check values to run for the methods used; their outcome is part of the package
     * @throws nappe.station.StationException where entries do not fit the methods
     */
    public Done run(Design design, List<CheckRow> checks) {
        return run(design, () -> checks);
    }

    /**
     * The same with check values that are read beside the search for flows.
     *
     * @throws nappe.station.StationException where entries do not fit the methods
     */
    public Done run(Design design, Supplier<List<CheckRow>> checks) {
        stage.accept("looking for the flows at the limits");
        Map<String, MethodSheet> used = used(design);
        Beside<SoftwareStatement> software = Beside.start("check values", () -> statement(used, checks.get()));
        Beside<Map<String, List<SizeRerun>>> sizes =
                Beside.start("sizes", () -> new SizeReruns(design, methods::sheet).run());
        FoundFlows found = FlowSearch.of(design, methods::sheet);
        return done(design, used, found, software.outcome(), sizes.outcome());
    }

    /**
     * The same with flows found before, which are not looked for anew: what an issued workbook shows once an entry of it
     * is changed.
     *
     * @throws nappe.station.StationException where entries do not fit the methods
     */
    public Done run(Design design, List<CheckRow> checks, FoundFlows found) {
        Map<String, MethodSheet> used = used(design);
        stage.accept("running the check values");
        SoftwareStatement software = statement(used, checks);
        stage.accept("comparing sizes");
        Map<String, List<SizeRerun>> sizes = new SizeReruns(design, methods::sheet).run();
        return done(design, used, found, software, sizes);
    }

    Map<String, MethodSheet> used(Design design) {
        Map<String, MethodSheet> used = new LinkedHashMap<>();
        design.elements().forEach(e -> used.computeIfAbsent(e.method(), methods::sheet));
        return used;
    }

    Done done(
            Design design,
            Map<String, MethodSheet> used,
            FoundFlows found,
            SoftwareStatement software,
            Map<String, List<SizeRerun>> sizes) {
        stage.accept("computing");
        PackageLayout.Layout layout = PackageLayout.of(
                design,
                methods::sheet,
                method -> drawings.of(method).map(FigureSheet::printed).orElse(List.of()),
                found,
                software,
                sizes);
        Map<Cell, Value> values = Evaluation.of(layout.cells());
        return new Done(
                new Results(
                        furniture(design, used),
                        layout.sheets(),
                        layout.cells(),
                        values,
                        figures(design, layout, values)),
                layout.ratings(),
                found);
    }

    private Map<String, Figure> figures(Design design, PackageLayout.Layout layout, Map<Cell, Value> values) {
        Map<String, Figure> figures = new LinkedHashMap<>();
        WorkingSystem system = design.project().system();
        List<String> names = layout.caseNames();
        layout.sheets().stream()
                .filter(sheet -> sheet.blocks().stream()
                        .anyMatch(block ->
                                block instanceof Block.Figure f && f.key().equals(PackageLayout.LIMITS_FIGURE)))
                .forEach(sheet -> figures.put(
                        PackageLayout.LIMITS_FIGURE,
                        MarginBars.of(
                                sheet, layout.limits(), values, "Margins of the limits, each in its tightest case")));
        for (Design.Element element : design.elements()) {
            MethodSheet method = methods.sheet(element.method());
            List<Scope> cases = java.util.Objects.requireNonNull(layout.cases().get(element.tag()));
            drawings.of(method)
                    .ifPresent(sheet -> figures.put(
                            element.tag() + PackageLayout.GEOMETRY_FIGURE,
                            Drafting.draw(
                                    sheet,
                                    method,
                                    cases.get(layout.workedCase()),
                                    values,
                                    system,
                                    names.get(layout.workedCase()))));
            Block.Table rating = layout.ratings().get(element.tag());
            if (rating != null) {
                RatingFigure.of(method, rating, names, cases, values, system)
                        .ifPresent(curve -> figures.put(element.tag() + PackageLayout.RATING_FIGURE, curve));
            }
        }
        return figures;
    }

    private Furniture furniture(Design design, Map<String, MethodSheet> used) {
        Design.Project p = design.project();
        Map<String, String> drawn = new LinkedHashMap<>();
        used.forEach((name, method) -> drawings.of(method).ifPresent(figure -> drawn.put(name, figure.text())));
        return new Furniture(
                p.project(),
                p.firm(),
                p.client(),
                p.number(),
                p.subject(),
                p.revision(),
                p.date(),
                p.status(),
                Fingerprint.of(design, used.values(), drawn, version),
                version,
                p.letterPaper(),
                FOOT,
                p.release());
    }

    SoftwareStatement statement(Map<String, MethodSheet> used, List<CheckRow> checks) {
        Verification verification = new Verification(methods);
        List<CheckOutcome> outcomes = checks.stream()
                .filter(row -> used.containsKey(row.method()))
                .map(verification::run)
                .toList();
        List<List<String>> texts = new ArrayList<>();
        for (MethodSheet method : used.values()) {
            texts.add(List.of(method.name(), Fingerprint.ofText(method.text()), standing(method, outcomes)));
            drawings.of(method)
                    .ifPresent(figure -> texts.add(
                            List.of(method.name() + ", figure", Fingerprint.ofText(figure.text()), whose(method))));
        }
        List<List<String>> rows = outcomes.stream().map(CheckOutcome::printed).toList();
        List<List<String>> off = used.keySet().stream()
                .flatMap(method -> CheckRow.knownToBeOff(methods.library(), method).stream())
                .toList();
        return new SoftwareStatement(version, texts, CheckOutcome.counts(outcomes), rows, off);
    }

    private static String whose(MethodSheet method) {
        return method.house().isEmpty() ? "comes with Nappe" : "the house's own, folder " + method.house();
    }

    /** Whose a method is; for one of the house, what speaks for it. */
    private static String standing(MethodSheet method, List<CheckOutcome> outcomes) {
        if (method.house().isEmpty()) {
            return whose(method);
        }
        List<CheckOutcome> own = outcomes.stream()
                .filter(outcome -> outcome.row().method().equals(method.name()))
                .toList();
        long met = own.stream().filter(CheckOutcome::met).count();
        return whose(method) + "; not verified by Nappe's check values; "
                + (own.isEmpty()
                        ? "UNVERIFIED: the house has no check values for it"
                        : own.size() + (own.size() == 1 ? " check value" : " check values") + " of the house run, "
                                + met + " met");
    }
}
