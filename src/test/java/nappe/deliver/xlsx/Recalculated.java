package nappe.deliver.xlsx;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.function.IntFunction;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import nappe.Tools;
import nappe.calculation.Cell;
import nappe.formula.Value;
import nappe.results.Results;

/**
 * A workbook as a spreadsheet program sees it after it has recalculated every cell: values by {@code "Sheet!A1"},
 * numbers as Double, all else as String. LibreOffice hands on 15 digits, Gnumeric all of them.
 */
public final class Recalculated {
    /** As loose as the comparison of one value needs: LibreOffice rounds to 15 digits and snaps sums near zero. */
    public static final double RELATIVE = 1e-9;

    /**
     * For the weighted difference of a root's other end: its weight is a ratio of two differences, each near the dead band
     * of 1e-12 in the rows before a root closes, and so is only as exact as they are. Nothing but the next trial rests on it.
     */
    private static final double RELATIVE_OF_WEIGHTS = 1e-6;

    private static final String WEIGHTED = "d_o";

    private Recalculated() {}

    /** Recalculated by LibreOffice; the test is skipped, with a message, where it is not installed. */
    public static Map<String, Object> byLibreOffice(Path workbook) {
        return byLibreOffice(List.of(workbook)).get(0);
    }

    /** Several workbooks recalculated by one run of LibreOffice, in their order. */
    public static List<Map<String, Object>> byLibreOffice(List<Path> workbooks) {
        return in(folder -> {
            IntFunction<Map<String, Object>> recalculated = byLibreOffice(workbooks, folder);
            return IntStream.range(0, workbooks.size()).mapToObj(recalculated).toList();
        });
    }

    /** The same into a folder that is kept, where each is read when it is asked for: all at once are many. */
    public static IntFunction<Map<String, Object>> byLibreOffice(List<Path> workbooks, Path folder) throws IOException {
        Tools.require("soffice", "LibreOffice");
        Path profile = Files.createDirectories(folder.resolve("profile/user"));
        Files.writeString(profile.resolve("registrymodifications.xcu"), """
                <?xml version="1.0" encoding="UTF-8"?>
                <oor:items xmlns:oor="http://openoffice.org/2001/registry">
                <item oor:path="/org.openoffice.Office.Calc/Formula/Load"><prop oor:name="OOXMLRecalcMode"
                 oor:op="fuse"><value>0</value></prop></item>
                </oor:items>
                """);
        List<String> command = new ArrayList<>(List.of(
                "soffice",
                "-env:UserInstallation=" + folder.resolve("profile").toUri(),
                "--headless",
                "--convert-to",
                SheetsAsText.FORMAT,
                "--outdir",
                folder.resolve("out").toString()));
        for (int i = 0; i < workbooks.size(); i++) {
            command.add(Files.copy(workbooks.get(i), folder.resolve("book" + i + ".xlsx"))
                    .toString());
        }
        spreadsheet(command);
        return i -> {
            try {
                return SheetsAsText.of(folder.resolve("out"), "book" + i);
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        };
    }

    /** Recalculated by Gnumeric; the test is skipped, with a message, where it is not installed. */
    public static Map<String, Object> byGnumeric(Path workbook) {
        Tools.require("ssconvert", "Gnumeric");
        return in(folder -> {
            Path out = folder.resolve("out.xlsx");
            spreadsheet(List.of(
                    "ssconvert", "--recalc", "-T", "Gnumeric_Excel:xlsx2", workbook.toString(), out.toString()));
            return StoredCells.of(out);
        });
    }

    /** Runs a program that takes memory from the system in large pieces and keeps it, which saves a sixth of its time. */
    private static void spreadsheet(List<String> command) throws IOException {
        ProcessBuilder builder = new ProcessBuilder(command);
        builder.environment().put("MALLOC_TOP_PAD_", "134217728");
        builder.environment().put("MALLOC_TRIM_THRESHOLD_", "4000000000");
        Tools.run(builder);
    }

    /** The values that are stored in a workbook, nothing recalculated. */
    public static Map<String, Object> asStored(Path workbook) {
        try {
            return StoredCells.of(workbook);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Where the values of a program and the results part, in words; empty where all agree. */
    public static List<String> disagreements(Map<String, Object> values, Results results) {
        return disagreements(values, results, 1e-12);
    }

    /**
     * Where the values of a program and the results part, in words; empty where all agree.
     *
     * @param floor so much difference is none, whatever the size of the numbers
     */
    public static List<String> disagreements(Map<String, Object> values, Results results, double floor) {
        List<String> faults = new ArrayList<>();
        for (Cell cell : results.cells()) {
            Object there = values.get(cell.place().sheet() + "!" + cell.place().address());
            Value here = results.value(cell);
            double relative = cell.symbol().equals(WEIGHTED) ? RELATIVE_OF_WEIGHTS : RELATIVE;
            if (!agree(here, there, relative, floor)) {
                faults.add(cell + ": " + here + " here, " + there + " there"
                        + (cell.formula() == null ? "" : ", =" + SpreadsheetReading.of(cell)));
            }
        }
        return faults;
    }

    private static boolean agree(Value here, Object there, double relative, double floor) {
        if (here instanceof Value.Number number) {
            double a = number.value();
            return there instanceof Double b
                    && Math.abs(a - b) <= relative * Math.max(Math.abs(a), Math.abs(b)) + floor;
        }
        return SheetRows.words(here).equals(there);
    }

    private interface Work<T> {
        T in(Path folder) throws IOException;
    }

    private static <T> T in(Work<T> work) {
        try {
            Path folder = Files.createTempDirectory("nappe-recalculated");
            try {
                return work.in(folder);
            } finally {
                try (Stream<Path> all = Files.walk(folder)) {
                    all.sorted(Comparator.reverseOrder())
                            .forEach(path -> path.toFile().delete());
                }
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
