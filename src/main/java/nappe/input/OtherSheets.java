package nappe.input;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import nappe.formula.Sign;
import nappe.input.ProjectSheet.Named;
import nappe.station.Design.Assumption;
import nappe.station.Design.Demand;
import nappe.station.Design.Requirement;
import nappe.station.Design.RevisionNote;
import nappe.station.Design.Typed;
import nappe.unit.Unit;
import nappe.unit.UnitException;
import org.jspecify.annotations.Nullable;

/** Reads the lists beside the station: demands, assumptions, references, requirements, revisions. */
final class OtherSheets {
    private final Entries entries;
    private final Quantities quantities;
    private final Faults faults;

    OtherSheets(Entries entries, Faults faults) {
        this.entries = entries;
        this.quantities = new Quantities(entries);
        this.faults = faults;
    }

    /**
     * The demands.
     *
     * @param elements empty where faults leave open which tags there are
     * @param columns the cases and combinations that a demand may be confined to
     */
    List<Demand> demands(@Nullable RawSheet sheet, List<Named> elements, CaseNames columns) {
        List<String> tags = elements.stream().map(Named::tag).toList();
        return list(
                sheet, Layout.DEMAND_HEADS, Layout.DEMAND_OPTIONAL, List.of("Unit"), row -> demand(row, tags, columns));
    }

    private Demand demand(Table.Row row, List<String> tags, CaseNames columns) {
        String tag = entries.requiredText(row.field("Element"), "the tag of the element", Entries.LONGEST_NAME);
        if (!tag.isEmpty() && !tags.isEmpty() && !tags.contains(tag)) {
            entries.fault(
                    row.field("Element"),
                    "tag-unknown",
                    Shown.quoted(tag) + " is the tag of no element; write " + Entries.listed(tags));
        }
        String symbol = entries.requiredText(row.field("Symbol"), "the symbol", Entries.LONGEST_NAME);
        boolean atMost = entries.word(row.field("At most or at least"), "the side", Layout.SIDES)
                .equals("at most");
        Field value = row.field("Value");
        if (value.isBlank()) {
            entries.missing(value, "the value demanded", "write a number");
        }
        String citation = entries.requiredText(row.field("Citation"), "the citation", Entries.LONGEST_TEXT);
        Typed typed = new Typed(
                quantities.number(value, "the value demanded", Sign.ANY),
                anyUnit(row.field("Unit")),
                citation,
                "known",
                value.origin());
        String what = entries.text(row.field("What is demanded"), "what is demanded", Entries.LONGEST_TEXT);
        return new Demand(
                tag,
                symbol,
                atMost,
                typed,
                what,
                citation,
                row.field("Symbol").origin(),
                row.field("Unit").origin(),
                columns.judged(row.field(Layout.IN_CASE)));
    }

    /** A unit of any kind: what a demanded result measures is known only where it is calculated. */
    private Unit anyUnit(Field field) {
        String text = quantities.unitText(field, "the value demanded", Unit.one());
        try {
            return text.isEmpty() ? Unit.one() : Unit.parse(text);
        } catch (UnitException | ArithmeticException | NumberFormatException e) {
            String question = UnitOffer.question(text, Unit.one());
            entries.fault(
                    field,
                    "unit-unknown",
                    Shown.quoted(text) + " is not a known unit"
                            + (question.isEmpty() ? "; write one of the sheet Lists" : question));
            return Unit.one();
        }
    }

    List<Assumption> assumptions(@Nullable RawSheet sheet) {
        return list(
                sheet,
                Layout.ASSUMPTION_HEADS,
                List.of(),
                row -> new Assumption(
                        entries.requiredText(row.field("Assumption"), "the assumption", Entries.LONGEST_TEXT),
                        entries.text(row.field("Basis"), "the basis", Entries.LONGEST_TEXT),
                        entries.text(row.field("Owner"), "the owner", Entries.LONGEST_NAME),
                        entries.word(row.field("Open or closed"), "the state", Layout.OPEN)
                                .equals("open")));
    }

    List<String> references(@Nullable RawSheet sheet) {
        return list(
                sheet,
                Layout.REFERENCE_HEADS,
                List.of(),
                row -> entries.requiredText(row.field("Reference"), "the reference", Entries.LONGEST_TEXT));
    }

    List<Requirement> requirements(@Nullable RawSheet sheet) {
        return list(
                sheet,
                Layout.REQUIREMENT_HEADS,
                List.of(),
                row -> new Requirement(
                        entries.requiredText(row.field("Requirement"), "the requirement", Entries.LONGEST_TEXT),
                        entries.text(row.field("Citation"), "the citation", Entries.LONGEST_TEXT),
                        entries.text(row.field("Answered where"), "the answer", Entries.LONGEST_TEXT)));
    }

    List<RevisionNote> revisions(@Nullable RawSheet sheet) {
        return list(
                sheet,
                Layout.REVISION_HEADS,
                List.of(),
                row -> new RevisionNote(
                        entries.requiredText(row.field("Revision"), "the revision", 10),
                        entries.date(row.field("Date"), "the date").toString(),
                        entries.text(row.field("What changed"), "what changed", Entries.LONGEST_TEXT)));
    }

    private <T> List<T> list(
            @Nullable RawSheet sheet, List<String> heads, List<String> prefilled, Function<Table.Row, T> read) {
        return list(sheet, heads, List.of(), prefilled, read);
    }

    private <T> List<T> list(
            @Nullable RawSheet sheet,
            List<String> heads,
            List<String> optional,
            List<String> prefilled,
            Function<Table.Row, T> read) {
        List<T> list = new ArrayList<>();
        Table table = sheet == null ? null : Table.find(sheet, heads, optional, faults);
        if (table != null) {
            for (Table.Row row : table.rows(prefilled, faults)) {
                list.add(read.apply(row));
            }
        }
        return list;
    }
}
