package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.time.LocalDate;
import nappe.formula.Value;
import nappe.station.Design;
import nappe.station.Design.Origin;
import nappe.station.Design.Typed;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class InputReaderTest {
    @TempDir
    Path folder;

    private Design read(Filler filler) throws IOException {
        return InputReader.read(filler.save(folder.resolve("headworks.xlsx")), Samples.METHODS);
    }

    @Test
    void filledBlankReadsBackAsItWasFilled() throws IOException {
        Design design = read(Samples.filled());

        assertThat(design.project())
                .isEqualTo(new Design.Project(
                        "Invented works at Nowhere",
                        "Any Firm",
                        "Any Town",
                        "C-001",
                        "Trough and reach",
                        "A",
                        LocalDate.of(2030, 1, 31),
                        "preliminary",
                        WorkingSystem.US,
                        true,
                        Unit.parse("MGD"),
                        Unit.parse("in"),
                        "invented datum",
                        "Peak hour",
                        "For trying out only.",
                        true));
        assertThat(design.elements()).extracting(Design.Element::tag).containsExactly("F1", "R1");
        assertThat(design.elements().get(0).title()).isEqualTo("Trough");
        assertThat(design.elements().get(0).typed().keySet()).containsExactly("size", "z_f", "D", "d", "u_r", "theta");
        assertThat(design.elements().get(0).typed().get("size").value()).isEqualTo(Value.word("3 ft"));
        assertThat(design.elements().get(0).typed().get("D"))
                .isEqualTo(new Typed(
                        Value.of(48), Unit.parse("in"), "invented drawing 1", "assumed", new Origin("F1", "C9")));
        assertThat(design.elements().get(0).typed().get("d").value()).isEqualTo(new Value.None(Value.NOT_GIVEN));
        assertThat(design.cases())
                .extracting(Design.FlowCase::name)
                .containsExactly("Least hour", "Peak hour", "Peak hour, river low");
        assertThat(design.cases().get(0).year()).isEqualTo("2030");
        assertThat(design.cases().get(1).typed().get("F1.h_g").value()).isEqualTo(Value.of(1.25));
        assertThat(design.cases().get(2).tailwater().value()).isEqualTo(new Value.None(Value.NOT_GIVEN));
        assertThat(design.demands().get(0).value().unit()).isEqualTo(Unit.parse("ft"));
        assertThat(design.demands().get(0).atMost()).isTrue();
        assertThat(design.assumptions())
                .containsExactly(new Design.Assumption("The floor is level.", "new work", "the surveyor", true));
        assertThat(design.references()).containsExactly("Invented drawing 1, edition of 2029");
        assertThat(design.requirements())
                .containsExactly(new Design.Requirement("Show the least flow.", "invented rule 2", "All cases"));
        assertThat(design.revisions()).containsExactly(new Design.RevisionNote("A", "2030-01-31", "First issue."));
    }
}
