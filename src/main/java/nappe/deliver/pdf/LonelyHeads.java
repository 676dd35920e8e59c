package nappe.deliver.pdf;

import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import org.w3c.dom.Element;
import org.xhtmlrenderer.newtable.TableBox;
import org.xhtmlrenderer.newtable.TableRowBox;
import org.xhtmlrenderer.pdf.ITextRenderer;
import org.xhtmlrenderer.render.Box;
import org.xhtmlrenderer.render.PageBox;

/**
 * Finds tables whose head stands at the foot of a page while the first row went to the next one, which the renderer
 * lets happen where rows are kept whole, and moves them.
 */
final class LonelyHeads {
    private static final String MOVED = " ahead";

    private final List<PageBox> pages;
    private final Set<Integer> changed = new HashSet<>();
    private boolean found;

    private LonelyHeads(List<PageBox> pages) {
        this.pages = pages;
    }

    /** Marks such tables in the document that was laid out; true where there were any and it must be laid out again. */
    static boolean moved(ITextRenderer renderer) {
        Box root = Objects.requireNonNull(renderer.getRootBox());
        LonelyHeads heads =
                new LonelyHeads(Objects.requireNonNull(root.getLayer()).getPages());
        heads.search(root, -1);
        return heads.found;
    }

    /** Of each sheet only the first is moved, since that moves all that follows on the sheet. */
    private void search(Box box, int sheet) {
        if (box instanceof TableBox table) {
            Element element = table.getElement();
            if (element != null && !changed.contains(sheet) && isLonely(table) && !isMoved(element)) {
                element.setAttribute("class", element.getAttribute("class") + MOVED);
                changed.add(sheet);
                found = true;
            }
            return;
        }
        for (int i = 0; i < box.getChildCount(); i++) {
            Box child = box.getChild(i);
            Element element = child.getElement();
            boolean leaf = element != null && element.getAttribute("class").startsWith("leaf ");
            search(child, leaf ? i : sheet);
        }
    }

    private boolean isLonely(TableBox table) {
        TableRowBox first = table.getFirstBodyRow();
        return first != null && page(first.getAbsY()) != page(table.getAbsY());
    }

    private static boolean isMoved(Element element) {
        return element.getAttribute("class").endsWith(MOVED);
    }

    private int page(int y) {
        int page = 0;
        while (page < pages.size() - 1 && y >= pages.get(page).getBottom()) {
            page++;
        }
        return page;
    }
}
