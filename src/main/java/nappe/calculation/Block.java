package nappe.calculation;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** A piece of a sheet. Each knows the workbook row (from 0) on which it starts. */
public sealed interface Block {
    int row();

    /** A heading within a sheet; one workbook row. */
    record Heading(int row, String text) implements Block {}

    /** A paragraph; one workbook row, over the width of the sheet. A caution is printed with more weight. */
    record Note(int row, String text, boolean caution) implements Block {}

    /**
     * A table: one head row, then its rows. Column i of the table is column i of the workbook sheet.
     *
     * @param title printed above it, on the workbook row before the head; empty for none
     * @param keys the PDF prints only the rows that begin with what one of these cells holds; all rows where there is none
     */
    record Table(int row, String title, List<Column> columns, List<Row> rows, List<Cell> keys) implements Block {
        /** A table that is printed whole. */
        public Table(int row, String title, List<Column> columns, List<Row> rows) {
            this(row, title, columns, rows, List.of());
        }
    }

    /**
     * Where the trial rows of a workbook stand: laid out as a table in the workbook only; in the PDF one line says so.
     */
    record WorkbookOnly(Table table) implements Block {
        @Override
        public int row() {
            return table.row();
        }
    }

    /**
     * A chart of curves and points, drawn by the workbook from its cells; it stands in the workbook only.
     *
     * @param rows workbook rows that it takes
     * @param across what is measured along the foot, with its unit
     * @param up what is measured along the side, with its unit
     */
    record Chart(int row, int rows, String title, String across, String up, List<Series> series) implements Block {}

    /**
     * What a chart draws: a line through its places, or a mark at each.
     *
     * @param across runs of equal length with the other
     */
    record Series(String name, boolean isLine, Run across, Run up) {}

    /**
     * A figure: drawn in the PDF; in the workbook one row that says where it is.
     *
     * @param key by which the results know it
     */
    record Figure(int row, String title, String key) implements Block {
        /** What the workbook says in its place. */
        public String words() {
            return "Figure: " + title + ". It is drawn in the PDF, on the sheet of the same number.";
        }
    }

    /**
     * The calculation of one element. In the workbook one table: code, description, symbol, equation, unit, source,
     * value for all cases, then one column per case. In the PDF two: one case worked in full with equations and
     * numbers, then every case.
     *
     * @param caseNames heads of the case columns
     * @param printed how many of them, from the left, are printed in the PDF; the others stand in the workbook only
     * @param workedCase index of the case worked in full
     */
    record Lines(int row, List<String> caseNames, int printed, int workedCase, List<Line> lines) implements Block {
        /** Lines whose cases are all printed. */
        public Lines(int row, List<String> caseNames, int workedCase, List<Line> lines) {
            this(row, caseNames, caseNames.size(), workedCase, lines);
        }
    }

    /**
     * One line of a calculation.
     *
     * @param kind how it is presented
     * @param code its code on the sheet ("F1.007")
     * @param equation the formula as plain text, or what is printed in its place ("from sheet Entries")
     * @param source citation in words; empty where none is owed
     * @param forAll the cell that serves all cases, or null
     * @param perCase one cell per case, or empty
     */
    record Line(
            LineKind kind,
            String code,
            String description,
            String symbol,
            String equation,
            String unit,
            String source,
            @Nullable Cell forAll,
            List<Cell> perCase) {}

    /** How a line is presented: a quantity, a heading between lines, or a part of a limit. */
    enum LineKind {
        QUANTITY,
        /** Leads to a result elsewhere; it is worked in full for one case, and stands in the workbook for every case. */
        STEP,
        HEADING,
        LIMIT_VERDICT,
        LIMIT_MARGIN
    }

    /**
     * A column of a table.
     *
     * @param head its head, with the unit in brackets
     * @param width in characters of the workbook's type
     */
    record Column(String head, int width, Align align) {}

    enum Align {
        LEFT,
        CENTRE,
        RIGHT
    }

    record Row(List<Item> items) {}

    /** What stands in one place of a table. */
    sealed interface Item {}

    record Text(String text) implements Item {}

    /** A symbol, set with its subscript. */
    record Symbol(String symbol) implements Item {}

    /** The content of a cell: typed, or live. */
    record Content(Cell cell) implements Item {}

    /** The formula of a cell as text, in symbols. */
    record Equation(Cell cell) implements Item {}

    /** The workbook address of a cell; in the workbook a link to it. */
    record Address(Cell cell) implements Item {}

    /** A text that leads to a cell. */
    record Jump(String text, Cell to) implements Item {}

    /** A sheet, by its number and title; a link to it. */
    record SheetLink(int number, String sheetName, String title) implements Item {}
}
