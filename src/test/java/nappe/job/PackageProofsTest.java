package nappe.job;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TimeZone;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.deliver.xlsx.Recalculated;
import nappe.deliver.xlsx.Retyper;
import nappe.deliver.xlsx.Spoiler;
import nappe.deliver.xlsx.XlsxDelivery;
import nappe.formula.Value;
import nappe.results.Results;
import nappe.unit.WorkingSystem;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/** What must always hold between the package as computed here and its workbook in other hands. */
class PackageProofsTest {
    @TempDir
    Path folder;

    @ParameterizedTest
    @EnumSource(WorkingSystem.class)
    void twoSpreadsheetProgramsComputeEveryCellAlike(WorkingSystem system) throws IOException {
        Results results = PretendStation.AS_ISSUED.done(system).results();
        Path spoilt = Files.write(folder.resolve("spoilt.xlsx"), Spoiler.spoil(XlsxDelivery.render(results)));
        assertThat(Recalculated.disagreements(Recalculated.byGnumeric(spoilt), results))
                .isEmpty();
        assertThat(Recalculated.disagreements(Recalculated.byLibreOffice(spoilt), results))
                .isEmpty();
    }

    static List<PretendStation> changes() {
        PretendStation issued = PretendStation.AS_ISSUED;
        List<Double> noLevel = issued.levels();
        return List.of(
                new PretendStation(99, issued.flows(), noLevel, 13.2, 24),
                new PretendStation(101.25, List.of(1.0, 0.0, 3.0, 9.0, 12.0), noLevel, 13.2, 24),
                new PretendStation(100, issued.flows(), List.of(Double.NaN, 103.0, 104.0, 99.0, 100.0), 13.2, 24),
                new PretendStation(101.25, issued.flows(), noLevel, 9, 72));
    }

    @ParameterizedTest
    @MethodSource("changes")
    void anEntryTypedIntoTheWorkbookGivesWhatANewIssueGives(PretendStation changed) throws IOException {
        Job.Done before = PretendStation.AS_ISSUED.done(WorkingSystem.US);
        byte[] issued = XlsxDelivery.render(before.results());
        Results anew = changed.results(WorkingSystem.US, before.found());
        Path retyped = Files.write(folder.resolve("retyped.xlsx"), Retyper.type(issued, numbersTyped(anew)));
        assertThat(Recalculated.disagreements(Recalculated.byGnumeric(retyped), live(anew)))
                .isEmpty();
    }

    /** Without what reruns found as issued, which says that it does not follow a changed entry. */
    private static Results live(Results all) {
        return new Results(
                all.furniture(),
                all.sheets(),
                all.cells().stream()
                        .filter(cell -> cell.kind() != Cell.Kind.RERUN)
                        .toList(),
                all.values(),
                all.figures());
    }

    @Test
    void sameInputGivesTheSameWorkbookInAnyLocaleAndTimeZone() {
        byte[] here = XlsxDelivery.render(
                PretendStation.AS_ISSUED.done(WorkingSystem.SI).results());
        Locale locale = Locale.getDefault();
        TimeZone zone = TimeZone.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("ar-EG"));
            TimeZone.setDefault(TimeZone.getTimeZone("Pacific/Auckland"));
            assertThat(XlsxDelivery.render(
                            PretendStation.AS_ISSUED.done(WorkingSystem.SI).results()))
                    .isEqualTo(here);
        } finally {
            Locale.setDefault(locale);
            TimeZone.setDefault(zone);
        }
    }

    private static Map<Place, Double> numbersTyped(Results results) {
        Map<Place, Double> numbers = new LinkedHashMap<>();
        for (Cell cell : results.cells()) {
            if (cell.kind() == Cell.Kind.ENTRY && cell.typed() instanceof Value.Number number) {
                numbers.put(cell.place(), number.value());
            }
        }
        return numbers;
    }
}
