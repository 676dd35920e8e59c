package nappe.job;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.function.Function;
import java.util.stream.Collectors;
import nappe.calculation.Cell;
import nappe.calculation.ElementSheet;
import nappe.formula.Value;
import nappe.method.Item;
import nappe.method.MethodSheet;
import nappe.method.Screen;
import nappe.solve.Evaluation;
import nappe.station.Design;
import nappe.station.DesignFault;
import nappe.station.SizeRerun;
import nappe.station.StationException;
import nappe.station.StationLayout;
import nappe.unit.Unit;
import org.jspecify.annotations.Nullable;

/** Evaluates the whole station anew for each word of a choice that is screened, and keeps which limits fail. */
final class SizeReruns {
    private static final String NOT_MET = "not met";

    private final Design design;
    private final Function<String, MethodSheet> methodOf;

    SizeReruns(Design design, Function<String, MethodSheet> methodOf) {
        this.design = design;
        this.methodOf = methodOf;
    }

    /** What the reruns found, by the tag of each element whose method has a screen statement, in the order of the words. */
    Map<String, List<SizeRerun>> run() {
        Map<String, List<SizeRerun>> found = new LinkedHashMap<>();
        for (Design.Element element : design.elements()) {
            MethodSheet method = methodOf.apply(element.method());
            Screen screen = method.screen();
            if (screen != null) {
                Item.Given choice = (Item.Given) Objects.requireNonNull(method.item(screen.choice()));
                found.put(element.tag(), reruns(element, choice));
            }
        }
        return found;
    }

    /**
     * The station is laid out once: its layout is the same for every word, and only what is typed differs. Evaluated anew
     * is what rests on the word and leads to a verdict.
     */
    private List<SizeRerun> reruns(Design.Element element, Item.Given choice) {
        StationLayout station;
        try {
            station = StationLayout.bare(
                    with(design, element, choice.symbol(), choice.words().get(0)), methodOf);
        } catch (StationException e) {
            String why = e.faults().stream().map(DesignFault::message).collect(Collectors.joining("; "));
            return choice.words().stream()
                    .map(word -> new SizeRerun(word, List.of(), false, why))
                    .toList();
        }
        Cell entry = station.entry(element.tag(), choice.symbol());
        Map<Cell, Value> first = Evaluation.of(station.allCells());
        List<Cell> moved = Evaluation.leadingTo(verdicts(station), Evaluation.restingOn(entry, station.allCells()));
        return choice.words().stream()
                .map(word -> {
                    Map<Cell, Value> anew = Evaluation.again(first, Map.of(entry, Value.word(word)), moved);
                    return found(word, station, cell -> anew.getOrDefault(cell, first.get(cell)));
                })
                .toList();
    }

    /** All that is read after a rerun. */
    private static List<Cell> verdicts(StationLayout station) {
        int judgedCases = station.columns().judged();
        return station.judgedLimits().stream()
                .flatMap(limit -> limit.first(judgedCases).verdicts().stream())
                .toList();
    }

    private static SizeRerun found(String word, StationLayout station, Function<Cell, @Nullable Value> valueOf) {
        int judgedCases = station.columns().judged();
        List<SizeRerun.Failure> notMet = new ArrayList<>();
        List<SizeRerun.Failure> noResult = new ArrayList<>();
        boolean lacks = false;
        for (ElementSheet.LimitResult limit : station.judgedLimits()) {
            ElementSheet.LimitResult judged = limit.first(judgedCases);
            List<String> verdicts = judged.verdicts().stream()
                    .map(cell -> words(Objects.requireNonNull(valueOf.apply(cell))))
                    .toList();
            if (verdicts.contains(NOT_MET)) {
                notMet.add(failure(limit, verdicts, NOT_MET));
            } else if (verdicts.contains(Value.NO_RESULT)) {
                noResult.add(failure(limit, verdicts, Value.NO_RESULT));
            }
            lacks |= verdicts.contains(Value.NOT_GIVEN);
        }
        notMet.addAll(noResult);
        return new SizeRerun(word, notMet, lacks, "");
    }

    private static SizeRerun.Failure failure(ElementSheet.LimitResult limit, List<String> verdicts, String verdict) {
        List<Integer> cases = new ArrayList<>();
        for (int c = 0; c < verdicts.size() && !limit.forAll(); c++) {
            if (verdicts.get(c).equals(verdict)) {
                cases.add(c + 1);
            }
        }
        return new SizeRerun.Failure(limit.tag(), limit.label(), verdict.equals(NOT_MET), List.copyOf(cases));
    }

    /** The design with another word typed for a choice of an element. */
    static Design with(Design design, Design.Element element, String choice, String word) {
        Map<String, Design.Typed> typed = new LinkedHashMap<>(element.typed());
        Design.Typed before = typed.get(choice);
        typed.put(
                choice,
                before == null
                        ? new Design.Typed(Value.word(word), Unit.one(), "", "", new Design.Origin("", ""))
                        : new Design.Typed(
                                Value.word(word), before.unit(), before.source(), before.standing(), before.origin()));
        Design.Element other = new Design.Element(element.tag(), element.title(), element.method(), typed);
        return design.withElements(
                design.elements().stream().map(e -> e == element ? other : e).toList());
    }

    private static String words(Value value) {
        return value instanceof Value.Word word ? word.text() : value instanceof Value.None none ? none.why() : "";
    }
}
