package nappe.source;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * The text of a file that somebody wrote: UTF-8 and nothing else, with or without a byte-order mark, lines ended in either
 * way. What comes out is the same wherever the file was saved: no mark, and line feeds only.
 */
public final class StrictText {
    /** More are told by their number: a file in another encoding has one in every line. */
    private static final int MOST_FAULTS = 20;

    private final String file;
    private final byte[] bytes;
    private final StringBuilder decoded = new StringBuilder();

    /** Where in the decoded text a byte was that is no character, and which byte. */
    private final Map<Integer, Byte> strangers = new HashMap<>();

    private final List<TextFault> faults = new ArrayList<>();

    private StrictText(String file, byte[] bytes) {
        this.file = file;
        this.bytes = bytes;
    }

    /**
     * The text of a file.
     *
     * @param file as messages name it
     * @throws TextException with the line and column of what is not text in UTF-8
     */
    public static String of(String file, byte[] bytes) {
        return new StrictText(file, bytes).text();
    }

    private String text() {
        refuseOtherKinds();
        decode();
        List<String> lines = decoded.toString().lines().toList();
        int line = 1;
        int start = decoded.indexOf("\uFEFF") == 0 ? 1 : 0;
        for (int i = start; i < decoded.length(); i++) {
            char c = decoded.charAt(i);
            boolean isLast = i + 1 == decoded.length();
            Byte stranger = strangers.get(i);
            if (c == '\n' || c == '\r' && (isLast || decoded.charAt(i + 1) != '\n')) {
                line++;
                start = i + 1;
            } else if (stranger != null) {
                add(
                        line,
                        i - start + 1,
                        String.format(
                                Locale.ROOT,
                                "the byte %02X is not UTF-8 here; save the file in that encoding",
                                stranger),
                        lines);
            } else if (Character.isISOControl(c) && c != '\t' && c != '\r' || c >= '\uFFFE') {
                add(
                        line,
                        i - start + 1,
                        String.format(Locale.ROOT, "U+%04X is no character of a text; take it out", (int) c),
                        lines);
            }
        }
        if (!faults.isEmpty()) {
            throw new TextException(told());
        }
        String text = decoded.toString().replace("\r\n", "\n").replace('\r', '\n');
        return text.startsWith("\uFEFF") ? text.substring(1) : text;
    }

    /** A workbook, or a text in another encoding throughout, would give a fault for every letter. */
    private void refuseOtherKinds() {
        if (startsWith(0x50, 0x4B, 3, 4) || startsWith(0xD0, 0xCF, 0x11, 0xE0)) {
            throw refuse(
                    "this is a workbook or a packed file, not a text; save what it holds as plain text (a table as CSV)");
        }
        if (startsWith(0xFF, 0xFE) || startsWith(0xFE, 0xFF)) {
            throw refuse("this text is saved in UTF-16; save the file in UTF-8");
        }
    }

    private boolean startsWith(int... first) {
        for (int i = 0; i < first.length; i++) {
            if (i >= bytes.length || (bytes[i] & 0xFF) != first[i]) {
                return false;
            }
        }
        return true;
    }

    private TextException refuse(String message) {
        return new TextException(List.of(TextFault.ofFile(file, message, "encoding")));
    }

    private void add(int line, int column, String message, List<String> lines) {
        String text = line <= lines.size() ? lines.get(line - 1) : "";
        faults.add(new TextFault(
                file, line, column, message, "encoding", text.startsWith("\uFEFF") ? text.substring(1) : text));
    }

    private List<TextFault> told() {
        if (faults.size() <= MOST_FAULTS) {
            return faults;
        }
        List<TextFault> told = new ArrayList<>(faults.subList(0, MOST_FAULTS));
        told.add(TextFault.ofFile(
                file,
                faults.size() - MOST_FAULTS + " more of that kind; save the whole file anew in UTF-8",
                "encoding"));
        return told;
    }

    /** Decodes with a question mark for each run of bytes that is no character. */
    private void decode() {
        CharsetDecoder decoder = StandardCharsets.UTF_8.newDecoder();
        ByteBuffer in = ByteBuffer.wrap(bytes);
        CharBuffer out = CharBuffer.allocate(bytes.length + 1);
        CoderResult result = decoder.decode(in, out, true);
        while (!result.isUnderflow()) {
            strangers.put(out.position(), in.get(in.position()));
            in.position(in.position() + result.length());
            out.put('?');
            result = decoder.decode(in, out, true);
        }
        decoded.append(out.flip());
    }
}
