package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import nappe.Tools;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Sheet;
import nappe.formula.Value;
import nappe.results.Digits;
import nappe.results.Furniture;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What one who knows nothing of the job sees on the printed pages: each value as often as it is due, and nothing out of its place. */
class StrangerTest {
    @TempDir
    Path folder;

    private static String flat(String text) {
        return text.replace('\u2212', '-')
                .replaceAll("[\\s\\p{Z}\\u200b]+", " ")
                .strip();
    }

    private static final Map<String, List<String>> PAGES = new HashMap<>();

    /** The text of each page in the order of drawing: head and foot, the content, the label of the page. */
    private List<String> pages(String name) throws IOException {
        if (!PAGES.containsKey(name)) {
            Tools.require("pdftotext", "poppler");
            Path text = folder.resolve("raw.txt");
            Tools.run(
                    "pdftotext", "-raw", "-enc", "UTF-8", Issued.of(name).pdf().toString(), text.toString());
            List<String> pages = Arrays.asList(Files.readString(text).split("\f"));
            assertThat(pages).hasSizeGreaterThan(20);
            PAGES.put(name, pages);
        }
        return PAGES.get(name);
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void everyValueStandsOnItsSheetAsOftenAsItIsDue(String name) throws IOException {
        Package sample = Package.ofSample(name);
        List<String> pages = pages(name);
        List<String> missing = new ArrayList<>();
        int values = 0;
        for (Sheet sheet : sample.results().sheets()) {
            Map<String, Integer> due = new HashMap<>();
            for (Block block : sheet.blocks()) {
                for (Cell cell : cells(block, sample)) {
                    values++;
                    for (String word : flat(print(sample, cell)).split(" ")) {
                        // a symbol within words is set with its subscript, and reads as two words
                        if (word.indexOf('_') < 0) {
                            due.merge(word, 1, Integer::sum);
                        }
                    }
                }
            }
            Map<String, Integer> there = new HashMap<>();
            for (String page : pages) {
                if (PdfPages.sheetOf(page).startsWith(sheet.number() + " of ")) {
                    Stream.of(flat(page).split(" ")).forEach(word -> there.merge(word, 1, Integer::sum));
                }
            }
            due.forEach((word, times) -> {
                if (there.getOrDefault(word, 0) < times) {
                    missing.add(
                            sheet.name() + ": " + word + " " + there.getOrDefault(word, 0) + " times, due " + times);
                }
            });
        }
        assertThat(missing).isEmpty();
        assertThat(values).isGreaterThan(300);
    }

    private static List<Cell> cells(Block block, Package sample) {
        List<Cell> cells = new ArrayList<>();
        if (block instanceof Block.Lines all) {
            all.lines().forEach(line -> {
                cells.addAll(PackageTest.printed(all, line));
                if (line.forAll() != null) {
                    cells.add(line.forAll());
                }
            });
        } else if (block instanceof Block.Table table) {
            PackageTest.printed(table, sample)
                    .forEach(row -> row.items().forEach(item -> {
                        if (item instanceof Block.Content content) {
                            cells.add(content.cell());
                        }
                    }));
        }
        return cells;
    }

    private static String print(Package sample, Cell cell) {
        Value value = sample.results().value(cell);
        if (value instanceof Value.Number number) {
            return cell.isComputed() ? Digits.print(cell.unit(), number.value()) : Digits.asTyped(number.value());
        }
        return value instanceof Value.Word word ? word.text() : ((Value.None) value).why();
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void everyPageHasTheWholeCautionsTheRevisionAndItsSheet(String name) throws IOException {
        Package sample = Package.ofSample(name);
        Furniture furniture = sample.results().furniture();
        int sheets = sample.results().sheets().size();
        int before = 0;
        // the command line issues under its own version, which is part of the fingerprint
        String fingerprint = Files.readString(Issued.of(name).pdf().resolveSibling("contents.txt"))
                .lines()
                .filter(line -> line.startsWith("fingerprint: "))
                .findFirst()
                .orElseThrow()
                .substring("fingerprint: ".length());
        for (String page : pages(name)) {
            String flat = flat(page);
            assertThat(flat)
                    .contains(furniture.cautions().stream()
                            .map(StrangerTest::flat)
                            .toList());
            assertThat(flat)
                    .contains(
                            flat(furniture.release()),
                            "Fingerprint " + fingerprint,
                            "Revision " + furniture.revision() + " ",
                            furniture.date().toString(),
                            flat(furniture.project()),
                            flat(furniture.subject()));
            int sheet = Integer.parseInt(PdfPages.sheetOf(page).split(" ")[0]);
            assertThat(sheet).isBetween(Math.max(1, before), before + 1);
            before = sheet;
        }
        assertThat(before).isEqualTo(sheets);
    }

    /** All words, those of equations too: the setting leaves even sub- and superscripts clear of one another. */
    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void noWordStandsInAMarginOrOnAnother(String name) throws IOException {
        PdfBoxes boxes = PdfBoxes.of(Issued.of(name).pdf(), folder);
        assertThat(boxes.pages())
                .hasSameSizeAs(pages(name))
                .allMatch(page -> page.words().size() > 50);
        boxes.assertWithinMargins();
        boxes.assertNoneOverlap();
    }

    @ParameterizedTest
    @ValueSource(strings = {"headworks.xlsx", "inlet-works.xlsx", "return-weir.xlsx", "seepage-pond.xlsx"})
    void noPageEndsWithAHeading(String name) throws IOException {
        Set<String> headings = new HashSet<>();
        for (Sheet sheet : Package.ofSample(name).results().sheets()) {
            headings.add(flat(sheet.title()));
            for (Block block : sheet.blocks()) {
                if (block instanceof Block.Heading heading) {
                    headings.add(flat(heading.text()));
                } else if (block instanceof Block.Table table) {
                    headings.add(flat(table.title()));
                    headings.add(flat(String.join(
                            " ",
                            table.columns().stream().map(Block.Column::head).toList())));
                } else if (block instanceof Block.Lines lines) {
                    lines.lines().stream()
                            .filter(line -> line.kind() == Block.LineKind.HEADING)
                            .forEach(line -> headings.add(flat(line.description())));
                }
            }
        }
        assertThat(headings).hasSizeGreaterThan(25);
        int seen = 0;
        for (String page : pages(name)) {
            List<String> lines = page.lines()
                    .map(StrangerTest::flat)
                    .filter(line -> !line.isEmpty())
                    .toList();
            assertThat(lines.get(lines.size() - 1)).as("the label of the page").matches("\\d+-\\d+");
            assertThat(headings).as(lines.get(lines.size() - 1)).doesNotContain(lines.get(lines.size() - 2));
            seen += (int) lines.stream().filter(headings::contains).count();
        }
        assertThat(seen).isGreaterThan(25);
    }
}
