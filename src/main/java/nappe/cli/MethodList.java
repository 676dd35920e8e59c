package nappe.cli;

import java.io.PrintWriter;
import java.util.List;
import nappe.job.MethodOverview;

/** The methods on the screen: name and title, then standards, range and state, each in lines of a readable length. */
final class MethodList {
    private static final int WIDTH = 100;
    private static final int INDENT = 13;

    private final PrintWriter out;

    MethodList(PrintWriter out) {
        this.out = out;
    }

    /** Name, title and state only, to choose from. */
    void printShort(MethodOverview method, String mark) {
        out.println(method.name() + "  " + method.title() + mark);
        out.println("    " + method.state());
    }

    /** @param mark whose the method is, behind its title */
    void print(MethodOverview method, String mark) {
        out.println(method.name() + "  " + method.title() + mark);
        print("standards", method.standards());
        print("range", method.ranges());
        print("state", List.of(method.state()));
        out.println();
    }

    private void print(String head, List<String> parts) {
        String lead = "  " + head;
        StringBuilder line = new StringBuilder(lead).append(" ".repeat(INDENT - lead.length()));
        boolean first = true;
        for (String word : String.join("; ", parts).split(" ")) {
            if (!first && line.length() + 1 + word.length() > WIDTH) {
                out.println(line);
                line = new StringBuilder(" ".repeat(INDENT));
                first = true;
            }
            line.append(first ? "" : " ").append(word);
            first = false;
        }
        if (!parts.isEmpty()) {
            out.println(line);
        }
    }
}
