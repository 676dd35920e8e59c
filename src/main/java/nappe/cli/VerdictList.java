package nappe.cli;

import java.io.PrintWriter;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Sheet;
import nappe.formula.Value;
import nappe.results.Digits;
import nappe.results.Results;

/** The summary of limits as lines of text. */
final class VerdictList {
    private final Results results;

    VerdictList(Results results) {
        this.results = results;
    }

    void print(PrintWriter out) {
        Sheet sheet = results.sheets().stream()
                .filter(s -> s.name().equals("Limits"))
                .findFirst()
                .orElseThrow();
        for (Block block : sheet.blocks()) {
            if (block instanceof Block.Table table) {
                out.println(table.title() + ":");
                for (Block.Row row : table.rows()) {
                    List<String> texts = row.items().stream().map(this::text).toList();
                    out.printf(
                            "  %-14s %-4s %s; tightest margin %s in %s%s%s%n",
                            texts.get(3),
                            texts.get(1),
                            texts.get(2),
                            texts.get(6),
                            texts.get(7),
                            count(texts.get(4), "not met"),
                            count(texts.get(5), "without result"));
                }
                return;
            }
        }
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
