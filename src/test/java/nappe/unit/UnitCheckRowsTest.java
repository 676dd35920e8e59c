package nappe.unit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;

/** The rows of {@code checks/units.csv}: one entry, given back in another unit. */
class UnitCheckRowsTest {
    @Test
    void everyRowHoldsWithinItsTolerance() throws IOException {
        List<CSVRecord> rows = rows();
        assertThat(rows).extracting(row -> row.get("id")).contains("TF-1");
        for (CSVRecord row : rows) {
            String[] entry = row.get("entries").split(" = ")[1].split(" ");
            Unit given = Unit.parse(entry[1]);
            Unit asked = Unit.parse(row.get("unit"));
            double computed = Double.parseDouble(entry[0]) * given.sizeInSi() / asked.sizeInSi();
            double expected = Double.parseDouble(row.get("expected"));
            String[] tolerance = row.get("tolerance").split(" ");
            double allowed =
                    Double.parseDouble(tolerance[0]) * (tolerance[1].equals("%") ? Math.abs(expected) / 100 : 1);
            assertThat(given.dimension()).isEqualTo(asked.dimension());
            assertThat(computed).as(row.get("id") + ", " + row.get("source")).isCloseTo(expected, within(allowed));
        }
    }

    private static List<CSVRecord> rows() throws IOException {
        CSVFormat format = CSVFormat.DEFAULT
                .builder()
                .setCommentMarker('#')
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        try (InputStream in =
                Objects.requireNonNull(UnitCheckRowsTest.class.getResourceAsStream("/checks/units.csv"))) {
            return format.parse(new InputStreamReader(in, StandardCharsets.UTF_8))
                    .getRecords();
        }
    }
}
