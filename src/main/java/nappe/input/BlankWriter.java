package nappe.input;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Date;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import nappe.method.MethodCatalogue;
import nappe.unit.WorkingSystem;
import org.apache.poi.util.LocaleUtil;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** Writes the input workbook for chosen elements, to be filled in. */
public final class BlankWriter {
    /** Keeps the logging of the spreadsheet library off standard output, unless somebody has set it up. */
    static void quietLogging() {
        if (System.getProperty("log4j.provider") == null) {
            System.setProperty("log4j.provider", "org.apache.logging.log4j.simple.internal.SimpleProvider");
            System.setProperty("org.apache.logging.log4j.simplelog.level", "OFF");
        }
    }

    private BlankWriter() {}

    /** An element of the station: its tag and the name of its method. */
    public record Chosen(String tag, String method) {}

    /**
     * Writes a new file, whole or not at all; the same arguments give the same bytes.
     *
     * @param elements from the downstream end up
     * @throws java.nio.file.FileAlreadyExistsException where there is a file, which may have been filled in
     * @throws IllegalArgumentException with what is wrong with a tag or a method
     */
    public static void write(Path path, WorkingSystem system, List<Chosen> elements, MethodCatalogue methods)
            throws IOException {
        byte[] bytes = bytes(system, elements, methods);
        NewFile.write(path, bytes);
    }

    static byte[] bytes(WorkingSystem system, List<Chosen> elements, MethodCatalogue methods) throws IOException {
        quietLogging();
        check(elements, methods);
        LocaleUtil.setUserLocale(Locale.ROOT);
        try (XSSFWorkbook workbook = new XSSFWorkbook()) {
            Optional<Date> fixed = Optional.of(new Date(946_684_800_000L)); // 2000-01-01, as in the zip
            workbook.getProperties().getCoreProperties().setCreator("Nappe");
            workbook.getProperties().getCoreProperties().setTitle("Input workbook");
            workbook.getProperties().getCoreProperties().setCreated(fixed);
            workbook.getProperties().getCoreProperties().setModified(fixed);
            workbook.getProperties().getExtendedProperties().setApplication("Nappe");
            new Blank(workbook, system, elements, methods).write();
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            workbook.write(out);
            return FixedZip.of(out.toByteArray());
        } finally {
            LocaleUtil.resetUserLocale();
        }
    }

    private static void check(List<Chosen> elements, MethodCatalogue methods) {
        if (elements.isEmpty()) {
            throw new IllegalArgumentException("no element is given; name at least one");
        }
        Set<String> tags = new HashSet<>();
        for (Chosen element : elements) {
            String complaint = Tags.complaint(element.tag());
            if (complaint != null) {
                throw new IllegalArgumentException(complaint);
            }
            if (!tags.add(element.tag())) {
                throw new IllegalArgumentException("the tag " + element.tag() + " is given twice");
            }
            if (!methods.knows(element.method())) {
                String question = Near.question(element.method(), methods.names());
                throw new IllegalArgumentException(Shown.quoted(element.method()) + " is not a known method"
                        + (question.isEmpty() ? "; known are " + String.join(", ", methods.names()) : question));
            }
        }
    }
}
