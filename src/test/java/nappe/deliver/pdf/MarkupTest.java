package nappe.deliver.pdf;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import nappe.deliver.pdf.View.GridCell;
import nappe.deliver.pdf.View.GridRow;
import nappe.deliver.pdf.View.Inset;
import nappe.deliver.pdf.View.Text;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Element;

class MarkupTest {
    private static Element read(String markup) {
        return Xhtml.parse("<p>" + markup + "</p>").getDocumentElement();
    }

    @Property(tries = 300)
    void what_is_written_is_what_a_reader_of_the_document_reads(@ForAll String first, @ForAll String second) {
        Text text = Text.of("", List.of(Piece.plain(first), Piece.italic(second)));
        assertThat(read(text.markup()).getTextContent()).isEqualTo(text.characters());
    }

    @Property(tries = 300)
    void a_target_and_the_name_of_a_drawing_stand_in_their_attributes(@ForAll String target, @ForAll String words) {
        String safe = XmlText.safe(target);
        Text text = new Text("", List.of(Piece.plain("x")), "#" + safe).with(new Inset(safe, XmlText.safe(words)));
        Element link = (Element) read(text.markup()).getFirstChild();
        assertThat(link.getAttribute("href")).isEqualTo("#" + safe);
        Element drawn = (Element) link.getLastChild();
        assertThat(drawn.getAttribute(Drawings.ATTRIBUTE)).isEqualTo(safe);
        assertThat(drawn.getAttribute("title")).isEqualTo(XmlText.safe(words));
    }

    @Test
    void a_symbol_and_its_subscript_are_one_word_within_a_line() {
        Text text = Text.of(
                "",
                List.of(
                        Piece.plain("head "),
                        Piece.italic("h"),
                        Piece.plain("a").lowered()));
        assertThat(text.markup())
                .isEqualTo("head <span class=\"word\"><span class=\"i\">h</span><span class=\"t sub\">a</span></span>");
    }

    @Test
    void a_row_has_a_cell_for_each_with_its_lines() {
        GridRow row = new GridRow(
                "r",
                List.of(
                        new GridCell("right", 2, List.of(Text.plain("small", "a < b"), Text.plain("", "c"))),
                        GridCell.of("", Text.plain("small", "d"))));
        assertThat(row.markup("td"))
                .isEqualTo("<td class=\"right\" colspan=\"2\"><p class=\"small\">a &lt; b</p><p>c</p></td>"
                        + "<td><p class=\"small\">d</p></td>");
    }

    @Test
    void a_run_alone_in_its_cell_and_without_a_look_is_no_paragraph() {
        GridRow row = new GridRow(
                "",
                List.of(
                        GridCell.of("", Text.plain("", "a")),
                        GridCell.of("", Text.plain(Text.WHOLE, "b")),
                        GridCell.of(
                                "",
                                Text.of(
                                        "",
                                        List.of(
                                                Piece.italic("h"),
                                                Piece.plain("a").lowered()))),
                        GridCell.of("")));
        assertThat(row.markup("th"))
                .isEqualTo("<th>a</th><th>b</th><th><p><span class=\"word\"><span class=\"i\">h</span>"
                        + "<span class=\"t sub\">a</span></span></p></th><th></th>");
    }
}
