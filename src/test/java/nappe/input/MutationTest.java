package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Whatever is changed inside the parts of a workbook, it is read or refused; nothing else happens. */
class MutationTest {
    private static final int TIMES = 600;
    private static final String SNIPPETS = "<>\"'/=&; 0129-.,eExXAZ_r:\u00A0\u0007";

    @TempDir
    Path folder;

    @Test
    void changedPartIsReadOrRefused() throws IOException {
        byte[] sound = Samples.filled().bytes();
        List<String> parts = List.of(
                "[Content_Types].xml",
                "_rels/.rels",
                "xl/workbook.xml",
                "xl/_rels/workbook.xml.rels",
                "xl/styles.xml",
                "xl/sharedStrings.xml",
                "xl/worksheets/sheet1.xml",
                "xl/worksheets/sheet2.xml",
                "xl/worksheets/sheet3.xml",
                "xl/worksheets/sheet5.xml");
        Random random = new Random(20);
        int refused = 0;
        for (int i = 0; i < TIMES; i++) {
            String part = parts.get(random.nextInt(parts.size()));
            Path file =
                    Zips.of(sound).change(part, text -> changed(text, random)).save(folder.resolve("in.xlsx"));
            try {
                InputReader.read(file, Samples.METHODS);
            } catch (InputRefused e) {
                refused++;
                assertThat(e.faults()).isNotEmpty();
            }
        }
        assertThat(refused).isGreaterThan(TIMES / 4);
    }

    private static String changed(String text, Random random) {
        int from = random.nextInt(text.length());
        int to = Math.min(text.length(), from + random.nextInt(4));
        char put = SNIPPETS.charAt(random.nextInt(SNIPPETS.length()));
        String after = text.substring(0, from) + put + text.substring(to);
        return after.equals(text) ? text + " " : after;
    }
}
