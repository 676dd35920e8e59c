package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import nappe.formula.Guard;
import nappe.method.Item;
import nappe.method.MethodLibrary;
import nappe.source.BuiltInLibrary;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** A formula shows the words of a symbol that it does not test, whatever else it says: words are handed on tested. */
class WordsHandedOnTest {
    private static final MethodLibrary METHODS = new MethodLibrary(new BuiltInLibrary());

    static List<String> methods() {
        return METHODS.names();
    }

    @ParameterizedTest
    @MethodSource("methods")
    void everyLineComparesTheWordsThatItHandsOn(String method) {
        List<Item.Line> lines = METHODS.sheet(method).items().stream()
                .filter(Item.Line.class::isInstance)
                .map(Item.Line.class::cast)
                .toList();
        Set<String> words = lines.stream()
                .filter(line -> line.unit() == null)
                .map(Item.Line::symbol)
                .collect(Collectors.toSet());
        assertThat(lines)
                .allSatisfy(line -> assertThat(Guard.guarded(line.formula()))
                        .as(line.symbol())
                        .doesNotContainAnyElementsOf(words));
    }
}
