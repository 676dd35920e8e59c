package nappe.method;

import java.util.List;
import java.util.Map;
import nappe.formula.Formula;
import nappe.formula.Sign;
import nappe.source.Citation;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/**
 * What a method sheet defines, in the order of its text. A line's place follows from what it rests on, never from a
 * keyword: only on entries, once for all cases; on a case, once per case; on a free symbol, not by itself at all.
 */
public sealed interface Item {
    /** The symbols it defines. */
    List<String> outputs();

    /** How a symbol is taken in: typed or from a neighbour. */
    enum From {
        ENTRY,
        CHOICE,
        CASE,
        NEIGHBOUR
    }

    /**
     * Typed by the engineer, or taken from the neighbour downstream.
     *
     * @param unit its dimension and the unit offered first; 1 for a choice
     * @param role what it is to the station: "flow", "water level", "energy level"; empty for nothing
     * @param words the words of a choice
     * @param table the table a choice is made from; empty for others
     */
    record Given(
            From from,
            String symbol,
            Unit unit,
            String label,
            Sign sign,
            boolean optional,
            String role,
            List<String> words,
            String table)
            implements Item {
        @Override
        public List<String> outputs() {
            return List.of(symbol);
        }

        /** Whether it is the flow through the element: all of the case, or one part of several in service. */
        public boolean isFlow() {
            return role.equals("flow") || role.equals("flow through one");
        }
    }

    /** A symbol that has no value by itself: a depth, a head. */
    record Free(String symbol, Unit unit, String label, Sign sign) implements Item {
        @Override
        public List<String> outputs() {
            return List.of(symbol);
        }
    }

    /** A cited number. */
    record Constant(
            String symbol,
            double value,
            String digits,
            Unit unit,
            String label,
            @Nullable Citation citation) implements Item {
        @Override
        public List<String> outputs() {
            return List.of(symbol);
        }
    }

    /**
     * One formula.
     *
     * @param unit its dimension; null for words
     * @param knownSign a sign known from how it was made (a step of a rising column), or null
     * @param mayBeBlank true for a look-up in a column with blanks
     */
    record Line(
            String symbol,
            Formula formula,
            @Nullable Unit unit,
            String label,
            String source,
            @Nullable Sign knownSign,
            boolean mayBeBlank)
            implements Item {
        @Override
        public List<String> outputs() {
            return List.of(symbol);
        }
    }

    /**
     * Binds a free symbol and names what comes of it.
     *
     * @param members what rests on the free symbol and leads to the results, in order
     * @param results new name to the member's own symbol
     */
    record At(String free, Formula value, List<Item> members, Map<String, String> results) implements Item {
        @Override
        public List<String> outputs() {
            return List.copyOf(results.keySet());
        }
    }

    /**
     * The value of a free symbol at which two sides are equal, found in trial rows.
     *
     * @param below result where the root lies under the bracket; null for none
     * @param above result where it lies over the bracket; null for none
     */
    record Root(
            String symbol,
            String free,
            Sign freeSign,
            Formula left,
            Formula right,
            Formula from,
            Formula to,
            @Nullable Formula below,
            @Nullable Formula above,
            int trials,
            List<Item> members,
            Unit unit,
            String label,
            String source)
            implements Item {
        @Override
        public List<String> outputs() {
            return List.of(symbol);
        }
    }
}
