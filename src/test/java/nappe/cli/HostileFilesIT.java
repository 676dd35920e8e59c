package nappe.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * A file that is no sound input workbook is refused by the packed program in words, within 10 s and 512 MB, and nothing is written.
 * The bounds are demands of the issue.
 */
class HostileFilesIT {
    private static final long LONGEST_MILLIS = 10_000;

    @TempDir
    Path folder;

    private static void assertRefused(String said, Path file, String fault) {
        assertThat(said)
                .as(file.getFileName().toString())
                .contains(file.getFileName().toString(), "(fault: " + fault + ")", "no package was written.")
                .doesNotContain("\tat ", "Exception", "Error", "nappe.", "org.apache", "java.");
    }

    @Test
    void everyKindIsToldInWords() throws IOException {
        Jar jar = Jar.in(folder);
        Map<Path, String> files = HostileFiles.light(folder);
        List<String> args = new ArrayList<>(List.of(folder.resolve("out").toString()));
        files.keySet().forEach(file -> args.add(file.toString()));
        Map<String, String> before = Jar.listing(folder);
        Jar.Said said = jar.runClass(EachInTurn.class, args);
        assertThat(said.err()).isEmpty();
        assertThat(Jar.listing(folder)).isEqualTo(before);
        List<String> each = List.of(said.out().split("(?m)^" + EachInTurn.MARK));
        assertThat(each).hasSize(files.size() + 1);
        int at = 1;
        for (Map.Entry<Path, String> file : files.entrySet()) {
            String[] head = each.get(at).lines().findFirst().orElseThrow().split(" ", 3);
            assertThat(head[2]).isEqualTo(file.getKey().toString());
            assertThat(head[0]).as(each.get(at)).isEqualTo("3");
            assertThat(Long.parseLong(head[1])).isLessThan(LONGEST_MILLIS);
            assertRefused(each.get(at), file.getKey(), file.getValue());
            at++;
        }
    }

    @Test
    void whatWouldFillMemoryIsRefusedInTime() throws IOException {
        Jar jar = Jar.in(folder);
        Map<Path, String> files = HostileFiles.heavy(folder);
        Map<String, String> before = Jar.listing(folder);
        for (Map.Entry<Path, String> file : files.entrySet()) {
            Jar.Said said = jar.run("issue", file.getKey(), "-o", "out", "--marked", "copy.xlsx");
            assertThat(said.status()).as(file + said.err()).isEqualTo(ExitStatus.INPUT_REFUSED);
            assertThat(said.out()).isEmpty();
            assertThat(said.time()).as(file.toString()).isLessThan(Duration.ofMillis(LONGEST_MILLIS));
            assertRefused(said.err(), file.getKey(), file.getValue());
            assertThat(said.err()).contains("no marked copy was written");
        }
        assertThat(Jar.listing(folder)).isEqualTo(before);
    }
}
