package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.formula.Operator;
import nappe.formula.Reading;
import org.jspecify.annotations.Nullable;

/**
 * The typeset reading of a formula, as a textbook sets it: fractions with a bar, roots, raised exponents, italic
 * symbols with upright subscripts, cases behind a brace.
 */
final class EquationReading implements Reading<BoxRow> {
    private static final int AT_RELATION = 0;
    private static final int AT_SUM = 1;
    private static final int AT_PRODUCT = 2;
    private static final int AT_BLANK = 1;
    private static final int IN_QUOTES = 5;
    private static final int IN_WORD = 8;

    /** A longer word may be broken anywhere. */
    private static final int LONGEST_WORD = 24;

    private final Type type;
    private final double width;
    private final boolean crosses;
    private final Shapes shapes;

    /**
     * @param width of the lines that cases are broken to, in points
     * @param crosses whether every product has a cross, as between numbers
     */
    EquationReading(Type type, double width, boolean crosses) {
        this.type = type;
        this.width = width;
        this.crosses = crosses;
        this.shapes = new Shapes(type);
    }

    Type type() {
        return type;
    }

    double width() {
        return width;
    }

    Shapes shapes() {
        return shapes;
    }

    private EquationReading at(Type other) {
        return new EquationReading(other, width, crosses);
    }

    EquationReading narrower(double by) {
        return new EquationReading(type, width - by, crosses);
    }

    double em(double part) {
        return part * type.size();
    }

    /** A name as a symbol; {@code before(x)} and the like keep their word; {@code sizes.C} is a column of a table. */
    BoxRow name(String name) {
        int point = name.lastIndexOf('.');
        if (name.indexOf(':') >= 0 || name.indexOf('!') >= 0) {
            return words(name);
        }
        if (point > 0 && point < name.length() - 1) {
            return words("column")
                    .then(em(Type.MEDIUM), AT_BLANK, symbol(name.substring(point + 1), null))
                    .then(em(Type.MEDIUM), AT_BLANK, words("of " + name.substring(0, point)));
        }
        int bracket = name.indexOf('(');
        if (bracket > 0 && name.endsWith(")")) {
            return call(name.substring(0, bracket), List.of(name(name.substring(bracket + 1, name.length() - 1))));
        }
        return symbol(name, null);
    }

    private BoxRow symbol(String name, @Nullable Box raised) {
        List<Piece> pieces = SymbolPrint.pieces(name);
        Box letter = type.italic(pieces.get(0).text());
        Box below = pieces.size() > 1 ? type.script().upright(pieces.get(1).text()) : null;
        if (below == null && raised == null) {
            return BoxRow.atom(letter);
        }
        return BoxRow.atom(shapes.scripts(letter, below, raised));
    }

    /** Words that may be broken between them. */
    BoxRow words(String text) {
        return words(text, AT_BLANK);
    }

    private BoxRow words(String text, int atBlank) {
        List<BoxRow.Item> items = new ArrayList<>();
        double gap = 0;
        for (String word : text.split("(?<= )", -1)) {
            String bare = word.stripTrailing();
            for (int from = 0; from < bare.length(); from += LONGEST_WORD) {
                int to = Math.min(bare.length(), from + LONGEST_WORD);
                items.add(new BoxRow.Item(
                        type.upright(bare.substring(from, to)), from == 0 ? gap : 0, from == 0 ? atBlank : IN_WORD));
            }
            gap = bare.length() < word.length() ? em(Type.MEDIUM) : 0;
        }
        if (items.isEmpty()) {
            return BoxRow.atom(Box.empty(0, 0, 0));
        }
        items.set(0, items.get(0).glued(0));
        return new BoxRow(items, BoxRow.ATOM, false, false, false);
    }

    /** An upright name and what it is of, in brackets. */
    BoxRow call(String name, List<BoxRow> of) {
        return called(BoxRow.atom(type.upright(name)), of);
    }

    BoxRow called(BoxRow name, List<BoxRow> of) {
        BoxRow all = of.get(0).bound(BoxRow.ATOM);
        for (BoxRow next : of.subList(1, of.size())) {
            all = all.then(0, BoxRow.atom(type.upright(","))).then(em(Type.THICK), AT_SUM, next);
        }
        return name.then(em(0.02), all.bracketed(shapes));
    }

    @Override
    public BoxRow numeral(Formula.Numeral numeral) {
        return BoxRow.atom(type.upright(numeral.text())).with(true, false);
    }

    @Override
    public BoxRow quantity(Formula.Quantity quantity) {
        List<Piece> unit = UnitPrint.pieces(quantity.unit().text());
        Box number = type.upright(quantity.text());
        return unit.isEmpty()
                ? BoxRow.atom(number).with(true, false)
                : BoxRow.of(BoxRow.PRODUCT, Box.row(List.of(number, type.gap(Type.THIN), type.pieces(unit))))
                        .with(true, true);
    }

    @Override
    public BoxRow word(Formula.Word word) {
        return words("“" + XmlText.safe(word.text()) + "”", IN_QUOTES);
    }

    @Override
    public BoxRow symbol(Formula.Symbol symbol) {
        return name(symbol.name());
    }

    @Override
    public BoxRow neighbour(Formula.Neighbour neighbour) {
        return call(neighbour.before() ? "before" : "after", List.of(name(neighbour.name())));
    }

    @Override
    public BoxRow summary(Formula.Summary summary) {
        return call(summary.kind(), List.of(name(summary.name())));
    }

    @Override
    public BoxRow negation(Formula.Negation negation) {
        BoxRow of = negation.of().read(this);
        boolean number = negation.of() instanceof Formula.Quantity;
        BoxRow inside = of.minusFirst() ? of.bracketed(shapes) : number ? of : of.within(BoxRow.MINUS, shapes);
        return BoxRow.atom(type.upright("−")).then(0, inside).withMinusFirst();
    }

    @Override
    public BoxRow operation(Formula.Operation operation) {
        return switch (operation.operator()) {
            case PLUS -> infix(operation, "+", AT_SUM, BoxRow.SUM, BoxRow.SUM);
            case MINUS -> infix(operation, "−", AT_SUM, BoxRow.SUM, BoxRow.PRODUCT);
            case TIMES -> times(operation);
            case OVER -> over(operation);
            case POWER -> power(operation);
        };
    }

    private BoxRow infix(Formula.Operation operation, String sign, int price, int leastLeft, int leastRight) {
        BoxRow left = operation.left().read(this).within(leastLeft, shapes);
        BoxRow right = operation.right().read(this).within(leastRight, shapes);
        BoxRow second = right.minusFirst() ? right.bracketed(shapes) : right;
        return left.then(em(Type.MEDIUM), price, BoxRow.atom(type.upright(sign)))
                .then(em(Type.MEDIUM), second)
                .bound(operation.operator().binding());
    }

    private BoxRow times(Formula.Operation operation) {
        BoxRow left = operation.left().read(this).within(BoxRow.PRODUCT, shapes);
        BoxRow right = operation.right().read(this).within(BoxRow.PRODUCT, shapes);
        if (crosses || right.numberFirst() || left.unitLast()) {
            return infix(operation, "×", AT_PRODUCT, BoxRow.PRODUCT, BoxRow.PRODUCT);
        }
        BoxRow second = right.minusFirst() ? right.bracketed(shapes) : right;
        return left.then(em(Type.THIN), second).bound(BoxRow.PRODUCT);
    }

    private BoxRow over(Formula.Operation operation) {
        if (operation.left() instanceof Formula.Operation product
                && product.operator() == Operator.TIMES
                && product.right() instanceof Formula.Numeral
                && operation.right() instanceof Formula.Numeral) {
            return times(new Formula.Operation(Operator.TIMES, product.left(), quotient(product, operation)));
        }
        if (!type.hasSlashes()) {
            EquationReading inner = at(type.inFraction());
            BoxRow above = operation.left().read(inner);
            BoxRow below = operation.right().read(inner);
            return BoxRow.of(BoxRow.MINUS, shapes.fraction(above.box(), below.box()))
                    .with(above.numberFirst(), false);
        }
        BoxRow left = operation.left().read(this);
        BoxRow above = left.within(left.unitLast() && left.numberFirst() ? BoxRow.MINUS : BoxRow.PRODUCT, shapes);
        BoxRow below = operation.right().read(this).within(BoxRow.MINUS, shapes);
        double gap = em(0.04);
        return above.then(gap, AT_PRODUCT, BoxRow.atom(type.upright("/")))
                .then(gap, below)
                .bound(Operator.OVER.binding());
    }

    /** Of {@code C*2/3}, the {@code 2/3}: two numbers that belong together are set as one fraction. */
    private static Formula quotient(Formula.Operation product, Formula.Operation whole) {
        return new Formula.Operation(Operator.OVER, product.right(), whole.right());
    }

    private BoxRow power(Formula.Operation operation) {
        Box exponent = operation.right().read(at(type.script())).box();
        if (operation.left() instanceof Formula.Symbol symbol && symbol.name().matches("\\w+")) {
            return symbol(symbol.name(), exponent).bound(BoxRow.POWER);
        }
        BoxRow base = operation.left().read(this).within(BoxRow.ATOM, shapes);
        List<BoxRow.Item> items = new ArrayList<>(base.items());
        int last = items.size() - 1;
        items.set(
                last,
                new BoxRow.Item(
                        shapes.scripts(items.get(last).box(), null, exponent),
                        items.get(last).gap(),
                        items.get(last).price()));
        return new BoxRow(items, BoxRow.POWER, base.numberFirst(), false, false);
    }

    @Override
    public BoxRow comparison(Formula.Comparison comparison) {
        BoxRow right = comparison.right().read(this).within(BoxRow.SUM, shapes);
        return comparison
                .left()
                .read(this)
                .within(BoxRow.SUM, shapes)
                .then(em(Type.THICK), AT_RELATION + 1, BoxRow.atom(type.upright(sign(comparison.comparator()))))
                .then(em(Type.THICK), right)
                .bound(BoxRow.LOOSE);
    }

    private static String sign(Comparator comparator) {
        return switch (comparator) {
            case AT_MOST -> "≤";
            case AT_LEAST -> "≥";
            case UNLIKE -> "≠";
            case BELOW, ABOVE, EQUAL -> comparator.sign();
        };
    }

    @Override
    public BoxRow logic(Formula.Logic logic) {
        List<Formula> parts = logic.parts();
        double blank = em(Type.MEDIUM);
        if (logic.kind().equals("not")) {
            BoxRow of = parts.get(0).read(this).within(BoxRow.SUM, shapes);
            return BoxRow.atom(type.upright("not")).then(blank, of).bound(BoxRow.LOOSE);
        }
        BoxRow all = part(parts.get(0));
        for (Formula part : parts.subList(1, parts.size())) {
            all = all.then(blank, AT_RELATION, BoxRow.atom(type.upright(logic.kind())))
                    .then(blank, part(part));
        }
        return all.bound(BoxRow.LOOSE);
    }

    private BoxRow part(Formula formula) {
        BoxRow part = formula.read(this);
        return formula instanceof Formula.Logic logic && !logic.kind().equals("not") ? part.bracketed(shapes) : part;
    }

    @Override
    public BoxRow call(Formula.Call call) {
        return CallSetting.of(call, this);
    }

    @Override
    public BoxRow noResult(Formula.NoResult noResult) {
        return words(XmlText.safe(noResult.why())).bound(BoxRow.LOOSE);
    }
}
