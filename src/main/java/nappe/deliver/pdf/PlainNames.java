package nappe.deliver.pdf;

import java.util.Optional;
import org.xhtmlrenderer.css.sheet.StylesheetInfo;
import org.xhtmlrenderer.simple.extend.XhtmlCssOnlyNamespaceHandler;

/** XHTML without the renderer's default look: the package's own style sheet says all. */
final class PlainNames extends XhtmlCssOnlyNamespaceHandler {
    @Override
    public Optional<StylesheetInfo> getDefaultStylesheet() {
        return Optional.empty();
    }
}
