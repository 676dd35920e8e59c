package nappe.station;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Stream;
import nappe.calculation.Cell;
import nappe.calculation.ScreenGrid;
import nappe.calculation.SheetDraft;
import nappe.formula.Value;
import nappe.input.InputReader;
import nappe.method.Item;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.method.Screen;
import nappe.solve.Evaluation;
import nappe.source.BuiltInLibrary;
import nappe.unit.WorkingSystem;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** A closure equals a rerun, to the last bit: each size of the grid is what the calculation gives with that size. */
class ScreenGridTest {
    private static final MethodLibrary METHODS = new MethodLibrary(new BuiltInLibrary());

    /** One design carried through with its grids. */
    private record Laid(StationLayout station, Map<String, List<ScreenGrid.Variant>> grids, Map<Cell, Value> values) {
        static Laid of(Design design, Map<String, MethodSheet> methods) {
            StationLayout station = StationLayout.bare(design, methods::get);
            Map<String, List<ScreenGrid.Variant>> grids = new LinkedHashMap<>();
            for (Design.Element element : design.elements()) {
                MethodSheet method = methods.get(element.method());
                Screen screen = method.screen();
                if (screen != null) {
                    Item.Given choice = (Item.Given) Objects.requireNonNull(method.item(screen.choice()));
                    int judged = station.columns().judged();
                    grids.put(
                            element.tag(),
                            new ScreenGrid(station.items(), method, screen)
                                    .lay(
                                            Sources.keys(station.scope(element.tag()), choice.table()),
                                            station.scope(element.tag()),
                                            station.cases(element.tag()).subList(0, judged),
                                            station.columns().judgedNames(),
                                            new SheetDraft("Grid", "")));
                }
            }
            return new Laid(station, grids, Evaluation.of(station.allCells()));
        }
    }

    private static final Map<String, Map<String, Laid>> RERUNS = new LinkedHashMap<>();

    private static Design headworks(WorkingSystem system) {
        return in(InputReader.read(Path.of("sample-inputs", "headworks.xlsx"), METHODS), system);
    }

    /** The whole calculation laid out and evaluated anew with each size; once for each station and system. */
    private static Map<String, Laid> reruns(Design design) {
        String station = design.project().number() + " " + design.project().system();
        return RERUNS.computeIfAbsent(station, key -> {
            Map<String, Laid> reruns = new LinkedHashMap<>();
            for (String size : METHODS.declared("parshall-flume").get(0).words()) {
                StationLayout rerun = StationLayout.bare(sized(design, size), methods(design)::get);
                reruns.put(size, new Laid(rerun, Map.of(), Evaluation.of(rerun.allCells())));
            }
            return reruns;
        });
    }

    static Stream<Design> designs() {
        return Stream.of(
                headworks(WorkingSystem.US),
                headworks(WorkingSystem.SI),
                sized(headworks(WorkingSystem.US), "0.6 m"),
                sized(headworks(WorkingSystem.SI), "50 ft"),
                InputReader.read(Path.of("sample-inputs", "inlet-works.xlsx"), METHODS));
    }

    /** Typing another size into the cells of one layout is the same as laying out anew with it: in every cell. */
    @Test
    void theLayoutIsTheSameForEverySize() {
        StationLayout one = StationLayout.bare(
                sized(headworks(WorkingSystem.US), "1 in"), methods(headworks(WorkingSystem.US))::get);
        Cell entry = one.entry("F1", "size");
        reruns(headworks(WorkingSystem.US)).forEach((size, anew) -> {
            Map<Cell, Value> typed = Evaluation.of(one.allCells(), Map.of(entry, Value.word(size)));
            List<Cell> there = anew.station().allCells();
            assertThat(there).hasSameSizeAs(one.allCells());
            List<Cell> here = one.allCells();
            for (int i = 0; i < there.size(); i++) {
                if (!here.get(i).place().equals(there.get(i).place())
                        || !typed.get(here.get(i)).equals(anew.values().get(there.get(i)))) {
                    assertThat(here.get(i) + ": " + typed.get(here.get(i)))
                            .as(size)
                            .isEqualTo(there.get(i) + ": " + anew.values().get(there.get(i)));
                }
            }
        });
    }

    @ParameterizedTest
    @MethodSource("designs")
    void everySizeIsARerunWithThatSize(Design design) {
        Map<String, MethodSheet> methods = methods(design);
        Laid laid = Laid.of(design, methods);
        assertThat(apart(design, methods, laid)).isEmpty();
    }

    @ParameterizedTest
    @MethodSource("designs")
    void theChosenSizeIsTheCalculationItself(Design design) {
        Map<String, MethodSheet> methods = methods(design);
        Laid laid = Laid.of(design, methods);
        laid.grids().forEach((tag, variants) -> {
            String size = word(design.element(tag).typed().get("size").value());
            ScreenGrid.Variant chosen = variants.stream()
                    .filter(v -> word(laid.values().get(v.word())).equals(size))
                    .findFirst()
                    .orElseThrow();
            assertThat(apart(chosen, laid, laid, tag, methods.get("parshall-flume")))
                    .isEmpty();
        });
    }

    /** Whatever line is left out of the closure, the comparison with the reruns finds it. */
    @Test
    void aLineThatTheClosureForgetsIsFound() {
        Design design = designs().findFirst().orElseThrow();
        MethodSheet method = METHODS.sheet("parshall-flume");
        List<Item> members = Objects.requireNonNull(method.screen()).members();
        assertThat(members).hasSizeGreaterThan(15);
        for (Item forgotten : members) {
            List<Item> fewer =
                    members.stream().filter(item -> item != forgotten).toList();
            Screen screen = new Screen("size", method.screen().targets(), fewer);
            MethodSheet broken = new MethodSheet(
                    method.name(),
                    method.house(),
                    method.title(),
                    method.about(),
                    method.cautions(),
                    method.sources(),
                    method.items(),
                    method.limits(),
                    method.geometry(),
                    method.ratings(),
                    screen,
                    method.gives(),
                    method.tables(),
                    method.reach(),
                    method.text());
            Map<String, MethodSheet> methods = methods(design);
            methods.put("parshall-flume", broken);
            assertThat(apart(design, methods, Laid.of(design, methods)))
                    .as("without " + forgotten.outputs())
                    .isNotEmpty();
        }
    }

    private static List<String> apart(Design design, Map<String, MethodSheet> methods, Laid laid) {
        List<String> faults = new ArrayList<>();
        laid.grids().forEach((tag, variants) -> {
            MethodSheet method =
                    methods.get(Objects.requireNonNull(design.element(tag)).method());
            assertThat(variants.stream().map(v -> word(laid.values().get(v.word()))))
                    .isEqualTo(((Item.Given) Objects.requireNonNull(method.item("size"))).words());
            for (ScreenGrid.Variant variant : variants) {
                Laid anew = reruns(design).get(word(laid.values().get(variant.word())));
                faults.addAll(apart(variant, laid, anew, tag, method));
            }
        });
        return faults;
    }

    /** Where the lines of a variant and those of a calculation part. */
    private static List<String> apart(
            ScreenGrid.Variant variant, Laid laid, Laid anew, String tag, MethodSheet method) {
        List<String> faults = new ArrayList<>();
        int compared = 0;
        List<String> symbols = new ArrayList<>(method.screen().targets());
        method.screen().members().forEach(item -> symbols.addAll(item.outputs()));
        for (String symbol : symbols) {
            boolean perCase = method.perCase(symbol);
            for (int c = 0; c < (perCase ? variant.cases().size() : 1); c++) {
                Cell here = (perCase ? variant.cases().get(c) : variant.scope()).cell(symbol);
                Cell there = (perCase
                                ? anew.station().cases(tag).get(c)
                                : anew.station().scope(tag))
                        .cell(symbol);
                compared++;
                if (!laid.values().get(here).equals(anew.values().get(there))) {
                    faults.add(laid.values().get(variant.word()) + " " + symbol + " in case " + c + ": "
                            + laid.values().get(here) + " in the grid, "
                            + anew.values().get(there) + " in the rerun");
                }
            }
        }
        assertThat(compared).isGreaterThan(20);
        return faults;
    }

    private static Map<String, MethodSheet> methods(Design design) {
        Map<String, MethodSheet> methods = new LinkedHashMap<>();
        design.elements().forEach(e -> methods.put(e.method(), METHODS.sheet(e.method())));
        return methods;
    }

    private static String word(Value value) {
        return ((Value.Word) value).text();
    }

    private static Design sized(Design design, String size) {
        return design.withElements(design.elements().stream()
                .map(e -> {
                    Map<String, Design.Typed> typed = new LinkedHashMap<>(e.typed());
                    typed.computeIfPresent(
                            "size",
                            (key, one) -> new Design.Typed(
                                    Value.word(size), one.unit(), one.source(), one.standing(), one.origin()));
                    return new Design.Element(e.tag(), e.title(), e.method(), typed);
                })
                .toList());
    }

    private static Design in(Design d, WorkingSystem system) {
        Design.Project p = d.project();
        return new Design(
                new Design.Project(
                        p.project(),
                        p.firm(),
                        p.client(),
                        p.number(),
                        p.subject(),
                        p.revision(),
                        p.date(),
                        p.status(),
                        system,
                        p.letterPaper(),
                        p.flowUnit(),
                        p.headUnit(),
                        p.datum(),
                        p.workedCase(),
                        p.release(),
                        p.sealSpace()),
                d.elements(),
                d.cases(),
                d.demands(),
                d.assumptions(),
                d.references(),
                d.requirements(),
                d.revisions(),
                d.combinations(),
                d.levels());
    }
}
