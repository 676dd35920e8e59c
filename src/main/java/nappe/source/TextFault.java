package nappe.source;

/**
 * A fault in a text (a method sheet, a table, check values, a figure), with its place. As text:
 *
 * <pre>
 * v-notch-weir.txt:15:23: k_h is not defined above (fault: symbol-unknown)
 *     line      h_e = h_1 + k_h ; m ; effective head ; WMM ch. 7
 *                           ^
 * </pre>
 *
 * @param line from 1; 0 where the fault is of the whole file
 * @param column from 1
 * @param code stable and searchable: "row-length"
 * @param text the line as written
 */
public record TextFault(String file, int line, int column, String message, String code, String text) {
    /** Of a line that is longer than a screen only the part around the fault is shown. */
    private static final int LONG = 140;

    /** A fault of a whole file or folder. */
    public static TextFault ofFile(String file, String message, String code) {
        return new TextFault(file, 0, 0, message, code, "");
    }

    @Override
    public String toString() {
        String said = message + " (fault: " + code + ")";
        if (line == 0) {
            return file + ": " + said;
        }
        int from = column > LONG ? column - LONG / 2 : 0;
        String near = text.substring(Math.min(from, text.length()), Math.min(text.length(), from + 2 * LONG));
        return file + ":" + line + ":" + column + ": " + said + "\n    " + near.replaceAll("\\p{Cntrl}", "?") + "\n    "
                + " ".repeat(Math.max(0, column - 1 - from)) + "^";
    }
}
