package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Allowed;
import nappe.calculation.Cell;
import nappe.deliver.xlsx.Recalculated;
import nappe.deliver.xlsx.Spoiler;
import nappe.formula.Value;
import nappe.input.SampleStations;
import nappe.proof.Typing.Demand;
import nappe.proof.Typing.Entry;
import nappe.proof.Typing.Flow;
import nappe.proof.Typing.Head;
import nappe.proof.Typing.Level;
import nappe.proof.Typing.Units;
import nappe.station.Design;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * What a checker types into the issued workbook gives, recalculated, what issuing anew with that entry gives. Flows found
 * stay as issued: they are handed on to the new issue, and all that rests on them follows the entry.
 */
class CheckersEditTest {
    @TempDir
    Path folder;

    private static final Map<String, List<Typing>> FLUME = new LinkedHashMap<>();
    private static final Map<String, List<Typing>> INLET = new LinkedHashMap<>();
    private static final Map<String, List<Typing>> WEIR = new LinkedHashMap<>();
    private static final Map<String, List<Typing>> POND = new LinkedHashMap<>();
    private static final Map<String, List<Typing>> TURNOUT = new LinkedHashMap<>();

    private static final Map<String, List<Typing>> MAIN = new LinkedHashMap<>();
    private static final Map<String, List<Typing>> REUSE = new LinkedHashMap<>();

    private static void flume(String what, Typing... typings) {
        FLUME.put(what, Arrays.asList(typings));
    }

    private static void inlet(String what, Typing... typings) {
        INLET.put(what, Arrays.asList(typings));
    }

    private static void weir(String what, Typing... typings) {
        WEIR.put(what, Arrays.asList(typings));
    }

    private static void main(String what, Typing... typings) {
        MAIN.put(what, Arrays.asList(typings));
    }

    private static void reuse(String what, Typing... typings) {
        REUSE.put(what, Arrays.asList(typings));
    }

    private static void pond(String what, Typing... typings) {
        POND.put(what, Arrays.asList(typings));
    }

    private static void turnout(String what, Typing... typings) {
        TURNOUT.put(what, Arrays.asList(typings));
    }

    static {
        turnout(
                "published modular limit, sudden end, rougher throat: free flow is lost in more cases",
                new Entry("F1", "modular", "published"),
                new Entry("F1", "EM", 0.0),
                new Entry("F1", "L_d", 0.0),
                new Entry("F1", "finish", "field concrete"),
                new Level(2, 52.66));
        turnout(
                "throat as a sill over the whole floor, no flow, level below the bed downstream",
                new Entry("F1", "b", 880),
                new Flow(0, 0.0),
                new Level(1, 52.1));
        main(
                "machined kind by the other sources, another loss, lengths of 1991",
                new Entry("V1", "kind", "machined"),
                new Entry("V1", "reading", "the other sources"),
                new Entry("V1", "loss", "curve of the annex"),
                new Entry("V1", "edition", "edition of 1991"));
        main(
                "throat too wide, density typed, a fitting that the edition of 1991 lacks",
                new Entry("V1", "d", 400),
                new Entry("V1", "rho_t", 1010),
                new Entry("V1", "edition", "edition of 1991"),
                new Entry("V1", "fitting", "reducer 1.33 D to D, 2.3 D long"));
        main(
                "inclined limb whose slope is not typed, no transmitter, coefficient typed, warmer water",
                new Entry("V1", "gauge", "inclined limb, heavier liquid"),
                new Entry("V1", "p_s", "not given"),
                new Entry("V1", "C_t", 0.99),
                new Entry("V1", "T", 30));
        main(
                "crown higher: not full; no flow; flow beyond everything",
                new Entry("V1", "z_k", 133.5),
                new Flow(1, 0),
                new Flow(3, 1900));

        reuse("corner taps, bore beyond the range", new Entry("O1", "taps", "corner"), new Entry("O1", "d", 9.3));
        reuse(
                "small pipe, small flows, no friction",
                new Entry("O1", "D", 2.5),
                new Entry("O1", "d", 1.2),
                new Entry("O1", "f_D", 0),
                new Flow(2, 0.05));
        reuse(
                "straight lengths too short, a second fitting, a U-tube of a light liquid, the pond full",
                new Entry("O1", "L_s", 9),
                new Entry("O1", "second", "full-bore ball or gate valve fully open"),
                new Entry("O1", "gauge", "inverted U-tube"),
                new Entry("O1", "rho_m", 1.6),
                new Level(4, 4190));

        // a sample of this size takes LibreOffice many seconds each: so several edits go together where they do not
        // meet
        flume("smallest size, a head read in submerged flow", new Entry("F1", "size", "1 in"), new Level(1, 412.85));
        flume(
                "the subtraction, submerged readings accepted, width at the gauge typed",
                new Entry("F1", "form", "subtraction"),
                new Entry("F1", "submerged", "accepted"),
                new Entry("F1", "W_g", 1.7),
                new Level(3, 413.45));
        flume(
                "other size of the general formula, in other letters; crest a little higher",
                new Entry("F1", "size", "8 FT"),
                new Entry("F1", "z_f", 412.75));
        flume(
                "ISO metric size without a general formula; crest lower: most cases drown",
                new Entry("F1", "size", "0.152 m"),
                new Entry("F1", "z_f", 411.1));
        flume(
                "crest higher: all flow free; no flow, the smallest flow, and flow beyond the rating",
                new Entry("F1", "z_f", 414.5),
                new Flow(0, 1e-6),
                new Flow(1, 0),
                new Flow(6, 80));
        flume(
                "tailwater at the crest, frees the flow, drowns the least flow; heads read and taken out",
                new Level(5, 413.2),
                new Level(0, 412.9),
                new Level(2, 412.5),
                new Head(4, "F1", 1.4),
                new Head(1, "F1", "not given"));
        flume(
                "demand no longer met, head read beyond the rating, units in service, what combinations take",
                new Demand(0, 413.0),
                new Head(1, "F1", 40),
                new Units(6, 3),
                new Units(0, 2),
                new Flow(6, 9),
                new Level(5, 412.45));
        flume(
                "many at once",
                new Entry("F1", "size", "2.4 m"),
                new Entry("F1", "z_f", 413.3),
                new Flow(3, 17),
                new Level(6, 416),
                new Head(0, "F1", 0.2),
                new Head(1, "F1", 9),
                new Demand(1, 5));

        inlet(
                "channel wider and steeper, submerged readings refused",
                new Entry("A1", "b", 2.1),
                new Entry("A1", "S_0", 0.004),
                new Entry("F1", "submerged", "refused"));
        inlet("channel so shallow that flow is critical", new Entry("A1", "z_f", 22.4));
        inlet(
                "sloping sides, a screen, walls too low, a jump; one channel for all",
                new Entry("A1", "m", 1.5),
                new Entry("A1", "K", 3),
                new Entry("A1", "z_w", 22.4),
                new Entry("A1", "inflow", "rapid, with a jump"),
                new Entry("A1", "serves", "all units"),
                new Units(3, 2));
        inlet(
                "crest lower: submerged by the curve; a level typed where the curve served; flow beyond the curve; a demand",
                new Entry("F1", "z_f", 21.5),
                new Level(0, 22.1),
                new Flow(6, 1300),
                new Demand(2, 0.2));

        weir("notch wider", new Entry("W1", "b", 850));
        weir("notch as wide as the channel", new Entry("W1", "b", 1100));
        weir("notch too narrow", new Entry("W1", "b", 90));
        weir("width ratio in the zone that is refused", new Entry("W1", "b", 990));
        weir("width ratio at the end of that zone", new Entry("W1", "b", 880));
        weir("channel wider", new Entry("W1", "B", 2.75));
        weir("channel narrower, in the zone that is refused", new Entry("W1", "B", 0.66));
        weir("crest higher over the bed", new Entry("W1", "p", 1.2));
        weir("crest height under its limit", new Entry("W1", "p", 0.04));
        weir("crest level lower: less free", new Entry("W1", "z_c", 17.9));
        weir("crest level higher: all free", new Entry("W1", "z_c", 18.6));
        weir("no flow in a case", new Flow(1, 0));
        weir("flow beyond the range", new Flow(3, 900));
        weir("least flow", new Flow(0, 1e-4));
        weir("flow so small that the head is under the bracket", new Flow(0, 1e-7));
        weir("tailwater frees the nappe", new Level(4, 17.8));
        weir("tailwater takes the nappe's freedom", new Level(2, 18.2));
        weir("tailwater just where the nappe is no longer free", new Level(2, 18.19));
        weir("head read where none was given", new Head(0, "W1", 0.05));
        weir("head read taken out, in words", new Head(2, "W1", "not given"));
        weir(
                "many at once",
                new Entry("W1", "b", 400),
                new Entry("W1", "B", 0.7),
                new Entry("W1", "p", 0.3),
                new Entry("W1", "z_c", 18.3),
                new Flow(4, 300),
                new Level(1, 18.29),
                new Head(3, "W1", 0.33));

        pond(
                "the other sets and limits, another angle, a head read",
                new Entry("W1", "set", "US constants"),
                new Entry("V1", "set", "polynomial"),
                new Entry("V1", "rules", "US manual"),
                new Entry("V1", "theta", 53.13),
                new Head(1, "W1", 48));
        pond(
                "weir as wide as the pond's outlet, with vents; crest higher, so that the V-notch is not free",
                new Entry("W1", "b", 2000),
                new Entry("W1", "z_d", 49.6),
                new Entry("W1", "A_v", 0.01),
                new Entry("W1", "K_v", 3),
                new Entry("W1", "z_c", 50.6));
        pond(
                "width correction read from the figure; both weirs drowned; no flow in a case",
                new Entry("W1", "b", 1800),
                new Entry("W1", "k_y", 0.0035),
                new Level(3, 50.75),
                new Flow(0, 0),
                new Entry("V1", "p", 0.3));
    }

    private Path file(byte[] workbook) throws IOException {
        return Files.write(Files.createTempFile(folder, "book", ".xlsx"), workbook);
    }

    private Path typed(Package issued, List<Typing> typings) throws IOException {
        Edited edited = new Edited(Spoiler.spoil(issued.workbook()));
        typings.forEach(typing -> edited.type(typing.place(issued), typing.content()));
        return file(edited.bytes());
    }

    private static Package anew(Package issued, List<Typing> typings) {
        Design design = issued.design();
        for (Typing typing : typings) {
            design = typing.in(design, issued);
        }
        return Package.of(design, issued.found());
    }

    private static List<Typing> inJava(List<Typing> typings) {
        return typings.stream()
                .map(t -> t instanceof Head head && "not given".equals(head.content())
                        ? new Head(head.of(), head.tag(), null)
                        : t)
                .toList();
    }

    private void proven(String sample, Map<String, List<Typing>> edits, int byGnumericToo) throws IOException {
        Package issued = Package.ofSample(sample);
        List<Path> books = new ArrayList<>();
        for (List<Typing> typings : edits.values()) {
            books.add(typed(issued, typings));
        }
        List<Map<String, Object>> recalculated = Recalculated.byLibreOffice(books);
        List<String> faults = new ArrayList<>();
        int i = 0;
        for (Map.Entry<String, List<Typing>> edit : edits.entrySet()) {
            Package anew = anew(issued, inJava(edit.getValue()));
            Map<String, Object> expected = anew.live(Recalculated.asStored(file(anew.workbook())));
            Comparison comparison = Comparison.of(anew.live(recalculated.get(i)), expected, anew.results());
            System.out.println(sample + ", " + edit.getKey() + ": " + comparison);
            comparison.faults().forEach(fault -> faults.add(edit.getKey() + ", LibreOffice: " + fault));
            if (i % byGnumericToo == 0) {
                Comparison.of(anew.live(Recalculated.byGnumeric(books.get(i))), expected, anew.results())
                        .faults()
                        .forEach(fault -> faults.add(edit.getKey() + ", Gnumeric: " + fault));
            }
            i++;
        }
        assertThat(faults).isEmpty();
    }

    @Test
    void editsOfTheFlumeGiveWhatIssuingAnewGives() throws IOException {
        proven("headworks.xlsx", FLUME, 4);
    }

    @Test
    void editsOfTheInletGiveWhatIssuingAnewGives() throws IOException {
        proven("inlet-works.xlsx", INLET, 4);
    }

    @Test
    void editsOfTheWeirGiveWhatIssuingAnewGives() throws IOException {
        proven("return-weir.xlsx", WEIR, 5);
    }

    @Test
    void editsOfThePumpingMainGiveWhatIssuingAnewGives() throws IOException {
        proven("pumping-main.xlsx", MAIN, 3);
    }

    @Test
    void editsOfTheReuseLineGiveWhatIssuingAnewGives() throws IOException {
        proven("reuse-line.xlsx", REUSE, 3);
    }

    @Test
    void editsOfThePondGiveWhatIssuingAnewGives() throws IOException {
        proven("seepage-pond.xlsx", POND, 2);
    }

    @Test
    void editsOfTheTurnoutGiveWhatIssuingAnewGives() throws IOException {
        proven("canal-turnout.xlsx", TURNOUT, 2);
    }

    /** A cell that is emptied is empty where "not given" stood; all that rests on it reads as not given. */
    @Test
    void headReadThatIsDeletedIsNotGiven() throws IOException {
        Package issued = Package.ofSample("return-weir.xlsx");
        Head deleted = new Head(2, "W1", null);
        Package anew = anew(issued, List.of(deleted));
        String emptied = "Cases!" + deleted.place(issued).address();
        Map<String, Object> expected = new LinkedHashMap<>(Recalculated.asStored(file(anew.workbook())));
        assertThat(expected.remove(emptied)).isEqualTo("not given");
        Path file = typed(issued, List.of(deleted));
        assertThat(Comparison.of(Recalculated.byLibreOffice(file), expected, anew.results())
                        .faults())
                .isEmpty();
        assertThat(Comparison.of(Recalculated.byGnumeric(file), expected, anew.results())
                        .faults())
                .isEmpty();
    }

    /** What may be typed over in the issued workbook is what these edits type over: numbers and choices. */
    @Test
    void wordsThatAreUnlockedAreChoices() {
        for (String sample : SampleStations.names()) {
            assertThat(Package.ofSample(sample).results().cells())
                    .filteredOn(c -> c.kind() == Cell.Kind.ENTRY && c.typed() instanceof Value.Word)
                    .allMatch(c -> c.allowed() instanceof Allowed.Words);
        }
    }

    /** What cannot be built is refused when issued anew; typed over in the issued workbook, a limit there is not met. */
    @Test
    void aNotchWiderThanItsChannelIsToldByALimit() throws IOException {
        Package issued = Package.ofSample("return-weir.xlsx");
        List<Typing> wider = List.of(new Entry("W1", "b", 1300));
        assertThatThrownBy(() -> anew(issued, wider)).hasMessageContaining("the notch is no wider than the channel");
        long before = notMet(Recalculated.asStored(file(issued.workbook())));
        assertThat(notMet(Recalculated.byLibreOffice(typed(issued, wider)))).isGreaterThan(before);
    }

    private static long notMet(Map<String, Object> values) {
        return values.entrySet().stream()
                .filter(one -> one.getKey().startsWith("W1!") && "not met".equals(one.getValue()))
                .count();
    }

    @Test
    void sizeThatNoTableHasLeavesNoNumber() throws IOException {
        Package issued = Package.ofSample("headworks.xlsx");
        Map<String, Object> values =
                Recalculated.byLibreOffice(typed(issued, List.of(new Entry("F1", "size", "11 ft"))));
        assertThat(issued.results().cells().stream()
                        .filter(c -> c.kind() == Cell.Kind.FORMULA
                                && List.of("h_f", "h_a", "z_u", "Q_h", "Q_min").contains(c.symbol())
                                && c.place().sheet().startsWith("F1")
                                && !c.place().sheet().startsWith("F1 size"))
                        .map(c -> values.get(c.place().sheet() + "!" + c.place().address())))
                .hasSizeGreaterThan(20)
                .noneMatch(Double.class::isInstance);
    }

    @Test
    void anEditThatIsNotMadeInTheDesignIsReported() throws IOException {
        Package issued = Package.ofSample("return-weir.xlsx");
        Path edited = typed(issued, List.of(new Entry("W1", "p", 0.4500001)));
        assertThat(Comparison.of(
                                Recalculated.byLibreOffice(edited),
                                Recalculated.asStored(file(issued.workbook())),
                                issued.results())
                        .faults())
                .hasSizeGreaterThan(20);
    }
}
