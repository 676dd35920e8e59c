package nappe.proof;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Stream;
import nappe.cli.Nappe;

/** A sample as the command line issues it. */
record Issued(Path pdf, Path workbook) {
    static final String WITH_SEAL_SPACE = "headworks.xlsx";
    static final String WITHOUT_SEAL_SPACE = "return-weir.xlsx";

    private static final Map<String, Issued> SAMPLES = new LinkedHashMap<>();

    /** The package of an input workbook in {@code sample-inputs}, issued once. */
    static synchronized Issued of(String name) {
        return SAMPLES.computeIfAbsent(name, Issued::issue);
    }

    static List<Issued> both() {
        return List.of(of(WITH_SEAL_SPACE), of(WITHOUT_SEAL_SPACE));
    }

    private static Issued issue(String name) {
        Locale locale = Locale.getDefault();
        try {
            Path folder = Files.createTempDirectory(Path.of("target"), "issued-");
            StringWriter said = new StringWriter();
            PrintWriter writer = new PrintWriter(said);
            String[] arguments = {"issue", Package.INPUTS.resolve(name).toString(), "-o", folder.toString()};
            if (Nappe.run(arguments, writer, writer) != 0) {
                throw new IllegalStateException(said.toString());
            }
            return new Issued(one(folder, ".pdf"), one(folder, ".xlsx"));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } finally {
            Locale.setDefault(locale);
        }
    }

    private static Path one(Path folder, String end) throws IOException {
        try (Stream<Path> all = Files.walk(folder)) {
            return all.filter(file -> file.toString().endsWith(end)).findFirst().orElseThrow();
        }
    }

    @Override
    public String toString() {
        return pdf.getFileName().toString();
    }
}
