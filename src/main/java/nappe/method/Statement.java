package nappe.method;

import java.util.ArrayList;
import java.util.List;
import nappe.source.TextFault;

/**
 * One statement of a method sheet: a word, then fields separated by semicolons. Indented lines continue it; {@code #}
 * starts a comment.
 */
public final class Statement {
    /** A field with the place of its first character in the statement's text. */
    public record Field(String text, int offset) {}

    private final String file;
    private final List<String> sheet;
    private final String text;
    private final int[] lines;
    private final int[] columns;
    private final String word;
    private final List<Field> fields;

    private Statement(String file, List<String> sheet, String text, int[] lines, int[] columns) {
        this.file = file;
        this.sheet = sheet;
        this.text = text;
        this.lines = lines;
        this.columns = columns;
        int blank = text.indexOf(' ');
        this.word = blank < 0 ? text : text.substring(0, blank);
        this.fields = split(blank < 0 ? text.length() : blank);
    }

    /** The statements of a text, in order. */
    public static List<Statement> of(String file, String text) {
        List<String> sheet = text.lines().toList();
        List<Statement> statements = new ArrayList<>();
        StringBuilder joined = new StringBuilder();
        List<int[]> places = new ArrayList<>();
        for (int i = 0; i <= sheet.size(); i++) {
            String line = i == sheet.size() ? "" : withoutComment(sheet.get(i));
            boolean starts = i == sheet.size() || !line.isBlank() && !Character.isWhitespace(line.charAt(0));
            if (starts && !joined.isEmpty()) {
                statements.add(new Statement(
                        file,
                        sheet,
                        joined.toString(),
                        places.stream().mapToInt(p -> p[0]).toArray(),
                        places.stream().mapToInt(p -> p[1]).toArray()));
                joined.setLength(0);
                places.clear();
            }
            if (!line.isBlank()) {
                if (!joined.isEmpty()) {
                    joined.append(' ');
                    places.add(new int[] {i, 0});
                }
                for (int c = 0; c < line.length(); c++) {
                    joined.append(line.charAt(c) == '\t' ? ' ' : line.charAt(c));
                    places.add(new int[] {i, c});
                }
            }
        }
        return statements;
    }

    private static String withoutComment(String line) {
        boolean quoted = false;
        for (int i = 0; i < line.length(); i++) {
            quoted ^= line.charAt(i) == '"';
            if (line.charAt(i) == '#' && !quoted) {
                return line.substring(0, i).stripTrailing();
            }
        }
        return line.stripTrailing();
    }

    private List<Field> split(int from) {
        List<Field> result = new ArrayList<>();
        boolean quoted = false;
        int start = from;
        for (int i = from; i <= text.length(); i++) {
            if (i == text.length() || text.charAt(i) == ';' && !quoted) {
                String raw = text.substring(start, i);
                int lead = raw.length() - raw.stripLeading().length();
                result.add(new Field(raw.strip(), start + lead));
                start = i + 1;
            } else if (text.charAt(i) == '"') {
                quoted = !quoted;
            }
        }
        return result;
    }

    public String word() {
        return word;
    }

    public int fieldCount() {
        return fields.size();
    }

    /** Field i, or an empty one where the statement is shorter. */
    public Field field(int i) {
        return i < fields.size() ? fields.get(i) : new Field("", Math.max(0, text.length() - 1));
    }

    /** Everything after the word, semicolons included, as one paragraph. */
    public String rest() {
        return text.substring(Math.min(text.length(), word.length())).strip().replaceAll("\\s+", " ");
    }

    /** A fault at an offset of the statement's text. */
    public TextFault fault(int offset, String message, String code) {
        int i = Math.max(0, Math.min(offset, lines.length - 1));
        return new TextFault(file, lines[i] + 1, columns[i] + 1, message, code, sheet.get(lines[i]));
    }
}
