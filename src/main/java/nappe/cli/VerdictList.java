package nappe.cli;

import java.io.PrintWriter;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.calculation.Block;
import nappe.formula.Value;
import nappe.results.Digits;
import nappe.results.Results;

/** The summary of limits as lines of text. */
final class VerdictList {
    /** Verdicts that need no line of their own where there is no margin to tell. */
    private static final Set<String> QUIET = Set.of("met", "does not apply");

    private final Results results;

    VerdictList(Results results) {
        this.results = results;
    }

    /** Every limit with a margin, and every one that is not plainly met; the others are counted by their verdict. */
    void print(PrintWriter out) {
        Block.Table table = limits();
        out.println(table.title() + " (a margin is a part of its bound, below 0 where not met):");
        Map<String, Integer> counted = new LinkedHashMap<>();
        for (Block.Row row : table.rows()) {
            List<String> texts = row.items().stream().map(this::text).toList();
            String verdict = texts.get(3);
            boolean hasMargin = isNumber(row.items().get(6));
            if (hasMargin || !QUIET.contains(verdict)) {
                out.printf(
                        "  %-14s %-4s %s%s%s%s%n",
                        verdict,
                        texts.get(1),
                        texts.get(2),
                        hasMargin ? "; tightest margin " + texts.get(6) + " in " + texts.get(7) : "",
                        count(texts.get(4), "not met"),
                        count(texts.get(5), "without result"));
            } else {
                counted.merge(verdict, 1, Integer::sum);
            }
        }
        counted.forEach((verdict, count) -> out.printf(
                "  %-14s %s%n", verdict, count + (verdict.equals("met") ? " more, which have no margin" : " more")));
    }

    private Block.Table limits() {
        return results.sheets().stream()
                .filter(sheet -> sheet.name().equals("Limits"))
                .flatMap(sheet -> sheet.blocks().stream())
                .filter(Block.Table.class::isInstance)
                .map(Block.Table.class::cast)
                .findFirst()
                .orElseThrow();
    }

    private boolean isNumber(Block.Item item) {
        return item instanceof Block.Content content && results.value(content.cell()) instanceof Value.Number;
    }

    private static String count(String cases, String what) {
        return cases.equals("0") ? "" : "; " + what + " in " + cases + (cases.equals("1") ? " case" : " cases");
    }

    private String text(Block.Item item) {
        if (item instanceof Block.Text text) {
            return text.text();
        }
        if (item instanceof Block.Content content) {
            Value value = results.value(content.cell());
            return value instanceof Value.Number number
                    ? Digits.print(content.cell().unit(), number.value())
                    : value instanceof Value.Word word ? word.text() : ((Value.None) value).why();
        }
        return "";
    }
}
