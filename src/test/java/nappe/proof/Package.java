package nappe.proof;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Supplier;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.deliver.xlsx.XlsxDelivery;
import nappe.input.InputReader;
import nappe.job.CheckRow;
import nappe.job.Job;
import nappe.method.MethodLibrary;
import nappe.results.Results;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;
import nappe.station.FoundFlows;

/** The package of one design: what was typed, what Java computed, the workbook that is issued. */
record Package(
        Design design, Results results, Map<String, Block.Table> ratings, FoundFlows found, Supplier<byte[]> rendered) {
    private static final BuiltInLibrary LIBRARY = new BuiltInLibrary();
    private static final MethodLibrary METHODS = new MethodLibrary(LIBRARY);
    private static final Map<String, Package> SAMPLES = new LinkedHashMap<>();

    static final Path INPUTS = Path.of("sample-inputs");

    static Package of(Design design) {
        return of(design, new Job(METHODS, "0.0.0").run(design, CheckRow.builtIn(LIBRARY)));
    }

    /** The package with flows found before: what does not follow a changed entry stays as issued. */
    static Package of(Design design, FoundFlows found) {
        return of(design, new Job(METHODS, "0.0.0").run(design, CheckRow.builtIn(LIBRARY), found));
    }

    private static Package of(Design design, Job.Done done) {
        return new Package(design, done.results(), done.ratings(), done.found(), once(done.results()));
    }

    /** Written when it is first asked for: not every test looks into the workbook. */
    private static Supplier<byte[]> once(Results results) {
        byte[][] written = new byte[1][];
        return () -> {
            if (written[0] == null) {
                written[0] = XlsxDelivery.render(results);
            }
            return written[0];
        };
    }

    byte[] workbook() {
        return rendered.get();
    }

    /** The package of an input workbook in {@code sample-inputs}, made once. */
    static Package ofSample(String name) {
        return SAMPLES.computeIfAbsent(name, key -> of(InputReader.read(INPUTS.resolve(key), METHODS)));
    }

    /** Values without those of cells that say they hold what reruns found as issued: these do not follow a changed entry. */
    Map<String, Object> live(Map<String, Object> values) {
        Map<String, Object> live = new LinkedHashMap<>(values);
        results.cells().stream()
                .filter(cell -> cell.kind() == Cell.Kind.RERUN)
                .forEach(cell ->
                        live.remove(cell.place().sheet() + "!" + cell.place().address()));
        return live;
    }

    @Override
    public String toString() {
        return design.project().number();
    }
}
