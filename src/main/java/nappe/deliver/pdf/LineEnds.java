package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import nappe.deliver.pdf.BoxRow.Item;

/** Breaks a row of boxes into lines: before signs of the outermost operation first, within brackets only if need be. */
final class LineEnds {
    /** A line is filled at least so far before it ends at a cheap place. */
    private static final double FILLED = 0.45;

    private final List<Item> items;
    private final double width;
    private final double indent;

    private LineEnds(BoxRow run, double width, double indent) {
        this.items = run.items();
        this.width = width;
        this.indent = indent;
    }

    /**
     * The lines as one box with the baseline of the first; lines after the first are moved to the right.
     *
     * @param width of a line; wider only where a single box is
     */
    static Box broken(BoxRow run, double width, Type type, double indent) {
        List<Box> lines = new LineEnds(run, width, indent).lines();
        List<Double> indents = new ArrayList<>();
        for (int i = 0; i < lines.size(); i++) {
            indents.add(i == 0 ? 0 : indent);
        }
        return lines.size() == 1 ? lines.get(0) : Box.column(lines, indents, 1.3 * type.size(), 0.28 * type.size());
    }

    private List<Box> lines() {
        List<Integer> prices =
                items.stream().skip(1).map(Item::price).distinct().sorted().toList();
        for (int price : prices) {
            List<List<Item>> lines = filled(price);
            if (price == BoxRow.NEVER) {
                break;
            }
            if (fits(lines)) {
                return boxes(lines);
            }
        }
        return boxes(filled(BoxRow.NEVER - 1));
    }

    private boolean fits(List<List<Item>> lines) {
        for (int i = 0; i < lines.size(); i++) {
            if (width(lines.get(i)) > room(i) + 1e-6) {
                return false;
            }
        }
        return true;
    }

    private double room(int line) {
        return line == 0 ? width : width - indent;
    }

    private static double width(List<Item> line) {
        double width = 0;
        for (int i = 0; i < line.size(); i++) {
            width += line.get(i).box().width() + (i == 0 ? 0 : line.get(i).gap());
        }
        return width;
    }

    /** Lines as full as they get, ended at places of at most this price. */
    private List<List<Item>> filled(int dearest) {
        List<List<Item>> lines = new ArrayList<>();
        int from = 0;
        while (from < items.size()) {
            int to = end(from, room(lines.size()), dearest);
            lines.add(items.subList(from, to));
            from = to;
        }
        return lines;
    }

    private int end(int from, double room, int dearest) {
        if (width(items.subList(from, items.size())) <= room + 1e-6) {
            return items.size();
        }
        int end = -1;
        for (int at = from + 1; at < items.size(); at++) {
            int price = items.get(at).price();
            if (price > dearest) {
                continue;
            }
            double filled = width(items.subList(from, at));
            if (end >= 0 && filled > room + 1e-6) {
                break;
            }
            if (end < 0 || price <= items.get(end).price() || width(items.subList(from, end)) < FILLED * room) {
                end = at;
            }
        }
        return end < 0 ? items.size() : end;
    }

    private static List<Box> boxes(List<List<Item>> lines) {
        return lines.stream()
                .map(line -> new BoxRow(line, BoxRow.ATOM, false, false, false).box())
                .toList();
    }
}
