package nappe.deliver.xlsx;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.calculation.Sheet;
import nappe.formula.Value;
import nappe.unit.Unit;
import org.junit.jupiter.api.Test;

class CellNamesTest {
    private int row;

    @Test
    void codesBecomeNamesThatAreNoAddresses() {
        assertThat(names("F1.07", "F107", "R1C1", "C", "07", "Reach A/3", "true"))
                .containsExactly("F1_07", "line_F107", "line_R1C1", "line_C", "line_07", "Reach_A_3", "line_true");
    }

    @Test
    void namesThatDifferInCapitalsOnlyAreToldApart() {
        assertThat(names("F1.a", "f1.A", "F1 a")).containsExactly("F1_a", "f1_A_a0", "F1_a_b0");
    }

    private List<String> names(String... codes) {
        List<Block.Line> lines = new ArrayList<>();
        for (String code : codes) {
            Cell cell = Cell.typed(Cell.Kind.ENTRY, new Place("S", ++row, 6), "", Unit.one(), Value.of(1));
            lines.add(new Block.Line(Block.LineKind.QUANTITY, code, "", "", "", "", "", cell, List.of()));
        }
        Sheet sheet = new Sheet(1, "S", "S", List.of(new Block.Lines(4, List.of(), 0, lines)));
        return List.copyOf(CellNames.of(List.of(sheet)).keySet());
    }
}
