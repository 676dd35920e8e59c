package nappe.deliver.xlsx;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;

/** Takes the stored results out of the formula cells of a workbook that Nappe wrote, or puts wrong ones in. */
public final class Spoiler {
    /** Stored in place of each number. */
    public static final double WRONG = -999.25;

    /** Stored in place of each word. */
    public static final String WRONG_WORD = "SPOILT";

    private static final Pattern NUMBER = Pattern.compile("(<c r=\"[A-Z]+\\d+\" s=\"\\d+\"><f>[^<]*</f>)<v>[^<]*</v>");
    private static final Pattern WORD =
            Pattern.compile("(<c r=\"[A-Z]+\\d+\" s=\"\\d+\" t=\"str\"><f>[^<]*</f>)<v>[^<]*</v>");

    private Spoiler() {}

    /** The workbook with a wrong result in each formula cell. */
    public static byte[] spoil(byte[] workbook) {
        return rewrite(workbook, "$1<v>" + WRONG + "</v>", "$1<v>" + WRONG_WORD + "</v>");
    }

    /** The workbook with no result in any formula cell. */
    public static byte[] strip(byte[] workbook) {
        return rewrite(workbook, "$1", "$1");
    }

    private static byte[] rewrite(byte[] workbook, String number, String word) {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        int found = 0;
        try (ZipInputStream in = new ZipInputStream(new ByteArrayInputStream(workbook));
                ZipOutputStream out = new ZipOutputStream(bytes)) {
            for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                byte[] part = in.readAllBytes();
                if (entry.getName().startsWith("xl/worksheets/sheet")) {
                    String text = new String(part, StandardCharsets.UTF_8);
                    Matcher numbers = NUMBER.matcher(text);
                    found += (int) numbers.results().count()
                            + (int) WORD.matcher(text).results().count();
                    text = WORD.matcher(numbers.replaceAll(number)).replaceAll(word);
                    part = text.getBytes(StandardCharsets.UTF_8);
                }
                out.putNextEntry(new ZipEntry(entry.getName()));
                out.write(part);
                out.closeEntry();
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        if (found == 0) {
            throw new IllegalArgumentException("no formula cell to spoil");
        }
        return bytes.toByteArray();
    }
}
