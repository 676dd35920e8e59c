package nappe.proof;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Random;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;

/** One small damage to the text of a part of a workbook, drawn by lot. */
enum Damage {
    BYTE_CHANGED {
        @Override
        String to(String text, Random lot) {
            byte[] bytes = text.getBytes(StandardCharsets.ISO_8859_1);
            bytes[lot.nextInt(bytes.length)] = (byte) lot.nextInt(256);
            return new String(bytes, StandardCharsets.ISO_8859_1);
        }
    },
    STRETCH_LOST {
        @Override
        String to(String text, Random lot) {
            int from = lot.nextInt(text.length());
            return text.substring(0, from) + text.substring(Math.min(text.length(), from + 1 + lot.nextInt(40)));
        }
    },
    ATTRIBUTE_LOST {
        @Override
        String to(String text, Random lot) {
            return replaced(text, ATTRIBUTE, lot, "");
        }
    },
    ATTRIBUTE_WILD {
        @Override
        String to(String text, Random lot) {
            return replaced(text, VALUE, lot, "\"" + one(WILD, lot) + "\"");
        }
    },
    ELEMENT_LOST {
        @Override
        String to(String text, Random lot) {
            return replaced(text, ELEMENT, lot, "");
        }
    },
    ELEMENT_TWICE {
        @Override
        String to(String text, Random lot) {
            return replaced(text, ELEMENT, lot, "$0$0");
        }
    },
    ROW_TWICE {
        @Override
        String to(String text, Random lot) {
            return replaced(text, ROW, lot, "$0$0");
        }
    },
    ROW_LOST {
        @Override
        String to(String text, Random lot) {
            return replaced(text, ROW, lot, "");
        }
    },
    NUMBER_WILD {
        @Override
        String to(String text, Random lot) {
            return replaced(text, CONTENT, lot, "<v>" + one(WILD, lot) + "</v>");
        }
    },
    CELL_MOVED {
        @Override
        String to(String text, Random lot) {
            return replaced(text, ADDRESS, lot, " r=\"" + (char) ('A' + lot.nextInt(14)) + "$2\"");
        }
    },
    CELL_MOVED_FAR {
        @Override
        String to(String text, Random lot) {
            return replaced(text, ADDRESS, lot, " r=\"$1" + lot.nextInt(60) + "\"");
        }
    },
    KIND_CHANGED {
        @Override
        String to(String text, Random lot) {
            return replaced(text, KIND, lot, " t=\"" + one(KINDS, lot) + "\"");
        }
    },
    ROW_HIDDEN {
        @Override
        String to(String text, Random lot) {
            return replaced(text, ROW_START, lot, "<row hidden=\"1\" ");
        }
    },
    CELLS_MERGED {
        @Override
        String to(String text, Random lot) {
            int row = 1 + lot.nextInt(30);
            String range = "A" + row + ":" + (char) ('B' + lot.nextInt(8)) + (row + lot.nextInt(3));
            return replaced(text, DATA_END, lot, "$0<mergeCells><mergeCell ref=\"" + range + "\"/></mergeCells>");
        }
    };

    /** What stands where a number should. */
    static final List<String> NO_NUMBERS =
            List.of("abc", "NaN", "1e999", "-1e999", "Infinity", "INF", "0x10", "1,5", "1 2", "1d", "\u0664", "1.2.3");

    private static final List<String> WILD = List.of(
            "abc",
            "NaN",
            "1e999",
            "inf",
            "-1",
            "0",
            "1",
            "7",
            "1e300",
            "1e-300",
            "99999999999",
            "",
            " ",
            "0x1p3",
            "true",
            "A1");
    private static final List<String> KINDS = List.of("s", "str", "b", "e", "d", "inlineStr", "n", "zz", "");
    private static final Pattern ATTRIBUTE = Pattern.compile(" [\\w:]+=\"[^\"]*\"");
    private static final Pattern VALUE = Pattern.compile("\"[^\"]*\"");
    private static final Pattern ELEMENT = Pattern.compile(
            "<(c|si|xf|sheet|col|numFmt|Relationship|Override|Default) [^<>]*(/>|>(?:(?!</\\1>).)*</\\1>)");
    private static final Pattern ROW = Pattern.compile("<row .*?</row>");
    private static final Pattern ROW_START = Pattern.compile("<row ");
    private static final Pattern CONTENT = Pattern.compile("<v>[^<]*</v>");
    private static final Pattern ADDRESS = Pattern.compile(" r=\"([A-Z]+)([0-9]+)\"");
    private static final Pattern KIND = Pattern.compile(" t=\"[^\"]*\"");
    private static final Pattern DATA_END = Pattern.compile("</sheetData>");

    /** The damaged text; the same where there is nothing to damage in this way. */
    abstract String to(String text, Random lot);

    private static String one(List<String> of, Random lot) {
        return of.get(lot.nextInt(of.size()));
    }

    private static String replaced(String text, Pattern pattern, Random lot, String by) {
        List<MatchResult> all = pattern.matcher(text).results().toList();
        if (all.isEmpty()) {
            return text;
        }
        MatchResult chosen = all.get(lot.nextInt(all.size()));
        String put = pattern.matcher(chosen.group()).replaceFirst(by);
        return text.substring(0, chosen.start()) + put + text.substring(chosen.end());
    }
}
