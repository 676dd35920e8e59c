package nappe.deliver.pdf;

import org.xhtmlrenderer.css.style.CalculatedStyle;
import org.xhtmlrenderer.layout.breaker.BreakPoint;
import org.xhtmlrenderer.layout.breaker.BreakPointsProvider;
import org.xhtmlrenderer.layout.breaker.LineBreakingStrategy;

/**
 * Lines break after spaces and after hyphens within words, nowhere else: not within a number, a unit or an address, and
 * not as the machine's language would have it, which is what the renderer asks by itself.
 */
final class SpaceBreaks implements LineBreakingStrategy {
    @Override
    public BreakPointsProvider getBreakPointsProvider(String text, String language, CalculatedStyle style) {
        return new BreakPointsProvider() {
            private int at;

            @Override
            public BreakPoint next() {
                if (at >= text.length()) {
                    return BreakPoint.getDonePoint();
                }
                do {
                    at++;
                } while (at < text.length() && !mayBreak(text, at));
                return new BreakPoint(at);
            }
        };
    }

    /** Whether a line may end before the character at the place. */
    private static boolean mayBreak(String text, int at) {
        char before = text.charAt(at - 1);
        char after = text.charAt(at);
        boolean hyphen =
                before == '-' && at > 1 && Character.isLetter(text.charAt(at - 2)) && Character.isLetter(after);
        return before == ' ' && after != ' ' || hyphen;
    }
}
