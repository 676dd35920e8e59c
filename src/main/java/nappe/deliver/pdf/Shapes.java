package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Puts boxes of an equation together: fractions, scripts, roots, brackets, cases. */
final class Shapes {
    private final Type type;
    private final double size;

    Shapes(Type type) {
        this.type = type;
        this.size = type.size();
    }

    /** One box over another, the bar between them on the axis. */
    Box fraction(Box above, Box below) {
        double overhang = 0.1 * size;
        double side = 0.06 * size;
        double gap = 0.16 * size;
        double bar = Math.max(above.width(), below.width()) + 2 * overhang;
        double half = type.rule() / 2;
        Box rule = Box.of(bar, type.rule(), 0, Mark.Area.rule(bar, type.rule()));
        return Box.holding(
                bar + 2 * side,
                List.of(
                        new Box.Part(
                                above,
                                side + (bar - above.width()) / 2,
                                type.axis() + half + gap + Math.max(0, above.below())),
                        new Box.Part(rule, side, type.axis() - half),
                        new Box.Part(
                                below, side + (bar - below.width()) / 2, type.axis() - half - gap - below.above())));
    }

    /** A base with what stands below and above it at its right, one over the other where there are both. */
    Box scripts(Box base, @Nullable Box sub, @Nullable Box sup) {
        double gap = 0.02 * size;
        double drop = Math.max(0.2 * size, base.below() - 0.05 * size);
        double rise = Math.max(0.38 * size, base.above() - 0.34 * size);
        List<Box.Part> parts = new ArrayList<>();
        parts.add(new Box.Part(base, 0, 0));
        if (sup != null) {
            double lift = Math.max(rise, 0.18 * size + sup.below());
            if (sub != null) {
                drop = Math.max(drop, sub.above() - 0.2 * size);
                lift = Math.max(lift, sub.above() - drop + sup.below() + 0.08 * size);
            }
            parts.add(new Box.Part(sup, base.width() + 0.06 * size, lift));
        }
        if (sub != null) {
            parts.add(new Box.Part(sub, base.width() + gap, -drop));
        }
        return Box.holding(0, parts);
    }

    /** A radical that is as high as what stands under it. */
    Box root(Box under) {
        double rule = type.rule();
        double clear = 0.14 * size;
        double top = Math.max(under.above(), 0.66 * size) + clear + rule;
        double foot = Math.max(under.below(), 0.02 * size);
        double sign = 0.56 * size;
        double height = top + foot;
        double tick = Math.min(0.5 * height, 0.55 * size) - foot;
        double slope = sign - 0.28 * size;
        double thick = 1.7 * rule;
        List<Mark.Curve> edge = List.of(
                Mark.Curve.straight(0.12 * size, tick),
                Mark.Curve.straight(0.28 * size, -foot + 2.2 * rule),
                Mark.Curve.straight(0.28 * size + slope - 0.2 * rule, top),
                Mark.Curve.straight(sign + under.width() + 0.08 * size, top),
                Mark.Curve.straight(sign + under.width() + 0.08 * size, top - rule),
                Mark.Curve.straight(sign + 0.6 * rule, top - rule),
                Mark.Curve.straight(0.28 * size + 0.3 * rule, -foot),
                Mark.Curve.straight(0.28 * size - 0.5 * rule, -foot),
                Mark.Curve.straight(0.12 * size - thick * 0.2, tick - thick),
                Mark.Curve.straight(0.02 * size, tick - thick - 0.03 * size));
        double width = sign + under.width() + 0.14 * size;
        Box radical = Box.of(width, top, foot, new Mark.Area(0.02 * size, tick - 0.05 * size, edge));
        return new Box(width, top, foot, radical.ink(), List.of(new Box.Part(under, sign + 0.03 * size, 0)));
    }

    /** A round bracket for something that reaches so far; drawn where the character would be too low. */
    Box bracket(boolean opening, double above, double below) {
        if (above <= 0.95 * size && below <= 0.33 * size) {
            return type.upright(opening ? "(" : ")");
        }
        double half = Math.max(above - type.axis(), below + type.axis()) + 0.03 * size;
        double top = type.axis() + half;
        double bottom = type.axis() - half;
        double bend = Math.min(0.22 * size + 0.03 * half, 0.5 * size);
        double side = 0.05 * size;
        double width = bend + 2 * side;
        double thick = 1.7 * type.rule();
        double tip = 0.5 * type.rule();
        double far = opening ? side + bend : side;
        double near = opening ? side : side + bend;
        double in = opening ? 1 : -1;
        double arm = 0.62 * half;
        return Box.of(
                width,
                top,
                -bottom,
                new Mark.Area(
                        far,
                        top,
                        List.of(
                                new Mark.Curve(near, top - 0.25 * half, near, top - arm, near, type.axis()),
                                new Mark.Curve(near, bottom + arm, near, bottom + 0.25 * half, far, bottom),
                                Mark.Curve.straight(far, bottom + 2 * tip),
                                new Mark.Curve(
                                        near + in * thick,
                                        bottom + 0.3 * half,
                                        near + in * thick,
                                        bottom + arm,
                                        near + in * thick,
                                        type.axis()),
                                new Mark.Curve(
                                        near + in * thick,
                                        top - arm,
                                        near + in * thick,
                                        top - 0.3 * half,
                                        far,
                                        top - 2 * tip))));
    }

    /** A bar at the side of an absolute value. */
    Box bar(double above, double below) {
        double top = Math.max(above, 0.7 * size) + 0.04 * size;
        double foot = Math.max(below, 0.12 * size) + 0.04 * size;
        double thick = 1.1 * type.rule();
        Box rule = Box.of(thick, top + foot, 0, Mark.Area.rule(thick, top + foot));
        return Box.holding(thick + 0.16 * size, List.of(new Box.Part(rule, 0.08 * size, -foot)));
    }

    /** A brace at the left of what stands in rows; the whole is centred on the axis. */
    Box braced(Box rows) {
        double half = rows.height() / 2 + 0.06 * size;
        double axis = type.axis();
        double top = axis + half;
        double bottom = axis - half;
        double bend = Math.min(0.2 * size, 0.5 * half);
        double spine = 0.24 * size;
        double thick = 1.6 * type.rule();
        double hair = 0.5 * type.rule();
        double end = 0.48 * size;
        double tip = 0.03 * size;
        List<Mark.Curve> edge = List.of(
                new Mark.Curve(spine + 0.1 * size, top, spine, top - 0.4 * bend, spine, top - bend),
                Mark.Curve.straight(spine, axis + bend),
                new Mark.Curve(spine, axis + 0.4 * bend, spine - 0.06 * size, axis + hair, tip, axis),
                new Mark.Curve(spine - 0.06 * size, axis - hair, spine, axis - 0.4 * bend, spine, axis - bend),
                Mark.Curve.straight(spine, bottom + bend),
                new Mark.Curve(spine, bottom + 0.4 * bend, spine + 0.1 * size, bottom, end, bottom),
                Mark.Curve.straight(end, bottom + 2 * hair),
                new Mark.Curve(
                        spine + thick + 0.06 * size,
                        bottom + 2 * hair,
                        spine + thick,
                        bottom + 0.5 * bend,
                        spine + thick,
                        bottom + bend),
                Mark.Curve.straight(spine + thick, axis - bend),
                new Mark.Curve(
                        spine + thick, axis - 0.5 * bend, spine + 0.5 * thick, axis - 2 * hair, tip + thick, axis),
                new Mark.Curve(
                        spine + 0.5 * thick,
                        axis + 2 * hair,
                        spine + thick,
                        axis + 0.5 * bend,
                        spine + thick,
                        axis + bend),
                Mark.Curve.straight(spine + thick, top - bend),
                new Mark.Curve(
                        spine + thick,
                        top - 0.5 * bend,
                        spine + thick + 0.06 * size,
                        top - 2 * hair,
                        end,
                        top - 2 * hair));
        Box brace = Box.of(braceWidth(), top, -bottom, new Mark.Area(end, top, edge));
        double y = axis + rows.height() / 2 - rows.above();
        return Box.holding(0, List.of(new Box.Part(brace, 0, 0), new Box.Part(rows, braceWidth(), y)));
    }

    double braceWidth() {
        return 0.68 * size;
    }
}
