package nappe.deliver.pdf;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.calculation.Reference;
import nappe.calculation.Run;
import nappe.calculation.Sheet;
import nappe.calculation.Sureness;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.Operator;
import nappe.formula.Value;
import nappe.results.Furniture;
import nappe.results.Results;
import nappe.unit.Unit;

/** An invented package, made by hand: all numbers, names and sources are fiction. */
final class Invented {
    static final int CASES = 7;
    static final String HOSTILE = "<script>alert(1)</script> & ${7*7} [[${7*7}]] ]]> \u0007 \u4e2d\u6587 \ud800 end";
    private static final List<String> CAUTIONS = List.of(
            "Valid only for the inputs and revision shown; the fingerprint must match on all sheets and in the workbook.",
            "Design estimate. Not a field calibration; measured accuracy must be confirmed after installation.",
            "Not for use until checked and approved; superseded by any later revision.",
            "Displayed values are rounded; the workbook carries full precision. Local codes and licensed practice govern.");

    private final Map<Cell, Value> values = new HashMap<>();
    private final List<Cell> cells = new ArrayList<>();
    private final double flow;

    private Invented(double flow) {
        this.flow = flow;
    }

    /** The package, with a flow that may be changed. */
    static Results results(double flow) {
        return new Invented(flow).make(furniture(true, "For checking only; not for construction.", "preliminary"));
    }

    static Results results() {
        return results(1.2345);
    }

    static Results onA4() {
        return new Invented(1.2345).make(furniture(false, "", "issued"));
    }

    static Furniture furniture(boolean letter, String release, String status) {
        return new Furniture(
                "Example Creek interceptor, flow-measurement station 4 (invented)",
                "Invented Engineers of Nowhere",
                "Imaginary Sanitary District of Nowhere County",
                "C-0042",
                "Parshall flume and thin-plate weir at the headworks",
                "B",
                LocalDate.of(2026, 3, 1),
                status,
                "4F3A 99E1 0C7D 51B2",
                "0.1.0",
                letter,
                CAUTIONS,
                release);
    }

    private Results make(Furniture furniture) {
        List<Sheet> sheets = new ArrayList<>();
        Sheet flume = flume();
        Sheet register = register();
        sheets.add(cover(List.of(flume, register)));
        sheets.add(flume);
        sheets.add(register);
        sheets.add(hostile());
        sheets.add(trials());
        return new Results(furniture, sheets, cells, values);
    }

    private Sheet cover(List<Sheet> others) {
        List<Block.Row> index = new ArrayList<>();
        for (Sheet sheet : others) {
            index.add(new Block.Row(List.of(
                    new Block.SheetLink(sheet.number(), sheet.name(), sheet.title()), new Block.Text(sheet.name()))));
        }
        return new Sheet(
                1,
                "Cover",
                "Calculation package",
                List.of(
                        new Block.Heading(0, "Example Creek interceptor, flow-measurement station 4 (invented)"),
                        new Block.Note(
                                1, "Open assumptions: yes. They must be closed before issue for construction.", true),
                        new Block.Note(
                                2,
                                "The rating applies only inside the flow, head and submergence limits listed.",
                                false),
                        new Block.Heading(3, "Seal and signature"),
                        new Block.Note(4, "(space for a seal)", false),
                        new Block.Heading(5, "Index"),
                        new Block.Table(
                                6,
                                "",
                                List.of(
                                        new Block.Column("Sheet", 40, Block.Align.LEFT),
                                        new Block.Column("Tab of the workbook", 20, Block.Align.LEFT)),
                                index)));
    }

    private static Formula symbol(String name) {
        return new Formula.Symbol(name);
    }

    private static Formula op(Operator operator, Formula left, Formula right) {
        return new Formula.Operation(operator, left, right);
    }

    private static Formula call(Function function, Formula... arguments) {
        return new Formula.Call(function, List.of(arguments));
    }

    private static Formula one(String unit) {
        return new Formula.Quantity(1, "1", Unit.parse(unit));
    }

    private Cell typed(Cell.Kind kind, int row, int column, String symbol, String unit, double value) {
        return keep(
                Cell.typed(kind, new Place("F1", row, column), symbol, Unit.parse(unit), new Value.Number(value)),
                new Value.Number(value));
    }

    private Cell live(int row, int column, String symbol, String unit, Formula formula, Value value, Cell... of) {
        Map<String, Reference> references = new HashMap<>();
        for (Cell cell : of) {
            references.put(cell.symbol(), cell);
        }
        return keep(
                Cell.live(new Place("F1", row, column), symbol, Unit.parse(unit), formula, references, Sureness.SURE),
                value);
    }

    private Cell keep(Cell cell, Value value) {
        cells.add(cell);
        values.put(cell, value);
        return cell;
    }

    private static Block.Line line(
            String code, String description, String symbol, String unit, String source, Cell forAll, List<Cell> cases) {
        return new Block.Line(Block.LineKind.QUANTITY, code, description, symbol, "", unit, source, forAll, cases);
    }

    private static Block.Line line(Block.LineKind kind, String code, String description, List<Cell> cases) {
        return new Block.Line(kind, code, description, "", "", "1", "Invented Manual, 2nd ed., sec. 7", null, cases);
    }

    /** The river floods in one case, so that the flume drowns and words stand in place of numbers. */
    private static double tailwater(int index) {
        return index == 4 ? 0.9 : (index + 1) / 10.0;
    }

    private Sheet flume() {
        Cell coefficient = typed(Cell.Kind.TABLE, 3, 6, "C", "1", 4);
        Cell exponent = typed(Cell.Kind.TABLE, 4, 6, "n", "1", 1.522);
        Cell limit = typed(Cell.Kind.CONSTANT, 5, 6, "S_lim", "1", 0.62);
        Cell gravity = typed(Cell.Kind.CONSTANT, 6, 6, "g", "ft/s2", 32.174);
        Cell width = typed(Cell.Kind.ENTRY, 7, 6, "W", "ft", 1);
        Cell roughness = typed(Cell.Kind.ENTRY, 8, 6, "n_M", "1", 0.000013);
        List<Cell> flows = new ArrayList<>();
        List<Cell> tailwaters = new ArrayList<>();
        List<Cell> heads = new ArrayList<>();
        List<Cell> submergences = new ArrayList<>();
        List<Cell> measured = new ArrayList<>();
        List<Cell> velocities = new ArrayList<>();
        List<Cell> verdicts = new ArrayList<>();
        List<Cell> margins = new ArrayList<>();
        for (int i = 0; i < CASES; i++) {
            int at = 7 + i;
            double q = flow + i * 0.731;
            Cell flowCell = typed(Cell.Kind.ENTRY, 10, at, "Q", "ft3/s", Math.round(q * 1e4) / 1e4);
            Cell tail = typed(Cell.Kind.ENTRY, 11, at, "h_b", "ft", tailwater(i));
            double h = Math.pow(q / 4, 1 / 1.522);
            Cell head = live(
                    12,
                    at,
                    "h_f",
                    "ft",
                    op(
                            Operator.TIMES,
                            one("ft"),
                            op(
                                    Operator.POWER,
                                    op(Operator.OVER, symbol("Q"), op(Operator.TIMES, symbol("C"), one("ft3/s"))),
                                    op(Operator.OVER, new Formula.Numeral(1, "1"), symbol("n")))),
                    Value.of(h),
                    flowCell,
                    coefficient,
                    exponent);
            double s = tailwater(i) / h;
            Cell submergence =
                    live(13, at, "S_f", "1", op(Operator.OVER, symbol("h_b"), symbol("h_f")), Value.of(s), tail, head);
            Value result = s <= 0.62 ? Value.of(h) : new Value.None(Value.NO_RESULT);
            Cell choice = live(
                    14,
                    at,
                    "h_a",
                    "ft",
                    call(
                            Function.IF,
                            new Formula.Comparison(Comparator.AT_MOST, symbol("S_f"), symbol("S_lim")),
                            symbol("h_f"),
                            new Formula.NoResult(Value.NO_RESULT)),
                    result,
                    submergence,
                    limit,
                    head);
            Formula area = op(Operator.TIMES, symbol("W"), op(Operator.PLUS, symbol("h_a"), symbol("h_b")));
            Cell velocity = live(
                    15,
                    at,
                    "Delta_v_max",
                    "ft/s",
                    op(
                            Operator.MINUS,
                            call(
                                    Function.SQRT,
                                    op(
                                            Operator.TIMES,
                                            op(Operator.TIMES, new Formula.Numeral(2, "2"), symbol("g")),
                                            symbol("h_f"))),
                            op(
                                    Operator.OVER,
                                    op(
                                            Operator.TIMES,
                                            symbol("Q"),
                                            op(
                                                    Operator.POWER,
                                                    symbol("n_M"),
                                                    new Formula.Negation(op(
                                                            Operator.OVER,
                                                            new Formula.Numeral(2, "2"),
                                                            new Formula.Numeral(3, "3"))))),
                                    area)),
                    s <= 0.62 ? Value.of(8.0 * h) : new Value.None(Value.NO_RESULT),
                    gravity,
                    head,
                    flowCell,
                    width,
                    choice,
                    tail,
                    roughness);
            Cell verdict = live(
                    17,
                    at,
                    "",
                    "1",
                    call(
                            Function.IF,
                            new Formula.Comparison(Comparator.AT_MOST, symbol("S_f"), symbol("S_lim")),
                            new Formula.Word("met"),
                            new Formula.Word("not met")),
                    Value.word(s <= 0.62 ? "met" : "not met"),
                    submergence,
                    limit);
            Cell margin = live(
                    18,
                    at,
                    "",
                    "1",
                    op(Operator.OVER, op(Operator.MINUS, symbol("S_lim"), symbol("S_f")), symbol("S_lim")),
                    Value.of((0.62 - s) / 0.62),
                    limit,
                    submergence);
            flows.add(flowCell);
            tailwaters.add(tail);
            heads.add(head);
            submergences.add(submergence);
            measured.add(choice);
            velocities.add(velocity);
            verdicts.add(verdict);
            margins.add(margin);
        }
        List<Cell> column = new ArrayList<>();
        for (int i = 0; i < 5; i++) {
            column.add(keep(
                    Cell.typed(
                            Cell.Kind.TABLE, new Place("Tables", 3 + i, 1), "C", Unit.one(), new Value.Number(4 + i)),
                    new Value.Number(4 + i)));
        }
        Cell looked = keep(
                Cell.live(
                        new Place("F1", 9, 6),
                        "C_2",
                        Unit.one(),
                        call(Function.INDEX, symbol("C"), call(Function.MATCH_BELOW, symbol("W"), symbol("C"))),
                        Map.of("C", new Run(column), "W", width),
                        Sureness.SURE),
                Value.of(4));
        String source = "Invented Manual of Flumes, 2nd ed. (fiction), table 8-2, p. 8-47";
        List<Block.Line> lines = List.of(
                line("F1.01", "coefficient of the rating", "C", "1", source, coefficient, List.of()),
                line("F1.02", "exponent of the rating", "n", "1", source, exponent, List.of()),
                line("F1.03", "submergence up to which flow is free", "S_lim", "1", source, limit, List.of()),
                line("F1.04", "standard gravity", "g", "ft/s2", "from memory, to be confirmed", gravity, List.of()),
                line("F1.05", "throat width", "W", "ft", "drawing H-3 (fiction)", width, List.of()),
                line("F1.06", "roughness (not a real one)", "n_M", "1", "", roughness, List.of()),
                line("F1.07", "coefficient by look-up", "C_2", "1", source, looked, List.of()),
                new Block.Line(Block.LineKind.HEADING, "", "Heads and submergence", "", "", "", "", null, List.of()),
                line("F1.08", "flow", "Q", "ft3/s", "sheet of flows (fiction)", null, flows),
                line("F1.09", "throat gauge head", "h_b", "ft", "level of the river (fiction)", null, tailwaters),
                line("F1.10", "gauge head in free flow", "h_f", "ft", source, null, heads),
                line("F1.11", "submergence if flow were free", "S_f", "1", source, null, submergences),
                line("F1.12", "gauge head, no result where the flume is drowned", "h_a", "ft", source, null, measured),
                line(
                        "F1.13",
                        "a long invented difference of velocities",
                        "Delta_v_max",
                        "ft/s",
                        source,
                        null,
                        velocities),
                new Block.Line(Block.LineKind.HEADING, "", "Limits of use", "", "", "", "", null, List.of()),
                line(Block.LineKind.LIMIT_VERDICT, "F1.14", "tailwater does not slow the flume", verdicts),
                line(Block.LineKind.LIMIT_MARGIN, "F1.14m", "margin, as a fraction of the limit", margins));
        List<String> names = List.of(
                "Start-up minimum",
                "Start-up average",
                "Design average",
                "Peak hour",
                "Peak hour, river in flood",
                "Peak instantaneous",
                "free flow is lost (found)");
        return new Sheet(
                2,
                "F1",
                "F1 Parshall flume",
                List.of(
                        new Block.Note(0, "Free up to the limit; above it no measurement is claimed.", false),
                        new Block.Note(1, "Level floor, zero referenced to the floor at the gauge station.", true),
                        new Block.Heading(2, "Calculation"),
                        new Block.Lines(3, names, 2, lines)));
    }

    private Sheet register() {
        List<Block.Column> columns = List.of(
                new Block.Column("Sheet", 20, Block.Align.LEFT),
                new Block.Column("Line", 8, Block.Align.LEFT),
                new Block.Column("Symbol", 8, Block.Align.LEFT),
                new Block.Column("Value", 10, Block.Align.RIGHT),
                new Block.Column("Unit", 8, Block.Align.CENTRE),
                new Block.Column("Equation", 40, Block.Align.LEFT),
                new Block.Column("Cell", 10, Block.Align.LEFT));
        List<Block.Row> rows = new ArrayList<>();
        for (int i = 0; i < 60; i++) {
            Cell cell = cells.get(i % cells.size());
            rows.add(new Block.Row(List.of(
                    new Block.SheetLink(2, "F1", "F1 Parshall flume"),
                    new Block.Text("F1." + (10 + i)),
                    new Block.Symbol(cell.symbol()),
                    new Block.Content(cell),
                    new Block.Text(cell.unit().text()),
                    new Block.Equation(cell),
                    new Block.Address(cell))));
        }
        List<Block.Row> points = new ArrayList<>();
        for (int i = 0; i < 12; i++) {
            Cell head = keep(
                    Cell.typed(
                            Cell.Kind.TABLE,
                            new Place("Register", 80 + i, 0),
                            "h",
                            Unit.parse("ft"),
                            new Value.Number(i / 20.0)),
                    new Value.Number(i / 20.0));
            Cell rated = keep(
                    Cell.live(
                            new Place("Register", 80 + i, 1),
                            "Q",
                            Unit.parse("ft3/s"),
                            op(Operator.TIMES, new Formula.Numeral(4, "4"), symbol("h")),
                            Map.of("h", head),
                            Sureness.SURE),
                    Value.of(4 * Math.pow(i / 20.0, 1.522)));
            points.add(new Block.Row(List.of(new Block.Content(head), new Block.Content(rated))));
        }
        return new Sheet(
                3,
                "Register",
                "Register of results",
                List.of(
                        new Block.Heading(0, "Every result"),
                        new Block.Table(1, "Register", columns, rows),
                        new Block.Heading(78, "Rating"),
                        new Block.Table(
                                79,
                                "Free flow",
                                List.of(
                                        new Block.Column("Head (ft)", 8, Block.Align.RIGHT),
                                        new Block.Column("Flow (ft3/s)", 8, Block.Align.RIGHT)),
                                points)));
    }

    private Sheet hostile() {
        return new Sheet(
                4,
                "Notes",
                "Notes & <b>remarks</b>",
                List.of(
                        new Block.Note(0, HOSTILE, false),
                        new Block.Note(1, "x".repeat(10_000), false),
                        new Block.Heading(2, "In a table"),
                        new Block.Table(
                                3,
                                "",
                                List.of(
                                        new Block.Column("No.", 5, Block.Align.RIGHT),
                                        new Block.Column("Text", 40, Block.Align.LEFT)),
                                List.of(
                                        new Block.Row(List.of(new Block.Text("1"), new Block.Text(HOSTILE))),
                                        new Block.Row(List.of(new Block.Text("2"), new Block.Text("y".repeat(600)))))),
                        new Block.Heading(9, "Nothing follows")));
    }

    private Sheet trials() {
        List<Block.Column> columns = new ArrayList<>();
        List<Block.Item> items = new ArrayList<>();
        for (int i = 0; i < 14; i++) {
            columns.add(new Block.Column("Residual of trial " + i + " (ft3/s)", 14, Block.Align.RIGHT));
            items.add(new Block.Content(cells.get(cells.size() - 1 - i)));
        }
        List<Block.Row> rows = new ArrayList<>();
        for (int i = 0; i < 20; i++) {
            rows.add(new Block.Row(items));
        }
        return new Sheet(
                5,
                "Trials",
                "Trial rows",
                List.of(
                        new Block.Heading(0, "Roots"),
                        new Block.WorkbookOnly(new Block.Table(1, "Trial rows of h_s, case Peak hour", columns, rows)),
                        new Block.Table(30, "Summary of roots", columns, rows.subList(0, 4))));
    }
}
