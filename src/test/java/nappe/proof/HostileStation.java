package nappe.proof;

import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import nappe.input.Filler;
import nappe.input.SampleStations;
import nappe.unit.WorkingSystem;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/**
 * A small station with something on every sheet that takes text: combinations, a tailwater curve, demands (one in a single
 * case) besides what every station has. Small, because the tests type into it and issue it many times.
 */
final class HostileStation {
    /** Where text is typed: the cell, and how long a text may be. */
    record Spot(String sheet, String address, int longest) {
        String cell() {
            return sheet + "!" + address;
        }
    }

    private interface Filling {
        Filler fill() throws IOException;
    }

    static final int NAME = 60;
    static final int LINE = 120;
    static final int TEXT = 2000;

    private static final int CASE = 40;

    private final Filling filling;
    private final List<Spot> spots = new ArrayList<>();
    private final Map<Spot, List<Spot>> named = new LinkedHashMap<>();

    private HostileStation(Filling filling, String tag) throws IOException {
        this.filling = filling;
        filling.fill().change(book -> findSpots(book, tag));
    }

    /** A weir; the combinations are of cases whose names are no spots, so that these can be refused. */
    static HostileStation weir() throws IOException {
        return new HostileStation(
                () -> completed(
                                SampleStations.blank(WorkingSystem.SI, "W1", "rectangular-weir"),
                                List.of("First", "Second", "Third", "Fourth"),
                                17.5)
                        .entry("W1", "set", "ISO 1438", null, "invented", "known")
                        .entry("W1", "b", 600, "mm", "invented", "known")
                        .entry("W1", "B", 1.1, "m", "invented", "known")
                        .entry("W1", "p", 0.45, "m", "invented", "known")
                        .entry("W1", "z_c", 18.25, "m", "invented", "known")
                        .row("Demands", "W1", "h_1", "at least", 50, "mm", "resolved head", "Invented sheet IS-1")
                        .row("Demands", "W1", "h_1", "at most", 2, "m", "room", "Invented permit P-1", "Third"),
                "W1");
    }

    /** A flume, which has its standard sizes compared and the reason for the choice printed. */
    static HostileStation flume() throws IOException {
        return new HostileStation(
                () -> completed(
                                SampleStations.blank(WorkingSystem.SI, "F1", "parshall-flume"),
                                List.of("First", "Second"),
                                17.5)
                        .entry("F1", "size", "3 ft", null, "invented", "known")
                        .entry("F1", "form", "1967 form", null, "invented", "known")
                        .entry("F1", "submerged", "refused", null, "invented", "known")
                        .entry("F1", "z_f", 18.25, "m", "invented", "known")
                        .row("Demands", "F1", "h_a", "at least", 50, "mm", "resolved head", "Invented sheet IS-1")
                        .row("Demands", "F1", "h_a", "at most", 2, "m", "room", "Invented permit P-1"),
                "F1");
    }

    /** Filled in but for the element: flows of the cases named, the last by the curve, and combinations of the last two. */
    private static Filler completed(Filler filler, List<String> cases, double level) {
        for (int i = 0; i < cases.size(); i++) {
            boolean byCurve = i == cases.size() - 1;
            filler.row(
                    "Flows",
                    cases.get(i),
                    "1 h",
                    i < 2 ? "2030" : "2040",
                    40 * (i + 1),
                    "L/s",
                    byCurve ? null : level + i / 4.0,
                    null,
                    "1 year",
                    "invented",
                    i == 0 ? "assumed" : "known");
        }
        String one = cases.get(cases.size() - 2);
        String other = cases.get(cases.size() - 1);
        return filler.project("Project", "Made for a test (fictional)")
                .project("Calculation number", "H-1")
                .project("Subject", "A device among odd words")
                .project("Revision", "A")
                .project("Revision date", "2030-03-14")
                .project("Status", "preliminary")
                .project("Elevations refer to", "an invented datum")
                .project("Space for a seal on the cover", "yes")
                .row("Tailwater curve", 0, "L/s", level, null, "Invented outfall calculation OC-1", "known")
                .row("Tailwater curve", 1000, "L/s", level + 1, null, "Invented outfall calculation OC-1", "assumed")
                .row("Combinations", "High and low", one, other, "yes", "Invented river study RS-3")
                .row("Combinations", "Low and high", other, one, "no", "Invented river study RS-3")
                .row("Assumptions", "One.", "invented", "project engineer", "open")
                .row("Assumptions", "Two.", "invented", "project engineer", "closed")
                .row("References", "Invented reference 1")
                .row("References", "Invented reference 2")
                .row("Requirements", "Show it.", "Invented permit P-1, item 1", "Limits")
                .row("Requirements", "Name every source.", "Invented permit P-1, item 2", "Entries")
                .row("Revisions", "A", "2030-03-14", "First issue.");
    }

    /** The station, open to changes. */
    Filler filler() throws IOException {
        return filling.fill();
    }

    /** All entries for text, two rows of each list; they are within the first hundred. */
    List<Spot> spots() {
        return List.copyOf(spots);
    }

    /** The cells that may name the case or combination of a spot: in combinations, in a demand, as the one worked in full. */
    Map<Spot, List<Spot>> named() {
        return named;
    }

    Spot project() {
        return spots.get(0);
    }

    Spot subject() {
        return spots.get(4);
    }

    Spot release() {
        return spots.get(6);
    }

    private void findSpots(XSSFWorkbook book, String tag) {
        spots.add(label(book, "Project", LINE));
        spots.add(label(book, "Firm", NAME));
        spots.add(label(book, "Client", NAME));
        spots.add(label(book, "Calculation number", NAME));
        spots.add(label(book, "Subject", LINE));
        spots.add(label(book, "Elevations refer to", LINE));
        spots.add(label(book, "Purpose of release", 400));
        column(book, "Project", "Title", LINE, 1);
        List<Spot> cases = column(book, "Flows", "Case", CASE, 2);
        column(book, "Flows", "Averaging period", NAME, 2);
        column(book, "Flows", "Design year", NAME, 2);
        column(book, "Flows", "Return period of the level", NAME, 2);
        column(book, "Flows", "Source or basis", TEXT, 2);
        column(book, "Tailwater curve", "Source or basis", TEXT, 2);
        List<Spot> combinations = column(book, "Combinations", "Combination", CASE, 2);
        column(book, "Combinations", "Basis", TEXT, 2);
        column(book, tag, "Source or basis", TEXT, 2);
        column(book, "Demands", "What is demanded", TEXT, 2);
        column(book, "Demands", "Citation", TEXT, 2);
        column(book, "Assumptions", "Assumption", TEXT, 2);
        column(book, "Assumptions", "Basis", TEXT, 2);
        column(book, "Assumptions", "Owner", NAME, 2);
        column(book, "References", "Reference", TEXT, 2);
        column(book, "Requirements", "Requirement", TEXT, 2);
        column(book, "Requirements", "Citation", TEXT, 2);
        column(book, "Requirements", "Answered where", TEXT, 2);
        column(book, "Revisions", "What changed", TEXT, 1);
        List<Spot> flowOf = below(book, "Combinations", "Flow of case", CASE, 2);
        List<Spot> levelOf = below(book, "Combinations", "Level of case", CASE, 2);
        List<Spot> inCase = below(book, "Demands", "In case", CASE, 1);
        named.put(cases.get(0), List.of(flowOf.get(0), levelOf.get(1)));
        named.put(cases.get(1), List.of(levelOf.get(0), flowOf.get(1), label(book, "Case worked in full", CASE)));
        named.put(combinations.get(0), inCase);
    }

    private static Spot label(XSSFWorkbook book, String label, int longest) {
        return new Spot("Project", "B" + (row(book.getSheet("Project"), label) + 1), longest);
    }

    private List<Spot> column(XSSFWorkbook book, String name, String head, int longest, int rows) {
        List<Spot> below = below(book, name, head, longest, rows);
        spots.addAll(below);
        return below;
    }

    /** The cells below a head word. */
    private static List<Spot> below(XSSFWorkbook book, String name, String head, int longest, int rows) {
        XSSFSheet sheet = book.getSheet(name);
        int first = name.equals("Project") ? row(sheet, "Tag") : 0;
        for (int row = first; row <= sheet.getLastRowNum(); row++) {
            for (int column = 0;
                    sheet.getRow(row) != null && column < sheet.getRow(row).getLastCellNum();
                    column++) {
                if (text(sheet, row, column).equals(head)) {
                    String letters = CellReference.convertNumToColString(column);
                    int at = row + 1;
                    return IntStream.rangeClosed(1, rows)
                            .mapToObj(i -> new Spot(name, letters + (at + i), longest))
                            .toList();
                }
            }
        }
        throw new IllegalArgumentException(name + " has no column " + head);
    }

    private static int row(XSSFSheet sheet, String label) {
        for (int row = sheet.getLastRowNum(); row >= 0; row--) {
            if (text(sheet, row, 0).equals(label)) {
                return row;
            }
        }
        throw new IllegalArgumentException(sheet.getSheetName() + " has no row " + label);
    }

    private static String text(XSSFSheet sheet, int row, int column) {
        var there = sheet.getRow(row) == null ? null : sheet.getRow(row).getCell(column);
        return there != null && there.getCellType() == CellType.STRING ? there.getStringCellValue() : "";
    }
}
