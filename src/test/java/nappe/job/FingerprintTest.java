package nappe.job;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.method.MethodLibrary;
import nappe.method.MethodReader;
import nappe.method.MethodSheet;
import nappe.method.Texts;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;
import org.junit.jupiter.api.Test;

class FingerprintTest {
    private static final MethodLibrary METHODS = new MethodLibrary(new BuiltInLibrary());
    private static final List<MethodSheet> USED =
            List.of(METHODS.sheet("rectangular-weir"), METHODS.sheet("parshall-flume"));
    private static final Map<String, String> DRAWN =
            Map.of("rectangular-weir", "view a\n", "parshall-flume", "view b\n");
    private static final Design DESIGN =
            Designs.weirBelowFlume(1.6, Designs.flowCase("Low", 0.01, 0.5), Designs.flowCase("High", 0.1, 0.6));
    private static final String MARK = Fingerprint.of(DESIGN, USED, DRAWN, "0.1.0");

    @Test
    void itIsSixteenHexadecimalDigitsInGroupsOfFour() {
        assertThat(MARK).matches("[0-9a-f]{4}( [0-9a-f]{4}){3}");
        assertThat(Fingerprint.ofText("a text")).matches("[0-9a-f]{8}");
    }

    @Test
    void theSameDesignHasTheSameMark() {
        Design again =
                Designs.weirBelowFlume(1.6, Designs.flowCase("Low", 0.01, 0.5), Designs.flowCase("High", 0.1, 0.6));
        assertThat(Fingerprint.of(again, USED, DRAWN, "0.1.0")).isEqualTo(MARK);
    }

    @Test
    void everyTypedValueChangesIt() {
        Map<String, Design> changed = Designs.changedInOneValue(DESIGN);
        Map<String, String> marks = new LinkedHashMap<>();
        changed.forEach((what, design) -> marks.put(what, Fingerprint.of(design, USED, DRAWN, "0.1.0")));
        assertThat(changed).hasSizeGreaterThan(60);
        assertThat(marks.values()).doesNotContain(MARK).doesNotHaveDuplicates();
    }

    @Test
    void whereAValueWasTypedDoesNotChangeIt() {
        Design moved = Designs.design(
                DESIGN.elements().stream().map(FingerprintTest::moved).toList(), DESIGN.cases());
        assertThat(Fingerprint.of(moved, USED, DRAWN, "0.1.0")).isEqualTo(MARK);
    }

    @Test
    void theOrderInWhichSymbolsWereTypedDoesNotChangeIt() {
        List<Design.Element> turned = DESIGN.elements().stream()
                .map(e -> {
                    Map<String, Design.Typed> typed = new LinkedHashMap<>();
                    List<String> symbols = new ArrayList<>(e.typed().keySet());
                    java.util.Collections.reverse(symbols);
                    symbols.forEach(symbol -> typed.put(symbol, e.typed().get(symbol)));
                    return new Design.Element(e.tag(), e.title(), e.method(), typed);
                })
                .toList();
        assertThat(Fingerprint.of(Designs.design(turned, DESIGN.cases()), USED, DRAWN, "0.1.0"))
                .isEqualTo(MARK);
    }

    @Test
    void whatStandsOnEitherSideOfABarIsNotTheSame() {
        assertThat(mark(named("a|b", "c"))).isNotEqualTo(mark(named("a", "b|c")));
    }

    @Test
    void aMethodTextItsTableAndTheVersionChangeIt() {
        String text = "method Pretend\nentry r ; 1 ; key\ntable curve between r\ncolumn c ; 1 ; curve\n";
        String plain = mark(text, "r [1],c [1]\n1,2\n2,3\n");
        assertThat(mark(text.replace("; curve", "; the curve"), "r [1],c [1]\n1,2\n2,3\n"))
                .isNotEqualTo(plain);
        assertThat(mark(text, "r [1],c [1]\n1,2\n2,3.1\n")).isNotEqualTo(plain);
        assertThat(Fingerprint.of(DESIGN, USED, DRAWN, "0.1.1")).isNotEqualTo(MARK);
    }

    @Test
    void aDrawingAndWhoseAMethodIsChangeIt() {
        Map<String, String> other = Map.of("rectangular-weir", "view a\n", "parshall-flume", "view c\n");
        assertThat(Fingerprint.of(DESIGN, USED, other, "0.1.0")).isNotEqualTo(MARK);
        String text = "method Pretend\nentry r ; 1 ; key\n";
        MethodSheet builtIn = new MethodReader(new Texts().method("pretend", text)).read("pretend");
        MethodSheet house = new MethodReader(new Texts().ofHouse("our folder").method("pretend", text)).read("pretend");
        assertThat(house.house()).isEqualTo("our folder");
        assertThat(Fingerprint.of(DESIGN, List.of(house), DRAWN, "0.1.0"))
                .isNotEqualTo(Fingerprint.of(DESIGN, List.of(builtIn), DRAWN, "0.1.0"));
    }

    private static String mark(String text, String table) {
        MethodSheet sheet = new MethodReader(new Texts().table("curve", table).method("pretend", text)).read("pretend");
        return Fingerprint.of(DESIGN, List.of(sheet), DRAWN, "0.1.0");
    }

    private static String mark(Design design) {
        return Fingerprint.of(design, USED, DRAWN, "0.1.0");
    }

    private static Design named(String project, String firm) {
        Design.Project p = Designs.PROJECT;
        Design.Project other = new Design.Project(
                project,
                firm,
                p.client(),
                p.number(),
                p.subject(),
                p.revision(),
                p.date(),
                p.status(),
                p.system(),
                p.letterPaper(),
                p.flowUnit(),
                p.headUnit(),
                p.datum(),
                p.workedCase(),
                p.release(),
                p.sealSpace());
        return new Design(
                other, DESIGN.elements(), DESIGN.cases(), List.of(), List.of(), List.of(), List.of(), List.of());
    }

    private static Design.Element moved(Design.Element element) {
        Map<String, Design.Typed> typed = new LinkedHashMap<>();
        element.typed()
                .forEach((symbol, t) -> typed.put(
                        symbol,
                        new Design.Typed(
                                t.value(), t.unit(), t.source(), t.standing(), new Design.Origin("Moved", "Z99"))));
        return new Design.Element(element.tag(), element.title(), element.method(), typed);
    }
}
