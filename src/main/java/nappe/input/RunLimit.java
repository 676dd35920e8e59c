package nappe.input;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;

/** XML that is cut short where a million bytes go by without a tag, before they pile up in memory. */
final class RunLimit extends FilterInputStream {
    /** What the exception says. */
    static final String SAID = "run of text without end";

    private static final int LONGEST = 1_000_000;

    private int run;
    private int last;
    private int lastButOne;
    /** Inside a comment, a character section or an instruction, where {@code <} starts no tag. */
    private boolean inside;

    RunLimit(InputStream in) {
        super(in);
    }

    @Override
    public int read() throws IOException {
        int c = super.read();
        count(c);
        return c;
    }

    @Override
    public int read(byte[] to, int from, int most) throws IOException {
        int n = super.read(to, from, most);
        for (int i = from; i < from + n; i++) {
            count(to[i]);
        }
        return n;
    }

    private void count(int c) throws IOException {
        if (c == 0) {
            return; // half a character of UTF-16
        }
        run++;
        if (inside) {
            inside = !(c == '>' && (last == '?' || last == lastButOne && (last == '-' || last == ']')));
        } else if (last == '<' && (c == '!' || c == '?')) {
            inside = true;
        } else if (c == '<') {
            run = 0;
        }
        lastButOne = last;
        last = c;
        if (run > LONGEST) {
            throw new IOException(SAID);
        }
    }
}
