package nappe.deliver.pdf;

import java.util.List;
import nappe.bench.Clock;
import nappe.results.Results;

/** What the PDF consists of, each with its time. */
public final class PdfStages {
    private PdfStages() {}

    public static byte[] run(Results results, String name, byte[] workbook, Clock clock) {
        FilledPages filled = FilledPages.of(results);
        clock.lap("PDF: template");
        LaidOutPages laidOut = filled.laidOut(List.of(new Attachment(name, workbook)));
        clock.lap("PDF: layout");
        byte[] pdf = laidOut.painted().bytes();
        clock.lap("PDF: painting");
        return pdf;
    }
}
