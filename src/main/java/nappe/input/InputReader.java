package nappe.input;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import nappe.input.ProjectSheet.Named;
import nappe.method.MethodCatalogue;
import nappe.station.Design;
import nappe.station.Design.Element;
import nappe.station.Design.FlowCase;
import nappe.station.Design.Project;
import nappe.unit.WorkingSystem;
import org.jspecify.annotations.Nullable;

/** Reads a filled-in input workbook into a design. */
public final class InputReader {
    private final RawWorkbook workbook;
    private final MethodCatalogue methods;
    private final Faults faults;
    private final Entries entries;

    private InputReader(RawWorkbook workbook, MethodCatalogue methods, Faults faults) {
        this.workbook = workbook;
        this.methods = methods;
        this.faults = faults;
        this.entries = new Entries(faults, workbook.from1904());
    }

    /**
     * Reads the file, which is never written to.
     *
     * @throws InputRefused with every fault of the file, each at its cell
     */
    public static Design read(Path file, MethodCatalogue methods) {
        Path name = file.getFileName();
        Faults faults = new Faults(name == null ? file.toString() : name.toString());
        return new InputReader(WorkbookReader.read(file, faults), methods, faults).design();
    }

    private Design design() {
        RawSheet projectSheet = sheet(Layout.PROJECT);
        ProjectSheet reader = projectSheet == null ? null : new ProjectSheet(projectSheet, methods, entries, faults);
        Project project = reader == null ? null : reader.project();
        int before = faults.count();
        List<Named> named = reader == null ? List.of() : reader.elements();
        boolean tagsKnown = reader != null && faults.count() == before;
        List<FlowCase> cases = cases(named, project == null ? WorkingSystem.SI : project.system());
        List<Element> elements = elements(named);
        OtherSheets others = new OtherSheets(entries, faults);
        CaseNames names = new CaseNames(cases, entries);
        List<Design.LevelPair> levels = levels(project == null ? WorkingSystem.SI : project.system());
        List<Design.Combination> combinations = combinations(names);
        List<Design.Demand> demands = others.demands(sheet(Layout.DEMANDS), tagsKnown ? named : List.of(), names);
        List<Design.Assumption> assumptions = others.assumptions(sheet(Layout.ASSUMPTIONS));
        List<String> references = others.references(sheet(Layout.REFERENCES));
        List<Design.Requirement> requirements = others.requirements(sheet(Layout.REQUIREMENTS));
        List<Design.RevisionNote> revisions = others.revisions(sheet(Layout.REVISIONS));
        if (reader != null && project != null) {
            List<String> worked = cases.stream().map(FlowCase::name).toList();
            project = withWorkedCase(project, worked.isEmpty() ? "" : reader.workedCase(project.workedCase(), worked));
        }
        refuseStray(Layout.LEVELS, Layout.LEVEL_HEADS);
        refuseStray(Layout.COMBINATIONS, Layout.COMBINATION_HEADS);
        if (tagsKnown) {
            refuseStraySheets(named);
        }
        faults.throwIfAny();
        if (project == null) {
            throw new IllegalStateException("no project and no fault");
        }
        return new Design(
                project,
                elements,
                cases,
                demands,
                assumptions,
                references,
                requirements,
                revisions,
                combinations,
                levels);
    }

    private List<Design.LevelPair> levels(WorkingSystem system) {
        RawSheet sheet = optionalSheet(Layout.LEVELS);
        return sheet == null ? List.of() : new LevelsSheet(sheet, system, entries, faults).pairs();
    }

    private List<Design.Combination> combinations(CaseNames names) {
        RawSheet sheet = optionalSheet(Layout.COMBINATIONS);
        return sheet == null ? List.of() : new CombinationsSheet(sheet, entries, faults).combinations(names);
    }

    private List<FlowCase> cases(List<Named> named, WorkingSystem system) {
        RawSheet sheet = sheet(Layout.FLOWS);
        return sheet == null ? List.of() : new FlowsSheet(sheet, system, entries, faults).cases(named, methods);
    }

    private List<Element> elements(List<Named> named) {
        List<Element> elements = new ArrayList<>();
        for (Named one : named) {
            RawSheet sheet = sheet(one.tag());
            if (sheet != null) {
                elements.add(new ElementSheet(sheet, entries, faults).element(one, methods.declared(one.method())));
            }
        }
        return elements;
    }

    private @Nullable RawSheet sheet(String name) {
        RawSheet sheet = workbook.sheet(name);
        if (sheet == null) {
            faults.add(
                    name,
                    null,
                    "sheet-missing",
                    "there is no sheet of this name; it was removed or renamed, name it " + name
                            + " again or start from a new blank");
            return null;
        }
        return optionalSheet(name);
    }

    /** A sheet that may be missing, as in workbooks of before there was one. */
    private @Nullable RawSheet optionalSheet(String name) {
        RawSheet sheet = workbook.sheet(name);
        if (sheet != null && sheet.isHidden()) {
            faults.add(sheet.name(), null, "sheet-hidden", "the sheet is hidden; show it and check what stands there");
        }
        return sheet;
    }

    /** A sheet that may be missing and was renamed: its entries would be lost in silence. */
    private void refuseStray(String name, List<String> heads) {
        for (RawSheet sheet : workbook.sheets()) {
            if (!sheet.name().equalsIgnoreCase(name) && Table.looksLike(sheet, heads)) {
                faults.add(
                        sheet.name(),
                        null,
                        "sheet-stray",
                        "the sheet has the columns of the sheet " + name + " under another name; name it " + name
                                + ", or remove it");
            }
        }
    }

    /** A sheet that looks like an element's but is none: its entries would be lost in silence. */
    private void refuseStraySheets(List<Named> named) {
        for (RawSheet sheet : workbook.sheets()) {
            boolean element = named.stream().anyMatch(n -> n.tag().equalsIgnoreCase(sheet.name()));
            if (!element
                    && Table.looksLike(sheet, Layout.ENTRY_HEADS)
                    && !sheet.name().equals(Layout.DEMANDS)) {
                faults.add(
                        sheet.name(),
                        null,
                        "sheet-stray",
                        "the sheet has entries, but no element has this tag; name "
                                + "it in the list of elements on the sheet Project, or remove the sheet");
            }
        }
    }

    private static Project withWorkedCase(Project p, String workedCase) {
        return new Project(
                p.project(),
                p.firm(),
                p.client(),
                p.number(),
                p.subject(),
                p.revision(),
                p.date(),
                p.status(),
                p.system(),
                p.letterPaper(),
                p.flowUnit(),
                p.headUnit(),
                p.datum(),
                workedCase,
                p.release(),
                p.sealSpace());
    }
}
