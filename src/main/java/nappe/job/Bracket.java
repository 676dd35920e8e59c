package nappe.job;

import java.util.function.DoubleFunction;
import nappe.job.TrialFlows.Judged;
import nappe.job.TrialFlows.Verdict;
import org.jspecify.annotations.Nullable;

/**
 * Two flows between which the verdict on a limit turns, narrowed until its margin is zero or the flows are as good as
 * one. By turns a chord with the weight of an end that stays halved (the Illinois variant of false position, common
 * practice) and a halving, so that it always ends.
 */
final class Bracket {
    /** A flow with what the limit says there; the verdict is met or not met. */
    record Point(double flow, Judged judged) {}

    /** Where the verdict turns. */
    record Turn(double flow, boolean metBelow, boolean jump) {}

    /** A margin that counts as zero: the tolerance of verdicts. */
    static final double ZERO = 1e-9;

    /** The margin aimed at: a hair on the side where the limit is met, so that every program gives the same verdict. */
    private static final double AIM = 5e-11;

    private static final double CLOSE = 4e-11;
    private static final double NARROW = 2e-15;
    private static final int MOST = 200;

    /** How far beside a jump its flow is stated, on the side where the limit is not met; programs differ by less. */
    private static final double BESIDE = 1e-7;

    private final DoubleFunction<Judged> limit;
    private Point low;
    private Point high;
    private double lowLeft;
    private double highLeft;

    private Bracket(Point low, Point high, DoubleFunction<Judged> limit) {
        this.low = low;
        this.high = high;
        this.limit = limit;
        this.lowLeft = left(low.judged());
        this.highLeft = left(high.judged());
    }

    /**
     * Where the verdict turns between two flows at which it differs; null where it is lost in a stretch without verdict.
     *
     * @param limit what the limit says at a flow
     */
    static @Nullable Turn turn(Point low, Point high, DoubleFunction<Judged> limit) {
        return new Bracket(low, high, limit).narrowed();
    }

    private @Nullable Turn narrowed() {
        boolean metBelow = low.judged().verdict() == Verdict.MET;
        for (Point end : new Point[] {low, high}) {
            // a flow typed just where the limit is reached; met though the margin is below nought: by the tolerance
            Double margin = end.judged().margin();
            if (end.judged().verdict() == Verdict.MET && margin != null && margin <= ZERO) {
                return new Turn(end.flow(), metBelow, false);
            }
        }
        boolean lastWasLow = false;
        for (int k = 0; k < MOST && high.flow() - low.flow() > NARROW * high.flow(); k++) {
            double flow = k % 3 == 2 ? middle() : chord();
            Point next = new Point(flow, limit.apply(flow));
            if (next.judged().verdict() == Verdict.NONE) {
                return null;
            }
            double left = left(next.judged());
            if (next.judged().verdict() == Verdict.MET && next.judged().margin() != null && Math.abs(left) <= CLOSE) {
                return new Turn(flow, metBelow, false);
            }
            boolean isLow = left > 0 == lowLeft > 0;
            if (isLow) {
                low = next;
                lowLeft = left;
                highLeft = k > 0 && lastWasLow ? highLeft / 2 : highLeft;
            } else {
                high = next;
                highLeft = left;
                lowLeft = k > 0 && !lastWasLow ? lowLeft / 2 : lowLeft;
            }
            lastWasLow = isLow;
        }
        return closed(metBelow);
    }

    /** The flows are as good as one: the margin is zero as far as numbers go, or it jumps. */
    private Turn closed(boolean metBelow) {
        Point met = metBelow ? low : high;
        Point not = metBelow ? high : low;
        if (isZero(met)) {
            return new Turn(met.flow(), metBelow, false);
        }
        double beside = not.flow() * (metBelow ? 1 + BESIDE : 1 - BESIDE);
        boolean stays = limit.apply(beside).verdict() == not.judged().verdict();
        return new Turn(stays ? beside : not.flow(), metBelow, true);
    }

    private static boolean isZero(Point point) {
        Double margin = point.judged().margin();
        return margin != null && Math.abs(margin) <= ZERO;
    }

    /** What is left to the aim; where there is no margin, only the side of it. */
    private static double left(Judged judged) {
        Double margin = judged.margin();
        return margin == null ? judged.verdict() == Verdict.MET ? 1 : -1 : margin - AIM;
    }

    private double middle() {
        return low.flow() + (high.flow() - low.flow()) / 2;
    }

    private double chord() {
        double flow = high.flow() - highLeft * (high.flow() - low.flow()) / (highLeft - lowLeft);
        return flow > low.flow() && flow < high.flow() ? flow : middle();
    }
}
