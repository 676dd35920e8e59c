package nappe.figure;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Scope;
import nappe.formula.Formula;
import nappe.formula.Value;
import nappe.method.Item;
import nappe.method.Limit;
import nappe.method.MethodSheet;
import nappe.method.Rating;
import nappe.results.Curve;
import nappe.results.Curve.End;
import nappe.unit.Dimension;
import nappe.unit.WorkingSystem;
import org.jspecify.annotations.Nullable;

/** A rating curve from its table, with the flow cases and the ends of the ranges that the limits name. */
public final class RatingFigure {
    /** What an element gives where its head in a case is the head of its rating. */
    private static final String GAUGE_HEAD = "head at the gauge";

    private static final double SAME = 1e-9;

    private final MethodSheet method;
    private final Map<Cell, Value> values;
    private final WorkingSystem system;

    private RatingFigure(MethodSheet method, Map<Cell, Value> values, WorkingSystem system) {
        this.method = method;
        this.values = values;
        this.system = system;
    }

    /**
     * The curve; empty where the table gives no flow or the method knows no flow of a case.
     *
     * @param scope of what serves all cases
     * @param cases the scopes of the cases, which know flow and head
     */
    public static Optional<Curve> of(
            MethodSheet method,
            Block.Table table,
            List<String> caseNames,
            List<Scope> cases,
            Map<Cell, Value> values,
            WorkingSystem system) {
        return new RatingFigure(method, values, system).curve(table, caseNames, cases);
    }

    private Optional<Curve> curve(Block.Table table, List<String> caseNames, List<Scope> cases) {
        Rating rating = method.ratings().get(0);
        String flow = flow();
        String flowOfTable =
                rating.results().stream().filter(this::isFlow).findFirst().orElse(null);
        if (flow == null || flowOfTable == null) {
            return Optional.empty();
        }
        List<Curve.Point> points = new ArrayList<>();
        for (Block.Row row : table.rows()) {
            Cell q = cell(row, flowOfTable);
            Cell h = cell(row, rating.free());
            if (q != null && h != null && isNumber(q) && isNumber(h)) {
                points.add(new Curve.Point(q, h));
            }
        }
        String head = method.gives().get(GAUGE_HEAD);
        List<Curve.Case> marks = new ArrayList<>();
        List<String> missing = new ArrayList<>();
        for (int c = 0; c < cases.size(); c++) {
            mark(
                    caseNames.get(c),
                    cases.get(c).cell(flow),
                    head == null ? null : cases.get(c).cell(head),
                    marks,
                    missing);
        }
        return points.size() < 2
                ? Optional.empty()
                : Optional.of(new Curve(
                        "Rating curve with flow cases and ends of the ranges",
                        flow,
                        rating.free(),
                        points,
                        marks,
                        ends(flow, head, points, cases),
                        missing));
    }

    private void mark(String name, Cell flow, @Nullable Cell head, List<Curve.Case> marks, List<String> missing) {
        if (head != null && isNumber(flow) && isNumber(head) && !(number(flow) > 0 && number(head) > 0)) {
            missing.add("Case " + name + " is not marked: there is no nought on a logarithmic scale.");
        } else if (head != null && isNumber(flow) && isNumber(head)) {
            marks.add(new Curve.Case(name, flow, head));
        } else {
            missing.add("Case " + name + " is not marked: "
                    + (head == null
                            ? "the method names no head at the gauge"
                            : "head at the gauge: " + words(isNumber(flow) ? head : flow))
                    + ".");
        }
    }

    private List<End> ends(String flow, @Nullable String head, List<Curve.Point> points, List<Scope> cases) {
        List<End> ends = new ArrayList<>();
        for (Limit limit : method.limits()) {
            boolean ofHead = limit.value() instanceof Formula.Symbol symbol
                            && symbol.name().equals(head)
                    || isEndOfRating(limit.bound());
            boolean ofFlow = limit.value() instanceof Formula.Symbol symbol
                    && symbol.name().equals(flow);
            if ((ofHead || ofFlow) && !cases.isEmpty()) {
                Double bound = bound(limit.bound(), cases.get(0));
                if (bound != null) {
                    add(
                            ends,
                            new End(
                                    ofHead,
                                    (limit.valueIsLesser() ? "greatest " : "least ") + (ofHead ? "head" : "flow"),
                                    bound));
                }
            }
        }
        add(
                ends,
                new End(
                        true,
                        "head where the table begins",
                        number(points.get(0).head())));
        add(
                ends,
                new End(
                        true,
                        "head where the table ends",
                        number(points.get(points.size() - 1).head())));
        return ends;
    }

    /** A head that the rating runs from or to is an end of its range, whichever head the limit judges by it. */
    private boolean isEndOfRating(Formula bound) {
        Rating rating = method.ratings().get(0);
        return bound instanceof Formula.Symbol && (bound.equals(rating.from()) || bound.equals(rating.to()));
    }

    private static void add(List<End> ends, End end) {
        boolean known = ends.stream()
                .anyMatch(e ->
                        e.ofHead() == end.ofHead() && Math.abs(e.value() - end.value()) <= SAME * Math.abs(e.value()));
        if (!known) {
            ends.add(end);
        }
    }

    /** A bound that is one symbol or one quantity, the same in every case. */
    private @Nullable Double bound(Formula bound, Scope scope) {
        if (bound instanceof Formula.Quantity quantity) {
            return quantity.value() * quantity.unit().sizeIn(system);
        }
        if (bound instanceof Formula.Symbol symbol
                && !method.perCase(symbol.name())
                && scope.find(symbol.name()) instanceof Cell cell
                && isNumber(cell)) {
            return number(cell);
        }
        return null;
    }

    private @Nullable String flow() {
        return method.items().stream()
                .filter(item -> item instanceof Item.Given given && given.isFlow())
                .map(item -> ((Item.Given) item).symbol())
                .findFirst()
                .orElse(null);
    }

    private boolean isFlow(String symbol) {
        return method.item(symbol) instanceof Item.Line line
                && line.unit() != null
                && line.unit().dimension().equals(Dimension.FLOW);
    }

    /** The cell of a symbol in its working unit, which stands before those in other units. */
    private static @Nullable Cell cell(Block.Row row, String symbol) {
        for (Block.Item item : row.items()) {
            if (item instanceof Block.Content content && content.cell().symbol().equals(symbol)) {
                return content.cell();
            }
        }
        return null;
    }

    private boolean isNumber(Cell cell) {
        return values.get(cell) instanceof Value.Number;
    }

    private double number(Cell cell) {
        return values.get(cell) instanceof Value.Number number ? number.value() : Double.NaN;
    }

    private String words(Cell cell) {
        Value value = values.get(cell);
        return value instanceof Value.Word word
                ? word.text()
                : value instanceof Value.None none ? none.why() : "no number";
    }
}
