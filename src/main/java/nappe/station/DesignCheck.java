package nappe.station;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import nappe.method.Item;
import nappe.method.MethodSheet;
import org.jspecify.annotations.Nullable;

/** What can be told of a design from its methods before anything is computed: all faults, each at its cell. */
public final class DesignCheck {
    private DesignCheck() {}

    /**
     * What does not fit together: elements and their neighbours, dimensions that cannot be built, demands.
     *
     * @param methodOf the method sheet of a name
     */
    public static List<DesignFault> faults(Design design, Function<String, MethodSheet> methodOf) {
        Map<String, MethodSheet> methods = new LinkedHashMap<>();
        design.elements().forEach(element -> methods.put(element.tag(), methodOf.apply(element.method())));
        List<DesignFault> faults = new ArrayList<>(missingLinks(design, methods));
        faults.addAll(GeometryCheck.faults(design, methods));
        faults.addAll(DemandCheck.faults(design, methods));
        return faults;
    }

    /** What an element takes from its neighbour downstream must be given there, or be the level of the case. */
    private static List<DesignFault> missingLinks(Design design, Map<String, MethodSheet> methods) {
        List<DesignFault> faults = new ArrayList<>();
        Design.@Nullable Element below = null;
        for (Design.Element element : design.elements()) {
            MethodSheet offers = below == null ? null : methods.get(below.tag());
            for (Item item :
                    java.util.Objects.requireNonNull(methods.get(element.tag())).items()) {
                if (item instanceof Item.Given given
                        && given.from() == Item.From.NEIGHBOUR
                        && !isOffered(given.role(), offers)) {
                    faults.add(missing(element, below, given.role()));
                }
            }
            below = element;
        }
        return faults;
    }

    /** At the end of the station the levels are those of the case. */
    private static boolean isOffered(String role, @Nullable MethodSheet below) {
        return below == null
                ? role.equals("water level") || role.equals("energy level")
                : below.gives().containsKey(role);
    }

    private static DesignFault missing(Design.Element element, Design.@Nullable Element below, String role) {
        String where = below == null
                ? "it is the last one downstream"
                : below.tag() + " (" + below.method() + ") below it gives none";
        return new DesignFault(
                new Design.Origin("Project", ""),
                element.tag() + " (" + element.method() + ") takes the " + role + " from the element downstream, and "
                        + where + "; put an element below it that gives one, or take " + element.tag() + " away",
                "link-missing");
    }
}
