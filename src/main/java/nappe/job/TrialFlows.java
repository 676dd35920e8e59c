package nappe.job;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.function.Function;
import nappe.calculation.Cell;
import nappe.calculation.ElementSheet.LimitResult;
import nappe.formula.Value;
import nappe.method.MethodSheet;
import nappe.solve.Evaluation;
import nappe.station.Design;
import nappe.station.FoundCase;
import nappe.station.FoundCase.Condition;
import nappe.station.StationLayout;
import org.jspecify.annotations.Nullable;

/**
 * The calculation with a column for each condition, in which any flow may be tried. The layout does not depend on
 * numbers: it is laid once, and a trial evaluates what rests on its flow once more, by the same cells that the package
 * holds.
 */
final class TrialFlows {
    /** What a limit says at a flow. */
    enum Verdict {
        MET,
        NOT_MET,
        /** It does not apply, is not given or has no result. */
        NONE
    }

    /** @param margin null where there is none */
    record Judged(Verdict verdict, @Nullable Double margin) {}

    private final StationLayout station;
    private final Map<Cell, Value> asTyped;
    private final List<Cell> flows;
    /** What rests on the flow of each condition and leads to any searched limit; and the same for each searched limit. */
    private final List<List<Cell>> resting = new ArrayList<>();

    private final List<List<List<Cell>>> restingOfEach = new ArrayList<>();
    private final List<Integer> limits = new ArrayList<>();
    private final List<Double> rated = new ArrayList<>();
    private final int firstColumn;

    /** @throws nappe.station.StationException where entries do not fit the methods */
    TrialFlows(Design design, Function<String, MethodSheet> methodOf, List<Condition> conditions) {
        this.station = StationLayout.bare(
                design,
                methodOf,
                conditions.stream().map(one -> FoundCase.trial(one, 1)).toList());
        List<Cell> ends = station.ratedFlows();
        this.asTyped = Evaluation.of(station.allCells());
        this.flows = station.foundFlows();
        this.firstColumn = station.columns().count() - conditions.size();
        for (int i = 0; i < station.limits().size(); i++) {
            if (isSearched(station.limits().get(i))) {
                limits.add(i);
            }
        }
        for (int i = 0; i < flows.size(); i++) {
            List<Cell> moved = Evaluation.restingOn(flows.get(i), station.allCells());
            List<Cell> read = new ArrayList<>();
            List<List<Cell>> ofEach = new ArrayList<>();
            for (int index : limits) {
                List<Cell> targets = List.of(verdict(i, index), margin(i, index));
                read.addAll(targets);
                ofEach.add(Evaluation.leadingTo(targets, moved));
            }
            resting.add(Evaluation.leadingTo(read, moved));
            restingOfEach.add(ofEach);
        }
        for (Cell end : ends) {
            if (asTyped.get(end) instanceof Value.Number number && number.value() > 0) {
                rated.add(number.value());
            }
        }
    }

    /** Limits that are judged in each case and have a margin; whether the trials of a root closed has none. */
    private boolean isSearched(LimitResult limit) {
        return limit.verdicts().size() == station.columns().count()
                && limit.margins().stream().allMatch(Objects::nonNull);
    }

    /** The indices of the limits that are searched, among those of the station. */
    List<Integer> limits() {
        return limits;
    }

    LimitResult limit(int index) {
        return station.limits().get(index);
    }

    /** The flows at the ends of the rating tables, through one device, in the working unit. */
    List<Double> rated() {
        return rated;
    }

    private Cell verdict(int condition, int index) {
        return limit(index).verdicts().get(firstColumn + condition);
    }

    private Cell margin(int condition, int index) {
        return Objects.requireNonNull(limit(index).margins().get(firstColumn + condition));
    }

    /**
     * What each searched limit says at a flow.
     *
     * @param condition index of the condition
     * @param flow in the working unit
     */
    List<Judged> at(int condition, double flow) {
        Map<Cell, Value> values = values(condition, flow, resting.get(condition));
        return limits.stream().map(index -> judged(values, condition, index)).toList();
    }

    /**
     * What one searched limit says at a flow.
     *
     * @param condition index of the condition
     * @param limit which of {@link #limits}
     * @param flow in the working unit
     */
    Judged at(int condition, int limit, double flow) {
        List<Cell> cells = restingOfEach.get(condition).get(limit);
        return judged(values(condition, flow, cells), condition, limits.get(limit));
    }

    private Map<Cell, Value> values(int condition, double flow, List<Cell> cells) {
        return Evaluation.again(asTyped, Map.of(flows.get(condition), Value.of(flow)), cells);
    }

    private Judged judged(Map<Cell, Value> values, int condition, int index) {
        Value verdict = value(values, verdict(condition, index));
        Value margin = value(values, margin(condition, index));
        return new Judged(verdict(verdict), margin instanceof Value.Number number ? number.value() : null);
    }

    /** A limit may not rest on the flow at all. */
    private Value value(Map<Cell, Value> values, Cell cell) {
        Value value = values.get(cell);
        return value != null ? value : Objects.requireNonNull(asTyped.get(cell));
    }

    private static Verdict verdict(Value value) {
        if (value instanceof Value.Word word) {
            return switch (word.text()) {
                case "met" -> Verdict.MET;
                case "not met" -> Verdict.NOT_MET;
                default -> Verdict.NONE;
            };
        }
        return Verdict.NONE;
    }
}
