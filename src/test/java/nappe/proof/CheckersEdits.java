package nappe.proof;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.proof.Typing.Demand;
import nappe.proof.Typing.Entry;
import nappe.proof.Typing.Flow;
import nappe.proof.Typing.Head;
import nappe.proof.Typing.Level;
import nappe.proof.Typing.Units;

/** What checkers type into the issued workbooks of the samples. */
final class CheckersEdits {
    static final String FLUME = "headworks.xlsx";
    static final String INLET = "inlet-works.xlsx";
    static final String WEIR = "return-weir.xlsx";
    static final String POND = "seepage-pond.xlsx";
    static final String TURNOUT = "canal-turnout.xlsx";
    static final String MAIN = "pumping-main.xlsx";
    static final String REUSE = "reuse-line.xlsx";

    private static final Map<String, Map<String, List<Typing>>> EDITS = new LinkedHashMap<>();

    private CheckersEdits() {}

    /** The edits of a sample by what they are for. */
    static Map<String, List<Typing>> of(String sample) {
        return EDITS.get(sample);
    }

    private static void edit(String sample, String what, Typing... typings) {
        EDITS.computeIfAbsent(sample, key -> new LinkedHashMap<>()).put(what, Arrays.asList(typings));
    }

    static {
        edit(
                TURNOUT,
                "published modular limit, sudden end, rougher throat: free flow is lost in more cases",
                new Entry("F1", "modular", "published"),
                new Entry("F1", "EM", 0.0),
                new Entry("F1", "L_d", 0.0),
                new Entry("F1", "finish", "field concrete"),
                new Level(2, 52.66));
        edit(
                TURNOUT,
                "throat as a sill over the whole floor, no flow, level below the bed downstream",
                new Entry("F1", "b", 880),
                new Flow(0, 0.0),
                new Level(1, 52.1));
        edit(
                MAIN,
                "machined kind by the other sources, another loss, lengths of 1991",
                new Entry("V1", "kind", "machined"),
                new Entry("V1", "reading", "the other sources"),
                new Entry("V1", "loss", "curve of the annex"),
                new Entry("V1", "edition", "edition of 1991"));
        edit(
                MAIN,
                "throat too wide, density typed, a fitting that the edition of 1991 lacks",
                new Entry("V1", "d", 400),
                new Entry("V1", "rho_t", 1010),
                new Entry("V1", "edition", "edition of 1991"),
                new Entry("V1", "fitting", "reducer 1.33 D to D, 2.3 D long"));
        edit(
                MAIN,
                "inclined limb whose slope is not typed, no transmitter, coefficient typed, warmer water",
                new Entry("V1", "gauge", "inclined limb, heavier liquid"),
                new Entry("V1", "p_s", "not given"),
                new Entry("V1", "C_t", 0.99),
                new Entry("V1", "T", 30));
        edit(
                MAIN,
                "crown higher: not full; no flow; flow beyond everything",
                new Entry("V1", "z_k", 133.5),
                new Flow(1, 0),
                new Flow(3, 1900));

        edit(REUSE, "corner taps, bore beyond the range", new Entry("O1", "taps", "corner"), new Entry("O1", "d", 9.3));
        edit(
                REUSE,
                "small pipe, small flows, no friction",
                new Entry("O1", "D", 2.5),
                new Entry("O1", "d", 1.2),
                new Entry("O1", "f_D", 0),
                new Flow(2, 0.05));
        edit(
                REUSE,
                "straight lengths too short, a second fitting, a U-tube of a light liquid, the pond full",
                new Entry("O1", "L_s", 9),
                new Entry("O1", "second", "full-bore ball or gate valve fully open"),
                new Entry("O1", "gauge", "inverted U-tube"),
                new Entry("O1", "rho_m", 1.6),
                new Level(4, 4190));

        // a sample of this size takes LibreOffice seconds each: so several edits go together where they do not meet
        edit(
                FLUME,
                "smallest size, a head read in submerged flow",
                new Entry("F1", "size", "1 in"),
                new Level(1, 412.85));
        edit(
                FLUME,
                "the subtraction, submerged readings accepted, width at the gauge typed",
                new Entry("F1", "form", "subtraction"),
                new Entry("F1", "submerged", "accepted"),
                new Entry("F1", "W_g", 1.7),
                new Level(3, 413.45));
        edit(
                FLUME,
                "other size of the general formula, in other letters; crest a little higher",
                new Entry("F1", "size", "8 FT"),
                new Entry("F1", "z_f", 412.75));
        edit(
                FLUME,
                "ISO metric size without a general formula; crest lower: most cases drown",
                new Entry("F1", "size", "0.152 m"),
                new Entry("F1", "z_f", 411.1));
        edit(
                FLUME,
                "crest higher: all flow free; no flow, the smallest flow, and flow beyond the rating",
                new Entry("F1", "z_f", 414.5),
                new Flow(0, 1e-6),
                new Flow(1, 0),
                new Flow(6, 80));
        edit(
                FLUME,
                "tailwater at the crest, frees the flow, drowns the least flow; heads read and taken out",
                new Level(5, 413.2),
                new Level(0, 412.9),
                new Level(2, 412.5),
                new Head(4, "F1", 1.4),
                new Head(1, "F1", "not given"));
        edit(
                FLUME,
                "demand no longer met, head read beyond the rating, units in service, what combinations take",
                new Demand(0, 413.0),
                new Head(1, "F1", 40),
                new Units(6, 3),
                new Units(0, 2),
                new Flow(6, 9),
                new Level(5, 412.45));
        edit(
                FLUME,
                "many at once",
                new Entry("F1", "size", "2.4 m"),
                new Entry("F1", "z_f", 413.3),
                new Flow(3, 17),
                new Level(6, 416),
                new Head(0, "F1", 0.2),
                new Head(1, "F1", 9),
                new Demand(1, 5));

        edit(
                INLET,
                "channel wider and steeper, submerged readings refused",
                new Entry("A1", "b", 2.1),
                new Entry("A1", "S_0", 0.004),
                new Entry("F1", "submerged", "refused"));
        edit(INLET, "channel so shallow that flow is critical", new Entry("A1", "z_f", 22.4));
        edit(
                INLET,
                "sloping sides, a screen, walls too low, a jump; one channel for all",
                new Entry("A1", "m", 1.5),
                new Entry("A1", "K", 3),
                new Entry("A1", "z_w", 22.4),
                new Entry("A1", "inflow", "rapid, with a jump"),
                new Entry("A1", "serves", "all units"),
                new Units(3, 2));
        edit(
                INLET,
                "crest lower: submerged by the curve; a level typed where the curve served; flow beyond the curve; a demand",
                new Entry("F1", "z_f", 21.5),
                new Level(0, 22.1),
                new Flow(6, 1300),
                new Demand(2, 0.2));

        edit(WEIR, "notch wider", new Entry("W1", "b", 850));
        edit(WEIR, "notch as wide as the channel", new Entry("W1", "b", 1100));
        edit(WEIR, "notch too narrow", new Entry("W1", "b", 90));
        edit(WEIR, "width ratio in the zone that is refused", new Entry("W1", "b", 990));
        edit(WEIR, "width ratio at the end of that zone", new Entry("W1", "b", 880));
        edit(WEIR, "channel wider", new Entry("W1", "B", 2.75));
        edit(WEIR, "channel narrower, in the zone that is refused", new Entry("W1", "B", 0.66));
        edit(WEIR, "crest higher over the bed", new Entry("W1", "p", 1.2));
        edit(WEIR, "crest height under its limit", new Entry("W1", "p", 0.04));
        edit(WEIR, "crest level lower: less free", new Entry("W1", "z_c", 17.9));
        edit(WEIR, "crest level higher: all free", new Entry("W1", "z_c", 18.6));
        edit(WEIR, "no flow in a case", new Flow(1, 0));
        edit(WEIR, "flow beyond the range", new Flow(3, 900));
        edit(WEIR, "least flow", new Flow(0, 1e-4));
        edit(WEIR, "flow so small that the head is under the bracket", new Flow(0, 1e-7));
        edit(WEIR, "tailwater frees the nappe", new Level(4, 17.8));
        edit(WEIR, "tailwater takes the nappe's freedom", new Level(2, 18.2));
        edit(WEIR, "tailwater just where the nappe is no longer free", new Level(2, 18.19));
        edit(WEIR, "head read where none was given", new Head(0, "W1", 0.05));
        edit(WEIR, "head read taken out, in words", new Head(2, "W1", "not given"));
        edit(
                WEIR,
                "many at once",
                new Entry("W1", "b", 400),
                new Entry("W1", "B", 0.7),
                new Entry("W1", "p", 0.3),
                new Entry("W1", "z_c", 18.3),
                new Flow(4, 300),
                new Level(1, 18.29),
                new Head(3, "W1", 0.33));

        edit(
                POND,
                "the other sets and limits, another angle, a head read",
                new Entry("W1", "set", "US constants"),
                new Entry("V1", "set", "polynomial"),
                new Entry("V1", "rules", "US manual"),
                new Entry("V1", "theta", 53.13),
                new Head(1, "W1", 48));
        edit(
                POND,
                "weir as wide as the pond's outlet, with vents; crest higher, so that the V-notch is not free",
                new Entry("W1", "b", 2000),
                new Entry("W1", "z_d", 49.6),
                new Entry("W1", "A_v", 0.01),
                new Entry("W1", "K_v", 3),
                new Entry("W1", "z_c", 50.6));
        edit(
                POND,
                "width correction read from the figure; both weirs drowned; no flow in a case",
                new Entry("W1", "b", 1800),
                new Entry("W1", "k_y", 0.0035),
                new Level(3, 50.75),
                new Flow(0, 0),
                new Entry("V1", "p", 0.3));
    }
}
