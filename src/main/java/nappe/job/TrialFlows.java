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
    private final List<List<Cell>> resting = new ArrayList<>();
    private final List<Integer> limits = new ArrayList<>();
    private final List<Double> rated = new ArrayList<>();
    private final int firstColumn;
    private int trials;

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
        for (Cell flow : flows) {
            resting.add(Evaluation.restingOn(flow, station.allCells()));
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

    /** How many trials were made. */
    int trials() {
        return trials;
    }

    /**
     * What each searched limit says at a flow.
     *
     * @param condition index of the condition
     * @param flow in the working unit
     */
    List<Judged> at(int condition, double flow) {
        trials++;
        Map<Cell, Value> values =
                Evaluation.again(asTyped, Map.of(flows.get(condition), Value.of(flow)), resting.get(condition));
        List<Judged> judged = new ArrayList<>();
        for (int index : limits) {
            LimitResult limit = limit(index);
            Value verdict = value(values, limit.verdicts().get(firstColumn + condition));
            Value margin = value(values, Objects.requireNonNull(limit.margins().get(firstColumn + condition)));
            judged.add(new Judged(verdict(verdict), margin instanceof Value.Number number ? number.value() : null));
        }
        return judged;
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
