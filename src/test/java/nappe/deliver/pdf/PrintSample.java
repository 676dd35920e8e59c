package nappe.deliver.pdf;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** Writes the invented package to a file, to be looked at, or to be compared from another process. */
final class PrintSample {
    private PrintSample() {}

    public static void main(String[] arguments) throws IOException {
        PdfDelivery letter = PdfDelivery.render(Invented.results());
        Files.write(Path.of(arguments[0]), letter.bytes());
        if (arguments.length > 1) {
            Files.write(
                    Path.of(arguments[1]), PdfDelivery.render(Invented.onA4()).bytes());
        }
    }
}
