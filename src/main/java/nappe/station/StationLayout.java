package nappe.station;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.function.Function;
import nappe.calculation.Block;
import nappe.calculation.CaseColumns;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.ElementSheet;
import nappe.calculation.Formulas;
import nappe.calculation.ItemLayout;
import nappe.calculation.RatingGrid;
import nappe.calculation.Scope;
import nappe.calculation.SheetDraft;
import nappe.calculation.TrialRows;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.method.Item;
import nappe.method.Limit;
import nappe.method.MethodSheet;
import nappe.unit.Dimension;
import org.jspecify.annotations.Nullable;

/**
 * Lays the calculation itself: cases, entries, constants and every element from the downstream end up, each case taking
 * the levels of its neighbour downstream in the same case. A package is built around it; a rerun needs nothing else.
 */
public final class StationLayout {
    /** The sheets that the calculation is laid on. */
    record Sheets(
            SheetDraft cases,
            SheetDraft entries,
            SheetDraft constants,
            SheetDraft tables,
            SheetDraft standing,
            SheetDraft trials,
            SheetDraft found,
            Function<String, SheetDraft> element) {}

    private final Design design;
    private final Map<String, MethodSheet> methods = new LinkedHashMap<>();
    private final Sheets sheets;
    private final Cells cells;
    private final ItemLayout items;
    private final TrialRows trialRows;
    private final CasesSheet cases;
    private final FoundColumns found;
    private final CaseColumns columns;
    private final Map<String, Scope> scopes = new LinkedHashMap<>();
    private final Map<String, List<Scope>> casesOf = new LinkedHashMap<>();
    private final Map<String, List<Block.Line>> linesOf = new LinkedHashMap<>();
    private final List<ElementSheet.LimitResult> limits = new ArrayList<>();

    /**
     * @param methodOf the method sheet of a name
     * @param foundCases flows found, each a column after all others
     * @throws StationException where entries do not fit the methods
     */
    StationLayout(Design design, Function<String, MethodSheet> methodOf, List<FoundCase> foundCases, Sheets sheets) {
        this.design = design;
        this.sheets = sheets;
        design.elements().forEach(e -> methods.put(e.tag(), methodOf.apply(e.method())));
        List<DesignFault> faults = DesignCheck.faults(design, methodOf);
        if (!faults.isEmpty()) {
            throw new StationException(faults);
        }
        this.cells = new Cells(design.project().system(), sheets.constants());
        this.trialRows = new TrialRows(cells, sheets.trials());
        this.items = new ItemLayout(cells, trialRows);
        this.cases = new CasesSheet(cells, sheets.cases(), design);
        this.found = new FoundColumns(cells, sheets.found(), design, foundCases);
        this.columns = found.after(cases.columns());
        lay();
    }

    /**
     * The calculation alone, on sheets that go nowhere: for reruns with another flow, level or size.
     *
     * @param methodOf the method sheet of a name
     * @throws StationException where entries do not fit the methods
     */
    public static StationLayout bare(Design design, Function<String, MethodSheet> methodOf) {
        return bare(design, methodOf, List.of());
    }

    /**
     * The calculation alone, with columns for flows to be tried.
     *
     * @param methodOf the method sheet of a name
     * @throws StationException where entries do not fit the methods
     */
    public static StationLayout bare(
            Design design, Function<String, MethodSheet> methodOf, List<FoundCase> foundCases) {
        SheetDraft tables = new SheetDraft("Tables", "");
        return new StationLayout(
                design,
                methodOf,
                foundCases,
                new Sheets(
                        new SheetDraft("Cases", ""),
                        new SheetDraft("Entries", ""),
                        new SheetDraft("Constants", ""),
                        tables,
                        tables,
                        new SheetDraft("Trials", ""),
                        new SheetDraft("Found", ""),
                        tag -> new SheetDraft(tag, "")));
    }

    private void lay() {
        Sources sources = new Sources(cells, sheets.constants(), sheets.tables(), sheets.standing());
        Map<String, Map<String, Cell>> constants = sources.layConstants(distinctMethods());
        cases.lay(isShared());
        found.lay(cases);
        EntriesSheet entries = new EntriesSheet(cells, sheets.entries());
        for (Design.Element element : design.elements()) {
            Scope scope = Scope.ofElement();
            method(element.tag()).tables().values().forEach(table -> sources.layTable(table, scope));
            entries.lay(element, method(element.tag()), scope);
            constants.getOrDefault(element.method(), Map.of()).forEach(scope::put);
            scopes.put(element.tag(), scope);
            printRowsInUse(sources, method(element.tag()), scope);
        }
        Map<Design.Demand, Cell> demands = entries.layDemands(design.demands());
        @Nullable String below = null;
        for (Design.Element element : design.elements()) {
            String tag = element.tag();
            List<Scope> caseScopes = caseScopes(tag, below);
            casesOf.put(tag, caseScopes);
            ElementSheet laid = new ElementSheet(
                    tag, method(tag), items, trialRows, sheets.element().apply(tag), scope(tag), columns, caseScopes);
            limits.addAll(laid.lay(workedCase(), demanded(element, demands)));
            linesOf.put(tag, laid.lines());
            below = tag;
        }
    }

    /** A table that a choice looks up is printed by the rows in use. */
    private static void printRowsInUse(Sources sources, MethodSheet method, Scope scope) {
        for (Item item : method.items()) {
            if (item instanceof Item.Line line
                    && line.formula() instanceof Formula.Call match
                    && match.function() == nappe.formula.Function.MATCH
                    && match.arguments().get(0) instanceof Formula.Symbol key
                    && match.arguments().get(1) instanceof Formula.Symbol column
                    && scope.find(key.name()) instanceof Cell chosen) {
                sources.printRow(column.name().substring(0, column.name().lastIndexOf('.')), chosen);
            }
        }
    }

    private boolean isShared() {
        return methods.values().stream()
                .flatMap(method -> method.items().stream())
                .anyMatch(item -> item instanceof Item.Given given
                        && (given.role().equals("flow through one")
                                || given.role().equals("units in service")));
    }

    Cells cells() {
        return cells;
    }

    /** All cells, in the order of evaluation. */
    public List<Cell> allCells() {
        return List.copyOf(cells.all());
    }

    ItemLayout items() {
        return items;
    }

    TrialRows trialRows() {
        return trialRows;
    }

    CasesSheet cases() {
        return cases;
    }

    /** The columns of the flows found. */
    FoundColumns foundColumns() {
        return found;
    }

    /** The cells that hold the flows found, in the working unit, in the order of their columns. */
    public List<Cell> foundFlows() {
        return List.copyOf(found.flows());
    }

    /**
     * The flows at the ends of every rating table, through one device: what a search must span. They are laid on a sheet
     * that goes nowhere.
     */
    public List<Cell> ratedFlows() {
        List<Cell> ends = new ArrayList<>();
        SheetDraft nowhere = new SheetDraft("Rated", "");
        methods.forEach((tag, method) -> method.ratings().forEach(rating -> {
            trialRows.nowFor(tag, "rating");
            List<Block.Row> rows = new RatingGrid(items, method, Map.of())
                    .lay(rating, scope(tag), nowhere, tag)
                    .table()
                    .rows();
            for (Block.Row row : List.of(rows.get(0), rows.get(rows.size() - 1))) {
                for (Block.Item item : row.items()) {
                    if (item instanceof Block.Content content
                            && content.cell().unit().dimension().equals(Dimension.FLOW)) {
                        ends.add(content.cell());
                    }
                }
            }
        }));
        return ends;
    }

    /** The columns of every element's calculation. */
    public CaseColumns columns() {
        return columns;
    }

    /** The scope of what serves all cases of an element. */
    public Scope scope(String tag) {
        return Objects.requireNonNull(scopes.get(tag));
    }

    /** The cell into which a symbol of an element is typed, behind the cells that hand it on. */
    public Cell entry(String tag, String symbol) {
        Cell cell = scope(tag).cell(symbol);
        while (cell.formula() != null) {
            cell = cell.references().values().stream()
                    .filter(Cell.class::isInstance)
                    .map(Cell.class::cast)
                    .findFirst()
                    .orElseThrow();
        }
        return cell;
    }

    /** The scopes of an element's cases, one per column. */
    public List<Scope> cases(String tag) {
        return Objects.requireNonNull(casesOf.get(tag));
    }

    /** The lines of each element, by its tag. */
    Map<String, List<Block.Line>> lines() {
        return linesOf;
    }

    /** Every limit with its margin and verdict in every column. */
    public List<ElementSheet.LimitResult> limits() {
        return List.copyOf(limits);
    }

    /** Those that a case is judged by, or the layout: without the thresholds that are only searched for. */
    public List<ElementSheet.LimitResult> judgedLimits() {
        return limits.stream()
                .filter(limit -> limit.kind() != Limit.Kind.THRESHOLD)
                .toList();
    }

    /** The tags of the elements, from the downstream end up. */
    List<String> tags() {
        return design.elements().stream().map(Design.Element::tag).toList();
    }

    public MethodSheet method(String tag) {
        return Objects.requireNonNull(methods.get(tag));
    }

    List<MethodSheet> distinctMethods() {
        // by name: a method sheet is a whole text, slow to compare
        Map<String, MethodSheet> distinct = new LinkedHashMap<>();
        methods.values().forEach(method -> distinct.putIfAbsent(method.name(), method));
        return List.copyOf(distinct.values());
    }

    /** Index of the case worked in full. */
    int workedCase() {
        return Math.max(0, columns.names().indexOf(design.project().workedCase()));
    }

    private List<Scope> caseScopes(String tag, @Nullable String below) {
        MethodSheet method = method(tag);
        List<Item.Given> asked = new ArrayList<>();
        for (Item item : method.items()) {
            if (item instanceof Item.Given given
                    && given.from() == Item.From.CASE
                    && given.role().isEmpty()) {
                asked.add(given);
            }
        }
        Map<String, List<Cell>> own = cases.layOwn(tag, asked);
        List<Scope> inners = new ArrayList<>();
        for (int c = 0; c < columns.count(); c++) {
            Scope inner = scope(tag).inner();
            for (Item.Given given : asked) {
                List<Cell> typed = Objects.requireNonNull(own.get(given.symbol()));
                inner.put(given.symbol(), c < typed.size() ? typed.get(c) : found.notGiven(tag, given));
            }
            for (Item item : method.items()) {
                if (item instanceof Item.Given given && !given.role().isEmpty()) {
                    inner.put(given.symbol(), linked(given.role(), c, below));
                }
            }
            inners.add(inner);
        }
        return inners;
    }

    /** What a role is in a case: the flow, or a level from the neighbour downstream, or from the case at the end. */
    private Cell linked(String role, int c, @Nullable String below) {
        switch (role) {
            case "flow":
                return cases.flow(c);
            case "flow through one":
                return cases.flowThroughOne(c);
            case "units in service":
                return cases.unitsInService(c);
            default:
                break;
        }
        String offered = below == null ? null : method(below).gives().get(role);
        if (offered != null && below != null) {
            return cases(below).get(c).cell(offered);
        }
        if (below == null && (role.equals("water level") || role.equals("energy level"))) {
            return cases.level(c);
        }
        throw new IllegalStateException("nothing gives a " + role + "; a design is checked for that before");
    }

    private List<ElementSheet.Demanded> demanded(Design.Element element, Map<Design.Demand, Cell> bounds) {
        List<ElementSheet.Demanded> demanded = new ArrayList<>();
        for (Design.Demand demand : design.demands()) {
            if (demand.tag().equalsIgnoreCase(element.tag())) {
                String name = "bound";
                Formula value = new Formula.Symbol(demand.symbol());
                Formula bound = new Formula.Symbol(name);
                Formula scale = scale(demand, method(element.tag()));
                Formula when = demand.inCase().isEmpty()
                        ? null
                        : Formulas.compare(
                                Formulas.symbol(ElementSheet.CASE_NAME),
                                Comparator.EQUAL,
                                Formulas.word(demand.inCase()));
                Limit limit = demand.atMost()
                        ? new Limit(value, bound, true, scale, when, demand.label(), demand.citation())
                        : new Limit(bound, value, false, scale, when, demand.label(), demand.citation());
                demanded.add(new ElementSheet.Demanded(
                        limit,
                        Map.of(name, Objects.requireNonNull(bounds.get(demand))),
                        when == null ? List.of() : cases.names()));
            }
        }
        return demanded;
    }

    /**
     * A fraction of an elevation means nothing: what is left to a demanded length or level is measured by the height that
     * the element names, so that it stands beside other margins in any unit; where it names none, by one foot or metre.
     */
    private Formula scale(Design.Demand demand, MethodSheet method) {
        Dimension dimension = demand.value().unit().dimension();
        String height = method.gives().get("scale of levels");
        if (dimension.equals(Dimension.LENGTH) && height != null) {
            return new Formula.Symbol(height);
        }
        return dimension.equals(Dimension.LENGTH)
                ? new Formula.Quantity(1, "1", design.project().system().coherentUnit(dimension))
                : new Formula.Call(nappe.formula.Function.ABS, List.of(new Formula.Symbol("bound")));
    }
}
