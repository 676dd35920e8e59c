package nappe.input;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * Reads an .xlsx file cell by cell, strictly: what a spreadsheet program would mend in silence is refused, for a
 * calculation must not rest on a guess.
 */
final class WorkbookReader {
    private static final int MOST_TEXT = 20_000_000;
    private static final int MOST_SHEETS = 200;

    /** What one part says of another. */
    private record Relation(String type, String target) {
        boolean isOf(String kind) {
            return type.endsWith("/" + kind);
        }
    }

    private record SheetEntry(
            String name, boolean hidden, @Nullable String relation) {}

    private final Parts parts;
    private final Faults faults;

    private WorkbookReader(Parts parts, Faults faults) {
        this.parts = parts;
        this.faults = faults;
    }

    /** Reads the file; what is wrong with it as a file is thrown as {@link InputRefused}. */
    static RawWorkbook read(Path file, Faults faults) {
        new FileKind(file, faults).requireZip();
        try (Parts parts = Parts.open(file, faults)) {
            RawWorkbook workbook = new WorkbookReader(parts, faults).workbook();
            faults.throwIfAny();
            return workbook;
        }
    }

    private RawWorkbook workbook() {
        String main = mainPart();
        Map<String, Relation> relations = relations(main);
        for (Relation relation : relations.values()) {
            if (relation.isOf("externalLink")) {
                throw faults.refuse(
                        "external-links",
                        "the workbook has links to other workbooks; replace them by "
                                + "their values and save it again");
            }
            if (relation.isOf("vbaProject") || relation.isOf("xlMacrosheet")) {
                throw macros();
            }
        }
        List<SheetEntry> entries = new ArrayList<>();
        boolean from1904 = false;
        try (Xml xml = Xml.openShort(parts, main)) {
            if (xml.namespace().startsWith("http://purl.oclc.org/ooxml/")) {
                throw strictVariant();
            }
            if (!xml.starts("workbook") || !xml.namespace().equals(Xml.MAIN)) {
                throw faults.refuse(
                        "not-a-workbook", "its main part is no workbook; give the input workbook saved as .xlsx");
            }
            while (xml.next()) {
                if (xml.starts("workbookPr")) {
                    from1904 = xml.isTrue("date1904");
                } else if (xml.starts("sheet")) {
                    boolean hidden = !xml.attribute("state", "visible").equals("visible");
                    entries.add(new SheetEntry(xml.attribute("name", ""), hidden, xml.relation()));
                }
            }
        }
        return new RawWorkbook(sheets(entries, relations), from1904);
    }

    private List<RawSheet> sheets(List<SheetEntry> entries, Map<String, Relation> relations) {
        if (entries.size() > MOST_SHEETS) {
            throw faults.refuse(
                    "too-many-sheets",
                    "the workbook has " + entries.size() + " sheets, more than the " + MOST_SHEETS
                            + " that an input workbook may have");
        }
        NumberFormats formats = new NumberFormats();
        List<String> texts = List.of();
        for (Relation relation : relations.values()) {
            if (relation.isOf("styles") && parts.has(relation.target())) {
                formats = NumberFormats.read(parts, relation.target());
            } else if (relation.isOf("sharedStrings") && parts.has(relation.target())) {
                texts = sharedTexts(relation.target());
            }
        }
        List<RawSheet> sheets = new ArrayList<>();
        Set<String> names = new HashSet<>();
        int filled = 0;
        for (SheetEntry entry : entries) {
            Relation relation = entry.relation() == null ? null : relations.get(entry.relation());
            if (relation == null || !parts.has(relation.target())) {
                faults.add(
                        entry.name(),
                        null,
                        "sheet-part-missing",
                        "the file is damaged: the part with this sheet's cells is missing");
                continue;
            }
            if (!names.add(entry.name().toLowerCase(Locale.ROOT))) {
                faults.add(entry.name(), null, "sheet-twice", "the file is damaged: there are two sheets of this name");
            }
            if (relation.isOf("worksheet")) {
                RawSheet sheet = new RawSheet(entry.name(), entry.hidden());
                try (Xml xml = Xml.open(parts, relation.target())) {
                    if (!xml.starts("worksheet") || !xml.namespace().equals(Xml.MAIN)) {
                        throw faults.refuse(
                                "damaged", "the file is damaged: its part " + relation.target() + " is no sheet");
                    }
                    filled = new SheetPart(xml, sheet, texts, formats, faults).read(filled);
                }
                sheets.add(sheet);
            }
        }
        return sheets;
    }

    private List<String> sharedTexts(String part) {
        List<String> texts = new ArrayList<>();
        long length = 0;
        try (Xml xml = Xml.open(parts, part)) {
            StringBuilder text = new StringBuilder();
            while (xml.next()) {
                if (xml.starts("si")) {
                    text.setLength(0);
                } else if (xml.starts("rPh")) {
                    xml.text();
                } else if (xml.starts("t")) {
                    xml.appendText(text);
                } else if (xml.ends("si")) {
                    texts.add(SheetPart.unescaped(text.toString()));
                    length += text.length() + 20;
                }
                if (length > MOST_TEXT) {
                    throw faults.refuse(
                            "too-large",
                            "the workbook holds more than " + MOST_TEXT
                                    + " characters of text, the most that an input workbook may have");
                }
            }
        }
        return texts;
    }

    /** The name of the part that lists the sheets, after the kinds of file that are not ours were refused. */
    private String mainPart() {
        if (!parts.has("[Content_Types].xml") || !parts.has("_rels/.rels")) {
            throw otherZip();
        }
        Relation main = relations("").values().stream()
                .filter(r -> r.isOf("officeDocument") && parts.has(r.target()))
                .findFirst()
                .orElseThrow(this::otherZip);
        if (main.type().startsWith("http://purl.oclc.org/ooxml/")) {
            throw strictVariant();
        }
        String type = contentType(main.target());
        if (type.contains("template")) {
            throw faults.refuse("template", "this is a template; open it and save it as a plain .xlsx workbook");
        }
        if (type.contains("macroenabled") || type.contains("addin") || parts.has("xl/vbaProject.bin")) {
            throw macros();
        }
        if (!type.contains("spreadsheetml.sheet.main")) {
            throw faults.refuse(
                    "not-a-workbook",
                    "this is an office file of another kind, no workbook; give the input " + "workbook saved as .xlsx");
        }
        return main.target();
    }

    private String contentType(String part) {
        String byExtension = "";
        try (Xml xml = Xml.openShort(parts, "[Content_Types].xml")) {
            while (xml.next()) {
                String type = xml.isStart() ? xml.attribute("ContentType", "").toLowerCase(Locale.ROOT) : "";
                if (xml.starts("Override") && xml.attribute("PartName", "").equalsIgnoreCase("/" + part)) {
                    return type;
                }
                if (xml.starts("Default") && part.endsWith("." + xml.attribute("Extension", ""))) {
                    byExtension = type;
                }
            }
        }
        return byExtension;
    }

    private Map<String, Relation> relations(String of) {
        int slash = of.lastIndexOf('/') + 1;
        String part = of.substring(0, slash) + "_rels/" + of.substring(slash) + ".rels";
        Map<String, Relation> relations = new LinkedHashMap<>();
        if (!parts.has(part)) {
            return relations;
        }
        try (Xml xml = Xml.openShort(parts, part)) {
            do {
                if (xml.starts("Relationship")
                        && !xml.attribute("TargetMode", "").equals("External")) {
                    relations.put(
                            xml.attribute("Id", ""),
                            new Relation(
                                    xml.attribute("Type", ""),
                                    resolved(of.substring(0, slash), xml.attribute("Target", ""))));
                }
            } while (xml.next());
        }
        return relations;
    }

    private static String resolved(String folder, String target) {
        if (target.startsWith("/")) {
            return target.substring(1);
        }
        String path = Path.of("/" + folder)
                .resolve(target.replace("\0", ""))
                .normalize()
                .toString();
        return path.replace('\\', '/').replaceFirst("^/", "");
    }

    private InputRefused otherZip() {
        try {
            String kind = parts.start("mimetype");
            if (kind != null && kind.contains("opendocument")) {
                return faults.refuse("open-document", "this is an OpenDocument file; open it and save it as .xlsx");
            }
        } catch (IOException e) {
            return faults.refuse("damaged", "the file is damaged: its part mimetype can't be unpacked");
        }
        return faults.refuse("not-a-workbook", "this zip file is no workbook; give the input workbook saved as .xlsx");
    }

    private InputRefused macros() {
        return faults.refuse("macros", "the workbook can hold macros; save it as a plain .xlsx workbook");
    }

    private InputRefused strictVariant() {
        return faults.refuse(
                "strict-variant",
                "the workbook is saved in the strict variant of .xlsx; save it as a plain " + ".xlsx workbook");
    }
}
