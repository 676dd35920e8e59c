package nappe.input;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;
import nappe.input.BlankWriter.Chosen;
import nappe.unit.WorkingSystem;

/** An invented station, filled in. */
final class Samples {
    static final FakeMethods METHODS = new FakeMethods();
    static final List<Chosen> ELEMENTS = List.of(new Chosen("F1", "trough"), new Chosen("R1", "reach"));

    private Samples() {}

    static byte[] blank() {
        try {
            return BlankWriter.bytes(WorkingSystem.US, ELEMENTS, METHODS);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Every sheet filled in without a fault. */
    static Filler filled() {
        try {
            return new Filler(blank())
                    .project("Project", "Invented works at Nowhere")
                    .project("Firm", "Any Firm")
                    .project("Client", "Any Town")
                    .project("Calculation number", "C-001")
                    .project("Subject", "Trough and reach")
                    .project("Revision", "A")
                    .project("Revision date", "2030-01-31")
                    .project("Elevations refer to", "invented datum")
                    .project("Case worked in full", "peak HOUR")
                    .project("Purpose of release", "For trying out only.")
                    .row("Flows", "Least hour", "1 h", 2030, 1.5, "MGD", 100.25, "ft", "", "invented", "known")
                    .row(
                            "Flows",
                            "Peak hour",
                            "1 h",
                            "2050",
                            12.5,
                            "MGD",
                            101.5,
                            "ft",
                            "100 years",
                            "invented",
                            "assumed",
                            null,
                            1.25,
                            "ft")
                    .row(
                            "Flows",
                            "Peak hour, river low",
                            "1 h",
                            "2050",
                            12.5,
                            "MGD",
                            null,
                            null,
                            "",
                            "invented",
                            "assumed")
                    .entry("F1", "size", "3 FT", null, "invented", "known")
                    .entry("F1", "z_f", 99.5, "ft", "invented drawing 1", "known")
                    .entry("F1", "D", 48, "in", "invented drawing 1", "assumed")
                    .entry("F1", "theta", 45, "deg", "invented drawing 1", "known")
                    .entry("R1", "L", 120, "ft", "invented drawing 2", "known")
                    .entry("R1", "S_0", -0.001, "1", "invented drawing 2", "known")
                    .row("Demands", "F1", "h_max", "at most", 2.5, "ft", "head stays in range", "invented rule 1")
                    .row("Assumptions", "The floor is level.", "new work", "the surveyor", "open")
                    .row("References", "Invented drawing 1, edition of 2029")
                    .row("Requirements", "Show the least flow.", "invented rule 2", "All cases")
                    .row("Revisions", "A", "2030-01-31", "First issue.");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
