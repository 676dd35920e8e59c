package nappe.deliver.xlsx;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Cell;
import nappe.calculation.Formulas;
import nappe.calculation.Place;
import nappe.calculation.Reference;
import nappe.calculation.Run;
import nappe.calculation.Sureness;
import nappe.formula.Formula;
import nappe.formula.FormulaParser;
import nappe.formula.Function;
import nappe.formula.Value;
import nappe.unit.Unit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Symbols a to d stand in B1 to B4, e on the sheet F1, w (words) in B6, u and v (unsure) in B7 and B8. */
class SpreadsheetReadingTest {
    private final Map<String, Reference> known = new LinkedHashMap<>();

    SpreadsheetReadingTest() {
        for (int i = 0; i < 4; i++) {
            known.put("abcd".substring(i, i + 1), number("S", i, 1));
        }
        known.put("e", number("F1", 13, 4));
        known.put("w", Cell.typed(Cell.Kind.ENTRY, new Place("S", 5, 1), "w", Unit.one(), Value.word("free")));
        known.put("u", unsure(6));
        known.put("v", unsure(7));
        known.put("1 ft3/s", number("Factors", 2, 2));
        List<Cell> column = new ArrayList<>();
        for (int i = 3; i < 38; i++) {
            column.add(number("Tables", i, 1));
        }
        known.put("run", new Run(column));
        known.put("single", new Run(List.of(number("F1", 6, 7))));
        known.put("along", new Run(List.of(number("F1", 6, 7), number("F1", 6, 8))));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            a+b-c             | B1+B2-B3
            a-(b-c)           | B1-(B2-B3)
            a+(b+c)           | B1+(B2+B3)
            a*b/c             | B1*B2/B3
            a/(b*c)           | B1/(B2*B3)
            (a+b)*c           | (B1+B2)*B3
            a+b*c             | B1+B2*B3
            -a                | -B1
            -a+b              | (-B1)+B2
            a-(-b)            | B1-(-B2)
            a*-b              | B1*(-B2)
            -a^2              | -(B1^2)
            (-a)^2            | (-B1)^2
            -(a*b)            | -(B1*B2)
            a^-2              | B1^(-2)
            a^-b^c            | B1^(-(B2^B3))
            a^b^c             | B1^(B2^B3)
            (a^b)^c           | (B1^B2)^B3
            a^(b/c)           | B1^(B2/B3)
            2*a^1.5*b         | 2*B1^1.5*B2
            sqrt(a)^2         | SQRT(B1)^2
            e*a               | 'F1'!E14*B1
            0.385             | 0.385
            1e-7*a            | 1E-7*B1
            4 ft3/s * a       | 4*'Factors'!C3*B1
            a/(4 ft3/s)       | B1/(4*'Factors'!C3)
            a/1 ft3/s         | B1/'Factors'!C3
            a/1 ft            | B1
            (a/1 ft)^2        | B1^2
            ((a+b)/1 ft)^2    | (B1+B2)^2
            4 ft * a          | 4*B1
            a*1 ft            | B1
            1 ft * a          | B1
            1 ft / a          | 1/B1
            log10(a)+ln(b)    | LOG10(B1)+LN(B2)
            tanh(a)-atan(b)   | TANH(B1)-ATAN(B2)
            max(a, b, c)      | MAX(B1,B2,B3)
            min(a, b + c)     | MIN(B1,B2+B3)
            """)
    void arithmetic(String formula, String text) {
        assertThat(text(formula)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            if(a <= b, c, d)            | IF(B1-B2<=1E-9*ABS(B2),B3,B4)
            if(a < b, c, d)             | IF(B1-B2<-1E-9*ABS(B2),B3,B4)
            if(a >= b, c, d)            | IF(B2-B1<=1E-9*ABS(B2),B3,B4)
            if(a > b, c, d)             | IF(B2-B1<-1E-9*ABS(B2),B3,B4)
            if(a = b, c, d)             | IF(ABS(B1-B2)<=1E-9*ABS(B2),B3,B4)
            if(a <> b, c, d)            | IF(ABS(B1-B2)>1E-9*ABS(B2),B3,B4)
            if(a + b <= c - d, 1, 2)    | IF(B1+B2-(B3-B4)<=1E-9*ABS(B3-B4),1,2)
            if(a >= b + c, 1, 2)        | IF(B2+B3-B1<=1E-9*ABS(B2+B3),1,2)
            if(a <= 0.4, "met", "over") | IF(B1-0.4<=1E-9*ABS(0.4),"met","over")
            if(w = "free", a, b)        | IF(B6="free",B1,B2)
            if("free" <> w, a, b)       | IF("free"<>B6,B1,B2)
            if(a < b and c < d, 1, 2)   | IF(AND(B1-B2<-1E-9*ABS(B2),B3-B4<-1E-9*ABS(B4)),1,2)
            if(not w = "free" or a < b, 1, 2) | IF(OR(NOT(B6="free"),B1-B2<-1E-9*ABS(B2)),1,2)
            if(a < b, none(), a)    | IF(B1-B2<-1E-9*ABS(B2),"no result",B1)
            """)
    void conditionsCarryTheTolerance(String formula, String text) {
        assertThat(text(formula)).isEqualTo(text);
    }

    @Test
    void quotesInWordsAreDoubled() {
        assertThat(text(new Formula.Word("6\" pipe"), Sureness.SURE)).isEqualTo("\"6\"\" pipe\"");
    }

    @Test
    void columnsOfATableAreFixedRanges() {
        Formula run = Formulas.symbol("run");
        Formula a = Formulas.symbol("a");
        assertThat(text(Formulas.call(Function.MATCH, Formulas.symbol("w"), run), Sureness.SURE))
                .isEqualTo("MATCH(B6,'Tables'!$B$4:$B$38,0)");
        assertThat(text(Formulas.call(Function.MATCH_BELOW, a, run), Sureness.SURE))
                .isEqualTo("MATCH(B1+1E-9*ABS(B1),'Tables'!$B$4:$B$38,1)");
        assertThat(text(Formulas.call(Function.INDEX, run, a), Sureness.SURE))
                .isEqualTo("INDEX('Tables'!$B$4:$B$38,B1)");
        assertThat(text(Formulas.call(Function.SMALL, run, a), Sureness.SURE))
                .isEqualTo("SMALL('Tables'!$B$4:$B$38,B1)");
        assertThat(text(Formulas.call(Function.LOWEST_OF, run), Sureness.SURE)).isEqualTo("MIN('Tables'!$B$4:$B$38)");
        assertThat(text(Formulas.call(Function.TALLY, run, Formulas.word("met")), Sureness.SURE))
                .isEqualTo("COUNTIF('Tables'!$B$4:$B$38,\"met\")");
        assertThat(text(new Formula.Summary("last", "run"), Sureness.SURE)).isEqualTo("'Tables'!B38");
        assertThat(text(new Formula.Summary("highest", "run"), Sureness.SURE)).isEqualTo("MAX('Tables'!$B$4:$B$38)");
    }

    @Test
    void aPlaceInARunAlongARowIsThatOfTheColumn() {
        assertThat(text(Formulas.call(Function.INDEX, Formulas.symbol("along"), Formulas.symbol("a")), Sureness.SURE))
                .isEqualTo("INDEX('F1'!$H$7:$I$7,1,B1)");
    }

    @Test
    void aRunOfOneCellIsNotLookedInto() {
        assertThat(text(Formulas.call(Function.INDEX, Formulas.symbol("single"), Formulas.symbol("a")), Sureness.SURE))
                .isEqualTo("IF(B1=1,'F1'!H7,\"no result\")");
    }

    @Test
    void exactlyEqualIsWithoutTolerance() {
        Formula same = Formulas.call(Function.SAME, Formulas.symbol("a"), FormulaParser.parse("b + c"));
        assertThat(text(Formulas.iff(same, Formulas.number("1"), Formulas.number("2")), Sureness.SURE))
                .isEqualTo("IF(B1=B2+B3,1,2)");
    }

    @Test
    void wordsArePassedOnInTheOrderOfTheSymbols() {
        assertThat(text(FormulaParser.parse("v*a + u/v"), Sureness.MAY_BE_WORDS))
                .isEqualTo(
                        "IF(ISNUMBER(B8),IF(ISNUMBER(B7),B8*B1+B7/B8,IF(B7=\"\",\"not given\",B7)),IF(B8=\"\",\"not given\",B8))");
    }

    @Test
    void aCellThatMayFailShowsNoResult() {
        assertThat(text(FormulaParser.parse("sqrt(a - b)"), Sureness.MAY_FAIL))
                .isEqualTo("IFERROR(SQRT(B1-B2),\"no result\")");
        assertThat(text(FormulaParser.parse("sqrt(u)"), Sureness.MAY_FAIL))
                .isEqualTo("IF(ISNUMBER(B7),IFERROR(SQRT(B7),\"no result\"),IF(B7=\"\",\"not given\",B7))");
    }

    @Test
    void whatTheFormulaTestsItselfIsNotGuarded() {
        Formula isNumber = Formulas.call(Function.IS_NUMBER, Formulas.symbol("u"));
        assertThat(text(
                        Formulas.iff(isNumber, FormulaParser.parse("u + v"), Formulas.number("0")),
                        Sureness.MAY_BE_WORDS))
                .isEqualTo("IF(ISNUMBER(B8),IF(ISNUMBER(B7),B7+B8,0),IF(B8=\"\",\"not given\",B8))");
        assertThat(text(FormulaParser.parse("if(u = \"free\", a, b)"), Sureness.SURE))
                .isEqualTo("IF(B7=\"free\",B1,B2)");
        assertThat(text(FormulaParser.parse("u"), Sureness.MAY_BE_WORDS)).isEqualTo("IF(B7=\"\",\"not given\",B7)");
    }

    @Test
    void aSymbolThatPointsNowhereIsAFault() {
        assertThatThrownBy(() -> text("a + nowhere"))
                .isInstanceOf(IllegalStateException.class)
                .hasMessage("'S'!D10 (x): nowhere points to no cell");
    }

    private String text(String formula) {
        return text(FormulaParser.parse(formula), Sureness.SURE);
    }

    private String text(Formula formula, Sureness sureness) {
        return SpreadsheetReading.of(Cell.live(new Place("S", 9, 3), "x", Unit.one(), formula, known, sureness));
    }

    private static Cell number(String sheet, int row, int column) {
        return Cell.typed(Cell.Kind.ENTRY, new Place(sheet, row, column), "", Unit.one(), Value.of(1));
    }

    private static Cell unsure(int row) {
        return Cell.typed(Cell.Kind.ENTRY, new Place("S", row, 1), "", Unit.one(), new Value.None(Value.NOT_GIVEN));
    }
}
