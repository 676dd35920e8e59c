package nappe.method;

import java.util.List;
import java.util.Map;
import java.util.Set;
import nappe.source.CitedTable;
import nappe.source.Publication;
import org.jspecify.annotations.Nullable;

/**
 * What one text says about one kind of element: checked, and without numbers of a design.
 *
 * @param house the name of the house whose own method it is; empty for one that comes with Nappe
 * @param about paragraphs on the method and the limits of its use
 * @param cautions printed on the sheets of the device
 * @param items in the order of the text
 * @param geometry what a device must satisfy to exist at all
 * @param screen what is compared over the words of a choice, or null
 * @param gives role ("water level") to the symbol offered to the neighbour upstream
 * @param reach for each symbol, all the symbols it rests on, less those that are bound on the way
 * @param text the text itself, with all it includes, for the fingerprint
 */
public record MethodSheet(
        String name,
        String house,
        String title,
        List<String> about,
        List<String> cautions,
        List<Publication> sources,
        List<Item> items,
        List<Limit> limits,
        List<Geometry> geometry,
        List<Rating> ratings,
        @Nullable Screen screen,
        Map<String, String> gives,
        Map<String, CitedTable> tables,
        Map<String, Set<String>> reach,
        String text) {

    /** The item that defines a symbol, or null. */
    public @Nullable Item item(String symbol) {
        for (Item item : items) {
            if (item.outputs().contains(symbol)) {
                return item;
            }
        }
        return null;
    }

    /** What a symbol rests on that is typed once per case or comes from a neighbour. */
    public boolean perCase(String symbol) {
        return reach.getOrDefault(symbol, Set.of()).stream()
                .anyMatch(s -> item(s) instanceof Item.Given given
                        && (given.from() == Item.From.CASE || given.from() == Item.From.NEIGHBOUR));
    }

    /** Whether a symbol rests on a free one and so has no value by itself. */
    public boolean isTemplate(String symbol) {
        return reach.getOrDefault(symbol, Set.of()).stream().anyMatch(s -> item(s) instanceof Item.Free);
    }

    /** The items that rest on a free symbol and lead to the targets, in order. */
    public List<Item> closure(String free, Set<String> targets) {
        return Closure.of(items, reach, free, targets);
    }
}
