package nappe.deliver.pdf;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.xhtmlrenderer.context.StyleReference;
import org.xhtmlrenderer.css.newmatch.CascadedStyle;
import org.xhtmlrenderer.pdf.ITextRenderer;

class StyleMemoryTest {
    private final PlainNames names = new PlainNames();
    private final ClosedAgent agent = new ClosedAgent(new Paper(ITextRenderer.DEFAULT_DOTS_PER_POINT));

    @Test
    void every_element_of_a_package_has_the_style_that_the_rules_give_it() {
        Document document = Xhtml.parse(FilledPages.of(Invented.results()).xhtml());
        StyleReference remembered = set(new StyleMemory(agent, names), document);
        StyleReference matched = set(new StyleReference(agent), document);
        List<Element> elements = elements(document.getDocumentElement(), new ArrayList<>());
        assertThat(elements).hasSizeGreaterThan(1000);
        for (Element element : elements) {
            assertThat(remembered.getCascadedStyle(element, false).getFingerprint())
                    .as(place(element))
                    .isEqualTo(matched.getCascadedStyle(element, false).getFingerprint());
            assertThat(fingerprint(remembered, element)).as(place(element)).isEqualTo(fingerprint(matched, element));
        }
        assertThat(elements).anyMatch(element -> fingerprint(matched, element).isPresent());
    }

    @Test
    void a_style_that_an_element_is_given_later_counts_once_it_is_asked_for_anew() {
        Document document = Xhtml.parse(FilledPages.of(Invented.results()).xhtml());
        StyleReference remembered = set(new StyleMemory(agent, names), document);
        Element table = (Element) document.getElementsByTagName("tbody").item(0);
        String before = remembered.getCascadedStyle(table, false).getFingerprint();
        table.setAttribute("style", "page-break-before: always");
        assertThat(remembered.getCascadedStyle(table, false).getFingerprint()).isEqualTo(before);
        assertThat(remembered.getCascadedStyle(table, true).getFingerprint()).isNotEqualTo(before);
    }

    private StyleReference set(StyleReference styles, Document document) {
        ITextRenderer renderer = new ITextRenderer();
        renderer.getSharedContext().setCss(styles);
        renderer.setDocument(document, null, names);
        return styles;
    }

    private static Optional<String> fingerprint(StyleReference styles, Element element) {
        return Optional.ofNullable(styles.getPseudoElementStyle(element, "before"))
                .map(CascadedStyle::getFingerprint);
    }

    private static String place(Element element) {
        return element.getNodeName() + " " + element.getAttribute("class") + " in "
                + element.getParentNode().getNodeName();
    }

    private static List<Element> elements(Element root, List<Element> found) {
        found.add(root);
        for (Node node = root.getFirstChild(); node != null; node = node.getNextSibling()) {
            if (node instanceof Element child) {
                elements(child, found);
            }
        }
        return found;
    }
}
