package nappe.job;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.Function;
import nappe.calculation.ElementSheet.LimitResult;
import nappe.job.Bracket.Point;
import nappe.job.Bracket.Turn;
import nappe.job.TrialFlows.Judged;
import nappe.job.TrialFlows.Verdict;
import nappe.method.MethodSheet;
import nappe.results.Digits;
import nappe.station.Design;
import nappe.station.FoundCase;
import nappe.station.FoundFlows;
import nappe.station.FoundFlows.NotReached;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * Looks for the flows at which the verdict on a limit turns between met and not met, condition by condition: flows in
 * equal ratios over the range of the typed flows and of the ratings and well beyond, then each turn narrowed. Where a
 * margin comes near nought and turns back between the flows tried, it is followed to its extreme, so that two turns close
 * to one another are not stepped over.
 */
final class FlowSearch {
    /** So many cases are laid at most. */
    static final int MOST_CASES = 40;

    /** The range searched: from this share of the least typed flow to so many times the greatest. */
    private static final double BELOW = 0.05;

    private static final double BEYOND = 4;

    /** However far a rating goes, the range reaches no further from the typed flows. */
    private static final double FURTHEST = 1e3;

    private static final double RATIO = 1.15;
    private static final int LEAST_STEPS = 60;
    private static final int MOST_STEPS = 240;

    /** Flows as good as one. */
    private static final double SAME = 1e-9;

    private static final int MOST_TO_AN_EXTREME = 40;

    private record Found(int limit, int condition, Turn turn) {}

    private final Design design;
    private final FlowConditions conditions;
    private final TrialFlows trials;
    private final List<Double> flows;
    private final List<Found> found = new ArrayList<>();
    private final Map<Integer, Map<String, List<Integer>>> notReached = new LinkedHashMap<>();

    private FlowSearch(Design design, FlowConditions conditions, TrialFlows trials) {
        this.design = design;
        this.conditions = conditions;
        this.trials = trials;
        this.flows = flowsToTry();
    }

    /** @throws nappe.station.StationException where entries do not fit the methods */
    static FoundFlows of(Design design, Function<String, MethodSheet> methodOf) {
        FlowConditions conditions = FlowConditions.of(design);
        if (conditions.flows().isEmpty()) {
            return new FoundFlows(
                    List.of(), List.of(), List.of("No flow above nought was typed: nothing was searched."));
        }
        TrialFlows trials = new TrialFlows(design, methodOf, conditions.all());
        return new FlowSearch(design, conditions, trials).search();
    }

    private List<Double> flowsToTry() {
        double least = conditions.flows().stream().min(Double::compare).orElseThrow();
        double greatest = conditions.flows().stream().max(Double::compare).orElseThrow();
        double from = least * BELOW;
        double to = greatest * BEYOND;
        for (double rated : trials.rated()) {
            from = Math.min(from, Math.max(rated / 2, least / FURTHEST));
            to = Math.max(to, Math.min(2 * rated * conditions.mostUnits(), greatest * FURTHEST));
        }
        int steps = (int) Math.ceil(Math.log(to / from) / Math.log(RATIO));
        steps = Math.max(LEAST_STEPS, Math.min(MOST_STEPS, steps));
        TreeSet<Double> all = new TreeSet<>(conditions.flows());
        for (int i = 0; i <= steps; i++) {
            all.add(from * Math.pow(to / from, (double) i / steps));
        }
        return List.copyOf(all);
    }

    private FoundFlows search() {
        for (int k = 0; k < conditions.all().size(); k++) {
            int condition = k;
            List<List<Judged>> tried =
                    flows.stream().map(flow -> trials.at(condition, flow)).toList();
            for (int i = 0; i < trials.limits().size(); i++) {
                int limit = i;
                List<Point> points = new ArrayList<>();
                for (int q = 0; q < flows.size(); q++) {
                    points.add(new Point(flows.get(q), tried.get(q).get(limit)));
                }
                search(condition, limit, withExtremes(condition, limit, points));
            }
        }
        return result();
    }

    /** The points, and between them those at which a margin that turned back before nought passes it. */
    private List<Point> withExtremes(int condition, int limit, List<Point> points) {
        List<Point> all = new ArrayList<>(points);
        for (int i = 1; i + 1 < points.size(); i++) {
            Double before = points.get(i - 1).judged().margin();
            Double here = points.get(i).judged().margin();
            Double after = points.get(i + 1).judged().margin();
            Verdict verdict = points.get(i).judged().verdict();
            boolean alike = verdict != Verdict.NONE
                    && points.get(i - 1).judged().verdict() == verdict
                    && points.get(i + 1).judged().verdict() == verdict;
            if (alike && before != null && here != null && after != null) {
                double sign = verdict == Verdict.MET ? 1 : -1;
                if (sign * here < sign * before && sign * here <= sign * after) {
                    extreme(
                            condition,
                            limit,
                            points.get(i - 1).flow(),
                            points.get(i + 1).flow(),
                            verdict,
                            sign,
                            all);
                }
            }
        }
        all.sort(Comparator.comparingDouble(Point::flow));
        return all;
    }

    /** Golden section towards the extreme of a margin, until its verdict turns. */
    private void extreme(
            int condition, int limit, double from, double to, Verdict verdict, double sign, List<Point> all) {
        double share = (Math.sqrt(5) - 1) / 2;
        double low = from;
        double high = to;
        double[] flow = {high - share * (high - low), low + share * (high - low)};
        double[] margin = new double[2];
        for (int k = 0; k < 2; k++) {
            Point point = new Point(flow[k], trials.at(condition, limit, flow[k]));
            if (isBeyond(point, verdict, all)) {
                return;
            }
            Double there = point.judged().margin();
            margin[k] = there == null ? Double.MAX_VALUE : sign * there;
        }
        for (int k = 0; k < MOST_TO_AN_EXTREME; k++) {
            int next = margin[0] < margin[1] ? 0 : 1;
            if (next == 0) {
                high = flow[1];
                flow[1] = flow[0];
                margin[1] = margin[0];
                flow[0] = high - share * (high - low);
            } else {
                low = flow[0];
                flow[0] = flow[1];
                margin[0] = margin[1];
                flow[1] = low + share * (high - low);
            }
            Point point = new Point(flow[next], trials.at(condition, limit, flow[next]));
            if (isBeyond(point, verdict, all)) {
                return;
            }
            Double there = point.judged().margin();
            margin[next] = there == null ? Double.MAX_VALUE : sign * there;
        }
    }

    private static boolean isBeyond(Point point, Verdict verdict, List<Point> all) {
        Verdict there = point.judged().verdict();
        if (there == verdict || there == Verdict.NONE) {
            return false;
        }
        all.add(point);
        return true;
    }

    private void search(int condition, int limit, List<Point> points) {
        Point before = null;
        boolean gap = false;
        boolean none = false;
        boolean turned = false;
        for (Point point : points) {
            if (point.judged().verdict() == Verdict.NONE) {
                gap = true;
                none = true;
                continue;
            }
            if (before != null && before.judged().verdict() != point.judged().verdict()) {
                turned = true;
                Turn turn = gap ? null : Bracket.turn(before, point, flow -> trials.at(condition, limit, flow));
                if (turn == null) {
                    notReached(limit, condition, acrossAGap(before, point));
                } else {
                    found.add(new Found(trials.limits().get(limit), condition, turn));
                }
            }
            before = point;
            gap = false;
        }
        if (!turned) {
            notReached(limit, condition, throughout(before, none));
        }
    }

    private static String throughout(@Nullable Point last, boolean none) {
        if (last == null) {
            return "no verdict at any flow: does not apply, not given or no result";
        }
        String verdict = last.judged().verdict() == Verdict.MET ? "met" : "not met";
        return none ? verdict + " at every flow with a verdict" : verdict + " throughout";
    }

    private String acrossAGap(Point before, Point after) {
        boolean met = before.judged().verdict() == Verdict.MET;
        return (met ? "met" : "not met") + " at " + inBoth(before.flow()) + ", " + (met ? "not met" : "met") + " at "
                + inBoth(after.flow()) + ", without a verdict between";
    }

    private void notReached(int limit, int condition, String outcome) {
        notReached
                .computeIfAbsent(trials.limits().get(limit), key -> new LinkedHashMap<>())
                .computeIfAbsent(outcome, key -> new ArrayList<>())
                .add(condition);
    }

    private FoundFlows result() {
        List<FoundCase> all = merged();
        List<String> notes = new ArrayList<>();
        notes.add("Flows searched: from " + inBoth(flows.get(0)) + " to " + inBoth(flows.get(flows.size() - 1)) + ", "
                + flows.size()
                + " flows in nearly equal ratios for each water level and number of units in service of the"
                + " cases, then narrowed.");
        List<FoundCase> kept = all;
        if (all.size() > MOST_CASES) {
            kept = all.stream()
                    .sorted(Comparator.comparingDouble(this::outsideOfTheTyped))
                    .limit(MOST_CASES)
                    .toList();
            List<FoundCase> most = kept;
            kept = all.stream().filter(most::contains).toList();
            notes.add("Cut off: " + all.size() + " flows were found; the " + MOST_CASES
                    + " within or nearest to the range of the typed flows are given.");
        }
        List<NotReached> lines = new ArrayList<>();
        new TreeMap<>(notReached)
                .forEach((limit, outcomes) -> outcomes.forEach((outcome, under) -> {
                    LimitResult one = trials.limit(limit);
                    lines.add(new NotReached(one.tag(), one.label(), conditions.words(under), outcome));
                }));
        return new FoundFlows(kept, lines, notes);
    }

    /** The turns in the order of the limits and of the flows; the same turn under several conditions once. */
    private List<FoundCase> merged() {
        List<Found> sorted = found.stream()
                .sorted(Comparator.comparingInt(Found::limit)
                        .thenComparingDouble(one -> one.turn().flow())
                        .thenComparingInt(Found::condition))
                .toList();
        List<List<Found>> groups = new ArrayList<>();
        for (Found one : sorted) {
            List<Found> last = groups.isEmpty() ? List.of() : groups.get(groups.size() - 1);
            if (last.isEmpty() || !isSame(last.get(0), one)) {
                last = new ArrayList<>();
                groups.add(last);
            }
            last.add(one);
        }
        return groups.stream().map(this::foundCase).toList();
    }

    private static boolean isSame(Found one, Found other) {
        return one.limit() == other.limit()
                && one.turn().metBelow() == other.turn().metBelow()
                && one.turn().jump() == other.turn().jump()
                && Math.abs(one.turn().flow() - other.turn().flow())
                        <= SAME * other.turn().flow();
    }

    private FoundCase foundCase(List<Found> group) {
        Found first = group.get(0);
        LimitResult limit = trials.limit(first.limit());
        List<Integer> under = group.stream().map(Found::condition).sorted().toList();
        return new FoundCase(
                conditions.all().get(first.condition()),
                first.turn().flow(),
                first.limit(),
                limit.tag(),
                limit.label(),
                conditions.words(under),
                first.turn().metBelow(),
                first.turn().jump());
    }

    /** How far a flow is from the range of the typed flows, as a ratio; nought within it. */
    private double outsideOfTheTyped(FoundCase one) {
        double least = conditions.flows().stream().min(Double::compare).orElseThrow();
        double greatest = conditions.flows().stream().max(Double::compare).orElseThrow();
        return Math.max(0, Math.max(Math.log(least / one.flow()), Math.log(one.flow() / greatest)));
    }

    private String inBoth(double flow) {
        Unit working = design.project().system().coherentUnit(Dimension.FLOW);
        Unit report = design.project().flowUnit();
        String text = Digits.print(working, flow) + " " + working;
        double reported = flow / report.sizeIn(design.project().system());
        return report.equals(working) ? text : text + " (" + Digits.print(report, reported) + " " + report + ")";
    }
}
