package nappe.input;

import static nappe.input.Layout.Label;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.method.MethodCatalogue;
import nappe.station.Design.Project;
import nappe.unit.Dimension;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;
import org.jspecify.annotations.Nullable;

/** Reads the sheet Project: the labels, and the list of elements below them. */
final class ProjectSheet {
    /** An element by its name; what it asks for is typed on a sheet of its own. */
    record Named(String tag, String method, String title, Field tagField) {}

    private final RawSheet sheet;
    private final MethodCatalogue methods;
    private final Entries entries;
    private final Faults faults;
    private final Quantities quantities;
    private final Map<Label, Field> fields = new EnumMap<>(Label.class);

    ProjectSheet(RawSheet sheet, MethodCatalogue methods, Entries entries, Faults faults) {
        this.sheet = sheet;
        this.methods = methods;
        this.entries = entries;
        this.faults = faults;
        this.quantities = new Quantities(entries);
    }

    /** What the labels say, or null where one of them is missing. */
    @Nullable
    Project project() {
        Table table = Table.find(sheet, Layout.PROJECT_HEADS, faults);
        if (table == null || !readLabels(table.above(Table.find(sheet, Layout.STATION_HEADS, new Faults(""))))) {
            return null;
        }
        boolean us = word(Label.SYSTEM, Layout.SYSTEMS).equals(WorkingSystem.US.title());
        WorkingSystem system = us ? WorkingSystem.US : WorkingSystem.SI;
        String revision = text(Label.REVISION);
        if (!revision.isEmpty() && !revision.matches("[A-Za-z0-9][A-Za-z0-9.-]*")) {
            entries.fault(
                    field(Label.REVISION),
                    "revision-odd",
                    Shown.quoted(revision)
                            + " can't be a revision; write letters, digits, points and hyphens: 0, A, P1");
        }
        return new Project(
                text(Label.PROJECT),
                text(Label.FIRM),
                text(Label.CLIENT),
                text(Label.NUMBER),
                text(Label.SUBJECT),
                revision,
                entries.date(field(Label.DATE), Label.DATE.text()),
                word(Label.STATUS, Layout.STATUSES),
                system,
                word(Label.PAPER, Layout.PAPERS).equals(Layout.PAPERS.get(0)),
                unit(Label.FLOW_UNIT, system.coherentUnit(Dimension.FLOW)),
                unit(Label.HEAD_UNIT, system.coherentUnit(Dimension.LENGTH)),
                text(Label.DATUM),
                text(Label.WORKED_CASE),
                text(Label.RELEASE),
                word(Label.SEAL, Layout.YES).equals("yes"));
    }

    /** The case worked in full must be one of those on the sheet Flows; returned as it is written there. */
    String workedCase(String typed, List<String> cases) {
        for (String name : cases) {
            if (name.equalsIgnoreCase(typed)) {
                return name;
            }
        }
        if (!typed.isEmpty()) {
            String near = Near.question(typed, cases);
            entries.fault(
                    field(Label.WORKED_CASE),
                    "case-unknown",
                    Shown.quoted(typed) + " is not a case of the sheet Flows"
                            + (near.isEmpty() ? "; leave it blank for the first" : near));
        }
        return "";
    }

    private boolean readLabels(Table table) {
        for (Table.Row row : table.rows(List.of(), faults)) {
            RawCell typed = row.field("Label").cell();
            for (Label label : Label.values()) {
                if (typed != null && typed.text().strip().equalsIgnoreCase(label.text())) {
                    fields.putIfAbsent(label, row.field("Value"));
                }
            }
        }
        for (Label label : Label.values()) {
            if (!fields.containsKey(label)) {
                faults.add(
                        sheet.name(),
                        null,
                        "label-missing",
                        "there is no row labelled \"" + label.text()
                                + "\"; write that label and its value above the list of elements");
            }
        }
        return fields.size() == Label.values().length;
    }

    /** The elements of known methods; faults for the rest. */
    List<Named> elements() {
        List<Named> elements = new ArrayList<>();
        Table table = Table.find(sheet, Layout.STATION_HEADS, faults);
        if (table == null) {
            return elements;
        }
        List<Table.Row> rows = table.rows(List.of(), faults);
        if (rows.isEmpty()) {
            faults.add(
                    sheet.name(),
                    null,
                    "elements-missing",
                    "there is no element; write tag and method of at least one below the head row Tag | Method | Title");
        }
        Set<String> tags = new HashSet<>();
        for (Table.Row row : rows) {
            Field tagField = row.field("Tag");
            String tag = tag(tagField, tags);
            String method = method(row.field("Method"));
            String title = entries.text(row.field("Title"), "the title", Entries.LONGEST_TITLE);
            if (!tag.isEmpty() && !method.isEmpty()) {
                elements.add(new Named(tag, method, title.isEmpty() ? methods.title(method) : title, tagField));
            }
        }
        return elements;
    }

    private String tag(Field field, Set<String> tags) {
        String tag = entries.requiredText(field, "the tag", Entries.LONGEST_NAME);
        if (tag.isEmpty()) {
            return "";
        }
        String complaint = Tags.complaint(tag);
        if (complaint != null) {
            entries.fault(field, "tag-odd", complaint);
            return "";
        }
        if (!tags.add(tag)) {
            entries.fault(
                    field, "tag-twice", "the tag " + tag + " stands here a second time; give each element its own");
            return "";
        }
        return tag;
    }

    private String method(Field field) {
        String method = entries.requiredText(field, "the method", Entries.LONGEST_NAME);
        if (method.isEmpty() || methods.knows(method)) {
            return method;
        }
        String near = Near.to(method, methods.names());
        for (String name : methods.names()) {
            near = methods.title(name).equalsIgnoreCase(method) ? name : near;
        }
        entries.fault(
                field,
                "method-unknown",
                Shown.quoted(method) + " is not a known method; "
                        + (near == null
                                ? "choose " + Entries.listed(methods.names())
                                        + "; a method of the house's own is known where --house names its folder"
                                : "did you mean " + near + "?"));
        return "";
    }

    private Field field(Label label) {
        Field field = fields.get(label);
        if (field == null) {
            throw new IllegalStateException(label.text());
        }
        return field;
    }

    private String text(Label label) {
        Field field = field(label);
        return label.required()
                ? entries.requiredText(field, label.text(), label.longest())
                : entries.text(field, label.text(), label.longest());
    }

    private String word(Label label, List<String> words) {
        return entries.word(field(label), label.text(), words);
    }

    private Unit unit(Label label, Unit declared) {
        return quantities.unit(field(label), label.text(), declared);
    }
}
