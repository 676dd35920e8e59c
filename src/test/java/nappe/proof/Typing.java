package nappe.proof;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.UnaryOperator;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.formula.Value;
import nappe.station.Design;
import nappe.station.Design.Element;
import nappe.station.Design.FlowCase;
import nappe.station.Design.Origin;
import nappe.station.Design.Typed;

/**
 * One entry typed anew: a number in the unit that stands beside the cell, a word, or null where the entry is left blank.
 */
sealed interface Typing {
    Object content();

    /** The cell of the issued workbook in which a checker types it. */
    Place place(Package issued);

    /** The design as if it had been typed in the input workbook. */
    Design in(Design design, Package issued);

    /** A flow of a case, counted from 0. */
    record Flow(int of, double number) implements Typing {
        @Override
        public Object content() {
            return number;
        }

        @Override
        public Place place(Package issued) {
            return entry(issued, "Cases", "Q", of).place();
        }

        @Override
        public Design in(Design design, Package issued) {
            return inCase(
                    design,
                    of,
                    one -> new FlowCase(
                            one.name(),
                            one.period(),
                            one.year(),
                            retyped(one.flow(), number),
                            one.units(),
                            one.tailwater(),
                            one.tailwaterReturn(),
                            one.typed()));
        }
    }

    /** A water level downstream in a case. */
    record Level(int of, double number) implements Typing {
        @Override
        public Object content() {
            return number;
        }

        @Override
        public Place place(Package issued) {
            return entry(issued, "Cases", "z", of).place();
        }

        @Override
        public Design in(Design design, Package issued) {
            return inCase(
                    design,
                    of,
                    one -> new FlowCase(
                            one.name(),
                            one.period(),
                            one.year(),
                            one.flow(),
                            one.units(),
                            retyped(one.tailwater(), number),
                            one.tailwaterReturn(),
                            one.typed()));
        }
    }

    /** The units in service in a case. */
    record Units(int of, double number) implements Typing {
        @Override
        public Object content() {
            return number;
        }

        @Override
        public Place place(Package issued) {
            return entry(issued, "Cases", "N", of).place();
        }

        @Override
        public Design in(Design design, Package issued) {
            return inCase(
                    design,
                    of,
                    one -> new FlowCase(
                            one.name(),
                            one.period(),
                            one.year(),
                            one.flow(),
                            retyped(one.units(), number),
                            one.tailwater(),
                            one.tailwaterReturn(),
                            one.typed()));
        }
    }

    /** A head read in a case. */
    record Head(int of, String tag, Object content) implements Typing {
        @Override
        public Place place(Package issued) {
            return entry(issued, "Cases", "h_g", of).place();
        }

        @Override
        public Design in(Design design, Package issued) {
            return inCase(design, of, one -> {
                Map<String, Typed> typed = new LinkedHashMap<>(one.typed());
                String key = tag + ".h_g";
                Cell cell = entry(issued, "Cases", "h_g", of);
                Typed before = typed.getOrDefault(
                        key,
                        new Typed(
                                new Value.None(Value.NOT_GIVEN), cell.unit(), "", "known", new Origin("Flows", "A1")));
                typed.put(key, retyped(before, content));
                return new FlowCase(
                        one.name(),
                        one.period(),
                        one.year(),
                        one.flow(),
                        one.units(),
                        one.tailwater(),
                        one.tailwaterReturn(),
                        typed);
            });
        }
    }

    /** An entry of an element. */
    record Entry(String tag, String symbol, Object content) implements Typing {
        @Override
        public Place place(Package issued) {
            int before = (int) issued.design().elements().stream()
                    .takeWhile(e -> !e.tag().equals(tag))
                    .filter(e -> e.typed().containsKey(symbol))
                    .count();
            return entry(issued, "Entries", symbol, before).place();
        }

        @Override
        public Design in(Design design, Package issued) {
            List<Element> elements = design.elements().stream()
                    .map(e -> e.tag().equals(tag) ? new Element(e.tag(), e.title(), e.method(), with(e.typed())) : e)
                    .toList();
            return new Design(
                    design.project(),
                    elements,
                    design.cases(),
                    design.demands(),
                    design.assumptions(),
                    design.references(),
                    design.requirements(),
                    design.revisions(),
                    design.combinations(),
                    design.levels());
        }

        private Map<String, Typed> with(Map<String, Typed> before) {
            Map<String, Typed> typed = new LinkedHashMap<>(before);
            typed.computeIfPresent(symbol, (key, one) -> retyped(one, content));
            return typed;
        }
    }

    /** The bound of a demand, counted from 0. */
    record Demand(int of, double number) implements Typing {
        @Override
        public Object content() {
            return number;
        }

        @Override
        public Place place(Package issued) {
            Design.Demand demand = issued.design().demands().get(of);
            return entry(issued, "Entries", demand.symbol(), 0).place();
        }

        @Override
        public Design in(Design design, Package issued) {
            List<Design.Demand> demands = new ArrayList<>(design.demands());
            Design.Demand d = demands.get(of);
            demands.set(
                    of,
                    new Design.Demand(
                            d.tag(),
                            d.symbol(),
                            d.atMost(),
                            retyped(d.value(), number),
                            d.description(),
                            d.citation(),
                            d.symbolAt(),
                            d.unitAt(),
                            d.inCase()));
            return new Design(
                    design.project(),
                    design.elements(),
                    design.cases(),
                    demands,
                    design.assumptions(),
                    design.references(),
                    design.requirements(),
                    design.revisions(),
                    design.combinations(),
                    design.levels());
        }
    }

    private static Cell entry(Package issued, String sheet, String symbol, int number) {
        return issued.results().cells().stream()
                .filter(c -> c.kind() == Cell.Kind.ENTRY
                        && c.place().sheet().equals(sheet)
                        && c.symbol().equals(symbol))
                .skip(number)
                .findFirst()
                .orElseThrow();
    }

    private static Typed retyped(Typed before, Object content) {
        Value value = content instanceof Number number
                ? Value.of(number.doubleValue())
                : content == null ? new Value.None(Value.NOT_GIVEN) : Value.word(content.toString());
        return new Typed(value, before.unit(), before.source(), before.standing(), before.origin());
    }

    private static Design inCase(Design design, int number, UnaryOperator<FlowCase> change) {
        List<FlowCase> cases = new ArrayList<>(design.cases());
        cases.set(number, change.apply(cases.get(number)));
        return new Design(
                design.project(),
                design.elements(),
                cases,
                design.demands(),
                design.assumptions(),
                design.references(),
                design.requirements(),
                design.revisions(),
                design.combinations(),
                design.levels());
    }
}
