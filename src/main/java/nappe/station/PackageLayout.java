package nappe.station;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.ElementSheet;
import nappe.calculation.Place;
import nappe.calculation.RatingGrid;
import nappe.calculation.Scope;
import nappe.calculation.ScreenGrid;
import nappe.calculation.Sheet;
import nappe.calculation.SheetDraft;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.method.Screen;
import nappe.unit.Dimension;
import nappe.unit.Unit;

/**
 * Lays a design out as the sheets of a package: cells with formulas and no numbers. Levels are worked from the
 * downstream end up: each element takes its neighbour's water level in the same case.
 */
public final class PackageLayout {
    /**
     * The sheets in order, and the cells in the order of evaluation.
     *
     * @param ratings the rating table of an element, by its tag
     * @param caseNames the names of the cases and combinations that are judged
     * @param cases the scopes of an element's cases, by its tag
     * @param limits every limit with its margins
     * @param workedCase index of the case worked in full
     */
    public record Layout(
            List<Sheet> sheets,
            List<Cell> cells,
            Map<String, Block.Table> ratings,
            List<String> caseNames,
            Map<String, List<Scope>> cases,
            List<ElementSheet.LimitResult> limits,
            int workedCase) {}

    /** Keys of the figures. */
    public static final String LIMITS_FIGURE = "limits";

    public static final String GEOMETRY_FIGURE = " geometry";
    public static final String RATING_FIGURE = " rating";

    private final Design design;
    private final Map<String, MethodSheet> methods = new LinkedHashMap<>();
    private final List<SheetDraft> drafts = new ArrayList<>();
    private final List<String> contents = new ArrayList<>();
    private final Function<String, MethodSheet> methodOf;
    private final Function<MethodSheet, List<String>> drawn;
    private final Map<String, List<SizeRerun>> sizeReruns;

    private PackageLayout(
            Design design,
            Function<String, MethodSheet> methodOf,
            Function<MethodSheet, List<String>> drawn,
            Map<String, List<SizeRerun>> sizeReruns) {
        this.design = design;
        this.methodOf = methodOf;
        this.drawn = drawn;
        this.sizeReruns = sizeReruns;
        design.elements().forEach(e -> methods.put(e.tag(), methodOf.apply(e.method())));
    }

    /**
     * @param methodOf the method sheet of a name
     * @param drawn the symbols whose values the drawing of a method shows; empty for a method without drawing
     * @param found the flows at which limits are first reached
     * @param sizeReruns for the tag of each element whose method has a screen statement, one rerun for each word
     * @throws StationException where entries do not fit the methods
     */
    public static Layout of(
            Design design,
            Function<String, MethodSheet> methodOf,
            Function<MethodSheet, List<String>> drawn,
            FoundFlows found,
            SoftwareStatement software,
            Map<String, List<SizeRerun>> sizeReruns) {
        return new PackageLayout(design, methodOf, drawn, sizeReruns).lay(found, software);
    }

    private SheetDraft draft(String name, String title, String content) {
        return add(new SheetDraft(name, title), content);
    }

    private SheetDraft add(SheetDraft draft, String content) {
        drafts.add(draft);
        contents.add(content);
        return draft;
    }

    /** The sheets of a screen statement; the grid behind takes its place at the back later. */
    private record SizeDrafts(SheetDraft compared, SheetDraft reruns, SheetDraft grid) {}

    private SizeDrafts sizeDrafts(String tag) {
        return new SizeDrafts(
                draft(
                        tag + " sizes",
                        tag + "  Standard sizes compared",
                        "every standard size through all cases; the chosen one and why"),
                draft(
                        tag + " size reruns",
                        tag + "  What fails with each standard size",
                        "limits of the whole station with each size, as issued"),
                new SheetDraft(tag + " size grid", tag + "  Standard sizes line by line"));
    }

    private Layout lay(FoundFlows found, SoftwareStatement software) {
        SheetDraft cover = draft("Cover", "Cover", "what this calculation is for, status, approvals, cautions");
        SheetDraft index = draft(
                "Index", "Index, requirements and revisions", "this list; requirements and where they are answered");
        SheetDraft overviewSheet = draft(
                "Overview",
                "Overview of the cases",
                "for each case: what is measured, how high the water stands, which limit governs");
        SheetDraft limitSheet =
                draft("Limits", "Summary of limits", "every limit in its worst case, and in every case");
        SheetDraft foundDraft = draft(
                "Found",
                "Where each limit is first reached",
                "flows at which a verdict turns, as issued, with live margins");
        SheetDraft caseSheet =
                draft("Cases", "Design flows and water levels", "flow cases as typed and in working units");
        SheetDraft combinationSheet = design.combinations().isEmpty()
                ? null
                : draft(
                        "Combinations",
                        "Combinations of flow and water level",
                        "the flow of one case with the level of another: which can occur, and what comes of it");
        SheetDraft yearSheet = YearsSheet.isNeeded(design)
                ? draft("Years", "Design years side by side", "flow, units in service and heads in each design year")
                : null;
        SheetDraft entrySheet = draft(
                "Entries", "Entries and demands, with sources", "what was typed, in its unit and in working units");
        SheetDraft constantSheet =
                draft("Constants", "Constants and conversion factors", "cited numbers and factors in use");
        SheetDraft tableSheet = draft("Tables", "Cited tables", "published coefficients that the lines look up");
        SheetDraft standingSheet = hasRemarks()
                ? draft(
                        "Standing",
                        "Standing of the tabled numbers",
                        "row by row: what was read where, what is from memory")
                : tableSheet;
        Map<String, SheetDraft> elementSheets = new LinkedHashMap<>();
        Map<String, SheetDraft> figureSheets = new LinkedHashMap<>();
        Map<String, SheetDraft> ratingSheets = new LinkedHashMap<>();
        Map<String, SizeDrafts> sizeSheets = new LinkedHashMap<>();
        for (Design.Element element : design.elements()) {
            String title = element.tag() + "  " + EntriesSheet.title(element, method(element));
            SheetDraft methodSheet = draft(
                    element.tag() + " method",
                    element.tag() + "  Method and limits of use",
                    "what the method says, and where it holds");
            houseMethod(methodSheet, method(element));
            method(element).about().forEach(methodSheet::note);
            methodSheet.heading("Cautions");
            method(element).cautions().forEach(methodSheet::caution);
            if (!drawn.apply(method(element)).isEmpty()) {
                figureSheets.put(
                        element.tag(),
                        draft(
                                element.tag() + " figure",
                                element.tag() + "  Geometry and levels",
                                "the device drawn, with its dimensions and levels"));
            }
            elementSheets.put(
                    element.tag(), draft(element.tag(), title, "one case worked in full, every case, limits"));
            if (!method(element).ratings().isEmpty()) {
                ratingSheets.put(
                        element.tag(),
                        draft(
                                element.tag() + " rating",
                                element.tag() + "  Rating table",
                                "flow for equal steps of head, over the usable range"));
            }
            if (method(element).screen() != null) {
                sizeSheets.put(element.tag(), sizeDrafts(element.tag()));
            }
        }
        SheetDraft assumptionSheet = draft("Assumptions", "Assumptions", "each with basis and owner, open or closed");
        SheetDraft glossarySheet =
                draft("Glossary", "Glossary and dependence", "every symbol, what it rests on, what rests on it");
        SheetDraft registerSheet =
                draft("Register", "Register of results", "every result with its case, sheet, line and cell (workbook)");
        SheetDraft checkerSheet = draft(
                "Checker", "Checker's record", "every formula with its cell, room for tick, initials and comment");
        SheetDraft referenceSheet = draft("References", "References", "publications and tables cited");
        SheetDraft softwareSheet = draft("Software", "Software statement", "version, method texts, check values");
        sizeSheets.values().forEach(sizes -> add(sizes.grid(), "the lines behind the sizes compared (workbook)"));
        SheetDraft trialSheet = draft("Trials", "Trial rows", "roots step by step (workbook), and how each closed");

        FoundSheet foundSheet = new FoundSheet(foundDraft, found);
        foundSheet.head();
        StationLayout station = new StationLayout(
                design,
                methodOf,
                found.cases(),
                new StationLayout.Sheets(
                        caseSheet,
                        entrySheet,
                        constantSheet,
                        tableSheet,
                        standingSheet,
                        trialSheet,
                        foundDraft,
                        tag -> java.util.Objects.requireNonNull(elementSheets.get(tag))));
        Cells cells = station.cells();
        int judged = station.columns().judged();
        List<String> caseNames = station.columns().judgedNames();
        List<ElementSheet.LimitResult> limits = station.judgedLimits().stream()
                .map(limit -> limit.first(judged))
                .toList();
        Map<String, Block.Table> ratings = new LinkedHashMap<>();
        Map<String, List<Scope>> casesOf = new LinkedHashMap<>();
        Map<String, List<Block.Line>> linesOf = station.lines();
        for (Design.Element element : design.elements()) {
            MethodSheet method = method(element);
            List<Scope> caseScopes = station.cases(element.tag()).subList(0, judged);
            casesOf.put(element.tag(), caseScopes);
            SheetDraft figureSheet = figureSheets.get(element.tag());
            if (figureSheet != null) {
                new DrawnSheet(method, figureSheet)
                        .lay(element.tag(), drawn.apply(method), caseScopes.get(station.workedCase()));
            }
            SheetDraft ratingSheet = ratingSheets.get(element.tag());
            if (ratingSheet != null) {
                Block.Table table = rating(element, method, station, ratingSheet);
                ratings.put(element.tag(), table);
                new RatingCurve(cells, method, ratingSheet)
                        .lay(table, method.ratings().get(0), "Rating curve of " + element.tag(), caseNames, caseScopes);
            }
            SizeDrafts sizes = sizeSheets.get(element.tag());
            if (sizes != null) {
                sizes(element, station, sizes);
            }
        }

        BackSheets back = new BackSheets(cells, design);
        List<String> foundNames = station.foundColumns().names();
        back.roots(
                trialSheet,
                station.trialRows().solved().stream()
                        .filter(root -> !foundNames.contains(root.caseName()))
                        .toList());
        foundSheet.lay(design, station);
        SummarySheet.Sorted sorted = new SummarySheet(
                        cells,
                        limitSheet,
                        trialSheet,
                        caseNames,
                        station.cases().judgedNames())
                .lay(limits);
        new OverviewSheet(design, station, overviewSheet).lay(trialSheet);
        if (combinationSheet != null) {
            new CombinationsSheet(design, station, combinationSheet).lay(trialSheet);
        }
        if (yearSheet != null) {
            new YearsSheet(design, station, yearSheet).lay();
        }
        CheckerSheets.glossary(glossarySheet, linesOf);
        CheckerSheets.formulas(checkerSheet, linesOf);
        Map<String, Integer> numbers = new LinkedHashMap<>();
        elementSheets.forEach((tag, sheet) -> numbers.put(tag, drafts.indexOf(sheet) + 1));
        RegisterSheet.lay(
                registerSheet,
                cells,
                linesOf,
                numbers,
                station.columns().names().stream()
                        .map(name -> foundNames.contains(name) ? name + ", flow as issued" : name)
                        .toList());
        limitSheet.figure("Margins of the limits", LIMITS_FIGURE);
        back.assumptions(assumptionSheet);
        back.references(referenceSheet, station.distinctMethods());
        back.software(softwareSheet, software);
        FrontSheets front = new FrontSheets(cells, design);
        front.cover(cover, sorted);
        front.index(index, drafts, contents);

        List<Sheet> sheets = new ArrayList<>();
        for (int i = 0; i < drafts.size(); i++) {
            sheets.add(drafts.get(i).finish(i + 1));
        }
        return new Layout(
                List.copyOf(sheets),
                List.copyOf(cells.all()),
                ratings,
                caseNames,
                casesOf,
                limits,
                station.workedCase());
    }

    private static void houseMethod(SheetDraft sheet, MethodSheet method) {
        if (!method.house().isEmpty()) {
            sheet.caution(
                    "House method " + method.name() + " of folder " + method.house()
                            + ": written by the house, no part of Nappe. What check values speak for it stands on sheet Software.");
        }
    }

    private boolean hasRemarks() {
        return methods.values().stream()
                .flatMap(method -> method.tables().values().stream())
                .flatMap(table -> table.columns().stream())
                .anyMatch(Sources::isRemark);
    }

    private MethodSheet method(Design.Element element) {
        return java.util.Objects.requireNonNull(methods.get(element.tag()));
    }

    /** Lays every word of the screened choice for the judged cases: the grid behind, the comparison, what reruns found. */
    private void sizes(Design.Element element, StationLayout station, SizeDrafts drafts) {
        MethodSheet method = method(element);
        Screen screen = java.util.Objects.requireNonNull(method.screen());
        Item.Given choice = (Item.Given) java.util.Objects.requireNonNull(method.item(screen.choice()));
        Scope scope = station.scope(element.tag());
        List<String> names = station.columns().judgedNames();
        List<ScreenGrid.Variant> variants = new ScreenGrid(station.items(), method, screen)
                .lay(
                        Sources.keys(scope, choice.table()),
                        scope,
                        station.cases(element.tag()).subList(0, names.size()),
                        names,
                        drafts.grid());
        Design.Typed typed = element.typed().get(screen.choice());
        Place at = station.entry(element.tag(), screen.choice()).place();
        String entry = "cell " + at.address() + " of sheet " + at.sheet();
        List<Cell> marks = new SizesSheet(station.items(), method, screen, drafts.grid())
                .lay(
                        drafts.compared(),
                        scope.cell(screen.choice()),
                        entry,
                        typed == null ? "" : typed.source(),
                        variants);
        SizeRerunsSheet reruns = new SizeRerunsSheet(station.cells(), drafts.reruns(), screen.choice());
        reruns.notes(entry, names);
        reruns.table(variants, marks, java.util.Objects.requireNonNull(sizeReruns.get(element.tag())));
    }

    private Block.Table rating(Design.Element element, MethodSheet method, StationLayout station, SheetDraft sheet) {
        station.trialRows().nowFor(element.tag(), "rating");
        Map<Dimension, Unit> reports = new LinkedHashMap<>();
        for (Unit unit : List.of(design.project().flowUnit(), design.project().headUnit())) {
            if (!unit.equals(station.cells().unit(unit.dimension()))) {
                reports.put(unit.dimension(), unit);
            }
        }
        sheet.note(
                "Only for flow as the method takes it: not slowed by the level downstream, unless the head is a difference of two levels; in a meter, through a full pipe. Outside this range, or where a limit of the device is not met, no result is claimed.");
        method.cautions().forEach(sheet::caution);
        sheet.gap();
        sheet.figure("Rating curve of " + element.tag(), element.tag() + RATING_FIGURE);
        return new RatingGrid(station.items(), method, reports)
                .lay(method.ratings().get(0), station.scope(element.tag()), sheet, "Rating of " + element.tag())
                .table();
    }
}
