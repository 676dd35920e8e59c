package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;

/**
 * A part of an equation as boxes in a row, between some of which a line may end.
 *
 * @param binding how tightly its outermost operation binds, as in {@link nappe.formula.Operator#binding()}
 * @param numberFirst whether it starts with digits, which must not run into a number before
 * @param unitLast whether it ends with a unit, which must not run into what follows
 * @param minusFirst whether it starts with a minus sign
 */
record BoxRow(List<Item> items, int binding, boolean numberFirst, boolean unitLast, boolean minusFirst) {
    /** Binding of words and conditions. */
    static final int LOOSE = 0;

    /** Binding of a sum. */
    static final int SUM = 1;

    /** Binding of a product. */
    static final int PRODUCT = 2;

    /** Binding of a leading minus and of a fraction with a bar. */
    static final int MINUS = 3;

    /** Binding of a power. */
    static final int POWER = 4;

    /** Binding of what is never bracketed. */
    static final int ATOM = 5;

    /** The price of ending a line where none may end. */
    static final int NEVER = Integer.MAX_VALUE;

    private static final int INSIDE = 10;

    /**
     * A box of the row.
     *
     * @param gap before it, where it doesn't start a line
     * @param price of ending a line before it; among places that serve, the cheaper is taken
     */
    record Item(Box box, double gap, int price) {
        Item glued(double gap) {
            return new Item(box, gap, NEVER);
        }

        Item dearer() {
            return price == NEVER ? this : new Item(box, gap, price + INSIDE);
        }
    }

    BoxRow {
        items = List.copyOf(items);
    }

    static BoxRow of(int binding, Box box) {
        return new BoxRow(List.of(new Item(box, 0, NEVER)), binding, false, false, false);
    }

    static BoxRow atom(Box box) {
        return of(ATOM, box);
    }

    BoxRow with(boolean itsNumberFirst, boolean itsUnitLast) {
        return new BoxRow(items, binding, itsNumberFirst, itsUnitLast, minusFirst);
    }

    BoxRow bound(int itsBinding) {
        return new BoxRow(items, itsBinding, numberFirst, unitLast, minusFirst);
    }

    /** Two side by side, never parted. */
    BoxRow then(double gap, BoxRow next) {
        return then(gap, NEVER, next);
    }

    /** Two side by side; at this price a line may end between them. */
    BoxRow then(double gap, int price, BoxRow next) {
        List<Item> all = new ArrayList<>(items);
        Item first = next.items.get(0);
        all.add(new Item(first.box(), gap, price));
        all.addAll(next.items.subList(1, next.items.size()));
        return new BoxRow(all, binding, numberFirst, next.unitLast, minusFirst);
    }

    BoxRow withMinusFirst() {
        return new BoxRow(items, MINUS, false, unitLast, true);
    }

    /** Itself, or in brackets where it binds less tightly than asked. */
    BoxRow within(int least, Shapes shapes) {
        return binding >= least ? this : bracketed(shapes);
    }

    BoxRow bracketed(Shapes shapes) {
        double above =
                items.stream().mapToDouble(item -> item.box().above()).max().orElse(0);
        double below =
                items.stream().mapToDouble(item -> item.box().below()).max().orElse(0);
        return between(shapes.bracket(true, above, below), shapes.bracket(false, above, below));
    }

    /** Itself between two boxes that belong to it; within, lines end only at a higher price. */
    BoxRow between(Box open, Box close) {
        List<Item> all = new ArrayList<>();
        all.add(new Item(open, 0, NEVER));
        all.add(items.get(0).glued(0));
        items.subList(1, items.size()).forEach(item -> all.add(item.dearer()));
        all.add(new Item(close, 0, NEVER));
        return new BoxRow(all, ATOM, false, false, false);
    }

    /** All in one row. */
    Box box() {
        List<Box> boxes = new ArrayList<>();
        for (Item item : items) {
            if (!boxes.isEmpty() && item.gap() > 0) {
                boxes.add(Box.empty(item.gap(), 0, 0));
            }
            boxes.add(item.box());
        }
        return Box.row(boxes);
    }
}
