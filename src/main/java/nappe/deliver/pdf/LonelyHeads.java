package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.w3c.dom.Element;
import org.xhtmlrenderer.newtable.TableBox;
import org.xhtmlrenderer.newtable.TableRowBox;
import org.xhtmlrenderer.newtable.TableSectionBox;
import org.xhtmlrenderer.pdf.ITextRenderer;
import org.xhtmlrenderer.render.Box;
import org.xhtmlrenderer.render.PageBox;

/**
 * Finds tables whose head stands at the foot of a page with no row or a single one below it, which the renderer lets
 * happen where rows are kept whole, and moves them; and tables whose last row stands alone on a page, to which it sends
 * the row before.
 */
final class LonelyHeads {
    /** A style of the element itself: its class is asked for once and then remembered. */
    private static final String MOVED = "; page-break-before: always";

    /** A table of no more rows is not split for the sake of its last one. */
    private static final int MOST_ALONE = 2;

    private final List<PageBox> pages;
    private final Set<Integer> changed = new HashSet<>();
    private final List<Element> moved = new ArrayList<>();

    private LonelyHeads(List<PageBox> pages) {
        this.pages = pages;
    }

    /**
     * Marks such tables in the document that was laid out; where there are any, they get a style anew and it must be laid
     * out again. The mark has no bearing on what is inside, which keeps its style.
     */
    static boolean moved(ITextRenderer renderer) {
        Box root = Objects.requireNonNull(renderer.getRootBox());
        LonelyHeads heads =
                new LonelyHeads(Objects.requireNonNull(root.getLayer()).getPages());
        heads.search(root, -1);
        heads.moved.forEach(element -> renderer.getSharedContext().getStyle(element, true));
        return !heads.moved.isEmpty();
    }

    /** Of each sheet only the first is moved, since that moves all that follows on the sheet. */
    private void search(Box box, int sheet) {
        if (box instanceof TableBox table) {
            if (!changed.contains(sheet)) {
                table(table, sheet);
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

    private void table(TableBox table, int sheet) {
        List<TableRowBox> rows = rows(table);
        if (isLonely(table, rows)) {
            move(table.getElement(), sheet);
        } else if (rows.size() > MOST_ALONE && isWidow(rows)) {
            move(rows.get(rows.size() - 2).getElement(), sheet);
        }
    }

    private void move(@Nullable Element element, int sheet) {
        if (element != null && !isMoved(element)) {
            element.setAttribute("style", element.getAttribute("style") + MOVED);
            changed.add(sheet);
            moved.add(element);
        }
    }

    private boolean isLonely(TableBox table, List<TableRowBox> rows) {
        if (rows.isEmpty()) {
            return false;
        }
        int start = page(table.getAbsY());
        if (page(rows.get(0).getAbsY()) != start) {
            return true;
        }
        return rows.size() > 1 && page(rows.get(1).getAbsY()) != start && isLow(table.getAbsY(), pages.get(start));
    }

    /** Only there is little lost when the rest of a page stays empty. */
    private static boolean isLow(int y, PageBox page) {
        return y > page.getTop() + 0.6 * (page.getBottom() - page.getTop());
    }

    private boolean isWidow(List<TableRowBox> rows) {
        int last = rows.size() - 1;
        int page = page(rows.get(last).getAbsY());
        return page != page(rows.get(last - 1).getAbsY());
    }

    /** The rows below the head, in order. */
    private static List<TableRowBox> rows(TableBox table) {
        List<TableRowBox> rows = new ArrayList<>();
        for (int i = 0; i < table.getChildCount(); i++) {
            if (table.getChild(i) instanceof TableSectionBox section && !section.isHeader() && !section.isFooter()) {
                for (int j = 0; j < section.getChildCount(); j++) {
                    if (section.getChild(j) instanceof TableRowBox row) {
                        rows.add(row);
                    }
                }
            }
        }
        return rows;
    }

    private static boolean isMoved(Element element) {
        return element.getAttribute("style").endsWith(MOVED);
    }

    private int page(int y) {
        int page = 0;
        while (page < pages.size() - 1 && y >= pages.get(page).getBottom()) {
            page++;
        }
        return page;
    }
}
