package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;

/** Bookmarks: the sheets, the headings of each, and under them the headings between the rows of its grids. */
final class Outline {
    private final Document document;

    private Outline(Document document) {
        this.document = document;
    }

    /** Writes the bookmarks into the head of the page, where the renderer looks for them. */
    static void write(Document document) {
        Outline outline = new Outline(document);
        Element bookmarks = document.createElement("bookmarks");
        for (Element leaf : outline.named("div", document.getDocumentElement(), "leaf")) {
            outline.sheet(leaf, bookmarks);
        }
        document.getElementsByTagName("head").item(0).appendChild(bookmarks);
    }

    private void sheet(Element leaf, Element bookmarks) {
        String id = leaf.getAttribute("id");
        String title = leaf.getElementsByTagName("h1").item(0).getTextContent();
        Element sheet = bookmark(bookmarks, id.substring(id.indexOf('-') + 1) + " " + title, id);
        Element heading = sheet;
        int count = 0;
        for (Element line : named("p", leaf, "heading", "between")) {
            String words = line.getTextContent().replace('\u00a0', ' ').strip();
            if (words.isEmpty()) {
                continue;
            }
            String its = "heading-" + id + "-" + ++count;
            line.setAttribute("id", its);
            if (classes(line).contains("heading")) {
                heading = bookmark(sheet, words, its);
            } else {
                bookmark(heading, words, its);
            }
        }
    }

    private Element bookmark(Element under, String name, String id) {
        Element bookmark = document.createElement("bookmark");
        bookmark.setAttribute("name", name);
        bookmark.setAttribute("href", "#" + id);
        under.appendChild(bookmark);
        return bookmark;
    }

    private List<Element> named(String tag, Element within, String... anyOf) {
        List<Element> elements = new ArrayList<>();
        NodeList all = within.getElementsByTagName(tag);
        for (int i = 0; i < all.getLength(); i++) {
            if (all.item(i) instanceof Element element && !java.util.Collections.disjoint(classes(element), List.of(anyOf))) {
                elements.add(element);
            }
        }
        return elements;
    }

    private static Set<String> classes(Element element) {
        return Set.copyOf(List.of(element.getAttribute("class").split(" ", -1)));
    }
}
