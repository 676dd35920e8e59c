package nappe.method;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import org.junit.jupiter.api.Test;

/** The statement screen: what it takes in, and where its faults are shown. */
class ScreenStatementTest {
    private static final String METHOD = """
            method Pretend
            source INV ; invented for a test
            choice size from pretend-sizes ; nominal size
            choice other from pretend-sizes ; another choice
            entry  b ; 1 ; some number
            case   Q = flow ; m3/s ; flow
            table  pretend-sizes by size ; INV
            column C ; 1 ; coefficient
            column kind ; words ; kind of size
            line   k = C*b ; 1 ; product
            line   q = k*Q ; m3/s ; per case
            line   p = 2*Q ; m3/s ; without the size
            line   m = highest(q) ; m3/s ; over the cases
            line   v = if(q > 1 m3/s, "much", "little") ; words ; words per case
            free   y ; 1 ; unknown
            line   f = k*y ; 1 ; rests on y
            at     y = 2*k : g = f
            root   r = y where f = b between b/k/2 and 2*b/k ; 1 ; root
            line   s = r + 1 ; 1 ; beyond the root
            """;

    @Test
    void itTakesInWhatLeadsFromTheChoiceToItsTargets() {
        Screen screen = new MethodReader(texts("screen size : kind, g, q"))
                .read("pretend")
                .screen();
        assertThat(screen.choice()).isEqualTo("size");
        assertThat(screen.targets()).containsExactly("kind", "g", "q");
        assertThat(screen.members().stream().flatMap(item -> item.outputs().stream()))
                .contains("C", "kind", "k", "q", "g")
                .doesNotContain("b", "p", "Q", "f", "size");
    }

    @Test
    void aSheetNeedsNone() {
        assertThat(new MethodReader(texts("")).read("pretend").screen()).isNull();
    }

    @Test
    void itsFaultsAreShownAtTheSymbol() {
        assertThat(faults("screen b : k")).isEqualTo("""
                pretend.txt:20:8: b is not a choice; what is screened are the words of one (fault: not-a-choice)
                    screen b : k
                           ^""");
        assertThat(faults("screen nothing : k")).contains("20:8: nothing is not defined above (fault: symbol-unknown)");
        assertThat(faults("screen size : k, nothing"))
                .contains("20:18: nothing is not defined above (fault: symbol-unknown)");
        assertThat(faults("screen size : k, q, k")).contains("20:21: k is named already (fault: symbol-twice)");
        assertThat(faults("screen size : k, p"))
                .contains("20:18: p does not rest on size; it is the same for each of its words (fault: not-screened)");
        assertThat(faults("screen other : k")).contains("20:16: k does not rest on other", "not-screened");
        assertThat(faults("screen size : size")).contains("20:15: size does not rest on size", "not-screened");
        assertThat(faults("screen size : f"))
                .contains(
                        "20:15: f rests on a free symbol and has no value by itself; name one with at (fault: no-value)");
        assertThat(faults("screen size : s")).contains("20:15: s rests on the root r, ", "(fault: rests-on-root)");
        assertThat(faults("screen size : r")).contains("20:15: r rests on the root r, ", "(fault: rests-on-root)");
        assertThat(faults("screen size : m"))
                .contains("20:15: m rests on m, which is over the cases; name q, ", "(fault: over-cases)");
        assertThat(faults("screen size : v")).contains("20:15: v holds words in each case", "(fault: words-per-case)");
        assertThat(faults("screen size")).contains("(fault: syntax)");
        assertThat(faults("screen size :")).contains("(fault: syntax)");
        assertThat(faults("screen size : k q")).contains("(fault: syntax)");
        assertThat(faults("screen size : k\nscreen size : q")).contains("21:1: ", "(fault: screen-twice)");
    }

    @Test
    void aTargetThatIsBrokenItselfBringsNoSecondFault() {
        assertThat(faults("line bad = C + 1 m ; 1 ; l\nscreen size : bad"))
                .contains("unlike-dimensions")
                .doesNotContain("screen");
    }

    private static Texts texts(String statement) {
        return new Texts()
                .method("pretend", METHOD + statement + "\n")
                .table("pretend-sizes", "size,C [1],kind\nsmall,2.5,narrow\nlarge,3.5,wide\n");
    }

    private static String faults(String statement) {
        return catchThrowableOfType(MethodException.class, () -> new MethodReader(texts(statement)).read("pretend"))
                .getMessage();
    }
}
