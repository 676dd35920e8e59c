package nappe.bench;

import java.time.Duration;
import java.time.Instant;
import java.util.LinkedHashMap;
import java.util.Map;

/** Times of stages that follow one another, in seconds. */
public final class Clock {
    private final Map<String, Double> laps = new LinkedHashMap<>();
    private long last;

    private Clock(long start) {
        this.last = start;
    }

    public static Clock start() {
        return new Clock(System.nanoTime());
    }

    /** A clock that has been running since the process was started. */
    public static Clock sinceProcessStart() {
        Instant started = ProcessHandle.current().info().startInstant().orElse(Instant.now());
        return new Clock(
                System.nanoTime() - Duration.between(started, Instant.now()).toNanos());
    }

    /** Ends a stage. */
    public void lap(String stage) {
        long now = System.nanoTime();
        laps.put(stage, (now - last) / 1e9);
        last = now;
    }

    /** Each stage on a line: name, tab, seconds. */
    public void print() {
        laps.forEach((stage, seconds) -> System.out.println(stage + "\t" + seconds));
    }
}
