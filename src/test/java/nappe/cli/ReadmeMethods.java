package nappe.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import nappe.job.CheckRow;
import nappe.job.MethodOverview;

/** Writes the table of methods into the README, between its two marks. */
final class ReadmeMethods {
    static final Path README = Path.of("README.md");

    private static final String START = "<!-- methods: written by ReadmeMethods -->\n";
    private static final String END = "<!-- end of methods -->";

    private ReadmeMethods() {}

    public static void main(String[] args) throws IOException {
        String readme = Files.readString(README);
        int start = readme.indexOf(START) + START.length();
        String after = readme.substring(start + written(readme).length());
        Files.writeString(README, readme.substring(0, start) + table() + after);
    }

    /** What stands between the marks. */
    static String written(String readme) {
        int start = readme.indexOf(START) + START.length();
        int end = readme.indexOf(END);
        if (start < START.length() || end < start) {
            throw new IllegalStateException("README.md lacks the marks of the table of methods");
        }
        return readme.substring(start, end);
    }

    /** What the program says of its methods. */
    static String table() {
        Desk desk = new Desk();
        List<CheckRow> checks = desk.checks();
        StringBuilder table =
                new StringBuilder("| name | what it is | standards | range | check values |\n|---|---|---|---|---|\n");
        for (String name : desk.methods().names()) {
            MethodOverview method = MethodOverview.of(desk.methods(), name, checks);
            table.append("| `")
                    .append(name)
                    .append("` | ")
                    .append(cell(List.of(method.title())))
                    .append(" | ")
                    .append(cell(brief(method.standards())))
                    .append(" | ")
                    .append(cell(method.ranges()))
                    .append(" | ")
                    .append(cell(List.of(method.state())))
                    .append(" |\n");
        }
        return table.toString();
    }

    /** Publications by their number or first author: {@code blank --methods NAME} tells them in full. */
    private static List<String> brief(List<String> standards) {
        return standards.stream()
                .filter(standard -> !standard.startsWith("Common practice"))
                .map(standard -> standard.split("[,:(] ?(?![0-9])", 2)[0].strip()
                        + (standard.contains("from memory") ? " (memory)" : ""))
                .distinct()
                .toList();
    }

    private static String cell(List<String> parts) {
        return String.join("; ", parts).replace("|", "\\|").replace("*", "\\*").replace("_", "\\_");
    }
}
