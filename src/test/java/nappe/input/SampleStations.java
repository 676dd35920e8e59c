package nappe.input;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;
import nappe.input.BlankWriter.Chosen;
import nappe.method.MethodLibrary;
import nappe.source.BuiltInLibrary;
import nappe.unit.WorkingSystem;

/**
 * The samples in {@code sample-inputs}: invented stations, filled in as an engineer would. Run {@code main} to write them
 * anew.
 */
public final class SampleStations {
    private static final MethodLibrary METHODS = new MethodLibrary(new BuiltInLibrary());

    private SampleStations() {}

    /** The samples by file name. */
    public static Map<String, Supplier<byte[]>> all() {
        return Map.of(
                "canal-turnout.xlsx",
                () -> bytes(SampleStations::turnout),
                "headworks.xlsx",
                () -> bytes(SampleStations::headworks),
                "inlet-works.xlsx",
                () -> bytes(SampleStations::inlet),
                "pumping-main.xlsx",
                () -> bytes(PressureStations::pumpingMain),
                "reuse-line.xlsx",
                () -> bytes(PressureStations::reuseLine),
                "seepage-pond.xlsx",
                () -> bytes(SampleStations::pond),
                "return-weir.xlsx",
                () -> bytes(SampleStations::weir));
    }

    /** Their file names, in order. */
    public static List<String> names() {
        return all().keySet().stream().sorted().toList();
    }

    public static void main(String[] args) throws IOException {
        for (Map.Entry<String, Supplier<byte[]>> sample : all().entrySet()) {
            Files.write(
                    Path.of("sample-inputs", sample.getKey()), sample.getValue().get());
        }
    }

    private interface Filled {
        Filler fill() throws IOException;
    }

    private static byte[] bytes(Filled filled) {
        try {
            return filled.fill().bytes();
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    /** A blank for one element, to be filled in. */
    public static Filler blank(WorkingSystem system, String tag, String method) throws IOException {
        return filler(system, new Chosen(tag, method));
    }

    static Filler filler(WorkingSystem system, Chosen... elements) throws IOException {
        return new Filler(BlankWriter.bytes(system, List.of(elements), METHODS));
    }

    /** The headworks, open to changes. */
    public static Filler headworks() throws IOException {
        String brief = "Invented design brief DB-3, table 2";
        String river = "Invented river study RS-1, table 4";
        String drawing = "Invented drawing C-12, rev. 1";
        return filler(WorkingSystem.US, new Chosen("F1", "parshall-flume"), new Chosen("A1", "approach-channel"))
                .project("Project", "Quillwater Reclamation Works, headworks (fictional)")
                .project("Firm", "Any Firm of Engineers (fictional)")
                .project("Client", "Town of Nowhere Falls (fictional)")
                .project("Calculation number", "QW-H-017")
                .project("Subject", "Influent Parshall flume and its approach: range, free flow and levels")
                .project("Revision", "A")
                .project("Revision date", "2030-03-14")
                .project("Status", "preliminary")
                .project("Flow reported in", "MGD")
                .project("Head reported in", "in")
                .project("Elevations refer to", "invented plant datum, benchmark BM-2 at 420.00 ft")
                .project("Case worked in full", "Design, peak hour")
                .project(
                        "Purpose of release",
                        "Released for review of the sample only; not for bidding, construction or permit.")
                .project("Space for a seal on the cover", "yes")
                .row("Flows", "Start-up, minimum hour", "1 h", "2031", 0.5, "MGD", 412.2, "ft", "", brief, "assumed")
                .row(
                        "Flows",
                        "Start-up, average day",
                        "1 d",
                        "2031",
                        2.4,
                        "MGD",
                        412.4,
                        "ft",
                        "",
                        brief,
                        "known",
                        null,
                        5.6,
                        "in")
                .row("Flows", "Design, average day", "1 d", "2040", 5, "MGD", 412.6, "ft", "", brief, "known")
                .row("Flows", "Design, maximum month", "30 d", "2040", 6.8, "MGD", 412.7, "ft", "", brief, "known")
                .row("Flows", "Design, peak hour", "1 h", "2040", 12.5, "MGD", 413.1, "ft", "", brief, "known")
                .row(
                        "Flows",
                        "Design, peak hour, high river",
                        "1 h",
                        "2040",
                        12.5,
                        "MGD",
                        414.05,
                        "ft",
                        "25 years",
                        river,
                        "known")
                .row(
                        "Flows",
                        "Build-out, peak instantaneous",
                        "5 min",
                        "2055",
                        21,
                        "MGD",
                        413.7,
                        "ft",
                        "",
                        brief,
                        "assumed",
                        2)
                .row(
                        "Combinations",
                        "Build-out peak, high river",
                        "Build-out, peak instantaneous",
                        "Design, peak hour, high river",
                        "yes",
                        "Invented river study RS-1, section 6: one long storm brings both.")
                .row(
                        "Combinations",
                        "Least flow, high river",
                        "Start-up, minimum hour",
                        "Design, peak hour, high river",
                        "no",
                        "Invented river study RS-1, section 6: the river is high only after days of rain, when flow is above the"
                                + " average.")
                .entry("F1", "size", "3 ft", null, "Invented drawing C-12, rev. 1", "known")
                .entry("F1", "form", "1967 form", null, "Invented design brief DB-3, clause 4.3", "known")
                .entry("F1", "submerged", "refused", null, "Invented design brief DB-3, clause 4.3", "known")
                .entry("F1", "z_f", 412.5, "ft", "Invented drawing C-12, rev. 1", "known")
                .entry("A1", "serves", "one unit", null, drawing, "known")
                .entry("A1", "inflow", "tranquil", null, drawing, "known")
                .entry("A1", "b", 62, "in", drawing, "known")
                .entry("A1", "m", 0, "1", drawing, "known")
                .entry("A1", "z_f", 412.3, "ft", drawing, "known")
                .entry("A1", "L_c", 60, "ft", drawing, "known")
                .entry("A1", "S_0", 0.0005, "1", drawing, "known")
                .entry("A1", "n", 0.013, "1", "Invented design brief DB-3, table 5: concrete, some slime", "assumed")
                .entry("A1", "C_t", 0.1, "1", "Invented design brief DB-3, table 5: walls rounded", "assumed")
                .entry("A1", "K", 4.3, "1", "Invented screen sheet SC-1: bars half blinded", "assumed")
                .entry("A1", "z_w", 416.5, "ft", drawing, "known")
                .entry("A1", "L_s", 56, "ft", drawing, "known")
                .row(
                        "Demands",
                        "A1",
                        "f_b",
                        "at least",
                        1.5,
                        "ft",
                        "freeboard to the top of the channel walls",
                        "Invented design brief DB-3, clause 4.4")
                .row(
                        "Demands",
                        "A1",
                        "z_1",
                        "at most",
                        414.4,
                        "ft",
                        "water at the head of the channel stays under the floor drain of the screen room",
                        "Invented design brief DB-3, clause 4.5")
                .row(
                        "Demands",
                        "A1",
                        "V_m",
                        "at least",
                        1.5,
                        "ft/s",
                        "channel cleans itself at the daily peak of the design year",
                        "Invented design brief DB-3, clause 4.6",
                        "Design, peak hour")
                .row(
                        "Demands",
                        "F1",
                        "z_u",
                        "at most",
                        414.6,
                        "ft",
                        "water at the gauge stays under the crown of the incoming sewer",
                        "Invented design brief DB-3, clause 4.2")
                .row(
                        "Demands",
                        "F1",
                        "h_a",
                        "at least",
                        2,
                        "in",
                        "least head that the level instrument resolves",
                        "Invented instrument sheet IS-9")
                .row(
                        "Assumptions",
                        "The downstream levels hold with both screens in service.",
                        "Invented river study RS-1",
                        "project engineer",
                        "open")
                .row(
                        "Assumptions",
                        "The flume is built to the published dimensions of its size.",
                        "specification to follow",
                        "project engineer",
                        "closed")
                .row("References", "Invented design brief DB-3, edition of 2029")
                .row("References", "Invented river study RS-1, edition of 2028")
                .row(
                        "Requirements",
                        "Show that the flume measures from the start-up minimum hour to the build-out peak.",
                        "Invented design brief DB-3, clause 4.1",
                        "Overview")
                .row(
                        "Requirements",
                        "State the origin of each design flow.",
                        "Invented design brief DB-3, clause 2.3",
                        "Cases")
                .row("Revisions", "A", "2030-03-14", "First issue, preliminary.");
    }

    /** A flume of the ISO metric series below a tidal river, open to changes. */
    public static Filler inlet() throws IOException {
        String brief = "Invented design brief MG-1, table 3";
        String tide = "Invented estuary note EN-2, figure 4";
        String drawing = "Invented drawing MG-21, rev. 0";
        return filler(WorkingSystem.SI, new Chosen("F1", "parshall-flume"), new Chosen("A1", "approach-channel"))
                .project("Project", "Mossgate Point sewage works, inlet (fictional)")
                .project("Firm", "Any Firm of Engineers (fictional)")
                .project("Client", "Mossgate Point Drainage Board (fictional)")
                .project("Calculation number", "MP-I-002")
                .project("Subject", "Inlet flume and its approach: range, submerged flow at high tide, levels")
                .project("Revision", "0")
                .project("Revision date", "2031-09-08")
                .project("Status", "for checking")
                .project("Paper", "A4")
                .project("Flow reported in", "L/s")
                .project("Head reported in", "mm")
                .project("Elevations refer to", "invented harbour datum, 0.000 m at the old tide board")
                .project("Case worked in full", "Wet-weather peak, spring tide")
                .project("Purpose of release", "Released for checking of the sample only.")
                .project("Space for a seal on the cover", "no")
                .row("Flows", "Night minimum", "1 h", "2032", 22, "L/s", null, "m", "", brief, "known")
                .row("Flows", "Dry-weather average", "1 d", "2032", 85, "L/s", null, "m", "", brief, "known")
                .row(
                        "Flows",
                        "Dry-weather peak",
                        "1 h",
                        "2032",
                        170,
                        "L/s",
                        null,
                        "m",
                        "",
                        brief,
                        "known",
                        null,
                        255,
                        "mm")
                .row("Flows", "Wet-weather peak", "15 min", "2032", 420, "L/s", null, "m", "", brief, "known")
                .row(
                        "Flows",
                        "Wet-weather peak, spring tide",
                        "15 min",
                        "2032",
                        420,
                        "L/s",
                        22.2,
                        "m",
                        "1 year",
                        tide,
                        "known")
                .row("Flows", "Wet-weather peak, 2050", "15 min", "2050", 640, "L/s", null, "m", "", brief, "assumed")
                .row(
                        "Flows",
                        "Storm before the overflow spills",
                        "5 min",
                        "2050",
                        1.05,
                        "m3/s",
                        null,
                        "m",
                        "",
                        brief,
                        "assumed")
                .row("Flows", "Storm surge", "5 min", "2050", 640, "L/s", 22.62, "m", "100 years", tide, "known")
                .row("Tailwater curve", 0, "L/s", 21.4, "m", "Invented outfall calculation OC-7, table 1", "known")
                .row("Tailwater curve", 100, "L/s", 21.62, "m", "Invented outfall calculation OC-7, table 1", "known")
                .row("Tailwater curve", 300, "L/s", 21.9, "m", "Invented outfall calculation OC-7, table 1", "known")
                .row("Tailwater curve", 600, "L/s", 22.12, "m", "Invented outfall calculation OC-7, table 1", "known")
                .row("Tailwater curve", 1200, "L/s", 22.38, "m", "Invented outfall calculation OC-7, table 1", "known")
                .row(
                        "Combinations",
                        "Dry-weather peak at spring tide",
                        "Dry-weather peak",
                        "Wet-weather peak, spring tide",
                        "yes",
                        "Invented estuary note EN-2, section 3: the tide does not ask for rain.")
                .row(
                        "Combinations",
                        "Night minimum at the surge",
                        "Night minimum",
                        "Storm surge",
                        "no",
                        "Invented estuary note EN-2, section 5: surges come with days of rain.")
                .entry(
                        "F1",
                        "size",
                        "0.6 m",
                        null,
                        "Invented option report MG-OR, section 2: fits the old chamber",
                        "known")
                .entry("F1", "form", "subtraction", null, brief, "known")
                .entry("F1", "submerged", "accepted", null, "Invented permit draft MG-P, condition 6", "assumed")
                .entry("F1", "z_f", 21.85, "m", drawing, "known")
                .entry("A1", "serves", "one unit", null, drawing, "known")
                .entry("A1", "inflow", "tranquil", null, drawing, "known")
                .entry("A1", "b", 1.2, "m", drawing, "known")
                .entry("A1", "m", 0, "1", drawing, "known")
                .entry("A1", "z_f", 21.8, "m", drawing, "known")
                .entry("A1", "L_c", 15, "m", drawing, "known")
                .entry("A1", "S_0", 0.0005, "1", drawing, "known")
                .entry("A1", "n", 0.014, "1", "Invented design brief MG-1, table 6: rendered walls", "assumed")
                .entry("A1", "C_t", 0.1, "1", "Invented design brief MG-1, table 6", "assumed")
                .entry("A1", "K", 0, "1", "no screen in the channel", "known")
                .entry("A1", "z_w", 22.95, "m", drawing, "known")
                .entry("A1", "L_s", 13.5, "m", drawing, "known")
                .row(
                        "Demands",
                        "A1",
                        "f_b",
                        "at least",
                        300,
                        "mm",
                        "freeboard to the top of the channel walls",
                        "Invented permit draft MG-P, condition 8")
                .row(
                        "Demands",
                        "A1",
                        "z_1",
                        "at most",
                        22.6,
                        "m",
                        "water at the head of the channel stays under the crown of the incoming sewer",
                        "Invented permit draft MG-P, condition 9")
                .row(
                        "Demands",
                        "A1",
                        "V_m",
                        "at least",
                        0.45,
                        "m/s",
                        "channel cleans itself once a day",
                        "Invented design brief MG-1, clause 5.2",
                        "Dry-weather peak")
                .row(
                        "Assumptions",
                        "The overflow upstream holds the flow to the inlet at the storm flow stated.",
                        "Invented overflow note ON-1",
                        "project engineer",
                        "open")
                .row("References", "Invented design brief MG-1, edition of 2030")
                .row("References", "Invented estuary note EN-2, edition of 2029")
                .row(
                        "Requirements",
                        "Show what is measured at spring tide, and how high the water stands.",
                        "Invented permit draft MG-P, condition 7",
                        "Overview")
                .row("Revisions", "0", "2031-09-08", "First issue for checking.");
    }

    /** A V-notch for low flows above a contracted weir for high ones, open to changes. */
    public static Filler pond() throws IOException {
        String study = "Invented seepage study SS-4, table 2";
        String survey = "Invented brook survey BS-1, figure 3";
        String drawing = "Invented drawing HM-31, rev. 2";
        return filler(WorkingSystem.SI, new Chosen("W1", "rectangular-weir"), new Chosen("V1", "v-notch-weir"))
                .project("Project", "Hollow Marl storage pond, seepage gauging (fictional)")
                .project("Firm", "Any Firm of Engineers (fictional)")
                .project("Client", "Hollow Marl Water Users (fictional)")
                .project("Calculation number", "HM-S-009")
                .project(
                        "Subject", "V-notch at the toe drain and contracted weir at the pond outlet: ranges and levels")
                .project("Revision", "0")
                .project("Revision date", "2031-04-22")
                .project("Status", "for checking")
                .project("Paper", "A4")
                .project("Flow reported in", "L/s")
                .project("Head reported in", "mm")
                .project("Elevations refer to", "invented dam datum, 60.000 m at the crest stone")
                .project("Case worked in full", "After rain")
                .project("Purpose of release", "Released for checking of the sample only.")
                .project("Space for a seal on the cover", "no")
                .row(
                        "Flows",
                        "Dry season",
                        "1 d",
                        "2031",
                        1.6,
                        "L/s",
                        49.9,
                        "m",
                        "",
                        study,
                        "known",
                        null,
                        null,
                        "mm",
                        66,
                        "mm")
                .row("Flows", "After rain", "1 d", "2031", 9, "L/s", 49.95, "m", "", study, "known")
                .row("Flows", "Pond drawn down", "1 h", "2031", 70, "L/s", 50.1, "m", "", study, "assumed")
                .row(
                        "Flows",
                        "Storm, brook in flood",
                        "1 h",
                        "2031",
                        70,
                        "L/s",
                        50.32,
                        "m",
                        "25 years",
                        survey,
                        "known")
                .entry("W1", "set", "ISO 1438", null, "Invented monitoring plan MP-2, clause 3", "known")
                .entry("W1", "b", 500, "mm", drawing, "known")
                .entry("W1", "B", 2, "m", drawing, "known")
                .entry("W1", "p", 0.5, "m", drawing, "known")
                .entry("W1", "z_c", 50.2, "m", drawing, "known")
                .entry("W1", "h_n", 0.4, "m", drawing, "known")
                .entry("W1", "x_g", 1.2, "m", drawing, "known")
                .entry("W1", "L_a", 10.5, "m", drawing, "known")
                .entry("V1", "rules", "ISO 1438", null, "Invented monitoring plan MP-2, clause 3", "known")
                .entry("V1", "set", "curve points", null, "Invented monitoring plan MP-2, clause 3", "known")
                .entry("V1", "theta", 90, "deg", drawing, "known")
                .entry("V1", "B", 1.2, "m", drawing, "known")
                .entry("V1", "p", 0.5, "m", drawing, "known")
                .entry("V1", "z_c", 50.62, "m", drawing, "known")
                .entry("V1", "h_n", 0.25, "m", drawing, "known")
                .entry("V1", "x_g", 0.9, "m", drawing, "known")
                .row(
                        "Demands",
                        "V1",
                        "z_u",
                        "at most",
                        51.0,
                        "m",
                        "water at the V-notch stays under the mouth of the toe drain",
                        "Invented monitoring plan MP-2, clause 5")
                .row(
                        "Assumptions",
                        "No water joins between the two weirs.",
                        "site visit to follow",
                        "project engineer",
                        "open")
                .row("References", "Invented monitoring plan MP-2, edition of 2030")
                .row(
                        "Requirements",
                        "Show which of the two weirs measures at each flow.",
                        "Invented monitoring plan MP-2, clause 4",
                        "Overview")
                .row("Revisions", "0", "2031-04-22", "First issue for checking.");
    }

    /** The weir, open to changes. */
    public static Filler weir() throws IOException {
        String log = "Invented pump schedule PS-2";
        return filler(WorkingSystem.SI, new Chosen("W1", "rectangular-weir"))
                .project("Project", "Lantern Fen treatment plant, return water (fictional)")
                .project("Firm", "Any Firm of Engineers (fictional)")
                .project("Client", "Lantern Fen Water Board (fictional)")
                .project("Calculation number", "LF-W-004")
                .project("Subject", "Return-water weir: range, free nappe and levels")
                .project("Revision", "0")
                .project("Revision date", "2030-05-02")
                .project("Status", "for checking")
                .project("Paper", "A4")
                .project("Flow reported in", "L/s")
                .project("Head reported in", "mm")
                .project("Elevations refer to", "invented site datum, 0.000 m at the gate sill")
                .project("Case worked in full", "Four pumps")
                .project("Purpose of release", "Released for checking of the sample only.")
                .project("Space for a seal on the cover", "no")
                .row("Flows", "Leakage only", "1 h", "2030", 4, "L/s", 17.6, "m", "", log, "assumed")
                .row("Flows", "One pump", "1 h", "2030", 30, "L/s", 17.7, "m", "", log, "known")
                .row("Flows", "Two pumps", "1 h", "2030", 60, "L/s", 17.8, "m", "", log, "known", null, 142, "mm")
                .row("Flows", "Four pumps", "1 h", "2030", 120, "L/s", 17.95, "m", "", log, "known")
                .row("Flows", "Four pumps, pond full", "1 h", "2035", 432, "m3/h", 18.22, "m", "", log, "known")
                .entry("W1", "set", "ISO 1438", null, "Invented operating permit, item 6", "known")
                .entry("W1", "b", 600, "mm", "Invented drawing S-3", "known")
                .entry("W1", "B", 1.1, "m", "Invented drawing S-3", "known")
                .entry("W1", "p", 0.45, "m", "Invented drawing S-3", "known")
                .entry("W1", "z_c", 18.25, "m", "Invented drawing S-3", "known")
                .row(
                        "Assumptions",
                        "The approach channel is straight over ten widths.",
                        "site visit to follow",
                        "project engineer",
                        "open")
                .row("References", "Invented drawing S-3, rev. B")
                .row(
                        "Requirements",
                        "Show that the nappe is free at every pump setting.",
                        "Invented operating permit, item 7",
                        "Limits")
                .row("Revisions", "0", "2030-05-02", "First issue for checking.");
    }

    /** A trapezoidal long-throated flume at a canal turnout, open to changes. */
    public static Filler turnout() throws IOException {
        String roster = "Invented delivery roster DR-7";
        String drawing = "Invented drawing TC-07, rev. 2";
        return filler(
                        WorkingSystem.SI,
                        new Chosen("F1", "long-throat-trapezoidal"),
                        new Chosen("A1", "approach-channel"))
                .project("Project", "Thistledown Canal, turnout 7 (fictional)")
                .project("Firm", "Any Firm of Engineers (fictional)")
                .project("Client", "Thistledown Water Users (fictional)")
                .project("Calculation number", "TC-T-007")
                .project("Subject", "Turnout flume and its approach: range, modular flow and levels")
                .project("Revision", "0")
                .project("Revision date", "2032-02-20")
                .project("Status", "for checking")
                .project("Paper", "A4")
                .project("Flow reported in", "L/s")
                .project("Head reported in", "mm")
                .project("Elevations refer to", "invented canal datum, 0.000 m at the intake sill")
                .project("Case worked in full", "Full delivery")
                .project("Purpose of release", "Released for checking of the sample only.")
                .project("Space for a seal on the cover", "no")
                .row("Flows", "Leakage past the gate", "1 d", "2032", 4, "L/s", 52.25, "m", "", roster, "assumed")
                .row("Flows", "Least delivery", "1 d", "2032", 60, "L/s", 52.42, "m", "", roster, "known")
                .row(
                        "Flows",
                        "Usual delivery",
                        "1 d",
                        "2032",
                        180,
                        "L/s",
                        52.56,
                        "m",
                        "",
                        roster,
                        "known",
                        null,
                        280,
                        "mm")
                .row("Flows", "Full delivery", "1 d", "2032", 420, "L/s", 52.72, "m", "", roster, "known")
                .row(
                        "Flows",
                        "Usual delivery, check gate below shut",
                        "6 h",
                        "2032",
                        180,
                        "L/s",
                        52.78,
                        "m",
                        "",
                        roster,
                        "known")
                .entry("F1", "finish", "smooth", null, drawing, "known")
                .entry("F1", "modular", "losses", null, "Invented design note TN-2, clause 3", "known")
                .entry("F1", "b", 450, "mm", drawing, "known")
                .entry("F1", "m", 1, "1", drawing, "known")
                .entry("F1", "b_a", 600, "mm", drawing, "known")
                .entry("F1", "m_a", 1, "1", drawing, "known")
                .entry("F1", "b_t", 600, "mm", drawing, "known")
                .entry("F1", "m_t", 1, "1", drawing, "known")
                .entry("F1", "z_c", 52.4, "m", drawing, "known")
                .entry("F1", "p", 150, "mm", drawing, "known")
                .entry("F1", "L", 0.9, "m", drawing, "known")
                .entry("F1", "L_a", 1.5, "m", drawing, "known")
                .entry("F1", "L_b", 450, "mm", drawing, "known")
                .entry("F1", "L_d", 1.2, "m", drawing, "known")
                .entry("F1", "EM", 6, "1", drawing, "known")
                .entry("F1", "k_s", 0.2, "mm", "Invented design note TN-2, table 1: trowelled concrete", "assumed")
                .entry("F1", "nu", 1.14, "cSt", "Invented design note TN-2, table 1: water at 15 degrees", "assumed")
                .entry("F1", "z_b", 52.2, "m", drawing, "known")
                .entry("A1", "serves", "all units", null, drawing, "known")
                .entry("A1", "inflow", "tranquil", null, drawing, "known")
                .entry("A1", "b", 600, "mm", drawing, "known")
                .entry("A1", "m", 1, "1", drawing, "known")
                .entry("A1", "z_f", 52.25, "m", drawing, "known")
                .entry("A1", "L_c", 20, "m", drawing, "known")
                .entry("A1", "S_0", 0.0004, "1", drawing, "known")
                .entry("A1", "n", 0.014, "1", "Invented design note TN-2, table 1: trowelled concrete", "assumed")
                .entry("A1", "C_t", 0, "1", "no transition: the gauge stands in the channel", "known")
                .entry("A1", "K", 0, "1", "no screen", "known")
                .entry("A1", "z_w", 53.1, "m", drawing, "known")
                .entry("A1", "L_s", 18, "m", drawing, "known")
                .row(
                        "Demands",
                        "A1",
                        "f_b",
                        "at least",
                        0.15,
                        "m",
                        "freeboard to the top of the lining",
                        "Invented design note TN-2, clause 5")
                .row(
                        "Assumptions",
                        "The lateral below the flume is free of weed when its levels are as in the roster.",
                        roster,
                        "project engineer",
                        "open")
                .row("References", "Invented drawing TC-07, rev. 2")
                .row(
                        "Requirements",
                        "Say which deliveries are measured, and how high the canal stands when the check gate is shut.",
                        "Invented water order, item 4",
                        "Overview")
                .row("Revisions", "0", "2032-02-20", "First issue for checking.");
    }
}
