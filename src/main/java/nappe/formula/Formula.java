package nappe.formula;

import java.util.List;
import nappe.unit.Unit;

/**
 * One formula as a tree of plain records. What a formula means is said by its readings, one class each: the number, the
 * dimension, the spreadsheet text, the typeset equation, the symbols it rests on.
 */
public sealed interface Formula {
    /** Lets a reading visit this node. */
    <R> R read(Reading<R> reading);

    /** A pure number, with the digits it was written with. */
    record Numeral(double value, String text) implements Formula {
        public <R> R read(Reading<R> reading) {
            return reading.numeral(this);
        }
    }

    /** A numeral and a unit: {@code 4 ft3/s}; {@code h/1 ft} is the number of feet in h. */
    record Quantity(double value, String text, Unit unit) implements Formula {
        public <R> R read(Reading<R> reading) {
            return reading.quantity(this);
        }
    }

    /** Words in quotes. */
    record Word(String text) implements Formula {
        public <R> R read(Reading<R> reading) {
            return reading.word(this);
        }
    }

    /** A symbol, defined elsewhere: an entry, a line, a constant, a column of a table. */
    record Symbol(String name) implements Formula {
        public <R> R read(Reading<R> reading) {
            return reading.symbol(this);
        }
    }

    /** A symbol in the neighbouring row of a march: {@code before(x)}, {@code after(x)}. */
    record Neighbour(boolean before, String name) implements Formula {
        public <R> R read(Reading<R> reading) {
            return reading.neighbour(this);
        }
    }

    /** One number for a whole column of a march: {@code last(x)}, {@code highest(x)}, {@code lowest(x)}. */
    record Summary(String kind, String name) implements Formula {
        public <R> R read(Reading<R> reading) {
            return reading.summary(this);
        }
    }

    /** A leading minus. */
    record Negation(Formula of) implements Formula {
        public <R> R read(Reading<R> reading) {
            return reading.negation(this);
        }
    }

    /** Two formulas joined by an operation of arithmetic. */
    record Operation(Operator operator, Formula left, Formula right) implements Formula {
        public <R> R read(Reading<R> reading) {
            return reading.operation(this);
        }
    }

    /** Two formulas compared. */
    record Comparison(Comparator comparator, Formula left, Formula right) implements Formula {
        public <R> R read(Reading<R> reading) {
            return reading.comparison(this);
        }
    }

    /** Conditions joined by {@code and} or {@code or}, or one turned round by {@code not}. */
    record Logic(String kind, List<Formula> parts) implements Formula {
        public <R> R read(Reading<R> reading) {
            return reading.logic(this);
        }
    }

    /** A function of the catalogue with its arguments. */
    record Call(Function function, List<Formula> arguments) implements Formula {
        public <R> R read(Reading<R> reading) {
            return reading.call(this);
        }
    }

    /** {@code none("words")}: no result here, and the words that are printed in its place. */
    record NoResult(String why) implements Formula {
        public <R> R read(Reading<R> reading) {
            return reading.noResult(this);
        }
    }
}
