package nappe.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Runs a command as a whole process and says how long it took. */
final class Commands {
    /** Seconds: on the wall, and of processors, user and system together. */
    record Took(double wall, double processor) {}

    private Commands() {}

    /** What the command prints goes to the file; a status other than 0 is a failure. */
    static Took run(Path printed, List<String> command) throws IOException, InterruptedException {
        Path times = Files.createTempFile("times", ".txt");
        List<String> timed = new ArrayList<>(List.of(
                "bash",
                "-c",
                "TIMEFORMAT='%R %U %S'; { time \"$@\" >\"$out\" 2>&1; } 2>\"$times\"",
                "bash"));
        timed.addAll(command);
        ProcessBuilder builder = new ProcessBuilder(timed);
        builder.environment().put("out", printed.toString());
        builder.environment().put("times", times.toString());
        int status = builder.start().waitFor();
        if (status != 0) {
            throw new IOException(command + " ended with " + status + ": " + Files.readString(printed));
        }
        String[] seconds = Files.readString(times).strip().split(" ");
        Files.delete(times);
        return new Took(
                Double.parseDouble(seconds[0]), Double.parseDouble(seconds[1]) + Double.parseDouble(seconds[2]));
    }
}
