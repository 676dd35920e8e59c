package nappe.proof;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.lang.ref.SoftReference;
import java.util.HashMap;
import java.util.Map;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** Issued workbooks of samples, opened to be looked at and never changed or closed: to open one takes seconds. */
final class OpenedBooks {
    private static final Map<String, SoftReference<XSSFWorkbook>> BOOKS = new HashMap<>();

    private OpenedBooks() {}

    /** The workbook of a sample; kept as long as there is room. */
    static synchronized XSSFWorkbook of(String sample) {
        SoftReference<XSSFWorkbook> kept = BOOKS.get(sample);
        XSSFWorkbook book = kept == null ? null : kept.get();
        if (book == null) {
            try {
                book = new XSSFWorkbook(
                        new ByteArrayInputStream(Package.ofSample(sample).workbook()));
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
            BOOKS.put(sample, new SoftReference<>(book));
        }
        return book;
    }
}
