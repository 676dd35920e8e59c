package nappe.input;

import java.util.ArrayList;
import java.util.List;
import nappe.station.Design.Combination;

/** Reads the combinations: the flow of one case with the water level of another, each with the engineer's word on it. */
final class CombinationsSheet {
    private final RawSheet sheet;
    private final Entries entries;
    private final Faults faults;

    CombinationsSheet(RawSheet sheet, Entries entries, Faults faults) {
        this.sheet = sheet;
        this.entries = entries;
        this.faults = faults;
    }

    /** The combinations, in the order of their rows; the names learn theirs. */
    List<Combination> combinations(CaseNames names) {
        List<Combination> combinations = new ArrayList<>();
        Table table = Table.find(sheet, Layout.COMBINATION_HEADS, faults);
        if (table != null) {
            for (Table.Row row : table.rows(List.of(), faults)) {
                Field name = row.field("Combination");
                Combination one = new Combination(
                        entries.requiredText(name, "the name of the combination", FlowsSheet.LONGEST_CASE),
                        names.ofCase(row.field("Flow of case"), "the case whose flow it takes"),
                        names.ofCase(row.field("Level of case"), "the case whose water level it takes"),
                        entries.word(row.field("Can coincide"), "whether both can occur together", Layout.YES)
                                .equals("yes"),
                        entries.requiredText(
                                row.field("Basis"), "why both can or cannot occur together", Entries.LONGEST_TEXT),
                        name.origin());
                names.add(one, name);
                combinations.add(one);
            }
        }
        return combinations;
    }
}
