package nappe.deliver.pdf;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;

/** Nothing that was typed makes the renderer open a file or an address. */
class SafetyTest {
    @Test
    void aDocumentTypeIsRefused() {
        assertThatThrownBy(() -> Xhtml.parse(
                        "<!DOCTYPE html [<!ENTITY e SYSTEM \"file:///etc/hostname\">]><html><body>&e;</body></html>"))
                .isInstanceOf(IllegalStateException.class)
                .cause()
                .hasMessageContaining("DOCTYPE");
    }

    @Test
    void onlyTheOwnStyleSheetIsOpened() {
        ClosedAgent agent = new ClosedAgent(new Paper(20));
        assertThat(agent.resolveAndOpenStream(ClosedAgent.STYLE_SHEET)).isNotNull();
        for (String address : List.of(
                "file:///etc/hostname",
                "http://localhost/x.css",
                "https://localhost/x.png",
                "data:text/css;base64,cHt9",
                "jar:file:/x.jar!/y",
                "classpath:/templates/package.css",
                "res:../fonts/README.txt",
                "package.css")) {
            assertThat(agent.resolveAndOpenStream(address)).as(address).isNull();
            assertThat(agent.getBinaryResource(address)).as(address).isNull();
            assertThat(agent.getImageResource(address).getImage()).as(address).isNull();
        }
    }

    @Test
    void whatXmlCannotCarryIsReplaced() {
        assertThat(XmlText.safe("a\u0000b\u0007c\ud800d\uffffe\tf\ud835\udc44"))
                .isEqualTo("a\ufffdb\ufffdc\ufffdd\ufffde\tf\ud835\udc44");
    }
}
