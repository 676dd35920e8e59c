package nappe.method;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import nappe.formula.Formula;
import nappe.formula.FormulaParser;
import nappe.formula.PlainReading;
import nappe.formula.Sign;
import nappe.source.BuiltInLibrary;
import nappe.source.Publication;
import nappe.unit.Unit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class MethodReaderTest {
    private static final Texts TEXTS = new Texts()
            .table("pretend-sizes", "size,C [1],d [mm],kind\nsmall,2.5,3,narrow\nlarge,3.5,,wide\n")
            .table("pretend-curve", "r [mm],c [1],e [mm]\n20,0.5,1\n40,0.6,3\n80,0.7,4\n")
            .method("trough", """
                    # An invented device.
                    method    Pretend trough
                    about     One paragraph; with a semicolon,
                              over two lines.   # and a remark
                    about     Another.
                    caution   Never build it.
                    source    INV ; An invented book
                    source    RUM ; A rumour ; memory
                    choice    size from pretend-sizes ; nominal size
                    entry     b ; m ; width
                    entry     z_f ; m ; level of the floor ; any sign
                    entry     d_p ; mm ; a pretend depth ; not negative, optional
                    case      Q = flow ; m3/s ; flow ; not negative
                    case      h_g ; m ; head read ; optional
                    take      z_t = water level ; m ; water level downstream
                    constant  g = 9.81 m/s2 ; m/s2 ; pretend gravity ; INV p. 3
                    constant  k = 1.50 ; 1 ; pretend factor ; RUM p. 4 ; memory
                    table     pretend-sizes by size ; INV p. 5
                    column    C ; 1 ; coefficient ; INV p. 5 ; memory
                    column    d_T = d ; m ; depth from the table
                    column    kind ; words ; kind of size
                    table     pretend-curve between b ; RUM fig. 1
                    column    c ; 1 ; pretend curve
                    free      h ; m ; head
                    free      y ; m ; rise ; any sign
                    line      q = C*c*sqrt(2*g)*b*h^1.5 ; m3/s ; flow at a head ; INV p. 6
                    line      state = if(z_t <= z_f, "free", "drowned") ; words ; state
                    root      h_1 = h where q = Q between 1 mm and 9 m below 0 m above 10 m trials 12 ; m ; head ; INV p. 7
                    at        h = h_g : q_g = q
                    line      z_u = z_f + h_1 ; m ; level upstream
                    limit     0.02 m <= h_1 <= 5*b when not h_1 > 3 m scale b ; head fits ; INV p. 8
                    limit     b <= 4 m ; width fits ; INV p. 8
                    limit     z_t <= z_f ; free ; INV p. 9 ; memory
                    rating    h from 0.02 m to 5*b steps 4 : q
                    give      water level = z_u
                    """);

    private static final MethodSheet TROUGH = new MethodReader(TEXTS).read("trough");

    @Test
    void aSheetSaysItsTitleParagraphsCautionsAndSources() {
        assertThat(TROUGH.title()).isEqualTo("Pretend trough");
        assertThat(TROUGH.about()).containsExactly("One paragraph; with a semicolon, over two lines.", "Another.");
        assertThat(TROUGH.cautions()).containsExactly("Never build it.");
        assertThat(TROUGH.sources())
                .containsExactly(
                        new Publication("INV", "An invented book", false), new Publication("RUM", "A rumour", true));
    }

    @Test
    void aChoiceHasTheWordsOfTheFirstColumn() {
        assertThat(TROUGH.item("size"))
                .isEqualTo(new Item.Given(
                        Item.From.CHOICE,
                        "size",
                        Unit.one(),
                        "nominal size",
                        Sign.POSITIVE,
                        false,
                        "",
                        List.of("small", "large"),
                        "pretend-sizes"));
    }

    @Test
    void whatIsGivenHasItsSignAndMayBeOptional() {
        assertThat(TROUGH.item("b")).isEqualTo(given(Item.From.ENTRY, "b", "m", "width", Sign.POSITIVE, false, ""));
        assertThat(TROUGH.item("z_f"))
                .isEqualTo(given(Item.From.ENTRY, "z_f", "m", "level of the floor", Sign.ANY, false, ""));
        assertThat(TROUGH.item("d_p"))
                .isEqualTo(given(Item.From.ENTRY, "d_p", "mm", "a pretend depth", Sign.NOT_NEGATIVE, true, ""));
        assertThat(TROUGH.item("h_g"))
                .isEqualTo(given(Item.From.CASE, "h_g", "m", "head read", Sign.POSITIVE, true, ""));
    }

    @Test
    void aRoleSaysWhatASymbolIsToTheStation() {
        assertThat(TROUGH.item("Q"))
                .isEqualTo(given(Item.From.CASE, "Q", "m3/s", "flow", Sign.NOT_NEGATIVE, false, "flow"));
        assertThat(TROUGH.item("z_t"))
                .isEqualTo(given(
                        Item.From.NEIGHBOUR,
                        "z_t",
                        "m",
                        "water level downstream",
                        Sign.POSITIVE,
                        false,
                        "water level"));
        assertThat(TROUGH.gives()).isEqualTo(Map.of("water level", "z_u"));
    }

    @Test
    void aConstantKeepsItsDigitsAndItsCitation() {
        Item.Constant k = (Item.Constant) TROUGH.item("k");
        assertThat(k.digits()).isEqualTo("1.50");
        assertThat(k.citation().shown()).isEqualTo("RUM p. 4 (from memory)");
        assertThat(((Item.Constant) TROUGH.item("g")).unit()).isEqualTo(Unit.parse("m/s2"));
    }

    @Test
    void aTableByAWordIsARowAndALookUpPerColumn() {
        assertThat(formula("i_T1")).isEqualTo("match(size, pretend-sizes.size)");
        assertThat(formula("C")).isEqualTo("index(pretend-sizes.C, i_T1)");
        assertThat(formula("d_T"))
                .isEqualTo(
                        "if(is_number(index(pretend-sizes.d, i_T1)), index(pretend-sizes.d, i_T1)*1 mm, none(\"not given\"))");
        assertThat(line("C").source()).isEqualTo("INV p. 5 (from memory)");
        assertThat(line("d_T").mayBeBlank()).isTrue();
        assertThat(line("C").mayBeBlank()).isFalse();
        assertThat(line("kind").unit()).isNull();
    }

    @Test
    void aTableBetweenNumbersIsAShareOfTheWayInCellsOfTheirOwn() {
        assertThat(formula("x_T2")).isEqualTo("min(max(b/1 mm, index(pretend-curve.r, 1)), index(pretend-curve.r, 3))");
        assertThat(formula("i_T2")).isEqualTo("min(match_below(x_T2, pretend-curve.r), 2)");
        assertThat(formula("d_T2")).isEqualTo("index(pretend-curve.r, i_T2 + 1) - index(pretend-curve.r, i_T2)");
        assertThat(formula("t_T2")).isEqualTo("(x_T2 - index(pretend-curve.r, i_T2))/d_T2");
        assertThat(formula("c"))
                .isEqualTo(
                        "index(pretend-curve.c, i_T2) + t_T2*(index(pretend-curve.c, i_T2 + 1) - index(pretend-curve.c, i_T2))");
    }

    @Test
    void aTableBetweenNumbersBringsTheLimitsOfItsEnds() {
        assertThat(TROUGH.limits().subList(0, 2))
                .extracting(Limit::label)
                .containsExactly(
                        "width is within the table, lower end: Pretend table",
                        "width is within the table, upper end: Pretend table");
    }

    @Test
    void aLimitOfThreePartsIsTwo() {
        Limit lower = TROUGH.limits().get(2);
        Limit upper = TROUGH.limits().get(3);
        assertThat(lower.label()).isEqualTo("head fits, lower end");
        assertThat(PlainReading.of(lower.value())).isEqualTo("h_1");
        assertThat(PlainReading.of(lower.bound())).isEqualTo("0.02 m");
        assertThat(upper.label()).isEqualTo("head fits, upper end");
        assertThat(PlainReading.of(upper.value())).isEqualTo("h_1");
        assertThat(PlainReading.of(upper.bound())).isEqualTo("5*b");
        assertThat(PlainReading.of(upper.when())).isEqualTo("not h_1 > 3 m");
        assertThat(PlainReading.of(upper.scale())).isEqualTo("b");
        assertThat(upper.source()).isEqualTo("INV p. 8");
    }

    @Test
    void whatIsJudgedIsTheSideThatVaries() {
        assertThat(PlainReading.of(TROUGH.limits().get(4).value())).isEqualTo("b");
        assertThat(PlainReading.of(TROUGH.limits().get(5).value())).isEqualTo("z_t");
        assertThat(TROUGH.limits().get(4).when()).isNull();
        assertThat(TROUGH.limits().get(4).scale()).isNull();
    }

    @Test
    void aRootHasItsSidesItsBracketAndItsMembers() {
        Item.Root root = (Item.Root) TROUGH.item("h_1");
        assertThat(List.of(root.left(), root.right(), root.from(), root.to(), root.below(), root.above()))
                .extracting(PlainReading::of)
                .containsExactly("q", "Q", "1 mm", "9 m", "0 m", "10 m");
        assertThat(root.trials()).isEqualTo(12);
        assertThat(root.members()).containsExactly(TROUGH.item("q"));
    }

    @Test
    void anAtBindsAFreeSymbolAndNamesWhatComesOfIt() {
        Item.At at = (Item.At) TROUGH.item("q_g");
        assertThat(at.free()).isEqualTo("h");
        assertThat(at.value()).isEqualTo(new Formula.Symbol("h_g"));
        assertThat(at.members()).containsExactly(TROUGH.item("q"));
        assertThat(at.results()).isEqualTo(Map.of("q_g", "q"));
    }

    @Test
    void aRatingGoesInStepsOverAFreeSymbol() {
        Rating rating = TROUGH.ratings().get(0);
        assertThat(rating)
                .isEqualTo(new Rating(
                        "h",
                        FormulaParser.parse("0.02 m"),
                        FormulaParser.parse("5*b"),
                        4,
                        List.of("q"),
                        List.of(TROUGH.item("q"))));
    }

    @Test
    void whatRestsOnAFreeSymbolIsATemplateAndWhatRestsOnACaseIsPerCase() {
        assertThat(TROUGH.isTemplate("q")).isTrue();
        assertThat(TROUGH.isTemplate("h_1")).isFalse();
        assertThat(TROUGH.isTemplate("q_g")).isFalse();
        assertThat(TROUGH.perCase("h_1")).isTrue();
        assertThat(TROUGH.perCase("z_u")).isTrue();
        assertThat(TROUGH.perCase("state")).isTrue();
        assertThat(TROUGH.perCase("c")).isFalse();
        assertThat(TROUGH.perCase("q")).isFalse();
    }

    @Test
    void aSymbolReachesAllItRestsOnLessWhatIsBound() {
        assertThat(TROUGH.reach().get("z_u"))
                .contains("z_f", "h_1", "Q", "C", "size", "b", "g")
                .doesNotContain("h", "q");
        assertThat(TROUGH.reach().get("q")).contains("h", "b");
    }

    @Test
    void theTextForTheFingerprintHoldsTheTables() {
        assertThat(TROUGH.text()).contains("method    Pretend trough").contains("narrow");
    }

    @Test
    void semicolonsAndHashesInQuotesBelongToTheWords() {
        MethodSheet sheet = read("line s = if(1 < 2, \"a; b # c\", \"d\") ; words ; with words\n");
        assertThat(PlainReading.of(((Item.Line) sheet.item("s")).formula()))
                .isEqualTo("if(1 < 2, \"a; b # c\", \"d\")");
    }

    @Test
    void aTextIsIncludedWithWhatItRequires() {
        MethodSheet sheet = new MethodReader(new Texts()
                        .method("part", "requires D ; m ; diameter\nline A_0 = D^2 ; m2 ; area\n")
                        .method(
                                "pretend",
                                "method Pretend\nentry D ; m ; diameter\ninclude part\nline B = 2*A_0 ; m2 ; twice\n"))
                .read("pretend");
        assertThat(sheet.items()).extracting(item -> item.outputs().get(0)).containsExactly("D", "A_0", "B");
        assertThat(sheet.text()).contains("requires D");
    }

    @Test
    void withASubscriptEverySymbolOfAnIncludedTextGetsIt() {
        MethodSheet sheet = new MethodReader(new Texts()
                        .table("pretend-curve", "r [m],c [1]\n1,2\n3,4\n")
                        .method("part", """
                                requires b ; m ; width
                                table pretend-curve between b
                                column c ; 1 ; curve
                                line A_x = c*b^2 ; m2 ; area
                                """)
                        .method("pretend", """
                                method Pretend
                                entry b_e ; m ; width of the throat
                                entry b_a ; m ; width of the approach
                                include part subscript e
                                include part subscript a
                                line R = A_xe/A_xa ; 1 ; ratio
                                """))
                .read("pretend");
        assertThat(PlainReading.of(((Item.Line) sheet.item("A_xa")).formula())).isEqualTo("c_a*b_a^2");
        assertThat(sheet.reach().get("A_xa")).contains("b_a").doesNotContain("b_e");
        assertThat(sheet.reach().get("A_xe")).contains("b_e").doesNotContain("b_a");
    }

    @Test
    void oneTableLookedUpByTwoKeysIsTwoLookUps() {
        MethodSheet sheet = new MethodReader(new Texts()
                        .table("pretend-curve", "r [1],c [1]\n1,2\n3,4\n")
                        .method("pretend", """
                                method Pretend
                                entry r ; 1 ; first key
                                entry s ; 1 ; second key
                                table pretend-curve between r
                                column c_r = c ; 1 ; by the first
                                table pretend-curve between s
                                column c_s = c ; 1 ; by the second
                                table pretend-curve between r
                                column c_t = c ; 1 ; by the first again
                                """))
                .read("pretend");
        assertThat(sheet.reach().get("c_r")).contains("r").doesNotContain("s");
        assertThat(sheet.reach().get("c_s")).contains("s").doesNotContain("r");
        assertThat(sheet.reach().get("c_t")).contains("r", "i_T1").doesNotContain("s", "i_T2");
    }

    static List<String> builtIn() {
        return new MethodLibrary(new BuiltInLibrary()).names();
    }

    @Test
    void theTwoDevicesOfTheFirstIssueAreThere() {
        assertThat(builtIn()).contains("parshall-flume", "rectangular-weir");
    }

    @ParameterizedTest
    @MethodSource("builtIn")
    void everyBuiltInSheetLoadsAndDescribesEverySymbol(String name) {
        MethodSheet sheet = new MethodLibrary(new BuiltInLibrary()).sheet(name);
        for (Item item : sheet.items()) {
            assertThat(label(item)).as(name + ": " + item.outputs()).isNotBlank();
        }
        assertThat(sheet.limits()).allSatisfy(limit -> {
            assertThat(limit.label()).isNotBlank();
            assertThat(limit.source()).isNotBlank();
        });
        assertThat(sheet.about()).isNotEmpty();
        assertThat(sheet.cautions()).isNotEmpty();
    }

    private static String label(Item item) {
        return switch (item.getClass().getSimpleName()) {
            case "Given" -> ((Item.Given) item).label();
            case "Free" -> ((Item.Free) item).label();
            case "Constant" -> ((Item.Constant) item).label();
            case "Line" -> ((Item.Line) item).label();
            case "Root" -> ((Item.Root) item).label();
            default -> "named by at";
        };
    }

    private static MethodSheet read(String statements) {
        return new MethodReader(new Texts().method("pretend", "method Pretend\n" + statements)).read("pretend");
    }

    private static Item.Line line(String symbol) {
        return (Item.Line) TROUGH.item(symbol);
    }

    private static String formula(String symbol) {
        return PlainReading.of(line(symbol).formula());
    }

    private static Item.Given given(
            Item.From from, String symbol, String unit, String label, Sign sign, boolean optional, String role) {
        return new Item.Given(from, symbol, Unit.parse(unit), label, sign, optional, role, List.of(), "");
    }
}
