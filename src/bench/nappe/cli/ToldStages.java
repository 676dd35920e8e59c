package nappe.cli;

import java.io.PrintWriter;
import java.io.StringWriter;
import nappe.bench.Clock;

/** The program with its usual arguments, timed from each stage that it tells a waiting person to the next. */
public final class ToldStages {
    private ToldStages() {}

    public static void main(String[] args) {
        Clock clock = Clock.sinceProcessStart();
        String[] stage = {"start"};
        int status = Nappe.run(
                words -> {
                    clock.lap(stage[0]);
                    stage[0] = words;
                },
                args,
                new PrintWriter(new StringWriter()),
                new PrintWriter(System.err, true));
        clock.lap(stage[0]);
        clock.print();
        System.exit(status);
    }
}
