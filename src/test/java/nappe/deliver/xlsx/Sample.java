package nappe.deliver.xlsx;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Block.Align;
import nappe.calculation.Block.LineKind;
import nappe.calculation.Cell;
import nappe.calculation.Formulas;
import nappe.calculation.Place;
import nappe.calculation.Reference;
import nappe.calculation.Run;
import nappe.calculation.Sheet;
import nappe.calculation.Sureness;
import nappe.formula.Formula;
import nappe.formula.FormulaParser;
import nappe.formula.Function;
import nappe.formula.PlainReading;
import nappe.formula.Value;
import nappe.results.Furniture;
import nappe.results.Results;
import nappe.unit.Unit;

/** A hand-made package of three sheets about a flume that never was. */
final class Sample {
    static final Furniture FURNITURE = new Furniture(
            "Weaver & Fox pretend works",
            "Made-up Engineers",
            "Nowhere District",
            "NW-007",
            "Metering station M1",
            "B",
            LocalDate.of(2026, 3, 14),
            "for checking",
            "1f3a 99c0 5e77 0b12",
            "0.1.0",
            true,
            List.of(
                    "To be checked and sealed by a licensed engineer before use.",
                    "Local codes and permits take precedence."),
            "Released for review only.");

    private static final List<String> CASES = List.of("Low", "Design", "Peak, all rain");

    final List<Cell> cells = new ArrayList<>();
    final Map<String, Reference> known = new LinkedHashMap<>();

    static Results results() {
        return new Sample().build();
    }

    private Results build() {
        Sheet constants = constants();
        Sheet element = element();
        Sheet summary = summary();
        return new Results(FURNITURE, List.of(constants, element, summary), List.copyOf(cells), Evaluated.of(cells));
    }

    private Sheet constants() {
        String name = "Constants";
        List<Block.Column> columns = List.of(
                new Block.Column("Symbol", 10, Align.LEFT),
                new Block.Column("Description", 40, Align.LEFT),
                new Block.Column("Value", 14, Align.RIGHT),
                new Block.Column("Unit", 10, Align.LEFT),
                new Block.Column("Source", 30, Align.LEFT));
        Cell g = typed(Cell.Kind.CONSTANT, name, 6, 2, "g", "ft/s2", Value.of(32.174));
        Cell mgd = typed(Cell.Kind.CONSTANT, name, 7, 2, "1 MGD", "ft3/s", Value.of(1.5472286365740740));
        List<Block.Row> rows = List.of(
                row(
                        new Block.Symbol("g"),
                        text("standard gravity"),
                        new Block.Content(g),
                        text("ft/s2"),
                        text("invented for this sample")),
                row(
                        text("1 MGD"),
                        text("million gallons per day, a description that is long enough to need two or three lines"),
                        new Block.Content(mgd),
                        text("ft3/s"),
                        text("=1+1 stays a text")));
        List<Block.Column> lookup = List.of(
                new Block.Column("Size", 10, Align.LEFT),
                new Block.Column("C (ft3/s)", 14, Align.RIGHT),
                new Block.Column("n (1)", 14, Align.RIGHT));
        List<Cell> sizes = new ArrayList<>();
        List<Cell> factors = new ArrayList<>();
        List<Block.Row> sizeRows = new ArrayList<>();
        for (int i = 0; i < 3; i++) {
            sizes.add(typed(
                    Cell.Kind.TABLE,
                    name,
                    11 + i,
                    0,
                    "",
                    "1",
                    Value.word(List.of("small", "middle", "large").get(i))));
            factors.add(typed(Cell.Kind.TABLE, name, 11 + i, 1, "", "ft3/s", Value.of(2.5 + 1.25 * i)));
            Cell n = typed(Cell.Kind.TABLE, name, 11 + i, 2, "", "1", Value.of(1.5 + 0.01 * i));
            sizeRows.add(row(new Block.Content(sizes.get(i)), new Block.Content(factors.get(i)), new Block.Content(n)));
        }
        known.put("sizes", new Run(sizes));
        known.put("factors", new Run(factors));
        return new Sheet(
                1,
                name,
                "Constants and conversions",
                List.of(
                        new Block.Heading(4, "Constants"),
                        new Block.Table(5, "", columns, rows),
                        new Block.Note(
                                8,
                                "A note over the width of the sheet. It goes on and on so that it takes more than one line: "
                                        + "the pretend flume was never built, its numbers are invented, and nobody should ever think that "
                                        + "they say anything about a real one, wherever it may be.",
                                false),
                        new Block.Table(9, "Pretend sizes", lookup, sizeRows)));
    }

    private Sheet element() {
        String name = "F1 Flume";
        List<Block.Line> lines = new ArrayList<>();
        int row = 6;
        lines.add(heading("F1", "Entries"));
        lines.add(entry(++row, "F1.01", "Size of the flume", "size", "1", Value.word("MIDDLE")));
        lines.add(entry(++row, "F1.02", "Width of the throat", "W", "ft", Value.of(1.5)));
        lines.add(entry(
                ++row,
                "F1.03",
                "Slope of the floor, not typed by the engineer",
                "S_0",
                "1",
                new Value.None(Value.NOT_GIVEN)));
        List<Cell> heads = new ArrayList<>();
        row++;
        for (int i = 0; i < CASES.size(); i++) {
            heads.add(typed(Cell.Kind.ENTRY, name, row, 7 + i, "h_a", "ft", Value.of(0.35 + 0.6 * i)));
        }
        lines.add(
                new Block.Line(LineKind.QUANTITY, "F1.04", "Head at the gauge", "h_a", "", "ft", "typed", null, heads));
        lines.add(heading("", "Flow"));
        row++;
        lines.add(all(
                ++row,
                "F1.05",
                "Place of the size in the table",
                "k",
                "1",
                Formulas.call(Function.MATCH, Formulas.symbol("size"), Formulas.symbol("sizes")),
                Sureness.MAY_FAIL));
        lines.add(all(
                ++row,
                "F1.06",
                "Factor",
                "C",
                "ft3/s",
                Formulas.call(Function.INDEX, Formulas.symbol("factors"), Formulas.symbol("k")),
                Sureness.MAY_FAIL));
        lines.add(each(
                ++row,
                "F1.07",
                "Flow, as the pretend handbook writes it",
                "Q",
                "ft3/s",
                FormulaParser.parse("C*(W/1 ft)*(h_a/1 ft)^1.522"),
                heads,
                Sureness.MAY_BE_WORDS));
        lines.add(each(
                ++row,
                "F1.08",
                "Flow in the unit of the permit",
                "Q_perm",
                "MGD",
                FormulaParser.parse("Q/1 MGD"),
                perCase(lines),
                Sureness.MAY_BE_WORDS));
        lines.add(each(
                ++row,
                "F1.09",
                "Velocity head at the gauge, with a leading minus and powers",
                "h_v",
                "ft",
                FormulaParser.parse("-(-Q/1 ft3/s)^2/(2*g/1 ft/s2)*(W/1 ft)^-2^0.5"),
                perCase(lines),
                Sureness.MAY_BE_WORDS));
        lines.add(all(
                ++row,
                "F1.10",
                "Depends on what was not given",
                "delta_z",
                "ft",
                FormulaParser.parse("2*S_0*W"),
                Sureness.MAY_BE_WORDS));
        lines.add(all(
                ++row,
                "F1.11",
                "Outside its range of definition",
                "r",
                "1",
                FormulaParser.parse("ln(1 - W/1 ft)"),
                Sureness.MAY_FAIL));
        lines.add(all(++row, "F1.12", "Zero as issued", "z_0", "ft", FormulaParser.parse("W - W"), Sureness.SURE));
        List<Cell> flows = lines.get(lines.size() - 6).perCase();
        lines.add(verdict(++row, "F1.13", flows));
        return new Sheet(
                2,
                name,
                "F1 Pretend flume",
                List.of(new Block.Note(4, "To be used only in a test.", true), new Block.Lines(5, CASES, 1, lines)));
    }

    private static List<Cell> perCase(List<Block.Line> lines) {
        for (int i = lines.size() - 1; i >= 0; i--) {
            if (lines.get(i).symbol().equals("Q")) {
                return lines.get(i).perCase();
            }
        }
        throw new IllegalStateException();
    }

    private Sheet summary() {
        Cell flow = (Cell) known.get("Q");
        Cell sum = live(
                "Summary",
                5,
                1,
                "Q_all",
                "ft3/s",
                FormulaParser.parse("Q + Q"),
                Sureness.MAY_BE_WORDS,
                Map.of("Q", flow));
        List<Block.Column> columns = List.of(
                new Block.Column("What", 30, Align.LEFT),
                new Block.Column("Value", 14, Align.RIGHT),
                new Block.Column("Equation", 30, Align.LEFT),
                new Block.Column("Cell", 14, Align.LEFT),
                new Block.Column("Sheet", 24, Align.LEFT));
        return new Sheet(
                3,
                "Summary",
                "Summary, tightest first",
                List.of(new Block.Table(
                        4,
                        "",
                        columns,
                        List.of(
                                row(
                                        text("@twice the flow"),
                                        new Block.Content(sum),
                                        new Block.Equation(sum),
                                        new Block.Address(sum),
                                        new Block.SheetLink(2, "F1 Flume", "F1 Pretend flume")),
                                row(
                                        text("the flow _x0041_ itself, a link"),
                                        new Block.Content(flow),
                                        new Block.Equation(flow),
                                        new Block.Address(flow),
                                        new Block.SheetLink(1, "Constants", "Constants"))))));
    }

    private Block.Line heading(String code, String words) {
        return new Block.Line(LineKind.HEADING, code, words, "", "", "", "", null, List.of());
    }

    private Block.Line entry(int row, String code, String words, String symbol, String unit, Value value) {
        Cell cell = typed(Cell.Kind.ENTRY, "F1 Flume", row, 6, symbol, unit, value);
        return new Block.Line(
                LineKind.QUANTITY, code, words, symbol, "", unit, "typed, from an invented drawing", cell, List.of());
    }

    private Block.Line all(
            int row, String code, String words, String symbol, String unit, Formula formula, Sureness sureness) {
        Cell cell = live("F1 Flume", row, 6, symbol, unit, formula, sureness, known);
        return new Block.Line(
                LineKind.QUANTITY, code, words, symbol, PlainReading.of(symbol, formula), unit, "", cell, List.of());
    }

    private Block.Line each(
            int row,
            String code,
            String words,
            String symbol,
            String unit,
            Formula formula,
            List<Cell> cases,
            Sureness sureness) {
        List<Cell> made = new ArrayList<>();
        for (int i = 0; i < cases.size(); i++) {
            Map<String, Reference> references = new LinkedHashMap<>(known);
            references.put(cases.get(i).symbol(), cases.get(i));
            made.add(live("F1 Flume", row, 7 + i, symbol, unit, formula, sureness, references));
        }
        known.put(symbol, made.get(0));
        return new Block.Line(
                LineKind.QUANTITY,
                code,
                words,
                symbol,
                PlainReading.of(symbol, formula),
                unit,
                "Pretend Handbook, ch. 7, sec. 2",
                null,
                made);
    }

    private Block.Line verdict(int row, String code, List<Cell> flows) {
        List<Cell> made = new ArrayList<>();
        for (int i = 0; i < flows.size(); i++) {
            made.add(live(
                    "F1 Flume",
                    row,
                    7 + i,
                    "",
                    "1",
                    Formulas.iff(
                            Formulas.call(Function.IS_NUMBER, Formulas.symbol("Q")),
                            FormulaParser.parse("if(Q <= 4 ft3/s, \"met\", \"not met\")"),
                            Formulas.word("no result")),
                    Sureness.SURE,
                    Map.of("Q", flows.get(i))));
        }
        return new Block.Line(
                LineKind.LIMIT_VERDICT,
                code,
                "Flow is no more than a pretend limit",
                "",
                "",
                "",
                "Pretend permit, p. 3",
                null,
                made);
    }

    private Cell typed(Cell.Kind kind, String sheet, int row, int column, String symbol, String unit, Value value) {
        Cell cell = Cell.typed(kind, new Place(sheet, row, column), symbol, Unit.parse(unit), value);
        return keep(cell);
    }

    private Cell live(
            String sheet,
            int row,
            int column,
            String symbol,
            String unit,
            Formula formula,
            Sureness sureness,
            Map<String, Reference> references) {
        return keep(Cell.live(new Place(sheet, row, column), symbol, Unit.parse(unit), formula, references, sureness));
    }

    private Cell keep(Cell cell) {
        cells.add(cell);
        if (!cell.symbol().isEmpty()) {
            known.putIfAbsent(cell.symbol(), cell);
        }
        return cell;
    }

    private static Block.Row row(Block.Item... items) {
        return new Block.Row(List.of(items));
    }

    private static Block.Text text(String text) {
        return new Block.Text(text);
    }
}
