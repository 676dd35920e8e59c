package nappe.deliver.pdf;

/** A file that the PDF carries: the workbook of the same package. */
public record Attachment(String fileName, byte[] bytes) {}
