package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.calculation.Cell;
import nappe.deliver.xlsx.Recalculated;
import nappe.deliver.xlsx.Spoiler;
import nappe.formula.Value;
import nappe.input.InputReader;
import nappe.input.SampleStations;
import nappe.job.DeviceStations;
import nappe.job.DeviceStations.Station;
import nappe.method.Item;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.proof.Typing.Entry;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;
import nappe.station.Design.Typed;
import nappe.station.DesignCheck;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The proofs hold for every device, not for the samples' alone: three programs agree on every cell, and an issued workbook
 * in which every entry is changed gives, recalculated, what issuing anew gives.
 */
class EveryDeviceTest {
    private static final MethodLibrary METHODS = new MethodLibrary(new BuiltInLibrary());
    private static final double LARGER = 1.03;

    @TempDir
    Path folder;

    @Test
    void everyDeviceStandsInASampleOrInAStationOfItsOwn() {
        Set<String> proven = new LinkedHashSet<>();
        DeviceStations.all().forEach(station -> proven.add(station.method()));
        SampleStations.all()
                .keySet()
                .forEach(sample -> InputReader.read(Package.INPUTS.resolve(sample), METHODS)
                        .elements()
                        .forEach(element -> proven.add(element.method())));
        assertThat(proven).containsAll(METHODS.names());
    }

    /** Each station has flows that are measured and flows that are not: a proof over blanks would be none. */
    @Test
    void everyStationMeasuresSomeFlowsAndSaysOfOthersThatItDoesNot() {
        for (Station station : DeviceStations.all()) {
            MethodSheet method = METHODS.sheet(station.method());
            String head = method.gives().get("head at the gauge");
            String level = method.gives().get("water level");
            assertThat(results(station, head)).as(station + " " + head).hasAtLeastOneElementOfType(Value.Number.class);
            assertThat(results(station, head)).as(station + " " + head).contains(new Value.None("no result"));
            assertThat(results(station, level))
                    .as(station + " " + level)
                    .hasAtLeastOneElementOfType(Value.Number.class);
        }
    }

    private List<Value> results(Station station, String symbol) {
        Package issued = issued(station);
        return issued.results().cells().stream()
                .filter(cell -> cell.symbol().equals(symbol)
                        && cell.place().sheet().equals("X1")
                        && cell.kind() == Cell.Kind.FORMULA)
                .map(cell -> issued.results().value(cell))
                .toList();
    }

    private static final Map<String, Package> ISSUED = new LinkedHashMap<>();

    private static Package issued(Station station) {
        return ISSUED.computeIfAbsent(station.method(), name -> Package.of(station.design()));
    }

    @Test
    void threeProgramsAgreeAndEveryEntryIsLive() throws IOException {
        List<String> faults = new ArrayList<>();
        List<Path> books = new ArrayList<>();
        List<Station> stations = DeviceStations.all();
        for (Station station : stations) {
            Package issued = issued(station);
            byte[] spoilt = Spoiler.spoil(issued.workbook());
            books.add(file(spoilt));
            Edited edited = new Edited(spoilt);
            typings(issued.design()).forEach(typing -> edited.type(typing.place(issued), typing.content()));
            books.add(file(edited.bytes()));
        }
        List<Map<String, Object>> recalculated = Recalculated.byLibreOffice(books);
        for (int i = 0; i < stations.size(); i++) {
            Station station = stations.get(i);
            Package issued = issued(station);
            Map<String, Object> stored = Recalculated.asStored(file(issued.workbook()));
            compare(station + ", LibreOffice", recalculated.get(2 * i), stored, issued, faults);
            compare(station + ", Gnumeric", Recalculated.byGnumeric(books.get(2 * i)), stored, issued, faults);
            Design design = issued.design();
            for (Entry typing : typings(design)) {
                design = typing.in(design, issued);
            }
            Package anew = Package.of(design, issued.found());
            compare(
                    station + ", every entry changed",
                    anew.live(recalculated.get(2 * i + 1)),
                    anew.live(Recalculated.asStored(file(anew.workbook()))),
                    anew,
                    faults);
        }
        assertThat(faults).isEmpty();
    }

    private static void compare(
            String what, Map<String, Object> there, Map<String, Object> here, Package of, List<String> faults) {
        Comparison comparison = Comparison.of(there, here, of.results());
        System.out.println(what + ": " + comparison);
        comparison.faults().forEach(fault -> faults.add(what + ": " + fault));
    }

    /** Every number a little larger, which keeps the form of the device; every choice its last word, where that can be built. */
    private static List<Entry> typings(Design design) {
        Design.Element element = design.elements().get(0);
        List<Entry> typings = new ArrayList<>();
        for (Map.Entry<String, Typed> one : element.typed().entrySet()) {
            if (one.getValue().value() instanceof Value.Number number) {
                typings.add(new Entry("X1", one.getKey(), number.value() * LARGER));
            }
        }
        for (Item item : METHODS.sheet(element.method()).items()) {
            if (item instanceof Item.Given given && given.from() == Item.From.CHOICE) {
                Entry last = new Entry(
                        "X1", given.symbol(), given.words().get(given.words().size() - 1));
                List<Entry> with = new ArrayList<>(typings);
                with.add(last);
                Design changed = design;
                for (Entry typing : with) {
                    changed = typing.in(changed, issuedAs(design));
                }
                if (DesignCheck.faults(changed, METHODS::sheet).isEmpty()) {
                    typings.add(last);
                }
            }
        }
        return typings;
    }

    /** An entry needs no package to be changed in a design. */
    private static Package issuedAs(Design design) {
        return ISSUED.get(design.elements().get(0).method());
    }

    private Path file(byte[] workbook) throws IOException {
        return Files.write(Files.createTempFile(folder, "book", ".xlsx"), workbook);
    }
}
