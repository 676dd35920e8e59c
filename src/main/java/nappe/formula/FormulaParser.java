package nappe.formula;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import nappe.unit.Unit;

/**
 * Reads formula text, one method a level of precedence:
 *
 * <pre>
 * condition  = both { "or" both }
 * both       = not { "and" not }
 * not        = "not" not | comparison
 * comparison = sum [ ("&lt;=" | "&lt;" | "&gt;=" | "&gt;" | "=" | "&lt;&gt;") sum ]
 * sum        = product { ("+" | "-") product }
 * product    = signed { ("*" | "/") signed }
 * signed     = "-" signed | power
 * power      = atom [ "^" signed ]                      groups to the right
 * atom       = numeral [unit] | words | symbol | function "(" ... ")" | "(" condition ")"
 * </pre>
 *
 * A statement of a method sheet reads several formulas with words between them: it asks for a {@link #sum()}, then for a
 * word, and so on, with one parser.
 */
public final class FormulaParser {
    /** Spreadsheets have a bound of this kind too; a formula that needs more is better read in several lines. */
    private static final int DEEPEST = 60;

    private static final int LONGEST = 2000;

    private final List<Token> tokens;
    private final Map<Formula, Integer> offsets = new IdentityHashMap<>();
    private int at;
    private int depth;

    public FormulaParser(String text) {
        this.tokens = Tokens.of(text);
        if (tokens.size() > LONGEST) {
            throw new FormulaException(
                    "a formula of more than " + LONGEST + " parts; write it in several lines",
                    tokens.get(LONGEST).offset(),
                    1,
                    "formula-long");
        }
    }

    /** A whole text as one formula. */
    public static Formula parse(String text) {
        FormulaParser parser = new FormulaParser(text);
        Formula formula = parser.condition();
        parser.end();
        return formula;
    }

    /** Where each node that was read starts in the text; by identity. */
    public Map<Formula, Integer> offsets() {
        return offsets;
    }

    /** Where the next token starts. */
    public int offset() {
        return tokens.get(at).offset();
    }

    /** Whether the given name comes next; if so it is passed. */
    public boolean passes(String name) {
        if (tokens.get(at).isName(name) || tokens.get(at).isSign(name)) {
            at++;
            return true;
        }
        return false;
    }

    /** The name or sign that must come next. */
    public void expect(String name) {
        if (!passes(name)) {
            throw unexpected("\"" + name + "\"");
        }
    }

    /** A symbol that must come next. */
    public String name() {
        Token token = tokens.get(at);
        if (token.kind() != Token.Kind.NAME) {
            throw unexpected("a symbol");
        }
        at++;
        return token.text();
    }

    /** A whole number that must come next. */
    public int count() {
        Token token = tokens.get(at);
        if (token.kind() != Token.Kind.NUMERAL
                || token.unit() != null
                || !token.text().matches("\\d{1,4}")) {
            throw unexpected("a whole number");
        }
        at++;
        return Integer.parseInt(token.text());
    }

    /** Nothing may follow. */
    public void end() {
        if (tokens.get(at).kind() != Token.Kind.END) {
            throw unexpected("an operation or the end");
        }
    }

    /** Whether all has been read. */
    public boolean atEnd() {
        return tokens.get(at).kind() == Token.Kind.END;
    }

    /** A condition or, where nothing is compared, any formula. */
    public Formula condition() {
        int start = offset();
        List<Formula> parts = new ArrayList<>(List.of(both()));
        while (passes("or")) {
            parts.add(both());
        }
        return parts.size() == 1 ? parts.get(0) : at(start, new Formula.Logic("or", List.copyOf(parts)));
    }

    private Formula both() {
        int start = offset();
        List<Formula> parts = new ArrayList<>(List.of(not()));
        while (passes("and")) {
            parts.add(not());
        }
        return parts.size() == 1 ? parts.get(0) : at(start, new Formula.Logic("and", List.copyOf(parts)));
    }

    private Formula not() {
        int start = offset();
        goDeeper();
        Formula read = passes("not") ? at(start, new Formula.Logic("not", List.of(not()))) : comparison();
        depth--;
        return read;
    }

    private Formula comparison() {
        int start = offset();
        Formula left = sum();
        Optional<Comparator> comparator = comparator();
        return comparator.isEmpty() ? left : at(start, new Formula.Comparison(comparator.get(), left, sum()));
    }

    /** The comparison sign that comes next, if one does; it is passed. */
    public Optional<Comparator> comparator() {
        for (Comparator comparator : Comparator.values()) {
            if (passes(comparator.sign())) {
                return Optional.of(comparator);
            }
        }
        return Optional.empty();
    }

    /** A formula without comparison. */
    public Formula sum() {
        int start = offset();
        Formula left = product();
        while (tokens.get(at).isSign("+") || tokens.get(at).isSign("-")) {
            Operator operator = passes("+") ? Operator.PLUS : minus();
            left = at(start, new Formula.Operation(operator, left, product()));
        }
        return left;
    }

    private Operator minus() {
        at++;
        return Operator.MINUS;
    }

    private Formula product() {
        int start = offset();
        Formula left = signed();
        while (true) {
            if (passes("*")) {
                left = at(start, new Formula.Operation(Operator.TIMES, left, signed()));
            } else if (passes("/")) {
                left = at(start, new Formula.Operation(Operator.OVER, left, signed()));
            } else {
                return left;
            }
        }
    }

    private Formula signed() {
        int start = offset();
        goDeeper();
        Formula read = passes("-") ? at(start, new Formula.Negation(signed())) : power();
        depth--;
        return read;
    }

    private void goDeeper() {
        depth++;
        if (depth > 2 * DEEPEST) {
            throw new FormulaException(
                    "brackets or signs nested more than " + DEEPEST + " deep; write the formula in several lines",
                    offset(),
                    1,
                    "formula-deep");
        }
    }

    private Formula power() {
        int start = offset();
        Formula base = atom();
        return passes("^") ? at(start, new Formula.Operation(Operator.POWER, base, signed())) : base;
    }

    private Formula atom() {
        int start = offset();
        Token token = tokens.get(at);
        switch (token.kind()) {
            case NUMERAL -> {
                at++;
                return at(start, numeral(token));
            }
            case WORD -> {
                at++;
                return at(start, new Formula.Word(token.text()));
            }
            case NAME -> {
                at++;
                return at(start, tokens.get(at).isSign("(") ? call(token) : new Formula.Symbol(token.text()));
            }
            default -> {
                if (passes("(")) {
                    Formula inner = condition();
                    expect(")");
                    return inner;
                }
                throw unexpected("a number, a symbol or \"(\"");
            }
        }
    }

    private static Formula numeral(Token token) {
        double value = Double.parseDouble(token.text());
        Unit unit = token.unit();
        return unit == null
                ? new Formula.Numeral(value, token.text())
                : new Formula.Quantity(value, token.text(), unit);
    }

    private Formula call(Token name) {
        expect("(");
        switch (name.text()) {
            case "none" -> {
                expect(")");
                return new Formula.NoResult(Value.NO_RESULT);
            }
            case "given" -> {
                Formula symbol = new Formula.Symbol(name());
                expect(")");
                return new Formula.Call(Function.IS_NUMBER, List.of(symbol));
            }
            case "before", "after" -> {
                String symbol = name();
                expect(")");
                return new Formula.Neighbour(name.text().equals("before"), symbol);
            }
            case "last", "highest", "lowest" -> {
                String symbol = name();
                expect(")");
                return new Formula.Summary(name.text(), symbol);
            }
            default -> {
                return function(name);
            }
        }
    }

    private Formula function(Token name) {
        Function function = Function.forAuthors(name.text())
                .orElseThrow(() -> new FormulaException(
                        name.text() + " is not a function",
                        name.offset(),
                        name.text().length(),
                        "function-unknown"));
        List<Formula> arguments = new ArrayList<>(List.of(condition()));
        while (passes(",")) {
            arguments.add(condition());
        }
        expect(")");
        if (arguments.size() < function.least() || arguments.size() > function.most()) {
            String wanted = function.least() == function.most()
                    ? Integer.toString(function.least())
                    : function.least() + " or more";
            throw new FormulaException(
                    name.text() + " takes " + wanted + " arguments, here are " + arguments.size(),
                    name.offset(),
                    name.text().length(),
                    "arguments-wrong");
        }
        return new Formula.Call(function, List.copyOf(arguments));
    }

    private FormulaException unexpected(String wanted) {
        Token token = tokens.get(at);
        return new FormulaException(
                "found " + token.shown() + " where " + wanted + " was expected",
                token.offset(),
                Math.max(1, token.text().length()),
                "syntax");
    }

    private Formula at(int start, Formula formula) {
        offsets.put(formula, start);
        return formula;
    }
}
