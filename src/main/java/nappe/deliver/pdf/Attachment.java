package nappe.deliver.pdf;

import java.util.function.Supplier;

/**
 * A file that the PDF carries: the workbook of the same package.
 *
 * @param content asked for when all pages are painted, so that the file may be made meanwhile
 */
public record Attachment(String fileName, Supplier<byte[]> content) {
    /** A file that is there already. */
    public Attachment(String fileName, byte[] bytes) {
        this(fileName, () -> bytes);
    }

    byte[] bytes() {
        return content.get();
    }
}
