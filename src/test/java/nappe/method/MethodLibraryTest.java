package nappe.method;

import static org.assertj.core.api.Assertions.assertThat;

import nappe.formula.Sign;
import org.junit.jupiter.api.Test;

class MethodLibraryTest {
    private static final MethodLibrary LIBRARY = new MethodLibrary(new Texts()
            .table("pretend-sizes", "size,C [1]\nsmall,2.5\nlarge,3.5\n")
            .method("trough", """
                    # remark

                    method Pretend trough
                    choice size from pretend-sizes ; nominal size
                    entry b ; m ; width
                    case Q = flow ; m3/s ; flow
                    case h_g ; m ; head read ; optional
                    take z_t = water level ; m ; level
                    """)
            .method("part", "requires D ; m ; diameter\n")
            .method("basin", "method Pretend basin\n"));

    @Test
    void textsThatAreOnlyIncludedAreNoMethods() {
        assertThat(LIBRARY.names()).containsExactly("basin", "trough");
        assertThat(LIBRARY.knows("part")).isFalse();
        assertThat(LIBRARY.title("basin")).isEqualTo("Pretend basin");
    }

    @Test
    void whatHasARoleOrComesFromANeighbourIsNotAskedOfTheEngineer() {
        assertThat(LIBRARY.declared("trough")).extracting(Declared::symbol).containsExactly("size", "b", "h_g");
        assertThat(LIBRARY.declared("trough"))
                .extracting(Declared::kind)
                .containsExactly(Declared.Kind.CHOICE, Declared.Kind.ENTRY, Declared.Kind.CASE);
        assertThat(LIBRARY.declared("trough")).extracting(Declared::optional).containsExactly(false, false, true);
        assertThat(LIBRARY.declared("trough").get(0).words()).containsExactly("small", "large");
        assertThat(LIBRARY.declared("trough").get(1).sign()).isEqualTo(Sign.POSITIVE);
    }

    @Test
    void aSheetIsReadOnce() {
        assertThat(LIBRARY.sheet("trough")).isSameAs(LIBRARY.sheet("trough"));
    }
}
