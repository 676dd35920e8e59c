package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Cell;
import nappe.deliver.pdf.Ink.At;
import nappe.formula.Value;
import nappe.results.Bars;
import nappe.results.Digits;
import nappe.results.Results;

/**
 * Margins as bars: to the right of the line of nought what is left to the limit, to the left of it, hatched, what is
 * missing. A bar longer than the scale is cut and ends in an arrow; number and verdict stand beside it in words.
 */
final class BarsPicture {
    private static final double SIZE = 8;
    private static final double SMALL = 7.5;
    private static final double ROW = 9;
    private static final double HEAD = 10;
    private static final double BAR = 3.6;
    private static final double WORDS = 42;

    private final Results results;
    private final Sketch sketch;
    private final double width;
    private final double half;
    private final double zero;

    private BarsPicture(Results results, double width) {
        this.results = results;
        this.width = width;
        this.sketch = new Sketch(width);
        double room = width * 0.4;
        this.half = (width - room - WORDS) / 2 - 2;
        this.zero = room + 1 + half;
    }

    /** How many bars fit into a height in mm. */
    static int perPicture(double height) {
        return Math.max(1, (int) Math.floor((height - HEAD) / ROW));
    }

    static Picture of(Results results, String title, List<Bars.Bar> bars, double width) {
        return new BarsPicture(results, width).make(title, bars);
    }

    private Picture make(String title, List<Bars.Bar> bars) {
        double height = HEAD + bars.size() * ROW;
        sketch.centred(new At(zero - half, 3), SMALL, 0, List.of(Piece.plain("\u2212100 %")));
        sketch.centred(new At(zero - half / 2, 3), SMALL, 0, List.of(Piece.plain("what is missing")));
        sketch.centred(new At(zero, 3), SMALL, 0, List.of(Piece.plain("limit")));
        sketch.centred(new At(zero + half / 2, 3), SMALL, 0, List.of(Piece.plain("what is left")));
        sketch.centred(new At(zero + half, 3), SMALL, 0, List.of(Piece.plain("100 %")));
        for (double share : new double[] {-1, -0.5, 0.5, 1}) {
            double x = zero + half * share;
            sketch.grid(new At(x, 5), new At(x, height - 1));
        }
        double y = HEAD - 2;
        for (Bars.Bar bar : bars) {
            row(bar, y);
            y += ROW;
        }
        sketch.stroke(Sketch.MEDIUM, Sketch.WHOLE, new At(zero, 4.4), new At(zero, height - 1));
        return sketch.finish(height, title);
    }

    private void row(Bars.Bar bar, double top) {
        double middle = top + ROW / 2;
        List<String> lines =
                lines(bar.number() + "\u2002" + words(bar.tag()) + "  " + words(bar.label()), width * 0.4 - 4);
        for (int i = 0; i < lines.size(); i++) {
            double x = i == 0 ? 0 : 4;
            sketch.text(
                    new At(x, middle + 1 + (i - (lines.size() - 1) / 2.0) * 3.5),
                    SIZE,
                    Labels.label(results, lines.get(i)));
        }
        Value margin = results.value(bar.margin());
        String verdict = words(bar.verdict());
        double right = zero + half + 4;
        List<Piece> said = new ArrayList<>(List.of(Verdicts.weigh(verdict)));
        if (margin instanceof Value.Number number && !bar.unit().text().equals("1")) {
            said.add(Piece.plain(", " + (number.value() < 0 ? "missing " : "left ")));
            said.addAll(UnitPrint.after(
                    Digits.print(bar.unit(), Math.abs(number.value())),
                    bar.unit().text()));
        } else if (margin instanceof Value.Number number) {
            said.add(Piece.plain(", " + percent(number.value())));
            bar(number.value(), middle);
        }
        sketch.text(new At(right, middle - 0.7), SIZE, said);
        List<String> worst = lines(words(bar.where()), WORDS - 4);
        sketch.text(
                new At(right, middle + 2.7),
                SMALL,
                List.of(Piece.plain(worst.get(0) + (worst.size() > 1 ? "\u2026" : ""))));
    }

    private static String percent(double margin) {
        double percent = margin * 100;
        int decimals = Math.abs(percent) < 10 ? 2 : Math.abs(percent) < 100 ? 1 : 0;
        return (percent < 0 ? "\u2212" : "") + Digits.print(Math.abs(percent), decimals) + "\u00a0%";
    }

    private void bar(double margin, double middle) {
        boolean cut = Math.abs(margin) > 1;
        double end = zero + half * Math.max(-1, Math.min(1, margin));
        double top = middle - BAR / 2;
        double foot = middle + BAR / 2;
        List<At> corners = List.of(new At(zero, top), new At(end, top), new At(end, foot), new At(zero, foot));
        if (margin >= 0) {
            sketch.fill(0.8, corners.toArray(At[]::new));
        } else {
            for (double x = end + 1.2; x < zero; x += 1.2) {
                double back = Math.min(BAR, x - end);
                sketch.stroke(Sketch.THIN, Sketch.WHOLE, new At(x, top), new At(x - back, top + back));
            }
        }
        sketch.stroke(Sketch.MEDIUM, Sketch.WHOLE, true, corners);
        if (cut) {
            sketch.head(new At(zero, middle), new At(end + Math.signum(margin) * 2.6, middle));
        }
    }

    private String words(Cell cell) {
        return Printed.value(results, cell);
    }

    /** Words on lines no wider than the room, at most two; a word that is wider is cut to it. */
    private static List<String> lines(String text, double room) {
        List<String> lines = new ArrayList<>();
        String line = "";
        for (String word : text.split(" ")) {
            String fitting = cut(word, room);
            String longer = line.isEmpty() ? fitting : line + " " + fitting;
            if (!line.isEmpty() && width(longer) > room) {
                lines.add(line);
                line = fitting;
            } else {
                line = longer;
            }
        }
        lines.add(line);
        if (lines.size() > 2) {
            return List.of(lines.get(0), cut(lines.get(1) + "\u2026", room));
        }
        return lines;
    }

    private static String cut(String word, double room) {
        if (width(word) <= room) {
            return word;
        }
        int end = word.length();
        while (end > 1 && width(word.substring(0, end) + "\u2026") > room) {
            end = word.offsetByCodePoints(end, -1);
        }
        return word.substring(0, end) + "\u2026";
    }

    private static double width(String text) {
        return Typefaces.width(text, Typefaces.REGULAR, SIZE);
    }
}
