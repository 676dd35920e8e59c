package nappe.source;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class BuiltInLibraryTest {
    private static final BuiltInLibrary LIBRARY = new BuiltInLibrary();

    @Test
    void aTextThatIsNotThereIsNull() {
        assertThat(LIBRARY.text("methods/no-such-device.txt")).isNull();
        assertThat(LIBRARY.names("no-such-folder")).isEmpty();
    }

    @Test
    void namesAreInAlphabeticalOrder() {
        assertThat(LIBRARY.names("methods")).isSorted().contains("parshall-flume.txt", "rectangular-weir.txt");
    }

    static java.util.List<String> citedTables() {
        return LIBRARY.names("tables").stream()
                .filter(name -> !name.equals("units.csv"))
                .toList();
    }

    @ParameterizedTest
    @MethodSource("citedTables")
    void everyTableThatComesWithNappeIsRead(String file) {
        String name = file.substring(0, file.length() - ".csv".length());
        assertThat(CitedTable.read(name, LIBRARY.text("tables/" + file)).rows()).isPositive();
    }
}
