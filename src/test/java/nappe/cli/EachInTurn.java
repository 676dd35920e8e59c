package nappe.cli;

import java.io.PrintWriter;
import java.io.StringWriter;

/** Issues files one after the other in one Java, and prints a line of status and time before what was said of each. */
final class EachInTurn {
    static final String MARK = ">>> ";

    private EachInTurn() {}

    /** @param args the folder for packages, then the files */
    public static void main(String[] args) {
        for (int i = 1; i < args.length; i++) {
            StringWriter said = new StringWriter();
            PrintWriter writer = new PrintWriter(said, true);
            long start = System.nanoTime();
            int status = Nappe.run(new String[] {"issue", args[i], "-o", args[0]}, writer, writer);
            System.out.println(MARK + status + " " + (System.nanoTime() - start) / 1_000_000 + " " + args[i]);
            System.out.print(said);
        }
    }
}
