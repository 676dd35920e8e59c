package nappe.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What the page on house methods shows is in its example, and what it says of faults is what the program says. */
class HousePageTest {
    private static final Path PAGE = Path.of("src/docs/house-methods.md");

    @TempDir
    Path folder;

    @Test
    void everyLineShownIsInTheExample() throws IOException {
        TreeSet<String> known = new TreeSet<>();
        try (Stream<Path> all = Files.walk(MillRace.HOUSE)) {
            for (Path file : all.filter(Files::isRegularFile).toList()) {
                known.addAll(Files.readAllLines(file));
            }
        }
        List<String> shown = List.of(Files.readString(PAGE).split("```")).stream()
                .filter(block -> block.startsWith("text\n"))
                .flatMap(String::lines)
                .filter(line -> !line.equals("text"))
                .toList();
        assertThat(shown).hasSizeGreaterThan(30).isSubsetOf(known);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            methods/mill-race-weir.txt | r_L = h_1/L_b | r_L = h_1/L_c | L_c is not defined above
            methods/mill-race-weir.txt | 0.30 m <= b | 0.30 <= b | the sides of the limit differ in dimension
            methods/mill-race-weir.txt | r_p = h_1/p ; 1 | r_p = h_1/p ; m | the formula comes out as a pure number, but m is length
            methods/mill-race-weir.txt | r_p = h_1/p ; 1 ; head to height | r_p = h_1/p ; head to height | a unit stands here, not "head to height
            methods/mill-race-weir.txt | L_b - r ; m | L_b - 0.1 ; m | length minus a pure number; both sides must be alike
            methods/mill-race-weir.txt | growth of the boundary layer ; ISO ; memory | growth ; ISO ; memori | the only mark known here is "memory"
            methods/mill-race-weir.txt | limit     r_p <= 1.5 | limit     Q_h <= 2 m3/s | rests on the free symbol h and has no value by itself
            tables/mill-race-finish.csv | 0.005 | 0,005 | 4 columns where the head has 3
            tables/mill-race-finish.csv | 0.003 | 0.003 mm | "0.003 mm" is not a number
            checks/mill-race-weir.csv | m3/s,0.01 % | m3/s,0.1 | tolerance "0.1" is neither like 0.1 % nor like 0.005 abs
            """)
    void faultIsToldAsThePageSays(String file, String written, String instead, String message) throws IOException {
        Path house = folder.resolve("our-methods");
        try (Stream<Path> all = Files.walk(MillRace.HOUSE)) {
            for (Path one : all.filter(Files::isRegularFile).toList()) {
                Path target = house.resolve(MillRace.HOUSE.relativize(one).toString());
                Files.createDirectories(target.getParent());
                Files.copy(one, target);
            }
        }
        String text = Files.readString(house.resolve(file));
        assertThat(text).contains(written);
        Files.writeString(house.resolve(file), text.replace(written, instead));
        NappeTest.Said said = NappeTest.nappe("verify", "--house", house);
        assertThat(said.status()).isEqualTo(ExitStatus.INPUT_REFUSED);
        assertThat(said.err()).contains(house + "/" + file + ":").contains(message);
        assertThat(Files.readString(PAGE)).contains(message);
    }
}
