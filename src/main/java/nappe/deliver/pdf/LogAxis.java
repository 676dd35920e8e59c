package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import nappe.results.Digits;

/**
 * A logarithmic axis.
 *
 * @param least value at its start
 * @param greatest value at its end
 * @param from where it starts on paper, in mm
 * @param to where it ends on paper, in mm
 */
record LogAxis(double least, double greatest, double from, double to) {
    /** A division; without text for a minor one. */
    record Tick(double value, String text) {}

    private static final double ROOM = 6;

    /** An axis on which all the positive values lie, with a little air at both ends. */
    static LogAxis of(List<Double> values, double from, double to) {
        double least =
                values.stream().filter(v -> v > 0).mapToDouble(v -> v).min().orElse(1);
        double greatest =
                values.stream().filter(v -> v > 0).mapToDouble(v -> v).max().orElse(10);
        double air = Math.pow(Math.max(1.2, greatest / least), 0.04);
        return new LogAxis(least / air, greatest * air, from, to);
    }

    double place(double value) {
        return from + (to - from) * Math.log(value / least) / Math.log(greatest / least);
    }

    /** The divisions 1 to 9 of each decade; 1, 2 and 5, or all where there is room, with text. */
    List<Tick> ticks() {
        List<Tick> ticks = new ArrayList<>();
        int first = (int) Math.floor(Math.log10(least));
        int last = (int) Math.ceil(Math.log10(greatest));
        double decade = Math.abs(to - from) / Math.log10(greatest / least);
        for (int power = first; power <= last; power++) {
            for (int digit = 1; digit <= 9; digit++) {
                double value = power < 0 ? digit / Math.pow(10, -power) : digit * Math.pow(10, power);
                if (value >= least && value <= greatest) {
                    boolean major = digit == 1
                            || (digit == 2 || digit == 5) && decade * 0.3 > ROOM
                            || decade * Math.log10((digit + 1.0) / digit) > 2 * ROOM;
                    ticks.add(new Tick(value, major ? Digits.asTyped(value) : ""));
                }
            }
        }
        return ticks;
    }
}
