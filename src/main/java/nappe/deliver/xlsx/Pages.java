package nappe.deliver.xlsx;

import java.util.ArrayList;
import java.util.List;
import nappe.results.Furniture;

/**
 * How a sheet is printed: upright or wide, on how many pages beside each other, and where a page ends so that no chart
 * is cut in two and no title stands alone at the foot. Sizes are guessed from widths in characters and heights in
 * points, on the safe side, and are the same on every machine. The programs fit the width themselves, since each
 * measures columns in its own way. An end of a page is set only where it is needed: Gnumeric adds empty pages for them.
 */
final class Pages {
    /** Rows that stay on one page. */
    record Kept(int first, int last) {}

    static final double SIDE = 0.5;
    static final double TOP = 0.8;
    static final double BOTTOM = 1.0;

    private static final double INCH = 72;

    /** Points of a character of width; programs that measure their own type take up to this. */
    private static final double CHARACTER = 5.6;

    private static final double SAFE = 0.94;

    /** Upright is wide enough down to this scale, and a wide page down to that. */
    private static final double LEAST_UPRIGHT = 0.65;

    private static final double LEAST_WIDE = 0.56;

    /** What takes no more pages than this is printed smaller on one, unless it gets smaller than the least scale. */
    private static final double NEARLY_ONE = 1.3;

    private static final double LEAST_ON_ONE = 0.62;

    private final SheetRows rows;
    private final boolean wide;
    private final double scale;
    private final double height;
    private final int beside;
    private final boolean onOne;

    Pages(Furniture furniture, int characters, SheetRows rows) {
        this.rows = rows;
        double shorter = (furniture.letterPaper() ? 8.5 : 8.27) * INCH;
        double longer = (furniture.letterPaper() ? 11 : 11.69) * INCH;
        double asked = characters * CHARACTER;
        double sides = 2 * SIDE * INCH;
        wide = (shorter - sides) / asked < LEAST_UPRIGHT;
        double width = (wide ? longer : shorter) - sides;
        beside = wide ? Math.max(1, (int) Math.ceil(asked * LEAST_WIDE / width)) : 1;
        height = ((wide ? shorter : longer) - (TOP + BOTTOM) * INCH) * SAFE;
        double byWidth = Math.min(1, beside * width / asked);
        double pages = between(0, rows.lastRow()) * byWidth / height;
        onOne = beside == 1 && pages > 1 && pages <= NEARLY_ONE && byWidth / pages >= LEAST_ON_ONE;
        scale = byWidth;
    }

    boolean wide() {
        return wide;
    }

    /** Pages beside each other. */
    int beside() {
        return beside;
    }

    /** Whether it is printed on one page, a little smaller than its width asks for. */
    boolean onOne() {
        return onOne;
    }

    /**
     * The rows after which a page is to end, where it would else end among rows that belong together.
     *
     * @param repeated the rows at the top of each page after the first
     */
    List<Integer> ends(Kept repeated, List<Kept> kept) {
        List<Integer> ends = new ArrayList<>();
        if (onOne) {
            return ends;
        }
        double room = height / scale;
        double used = 0;
        int start = 0;
        for (int row = 0; row <= rows.lastRow(); row++) {
            used += rows.height(row);
            if (used > room && row > start) {
                int end = beforeKept(row, start, kept);
                if (end < row) {
                    ends.add(end - 1);
                }
                start = end;
                used = between(repeated.first(), repeated.last()) + between(end, row);
            }
        }
        return ends;
    }

    /** The row itself, or the first of the kept rows that it is among, if those do not start the page. */
    private static int beforeKept(int row, int start, List<Kept> kept) {
        int first = row;
        for (Kept one : kept) {
            if (one.first() < first && first <= one.last() && one.first() > start) {
                first = one.first();
            }
        }
        return first;
    }

    private double between(int first, int last) {
        double sum = 0;
        for (int row = first; row <= last; row++) {
            sum += rows.height(row);
        }
        return sum;
    }
}
