package nappe.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import nappe.deliver.pdf.PdfStages;
import nappe.deliver.xlsx.XlsxDelivery;
import nappe.input.InputReader;
import nappe.job.Job;
import nappe.job.SolvingStages;
import nappe.method.MethodLibrary;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;

/** Issues a package stage after stage on one thread: INPUT, FOLDER, how many times. Each time prints its stages. */
final class Stages {
    private Stages() {}

    public static void main(String[] args) throws IOException {
        Clock clock = Clock.sinceProcessStart();
        Locale.setDefault(Locale.ROOT);
        Path folder = Files.createDirectories(Path.of(args[1]));
        for (int i = 0; i < Integer.parseInt(args[2]); i++) {
            MethodLibrary methods = new MethodLibrary(new BuiltInLibrary());
            Design design = InputReader.read(Path.of(args[0]), methods);
            clock.lap(i == 0 ? "JVM and reading" : "reading");
            Job.Done done = SolvingStages.run(methods, design, clock);
            byte[] workbook = XlsxDelivery.render(done.results());
            clock.lap("workbook");
            byte[] pdf = PdfStages.run(done.results(), "package.xlsx", workbook, clock);
            Files.write(folder.resolve("package.xlsx"), workbook);
            Files.write(folder.resolve("package.pdf"), pdf);
            clock.lap("writing the files");
            clock.print();
            System.out.println("end\t0");
            clock = Clock.start();
        }
    }
}
