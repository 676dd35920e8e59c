package nappe.input;

import static nappe.input.Layout.Label;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.stream.Stream;
import nappe.formula.Sign;
import nappe.input.BlankWriter.Chosen;
import nappe.method.Declared;
import nappe.method.MethodCatalogue;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** The sheets of one blank, in their order. */
final class Blank {
    static final int ROWS = 24;
    private static final int COMBINATION_ROWS = 16;
    static final String REQUIRED = "required";
    static final String OPTIONAL = "optional";
    static final String FRAMES = "Write only into the cells with a frame. ";

    private final XSSFWorkbook workbook;
    private final WorkingSystem system;
    private final List<Chosen> elements;
    private final MethodCatalogue methods;
    private final BlankStyles styles;
    private final DropDowns lists = new DropDowns();
    private final Offers offers = new Offers(lists);
    private final List<BlankSheet> sheets = new ArrayList<>();

    Blank(XSSFWorkbook workbook, WorkingSystem system, List<Chosen> elements, MethodCatalogue methods) {
        this.workbook = workbook;
        this.system = system;
        this.elements = elements;
        this.methods = methods;
        this.styles = new BlankStyles(workbook);
    }

    void write() {
        project();
        FlowsBlank flows = new FlowsBlank(system, elements, methods);
        String cases = flows.write(sheet(Layout.FLOWS, "Flow cases", flows.widths()), styles, offers);
        levels();
        combinations(cases);
        elements.forEach(this::element);
        demands(cases);
        list(
                Layout.ASSUMPTIONS,
                30,
                Layout.ASSUMPTION_HEADS,
                List.of(REQUIRED, OPTIONAL, OPTIONAL, REQUIRED),
                "One assumption a row, with its basis and who is to confirm it; open until it is confirmed.",
                60,
                50,
                20,
                12);
        list(
                Layout.REFERENCES,
                30,
                Layout.REFERENCE_HEADS,
                List.of(REQUIRED),
                "One reference a row: drawings, surveys, reports and publications, each with its date or edition.",
                130);
        list(
                Layout.REQUIREMENTS,
                24,
                Layout.REQUIREMENT_HEADS,
                List.of(REQUIRED, OPTIONAL, OPTIONAL),
                "One requirement a row that the calculation has to answer, with its citation and the place of the answer.",
                60,
                40,
                40);
        list(
                Layout.REVISIONS,
                16,
                Layout.REVISION_HEADS,
                List.of(REQUIRED, REQUIRED, OPTIONAL),
                "One revision a row, the first at the top; the date as year-month-day.",
                12,
                14,
                100);
        lists();
        sheets.forEach(sheet -> sheet.finish(system == WorkingSystem.US));
    }

    private BlankSheet sheet(String name, String title, int... widths) {
        BlankSheet sheet = new BlankSheet(workbook, styles, name, title, widths);
        sheets.add(sheet);
        return sheet;
    }

    private void project() {
        BlankSheet sheet = sheet(Layout.PROJECT, "Project", 32, 52, 62);
        sheet.lines(List.of(
                FRAMES + "What must be filled in is marked \"required\".",
                "Numbers are written with a point and without their unit; the unit stands in a cell of its own."));
        sheet.head(Layout.PROJECT_HEADS, false);
        for (Label label : Label.values()) {
            String note = (label.required() ? REQUIRED : OPTIONAL) + ". " + label.note();
            int row = sheet.line(
                    List.of(label.text(), filled(label), note), List.of(styles.label, styles.textEntry, styles.label));
            offer(sheet, label, row);
        }
        sheet.skip();
        sheet.line("Elements, from the downstream end up");
        sheet.head(Layout.STATION_HEADS, false);
        for (Chosen element : elements) {
            sheet.line(
                    List.of(element.tag(), element.method(), methods.title(element.method())),
                    List.of(styles.label, styles.label, styles.textEntry));
        }
    }

    private String filled(Label label) {
        boolean us = system == WorkingSystem.US;
        return switch (label) {
            case STATUS -> Layout.STATUSES.get(0);
            case SYSTEM -> system.title();
            case PAPER -> Layout.PAPERS.get(us ? 0 : 1);
            case FLOW_UNIT -> us ? "MGD" : "L/s";
            case HEAD_UNIT -> us ? "in" : "mm";
            case SEAL -> Layout.YES.get(0);
            default -> "";
        };
    }

    private void offer(BlankSheet sheet, Label label, int row) {
        switch (label) {
            case STATUS -> sheet.offer(row, row, 1, lists.range(label.text(), Layout.STATUSES), true);
            case SYSTEM -> sheet.offer(row, row, 1, lists.range(label.text(), Layout.SYSTEMS), true);
            case PAPER -> sheet.offer(row, row, 1, lists.range(label.text(), Layout.PAPERS), true);
            case FLOW_UNIT -> sheet.offer(row, row, 1, offers.units(system.coherentUnit(Dimension.FLOW)), false);
            case HEAD_UNIT -> sheet.offer(row, row, 1, offers.units(system.coherentUnit(Dimension.LENGTH)), false);
            case SEAL -> sheet.offer(row, row, 1, lists.range("Yes or no", Layout.YES), true);
            default -> {}
        }
    }

    private void element(Chosen element) {
        BlankSheet sheet = sheet(
                element.tag(), element.tag() + ": " + methods.title(element.method()), 12, 46, 16, 14, 44, 12, 12);
        sheet.lines(List.of(
                FRAMES + "Method: " + element.method() + ".",
                "Say of every value where it comes from, and whether it is known or assumed."));
        sheet.head(
                Stream.concat(Layout.ENTRY_HEADS.stream(), Stream.of("To fill in"))
                        .toList(),
                true);
        for (Declared declared : methods.declared(element.method())) {
            if (declared.kind() == Declared.Kind.CASE) {
                continue;
            }
            boolean quantity = declared.words().isEmpty();
            int row = sheet.line(
                    List.of(
                            declared.symbol(),
                            declared.label(),
                            "",
                            quantity ? UnitOffer.first(declared.unit(), system).text() : "",
                            "",
                            "",
                            declared.optional() ? OPTIONAL : REQUIRED),
                    List.of(
                            styles.label,
                            styles.label,
                            quantity ? styles.numberEntry : styles.textEntry,
                            quantity ? styles.textEntry : styles.label,
                            styles.textEntry,
                            styles.textEntry,
                            styles.label));
            offers.entry(sheet, row, row, 2, declared);
            if (quantity) {
                sheet.offer(row, row, 3, offers.units(declared.unit()), false);
            }
            offers.standing(sheet, row, row, 5);
        }
    }

    private void levels() {
        BlankSheet sheet = sheet(Layout.LEVELS, "Tailwater curve", 12, 10, 13, 10, 60, 11);
        sheet.lines(List.of(
                FRAMES
                        + "Optional. The water level downstream at some flows of the whole station, the least flow first.",
                "A case on the sheet " + Layout.FLOWS
                        + " whose water level is blank takes it from here, straight between two rows; beyond the first and"
                        + " the last flow there is no result."));
        sheet.marks(List.of(REQUIRED, REQUIRED, REQUIRED, REQUIRED, OPTIONAL, REQUIRED));
        sheet.head(Layout.LEVEL_HEADS, true);
        Unit flow = system.coherentUnit(Dimension.FLOW);
        Unit level = system.coherentUnit(Dimension.LENGTH);
        int first = sheet.rows(
                ROWS,
                List.of("", system == WorkingSystem.US ? "MGD" : "L/s", "", level.text(), "", ""),
                List.of(
                        styles.numberEntry,
                        styles.textEntry,
                        styles.numberEntry,
                        styles.textEntry,
                        styles.textEntry,
                        styles.textEntry));
        int last = first + ROWS - 1;
        sheet.number(first, last, 0, Sign.NOT_NEGATIVE, "Flow", "Flow of the whole station, rising from row to row.");
        sheet.offer(first, last, 1, offers.units(flow), false);
        sheet.number(first, last, 2, Sign.ANY, "Water level", "Level of the receiving water at this flow.");
        sheet.offer(first, last, 3, offers.units(level), false);
        offers.standing(sheet, first, last, 5);
    }

    private void combinations(String cases) {
        BlankSheet sheet = sheet(Layout.COMBINATIONS, "Combinations of flow and water level", 26, 26, 26, 10, 70);
        sheet.lines(List.of(
                FRAMES
                        + "Optional. The flow of one case with the water level downstream of another, under a name of its own.",
                "Where you state that both can occur together the limits are judged as in any case; where not, the"
                        + " combination is shown and not judged."));
        sheet.marks(Collections.nCopies(5, REQUIRED));
        sheet.head(Layout.COMBINATION_HEADS, true);
        int first = sheet.rows(COMBINATION_ROWS, Collections.nCopies(5, ""), Collections.nCopies(5, styles.textEntry));
        int last = first + COMBINATION_ROWS - 1;
        sheet.offer(first, last, 1, cases, false);
        sheet.offer(first, last, 2, cases, false);
        sheet.offer(first, last, 3, lists.range("Yes or no", Layout.YES), true);
    }

    private void demands(String cases) {
        BlankSheet sheet = sheet(Layout.DEMANDS, "Limits demanded by others", 10, 12, 14, 12, 12, 50, 50, 26);
        sheet.lines(List.of(
                FRAMES + "One limit a row: a result of an element, by its tag and symbol, at most or at least a value.",
                "No limit of an authority is built in: each stands here with its citation. In case: the case or"
                        + " combination in which alone it is judged; blank for every one."));
        sheet.marks(List.of(REQUIRED, REQUIRED, REQUIRED, REQUIRED, REQUIRED, OPTIONAL, REQUIRED, OPTIONAL));
        sheet.head(
                Stream.concat(Layout.DEMAND_HEADS.stream(), Layout.DEMAND_OPTIONAL.stream())
                        .toList(),
                true);
        List<XSSFCellStyle> cellStyles = new ArrayList<>(Collections.nCopies(8, styles.textEntry));
        cellStyles.set(3, styles.numberEntry);
        int first = sheet.rows(ROWS, Collections.nCopies(8, ""), cellStyles);
        int last = first + ROWS - 1;
        sheet.offer(
                first,
                last,
                0,
                lists.range("Tags", elements.stream().map(Chosen::tag).toList()),
                true);
        sheet.offer(first, last, 2, lists.range("At most or at least", Layout.SIDES), true);
        sheet.number(first, last, 3, Sign.ANY, "Value", "The value demanded.");
        sheet.offer(first, last, 4, lists.range("Units", UnitOffer.all()), false);
        sheet.offer(first, last, 7, cases, false);
    }

    private void list(String name, int rows, List<String> heads, List<String> marks, String line, int... widths) {
        BlankSheet sheet = sheet(name, name, widths);
        sheet.lines(List.of(FRAMES + line));
        sheet.marks(marks);
        sheet.head(heads, true);
        List<XSSFCellStyle> cellStyles = Collections.nCopies(heads.size(), styles.textEntry);
        int first = sheet.rows(rows, Collections.nCopies(heads.size(), ""), cellStyles);
        if (heads.contains("Open or closed")) {
            sheet.offer(
                    first,
                    first + rows - 1,
                    heads.indexOf("Open or closed"),
                    lists.range("Open or closed", Layout.OPEN),
                    true);
        }
    }

    private void lists() {
        List<DropDowns.Column> columns = lists.columns();
        int[] widths = new int[Math.max(columns.size(), 1)];
        Arrays.fill(widths, 18);
        BlankSheet sheet = sheet(Layout.LISTS, "Lists", widths);
        sheet.line("The words and units that the other sheets offer. Nothing is written here.");
        sheet.skip();
        sheet.head(columns.stream().map(DropDowns.Column::title).toList(), false);
        int longest = columns.stream().mapToInt(c -> c.words().size()).max().orElse(0);
        for (int i = 0; i < longest; i++) {
            int at = i;
            sheet.line(
                    columns.stream()
                            .map(c -> at < c.words().size() ? c.words().get(at) : "")
                            .toList(),
                    Collections.nCopies(columns.size(), styles.line));
        }
    }
}
