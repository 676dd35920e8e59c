package nappe.method;

/**
 * A fault in a method sheet, with its place. As text:
 *
 * <pre>
 * v-notch-weir.txt:15:23: k_h is not defined above (fault: symbol-unknown)
 *     line      h_e = h_1 + k_h ; m ; effective head ; WMM ch. 7
 *                           ^
 * </pre>
 *
 * @param line from 1
 * @param column from 1
 * @param text the line as written
 */
public record MethodFault(String file, int line, int column, String message, String code, String text) {
    @Override
    public String toString() {
        return file + ":" + line + ":" + column + ": " + message + " (fault: " + code + ")\n    " + text + "\n    "
                + " ".repeat(Math.max(0, column - 1)) + "^";
    }
}
