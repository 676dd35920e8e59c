package nappe.figure;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import nappe.calculation.Block;
import nappe.results.Bars;
import nappe.results.Curve;
import nappe.results.Drawing;
import nappe.results.Results;
import nappe.unit.WorkingSystem;
import org.junit.jupiter.api.Test;

class DraftingTest {
    private static final Results FOOT = DrawnStation.flume(WorkingSystem.US, "1 ft", 4, 100.3);

    private static Drawing drawing(Results results) {
        return (Drawing) java.util.Objects.requireNonNull(results.figures().get("X1 geometry"));
    }

    private static Curve curve(Results results) {
        return (Curve) java.util.Objects.requireNonNull(results.figures().get("X1 rating"));
    }

    private static List<Drawing.Part> parts(Results results) {
        return drawing(results).views().stream()
                .flatMap(view -> view.parts().stream())
                .toList();
    }

    private static List<String> points(Drawing.Path path) {
        return path.points().stream()
                .map(p -> String.format(Locale.ROOT, "%.4f %.4f", p.x(), p.y()))
                .toList();
    }

    private static List<String> dimensioned(Results results) {
        return parts(results).stream()
                .filter(Drawing.Dimension.class::isInstance)
                .map(part -> ((Drawing.Dimension) part).value().symbol())
                .toList();
    }

    /** Inches of the table over 12: B 52.875, D 33.25, W 12, F 24, G 36, C 24. */
    @Test
    void theWallsOfAFlumeAreThoseOfItsTable() {
        List<Drawing.Path> walls = paths(Drawing.Pen.WALL);
        assertThat(points(walls.get(0)))
                .containsExactly("-4.4063 1.3854", "0.0000 0.5000", "2.0000 0.5000", "5.0000 1.0000");
        assertThat(points(walls.get(1)))
                .containsExactly("-4.4063 -1.3854", "0.0000 -0.5000", "2.0000 -0.5000", "5.0000 -1.0000");
    }

    /** N 9 in and K 3 in below the crest. */
    @Test
    void theFloorFallsIntoTheThroatAndRisesAgain() {
        assertThat(points(paths(Drawing.Pen.FLOOR).get(0)))
                .containsExactly("-4.4063 0.0000", "0.0000 0.0000", "2.0000 -0.7500", "5.0000 -0.2500");
    }

    private static List<Drawing.Path> paths(Drawing.Pen pen) {
        return parts(FOOT).stream()
                .filter(part -> part instanceof Drawing.Path path && path.pen() == pen)
                .map(Drawing.Path.class::cast)
                .toList();
    }

    /** 36 in along the wall, whose axial share is 52.875 in 54.0. */
    @Test
    void theGaugeStandsAtItsPlaceOnTheWall() {
        Drawing.Gauge gauge = (Drawing.Gauge) parts(FOOT).stream()
                .filter(Drawing.Gauge.class::isInstance)
                .findFirst()
                .orElseThrow();
        assertThat(Math.hypot(gauge.at().x(), gauge.at().y() - 0.5))
                .isCloseTo(3, org.assertj.core.data.Offset.offset(1e-12));
        assertThat(gauge.at().y()).isBetween(0.5, 1.3854);
    }

    @Test
    void everyPrintedQuantityIsACellOfTheElementsOwnSheet() {
        assertThat(parts(FOOT).stream().flatMap(DraftingTest::quantities))
                .hasSizeGreaterThan(12)
                .allSatisfy(quantity -> {
                    assertThat(quantity.cell().place().sheet()).isEqualTo("X1");
                    assertThat(quantity.cell().symbol()).isEqualTo(quantity.symbol());
                });
    }

    private static Stream<Drawing.Quantity> quantities(Drawing.Part part) {
        return part instanceof Drawing.Dimension dimension
                ? Stream.of(dimension.value())
                : part instanceof Drawing.Level level
                        ? Stream.of(level.value())
                        : part instanceof Drawing.Water water && water.level() != null
                                ? Stream.of(water.level())
                                : Stream.of();
    }

    @Test
    void aDrownedFlumeHasABoundingLevelAndNoHeadAtItsGaugeAndSaysSo() {
        Results drowned = DrawnStation.flume(WorkingSystem.US, "1 ft", 4, 101.3);
        assertThat(dimensioned(drowned)).doesNotContain("h_a").contains("L_B", "W");
        assertThat(drawing(drowned).notes())
                .startsWith(
                        "State of flow: drowned.",
                        "Water level at the gauge: bounding level, not a measurement.",
                        "Not drawn, since there is no result: head at the gauge, where it measures h_a.");
        assertThat(curve(drowned).missing()).contains("Case drawn is not marked: head at the gauge: no result.");
    }

    @Test
    void aLevelThatWasNotTypedIsNotGiven() {
        Results none = DrawnStation.flume(WorkingSystem.US, "2 ft", 10, Double.NaN);
        assertThat(drawing(none).notes())
                .anySatisfy(note -> assertThat(note)
                        .startsWith("Not drawn, since there is no value given: ")
                        .contains("water level downstream z_t"));
    }

    @Test
    void aSizeWithoutDimensionsIsNotToScale() {
        Results metric = DrawnStation.flume(WorkingSystem.SI, "0.6 m", 0.3, 99.9);
        assertThat(drawing(metric).schematic()).isEqualTo("the dimensions of this size are not given");
        assertThat(dimensioned(metric)).containsExactly("W", "h_a");
        assertThat(drawing(metric).notes())
                .contains("Not drawn, since there is no value given: a, L_A, L_D, L_C, L_B, L_F, L_G, L_E, L_K, L_N.");
        assertThat(drawing(FOOT).schematic()).isEmpty();
    }

    @Test
    void aTailwaterFarBelowIsSaidAndNotDrawn() {
        Results deep = DrawnStation.flume(WorkingSystem.US, "1 ft", 4, 60);
        assertThat(drawing(deep).notes())
                .contains("The water level downstream is not drawn: it is far above or below the flume.");
    }

    @Test
    void theCurveHasTheEndsOfItsRangesAndItsCases() {
        Curve curve = curve(FOOT);
        assertThat(curve.points()).hasSize(21);
        assertThat(curve.cases()).extracting(Curve.Case::name).containsExactly("drawn", "half of it");
        assertThat(curve.ends())
                .extracting(end -> end.words() + " " + end.value())
                .containsExactly("least head 0.1", "greatest head 2.5", "least flow 0.11", "greatest flow 16.1");
    }

    @Test
    void aBarStandsForEveryLimitOfTheSummary() {
        Bars bars = (Bars) java.util.Objects.requireNonNull(FOOT.figures().get("limits"));
        Block.Table summary = FOOT.sheets().stream()
                .filter(sheet -> sheet.name().equals("Limits"))
                .flatMap(sheet -> sheet.blocks().stream())
                .filter(Block.Table.class::isInstance)
                .map(Block.Table.class::cast)
                .findFirst()
                .orElseThrow();
        assertThat(bars.bars()).hasSize(summary.rows().size());
    }
}
