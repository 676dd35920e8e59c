package nappe.job;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import nappe.Tools;
import nappe.method.MethodLibrary;
import nappe.source.BuiltInLibrary;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The general-purpose library fluids beside Nappe: a script prints a grid of points with its results, and each point is
 * run through the method sheet. Another device is a few lines of the script.
 */
class LibraryBesideTest {
    private static final Path SCRIPT = Path.of("src/test/fluids/grid.py");
    private static final int LEAST_POINTS = 2000;

    private static Map<String, List<CheckRow>> devices = Map.of();

    @BeforeAll
    static void runTheLibrary(@TempDir Path folder) throws IOException {
        Tools.requirePythonModule("fluids", "the general-purpose library fluids");
        Path grid = folder.resolve("grid.csv");
        Tools.run(Tools.PYTHON, SCRIPT.toString(), grid.toString());
        devices = CheckRow.read("grid.csv", Files.readString(grid)).stream()
                .collect(Collectors.groupingBy(
                        row -> row.id().substring(0, row.id().indexOf(' ')), TreeMap::new, Collectors.toList()));
    }

    @Test
    void everyPointIsWhatTheLibraryGives() {
        Verification verification = new Verification(new MethodLibrary(new BuiltInLibrary()));
        devices.forEach((device, rows) -> {
            double largest = 0;
            for (CheckRow row : rows) {
                CheckOutcome outcome = verification.run(row);
                assertThat(outcome.met()).as(outcome.printed().toString()).isTrue();
                largest = Math.max(largest, Math.abs(outcome.computed() / row.expected() - 1));
            }
            System.out.printf(
                    Locale.ROOT,
                    "Beside fluids, %s: %d points, largest difference %.2g%n",
                    device,
                    rows.size(),
                    largest);
        });
    }

    @Test
    void theGridIsDenseForEveryMethod() {
        Map<String, Long> points = devices.values().stream()
                .flatMap(List::stream)
                .collect(Collectors.groupingBy(CheckRow::method, TreeMap::new, Collectors.counting()));
        assertThat(points)
                .isNotEmpty()
                .allSatisfy((method, count) -> assertThat(count).as(method).isGreaterThanOrEqualTo(LEAST_POINTS));
    }
}
