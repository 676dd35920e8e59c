package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;

/** What tests read of boxes. */
final class Boxes {
    private static final double ROUNDING = 1e-6;

    private Boxes() {}

    /**
     * All in a row: italics in slashes, what stands higher after a caret, what stands lower after an underscore, both in
     * braces; a bar is a dash, another shape that is drawn a tilde.
     */
    static String marked(Box box) {
        StringBuilder marked = new StringBuilder(ink(box.ink()));
        for (Box.Part part : box.parts()) {
            String inner = marked(part.box());
            boolean level = Math.abs(part.y()) < ROUNDING || inner.equals("—") || inner.isEmpty();
            marked.append(level ? inner : (part.y() > 0 ? "^{" : "_{") + inner + "}");
        }
        return marked.toString();
    }

    private static String ink(Mark ink) {
        if (ink instanceof Mark.Characters characters) {
            return characters.face() == Typefaces.ITALIC ? "/" + characters.text() + "/" : characters.text();
        }
        if (ink instanceof Mark.Area area) {
            return area.edge().stream().allMatch(Mark.Curve::isStraight)
                            && area.edge().size() == 3
                    ? "—"
                    : "~";
        }
        return "";
    }

    /** What is wrong with the boxes: a part that reaches out of its box or over another part. */
    static List<String> faults(Box box) {
        List<String> faults = new ArrayList<>();
        for (int i = 0; i < box.parts().size(); i++) {
            Box.Part part = box.parts().get(i);
            if (part.x() < -ROUNDING
                    || part.right() > box.width() + ROUNDING
                    || part.top() > box.above() + ROUNDING
                    || part.bottom() < -box.below() - ROUNDING) {
                faults.add("out of its box: " + marked(part.box()));
            }
            for (Box.Part other : box.parts().subList(i + 1, box.parts().size())) {
                if (overlap(part, other)) {
                    faults.add(marked(part.box()) + " over " + marked(other.box()));
                }
            }
            faults.addAll(faults(part.box()));
        }
        return faults;
    }

    private static boolean overlap(Box.Part one, Box.Part other) {
        double across = Math.min(one.right(), other.right()) - Math.max(one.x(), other.x());
        double up = Math.min(one.top(), other.top()) - Math.max(one.bottom(), other.bottom());
        return across > ROUNDING && up > ROUNDING;
    }
}
