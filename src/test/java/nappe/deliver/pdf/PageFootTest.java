package nappe.deliver.pdf;

import static org.assertj.core.api.Assertions.assertThat;

import com.lowagie.text.pdf.PdfReader;
import com.lowagie.text.pdf.parser.PdfTextExtractor;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.calculation.Sheet;
import nappe.formula.Value;
import nappe.results.Results;
import nappe.unit.Unit;
import org.junit.jupiter.api.Test;

/** Wherever a page ends, no heading and no table head stands alone above it. */
class PageFootTest {
    private static final int POSITIONS = 26;
    private static final List<String> ALONE = List.of(
            "Heading of a note",
            "Heading of a table",
            "Head of a table",
            "Head of column",
            "Heading of lines",
            "cell",
            "for case one",
            "Every case",
            "two",
            "Between");

    @Test
    void noHeadingStandsAloneAtTheFootOfAPage() throws IOException {
        List<String> lonely = new ArrayList<>();
        for (int filler = 12; filler < 12 + POSITIONS; filler++) {
            try (PdfReader reader =
                    new PdfReader(PdfDelivery.render(package_(filler)).bytes())) {
                PdfTextExtractor extractor = new PdfTextExtractor(reader);
                for (int page = 1; page <= reader.getNumberOfPages(); page++) {
                    String content = extractor
                            .getTextFromPage(page)
                            .replaceAll("\\s+", " ")
                            .strip();
                    if (ALONE.stream().anyMatch(content::endsWith)) {
                        lonely.add(filler + " lines before: ..." + content.substring(content.length() - 30));
                    }
                }
            }
        }
        assertThat(lonely).isEmpty();
    }

    private static Results package_(int filler) {
        List<Block> blocks = new ArrayList<>();
        for (int i = 0; i < filler; i++) {
            blocks.add(new Block.Note(i, "filler " + i, false));
        }
        Cell cell = Cell.typed(Cell.Kind.ENTRY, new Place("A", 0, 0), "W", Unit.parse("ft"), new Value.Number(2));
        blocks.add(new Block.Heading(60, "Heading of a note"));
        blocks.add(new Block.Note(61, "note under it", false));
        blocks.add(new Block.Heading(62, "Heading of a table"));
        Block.Row row = new Block.Row(List.of(new Block.Text("row")));
        blocks.add(new Block.Table(
                63,
                "Head of a table",
                List.of(new Block.Column("Head of column", 9, Block.Align.LEFT)),
                List.of(row, row, row)));
        blocks.add(new Block.Heading(70, "Heading of lines"));
        blocks.add(new Block.Lines(
                71, List.of("one", "two"), 0, List.of(between(), quantity(cell), between(), quantity(cell))));
        return new Results(
                Invented.furniture(true, "For checking only.", "preliminary"),
                List.of(new Sheet(1, "A", "A sheet", blocks)),
                List.of(cell),
                Map.of(cell, new Value.Number(2)));
    }

    private static Block.Line between() {
        return new Block.Line(Block.LineKind.HEADING, "", "Between", "", "", "", "", null, List.of());
    }

    private static Block.Line quantity(Cell cell) {
        return new Block.Line(Block.LineKind.QUANTITY, "A.1", "width", "W", "", "ft", "", null, List.of(cell, cell));
    }
}
