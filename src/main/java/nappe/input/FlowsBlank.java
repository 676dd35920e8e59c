package nappe.input;

import static nappe.input.Blank.FRAMES;
import static nappe.input.Blank.OPTIONAL;
import static nappe.input.Blank.REQUIRED;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import nappe.formula.Sign;
import nappe.input.BlankWriter.Chosen;
import nappe.method.Declared;
import nappe.method.MethodCatalogue;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;

/** The blank sheet Flows, with columns for what single elements ask for in each case. */
final class FlowsBlank {
    /** @param filled what stands in each row from the start */
    private record Column(String head, int width, String mark, boolean number, String filled) {}

    private static final List<String> FIXED = Stream.concat(Layout.FLOW_HEADS.stream(), Layout.FLOW_OPTIONAL.stream())
            .toList();

    private final WorkingSystem system;
    private final Unit level;
    private final Map<String, Declared> perCase = new LinkedHashMap<>();
    private final List<Column> columns = new ArrayList<>();

    FlowsBlank(WorkingSystem system, List<Chosen> elements, MethodCatalogue methods) {
        this.system = system;
        this.level = system.coherentUnit(Dimension.LENGTH);
        for (Chosen element : elements) {
            for (Declared declared : methods.declared(element.method())) {
                if (declared.kind() == Declared.Kind.CASE) {
                    perCase.put(element.tag() + "." + declared.symbol(), declared);
                }
            }
        }
        FIXED.forEach(head -> columns.add(column(head)));
        perCase.forEach((key, declared) -> {
            String mark = declared.optional() ? OPTIONAL : REQUIRED;
            boolean quantity = declared.words().isEmpty();
            String unit = quantity ? UnitOffer.first(declared.unit(), system).text() : "";
            columns.add(new Column(key, 12, mark, quantity, ""));
            columns.add(new Column(key + Layout.UNIT_OF, 12, quantity ? mark : OPTIONAL, false, unit));
        });
    }

    private Column column(String head) {
        return switch (head) {
            case "Case" -> new Column(head, 26, REQUIRED, false, "");
            case "Flow" -> new Column(head, 12, REQUIRED, true, "");
            case "Flow unit" -> new Column(head, 10, REQUIRED, false, system == WorkingSystem.US ? "MGD" : "L/s");
            case "Water level downstream" -> new Column(head, 13, OPTIONAL, true, "");
            case "Water level unit" -> new Column(head, 10, OPTIONAL, false, level.text());
            case Layout.UNITS -> new Column(head, 10, OPTIONAL, true, "");
            case "Source or basis" -> new Column(head, 36, OPTIONAL, false, "");
            case "Standing" -> new Column(head, 11, REQUIRED, false, "");
            default -> new Column(head, 14, OPTIONAL, false, "");
        };
    }

    int[] widths() {
        return columns.stream().mapToInt(Column::width).toArray();
    }

    /** Writes the sheet, and returns the range of the names of the cases. */
    String write(BlankSheet sheet, BlankStyles styles, Offers offers) {
        List<String> lines = new ArrayList<>(List.of(
                FRAMES
                        + "One case a row: one flow of the whole station with one water level downstream, under a name of"
                        + " its own; the same flow may stand in several.",
                "Units in service, blank: one. Water level, blank: from the sheet " + Layout.LEVELS
                        + ", if filled in. A row with nothing but units of measure in it is passed over."));
        perCase.forEach((key, declared) -> lines.add(key + ": " + declared.label() + ", for each case."));
        sheet.lines(lines);
        sheet.marks(columns.stream().map(Column::mark).toList());
        sheet.head(columns.stream().map(Column::head).toList(), true);
        List<XSSFCellStyle> cellStyles = columns.stream()
                .map(c -> c.number() ? styles.numberEntry : styles.textEntry)
                .toList();
        int first = sheet.rows(Blank.ROWS, columns.stream().map(Column::filled).toList(), cellStyles);
        int last = first + Blank.ROWS - 1;
        offer(sheet, offers, first, last);
        return Layout.FLOWS + "!" + DropDowns.fixed(RawCell.address(first, 0)) + ":"
                + DropDowns.fixed(RawCell.address(last, 0));
    }

    private void offer(BlankSheet sheet, Offers offers, int first, int last) {
        int flow = FIXED.indexOf("Flow");
        sheet.number(first, last, flow, Sign.POSITIVE, "Flow", "Flow of the case, greater than zero.");
        sheet.offer(first, last, flow + 1, offers.units(system.coherentUnit(Dimension.FLOW)), false);
        int water = FIXED.indexOf("Water level downstream");
        sheet.number(
                first,
                last,
                water,
                Sign.ANY,
                "Water level downstream",
                "Level of the receiving water; blank where there is none, or where it comes from the tailwater curve.");
        sheet.offer(first, last, water + 1, offers.units(level), false);
        sheet.count(
                first,
                last,
                FIXED.indexOf(Layout.UNITS),
                FlowsSheet.MOST_UNITS,
                Layout.UNITS,
                "Like devices side by side that share the flow of the case; blank for one.");
        offers.standing(sheet, first, last, FIXED.indexOf("Standing"));
        int column = FIXED.size();
        for (Declared declared : perCase.values()) {
            offers.entry(sheet, first, last, column, declared);
            if (declared.words().isEmpty()) {
                sheet.offer(first, last, column + 1, offers.units(declared.unit()), false);
            }
            column += 2;
        }
    }
}
