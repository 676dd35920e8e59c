package nappe.input;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import nappe.station.Design.Combination;
import nappe.station.Design.FlowCase;

/** The names of the cases and combinations, and what is typed to name one of them. */
final class CaseNames {
    private final Entries entries;
    private final Map<String, FlowCase> cases = new LinkedHashMap<>();
    private final Map<String, Combination> combinations = new LinkedHashMap<>();

    /** @param cases without a name, or none at all, where faults leave open which there are */
    CaseNames(List<FlowCase> cases, Entries entries) {
        this.entries = entries;
        for (FlowCase one : cases) {
            if (!one.name().isEmpty()) {
                this.cases.putIfAbsent(Entries.key(one.name()), one);
            }
        }
    }

    /** Takes in a combination; a name that there is already is a fault. */
    void add(Combination combination, Field field) {
        String key = Entries.key(combination.name());
        FlowCase same = cases.get(key);
        Combination before = combinations.get(key);
        if (combination.name().isEmpty()) {
            return;
        }
        if (same != null || before != null) {
            entries.fault(
                    field,
                    "case-twice",
                    Shown.quoted(combination.name()) + " is the name of a "
                            + (same != null
                                    ? "case on the sheet " + Layout.FLOWS
                                    : "combination in "
                                            + (before == null
                                                    ? ""
                                                    : before.origin().cell()))
                            + " too; give each its own");
        }
        combinations.putIfAbsent(key, combination);
    }

    /** The name of a case, as it is written on the sheet Flows; the name as typed where no case has it. */
    String ofCase(Field field, String what) {
        String typed = entries.requiredText(field, what, FlowsSheet.LONGEST_CASE);
        FlowCase known = cases.get(Entries.key(typed));
        if (known == null && !typed.isEmpty() && !cases.isEmpty()) {
            refuse(field, typed, cases.values().stream().map(FlowCase::name).toList());
        }
        return known == null ? typed : known.name();
    }

    /** The name of a case or combination that is judged; empty where blank. */
    String judged(Field field) {
        String typed = entries.text(field, "the case", FlowsSheet.LONGEST_CASE);
        String key = Entries.key(typed);
        FlowCase known = cases.get(key);
        Combination combined = combinations.get(key);
        if (typed.isEmpty() || cases.isEmpty()) {
            return typed;
        }
        if (combined != null && !combined.canCoincide()) {
            entries.fault(
                    field,
                    "case-not-judged",
                    Shown.quoted(combined.name()) + " is a combination that cannot coincide, in which nothing is judged"
                            + "; name another, or leave it blank for every case");
        } else if (known == null && combined == null) {
            List<String> names = new ArrayList<>();
            cases.values().forEach(one -> names.add(one.name()));
            combinations.values().stream().filter(Combination::canCoincide).forEach(one -> names.add(one.name()));
            refuse(field, typed, names);
        }
        return known != null ? known.name() : combined != null ? combined.name() : typed;
    }

    private void refuse(Field field, String typed, List<String> names) {
        String question = Near.question(typed, names);
        entries.fault(
                field,
                "case-unknown",
                Shown.quoted(typed) + " is the name of no case"
                        + (question.isEmpty() ? "; write " + Entries.listed(names) : question));
    }
}
