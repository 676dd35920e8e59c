package nappe.input;

import java.util.BitSet;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.input.RawCell.Format;
import nappe.input.RawCell.Kind;
import org.jspecify.annotations.Nullable;

/** Reads one sheet part; what is damaged in it becomes faults at its cells. */
final class SheetPart {
    static final int MOST_CELLS = 200_000;
    static final int MOST_ROWS = 100_000;
    private static final int MOST_MERGES = 2_000;
    private static final int LONGEST_NUMBER = 64;
    private static final int ROWS = 1_048_576;
    private static final int COLUMNS = 16_384;
    private static final Pattern ADDRESS = Pattern.compile("([A-Z]{1,3})([1-9][0-9]{0,6})");
    private static final Pattern RANGE = Pattern.compile(ADDRESS + "(?::" + ADDRESS + ")?");
    private static final Pattern NUMBER = Pattern.compile("[+-]?(\\d+(\\.\\d*)?|\\.\\d+)([eE][+-]?\\d{1,4})?");
    private static final Pattern ESCAPED = Pattern.compile("_x([0-9A-Fa-f]{4})_");

    private final Xml xml;
    private final RawSheet sheet;
    private final List<String> sharedTexts;
    private final NumberFormats formats;
    private final Faults faults;
    private int filled;
    private final BitSet seen = new BitSet();
    private int rows;
    private int row = -1;
    private int column = -1;

    SheetPart(Xml xml, RawSheet sheet, List<String> sharedTexts, NumberFormats formats, Faults faults) {
        this.xml = xml;
        this.sheet = sheet;
        this.sharedTexts = sharedTexts;
        this.formats = formats;
        this.faults = faults;
    }

    /**
     * Reads to the end.
     *
     * @param filledBefore filled cells of the sheets before
     * @return the same with this sheet
     */
    int read(int filledBefore) {
        filled = filledBefore;
        boolean inData = false;
        while (xml.next()) {
            if (xml.starts("sheetData") || xml.ends("sheetData")) {
                inData = xml.isStart();
            } else if (inData && xml.starts("row")) {
                startRow();
            } else if (inData && xml.starts("c")) {
                cell();
            } else if (xml.starts("col") && xml.isTrue("hidden")) {
                int first = index(xml.attribute("min"), COLUMNS);
                int last = index(xml.attribute("max"), COLUMNS);
                if (first >= 0 && last >= first) {
                    sheet.hiddenColumns.set(first, last + 1);
                }
            } else if (xml.starts("mergeCell")) {
                merge(xml.attribute("ref", ""));
            }
        }
        return filled;
    }

    private void startRow() {
        String typed = xml.attribute("r");
        row = typed == null ? row + 1 : index(typed, ROWS + 1);
        column = -1;
        if (row < 0 || row >= ROWS) {
            faults.add(
                    sheet.name(),
                    null,
                    "wild-address",
                    "the file is damaged: it has a row numbered " + Shown.quoted(String.valueOf(typed)));
            row = -1;
        } else {
            count();
        }
    }

    private void count() {
        if (++rows > MOST_ROWS) {
            throw faults.refuse(
                    "too-many-rows",
                    "the sheet " + sheet.name() + " has more than " + MOST_ROWS
                            + " rows, filled or formatted, the most that an input workbook may have; delete the rows below"
                            + " the entries and save it again");
        }
        if (seen.get(row)) {
            faults.add(
                    sheet.name(),
                    RawCell.address(row, 0),
                    "row-twice",
                    "the file is damaged: this row appears twice; get it again from where it came from");
        }
        seen.set(row);
        if (xml.isTrue("hidden")) {
            sheet.hiddenRows.set(row);
        }
    }

    private void cell() {
        String address = xml.attribute("r");
        String type = xml.attribute("t", "n");
        int style = index(xml.attribute("s", "0"), Integer.MAX_VALUE - 1) + 1;
        boolean placed = place(address);
        @Nullable String value = null;
        boolean formula = false;
        StringBuilder inline = new StringBuilder();
        while (xml.next() && !xml.ends("c")) {
            if (xml.starts("v")) {
                value = xml.text();
            } else if (xml.starts("f")) {
                formula = true;
                xml.text();
            } else if (xml.starts("rPh")) {
                xml.text();
            } else if (xml.starts("t")) {
                xml.appendText(inline);
            }
        }
        if (!placed) {
            return;
        }
        boolean known = formats.has(style);
        if (!known) {
            damaged("style-unknown", "a style that does not exist (number " + style + ")");
        }
        Format format = known ? formats.style(style) : Format.PLAIN;
        if (type.equals("inlineStr")) {
            keep(Kind.TEXT, unescaped(inline.toString()), formula, format);
        } else if (value != null) {
            keep(type, value.strip(), value, formula, format);
        } else if (formula) {
            keep(type.equals("str") ? Kind.TEXT : Kind.NO_VALUE, "", true, format);
        }
    }

    private boolean place(@Nullable String address) {
        if (row < 0) {
            return false;
        }
        if (address == null) {
            column++;
        } else {
            Matcher matcher = ADDRESS.matcher(address);
            int there = matcher.matches() ? columnOf(matcher.group(1)) : COLUMNS;
            if (there >= COLUMNS || Integer.parseInt(matcher.group(2)) != row + 1) {
                faults.add(
                        sheet.name(),
                        null,
                        "wild-address",
                        "the file is damaged: row " + (row + 1) + " has a cell with the address "
                                + Shown.quoted(address));
                return false;
            }
            column = there;
        }
        return column < COLUMNS;
    }

    private void keep(String type, String bare, String value, boolean formula, Format format) {
        switch (type) {
            case "n" -> number(bare, formula, format);
            case "s" -> shared(bare, formula, format);
            case "str" -> keep(Kind.TEXT, unescaped(value), formula, format);
            case "b" -> keep(Kind.BOOLEAN, bare.equals("1") || bare.equals("true") ? "TRUE" : "FALSE", formula, format);
            case "e" -> keep(Kind.ERROR, bare, formula, format);
            case "d" -> keep(Kind.TEXT, bare, formula, Format.DATE);
            default -> damaged("cell-kind", "a cell of the unknown kind " + Shown.quoted(type));
        }
    }

    private void number(String bare, boolean formula, Format format) {
        if (bare.isEmpty()) {
            if (formula) {
                keep(Kind.NO_VALUE, "", true, format);
            }
        } else if (bare.length() > LONGEST_NUMBER
                || !NUMBER.matcher(bare).matches()
                || !Double.isFinite(Double.parseDouble(bare))) {
            damaged("damaged-number", "a number cell holding " + Shown.quoted(bare) + "; type the number again");
        } else {
            keep(Kind.NUMBER, bare, formula, format);
        }
    }

    private void shared(String bare, boolean formula, Format format) {
        int at = index(bare, Integer.MAX_VALUE - 1) + 1;
        if (at < 0 || at >= sharedTexts.size()) {
            damaged("text-unknown", "a text that does not exist (number " + bare + "); type the text again");
        } else {
            keep(Kind.TEXT, sharedTexts.get(at), formula, format);
        }
    }

    private void keep(Kind kind, String text, boolean formula, Format format) {
        if (++filled > MOST_CELLS) {
            throw faults.refuse(
                    "too-many-cells",
                    "the workbook has more than " + MOST_CELLS
                            + " filled cells, the most that an input workbook may have");
        }
        if (!sheet.add(new RawCell(row, column, kind, text, formula, format))) {
            faults.add(
                    sheet.name(),
                    RawCell.address(row, column),
                    "cell-twice",
                    "the file is damaged: this cell appears twice");
        }
    }

    private void damaged(String code, String what) {
        faults.add(sheet.name(), RawCell.address(row, column), code, "the file is damaged: it has " + what);
    }

    private void merge(String range) {
        Matcher matcher = RANGE.matcher(range);
        if (!matcher.matches() || sheet.merges.size() >= MOST_MERGES) {
            throw faults.refuse(
                    "damaged",
                    "the file is damaged: sheet " + sheet.name() + " merges the cells " + Shown.quoted(range));
        }
        if (matcher.group(3) != null) {
            sheet.merges.add(new RawSheet.Merge(
                    Integer.parseInt(matcher.group(2)) - 1,
                    columnOf(matcher.group(1)),
                    Integer.parseInt(matcher.group(4)) - 1,
                    columnOf(matcher.group(3))));
        }
    }

    /** Decodes {@code _x000D_} and its kind. */
    static String unescaped(String text) {
        return text.contains("_x")
                ? ESCAPED.matcher(text)
                        .replaceAll(m -> Matcher.quoteReplacement("" + (char) Integer.parseInt(m.group(1), 16)))
                : text;
    }

    private static int columnOf(String letters) {
        int column = 0;
        for (int i = 0; i < letters.length(); i++) {
            column = column * 26 + letters.charAt(i) - 'A' + 1;
        }
        return column - 1;
    }

    /** A count from 1 as an index from 0, at most the limit; below -1 where the text is no such count. */
    private static int index(@Nullable String text, int limit) {
        if (text == null || text.isEmpty() || text.length() > 9) {
            return -2;
        }
        int count = 0;
        for (int i = 0; i < text.length(); i++) {
            int digit = text.charAt(i) - '0';
            if (digit < 0 || digit > 9) {
                return -2;
            }
            count = count * 10 + digit;
        }
        return Math.min(count, limit) - 1;
    }
}
