package nappe.input;

import static nappe.input.SampleStations.filler;

import java.io.IOException;
import nappe.input.BlankWriter.Chosen;
import nappe.unit.WorkingSystem;

/** Invented stations with meters in full pipes. */
public final class PressureStations {
    private PressureStations() {}

    /** A Venturi tube in a pumped main, with a U-tube as check gauge, open to changes. */
    public static Filler pumpingMain() throws IOException {
        String brief = "Invented design brief OB-2, table 1";
        String drawing = "Invented drawing OB-14, rev. 2";
        String sheet = "Invented instrument sheet OB-I3";
        return filler(WorkingSystem.SI, new Chosen("V1", "venturi-tube"))
                .project("Project", "Otterbeck ridge pumping main, meter chamber (fictional)")
                .project("Firm", "Any Firm of Engineers (fictional)")
                .project("Client", "Otterbeck Water District (fictional)")
                .project("Calculation number", "OB-M-011")
                .project("Subject", "Venturi tube in the pumped main: range, loss, lowest pressure, check gauge")
                .project("Revision", "0")
                .project("Revision date", "2031-02-17")
                .project("Status", "for checking")
                .project("Paper", "A4")
                .project("Flow reported in", "L/s")
                .project("Head reported in", "mm")
                .project("Elevations refer to", "invented district datum, 100.000 m at the old pump house step")
                .project("Case worked in full", "Two pumps")
                .project("Purpose of release", "Released for checking of the sample only.")
                .project("Space for a seal on the cover", "no")
                .row("Flows", "Trickle at night", "1 h", "2031", 30, "L/s", 131.4, "m", "", brief, "assumed")
                .row("Flows", "One pump", "1 h", "2031", 130, "L/s", 131.9, "m", "", brief, "known", null, 3.4, "kPa")
                .row(
                        "Flows",
                        "Two pumps",
                        "1 h",
                        "2031",
                        240,
                        "L/s",
                        133.1,
                        "m",
                        "",
                        brief,
                        "known",
                        null,
                        11.52,
                        "kPa",
                        94,
                        "mm")
                .row("Flows", "Three pumps", "1 h", "2040", 350, "L/s", 134.9, "m", "", brief, "known")
                .row(
                        "Flows",
                        "Three pumps, burst below",
                        "15 min",
                        "2040",
                        330,
                        "L/s",
                        124.2,
                        "m",
                        "",
                        brief,
                        "assumed")
                .entry("V1", "kind", "as cast", null, drawing, "known")
                .entry("V1", "reading", "two codes and memory", null, brief, "known")
                .entry(
                        "V1",
                        "loss",
                        "fit, 15 degree exit",
                        null,
                        "Invented design brief OB-2, clause 3.2: the largest",
                        "known")
                .entry("V1", "T", 8, "degC", "Invented water survey OB-W, winter", "known")
                .entry("V1", "T_x", 21, "degC", "Invented water survey OB-W, summer", "known")
                .entry("V1", "z_s", 120, "m", "Invented survey", "known")
                .entry("V1", "D", 500, "mm", drawing, "known")
                .entry("V1", "d", 250, "mm", drawing, "known")
                .entry("V1", "z_k", 124.6, "m", drawing, "known")
                .entry("V1", "L_p", 6, "m", drawing, "known")
                .entry("V1", "f_D", 0.018, "1", "Invented design brief OB-2, clause 3.3", "assumed")
                .entry("V1", "p_s", 30, "kPa", sheet, "known")
                .entry("V1", "gauge", "U-tube, heavier liquid", null, sheet, "known")
                .entry("V1", "rho_m", 13550, "kg/m3", "Invented instrument sheet OB-I3: mercury at 15 degrees", "known")
                .entry("V1", "R_x", 250, "mm", sheet, "known")
                .entry("V1", "fitting", "two or more 90 deg bends in different planes", null, drawing, "known")
                .entry("V1", "edition", "edition of 2003", null, "Invented design brief OB-2, clause 3.4", "known")
                .entry("V1", "L_s", 3.6, "m", drawing, "known")
                .entry("V1", "L_d", 2, "m", drawing, "known")
                .row(
                        "Demands",
                        "V1",
                        "z_u",
                        "at most",
                        136,
                        "m",
                        "grade line at the meter stays under what three pumps lift",
                        "Invented design brief OB-2, clause 2.5")
                .row(
                        "Assumptions",
                        "The grade line downstream is that of the old main, not yet measured.",
                        "Invented main study OB-S",
                        "project engineer",
                        "open")
                .row("References", "Invented design brief OB-2, edition of 2030")
                .row(
                        "Requirements",
                        "Show the least flow that is measured within the standard.",
                        "Invented design brief OB-2, clause 2.1",
                        "Limits")
                .row("Revisions", "0", "2031-02-17", "First issue for checking.");
    }

    /** An orifice plate with flange taps in a reuse line, in US customary units, open to changes. */
    public static Filler reuseLine() throws IOException {
        String brief = "Invented reuse plan RP-6, table 3";
        String drawing = "Invented drawing M-31, rev. C";
        return filler(WorkingSystem.US, new Chosen("O1", "orifice-plate"))
                .project("Project", "Sandwhistle Flats reuse line, orifice meter (fictional)")
                .project("Firm", "Any Firm of Engineers (fictional)")
                .project("Client", "Sandwhistle Flats Irrigators (fictional)")
                .project("Calculation number", "SF-R-003")
                .project("Subject", "Orifice plate with flange taps: range, loss and lowest pressure")
                .project("Revision", "B")
                .project("Revision date", "2032-06-30")
                .project("Status", "preliminary")
                .project("Flow reported in", "MGD")
                .project("Head reported in", "in")
                .project("Elevations refer to", "invented mesa datum, benchmark SW-1 at 4180.00 ft")
                .project("Case worked in full", "Summer delivery")
                .project(
                        "Purpose of release",
                        "Released for review of the sample only; not for bidding, construction or permit.")
                .project("Space for a seal on the cover", "yes")
                .row("Flows", "Hydrant drip", "1 h", "2032", 0.08, "MGD", 4192, "ft", "", brief, "assumed")
                .row("Flows", "Winter delivery", "1 d", "2032", 0.9, "MGD", 4192, "ft", "", brief, "known")
                .row(
                        "Flows",
                        "Summer delivery",
                        "1 d",
                        "2032",
                        2.6,
                        "MGD",
                        4194,
                        "ft",
                        "",
                        brief,
                        "known",
                        null,
                        90,
                        "inH2O(60degF)")
                .row("Flows", "Fire reserve", "2 h", "2040", 3.6, "MGD", 4195, "ft", "", brief, "assumed")
                .row("Flows", "Filling an empty pond", "6 h", "2032", 1.4, "MGD", 4183, "ft", "", brief, "known")
                .entry("O1", "taps", "flange", null, drawing, "known")
                .entry("O1", "T", 55, "degF", "Invented effluent record ER-1, coldest month", "known")
                .entry("O1", "T_x", 84, "degF", "Invented effluent record ER-1, hottest month", "known")
                .entry("O1", "z_s", 4180, "ft", "Invented survey", "known")
                .entry("O1", "D", 12, "in", drawing, "known")
                .entry("O1", "d", 7.2, "in", drawing, "known")
                .entry("O1", "z_k", 4184.5, "ft", drawing, "known")
                .entry("O1", "L_p", 30, "ft", drawing, "known")
                .entry("O1", "f_D", 0.019, "1", "Invented reuse plan RP-6, section 5", "assumed")
                .entry("O1", "p_s", 150, "inH2O(60degF)", "Invented instrument sheet IS-4", "known")
                .entry("O1", "gauge", "transmitter only", null, "Invented instrument sheet IS-4", "known")
                .entry("O1", "fitting", "90 deg tee or mitre bend", null, drawing, "known")
                .entry("O1", "second", "none", null, drawing, "known")
                .entry("O1", "L_s", 32, "ft", drawing, "known")
                .entry("O1", "L_d", 8, "ft", drawing, "known")
                .entry("O1", "L_2", 0, "ft", drawing, "known")
                .row(
                        "Demands",
                        "O1",
                        "p_l",
                        "at most",
                        2.5,
                        "psi",
                        "permanent loss of the plate in the summer delivery",
                        "Invented reuse plan RP-6, section 5",
                        "Summer delivery")
                .row(
                        "Assumptions",
                        "The plate is new and its edge sharp.",
                        "inspection each spring",
                        "operator",
                        "open")
                .row("References", "Invented reuse plan RP-6, edition of 2031")
                .row(
                        "Requirements",
                        "State which deliveries are measured within the standard.",
                        "Invented reuse plan RP-6, section 6",
                        "Overview")
                .row("Revisions", "B", "2032-06-30", "Plate of 7.2 in for the summer delivery.");
    }
}
