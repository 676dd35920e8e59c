package nappe.deliver.pdf;

import java.util.HashMap;
import java.util.IdentityHashMap;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.xhtmlrenderer.context.StyleReference;
import org.xhtmlrenderer.css.newmatch.CascadedStyle;
import org.xhtmlrenderer.extend.NamespaceHandler;
import org.xhtmlrenderer.extend.UserAgentCallback;

/**
 * What the style sheet says of an element, remembered for all that are like it: of the same name, class and style of its
 * own, within elements that are alike. It is right as long as the selectors of the style sheet ask for nothing else,
 * neither order nor attributes; without it each element is held against each rule, which took a third of the layout.
 */
final class StyleMemory extends StyleReference {
    /** Elements that are alike. */
    private record Kind(@Nullable Kind parent, String name, String look, String style) {
        /** Kinds are kept once each, so that a parent is told by what it is, not by all that it stands in. */
        @Override
        public boolean equals(@Nullable Object other) {
            return other instanceof Kind kind
                    && parent == kind.parent
                    && name.equals(kind.name)
                    && look.equals(kind.look)
                    && style.equals(kind.style);
        }

        @Override
        public int hashCode() {
            return ((System.identityHashCode(parent) * 31 + name.hashCode()) * 31 + look.hashCode()) * 31
                    + style.hashCode();
        }
    }

    private final NamespaceHandler names;
    private final Map<Kind, Kind> kinds = new HashMap<>();
    private final Map<Element, Kind> known = new IdentityHashMap<>();
    private final Map<Kind, CascadedStyle> styles = new IdentityHashMap<>();
    private final Map<Kind, Map<String, Optional<CascadedStyle>>> pseudoStyles = new IdentityHashMap<>();

    /** @param names what a document says of its elements' looks other than in the style sheet */
    StyleMemory(UserAgentCallback agent, NamespaceHandler names) {
        super(agent);
        this.names = names;
    }

    @Override
    public CascadedStyle getCascadedStyle(@Nullable Element element, boolean again) {
        if (element == null) {
            return super.getCascadedStyle(null, again);
        }
        if (again) {
            known.remove(element);
        }
        Kind kind = kind(element);
        CascadedStyle style = styles.get(kind);
        if (style == null) {
            style = super.getCascadedStyle(element, again);
            styles.put(kind, style);
        }
        return style;
    }

    @Override
    public @Nullable CascadedStyle getPseudoElementStyle(Node node, String pseudoElement) {
        Element element = node instanceof Element itself ? itself : (Element) node.getParentNode();
        return pseudoStyles
                .computeIfAbsent(kind(element), kind -> new HashMap<>())
                .computeIfAbsent(pseudoElement, name -> Optional.ofNullable(super.getPseudoElementStyle(element, name)))
                .orElse(null);
    }

    private static String said(@Nullable String words) {
        return words == null ? "" : words;
    }

    private Kind kind(Element element) {
        Kind kind = known.get(element);
        if (kind == null) {
            Kind parent = element.getParentNode() instanceof Element above ? kind(above) : null;
            Kind fresh = new Kind(
                    parent,
                    element.getNodeName(),
                    said(names.getClass(element)),
                    said(names.getElementStyling(element)) + ";" + said(names.getNonCssStyling(element)));
            Kind first = kinds.putIfAbsent(fresh, fresh);
            kind = first == null ? fresh : first;
            known.put(element, kind);
        }
        return kind;
    }
}
