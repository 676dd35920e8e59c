package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.formula.Formula;
import nappe.formula.PlainReading;
import nappe.formula.Value;
import nappe.results.Results;
import org.jspecify.annotations.Nullable;

/** One case worked in full: each line with its equation in symbols, with numbers, its result, source and cell. */
final class WorkedGrid {
    private static final double CODE = 15;
    private static final double RESULT = 33;
    private static final double SOURCE = 40;

    /** Of the type of equations, in points. */
    private static final double SIZE = 9.5;

    /** What the style sheet leaves free at both sides of an equation, in mm. */
    private static final double SIDES = 5.4;

    /** Words longer than this stand under the equation, not in the column of results. */
    private static final int LONGEST_RESULT = 18;

    private final Results results;
    private final Links links;
    private final Drawings drawings;
    private final Block.Lines lines;
    private final SubstitutedReading numbers;

    WorkedGrid(Results results, Links links, Drawings drawings, Block.Lines lines) {
        this.results = results;
        this.links = links;
        this.drawings = drawings;
        this.lines = lines;
        this.numbers = new SubstitutedReading(results);
    }

    View.Grid grid(List<View.Text> headings, double width) {
        List<View.Text> titles = new ArrayList<>(headings);
        if (!lines.caseNames().isEmpty()) {
            titles.add(View.Text.plain(
                    "tabletitle", "Worked in full for case " + lines.caseNames().get(lines.workedCase())));
        }
        View.GridRow head = new View.GridRow(
                "",
                List.of(
                        cell("", "Line"),
                        cell("", "Quantity, equation, the same with numbers"),
                        cell("right", "Result"),
                        cell("", "Source; workbook cell")));
        List<View.GridRow> body = new ArrayList<>();
        Between between = new Between(width);
        double room = Typefaces.points(width - CODE - RESULT - SOURCE - SIDES);
        for (Block.Line line : lines.lines()) {
            if (line.kind() == Block.LineKind.HEADING) {
                between.heading(line.description());
            } else {
                body.add(between.above(row(line, room)));
            }
        }
        body.addAll(between.rest(4));
        List<Double> widths = List.of(CODE, width - CODE - RESULT - SOURCE, RESULT, SOURCE);
        return new View.Grid("worked", widths, titles, List.of(head), body);
    }

    private static View.GridCell cell(String style, String text) {
        return View.GridCell.of(style, View.Text.plain("", text));
    }

    /**
     * @param room for an equation, in points
     */
    private View.GridRow row(Block.Line line, double room) {
        Cell cell = cell(line);
        List<View.Text> quantity = new ArrayList<>(quantity(line, cell, room));
        boolean wordy = cell != null && Printed.value(results, cell).length() > LONGEST_RESULT;
        if (cell != null && wordy) {
            quantity.add(View.Text.of("numbers", result(line, cell).pieces()));
        }
        return new View.GridRow(
                "",
                List.of(
                        cell("", line.code()),
                        new View.GridCell("", 1, quantity),
                        new View.GridCell(
                                quantity.size() > 1 ? "right low" : "right",
                                1,
                                cell == null || wordy ? List.of() : List.of(level(result(line, cell), quantity))),
                        new View.GridCell("", 1, source(line, cell))));
    }

    private @Nullable Cell cell(Block.Line line) {
        if (line.forAll() != null || line.perCase().isEmpty()) {
            return line.forAll();
        }
        return line.perCase().get(lines.workedCase());
    }

    private List<View.Text> quantity(Block.Line line, @Nullable Cell cell, double room) {
        List<View.Text> texts = new ArrayList<>();
        texts.add(View.Text.of("", SymbolPrint.inText(line.description())));
        Formula formula = cell == null ? null : cell.formula();
        boolean noted = !line.equation().isEmpty()
                && (formula == null || !line.equation().equals(PlainReading.of(formula)));
        if (noted) {
            texts.add(written(line, cell, room));
        }
        if (cell == null || formula == null) {
            return texts;
        }
        boolean conversion = SubstitutedReading.isConversion(cell, formula);
        if (noted || conversion || handsOn(line, cell, formula) != null) {
            if (!noted) {
                texts.add(origin(line, cell, formula));
            }
            if (conversion) {
                texts.add(drawn("equation", new EquationSetting("", SIZE, room).numbers(numbers.of(cell, formula))));
            }
            return texts;
        }
        Formula shown = Asked.condition(formula);
        if (line.kind() == Block.LineKind.LIMIT_VERDICT) {
            Asked.when(formula).ifPresent(when -> texts.add(View.Text.plain("written", "asked for where " + when)));
        }
        Formula inNumbers = numbers.of(cell, shown);
        EquationSetting setting = new EquationSetting(line.symbol(), SIZE, room).symbols(shown);
        if (results.value(cell).equals(new Value.None(Value.NOT_GIVEN))) {
            // there are no numbers to show
            texts.add(drawn("equation", setting));
            return texts;
        }
        if (!inNumbers.equals(shown) && line.kind() == Block.LineKind.LIMIT_VERDICT) {
            setting.numbersAlone(inNumbers);
        } else if (!inNumbers.equals(shown)) {
            setting.numbers(inNumbers);
        }
        texts.add(drawn("equation", setting));
        return texts;
    }

    private View.Text drawn(String style, EquationSetting setting) {
        Equation equation = setting.equation();
        return View.Text.of(style, List.of()).with(drawings.add(equation, equation.text()));
    }

    private View.Text written(Block.Line line, @Nullable Cell cell, double room) {
        String target = target(line, cell);
        return WrittenEquation.of(line.equation())
                .map(root -> new EquationSetting("", SIZE, room)
                        .words(root::set, line.equation())
                        .equation())
                .map(root -> new View.Text("equation", List.of(), target).with(drawings.add(root, root.text())))
                .orElse(new View.Text("written", List.of(Piece.plain(line.equation())), target));
    }

    /** The sheet of the cell of the same symbol that the line rests on; empty where there is none. */
    private String target(Block.Line line, @Nullable Cell cell) {
        return cell != null && cell.references().get(line.symbol()) instanceof Cell origin ? links.to(origin) : "";
    }

    /** The cell whose content the line only hands on under the same symbol; null where it does more. */
    private static @Nullable Cell handsOn(Block.Line line, Cell cell, Formula formula) {
        return formula instanceof Formula.Symbol symbol
                        && symbol.name().equals(line.symbol())
                        && cell.references().get(symbol.name()) instanceof Cell origin
                ? origin
                : null;
    }

    private View.Text origin(Block.Line line, Cell cell, Formula formula) {
        Cell origin = handsOn(line, cell, formula);
        return origin == null
                ? View.Text.plain("written", "brought into the working unit")
                : new View.Text(
                        "written",
                        List.of(Piece.plain("from cell "), Piece.plain(links.address(origin))),
                        links.to(origin));
    }

    /** The result on the baseline of the last equation beside it. */
    private View.Text level(View.Text result, List<View.Text> quantity) {
        View.Inset last = quantity.get(quantity.size() - 1).inset();
        return last != null && drawings.named(last.name()) instanceof Equation equation
                ? result.with(drawings.add(Equation.strut(SIZE, equation.lastBelow()), ""))
                : result;
    }

    private View.Text result(Block.Line line, Cell cell) {
        List<Piece> pieces = new ArrayList<>();
        if (!line.symbol().isEmpty()) {
            pieces.addAll(SymbolPrint.pieces(line.symbol()));
            pieces.add(Piece.plain("\u00a0"));
        }
        if (Printed.isNumber(results, cell) || !line.symbol().isEmpty()) {
            pieces.add(Piece.plain("= "));
        }
        pieces.addAll(Printed.withUnit(results, cell));
        return View.Text.of("result", pieces);
    }

    private List<View.Text> source(Block.Line line, @Nullable Cell cell) {
        List<View.Text> texts = new ArrayList<>();
        if (!line.source().isEmpty()) {
            texts.add(View.Text.plain("small", line.source()));
        }
        if (cell != null) {
            String kind = switch (cell.kind()) {
                case ENTRY -> "entry, ";
                case CONSTANT -> "constant, ";
                case TABLE -> "from a table, ";
                case RERUN -> "found by reruns, as issued, ";
                case FORMULA -> "";
            };
            String all = line.forAll() != null && lines.caseNames().size() > 1 ? ", all cases" : "";
            texts.add(new View.Text(
                    "small",
                    List.of(Piece.plain(kind + "cell "), Piece.plain(links.address(cell)), Piece.plain(all)),
                    links.to(cell)));
        }
        return texts;
    }
}
