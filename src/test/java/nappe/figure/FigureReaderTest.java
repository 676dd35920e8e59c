package nappe.figure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.util.List;
import nappe.method.MethodException;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.source.BuiltInLibrary;
import org.junit.jupiter.api.Test;

class FigureReaderTest {
    private static final BuiltInLibrary LIBRARY = new BuiltInLibrary();
    private static final MethodSheet FLUME = new MethodLibrary(LIBRARY).sheet("parshall-flume");

    private static List<String> faults(String text) {
        MethodException thrown = catchThrowableOfType(
                MethodException.class, () -> FigureReader.read(FLUME, "figures/parshall-flume.txt", text));
        return thrown.faults().stream()
                .map(f -> f.line() + ":" + f.column() + " " + f.message() + " (" + f.code() + ")")
                .toList();
    }

    @Test
    void everyBuiltInFigureLoadsAndBelongsToAMethod() {
        for (String file : LIBRARY.names("figures")) {
            MethodSheet method = new MethodLibrary(LIBRARY).sheet(file.replace(".txt", ""));
            assertThat(new FigureLibrary(LIBRARY).of(method)).isPresent();
        }
    }

    @Test
    void aMethodWithoutFigureFileHasNoDrawing() {
        assertThat(new FigureLibrary(new NoTexts()).of(FLUME)).isEmpty();
    }

    @Test
    void allFaultsAreFoundWithLineAndColumn() {
        assertThat(faults("""
                view      Plan
                wall      0 m, W ; L_B, Q
                wall      0 m, 0 ; L_B, 0 m
                line      0 m, nothing ; L_B, 0 m
                axis      0 m, h ; W, W
                dimension beside 1 W ; 0 m, 0 m ; W, W
                dimension left 1 n ; 0 m, 0 m ; W, W
                level     0 m, 0 m ; y_q ; crest
                circle    0 m, 0 m
                flow      0 m, 0 m
                """))
                .containsExactly(
                        "2:25 a length is needed here, and this is length^3 time^-1 (not-a-length)",
                        "3:16 a length is needed here, and this is a pure number; nought is written 0 m (not-a-length)",
                        "4:16 nothing is neither a symbol of parshall-flume.txt nor defined above (symbol-unknown)",
                        "5:16 h has no value by itself (symbol-free)",
                        "6:11 a dimension stands above, below, left, right, along or here (side-unknown)",
                        "7:18 n is not a length (not-a-length)",
                        "8:22 y_q is not a symbol of parshall-flume.txt (symbol-unknown)",
                        "9:1 \"circle\" is not a statement word of a figure (statement-unknown)",
                        "10:18 found the end where a number, a symbol or \"(\" was expected (syntax)");
    }

    @Test
    void aPartBeforeAnyViewIsAFault() {
        assertThat(faults("wall 0 m, W ; W, W")).containsExactly("1:1 a view comes first: view title (view-missing)");
    }

    @Test
    void aLengthOfTheDrawingsOwnHasAFreshName() {
        assertThat(faults("let W = 2*L_B\nlet x = L_B\nlet x = W\nlet y = Q\n"))
                .containsExactly(
                        "1:5 W is defined already (symbol-again)",
                        "3:5 x is defined already (symbol-again)",
                        "4:9 a length is needed here, and this is length^3 time^-1 (not-a-length)");
    }

    @Test
    void aConditionMustBeOne() {
        assertThat(faults("view Plan\nwall 0 m, W ; W, W ; when W"))
                .containsExactly("2:27 a condition is needed here, such as h < 2 ft (not-a-condition)");
    }

    @Test
    void aNoteWithAConditionKeepsItsFurtherSemicolons() {
        FigureSheet figure = FigureReader.read(
                FLUME,
                "figures/parshall-flume.txt",
                "view Plan\nschematic when W > 1 m ; why\nnote when W > 1 m ; one; two\nnote a; b");
        assertThat(figure.notes()).extracting(FigureSheet.Note::text).containsExactly("one; two", "a; b");
        assertThat(figure.notes().get(1).when()).isNull();
        assertThat(figure.schematic()).isNull();
        assertThat(figure.views().get(0).schematic()).isNotNull();
    }

    @Test
    void aNoteWithoutItsSentenceIsAFault() {
        assertThat(faults("note when W > 1 m")).containsExactly("1:17 a note needs its sentence (note-empty)");
    }

    /** A library with nothing in it. */
    private static final class NoTexts implements nappe.source.TextLibrary {
        @Override
        public @org.jspecify.annotations.Nullable String text(String path) {
            return null;
        }

        @Override
        public List<String> names(String folder) {
            return List.of();
        }
    }
}
