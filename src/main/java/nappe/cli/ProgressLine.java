package nappe.cli;

import java.io.FilterWriter;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.io.Writer;

/**
 * One line on the terminal that says what the program is busy with. It appears only once a person has waited for a while, each
 * stage takes the place of the one before, and whatever else is printed takes it away first, so that nothing of it is left.
 */
final class ProgressLine {
    private final Writer screen;
    private String stage = "";
    private int shown;
    private boolean due;
    private boolean ended;

    private ProgressLine(Writer screen) {
        this.screen = screen;
    }

    /** @param patienceMillis how long a person waits without being told anything */
    static ProgressLine on(Writer screen, long patienceMillis) {
        ProgressLine line = new ProgressLine(screen);
        Thread clock = new Thread(() -> line.waitThenShow(patienceMillis), "progress");
        clock.setDaemon(true);
        clock.start();
        return line;
    }

    private void waitThenShow(long millis) {
        try {
            Thread.sleep(millis);
        } catch (InterruptedException e) {
            return;
        }
        synchronized (this) {
            due = true;
            show();
        }
    }

    /** A stream of the same terminal: what is written to it takes the line away first. */
    Writer before(Writer stream) {
        return new FilterWriter(stream) {
            @Override
            public void write(int c) throws IOException {
                erase();
                super.write(c);
            }

            @Override
            public void write(char[] text, int from, int length) throws IOException {
                erase();
                super.write(text, from, length);
            }

            @Override
            public void write(String text, int from, int length) throws IOException {
                erase();
                super.write(text, from, length);
            }
        };
    }

    /** What the program is busy with from now on, such as "comparing sizes". */
    synchronized void stage(String words) {
        stage = words;
        show();
    }

    /** Takes the line away for good. */
    synchronized void end() {
        erase();
        ended = true;
    }

    private void show() {
        if (due && !ended && !stage.isEmpty()) {
            erase();
            String text = "nappe: " + stage + " ...";
            print(text);
            shown = text.length();
        }
    }

    private synchronized void erase() {
        if (shown > 0) {
            print("\r" + " ".repeat(shown) + "\r");
            shown = 0;
        }
    }

    private void print(String text) {
        try {
            screen.write(text);
            screen.flush();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
