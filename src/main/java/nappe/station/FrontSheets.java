package nappe.station;

import static nappe.calculation.Formulas.call;
import static nappe.calculation.Formulas.symbol;
import static nappe.calculation.Formulas.word;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Cells;
import nappe.calculation.Run;
import nappe.calculation.Scope;
import nappe.calculation.SheetDraft;
import nappe.calculation.TableDraft;
import nappe.formula.Function;
import nappe.unit.Unit;

/** Lays the cover and the index. */
final class FrontSheets {
    /** The text of the note that stands for a clear space on the cover. */
    static final String SEAL_SPACE = "(space for a seal)";

    private static final List<String> VERDICTS = List.of("not met", "no result", "not given", "met", "does not apply");

    private static final List<String> CAUTIONS = List.of(
            "The ratings hold only within the limits of flow, head and submergence listed. Outside them no result is claimed.",
            "Results rest on the dimensions, floor level and gauge zero as built. Where they differ from those entered, the station is to be"
                    + " rated anew before use.",
            "Every limit demanded by an authority or owner was supplied by the engineer; number, basis and citation are to be confirmed"
                    + " against the permit or rule in force.",
            "Flows and water levels downstream are supplied values; which combination governs is for the engineer to confirm.",
            "Open assumptions are to be closed before issue for construction or record.",
            "Published methods and coefficients are used within the edition cited; the engineer decides on their fitness. What is marked as"
                    + " from memory was not confirmed against the publication.",
            "An edit to the workbook after issue ends its agreement with the PDF.",
            "Deposits, growth, waves and obstructions change the measurement; the station needs inspection in service.",
            "This package does not replace the judgement of the engineer in responsible charge nor an independent check. Local codes and the"
                    + " law on licensed practice govern.");

    private final Cells cells;
    private final Design design;

    FrontSheets(Cells cells, Design design) {
        this.cells = cells;
        this.design = design;
    }

    void cover(SheetDraft sheet, SummarySheet.Sorted limits) {
        Design.Project project = design.project();
        TableDraft head = sheet.table(
                "",
                List.of(
                        new Block.Column("Calculation", 26, Block.Align.LEFT),
                        new Block.Column("", 60, Block.Align.LEFT)));
        row(head, "Project", project.project());
        row(head, "Client", project.client());
        row(head, "Firm", project.firm());
        row(head, "Calculation number", project.number());
        row(head, "Subject", project.subject());
        row(head, "Revision", project.revision() + ", " + project.date());
        row(head, "Status", project.status());
        row(
                head,
                "Elements",
                String.join(
                        "; ",
                        design.elements().stream()
                                .map(e -> e.tag() + (e.title().isEmpty() ? "" : " " + e.title()))
                                .toList()));
        row(head, "Elevations refer to", project.datum());
        row(head, "Working units", project.system().title());
        long open =
                design.assumptions().stream().filter(Design.Assumption::open).count();
        row(head, "Open assumptions", open == 0 ? "none" : "YES: " + open + " to be confirmed, see sheet Assumptions");
        long assumed = design.elements().stream()
                        .flatMap(e -> e.typed().values().stream())
                        .filter(t -> t.standing().equals("assumed"))
                        .count()
                + design.cases().stream()
                        .filter(c -> c.flow().standing().equals("assumed"))
                        .count();
        row(head, "Entries assumed", assumed == 0 ? "none" : assumed + ", see sheet Assumptions");
        sheet.gap();
        verdicts(sheet, limits.verdicts());
        worst(sheet, limits);
        if (!project.release().isEmpty()) {
            sheet.caution(project.release());
            sheet.gap();
        }
        approvals(sheet);
        if (project.sealSpace()) {
            sheet.note(SEAL_SPACE);
            sheet.gap();
        }
        sheet.heading("Cautions");
        CAUTIONS.forEach(sheet::caution);
    }

    private static void row(TableDraft table, String label, String text) {
        table.add(List.of(new Block.Text(label), new Block.Text(text.isEmpty() ? "none" : text)));
    }

    private void verdicts(SheetDraft sheet, Run verdicts) {
        TableDraft table = sheet.table(
                "Limits, each counted by its worst verdict over the cases",
                List.of(
                        new Block.Column("Verdict", 26, Block.Align.LEFT),
                        new Block.Column("Limits", 60, Block.Align.LEFT)));
        Scope scope = Scope.ofElement();
        scope.put("verdicts", verdicts);
        for (String verdict : VERDICTS) {
            Cell count = cells.raw(
                    table.place(1),
                    "",
                    Unit.one(),
                    call(Function.TALLY, symbol("verdicts"), word(verdict)),
                    scope,
                    null,
                    false);
            table.add(List.of(new Block.Text(verdict), new Block.Content(count)));
        }
        sheet.gap();
    }

    private void worst(SheetDraft sheet, SummarySheet.Sorted limits) {
        TableDraft table = sheet.table(
                "The three worst limits",
                List.of(
                        new Block.Column("Verdict", 26, Block.Align.LEFT),
                        new Block.Column("Limit", 60, Block.Align.LEFT),
                        new Block.Column("Tightest in case", 30, Block.Align.LEFT)));
        for (int i = 0; i < Math.min(3, limits.verdicts().cells().size()); i++) {
            List<Block.Item> row = new ArrayList<>();
            int column = 0;
            for (Run run : List.of(limits.verdicts(), limits.limits(), limits.cases())) {
                Scope scope = Scope.ofElement();
                scope.put("worst", run.cells().get(i));
                row.add(new Block.Content(
                        cells.raw(table.place(column++), "", Unit.one(), symbol("worst"), scope, null, false)));
            }
            table.add(row);
        }
        sheet.gap();
    }

    private static void approvals(SheetDraft sheet) {
        TableDraft table = sheet.table(
                "Approvals, to be filled in by hand",
                List.of(
                        new Block.Column("", 26, Block.Align.LEFT),
                        new Block.Column("Name, initials and date", 60, Block.Align.LEFT)));
        for (String role : List.of("By", "Checked", "Approved")) {
            table.add(List.of(new Block.Text(role), new Block.Text("")));
        }
        sheet.gap();
    }

    void index(SheetDraft sheet, List<SheetDraft> all, List<String> contents) {
        TableDraft table = sheet.table(
                "Sheets",
                List.of(
                        new Block.Column("Sheet", 50, Block.Align.LEFT),
                        new Block.Column("What it holds", 80, Block.Align.LEFT),
                        new Block.Column("Workbook tab", 16, Block.Align.LEFT)));
        for (int i = 0; i < all.size(); i++) {
            SheetDraft one = all.get(i);
            table.add(List.of(
                    new Block.SheetLink(i + 1, one.name(), one.title()),
                    new Block.Text(contents.get(i)),
                    new Block.Text(one.name())));
        }
        sheet.gap();
        sheet.heading("Requirements, and where they are answered");
        if (design.requirements().isEmpty()) {
            sheet.note("none");
        } else {
            requirements(sheet, all);
        }
        sheet.gap();
        sheet.heading("Revisions");
        if (design.revisions().isEmpty()) {
            sheet.note("none");
        } else {
            TableDraft revisions = sheet.table(
                    "",
                    List.of(
                            new Block.Column("Revision and date", 50, Block.Align.LEFT),
                            new Block.Column("What changed", 80, Block.Align.LEFT)));
            design.revisions()
                    .forEach(r -> revisions.add(
                            List.of(new Block.Text(r.revision() + ", " + r.date()), new Block.Text(r.what()))));
        }
    }

    private void requirements(SheetDraft sheet, List<SheetDraft> all) {
        TableDraft table = sheet.table(
                "",
                List.of(
                        new Block.Column("Answered on", 50, Block.Align.LEFT),
                        new Block.Column("Requirement and its citation", 80, Block.Align.LEFT)));
        for (Design.Requirement requirement : design.requirements()) {
            List<Block.Item> row = new ArrayList<>();
            row.add(answer(requirement.answer(), all));
            row.add(new Block.Text(requirement.text()
                    + (requirement.citation().isEmpty() ? "" : " (" + requirement.citation() + ")")));
            table.add(row);
        }
    }

    private static Block.Item answer(String answer, List<SheetDraft> all) {
        for (int i = 0; i < all.size(); i++) {
            if (all.get(i).name().equalsIgnoreCase(answer.strip())) {
                return new Block.SheetLink(i + 1, all.get(i).name(), all.get(i).title());
            }
        }
        return new Block.Text(answer.isEmpty() ? "not answered" : answer);
    }
}
