package nappe.station;

import static nappe.calculation.Formulas.call;
import static nappe.calculation.Formulas.compare;
import static nappe.calculation.Formulas.iff;
import static nappe.calculation.Formulas.number;
import static nappe.calculation.Formulas.symbol;
import static nappe.calculation.Formulas.word;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.Run;
import nappe.calculation.Scope;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.calculation.TrialRows;
import nappe.formula.Comparator;
import nappe.formula.Formula;
import nappe.formula.Function;
import nappe.formula.Value;
import nappe.method.MethodSheet;
import nappe.source.CitedTable;
import nappe.source.Publication;
import nappe.unit.Unit;

/** Lays assumptions, references, the software statement and the list of roots. */
final class BackSheets {
    private final Cells cells;
    private final Design design;

    BackSheets(Cells cells, Design design) {
        this.cells = cells;
        this.design = design;
    }

    void assumptions(SheetDraft sheet) {
        if (design.assumptions().isEmpty()) {
            sheet.note("none");
            return;
        }
        TableDraft table = sheet.table(
                "",
                List.of(
                        new Block.Column("No.", 6, Block.Align.RIGHT),
                        new Block.Column("Assumption", 50, Block.Align.LEFT),
                        new Block.Column("Basis", 40, Block.Align.LEFT),
                        new Block.Column("Owner", 22, Block.Align.LEFT),
                        new Block.Column("Open or closed", 12, Block.Align.LEFT)));
        int number = 1;
        for (Design.Assumption one : design.assumptions()) {
            table.add(List.of(
                    new Block.Text(Integer.toString(number++)),
                    new Block.Text(one.text()),
                    new Block.Text(one.basis()),
                    new Block.Text(one.owner()),
                    new Block.Text(one.open() ? "open" : "closed")));
        }
        sheet.gap();
        sheet.heading("Entries marked as assumed");
        List<List<Block.Item>> assumed = new ArrayList<>();
        for (Design.Element element : design.elements()) {
            element.typed().forEach((symbol, typed) -> {
                if (typed.standing().equals("assumed")) {
                    assumed.add(List.of(
                            new Block.Text(element.tag()), new Block.Symbol(symbol), new Block.Text(typed.source())));
                }
            });
        }
        for (Design.FlowCase one : design.cases()) {
            if (one.flow().standing().equals("assumed")
                    || one.tailwater().standing().equals("assumed")) {
                assumed.add(List.of(
                        new Block.Text("case"),
                        new Block.Text(one.name()),
                        new Block.Text(one.flow().source())));
            }
        }
        if (assumed.isEmpty()) {
            sheet.note("none");
            return;
        }
        TableDraft entries = sheet.table(
                "",
                List.of(
                        new Block.Column("Where", 6, Block.Align.LEFT),
                        new Block.Column("Symbol or case", 50, Block.Align.LEFT),
                        new Block.Column("Source or basis", 40, Block.Align.LEFT)));
        assumed.forEach(entries::add);
    }

    void references(SheetDraft sheet, Collection<MethodSheet> methods) {
        houseMethods(sheet, methods);
        TableDraft table = sheet.table(
                "Publications cited by the methods",
                List.of(
                        new Block.Column("Key", 10, Block.Align.LEFT),
                        new Block.Column("Publication", 90, Block.Align.LEFT),
                        new Block.Column("Standing", 26, Block.Align.LEFT)));
        Map<String, Publication> known = new LinkedHashMap<>();
        Map<String, String> citing = new LinkedHashMap<>();
        for (MethodSheet method : methods) {
            for (Publication publication : method.sources()) {
                String key = publication.key() + publication.text();
                known.putIfAbsent(key, publication);
                citing.merge(key, method.house(), (a, b) -> a.isEmpty() || b.isEmpty() ? "" : a);
            }
        }
        known.forEach((key, publication) -> table.add(List.of(
                new Block.Text(publication.key()),
                new Block.Text(publication.text()),
                new Block.Text((publication.memory() ? "from memory, not confirmed" : "as cited")
                        + (citing.getOrDefault(key, "").isEmpty() ? "" : ", by a house method only")))));
        sheet.gap();
        TableDraft tables = sheet.table(
                "Cited tables",
                List.of(
                        new Block.Column("Table", 10, Block.Align.LEFT),
                        new Block.Column("Source", 90, Block.Align.LEFT),
                        new Block.Column("Standing", 26, Block.Align.LEFT)));
        Map<String, CitedTable> cited = new LinkedHashMap<>();
        methods.forEach(m -> cited.putAll(m.tables()));
        cited.values()
                .forEach(t -> tables.add(List.of(
                        new Block.Text(t.title()),
                        new Block.Text(t.source()),
                        new Block.Text(
                                t.house().isEmpty()
                                        ? "see sheet Tables"
                                        : "house table, folder " + t.house() + "; see sheet Tables"))));
        sheet.gap();
        sheet.heading("References of the engineer");
        if (design.references().isEmpty()) {
            sheet.note("none");
        }
        design.references().forEach(sheet::note);
    }

    /** Which methods are the house's own; nothing where all come with Nappe. */
    private static void houseMethods(SheetDraft sheet, Collection<MethodSheet> methods) {
        List<MethodSheet> own =
                methods.stream().filter(m -> !m.house().isEmpty()).toList();
        if (own.isEmpty()) {
            return;
        }
        TableDraft table = sheet.table(
                "House methods: written by the house, no part of Nappe",
                List.of(
                        new Block.Column("Method", 24, Block.Align.LEFT),
                        new Block.Column("Title", 66, Block.Align.LEFT),
                        new Block.Column("Standing", 36, Block.Align.LEFT)));
        own.forEach(m -> table.add(List.of(
                new Block.Text(m.name()),
                new Block.Text(m.title()),
                new Block.Text("house method, folder " + m.house()))));
        sheet.gap();
    }

    void software(SheetDraft sheet, SoftwareStatement statement) {
        sheet.note("Made by Nappe " + statement.version()
                + ". Each formula is written once, as text in a method sheet; the number, the live"
                + " formula in the workbook and the printed equation are readings of that text.");
        texts(
                sheet,
                "Texts of the methods used",
                List.of("Method", "Hash of its text", "Whose it is"),
                List.of(40, 20, 60),
                statement.methods());
        texts(
                sheet,
                "Check values run for these methods when this package was made",
                List.of("Method", "Kind", "Rows", "Met"),
                List.of(40, 30, 12, 12),
                statement.counts());
        texts(
                sheet,
                "Check values at hand that are known to disagree, and are not run",
                List.of("Check value", "Why"),
                List.of(40, 60),
                statement.off());
        sheet.note(
                "Kinds: published, a number printed by somebody else; library, a general-purpose library that was run; derived, a second"
                        + " evaluation of the same theory, which guards the coding and not the theory; memory, not confirmed.");
        if (!statement.rows().isEmpty()) {
            TableDraft table = sheet.workbookTable(
                    "Each check value",
                    columns(
                            List.of(
                                    "Method and entries",
                                    "Source",
                                    "Symbol",
                                    "Computed",
                                    "Expected",
                                    "Tolerance",
                                    "Verdict"),
                            List.of(40, 44, 10, 16, 16, 12, 10)),
                    statement.rows().size());
            statement
                    .rows()
                    .forEach(row -> table.add(
                            row.stream().<Block.Item>map(Block.Text::new).toList()));
        }
    }

    private static List<Block.Column> columns(List<String> heads, List<Integer> widths) {
        List<Block.Column> columns = new ArrayList<>();
        for (int i = 0; i < heads.size(); i++) {
            columns.add(new Block.Column(heads.get(i), widths.get(i), Block.Align.LEFT));
        }
        return columns;
    }

    private static void texts(
            SheetDraft sheet, String title, List<String> heads, List<Integer> widths, List<List<String>> rows) {
        if (rows.isEmpty()) {
            sheet.heading(title);
            sheet.note("none");
        } else {
            TableDraft table = sheet.table(title, columns(heads, widths));
            rows.forEach(row ->
                    table.add(row.stream().<Block.Item>map(Block.Text::new).toList()));
        }
        sheet.gap();
    }

    /** One row per root and case: how many trials it took, and what was left. */
    void roots(SheetDraft sheet, List<TrialRows.Solved> roots) {
        if (roots.isEmpty()) {
            sheet.heading("Roots found in trial rows");
            sheet.note("none");
            sheet.gap();
            return;
        }
        TableDraft table = sheet.table(
                "Roots found in trial rows",
                List.of(
                        new Block.Column("Element", 9, Block.Align.LEFT),
                        new Block.Column("Root", 40, Block.Align.LEFT),
                        new Block.Column("Case", 26, Block.Align.LEFT),
                        new Block.Column("Trials", 24, Block.Align.LEFT),
                        new Block.Column("Trials used", 15, Block.Align.RIGHT),
                        new Block.Column(
                                "Difference left (0: within 1e-12 of the right side)", 20, Block.Align.RIGHT)));
        for (TrialRows.Solved root : roots) {
            Scope scope = Scope.ofElement();
            scope.put("closing", root.status());
            scope.put("left", root.residual());
            scope.put("differences", new Run(root.trials()));
            Cell status = cells.raw(table.place(3), "", Unit.one(), symbol("closing"), scope, null, false);
            Formula used = iff(
                    compare(symbol("closing"), Comparator.EQUAL, word("closed")),
                    call(Function.MATCH, number("0"), symbol("differences")),
                    new Formula.NoResult(Value.NO_RESULT));
            Cell count = cells.raw(table.place(4), "", Unit.one(), used, scope, null, false);
            Cell left = cells.raw(table.place(5), "", root.residual().unit(), symbol("left"), scope, null, false);
            table.add(List.of(
                    new Block.Text(root.tag()),
                    new Block.Text(root.root().symbol() + ", " + root.root().label()),
                    new Block.Text(root.caseName().isEmpty() ? "all cases" : root.caseName()),
                    new Block.Content(status),
                    new Block.Content(count),
                    new Block.Content(left)));
        }
        sheet.gap();
    }
}
