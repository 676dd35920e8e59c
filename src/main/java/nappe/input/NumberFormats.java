package nappe.input;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import nappe.input.RawCell.Format;

/** How cells show their numbers, by style number. */
final class NumberFormats {
    private static final int LONGEST_CODE = 255;

    private final Map<String, String> codes = new HashMap<>();
    private final List<Format> styles = new ArrayList<>();

    /** Without a style part: one plain style. */
    NumberFormats() {
        styles.add(Format.PLAIN);
    }

    static NumberFormats read(Parts parts, String part) {
        NumberFormats formats = new NumberFormats();
        formats.styles.clear();
        try (Xml xml = Xml.openShort(parts, part)) {
            boolean inCells = false;
            while (xml.next()) {
                if (xml.starts("numFmt")) {
                    formats.codes.put(xml.attribute("numFmtId", ""), xml.attribute("formatCode", ""));
                } else if (xml.starts("cellXfs") || xml.ends("cellXfs")) {
                    inCells = xml.isStart();
                } else if (inCells && xml.starts("xf")) {
                    formats.styles.add(formats.of(xml.attribute("numFmtId", "0")));
                }
            }
        }
        return formats;
    }

    boolean has(int style) {
        return style >= 0 && style < styles.size();
    }

    Format style(int style) {
        return styles.get(style);
    }

    private Format of(String id) {
        String code = codes.get(id);
        return code != null ? ofCode(code) : builtIn(id.matches("\\d{1,4}") ? Integer.parseInt(id) : 0);
    }

    /** The formats that stand in no file, by their numbers in ECMA-376-1, section 18.8.30 (from memory). */
    private static Format builtIn(int id) {
        if (id == 9 || id == 10) {
            return Format.PERCENT;
        }
        boolean date = id >= 14 && id <= 22 || id >= 27 && id <= 36 || id >= 45 && id <= 47 || id >= 50 && id <= 58;
        return date ? Format.DATE : Format.PLAIN;
    }

    static Format ofCode(String code) {
        if (code.length() > LONGEST_CODE) {
            return Format.WORDS;
        }
        String words = code.replaceAll("\\[\\$[^\\]]*\\]", "\"money\"");
        String bare = words.replaceAll("\"[^\"]*\"|\\\\.|_.|\\*.", "")
                .replaceAll("\\[(?!(?i)[hms]+\\])[^\\]]*\\]", "")
                .toLowerCase(Locale.ROOT);
        if (bare.replace("general", "").replace("standard", "").matches(".*[dmyhs].*")) {
            return Format.DATE;
        }
        if (bare.contains("%")) {
            return Format.PERCENT;
        }
        boolean letters = words.matches(".*\"[^\"]*[\\p{L}%‰°][^\"]*\".*") || words.matches(".*\\\\[\\p{L}%‰°].*");
        boolean scaled = bare.matches(".*[0#?],+([^0#?,].*)?");
        return letters || scaled ? Format.WORDS : Format.PLAIN;
    }
}
