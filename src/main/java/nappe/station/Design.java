package nappe.station;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import nappe.formula.Value;
import nappe.unit.Unit;
import nappe.unit.WorkingSystem;
import org.jspecify.annotations.Nullable;

/**
 * Everything typed in one input workbook.
 *
 * @param elements from the downstream end up
 */
public record Design(
        Project project,
        List<Element> elements,
        List<FlowCase> cases,
        List<Demand> demands,
        List<Assumption> assumptions,
        List<String> references,
        List<Requirement> requirements,
        List<RevisionNote> revisions,
        List<Combination> combinations,
        List<LevelPair> levels) {

    /** A design without combinations and without a table of levels. */
    public Design(
            Project project,
            List<Element> elements,
            List<FlowCase> cases,
            List<Demand> demands,
            List<Assumption> assumptions,
            List<String> references,
            List<Requirement> requirements,
            List<RevisionNote> revisions) {
        this(project, elements, cases, demands, assumptions, references, requirements, revisions, List.of(), List.of());
    }

    /** Where something was typed: sheet and cell of the input workbook. */
    public record Origin(String sheet, String cell) {}

    /**
     * A typed quantity or word.
     *
     * @param value a number in the unit as typed, a word, or {@link Value.None} where it was left blank
     * @param source source or basis, as typed
     * @param standing "known" or "assumed"
     */
    public record Typed(Value value, Unit unit, String source, String standing, Origin origin) {}

    /**
     * @param number calculation number
     * @param status "preliminary", "for checking", "issued" or "superseded"
     * @param flowUnit reporting unit of flow beside the working one
     * @param headUnit reporting unit of head beside the working one
     * @param datum what elevations refer to
     * @param workedCase name of the case worked in full; empty for the first
     * @param release statement on the purpose of release of anything not issued
     * @param sealSpace whether the cover keeps a clear space for a seal
     */
    public record Project(
            String project,
            String firm,
            String client,
            String number,
            String subject,
            String revision,
            LocalDate date,
            String status,
            WorkingSystem system,
            boolean letterPaper,
            Unit flowUnit,
            Unit headUnit,
            String datum,
            String workedCase,
            String release,
            boolean sealSpace) {}

    /** A device with its tag ({@code F1}), the name of its method and what was typed for each symbol. */
    public record Element(String tag, String title, String method, Map<String, Typed> typed) {}

    /**
     * One flow with one tailwater.
     *
     * @param units how many like devices are in service side by side; one where it was left blank
     * @param tailwater water level downstream; left blank it comes from the table of levels, where there is one
     * @param typed what an element asks for in each case, by tag and symbol ({@code F1.h_g})
     */
    public record FlowCase(
            String name,
            String period,
            String year,
            Typed flow,
            Typed units,
            Typed tailwater,
            String tailwaterReturn,
            Map<String, Typed> typed) {
        /** A case with one unit in service. */
        public FlowCase(
                String name,
                String period,
                String year,
                Typed flow,
                Typed tailwater,
                String tailwaterReturn,
                Map<String, Typed> typed) {
            this(
                    name,
                    period,
                    year,
                    flow,
                    new Typed(new Value.None(Value.NOT_GIVEN), Unit.one(), "", "", flow.origin()),
                    tailwater,
                    tailwaterReturn,
                    typed);
        }
    }

    /**
     * The flow of one case with the water level downstream of another, besides the cases as typed.
     *
     * @param flowOf name of the case whose flow it takes, with its units in service
     * @param levelOf name of the case whose level it takes
     * @param canCoincide whether the engineer holds that both can occur together; if not it is shown and not judged
     * @param basis why it can or cannot
     */
    public record Combination(
            String name, String flowOf, String levelOf, boolean canCoincide, String basis, Origin origin) {}

    /** A pair of the table of levels downstream: at this flow of all the station the water stands so high. */
    public record LevelPair(Typed flow, Typed level) {}

    /**
     * A limit demanded by an authority or owner: a result of an element at most or at least a value, with citation and
     * cells.
     *
     * @param inCase name of the case or combination in which alone it is judged; empty for every one
     */
    public record Demand(
            String tag,
            String symbol,
            boolean atMost,
            Typed value,
            String description,
            String citation,
            Origin symbolAt,
            Origin unitAt,
            String inCase) {
        /** What is demanded, with the case in which alone it is judged. */
        public String label() {
            return inCase.isEmpty() ? description : description + " (in case " + inCase + ")";
        }

        /** A demand in every case, whose parts all stand where its value stands. */
        public Demand(String tag, String symbol, boolean atMost, Typed value, String description, String citation) {
            this(tag, symbol, atMost, value, description, citation, value.origin(), value.origin(), "");
        }
    }

    /** @param open true until confirmed */
    public record Assumption(String text, String basis, String owner, boolean open) {}

    /** @param answer where it is answered: a title of a sheet, or words */
    public record Requirement(String text, String citation, String answer) {}

    public record RevisionNote(String revision, String date, String what) {}

    /** The same with other elements in their places. */
    public Design withElements(List<Element> others) {
        return new Design(
                project,
                others,
                cases,
                demands,
                assumptions,
                references,
                requirements,
                revisions,
                combinations,
                levels);
    }

    /** The element with the tag, or null. */
    public @Nullable Element element(String tag) {
        return elements.stream()
                .filter(e -> e.tag().equalsIgnoreCase(tag))
                .findFirst()
                .orElse(null);
    }
}
