package nappe.input;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import nappe.unit.WorkingSystem;

/** The fixed words of the input workbook, shared by the blank and the reader. */
final class Layout {
    static final String PROJECT = "Project";
    static final String FLOWS = "Flows";
    static final String LEVELS = "Tailwater curve";
    static final String COMBINATIONS = "Combinations";
    static final String DEMANDS = "Demands";
    static final String ASSUMPTIONS = "Assumptions";
    static final String REFERENCES = "References";
    static final String REQUIREMENTS = "Requirements";
    static final String REVISIONS = "Revisions";
    static final String LISTS = "Lists";

    /** A label of the sheet Project. */
    enum Label {
        PROJECT("Project", true, 120, "Name of the project, as on the drawings."),
        FIRM("Firm", false, 60, "Firm that makes the calculation."),
        CLIENT("Client", false, 60, "For whom it is made."),
        NUMBER("Calculation number", true, 60, "The firm's own number of this calculation."),
        SUBJECT("Subject", true, 120, "What is calculated, in one line."),
        REVISION("Revision", true, 10, "Letters, digits, points and hyphens: 0, A, P1."),
        DATE("Revision date", true, 10, "Year-month-day: 2030-01-31."),
        STATUS("Status", true, 20, "preliminary, for checking, issued or superseded."),
        SYSTEM("Unit system", true, 20, "The system in which the package is worked."),
        PAPER("Paper", true, 10, "letter or A4."),
        FLOW_UNIT("Flow reported in", true, 20, "Unit of flow beside the working one."),
        HEAD_UNIT("Head reported in", true, 20, "Unit of head beside the working one."),
        DATUM("Elevations refer to", true, 120, "Datum of every level and elevation."),
        WORKED_CASE("Case worked in full", false, 40, "Name of a case on the sheet Flows; the first where blank."),
        RELEASE("Purpose of release", false, 400, "Printed on the cover of anything not issued."),
        SEAL("Space for a seal on the cover", true, 3, "yes or no.");

        private final String text;
        private final boolean required;
        private final int longest;
        private final String note;

        Label(String text, boolean required, int longest, String note) {
            this.text = text;
            this.required = required;
            this.longest = longest;
            this.note = note;
        }

        String text() {
            return text;
        }

        boolean required() {
            return required;
        }

        /** The most characters that it may have. */
        int longest() {
            return longest;
        }

        String note() {
            return note;
        }
    }

    static final List<String> PROJECT_HEADS = List.of("Label", "Value", "Note");
    static final List<String> STATION_HEADS = List.of("Tag", "Method", "Title");
    static final List<String> ENTRY_HEADS =
            List.of("Symbol", "Description", "Value", "Unit", "Source or basis", "Standing");
    static final List<String> FLOW_HEADS = List.of(
            "Case",
            "Averaging period",
            "Design year",
            "Flow",
            "Flow unit",
            "Water level downstream",
            "Water level unit",
            "Return period of the level",
            "Source or basis",
            "Standing");

    static final String UNITS = "Units in service";

    /** Columns of the sheet Flows that may be missing, as in workbooks of before there were any. */
    static final List<String> FLOW_OPTIONAL = List.of(UNITS);

    static final List<String> LEVEL_HEADS =
            List.of("Flow", "Flow unit", "Water level", "Water level unit", "Source or basis", "Standing");
    static final List<String> COMBINATION_HEADS =
            List.of("Combination", "Flow of case", "Level of case", "Can coincide", "Basis");
    static final List<String> DEMAND_HEADS =
            List.of("Element", "Symbol", "At most or at least", "Value", "Unit", "What is demanded", "Citation");
    static final String IN_CASE = "In case";

    /** Columns of the sheet Demands that may be missing. */
    static final List<String> DEMAND_OPTIONAL = List.of(IN_CASE);

    static final List<String> ASSUMPTION_HEADS = List.of("Assumption", "Basis", "Owner", "Open or closed");
    static final List<String> REFERENCE_HEADS = List.of("Reference");
    static final List<String> REQUIREMENT_HEADS = List.of("Requirement", "Citation", "Answered where");
    static final List<String> REVISION_HEADS = List.of("Revision", "Date", "What changed");

    static final List<String> STATUSES = List.of("preliminary", "for checking", "issued", "superseded");
    static final List<String> STANDINGS = List.of("known", "assumed");
    static final List<String> SIDES = List.of("at most", "at least");
    static final List<String> OPEN = List.of("open", "closed");
    static final List<String> YES = List.of("yes", "no");
    static final List<String> PAPERS = List.of("letter", "A4");
    static final List<String> SYSTEMS =
            Arrays.stream(WorkingSystem.values()).map(WorkingSystem::title).toList();

    /** Behind the symbol of a case entry in the head of its unit column: {@code F1.h_g unit}. */
    static final String UNIT_OF = " unit";

    private static final Set<String> RESERVED = Set.of(
            "PROJECT",
            "FLOWS",
            "DEMANDS",
            "LISTS",
            "REVISION",
            "HISTORY",
            "COVER",
            "INDEX",
            "SUMMARY",
            "GEOMETRY",
            "SKETCH",
            "METHOD",
            "METHODS",
            "LIMITS",
            "WORKED",
            "CASES",
            "PROFILE",
            "PROFILES",
            "RATING",
            "RATINGS",
            "SCREEN",
            "SIZES",
            "CARD",
            "ASBUILT",
            "SOFTWARE",
            "CHECKER",
            "CHECK",
            "CHECKS",
            "TRIAL",
            "TRIALS",
            "TABLE",
            "TABLES",
            "CONSTANT",
            "UNITS",
            "LEVELS",
            "YEARS",
            "STATION",
            "ENTRIES",
            "REGISTER",
            "STANDING",
            "GLOSSARY",
            "FAULTS",
            "TRUE",
            "FALSE");

    private Layout() {}

    /** Whether the tag is the name of a sheet, in the input workbook or in the package. */
    static boolean isReserved(String tag) {
        return RESERVED.contains(tag.toUpperCase(Locale.ROOT));
    }
}
