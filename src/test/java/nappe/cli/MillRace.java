package nappe.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import nappe.input.Filler;

/** The station of the walk-through in {@code src/docs/house-methods.md}: an invented weir by the house's own method. */
final class MillRace {
    /** The house folder of the walk-through. */
    static final Path HOUSE = Path.of("src/docs/house-example");

    private MillRace() {}

    /** Fills in the blank as the page says. */
    static Filler filled(Path blank) throws IOException {
        String brief = "Invented design brief MB-1, table 1";
        String drawing = "Invented drawing MR-2";
        return new Filler(Files.readAllBytes(blank))
                .project("Project", "Alder Mill fish pass, head race (fictional)")
                .project("Firm", "Any Firm of Engineers (fictional)")
                .project("Client", "Parish of Nowhere (fictional)")
                .project("Calculation number", "AM-W-001")
                .project("Subject", "Mill race weir: range and levels")
                .project("Revision", "A")
                .project("Revision date", "2030-09-02")
                .project("Elevations refer to", "invented site datum")
                .project("Purpose of release", "Released for trying out only.")
                .row("Flows", "Dry summer", "1 d", "2031", 60, "L/s", 9.9, "m", "", brief, "known")
                .row("Flows", "Mean flow", "1 d", "2031", 0.25, "m3/s", 10.05, "m", "", brief, "known")
                .row("Flows", "Flood in the tailwater", "1 h", "2031", 0.25, "m3/s", 10.4, "m", "", brief, "assumed")
                .entry("W1", "finish", "smooth", null, drawing, "known")
                .entry("W1", "b", 1, "m", drawing, "known")
                .entry("W1", "L_b", 0.8, "m", drawing, "known")
                .entry("W1", "r", 100, "mm", drawing, "known")
                .entry("W1", "p", 0.4, "m", drawing, "known")
                .entry("W1", "z_c", 10, "m", drawing, "known")
                .row("Revisions", "A", "2030-09-02", "First issue, preliminary.");
    }
}
