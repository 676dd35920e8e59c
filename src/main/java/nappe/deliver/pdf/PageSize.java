package nappe.deliver.pdf;

import java.util.Locale;

/** The paper, in mm: US letter or A4, with a binding edge at the left of upright pages and at the head of wide ones. */
record PageSize(double width, double height) {
    private static final double BINDING = 25;
    static final double SIDE = 14;
    private static final double HEAD = 35;
    private static final double CLEAR = 10;

    static PageSize of(boolean letter) {
        return letter ? new PageSize(215.9, 279.4) : new PageSize(210, 297);
    }

    /** The width for content on upright pages. */
    double upright() {
        return width - BINDING - SIDE;
    }

    /** The width for content on wide pages. */
    double wide() {
        return height - 2 * SIDE;
    }

    /**
     * The rules for both kinds of page.
     *
     * @param foot height of the page foot
     */
    String rules(double foot) {
        return rule("upright", width, height, HEAD + CLEAR, SIDE, foot + 10, BINDING)
                + rule("wide", height, width, HEAD + BINDING, SIDE, foot + 10, SIDE)
                + ".landscape {width: " + number(wide()) + "mm}\n.portrait {width: " + number(upright()) + "mm}\n";
    }

    private static String rule(
            String name, double width, double height, double top, double right, double bottom, double left) {
        return "@page " + name + " {size: " + number(width) + "mm " + number(height) + "mm; margin: " + number(top)
                + "mm " + number(right) + "mm " + number(bottom) + "mm " + number(left) + "mm;\n"
                + "@top-left {content: element(head); vertical-align: bottom; padding-bottom: 4mm; width: 100%}\n"
                + "@bottom-left {content: element(foot); vertical-align: top; padding-top: 3mm; width: 100%}}\n";
    }

    /** The space above the page head, in mm. */
    static double aboveHead(boolean wide) {
        return wide ? BINDING : CLEAR;
    }

    /** Millimetres as points. */
    static float points(double mm) {
        return (float) (mm / 25.4 * 72);
    }

    private static String number(double mm) {
        return String.format(Locale.ROOT, "%.2f", mm);
    }
}
