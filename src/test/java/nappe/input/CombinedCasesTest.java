package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.nio.file.Path;
import nappe.formula.Value;
import nappe.station.Design;
import nappe.unit.Unit;
import org.apache.poi.ss.usermodel.Row;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Units in service, tailwater curve, combinations and demands in one case: as typed, and what is refused. */
class CombinedCasesTest {
    private static final String CURVE = "Tailwater curve";

    @TempDir
    Path folder;

    private static Filler filled() {
        return Samples.filled()
                .set("Flows", "K9", 2)
                .row(CURVE, 1, "MGD", 100, "ft", "invented study", "known")
                .row(CURVE, 5000, "gpm", 31, "m", "invented study", "assumed")
                .row(CURVE, 20, "MGD", 31, "m", "invented study", "assumed")
                .row("Combinations", "Flood at least flow", "Least hour", "peak  HOUR", "yes", "invented study")
                .row("Combinations", "Low at peak", "Peak hour", "Least hour", "No", "invented letter")
                .row("Demands", "F1", "h_max", "at least", 0.1, "ft", "scour", "invented rule 2", "LEAST hour")
                .row(
                        "Demands",
                        "F1",
                        "h_max",
                        "at least",
                        0.2,
                        "ft",
                        "scour",
                        "invented rule 2",
                        "flood at least FLOW");
    }

    private Design read(Filler filler) throws IOException {
        return InputReader.read(filler.save(folder.resolve("station.xlsx")), Samples.METHODS);
    }

    private String faults(Filler filler) throws IOException {
        Path file = filler.save(folder.resolve("station.xlsx"));
        InputRefused refused = catchThrowableOfType(InputRefused.class, () -> InputReader.read(file, Samples.METHODS));
        assertThat(refused).as("refused").isNotNull();
        return refused.getMessage();
    }

    /** The row, counted from 1, of a sheet whose first column holds the text. */
    private static int row(Filler filler, String sheet, String text) {
        int[] found = new int[1];
        filler.change(w -> w.getSheet(sheet).forEach(r -> {
            if (r.getCell(0) != null && r.getCell(0).toString().equals(text)) {
                found[0] = r.getRowNum() + 1;
            }
        }));
        assertThat(found[0]).as(text).isPositive();
        return found[0];
    }

    /** The fault where one cell of a row is typed otherwise. */
    private String fault(String sheet, String inColumnA, String column, Object value) throws IOException {
        Filler filler = filled();
        return faults(filler.set(sheet, column + row(filler, sheet, inColumnA), value));
    }

    @Test
    void allOfItIsReadAsTyped() throws IOException {
        Design design = read(filled());
        assertThat(design.cases().get(0).units().value()).isEqualTo(Value.of(2));
        assertThat(design.cases().get(1).units().value()).isEqualTo(new Value.None(Value.NOT_GIVEN));
        assertThat(design.levels()).hasSize(3);
        assertThat(design.levels().get(1).flow().unit()).isEqualTo(Unit.parse("gpm"));
        assertThat(design.levels().get(1).level().value()).isEqualTo(Value.of(31));
        assertThat(design.levels().get(1).level().standing()).isEqualTo("assumed");
        assertThat(design.combinations())
                .extracting(
                        Design.Combination::name,
                        Design.Combination::flowOf,
                        Design.Combination::levelOf,
                        Design.Combination::canCoincide,
                        Design.Combination::basis)
                .containsExactly(
                        org.assertj.core.groups.Tuple.tuple(
                                "Flood at least flow", "Least hour", "Peak hour", true, "invented study"),
                        org.assertj.core.groups.Tuple.tuple(
                                "Low at peak", "Peak hour", "Least hour", false, "invented letter"));
        assertThat(design.demands())
                .extracting(Design.Demand::inCase)
                .containsExactly("", "Least hour", "Flood at least flow");
    }

    @Test
    void workbookFromBeforeThereWasAnyOfItIsRead() throws IOException {
        Design now = read(Samples.filled());
        Design then = read(Samples.filled().change(w -> {
            w.removeSheetAt(w.getSheetIndex(CURVE));
            w.removeSheetAt(w.getSheetIndex("Combinations"));
            for (Row row : w.getSheet("Flows")) {
                if (row.getCell(10) != null) {
                    row.removeCell(row.getCell(10));
                }
            }
            for (Row row : w.getSheet("Demands")) {
                if (row.getCell(7) != null) {
                    row.removeCell(row.getCell(7));
                }
            }
        }));
        assertThat(then.demands()).isEqualTo(now.demands());
        assertThat(then.combinations()).isEmpty();
        assertThat(then.levels()).isEmpty();
        assertThat(then.cases()).extracting(one -> one.units().value()).containsOnly(new Value.None(Value.NOT_GIVEN));
        assertThat(then.cases())
                .extracting(Design.FlowCase::flow)
                .isEqualTo(now.cases().stream().map(Design.FlowCase::flow).toList());
    }

    @Test
    void unitsInServiceAreAWholeNumberUpToFifty() throws IOException {
        assertThat(fault("Flows", "Least hour", "K", 2.5))
                .isEqualTo("station.xlsx, sheet Flows, cell K9: 2.5 can't be the number of units in service; write a "
                        + "whole number from 1 to 50, or leave it blank for one (fault: count-expected)");
        for (Object wrong : new Object[] {0, -1, 51}) {
            assertThat(fault("Flows", "Least hour", "K", wrong)).contains("cell K9", "(fault: count-expected)");
        }
        assertThat(fault("Flows", "Least hour", "K", "two")).contains("cell K9", "(fault: number-expected)");
        Filler fifty = filled();
        assertThat(read(fifty.set("Flows", "K9", 50)).cases().get(0).units().value())
                .isEqualTo(Value.of(50));
    }

    @Test
    void flowsOfTheCurveRiseAndItsLevelsDoNotFall() throws IOException {
        int first = row(filled(), CURVE, "1.0");
        assertThat(fault(CURVE, "5000.0", "A", 690))
                .isEqualTo("station.xlsx, sheet Tailwater curve, cell A" + (first + 1)
                        + ": 690 gpm is not above the 1 MGD in A" + first
                        + "; write the flows rising from row to row (fault: curve-not-rising)");
        assertThat(fault(CURVE, "5000.0", "C", 30))
                .isEqualTo("station.xlsx, sheet Tailwater curve, cell C" + (first + 1)
                        + ": 30 m is below the 100 ft in C" + first
                        + "; the water stands no lower at a greater flow, so check both rows (fault: curve-falling)");
        assertThat(fault(CURVE, "20.0", "A", 7.2)).contains("7.2 MGD is not above the 5000 gpm");
    }

    @Test
    void aCurveHasTwoRowsAtLeastAndAllThatARowNeeds() throws IOException {
        assertThat(faults(Samples.filled().row(CURVE, 1, "MGD", 100, "ft", "invented study", "known")))
                .contains("sheet Tailwater curve, cell A", "(fault: curve-too-short)");
        assertThat(fault(CURVE, "5000.0", "C", "")).contains("the water level is missing", "(fault: entry-missing)");
        assertThat(fault(CURVE, "5000.0", "B", "ft")).contains("(fault: unit-dimension)");
        assertThat(fault(CURVE, "5000.0", "A", -1)).contains("(fault: sign-impossible)");
        assertThat(fault(CURVE, "5000.0", "F", "")).contains("the standing is missing");
    }

    @Test
    void namesOfCombinationsAreTheirOwnAndTheirCasesThere() throws IOException {
        assertThat(fault("Combinations", "Low at peak", "A", "PEAK hour"))
                .contains("\"PEAK hour\" is the name of a case on the sheet Flows too", "(fault: case-twice)");
        assertThat(fault("Combinations", "Low at peak", "A", "Flood at LEAST flow"))
                .contains("is the name of a combination in A", "(fault: case-twice)");
        assertThat(fault("Combinations", "Low at peak", "B", "Peek hour"))
                .contains("\"Peek hour\" is the name of no case; did you mean Peak hour?", "(fault: case-unknown)");
        assertThat(fault("Combinations", "Low at peak", "C", "Flood at least flow"))
                .contains("(fault: case-unknown)");
        assertThat(fault("Combinations", "Low at peak", "D", "perhaps")).contains("(fault: word-unknown)");
        for (String column : new String[] {"B", "C", "D", "E"}) {
            assertThat(fault("Combinations", "Low at peak", column, "")).contains("(fault: entry-missing)");
        }
    }

    @Test
    void aDemandInOneCaseNamesOneThatIsJudged() throws IOException {
        Filler unknown = Samples.filled();
        int demand = row(unknown, "Demands", "F1");
        assertThat(faults(unknown.set("Demands", "H" + demand, "Leest hour")))
                .isEqualTo("station.xlsx, sheet Demands, cell H" + demand
                        + ": \"Leest hour\" is the name of no case; did you mean Least hour? (fault: case-unknown)");
        assertThat(faults(filled().set("Demands", "H" + demand, "Low at peak")))
                .contains("cell H" + demand, "cannot coincide", "(fault: case-not-judged)");
    }

    @Test
    void whatIsMisnamedIsNotLostInSilence() throws IOException {
        int head = row(filled(), "Flows", "Case");
        assertThat(faults(filled().set("Flows", "K" + head, "Unit in service")))
                .isEqualTo("station.xlsx, sheet Flows, cell K" + head
                        + ": \"Unit in service\" is not a column of this sheet; did you mean Units in service? "
                        + "(fault: head-word-unknown)");
        assertThat(faults(filled().change(w -> w.setSheetName(w.getSheetIndex("Combinations"), "Combined"))))
                .contains(
                        "sheet Combined: the sheet has the columns of the sheet Combinations", "(fault: sheet-stray)");
    }

    @Test
    void allFaultsAreToldAtOnce() throws IOException {
        Filler filler = filled();
        String told = faults(filler.set("Flows", "K9", 0)
                .set(CURVE, "A" + row(filler, CURVE, "5000.0"), 690)
                .set("Combinations", "B" + row(filler, "Combinations", "Low at peak"), "none")
                .set("Demands", "H" + row(filler, "Demands", "F1"), "none"));
        assertThat(told.lines()).hasSize(4);
    }
}
