package nappe;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.library.dependencies.SlicesRuleDefinition;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Packages in one direction: what each may use. Change the table knowingly. */
class PackageTreeTest {
    private static final JavaClasses NAPPE = new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("nappe");

    private static final String CSV = "org.apache.commons.csv..";
    private static final String FRACTIONS = "org.apache.commons.math3.fraction..";
    private static final String XML = "javax.xml.. org.w3c.dom.. org.xml.sax..";

    /** A package, the packages of ours that it may use, and the libraries. */
    record Row(String name, String ours, String libraries) {
        ArchRule rule() {
            List<String> allowed = new ArrayList<>(List.of("java..", "org.jspecify..", "nappe." + name));
            words(ours).forEach(ours -> allowed.add("nappe." + ours));
            words(libraries).forEach(allowed::add);
            return classes()
                    .that()
                    .resideInAPackage("nappe." + name)
                    .should()
                    .onlyDependOnClassesThat()
                    .resideInAnyPackage(allowed.toArray(String[]::new));
        }

        private static Stream<String> words(String text) {
            return Arrays.stream(text.split(" ")).filter(word -> !word.isEmpty());
        }
    }

    static List<Row> table() {
        return List.of(
                new Row("unit", "", "javax.measure.. tech.units.. " + CSV + " " + FRACTIONS),
                new Row("formula", "unit", FRACTIONS),
                new Row("source", "formula unit", ""),
                new Row("method", "source formula unit", ""),
                new Row("calculation", "method source formula unit", ""),
                new Row("results", "calculation source formula unit", ""),
                new Row("station", "results calculation method source formula unit", ""),
                new Row("solve", "results calculation formula unit", "org.apache.commons.math3.."),
                new Row("figure", "results calculation method source formula unit", ""),
                new Row("job", "figure station solve results calculation method source formula unit", ""),
                new Row("input", "station method source formula unit", "org.apache.poi.. " + XML),
                new Row("deliver.csv", "results calculation formula source unit", ""),
                new Row(
                        "deliver.xlsx",
                        "results calculation formula source unit",
                        "org.apache.poi.. org.openxmlformats.. " + XML),
                new Row(
                        "deliver.pdf",
                        "results calculation formula source unit",
                        "org.thymeleaf.. org.xhtmlrenderer.. com.lowagie.. org.attoparser.. " + XML),
                new Row(
                        "cli",
                        "job input deliver.csv deliver.xlsx deliver.pdf station solve results calculation method source formula unit",
                        "picocli.. org.apache.poi.util.. org.apache.poi.openxml4j.util.."));
    }

    @ParameterizedTest
    @MethodSource("table")
    void aPackageUsesOnlyWhatTheTableAllows(Row row) {
        row.rule().check(NAPPE);
    }

    @Test
    void theTableNamesEveryPackage() {
        List<String> known = table().stream().map(row -> "nappe." + row.name()).toList();
        assertThat(NAPPE).extracting(type -> type.getPackageName()).allMatch(known::contains);
    }

    @Test
    void noTwoPackagesUseEachOther() {
        SlicesRuleDefinition.slices()
                .matching("nappe.(**)")
                .should()
                .beFreeOfCycles()
                .check(NAPPE);
    }

    @Test
    void aPackageThatUsesWhatItMayNotIsFound() {
        assertThatThrownBy(() -> new Row("method", "source unit", "").rule().check(NAPPE))
                .isInstanceOf(AssertionError.class)
                .hasMessageContaining("nappe.method.StatementReader")
                .hasMessageContaining("nappe.formula.FormulaParser");
        assertThatThrownBy(() -> new Row("unit", "", "javax.measure.. tech.units.. " + FRACTIONS)
                        .rule()
                        .check(NAPPE))
                .isInstanceOf(AssertionError.class)
                .hasMessageContaining("org.apache.commons.csv");
    }
}
